// Which rule a shape's capacity comes by is worth up to 15 % of its strength, and more when the flange is braced too far apart: a limit
// read on the wrong side gives a shape Fy Z that buckles before. Invented shapes stand at each limit and just beyond it.
// AASHTO Standard Specifications, 17th ed., Art. 10.48.1, 10.48.2, 10.48.4 (limits seen; Mr and 487 from memory).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import type { Shape } from "../../../../src/catalogue/shape.js";
import { type FlexureCapacity, flexureCapacity, newFlexureCapacity, partiallyBracedMoment } from "../../../../src/specs/lfd/flexure.js";
import { preparedOf } from "../../../support/question.js";
import { invented, shapeNamed } from "../../../support/shapes.js";

const HAIR = 1e-9;
const GRADES = [33, 36, 42, 50];

/** An invented shape of given bf/2tf and D/tw. */
function slender(flange: number, web: number, d = 30, tf = 0.75): Shape {
  return invented({ d, tf, bf: 2 * tf * flange, tw: (d - 2 * tf) / web });
}

function capacityOf(shape: Shape, Fy: number, unbracedIn: number): FlexureCapacity {
  const out = newFlexureCapacity();
  flexureCapacity(shape, Fy, unbracedIn, out, null);
  return out;
}

/** Lateral buckling moment with Cb = 1, not capped, kip-ft. */
function uncappedMr({ flangeWidthIn: bf, flangeThicknessIn: tf, depthIn: d, torsionJIn4: J }: Shape, Lb: number): number {
  const Iyc = (tf * bf ** 3) / 12;
  return (91000 * (Iyc / Lb) * Math.sqrt((0.772 * J) / Iyc + 9.87 * (d / Lb) ** 2)) / 12;
}
const plastic = (shape: Shape, Fy: number) => (Fy * shape.plasticModulusXIn3) / 12;
const elastic = (shape: Shape, Fy: number) => (Fy * shape.sectionModulusXIn3) / 12;

