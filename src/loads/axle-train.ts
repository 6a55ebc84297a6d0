import { requirePositive } from "../errors.js";
import { momentUnderAxle, momentUnderAxleAndLane } from "./formulas.js";

/** Axles of one vehicle in one lane, front to rear: whole axles, kip, and the distances between them, ft. */
export interface AxleTrain {
  readonly name: string;
  readonly axlesKip: readonly number[];
  /** One fewer than axles. */
  readonly spacingsFt: readonly number[];
  /** False for a train that plays no part in live-load deflection, such as the design tandem. */
  readonly deflection?: boolean;
}

/** Weight of a whole train, kip. */
export function grossWeightKip(train: AxleTrain): number {
  return train.axlesKip.reduce((sum, axle) => sum + axle, 0);
}

/** The same train driving the other way. */
export function reversed(train: AxleTrain): AxleTrain {
  return { ...train, axlesKip: train.axlesKip.toReversed(), spacingsFt: train.spacingsFt.toReversed() };
}

/** The same train with every axle multiplied. */
export function scaled(train: AxleTrain, factor: number): AxleTrain {
  return { ...train, axlesKip: train.axlesKip.map((axle) => axle * factor) };
}

/** Distance of each axle behind the first, ft. */
export function axlePlacesFt(train: AxleTrain): number[] {
  const places = [0];
  for (const spacing of train.spacingsFt) places.push((places.at(-1) as number) + spacing);
  return places;
}

/** A greatest moment with what a hand calculation of it needs. */
export interface GreatestMoment {
  readonly momentKipFt: number;
  /** Section of the moment, from the support the train's first axle stands nearer to, ft: the place of one axle. */
  readonly atFt: number;
  /** Resultant R of the axles on the span, kip. */
  readonly resultantKip: number;
  /** Place of the resultant minus place of the axle the moment stands under, ft. */
  readonly eccentricityFt: number;
  /** Moment of the axles before that axle about it, kip-ft. */
  readonly earlierAxlesKipFt: number;
}

/**
 * Absolute maximum moment of an axle train on a simple span, with a uniform load over the whole span if given.
 *
 * For each run of neighbouring axles on the span, and each axle of it, the resultant and the axle stand astride midspan; with a
 * uniform load w the axle stands where R(L - 2x - e)/L + w(L - 2x)/2 = 0. Axles off the span are left out. No stepping. One
 * direction serves: the train turned round gives the mirror image.
 *
 * @param train axles in one lane
 * @param spanFt bearing to bearing, ft
 * @param uniformKlf uniform load w over the whole span, kip/ft; its moment is in the result
 * @returns moment in kip-ft without impact
 * @throws {RangeError} if spanFt is not finite or not positive
 * Source: statics.
 */
export function greatestMoment(train: AxleTrain, spanFt: number, uniformKlf: number): GreatestMoment {
  requirePositive("spanFt", spanFt);
  const L = spanFt;
  const w = uniformKlf;
  const places = axlePlacesFt(train);
  let best: GreatestMoment = { momentKipFt: 0, atFt: L / 2, resultantKip: 0, eccentricityFt: 0, earlierAxlesKipFt: 0 };
  for (let first = 0; first < places.length; first++) {
    let R = 0;
    let momentOfPlaces = 0;
    for (let last = first; last < places.length; last++) {
      R += train.axlesKip[last];
      momentOfPlaces += train.axlesKip[last] * places[last];
      let earlier = 0;
      for (let under = first; under <= last; under++) {
        if (under > first) earlier += sumBefore(train, first, under) * (places[under] - places[under - 1]);
        const e = momentOfPlaces / R - places[under];
        const x = ((R * (L - e)) / L + (w * L) / 2) / ((2 * R) / L + w);
        if (x - (places[under] - places[first]) < 0 || x + (places[last] - places[under]) > L) continue;
        const moment = w === 0 ? momentUnderAxle.of(R, L, x, e, earlier) : momentUnderAxleAndLane.of(R, L, x, e, earlier, w);
        if (moment > best.momentKipFt) {
          best = { momentKipFt: moment, atFt: x, resultantKip: R, eccentricityFt: e, earlierAxlesKipFt: earlier };
        }
      }
    }
  }
  return best;
}

function sumBefore(train: AxleTrain, first: number, under: number): number {
  let sum = 0;
  for (let axle = first; axle < under; axle++) sum += train.axlesKip[axle];
  return sum;
}

/**
 * Greatest moment at a section, kip-ft: some axle stands at it, whichever way the train drives.
 *
 * @param atFt section from a support, ft
 * Source: statics.
 */
export function greatestMomentAt(train: AxleTrain, spanFt: number, atFt: number): number {
  requirePositive("spanFt", spanFt);
  const x = atFt;
  const L = spanFt;
  return greatestWithAxleAt(train, x, (a) => (a < 0 || a > L ? 0 : a <= x ? (a * (L - x)) / L : (x * (L - a)) / L));
}

