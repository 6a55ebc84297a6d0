import type { Shape } from "../catalogue/shape.js";
import { InputError, type InputIssue } from "../errors.js";
import type { Bridge, Grade, Source } from "./bridge.js";

/** A shape with the yield stress in force for it. */
export interface Steel {
  /** The shape as it is checked: where its row tells of thickness lost, with the figures of what is left. */
  readonly shape: Shape;
  readonly fyKsi: number;
}

/**
 * Minimum yield stress of the rolled grades offered, ksi.
 *
 * Source: ASTM A709/A709M, grades 36, 50 and 50W.
 */
export const GRADE_YIELD_KSI: Readonly<Record<Grade, number>> = { "36": 36, "50": 50, "50W": 50 };

const STRENGTH_OF_WORD: Readonly<Record<Source, number>> = { practice: 0, bridge: 1, list: 2, flag: 3 };

/** Yield stress that bridge, practice and flags ask for, ksi, and who asks. A grade overrides a stress from a weaker source. */
export function askedYieldStress(bridge: Bridge): { readonly fyKsi: number; readonly source: Source } {
  const gradeSource = bridge.sources["steel.grade"] ?? "practice";
  const stressSource = bridge.sources["steel.fyKsi"] ?? "practice";
  const { fyKsi, grade } = bridge.steel;
  if (fyKsi !== null && STRENGTH_OF_WORD[stressSource] >= STRENGTH_OF_WORD[gradeSource]) return { fyKsi, source: stressSource };
  return { fyKsi: GRADE_YIELD_KSI[grade], source: gradeSource };
}

/** Last year of each age of steel, and the yield stress taken for steel of unknown make from it, ksi. */
const YIELD_BY_YEAR: readonly (readonly [upTo: number, fyKsi: number])[] = [
  [1904, 26],
  [1936, 30],
  [1963, 33],
  [Number.POSITIVE_INFINITY, 36],
];

/**
 * Yield stress of steel of unknown make.
 *
 * @param yearBuilt year in which it was built in; of a year on the border of two ages the weaker counts
 * @returns ksi: before 1905 26, to 1936 30, to 1963 33, later 36
 * Source: AASHTO Manual for Bridge Evaluation, steel of unknown type by year built (values from memory).
 */
export function yieldByYearKsi(yearBuilt: number): number {
  const found = YIELD_BY_YEAR.find(([upTo]) => yearBuilt <= upTo);
  if (found === undefined) throw new RangeError(`yearBuilt must be a number, got ${yearBuilt}`);
  return found[1];
}

/** A shape's yield stress and its source, or why there is none. */
export type YieldStress = { readonly fyKsi: number; readonly source: Source | "year built" } | { readonly issue: InputIssue };

/**
 * The yield stress in force for a shape: flag, else the row's own, given or by its year built, else the bridge file, else, for the bundled
 * catalogue alone, the practice.
 *
 * @returns ksi with its source; a fault where a flag stands above the row's own figure, or nobody says what an own list's steel is
 * Source: common practice (old steel is never taken for today's grade unless somebody says so).
 */
export function yieldStress(bridge: Bridge, shape: Shape): YieldStress {
  const asked = askedYieldStress(bridge);
  const { file, line } = shape.source;
  if (asked.source === "flag") {
    if (shape.yieldStressKsi !== null && asked.fyKsi > shape.yieldStressKsi) {
      const problem = `the flag asks for Fy ${asked.fyKsi} ksi, the row's own steel has ${shape.yieldStressKsi} ksi`;
      return { issue: { file, line, field: shape.designation, problem, allowed: `Fy up to ${shape.yieldStressKsi} ksi` } };
    }
    return asked;
  }
  if (shape.yieldStressKsi !== null) return { fyKsi: shape.yieldStressKsi, source: "list" };
  if (typeof shape.stock?.yearBuilt === "number") return { fyKsi: yieldByYearKsi(shape.stock.yearBuilt), source: "year built" };
  if (asked.source === "bridge" || shape.bundled) return asked;
  return {
    issue: {
      file,
      line,
      field: shape.designation,
      problem: "nothing says what steel this is",
      allowed: "a yieldStressKsi in the row, or steel.grade or steel.fyKsi in the bridge file, or --grade or --fy",
    },
  };
}

/**
 * Every shape with its yield stress.
 *
 * @throws {InputError} naming each shape without one, or with a flag above its own
 */
export function gradeShapes(bridge: Bridge, shapes: readonly Shape[]): readonly Steel[] {
  const issues: InputIssue[] = [];
  const steels: Steel[] = [];
  for (const shape of shapes) {
    const found = yieldStress(bridge, shape);
    if ("issue" in found) issues.push(found.issue);
    else steels.push({ shape, fyKsi: found.fyKsi });
  }
  if (issues.length > 0) throw new InputError(issues);
  return steels;
}
