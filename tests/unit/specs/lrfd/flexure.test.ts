// The bare shape carries the wet deck, and every noncomposite stringer. A step down at a limit, or a straight line that ends elsewhere than the
// curve it leads to, gives a stringer strength that its neighbour an inch farther along the list does not have.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Appendix A6, Art. 6.10.6.2, 6.10.7 (from memory).
import { describe, expect, it } from "vitest";
import type { ShapeFigures } from "../../../../src/catalogue/shape.js";
import * as flexure from "../../../../src/specs/lrfd/flexure.js";
import { CATALOGUE } from "../../../support/question.js";
import { invented, shapeNamed } from "../../../support/shapes.js";

const E = 29000;
const HAIR = 1e-9;
const capacityOf = (shape: ShapeFigures, Fy: number, Lb: number): flexure.BareCapacity => {
  const out = flexure.newBareCapacity();
  flexure.bareCapacity(shape, Fy, Lb, out, null);
  return out;
};
/** rt, Lp and Lr of a shape, written out. */
const lengthsOf = (
  { depthIn, flangeWidthIn, flangeThicknessIn, webThicknessIn, torsionJIn4, sectionModulusXIn3 }: ShapeFigures,
  Fy: number,
) => {
  const [d, bf, tf, tw, J, Sx] = [depthIn, flangeWidthIn, flangeThicknessIn, webThicknessIn, torsionJIn4, sectionModulusXIn3];
  const [h, Dc, Fyr] = [d - tf, (d - 2 * tf) / 2, 0.7 * Fy];
  const rt = bf / Math.sqrt(12 * (1 + (Dc * tw) / (3 * bf * tf)));
  const inner = 1 + Math.sqrt(1 + 6.76 * ((Fyr * Sx * h) / (E * J)) ** 2);
  return { rt, Lp: rt * Math.sqrt(E / Fy), Lr: 1.95 * rt * (E / Fyr) * Math.sqrt(J / (Sx * h)) * Math.sqrt(inner) };
};

describe("lateral torsional buckling", () => {
  it.each([36, 50, 70])("Fy %i ksi: no step at Lp and at Lr, every shape of the catalogue", (Fy) => {
    for (const shape of CATALOGUE) {
      const { Lp, Lr } = lengthsOf(shape, Fy);
      for (const [limit, step] of [
        [Lp, 1e-6],
        // The elastic curve meets the line at 0.7 Fy Sx as far as the rounded constants 1.95, 6.76 and 0.078 let it.
        [Lr, 2e-3],
      ]) {
        const below = capacityOf(shape, Fy, limit * (1 - HAIR)).momentKipIn;
        const above = capacityOf(shape, Fy, limit * (1 + HAIR)).momentKipIn;
        expect(Math.abs(above / below - 1), `${shape.designation} at ${limit} in`).toBeLessThan(step);
      }
    }
  });

  it("stands at Rpc Myc at Lp and at 0.7 Fy Sx at Lr", () => {
    const shape = shapeNamed("W30X99");
    const { Lp, Lr } = lengthsOf(shape, 50);
    expect(capacityOf(shape, 50, Lp).momentKipIn).toBeCloseTo(50 * shape.plasticModulusXIn3, 6);
    expect(capacityOf(shape, 50, Lr * (1 - HAIR)).momentKipIn).toBeCloseTo(35 * shape.sectionModulusXIn3, 3);
    // Half-way between the two, half-way down.
    const middle = (50 * shape.plasticModulusXIn3 + 35 * shape.sectionModulusXIn3) / 2;
    expect(capacityOf(shape, 50, (Lp + Lr) / 2).momentKipIn).toBeCloseTo(middle, 6);
  });

  it("falls as the unbraced length grows, and the limit named follows", () => {
    const shape = shapeNamed("W36X150");
    const { Lp, Lr } = lengthsOf(shape, 50);
    let before = Number.POSITIVE_INFINITY;
    for (let Lb = 12; Lb <= 900; Lb += 12) {
      const { momentKipIn, bracingLimitIn } = capacityOf(shape, 50, Lb);
      expect(momentKipIn).toBeLessThanOrEqual(before);
      const limit = Lb <= Lp ? Lp : Lb <= Lr ? Lr : Number.POSITIVE_INFINITY;
      if (limit === Number.POSITIVE_INFINITY) expect(bracingLimitIn).toBe(limit);
      else expect(bracingLimitIn).toBeCloseTo(limit, 8);
      before = momentKipIn;
    }
  });

  it("beyond Lr by the elastic stress, written out", () => {
    const shape = shapeNamed("W36X150");
    const { rt, Lr } = lengthsOf(shape, 50);
    const Lb = 1.4 * Lr;
    const h = shape.depthIn - shape.flangeThicknessIn;
    const JSh = shape.torsionJIn4 / (shape.sectionModulusXIn3 * h);
    const Fcr = ((Math.PI ** 2 * E) / (Lb / rt) ** 2) * Math.sqrt(1 + 0.078 * JSh * (Lb / rt) ** 2);
    expect(capacityOf(shape, 50, Lb).momentKipIn).toBeCloseTo(Fcr * shape.sectionModulusXIn3, 6);
  });
});

