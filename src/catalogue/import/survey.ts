import { InputError, type InputIssue } from "../../errors.js";
import { nearest } from "../../nearest.js";
import { decode, type EncodingFound, findEncoding, type OpenBytes } from "./decode.js";
import { areaOfPlates, expectedOrNull, PLF_PER_IN2 } from "./expected.js";
import { familyOf } from "./families.js";
import { DIMENSIONS, type Field, isProperty, isStock, QUANTITY, STOCK_FIELDS } from "./fields.js";
import { type Decimal, decimalOf, plainCell, readCell, saysNothing } from "./figures.js";
import { NOTE_WORDS } from "./header-words.js";
import { type ColumnWishes, demandColumns, findLayout, type HeaderColumn, type Layout } from "./layout.js";
import { type KindInput, kindOf } from "./row-kind.js";
import { type SampledColumn, type Settled, type SettledColumn, settle } from "./settle.js";
import type { ListRow } from "./split-rows.js";
import { readFeetAndInches } from "./stock-cells.js";
import { readUnit, UNITS_TRIED, type Unit } from "./units.js";

/** How a column writes its figures, for the rounding each stands for. */
export interface Precision {
  /** Most decimals and most digits seen in it. */
  readonly decimals: number;
  readonly digits: number;
  /** Finest common fraction seen in it; null for none. */
  readonly denominator: number | null;
}

/** A column that is read. */
export interface ReadColumn extends SettledColumn {
  readonly precision: Precision;
}

/** How a list is to be read: everything that holds for all its rows. */
export interface ListReading {
  readonly file: string;
  readonly encoding: EncodingFound;
  readonly decimal: Decimal;
  readonly layout: Layout;
  readonly columns: ReadonlyMap<Field, ReadColumn>;
  readonly twins: readonly ReadColumn[];
  /** Share of the area that fillets usually take in this list, where no column gives them; null where one does, or too few rows tell. */
  readonly filletShare: { readonly least: number; readonly most: number } | null;
  /** Column of the names. */
  readonly nameAt: number;
  /** Remarks on the file as a whole. */
  readonly remarks: readonly string[];
}

/** Characters and rows from which a reading is settled. */
const SAMPLE_CHARACTERS = 600_000;
const SAMPLE_ROWS = 160;
/** By how much, as a fraction, a k must overfill the middle area of a list to be taken for the detailing distance. */
const DETAILING_K = 0.008;
/** Rows from which the usual share of fillets is taken. */
const FEWEST_SHARES = 4;

/**
 * First pass: finds out how a list is to be read.
 *
 * @param open the file's bytes, opened anew for each pass
 * @param file its name, for faults
 * @param wishes what the user says of the columns
 * @throws {InputError} where the file is no such list, or its columns or units are open
 */
export async function survey(open: OpenBytes, file: string, wishes: ColumnWishes): Promise<ListReading> {
  demandWishes(wishes);
  const encoding = await findEncoding(open, file);
  const { text, whole } = await sampleOf(open, encoding);
  const layout = findLayout(text, whole, file, wishes);
  demandColumns(layout, file);
  const system = wishes.units.includes("us") ? "us" : wishes.units.includes("metric") ? "metric" : null;
  const nameAt = nameColumn(layout, file);
  demandOneTable(layout, nameAt, file);
  const decimals = decimalsOf(layout, nameAt, file);
  const tried = decimals.map((decimal) => attempt(() => settleWith(layout, decimal, nameAt, system, file)));
  const sound = tried.filter((one) => "read" in one);
  if (sound.length === 0) throw (tried[0] as { readonly error: InputError }).error;
  if (sound.length > 1 && !sameUnits(sound[0].read, sound[1].read)) {
    throw new InputError([
      {
        file,
        line: layout.headerLine,
        field: "decimals",
        problem: "a comma or point before three digits may mark thousands or decimals, and both readings fit",
        allowed: "one figure that settles it, or --units us or --units metric",
      },
    ]);
  }
  return { file, encoding, layout, nameAt, ...sound[0].read };
}

type Read = Pick<ListReading, "decimal" | "columns" | "twins" | "filletShare" | "remarks">;

function attempt(work: () => Read): { readonly read: Read } | { readonly error: InputError } {
  try {
    return { read: work() };
  } catch (error) {
    if (error instanceof InputError) return { error };
    throw error;
  }
}

const sameUnits = (a: Read, b: Read): boolean =>
  [...a.columns].every(
    ([field, { unit, index }]) => b.columns.get(field)?.unit.name === unit.name && b.columns.get(field)?.index === index,
  );

