import { nearestMiss, type Option, rank } from "../ranking/rank.js";
import { type Assessment, assessInFull } from "./assessment.js";
import { type Examined, examined, type Prepared } from "./question.js";
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
}

/**
 * The lightest options that pass every required check, best first.
 *
 * @param top options wanted, 1 or more
 */
export function lightest(prepared: Prepared, top: number): LightestAnswer {
  const { bridge, space } = prepared;
  const options = rank(space, top);
  const miss = options.length === 0 ? nearestMiss(space) : null;
  return {
    examined: examined(prepared),
    options: options.map((option, index) => ({ rank: index + 1, ...shown(prepared, option) })),
    nearestMiss: miss === null ? null : assessInFull(bridge, miss.assessor, miss.steel),
    whyNotLighter: options.length === 0 ? null : whyNotLighter(prepared, options[0]),
  };
}

function shown({ bridge }: Prepared, option: Option): Omit<RankedOption, "rank"> {
  return { spacingRangeFt: option.spacingRangeFt, assessment: assessInFull(bridge, option.assessor, option.steel) };
}
