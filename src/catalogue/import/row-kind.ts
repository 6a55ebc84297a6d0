import { type Decimal, plainCell, readCell, saysNothing } from "./figures.js";
import { readHeader } from "./header-words.js";
import type { Layout } from "./layout.js";
import { readUnit } from "./units.js";

/** What a record of the file is: a shape's row, or something around it that is passed over and counted. */
export type RowKind = "shape" | "blank" | "title" | "header" | "units" | "numbering" | "total" | "note";

const TOTAL =
  /^(?:sub-?\s?totals?|grand totals?|totals?|sums?|summe|gesamt|zwischensumme|gesamtsumme|somme|totale|suma|average|mean|mittelwert|count|anzahl)\b/i;

/** What it takes to tell a row's kind. */
export interface KindInput {
  readonly layout: Layout;
  readonly decimal: Decimal;
  /** Place of the name's column. */
  readonly nameAt: number;
  /** Places of the four dimensions. */
  readonly dimensionsAt: readonly number[];
}

/**
 * Whether a record below the table's head is a shape, or a blank line, a repeated head, a total or a note.
 *
 * A record with two or more dimensions is always a shape; so is one with a name that has letters and figures in it, such as `W30X116`, unless
 * it stands all alone, as a heading does, and none of its cells is a number.
 */
export function kindOf(cells: readonly string[], input: KindInput): RowKind | "second-header" {
  const { layout, decimal, nameAt, dimensionsAt } = input;
  if (cells.length === 0) return "blank";
  const isFigure = (cell: string | undefined): boolean => cell !== undefined && readCell(plainCell(cell), decimal).kind === "figure";
  let dimensions = 0;
  for (const place of dimensionsAt) if (isFigure(cells[place])) dimensions++;
  const name = plainCell(cells[nameAt] ?? "");
  if (TOTAL.test(name)) return "total";
  if (dimensions >= 3 && name !== "" && /\d/.test(name)) return "shape";
  const filled = cells.filter((cell) => !saysNothing(plainCell(cell)));
  if (filled.length === 0) return "blank";
  if (same(cells, layout.headerCells)) return "header";
  if (layout.unitCells !== null && same(cells, layout.unitCells)) return "units";
  if (TOTAL.test(plainCell(filled[0]))) return "total";
  if (dimensions >= 2) return "shape";
  const figures = filled.filter(isFigure).length;
  if (figures === 0 && filled.length >= 3) {
    const headers = filled.filter((cell) => readHeader(cell).meanings.length > 0).length;
    if (headers >= 3 && headers >= filled.length / 2) return sameMeaning(cells, layout) ? "header" : "second-header";
    const units = filled.filter((cell) => readUnit(cell) !== null).length;
    if (units >= 3 && units >= filled.length - 1) return "units";
  }
  const namesAShape = /^(?=.*\d)(?=.*[a-z])\S+(?: \S+){0,2}$/i.test(name) && name.length <= 24;
  if (namesAShape && (filled.length > 1 || /\d\s*[x×*]\s*\d/i.test(name))) return "shape";
  return figures >= 2 && name !== "" && filled.length > 2 ? "shape" : "note";
}

function same(cells: readonly string[], others: readonly string[]): boolean {
  return cells.length === others.length && cells.every((cell, index) => cell.toLowerCase() === others[index].toLowerCase());
}

/** Whether a header further down gives every column the meaning it has. */
function sameMeaning(cells: readonly string[], { columns }: Layout): boolean {
  return columns.every(({ meanings, index }) => {
    const again = readHeader(cells[index] ?? "").meanings;
    return meanings.length === 0 ? again.length === 0 : again.some((field) => meanings.includes(field));
  });
}
