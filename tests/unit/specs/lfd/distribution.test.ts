// The share of a truck one stringer carries scales every live-load effect on it. One row of the table misread, or its limit met on the
// wrong side, and a whole kind of deck gets stringers too light with nothing odd to see.
// AASHTO Standard Specifications, 17th ed., Table 3.23.1, Art. 3.12.1, 3.23.2.3.1.5 (figures from memory).
import { describe, expect, it } from "vitest";
import type { Bridge, DeckKind } from "../../../../src/bridge/bridge.js";
import {
  type DistributionPlace,
  distributionRow,
  exteriorFactors,
  interiorFactors,
  laneReduction,
} from "../../../../src/specs/lfd/distribution.js";
import { questionOf } from "../../../support/question.js";
import { exteriorShare, interiorShare, searchedWheelLines } from "../../../support/wheel-search.js";

const LFD = { specification: "lfd", spanFt: 50, "deck.outToOutFt": 40 };
const CONCRETE = questionOf({ ...LFD, "deck.composite": false }).bridge;
const HAIR = 1e-6;

/** An invented bridge on a deck of a kind and thickness. */
function bridgeOn(kind: DeckKind, thicknessIn: number): Bridge {
  return { ...CONCRETE, deck: { ...CONCRETE.deck, kind, thicknessIn } };
}
const placeOf = (change: Partial<DistributionPlace>): DistributionPlace => ({
  spacingFt: 6,
  count: 5,
  curbInsideFt: 0,
  lanes: 2,
  mostTrucks: 2,
  ...change,
});
const interior = (kind: DeckKind, thicknessIn: number, spacingFt: number, lanes: number) =>
  interiorFactors(bridgeOn(kind, thicknessIn), placeOf({ spacingFt, lanes, mostTrucks: lanes }), null);

type Row = readonly [kind: DeckKind, thicknessIn: number, one: number, oneToFt: number | null, more: number, moreToFt: number | null];
// Each row at its least thickness and just under its greatest; null where S over the divisor has no limit.
const ROWS: readonly Row[] = [
  ["concrete", 8.5, 7.0, 10, 5.5, 14],
  ["timber-plank", 3, 4.0, null, 3.75, null],
  ["timber-plank", 12, 4.0, null, 3.75, null],
  ["nail-laminated", 4, 4.5, null, 4.0, null],
  ["nail-laminated", 6 - HAIR, 4.5, null, 4.0, null],
  ["nail-laminated", 6, 5.0, 5, 4.25, 6.5],
  ["nail-laminated", 11.25, 5.0, 5, 4.25, 6.5],
  ["glulam", 4, 4.5, null, 4.0, null],
  ["glulam", 6 - HAIR, 4.5, null, 4.0, null],
  ["glulam", 6, 5.25, 5.5, 4.5, 7],
  ["glulam", 12.25, 5.25, 5.5, 4.5, 7],
  ["steel-grid", 1, 4.5, null, 4.0, null],
  ["steel-grid", 4 - HAIR, 4.5, null, 4.0, null],
  ["steel-grid", 4, 6.0, 6, 5.0, 10.5],
  ["steel-grid", 7, 6.0, 6, 5.0, 10.5],
  ["corrugated-steel", 2, 5.5, null, 4.5, null],
  ["corrugated-steel", 6, 5.5, null, 4.5, null],
];

/** The lever rule by a dense search; on 1 or 2 lanes there is no reduction. Steps of 0.0005 ft leave at most 4 wheels x 0.00025 ft/S. */
function searched(S: number, trucks: number): { readonly least: number; readonly most: number } {
  const step = 0.0005;
  const gaps = new Array<number>(trucks - 1).fill(4);
  const least = searchedWheelLines(interiorShare(S), gaps, -16, 0, step);
  return { least: least - 1e-9, most: least + (2 * trucks * (step / 2)) / S + 1e-9 };
}

