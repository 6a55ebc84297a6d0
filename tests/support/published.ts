import { readFileSync } from "node:fs";
import Papa from "papaparse";

/** Rows of a published table in tests/fixtures/published; an empty cell is null. */
export function publishedRows<Row>(name: string): readonly Row[] {
  const text = readFileSync(new URL(`../fixtures/published/${name}`, import.meta.url), "utf8");
  return Papa.parse<Row>(text, { header: true, dynamicTyping: true, skipEmptyLines: true }).data;
}

/** Half of the last digit a source prints. */
export const rounding = (decimals: number): number => 0.5 * 10 ** -decimals;
