import type { Layout } from "../bridge/layouts.js";
import type { Steel } from "../bridge/yield-stress.js";
import type { Shape } from "../catalogue/shape.js";
import { InputError } from "../errors.js";
import { type Option, rank } from "../ranking/rank.js";
import { stands } from "../search/search.js";
import { type Assessment, assessInFull } from "./assessment.js";
import { type Prepared, prepare, type Question } from "./question.js";

/** Values by dotted key that a variant changes. */
export type Changes = Readonly<Record<string, unknown>>;

/** The question with some keys changed and, if given, one shape alone; null when such a bridge cannot be. */
export function prepareVariant(question: Question, changes: Changes, steel: Steel | null): Prepared | null {
  try {
    const varied = question.vary(changes);
    return prepare(steel === null ? varied : { ...varied, shapes: [asListed(question, steel)] });
  } catch (error) {
    if (error instanceof InputError) return null;
    throw error;
  }
}

/** The shape as its list gives it: what it has lost is taken off anew when the variant is prepared. */
function asListed({ shapes }: Question, { shape }: Steel): Shape {
  return shapes.find(({ designation }) => designation === shape.designation) ?? shape;
}

/** One shape on one layout of a changed bridge, as `check` would answer it; null when that cannot be. */
export function checkVariant(
  question: Question,
  changes: Changes,
  steel: Steel,
  layout: Pick<Layout, "count" | "spacingFt">,
): Assessment | null {
  const fixed = { ...changes, "stringers.spacingFt": layout.spacingFt, ...(layout.count !== null && { "stringers.count": layout.count }) };
  const prepared = prepareVariant(question, fixed, steel);
  const [assessor] = prepared?.space.assessors ?? [];
  const [varied] = prepared?.space.steels ?? [];
  if (prepared === null || assessor === undefined || varied === undefined || !stands(assessor.layout, varied)) return null;
  return assessInFull(prepared.bridge, assessor, varied);
}

/** The lightest option of a changed bridge, over all shapes or one alone; null when none passes or the bridge cannot be. */
export function lightestVariant(
  question: Question,
  changes: Changes,
  steel: Steel | null,
): { readonly prepared: Prepared; readonly option: Option } | null {
  const prepared = prepareVariant(question, changes, steel);
  const [option] = prepared === null ? [] : rank(prepared.space, 1);
  return prepared === null || option === undefined ? null : { prepared, option };
}
