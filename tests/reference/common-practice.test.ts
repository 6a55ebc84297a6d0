// Common practice, no published source: what experienced engineers carry in their heads. HS20 on 80 ft is about 580 kip-ft a wheel line;
// S/5.5 wheel lines a stringer under a concrete deck with two lanes or more; impact 50/(L + 125); W33X118: bf/2tf 7.76, h/tw 54.5,
// Zx 415 in3, compact limits at 50 ksi 9.19 and 86.
//
// An answer that fails these is thrown out at first sight, before anybody reads the calculation.
import { describe, expect, it } from "vitest";
import { impactFraction } from "../../src/loads/formulas.js";
import { laneEffects } from "../../src/loads/live-load.js";
import { interiorFactors } from "../../src/specs/lfd/distribution.js";
import {
  compactFlangeLimit,
  compactWebLimit,
  flangeSlenderness,
  flexureCapacity,
  newFlexureCapacity,
} from "../../src/specs/lfd/flexure.js";
import { rounding } from "../support/published.js";
import { questionOf } from "../support/question.js";
import { shapeNamed } from "../support/shapes.js";
import { shipped } from "../support/vehicles.js";

describe("live load (common practice)", () => {
  it("HS20 on 80 ft, one wheel line: about 580 kip-ft", () => {
    // "About" is to the nearest ten.
    expect(Math.abs(laneEffects(shipped("HS20-44"), 80).momentKipFt / 2 - 580)).toBeLessThanOrEqual(rounding(-1));
  });

  it.each([4, 6.5, 8, 10])("S/5.5 wheel lines under a concrete deck, S %f ft", (spacingFt) => {
    const { bridge } = questionOf({ specification: "lfd", "deck.composite": false, spanFt: 80, "stringers.spacingFt": spacingFt });
    const place = { spacingFt, count: null, curbInsideFt: null, lanes: 2, mostTrucks: 4 };
    expect(interiorFactors(bridge, place, null).moment.factor).toBeCloseTo(spacingFt / 5.5, 12);
  });

  it("impact 50/(L + 125)", () => {
    expect(impactFraction.of(80)).toBeCloseTo(50 / (80 + 125), 12);
  });
});

describe("W33X118 at 50 ksi (common practice)", () => {
  const shape = shapeNamed("W33X118");

  it("bf/2tf 7.76, h/tw 54.5, Zx 415 in3 in the catalogue", () => {
    expect(Math.abs(shape.flangeSlenderness - 7.76)).toBeLessThanOrEqual(rounding(2));
    expect(Math.abs(shape.webSlenderness - 54.5)).toBeLessThanOrEqual(rounding(1));
    expect(Math.abs(shape.plasticModulusXIn3 - 415)).toBeLessThanOrEqual(rounding(0));
  });

  it("limits 9.19 and 86", () => {
    expect(Math.abs(compactFlangeLimit.of(50) - 9.19)).toBeLessThanOrEqual(rounding(2));
    expect(Math.abs(compactWebLimit.of(50) - 86)).toBeLessThanOrEqual(rounding(0));
    const capacity = newFlexureCapacity();
    flexureCapacity(shape, 50, 0, capacity, null);
    expect(Math.abs(capacity.flangeLimit - 9.19)).toBeLessThanOrEqual(rounding(2));
    expect(Math.abs(capacity.webLimit - 86)).toBeLessThanOrEqual(rounding(0));
    expect(capacity.route).toBe("compact");
  });

  it("bf/2tf from the printed bf 11.5 and tf 0.740 in agrees with the printed 7.76 within the rounding of bf", () => {
    const tolerance = rounding(1) / (2 * 0.74) + rounding(2);
    expect(Math.abs(flangeSlenderness.of(shape.flangeWidthIn, shape.flangeThicknessIn) - 7.76)).toBeLessThanOrEqual(tolerance);
  });
});
