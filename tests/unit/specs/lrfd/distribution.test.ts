// The share of a lane scales every live-load effect on a stringer. A formula used past its range, a rule left out for three stringers or a
// presence factor counted twice would be wrong for whole families of bridges, and each answer alone would still look sound.
// AASHTO LRFD Bridge Design Specifications, 9th ed., Art. 3.6.1.1.2, 4.6.2.2 (figures from memory unless said).
import { describe, expect, it } from "vitest";
import { check } from "../../../../src/answers/check.js";
import { counts } from "../../../../src/answers/counts.js";
import { lightest } from "../../../../src/answers/lightest.js";
import type { Bridge, DeckKind } from "../../../../src/bridge/bridge.js";
import type { ShapeFigures } from "../../../../src/catalogue/shape.js";
import { InputError } from "../../../../src/errors.js";
import {
  type LrfdFactors,
  type LrfdPlace,
  lrfdFactors,
  lrfdShare,
  multiplePresence,
  newLrfdFactors,
  OTHER_DECKS,
} from "../../../../src/specs/lrfd/distribution.js";
import { preparedOf, questionOf } from "../../../support/question.js";
import { shapeNamed } from "../../../support/shapes.js";
import { exteriorShare, interiorShare, searchedWheelLines } from "../../../support/wheel-search.js";

const HAIR = 1e-9;
const CONCRETE: Bridge = questionOf({ spanFt: 60, "deck.outToOutFt": 40 }).bridge;
const INTERIOR: LrfdPlace = {
  position: "interior",
  spacingFt: 8,
  spanFt: 60,
  slabIn: 8,
  haunchIn: 0,
  count: 5,
  curbInsideFt: 1.5,
  roadwayFt: 36,
  lanes: 3,
  mostTrucks: 3,
};
const EXTERIOR: LrfdPlace = { ...INTERIOR, position: "exterior" };
const SHAPE: ShapeFigures = shapeNamed("W36X150");
const N = 8;
const factorsOf = (place: LrfdPlace, shape: ShapeFigures = SHAPE, bridge: Bridge = CONCRETE): LrfdFactors => {
  const out = newLrfdFactors();
  lrfdFactors(lrfdShare(bridge, place, null), shape, N, out, null);
  return out;
};
const shareOf = (place: LrfdPlace) => lrfdShare(CONCRETE, place, null);
/** The stiffness term, written out: eg from the steel's middle to the slab's. */
const stiffnessOf = ({ spanFt: L, slabIn, haunchIn }: LrfdPlace, { inertiaXIn4, areaIn2, depthIn }: ShapeFigures) => {
  const ts = slabIn ?? 0;
  const Kg = N * (inertiaXIn4 + areaIn2 * (depthIn / 2 + haunchIn + ts / 2) ** 2);
  return { Kg, k: (Kg / (12 * L * ts ** 3)) ** 0.1 };
};
const oneLane = (S: number, L: number, k: number): number => 0.06 + (S / 14) ** 0.4 * (S / L) ** 0.3 * k;
const moreLanes = (S: number, L: number, k: number): number => 0.075 + (S / 9.5) ** 0.6 * (S / L) ** 0.2 * k;
/** The worst lever rule by trying every place of the trucks, lanes; factors of presence written out. */
const searchedLever = (place: LrfdPlace, trucks = place.mostTrucks): number => {
  const { position, spacingFt: S, curbInsideFt } = place;
  let worst = 0;
  for (let count = 1; count <= trucks; count++) {
    const gaps = new Array<number>(count - 1).fill(4);
    const [share, from, to] =
      position === "interior" ? [interiorShare(S), -S - 10 * count, S] : [exteriorShare(S, curbInsideFt ?? 0), 2, 2];
    worst = Math.max(worst, ([1.2, 1, 0.85, 0.65][count - 1] * searchedWheelLines(share, gaps, from, to, 0.05)) / 2);
  }
  return worst;
};

