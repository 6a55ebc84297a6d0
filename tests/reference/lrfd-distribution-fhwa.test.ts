// The share of a lane that one stringer carries scales all of its live load. An exponent or a unit mistaken in these formulas would make every
// stringer of every bridge too light or too heavy alike, and no answer would look odd beside another.
// FHWA NHI-15-047, 4.4.2.2.2.2, lever rule (seen; de inferred); FHWA NHI-04-041, interior and exterior stringer (from memory);
// AASHTO Manual for Bridge Evaluation, Example A1 (from memory). Tolerances: the print's rounding to 0.001.
import { describe, expect, it } from "vitest";
import type { Bridge } from "../../src/bridge/bridge.js";
import type { ShapeFigures } from "../../src/catalogue/shape.js";
import {
  exteriorMoment,
  exteriorShear,
  type LrfdFactors,
  type LrfdPlace,
  lrfdFactors,
  lrfdShare,
  newLrfdFactors,
  shearMoreLanes,
} from "../../src/specs/lrfd/distribution.js";
import { questionOf } from "../support/question.js";
import { shapeNamed } from "../support/shapes.js";

const BRIDGE: Bridge = questionOf({ spanFt: 120, "deck.outToOutFt": 44 }).bridge;
const PLACE: LrfdPlace = {
  position: "interior",
  spacingFt: 9.75,
  spanFt: 120,
  slabIn: 8,
  haunchIn: 0,
  count: 5,
  curbInsideFt: 2.5,
  roadwayFt: 40,
  lanes: 2,
  mostTrucks: 2,
};
/** An example gives Kg alone: a shape of that stiffness and no area, with n = 1, brings it in as it stands. */
const ofStiffness = (Kg: number): ShapeFigures => ({ ...shapeNamed("W36X150"), inertiaXIn4: Kg, areaIn2: 0 });
const factorsAt = (change: Partial<LrfdPlace>, Kg: number): LrfdFactors => {
  const out = newLrfdFactors();
  lrfdFactors(lrfdShare(BRIDGE, { ...PLACE, ...change }, null), ofStiffness(Kg), 1, out, null);
  return out;
};
/** Within half of the third decimal. */
const prints = (ours: number, printed: number): void => expect(Math.abs(ours - printed)).toBeLessThanOrEqual(0.0005);

describe("NHI-15-047, lever rule, exterior stringer, S 12 ft, de 2.0 ft", () => {
  const { leverFatigue, leverOne } = lrfdShare(BRIDGE, { ...PLACE, position: "exterior", spacingFt: 12, curbInsideFt: 2 }, null);
  it("one lane: 0.750", () => prints(leverFatigue, 0.75));
  it("with multiple presence 1.20: 0.900", () => prints(leverOne, 0.9));
});

describe("NHI-04-041, S 9.75 ft, L 120 ft, ts 8 in, Kg 818,611 in4", () => {
  const KG = 818611;

  it("interior, one lane: moment 0.472, shear 0.750", () => {
    const { moment, shear } = factorsAt({ lanes: 1, mostTrucks: 1 }, KG);
    prints(moment, 0.472);
    prints(shear, 0.75);
  });

  it("interior, two lanes or more: moment 0.696, shear 0.935", () => {
    const { moment, shear, fatigue } = factorsAt({}, KG);
    prints(moment, 0.696);
    prints(shear, 0.935);
    // The one-lane factor without its multiple presence of 1.20.
    prints(1.2 * fatigue, 0.472);
  });

  it("exterior, de 2.5 ft: e 1.045, moment 0.727; shear 0.85, 0.795", () => {
    prints(exteriorMoment.of(2.5, 1), 1.045);
    prints(exteriorMoment.of(2.5, 0.696), 0.727);
    prints(exteriorShear.of(2.5, 1), 0.85);
    prints(exteriorShear.of(2.5, 0.935), 0.795);
  });

  it("exterior as it governs: by the lever rule, which is more than either", () => {
    const { moment, shear, momentRule } = factorsAt({ position: "exterior" }, KG);
    // Wheels 2 and 8 ft from the curb, 12.25 ft from the first interior stringer to it.
    prints(moment, (1.2 * (10.25 + 4.25)) / 9.75 / 2);
    prints(shear, (1.2 * (10.25 + 4.25)) / 9.75 / 2);
    expect(momentRule).toBe("lever rule, one truck");
  });
});

describe("Manual for Bridge Evaluation, Example A1, S 7'-4\", ts 7.25 in", () => {
  it("interior shear 0.767", () => {
    prints(shearMoreLanes.of(7 + 4 / 12), 0.767);
    prints(factorsAt({ spacingFt: 7 + 4 / 12, spanFt: 65, slabIn: 7.25, count: 4 }, 2e5).shear, 0.767);
  });
});
