import type { Grade } from "../bridge/bridge.js";
import { GRADE_YIELD_KSI, type Steel } from "../bridge/yield-stress.js";
import type { Option } from "../ranking/rank.js";
import { type Assessment, assessInFull } from "./assessment.js";
import type { Prepared } from "./question.js";
import { checkVariant, lightestVariant } from "./variant.js";

/** A single change to the bridge, as data. */
export type Change =
  | { readonly code: "diaphragms"; readonly spacingFt: number }
  | { readonly code: "held" }
  | { readonly code: "spacing"; readonly spacingFt: number }
  | { readonly code: "one-more"; readonly count: number; readonly spacingFt: number }
  | { readonly code: "grade"; readonly grade: Grade }
  | { readonly code: "deflection-reported" };

/** The change by which a lighter shape would pass. */
export interface Rescue {
  readonly change: Change;
  readonly assessment: Assessment;
  /** Whether the steel of the whole bridge then weighs, or ranked by cost costs, less than the answer's. */
  readonly lighterThanAnswer: boolean;
}

/** Diaphragms closer than this are not offered, ft. Source: common practice. */
const CLOSEST_DIAPHRAGMS_FT = 10;

/**
 * The first single change that lets a shape pass: closer diaphragms, top flange held, a spacing step less, one stringer more, the next
 * grade, deflection only reported.
 *
 * @param steel a lighter shape that fails on the winner's layout
 * @returns null when no one change is enough
 */
export function rescue(prepared: Prepared, winner: Option, steel: Steel): Rescue | null {
  for (const attempt of attempts(prepared, winner, steel)) {
    const found = attempt();
    if (found?.assessment.passes !== true) continue;
    const measurePerFt = prepared.space.measure(steel.shape) * (found.assessment.layout.count ?? 1);
    return { ...found, lighterThanAnswer: measurePerFt < winner.measurePerFt };
  }
  return null;
}

type Attempt = () => { readonly change: Change; readonly assessment: Assessment } | null;

function* attempts({ question, bridge }: Prepared, { layout }: Option, steel: Steel): Generator<Attempt> {
  const { count, spacingFt } = layout;
  const here = (changes: Readonly<Record<string, unknown>>, change: Change): Attempt => {
    return () => {
      const assessment = checkVariant(question, changes, steel, layout);
      return assessment === null ? null : { change, assessment };
    };
  };
  const bays = Math.round(bridge.spanFt / bridge.bracing.diaphragmSpacingFt);
  for (let more = bays + 1; bridge.spanFt / more >= CLOSEST_DIAPHRAGMS_FT; more++) {
    const closer = bridge.spanFt / more;
    yield here({ "bracing.diaphragmSpacingFt": closer }, { code: "diaphragms", spacingFt: closer });
  }
  if (bridge.bracing.topFlange === "diaphragms") yield here({ "bracing.topFlange": "held" }, { code: "held" });
  yield () => {
    const closer = Math.round((spacingFt - bridge.stringers.spacingStepFt) * 1e9) / 1e9;
    const assessment = closer > 0 ? checkVariant(question, {}, steel, { count, spacingFt: closer }) : null;
    return assessment === null || assessment.brokenLimits.length > 0
      ? null
      : { change: { code: "spacing", spacingFt: closer }, assessment };
  };
  if (count !== null) {
    yield () => {
      const found = lightestVariant(question, { "stringers.count": count + 1, ...free(bridge.stringers.spacingFt) }, steel);
      if (found === null || found.option.layout.broken.length > 0) return null;
      const { prepared, option } = found;
      const change = { code: "one-more", count: count + 1, spacingFt: option.layout.spacingFt } as const;
      return { change, assessment: assessInFull(prepared.bridge, option.assessor, option.steel) };
    };
  }
  const grade = (["36", "50"] as const).find((name) => GRADE_YIELD_KSI[name] > steel.fyKsi);
  if (grade !== undefined && steel.shape.yieldStressKsi === null) {
    yield here({ "steel.grade": grade, "steel.fyKsi": null }, { code: "grade", grade });
  }
  if (bridge.deflection.use === "enforce") yield here({ "deflection.use": "report" }, { code: "deflection-reported" });
}

/** With one stringer more an explicit spacing gives way to the grid. */
const free = (spacingFt: number | null): Readonly<Record<string, unknown>> => (spacingFt === null ? {} : { "stringers.spacingFt": null });
