import { nearestMiss, rank } from "../ranking/rank.js";
import { type Assessment, assessInFull } from "./assessment.js";
import { type Examined, examined, type Prepared, refuseTwoStringers } from "./question.js";
import type { LeftOut } from "./stock.js";

/** The best of one count, or what came nearest. */
export interface CountRow {
  readonly count: number;
  readonly best: Assessment | null;
  readonly spacingRangeFt: readonly [number, number] | null;
  /** The nearest candidate when none of this count passes. */
  readonly nearestMiss: Assessment | null;
}

/** One row for each count that fits the deck. */
export interface CountsAnswer {
  /** Shapes of the list that are not offered, and why. */
  readonly leftOut: readonly LeftOut[];
  readonly examined: Examined;
  readonly counts: readonly CountRow[];
  readonly lightestCount: number | null;
  /** The fewest stringers whose steel is within 5 % of the lightest. */
  readonly fewestWithin5Percent: number | null;
}

const NEARLY_AS_LIGHT = 1.05;

/** Compares the counts that fit across the deck: the lightest passing shape and layout of each. */
export function counts(prepared: Prepared): CountsAnswer {
  refuseTwoStringers(prepared);
  const { bridge, space } = prepared;
  const fitting = [...new Set(space.assessors.map(({ layout }) => layout.count))].filter((count) => count !== null).sort((a, b) => a - b);
  const rows = fitting.map((count): CountRow => {
    const ofCount = { ...space, assessors: space.assessors.filter(({ layout }) => layout.count === count) };
    const [best] = rank(ofCount, 1);
    if (best !== undefined) {
      const assessment = assessInFull(bridge, best.assessor, best.steel);
      return { count, best: assessment, spacingRangeFt: best.spacingRangeFt, nearestMiss: null };
    }
    const miss = nearestMiss(ofCount);
    return { count, best: null, spacingRangeFt: null, nearestMiss: miss === null ? null : assessInFull(bridge, miss.assessor, miss.steel) };
  });
  const weights = rows.flatMap(({ count, best }) => (best === null ? [] : [{ count, plf: best.steelPlfOfBridge as number }]));
  const least = Math.min(...weights.map(({ plf }) => plf));
  return {
    leftOut: prepared.leftOut,
    examined: examined(prepared),
    counts: rows,
    lightestCount: weights.find(({ plf }) => plf === least)?.count ?? null,
    fewestWithin5Percent: weights.find(({ plf }) => plf <= least * NEARLY_AS_LIGHT)?.count ?? null,
  };
}
