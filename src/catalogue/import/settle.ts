import { InputError, type InputIssue } from "../../errors.js";
import { expectedOrNull, filletOfAreaIn, largestFilletIn, type Plates } from "./expected.js";
import { DIMENSIONS, type Dimension, type Field, isDimension, isProperty, type Property, QUANTITY } from "./fields.js";
import type { HeaderColumn } from "./layout.js";
import { type Quantity, UNITS_TRIED, type Unit } from "./units.js";

/** A column with the figures of the sample's rows, in its own unit; NaN for none. */
export interface SampledColumn extends HeaderColumn {
  readonly figures: readonly number[];
  /** Whether it writes common fractions. */
  readonly fractions: boolean;
}

/** What a column was found to hold. */
export interface SettledColumn {
  readonly index: number;
  readonly header: string;
  readonly field: Field;
  readonly unit: Unit;
}

/** What the figures of the sample settle. */
export interface Settled {
  readonly columns: readonly SettledColumn[];
  /** Columns that hold a field a second time, in other units or as fractions. */
  readonly twins: readonly SettledColumn[];
  /** Headers that may mean something and whose figures fit nothing. */
  readonly unread: readonly string[];
}

/** How far the middle of a column's figures may lie from what the dimensions make of them, as a fraction. */
const FIT = 0.12;
const FIT_OF: Partial<Record<Property, number>> = { areaIn2: 0.08, weightPlf: 0.08, torsionJIn4: 0.18, warpingCwIn6: 0.15 };
/** The same where a column may hold one of several properties, and by how much the next must be farther off. */
const FIT_OF_SEVERAL = 0.06;
const APART = 0.04;
const READINGS = 4096;
/** A difference in fit, as a fraction, that settles which of two like columns is read. */
const CLOSER = 0.003;
/** Rows below which a column that fits nothing is not called misunderstood, if its header says all. */
const FEW = 5;

/** Sizes of rolled shapes, in, for the choice of a unit. Source: common practice (100 mm to 1,100 mm deep, and some to spare). */
const SIZES: Readonly<Record<Dimension, readonly [least: number, most: number]>> = {
  depthIn: [2.9, 52],
  flangeWidthIn: [1.4, 26],
  webThicknessIn: [0.09, 6],
  flangeThicknessIn: [0.1, 7],
};

interface Reading {
  readonly dimensions: Readonly<Record<Dimension, { readonly column: SampledColumn; readonly unit: Unit }>>;
  /** Middle figure of each dimension, in. */
  readonly middles: readonly number[];
  readonly fillet: SettledColumn | null;
  readonly properties: readonly SettledColumn[];
  readonly twins: readonly SettledColumn[];
  readonly unread: readonly SampledColumn[];
  readonly faults: readonly InputIssue[];
  readonly score: number;
  /** How far the properties lie from what the dimensions make of them, as a fraction: the mean over the columns of their middle rows. */
  readonly off: number;
}

/** What the sample is read with. */
export interface SettleInput {
  readonly columns: readonly SampledColumn[];
  /** Names of the sample's rows; the weight in them (`W30X116`) tells inches from centimetres. */
  readonly names: readonly string[];
  readonly system: "us" | "metric" | null;
  readonly file: string;
  readonly headerLine: number;
}

/**
 * Settles what each column holds and in which unit, by figures: dimensions against area, weight, inertias and moduli.
 *
 * Every reading the headers leave open is tried. The one that contradicts nothing and explains most is taken; where two explain as much with
 * other dimensions, or none fits, nothing is guessed.
 *
 * @throws {InputError} naming the columns left open or contradicted, and what to pass
 */
export function settle(input: SettleInput): Settled {
  const readings = readingsOf(input, false);
  const usable = readings.some(({ faults }) => faults.length === 0) ? readings : [...readings, ...readingsOf(input, true)];
  const best = bestOf(usable);
  if (best === null) throw noneFits(input);
  if (best.faults.length > 0) throw new InputError(best.faults);
  const rivals = usable.filter((other) => other.faults.length === 0 && other.score >= best.score && !sameFigures(other, best));
  if (rivals.length > 0) throw twoFit(input, best, rivals[0]);
  const dimensions = DIMENSIONS.map((field) => settled(best.dimensions[field].column, field, best.dimensions[field].unit));
  return {
    columns: [...dimensions, ...(best.fillet === null ? [] : [best.fillet]), ...best.properties],
    twins: best.twins,
    unread: best.unread.map(({ header }) => header),
  };
}

