import type { Bridge } from "../bridge/bridge.js";
import type { Steel } from "../bridge/yield-stress.js";
import { type Option, rank } from "../ranking/rank.js";
import { type Assessment, assessInFull } from "./assessment.js";
import type { Prepared } from "./question.js";
import { type Changes, checkVariant, prepareVariant } from "./variant.js";

/** An assumption that nobody stated, by its key, and the value in force. */
export interface RestsOn {
  readonly key: string;
  readonly value: string | number | null;
  readonly flippedTo: string | number;
  /** `passes lighter`: something lighter (ranked by cost, cheaper) passes; `fails`: the answer's candidate fails; `other shape`: another is first at no less weight. */
  readonly outcome: "passes lighter" | "fails" | "other shape";
  /** The failing candidate, or what is first then. */
  readonly assessment: Assessment;
  /** What would be first instead when the answer fails; null when nothing passes, or it does not fail. */
  readonly instead: Assessment | null;
  /** Lanes on the roadway with the flip, where that is what changed. */
  readonly lanes: number | null;
}

interface Flip {
  readonly key: string;
  readonly flippedTo: string | number;
  readonly changes: Changes;
}

/** A narrow curb, the weaker grade, light traffic: the plausible others of what is taken when nobody says. Source: common practice. */
const NARROW_CURB_FT = 0.5;
const LIGHT_TRAFFIC_ADTT = 1000;
const LIGHT_TRAFFIC_ADTT_SL = 500;
const HEAVY_TRAFFIC_ADTT = 5000;

/** Each assumption that the user did not state, flipped to its plausible other; only those that change the shape or fail it. */
export function restsOn(prepared: Prepared, answer: Option): readonly RestsOn[] {
  return flips(prepared.bridge, answer.steel).flatMap((flip) => {
    const found = flipped(prepared, answer, flip);
    return found === null ? [] : [found];
  });
}

function flips(bridge: Bridge, { shape }: Steel): Flip[] {
  const unstated = (key: string): boolean => bridge.sources[key] === "practice";
  const list: Flip[] = [];
  if (unstated("barriers.baseFt") && bridge.roadwayFt !== null && bridge.barriers.baseFt !== NARROW_CURB_FT) {
    list.push({ key: "barriers.baseFt", flippedTo: NARROW_CURB_FT, changes: { "barriers.baseFt": NARROW_CURB_FT } });
  }
  const ownSteel = shape.yieldStressKsi !== null || typeof shape.stock?.yearBuilt === "number";
  if (!ownSteel && unstated("steel.grade") && unstated("steel.fyKsi") && bridge.steel.grade !== "36") {
    list.push({ key: "steel.grade", flippedTo: "36", changes: { "steel.grade": "36" } });
  }
  if (unstated("liveLoad.adtt")) {
    const { adtt } = bridge.liveLoad;
    const light = bridge.specification === "lrfd" ? LIGHT_TRAFFIC_ADTT_SL : LIGHT_TRAFFIC_ADTT;
    const other = adtt === null || adtt > light ? light : HEAVY_TRAFFIC_ADTT;
    list.push({ key: "liveLoad.adtt", flippedTo: other, changes: { "liveLoad.adtt": other } });
  }
  if (unstated("bracing.topFlange") && !bridge.deck.composite) {
    const other = bridge.bracing.topFlange === "held" ? "diaphragms" : "held";
    list.push({ key: "bracing.topFlange", flippedTo: other, changes: { "bracing.topFlange": other } });
  }
  if (unstated("deflection.use") && bridge.deflection.use === "enforce") {
    list.push({ key: "deflection.use", flippedTo: "report", changes: { "deflection.use": "report" } });
  }
  return list;
}

function flipped({ question, bridge, space }: Prepared, answer: Option, { key, flippedTo, changes }: Flip): RestsOn | null {
  const { steel, layout } = answer;
  const variant = prepareVariant(question, changes, null);
  if (variant === null) return null;
  const same = checkVariant(question, changes, steel, layout);
  const [first] = rank({ ...variant.space, measure: space.measure }, 1);
  const firstInFull = first === undefined ? null : assessInFull(variant.bridge, first.assessor, first.steel);
  const [group, name] = key.split(".") as [keyof Bridge, string];
  const value = (bridge[group] as unknown as Record<string, string | number | null>)[name];
  const { lanes } = variant.bridge.liveLoad;
  const common = { key, value, flippedTo, lanes: lanes === bridge.liveLoad.lanes ? null : lanes };
  if (same !== null && !same.passes) return { ...common, outcome: "fails", assessment: same, instead: firstInFull };
  if (first === undefined || firstInFull === null) return null;
  if (first.measurePerFt < answer.measurePerFt) return { ...common, outcome: "passes lighter", assessment: firstInFull, instead: null };
  const sameShape = firstInFull.shape === steel.shape.designation && first.layout.count === layout.count;
  return sameShape ? null : { ...common, outcome: "other shape", assessment: firstInFull, instead: null };
}
