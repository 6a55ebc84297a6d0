// The plastic moment is the strength of every compact composite stringer. An axis sought in the wrong plate, or a moment that jumps where the
// axis passes from one to the next, would hand an engineer a stringer that the slab cannot make strong enough.
// Source: statics, summed over fibres; AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.1; LRFD 9th ed., Art. D6.1.
import { describe, expect, it } from "vitest";
import type { Slab } from "../../../src/section/composite.js";
import {
  axisInFlange,
  axisInSlab,
  axisInWeb,
  momentFlange,
  momentSlab,
  momentWeb,
  newPlasticSection,
  type PlasticSection,
  plasticMoment,
} from "../../../src/section/plastic-moment.js";
import { reducedShape } from "../../../src/section/reduced-shape.js";
import { plasticByFibres, slabFibres, steelFibres } from "../../support/fibres.js";
import { CATALOGUE } from "../../support/question.js";
import { shapeNamed } from "../../support/shapes.js";

const plasticOf = (shape: Parameters<typeof plasticMoment>[0], slab: Slab, Fy: number, fc: number): PlasticSection => {
  const out = newPlasticSection();
  plasticMoment(shape, slab, Fy, fc, out, null);
  return out;
};
const SLABS: readonly Slab[] = [
  { widthIn: 48, thicknessIn: 6.5, haunchIn: 0 },
  { widthIn: 72, thicknessIn: 8, haunchIn: 2.5 },
  { widthIn: 114, thicknessIn: 8.5, haunchIn: 1 },
];
/** 0.1 %: what the section's rounding leaves in a moment anyway, and well over what strips of 1/40 of a flange leave out. */
const MOMENT_PART = 1e-3;

describe("against fibres, every shape of the catalogue", () => {
  it.each([
    [36, 3],
    [50, 4],
    [70, 6],
  ])("Fy %f ksi, f'c %f ksi", (Fy, fc) => {
    const places = new Set<string>();
    for (const shape of CATALOGUE) {
      const steel = steelFibres(shape, "spread over the web");
      for (const slab of SLABS) {
        const { momentKipFt, depthIn, webInCompressionIn, place } = plasticOf(shape, slab, Fy, fc);
        const fibres = plasticByFibres([...steel, ...slabFibres(shape, slab)], Fy, fc);
        const top = shape.depthIn + slab.haunchIn + slab.thicknessIn;
        const said = `${shape.designation}, slab ${slab.widthIn} x ${slab.thicknessIn} in, axis in the ${place}`;
        expect(Math.abs(momentKipFt / fibres.momentKipFt - 1), said).toBeLessThan(MOMENT_PART);
        expect(Math.abs(depthIn - (top - fibres.axisIn)), said).toBeLessThan(fibres.stripIn);
        const web = Math.max(0, shape.depthIn - shape.flangeThicknessIn - fibres.axisIn);
        expect(Math.abs(webInCompressionIn - web), said).toBeLessThan(fibres.stripIn);
        places.add(place);
      }
    }
    expect([...places].sort()).toEqual(["flange", "slab", "web"]);
  });

  it("a corroded shape is taken with what is left of it", () => {
    for (const shape of CATALOGUE.filter(({ webThicknessIn }) => webThicknessIn > 0.3)) {
      const left = reducedShape(shape, { flangeLossIn: 0.0625, webLossIn: 0.125 });
      if (left === null) throw new Error(`nothing left of ${shape.designation}`);
      const fibres = plasticByFibres([...steelFibres(left, "spread over the web"), ...slabFibres(left, SLABS[1])], 36, 4);
      const { momentKipFt } = plasticOf(left, SLABS[1], 36, 4);
      expect(Math.abs(momentKipFt / fibres.momentKipFt - 1), shape.designation).toBeLessThan(MOMENT_PART);
      expect(momentKipFt).toBeLessThan(plasticOf(shape, SLABS[1], 36, 4).momentKipFt);
    }
  });
});

describe("the fillets spread over the web", () => {
  it("give no more strength than the fillets in their corners", () => {
    // Steel moved from the flange's root towards mid-depth loses lever: the rule is on the safe side while the axis lies above the web's
    // middle. Both sections here are cut from the dimensions, so that the tabulated area's rounding plays no part.
    for (const shape of CATALOGUE) {
      const drawn = reducedShape(shape, { flangeLossIn: 0, webLossIn: 0 });
      if (drawn === null) throw new Error(shape.designation);
      for (const slab of SLABS) {
        const corners = plasticByFibres([...steelFibres(drawn, "in their corners"), ...slabFibres(drawn, slab)], 50, 4);
        const { momentKipFt } = plasticOf(drawn, slab, 50, 4);
        expect(momentKipFt / corners.momentKipFt, shape.designation).toBeLessThan(1 + MOMENT_PART);
        expect(momentKipFt / corners.momentKipFt, shape.designation).toBeGreaterThan(0.98);
      }
    }
  });
});

