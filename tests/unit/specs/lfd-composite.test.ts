// Composite action saves a third of the steel, and every rule here guards that saving: a slab taken too wide, concrete taken too stiff or a
// brittle section taken at its full plastic moment would pass stringers that are not there.
// AASHTO Standard Specifications, 17th ed., Art. 10.38, 10.50, 10.57 (figures from memory unless said).
import { describe, expect, it } from "vitest";
import { check } from "../../../src/answers/check.js";
import type { Shape } from "../../../src/catalogue/shape.js";
import type { CheckId, StringerAssessment } from "../../../src/specs/contract.js";
import * as composite from "../../../src/specs/lfd/composite-formulas.js";
import { preparedOf } from "../../support/question.js";
import { invented, shapeNamed } from "../../support/shapes.js";

type Change = Readonly<Record<string, unknown>>;
const HAIR = 1e-9;
const stringersOf = (change: Change, shape: Shape): readonly StringerAssessment[] =>
  check(preparedOf({ specification: "lfd", ...change }, [shape]), shape.designation).assessment.stringers;
const checkOf = ({ checks }: StringerAssessment, id: CheckId) => {
  const found = checks.find((one) => one.id === id);
  if (found === undefined) throw new Error(`no ${id} check`);
  return found;
};
const stepOf = ({ lines }: StringerAssessment, symbol: string): number => {
  const found = lines.findLast((line) => line.type === "step" && line.formula.symbol === symbol);
  if (found?.type !== "step") throw new Error(`no step ${symbol}`);
  return found.result;
};
const routeOf = ({ notes }: StringerAssessment) => notes.find(({ code }) => code === "composite-route")?.args;
const W36X150 = shapeNamed("W36X150");

describe("effective slab width", () => {
  const widthOf = (change: Change, shape = W36X150) => stringersOf(change, shape).map(({ effects }) => effects.effectiveWidthIn);

  it.each([
    ["a quarter of the span", 24, 9, 72],
    ["the spacing", 80, 6, 72],
    ["twelve times the slab", 80, 9, 96],
  ])("interior: %s", (_, spanFt, spacingFt, widthIn) => {
    expect(widthOf({ spanFt, "stringers.spacingFt": spacingFt })).toEqual([widthIn]);
  });

  it("exterior: half the interior width, and outside it the overhang but no more than the other half", () => {
    // S 7 ft: 84 in inside, 42 + min(42, 12 o) outside; o 2 ft, 3.5 ft and 4 ft.
    for (const [outToOutFt, widthIn] of [
      [25, 42 + 24],
      [28, 42 + 42],
      [29, 42 + 42],
    ]) {
      const deck = { spanFt: 80, "deck.outToOutFt": outToOutFt, "stringers.count": 4, "stringers.spacingFt": 7 };
      expect(widthOf(deck)).toEqual([84, widthIn]);
    }
  });

  it("an overhang less than half a flange and 6 in counts for nothing: one-sided", () => {
    const shape = invented({ d: 36, bf: 12, tf: 1, tw: 0.6 }, { yieldStressKsi: 50 });
    const withOverhang = (overhangFt: number, change: Change = {}) =>
      widthOf({ spanFt: 80, "deck.outToOutFt": 24 + 2 * overhangFt, "stringers.count": 5, "stringers.spacingFt": 6, ...change }, shape)[1];
    // Half of 12 in and 6 in: 1 ft. Just there it counts: 36 + 12 in.
    expect(withOverhang(1)).toBeCloseTo(48, 9);
    // A hair less: the least of L/12, 6 ts, S/2 = 80, 48, 36 in.
    expect(withOverhang(1 - 1e-6)).toBe(36);
    expect(withOverhang(0.7, { "deck.thicknessIn": 5 })).toBe(6 * 4.5);
    expect(withOverhang(0.7, { spanFt: 25 })).toBe(25);
  });
});