describe("flange local buckling", () => {
  const lpf = 0.38 * Math.sqrt(E / 50);
  const lrf = 0.95 * Math.sqrt((0.76 * E) / 35);

  it("leads from Rpc Myc at 0.38 sqrt(E/Fy) to 0.7 Fy Sx at 0.95 sqrt(0.76 E/(0.7 Fy))", () => {
    expect(flexure.compactFlangeLimit.of(E, 50)).toBeCloseTo(lpf, 12);
    expect(flexure.noncompactFlangeLimit.of(E, 35)).toBeCloseTo(lrf, 12);
    expect(flexure.flangeBuckling.of(35, 400, 23000, lpf, lpf, lrf)).toBeCloseTo(23000, 8);
    expect(flexure.flangeBuckling.of(35, 400, 23000, lrf, lpf, lrf)).toBeCloseTo(35 * 400, 8);
    expect(flexure.flangeBuckling.of(35, 400, 23000, (lpf + lrf) / 2, lpf, lrf)).toBeCloseTo((23000 + 14000) / 2, 8);
  });

  /** Thin flanges on a stocky web, braced so closely that the flange alone decides. */
  const withFlange = (lf: number) => invented({ d: 30, bf: 12, tf: 12 / (2 * lf), tw: 0.6 });
  const SHORT_IN = 1;

  it("begins without a step and lowers the moment from there", () => {
    const full = capacityOf(withFlange(lpf * (1 - HAIR)), 50, SHORT_IN);
    const first = capacityOf(withFlange(lpf * (1 + HAIR)), 50, SHORT_IN);
    expect(first.momentKipIn / full.momentKipIn).toBeCloseTo(1, 7);
    const shape = withFlange(11);
    const { momentKipIn, flangeLimit } = capacityOf(shape, 50, SHORT_IN);
    const Mmax = 50 * shape.plasticModulusXIn3;
    const line = 1 - (1 - (35 * shape.sectionModulusXIn3) / Mmax) * ((11 - lpf) / (lrf - lpf));
    expect(momentKipIn).toBeCloseTo(line * Mmax, 6);
    expect(flangeLimit).toBe(12);
  });

  it("does not touch a flange that is held", () => {
    const shape = withFlange(11);
    expect(capacityOf(shape, 50, 0).momentKipIn).toBeCloseTo(50 * shape.plasticModulusXIn3, 6);
  });

  it("flanges over 12 have no capacity", () => {
    expect(capacityOf(withFlange(12), 50, SHORT_IN).momentKipIn).toBeGreaterThan(0);
    expect(capacityOf(withFlange(12 + 1e-6), 50, SHORT_IN).momentKipIn).toBe(0);
  });
});

