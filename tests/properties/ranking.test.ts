import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { check } from "../../src/answers/check.js";
import { counts } from "../../src/answers/counts.js";
import { lightest } from "../../src/answers/lightest.js";
import type { Prepared } from "../../src/answers/question.js";
import { readShapes } from "../../src/catalogue/read-shapes.js";
import type { Shape } from "../../src/catalogue/shape.js";
import { nearestMiss, rank } from "../../src/ranking/rank.js";
import {
  bestOfEach,
  type Candidate,
  everyCandidate,
  figuresOf,
  figuresOfCandidate,
  plainLayouts,
  plainNearest,
  plainRange,
  totalOrder,
} from "../support/plain-enumeration.js";
import { CATALOGUE, preparedOf } from "../support/question.js";
import { anyOpenBridge, seeded, type Values } from "../support/random-bridges.js";

const OPTIONS = 50;

/** A yard's own list: every seventh shape of the catalogue, older steel, three strengths. */
const YARD: readonly Shape[] = CATALOGUE.filter((_, place) => place % 7 === 0).map((shape, place) => ({
  ...shape,
  yieldStressKsi: [33, 36, 50][place % 3],
  bundled: false,
}));

/** Shapes of four weights only, so that weights tie everywhere. */
const TIES: readonly Shape[] = CATALOGUE.filter(({ depthIn }) => depthIn > 23).map((shape) => ({
  ...shape,
  weightPlf: Math.ceil(shape.weightPlf / 60) * 60,
}));

/** Twins under other names: the same figures, told apart by name alone. */
const TWINS: readonly Shape[] = CATALOGUE.filter(({ weightPlf }) => weightPlf > 100 && weightPlf < 260).flatMap((shape) => [
  { ...shape, designation: `Z-${shape.designation}` },
  { ...shape, designation: `A-${shape.designation}` },
]);

const LIGHT: readonly Shape[] = CATALOGUE.filter(({ weightPlf }) => weightPlf < 40);

const LFD = { specification: "lfd", "deck.composite": false };
const LFD_COMPOSITE = { specification: "lfd", "deck.composite": true };
const LRFD_BARE = { specification: "lrfd", "deck.composite": false };
const ADVISED = { "advisories.depth": "enforce", "advisories.handling": "enforce", "advisories.overhang": "enforce" };
const GLULAM = { "deck.kind": "glulam", "deck.thicknessIn": 6.75, "barriers.baseFt": 0.75, "barriers.weightKlf": 0.05 };
const GRID = {
  "deck.kind": "steel-grid",
  "deck.thicknessIn": 5,
  "deck.deckPsf": 28,
  "deck.maxSpacingFt": 9,
  "barriers.baseFt": 1,
  "barriers.weightKlf": 0.12,
};
const OLD_AND_NEW = [...YARD.map((shape) => ({ ...shape, designation: `OLD ${shape.designation}` })), ...CATALOGUE];