describe.each(GRADES)("Fy %i ksi, flange held", (Fy) => {
  const flangeLimit = 65 / Math.sqrt(Fy);
  const webLimit = 608 / Math.sqrt(Fy);
  const together = 1064 / Math.sqrt(Fy);

  it("compact up to bf/2tf = 65/sqrt(Fy)", () => {
    const at = slender(flangeLimit * (1 - HAIR), 0.6 * webLimit);
    const beyond = slender(flangeLimit * (1 + HAIR), 0.6 * webLimit);
    expect(capacityOf(at, Fy, 0)).toMatchObject({ route: "compact", article: "10.48.1", flangeLimit, webLimit });
    expect(capacityOf(at, Fy, 0).capacityKipFt).toBeCloseTo(plastic(at, Fy), 9);
    expect(capacityOf(beyond, Fy, 0)).toMatchObject({ route: "noncompact", article: "10.48.2", flangeLimit: 12, webLimit: 150 });
    expect(capacityOf(beyond, Fy, 0).capacityKipFt).toBeCloseTo(elastic(beyond, Fy), 9);
  });

  it("compact up to D/tw = 608/sqrt(Fy)", () => {
    const at = slender(0.6 * flangeLimit, webLimit * (1 - HAIR));
    const beyond = slender(0.6 * flangeLimit, webLimit * (1 + HAIR));
    expect(capacityOf(at, Fy, 0).route).toBe("compact");
    expect(capacityOf(at, Fy, 0).capacityKipFt).toBeCloseTo(plastic(at, Fy), 9);
    expect(capacityOf(beyond, Fy, 0).route).toBe("noncompact");
    expect(capacityOf(beyond, Fy, 0).capacityKipFt).toBeCloseTo(elastic(beyond, Fy), 9);
  });

  it("flange and web together up to D/tw + 9.35 bf/2tf = 1064/sqrt(Fy), when both exceed 75 %", () => {
    const flange = 0.88 * flangeLimit;
    const web = together - 9.35 * flange;
    expect(web / webLimit).toBeGreaterThan(0.75);
    expect(web / webLimit).toBeLessThan(1);
    const at = capacityOf(slender(flange, web * (1 - HAIR)), Fy, 0);
    expect(at.route).toBe("compact");
    expect(at.interaction).toBeCloseTo(together, 5);
    expect(at.interactionLimit).toBeCloseTo(together, 12);
    expect(capacityOf(slender(flange, web * (1 + HAIR)), Fy, 0).route).toBe("noncompact");
    // Both within their own limits, far beyond the common one.
    expect(capacityOf(slender(0.99 * flangeLimit, 0.99 * webLimit), Fy, 0).route).toBe("noncompact");
  });

  it.each([
    [0.75 - HAIR, 1 - HAIR],
    [1 - HAIR, 0.75 - HAIR],
    [0.76, 0.76],
  ])("no interaction with the flange at %f and the web at %f of its limit", (flange, web) => {
    expect(capacityOf(slender(flange * flangeLimit, web * webLimit), Fy, 0).route).toBe("compact");
  });

  it("beyond compact the flange's buckling stress is (69.6/lf)^2, at most Fy", () => {
    const full = 69.6 / Math.sqrt(Fy);
    for (const flange of [flangeLimit + 0.01, full * (1 - HAIR)].filter((lf) => lf <= 12)) {
      const shape = slender(flange, 50);
      expect(capacityOf(shape, Fy, 0).capacityKipFt).toBeCloseTo(elastic(shape, Fy), 5);
    }
    for (const flange of [full + 0.05, 11, 12].filter((lf) => lf > full && lf <= 12)) {
      const shape = slender(flange, 50);
      expect(capacityOf(shape, Fy, 0).capacityKipFt).toBeCloseTo(elastic(shape, (69.6 / flange) ** 2), 6);
      expect(capacityOf(shape, Fy, 0).capacityKipFt).toBeLessThan(elastic(shape, Fy));
    }
  });

  it("bf/2tf over 12 and D/tw over 150 have no capacity, whatever the bracing", () => {
    // 12 and 150 come out exactly of these plates.
    const wide = invented({ d: 30, bf: 12, tf: 0.5, tw: 0.5 });
    const thin = invented({ d: 31, bf: 8, tf: 0.5, tw: 0.2 });
    expect(capacityOf(wide, Fy, 0)).toMatchObject({ flangeSlenderness: 12, flangeLimit: 12 });
    expect(capacityOf(thin, Fy, 0)).toMatchObject({ webSlenderness: 150, webLimit: 150 });
    expect(capacityOf(wide, Fy, 0).capacityKipFt).toBeGreaterThan(0);
    expect(capacityOf(thin, Fy, 0).capacityKipFt).toBeGreaterThan(0);
    for (const unbraced of [0, 60, 300]) {
      expect(capacityOf(invented({ d: 30, bf: 12.0001, tf: 0.5, tw: 0.5 }), Fy, unbraced).capacityKipFt).toBe(0);
      expect(capacityOf(invented({ d: 31.0001, bf: 8, tf: 0.5, tw: 0.2 }), Fy, unbraced).capacityKipFt).toBe(0);
    }
  });
});

