// The bare shape's own moments carry the wet deck and every noncomposite stringer; a modulus mistaken for another would show here first.
// Posted calculation to Appendix A6 of the AASHTO LRFD Bridge Design Specifications, without an author's name, so a weak source (seen):
// 36WF194 (A 57.0, d 36.5, bf 12.1, tf 1.26, tw 0.765 nominal; Sx 664, Zx 767), Fy 33 ksi: Myc 21,912 kip-in, Mp 25,311 kip-in,
// web limit 5.7 sqrt(E/Fy) = 168.97. Tolerances: the print's rounding.
import { expect, it } from "vitest";
import type { ShapeFigures } from "../../src/catalogue/shape.js";
import type { Recorder } from "../../src/formula.js";
import { bareCapacity, newBareCapacity } from "../../src/specs/lrfd/flexure.js";
import { shapeNamed } from "../support/shapes.js";

const WF36X194: ShapeFigures = {
  ...shapeNamed("W36X194"),
  areaIn2: 57,
  depthIn: 36.5,
  flangeWidthIn: 12.1,
  flangeThicknessIn: 1.26,
  webThicknessIn: 0.765,
  sectionModulusXIn3: 664,
  plasticModulusXIn3: 767,
};

it("moments and web limit of the held shape", () => {
  const steps = new Map<string, number>();
  const recorder: Recorder = {
    topic: () => {},
    value: () => {},
    step: (formula, result, ..._numbers) => {
      steps.set(formula.symbol, result);
    },
  };
  const out = newBareCapacity();
  bareCapacity(WF36X194, 33, 0, out, recorder);
  expect(steps.get("Myc")).toBeCloseTo(21912, 6);
  expect(steps.get("Mpb")).toBeCloseTo(25311, 6);
  expect(steps.get("lrw")).toBeCloseTo(168.97, 2);
  // So stocky a web lets the whole plastic moment develop.
  expect(out.momentKipIn).toBeCloseTo(25311, 6);
});
