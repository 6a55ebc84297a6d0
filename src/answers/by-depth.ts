import { nominalDepthIn } from "../catalogue/shape.js";
import { steelPlfOf } from "../ranking/order.js";
import { type Option, rank } from "../ranking/rank.js";
import { type Assessment, assessInFull } from "./assessment.js";
import type { Prepared } from "./question.js";

/** The lightest of one nominal depth. */
export interface DepthRow {
  readonly nominalDepthIn: number;
  readonly assessment: Assessment;
  /** Steel weight beyond the lightest of all, lb per ft of bridge. */
  readonly extraPlfOfBridge: number;
}

/** The lightest passing option of each nominal depth that has one, deepest first. */
export function lightestByDepth({ bridge, space }: Prepared, lightest: Option): readonly DepthRow[] {
  const depths = [...new Set(space.steels.map(({ shape }) => nominalDepthIn(shape)))].sort((a, b) => b - a);
  return depths.flatMap((depth) => {
    const [best] = rank({ ...space, steels: space.steels.filter(({ shape }) => nominalDepthIn(shape) === depth) }, 1);
    if (best === undefined) return [];
    const extraPlfOfBridge = steelPlfOf(best) - steelPlfOf(lightest);
    return [{ nominalDepthIn: depth, assessment: assessInFull(bridge, best.assessor, best.steel), extraPlfOfBridge }];
  });
}