const QUESTIONS: readonly (readonly [string, Values, readonly Shape[]])[] = [
  ["width only", { ...LFD, spanFt: 60, "deck.outToOutFt": 33 }, CATALOGUE],
  ["width only, lrfd composite", { spanFt: 60, "deck.outToOutFt": 33 }, CATALOGUE],
  ["width only, lfd composite", { ...LFD_COMPOSITE, spanFt: 60, "deck.outToOutFt": 33 }, CATALOGUE],
  ["width only, lrfd noncomposite", { ...LRFD_BARE, spanFt: 60, "deck.outToOutFt": 33 }, CATALOGUE],
  [
    "width only, long and wide",
    { ...LFD, spanFt: 85, "deck.outToOutFt": 44, "liveLoad.adtt": 300, "bracing.topFlange": "held" },
    CATALOGUE,
  ],
  ["width only, short, grade 36", { ...LFD, spanFt: 26, "deck.outToOutFt": 24, "steel.grade": "36", "liveLoad.adtt": 40 }, CATALOGUE],
  ["width only, fine grid", { spanFt: 44, "deck.outToOutFt": 31.3, "stringers.spacingStepFt": 0.05 }, CATALOGUE],
  ["width and count", { ...LFD, spanFt: 52.5, "deck.outToOutFt": 30, "stringers.count": 5 }, CATALOGUE],
  ["width and count, three stringers by lrfd", { spanFt: 52.5, "deck.outToOutFt": 24, "stringers.count": 3 }, CATALOGUE],
  ["width and spacing", { ...LFD, spanFt: 38, "deck.outToOutFt": 29.4, "stringers.spacingFt": 5.3 }, CATALOGUE],
  ["width and spacing, lrfd", { spanFt: 77, "deck.outToOutFt": 41.5, "stringers.spacingFt": 7.75 }, CATALOGUE],
  ["width, count and spacing", { ...LFD, spanFt: 48, "deck.outToOutFt": 28, "stringers.count": 4, "stringers.spacingFt": 7.6 }, CATALOGUE],
  ["spacing alone", { ...LFD, spanFt: 42, "stringers.spacingFt": 7 }, CATALOGUE],
  ["spacing alone, lrfd composite", { spanFt: 66, "stringers.spacingFt": 8.5 }, CATALOGUE],
  ["spacing alone, lever rule", { ...LFD, spanFt: 42, "stringers.spacingFt": 15, "liveLoad.vehicle": "H15-44" }, CATALOGUE],
  ["a yard's own list", { ...LFD, spanFt: 40, "deck.outToOutFt": 28 }, YARD],
  ["a yard's own list, lrfd composite", { spanFt: 50, "deck.outToOutFt": 28 }, YARD],
  ["a yard's list beside the catalogue", { ...LFD, spanFt: 40, "deck.outToOutFt": 28 }, OLD_AND_NEW],
  ["ties of weight", { ...LFD, spanFt: 50, "deck.outToOutFt": 32 }, TIES],
  ["twins by name", { spanFt: 50, "deck.outToOutFt": 32 }, TWINS],
  ["a depth limit", { ...LFD, spanFt: 50, "deck.outToOutFt": 32, "steel.maxDepthIn": 27.7 }, CATALOGUE],
  ["a structure depth limit", { spanFt: 50, "deck.outToOutFt": 32, "steel.maxStructureDepthIn": 38 }, CATALOGUE],
  ["every advisory enforced", { ...LFD, ...ADVISED, spanFt: 50, "deck.outToOutFt": 32 }, CATALOGUE],
  [
    "deflection only reported, light truck",
    { ...LFD, spanFt: 64, "deck.outToOutFt": 26, "deflection.use": "report", "liveLoad.vehicle": "H15-44", "liveLoad.adtt": 20 },
    CATALOGUE,
  ],
  ["a glulam deck", { specification: "lfd", ...GLULAM, spanFt: 36, "deck.outToOutFt": 17, "stringers.minCount": 3 }, CATALOGUE],
  ["a glulam deck by lrfd", { ...GLULAM, spanFt: 36, "deck.outToOutFt": 22, "stringers.minCount": 3 }, CATALOGUE],
  [
    "a steel grid, two stringers allowed",
    { specification: "lfd", ...GRID, spanFt: 54, "deck.outToOutFt": 16, "stringers.minCount": 2 },
    CATALOGUE,
  ],
  ["nothing passes: shapes too light", { ...LFD, spanFt: 70, "deck.outToOutFt": 33 }, LIGHT],
  ["nothing passes: shapes too light for lrfd", { spanFt: 70, "deck.outToOutFt": 33 }, LIGHT],
  ["nothing passes: shapes too light, lfd composite", { ...LFD_COMPOSITE, spanFt: 130, "deck.outToOutFt": 33 }, LIGHT],
  ["nothing passes: spacing alone, too long", { ...LFD, spanFt: 220, "stringers.spacingFt": 11 }, CATALOGUE],
  ["nothing passes: an impossible deflection", { spanFt: 90, "deck.outToOutFt": 28, "deflection.spanOver": 5000 }, CATALOGUE],
  ["no layout fits", { spanFt: 50, "deck.outToOutFt": 33, "stringers.minSpacingFt": 11, "stringers.maxSpacingFt": 11.2 }, CATALOGUE],
];

const named = QUESTIONS.map(([name, values, shapes]) => [name, values, shapes] as const);

function expectSame(actual: ReturnType<typeof figuresOf>, expected: Candidate): void {
  expect(actual).toEqual(figuresOfCandidate(expected));
}

