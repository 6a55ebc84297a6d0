import type { Layout } from "../bridge/layouts.js";
import type { Steel } from "../bridge/yield-stress.js";

/** A candidate with what the order looks at. */
export interface Ranked {
  readonly steel: Steel;
  readonly layout: Layout;
  readonly governingRatio: number;
  /** What is ordered by first, per foot of bridge: steel weight, lb/ft, or cost. */
  readonly measurePerFt: number;
}

/** Ratios that agree to this count as equal, so that the last binary digit never decides. */
const EQUAL_RATIO = 1e-9;

/** Steel weight per foot of bridge, lb/ft; of one stringer when the count is unknown. */
export function steelPlfOf({ steel, layout }: Pick<Ranked, "steel" | "layout">): number {
  return steel.shape.weightPlf * (layout.count ?? 1);
}

/**
 * The total order of candidates: steel weight per foot of bridge (by cost: cost, then weight), fewer stringers, smaller governing ratio, smaller overhang over
 * spacing, smaller spacing, name.
 *
 * @returns below zero when `a` comes first; zero only for the same candidate
 * Source: our rule.
 */
export function byPreference(a: Ranked, b: Ranked): number {
  return (
    a.measurePerFt - b.measurePerFt ||
    steelPlfOf(a) - steelPlfOf(b) ||
    (a.layout.count ?? 1) - (b.layout.count ?? 1) ||
    Math.round(a.governingRatio / EQUAL_RATIO) - Math.round(b.governingRatio / EQUAL_RATIO) ||
    overhangPerSpacing(a.layout) - overhangPerSpacing(b.layout) ||
    a.layout.spacingFt - b.layout.spacingFt ||
    byName(a.steel.shape.designation, b.steel.shape.designation)
  );
}

const overhangPerSpacing = (layout: Layout): number => (layout.overhangFt ?? 0) / layout.spacingFt;
const byName = (a: string, b: string): number => (a < b ? -1 : a > b ? 1 : 0);
