// A bridge that bounces is a bridge complained about. The design truck alone, or a quarter of it with the lane load, decides; a tandem let in,
// or the lane load added in full, would ask for heavier stringers than the specification does.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. 2.5.2.6.2, 3.6.1.3.2 (from memory); statics.
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import { preparedOf } from "../../../support/question.js";

/** EI times the greatest midspan deflection under one design truck, kip-ft3: every place of it, a hundredth of a foot apart. */
function truckKipFt3(L: number): number {
  const axles = [
    [8, 0],
    [32, 14],
    [32, 28],
  ];
  let most = 0;
  for (let step = 0; step <= 100 * (L + 28); step++) {
    let sum = 0;
    for (const [kip, behind] of axles) {
      const at = step / 100 - behind;
      const a = Math.min(at, L - at);
      if (a > 0) sum += (kip * a * (3 * L * L - 4 * a * a)) / 48;
    }
    most = Math.max(most, sum);
  }
  return most;
}
const laneKipFt3 = (L: number): number => (5 * 0.64 * L ** 4) / 384;

const asked = (spanFt: number, change: Readonly<Record<string, unknown>>, shape: string) => {
  const { stringers } = check(preparedOf({ spanFt, ...change }), shape).assessment;
  return stringers.map(({ lines, checks, effects }) => {
    const inertia = lines.find((line) => line.type === "step" && line.formula.symbol === "In");
    if (inertia?.type !== "step") throw new Error("In");
    const found = checks.find(({ id }) => id === "live-load-deflection");
    if (found === undefined) throw new Error("no deflection check");
    return { I: inertia.result, found, effects };
  });
};

describe("the truck alone, or a quarter of it with the lane load", () => {
  const FOUR = { "deck.outToOutFt": 33, "stringers.count": 4, "stringers.spacingFt": 9 };

  it.each([20, 24, 40, 80, 140])("%i ft: the truck", (L) => {
    const Y = 1.33 * truckKipFt3(L);
    expect(Y).toBeGreaterThan(0.25 * Y + laneKipFt3(L));
    for (const { I, found } of asked(L, FOUR, "W36X150")) {
      // Two lanes shared by four stringers.
      expect(found.demand / ((1728 * 2 * Y) / (4 * 29000 * I))).toBeCloseTo(1, 5);
      expect(found.capacity).toBeCloseTo((12 * L) / 800, 12);
    }
  });

  it("at 24 ft the tandem bends more, and yet plays no part", () => {
    const L = 24;
    // Two 25 kip axles astride midspan.
    const a = L / 2 - 2;
    const tandem = (2 * 25 * a * (3 * L * L - 4 * a * a)) / 48;
    expect(tandem).toBeGreaterThan(truckKipFt3(L));
    const [{ I, found }] = asked(L, FOUR, "W36X150");
    expect(found.demand).toBeLessThan((1728 * 2 * 1.33 * tandem) / (4 * 29000 * I));
  });

  it.each([220, 300])("%i ft: a quarter of the truck with the lane load", (L) => {
    const Y = 0.25 * 1.33 * truckKipFt3(L) + laneKipFt3(L);
    expect(Y).toBeGreaterThan(1.33 * truckKipFt3(L));
    const [{ I, found }] = asked(L, FOUR, "W44X408");
    expect(found.demand / ((1728 * 2 * Y) / (4 * 29000 * I))).toBeCloseTo(1, 5);
  });
});

describe("shared by all stringers, with presence", () => {
  it.each([
    [18, 1, 1.2],
    [27, 2, 1],
    [42, 3, 0.85],
    [54, 4, 0.65],
  ])("deck of %i ft, %i lanes: %f", (outToOutFt, lanes, m) => {
    const bridge = { "deck.outToOutFt": outToOutFt, "stringers.count": 5, "stringers.spacingFt": (outToOutFt - 4) / 4 };
    const Y = 1.33 * truckKipFt3(60);
    for (const { I, found } of asked(60, bridge, "W36X150")) {
      expect(found.demand / ((1728 * m * lanes * Y) / (5 * 29000 * I))).toBeCloseTo(1, 5);
    }
  });

  it("one stringer of unknown neighbours by its own factor for moment", () => {
    const Y = 1.33 * truckKipFt3(60);
    const [{ I, found, effects }] = asked(60, { "stringers.spacingFt": 8 }, "W36X150");
    expect(found.demand / ((1728 * effects.distributionMoment * Y) / (29000 * I))).toBeCloseTo(1, 5);
    expect(effects.deflectionIn).toBe(found.demand);
  });
});
