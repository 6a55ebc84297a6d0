// Impact is up to 30 % of every live-load effect: a limit met one foot too late, or a train's impact taken where none belongs, shifts
// every answer of the load factor design together, so that no comparison between stringers would show it.
import { describe, expect, it } from "vitest";
import { impactFraction, laneMoment } from "../../../src/loads/formulas.js";

describe("impact, 50/(L + 125) but at most 0.30", () => {
  it.each([
    [20, 0.3],
    [41.66, 0.3],
    [125 / 3, 0.3],
    [41.67, 50 / (41.67 + 125)],
    [60, 50 / 185],
    [100, 50 / 225],
  ])("at %f ft", (L, expected) => {
    expect(impactFraction.of(L)).toBeCloseTo(expected, 12);
  });

  it("meets its limit at 41 2/3 ft, not before and not after", () => {
    expect(impactFraction.of(41.67)).toBeLessThan(0.3);
    expect(50 / (41.66 + 125)).toBeGreaterThan(0.3);
  });
});

describe("the lane loading at midspan", () => {
  it("w L^2/8 + P L/4", () => {
    expect(laneMoment.of(0.64, 100, 18)).toBeCloseTo((0.64 * 100 ** 2) / 8 + (18 * 100) / 4, 10);
  });
});
