import type { Layout } from "../bridge/layouts.js";
import type { Steel } from "../bridge/yield-stress.js";
import type { Shape } from "../catalogue/shape.js";
import type { Assessor, Design, Specification } from "../specs/contract.js";
import { IN_PER_FT } from "../units.js";

/** What candidates are ordered by first, per foot of one stringer: its weight, lb/ft, or its cost. */
export type Measure = (shape: Shape) => number;

/** Weight of a stringer, lb/ft. */
export const byWeight: Measure = ({ weightPlf }) => weightPlf;

/** Candidates of equal measure and count: shapes of one weight or cost on every layout of one count. */
export interface Group {
  /** Measure per foot of bridge: count times that of the shape; the shape alone when the count is unknown. */
  readonly measurePerFt: number;
  readonly count: number | null;
  readonly steels: readonly Steel[];
  readonly assessors: readonly Assessor[];
}

/** All that a question can be answered from: every layout prepared, every shape with its steel. */
export interface SearchSpace {
  readonly assessors: readonly Assessor[];
  readonly steels: readonly Steel[];
  readonly measure: Measure;
}

/** Prepares every layout once; what a bridge and a layout fix is worked out here and not again for each shape. */
export function searchSpace(
  specification: Specification,
  design: Design,
  layouts: readonly Layout[],
  steels: readonly Steel[],
): SearchSpace {
  return { assessors: layouts.map((layout) => specification.prepare(design, layout)), steels, measure: byWeight };
}

/**
 * Candidates in groups of rising measure, steel weight or cost, and of equal ones the fewer stringers first.
 *
 * Every candidate is in exactly one group, so whoever stops after a whole group has missed none that weighs or costs less.
 */
export function groupsOf({ assessors, steels, measure }: SearchSpace): readonly Group[] {
  const byCount = gathered(assessors, ({ layout }) => layout.count);
  const byMeasure = gathered(steels, ({ shape }) => measure(shape));
  const groups: Group[] = [];
  for (const [count, ofCount] of byCount) {
    for (const [perStringer, ofMeasure] of byMeasure) {
      groups.push({ measurePerFt: perStringer * (count ?? 1), count, steels: ofMeasure, assessors: ofCount });
    }
  }
  return groups.sort((a, b) => a.measurePerFt - b.measurePerFt || (a.count ?? 1) - (b.count ?? 1));
}

/** Whether a shape stands under a layout's deck: flanges do not overlap, and the outer one does not reach beyond the edge. */
export function stands({ overhangFt, spacingFt }: Layout, { shape }: Steel): boolean {
  const widthFt = shape.flangeWidthIn / IN_PER_FT;
  return spacingFt >= widthFt - 1e-9 && (overhangFt === null || overhangFt >= widthFt / 2 - 1e-9);
}

/** Whether a candidate can be at all: it stands, and the stock has as many pieces as the layout has stringers. */
export function feasible(layout: Layout, steel: Steel): boolean {
  return stands(layout, steel) && suffices(layout, steel);
}

/** Whether the stock has as many pieces as a layout has stringers. */
function suffices({ count }: Layout, { shape }: Steel): boolean {
  const quantity = shape.stock?.quantity ?? null;
  return count === null || quantity === null || quantity >= count;
}

function gathered<T, K>(items: readonly T[], keyOf: (item: T) => K): Map<K, T[]> {
  const groups = new Map<K, T[]>();
  for (const item of items) {
    const group = groups.get(keyOf(item));
    if (group === undefined) groups.set(keyOf(item), [item]);
    else group.push(item);
  }
  return groups;
}
