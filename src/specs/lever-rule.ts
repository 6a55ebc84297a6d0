import { type Formula, formula } from "../formula.js";

/** Distance between the wheels of a truck, and between the wheels of trucks side by side, ft. Source: AASHTO Standard Specifications, 17th ed., Fig. 3.7.7A; LRFD 9th ed., Art. 3.6.1.2.2, 3.6.1.3.1. */
const WHEEL_GAUGE_FT = 6;
const BETWEEN_TRUCKS_FT = 4;
/** Outer wheel from the curb, ft. */
const WHEEL_FROM_CURB_FT = 2;

/** Places of the wheels of trucks side by side from the first, ft. */
function wheelsFt(trucks: number): number[] {
  return Array.from({ length: trucks }, (_, truck) => truck * (WHEEL_GAUGE_FT + BETWEEN_TRUCKS_FT)).flatMap((at) => [
    at,
    at + WHEEL_GAUGE_FT,
  ]);
}

/** Factor on the live load for a number of loaded lanes. */
export type LaneFactor = (lanes: number) => number;

/** Wheel lines that reach one stringer by the lever rule, and where the wheels stand. */
export interface LeverArrangement {
  /** Wheel lines, lane factor in it; half of it is lanes. */
  readonly factor: number;
  readonly reduction: number;
  readonly trucks: number;
  /** Distance of each wheel that counts: from the stringer (interior) or from the curb (exterior), ft. */
  readonly distancesFt: readonly number[];
}

/**
 * Lever rule for an interior stringer, wheel lines: the deck simply supported between stringers, curbs ignored (conservative).
 *
 * The greatest over 1 to `mostTrucks` trucks side by side, each number with its lane factor, of the sum of a triangular influence line
 * over the adjacent bays; the row of wheels is tried with each wheel at each break of that line, where the greatest must lie.
 *
 * @param spacingFt S, ft; > 0
 * @param mostTrucks trucks side by side at most, 1 or more
 * Source: AASHTO Standard Specifications, 17th ed., Table 3.23.1 note f, Art. 3.23.1.2; LRFD 9th ed., Art. C4.6.2.2.1; statics.
 */
export function leverRuleInterior(spacingFt: number, mostTrucks: number, laneFactor: LaneFactor): LeverArrangement {
  const S = spacingFt;
  let best = { factor: 0, reduction: 1, trucks: 0, shift: 0 };
  for (let trucks = 1; trucks <= mostTrucks; trucks++) {
    const wheels = wheelsFt(trucks);
    const reduction = laneFactor(trucks);
    for (const wheel of wheels) {
      for (let side = -1; side <= 1; side++) {
        const shift = side * S - wheel;
        const factor = reduction * triangleSum(wheels, shift, S);
        if (factor > best.factor) best = { factor, reduction, trucks, shift };
      }
    }
  }
  const distancesFt = wheelsFt(best.trucks)
    .map((wheel) => Math.abs(wheel + best.shift))
    .filter((distance) => distance < S);
  return { factor: best.factor, reduction: best.reduction, trucks: best.trucks, distancesFt };
}

/** Sum over the wheels of a triangle of height 1 over the stringer and 0 at its neighbours. */
function triangleSum(wheels: readonly number[], shift: number, S: number): number {
  let sum = 0;
  for (const wheel of wheels) {
    const distance = Math.abs(wheel + shift);
    if (distance < S) sum += (S - distance) / S;
  }
  return sum;
}

/**
 * Lever rule for the exterior stringer, wheel lines: a straight line from 0 at the first interior stringer through 1 at the exterior
 * one and on over the overhang; trucks crowd to the curb.
 *
 * @param spacingFt S, ft; > 0
 * @param curbInsideFt de, web of the exterior stringer to the curb face, ft; positive when the web stands inside the curb
 * @param mostTrucks trucks side by side at most, 1 or more
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.2.3.1.2; LRFD 9th ed., Art. C4.6.2.2.1; statics.
 */
export function leverRuleExterior(spacingFt: number, curbInsideFt: number, mostTrucks: number, laneFactor: LaneFactor): LeverArrangement {
  let best: LeverArrangement = { factor: 0, reduction: laneFactor(1), trucks: 1, distancesFt: [] };
  const reach = spacingFt + curbInsideFt;
  for (let trucks = 1; trucks <= mostTrucks; trucks++) {
    const reduction = laneFactor(trucks);
    const distancesFt = wheelsFt(trucks)
      .map((wheel) => WHEEL_FROM_CURB_FT + wheel)
      .filter((distance) => distance < reach);
    const factor = reduction * distancesFt.reduce((sum, distance) => sum + (reach - distance) / spacingFt, 0);
    if (factor > best.factor) best = { factor, reduction, trucks, distancesFt };
  }
  return best;
}

/** How a specification writes the lever rule down: per wheel line, or per lane of two wheel lines. */
export interface LeverStyle {
  readonly article: string;
  readonly per: "wheel line" | "lane";
}

/** The interior lever rule as a formula for the record. */
export function leverInteriorFormula(symbol: string, style: LeverStyle, { distancesFt }: LeverArrangement): Formula {
  const names = distancesFt.map((_, wheel) => `d${wheel + 1}`);
  const sum = names.map((name) => `(S - ${name}) / S`).join(" + ");
  return leverFormula(
    symbol,
    style,
    ["m", "S", ...names],
    sum,
    (m, S, ...distances) => m * distances.reduce((total, distance) => total + (S - distance) / S, 0),
  );
}

/** The exterior lever rule as a formula for the record. */
export function leverExteriorFormula(symbol: string, style: LeverStyle, { distancesFt }: LeverArrangement): Formula {
  const names = distancesFt.map((_, wheel) => `p${wheel + 1}`);
  const sum = names.length === 0 ? "0" : names.map((name) => `(S + de - ${name}) / S`).join(" + ");
  return leverFormula(
    symbol,
    style,
    ["m", "S", "de", ...names],
    sum,
    (m, S, de, ...distances) => m * distances.reduce((total, distance) => total + (S + de - distance) / S, 0),
  );
}

function leverFormula(
  symbol: string,
  { article, per }: LeverStyle,
  given: string[],
  sum: string,
  wheelLines: (...numbers: number[]) => number,
): Formula {
  if (per === "wheel line") return formula(symbol, `m * (${sum})`, "wheel lines", article, given, wheelLines);
  return formula(symbol, `m * (${sum}) / 2`, "lanes", article, given, (...numbers: number[]) => wheelLines(...numbers) / 2);
}
