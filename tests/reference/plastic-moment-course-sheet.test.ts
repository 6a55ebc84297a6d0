// The same balance of forces, worked by somebody else: a web taken without its fillets or an arm measured from the wrong face would show here,
// and would otherwise overstate or waste the strength of every composite stringer.
// Course sheet "AASHTO Flexure Example #4", plastic moment in negative flexure (seen): W30x99 (A 29.1, d 29.7, bf 10.5, tf 0.67, tw 0.52),
// Fy 50 ksi, 8 in slab with 8 #4 bars on top and 4 #4 bars at the bottom, Fy 60 ksi, clear cover 1 7/8 in. Tolerances: the print's rounding.
import { describe, expect, it } from "vitest";
import type { ShapeFigures } from "../../src/catalogue/shape.js";
import type { Slab } from "../../src/section/composite.js";
import { flangeForce, newPlasticSection, plasticMoment, steelForce, webForce } from "../../src/section/plastic-moment.js";
import { shapeNamed } from "../support/shapes.js";

const W30X99: ShapeFigures = {
  ...shapeNamed("W30X99"),
  areaIn2: 29.1,
  depthIn: 29.7,
  flangeWidthIn: 10.5,
  flangeThicknessIn: 0.67,
  webThicknessIn: 0.52,
};
// Twelve #4 bars of 0.196 in2 (a circle of 1/2 in) at 60 ksi.
const BARS_KIP = 12 * 0.25 * Math.PI * 0.5 ** 2 * 60;
// Above the steel: 4 bars on the lower cover and half a bar, 8 bars under the upper cover and half a bar.
const LOWER_IN = 1.875 + 0.25;
const UPPER_IN = 8 - LOWER_IN;
const BARS_AT_IN = (8 * UPPER_IN + 4 * LOWER_IN) / 12;

/**
 * The bars as a slab of our plastic moment.
 *
 * In negative flexure the bars pull where in positive flexure the slab pushes; the signs of all forces turn round and nothing else, so a slab of
 * the bars' force with its middle at the bars' height gives the same axis and moment. It is taken 1 in thick; its width follows from the force.
 */
const FC = 4;
const AS_SLAB: Slab = { thicknessIn: 1, haunchIn: BARS_AT_IN - 0.5, widthIn: BARS_KIP / (0.85 * FC * 1) };

describe("course sheet, negative flexure", () => {
  it("bars", () => {
    expect(BARS_KIP).toBeCloseTo(141.4, 1);
    expect([UPPER_IN, LOWER_IN, BARS_AT_IN]).toEqual([5.875, 2.125, 4.625]);
  });

  it("forces of flanges and web, the fillets counted in the web", () => {
    const Pf = flangeForce.of(50, 10.5, 0.67);
    expect(Pf).toBeCloseTo(351.75, 2);
    expect(webForce.of(steelForce.of(29.1, 50), Pf)).toBeCloseTo(751.5, 1);
  });

  it("neutral axis 11.51 in into the web, Mp 1509 kip-ft", () => {
    const out = newPlasticSection();
    plasticMoment(W30X99, AS_SLAB, 50, FC, out, null);
    expect(out.place).toBe("web");
    expect(out.webInCompressionIn).toBeCloseTo(11.51, 2);
    expect(Math.abs(out.momentKipFt - 1509)).toBeLessThan(0.5);
  });
});
