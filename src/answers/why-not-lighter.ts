import type { Option } from "../ranking/rank.js";
import { feasible } from "../search/search.js";
import { ABSENT, type CheckId } from "../specs/contract.js";
import { type Assessment, assessInFull } from "./assessment.js";
import type { Prepared } from "./question.js";
import { type Rescue, rescue } from "./rescue.js";

/** Why no lighter shape serves on the winning layout. */
export interface WhyNotLighter {
  /** Shapes lighter than the winner; ranked by cost, cheaper ones. */
  readonly lighterShapes: number;
  /** How many of them fail each required check; a shape counts once under each check it fails. */
  readonly failing: Readonly<Partial<Record<CheckId, number>>>;
  /** Those nearest to passing, nearest first. */
  readonly nearest: readonly Assessment[];
  /** The single change that would let the nearest pass; null when there is none. */
  readonly rescue: Rescue | null;
}

const NEAREST_SHOWN = 5;

/** Assesses every shape lighter than the winner on the winner's layout. */
export function whyNotLighter(prepared: Prepared, winner: Option): WhyNotLighter {
  const { bridge, space } = prepared;
  const { assessor } = winner;
  const lighter = space.steels.filter(({ shape }) => space.measure(shape) < space.measure(winner.steel.shape));
  const failing: Partial<Record<CheckId, number>> = {};
  const missed = lighter
    .filter((steel) => feasible(assessor.layout, steel))
    .map((steel) => {
      assessor.assess(steel, null);
      const ids = new Set<CheckId>();
      assessor.slots.forEach(({ id, kind }, place) => {
        const ratio = assessor.ratios[place];
        if (kind !== "advisory" && ratio !== ABSENT && !(ratio <= 1)) ids.add(id);
      });
      for (const id of ids) failing[id] = (failing[id] ?? 0) + 1;
      return { steel, ratio: assessor.governingRatio };
    });
  const nearest = missed.sort((a, b) => a.ratio - b.ratio || a.steel.shape.weightPlf - b.steel.shape.weightPlf).slice(0, NEAREST_SHOWN);
  return {
    lighterShapes: lighter.length,
    failing,
    nearest: nearest.map(({ steel }) => assessInFull(bridge, assessor, steel)),
    rescue: nearest.length === 0 ? null : rescue(prepared, winner, nearest[0].steel),
  };
}
