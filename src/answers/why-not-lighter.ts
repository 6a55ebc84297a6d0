import type { Option } from "../ranking/rank.js";
import { stands } from "../search/search.js";
import type { CheckId } from "../specs/contract.js";
import { type Assessment, assessInFull } from "./assessment.js";
import type { Prepared } from "./question.js";

/** Why no lighter shape serves on the winning layout. */
export interface WhyNotLighter {
  /** Shapes lighter than the winner. */
  readonly lighterShapes: number;
  /** How many of them fail each required check; a shape counts once under each check it fails. */
  readonly failing: Readonly<Partial<Record<CheckId, number>>>;
  /** Those nearest to passing, nearest first. */
  readonly nearest: readonly Assessment[];
}

const NEAREST_SHOWN = 5;

/** Assesses every shape lighter than the winner on the winner's layout. */
export function whyNotLighter({ bridge, space }: Prepared, winner: Option): WhyNotLighter {
  const { assessor } = winner;
  const lighter = space.steels.filter(({ shape }) => shape.weightPlf < winner.steel.shape.weightPlf);
  const failing: Partial<Record<CheckId, number>> = {};
  const missed = lighter
    .filter((steel) => stands(assessor.layout, steel))
    .map((steel) => {
      assessor.assess(steel, null);
      const ids = new Set<CheckId>();
      assessor.slots.forEach(({ id, kind }, place) => {
        const ratio = assessor.ratios[place];
        if (kind !== "advisory" && ratio !== -1 && !(ratio <= 1)) ids.add(id);
      });
      for (const id of ids) failing[id] = (failing[id] ?? 0) + 1;
      return { steel, ratio: assessor.governingRatio };
    });
  const nearest = missed
    .sort((a, b) => a.ratio - b.ratio || a.steel.shape.weightPlf - b.steel.shape.weightPlf)
    .slice(0, NEAREST_SHOWN)
    .map(({ steel }) => assessInFull(bridge, assessor, steel));
  return { lighterShapes: lighter.length, failing, nearest };
}
