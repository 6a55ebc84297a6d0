import { IN_PER_FT } from "../../units.js";
import { COLUMNS, STOCK_COLUMNS, YIELD_COLUMN } from "../columns.js";
import type { Shape, ShapeFigures, Stock } from "../shape.js";
import { readText } from "../text-cells.js";
import { areaOfPlates, expectedOf, filletOfAreaIn, largestFilletIn, PLF_PER_IN2, type Plates } from "./expected.js";
import { familyOf } from "./families.js";
import { DIMENSIONS, type Dimension, type Field, PROPERTIES, type Property, QUANTITY, STOCK_FIELDS } from "./fields.js";
import { type Figure, plainCell, readCell, saysNothing } from "./figures.js";
import { readFeetAndInches, readPieces } from "./stock-cells.js";
import type { ListReading, ReadColumn } from "./survey.js";
import { readUnit } from "./units.js";

/** A row's verdict: a shape with what was derived and what looks odd, or why it is refused. */
export type Verdict =
  | {
      readonly accepted: true;
      readonly shape: Shape;
      readonly derived: readonly (keyof ShapeFigures)[];
      readonly warnings: readonly string[];
    }
  | { readonly accepted: false; readonly reason: string };

/**
 * How far a figure may lie from what it follows from, beyond the rounding of both, as a fraction: up to `near` is silent, up to `far` is
 * warned of, beyond is refused. J and Cw are approximations; Iy takes the cube of a rounded width.
 */
const BY_DIMENSIONS: Readonly<Record<Property, { readonly near: number; readonly far: number }>> = {
  weightPlf: { near: 0.02, far: 0.045 },
  areaIn2: { near: 0.01, far: 0.025 },
  inertiaXIn4: { near: 0.01, far: 0.03 },
  sectionModulusXIn3: { near: 0.01, far: 0.03 },
  radiusXIn: { near: 0.01, far: 0.03 },
  plasticModulusXIn3: { near: 0.01, far: 0.03 },
  inertiaYIn4: { near: 0.015, far: 0.06 },
  sectionModulusYIn3: { near: 0.015, far: 0.06 },
  radiusYIn: { near: 0.01, far: 0.04 },
  plasticModulusYIn3: { near: 0.015, far: 0.06 },
  torsionJIn4: { near: 0.05, far: 0.15 },
  warpingCwIn6: { near: 0.02, far: 0.1 },
  flangeSlenderness: { near: 0.015, far: 0.05 },
  webSlenderness: { near: 0.03, far: 0.1 },
};
/** Tapered flanges are thick where they are narrow: the weak axis and the torsion differ more from parallel plates. */
const TAPERED_TIMES = 4;
const OF_WEAK_AXIS = new Set<Property>([
  "inertiaYIn4",
  "sectionModulusYIn3",
  "radiusYIn",
  "plasticModulusYIn3",
  "torsionJIn4",
  "warpingCwIn6",
]);
/** The same for figures that follow from one another, such as S = 2 I / d: only rounding stands between them. */
const BY_EACH_OTHER = { near: 0.006, far: 0.016 } as const;

/** The same for the share of the area that fillets take, beyond what is usual in the list. */
const FILLET_SHARE_OF_AREA = { near: 0.008, far: 0.022 } as const;
const FILLET_SHARE_OF_WEIGHT = { near: 0.018, far: 0.035 } as const;

/** Words by which reasons and warnings name a field. */
export const SYMBOLS: Readonly<Record<Field, string>> = {
  designation: "name",
  weightPlf: "weight",
  areaIn2: "A",
  depthIn: "d",
  flangeWidthIn: "bf",
  webThicknessIn: "tw",
  flangeThicknessIn: "tf",
  kDesignIn: "k",
  filletRadiusIn: "fillet radius",
  inertiaXIn4: "Ix",
  sectionModulusXIn3: "Sx",
  radiusXIn: "rx",
  plasticModulusXIn3: "Zx",
  inertiaYIn4: "Iy",
  sectionModulusYIn3: "Sy",
  radiusYIn: "ry",
  plasticModulusYIn3: "Zy",
  torsionJIn4: "J",
  warpingCwIn6: "Cw",
  flangeSlenderness: "bf/2tf",
  webSlenderness: "h/tw",
  yieldStressKsi: "yield stress",
  yearBuilt: "year built",
  quantity: "quantity",
  usableLengthFt: "usable length",
  pricePerLb: "price",
  place: "place",
  flangeLossIn: "flange loss",
  webLossIn: "web loss",
};

