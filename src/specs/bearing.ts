import type { ShapeFigures } from "../catalogue/shape.js";
import { formula, type Recorder } from "../formula.js";
import { STEEL_MODULUS_KSI } from "../units.js";

/** Web yielding over an end bearing, phi = 1.0. Source: AASHTO LRFD, 9th ed., Art. D6.5.2. */
export const webYielding = formula(
  "Rwy",
  "(2.5 * kdes + N) * Fy * tw",
  "kip",
  "D6.5.2",
  ["kdes", "N", "Fy", "tw"],
  (kdes: number, N: number, Fy: number, tw: number) => (2.5 * kdes + N) * Fy * tw,
);
/** Web crippling over an end bearing, N/d <= 0.2, phi = 0.80. Source: AASHTO LRFD, 9th ed., Art. D6.5.3. */
export const webCripplingShort = formula(
  "Rwc",
  "0.80 * 0.4 * tw^2 * sqrt(E * Fy * tf / tw) * (1 + 3 * (N / d) * (tw / tf)^1.5)",
  "kip",
  "D6.5.3",
  ["tw", "E", "Fy", "tf", "N", "d"],
  (tw: number, E: number, Fy: number, tf: number, N: number, d: number) =>
    0.8 * 0.4 * tw ** 2 * Math.sqrt((E * Fy * tf) / tw) * (1 + 3 * (N / d) * (tw / tf) ** 1.5),
);
/** The same, N/d > 0.2. Source: AASHTO LRFD, 9th ed., Art. D6.5.3. */
export const webCripplingLong = formula(
  "Rwc",
  "0.80 * 0.4 * tw^2 * sqrt(E * Fy * tf / tw) * (1 + (4 * N / d - 0.2) * (tw / tf)^1.5)",
  "kip",
  "D6.5.3",
  ["tw", "E", "Fy", "tf", "N", "d"],
  (tw: number, E: number, Fy: number, tf: number, N: number, d: number) =>
    0.8 * 0.4 * tw ** 2 * Math.sqrt((E * Fy * tf) / tw) * (1 + ((4 * N) / d - 0.2) * (tw / tf) ** 1.5),
);

/** Bearing length over depth at which the crippling formula changes. Source: AASHTO LRFD, 9th ed., Art. D6.5.3. */
const SHORT_BEARING = 0.2;

/**
 * Reaction that a web takes over an end bearing without stiffeners, kip.
 *
 * @param N bearing length along the span, in; > 0
 * Source: AASHTO LRFD, 9th ed., Art. D6.5.
 */
export function webAtBearingKip(shape: ShapeFigures, Fy: number, N: number, recorder: Recorder | null): number {
  const { kDesignIn: k, webThicknessIn: tw, flangeThicknessIn: tf, depthIn: d } = shape;
  const yielding = webYielding.of(k, N, Fy, tw);
  recorder?.step(webYielding, yielding, k, N, Fy, tw);
  const rule = N / d <= SHORT_BEARING ? webCripplingShort : webCripplingLong;
  const crippling = rule.of(tw, STEEL_MODULUS_KSI, Fy, tf, N, d);
  recorder?.step(rule, crippling, tw, STEEL_MODULUS_KSI, Fy, tf, N, d);
  return Math.min(yielding, crippling);
}

/**
 * Bearing length at which the web takes a reaction without stiffeners, in; 0 when any length does.
 *
 * @param reactionKip factored reaction, kip
 * Source: AASHTO LRFD, 9th ed., Art. D6.5, turned round.
 */
export function bearingLengthNeededIn(shape: ShapeFigures, Fy: number, reactionKip: number): number {
  const { kDesignIn: k, webThicknessIn: tw, flangeThicknessIn: tf, depthIn: d } = shape;
  const forYielding = reactionKip / (Fy * tw) - 2.5 * k;
  const r = (tw / tf) ** 1.5;
  const base = webCripplingShort.of(tw, STEEL_MODULUS_KSI, Fy, tf, 0, d);
  const beyond = reactionKip / base - 1;
  const short = (beyond * d) / (3 * r);
  const forCrippling = short <= SHORT_BEARING * d ? short : (d * (beyond / r + 0.2)) / 4;
  return Math.max(0, forYielding, forCrippling);
}