describe.each(ROWS)("%s, %f in", (kind, thicknessIn, one, oneToFt, more, moreToFt) => {
  it.each([
    ["one lane", 1, one, oneToFt],
    ["two lanes", 2, more, moreToFt],
  ] as const)("%s", (_, lanes, divisor, toFt) => {
    for (const S of toFt === null ? [2, 7.5, 19.9] : [2, toFt - HAIR, toFt]) {
      const { moment, oneLaneMoment } = interior(kind, thicknessIn, S, lanes);
      expect(moment.factor, `S ${S}`).toBeCloseTo(S / divisor, 12);
      expect(moment.rule).toMatch(/^S\//);
      // Fatigue and Group IA take the one-lane column whatever the lanes.
      if (S <= (oneToFt ?? 99)) expect(oneLaneMoment.factor).toBeCloseTo(S / one, 12);
    }
    if (toFt === null) return;
    const S = toFt + HAIR;
    const { moment } = interior(kind, thicknessIn, S, lanes);
    expect(moment.rule).toBe("lever rule");
    const { least, most } = searched(S, lanes);
    expect(moment.factor).toBeGreaterThanOrEqual(least);
    expect(moment.factor).toBeLessThanOrEqual(most);
  });

  it("three lanes and more take the column of two or more", () => {
    for (const lanes of [3, 4, 7]) expect(interior(kind, thicknessIn, 4, lanes).moment.factor).toBeCloseTo(4 / more, 12);
  });

  it("the axle over the bearing goes by the lever rule at every spacing", () => {
    for (const S of [3, 5.2, 8]) {
      const { endShear, oneLaneEndShear } = interior(kind, thicknessIn, S, 2);
      for (const [factor, trucks] of [
        [endShear.factor, 2],
        [oneLaneEndShear.factor, 1],
      ] as const) {
        const { least, most } = searched(S, trucks);
        expect(factor).toBeGreaterThanOrEqual(least);
        expect(factor).toBeLessThanOrEqual(most);
      }
    }
  });
});

describe("decks thinner than any row", () => {
  it.each([
    ["nail-laminated", 4],
    ["glulam", 4],
    ["corrugated-steel", 2],
  ] as const)("%s under %f in has none", (kind, least) => {
    expect(distributionRow(kind, least - HAIR)).toBeNull();
    expect(distributionRow(kind, least)).not.toBeNull();
    expect(() => interior(kind, least - HAIR, 4, 2)).toThrow(RangeError);
  });
});

describe("factors by hand beyond the limit", () => {
  it("concrete, one lane, S 11 ft: one wheel over the stringer, the other 6 ft off", () => {
    expect(interior("concrete", 8.5, 11, 1).moment.factor).toBeCloseTo(1 + (11 - 6) / 11, 12);
  });

  it("concrete, two lanes, S 15 ft: wheels 6, 0, 4 and 10 ft off", () => {
    expect(interior("concrete", 8.5, 15, 2).moment.factor).toBeCloseTo((9 + 15 + 11 + 5) / 15, 12);
  });

  it("concrete, three lanes, S 20 ft: wheels 16, 10, 6, 0, 4, 10 ft off at nine tenths", () => {
    expect(interior("concrete", 8.5, 20, 3).moment.factor).toBeCloseTo((0.9 * (4 + 10 + 14 + 20 + 16 + 10)) / 20, 12);
  });
});

describe("reduction for loaded lanes, 3.12.1", () => {
  it.each([
    [1, 1],
    [2, 1],
    [3, 0.9],
    [4, 0.75],
    [5, 0.75],
    [12, 0.75],
  ])("%i lanes: %f", (lanes, reduction) => {
    expect(laneReduction(lanes)).toBe(reduction);
  });
});

describe("exterior stringer", () => {
  const exterior = (change: Partial<DistributionPlace>, bridge = CONCRETE) => exteriorFactors(bridge, placeOf(change), null);
  /** The curb stands so far out that the lever rule stays below every floor. */
  const farCurb = { curbInsideFt: -2 };

  it.each([
    [4, 4 / 5.5],
    [6 - HAIR, (6 - HAIR) / 5.5],
    [6, 6 / 5.5],
    [6 + HAIR, (6 + HAIR) / (4 + 0.25 * (6 + HAIR))],
    [9, 9 / (4 + 0.25 * 9)],
    [14, 14 / (4 + 0.25 * 14)],
  ])("S = %f ft under concrete on four stringers: not less than the floor", (spacingFt, floor) => {
    for (const [lanes, count] of [
      [1, 4],
      [2, 5],
      [4, 9],
    ]) {
      const { moment, endShear, oneLaneMoment } = exterior({ ...farCurb, spacingFt, lanes, mostTrucks: lanes, count });
      expect(moment.factor).toBeCloseTo(floor, 12);
      expect(moment.rule).toContain("3.23.2.3.1.5");
      // The floor is one of moment: fatigue with one lane and the axle over the bearing go by the lever rule.
      expect(endShear.factor).toBeLessThan(floor);
      expect(endShear.rule).toBe("lever rule");
      expect(oneLaneMoment.rule).toBe("lever rule");
    }
  });

  it("beyond 14 ft, on three stringers and under other decks there is no floor", () => {
    const lever = (S: number, de: number) => searchedWheelLines(exteriorShare(S, de), [4], 2, 2, 1);
    const beyond = exterior({ ...farCurb, spacingFt: 14 + HAIR });
    expect(beyond.moment.rule).toBe("lever rule");
    expect(beyond.moment.factor).toBeCloseTo(lever(14 + HAIR, -2), 9);
    const three = exterior({ ...farCurb, spacingFt: 6, count: 3 });
    expect(three.moment.factor).toBeCloseTo(2 / 6, 12);
    const timber = exterior({ ...farCurb, spacingFt: 6, count: 6 }, bridgeOn("glulam", 6));
    expect(timber.moment.factor).toBeCloseTo(2 / 6, 12);
  });

  it("where the lever rule gives more, it stands", () => {
    const { moment } = exterior({ spacingFt: 6, curbInsideFt: 3 });
    expect(moment.factor).toBeCloseTo((6 + 3 - 2) / 6 + (6 + 3 - 8) / 6, 12);
    expect(moment.rule).toBe("lever rule");
  });

  it("needs a width", () => {
    expect(() => exterior({ curbInsideFt: null })).toThrow(RangeError);
    expect(() => exterior({ count: null })).toThrow(RangeError);
  });
});

describe("a factor of the user's own", () => {
  it("replaces every factor of both stringers, and says so", () => {
    const bridge = questionOf({ ...LFD, "deck.composite": false, "liveLoad.distribution": 1.37 }).bridge;
    for (const factors of [interiorFactors(bridge, placeOf({}), null), exteriorFactors(bridge, placeOf({}), null)]) {
      for (const factor of Object.values(factors)) expect(factor).toEqual({ factor: 1.37, rule: "given" });
    }
  });
});
