// Most new bridges go through these few rules. A brittle section taken at its full plastic moment, or a thin web taken as stocky, would pass
// stringers that fail before they bend.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. 4.6.2.6.1, 6.10.1.1.1b, 6.10.4.2.2, 6.10.6.2.2, 6.10.7, 6.10.10.4 (from memory).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import type { Shape } from "../../../../src/catalogue/shape.js";
import type { CheckId, StringerAssessment } from "../../../../src/specs/contract.js";
import { preparedOf } from "../../../support/question.js";
import { invented, shapeNamed } from "../../../support/shapes.js";

type Change = Readonly<Record<string, unknown>>;
const stringersOf = (change: Change, shape: Shape): readonly StringerAssessment[] =>
  check(preparedOf({ specification: "lrfd", ...change }, [shape]), shape.designation).assessment.stringers;
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
const routeOf = ({ notes }: StringerAssessment) => notes.find(({ code }) => code === "composite-route")?.args[0];
const W36X150 = shapeNamed("W36X150");
const ONE = { spanFt: 60, "stringers.spacingFt": 8 };

describe("slab and modular ratio", () => {
  it("the tributary width, whatever span and thickness", () => {
    const deck = { spanFt: 20, "deck.outToOutFt": 36, "stringers.count": 4, "stringers.spacingFt": 10, "deck.thicknessIn": 6 };
    expect(stringersOf(deck, W36X150).map(({ effects }) => effects.effectiveWidthIn)).toEqual([120, 12 * (5 + 3)]);
  });

  it("n = E/Ec from f'c, unless given", () => {
    const { areaIn2: A, depthIn: d, inertiaXIn4: Ix } = W36X150;
    const inertia = (n: number): number => {
      const slab = (96 * 8) / n;
      const y = ((A * d) / 2 + slab * (d + 4)) / (A + slab);
      return Ix + A * (y - d / 2) ** 2 + (96 * 8 ** 3) / (12 * n) + slab * (d + 4 - y) ** 2;
    };
    for (const [change, n] of [
      [{}, 29000 / (120000 * 0.145 ** 2 * 4 ** 0.33)],
      [{ "deck.fcKsi": 6 }, 29000 / (120000 * 0.145 ** 2 * 6 ** 0.33)],
      [{ "deck.modularRatio": 9 }, 9],
    ] as const) {
      const [stringer] = stringersOf({ ...ONE, ...change }, W36X150);
      expect(stepOf(stringer, "In")).toBeCloseTo(inertia(n), 6);
      expect(stepOf(stringer, "I3n")).toBeCloseTo(inertia(3 * n), 6);
    }
  });
});

describe("ductility", () => {
  it("Mp while Dp <= 0.1 Dt, and the reduction from there without a step", () => {
    // Concrete of a strength at which the axis stands at 0.1 (35.9 + 8) in.
    const Dt = W36X150.depthIn + 8;
    const fc = (W36X150.areaIn2 * 50) / (0.85 * 96 * 0.1 * Dt);
    const [[shallow], [deep]] = [1 + 1e-9, 1 - 1e-9].map((part) => stringersOf({ ...ONE, "deck.fcKsi": fc * part }, W36X150));
    expect([routeOf(shallow), routeOf(deep)]).toEqual(["plastic", "reduced"]);
    expect(checkOf(shallow, "flexure").capacity).toBe(shallow.effects.plasticMomentKipFt);
    expect(checkOf(deep, "flexure").capacity / checkOf(shallow, "flexure").capacity).toBeCloseTo(1, 7);
  });

  it("Dp beyond 0.42 Dt is refused", () => {
    const shape = shapeNamed("W44X408");
    const [stringer] = stringersOf({ spanFt: 30, "stringers.spacingFt": 3.5, "deck.thicknessIn": 4.5, "deck.fcKsi": 2 }, shape);
    const { demand, capacity, ok, kind } = checkOf(stringer, "ductility");
    expect(capacity).toBeCloseTo(0.42 * (shape.depthIn + 4), 10);
    expect(demand).toBeGreaterThan(capacity);
    expect([ok, kind]).toEqual([false, "limit"]);
  });
});