describe("multiple presence", () => {
  it("is 1.20, 1.00, 0.85, and 0.65 from four lanes on", () => {
    expect([1, 2, 3, 4, 5, 8].map(multiplePresence)).toEqual([1.2, 1, 0.85, 0.65, 0.65, 0.65]);
  });

  it("stands inside the formulas, is put on the lever rule, and is left out of fatigue", () => {
    const { k } = stiffnessOf(INTERIOR, SHAPE);
    const interior = factorsOf(INTERIOR);
    expect(interior.fatigue).toBeCloseTo(oneLane(8, 60, k) / 1.2, 12);
    const { leverOne, leverFatigue, rigidOne } = shareOf(EXTERIOR);
    expect(leverOne).toBeCloseTo(1.2 * leverFatigue, 12);
    expect(factorsOf(EXTERIOR).fatigue).toBeCloseTo(Math.max(leverFatigue, rigidOne), 12);
  });
});

describe("interior formulas", () => {
  it("two lanes or more take the larger of one lane and several, one lane the first alone", () => {
    for (const S of [3.5, 5, 8, 11, 16]) {
      for (const L of [20, 60, 240]) {
        const place = { ...INTERIOR, spacingFt: S, spanFt: L };
        const { k } = stiffnessOf(place, SHAPE);
        const both = factorsOf(place);
        expect(both.moment).toBeCloseTo(Math.max(oneLane(S, L, k), moreLanes(S, L, k)), 12);
        expect(both.shear).toBeCloseTo(Math.max(0.36 + S / 25, 0.2 + S / 12 - (S / 35) ** 2), 12);
        const single = factorsOf({ ...place, lanes: 1, mostTrucks: 1 });
        expect(single.moment).toBeCloseTo(oneLane(S, L, k), 12);
        expect(single.shear).toBeCloseTo(0.36 + S / 25, 12);
      }
    }
  });

  it("the haunch of the section lifts the slab, and a stiffer shape draws more", () => {
    const haunched = { ...INTERIOR, haunchIn: 3 };
    const { k } = stiffnessOf(haunched, SHAPE);
    expect(factorsOf(haunched).moment).toBeCloseTo(moreLanes(8, 60, k), 12);
    expect(factorsOf(INTERIOR, shapeNamed("W36X361")).moment).toBeGreaterThan(factorsOf(INTERIOR).moment);
  });
});

describe("exterior stringers", () => {
  it("two lanes or more: the largest of one truck with 1.20, e times the formula, and the rigid section", () => {
    const rules = new Set<string>();
    for (const spacingFt of [4, 6, 8, 10, 12]) {
      for (const curbInsideFt of [-1, 0, 1.5, 3, 5.5]) {
        for (const [count, spanFt] of [
          [4, 60],
          [5, 60],
          [9, 20],
        ]) {
          const roadwayFt = (count - 1) * spacingFt + 2 * curbInsideFt;
          const place = { ...EXTERIOR, spacingFt, spanFt, curbInsideFt, count, roadwayFt };
          const { k } = stiffnessOf(place, SHAPE);
          const { leverOne, rigid } = shareOf(place);
          expect(leverOne).toBeCloseTo(searchedLever(place, 1), 9);
          const { moment, shear, momentRule } = factorsOf(place);
          expect(moment).toBeCloseTo(Math.max(leverOne, (0.77 + curbInsideFt / 9.1) * moreLanes(spacingFt, spanFt, k), rigid), 12);
          const several = 0.2 + spacingFt / 12 - (spacingFt / 35) ** 2;
          expect(shear).toBeCloseTo(Math.max(leverOne, (0.6 + curbInsideFt / 10) * several, rigid), 12);
          rules.add(momentRule);
        }
      }
    }
    expect([...rules].sort()).toEqual(["(0.77 + de/9.1) times the formula", "lever rule, one truck", "rigid section"]);
  });

  it("one lane: one truck with 1.20 or the rigid section", () => {
    const place = { ...EXTERIOR, lanes: 1, mostTrucks: 1, roadwayFt: 18 };
    const { leverOne, rigid } = shareOf(place);
    expect(factorsOf(place).moment).toBe(Math.max(leverOne, rigid));
    expect(factorsOf(place).shear).toBe(Math.max(leverOne, rigid));
  });
});

