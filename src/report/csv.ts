import type { Assessment } from "../answers/assessment.js";
import type { CountsAnswer } from "../answers/counts.js";
import type { LightestAnswer } from "../answers/lightest.js";
import type { Shape } from "../catalogue/shape.js";
import type { SectionEffects } from "../loads/live-load.js";
import type { StringerAssessment } from "../specs/contract.js";

/** One row of a CSV answer by column name. */
export type CsvRecord = Record<string, string | number | boolean | null>;

/** Endings that put a check's unit into its column names. */
const UNIT_ENDING: Readonly<Record<string, string>> = {
  "kip-ft": "KipFt",
  kip: "Kip",
  ksi: "Ksi",
  in: "In",
  ft: "Ft",
  "wheel lines": "WheelLines",
  "-": "",
};

/** One row an option, the columns of its assessment flattened. */
export function lightestRows({ options }: LightestAnswer): CsvRecord[] {
  return options.map(({ rank, spacingRangeFt, assessment }) => ({
    rank,
    ...assessmentRow(assessment),
    passesFromSpacingFt: spacingRangeFt[0],
    passesToSpacingFt: spacingRangeFt[1],
  }));
}

/** One row a count, its best assessment flattened; a count without one has its number alone. */
export function countRows({ counts }: CountsAnswer): CsvRecord[] {
  return counts.map(({ count, best }) => (best === null ? { "layout.count": count, passes: false } : assessmentRow(best)));
}

/** A single assessment flattened. */
export function checkRows(assessment: Assessment): CsvRecord[] {
  return [assessmentRow(assessment)];
}

/** One row a tenth point. */
export function loadRows(tenthPoints: readonly SectionEffects[]): CsvRecord[] {
  return tenthPoints.map((point) => ({ ...point }));
}

/** One row a shape, in our own columns, so that the file can be read again as a list. */
export function sectionRows(shapes: readonly Shape[]): CsvRecord[] {
  return shapes.map(({ designation, source: _, bundled: __, yieldStressKsi, stock, ...figures }) => ({
    designation,
    ...figures,
    yieldStressKsi,
    ...stock,
  }));
}

function assessmentRow(assessment: Assessment): CsvRecord {
  const { layout, governing, source, steel } = assessment;
  return {
    shape: assessment.shape,
    weightPlf: assessment.weightPlf,
    depthIn: assessment.depthIn,
    fyKsi: assessment.fyKsi,
    "source.file": source.file,
    "source.line": source.line,
    "layout.count": layout.count,
    "layout.spacingFt": layout.spacingFt,
    "layout.overhangFt": layout.overhangFt,
    steelPlfOfBridge: assessment.steelPlfOfBridge,
    "steel.totalKip": steel?.totalKip ?? null,
    passes: assessment.passes,
    "governing.id": governing.id,
    "governing.position": governing.position,
    "governing.ratio": finite(governing.ratio),
    ...Object.assign({}, ...assessment.stringers.map(stringerColumns)),
  };
}

function stringerColumns({ position, effects, checks }: StringerAssessment): CsvRecord {
  const row: CsvRecord = {};
  for (const [name, value] of Object.entries(effects)) row[`${position}.${name}`] = typeof value === "number" ? finite(value) : value;
  for (const { id, demand, capacity, unit, ratio, ok } of checks) {
    const ending = UNIT_ENDING[unit] ?? "";
    row[`${position}.${id}.demand${ending}`] = finite(demand);
    row[`${position}.${id}.capacity${ending}`] = finite(capacity);
    row[`${position}.${id}.ratio`] = finite(ratio);
    row[`${position}.${id}.ok`] = ok;
  }
  return row;
}

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

/** Every column that any row has, in the order of first sight. */
export function columnsOf(rows: readonly CsvRecord[]): string[] {
  return [...new Set(rows.flatMap((row) => Object.keys(row)))];
}

/** Text that a spreadsheet would run as a formula gets a leading apostrophe. */
export function harmless(value: string | number | boolean | null): string | number | boolean {
  if (value === null) return "";
  return typeof value === "string" && /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
}