describe.each(GRADES)("Fy %i ksi, bracing", (Fy) => {
  const shape = slender(6, 45);
  const compactTo = ((3600 - 2200) * shape.radiusYIn) / Fy;
  const noncompactTo = (20000 * shape.flangeWidthIn * shape.flangeThicknessIn) / (Fy * shape.depthIn);

  it("compact up to (3600 - 2200 M1/Mu) ry/Fy with M1/Mu = 1 at midspan", () => {
    expect(compactTo).toBeLessThan(noncompactTo);
    const at = capacityOf(shape, Fy, compactTo * (1 - HAIR));
    expect(at.route).toBe("compact");
    expect(at.bracingLimitIn).toBeCloseTo(compactTo, 9);
    const beyond = capacityOf(shape, Fy, compactTo * (1 + HAIR));
    expect(beyond.route).toBe("noncompact");
    expect(beyond.capacityKipFt).toBeCloseTo(elastic(shape, Fy), 9);
  });

  it("braced noncompact up to 20000 Af/(Fy d), partially braced beyond", () => {
    const at = capacityOf(shape, Fy, noncompactTo * (1 - HAIR));
    expect(at.route).toBe("noncompact");
    expect(at.bracingLimitIn).toBeCloseTo(noncompactTo, 9);
    const beyond = capacityOf(shape, Fy, noncompactTo * (1 + HAIR));
    expect(beyond).toMatchObject({ route: "partially-braced", article: "10.48.4" });
    expect(beyond.capacityKipFt).toBeCloseTo(Math.min(elastic(shape, Fy), uncappedMr(shape, noncompactTo)), 5);
  });

  it("Mr by its formula, never above Fy Sx, and falling without a step", () => {
    let before = Number.POSITIVE_INFINITY;
    let [capped, free] = [0, 0];
    for (let Lb = noncompactTo + 0.01; Lb <= 800; Lb += 0.5) {
      const { capacityKipFt } = capacityOf(shape, Fy, Lb);
      const expected = Math.min(elastic(shape, Fy), uncappedMr(shape, Lb));
      expect(capacityKipFt).toBeCloseTo(expected, 8);
      expect(capacityKipFt).toBeLessThanOrEqual(before);
      // A step of half an inch cannot cost more than the steepest part of the curve, at its short end.
      if (before < Number.POSITIVE_INFINITY) expect(before - capacityKipFt).toBeLessThan(0.02 * elastic(shape, Fy));
      before = capacityKipFt;
      if (expected < elastic(shape, Fy)) free++;
      else capped++;
    }
    expect(capped).toBeGreaterThan(10);
    expect(free).toBeGreaterThan(100);
  });

  it("the line a checker reads, Mr alone, is capped as well", () => {
    const { flangeWidthIn: bf, flangeThicknessIn: tf, depthIn: d, torsionJIn4: J, sectionModulusXIn3: Sx } = shape;
    const Mr = (Lb: number) => partiallyBracedMoment.of(Fy, Sx, 1, (tf * bf ** 3) / 12, Lb, J, d);
    expect(uncappedMr(shape, 20)).toBeGreaterThan(elastic(shape, Fy));
    expect(Mr(20)).toBeCloseTo(elastic(shape, Fy), 9);
    expect(uncappedMr(shape, 700)).toBeLessThan(elastic(shape, Fy));
    expect(Mr(700)).toBeCloseTo(uncappedMr(shape, 700), 9);
  });

  it("meets its cap without a step", () => {
    let [low, high] = [noncompactTo, 2000];
    for (let halving = 0; halving < 80; halving++) {
      const middle = (low + high) / 2;
      if (uncappedMr(shape, middle) > elastic(shape, Fy)) low = middle;
      else high = middle;
    }
    expect(low).toBeGreaterThan(noncompactTo + 1);
    expect(capacityOf(shape, Fy, low - 1).capacityKipFt).toBeCloseTo(elastic(shape, Fy), 9);
    expect(capacityOf(shape, Fy, low + 1e-6).capacityKipFt).toBeCloseTo(elastic(shape, Fy), 4);
    expect(capacityOf(shape, Fy, low + 10).capacityKipFt).toBeLessThan(elastic(shape, Fy) - 1e-3);
  });

  it("a slender flange caps Mr at its own buckling stress", () => {
    const flange = 11.5;
    const wide = slender(flange, 50);
    const Fcr = Math.min(Fy, (69.6 / flange) ** 2);
    const Lb = (20000 * wide.flangeWidthIn * wide.flangeThicknessIn) / (Fy * wide.depthIn) + 1;
    expect(capacityOf(wide, Fy, Lb).route).toBe("partially-braced");
    expect(capacityOf(wide, Fy, Lb).capacityKipFt).toBeCloseTo(Math.min(elastic(wide, Fcr), uncappedMr(wide, Lb)), 8);
  });

  it("a web beyond D/2tw = 487/sqrt(Fy) is outside the partially braced rule", () => {
    const web = (2 * 487) / Math.sqrt(Fy);
    // For Fy below 42.2 ksi that lies beyond D/tw 150, which ends every rule.
    const at = slender(6, Math.min(150, web) * (1 - HAIR));
    const beyond = slender(6, Math.min(150, web) * (1 + HAIR));
    expect(capacityOf(at, Fy, 300).route).toBe("partially-braced");
    expect(capacityOf(at, Fy, 300).capacityKipFt).toBeGreaterThan(0);
    expect(capacityOf(beyond, Fy, 300).capacityKipFt).toBe(0);
  });
});

