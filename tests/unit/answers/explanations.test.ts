import { describe, expect, it } from "vitest";
import { check } from "../../../src/answers/check.js";
import { lightest } from "../../../src/answers/lightest.js";
import { prepare } from "../../../src/answers/question.js";
import type { Change } from "../../../src/answers/rescue.js";
import { nominalDepthIn } from "../../../src/catalogue/shape.js";
import { readVehicles } from "../../../src/loads/vehicles.js";
import { byHandLines } from "../../../src/report/by-hand.js";
import { CATALOGUE, preparedOf, questionOf, VEHICLES } from "../../support/question.js";

/** Invented bridges that between them reach every kind of rescue, flip and position. */
const LFD_BRIDGES: readonly Readonly<Record<string, unknown>>[] = [
  { spanFt: 60, "deck.outToOutFt": 33 },
  { spanFt: 48.5, "deck.outToOutFt": 30, "deck.thicknessIn": 8, "liveLoad.adtt": 450, "steel.grade": "50W" },
  { spanFt: 35, "deck.outToOutFt": 24, "steel.grade": "36", "liveLoad.adtt": 50 },
  { spanFt: 42, "stringers.spacingFt": 7 },
  { spanFt: 50, "stringers.spacingFt": 8, "bracing.topFlange": "held", "liveLoad.adtt": 50 },
  { spanFt: 60, "stringers.spacingFt": 7, "steel.grade": "36", "bracing.topFlange": "held", "liveLoad.adtt": 50 },
  { spanFt: 30, "deck.outToOutFt": 22, "bracing.topFlange": "held", "liveLoad.vehicle": "H15-44", "liveLoad.adtt": 10 },
  { spanFt: 70, "deck.outToOutFt": 40, "liveLoad.adtt": 300, "stringers.count": 5 },
  {
    spanFt: 36,
    "deck.kind": "glulam",
    "deck.outToOutFt": 16,
    "deck.thicknessIn": 6.75,
    "barriers.baseFt": 0.75,
    "barriers.weightKlf": 0.05,
    "stringers.minCount": 3,
  },
];

const BRIDGES: readonly Readonly<Record<string, unknown>>[] = [
  ...LFD_BRIDGES.map((bridge) => ({ specification: "lfd", "deck.composite": false, ...bridge })),
  { spanFt: 60, "deck.outToOutFt": 33 },
  { spanFt: 80, "deck.outToOutFt": 40, "liveLoad.adtt": 300, "steel.grade": "36" },
  { spanFt: 45, "deck.outToOutFt": 28, "deck.composite": false },
  { spanFt: 60, "deck.outToOutFt": 33, specification: "lfd" },
];

/** The keys by which a plain question would ask for a rescue's change. */
function asKeys(change: Change): Record<string, unknown> {
  switch (change.code) {
    case "diaphragms":
      return { "bracing.diaphragmSpacingFt": change.spacingFt };
    case "held":
      return { "bracing.topFlange": "held" };
    case "grade":
      return { "steel.grade": change.grade };
    case "deflection-reported":
      return { "deflection.use": "report" };
    default:
      return {};
  }
}

describe("rescue", () => {
  // An engineer who orders closer diaphragms on our word must find the shape passing when asked for it plainly.
  it.each(BRIDGES.map((bridge, index) => [index, bridge] as const))("passes when asked for plainly (bridge %i)", (_, bridge) => {
    const answer = lightest(preparedOf(bridge), 1);
    const rescue = answer.whyNotLighter?.rescue;
    if (rescue === null || rescue === undefined) return expect(answer.options.length).toBe(1);
    const { layout, shape } = rescue.assessment;
    const plain = preparedOf({
      ...bridge,
      ...asKeys(rescue.change),
      "stringers.spacingFt": layout.spacingFt,
      ...(layout.count !== null && { "stringers.count": layout.count }),
    });
    const checked = check(plain, shape).assessment;
    expect(checked.passes).toBe(true);
    expect(checked.governing).toEqual(rescue.assessment.governing);
    const weight = (one: { weightPlf: number; layout: { count: number | null } }) => one.weightPlf * (one.layout.count ?? 1);
    expect(rescue.lighterThanAnswer).toBe(weight(checked) < weight(answer.options[0].assessment));
  });

  it("is found by several kinds of change", () => {
    const codes = BRIDGES.map((bridge) => lightest(preparedOf(bridge), 1).whyNotLighter?.rescue?.change.code);
    expect(new Set(codes.filter((code) => code !== undefined)).size).toBeGreaterThanOrEqual(4);
  });

  it("was failing before the change, and is lighter per foot than the winner", () => {
    for (const bridge of BRIDGES) {
      const { whyNotLighter, options } = lightest(preparedOf(bridge), 1);
      if (!whyNotLighter?.rescue) continue;
      expect(whyNotLighter.nearest[0].shape).toBe(whyNotLighter.rescue.assessment.shape);
      expect(whyNotLighter.nearest[0].passes).toBe(false);
      expect(whyNotLighter.nearest[0].weightPlf).toBeLessThan(options[0].assessment.weightPlf);
    }
  });
});

