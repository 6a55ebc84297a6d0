import Papa from "papaparse";
import { InputError } from "../errors.js";

/** One row of a CSV text with the line on which it begins, from 1. */
export interface CsvRow {
  readonly line: number;
  readonly cells: readonly string[];
}

/**
 * Splits a CSV text into rows, blank ones left out, each with its true line number.
 *
 * The line is counted here from the parser's cursor: a quoted line break makes the parser's own row number drift.
 *
 * @param text the whole file; a leading byte-order mark is dropped
 * @param file the file's name, for the faults
 * @throws {InputError} on a quote that never ends or stands astray
 */
export function readCsvRows(text: string, file: string): CsvRow[] {
  // One kind of line end throughout: the parser guesses one from the header and would miss the others.
  const body = text.replace(/^\uFEFF/, "").replace(/\r\n?/g, "\n");
  const rows: CsvRow[] = [];
  const faults: { line: number; problem: string }[] = [];
  let line = 1;
  let read = 0;
  Papa.parse<string[]>(body, {
    delimiter: ",",
    newline: "\n",
    step: ({ data, errors, meta }) => {
      for (const error of errors) {
        if (error.type === "Quotes") faults.push({ line, problem: error.message });
      }
      if (data.some((cell) => cell.trim() !== "")) rows.push({ line, cells: data.map((cell) => cell.trim()) });
      line += lineBreaks(body, read, meta.cursor);
      read = meta.cursor;
    },
  });
  if (faults.length > 0) {
    throw new InputError(
      faults.map((fault) => ({ file, line: fault.line, problem: fault.problem, allowed: "well-formed CSV, quotes in pairs" })),
    );
  }
  return rows;
}

function lineBreaks(text: string, from: number, to: number): number {
  let count = 0;
  for (let at = text.indexOf("\n", from); at >= 0 && at < to; at = text.indexOf("\n", at + 1)) count++;
  return count;
}