function demandWishes({ map, units }: ColumnWishes): void {
  const issues: InputIssue[] = [];
  const names = [...Object.keys(QUANTITY), "unread"];
  for (const text of map) {
    const equals = text.indexOf("=");
    const name = equals < 1 ? text : text.slice(0, equals).trim();
    if (equals >= 1 && names.includes(name) && text.slice(equals + 1).trim() !== "") continue;
    const near = nearest(name, names);
    const hint = near === null || names.includes(name) ? "" : ` (did you mean ${near}?)`;
    issues.push({ field: "--map", problem: `"${text}"${hint}`, allowed: `NAME=HEADER, NAME one of ${names.join(", ")}` });
  }
  for (const text of units) {
    if (text === "us" || text === "metric" || text.lastIndexOf("=") > 0) continue;
    issues.push({ field: "--units", problem: `"${text}"`, allowed: "us, metric, or COLUMN=UNIT such as inertiaXIn4=cm4" });
  }
  if (units.includes("us") && units.includes("metric")) {
    issues.push({ field: "--units", problem: "both us and metric", allowed: "one of them" });
  }
  if (issues.length > 0) throw new InputError(issues);
}

async function sampleOf(open: OpenBytes, encoding: EncodingFound): Promise<{ readonly text: string; readonly whole: boolean }> {
  const pieces: string[] = [];
  let length = 0;
  for await (const piece of decode(open, encoding)) {
    pieces.push(piece);
    length += piece.length;
    if (length > SAMPLE_CHARACTERS) return { text: pieces.join("").slice(0, SAMPLE_CHARACTERS), whole: false };
  }
  return { text: pieces.join(""), whole: true };
}

/** The column of the names: by its header, else the first text column that holds letters and figures together. */
function nameColumn({ columns, body, headerLine, headerCells }: Layout, file: string): number {
  const rows = body.slice(0, 400);
  const shapeLike = (index: number): number =>
    rows.filter(({ cells }) => /^(?=.*\d)(?=.*[a-z×])/i.test(plainCell(cells[index] ?? "").replace(/\d[eE][+-]?\d+$/, ""))).length;
  const filled = rows.filter(({ cells }) => cells.length > 2).length;
  const named = columns.filter(({ meanings }) => meanings.includes("designation"));
  if (named.length > 0) {
    const own = named.find(({ header }) => header === "designation");
    if (own !== undefined || named.length === 1) return (own ?? named[0]).index;
    return named.reduce((best, one) => (shapeLike(one.index) > shapeLike(best.index) ? one : best)).index;
  }
  const width = Math.max(headerCells.length, ...rows.map(({ cells }) => cells.length));
  for (let index = 0; index < width; index++) {
    const column = columns[index];
    if (column !== undefined && column.meanings.length > 0) continue;
    if (filled > 0 && shapeLike(index) >= 0.6 * filled) return index;
  }
  throw new InputError([
    {
      file,
      line: headerLine,
      field: "designation",
      problem: `no column of names among ${headerCells.slice(0, 40).join(", ")}`,
      allowed: "a column called Designation, Shape, Section or Profil, or --map designation=HEADER",
    },
  ]);
}

/** Two tables side by side have two columns of names under one header, with other names in each. */
function demandOneTable({ columns, body, headerCells, headerLine }: Layout, nameAt: number, file: string): void {
  const header = headerCells[nameAt]?.toLowerCase();
  const again = columns.find(({ index }) => index > nameAt && headerCells[index]?.toLowerCase() === header && header !== "");
  if (again === undefined) return;
  const pairs = body.slice(0, 400).filter(({ cells }) => (cells[nameAt] ?? "") !== "" && (cells[again.index] ?? "") !== "");
  const other = pairs.filter(({ cells }) => cells[nameAt] !== cells[again.index]).length;
  if (other <= pairs.length / 2) return;
  throw new InputError([
    {
      file,
      line: headerLine,
      field: `column ${again.index + 1} "${again.header}"`,
      problem: "a second table stands beside the first, with other names",
      allowed: "one table a file: put the second below the first, or in a file of its own",
    },
  ]);
}

const numeric = ({ meanings }: HeaderColumn): boolean => meanings.some((field) => QUANTITY[field] !== "text");

