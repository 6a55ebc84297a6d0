// A crack comes after years in which all looked well. The wrong limit state or detail would let a busy road's stringer through on a range
// that it survives for a few years only.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. 3.4.1, 3.6.1.4, 6.6.1.2 (from memory).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import { LRFD_FATIGUE_DETAILS } from "../../../../src/bridge/bridge.js";
import { DETAIL_CONSTANTS, infiniteLifeAdtt, lrfdFatigueCase } from "../../../../src/specs/lrfd/fatigue.js";
import { preparedOf } from "../../../support/question.js";

// A in 10^8 ksi3 and threshold in ksi.
const TABLE = [
  ["A", 250, 24],
  ["B", 120, 16],
  ["B'", 61, 12],
  ["C", 44, 10],
  ["C'", 44, 12],
  ["D", 22, 7],
  ["E", 11, 4.5],
  ["E'", 3.9, 2.6],
] as const;

describe.each(TABLE)("detail %s", (detail, A, thresholdKsi) => {
  const limit = (A * 1e8) / (365 * 75 * ((0.8 / 1.75) * thresholdKsi) ** 3);

  it("has its constant and threshold", () => {
    expect(DETAIL_CONSTANTS[detail]).toEqual({ A, thresholdKsi });
    expect(infiniteLifeAdtt(detail)).toBeCloseTo(limit, 6);
  });

  it("without a count of trucks, and above the limit: 1.75 times the range against the threshold", () => {
    for (const adtt of [null, limit * (1 + 1e-9), 20000]) {
      expect(lrfdFatigueCase(detail, adtt)).toEqual({ limitState: "Fatigue I", gamma: 1.75, resistanceKsi: thresholdKsi });
    }
  });

  it("up to the limit: 0.80 times the range against what 75 years of trucks leave", () => {
    for (const adtt of [limit * (1 - 1e-9), limit / 8, 1]) {
      const { limitState, gamma, resistanceKsi } = lrfdFatigueCase(detail, adtt);
      expect([limitState, gamma]).toEqual(["Fatigue II", 0.8]);
      expect(resistanceKsi).toBeCloseTo(((A * 1e8) / (365 * 75 * adtt)) ** (1 / 3), 8);
    }
    // An eighth of the trucks, twice the range.
    const part = lrfdFatigueCase(detail, limit / 8).resistanceKsi;
    expect(part / lrfdFatigueCase(detail, limit).resistanceKsi).toBeCloseTo(2, 10);
  });

  it("asks as much on either side of the limit", () => {
    const [below, above] = [limit * (1 - 1e-9), limit * (1 + 1e-9)].map((adtt) => lrfdFatigueCase(detail, adtt));
    expect(below.gamma / below.resistanceKsi).toBeCloseTo(above.gamma / above.resistanceKsi, 8);
  });

  it("a road without trucks is finite and kinder than any other", () => {
    const none = lrfdFatigueCase(detail, 0).resistanceKsi;
    expect(none).toBeLessThan(Number.POSITIVE_INFINITY);
    expect(none).toBeGreaterThanOrEqual(lrfdFatigueCase(detail, 1).resistanceKsi);
  });
});

it("every detail of the bridge file is in the table", () => {
  expect(TABLE.map(([detail]) => detail)).toEqual([...LRFD_FATIGUE_DETAILS]);
});

describe("range of a whole check", () => {
  const BRIDGE = { spanFt: 80, "deck.outToOutFt": 33, "stringers.count": 4, "stringers.spacingFt": 9 };
  const fatigueOf = (change: Readonly<Record<string, unknown>>) => {
    const { stringers } = check(preparedOf({ ...BRIDGE, ...change }), "W36X182").assessment;
    return stringers.map(({ checks }) => {
      const found = checks.find(({ id }) => id === "fatigue");
      if (found === undefined) throw new Error("no fatigue check");
      return found;
    });
  };

  it("is the truck with its rear axles 30 ft apart and 15 %, by one lane without presence", () => {
    const { stringers } = check(preparedOf(BRIDGE), "W36X182").assessment;
    for (const { lines, checks } of stringers) {
      const value = (symbol: string): number => {
        const found = lines.findLast((line) => line.type === "value" && line.symbol === symbol);
        if (found?.type !== "value") throw new Error(symbol);
        return found.value;
      };
      const modulus = lines.find((line) => line.type === "step" && line.formula.symbol === "Sbn");
      if (modulus?.type !== "step") throw new Error("Sbn");
      // 8, 32, 32 kip at 0, 14, 44 ft on 80 ft: resultant 72 kip at (32 x 14 + 32 x 44)/72 = 25.78 ft, 11.78 ft behind the middle axle;
      // that axle 5.89 ft before midspan: 72 x 34.11^2/80 - 8 x 14.
      const moment = (72 * (40 - 106 / 18) ** 2) / 80 - 8 * 14;
      expect(value("MT")).toBeCloseTo(moment, 6);
      const range = (12 * 1.75 * moment * 1.15 * value("gf")) / modulus.result;
      expect(checks.find(({ id }) => id === "fatigue")?.demand).toBeCloseTo(range, 8);
    }
  });

  it("falls with the trucks and with a kinder detail", () => {
    const [unknown, few, fewer] = [{}, { "liveLoad.adtt": 200 }, { "liveLoad.adtt": 100 }].map((change) => fatigueOf(change)[0].ratio);
    expect(few).toBeLessThan(unknown);
    expect(fewer / few).toBeCloseTo(0.5 ** (1 / 3), 10);
    expect(fatigueOf({ "liveLoad.fatigueDetail": "B" })[0].ratio / unknown).toBeCloseTo(12 / 16, 10);
  });
});
