import { writeToString } from "fast-csv";
import { type CsvRecord, columnsOf, harmless } from "../report/csv.js";

/** Rows as the text of a CSV file: a header line, then a line a row; what a row lacks stays empty. */
export async function csvText(rows: readonly CsvRecord[]): Promise<string> {
  const columns = columnsOf(rows);
  const cells = rows.map((row) => columns.map((column) => harmless(row[column] ?? null)));
  return writeToString([columns, ...cells], { includeEndRowDelimiter: true });
}