/** The decimal signs the list may have: one by its figures, or both where none of them settles it and it matters. */
function decimalsOf({ columns, body, headerLine }: Layout, nameAt: number, file: string): readonly Decimal[] {
  const seen = { ".": [] as string[], ",": [] as string[], either: 0 };
  for (const { cells, line } of body.slice(0, 3000)) {
    for (const column of columns) {
      if (column.index === nameAt || !numeric(column)) continue;
      const text = plainCell(cells[column.index] ?? "");
      const sign = decimalOf(text);
      if (sign === "either") seen.either++;
      else if (sign !== null) seen[sign].push(`line ${line}, ${column.header} "${text}"`);
    }
  }
  const points = seen["."].length;
  const commas = seen[","].length;
  if (points === 0 && commas === 0) return seen.either > 0 ? [".", ","] : ["."];
  const [more, fewer] = points >= commas ? [points, commas] : [commas, points];
  if (fewer > 0.15 * (more + fewer)) {
    throw new InputError([
      {
        file,
        line: headerLine,
        field: "decimals",
        problem: `decimal points (${points} cells, such as ${seen["."][0]}) and decimal commas (${commas}, such as ${seen[","][0]}) both occur`,
        allowed: "one decimal sign throughout the list",
      },
    ]);
  }
  return points >= commas ? ["."] : [","];
}

function settleWith(layout: Layout, decimal: Decimal, nameAt: number, system: "us" | "metric" | null, file: string): Read {
  const rows = sampleRows(layout, decimal, nameAt, file);
  const columns = layout.columns.filter(
    (column) => column.index !== nameAt && column.meanings.some((field) => !isStock(field) && field !== "designation"),
  );
  const sampled = columns.map((column) => sampledColumn(column, rows, decimal));
  const found = settle({
    columns: sampled,
    names: rows.map(({ cells }) => plainCell(cells[nameAt] ?? "")),
    system,
    file,
    headerLine: layout.headerLine,
  });
  const remarks: string[] = found.unread.map((header) => `column "${header}" fits nothing its header may mean; left unread`);
  const settled = withoutDetailingK(found, sampled, remarks);
  const stock = stockColumns(layout, rows, decimal, nameAt, settled, system, file, remarks);
  const precise = (column: SettledColumn): ReadColumn => ({ ...column, precision: precisionOf(column.index, rows, decimal) });
  const all = [...settled.columns, ...stock].map(precise);
  const properties = all.filter(({ field }) => isProperty(field)).length;
  if (properties === 0)
    remarks.push("nothing in the list can be checked against its dimensions: no area, weight, inertia or modulus is read");
  return {
    decimal,
    columns: new Map(all.map((column) => [column.field, column])),
    twins: settled.twins.map(precise),
    filletShare: filletShareOf(settled, sampled),
    remarks,
  };
}

/** Rows from all over the sample from which units are settled: shapes with their dimensions, not those whose names tell of channels or tees. */
function sampleRows(layout: Layout, decimal: Decimal, nameAt: number, file: string): ListRow[] {
  const dimensionsAt = DIMENSIONS.map((field) =>
    layout.columns.filter(({ meanings }) => meanings.includes(field)).map(({ index }) => index),
  );
  const input: KindInput = { layout, decimal, nameAt, dimensionsAt: [...new Set(dimensionsAt.flat())] };
  const shapes = layout.body.filter(({ cells }) => kindOf(cells, input) === "shape");
  const wide = shapes.filter(({ cells }) => cells.length > layout.headerCells.length);
  if (shapes.length > 0 && wide.length > shapes.length / 2) {
    throw new InputError([
      {
        file,
        line: wide[0].line,
        problem: `${wide.length} of ${shapes.length} rows have more cells than the header has columns (${wide[0].cells.length} for ${layout.headerCells.length})`,
        allowed: "a header for each cell; numbers with commas in them quoted, or cells apart by semicolons",
      },
    ]);
  }
  const usable = shapes.filter(({ cells }) => familyOf(plainCell(cells[nameAt] ?? "")).refused === null);
  if (usable.length === 0) {
    throw new InputError([
      {
        file,
        line: layout.headerLine,
        problem: `no I-shape among the ${shapes.length} rows below the header${firstReason(shapes, nameAt)}`,
        allowed: "one rolled I-shape a row, with its dimensions",
      },
    ]);
  }
  const step = Math.max(1, usable.length / SAMPLE_ROWS);
  return Array.from({ length: Math.min(usable.length, SAMPLE_ROWS) }, (_, index) => usable[Math.floor(index * step)]);
}

/**
 * Leaves out a k that is too large for the areas: older tables print the detailing distance, which takes in more than the fillet.
 * The fillets are then taken from the area.
 */
