import type { Shape } from "../catalogue/shape.js";

/** Bounds within which shapes are listed; null for none. */
export interface SectionFilter {
  readonly minDepthIn: number | null;
  readonly maxDepthIn: number | null;
  readonly minWeightPlf: number | null;
  readonly maxWeightPlf: number | null;
  /** Least yield stress, ksi. A catalogue shape is rolled to any grade up to 50; a row of an own list that gives none is left out. */
  readonly fyKsi: number | null;
}

/** Greatest yield stress to which a catalogue shape is offered, ksi. Source: ASTM A709/A709M, grades 50 and 50W. */
const CATALOGUE_FY_KSI = 50;

/** Shapes within the bounds, lightest first, equal weights by depth and name. */
export function sections(shapes: readonly Shape[], filter: SectionFilter): readonly Shape[] {
  const within = (value: number, min: number | null, max: number | null): boolean =>
    (min === null || value >= min) && (max === null || value <= max);
  return shapes
    .filter(
      (shape) =>
        within(shape.depthIn, filter.minDepthIn, filter.maxDepthIn) &&
        within(shape.weightPlf, filter.minWeightPlf, filter.maxWeightPlf) &&
        within(shape.yieldStressKsi ?? (shape.bundled ? CATALOGUE_FY_KSI : 0), filter.fyKsi, null),
    )
    .sort((a, b) => a.weightPlf - b.weightPlf || a.depthIn - b.depthIn || (a.designation < b.designation ? -1 : 1));
}
