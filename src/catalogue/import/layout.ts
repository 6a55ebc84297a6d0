import { InputError } from "../../errors.js";
import { nearest } from "../../nearest.js";
import { DIMENSIONS, type Field, isDimension, isProperty, QUANTITY } from "./fields.js";
import { type Decimal, plainCell, readCell, saysNothing } from "./figures.js";
import { readHeader } from "./header-words.js";
import { type ListRow, splitText } from "./split-rows.js";
import { readUnit, type Unit } from "./units.js";

/** A column as its header tells of it. */
export interface HeaderColumn {
  readonly index: number;
  readonly header: string;
  /** Fields it may stand for; empty for a column that is not read. */
  readonly meanings: readonly Field[];
  /** Its unit by header, units row or --units; null where nobody says. */
  readonly unit: Unit | null;
  /** True where --units names this column: its unit is not questioned. */
  readonly unitForced: boolean;
}

/** Where a list's table begins and what its header says. */
export interface Layout {
  readonly delimiter: string;
  readonly headerLine: number;
  /** The header's cells, as they would stand if it were repeated further down. */
  readonly headerCells: readonly string[];
  readonly columns: readonly HeaderColumn[];
  /** What the rows of the table's head are, by line: `header`, `units` or `numbering`. */
  readonly headKinds: ReadonlyMap<number, "header" | "units" | "numbering">;
  /** The units row's cells, which may be repeated with the header; null for none. */
  readonly unitCells: readonly string[] | null;
  /** Records of the sample after the table's head. */
  readonly body: readonly ListRow[];
}

/** What the user says of the columns: --map and --units. */
export interface ColumnWishes {
  /** `NAME=HEADER`. */
  readonly map: readonly string[];
  /** `us`, `metric` or `COLUMN=UNIT`. */
  readonly units: readonly string[];
}

/** Separators tried, in order of preference. */
const DELIMITERS = [",", ";", "\t", "|"] as const;
/** Records among which a header is looked for. */
const HEAD_ROWS = 120;
/** Headers understood without which a row is no header. */
const FEWEST_HEADERS = 3;

/**
 * Finds separator, header and units row of a list.
 *
 * @param sample the beginning of the text
 * @param whole whether the sample is the whole file
 * @throws {InputError} where there is no header, naming what was found; or where a wish names no column
 */
export function findLayout(sample: string, whole: boolean, file: string, wishes: ColumnWishes): Layout {
  const declared = /^sep=([,;|\t])\s*$/im.exec(sample.slice(0, 8));
  let best: { delimiter: string; rows: ListRow[]; at: number; score: number } | null = null;
  let fault: InputError | null = null;
  for (const delimiter of declared === null ? DELIMITERS : [declared[1]]) {
    try {
      const rows = splitText(sample, delimiter, file, { sample: !whole });
      const found = headerAt(rows, mapOf(wishes));
      if (found.score > (best?.score ?? 0)) best = { delimiter, rows, ...found };
    } catch (error) {
      if (!(error instanceof InputError)) throw error;
      if (fault === null || sample.includes(delimiter)) fault ??= error;
    }
  }
  if (best === null || best.score < FEWEST_HEADERS) throw fault ?? noHeader(sample, file);
  return describe(best.rows, best.at, best.delimiter, file, wishes);
}

function noHeader(sample: string, file: string): InputError {
  const filled = sample.trim() !== "";
  const separated = DELIMITERS.some((delimiter) => sample.includes(delimiter));
  const problem = !filled ? "the file holds nothing but blanks" : separated ? "no header row found" : "only one column found";
  const allowed =
    "a header line with a name, depth, flange width, web and flange thickness, cells apart by comma, semicolon or tab; or --map NAME=HEADER";
  return new InputError([{ file, line: 1, problem, allowed }]);
}

interface MapWish {
  readonly name: string;
  readonly header: string;
}

function mapOf({ map }: ColumnWishes): MapWish[] {
  return map.flatMap((text) => {
    const equals = text.indexOf("=");
    return equals < 1 ? [] : [{ name: text.slice(0, equals).trim(), header: text.slice(equals + 1).trim() }];
  });
}

const tidy = (text: string): string =>
  text
    .replace(/[\s\u00a0]+/g, " ")
    .trim()
    .toLowerCase();