const isFillet = (field: Field): boolean => field === "kDesignIn" || field === "filletRadiusIn";
const settled = ({ index, header }: HeaderColumn, field: Field, unit: Unit): SettledColumn => ({ index, header, field, unit });

function bestOf(readings: readonly Reading[]): Reading | null {
  let best: Reading | null = null;
  for (const reading of readings) if (best === null || better(reading, best)) best = reading;
  return best;
}

function better(a: Reading, b: Reading): boolean {
  // Of two depths, one nominal, the one with decimals, or that the properties follow from.
  const closer = Math.abs(a.off - b.off) > CLOSER ? a.off - b.off : 0;
  const order = [
    a.faults.length - b.faults.length,
    b.score - a.score,
    coarseness(a) - coarseness(b),
    closer,
    awkwardness(a) - awkwardness(b),
  ];
  return (order.find((difference) => difference !== 0) ?? 0) < 0;
}

/** Dimensions read from columns of whole numbers, as nominal depths are. */
function coarseness({ dimensions }: Reading): number {
  return DIMENSIONS.filter((field) => dimensions[field].column.figures.every((figure) => Number.isNaN(figure) || Number.isInteger(figure)))
    .length;
}

/** Of readings with the same figures: decimals before fractions, columns that stand together, those to the left. */
function awkwardness({ dimensions }: Reading): number {
  const columns = DIMENSIONS.map((field) => dimensions[field].column);
  const places = columns.map(({ index }) => index);
  const units = new Set(DIMENSIONS.map((field) => dimensions[field].unit.name)).size;
  const fractions = columns.filter((column) => column.fractions).length;
  return units * 1e6 + fractions * 1e4 + (Math.max(...places) - Math.min(...places)) * 10 + Math.min(...places) / 1000;
}

function sameFigures(a: Reading, b: Reading): boolean {
  return a.middles.every((middle, index) => Math.abs(middle / b.middles[index] - 1) < 0.03);
}

function unitsFor(column: HeaderColumn, quantity: Quantity, system: SettleInput["system"]): readonly Unit[] {
  if (column.unit !== null && column.unit.quantity === quantity) {
    const overruled = system !== null && !column.unitForced && column.unit.system !== system && column.unit.system !== "none";
    if (!overruled) return [column.unit];
  }
  return UNITS_TRIED[quantity].filter((unit) => system === null || unit.system === system || unit.system === "none");
}

/** Every choice of columns and units for the four dimensions, followed through; `mixed` for units that differ from column to column. */
function readingsOf(input: SettleInput, mixed: boolean): Reading[] {
  const options = DIMENSIONS.map((field) => input.columns.filter(({ meanings }) => meanings.includes(field)));
  const readings: Reading[] = [];
  for (const columns of product(options)) {
    if (new Set(columns).size < columns.length || readings.length > READINGS) continue;
    const open = columns.some((column) => unitsFor(column, "length", input.system).length > 1);
    const choices = columns.map((column) => unitsFor(column, "length", input.system));
    const combinations: readonly (readonly Unit[])[] =
      mixed || !open
        ? product(choices)
        : UNITS_TRIED.length
            .map((unit) => choices.map((known) => (known.length === 1 ? known[0] : unit)))
            .filter((units) => units.every((unit, index) => choices[index].includes(unit)));
    for (const units of combinations) {
      const reading = follow(input, columns, units);
      if (reading !== null) readings.push(reading);
    }
  }
  return readings;
}

function product<T>(options: readonly (readonly T[])[]): T[][] {
  return options.reduce<T[][]>((before, next) => before.flatMap((chosen) => next.map((one) => [...chosen, one])).slice(0, READINGS), [[]]);
}

const median = (values: readonly number[]): number => {
  const known = values.filter((value) => !Number.isNaN(value)).sort((a, b) => a - b);
  return known.length === 0 ? Number.NaN : known[Math.floor((known.length - 1) / 2)];
};

