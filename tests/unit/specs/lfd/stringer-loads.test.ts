// Live load on a stringer is table moment, half of it, a factor, impact: a slip between whole and half axles is a factor of two, and the
// axle over the bearing taken like the others hides a quarter of the end shear. Hand figures of an invented bridge, HS20, 60 ft, S 7 ft.
import { describe, expect, it } from "vitest";
import { lfdLayout, stringerLoads } from "../../../../src/specs/lfd/stringer-loads.js";
import { preparedOf } from "../../../support/question.js";

const BRIDGE = {
  specification: "lfd",
  "deck.composite": false,
  spanFt: 60,
  "deck.outToOutFt": 33,
  "stringers.count": 5,
  "stringers.spacingFt": 7,
};
const placed = (change: Readonly<Record<string, unknown>> = {}) => {
  const { design, layouts } = preparedOf({ ...BRIDGE, ...change });
  return lfdLayout(design, layouts.layouts[0]);
};
const impact = 50 / 185;

describe("what the layout fixes", () => {
  it("de is the overhang less the barrier base, or less what a given roadway leaves", () => {
    // Overhang (33 - 4 x 7)/2 = 2.5 ft.
    expect(placed().place.curbInsideFt).toBeCloseTo(2.5 - 1.5, 12);
    expect(placed({ "barriers.baseFt": 1 }).place.curbInsideFt).toBeCloseTo(2.5 - 1, 12);
    expect(placed({ roadwayFt: 26 }).place.curbInsideFt).toBeCloseTo(2.5 - (33 - 26) / 2, 12);
  });

  it("trucks side by side are the lanes; of an unknown width four with two lanes or more, one with one", () => {
    expect(placed().place).toMatchObject({ lanes: 2, mostTrucks: 2 });
    expect(placed({ "deck.outToOutFt": 39, "stringers.count": 6 }).place).toMatchObject({ lanes: 3, mostTrucks: 3 });
    const alone = { specification: "lfd", "deck.composite": false, spanFt: 60, "stringers.spacingFt": 7 };
    const one = preparedOf({ ...alone, "liveLoad.lanes": 1 });
    const two = preparedOf(alone);
    expect(lfdLayout(two.design, two.layouts.layouts[0]).place).toMatchObject({ count: null, curbInsideFt: null, mostTrucks: 4 });
    expect(lfdLayout(one.design, one.layouts.layouts[0]).place).toMatchObject({ lanes: 1, mostTrucks: 1 });
  });
});

describe("live load on a stringer", () => {
  const moment = 18 * 60 - 280 + 392 / 60;

  it("interior: half of the lane's moment x S/5.5 x impact", () => {
    const { live, oneLane } = stringerLoads(placed(), "interior", null);
    expect(live.momentKipFt).toBeCloseTo((moment / 2) * (7 / 5.5) * (1 + impact), 9);
    expect(oneLane.momentKipFt).toBeCloseTo((moment / 2) * (7 / 7) * (1 + impact), 9);
  });

  it("interior end shear: the axle over the bearing by the lever rule, the others as for moment", () => {
    const { live, oneLane } = stringerLoads(placed(), "interior", null);
    // Two trucks: wheels 6, 0 and 4 ft off; one truck: 6 and 0 ft off. The heavy end at the bearing: 32, then 32 at 14 ft and 8 at 28 ft.
    const others = (32 * 46 + 8 * 32) / 60;
    expect(live.overSupportKip).toBe(32);
    expect(live.othersKip).toBeCloseTo(others, 10);
    expect(live.shearKip).toBeCloseTo(((32 * (1 / 7 + 1 + 3 / 7) + others * (7 / 5.5)) / 2) * (1 + impact), 9);
    expect(oneLane.shearKip).toBeCloseTo(((32 * (1 / 7 + 1) + others * 1) / 2) * (1 + impact), 9);
  });

  it("exterior: lever rule 6/7, floor S/(4 + 0.25 S) for moment alone", () => {
    const { live, oneLane } = stringerLoads(placed(), "exterior", null);
    const floor = 7 / 5.75;
    const others = (32 * 46 + 8 * 32) / 60;
    expect(live.momentKipFt).toBeCloseTo((moment / 2) * floor * (1 + impact), 9);
    expect(live.shearKip).toBeCloseTo((((32 * 6) / 7 + others * floor) / 2) * (1 + impact), 9);
    expect(oneLane.momentKipFt).toBeCloseTo((moment / 2) * (6 / 7) * (1 + impact), 9);
    expect(oneLane.shearKip).toBeCloseTo((((32 * 6) / 7 + (others * 6) / 7) / 2) * (1 + impact), 9);
  });

  it("on a long span the lane loading: its 26 kip over the bearing, its uniform load as for moment", () => {
    const { live } = stringerLoads(placed({ spanFt: 200 }), "interior", null);
    expect(live.overSupportKip).toBe(26);
    expect(live.othersKip).toBeCloseTo((0.64 * 200) / 2, 10);
    expect(live.shearKip).toBeCloseTo(((26 * (11 / 7) + 64 * (7 / 5.5)) / 2) * (1 + 50 / 325), 9);
  });

  it("tributary widths: S inside, half of it and the overhang outside", () => {
    expect(stringerLoads(placed(), "interior", null).dead.tributaryFt).toBe(7);
    expect(stringerLoads(placed(), "exterior", null).dead.tributaryFt).toBe(7 / 2 + 2.5);
  });
});
