import type { ImportSummary } from "../../catalogue/import/import-list.js";
import { SYMBOLS } from "../../catalogue/import/judge-row.js";
import type { RowKind } from "../../catalogue/import/row-kind.js";
import { CAUTION } from "../caution.js";
import { bullet, type Style, WIDTH } from "./frame.js";
import { table, wrap } from "./table.js";

/** Refusals and warnings shown; the rest are counted. */
const SHOWN = 20;
const SEPARATORS: Readonly<Record<string, string>> = { ",": "comma", ";": "semicolon", "\t": "tab", "|": "stroke" };
const KINDS: Readonly<Record<RowKind, string>> = {
  shape: "shapes",
  blank: "blank",
  title: "above the header",
  header: "header",
  units: "units",
  numbering: "column numbers",
  total: "totals",
  note: "notes",
};

/** The answer to `import` as plain text. @param written the files written, with their flags */
export function importText(
  summary: ImportSummary,
  written: readonly { readonly path: string; readonly flag: string }[],
  style: Style,
): string {
  const { reading, accepted, refusedCount, warningCount } = summary;
  const rows = accepted + refusedCount;
  const head = `${reading.file}: ${accepted} of ${rows} rows accepted, ${refusedCount} refused${warningCount === 0 ? "" : `, ${warningCount} warnings`}`;
  const separator = SEPARATORS[reading.layout.delimiter] ?? reading.layout.delimiter;
  const decimals = reading.decimal === "," ? "comma" : "point";
  return [
    style.strong(head),
    `Cells apart by ${separator}, decimals by ${decimals}, ${reading.encoding.encoding}; header on line ${reading.layout.headerLine}.`,
    "",
    ...columnLines(summary),
    ...unreadLines(summary),
    ...section("Refused", summary.refused, refusedCount, ({ line, reason }) => `line ${line}: ${reason}`),
    ...section("Warnings (accepted all the same)", summary.warnings, warningCount, ({ line, message }) => `line ${line}: ${message}`),
    ...remarkLines(summary),
    "",
    ...wrap(accountText(summary), WIDTH, ""),
    ...written.map(({ path, flag }) => `Written: ${flag === "--out" ? "accepted" : "refused"} rows to ${path}.`),
    ...(accepted > 0 && !written.some(({ flag }) => flag === "--out")
      ? ["--out FILE writes the accepted rows as a list for --sections."]
      : []),
    "",
    ...wrap(`Caution: ${CAUTION}`, WIDTH, ""),
    "",
  ].join("\n");
}

function columnLines({ reading, derived }: ImportSummary): string[] {
  const name = reading.layout.columns[reading.nameAt]?.header ?? "";
  const read = [...reading.columns.values()].map(({ field, header, unit, index }) => {
    const count = field in derived ? (derived[field as keyof typeof derived] ?? 0) : 0;
    return [SYMBOLS[field], header, String(index + 1), unit.name, count === 0 ? "" : `${count} derived`];
  });
  const lines = table(
    [
      { title: "what", align: "left" },
      { title: "header", align: "left" },
      { title: "column", align: "right" },
      { title: "unit", align: "left" },
      { title: "", align: "left" },
    ],
    [[SYMBOLS.designation, name, String(reading.nameAt + 1), "", ""], ...read],
  );
  const whole = Object.entries(derived).filter(([field]) => !reading.columns.has(field as never));
  if (whole.length === 0) return lines;
  const names = whole.map(([field, count]) => `${SYMBOLS[field as keyof typeof SYMBOLS]} (${count})`).join(", ");
  return [...lines, "", ...wrap(`Derived, rows in brackets: ${names}.`, WIDTH, "")];
}

function unreadLines({ reading: { layout, nameAt } }: ImportSummary): string[] {
  const headers = layout.columns
    .filter(({ meanings, header, index }) => meanings.length === 0 && header !== "" && index !== nameAt)
    .map(({ header }) => header);
  return headers.length === 0
    ? []
    : ["", ...wrap(`Not read: ${headers.slice(0, 30).join(", ")}${headers.length > 30 ? " ..." : ""}.`, WIDTH, "")];
}

function section<T>(title: string, items: readonly T[], count: number, words: (item: T) => string): string[] {
  if (count === 0) return [];
  const rest = count - Math.min(SHOWN, items.length);
  return [
    "",
    title,
    ...items.slice(0, SHOWN).flatMap((item) => bullet(words(item))),
    ...(rest > 0 ? [`  and ${rest} more (--json, --refused FILE)`] : []),
  ];
}

function remarkLines({ reading: { remarks } }: ImportSummary): string[] {
  return remarks.length === 0 ? [] : ["", "Remarks", ...remarks.flatMap((text) => bullet(text))];
}

/** The sum by which every record of the file is accounted for. */
function accountText({ accepted, refusedCount, passedOver }: ImportSummary): string {
  const kinds = Object.entries(passedOver) as [RowKind, number][];
  const total = accepted + refusedCount + kinds.reduce((sum, [, count]) => sum + count, 0);
  const rest = kinds.map(([kind, count]) => ` + ${count} ${KINDS[kind]}`).join("");
  return `${total} records = ${accepted} accepted + ${refusedCount} refused${rest}.`;
}
