// A layout never tried is a lighter bridge never found, and one tried that the practice forbids is an answer the agency sends back.
// What is tried is counted out here in whole inches, apart from the program's own loop.
import { describe, expect, it } from "vitest";
import { type Layout, layoutsOf } from "../../../src/bridge/layouts.js";
import { InputError } from "../../../src/errors.js";
import { preparedOf, questionOf } from "../../support/question.js";

const BASE = { specification: "lfd", "deck.composite": false, spanFt: 60 };
const ask = (values: Readonly<Record<string, unknown>>) => layoutsOf(questionOf({ ...BASE, ...values }).bridge);
const shown = (layouts: readonly Layout[]) => layouts.map(({ count, spacingFt, overhangFt }) => [count, spacingFt, overhangFt]);
const brokenKeys = (layout: Layout) => layout.broken.map(({ key }) => key);

interface InInches {
  readonly width: number;
  readonly counts: readonly number[];
  readonly spacings: readonly number[];
  readonly overhang: readonly [least: number, most: number];
  /** Greatest overhang over spacing, as a fraction of whole numbers. */
  readonly perSpacing: readonly [over: number, under: number];
}

/** Every layout that fits, in whole inches; twice the overhang keeps it whole. */
function countedOut({ width, counts, spacings, overhang: [least, most], perSpacing: [over, under] }: InInches) {
  return counts.flatMap((count) =>
    spacings.flatMap((spacing) => {
      const twice = width - (count - 1) * spacing;
      return twice >= 2 * least && twice <= 2 * most && twice * under <= 2 * over * spacing ? [[count, spacing / 12, twice / 24]] : [];
    }),
  );
}
const steps = (from: number, to: number, by: number): number[] =>
  Array.from({ length: Math.floor((to - from) / by) + 1 }, (_, k) => from + k * by);

// The shipped practice: 4 to 12 stringers, 3.5 to 12 ft by 0.25, overhang 1 to 4 ft and at most half the spacing.
const COUNTS = steps(4, 12, 1);
const SPACINGS = steps(42, 134, 3); // a deck of 8.5 in allows 30 x 8.5/12 - 10 = 11.25 ft = 135 in
const PRACTICE: Omit<InInches, "width"> = { counts: COUNTS, spacings: [...SPACINGS, 135], overhang: [12, 48], perSpacing: [1, 2] };

describe("width alone: every count, spacings on the grid", () => {
  it.each([22, 24, 28.5, 33, 40, 47.25, 61])("%f ft", (widthFt) => {
    const expected = countedOut({ ...PRACTICE, width: Math.round(widthFt * 12) });
    expect(expected.length).toBeGreaterThan(1);
    const { layouts, inTheWay } = ask({ "deck.outToOutFt": widthFt });
    expect(shown(layouts)).toEqual(expected);
    expect(inTheWay).toEqual([]);
    expect(layouts.flatMap(({ broken }) => broken)).toEqual([]);
  });

  it("on a grid of the user's own", () => {
    const own = { "stringers.minSpacingFt": 5, "stringers.maxSpacingFt": 9, "stringers.spacingStepFt": 0.5, "stringers.maxCount": 6 };
    const expected = countedOut({ ...PRACTICE, width: 396, counts: [4, 5, 6], spacings: steps(60, 108, 6) });
    expect(expected.length).toBeGreaterThan(3);
    expect(shown(ask({ "deck.outToOutFt": 33, ...own }).layouts)).toEqual(expected);
  });

  it("a step of a tenth of a foot, which no binary number holds, misses no spacing", () => {
    const own = { "stringers.minSpacingFt": 6.3, "stringers.maxSpacingFt": 7.1, "stringers.spacingStepFt": 0.1 };
    const { layouts } = ask({
      "deck.outToOutFt": 33,
      ...own,
      "stringers.maxOverhangPerSpacing": 2,
      "stringers.minOverhangFt": 0,
      "stringers.count": 5,
    });
    expect(layouts.map(({ spacingFt }) => spacingFt)).toEqual([6.3, 6.4, 6.5, 6.6, 6.7, 6.8, 6.9, 7, 7.1]);
  });

  it("the deck's own greatest spacing ends the grid", () => {
    // t = 7 in: 30 x 7/12 - 10 = 7.5 ft.
    const { layouts } = ask({ "deck.outToOutFt": 33, "deck.thicknessIn": 7 });
    expect(Math.max(...layouts.map(({ spacingFt }) => spacingFt))).toBe(7.5);
  });
});