/** One reading of the dimensions, and what it makes of every other column; null where the sizes are not those of rolled shapes. */
function follow(input: SettleInput, columns: readonly SampledColumn[], units: readonly Unit[]): Reading | null {
  const inches = columns.map(({ figures }, at) => figures.map((figure) => figure * units[at].factor));
  const rows = inches[0].map((_, row) => inches.map((column) => column[row]));
  const given = rows.filter((row) => row.every((figure) => figure > 0)).length;
  const stated = columns.every((column) => column.unitForced || unitsFor(column, "length", input.system).length === 1);
  const plates = rows.map((row) =>
    row.every((figure, at) => figure >= SIZES[DIMENSIONS[at]][0] && figure <= SIZES[DIMENSIONS[at]][1]) ? row : null,
  );
  const fillets = filletsOf(input, columns, units, plates);
  const sharp = expectedRows(plates, fillets.radii);
  const expected = fillets.column === null ? withFilletsOfArea(input, plates, sharp) : sharp;
  const sound = expected.filter((one) => one !== null).length;
  if (given > 0 && sound < given / 2 && !(stated && sound > 0)) return null;
  if (given === 0 || sound === 0) return null;

  const taken = new Set<SampledColumn>([...columns, ...(fillets.column === null ? [] : [fillets.column])]);
  const properties: SettledColumn[] = [];
  const twins: SettledColumn[] = [];
  const unread: SampledColumn[] = [];
  const misfits: { column: SampledColumn; fits: readonly Unit[] }[] = [];
  const offs: number[] = [];
  let score = 0;
  for (const column of input.columns) {
    if (taken.has(column) || column.figures.every((figure) => Number.isNaN(figure))) continue;
    const found = explain(column, expected, input.system);
    if (found !== null) {
      score++;
      const off = isProperty(found.field) ? offMiddle(column, found.field, found.unit, expected) : Number.NaN;
      if (!Number.isNaN(off)) offs.push(off);
      if (properties.some(({ field }) => field === found.field)) twins.push(found);
      else properties.push(found);
      continue;
    }
    const twin = twinOf(column, inches, input.system);
    if (twin !== null) twins.push(twin);
    else if (column.meanings.some(isProperty) && !column.meanings.some(isDimension))
      misfits.push({ column, fits: fitsOtherwise(column, expected) });
    else if (column.meanings.some(isDimension)) unread.push(column);
    else if (column.meanings.some(isFillet)) {
      const again = filletTwin(column, fillets, plates, input.system);
      if (again !== null) twins.push(again);
      else if (fillets.column === null) misfits.push({ column, fits: [] });
      else unread.push(column);
    }
  }
  const faults: InputIssue[] = [];
  for (const { column, fits } of misfits) {
    const others = column.meanings.filter((field) => !properties.some((known) => known.field === field));
    // A column whose field stands elsewhere (a static moment S beside the moduli) contradicts nothing.
    const compared = column.figures.filter((figure, row) => figure > 0 && expected[row] !== null).length;
    if (others.length === 0 || (fits.length === 0 && !others.includes(column.meanings[0]))) unread.push(column);
    else if (fits.length === 0 && column.unit !== null && column.meanings.length === 1 && compared < FEW) {
      // A few rows may all be slips: the header's word stands, and each row is judged by itself.
      properties.push(settled(column, column.meanings[0], column.unit));
    } else faults.push(misfit(input, column, fits));
  }
  if (nameFits(input.names, expected)) score += 0.5;
  return {
    dimensions: Object.fromEntries(
      DIMENSIONS.map((field, at) => [field, { column: columns[at], unit: units[at] }]),
    ) as Reading["dimensions"],
    middles: inches.map(median),
    fillet: fillets.settled,
    properties,
    twins,
    unread,
    faults,
    score,
    off: offs.length === 0 ? 0 : offs.reduce((sum, off) => sum + off, 0) / offs.length,
  };
}

type Expected = Readonly<Record<Property, number>> | null;

function expectedRows(plates: readonly (readonly number[] | null)[], radii: readonly number[]): Expected[] {
  return plates.map((row, at) => (row === null ? null : expectedOrNull(platesOf(row, radii[at]))));
}

const platesOf = ([depthIn, flangeWidthIn, webThicknessIn, flangeThicknessIn]: readonly number[], filletRadiusIn: number): Plates => ({
  depthIn,
  flangeWidthIn,
  webThicknessIn,
  flangeThicknessIn,
  filletRadiusIn,
});

/** Where no column gives the fillets, those that the areas leave room for: they tell elastic from plastic moduli more surely. */
function withFilletsOfArea(
  { columns, system }: SettleInput,
  plates: readonly (readonly number[] | null)[],
  sharp: readonly Expected[],
): readonly Expected[] {
  for (const column of columns) {
    if (!column.meanings.includes("areaIn2")) continue;
    const found = explain(column, sharp, system);
    if (found?.field !== "areaIn2") continue;
    const radii = plates.map((row, at) => {
      const area = column.figures[at] * found.unit.factor;
      return row === null || Number.isNaN(area) ? 0 : filletOfAreaIn(area, platesOf(row, 0));
    });
    return expectedRows(plates, radii);
  }
  return sharp;
}