describe("web plastification", () => {
  /** Stocky flanges on a web of a slenderness. */
  const withWeb = (lw: number) => invented({ d: 42, bf: 16, tf: 1, tw: 40 / lw });
  const limits = (shape: ShapeFigures, Fy: number) => {
    const ratio = shape.plasticModulusXIn3 / shape.sectionModulusXIn3;
    return { ratio, lpw: Math.sqrt(E / Fy) / (0.54 * ratio - 0.09) ** 2, lrw: 5.7 * Math.sqrt(E / Fy) };
  };

  it("a compact web lets Mp develop", () => {
    const shape = withWeb(70);
    const { lpw } = limits(shape, 50);
    const { momentKipIn, webLimit } = capacityOf(shape, 50, 0);
    expect(momentKipIn).toBeCloseTo(50 * shape.plasticModulusXIn3, 6);
    expect(webLimit).toBeCloseTo(lpw, 8);
  });

  it("a noncompact web takes the straight line from Mp to My", () => {
    for (const lw of [100, 115, 130]) {
      const shape = withWeb(lw);
      const { ratio, lpw, lrw } = limits(shape, 50);
      expect(lw).toBeGreaterThan(lpw);
      const Rpc = (1 - ((1 - 1 / ratio) * (lw - lpw)) / (lrw - lpw)) * ratio;
      const { momentKipIn, webLimit } = capacityOf(shape, 50, 0);
      expect(momentKipIn).toBeCloseTo(Rpc * 50 * shape.sectionModulusXIn3, 6);
      expect(webLimit).toBeCloseTo(lrw, 8);
    }
  });

  it("the line begins at Mp and ends at My", () => {
    expect(flexure.plastificationNoncompact.of(20000, 23000, 90, 90, 137)).toBeCloseTo(23000 / 20000, 12);
    expect(flexure.plastificationNoncompact.of(20000, 23000, 137, 90, 137)).toBeCloseTo(1, 12);
  });

  it("the limit for the plastic moment is never above the noncompact one", () => {
    // Only below Mp/My of about 0.94, which no I-shape has, would the formula alone go past it.
    expect(flexure.plasticWebLimit.of(E, 50, 0.9, 1)).toBeCloseTo(5.7 * Math.sqrt(E / 50), 10);
    expect(flexure.plasticWebLimit.of(E, 50, 1.15, 1)).toBeCloseTo(Math.sqrt(E / 50) / (0.54 * 1.15 - 0.09) ** 2, 10);
  });

  it("a web beyond 5.7 sqrt(E/Fy), or beyond 150, has no capacity", () => {
    const limit = 5.7 * Math.sqrt(E / 50);
    expect(capacityOf(withWeb(limit * (1 - 1e-9)), 50, 0).momentKipIn).toBeGreaterThan(0);
    expect(capacityOf(withWeb(limit * (1 + 1e-9)), 50, 0).momentKipIn).toBe(0);
    // Soft steel: 5.7 sqrt(E/Fy) is past 150 there.
    expect(capacityOf(withWeb(150 * (1 - 1e-9)), 36, 0).momentKipIn).toBeGreaterThan(0);
    expect(capacityOf(withWeb(150 * (1 + 1e-9)), 36, 0).momentKipIn).toBe(0);
  });
});

describe("composite", () => {
  it("the reduction begins at Dp = 0.1 Dt without a step and takes 22.4 % at 0.42 Dt", () => {
    expect(flexure.compositeReduced.of(3000, 4, 40)).toBeCloseTo(3000, 10);
    expect(flexure.compositeReduced.of(3000, 0.42 * 40, 40)).toBeCloseTo(3000 * (1.07 - 0.294), 10);
    expect(flexure.ductilityLimit.of(flexure.wholeDepth.of(30, 2, 8))).toBeCloseTo(0.42 * 40, 12);
  });
});