describe("limits are inclusive", () => {
  const one = { "stringers.count": 5, "stringers.minSpacingFt": 7, "stringers.maxSpacingFt": 7 };

  it.each([
    ["least overhang", { "deck.outToOutFt": 30, "stringers.minOverhangFt": 1 }, { "stringers.minOverhangFt": 1.000001 }],
    ["greatest overhang", { "deck.outToOutFt": 34, "stringers.maxOverhangFt": 3 }, { "stringers.maxOverhangFt": 2.999999 }],
    [
      "overhang over spacing",
      { "deck.outToOutFt": 35, "stringers.maxOverhangPerSpacing": 0.5 },
      { "stringers.maxOverhangPerSpacing": 0.499999 },
    ],
    ["deck's spacing", { "deck.outToOutFt": 32, "deck.maxSpacingFt": 7 }, { "deck.maxSpacingFt": 6.999999 }],
  ])("%s", (_, at, beyond) => {
    expect(ask({ ...one, ...at }).layouts).toHaveLength(1);
    expect(ask({ ...one, ...at, ...beyond }).layouts).toEqual([]);
  });

  it("within a billionth of a foot, which is what arithmetic leaves", () => {
    expect((32.8 - 4 * 6.7) / 2).toBeLessThan(3);
    const { layouts } = ask({
      "deck.outToOutFt": 32.8,
      "stringers.count": 5,
      "stringers.minSpacingFt": 6.7,
      "stringers.maxSpacingFt": 6.7,
      "stringers.minOverhangFt": 3,
    });
    expect(shown(layouts)).toEqual([[5, 6.7, 3]]);
  });
});

describe("width and count: that count, grid spacings", () => {
  it("five stringers under 33 ft", () => {
    const expected = countedOut({ ...PRACTICE, width: 396, counts: [5] });
    const { layouts } = ask({ "deck.outToOutFt": 33, "stringers.count": 5 });
    expect(shown(layouts)).toEqual(expected);
    expect(layouts.flatMap(brokenKeys)).toEqual([]);
  });

  it("a count outside the practice is taken, and shown as a limit broken", () => {
    const { layouts } = ask({ "deck.outToOutFt": 20, "stringers.count": 3 });
    expect(layouts.length).toBeGreaterThan(0);
    for (const { broken } of layouts) {
      expect(broken).toEqual([{ key: "stringers.minCount", value: 3, limit: 4, ratio: 4 / 3 }]);
    }
    const many = ask({ "deck.outToOutFt": 48, "stringers.count": 14 });
    expect(many.layouts[0].broken).toEqual([{ key: "stringers.maxCount", value: 14, limit: 12, ratio: 14 / 12 }]);
  });
});

describe("width and spacing: every count whose overhang fits, the spacing as given", () => {
  it("a spacing off the grid", () => {
    // 33 ft at 5.1 ft: six leave 3.75 ft (over half of 5.1), seven leave 1.2 ft.
    const { layouts } = ask({ "deck.outToOutFt": 33, "stringers.spacingFt": 5.1 });
    expect(shown(layouts)).toEqual([[7, 5.1, 1.2]]);
  });

  it("two counts can fit", () => {
    const { layouts } = ask({ "deck.outToOutFt": 26, "stringers.spacingFt": 4, "stringers.maxOverhangPerSpacing": 1 });
    expect(shown(layouts)).toEqual([
      [6, 4, 3],
      [7, 4, 1],
    ]);
  });

  it("a spacing beyond the practice and beyond the deck is taken, and both limits are shown broken", () => {
    const { layouts } = ask({ "deck.outToOutFt": 44, "stringers.spacingFt": 12.5 });
    expect(shown(layouts)).toEqual([[4, 12.5, 3.25]]);
    expect(layouts[0].broken).toEqual([
      { key: "stringers.maxSpacingFt", value: 12.5, limit: 12, ratio: 12.5 / 12 },
      { key: "deck.maxSpacingFt", value: 12.5, limit: 11.25, ratio: 12.5 / 11.25 },
    ]);
  });

  it("a spacing below the practice is shown as limit over value", () => {
    const { layouts } = ask({ "deck.outToOutFt": 20, "stringers.spacingFt": 3 });
    expect(layouts[0].broken).toEqual([{ key: "stringers.minSpacingFt", value: 3, limit: 3.5, ratio: 3.5 / 3 }]);
  });
});

