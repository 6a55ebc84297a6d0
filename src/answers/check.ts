import type { Steel } from "../bridge/yield-stress.js";
import { designationKey } from "../catalogue/shape.js";
import { InputError } from "../errors.js";
import { didYouMean } from "../nearest.js";
import { nearestMiss, rank } from "../ranking/rank.js";
import { stands } from "../search/search.js";
import { type Assessment, assessInFull } from "./assessment.js";
import type { Prepared } from "./question.js";

/** One shape checked in full. */
export interface CheckAnswer {
  readonly assessment: Assessment;
  /** Layouts from which the one shown was chosen: the ranker's first, else the one with the smallest governing ratio. */
  readonly layoutsTried: number;
}

/**
 * Checks one shape, every step written down.
 *
 * @param designation name of a shape of the list, case and blanks ignored
 * @throws {InputError} for an unknown shape, one left out by a depth limit, or one that stands on no layout
 */
export function check(prepared: Prepared, designation: string): CheckAnswer {
  const { bridge, space } = prepared;
  const steel = steelNamed(prepared, designation);
  const alone = { ...space, steels: [steel] };
  const chosen = rank(alone, 1)[0] ?? nearestMiss(alone);
  if (chosen === null) {
    throw new InputError([
      {
        field: steel.shape.designation,
        problem: `its flange is wider than the spacing or twice the overhang of every layout (overhangs ${overhangs(prepared, steel)})`,
        allowed: "a smaller spacing, fewer stringers or a wider deck",
      },
    ]);
  }
  return { assessment: assessInFull(bridge, chosen.assessor, steel), layoutsTried: space.assessors.length };
}

function steelNamed({ space, leftOut }: Prepared, designation: string): Steel {
  const key = designationKey(designation);
  const steel = space.steels.find(({ shape }) => designationKey(shape.designation) === key);
  if (steel !== undefined) return steel;
  const names = space.steels.map(({ shape }) => shape.designation);
  const deep = leftOut.some(({ shape }) => designationKey(shape) === key);
  const problem = deep
    ? `${designation} is left out: deeper than the bridge allows, or no sound plate left of it`
    : `no shape "${designation}" in the list${didYouMean(designation, names)}`;
  throw new InputError([
    { field: "SHAPE", problem, allowed: `a designation of the list, such as ${names[0] ?? "none: the list is empty"}` },
  ]);
}

function overhangs({ space }: Prepared, steel: Steel): string {
  return space.assessors
    .filter(({ layout }) => !stands(layout, steel))
    .slice(0, 5)
    .map(({ layout }) => `${layout.overhangFt} ft`)
    .join(", ");
}
