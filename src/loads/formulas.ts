import { formula } from "../formula.js";

/** Moment under one axle of a train on a simple span. Source: statics. */
export const momentUnderAxle = formula(
  "MLL",
  "R * (L - x - e) / L * x - Me",
  "kip-ft",
  "statics",
  ["R", "L", "x", "e", "Me"],
  (R: number, L: number, x: number, e: number, Me: number) => ((R * (L - x - e)) / L) * x - Me,
);

/** The same with a uniform load over the whole span in it. Source: statics. */
export const momentUnderAxleAndLane = formula(
  "MLL",
  "R * (L - x - e) / L * x - Me + wl * x * (L - x) / 2",
  "kip-ft",
  "statics",
  ["R", "L", "x", "e", "Me", "wl"],
  (R: number, L: number, x: number, e: number, Me: number, wl: number) => ((R * (L - x - e)) / L) * x - Me + (wl * x * (L - x)) / 2,
);

/** Moment at midspan of a uniform lane load with one concentrated load. Source: statics. */
export const laneMoment = formula(
  "MLL",
  "wl * L^2 / 8 + Pl * L / 4",
  "kip-ft",
  "statics",
  ["wl", "L", "Pl"],
  (wl: number, L: number, Pl: number) => (wl * L * L) / 8 + (Pl * L) / 4,
);

/**
 * Impact fraction of the live load on a simple span.
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.8.2.1.
 */
export const impactFraction = formula("I", "min(0.30, 50 / (L + 125))", "-", "3.8.2.1", ["L"], (L: number) =>
  Math.min(0.3, 50 / (L + 125)),
);