describe("rigid section", () => {
  it("an example by hand: five stringers at 8 ft, de 1.5 ft, 35 ft of roadway", () => {
    // Stringers at 16, 8, 0, -8, -16 ft: sum of squares 640 ft2. The curb stands at 16 + 1.5 = 17.5 ft; lanes of 12 ft from it, trucks in them
    // 5 ft from the curb: at 12.5 and 0.5 ft (35 ft of roadway hold two lanes).
    // One truck: 1.20 (1/5 + 16 x 12.5/640) = 0.615. Two: 1.00 (2/5 + 16 x 13/640) = 0.725.
    const { rigid, rigidOne } = shareOf({ ...EXTERIOR, roadwayFt: 35, lanes: 2, mostTrucks: 2 });
    expect(rigid).toBeCloseTo(0.725, 12);
    expect(rigidOne).toBeCloseTo(0.5125, 12);
  });

  it("every number of lanes is tried, and more lanes count only if they are worse", () => {
    // The same with a third truck at -11.5 ft: 0.85 (3/5 + 16 x 1.5/640) = 0.542, less than two trucks' 0.725.
    expect(shareOf({ ...EXTERIOR, roadwayFt: 36, lanes: 3 }).rigid).toBeCloseTo(0.725, 12);
    // Four stringers at 12 ft, de 3 ft: at 18 and 6 ft, sum of squares 720; trucks at 16, 4 and -8 ft.
    // 1.20 (1/4 + 18 x 16/720) = 0.78; (2/4 + 18 x 20/720) = 1.0; 0.85 (3/4 + 18 x 12/720) = 0.8925.
    const wide = { ...EXTERIOR, count: 4, spacingFt: 12, curbInsideFt: 3, roadwayFt: 42, lanes: 3 };
    expect(shareOf(wide).rigid).toBeCloseTo(1, 12);
    expect(shareOf({ ...wide, lanes: 1 }).rigid).toBeCloseTo(0.78, 12);
    // Twelve stringers at 6 ft, de 0: sum of squares 5148; trucks at 28, 16, 4, -8 and -20 ft. Here three lanes are worst:
    // 1.20 (1/12 + 33 x 28/5148) = 0.315; (2/12 + 33 x 44/5148) = 0.449; 0.85 (3/12 + 33 x 48/5148) = 0.474; 0.65 (4/12 + 33 x 40/5148) = 0.383.
    const many = { ...EXTERIOR, count: 12, spacingFt: 6, curbInsideFt: 0, roadwayFt: 66, lanes: 5 };
    expect(shareOf(many).rigid).toBeCloseTo(0.85 * (3 / 12 + (33 * 48) / 5148), 12);
  });

  it("two lanes of half the roadway from 20 to below 24 ft", () => {
    // Four stringers at 6 ft, de 2 ft, 22 ft of roadway: at 9 and 3 ft, sum of squares 180; the curb at 11 ft, trucks at 6 and -5 ft.
    const narrow = { ...EXTERIOR, count: 4, spacingFt: 6, curbInsideFt: 2, roadwayFt: 22, lanes: 2, mostTrucks: 2 };
    expect(shareOf(narrow).rigid).toBeCloseTo(Math.max(1.2 * (1 / 4 + (9 * 6) / 180), 2 / 4 + (9 * 1) / 180), 12);
    // Just below 24 ft they are just below 12 ft wide. With the curb far out two trucks are the worse: de 7 ft, trucks at 11 and -0.99 ft.
    const nearly = { ...narrow, curbInsideFt: 7, roadwayFt: 23.98 };
    expect(shareOf(nearly).rigid).toBeCloseTo(2 / 4 + (9 * (11 - 0.99)) / 180, 12);
    // At 24 ft the lanes are 12 ft wide again: de 3 ft, the curb at 12 ft, trucks at 7 and -5 ft.
    const full = { ...narrow, curbInsideFt: 3, roadwayFt: 24 };
    expect(shareOf(full).rigid).toBeCloseTo(Math.max(1.2 * (1 / 4 + (9 * 7) / 180), 2 / 4 + (9 * 2) / 180), 12);
  });

  it("none for interior stringers", () => {
    expect(shareOf(INTERIOR).rigid).toBe(0);
  });
});

