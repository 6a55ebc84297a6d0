/**
 * Text that a spreadsheet would run as a formula, with an apostrophe before it; so is text that looks as if it had been given one already,
 * for `readText` to give every text back as it was.
 */
export function harmlessText(text: string): string {
  return /^'*[=+\-@\t\r]/.test(text) ? `'${text}` : text;
}

/** The text of a cell without the apostrophe that keeps a spreadsheet from running it. */
export function readText(cell: string): string {
  return /^'+[=+\-@\t\r]/.test(cell) ? cell.slice(1) : cell;
}