function expectRanking(prepared: Prepared): void {
  const candidates = everyCandidate(prepared);
  const expected = bestOfEach(candidates).slice(0, OPTIONS);
  const answer = lightest(prepared, OPTIONS);
  expect(answer.options).toHaveLength(expected.length);
  answer.options.forEach(({ rank: place, assessment, spacingRangeFt }, index) => {
    expect(place).toBe(index + 1);
    expectSame(figuresOf(assessment), expected[index]);
    expect(spacingRangeFt).toEqual(plainRange(candidates, expected[index], prepared.bridge));
    const { count } = expected[index];
    const weight = expected[index].steel.shape.weightPlf;
    expect(assessment.steelPlfOfBridge).toBe(count === null ? null : count * weight);
  });
  expect(answer.examined).toEqual({
    layouts: plainLayouts(prepared.bridge).length,
    shapes: prepared.space.steels.length,
    candidates: plainLayouts(prepared.bridge).length * prepared.space.steels.length,
  });
  const nearest = expected.length > 0 ? undefined : plainNearest(candidates);
  if (nearest === undefined) expect(answer.nearestMiss).toBeNull();
  else expectSame(figuresOf(answer.nearestMiss ?? fail("no nearest miss")), nearest);
}

function fail(message: string): never {
  throw new Error(message);
}

describe("the ranked list", () => {
  // Lost without it: whatever the search skips to be quick could be the lightest beam, and the county would pay for steel it does not need.
  it.each(named)("equals plain enumeration of every candidate: %s", (name, values, shapes) => {
    const prepared = preparedOf(values, shapes);
    expectRanking(prepared);
    expect(rank(prepared.space, 1)).toHaveLength(name.startsWith("n") ? 0 : 1);
  });

  // Lost without it: the bridges nobody thought of would be the ones on which the search skips the answer.
  it("equals plain enumeration over many random bridges and short lists", () => {
    let answered = 0;
    let unanswered = 0;
    fc.assert(
      fc.property(anyOpenBridge, fc.subarray([...CATALOGUE], { minLength: 1, maxLength: 60 }), (values, shapes) => {
        const prepared = preparedOf(values, shapes);
        const candidates = everyCandidate(prepared);
        const expected = bestOfEach(candidates).slice(0, OPTIONS);
        const options = rank(prepared.space, OPTIONS);
        const place = (one: { readonly steel: Candidate["steel"]; readonly governingRatio: number }, layout: object) => [
          one.steel.shape.designation,
          one.governingRatio,
          layout,
        ];
        expect(options.map((one) => place(one, [one.layout.count, one.layout.spacingFt, one.spacingRangeFt]))).toEqual(
          expected.map((one) => place(one, [one.count, one.spacingFt, plainRange(candidates, one, prepared.bridge)])),
        );
        if (expected.length > 0) answered++;
        else {
          unanswered++;
          const [miss, nearest] = [nearestMiss(prepared.space), plainNearest(candidates)];
          expect(miss?.steel.shape.designation).toBe(nearest?.steel.shape.designation);
          expect(miss?.assessor.layout.spacingFt).toBe(nearest?.spacingFt);
          expect(miss?.assessor.layout.count).toBe(nearest?.count);
        }
      }),
      seeded(250),
    );
    expect(Math.min(answered, unanswered)).toBeGreaterThan(25);
  });

  // Lost without it: sorting the yard's list another way would change the beam that is ordered.
  it("is the same whatever the order of the shapes in the list", () => {
    for (const [list, rules] of [
      [TIES, LFD],
      [TWINS, {}],
    ] as const) {
      const values = { ...rules, spanFt: 50, "deck.outToOutFt": 32 };
      const ahead = rank(preparedOf(values, list).space, OPTIONS);
      const back = rank(preparedOf(values, list.toReversed()).space, OPTIONS);
      expect(back.map(({ steel, layout }) => [steel.shape.designation, layout])).toEqual(
        ahead.map(({ steel, layout }) => [steel.shape.designation, layout]),
      );
    }
  });

  // Lost without it: a longer list of options would not begin with the shorter one.
  it("starts the same whatever the number of options asked for", () => {
    for (const [, values, shapes] of QUESTIONS.slice(0, 4)) {
      const { space } = preparedOf(values, shapes);
      const many = rank(space, OPTIONS).map(({ steel, layout }) => [steel.shape.designation, layout]);
      for (const top of [1, 2, 5, 17]) {
        expect(rank(space, top).map(({ steel, layout }) => [steel.shape.designation, layout])).toEqual(many.slice(0, top));
      }
    }
  });
});

