// A slender web buckles before it yields. Were a limit met on the wrong side, an engineer would lay out a thin-webbed stringer without
// stiffeners on the strength of a web that folds.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. 6.10.9 (from memory).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import type { Shape } from "../../../../src/catalogue/shape.js";
import { shearElastic, shearInelastic, shearRoot, shearYielding } from "../../../../src/specs/lrfd/formulas.js";
import { preparedOf } from "../../../support/question.js";
import { invented } from "../../../support/shapes.js";

const HAIR = 1e-9;
/** Clear web 40 in deep at a slenderness. */
const withWeb = (slenderness: number): Shape => invented({ d: 42, bf: 16, tf: 1, tw: 40 / slenderness });
const shearOf = (shape: Shape, Fy: number) => {
  const bridge = { spanFt: 50, "stringers.spacingFt": 7, "steel.fyKsi": Fy };
  const { checks } = check(preparedOf(bridge, [shape]), shape.designation).assessment.stringers[0];
  const found = checks.find(({ id }) => id === "shear");
  if (found === undefined) throw new Error("no shear check");
  return found;
};

describe.each([36, 50, 70])("web 40 in deep, Fy %i ksi", (Fy) => {
  const q = Math.sqrt((5 * 29000) / Fy);
  const area = (slenderness: number): number => 40 * (40 / slenderness);

  it("yields up to D/tw = 1.12 sqrt(5E/Fy) and goes on without a step", () => {
    const limit = 1.12 * q;
    for (const slenderness of [limit / 2, limit * (1 - HAIR)]) {
      expect(shearOf(withWeb(slenderness), Fy).capacity).toBeCloseTo(0.58 * Fy * area(slenderness), 6);
    }
    const past = shearOf(withWeb(limit * (1 + HAIR)), Fy).capacity;
    expect(past / (0.58 * Fy * area(limit))).toBeCloseTo(1, 7);
  });

  it("buckles by the first rule between the limits, by the second beyond 1.40 sqrt(5E/Fy)", () => {
    const between = 1.25 * q;
    expect(shearOf(withWeb(between), Fy).capacity).toBeCloseTo((0.58 * Fy * area(between) * 1.12) / 1.25, 6);
    const atLimit = shearOf(withWeb(1.4 * q * (1 - HAIR)), Fy).capacity;
    expect(atLimit).toBeCloseTo(0.58 * Fy * area(1.4 * q) * (1.12 / 1.4), 4);
    const beyond = shearOf(withWeb(1.4 * q * (1 + HAIR)), Fy).capacity;
    expect(beyond).toBeCloseTo(0.58 * Fy * area(1.4 * q) * (1.57 / 1.4 ** 2), 4);
    // 0.800 against 0.801: the constants are rounded, no more.
    expect(beyond / atLimit).toBeCloseTo(1, 2);
    const far = 1.7 * q;
    expect(shearOf(withWeb(far), Fy).capacity).toBeCloseTo((0.58 * Fy * area(far) * 1.57) / 1.7 ** 2, 6);
  });
});

it("the three formulas written down are the ones that were used", () => {
  const q = shearRoot.of(29000, 50);
  expect(q).toBeCloseTo(Math.sqrt(2900), 10);
  expect(shearYielding.of(50, 30, 0.5)).toBeCloseTo(435, 10);
  expect(shearInelastic.of(50, 30, 30 / (1.2 * q), q)).toBeCloseTo(0.58 * 50 * 30 * (30 / (1.2 * q)) * (1.12 / 1.2), 8);
  expect(shearElastic.of(50, 30, 30 / (2 * q), q)).toBeCloseTo(0.58 * 50 * 30 * (30 / (2 * q)) * (1.57 / 4), 8);
});