describe("modular ratio", () => {
  it("steps down at 2.4, 2.9, 3.6, 4.6 and 6.0 ksi, which belong to the stronger side", () => {
    const bounds = [2.4, 2.9, 3.6, 4.6, 6];
    expect([2, ...bounds].map(composite.modularRatio)).toEqual([11, 10, 9, 8, 7, 6]);
    expect(bounds.map((fc) => composite.modularRatio(fc - HAIR))).toEqual([11, 10, 9, 8, 7]);
    expect(composite.modularRatio(10)).toBe(6);
    expect(() => composite.modularRatio(Number.NaN)).toThrow(RangeError);
  });

  it("live load on n, what lasts on three times it; a ratio of the user's own goes before", () => {
    const bridge = { spanFt: 60, "stringers.spacingFt": 8 };
    const { areaIn2: A, depthIn: d, inertiaXIn4: Ix } = W36X150;
    // Slab 96 x 8 in on the flange.
    const inertia = (n: number): number => {
      const slab = (96 * 8) / n;
      const y = ((A * d) / 2 + slab * (d + 4)) / (A + slab);
      return Ix + A * (y - d / 2) ** 2 + (96 * 8 ** 3) / (12 * n) + slab * (d + 4 - y) ** 2;
    };
    for (const [change, n] of [
      [{ "deck.fcKsi": 4 }, 8],
      [{ "deck.fcKsi": 3.5 }, 9],
      [{ "deck.fcKsi": 4, "deck.modularRatio": 7.5 }, 7.5],
    ] as const) {
      const [stringer] = stringersOf({ ...bridge, ...change }, W36X150);
      expect(stepOf(stringer, "In")).toBeCloseTo(inertia(n), 6);
      expect(stepOf(stringer, "I3n")).toBeCloseTo(inertia(3 * n), 6);
    }
  });
});

describe("ductility, D' = beta (d + ts + th)/7.5", () => {
  it("beta is 0.9 to 36 ksi and 0.7 beyond", () => {
    expect([33, 36, 36 + HAIR, 50].map(composite.ductilityBeta)).toEqual([0.9, 0.9, 0.7, 0.7]);
    expect(composite.ductilityDepth.of(0.7, 36, 8, 1)).toBeCloseTo((0.7 * 45) / 7.5, 12);
  });

  it("the line begins at Mp at D' and ends at 0.85 My at 5 D'", () => {
    expect(composite.reducedPlasticMoment.of(4000, 3000, 4, 4)).toBeCloseTo(4000, 10);
    expect(composite.reducedPlasticMoment.of(4000, 3000, 20, 4)).toBeCloseTo(0.85 * 3000, 10);
    expect(composite.reducedPlasticMoment.of(4000, 3000, 12, 4)).toBeCloseTo((4000 + 0.85 * 3000) / 2, 10);
  });

  it("a whole check goes from Mp to the line without a step", () => {
    // Concrete of a strength at which the axis stands at D': 96 x 8 in of slab, D' = 0.7 (35.9 + 8)/7.5.
    const Dpr = (0.7 * (W36X150.depthIn + 8)) / 7.5;
    const fc = (W36X150.areaIn2 * 50) / (0.85 * 96 * Dpr);
    const bridge = { spanFt: 60, "stringers.spacingFt": 8 };
    const [deep] = stringersOf({ ...bridge, "deck.fcKsi": fc * (1 - HAIR) }, W36X150);
    const [shallow] = stringersOf({ ...bridge, "deck.fcKsi": fc * (1 + HAIR) }, W36X150);
    expect([routeOf(shallow), routeOf(deep)]).toEqual([
      ["plastic", "slab"],
      ["reduced", "slab"],
    ]);
    expect(checkOf(deep, "flexure").capacity / checkOf(shallow, "flexure").capacity).toBeCloseTo(1, 7);
    expect(checkOf(shallow, "flexure").capacity).toBe(shallow.effects.plasticMomentKipFt);
  });

  it("between D' and 5 D' the line is used with the first-yield moment by stages", () => {
    const [stringer] = stringersOf({ spanFt: 60, "stringers.spacingFt": 8, "deck.fcKsi": 3.5 }, W36X150);
    const { areaIn2: A, depthIn: d, sectionModulusXIn3: Sx } = W36X150;
    const Dp = (A * 50) / (0.85 * 3.5 * 96);
    const Mp = (A * 50 * (d / 2 + 8 - Dp / 2)) / 12;
    const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw } = stringer.effects;
    const [Mf1, Mf2] = [1.3 * M1, 1.3 * (M2 + Mw)];
    const left = 50 - (12 * Mf1) / Sx - (12 * Mf2) / stepOf(stringer, "Sb3n");
    const My = Mf1 + Mf2 + (left * stepOf(stringer, "Sbn")) / 12;
    const ratio = Dp / ((0.7 * (d + 8)) / 7.5);
    const capacity = (5 * Mp - 0.85 * My) / 4 + ((0.85 * My - Mp) / 4) * ratio;
    expect(ratio).toBeGreaterThan(1);
    expect(checkOf(stringer, "flexure").capacity).toBeCloseTo(capacity, 6);
    expect(checkOf(stringer, "ductility").ratio).toBeCloseTo(ratio / 5, 10);
  });

  it("beyond 5 D' the section is refused, whatever it would carry", () => {
    // A thin slab of weak concrete on the heaviest shape: the axis stands in the lower half of the depth.
    const shape = shapeNamed("W44X408");
    const bridge = { spanFt: 30, "stringers.spacingFt": 3.5, "deck.thicknessIn": 4.5, "deck.fcKsi": 2 };
    const [stringer] = stringersOf(bridge, shape);
    const { demand, capacity, ok } = checkOf(stringer, "ductility");
    expect(capacity).toBeCloseTo((5 * 0.7 * (shape.depthIn + 4)) / 7.5, 10);
    expect(demand).toBeGreaterThan(capacity);
    expect(ok).toBe(false);
    expect(checkOf(stringer, "flexure")).toMatchObject({ capacity: 0, ok: false });
    // The same of soft steel is within its limit.
    const [soft] = stringersOf({ ...bridge, "steel.grade": "36" }, shape);
    expect(checkOf(soft, "ductility").ok).toBe(true);
    expect(checkOf(soft, "flexure").capacity).toBeGreaterThan(0);
  });
});

