// Recomputes every shape of a list of rolled W-shapes from its dimensions and compares with the
// figures printed beside them: npx tsx scripts/check-catalogue.ts [FILE]
// Exit code 0: all within tolerance; 1: at least one violation; 2: the file can't be read.
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import Papa from "papaparse";
import { propertiesFromDimensions } from "../src/catalogue/from-dimensions.js";
import { IN2_PER_FT2, UNIT_WEIGHT_PCF } from "../src/units.js";

const DIMENSIONS = ["depthIn", "flangeWidthIn", "webThicknessIn", "flangeThicknessIn", "kDesignIn"] as const;

/**
 * Largest difference allowed, as a fraction of the printed figure. Dimensions and figures are both
 * rounded to three digits, each up to 0.5 % off: for a ratio of two dimensions this stays within
 * 1 %; inertias raise it to the third power. Cw follows Iy and the square of the depth.
 */
const TOLERANCES = {
  areaIn2: 0.015,
  inertiaXIn4: 0.015,
  sectionModulusXIn3: 0.015,
  radiusXIn: 0.015,
  plasticModulusXIn3: 0.015,
  inertiaYIn4: 0.015,
  sectionModulusYIn3: 0.015,
  radiusYIn: 0.015,
  plasticModulusYIn3: 0.015,
  torsionJIn4: 0.015,
  warpingCwIn6: 0.025,
  weightPlf: 0.015,
  flangeSlenderness: 0.01,
  webSlenderness: 0.01,
} as const;

type Property = keyof typeof TOLERANCES;
type Column = Property | (typeof DIMENSIONS)[number];
type Row = Readonly<Partial<Record<string, string>>>;

const PROPERTIES = Object.keys(TOLERANCES) as Property[];
const COLUMNS: readonly string[] = ["designation", ...DIMENSIONS, ...PROPERTIES];

interface Comparison {
  readonly designation: string;
  readonly property: Property;
  readonly printed: number;
  readonly recomputed: number;
  /** recomputed / printed - 1 */
  readonly deviation: number;
}

/** Every cell of the list as text; the faults of the file as a whole are thrown as one Error. */
function parseRows(text: string): readonly Row[] {
  const { data, errors, meta } = Papa.parse<Row>(text, { header: true, skipEmptyLines: true });
  const missing = COLUMNS.filter((column) => !meta.fields?.includes(column));
  const faults = [...missing.map((column) => `column ${column} is missing`), ...errors.map((error) => error.message)];
  if (data.length === 0) faults.push("no shapes");
  if (faults.length > 0) throw new Error(faults.join("; "));
  return data;
}

/** A number > 0, or NaN, which no tolerance lets pass: an empty cell would read as 0. */
function numberIn(row: Row, column: Column): number {
  const value = Number(row[column]);
  return value > 0 ? value : Number.NaN;
}

function recompute(row: Row): Readonly<Record<Property, number>> {
  const dimensions = {
    depthIn: numberIn(row, "depthIn"),
    flangeWidthIn: numberIn(row, "flangeWidthIn"),
    webThicknessIn: numberIn(row, "webThicknessIn"),
    flangeThicknessIn: numberIn(row, "flangeThicknessIn"),
    kDesignIn: numberIn(row, "kDesignIn"),
  };
  return {
    ...propertiesFromDimensions(dimensions),
    weightPlf: (numberIn(row, "areaIn2") * UNIT_WEIGHT_PCF.steel) / IN2_PER_FT2,
    flangeSlenderness: dimensions.flangeWidthIn / (2 * dimensions.flangeThicknessIn),
    webSlenderness: (dimensions.depthIn - 2 * dimensions.kDesignIn) / dimensions.webThicknessIn,
  };
}

function compare(row: Row): readonly Comparison[] {
  const recomputed = recompute(row);
  return PROPERTIES.map((property) => {
    const printed = numberIn(row, property);
    return {
      designation: row.designation ?? "",
      property,
      printed,
      recomputed: recomputed[property],
      deviation: recomputed[property] / printed - 1,
    };
  });
}

function isWithinTolerance({ property, deviation }: Comparison): boolean {
  return Math.abs(deviation) <= TOLERANCES[property];
}

function percent(fraction: number): string {
  return `${(100 * fraction).toFixed(2)} %`;
}

function describe(comparison: Comparison): string {
  const { designation, property, printed, recomputed, deviation } = comparison;
  return (
    `${designation}: ${property} printed ${printed}, recomputed ${recomputed.toPrecision(4)}, ` +
    `off by ${percent(deviation)} (allowed ${percent(TOLERANCES[property])})`
  );
}

function largestDeviation(comparisons: readonly Comparison[], property: Property): string {
  const ofProperty = comparisons.filter((c) => c.property === property && !Number.isNaN(c.deviation));
  const [worst] = ofProperty.toSorted((a, b) => Math.abs(b.deviation) - Math.abs(a.deviation));
  return worst ? `${property} ${percent(worst.deviation)} ${worst.designation}` : `${property} none`;
}

/** Prints the findings of one list and returns the exit code. */
function checkCatalogue(rows: readonly Row[]): number {
  const comparisons: Comparison[] = [];
  const violations: string[] = [];
  for (const row of rows) {
    try {
      const ofShape = compare(row);
      comparisons.push(...ofShape);
      violations.push(...ofShape.filter((c) => !isWithinTolerance(c)).map(describe));
    } catch (error) {
      if (!(error instanceof RangeError)) throw error;
      violations.push(`${row.designation}: ${error.message}`);
    }
  }
  for (const violation of violations) console.log(violation);
  const largest = PROPERTIES.map((property) => largestDeviation(comparisons, property));
  console.log(`${rows.length} shapes checked, ${violations.length} violations; largest deviations: ${largest.join(", ")}`);
  return violations.length > 0 ? 1 : 0;
}

const file = process.argv[2] ?? fileURLToPath(new URL("../data/w-shapes.csv", import.meta.url));
try {
  process.exitCode = checkCatalogue(parseRows(readFileSync(file, "utf8")));
} catch (error) {
  console.error(`${file}: ${error instanceof Error ? error.message : error}`);
  process.exitCode = 2;
}