/** A figure of a row in our unit, with half its last place and the text it was read from. */
interface Given {
  readonly value: number;
  /** As the cell writes it; null for one that is exact, such as a number of pieces. */
  readonly figure: Figure | null;
  /** Turns the cell's figure into ours. */
  readonly factor: number;
  readonly text: string;
  readonly column: ReadColumn;
}

/** Where a fillet that no column gives was taken from. */
type DerivedFillet = "area" | "weight" | "none";

type GivenFigures = Partial<Record<Field, Given>>;

class Refusal {
  constructor(readonly reason: string) {}
}

/**
 * Judges one row: reads its cells, derives what is missing, compares what is given with what dimensions make.
 *
 * @param cells the row's cells
 * @param line its line in the file
 * @param reading how the list is read
 */
export function judgeRow(cells: readonly string[], line: number, reading: ListReading): Verdict {
  try {
    return accept(cells, line, reading);
  } catch (error) {
    if (error instanceof Refusal) return { accepted: false, reason: error.reason };
    throw error;
  }
}

function accept(cells: readonly string[], line: number, reading: ListReading): Verdict {
  const designation = nameOf(cells, reading);
  const { refused, tapered } = familyOf(designation);
  if (refused !== null) throw new Refusal(refused);
  const width = reading.layout.headerCells.length;
  if (cells.length > width) {
    throw new Refusal(`${cells.length} cells where the header has ${width}: a separator too many, or a comma within a number`);
  }
  const given = givenFigures(cells, reading);
  const missing = DIMENSIONS.filter((field) => given[field] === undefined);
  if (missing.length > 0) throw new Refusal(`no figure for ${missing.map((field) => SYMBOLS[field]).join(", ")}; it cannot be derived`);
  demandPlates(given);
  const { plates, derivedFillet } = platesOf(given);
  const expected = demandShape(plates);
  const warnings = compare(given, plates, expected, derivedFillet, tapered);
  warnings.push(...compareFilletShare(given, plates, derivedFillet, reading));
  warnings.push(...compareTwins(cells, given, reading));
  const { figures, derived } = complete(given, plates, expected, derivedFillet);
  for (const { name, min, max } of COLUMNS) {
    if (!(figures[name] >= min && figures[name] <= max)) {
      throw new Refusal(`${SYMBOLS[name]} ${short(figures[name])} ${unitWord(name)} is not that of a rolled shape (${min} to ${max})`);
    }
  }
  const shape: Shape = {
    designation,
    ...figures,
    yieldStressKsi: given.yieldStressKsi?.value ?? null,
    stock: stockOf(cells, given, reading),
    source: { file: reading.file, line },
    bundled: false,
  };
  return { accepted: true, shape, derived, warnings };
}

function nameOf(cells: readonly string[], { nameAt }: ListReading): string {
  const name = plainText(cells[nameAt] ?? "");
  if (saysNothing(name)) throw new Refusal("no name");
  if (name.length > 60) throw new Refusal(`a name of ${name.length} characters; at most 60 are allowed`);
  return name;
}

/** A text cell on one line, the apostrophe taken off that keeps a spreadsheet from running it. */
function plainText(cell: string): string {
  return readText(plainCell(cell).replace(/\s+/g, " ").trim());
}

function givenFigures(cells: readonly string[], reading: ListReading): GivenFigures {
  const given: GivenFigures = {};
  for (const column of reading.columns.values()) {
    if (column.field === "place") continue;
    const found = readGiven(cells[column.index] ?? "", column, reading);
    if (found !== null) given[column.field] = found;
  }
  return given;
}