describe("three stringers", () => {
  it.each([4, 6, 8, 10, 12, 14])("interior, S %f ft: moment the lesser of formula and lever rule, shear by the lever rule", (spacingFt) => {
    for (const spanFt of [20, 60]) {
      const place = { ...INTERIOR, count: 3, spacingFt, spanFt, lanes: 2, mostTrucks: 2 };
      const { k } = stiffnessOf(place, SHAPE);
      const formula = Math.max(oneLane(spacingFt, spanFt, k), moreLanes(spacingFt, spanFt, k));
      const lever = searchedLever(place);
      const { moment, shear, fatigue } = factorsOf(place);
      expect(moment).toBeCloseTo(Math.min(formula, lever), 9);
      expect(shear).toBeCloseTo(lever, 9);
      expect(fatigue).toBeCloseTo(Math.min(oneLane(spacingFt, spanFt, k) / 1.2, searchedLever(place, 1) / 1.2), 9);
    }
  });

  it("both sides of the lesser are met", () => {
    const rules = [20, 60].map((spanFt) => factorsOf({ ...INTERIOR, count: 3, spacingFt: 6, spanFt, lanes: 2, mostTrucks: 2 }).momentRule);
    expect(rules).toEqual(["lever rule (three stringers)", "formula (three stringers)"]);
  });

  it.each([4, 8, 12])("exterior, S %f ft: two lanes by the lesser of e times the formula and the lever rule", (spacingFt) => {
    for (const curbInsideFt of [0, 2, 4]) {
      const place = { ...EXTERIOR, count: 3, spacingFt, curbInsideFt, lanes: 2, mostTrucks: 2, roadwayFt: 2 * (spacingFt + curbInsideFt) };
      const { k } = stiffnessOf(place, SHAPE);
      const { leverOne, rigid } = shareOf(place);
      const lever = searchedLever(place);
      const several = Math.min((0.77 + curbInsideFt / 9.1) * moreLanes(spacingFt, 60, k), lever);
      const { moment, shear } = factorsOf(place);
      expect(moment).toBeCloseTo(Math.max(leverOne, several, rigid), 9);
      expect(shear).toBeCloseTo(Math.max(lever, rigid), 9);
    }
  });
});

describe("range of the formulas", () => {
  const isLever = (place: LrfdPlace, shape: ShapeFigures = SHAPE): boolean => factorsOf(place, shape).momentRule.includes("out of range");
  /** A shape whose stiffness is a given Kg, alone. */
  const ofStiffness = (Kg: number): ShapeFigures => ({ ...SHAPE, areaIn2: 0, inertiaXIn4: Kg / N });

  it.each([
    ["spacing", "spacingFt", 3.5, 16],
    ["span", "spanFt", 20, 240],
    ["slab", "slabIn", 4.5, 12],
  ] as const)("%s: on the limits by formula, a hair beyond by the lever rule, either position", (_, key, from, to) => {
    for (const place of [INTERIOR, EXTERIOR]) {
      expect([from, to].map((value) => isLever({ ...place, [key]: value }))).toEqual([false, false]);
      expect([from - HAIR, to + HAIR].map((value) => isLever({ ...place, [key]: value }))).toEqual([true, true]);
    }
  });

  it("stiffness 10^4 to 7 x 10^6 in4", () => {
    for (const place of [INTERIOR, EXTERIOR]) {
      expect([1e4, 7e6].map((Kg) => isLever(place, ofStiffness(Kg)))).toEqual([false, false]);
      expect([1e4 * (1 - HAIR), 7e6 * (1 + HAIR)].map((Kg) => isLever(place, ofStiffness(Kg)))).toEqual([true, true]);
    }
  });

  it("stiffness out of range takes the formulas of moment away, not those of shear", () => {
    for (const Kg of [9e3, 8e6]) {
      const interior = factorsOf(INTERIOR, ofStiffness(Kg));
      expect(interior.moment).toBeCloseTo(searchedLever(INTERIOR), 9);
      expect(interior.shear).toBeCloseTo(0.2 + 8 / 12 - (8 / 35) ** 2, 12);
      const { leverOne, rigid } = shareOf(EXTERIOR);
      const exterior = factorsOf(EXTERIOR, ofStiffness(Kg));
      expect(exterior.moment).toBeCloseTo(Math.max(searchedLever(EXTERIOR), rigid), 9);
      expect(exterior.shear).toBeCloseTo(Math.max(leverOne, 0.75 * (0.2 + 8 / 12 - (8 / 35) ** 2), rigid), 12);
    }
  });

  it("de -1 to 5.5 ft, for the exterior stringer alone", () => {
    expect([-1, 5.5].map((curbInsideFt) => isLever({ ...EXTERIOR, curbInsideFt }))).toEqual([false, false]);
    expect([-1 - HAIR, 5.5 + HAIR].map((curbInsideFt) => isLever({ ...EXTERIOR, curbInsideFt }))).toEqual([true, true]);
    expect([-2, 7].map((curbInsideFt) => isLever({ ...INTERIOR, curbInsideFt }))).toEqual([false, false]);
  });

  it("beyond them moment and shear are the lever rule with presence, 1 to NL trucks; fatigue is one truck alone", () => {
    const inside = { ...INTERIOR, spacingFt: 16.5, lanes: 3 };
    expect(factorsOf(inside).moment).toBeCloseTo(searchedLever(inside), 9);
    expect(factorsOf(inside).shear).toBe(factorsOf(inside).moment);
    expect(factorsOf(inside).fatigue).toBeCloseTo(searchedLever(inside, 1) / 1.2, 9);
    const outside = { ...EXTERIOR, curbInsideFt: 6, roadwayFt: 44 };
    const { rigid, rigidOne } = shareOf(outside);
    expect(factorsOf(outside).moment).toBeCloseTo(Math.max(searchedLever(outside), rigid), 9);
    expect(factorsOf(outside).fatigue).toBeCloseTo(Math.max(searchedLever(outside, 1) / 1.2, rigidOne), 9);
  });
});

