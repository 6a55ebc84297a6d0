// Without studs the shape carries everything alone: an unbraced flange taken as held, or a slab's help left in by mistake, is strength that
// is not there.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. 3.4.1, 6.10.2, 6.10.4.2.2, Appendix A6 (from memory).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import type { Shape } from "../../../../src/catalogue/shape.js";
import type { CheckId, StringerAssessment } from "../../../../src/specs/contract.js";
import { preparedOf } from "../../../support/question.js";
import { invented, shapeNamed } from "../../../support/shapes.js";

type Change = Readonly<Record<string, unknown>>;
const BRIDGE = { spanFt: 50, "stringers.spacingFt": 7, "deck.composite": false };
const W33X130 = shapeNamed("W33X130");
const stringerOf = (change: Change, shape: Shape = W33X130): StringerAssessment =>
  check(preparedOf({ ...BRIDGE, ...change }, [shape]), shape.designation).assessment.stringers[0];
const checkOf = ({ checks }: StringerAssessment, id: CheckId) => {
  const found = checks.find((one) => one.id === id);
  if (found === undefined) throw new Error(`no ${id} check`);
  return found;
};

describe("flexure", () => {
  it("a held flange takes the whole plastic moment", () => {
    const { capacity, article } = checkOf(stringerOf({ "bracing.topFlange": "held" }), "flexure");
    expect(capacity).toBeCloseTo((50 * W33X130.plasticModulusXIn3) / 12, 8);
    expect(article).toBe("A6.1");
  });

  it("diaphragms brace it at their distance, and the farther apart the less", () => {
    const E = 29000;
    const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, webThicknessIn: tw, torsionJIn4: J } = W33X130;
    const { sectionModulusXIn3: Sx, plasticModulusXIn3: Zx } = W33X130;
    const h = d - tf;
    const rt = bf / Math.sqrt(12 * (1 + (((d - 2 * tf) / 2) * tw) / (3 * bf * tf)));
    const Lp = rt * Math.sqrt(E / 50);
    const Lr = 1.95 * rt * (E / 35) * Math.sqrt(J / (Sx * h)) * Math.sqrt(1 + Math.sqrt(1 + 6.76 * ((35 * Sx * h) / (E * J)) ** 2));
    for (const ft of [10, 16.5, 20]) {
      const stringer = stringerOf({ "bracing.topFlange": "diaphragms", "bracing.diaphragmSpacingFt": ft });
      const moment = 50 * Zx - (50 * Zx - 35 * Sx) * ((12 * ft - Lp) / (Lr - Lp));
      expect(checkOf(stringer, "flexure").capacity).toBeCloseTo(moment / 12, 6);
      expect(checkOf(stringer, "bracing")).toMatchObject({ demand: 12 * ft, ok: true });
      expect(checkOf(stringer, "bracing").capacity).toBeCloseTo(Lr, 8);
    }
  });

  it("Strength I: 1.25 and 1.50 on what lasts, 1.75 on the live load", () => {
    const { effects, checks } = stringerOf({});
    const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw, liveMomentKipFt: ML } = effects;
    const factored = 1.25 * (M1 + M2) + 1.5 * Mw + 1.75 * ML;
    expect(checks.find(({ id }) => id === "flexure")?.demand).toBeCloseTo(factored, 10);
    expect(effects.requiredZIn3).toBeCloseTo((12 * factored) / 50, 10);
  });
});

describe("what the shape carries alone", () => {
  it("service II: everything on Sx, 1.30 on the live load, against 0.80 Fy", () => {
    const stringer = stringerOf({});
    const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw, liveMomentKipFt: ML } = stringer.effects;
    const moment = M1 + M2 + Mw + 1.3 * ML;
    expect(checkOf(stringer, "service-ii").demand).toBeCloseTo((12 * moment) / W33X130.sectionModulusXIn3, 10);
    expect(checkOf(stringer, "service-ii").capacity).toBeCloseTo(40, 12);
    expect(stringer.effects.requiredSIn3).toBeCloseTo((12 * moment) / 40, 10);
  });

  it("deflection and fatigue on the bare shape, and no studs", () => {
    const [bare, together] = [stringerOf({}), stringerOf({ "deck.composite": true })];
    const ratio = (id: CheckId): number => checkOf(bare, id).demand / checkOf(together, id).demand;
    const step = (symbol: string): number => {
      const found = together.lines.find((line) => line.type === "step" && line.formula.symbol === symbol);
      return found?.type === "step" ? found.result : Number.NaN;
    };
    expect(ratio("live-load-deflection")).toBeCloseTo(step("In") / W33X130.inertiaXIn4, 8);
    expect(ratio("fatigue")).toBeCloseTo(step("Sbn") / W33X130.sectionModulusXIn3, 8);
    expect(bare.studs).toBeNull();
    expect(bare.effects.plasticMomentKipFt).toBeNull();
  });

  it("the depth advised is of the steel alone", () => {
    const { demand, capacity } = checkOf(stringerOf({}), "depth");
    expect([demand, capacity]).toEqual([12 * 0.04 * 50, W33X130.depthIn]);
  });
});

describe("proportions of 6.10.2", () => {
  const proportions = (plates: Parameters<typeof invented>[0]) =>
    checkOf(stringerOf({}, invented(plates, { yieldStressKsi: 36 })), "proportions");

  // Each of the four where it is the nearest: the value, its limit, and the article.
  it.each([
    ["web D/tw to 150", { d: 62, bf: 20, tf: 1, tw: 0.42 }, 60 / 0.42, 150, "6.10.2.1.1"],
    ["flange bf/2tf to 12", { d: 32, bf: 22, tf: 1, tw: 0.5 }, 11, 12, "6.10.2.2-1"],
    ["flange at least D/6 wide", { d: 62, bf: 11, tf: 1, tw: 0.8 }, 10, 11, "6.10.2.2-2"],
    ["flange at least 1.1 tw thick", { d: 22, bf: 22, tf: 1, tw: 0.85 }, 0.935, 1, "6.10.2.2-3"],
  ])("%s", (_, plates, demand, capacity, article) => {
    const found = proportions(plates);
    expect(found.demand).toBeCloseTo(demand, 10);
    expect(found.capacity).toBeCloseTo(capacity, 10);
    expect(found).toMatchObject({ article, ok: true, kind: "limit" });
  });

  it.each([
    ["web", { d: 62, bf: 20, tf: 1, tw: 0.39 }],
    ["thin flange", { d: 32, bf: 24.5, tf: 1, tw: 0.5 }],
    ["narrow flange", { d: 62, bf: 9.9, tf: 1, tw: 0.7 }],
    ["flange thinner than 1.1 tw", { d: 22, bf: 10, tf: 1, tw: 0.92 }],
  ])("refused beyond: %s", (_, plates) => {
    expect(proportions(plates).ok).toBe(false);
  });
});