/** The row with the most headers understood; the first of several. */
function headerAt(rows: readonly ListRow[], maps: readonly MapWish[]): { at: number; score: number } {
  const wished = new Set(maps.map(({ header }) => tidy(header)));
  let best = { at: -1, score: 0 };
  rows.slice(0, HEAD_ROWS).forEach(({ cells }, at) => {
    const understood = new Set<string>();
    let figures = 0;
    let dimensions = 0;
    for (const cell of cells) {
      if (cell === "") continue;
      if (wished.has(tidy(cell))) understood.add(tidy(cell));
      else if (isNumber(cell)) figures++;
      else {
        const { meanings } = readHeader(cell);
        if (meanings.length > 0) understood.add(meanings.join());
        if (meanings.some(isDimension)) dimensions++;
      }
    }
    const score = figures > understood.size / 2 || (dimensions === 0 && wished.size === 0) ? 0 : understood.size;
    if (score > best.score) best = { at, score };
  });
  return best;
}

/** Whether a cell is a number by either decimal sign. */
export function isNumber(cell: string): boolean {
  const text = plainCell(cell);
  const either = (decimal: Decimal): boolean => readCell(text, decimal).kind === "figure";
  return /\d/.test(text) && (either(".") || either(",")) && readUnit(text) === null;
}

function describe(rows: readonly ListRow[], at: number, delimiter: string, file: string, wishes: ColumnWishes): Layout {
  const header = rows[at];
  const headKinds = new Map<number, "header" | "units" | "numbering">([[header.line, "header"]]);
  let unitCells: readonly string[] | null = null;
  let below: readonly string[] | null = null;
  let next = at + 1;
  for (; next < rows.length && next <= at + 5; next++) {
    const { cells, line } = rows[next];
    if (cells.length === 0) continue;
    const kind = headKind(cells, next - at <= 2);
    if (kind === null) break;
    headKinds.set(line, kind);
    if (kind === "units" && unitCells === null) unitCells = cells;
    if (kind === "header") below = cells;
  }
  const above = rows.slice(0, at).findLast(({ cells }) => cells.length > 0);
  const columns = header.cells.map((cell, index): HeaderColumn => {
    const words = bestWords(cell, filledCell(above?.cells, index), below?.[index] ?? "");
    const fromRow = unitCells === null ? null : readUnit(unitCells[index] ?? "");
    const fits = fromRow !== null && (words.meanings.length === 0 || words.meanings.some((field) => QUANTITY[field] === fromRow.quantity));
    const unit = fits ? fromRow : words.unit;
    const meanings = fits ? words.meanings.filter((field) => QUANTITY[field] === fromRow.quantity) : words.meanings;
    return { index, header: words.header, meanings, unit, unitForced: false };
  });
  return {
    delimiter,
    headerLine: header.line,
    headerCells: header.cells,
    columns: withWishes(columns, wishes, file, header.line),
    headKinds,
    unitCells,
    body: rows.slice(next),
  };
}

/** A cell of the row above the header; of merged cells a spreadsheet keeps the first, so a blank one takes its left neighbour's text. */
function filledCell(cells: readonly string[] | undefined, index: number): string {
  if (cells === undefined || cells.length < 2) return "";
  for (let at = Math.min(index, cells.length - 1); at >= 0; at--) if (cells[at] !== "") return cells[at];
  return "";
}

function bestWords(cell: string, above: string, below: string) {
  const alone = readHeader(cell);
  if (alone.meanings.length > 0) return alone;
  if (below !== "") {
    const lower = readHeader(below);
    if (lower.meanings.length > 0) return { ...lower, header: `${cell} ${below}`.trim() };
    const joined = readHeader(`${cell} ${below}`);
    if (joined.meanings.length > 0) return joined;
  }
  if (above !== "" && cell !== "") {
    const joined = readHeader(`${above} ${cell}`);
    if (joined.meanings.length > 0) return { ...joined, header: cell };
  }
  return alone;
}

/** What a row just below the header is, or null for the first row of the table itself. */
function headKind(cells: readonly string[], near: boolean): "header" | "units" | "numbering" | null {
  const filled = cells.filter((cell) => !saysNothing(plainCell(cell)));
  if (filled.length === 0) return "units";
  if (cells.every((cell, index) => cell === "" || new RegExp(`^[([]?${index + 1}[)\\].]?$`).test(cell)) && filled.length > 2)
    return "numbering";
  if (filled.some(isNumber)) return null;
  const units = filled.filter((cell) => readUnit(cell) !== null).length;
  if (units >= 2 && units >= filled.length / 2 - 1) return "units";
  const headers = filled.filter((cell) => readHeader(cell).meanings.length > 0).length;
  return near && headers >= 2 && headers >= filled.length / 2 ? "header" : null;
}

