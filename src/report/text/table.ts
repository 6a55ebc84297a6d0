/** One column of a plain table. */
export interface TableColumn {
  readonly title: string;
  readonly align: "left" | "right";
}

/** Lines of a plain table: columns two blanks apart, as wide as their widest cell. */
export function table(columns: readonly TableColumn[], rows: readonly (readonly string[])[]): string[] {
  const widths = columns.map(({ title }, column) => Math.max(title.length, ...rows.map((row) => (row[column] ?? "").length)));
  const line = (cells: readonly string[]): string =>
    columns
      .map(({ align }, column) => {
        const cell = cells[column] ?? "";
        return align === "left" ? cell.padEnd(widths[column]) : cell.padStart(widths[column]);
      })
      .join("  ")
      .trimEnd();
  return [line(columns.map(({ title }) => title)), ...rows.map(line)];
}

/** Breaks a sentence into lines of at most `width` characters, later ones indented like the first. */
export function wrap(text: string, width: number, indent: string): string[] {
  const lines: string[] = [];
  let line = "";
  for (const word of text.split(" ")) {
    if (line !== "" && indent.length + line.length + 1 + word.length > width) {
      lines.push(indent + line);
      line = word;
    } else line = line === "" ? word : `${line} ${word}`;
  }
  return [...lines, indent + line];
}