function withoutDetailingK(found: Settled, sampled: readonly SampledColumn[], remarks: string[]): Settled {
  const inches = (field: Field): readonly number[] | null => figuresOf(field, found, sampled);
  const [d, bf, tw, tf] = DIMENSIONS.map((field) => inches(field) ?? []);
  const k = inches("kDesignIn");
  const areas = inches("areaIn2");
  if (k === null || areas === null) return found;
  const excesses = areas
    .map((area, row) => {
      const plates = {
        depthIn: d[row],
        flangeWidthIn: bf[row],
        webThicknessIn: tw[row],
        flangeThicknessIn: tf[row],
        filletRadiusIn: Math.max(0, k[row] - tf[row]),
      };
      const expected = expectedOrNull(plates);
      return expected === null ? Number.NaN : expected.areaIn2 / area - 1;
    })
    .filter((excess) => !Number.isNaN(excess))
    .sort((a, b) => a - b);
  if (excesses.length === 0 || excesses[Math.floor(excesses.length / 2)] < DETAILING_K) return found;
  remarks.push("k is larger than the areas allow, as the detailing distance is; left unread, and the fillets taken from the area");
  return { ...found, columns: found.columns.filter(({ field }) => field !== "kDesignIn") };
}

/** A field's figures in the sample, in our unit; null where no column gives it. */
function figuresOf(field: Field, { columns }: Settled, sampled: readonly SampledColumn[]): readonly number[] | null {
  const column = columns.find((one) => one.field === field);
  const figures = column === undefined ? undefined : sampled.find(({ index }) => index === column.index)?.figures;
  return figures === undefined || column === undefined ? null : figures.map((figure) => figure * column.unit.factor);
}

/** The usual share of fillets in the area, by the middle half of the rows and as much again on either side. */
function filletShareOf(settled: Settled, sampled: readonly SampledColumn[]): ListReading["filletShare"] {
  if (settled.columns.some(({ field }) => field === "kDesignIn" || field === "filletRadiusIn")) return null;
  const [d, bf, tw, tf] = DIMENSIONS.map((field) => figuresOf(field, settled, sampled) ?? []);
  const areas = figuresOf("areaIn2", settled, sampled) ?? figuresOf("weightPlf", settled, sampled)?.map((weight) => weight / PLF_PER_IN2);
  const shares = (areas ?? [])
    .map(
      (area, row) =>
        1 -
        areaOfPlates({ depthIn: d[row], flangeWidthIn: bf[row], webThicknessIn: tw[row], flangeThicknessIn: tf[row], filletRadiusIn: 0 }) /
          area,
    )
    .filter((share) => !Number.isNaN(share))
    .sort((a, b) => a - b);
  if (shares.length < FEWEST_SHARES) return null;
  const at = (part: number): number => shares[Math.round(part * (shares.length - 1))];
  const [low, high] = [at(0.25), at(0.75)];
  const room = high - low + 0.004;
  return { least: Math.max(-0.01, low - room), most: high + room };
}

function firstReason(shapes: readonly ListRow[], nameAt: number): string {
  const [first] = shapes;
  const reason = first === undefined ? null : familyOf(plainCell(first.cells[nameAt] ?? "")).refused;
  return reason === null ? "" : ` (line ${first.line}: ${reason})`;
}

function sampledColumn(column: HeaderColumn, rows: readonly ListRow[], decimal: Decimal): SampledColumn {
  const suffixes = new Map<string, number>();
  let fractions = 0;
  const figures = rows.map(({ cells }) => {
    const cell = readCell(plainCell(cells[column.index] ?? ""), decimal);
    if (cell.kind !== "figure") return Number.NaN;
    const { value, suffix, denominator } = cell.figure;
    if (suffix !== "") suffixes.set(suffix, (suffixes.get(suffix) ?? 0) + 1);
    if (denominator !== null) fractions++;
    return value > 0 ? value : Number.NaN;
  });
  const known = figures.filter((figure) => !Number.isNaN(figure)).length;
  return { ...column, unit: column.unit ?? unitBehind(column, suffixes, known), figures, fractions: fractions > 0 };
}

/** The unit that most of a column's figures have behind them. */
function unitBehind({ meanings }: HeaderColumn, suffixes: ReadonlyMap<string, number>, known: number): Unit | null {
  for (const [suffix, count] of suffixes) {
    const unit = readUnit(suffix);
    if (unit !== null && count > known / 2 && meanings.some((field) => QUANTITY[field] === unit.quantity)) return unit;
  }
  return null;
}

function precisionOf(index: number, rows: readonly ListRow[], decimal: Decimal): Precision {
  let precision: Precision = { decimals: 0, digits: 1, denominator: null };
  for (const { cells } of rows) {
    const cell = readCell(plainCell(cells[index] ?? ""), decimal);
    if (cell.kind !== "figure") continue;
    const { decimals, digits, denominator } = cell.figure;
    precision = {
      decimals: Math.max(precision.decimals, decimals),
      digits: Math.max(precision.digits, digits),
      denominator: denominator === null ? precision.denominator : Math.max(denominator, precision.denominator ?? 1),
    };
  }
  return precision;
}