describe("all three: one layout, the overhang follows", () => {
  it("within every limit", () => {
    const { layouts } = ask({ "deck.outToOutFt": 33, "stringers.count": 5, "stringers.spacingFt": 7.3 });
    expect(layouts).toEqual([{ count: 5, spacingFt: 7.3, overhangFt: 1.9, broken: [] }]);
  });

  it("overhang limits broken are shown, none is refused", () => {
    const wide = ask({ "deck.outToOutFt": 33, "stringers.count": 4, "stringers.spacingFt": 7 }).layouts;
    expect(shown(wide)).toEqual([[4, 7, 6]]);
    expect(wide[0].broken).toEqual([
      { key: "stringers.maxOverhangFt", value: 6, limit: 4, ratio: 1.5 },
      { key: "stringers.maxOverhangPerSpacing", value: 6 / 7, limit: 0.5, ratio: 6 / 7 / 0.5 },
    ]);
    const narrow = ask({ "deck.outToOutFt": 33, "stringers.count": 5, "stringers.spacingFt": 7.9 }).layouts;
    expect(shown(narrow)).toEqual([[5, 7.9, 0.7]]);
    expect(brokenKeys(narrow[0])).toEqual(["stringers.minOverhangFt"]);
  });

  it("an overhang under which no flange finds room is refused", () => {
    // 33 - 4 x 8.2 leaves 0.1 ft on either side: half of a 2.4 in flange.
    expect(() => preparedOf({ ...BASE, "deck.outToOutFt": 33, "stringers.count": 5, "stringers.spacingFt": 8.2 })).toThrow(InputError);
    expect(() => preparedOf({ ...BASE, "deck.outToOutFt": 33, "stringers.count": 5, "stringers.spacingFt": 9 })).toThrow(
      /less than half a flange/,
    );
    expect(() => preparedOf({ ...BASE, "deck.outToOutFt": 33, "stringers.count": 5, "stringers.spacingFt": 7.9 })).not.toThrow();
  });
});

describe("spacing alone: one interior stringer", () => {
  it("count and overhang unknown", () => {
    const { layouts, inTheWay } = ask({ "stringers.spacingFt": 7 });
    expect(layouts).toEqual([{ count: null, spacingFt: 7, overhangFt: null, broken: [] }]);
    expect(inTheWay).toEqual([]);
  });

  it("counts two lanes unless told otherwise", () => {
    expect(questionOf({ ...BASE, "stringers.spacingFt": 7 }).bridge.liveLoad.lanes).toBe(2);
    expect(questionOf({ ...BASE, "stringers.spacingFt": 7, "liveLoad.lanes": 1 }).bridge.liveLoad.lanes).toBe(1);
    expect(questionOf({ ...BASE, "stringers.spacingFt": 7 }).bridge.roadwayFt).toBeNull();
  });
});

describe("too little said", () => {
  it.each([
    ["neither width nor spacing", {}, "neither a width nor a spacing is given"],
    ["count without width", { "stringers.count": 5 }, "a count needs the width of the deck"],
    ["count and spacing without width", { "stringers.count": 5, "stringers.spacingFt": 7 }, "a count needs the width of the deck"],
    ["a count of one", { "deck.outToOutFt": 20, "stringers.count": 1 }, "a whole number from 2 to 60"],
  ])("%s", (_, values, message) => {
    expect(() => ask(values)).toThrow(InputError);
    expect(() => ask(values)).toThrow(message);
  });
});

describe("no layout on the grid: the limits in the way", () => {
  it("an overhang limit, with how many trials it stopped, the worst first", () => {
    const { layouts, inTheWay } = ask({
      "deck.outToOutFt": 33,
      "stringers.count": 4,
      "stringers.minSpacingFt": 5,
      "stringers.maxSpacingFt": 8,
      "stringers.spacingStepFt": 1,
    });
    // Overhangs at 5, 6, 7, 8 ft: 9, 7.5, 6, 4.5 ft, all over 4.
    expect(layouts).toEqual([]);
    expect(inTheWay).toEqual([{ key: "stringers.maxOverhangFt", limit: 4, trials: 4 }]);
  });

  it("several limits", () => {
    const { layouts, inTheWay } = ask({
      "deck.outToOutFt": 33,
      "stringers.count": 5,
      "stringers.minSpacingFt": 6,
      "stringers.maxSpacingFt": 8.4,
      "stringers.spacingStepFt": 0.8,
      "stringers.maxOverhangPerSpacing": 0.2,
    });
    // 6, 6.8, 7.6, 8.4 ft: overhangs 4.5 (over 4), 2.9 and 1.3 by ratio 0.43 and 0.17, below 0: 7.6 fits.
    expect(shown(layouts)).toEqual([[5, 7.6, 1.3]]);
    expect(inTheWay).toEqual([]);
    const none = ask({
      "deck.outToOutFt": 33,
      "stringers.count": 5,
      "stringers.minSpacingFt": 6,
      "stringers.maxSpacingFt": 8.4,
      "stringers.spacingStepFt": 0.8,
      "stringers.maxOverhangPerSpacing": 0.1,
    });
    expect(none.layouts).toEqual([]);
    expect(none.inTheWay).toEqual([
      { key: "stringers.maxOverhangPerSpacing", limit: 0.1, trials: 2 },
      { key: "stringers.maxOverhangFt", limit: 4, trials: 1 },
      { key: "stringers.minOverhangFt", limit: 1, trials: 1 },
    ]);
  });

  it("a deck too thin for the least spacing", () => {
    // 30 x 5/12 - 10 = 2.5 ft.
    const { layouts, inTheWay } = ask({ "deck.outToOutFt": 33, "deck.thicknessIn": 5 });
    expect(layouts).toEqual([]);
    expect(inTheWay).toEqual([{ key: "deck.maxSpacingFt", limit: 2.5, trials: 0 }]);
  });
});
