// Stringers buckle while the deck is wet more often than under traffic: the bare shape stands alone then, and a bracket may bend its flange
// sideways as well. Each of the three conditions governs somewhere; one left out would show on the day of the pour.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. 3.4.2.1, 6.10.1.6, 6.10.3.2, 6.10.8.2.2, A6.3.3 (from memory).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import type { StringerAssessment } from "../../../../src/specs/contract.js";
import { preparedOf } from "../../../support/question.js";
import { invented, shapeNamed } from "../../../support/shapes.js";

const FY = 50;
const SHAPE = shapeNamed("W33X130");
const BRIDGE = { spanFt: 60, "stringers.spacingFt": 8 };
const stringerOf = (change: Readonly<Record<string, unknown>>): StringerAssessment =>
  check(preparedOf({ ...BRIDGE, ...change }), SHAPE.designation).assessment.stringers[0];
const pourOf = (change: Readonly<Record<string, unknown>>) => {
  const found = stringerOf(change).checks.find(({ id }) => id === "deck-pour");
  if (found === undefined) throw new Error("no deck-pour check");
  return found;
};

/** Buckling stress of the bare shape between diaphragms on the straight line of A6.3.3, written out. */
function bucklingKsi(Lb: number): number {
  const E = 29000;
  const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, webThicknessIn: tw } = SHAPE;
  const { sectionModulusXIn3: Sx, plasticModulusXIn3: Zx, torsionJIn4: J } = SHAPE;
  const h = d - tf;
  const rt = bf / Math.sqrt(12 * (1 + (((d - 2 * tf) / 2) * tw) / (3 * bf * tf)));
  const Lp = rt * Math.sqrt(E / FY);
  const x = (0.7 * FY * Sx * h) / (E * J);
  const Lr = 1.95 * rt * (E / (0.7 * FY)) * Math.sqrt(J / (Sx * h)) * Math.sqrt(1 + Math.sqrt(1 + 6.76 * x ** 2));
  expect(Lb).toBeGreaterThan(Lp);
  expect(Lb).toBeLessThan(Lr);
  const Mp = FY * Zx;
  return Math.min(FY, (Mp - (Mp - 0.7 * FY * Sx) * ((Lb - Lp) / (Lr - Lp))) / Sx);
}
/** Stress of wet deck, steel and construction load, written out: w1 and wc in kip/ft. */
const stressKsi = (w1: number, wc: number): number => {
  const moment = (Math.max(1.25 * w1 + 1.5 * wc, 1.4 * (w1 + wc)) * 60 ** 2) / 8;
  return (12 * moment) / SHAPE.sectionModulusXIn3;
};
// 8.5 in of deck on 8 ft, a haunch of 2 in on the flange, the shape and 5 %.
const W1 = (8.5 / 12) * 8 * 0.15 + ((SHAPE.flangeWidthIn * 2) / 144) * 0.15 + 0.13 * 1.05;
const WC = 0.02 * 8;

