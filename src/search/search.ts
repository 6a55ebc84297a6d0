import type { Layout } from "../bridge/layouts.js";
import type { Steel } from "../bridge/yield-stress.js";
import type { Assessor, Design, Specification } from "../specs/contract.js";
import { IN_PER_FT } from "../units.js";

/** Candidates of equal steel weight and count: one shape weight on every layout of one count. */
export interface Group {
  /** Steel weight per foot of bridge, lb/ft: count times shape; the shape alone when the count is unknown. */
  readonly steelPlf: number;
  readonly count: number | null;
  readonly steels: readonly Steel[];
  readonly assessors: readonly Assessor[];
}

/** All that a question can be answered from: every layout prepared, every shape with its steel. */
export interface SearchSpace {
  readonly assessors: readonly Assessor[];
  readonly steels: readonly Steel[];
}

/** Prepares every layout once; what a bridge and a layout fix is worked out here and not again for each shape. */
export function searchSpace(
  specification: Specification,
  design: Design,
  layouts: readonly Layout[],
  steels: readonly Steel[],
): SearchSpace {
  return { assessors: layouts.map((layout) => specification.prepare(design, layout)), steels };
}

/**
 * Candidates in groups of rising steel weight, and of equal weights the fewer stringers first.
 *
 * Every candidate is in exactly one group, so whoever stops after a whole group has missed none that weighs less.
 */
export function groupsByWeight({ assessors, steels }: SearchSpace): readonly Group[] {
  const byCount = gathered(assessors, ({ layout }) => layout.count);
  const byWeight = gathered(steels, ({ shape }) => shape.weightPlf);
  const groups: Group[] = [];
  for (const [count, ofCount] of byCount) {
    for (const [weightPlf, ofWeight] of byWeight) {
      groups.push({ steelPlf: weightPlf * (count ?? 1), count, steels: ofWeight, assessors: ofCount });
    }
  }
  return groups.sort((a, b) => a.steelPlf - b.steelPlf || (a.count ?? 1) - (b.count ?? 1));
}

/** Whether a shape stands under a layout's deck: the outer flange does not reach beyond the edge. */
export function stands({ overhangFt }: Layout, { shape }: Steel): boolean {
  return overhangFt === null || overhangFt >= shape.flangeWidthIn / 2 / IN_PER_FT - 1e-9;
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
