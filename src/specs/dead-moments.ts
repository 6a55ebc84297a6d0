import { formula } from "../formula.js";

const uniformMoment = (symbol: string, load: string) =>
  formula(symbol, `${load} * L^2 / 8`, "kip-ft", "statics", [load, "L"], (w: number, L: number) => (w * L * L) / 8);
/** Moments of the stages at midspan. Source: statics. */
export const momentStage1 = uniformMoment("M1", "w1");
export const momentStage2 = uniformMoment("M2", "w2");
export const momentWearing = uniformMoment("Mw", "ww");
/** All dead shear at the bearing. Source: statics. */
export const deadShear = formula(
  "VD",
  "(w1 + w2 + ww) * L / 2",
  "kip",
  "statics",
  ["w1", "w2", "ww", "L"],
  (w1: number, w2: number, ww: number, L: number) => ((w1 + w2 + ww) * L) / 2,
);