/** One cell in our unit; null for a blank one. Zero is a figure of the stock, and a blank of a property. */
function readGiven(raw: string, column: ReadColumn, { decimal }: ListReading): Given | null {
  const text = plainCell(raw);
  const { field, unit } = column;
  const stock = (STOCK_FIELDS as readonly string[]).includes(field);
  const scale = field === "usableLengthFt" ? 1 / IN_PER_FT : 1;
  if (field === "usableLengthFt") {
    const inches = readFeetAndInches(text);
    if (inches !== null) return { value: inches * scale, figure: null, factor: scale, text, column };
  }
  if (field === "quantity") {
    const pieces = readPieces(text);
    if (pieces !== null) return { value: pieces, figure: null, factor: 1, text, column };
  }
  const cell = readCell(text, decimal);
  if (cell.kind === "blank") return null;
  if (cell.kind === "unreadable")
    throw new Refusal(
      `${SYMBOLS[field]} "${shortText(text)}" is not a number as this list writes them (decimals by ${decimal === "." ? "point" : "comma"})`,
    );
  const { figure } = cell;
  if (figure.value === 0 && !stock) return null;
  let factor = unit.factor;
  if (figure.suffix !== "") {
    const own = readUnit(figure.suffix);
    if (own === null || own.quantity !== QUANTITY[field]) throw new Refusal(`${SYMBOLS[field]} "${shortText(text)}" is not a number alone`);
    factor = own.factor;
  }
  return { value: figure.value * factor * scale, figure, factor: factor * scale, text, column };
}

/** Half the last place of a given figure, in our unit. */
const halfPlace = ({ figure, factor, column }: Given): number => (figure === null ? 0 : halfOf(figure, column) * factor);

/**
 * Half the last place a figure stands for, in the column's own unit.
 *
 * A spreadsheet drops trailing zeros (18 for 18.0), so the column's own habit counts: its most digits, and its most decimals.
 */
function halfOf({ value, decimals, denominator }: Figure, { precision }: ReadColumn): number {
  if (denominator !== null) return 0.5 / Math.max(denominator, precision.denominator ?? 1);
  const own = 10 ** -decimals;
  const byDigits = 10 ** (Math.floor(Math.log10(Math.max(value, 1e-9))) + 1 - precision.digits);
  const byDecimals = 10 ** -precision.decimals;
  return Math.min(own, Math.max(byDigits, byDecimals)) / 2;
}

function demandPlates(given: GivenFigures): void {
  const d = figureOf(given, "depthIn");
  const bf = figureOf(given, "flangeWidthIn");
  const tw = figureOf(given, "webThicknessIn");
  const tf = figureOf(given, "flangeThicknessIn");
  const text = (field: Dimension): string => `${SYMBOLS[field]} ${given[field]?.text}`;
  if (2 * tf >= d) throw new Refusal(`impossible plates: 2 tf >= d (${text("flangeThicknessIn")}, ${text("depthIn")})`);
  if (tw >= bf) throw new Refusal(`impossible plates: tw >= bf (${text("webThicknessIn")}, ${text("flangeWidthIn")})`);
  const k = given.kDesignIn;
  if (
    k !== undefined &&
    k.value < tf &&
    k.value + halfPlace(k) < tf - (given.flangeThicknessIn === undefined ? 0 : halfPlace(given.flangeThicknessIn))
  ) {
    throw new Refusal(`impossible plates: k ${k.text} is less than ${text("flangeThicknessIn")}`);
  }
  const r = given.filletRadiusIn;
  const radius = r?.value ?? (k === undefined ? 0 : k.value - tf);
  if (radius > 1.5 * largestFilletIn(tf)) {
    throw new Refusal(`${r === undefined ? `k ${k?.text}` : `fillet radius ${r.text}`} is too large for ${text("flangeThicknessIn")}`);
  }
}