describe("a factor of the user's own", () => {
  it("replaces every other, for all shapes and both positions", () => {
    const bridge = { ...CONCRETE, liveLoad: { ...CONCRETE.liveLoad, distribution: 0.61 } };
    const all = [INTERIOR, EXTERIOR].flatMap((place) => [SHAPE, shapeNamed("W24X55")].map((shape) => factorsOf(place, shape, bridge)));
    for (const one of all) expect(one).toEqual({ ...all[0], momentRule: "given", shearRule: "given" });
  });
});

describe("two stringers", () => {
  const TWO = { spanFt: 40, "deck.outToOutFt": 18, "stringers.count": 2, "stringers.spacingFt": 10, "stringers.minCount": 2 };

  it("are not chosen", () => {
    for (const answer of [lightest, counts] as const) {
      const asked = (): unknown => (answer === lightest ? lightest(preparedOf(TWO), 1) : counts(preparedOf(TWO)));
      expect(asked).toThrow(InputError);
      expect(asked).toThrow(/nonredundant/);
    }
  });

  it("are checked, both by the lever rule or the rigid section", () => {
    const { stringers } = check(preparedOf(TWO), "W36X361").assessment;
    expect(stringers.map(({ position }) => position)).toEqual(["exterior"]);
    const [{ effects }] = stringers;
    // Roadway 15 ft, one lane; overhang 4 ft, de 2.5 ft: wheels 2 and 8 ft from the curb, 12.5 ft from the other stringer to it.
    const lever = (1.2 * ((12.5 - 2) / 10 + (12.5 - 8) / 10)) / 2;
    // The rigid section of two stringers is the same lever: 1.2 (1/2 + 5 (5 + 2.5 - 5)/50).
    expect(lever).toBeCloseTo(1.2 * (1 / 2 + (5 * 2.5) / 50), 12);
    expect(effects.distributionMoment).toBeCloseTo(lever, 12);
    expect(effects.distributionShear).toBeCloseTo(lever, 12);
  });
});

