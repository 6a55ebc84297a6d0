import { InputError, type InputIssue } from "../errors.js";
import { didYouMean } from "../nearest.js";
import { COLUMNS, DESIGNATION_COLUMN, PLACE_COLUMN, STOCK_COLUMNS, YIELD_COLUMN } from "./columns.js";
import { type CsvRow, readCsvRows } from "./read-rows.js";
import { designationKey, type Shape, type ShapeFigures, type Stock } from "./shape.js";
import { readText } from "./text-cells.js";

/** A list read: its shapes, and remarks for the reader's eye that stop nothing. */
export interface ShapeList {
  readonly shapes: readonly Shape[];
  readonly remarks: readonly string[];
}

const REQUIRED_COLUMNS: readonly string[] = [DESIGNATION_COLUMN, ...COLUMNS.map(({ name }) => name)];
const KNOWN_COLUMNS: readonly string[] = [...REQUIRED_COLUMNS, YIELD_COLUMN.name, ...STOCK_COLUMNS.map(({ name }) => name), PLACE_COLUMN];
const PLAIN_NUMBER = /^[+-]?(\d+(\.\d*)?|\.\d+)([eE][+-]?\d+)?$/;

/**
 * Reads a list of shapes in our own columns.
 *
 * @param text the whole CSV file
 * @param file its name, for sources and faults
 * @param origin whether this is the catalogue that comes with the program
 * @returns shapes in the order of the file
 * @throws {InputError} naming every fault: no rows, missing or repeated columns, figures that are not numbers or out of range,
 *   impossible plates, repeated designations
 */
export function readShapes(text: string, file: string, origin: { readonly bundled: boolean }): ShapeList {
  const [header, ...rows] = readCsvRows(text, file);
  if (header === undefined) {
    throw new InputError([{ file, problem: "the list is empty", allowed: `a header line with ${REQUIRED_COLUMNS.join(", ")}` }]);
  }
  const { places, remarks } = placeColumns(header, file);
  if (rows.length === 0) {
    throw new InputError([{ file, line: header.line, problem: "the list has a header but no shapes", allowed: "one row a shape" }]);
  }
  const issues: InputIssue[] = [];
  const shapes: Shape[] = [];
  const seen = new Map<string, number>();
  for (const row of rows) {
    const shape = readRow(row, header, places, file, origin.bundled, issues);
    const key = designationKey(shape.designation);
    const before = seen.get(key);
    if (before !== undefined && key !== "") {
      issues.push({
        file,
        line: row.line,
        field: DESIGNATION_COLUMN,
        problem: `${shape.designation} stands already on line ${before}`,
        allowed: "each designation once",
      });
    }
    seen.set(key, row.line);
    shapes.push(shape);
  }
  if (issues.length > 0) throw new InputError(issues);
  return { shapes, remarks };
}

function placeColumns(header: CsvRow, file: string): { places: ReadonlyMap<string, number>; remarks: string[] } {
  const places = new Map<string, number>();
  const issues: InputIssue[] = [];
  const remarks: string[] = [];
  header.cells.forEach((name, place) => {
    if (name === "") return;
    if (places.has(name)) {
      issues.push({ file, line: header.line, field: name, problem: "this column stands twice", allowed: "each column once" });
    } else if (!KNOWN_COLUMNS.includes(name)) {
      remarks.push(`${file}, line ${header.line}, ${name}: not one of our columns, left unread${didYouMean(name, KNOWN_COLUMNS)}`);
    }
    places.set(name, place);
  });
  for (const name of REQUIRED_COLUMNS) {
    if (!places.has(name)) {
      issues.push({
        file,
        line: header.line,
        field: name,
        problem: "this column is missing",
        allowed: `${REQUIRED_COLUMNS.join(", ")}; leanspan import turns any other list into one`,
      });
    }
  }
  if (issues.length > 0) throw new InputError(issues);
  return { places, remarks };
}

function readRow(
  row: CsvRow,
  header: CsvRow,
  places: ReadonlyMap<string, number>,
  file: string,
  bundled: boolean,
  issues: InputIssue[],
): Shape {
  const fault = (field: string, problem: string, allowed: string): void => {
    issues.push({ file, line: row.line, field, problem, allowed });
  };
  if (row.cells.length !== header.cells.length) {
    fault("row", `${row.cells.length} cells where the header has ${header.cells.length}`, "as many cells as columns");
  }
  const cell = (name: string): string => {
    const place = places.get(name);
    return place === undefined ? "" : (row.cells[place] ?? "");
  };
  const number = (name: string, min: number, max: number): number => {
    const text = cell(name);
    const value = PLAIN_NUMBER.test(text) ? Number(text) : Number.NaN;
    if (!(value >= min && value <= max)) {
      fault(name, text === "" ? "no figure" : `"${text}"`, `a plain number from ${min} to ${max}`);
    }
    return value;
  };
  const designation = readText(cell(DESIGNATION_COLUMN));
  // biome-ignore lint/suspicious/noControlCharactersInRegex: a control character in a name is what is looked for
  if (!/^[^\u0000-\u001f]{1,60}$/.test(designation)) {
    fault(DESIGNATION_COLUMN, designation === "" ? "no designation" : "an unreadable designation", "a name of 1 to 60 characters");
  }
  const figures = Object.fromEntries(COLUMNS.map(({ name, min, max }) => [name, number(name, min, max)])) as unknown as ShapeFigures;
  const yieldStressKsi = cell(YIELD_COLUMN.name) === "" ? null : number(YIELD_COLUMN.name, YIELD_COLUMN.min, YIELD_COLUMN.max);
  if (2 * figures.flangeThicknessIn >= figures.depthIn) {
    fault("flangeThicknessIn", "two flanges are as deep as the shape or deeper", "2 tf < d");
  }
  if (figures.webThicknessIn > figures.flangeWidthIn) fault("webThicknessIn", "the web is thicker than the flange is wide", "tw <= bf");
  if (figures.kDesignIn < figures.flangeThicknessIn) fault("kDesignIn", "k is less than the flange thickness", "k >= tf");
  return { designation, ...figures, yieldStressKsi, stock: readStock(), source: { file, line: row.line }, bundled };

  function readStock(): Stock | null {
    const given = (name: string): boolean => cell(name) !== "";
    if (!given(PLACE_COLUMN) && !STOCK_COLUMNS.some(({ name }) => given(name))) return null;
    const numbers = Object.fromEntries(STOCK_COLUMNS.map(({ name, min, max }) => [name, given(name) ? number(name, min, max) : null]));
    for (const { name, whole } of STOCK_COLUMNS) {
      if (whole && given(name) && !Number.isInteger(Number(cell(name)))) fault(name, `"${cell(name)}"`, "a whole number");
    }
    return { ...(numbers as unknown as Omit<Stock, "place">), place: given(PLACE_COLUMN) ? readText(cell(PLACE_COLUMN)) : null };
  }
}