function figureOf(given: GivenFigures, field: Field): number {
  const found = given[field];
  if (found === undefined) throw new RangeError(`${field} must be given`);
  return found.value;
}

/** The row's plates; a fillet nobody tells is taken from what the area, or the weight, leaves for it. */
function platesOf(given: GivenFigures): { readonly plates: Plates; readonly derivedFillet: DerivedFillet | null } {
  const tf = figureOf(given, "flangeThicknessIn");
  const sharp: Plates = {
    depthIn: figureOf(given, "depthIn"),
    flangeWidthIn: figureOf(given, "flangeWidthIn"),
    webThicknessIn: figureOf(given, "webThicknessIn"),
    flangeThicknessIn: tf,
    filletRadiusIn: 0,
  };
  const k = given.kDesignIn?.value;
  const radius = given.filletRadiusIn?.value;
  if (k !== undefined) return { plates: { ...sharp, filletRadiusIn: Math.max(0, k - tf) }, derivedFillet: null };
  if (radius !== undefined) return { plates: { ...sharp, filletRadiusIn: radius }, derivedFillet: null };
  const area = given.areaIn2?.value;
  const weight = given.weightPlf?.value;
  if (area !== undefined) return { plates: { ...sharp, filletRadiusIn: filletOfAreaIn(area, sharp) }, derivedFillet: "area" };
  if (weight !== undefined)
    return { plates: { ...sharp, filletRadiusIn: filletOfAreaIn(weight / PLF_PER_IN2, sharp) }, derivedFillet: "weight" };
  return { plates: sharp, derivedFillet: "none" };
}

function demandShape(plates: Plates): Readonly<Record<Property, number>> {
  try {
    return expectedOf(plates);
  } catch (error) {
    if (error instanceof RangeError) throw new Refusal(`impossible plates: ${error.message}`);
    throw error;
  }
}

/** Compares what is given with dimensions and with itself; throws a refusal, or returns warnings. */
function compare(
  given: GivenFigures,
  plates: Plates,
  expected: Readonly<Record<Property, number>>,
  derivedFillet: DerivedFillet | null,
  tapered: boolean,
): string[] {
  const far: string[] = [];
  const near: string[] = [];
  const note = (
    excess: number,
    limits: { readonly near: number; readonly far: number },
    field: Property,
    by: string,
    should: number,
  ): void => {
    if (!(excess > limits.near)) return;
    const figure = given[field];
    if (figure === undefined) return;
    const own = should / figure.column.unit.factor;
    const off = `${short(100 * Math.abs(figure.value / should - 1))} % off`;
    (excess > limits.far ? far : near).push(`${SYMBOLS[field]} ${figure.text} should be about ${short(own)} by ${by}, ${off}`);
  };
  for (const { field, by, should, rounding } of identities(given)) {
    const figure = given[field];
    if (figure === undefined) continue;
    const limits = field === "weightPlf" ? BY_DIMENSIONS.weightPlf : BY_EACH_OTHER;
    const off = Math.abs(figure.value / should - 1);
    if (off > limits.near) note(off - rounding() - roundingOf(figure), limits, field, by, should);
  }
  let slopes: Readonly<Record<Property, number>> | null = null;
  for (const field of PROPERTIES) {
    const figure = given[field];
    if (figure === undefined || (field === "weightPlf" && given.areaIn2 !== undefined)) continue;
    const times = !tapered ? 1 : OF_WEAK_AXIS.has(field) ? TAPERED_TIMES : TAPERED_TIMES / 2;
    const limits = { near: BY_DIMENSIONS[field].near * times, far: BY_DIMENSIONS[field].far * times };
    const off = Math.abs(figure.value / expected[field] - 1);
    if (!(off > limits.near)) continue;
    slopes ??= allowances(given, plates, expected, derivedFillet);
    note(off - slopes[field] - roundingOf(figure), limits, field, "the dimensions", expected[field]);
  }
  if (far.length > 0)
    throw new Refusal(`figures far apart: ${far.slice(0, 4).join("; ")}${far.length > 4 ? `; and ${far.length - 4} more` : ""}`);
  return near;
}

