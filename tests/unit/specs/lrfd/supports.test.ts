// Somebody will saw the bearing to the length printed and leave the stiffeners out: the web over it must then carry the reaction, no less.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. D6.5.2, D6.5.3 (from memory).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import type { Shape } from "../../../../src/catalogue/shape.js";
import { bearingLengthNeededIn, webAtBearingKip } from "../../../../src/specs/bearing.js";
import { CATALOGUE, preparedOf } from "../../../support/question.js";
import { shapeNamed } from "../../../support/shapes.js";

/** The web over a bearing, written out: yielding and crippling. */
function byHand({ kDesignIn: k, webThicknessIn: tw, flangeThicknessIn: tf, depthIn: d }: Shape, Fy: number, N: number) {
  const yielding = (2.5 * k + N) * Fy * tw;
  const along = N / d <= 0.2 ? 3 * (N / d) : 4 * (N / d) - 0.2;
  const crippling = 0.8 * 0.4 * tw ** 2 * (1 + along * (tw / tf) ** 1.5) * Math.sqrt((29000 * Fy * tf) / tw);
  return { yielding, crippling };
}

describe("reaction that the web takes", () => {
  it("is the lesser of yielding and crippling, with either rule of length", () => {
    const seen = new Set<string>();
    for (const shape of CATALOGUE) {
      for (const N of [1, 4, 0.2 * shape.depthIn, 0.2 * shape.depthIn + 1e-9, 12, 24]) {
        const { yielding, crippling } = byHand(shape, 50, N);
        expect(webAtBearingKip(shape, 50, N, null), shape.designation).toBeCloseTo(Math.min(yielding, crippling), 8);
        seen.add(`${yielding < crippling ? "yielding" : "crippling"} ${N / shape.depthIn <= 0.2 ? "short" : "long"}`);
      }
    }
    expect(seen.size).toBe(4);
  });
});

describe("bearing length that avoids stiffeners", () => {
  it.each([36, 50])("Fy %i ksi, every shape: at that length the web takes just the reaction", (Fy) => {
    for (const shape of CATALOGUE) {
      const atOnce = webAtBearingKip(shape, Fy, 1e-9, null);
      for (const times of [1.01, 1.2, 1.5, 2, 3]) {
        const reaction = times * atOnce;
        const N = bearingLengthNeededIn(shape, Fy, reaction);
        expect(N, shape.designation).toBeGreaterThan(0);
        expect(webAtBearingKip(shape, Fy, N, null) / reaction, `${shape.designation}, ${times}`).toBeCloseTo(1, 9);
      }
      expect(bearingLengthNeededIn(shape, Fy, 0.99 * atOnce), shape.designation).toBe(0);
    }
  });

  it("a bearing of that length, given, needs none; a shorter one does", () => {
    const bridge = { spanFt: 60, "deck.outToOutFt": 33, "stringers.count": 4, "stringers.spacingFt": 9 };
    const supportOf = (lengthIn: number) =>
      check(preparedOf({ ...bridge, "bearing.lengthIn": lengthIn }), "W40X149").assessment.stringers.map(({ support }) => support);
    const [interior, exterior] = supportOf(8);
    for (const { shearKip, withoutStiffenersKip, stiffenersNeeded, article } of [interior, exterior]) {
      const { yielding, crippling } = byHand(shapeNamed("W40X149"), 50, 8);
      expect(withoutStiffenersKip).toBeCloseTo(Math.min(yielding, crippling), 8);
      expect(stiffenersNeeded).toBe(shearKip > withoutStiffenersKip);
      expect(article).toBe("D6.5");
    }
    const needed = exterior.bearingLengthNeededIn;
    expect(supportOf(needed + 1e-6)[1].stiffenersNeeded).toBe(false);
    expect(supportOf(needed - 1e-6)[1].stiffenersNeeded).toBe(true);
  });

  it("the reaction is that of Strength I", () => {
    const { effects, support } = check(preparedOf({ spanFt: 50, "stringers.spacingFt": 8 }), "W33X118").assessment.stringers[0];
    const { deadStage1Klf: w1, deadStage2Klf: w2, deadWearingKlf: ww, liveShearKip: VL } = effects;
    expect(support.shearKip).toBeCloseTo((1.25 * (w1 + w2) + 1.5 * ww) * 25 + 1.75 * VL, 8);
    expect(effects.factoredShearKip).toBe(support.shearKip);
  });
});
