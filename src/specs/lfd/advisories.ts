import { formula } from "../../formula.js";

/** Least depth of a stringer. Source: AASHTO Standard Specifications, 17th ed., Art. 10.5.1. */
export const leastDepth = formula("dmin", "12 * L / 25", "in", "10.5.1", ["L"], (L: number) => (12 * L) / 25);
/** Least flange width of a piece that is handled, a span's length at a time. Source: common practice. */
export const leastFlangeWidth = formula(
  "bmin",
  "12 * (L + 2 * a) / 85",
  "in",
  "common practice",
  ["L", "a"],
  (L: number, a: number) => (12 * (L + 2 * a)) / 85,
);
/** Least thickness of a concrete deck. Source: AASHTO Standard Specifications, 17th ed., Art. 8.9.2. */
export const leastDeckThickness = formula("tmin", "12 * (S + 10) / 30", "in", "8.9.2", ["S"], (S: number) => (12 * (S + 10)) / 30);
