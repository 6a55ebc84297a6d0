// Above these counts of trucks a stringer must last for ever, below them for 75 years only: a threshold too high would let a busy road's
// stringer crack.
// AASHTO LRFD Bridge Design Specifications, Table 6.6.1.2.3-2, 75-year (ADTT)SL equivalent to infinite life, 1.75 and 0.80 (from memory;
// printed to the nearest five).
import { expect, it } from "vitest";
import { infiniteLifeAdtt, lrfdFatigueCase } from "../../src/specs/lrfd/fatigue.js";

const ROUNDING = 2.5;

it.each([
  ["A", 690],
  ["B", 1120],
  ["C", 1680],
  ["C'", 975],
] as const)("detail %s: %i trucks a day", (detail, printed) => {
  expect(Math.abs(infiniteLifeAdtt(detail) - printed)).toBeLessThanOrEqual(ROUNDING);
  expect(lrfdFatigueCase(detail, printed + ROUNDING).limitState).toBe("Fatigue I");
  expect(lrfdFatigueCase(detail, printed - ROUNDING).limitState).toBe("Fatigue II");
});
