import { describe, expect, it } from "vitest";
import { check } from "../../../src/answers/check.js";
import { counts } from "../../../src/answers/counts.js";
import { lightest } from "../../../src/answers/lightest.js";
import { ask, prepare } from "../../../src/answers/question.js";
import { readLayer } from "../../../src/bridge/layers.js";
import { yieldByYearKsi } from "../../../src/bridge/yield-stress.js";
import type { Shape, Stock } from "../../../src/catalogue/shape.js";
import { bridgeFile, CATALOGUE, PRACTICE, preparedOf, VEHICLES } from "../../support/question.js";

const NOTHING: Stock = {
  quantity: null,
  usableLengthFt: null,
  yearBuilt: null,
  pricePerLb: null,
  place: null,
  flangeLossIn: null,
  webLossIn: null,
};

/** A seeded source of numbers from 0 to 1, so that every run tries the same yards. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state * 1103515245 + 12345) % 2147483648;
    return state / 2147483648;
  };
}

/** An invented yard: thirty shapes of the catalogue with pieces, lengths, ages, prices and losses at random. */
function yard(seed: number): Shape[] {
  const random = seeded(seed);
  const maybe = <T>(value: T): T | null => (random() < 0.6 ? value : null);
  return CATALOGUE.filter((_, index) => index % 9 === seed % 9).map((shape) => ({
    ...shape,
    bundled: false,
    stock: {
      ...NOTHING,
      quantity: maybe(Math.floor(random() * 9)),
      usableLengthFt: maybe(40 + Math.floor(random() * 50)),
      yearBuilt: 1890 + Math.floor(random() * 120),
      pricePerLb: maybe(0.2 + random()),
      flangeLossIn: maybe(random() * 0.15),
      webLossIn: maybe(random() * 0.1),
    },
  }));
}

const BRIDGE = { spanFt: 52, "deck.outToOutFt": 30, "liveLoad.adtt": 300 };

describe("choosing from a yard's stock", () => {
  // A yard keeper who is offered five beams when four are there finds out on the day of the lift.
  it.each([1, 2, 3, 4, 5, 6])("offers what brute force over the stock offers (yard %i)", (seed) => {
    const shapes = yard(seed);
    const answer = lightest(preparedOf(BRIDGE, shapes), 1000);
    const expected = new Map<string, string>();
    for (const count of Array.from({ length: 9 }, (_, index) => index + 4)) {
      for (const shape of shapes) {
        const stock = shape.stock ?? NOTHING;
        const enough = (stock.quantity ?? 1000) >= count && (stock.usableLengthFt ?? 1000) >= 52 + 2 * 0.75;
        if (!enough) continue;
        const endless = { ...shape, stock: { ...stock, quantity: null, usableLengthFt: null } };
        const [only] = lightest(preparedOf({ ...BRIDGE, "stringers.count": count }, [endless]), 1).options;
        if (only !== undefined) expected.set(`${count} ${shape.designation}`, String(only.assessment.governing.ratio));
      }
    }
    const offered = new Map(
      answer.options.map(({ assessment }) => [`${assessment.layout.count} ${assessment.shape}`, String(assessment.governing.ratio)]),
    );
    expect(offered).toEqual(expected);
    for (const { shape, code, needed, there } of answer.leftOut) {
      const stock = shapes.find(({ designation }) => designation === shape)?.stock ?? NOTHING;
      if (code === "too-short") expect([needed, there]).toEqual([53.5, stock.usableLengthFt]);
      if (code === "too-few") expect([needed, there]).toEqual([4, stock.quantity]);
    }
    const short = shapes.filter(({ stock }) => (stock?.usableLengthFt ?? 1000) < 53.5 || (stock?.quantity ?? 1000) < 4);
    expect(answer.leftOut.map(({ shape }) => shape).sort()).toEqual(short.map(({ designation }) => designation).sort());
  });

  it("never counts more pieces than there are", () => {
    for (const seed of [1, 4, 7]) {
      for (const { count, best } of counts(preparedOf(BRIDGE, yard(seed))).counts) {
        if (best !== null) expect(best.stock?.quantity ?? 1000).toBeGreaterThanOrEqual(count);
      }
    }
  });

  it("checks a shape that is asked for by name, whatever the stock", () => {
    const shapes = CATALOGUE.map((shape): Shape => ({ ...shape, stock: { ...NOTHING, quantity: 1, usableLengthFt: 20 } }));
    const question = ask([PRACTICE, readLayer(bridgeFile(BRIDGE), "bridge.json", "bridge")], "layout", shapes, VEHICLES, "aside");
    expect(check(prepare(question), "W36X150").assessment.shape).toBe("W36X150");
  });
});

describe("old steel", () => {
  // Steel of a forgotten mill is as strong as its age allows, not as strong as today's (values from memory, AASHTO MBE).
  it.each([
    [1904, 26],
    [1905, 30],
    [1936, 30],
    [1937, 33],
    [1963, 33],
    [1964, 36],
  ])("of %i has %i ksi", (year, fyKsi) => {
    expect(yieldByYearKsi(year)).toBe(fyKsi);
    const shapes = CATALOGUE.map((shape): Shape => ({ ...shape, bundled: false, stock: { ...NOTHING, yearBuilt: year } }));
    const [option] = lightest(preparedOf(BRIDGE, shapes), 1).options;
    expect([option.assessment.fyKsi, option.assessment.fySource]).toEqual([fyKsi, "year built"]);
  });

  it("with losses never needs less than sound steel", () => {
    const sound = CATALOGUE.map((shape): Shape => ({ ...shape, stock: NOTHING }));
    const rusty = CATALOGUE.map((shape): Shape => ({ ...shape, stock: { ...NOTHING, flangeLossIn: 0.05, webLossIn: 0.05 } }));
    const plf = (shapes: readonly Shape[]) => lightest(preparedOf(BRIDGE, shapes), 1).options[0].assessment.steelPlfOfBridge ?? 0;
    expect(plf(rusty)).toBeGreaterThanOrEqual(plf(sound));
  });
});

describe("ranking by cost", () => {
  // An estimator who asks for the cheapest must not be given the lightest under another name.
  const priced = CATALOGUE.map((shape, index): Shape => ({ ...shape, stock: { ...NOTHING, pricePerLb: 0.3 + ((index * 7) % 10) / 20 } }));
  it("orders every passing option by cost, then by the total order", () => {
    const { options, rankedBy } = lightest(preparedOf(BRIDGE, priced), 1000, "cost");
    expect(rankedBy).toBe("cost");
    const costs = options.map(({ assessment }) => assessment.costPerFtOfBridge ?? 0);
    expect(costs).toEqual([...costs].sort((a, b) => a - b));
    const byWeight = lightest(preparedOf(BRIDGE, priced), 1000).options;
    const names = (list: typeof options) => list.map(({ assessment }) => `${assessment.layout.count} ${assessment.shape}`).sort();
    expect(names(options)).toEqual(names(byWeight));
    expect(options[0].assessment.shape).not.toBe(byWeight[0].assessment.shape);
  });

  it("keeps to weight, and says so, when a passing row has no price", () => {
    const one = priced.map((shape): Shape => (shape.designation === "W36X150" ? { ...shape, stock: NOTHING } : shape));
    const { rankedBy, withoutPrice } = lightest(preparedOf(BRIDGE, one), 5, "cost");
    expect([rankedBy, withoutPrice]).toEqual(["weight", ["W36X150"]]);
  });
});
