import { COLUMNS, DESIGNATION_COLUMN, PLACE_COLUMN, STOCK_COLUMNS, YIELD_COLUMN } from "./columns.js";
import type { Shape } from "./shape.js";
import { harmlessText } from "./text-cells.js";

/** Columns of our own format that a list may leave out. */
export const OPTIONAL_COLUMNS: readonly string[] = [YIELD_COLUMN.name, ...STOCK_COLUMNS.map(({ name }) => name), PLACE_COLUMN];

/** Header of a list in our own format. @param optional the optional columns that occur */
export function listHeader(optional: ReadonlySet<string>): string[] {
  return [DESIGNATION_COLUMN, ...COLUMNS.map(({ name }) => name), ...OPTIONAL_COLUMNS.filter((name) => optional.has(name))];
}

/** One shape as the cells of our own format: every figure to its last digit, so that reading gives it back. */
export function listRow(shape: Shape, optional: ReadonlySet<string>): string[] {
  const cells = [harmlessText(shape.designation), ...COLUMNS.map(({ name }) => String(shape[name]))];
  for (const name of OPTIONAL_COLUMNS) if (optional.has(name)) cells.push(optionalCell(shape, name));
  return cells;
}

function optionalCell({ yieldStressKsi, stock }: Shape, name: string): string {
  const value = name === YIELD_COLUMN.name ? yieldStressKsi : (stock?.[name as keyof typeof stock] ?? null);
  if (value === null) return "";
  return typeof value === "string" ? harmlessText(value) : String(value);
}
