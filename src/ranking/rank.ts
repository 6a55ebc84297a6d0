import type { Steel } from "../bridge/yield-stress.js";
import { feasible, type Group, groupsOf, type SearchSpace } from "../search/search.js";
import type { Assessor } from "../specs/contract.js";
import { byPreference, type Ranked } from "./order.js";

/** A shape on its best layout of one count, and the spacings over which it passes there. */
export interface Option extends Ranked {
  readonly assessor: Assessor;
  /** Least and greatest of the neighbouring spacings, the shown one among them, at all of which the shape passes, ft. */
  readonly spacingRangeFt: readonly [number, number];
}

/**
 * The best options that pass, at most one per count and shape, in the total order.
 *
 * Groups are pulled by rising measure, the first key of the order; once enough options stand when the measure rises, no candidate left can
 * come before them, so nothing skipped can change the answer.
 *
 * @param space layouts and shapes
 * @param top options wanted, 1 or more
 */
export function rank(space: SearchSpace, top: number): readonly Option[] {
  const options: Option[] = [];
  let measurePerFt = 0;
  for (const group of groupsOf(space)) {
    if (group.measurePerFt !== measurePerFt && options.length >= top) break;
    measurePerFt = group.measurePerFt;
    options.push(...passingOf(group));
  }
  return options.sort(byPreference).slice(0, top);
}

function passingOf(group: Group): Option[] {
  return group.steels.flatMap((steel) => {
    const option = bestLayout(group, steel);
    return option === null ? [] : [option];
  });
}

/** The best layout of one count that a shape passes on, or null. */
function bestLayout({ assessors, measurePerFt }: Group, steel: Steel): Option | null {
  let best: Option | null = null;
  for (let index = 0; index < assessors.length; index++) {
    const assessor = assessors[index];
    if (!passesOn(assessor, steel)) continue;
    const { layout, governingRatio } = assessor;
    const option = { steel, layout, governingRatio, measurePerFt, assessor, spacingRangeFt: [layout.spacingFt, layout.spacingFt] as const };
    if (best === null || byPreference(option, best) < 0) best = option;
  }
  return best === null ? null : { ...best, spacingRangeFt: passingRange(assessors, best) };
}

function passesOn(assessor: Assessor, steel: Steel): boolean {
  return feasible(assessor.layout, steel) && assessor.screen(steel);
}

/** Least and greatest of the neighbouring spacings at which the option's shape passes. */
function passingRange(assessors: readonly Assessor[], { assessor, steel }: Option): readonly [number, number] {
  let first = assessors.indexOf(assessor);
  let last = first;
  while (first > 0 && passesOn(assessors[first - 1], steel)) first--;
  while (last + 1 < assessors.length && passesOn(assessors[last + 1], steel)) last++;
  return [assessors[first].layout.spacingFt, assessors[last].layout.spacingFt];
}

/** The candidate nearest to passing: the smallest governing ratio, then the total order; null when no shape stands under the deck. */
export function nearestMiss({ assessors, steels, measure }: SearchSpace): { readonly steel: Steel; readonly assessor: Assessor } | null {
  let nearest: (Ranked & { readonly assessor: Assessor }) | null = null;
  for (const assessor of assessors) {
    for (const steel of steels) {
      if (!feasible(assessor.layout, steel)) continue;
      assessor.assess(steel, null);
      const ratio = assessor.governingRatio;
      if (nearest !== null && ratio > nearest.governingRatio) continue;
      const measurePerFt = measure(steel.shape) * (assessor.layout.count ?? 1);
      const ranked = { steel, layout: assessor.layout, governingRatio: ratio, measurePerFt, assessor };
      if (nearest === null || ratio < nearest.governingRatio || byPreference(ranked, nearest) < 0) nearest = ranked;
    }
  }
  return nearest;
}