/** Columns that tell of the pieces: their units by header, by size, or by the dimensions' units where that is how a yard measures. */
function stockColumns(
  layout: Layout,
  rows: readonly ListRow[],
  decimal: Decimal,
  nameAt: number,
  settled: Settled,
  system: "us" | "metric" | null,
  file: string,
  remarks: string[],
): SettledColumn[] {
  const found: SettledColumn[] = [];
  const issues: InputIssue[] = [];
  const thickness = settled.columns.find(({ field }) => field === "flangeThicknessIn")?.unit;
  for (const field of STOCK_FIELDS) {
    const candidates = layout.columns.filter(
      ({ meanings, index }) => index !== nameAt && meanings.includes(field) && !settled.columns.some((column) => column.index === index),
    );
    const column = candidates.find(({ header }) => !NOTE_WORDS.has(header.toLowerCase())) ?? candidates[0];
    if (column === undefined) continue;
    const unit = stockUnit(field, column, rows, decimal, thickness, system);
    if ("unit" in unit) {
      found.push({ index: column.index, header: column.header, field, unit: unit.unit });
      if (unit.remark !== null) remarks.push(unit.remark);
    } else if (unit.stop) {
      issues.push({
        file,
        line: layout.headerLine,
        field: `column ${column.index + 1} "${column.header}"`,
        problem: unit.problem,
        allowed: `--units "${column.header}=UNIT", or --map unread="${column.header}" to leave it aside`,
      });
    } else remarks.push(`column "${column.header}": ${unit.problem}; left unread (--units "${column.header}=money/lb" would read it)`);
  }
  if (issues.length > 0) throw new InputError(issues);
  return found;
}

type StockUnit = { readonly unit: Unit; readonly remark: string | null } | { readonly problem: string; readonly stop: boolean };

function stockUnit(
  field: Field,
  column: HeaderColumn,
  rows: readonly ListRow[],
  decimal: Decimal,
  thickness: Unit | undefined,
  system: "us" | "metric" | null,
): StockUnit {
  const quantity = QUANTITY[field];
  if (quantity === "text" || quantity === "number") return { unit: UNITS_TRIED[quantity][0], remark: null };
  const { unit, figures } = sampledColumn(column, rows, decimal);
  if (unit !== null && unit.quantity === quantity) return { unit, remark: null };
  const known = figures.filter((figure) => !Number.isNaN(figure));
  const fits = (one: Unit, least: number, most: number): boolean =>
    known.filter((figure) => figure * one.factor >= least && figure * one.factor <= most).length >= 0.7 * known.length;
  if (field === "yieldStressKsi") {
    const fitting = UNITS_TRIED.stress.filter((one) => fits(one, 20, 70));
    if (known.length === 0 || fitting.length === 1) return { unit: fitting[0] ?? UNITS_TRIED.stress[0], remark: null };
    return { problem: "no unit is given and the figures fit none of ksi, psi and MPa", stop: true };
  }
  if (field === "pricePerLb") return { problem: "no unit is given, such as $/lb or EUR/kg", stop: false };
  if (field === "flangeLossIn" || field === "webLossIn") {
    if (thickness === undefined || (known.length > 0 && !fits(thickness, 0.001, 1.5)))
      return { problem: "no unit is given and that of the flange thickness does not fit", stop: true };
    return { unit: thickness, remark: `column "${column.header}" gives no unit; read in ${thickness.name}, as the flange thickness` };
  }
  const feet = readUnit("ft");
  const written = rows.map(({ cells }) => plainCell(cells[column.index] ?? "")).filter((text) => !saysNothing(text));
  if (feet !== null && written.length > 0 && written.filter((text) => readFeetAndInches(text) !== null).length > written.length / 2)
    return { unit: feet, remark: null };
  const tried = ["ft", "in", "m", "mm"].flatMap((name) => readUnit(name) ?? []);
  const side = system ?? (thickness?.system === "us" ? "us" : "metric");
  const fitting = tried.filter((one) => one.system === side && fits(one, 12 * 8, 12 * 130));
  if (fitting.length !== 1) return { problem: "no unit is given and the lengths do not tell it", stop: true };
  return {
    unit: fitting[0],
    remark: `column "${column.header}" gives no unit; read in ${fitting[0].name}, as the lengths and the other columns suggest`,
  };
}
