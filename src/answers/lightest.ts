import type { Shape, ShapeFigures } from "../catalogue/shape.js";
import { nearestMiss, type Option, rank } from "../ranking/rank.js";
import { type Assessment, assessInFull } from "./assessment.js";
import { type DepthRow, lightestByDepth } from "./by-depth.js";
import { type Examined, examined, type Prepared, refuseTwoStringers } from "./question.js";
import { type RestsOn, restsOn } from "./rests-on.js";
import { costPerFtOfBridge, type LeftOut } from "./stock.js";
import { type WhyNotLighter, whyNotLighter } from "./why-not-lighter.js";

/** One line of the ranking. */
export interface RankedOption {
  readonly rank: number;
  readonly spacingRangeFt: readonly [number, number];
  readonly assessment: Assessment;
}

/** The lightest options, or the nearest miss. */
export interface LightestAnswer {
  /** What the options are ordered by: cost only when it was asked for and every passing row has a price. */
  readonly rankedBy: "weight" | "cost";
  /** Passing shapes without a price, which keep the order by weight; empty unless cost was asked for. */
  readonly withoutPrice: readonly string[];
  /** Shapes of the list that are not offered, and why. */
  readonly leftOut: readonly LeftOut[];
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
 * @param order `cost` orders by cost per foot of bridge when every passing row has a price
 */
export function lightest(prepared: Prepared, top: number, order: "weight" | "cost" = "weight"): LightestAnswer {
  refuseTwoStringers(prepared);
  const { bridge } = prepared;
  const withoutPrice = order === "cost" ? unpriced(prepared) : [];
  const rankedBy = order === "cost" && withoutPrice.length === 0 ? "cost" : "weight";
  const space = rankedBy === "cost" ? { ...prepared.space, measure: costPerFt } : prepared.space;
  const measured = { ...prepared, space };
  const options = rank(space, top);
  const [best] = options;
  const miss = options.length === 0 ? nearestMiss(space) : null;
  const ranked = options.map((option, index) => ({ rank: index + 1, ...shown(prepared, option) }));
  return {
    rankedBy,
    withoutPrice,
    leftOut: prepared.leftOut,
    examined: examined(prepared),
    options: ranked,
    nearestMiss: miss === null ? null : assessInFull(bridge, miss.assessor, miss.steel),
    whyNotLighter: best === undefined ? null : whyNotLighter(measured, best),
    byDepth: best === undefined ? [] : lightestByDepth(measured, best),
    restsOn: best === undefined ? [] : restsOn(measured, best),
    byHand: best === undefined ? null : { assessment: ranked[0].assessment, figures: best.steel.shape },
  };
}

const costPerFt = (shape: Shape): number => costPerFtOfBridge({ shape }, null) ?? Number.POSITIVE_INFINITY;

/** Shapes that pass somewhere and whose row gives no price. */
function unpriced({ space }: Prepared): string[] {
  const steels = space.steels.filter(({ shape }) => costPerFtOfBridge({ shape }, null) === null);
  return rank({ ...space, steels }, Number.POSITIVE_INFINITY)
    .map(({ steel }) => steel.shape.designation)
    .filter((name, index, names) => names.indexOf(name) === index);
}

function shown({ bridge }: Prepared, option: Option): Omit<RankedOption, "rank"> {
  return { spacingRangeFt: option.spacingRangeFt, assessment: assessInFull(bridge, option.assessor, option.steel) };
}