/**
 * Where the fillet is taken from the area, a slip in a plate would hide in it: so the share of the area it takes must be like that of the
 * list's other rows.
 */
function compareFilletShare(given: GivenFigures, plates: Plates, from: DerivedFillet | null, { filletShare }: ListReading): string[] {
  const figure = from === "area" ? given.areaIn2 : from === "weight" ? given.weightPlf : undefined;
  if (figure === undefined || filletShare === null) return [];
  const area = from === "area" ? figure.value : figure.value / PLF_PER_IN2;
  const share = 1 - areaOfPlates(plates) / area;
  const off = Math.max(share - filletShare.most, filletShare.least - share);
  const limits = from === "area" ? FILLET_SHARE_OF_AREA : FILLET_SHARE_OF_WEIGHT;
  if (!(off > limits.near)) return [];
  const excess = off - roundingOf(figure) - roundingOfPlates(given, plates) / area;
  if (!(excess > limits.near)) return [];
  const field = figure.column.field;
  const text = `${SYMBOLS[field]} ${figure.text} leaves ${short(100 * share)} % for the fillets, in this list it is ${short(100 * filletShare.least)} to ${short(100 * filletShare.most)} %`;
  if (excess > limits.far) throw new Refusal(`figures far apart: ${text}; a slip in it, d, bf, tw or tf`);
  return [text];
}

/** What rounding of the dimensions may do to the area of the plates, in2. */
function roundingOfPlates(
  given: GivenFigures,
  { depthIn: d, flangeWidthIn: bf, webThicknessIn: tw, flangeThicknessIn: tf }: Plates,
): number {
  const half = (field: Dimension): number => {
    const figure = given[field];
    return figure === undefined ? 0 : halfPlace(figure);
  };
  return (
    tw * half("depthIn") +
    2 * tf * half("flangeWidthIn") +
    (d - 2 * tf) * half("webThicknessIn") +
    2 * (bf - tw) * half("flangeThicknessIn")
  );
}

/** Half the last place as a fraction; three printed digits are never taken to say more. */
function roundingOf(given: Given): number {
  const thirdDigit = 10 ** (Math.floor(Math.log10(given.value)) - 2) / 2;
  return Math.max(halfPlace(given), thirdDigit) / given.value;
}

/** A figure that follows from other given ones, and the rounding these bring with them, as a fraction. */
interface Identity {
  readonly field: Property;
  readonly by: string;
  readonly should: number;
  readonly rounding: () => number;
}

/** Figures that follow from other given ones. Source: statics. */
function identities(given: GivenFigures): Identity[] {
  const { areaIn2: A, inertiaXIn4: Ix, inertiaYIn4: Iy, depthIn: d, flangeWidthIn: bf } = given;
  const exact = (one: Given): number => halfPlace(one) / one.value;
  const found: Identity[] = [];
  if (A !== undefined) found.push({ field: "weightPlf", by: "A", should: A.value * PLF_PER_IN2, rounding: () => roundingOf(A) });
  for (const [I, width, modulus, radius, by] of [
    [Ix, d, "sectionModulusXIn3", "radiusXIn", ["2 Ix / d", "sqrt(Ix / A)"]],
    [Iy, bf, "sectionModulusYIn3", "radiusYIn", ["2 Iy / bf", "sqrt(Iy / A)"]],
  ] as const) {
    if (I === undefined) continue;
    if (width !== undefined) {
      found.push({ field: modulus, by: by[0], should: (2 * I.value) / width.value, rounding: () => roundingOf(I) + exact(width) });
    }
    if (A !== undefined) {
      found.push({ field: radius, by: by[1], should: Math.sqrt(I.value / A.value), rounding: () => (roundingOf(I) + roundingOf(A)) / 2 });
    }
  }
  return found;
}

