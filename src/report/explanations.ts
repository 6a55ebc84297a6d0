import type { Change } from "../answers/rescue.js";
import type { RestsOn } from "../answers/rests-on.js";
import { feetText, ratioText, shown } from "./numbers.js";
import { failingText, layoutText } from "./text/assessment-lines.js";

/** A single change in words: "diaphragms at 15.5 ft". */
export function changeText(change: Change): string {
  switch (change.code) {
    case "diaphragms":
      return `diaphragms at ${feetText(change.spacingFt)} ft`;
    case "held":
      return "top flange held";
    case "spacing":
      return `stringers at ${feetText(change.spacingFt)} ft`;
    case "one-more":
      return `${change.count} stringers at ${feetText(change.spacingFt)} ft`;
    case "grade":
      return `grade ${change.grade}`;
    case "deflection-reported":
      return "live-load deflection only reported";
  }
}

/** The assumption in force, in words. */
export function assumptionText({ key, value }: Pick<RestsOn, "key" | "value">): string {
  switch (key) {
    case "barriers.baseFt":
      return `barrier base ${feetText(Number(value))} ft`;
    case "steel.grade":
      return `grade ${value} steel`;
    case "liveLoad.adtt":
      return value === null ? "truck traffic not given, taken as heavy" : `${shown(Number(value))} trucks a day (ADTT)`;
    case "bracing.topFlange":
      return flangeText(value);
    case "deflection.use":
      return "live-load deflection enforced";
    default:
      return `${key} ${value}`;
  }
}

/** The other value, in words. */
export function flippedText({ key, flippedTo }: Pick<RestsOn, "key" | "flippedTo">): string {
  switch (key) {
    case "barriers.baseFt":
      return `a ${feetText(Number(flippedTo))} ft curb`;
    case "steel.grade":
      return `grade ${flippedTo} steel`;
    case "liveLoad.adtt":
      return `${shown(Number(flippedTo))} trucks a day`;
    case "bracing.topFlange":
      return flangeText(flippedTo);
    case "deflection.use":
      return "live-load deflection only reported";
    default:
      return `${key} ${flippedTo}`;
  }
}

const flangeText = (value: unknown): string => (value === "held" ? "the top flange held" : "the top flange braced by diaphragms alone");

/** What comes of flipping an assumption, a sentence. */
export function restsOnText(found: RestsOn, rankedBy: "weight" | "cost"): string {
  const { assessment, instead, outcome, lanes } = found;
  const because = lanes === null ? "" : ` the roadway carries ${lanes} lane${lanes === 1 ? "" : "s"}:`;
  const what = `With ${flippedText(found)} (now ${assumptionText(found)})${because}`;
  const at = (one: typeof assessment): string => `${layoutText(one)} ft, ${one.shape}`;
  if (outcome === "fails") {
    const then = instead === null ? "nothing passes then" : `first is then ${at(instead)} at ${ratioText(instead.governing.ratio)}`;
    return `${what} ${assessment.shape} fails: ${failingText(assessment)}; ${then}.`;
  }
  const lighter =
    outcome === "passes lighter" ? `a ${rankedBy === "cost" ? "cheaper" : "lighter"} option passes` : "another shape is first";
  return `${what} ${lighter}: ${at(assessment)} at ${ratioText(assessment.governing.ratio)}.`;
}