describe("a web that is not compact", () => {
  // 60 in of thin web under a narrow slab: more than a third of it in compression.
  const withWeb = (tw: number): Shape => invented({ d: 62, bf: 16, tf: 1, tw });
  const BRIDGE = { spanFt: 50, "stringers.spacingFt": 3.5, "deck.thicknessIn": 5, "deck.fcKsi": 2.5, "steel.grade": "50" };

  it("2 Dcp/tw beyond 608/sqrt(Fy) takes the first-yield moment", () => {
    const [compact] = stringersOf(BRIDGE, withWeb(0.6));
    expect(routeOf(compact)?.[0]).not.toBe("first-yield");
    const shape = withWeb(0.45);
    const [stringer] = stringersOf(BRIDGE, shape);
    expect(routeOf(stringer)).toEqual(["first-yield", "web"]);
    const lw = (2 * stepOf(stringer, "Dcp")) / 0.45;
    expect(lw).toBeGreaterThan(608 / Math.sqrt(50));
    const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw } = stringer.effects;
    const [Mf1, Mf2] = [1.3 * M1, 1.3 * (M2 + Mw)];
    const extra = ["b", "t"].map((side) => {
      const left = 50 - (12 * Mf1) / shape.sectionModulusXIn3 - (12 * Mf2) / stepOf(stringer, `S${side}3n`);
      return (left * stepOf(stringer, `S${side}n`)) / 12;
    });
    expect(checkOf(stringer, "flexure").capacity).toBeCloseTo(Mf1 + Mf2 + Math.min(...extra), 6);
    // Then D/tw has its own limit, and Mp is not reached.
    expect(checkOf(stringer, "web-slenderness")).toMatchObject({ capacity: 150, article: "10.50.1.2" });
    expect(checkOf(stringer, "web-slenderness").demand).toBeCloseTo(60 / 0.45, 10);
    expect(checkOf(stringer, "flexure").capacity).toBeLessThan(stringer.effects.plasticMomentKipFt ?? 0);
  });

  it("on the limit is compact, a hair beyond is not", () => {
    const route = (tw: number) => routeOf(stringersOf(BRIDGE, withWeb(tw))[0])?.[0];
    let [thin, thick] = [0.45, 0.6];
    for (let halving = 0; halving < 50; halving++) {
      const middle = (thin + thick) / 2;
      if (route(middle) === "first-yield") thin = middle;
      else thick = middle;
    }
    const [stringer] = stringersOf(BRIDGE, withWeb(thick));
    expect((2 * stepOf(stringer, "Dcp")) / thick).toBeCloseTo(608 / Math.sqrt(50), 8);
    expect(checkOf(stringer, "web-slenderness").ok).toBe(true);
  });

  it("beyond 150 is refused", () => {
    const [stringer] = stringersOf(BRIDGE, withWeb(60 / 151));
    expect(checkOf(stringer, "web-slenderness").ok).toBe(false);
    expect(checkOf(stringer, "flexure").capacity).toBe(0);
  });
});

