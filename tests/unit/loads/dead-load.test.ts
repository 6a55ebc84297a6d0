// A take-down that loses a strip of deck between two tributary widths, or counts a barrier twice, is wrong on every stringer at once:
// what all stringers carry together must be what lies on the bridge, whatever the layout.
import { describe, expect, it } from "vitest";
import { layoutsOf } from "../../../src/bridge/layouts.js";
import { deadLoadOf, stage1Klf } from "../../../src/loads/dead-load.js";
import { lfdLayout, stringerLoads } from "../../../src/specs/lfd/stringer-loads.js";
import { preparedOf } from "../../support/question.js";
import { shapeNamed } from "../../support/shapes.js";

const LFD = { specification: "lfd", "deck.composite": false, spanFt: 55 };
const SHAPE = shapeNamed("W30X116");

/** The dead load of both stringers of every layout of an invented bridge, with what both kinds add up to across the deck. */
function takeDowns(values: Readonly<Record<string, unknown>>) {
  const { bridge, design } = preparedOf({ ...LFD, ...values });
  const { layouts } = layoutsOf(bridge);
  expect(layouts.length).toBeGreaterThan(0);
  return layouts.map((layout) => {
    const fixed = lfdLayout(design, layout);
    const count = layout.count as number;
    const [interior, exterior] = (["interior", "exterior"] as const).map((position) => stringerLoads(fixed, position, null).dead);
    const sum = (of: (dead: typeof interior) => number): number => (count - 2) * of(interior) + 2 * of(exterior);
    return { bridge, layout, count, interior, exterior, sum };
  });
}

describe("the stringers' sum is the deck's total", () => {
  it.each([
    ["narrow", { "deck.outToOutFt": 24 }],
    ["common", { "deck.outToOutFt": 33, wearingPsf: 35, "barriers.weightKlf": 0.47 }],
    ["thick and wide", { "deck.outToOutFt": 61.5, "deck.thicknessIn": 9.25, "barriers.baseFt": 1.25 }],
    ["roadway of its own", { "deck.outToOutFt": 40, roadwayFt: 30 }],
    ["one spacing", { "deck.outToOutFt": 36, "stringers.spacingFt": 6.3 }],
  ])("slab, barriers and wearing surface, concrete deck: %s", (_, values) => {
    for (const { bridge, count, layout, sum } of takeDowns(values)) {
      const { outToOutFt, thicknessIn } = bridge.deck;
      const where = `${count} at ${layout.spacingFt} ft`;
      expect(
        sum(({ tributaryFt }) => tributaryFt),
        where,
      ).toBeCloseTo(outToOutFt as number, 9);
      expect(
        sum(({ deckKlf }) => deckKlf),
        where,
      ).toBeCloseTo((((outToOutFt as number) * (thicknessIn as number)) / 12) * 0.15, 10);
      expect(
        sum(({ stage2Klf }) => stage2Klf),
        where,
      ).toBeCloseTo(2 * bridge.barriers.weightKlf, 10);
      expect(
        sum(({ wearingKlf }) => wearingKlf),
        where,
      ).toBeCloseTo((bridge.wearingPsf * (bridge.roadwayFt as number)) / 1000, 10);
    }
  });

  it("forms cover what flanges leave open, and haunches lie on flanges", () => {
    for (const { bridge, count, interior, exterior } of takeDowns({
      "deck.outToOutFt": 33,
      "deck.formsPsf": 15,
      "deck.haunchWeightIn": 2.5,
    })) {
      const bfFt = SHAPE.flangeWidthIn / 12;
      const bare = { ...bridge, deck: { ...bridge.deck, formsPsf: 0, haunchWeightIn: 0 } };
      const added = (count - 2) * (stage1Klf(bridge, interior, SHAPE, null) - stage1Klf(bare, interior, SHAPE, null));
      const addedOutside = 2 * (stage1Klf(bridge, exterior, SHAPE, null) - stage1Klf(bare, exterior, SHAPE, null));
      const forms = (15 * (33 - count * bfFt)) / 1000;
      const haunches = (count * bfFt * 2.5 * 0.15) / 12;
      expect(added + addedOutside).toBeCloseTo(forms + haunches, 10);
    }
  });

  it.each([
    ["timber plank by its thickness, 50 lb/ft3", { "deck.kind": "timber-plank", "deck.thicknessIn": 4 }, (4 / 12) * 50],
    ["glulam by its thickness", { "deck.kind": "glulam", "deck.thicknessIn": 6.75 }, (6.75 / 12) * 50],
    [
      "steel grid by its maker's weight",
      { "deck.kind": "steel-grid", "deck.thicknessIn": 5, "deck.deckPsf": 21, "deck.maxSpacingFt": 6 },
      21,
    ],
    ["a given weight stands before thickness", { "deck.kind": "nail-laminated", "deck.thicknessIn": 6, "deck.deckPsf": 30 }, 30],
  ])("%s", (_, deck, psf) => {
    const values = { "deck.outToOutFt": 18, "barriers.baseFt": 0.75, "barriers.weightKlf": 0.06, "stringers.minSpacingFt": 2.5, ...deck };
    for (const { sum } of takeDowns({ ...values, "stringers.maxCount": 7 })) {
      expect(sum(({ deckKlf }) => deckKlf)).toBeCloseTo((18 * psf) / 1000, 10);
      expect(sum(({ stage2Klf }) => stage2Klf)).toBeCloseTo(0.12, 10);
    }
  });
});