describe("the comparison of counts", () => {
  // Lost without it: an estimator who asks for four, five or six stringers would be shown a heavier four than there is.
  it.each(named.filter(([, values]) => values["deck.outToOutFt"] !== undefined))("equals plain enumeration: %s", (_, values, shapes) => {
    const prepared = preparedOf(values, shapes);
    const candidates = everyCandidate(prepared);
    const answer = counts(prepared);
    const all = [...new Set(plainLayouts(prepared.bridge).map(({ count }) => count as number))].sort((a, b) => a - b);
    expect(answer.counts.map(({ count }) => count)).toEqual(all);
    const best = new Map<number, Candidate>();
    for (const row of answer.counts) {
      const ofCount = candidates.filter(({ count }) => count === row.count);
      const [first] = bestOfEach(ofCount);
      if (first === undefined) {
        expect(row.best).toBeNull();
        const nearest = plainNearest(ofCount);
        if (nearest === undefined) expect(row.nearestMiss).toBeNull();
        else expectSame(figuresOf(row.nearestMiss ?? fail("no nearest miss")), nearest);
      } else {
        best.set(row.count, first);
        expect(row.nearestMiss).toBeNull();
        expectSame(figuresOf(row.best ?? fail("no best")), first);
        expect(row.spacingRangeFt).toEqual(plainRange(candidates, first, prepared.bridge));
      }
    }
    const ranked = [...best.values()].sort(totalOrder);
    expect(answer.lightestCount).toBe(ranked[0]?.count ?? null);
    const steel = (one: Candidate) => (one.count as number) * one.steel.shape.weightPlf;
    const near = ranked.filter((one) => steel(one) <= 1.05 * steel(ranked[0])).map(({ count }) => count as number);
    expect(answer.fewestWithin5Percent).toBe(near.length === 0 ? null : Math.min(...near));
  });
});

describe("a check with the layout left open", () => {
  // Lost without it: a checker who names a shape would be shown it on a worse layout than the one it was chosen for.
  it.each(named.slice(0, 16))("shows the ranker's layout, else the nearest to passing: %s", (_, values, shapes) => {
    const prepared = preparedOf(values, shapes);
    const every = everyCandidate(prepared);
    for (const shape of shapes.filter((_shape, place) => place % 23 === 0)) {
      const own = every.filter(({ steel }) => steel.shape.designation === shape.designation);
      const passing = own.filter(({ passes }) => passes).sort(totalOrder)[0];
      const answer = check(prepared, shape.designation);
      expectSame(figuresOf(answer.assessment), passing ?? plainNearest(own) ?? fail("no candidate"));
      expect(answer.layoutsTried).toBe(plainLayouts(prepared.bridge).length);
    }
  });
});

describe("a list read from a file", () => {
  // Lost without it: a shop's list would be ranked by other figures than those it sent.
  it("ranks as the same shapes of the catalogue do", () => {
    const columns = Object.keys(CATALOGUE[0]).filter((name) => !["source", "bundled", "stock"].includes(name)) as (keyof Shape)[];
    const some = CATALOGUE.filter((_, place) => place % 3 === 1);
    const text = [columns.join(","), ...some.map((shape) => columns.map((name) => shape[name] ?? "").join(","))].join("\r\n");
    const { shapes } = readShapes(`\uFEFF${text}\r\n`, "shop.csv", { bundled: false });
    const values = { spanFt: 47, "deck.outToOutFt": 30, "steel.grade": "50" };
    const chosen = (list: readonly Shape[]) =>
      lightest(preparedOf(values, list), OPTIONS).options.map(({ assessment }) => figuresOf(assessment));
    expect(chosen(shapes)).toEqual(chosen(some));
    expect(lightest(preparedOf(values, shapes), 1).options[0].assessment.source.file).toBe("shop.csv");
  });
});