describe("overload", () => {
  it("0.95 Fy against the worse of both flanges, each stage on its own section", () => {
    const bridge = { spanFt: 60, "deck.outToOutFt": 33, "stringers.count": 4, "stringers.spacingFt": 9 };
    for (const stringer of stringersOf(bridge, W36X150)) {
      const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw, liveMomentKipFt: ML } = stringer.effects;
      const [fb, ft] = ["b", "t"].map((side) => {
        const lasting = (12 * (M2 + Mw)) / stepOf(stringer, `S${side}3n`);
        return (12 * M1) / W36X150.sectionModulusXIn3 + lasting + (12 * (5 / 3) * ML) / stepOf(stringer, `S${side}n`);
      });
      expect(stepOf(stringer, "fb")).toBeCloseTo(fb, 8);
      expect(stepOf(stringer, "ft")).toBeCloseTo(ft, 8);
      expect(checkOf(stringer, "overload").demand).toBeCloseTo(Math.max(fb, ft), 8);
      expect(checkOf(stringer, "overload").capacity).toBeCloseTo(47.5, 12);
    }
  });

  it("a top flange that the live load stretches adds nothing to what lasts", () => {
    const shape = shapeNamed("W12X26");
    const [stringer] = stringersOf({ spanFt: 15, "stringers.spacingFt": 8 }, shape);
    expect(stepOf(stringer, "Stn")).toBeLessThan(0);
    const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw } = stringer.effects;
    const St3n = stepOf(stringer, "St3n");
    const lasting = St3n > 0 ? (12 * (M2 + Mw)) / St3n : 0;
    expect(stepOf(stringer, "ft")).toBeCloseTo((12 * M1) / shape.sectionModulusXIn3 + lasting, 10);
  });
});

describe("studs by strength", () => {
  const studsOf = (change: Change, shape: Shape) => {
    const [{ studs }] = stringersOf({ spanFt: 60, "stringers.spacingFt": 8, ...change }, shape);
    if (studs === null) throw new Error("no studs");
    return studs;
  };
  const strength = (ds: number, fc: number): number =>
    Math.min(0.4 * ds ** 2 * Math.sqrt(fc * 57 * Math.sqrt(1000 * fc)), (60 * Math.PI * ds ** 2) / 4);

  it("carry the lesser of slab and steel, with 0.85 on their strength, in whole rows", () => {
    for (const [change, shape, force] of [
      // All of the steel, below 0.85 x 4 x 96 x 8 kip of slab.
      [{}, W36X150, W36X150.areaIn2 * 50],
      // All of a thinner slab of weaker concrete, 72 x 6 in.
      [{ "deck.thicknessIn": 6.5, "deck.fcKsi": 3 }, W36X150, 0.85 * 3 * 72 * 6],
    ] as const) {
      const { forceKip, strengthKip, perHalfSpan, perStringer } = studsOf(change, shape);
      const Su = strength(0.875, "deck.fcKsi" in change ? 3 : 4);
      expect(forceKip).toBeCloseTo(force, 8);
      expect(strengthKip).toBeCloseTo(Su, 10);
      expect(perHalfSpan).toBe(Math.ceil(force / (0.85 * Su) / 3) * 3);
      expect(perStringer).toBe(2 * perHalfSpan);
    }
  });

  it("a stud is never stronger than 60 ksi on its area", () => {
    const area = (Math.PI * 0.75 ** 2) / 4;
    expect(studsOf({ "deck.fcKsi": 8, "studs.diameterIn": 0.75 }, W36X150).strengthKip).toBeCloseTo(60 * area, 10);
    expect(studsOf({ "deck.fcKsi": 3, "studs.diameterIn": 0.75 }, W36X150).strengthKip).toBeLessThan(60 * area);
  });

  it("one to six in a row: the count is a multiple of the row", () => {
    for (const perRow of [1, 2, 3, 4, 5, 6]) {
      const { perHalfSpan, forceKip, strengthKip } = studsOf({ "studs.perRow": perRow }, W36X150);
      expect(perHalfSpan % perRow).toBe(0);
      expect(perHalfSpan - forceKip / (0.85 * strengthKip)).toBeGreaterThanOrEqual(0);
      expect(perHalfSpan - forceKip / (0.85 * strengthKip)).toBeLessThan(perRow);
    }
  });
});