/** How far a fillet taken from the area (within 1 %), from the weight (within 2 %) or from nothing may be off, in. */
function filletDoubtIn({ filletRadiusIn: r, flangeThicknessIn }: Plates, areaIn2: number, from: DerivedFillet): number {
  if (from === "none") return largestFilletIn(flangeThicknessIn);
  const doubt = (from === "area" ? 0.01 : 0.02) * areaIn2;
  return Math.sqrt(r ** 2 + doubt / (4 - Math.PI)) - r;
}

/** What rounding of the dimensions may do to each property, as a fraction: each dimension turned up by half its last place in turn. */
function allowances(
  given: GivenFigures,
  plates: Plates,
  expected: Readonly<Record<Property, number>>,
  derivedFillet: DerivedFillet | null,
): Readonly<Record<Property, number>> {
  const sums = Object.fromEntries(PROPERTIES.map((field) => [field, 0])) as Record<Property, number>;
  const half = (field: Field): number => {
    const figure = given[field];
    return figure === undefined ? 0 : halfPlace(figure);
  };
  const filletHalf =
    derivedFillet !== null
      ? filletDoubtIn(plates, expected.areaIn2, derivedFillet)
      : given.kDesignIn === undefined
        ? half("filletRadiusIn")
        : half("kDesignIn") + half("flangeThicknessIn");
  const steps: readonly (readonly [keyof Plates, number])[] = [
    ...DIMENSIONS.map((field) => [field, half(field)] as const),
    ["filletRadiusIn", filletHalf],
  ];
  for (const [name, step] of steps) {
    if (step === 0) continue;
    const turned = turn(plates, name, step);
    if (turned === null) continue;
    for (const field of PROPERTIES) sums[field] += Math.abs(turned[field] / expected[field] - 1);
  }
  return sums;
}

function turn(plates: Plates, name: keyof Plates, step: number): Readonly<Record<Property, number>> | null {
  for (const sign of [1, -1]) {
    try {
      const turned = { ...plates, [name]: plates[name] + sign * step };
      if (turned.filletRadiusIn >= 0) return expectedOf(turned);
    } catch (error) {
      if (!(error instanceof RangeError)) throw error;
    }
  }
  return null;
}

/** Columns that give a figure a second time, in other units: they must say the same. */
function compareTwins(cells: readonly string[], given: GivenFigures, reading: ListReading): string[] {
  const warnings: string[] = [];
  for (const twin of reading.twins) {
    const first = given[twin.field];
    const cell = readCell(plainCell(cells[twin.index] ?? ""), reading.decimal);
    if (first === undefined || cell.kind !== "figure" || cell.figure.value === 0) continue;
    const again = cell.figure.value * twin.unit.factor;
    const rounding = (halfOf(cell.figure, twin) * twin.unit.factor) / again + roundingOf(first);
    if (Math.abs(again / first.value - 1) > rounding + 0.01) {
      warnings.push(
        `${SYMBOLS[twin.field]} ${first.text} is used; column ${twin.index + 1} says ${plainCell(cells[twin.index] ?? "")} ${twin.unit.name}, which is another figure`,
      );
    }
  }
  return warnings;
}