describe("the axis passing from slab to flange to web", () => {
  const FY = 50;
  const FC = 4;
  // A slab getting narrower: its force shrinks to nothing and the axis wanders down through flange and web.
  it.each(["W44X408", "W36X150", "W27X84", "W14X30", "W10X12"])("%s: Mp neither jumps nor falls as the slab widens bit by bit", (name) => {
    const shape = shapeNamed(name);
    const whole = (shape.areaIn2 * FY) / (0.85 * FC * 8);
    const step = whole / 1500;
    const seen: string[] = [];
    let before = plasticOf(shape, { widthIn: step, thicknessIn: 8, haunchIn: 2 }, FY, FC);
    for (let widthIn = 2 * step; widthIn < 1.3 * whole; widthIn += step) {
      const now = plasticOf(shape, { widthIn, thicknessIn: 8, haunchIn: 2 }, FY, FC);
      // The force added by a step of width works on no longer a lever than from the slab's middle to the bottom of the steel.
      const rise = now.momentKipFt - before.momentKipFt;
      const most = (0.85 * FC * 8 * step * (shape.depthIn + 2 + 4)) / 12;
      expect(rise).toBeGreaterThan(0);
      expect(rise).toBeLessThan(most);
      // Only at the haunch does the axis step: it holds no concrete that counts.
      const drop = before.depthIn - now.depthIn;
      expect(drop).toBeGreaterThan(0);
      expect(drop).toBeLessThan(before.place === "flange" && now.place === "slab" ? 2 + 0.05 : 0.05);
      if (seen.at(-1) !== now.place) seen.push(now.place);
      before = now;
    }
    expect(seen).toEqual(["web", "flange", "slab"]);
  });

  it("the formulas on either side of each border give one moment", () => {
    for (const shape of CATALOGUE) {
      const { areaIn2: A, depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf } = shape;
      const [ts, th, D] = [7.5, 1.5, d - 2 * tf];
      const [P, Pf] = [A * FY, bf * tf * FY];
      const Pw = P - 2 * Pf;
      const atTop = momentFlange.of(P, axisInFlange.of(P, P, FY, bf), th, ts, FY, bf, tf, Pw, d, Pf);
      expect(momentSlab.of(P, d, th, ts, axisInSlab.of(ts, P, P))).toBeCloseTo(atTop, 8);
      const Ps = P - 2 * Pf;
      const yf = axisInFlange.of(P, Ps, FY, bf);
      expect(yf).toBeCloseTo(tf, 12);
      const atRoot = momentWeb.of(Ps, axisInWeb.of(P, Ps, Pf, Pw, D), tf, th, ts, Pf, D, Pw);
      expect(momentFlange.of(Ps, yf, th, ts, FY, bf, tf, Pw, d, Pf)).toBeCloseTo(atRoot, 8);
    }
  });
});

describe("never below the bare shape", () => {
  // Zx is printed to three digits: up to 0.5 % of it is rounding, and as much of the area in it.
  const ROUNDING = 0.01;

  it("with any slab that a road could have", () => {
    for (const shape of CATALOGUE) {
      for (const widthIn of [12, 24, 48, 96]) {
        const { momentKipFt } = plasticOf(shape, { widthIn, thicknessIn: 4.5, haunchIn: 0 }, 50, 2.5);
        const bare = (50 * shape.plasticModulusXIn3) / 12;
        expect(momentKipFt / bare, `${shape.designation}, ${widthIn} in`).toBeGreaterThan(1 - ROUNDING);
      }
    }
  });

  it("with a slab that vanishes, short of it by no more than moving the fillets over the web costs", () => {
    for (const shape of CATALOGUE) {
      const { areaIn2: A, depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, webThicknessIn: tw, plasticModulusXIn3: Zx } = shape;
      const D = d - 2 * tf;
      // From their corners, at most D/2 off, to the mean D/4 of a web spread evenly.
      const fillets = Math.max(0, A - 2 * bf * tf - D * tw) * (D / 2 - D / 4);
      const { momentKipFt } = plasticOf(shape, { widthIn: 1e-9, thicknessIn: 8, haunchIn: 0 }, 50, 4);
      expect((12 * momentKipFt) / 50, shape.designation).toBeGreaterThan(Zx * (1 - ROUNDING) - fillets);
      expect((12 * momentKipFt) / 50, shape.designation).toBeLessThan(Zx * (1 + ROUNDING));
    }
  });
});

describe("the axis in the slab", () => {
  it("takes just so much of the slab as balances the steel", () => {
    const shape = shapeNamed("W33X118");
    const slab = { widthIn: 96, thicknessIn: 8, haunchIn: 1 };
    const { place, depthIn, webInCompressionIn, momentKipFt } = plasticOf(shape, slab, 50, 4);
    expect(place).toBe("slab");
    expect(webInCompressionIn).toBe(0);
    expect(0.85 * 4 * 96 * depthIn).toBeCloseTo(shape.areaIn2 * 50, 8);
    expect(momentKipFt).toBeCloseTo((shape.areaIn2 * 50 * (shape.depthIn / 2 + 1 + 8 - depthIn / 2)) / 12, 8);
  });

  it("stronger concrete lifts the axis and never costs strength", () => {
    const shape = shapeNamed("W36X150");
    let before = plasticOf(shape, SLABS[0], 50, 2);
    for (let fc = 2.25; fc <= 10; fc += 0.25) {
      const now = plasticOf(shape, SLABS[0], 50, fc);
      expect(now.momentKipFt).toBeGreaterThan(before.momentKipFt);
      expect(now.depthIn).toBeLessThan(before.depthIn);
      before = now;
    }
  });
});