interface Fillets {
  readonly radii: readonly number[];
  readonly column: SampledColumn | null;
  readonly settled: SettledColumn | null;
}

/** The fillet's radius in each row, in, by a k or a radius in the unit of the flange's thickness where it gives none; 0 where none is told. */
function filletsOf(
  { columns, system }: SettleInput,
  taken: readonly SampledColumn[],
  units: readonly Unit[],
  plates: readonly (readonly number[] | null)[],
): Fillets {
  for (const field of ["kDesignIn", "filletRadiusIn"] as const) {
    for (const column of columns) {
      if (!column.meanings.includes(field) || taken.includes(column)) continue;
      const choices = unitsFor(column, "length", system);
      const unit = choices.length === 1 ? choices[0] : units[3];
      const radii = plates.map((row, at) => column.figures[at] * unit.factor - (field === "kDesignIn" && row !== null ? row[3] : 0));
      const told = radii.filter((radius, at) => plates[at] !== null && !Number.isNaN(radius));
      const sound = radii.filter((radius, at) => {
        const row = plates[at];
        return row !== null && radius > -0.02 * row[3] && radius <= 1.3 * largestFilletIn(row[3]);
      });
      if (told.length === 0 || sound.length < 0.7 * told.length) continue;
      // A bare r is a fillet only where it is no radius of gyration.
      if (column.meanings.length > 1) {
        const sharp = expectedRows(
          plates,
          plates.map(() => 0),
        );
        if (explain(column, sharp, system) !== null) continue;
      }
      return {
        radii: radii.map((radius) => Math.max(0, Number.isNaN(radius) ? 0 : radius)),
        column,
        settled: settled(column, field, unit),
      };
    }
  }
  return { radii: plates.map(() => 0), column: null, settled: null };
}

/** The one property and unit that a column's figures fit; null for none, or for several. */
function explain(
  column: SampledColumn,
  expected: readonly (Readonly<Record<Property, number>> | null)[],
  system: SettleInput["system"],
): SettledColumn | null {
  const fits: { field: Property; unit: Unit; off: number }[] = [];
  const fields = column.meanings.filter(isProperty);
  for (const field of fields) {
    for (const unit of unitsFor(column, QUANTITY[field], system)) {
      fits.push({ field, unit, off: offMiddle(column, field, unit, expected) });
    }
  }
  fits.sort((a, b) => a.off - b.off);
  const [first, second] = fits;
  if (first === undefined || Number.isNaN(first.off)) return null;
  if (column.unitForced && fields.length === 1) return settled(column, first.field, first.unit);
  const several = fields.length > 1;
  if (!(first.off <= (several ? FIT_OF_SEVERAL : (FIT_OF[first.field] ?? FIT)))) return null;
  if (second !== undefined && second.off - first.off < APART) return null;
  return settled(column, first.field, first.unit);
}

/** Middle distance of a column's figures from what the dimensions make of the field, as a fraction; NaN without a row to compare. */
function offMiddle(
  column: SampledColumn,
  field: Property,
  unit: Unit,
  expected: readonly (Readonly<Record<Property, number>> | null)[],
): number {
  return median(
    column.figures.map((figure, row) => {
      const one = expected[row];
      return one === null || one === undefined || !(figure > 0) ? Number.NaN : Math.abs(Math.log((figure * unit.factor) / one[field]));
    }),
  );
}

/** Units in which a column that contradicts its header would fit. */
function fitsOtherwise(column: SampledColumn, expected: readonly (Readonly<Record<Property, number>> | null)[]): readonly Unit[] {
  return column.meanings
    .filter(isProperty)
    .flatMap((field) => UNITS_TRIED[QUANTITY[field]].filter((unit) => offMiddle(column, field, unit, expected) <= FIT));
}

/** A column that holds one of the dimensions again, as in a second block of units. */
function twinOf(column: SampledColumn, inches: readonly (readonly number[])[], system: SettleInput["system"]): SettledColumn | null {
  for (const [at, field] of DIMENSIONS.entries()) {
    if (!column.meanings.includes(field)) continue;
    for (const unit of unitsFor(column, "length", system)) {
      const off = median(column.figures.map((figure, row) => Math.abs(Math.log((figure * unit.factor) / inches[at][row]))));
      if (off < 0.05) return settled(column, field, unit);
    }
  }
  return null;
}