describe("without bending by brackets", () => {
  it("buckling between the diaphragms: 60 ft in three bays", () => {
    const { demand, capacity } = pourOf({});
    expect(stringerOf({}).effects.deadStage1Klf).toBeCloseTo(W1, 12);
    expect(demand).toBeCloseTo(stressKsi(W1, WC), 8);
    expect(capacity).toBeCloseTo(bucklingKsi(240), 6);
    expect(stringerOf({}).notes.map(({ code }) => code)).toContain("brackets-not-covered");
  });

  it("closer diaphragms raise it, to the yield stress and no further", () => {
    expect(pourOf({ "bracing.diaphragmSpacingFt": 15 }).capacity).toBeCloseTo(bucklingKsi(180), 6);
    expect(pourOf({ "bracing.diaphragmSpacingFt": 3 }).capacity).toBe(FY);
  });

  it("a thin flange buckles before: 6.10.8.2.2, on a line from Fy at 0.38 sqrt(E/Fy) to 0.7 Fy at 0.56 sqrt(E/(0.7 Fy))", () => {
    const [lpf, lrf] = [0.38 * Math.sqrt(29000 / FY), 0.56 * Math.sqrt(29000 / (0.7 * FY))];
    for (const lf of [8, lpf, 10, 11.9]) {
      const shape = invented({ d: 33, bf: 14, tf: 14 / (2 * lf), tw: 0.6 }, { yieldStressKsi: FY });
      const prepared = preparedOf({ ...BRIDGE, "bracing.diaphragmSpacingFt": 1 }, [shape]);
      const { checks } = check(prepared, shape.designation).assessment.stringers[0];
      const line = FY * (1 - 0.3 * (Math.max(0, lf - lpf) / (lrf - lpf)));
      expect(checks.find(({ id }) => id === "deck-pour")?.capacity, `bf/2tf ${lf}`).toBeCloseTo(line, 8);
    }
  });

  it("the worse of 1.25 and 1.5, and of 1.4 on all", () => {
    // Construction load over one and a half times the rest: the first; else the second.
    const given = { "deadLoad.stage1Klf": 0.3 };
    const w1 = 0.3 + 0.13 * 1.05;
    for (const psf of [0, 80, 82, 200]) {
      const wc = (psf * 8) / 1000;
      expect(pourOf({ ...given, "pour.constructionPsf": psf }).demand).toBeCloseTo(stressKsi(w1, wc), 8);
    }
    const heavy = ((1.25 * w1 + 1.5 * 1.6) * 3600) / 8 / (SHAPE.sectionModulusXIn3 / 12);
    expect(pourOf({ ...given, "pour.constructionPsf": 200 }).demand).toBeCloseTo(heavy, 8);
  });

  it("concerns concrete decks only", () => {
    const deck = { "deck.kind": "glulam", "deck.thicknessIn": 6, "barriers.baseFt": 1, "barriers.weightKlf": 0.1 };
    const { checks } = stringerOf({ ...deck, "stringers.spacingFt": 6 });
    expect(checks.map(({ id }) => id)).not.toContain("deck-pour");
  });
});

describe("with bending by brackets", () => {
  const governing = (fl: number, change: Readonly<Record<string, unknown>> = {}) => {
    const { demand, capacity, ratio } = pourOf({ ...change, "pour.lateralBendingKsi": fl });
    const fbu = stressKsi(W1, WC);
    const Fnc = bucklingKsi((12 * 60) / 3);
    const ratios = [(fbu + fl / 3) / Fnc, (fbu + fl) / FY, fl / (0.6 * FY)];
    expect(ratio).toBeCloseTo(Math.max(...ratios), 6);
    expect(ratio).toBeCloseTo(demand / capacity, 12);
    return ratios.indexOf(Math.max(...ratios));
  };

  it("a little: buckling with a third of it", () => expect(governing(3)).toBe(0));
  it("more: yielding with all of it", () => expect(governing(20)).toBe(1));
  it("most: its own limit of 0.6 Fy", () => expect(governing(45)).toBe(2));

  it("on the limit passes, a hair beyond does not", () => {
    // A stringer with next to nothing on it, held closely: bending sideways alone decides.
    const idle = { "deadLoad.stage1Klf": 0, "pour.constructionPsf": 0, "bracing.diaphragmSpacingFt": 3, spanFt: 20 };
    expect(pourOf({ ...idle, "pour.lateralBendingKsi": 30 }).ok).toBe(true);
    expect(pourOf({ ...idle, "pour.lateralBendingKsi": 30 + 1e-9 }).ok).toBe(false);
  });

  it("is covered then, and the note is not made", () => {
    expect(stringerOf({ "pour.lateralBendingKsi": 3 }).notes.map(({ code }) => code)).not.toContain("brackets-not-covered");
  });
});