describe("lightest by depth", () => {
  // A designer held to a 24 in beam reads this row instead of asking again: it must be the answer to that question.
  it.each(BRIDGES.map((bridge, index) => [index, bridge] as const))(
    "rows equal plain questions with other depths left out (bridge %i)",
    (_, bridge) => {
      const answer = lightest(preparedOf(bridge), 1);
      const depths = [...new Set(CATALOGUE.map(nominalDepthIn))];
      const rows = new Map(answer.byDepth.map((row) => [row.nominalDepthIn, row]));
      for (const depth of depths) {
        const plain = lightest(
          preparedOf(
            bridge,
            CATALOGUE.filter((shape) => nominalDepthIn(shape) === depth),
          ),
          1,
        ).options[0]?.assessment;
        const row = rows.get(depth);
        expect(row?.assessment.shape).toBe(plain?.shape);
        expect(row?.assessment.layout).toEqual(plain?.layout);
        expect(row?.assessment.governing).toEqual(plain?.governing);
      }
      for (const row of rows.values()) expect(row.extraPlfOfBridge).toBeGreaterThanOrEqual(0);
    },
  );
});

describe("rests on", () => {
  // What the answer says of a flipped assumption must be what a plain run with that value says.
  it.each(BRIDGES.map((bridge, index) => [index, bridge] as const))("each flip agrees with a plain run (bridge %i)", (_, bridge) => {
    const answer = lightest(preparedOf(bridge), 1);
    const best = answer.options[0].assessment;
    for (const flip of answer.restsOn) {
      expect(Object.keys(bridge)).not.toContain(flip.key);
      const changed = { ...bridge, [flip.key]: flip.flippedTo };
      const plain = lightest(preparedOf(changed), 1).options[0]?.assessment;
      if (flip.outcome === "fails") {
        const fixed = { ...changed, "stringers.spacingFt": best.layout.spacingFt };
        const same = check(preparedOf(best.layout.count === null ? fixed : { ...fixed, "stringers.count": best.layout.count }), best.shape);
        expect(same.assessment.passes).toBe(false);
        expect(same.assessment.governing).toEqual(flip.assessment.governing);
        expect(flip.instead?.shape).toBe(plain?.shape);
      } else {
        expect(flip.assessment.shape).toBe(plain?.shape);
        expect(flip.assessment.governing).toEqual(plain?.governing);
        const lighter = plain.weightPlf * (plain.layout.count ?? 1) < best.weightPlf * (best.layout.count ?? 1);
        expect(flip.outcome).toBe(lighter ? "passes lighter" : "other shape");
      }
    }
  });

  it("leaves out what the user stated and what changes nothing", () => {
    const stated = {
      specification: "lfd",
      "deck.composite": false,
      "barriers.baseFt": 1.5,
      "steel.grade": "50",
      "liveLoad.adtt": 3000,
      "bracing.topFlange": "diaphragms",
    };
    const answer = lightest(preparedOf({ spanFt: 60, "deck.outToOutFt": 33, "deflection.use": "enforce", ...stated }), 1);
    expect(answer.restsOn).toEqual([]);
  });

  it("says when a narrower curb brings another lane", () => {
    // 22 ft less two 1.5 ft bases is 19 ft, one lane; with 0.5 ft curbs it is 21 ft, two lanes (Standard Specifications 3.6).
    const { restsOn } = lightest(preparedOf({ spanFt: 40, "deck.outToOutFt": 22, specification: "lfd", "deck.composite": false }), 1);
    const curb = restsOn.find(({ key }) => key === "barriers.baseFt");
    expect(curb?.outcome).toBe("fails");
    expect(curb?.lanes).toBe(2);
  });
});