describe("shapes of the catalogue", () => {
  it("W33X118 at 50 ksi: compact when held, 10.48.4 with diaphragms at 20 ft", () => {
    const shape = shapeNamed("W33X118");
    expect(capacityOf(shape, 50, 0)).toMatchObject({ route: "compact" });
    expect(capacityOf(shape, 50, 0).capacityKipFt).toBeCloseTo((50 * 415) / 12, 9);
    const braced = capacityOf(shape, 50, 240);
    expect(braced.route).toBe("partially-braced");
    expect(braced.capacityKipFt).toBeCloseTo(Math.min(elastic(shape, 50), uncappedMr(shape, 240)), 8);
  });

  it("one object filled twice holds nothing of the shape before", () => {
    const out = newFlexureCapacity();
    flexureCapacity(slender(13, 50), 50, 0, out, null);
    expect(out.capacityKipFt).toBe(0);
    flexureCapacity(shapeNamed("W33X118"), 50, 0, out, null);
    expect(out).toEqual(capacityOf(shapeNamed("W33X118"), 50, 0));
  });
});

describe("through the whole assessment", () => {
  // Capacity 0 makes the ratio infinite: a shape outside every rule must be NG, not passed over.
  it.each([
    ["a flange over 12", invented({ d: 40, bf: 24.5, tf: 1, tw: 0.7 }), "flange-slenderness", 12.25 / 12],
    ["a web over 150", invented({ d: 62, bf: 16, tf: 1, tw: 0.39 }), "web-slenderness", 60 / 0.39 / 150],
  ])("%s fails flexure and its limit though it is strong enough by far", (_, shape, id, ratio) => {
    const steel = { ...shape, designation: "TOO-THIN", yieldStressKsi: 50 };
    const layout = { "stringers.count": 6, "stringers.spacingFt": 5.5, "deck.outToOutFt": 33 };
    const bridge = { specification: "lfd", "deck.composite": false, spanFt: 40, "bracing.topFlange": "held", ...layout };
    const { assessment } = check(preparedOf(bridge, [steel]), "TOO-THIN");
    expect(assessment.passes).toBe(false);
    for (const { checks } of assessment.stringers) {
      expect(checks.find((one) => one.id === "flexure")).toMatchObject({ capacity: 0, ratio: Number.POSITIVE_INFINITY, ok: false });
      const limit = checks.find((one) => one.id === id);
      expect(limit?.ok).toBe(false);
      expect(limit?.ratio).toBeCloseTo(ratio, 9);
    }
  });

  it("leaving the compact route lowers the capacity and is no failure", () => {
    const bridge = { specification: "lfd", "deck.composite": false, spanFt: 40, "stringers.spacingFt": 5 };
    const diaphragms = check(preparedOf(bridge), "W36X150").assessment.stringers[0].checks;
    const held = check(preparedOf({ ...bridge, "bracing.topFlange": "held" }), "W36X150").assessment.stringers[0].checks;
    const capacity = (checks: typeof held) => checks.find(({ id }) => id === "flexure")?.capacity ?? Number.NaN;
    expect(capacity(held)).toBeCloseTo(plastic(shapeNamed("W36X150"), 50), 9);
    expect(capacity(diaphragms)).toBeLessThan(capacity(held));
    expect(diaphragms.filter(({ id }) => id.endsWith("slenderness")).every(({ ok }) => ok)).toBe(true);
    expect(held.find(({ id }) => id === "bracing")).toMatchObject({ demand: 0, ratio: 0, ok: true });
    // Interaction is a limit of the compact route alone.
    expect(held.some(({ id }) => id === "slenderness-interaction")).toBe(true);
    expect(diaphragms.some(({ id }) => id === "slenderness-interaction")).toBe(false);
  });
});