/** Applies --map and --units to the columns. */
function withWishes(columns: readonly HeaderColumn[], wishes: ColumnWishes, file: string, line: number): HeaderColumn[] {
  const issues: { file: string; line?: number; field: string; problem: string; allowed: string }[] = [];
  let result = [...columns];
  for (const { name, header } of mapOf(wishes)) {
    const found = columnNamed(columns, header);
    if (found.length !== 1) {
      issues.push({ file, line, field: "--map", ...noSuchColumn(header, found.length, columns) });
      continue;
    }
    const [{ index }] = found;
    const field = name === "unread" ? null : (name as Field);
    result = result.map((column) => {
      if (column.index !== index) return { ...column, meanings: column.meanings.filter((meaning) => meaning !== field) };
      const unit = field !== null && column.unit !== null && column.unit.quantity === QUANTITY[field] ? column.unit : null;
      return { ...column, meanings: field === null ? [] : [field], unit };
    });
  }
  for (const text of wishes.units) {
    const equals = text.lastIndexOf("=");
    if (equals < 1) continue;
    const name = text.slice(0, equals).trim();
    const unit = readUnit(text.slice(equals + 1));
    const byField = result.filter(({ meanings }) => meanings.length > 0 && meanings.includes(name as Field));
    const found = byField.length > 0 ? byField : columnNamed(result, name);
    if (unit === null || found.length === 0) {
      const fault =
        unit === null
          ? { problem: `"${text}"`, allowed: "COLUMN=UNIT with a unit such as in4, cm4 or 10^6 mm4" }
          : noSuchColumn(name, 0, columns);
      issues.push({ file, field: "--units", ...fault });
      continue;
    }
    const places = new Set(found.map(({ index }) => index));
    result = result.map((column) => {
      if (!places.has(column.index)) return column;
      const fitting = column.meanings.filter((field) => QUANTITY[field] === unit.quantity);
      if (fitting.length === 0) {
        const problem = `${column.header} is not measured in ${unit.name}`;
        issues.push({ file, line, field: "--units", problem, allowed: "a unit of what the column holds" });
      }
      return { ...column, meanings: fitting, unit, unitForced: true };
    });
  }
  if (issues.length > 0) throw new InputError(issues);
  return result;
}

/** Columns of a header text, or the one at a place written `#3`. */
function columnNamed<T extends { readonly index: number; readonly header: string }>(columns: readonly T[], name: string): T[] {
  const place = /^#(\d+)$/.exec(name);
  if (place !== null) return columns.filter(({ index }) => index === Number(place[1]) - 1);
  return columns.filter(({ header }) => tidy(header) === tidy(name));
}

function noSuchColumn(name: string, found: number, columns: readonly HeaderColumn[]) {
  const headers = columns.map(({ header }) => header).filter((header) => header !== "");
  if (found > 1)
    return { problem: `${found} columns are called "${name}"`, allowed: "the column's place instead, such as #4 for the fourth" };
  const near = nearest(name, headers);
  const hint = near === null ? "" : ` (did you mean ${near}?)`;
  return { problem: `no column is called "${name}"${hint}`, allowed: `${headers.slice(0, 40).join(", ")}; or its place, such as #4` };
}

/** Demands that each of the four dimensions, and the name, has a column that may hold it. */
export function demandColumns({ columns, headerLine }: Layout, file: string): void {
  const missing = [...DIMENSIONS].filter((field) => !columns.some(({ meanings }) => meanings.includes(field)));
  if (missing.length === 0) return;
  const found = columns
    .filter(({ meanings }) => meanings.some((field) => isDimension(field) || isProperty(field)))
    .map(({ header }) => header);
  const unread = columns.filter(({ meanings, header }) => meanings.length === 0 && header !== "").map(({ header }) => header);
  throw new InputError(
    missing.map((field) => ({
      file,
      line: headerLine,
      field,
      problem: `no column for it; understood: ${found.slice(0, 40).join(", ")}; not understood: ${unread.slice(0, 40).join(", ") || "none"}`,
      allowed: `a column of that meaning, or --map ${field}=HEADER`,
    })),
  );
}