/** Every figure of a shape: what is given as given, the rest from the given figures it follows from, else from the dimensions. */
function complete(
  given: GivenFigures,
  plates: Plates,
  expected: Readonly<Record<Property, number>>,
  derivedFillet: DerivedFillet | null,
): { readonly figures: ShapeFigures; readonly derived: readonly (keyof ShapeFigures)[] } {
  const derived: (keyof ShapeFigures)[] = [];
  const take = (field: keyof ShapeFigures, otherwise: () => number): number => {
    const figure = given[field];
    if (figure !== undefined) return figure.value;
    derived.push(field);
    return otherwise();
  };
  const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf } = plates;
  const Sx = given.sectionModulusXIn3?.value;
  const Sy = given.sectionModulusYIn3?.value;
  const A = take("areaIn2", () => expected.areaIn2);
  const Ix = take("inertiaXIn4", () => (Sx === undefined ? expected.inertiaXIn4 : (Sx * d) / 2));
  const Iy = take("inertiaYIn4", () => (Sy === undefined ? expected.inertiaYIn4 : (Sy * bf) / 2));
  const kGiven = given.kDesignIn?.value;
  if (kGiven === undefined && (given.filletRadiusIn === undefined || derivedFillet !== null)) derived.push("kDesignIn");
  const figures: ShapeFigures = {
    weightPlf: take("weightPlf", () => A * PLF_PER_IN2),
    areaIn2: A,
    depthIn: d,
    flangeWidthIn: bf,
    webThicknessIn: plates.webThicknessIn,
    flangeThicknessIn: tf,
    kDesignIn: kGiven === undefined ? tf + plates.filletRadiusIn : Math.max(kGiven, tf),
    inertiaXIn4: Ix,
    sectionModulusXIn3: take("sectionModulusXIn3", () => (2 * Ix) / d),
    radiusXIn: take("radiusXIn", () => Math.sqrt(Ix / A)),
    plasticModulusXIn3: take("plasticModulusXIn3", () => expected.plasticModulusXIn3),
    inertiaYIn4: Iy,
    sectionModulusYIn3: take("sectionModulusYIn3", () => (2 * Iy) / bf),
    radiusYIn: take("radiusYIn", () => Math.sqrt(Iy / A)),
    plasticModulusYIn3: take("plasticModulusYIn3", () => expected.plasticModulusYIn3),
    torsionJIn4: take("torsionJIn4", () => expected.torsionJIn4),
    warpingCwIn6: take("warpingCwIn6", () => (Iy * (d - tf) ** 2) / 4),
    flangeSlenderness: take("flangeSlenderness", () => bf / (2 * tf)),
    webSlenderness: take("webSlenderness", () => expected.webSlenderness),
  };
  return { figures, derived };
}

function stockOf(cells: readonly string[], given: GivenFigures, reading: ListReading): Stock | null {
  const fy = given.yieldStressKsi;
  if (fy !== undefined && !(fy.value >= YIELD_COLUMN.min && fy.value <= YIELD_COLUMN.max)) {
    throw new Refusal(`yield stress ${fy.text} is ${short(fy.value)} ksi; ${YIELD_COLUMN.min} to ${YIELD_COLUMN.max} are allowed`);
  }
  const numbers: Record<string, number | null> = {};
  for (const { name, min, max, whole } of STOCK_COLUMNS) {
    const figure = given[name];
    numbers[name] = figure?.value ?? null;
    if (figure === undefined) continue;
    const sound = figure.value >= min && figure.value <= max && (!whole || Number.isInteger(figure.value));
    if (!sound)
      throw new Refusal(`${SYMBOLS[name]} "${figure.text}": ${whole ? "a whole number" : "a number"} from ${min} to ${max} is allowed`);
  }
  const placeAt = reading.columns.get("place")?.index;
  const place = placeAt === undefined ? "" : plainText(cells[placeAt] ?? "");
  const placeOrNull = place === "" || saysNothing(place) ? null : place.slice(0, 200);
  const tf = given.flangeThicknessIn?.value ?? 0;
  const tw = given.webThicknessIn?.value ?? 0;
  if ((numbers.flangeLossIn ?? 0) >= tf && tf > 0)
    throw new Refusal(`flange loss ${given.flangeLossIn?.text} leaves nothing of the flange`);
  if ((numbers.webLossIn ?? 0) >= tw && tw > 0) throw new Refusal(`web loss ${given.webLossIn?.text} leaves nothing of the web`);
  if (placeOrNull === null && Object.values(numbers).every((value) => value === null)) return null;
  return { ...(numbers as unknown as Omit<Stock, "place">), place: placeOrNull };
}

const short = (value: number): string => String(Number(value.toPrecision(4)));
const shortText = (text: string): string => (text.length > 40 ? `${text.slice(0, 40)}...` : text);
const unitWord = (field: keyof ShapeFigures): string => (/(In\d?|Plf)$/.exec(field)?.[1] ?? "").toLowerCase().replace("plf", "lb/ft");