describe("stage 1 of one stringer", () => {
  const { bridge } = preparedOf({ ...LFD, "deck.outToOutFt": 33, "deck.formsPsf": 12, "steel.miscFraction": 0.04 });

  it("slab, haunch, forms, shape and miscellaneous steel", () => {
    const dead = deadLoadOf(bridge, { tributaryFt: 7.5, spacingFt: 7.5, count: 5 }, null);
    const { weightPlf: w, flangeWidthIn: bf } = SHAPE;
    const slab = (8.5 / 12) * 7.5 * 0.15;
    const haunch = ((bf * 2) / 144) * 0.15;
    const forms = (12 * (7.5 - bf / 12)) / 1000;
    expect(stage1Klf(bridge, dead, SHAPE, null)).toBeCloseTo(slab + haunch + forms + (w * 1.04) / 1000, 12);
  });

  it("a stage that is given replaces the take-down of that stage, and the steel still comes on top", () => {
    const given = { ...bridge, deadLoad: { stage1Klf: 0.9, stage2Klf: 0.21, wearingKlf: 0 } };
    const dead = deadLoadOf(given, { tributaryFt: 7.5, spacingFt: 7.5, count: 5 }, null);
    expect(stage1Klf(given, dead, SHAPE, null)).toBeCloseTo(0.9 + (SHAPE.weightPlf * 1.04) / 1000, 12);
    expect([dead.stage2Klf, dead.wearingKlf]).toEqual([0.21, 0]);
  });

  it("one stage given leaves the others to the take-down", () => {
    const given = { ...bridge, deadLoad: { stage1Klf: null, stage2Klf: 0.3, wearingKlf: null } };
    const dead = deadLoadOf(given, { tributaryFt: 7.5, spacingFt: 7.5, count: 5 }, null);
    expect(dead.stage2Klf).toBe(0.3);
    expect(dead.deckKlf).toBeCloseTo((8.5 / 12) * 7.5 * 0.15, 12);
    expect(dead.wearingKlf).toBeCloseTo((25 * 30) / 5 / 1000, 12);
  });
});

describe("one interior stringer of unknown neighbours", () => {
  // With no width nobody can share a barrier among all stringers: a quarter of both is the convention, and it is said.
  it("carries deck and wearing on its spacing and a quarter of both barriers", () => {
    const { bridge } = preparedOf({ ...LFD, "stringers.spacingFt": 7, "barriers.weightKlf": 0.42, wearingPsf: 30 });
    const dead = deadLoadOf(bridge, { tributaryFt: 7, spacingFt: 7, count: null }, null);
    expect(dead.deckKlf).toBeCloseTo((8.5 / 12) * 7 * 0.15, 12);
    expect(dead.stage2Klf).toBeCloseTo((2 * 0.42) / 4, 12);
    expect(dead.wearingKlf).toBeCloseTo((30 * 7) / 1000, 12);
  });
});