/** A column that gives k, or the fillet's radius, again. */
function filletTwin(
  column: SampledColumn,
  { radii, settled: first }: Fillets,
  plates: readonly (readonly number[] | null)[],
  system: SettleInput["system"],
): SettledColumn | null {
  const field = column.meanings.find(isFillet);
  if (first === null || field !== first.field) return null;
  const before = radii.map((radius, row) => radius + (field === "kDesignIn" ? (plates[row]?.[3] ?? Number.NaN) : 0));
  for (const unit of unitsFor(column, "length", system)) {
    const off = median(column.figures.map((figure, row) => Math.abs(Math.log((figure * unit.factor) / before[row]))));
    if (off < 0.05) return settled(column, field, unit);
  }
  return null;
}

/** Whether the last number of the names is the weight, in lb/ft or kg/m, that the dimensions make. */
function nameFits(names: readonly string[], expected: readonly (Readonly<Record<Property, number>> | null)[]): boolean {
  return UNITS_TRIED.weight
    .filter(({ name }) => name === "lb/ft" || name === "kg/m")
    .some(({ factor }) => {
      const off = names.map((name, row) => {
        const weight = /\d\s*(?:x|×|\*|wf|[a-z]+)\s*(\d+(?:\.\d+)?)$/i.exec(name.trim());
        const one = expected[row];
        return weight === null || one === null || one === undefined
          ? Number.NaN
          : Math.abs(Math.log((Number(weight[1]) * factor) / one.weightPlf));
      });
      return median(off) < 0.05 && off.filter((value) => !Number.isNaN(value)).length >= 0.6 * names.length;
    });
}

function misfit({ file, headerLine }: SettleInput, column: SampledColumn, fits: readonly Unit[]): InputIssue {
  const field = column.meanings[0];
  const several = column.unit !== null && fits.some(({ name }) => name === column.unit?.name);
  if (several || new Set(fits.map(({ name }) => name)).size < fits.length) {
    return {
      file,
      line: headerLine,
      field: `column ${column.index + 1} "${column.header}"`,
      problem: `it may be ${column.meanings.filter(isProperty).join(" or ")}, and the figures do not tell which`,
      allowed: `--map ${field}="${column.header}", or --map unread="${column.header}" to leave it aside`,
    };
  }
  const said = column.unit === null ? "no unit fits closely" : `its unit says ${column.unit.name}, and that does not fit`;
  const instead = fits.length === 0 ? "" : `; roughly they would fit ${fits.map(({ name }) => name).join(" or ")}`;
  const unit = fits[0]?.name ?? "UNIT";
  return {
    file,
    line: headerLine,
    field: `column ${column.index + 1} "${column.header}"`,
    problem: `its figures do not fit the dimensions: ${said}${instead}`,
    allowed: `--units "${column.header}=${unit}", --map NAME="${column.header}", or --map unread="${column.header}" to leave ${field} aside`,
  };
}

function columnsText(reading: Reading): string {
  return DIMENSIONS.map((field) => `${reading.dimensions[field].column.header} as ${field} in ${reading.dimensions[field].unit.name}`).join(
    ", ",
  );
}

function twoFit({ file, headerLine }: SettleInput, one: Reading, other: Reading): InputError {
  return new InputError([
    {
      file,
      line: headerLine,
      field: "units",
      problem: `two readings fit the figures: ${columnsText(one)}; or ${columnsText(other)}`,
      allowed: "--units us, --units metric, --units COLUMN=UNIT (such as depthIn=mm), or --map NAME=HEADER, to say which",
    },
  ]);
}

function noneFits({ file, headerLine, columns }: SettleInput): InputError {
  const names = DIMENSIONS.map((field) =>
    columns
      .filter(({ meanings }) => meanings.includes(field))
      .map(({ header }) => `"${header}"`)
      .join(" or "),
  );
  return new InputError([
    {
      file,
      line: headerLine,
      field: "units",
      problem: `no reading fits: ${DIMENSIONS.map((field, at) => `${names[at]} as ${field}`).join(", ")} make no rolled I-shapes in in, mm or cm`,
      allowed: "figures of rolled I-shapes; --units COLUMN=UNIT or --map NAME=HEADER where a column was misunderstood",
    },
  ]);
}