describe("a web that is not compact", () => {
  // 60 in of thin web under a narrow slab: more than a third of it in compression at Mp.
  const withWeb = (tw: number, yieldStressKsi = 50): Shape => invented({ d: 62, bf: 16, tf: 1, tw }, { yieldStressKsi });
  const BRIDGE = { spanFt: 50, "stringers.spacingFt": 3.5, "deck.thicknessIn": 5, "deck.fcKsi": 2.5 };

  it("takes stress by stages against Fy, the worse flange", () => {
    const shape = withWeb(0.44);
    const [stringer] = stringersOf(BRIDGE, shape);
    expect(routeOf(stringer)).toBe("first-yield");
    expect((2 * stepOf(stringer, "Dcp")) / 0.44).toBeGreaterThan(3.76 * Math.sqrt(29000 / 50));
    const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw, liveMomentKipFt: ML } = stringer.effects;
    const stresses = ["b", "t"].map((side) => {
      const lasting = (12 * (1.25 * M2 + 1.5 * Mw)) / stepOf(stringer, `S${side}3n`);
      return (12 * 1.25 * M1) / shape.sectionModulusXIn3 + lasting + (12 * 1.75 * ML) / stepOf(stringer, `S${side}n`);
    });
    expect(checkOf(stringer, "flexure").demand).toBeCloseTo(Math.max(...stresses), 8);
    expect(checkOf(stringer, "flexure")).toMatchObject({ capacity: 50, unit: "ksi", article: "6.10.7.2" });
    // Both are written down under the heading of flexure, the bottom one first.
    const from = stringer.lines.findIndex((line) => line.type === "topic" && line.topic === "flexure");
    const written = stringer.lines
      .slice(from)
      .flatMap((line) => (line.type === "step" && /^f[bt]u?$/.test(line.formula.symbol) ? [line.result] : []));
    expect(written[0]).toBeCloseTo(stresses[0], 8);
    expect(written[1]).toBeCloseTo(stresses[1], 8);
    expect(checkOf(stringer, "web-slenderness")).toMatchObject({ capacity: 150, article: "6.10.2.1.1" });
    expect(checkOf(stringer, "web-slenderness").demand).toBeCloseTo(60 / 0.44, 10);
  });

  it("on the limit 2 Dcp/tw = 3.76 sqrt(E/Fy) is compact still", () => {
    let [thin, thick] = [0.44, 0.6];
    for (let halving = 0; halving < 50; halving++) {
      const middle = (thin + thick) / 2;
      if (routeOf(stringersOf(BRIDGE, withWeb(middle))[0]) === "first-yield") thin = middle;
      else thick = middle;
    }
    const [stringer] = stringersOf(BRIDGE, withWeb(thick));
    expect((2 * stepOf(stringer, "Dcp")) / thick).toBeCloseTo(3.76 * Math.sqrt(29000 / 50), 8);
    expect(checkOf(stringer, "web-slenderness").ok).toBe(true);
  });

  it("so is D/tw of 150, and steel of 70 ksi is the strongest that takes Mp", () => {
    // A wide slab: the axis lies above the web, and D/tw alone decides.
    const wide = { spanFt: 50, "stringers.spacingFt": 10, "deck.thicknessIn": 9 };
    expect(routeOf(stringersOf(wide, withWeb(60 / 150))[0])).not.toBe("first-yield");
    const [thin] = stringersOf(wide, withWeb(60 / 150.001));
    expect(routeOf(thin)).toBe("first-yield");
    expect(checkOf(thin, "web-slenderness").ok).toBe(false);
    expect(routeOf(stringersOf(wide, withWeb(0.8, 70))[0])).not.toBe("first-yield");
  });
});

describe("service II", () => {
  it("0.95 Fy against the worse flange, 1.30 on the live load, each stage on its own section", () => {
    const bridge = { spanFt: 60, "deck.outToOutFt": 33, "stringers.count": 4, "stringers.spacingFt": 9 };
    for (const stringer of stringersOf(bridge, W36X150)) {
      const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw, liveMomentKipFt: ML } = stringer.effects;
      const [fb, ft] = ["b", "t"].map((side) => {
        const lasting = (12 * (M2 + Mw)) / stepOf(stringer, `S${side}3n`);
        return (12 * M1) / W36X150.sectionModulusXIn3 + lasting + (12 * 1.3 * ML) / stepOf(stringer, `S${side}n`);
      });
      expect(stepOf(stringer, "fb")).toBeCloseTo(fb, 8);
      expect(stepOf(stringer, "ft")).toBeCloseTo(ft, 8);
      expect(checkOf(stringer, "service-ii").demand).toBeCloseTo(Math.max(fb, ft), 8);
      expect(checkOf(stringer, "service-ii").capacity).toBeCloseTo(47.5, 12);
    }
  });

  it("a top flange that the live load stretches adds nothing to what lasts", () => {
    const shape = shapeNamed("W12X26");
    const [stringer] = stringersOf({ spanFt: 20, "stringers.spacingFt": 8 }, shape);
    expect(stepOf(stringer, "Stn")).toBeLessThan(0);
    const { momentStage1KipFt: M1, momentStage2KipFt: M2, momentWearingKipFt: Mw } = stringer.effects;
    const St3n = stepOf(stringer, "St3n");
    const lasting = St3n > 0 ? (12 * (M2 + Mw)) / St3n : 0;
    expect(stepOf(stringer, "ft")).toBeCloseTo((12 * M1) / shape.sectionModulusXIn3 + lasting, 10);
  });
});

describe("studs by strength", () => {
  it("carry the lesser of slab and steel, 0.5 Asc sqrt(f'c Ec) each and at most 60 ksi, with 0.85, in whole rows", () => {
    for (const [change, force] of [
      [{}, W36X150.areaIn2 * 50],
      [{ "deck.thicknessIn": 6.5, "deck.fcKsi": 3, "studs.diameterIn": 0.75 }, 0.85 * 3 * 96 * 6],
      [{ "deck.fcKsi": 8, "studs.perRow": 4 }, W36X150.areaIn2 * 50],
    ] as const) {
      const given = { "deck.fcKsi": 4, "studs.diameterIn": 0.875, "studs.perRow": 3, ...change };
      const [{ studs }] = stringersOf({ ...ONE, ...given }, W36X150);
      const [fc, area] = [given["deck.fcKsi"], (Math.PI * given["studs.diameterIn"] ** 2) / 4];
      const Qn = Math.min(0.5 * area * Math.sqrt(fc * 120000 * 0.145 ** 2 * fc ** 0.33), 60 * area);
      expect(studs?.forceKip).toBeCloseTo(force, 8);
      expect(studs?.strengthKip).toBeCloseTo(Qn, 10);
      const rows = Math.ceil(force / (0.85 * Qn) / given["studs.perRow"]);
      expect(studs?.perHalfSpan).toBe(rows * given["studs.perRow"]);
      expect(studs?.perStringer).toBe(2 * rows * given["studs.perRow"]);
    }
  });
});