/**
 * Greatest shear at a section, kip, as a magnitude: some axle stands at it, whichever way the train drives.
 *
 * @param atFt section from a support, ft; at 0 it is the end shear
 * Source: statics.
 */
export function greatestShearAt(train: AxleTrain, spanFt: number, atFt: number): number {
  requirePositive("spanFt", spanFt);
  const L = spanFt;
  const towards = (x: number): number => greatestWithAxleAt(train, x, (a) => (a < 0 || a > L ? 0 : a >= x ? (L - a) / L : -a / L));
  return Math.max(towards(atFt), towards(L - atFt));
}

/** The greatest sum of axle times influence over all places of the train with some axle at x. */
function greatestWithAxleAt(train: AxleTrain, x: number, influence: (a: number) => number): number {
  let best = 0;
  for (const driven of [train, reversed(train)]) {
    const places = axlePlacesFt(driven);
    for (const at of places) {
      let sum = 0;
      for (let axle = 0; axle < places.length; axle++) sum += driven.axlesKip[axle] * influence(x + (places[axle] - at));
      best = Math.max(best, sum);
    }
  }
  return best;
}

/** A train with one axle over the support: that axle, and what the others add to the end shear. */
export interface EndPlace {
  readonly axleOverSupportKip: number;
  /** Sum of P (L - a)/L of the axles farther in, kip. */
  readonly othersKip: number;
}

/**
 * Every place of a train with an axle over the support, both ways.
 *
 * Source: statics; needed apart for AASHTO Standard Specifications, 17th ed., Art. 3.23.1.2.
 */
export function endPlaces(train: AxleTrain, spanFt: number): EndPlace[] {
  requirePositive("spanFt", spanFt);
  const result: EndPlace[] = [];
  for (const driven of [train, reversed(train)]) {
    const places = axlePlacesFt(driven);
    places.forEach((at, over) => {
      let others = 0;
      for (let axle = over + 1; axle < places.length; axle++) {
        const a = places[axle] - at;
        if (a < spanFt) others += (driven.axlesKip[axle] * (spanFt - a)) / spanFt;
      }
      result.push({ axleOverSupportKip: driven.axlesKip[over], othersKip: others });
    });
  }
  return result;
}

/**
 * Greatest deflection at a section times EI, kip-ft3.
 *
 * The deflection under a moving train is a cubic of its place between the places at which an axle stands at a support or at the
 * section; each piece is maximised exactly.
 *
 * @param atFt section from a support, ft
 * @returns EI times the deflection, downward positive; divide by E I (ksi in4) and multiply by 1728 for inches
 * Source: statics (superposition of P b x (L^2 - b^2 - x^2)/6 E I L).
 */
export function greatestDeflectionAt(train: AxleTrain, spanFt: number, atFt: number): number {
  requirePositive("spanFt", spanFt);
  const L = spanFt;
  let best = 0;
  for (const driven of [train, reversed(train)]) {
    const places = axlePlacesFt(driven);
    const front = (place: number): number =>
      places.reduce((sum, behind, axle) => sum + driven.axlesKip[axle] * deflectionInfluence(place - behind, atFt, L), 0);
    const breaks = places.flatMap((behind) => [behind, behind + atFt, behind + L]).sort((a, b) => a - b);
    for (let piece = 0; piece + 1 < breaks.length; piece++) {
      best = Math.max(best, greatestOfCubic(front, breaks[piece], breaks[piece + 1]));
    }
  }
  return best;
}

/** EI times the deflection at x of 1 kip at a, ft3; nothing when a is off the span. */
function deflectionInfluence(a: number, x: number, L: number): number {
  if (a <= 0 || a >= L) return 0;
  const [near, far] = x <= a ? [x, L - a] : [L - x, a];
  return (far * near * (L * L - far * far - near * near)) / (6 * L);
}

/** Greatest value of a cubic on a closed piece: at its ends or where its slope, a quadratic found from four values, is zero. */
function greatestOfCubic(cubic: (place: number) => number, from: number, to: number): number {
  const h = (to - from) / 3;
  const y0 = cubic(from);
  const y3 = cubic(to);
  let best = Math.max(y0, y3);
  if (h <= 0) return best;
  const y1 = cubic(from + h);
  const y2 = cubic(from + 2 * h);
  const c3 = (y3 - 3 * y2 + 3 * y1 - y0) / 6;
  const c2 = (y2 - 2 * y1 + y0) / 2 - 3 * c3;
  const c1 = y1 - y0 - c2 - c3;
  const [A, B, C] = [3 * c3, 2 * c2, c1];
  const root = Math.sqrt(Math.max(0, B * B - 4 * A * C));
  for (const t of [(-B + root) / (2 * A), (-B - root) / (2 * A), -C / B]) {
    if (t > 0 && t < 3) best = Math.max(best, cubic(from + t * h));
  }
  return best;
}
