// Fatigue often decides the exterior stringer: a road of 2,500 trucks a day checked for 500,000 cycles gets a stringer a fifth too light
// in its weakest weld. Cycles by truck traffic: AASHTO Standard Specifications, 17th ed., Table 10.3.2A; ranges Table 10.3.1A
// (from memory); 100,000 cycles below 100 trucks a day: common practice.
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import { allowedRanges, fatigueCase, NONREDUNDANT_RANGES_KSI, REDUNDANT_RANGES_KSI } from "../../../../src/specs/lfd/fatigue.js";
import { preparedOf } from "../../../support/question.js";

const RANGES = REDUNDANT_RANGES_KSI["C-stiffener"];

describe("cycles by trucks a day", () => {
  it.each([
    [0, "100,000", 35.5, null],
    [99, "100,000", 35.5, null],
    [99.9, "100,000", 35.5, null],
    [100, "500,000", 21, null],
    [2499, "500,000", 21, null],
    [2499.9, "500,000", 21, null],
    [2500, "2,000,000", 13, 12],
    [50000, "2,000,000", 13, 12],
    [null, "2,000,000", 13, 12],
  ] as const)("%s a day: %s cycles", (adtt, cycles, allowedKsi, oneLaneAllowedKsi) => {
    expect(fatigueCase(adtt, RANGES)).toEqual({ allowedKsi, oneLaneAllowedKsi, cycles });
  });
});

describe("allowed ranges", () => {
  it.each([
    ["A", [63, 37, 24, 24]],
    ["B", [49, 29, 18, 16]],
    ["B'", [39, 23, 14.5, 12]],
    ["C", [35.5, 21, 13, 10]],
    ["C-stiffener", [35.5, 21, 13, 12]],
    ["D", [28, 16, 10, 7]],
    ["E", [22, 13, 8, 4.5]],
  ] as const)("detail %s of redundant load paths", (detail, ranges) => {
    expect(allowedRanges(detail, 3)).toEqual(ranges);
    expect(allowedRanges(detail, 12)).toEqual(ranges);
    expect(allowedRanges(detail, null)).toEqual(ranges);
  });

  it("two stringers are nonredundant: no range above the redundant one, and none above that of fewer cycles", () => {
    for (const detail of ["A", "B", "B'", "C", "C-stiffener", "D", "E"] as const) {
      const two = allowedRanges(detail, 2);
      expect(two).toEqual(NONREDUNDANT_RANGES_KSI[detail]);
      two.forEach((range, place) => {
        expect(range).toBeLessThanOrEqual(REDUNDANT_RANGES_KSI[detail][place]);
        if (place > 0) expect(range).toBeLessThanOrEqual(two[place - 1]);
      });
      expect(two[0]).toBeLessThan(REDUNDANT_RANGES_KSI[detail][0]);
    }
  });
});

describe("through the whole assessment", () => {
  const bridge = {
    specification: "lfd",
    "deck.composite": false,
    spanFt: 60,
    "deck.outToOutFt": 33,
    "stringers.count": 5,
    "stringers.spacingFt": 7,
  };
  const fatigueOf = (change: Readonly<Record<string, unknown>>) => {
    const { stringers } = check(preparedOf({ ...bridge, ...change }), "W36X150").assessment;
    return stringers.map(({ position, checks }) => ({ position, ...checks.find(({ id }) => id === "fatigue") }));
  };
  // HS20 truck, absolute maximum 18 L - 280 + 392/L; impact 50/(L + 125); S of W36X150 504 in3.
  const truck = 18 * 60 - 280 + 392 / 60;
  const rangeOf = (factor: number) => (((12 * truck) / 2) * factor * (1 + 50 / 185)) / 504;
  // Interior: S/5.5 and one lane S/7. Exterior: de 1 ft, reach 8 ft: wheels 2 and 8 ft from the curb, lever rule 6/7; floor 7/(4 + 0.25 x 7).
  const [interior, oneLaneInterior] = [7 / 5.5, 7 / 7];
  const [exterior, oneLaneExterior] = [7 / (4 + 0.25 * 7), 6 / 7];

  it.each([
    [0, 35.5],
    [99, 35.5],
    [100, 21],
    [2499, 21],
  ])("%i trucks a day: the stringer's own factor against %f ksi", (adtt, allowed) => {
    const checks = fatigueOf({ "liveLoad.adtt": adtt });
    expect(checks.map(({ capacity }) => capacity)).toEqual([allowed, allowed]);
    expect(checks[0].demand).toBeCloseTo(rangeOf(interior), 9);
    expect(checks[1].demand).toBeCloseTo(rangeOf(exterior), 9);
  });

  it.each([2500, null])("%s trucks a day: also one lane loaded against the range for more cycles, and the worse of both counts", (adtt) => {
    const checks = fatigueOf({ "liveLoad.adtt": adtt });
    // With C-stiffener 13 and 12: interior 1.273/13 against 1/12, exterior 1.217/13 against 0.857/12: all lanes govern both.
    expect(checks[0].ratio).toBeCloseTo(Math.max(rangeOf(interior) / 13, rangeOf(oneLaneInterior) / 12), 10);
    expect(checks[1].ratio).toBeCloseTo(Math.max(rangeOf(exterior) / 13, rangeOf(oneLaneExterior) / 12), 10);
    // With detail E 8 and 4.5 one lane governs both.
    const detailE = fatigueOf({ "liveLoad.adtt": adtt, "liveLoad.fatigueDetail": "E" });
    expect(detailE.map(({ capacity }) => capacity)).toEqual([4.5, 4.5]);
    expect(detailE[0].demand).toBeCloseTo(rangeOf(oneLaneInterior), 9);
    expect(detailE[1].demand).toBeCloseTo(rangeOf(oneLaneExterior), 9);
  });

  it("the truck is HS20's whatever the design vehicle, and never the lane loading", () => {
    const own = fatigueOf({ "liveLoad.adtt": 500 }).map(({ demand }) => demand);
    expect(fatigueOf({ "liveLoad.adtt": 500, "liveLoad.vehicle": "HS25" }).map(({ demand }) => demand)).toEqual(own);
    expect(fatigueOf({ "liveLoad.adtt": 500, "liveLoad.vehicle": "H15-44" }).map(({ demand }) => demand)).toEqual(own);
    const long = fatigueOf({ "liveLoad.adtt": 500, spanFt: 150 });
    expect(long[0].demand).toBeCloseTo((((((12 * (18 * 150 - 280 + 392 / 150)) / 2) * 7) / 5.5) * (1 + 50 / 275)) / 504, 9);
  });
});