describe("decks other than concrete, interior stringers", () => {
  const onDeck = (kind: DeckKind, thicknessIn: number, spacingFt: number, lanes: number): LrfdFactors => {
    const bridge = { ...CONCRETE, deck: { ...CONCRETE.deck, kind, thicknessIn } };
    return factorsOf({ ...INTERIOR, slabIn: null, spacingFt, lanes, mostTrucks: lanes }, SHAPE, bridge);
  };
  const leverAt = (spacingFt: number, lanes: number): number => searchedLever({ ...INTERIOR, spacingFt, mostTrucks: lanes });
  type Row = readonly [kind: DeckKind, thicknessIn: number, one: number, oneToFt: number, more: number, moreToFt: number, wood: boolean];
  const ROWS: readonly Row[] = [
    ["timber-plank", 4, 6.7, 5, 7.5, 5, true],
    ["nail-laminated", 5, 8.3, 6, 8.5, 6, true],
    ["glulam", 5.125, 8.8, 6, 9, 6, true],
    ["steel-grid", 4 - HAIR, 7.5, 6, 8, 10.5, false],
    ["steel-grid", 4, 10, 6, 10, 10.5, false],
  ];

  it.each(ROWS)("%s %f in, one lane: S/%f to %f ft", (kind, thicknessIn, divisor, toFt, _more, _moreTo, wood) => {
    for (const S of [2, toFt - 0.5, toFt]) {
      const { moment, shear, fatigue } = onDeck(kind, thicknessIn, S, 1);
      expect(moment).toBeCloseTo(S / divisor, 12);
      expect(shear).toBeCloseTo(wood ? S / divisor : leverAt(S, 1), 9);
      expect(fatigue).toBeCloseTo(S / divisor / 1.2, 12);
    }
    const beyond = onDeck(kind, thicknessIn, toFt + HAIR, 1);
    expect(beyond.moment).toBeCloseTo(leverAt(toFt, 1), 6);
    expect(beyond.shear).toBeCloseTo(leverAt(toFt, 1), 6);
    expect(beyond.fatigue).toBeCloseTo(leverAt(toFt, 1) / 1.2, 6);
    expect(beyond.momentRule).toBe("lever rule");
  });

  it.each(ROWS)("%s %f in, two lanes: the column's divisor and its limit", (kind, thicknessIn, _one, _oneTo, divisor, toFt, wood) => {
    const row = OTHER_DECKS.find((one) => one.kind === kind && thicknessIn >= one.fromIn && thicknessIn < one.belowIn);
    expect(row?.moreLanes).toEqual({ divisor, toFt });
    for (const S of [2, toFt]) {
      const { moment, shear, momentRule } = onDeck(kind, thicknessIn, S, 2);
      expect(momentRule).not.toBe("lever rule");
      expect(moment).toBeGreaterThanOrEqual(S / divisor - HAIR);
      expect(shear).toBeCloseTo(wood ? moment : leverAt(S, 2), 9);
    }
    const beyond = onDeck(kind, thicknessIn, toFt + HAIR, 2);
    expect(beyond.moment).toBeCloseTo(leverAt(toFt, 2), 6);
    expect(beyond.shear).toBeCloseTo(leverAt(toFt, 2), 6);
    expect(beyond.momentRule).toBe("lever rule");
  });

  it("a road of two lanes carries one truck alone too: the larger of the columns, as under concrete", () => {
    // The one-lane column holds the presence of 1.20 and divides by less: it is the larger one on every deck of the table but the deep grid.
    for (const [kind, thicknessIn, one, oneToFt, more] of ROWS) {
      for (const S of [2, oneToFt]) {
        expect(onDeck(kind, thicknessIn, S, 2).moment, `${kind} ${thicknessIn} in, S ${S} ft`).toBeCloseTo(Math.max(S / one, S / more), 12);
      }
    }
  });

  it("a grid between its columns' limits: several lanes by the divisor, one truck by the lever rule, the larger", () => {
    for (const [thicknessIn, divisor] of [
      [3, 8],
      [4, 10],
    ]) {
      for (const S of [6 + HAIR, 6.5, 7, 8, 9, 10.5]) {
        const one = searchedLever({ ...INTERIOR, spacingFt: Math.round(S * 100) / 100 }, 1);
        expect(onDeck("steel-grid", thicknessIn, S, 2).moment).toBeCloseTo(Math.max(S / divisor, one), 6);
        expect(onDeck("steel-grid", thicknessIn, S, 2).fatigue).toBeCloseTo(one / 1.2, 6);
      }
    }
  });

  it("corrugated steel: by the lever rule", () => {
    expect(onDeck("corrugated-steel", 3, 4, 2).moment).toBeCloseTo(leverAt(4, 2), 9);
  });

  it("exterior stringers: by the lever rule", () => {
    const bridge = { ...CONCRETE, deck: { ...CONCRETE.deck, kind: "glulam" as const, thicknessIn: 6 } };
    const place = { ...EXTERIOR, slabIn: null, spacingFt: 5, lanes: 2, mostTrucks: 2 };
    expect(factorsOf(place, SHAPE, bridge).moment).toBeCloseTo(searchedLever(place), 9);
  });
});
