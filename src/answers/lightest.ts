import type { ShapeFigures } from "../catalogue/shape.js";
import { nearestMiss, type Option, rank } from "../ranking/rank.js";
import { type Assessment, assessInFull } from "./assessment.js";
import { type DepthRow, lightestByDepth } from "./by-depth.js";
import { type Examined, examined, type Prepared, refuseTwoStringers } from "./question.js";
import { type RestsOn, restsOn } from "./rests-on.js";
import { type WhyNotLighter, whyNotLighter } from "./why-not-lighter.js";

/** One line of the ranking. */
export interface RankedOption {
  readonly rank: number;
  readonly spacingRangeFt: readonly [number, number];
  readonly assessment: Assessment;
}

/** The lightest options, or the nearest miss. */
export interface LightestAnswer {
  readonly examined: Examined;
  readonly options: readonly RankedOption[];
  /** The candidate nearest to passing when none passes; null also when there was no candidate. */
  readonly nearestMiss: Assessment | null;
  readonly whyNotLighter: WhyNotLighter | null;
  /** The lightest of each nominal depth, deepest first. */
  readonly byDepth: readonly DepthRow[];
  /** Assumptions that nobody stated and that decide the answer. */
  readonly restsOn: readonly RestsOn[];
  /** What the calculation by hand of the first option starts from; null when nothing passes. */
  readonly byHand: { readonly assessment: Assessment; readonly figures: ShapeFigures } | null;
}

/**
 * The lightest options that pass every required check, best first.
 *
 * @param top options wanted, 1 or more
 */
export function lightest(prepared: Prepared, top: number): LightestAnswer {
  refuseTwoStringers(prepared);
  const { bridge, space } = prepared;
  const options = rank(space, top);
  const [best] = options;
  const miss = options.length === 0 ? nearestMiss(space) : null;
  const ranked = options.map((option, index) => ({ rank: index + 1, ...shown(prepared, option) }));
  return {
    examined: examined(prepared),
    options: ranked,
    nearestMiss: miss === null ? null : assessInFull(bridge, miss.assessor, miss.steel),
    whyNotLighter: best === undefined ? null : whyNotLighter(prepared, best),
    byDepth: best === undefined ? [] : lightestByDepth(prepared, best),
    restsOn: best === undefined ? [] : restsOn(prepared, best),
    byHand: best === undefined ? null : { assessment: ranked[0].assessment, figures: best.steel.shape },
  };
}

function shown({ bridge }: Prepared, option: Option): Omit<RankedOption, "rank"> {
  return { spacingRangeFt: option.spacingRangeFt, assessment: assessInFull(bridge, option.assessor, option.steel) };
}