describe("by hand", () => {
  // A checker repeats these lines on a calculator: each must give what it prints, to the digits shown.
  it.each(BRIDGES.map((bridge, index) => [index, bridge] as const))("the lines work out to what they print (bridge %i)", (_, bridge) => {
    const prepared = preparedOf(bridge);
    const { byHand } = lightest(prepared, 1);
    if (byHand === null) throw new Error("no answer to explain");
    const [w, dead, live, need] = byHandLines(prepared.bridge, byHand.assessment, byHand.figures);
    const numbers = (text: string) => [...text.matchAll(/(?<![A-Za-z0-9-])\d+(?:\.\d+)?/g)].map(([digits]) => Number(digits));
    const near = (actual: number, expected: number) => expect(Math.abs(actual / expected - 1)).toBeLessThan(2e-4);
    const [w1, w2, ww, sum] = numbers(w);
    near(w1 + w2 + ww, sum);
    const [, deadMoment] = /= ([\d.]+) kip-ft/.exec(dead) ?? [];
    near((sum * prepared.bridge.spanFt ** 2) / 8, Number(deadMoment));
    if (prepared.bridge.specification === "lrfd") {
      const [, lane, share, moment] = /Live: ([\d.]+) .* x ([\d.]+) lanes = ([\d.]+)/.exec(live) ?? [];
      near(Number(lane) * Number(share), Number(moment));
      const [, dc, dw, ll, Mu] = /1\.25 x ([\d.]+) \+ 1\.50 x ([\d.]+) \+ 1\.75 x ([\d.]+) = ([\d.]+)/.exec(need) ?? [];
      near(1.25 * Number(dc) + 1.5 * Number(dw) + 1.75 * Number(ll), Number(Mu));
      return;
    }
    const [, table, factor, impact, liveMoment] =
      /Live: ([\d.]+) .* \/ 2 x ([\d.]+) wheel lines x ([\d.]+) impact = ([\d.]+)/.exec(live) ?? [];
    near((Number(table) / 2) * Number(factor) * Number(impact), Number(liveMoment));
    if (prepared.bridge.deck.composite) {
      const [, MD, ML, Mu] = /1\.3 x \(([\d.]+) \+ 1\.67 x ([\d.]+)\) = ([\d.]+)/.exec(need) ?? [];
      near(1.3 * (Number(MD) + 1.67 * Number(ML)), Number(Mu));
      return;
    }
    const [, D, k, LL, below, required] = /\(([\d.]+) \+ ([\d./]+) x ([\d.]+)\) \/ (\(0\.80 x \d+\)|\d+) = ([\d.]+) in3/.exec(need) ?? [];
    const factorOfLive = k === "5/3" ? 5 / 3 : Number(k);
    const divisor = below.startsWith("(") ? 0.8 * byHand.assessment.fyKsi : byHand.assessment.fyKsi / 1.3;
    near((12 * (Number(D) + factorOfLive * Number(LL))) / divisor, Number(required));
  });
});

describe("a vehicle of the user's own", () => {
  // Somebody types in the design truck by hand: its answers may not differ from the built-in one's.
  it("equal to HS20 gives HS20's answers", () => {
    const own = readVehicles(
      JSON.stringify([
        {
          name: "Own twenty",
          trains: [{ name: "truck", axlesKip: [8, 32, 32], spacingsFt: [14, 14] }],
          lane: { uniformKlf: 0.64, momentKip: 18, shearKip: 26 },
        },
      ]),
      "own.json",
      VEHICLES,
    );
    const vehicles = [...VEHICLES, ...own];
    for (const spanFt of [25, 60, 100]) {
      const ask = (vehicle: string) =>
        lightest(
          prepare(questionOf({ spanFt, specification: "lfd", "deck.outToOutFt": 33, "liveLoad.vehicle": vehicle }, CATALOGUE, vehicles)),
          5,
        ).options.map(({ assessment }) => [assessment.shape, assessment.layout, assessment.governing]);
      expect(ask("own TWENTY")).toEqual(ask("HS20-44"));
    }
  });
});
