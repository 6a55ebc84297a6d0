// An envelope that misses the worst place of a truck by a foot undersizes every stringer of a bridge by the same per cent, and nothing
// else in the calculation would show it. Beams solved by direct stiffness try the places here; exact means no place beats the envelope.
import { describe, expect, it } from "vitest";
import {
  type AxleTrain,
  axlePlacesFt,
  endPlaces,
  greatestDeflectionAt,
  greatestMoment,
  greatestMomentAt,
  greatestShearAt,
  grossWeightKip,
  reversed,
  scaled,
} from "../../../src/loads/axle-train.js";
import { momentUnderAxle } from "../../../src/loads/formulas.js";
import { type PointLoad, type SolvedBeam, StiffnessBeam } from "../../support/direct-stiffness.js";
import { placed, trainOf } from "../../support/vehicles.js";

const lopsided: AxleTrain = { name: "lopsided", axlesKip: [40, 3, 3, 22, 9], spacingsFt: [6, 31, 5, 12] };
const TRAINS: readonly AxleTrain[] = [
  ...["HS20-44", "H20-44", "Tandem", "Type 3S2", "Type 3-3", "SU7", "EV3"].map((name) => ({ ...trainOf(name), name })),
  lopsided,
  { name: "one axle", axlesKip: [31], spacingsFt: [] },
];
const SPANS = [9, 27.5, 60, 118];
const CASES = TRAINS.flatMap((train) => SPANS.map((L) => [train.name, L, train] as const));

const gross = (train: AxleTrain): number => train.axlesKip.reduce((sum, axle) => sum + axle, 0);

/** Places of a train across a span, both ways round: its first axle every `stepFt` from before the span to beyond it. */
function* crossings(train: AxleTrain, L: number, stepFt: number): Generator<PointLoad[]> {
  const lengthFt = train.spacingsFt.reduce((sum, gap) => sum + gap, 0);
  const turned: AxleTrain = { ...train, axlesKip: [...train.axlesKip].reverse(), spacingsFt: [...train.spacingsFt].reverse() };
  for (const driven of [train, turned]) {
    const steps = Math.ceil((L + lengthFt) / stepFt);
    for (let step = 0; step <= steps; step++) yield placed(driven, 0, -lengthFt + step * stepFt);
  }
}

const onSpan = (loads: readonly PointLoad[], L: number): readonly PointLoad[] => loads.filter(({ atFt }) => atFt >= 0 && atFt <= L);
/** The same with what rounding pushed past a bearing brought back over it. */
const settled = (loads: readonly PointLoad[], L: number): PointLoad[] =>
  loads.map((load) => (Math.abs(load.atFt) < 1e-9 ? { ...load, atFt: 0 } : Math.abs(load.atFt - L) < 1e-9 ? { ...load, atFt: L } : load));

/** A beam's answer to trains anywhere on a grid: solved once for 1 kip at each place of it, then added up. */
function unitSolutions(L: number, stepFt: number, sectionsFt: readonly number[]) {
  const beam = new StiffnessBeam(L, sectionsFt);
  const solutions = Array.from({ length: Math.round(L / stepFt) + 1 }, (_, place) =>
    beam.under([{ atFt: Math.min(L, place * stepFt), kip: 1 }]),
  );
  return (loads: readonly PointLoad[], effect: (solved: SolvedBeam) => number): number =>
    onSpan(settled(loads, L), L).reduce((sum, { atFt, kip }) => sum + kip * effect(solutions[Math.round(atFt / stepFt)]), 0);
}

/** Shear on either side of a section; at a bearing the reaction, a load over it included. */
function sidesOf(x: number, L: number): ((solved: SolvedBeam) => number)[] {
  if (x === 0) return [(solved) => solved.leftReaction()];
  if (x === L) return [(solved) => solved.rightReaction()];
  return [(solved) => solved.shearLeftOf(x), (solved) => solved.shearRightOf(x)];
}

describe("the train itself", () => {
  it("places, weight, turning round and scaling", () => {
    expect(axlePlacesFt(lopsided)).toEqual([0, 6, 37, 42, 54]);
    expect(grossWeightKip(lopsided)).toBe(77);
    expect(reversed(lopsided)).toEqual({ name: "lopsided", axlesKip: [9, 22, 3, 3, 40], spacingsFt: [12, 5, 31, 6] });
    expect(scaled(lopsided, 2)).toEqual({ ...lopsided, axlesKip: [80, 6, 6, 44, 18] });
  });
});

describe("a train in a given place, by direct stiffness", () => {
  // The formula that the record prints for the moment, with numbers a checker would put in.
  it.each([
    ["HS20-44", 60, 1, 31],
    ["HS20-44", 60, 2, 45.5],
    ["Type 3-3", 110, 3, 52.3],
    ["SU7", 40, 4, 24.7],
    ["Type 3S2", 75, 2, 20],
  ])("%s on %f ft, axle %i at %f ft: moment under that axle", (name, L, axle, x) => {
    const train = trainOf(name);
    const loads = placed(train, axle, x);
    expect(onSpan(loads, L)).toHaveLength(loads.length);
    const R = gross(train);
    const e = loads.reduce((sum, { kip, atFt }) => sum + kip * atFt, 0) / R - x;
    const Me = loads.slice(0, axle).reduce((sum, { kip, atFt }) => sum + kip * (x - atFt), 0);
    const solved = new StiffnessBeam(L).under(loads);
    expect(momentUnderAxle.of(R, L, x, e, Me)).toBeCloseTo(solved.momentAt(x), 7);
  });

  it.each(CASES)("%s on %f ft: the absolute maximum is the moment of the place it names", (_, L, train) => {
    const { momentKipFt, atFt, resultantKip, eccentricityFt, earlierAxlesKipFt } = greatestMoment(train, L, 0);
    const beam = new StiffnessBeam(L);
    const under = train.axlesKip.map((_kip, axle) => beam.under(placed(train, axle, atFt)).momentAt(atFt));
    expect(under.some((moment) => Math.abs(moment - momentKipFt) <= 1e-7)).toBe(true);
    expect(Math.max(...under)).toBeLessThanOrEqual(momentKipFt + 1e-7);
    // What the record prints works out to what it says.
    expect(momentUnderAxle.of(resultantKip, L, atFt, eccentricityFt, earlierAxlesKipFt)).toBeCloseTo(momentKipFt, 9);
    // The resultant and the axle stand astride midspan.
    expect(atFt + eccentricityFt / 2).toBeCloseTo(L / 2, 9);
  });

  it.each(CASES)("%s on %f ft: each place with an axle over the bearing gives that end shear", (_, L, train) => {
    const beam = new StiffnessBeam(L);
    const solved = [train, reversed(train)].flatMap((driven) =>
      driven.axlesKip.map((kip, axle) => ({ kip, reaction: beam.under(placed(driven, axle, 0).slice(axle)).leftReaction() })),
    );
    const places = endPlaces(train, L);
    expect(places).toHaveLength(solved.length);
    places.forEach(({ axleOverSupportKip, othersKip }, index) => {
      expect(axleOverSupportKip).toBe(solved[index].kip);
      expect(axleOverSupportKip + othersKip).toBeCloseTo(solved[index].reaction, 8);
    });
    expect(Math.max(...solved.map(({ reaction }) => reaction))).toBeCloseTo(greatestShearAt(train, L, 0), 8);
  });
});

describe("the envelope against every place tried", () => {
  const STEP = 0.25;

  // The crossing puts an axle exactly at every section here, where moment and shear break: no gap is left.
  it.each(CASES)("%s on %f ft: moment and shear at sections", (_, L, train) => {
    const sections = [0, 1.5, L / 4 - ((L / 4) % STEP), L / 2 - ((L / 2) % STEP), L];
    const answer = unitSolutions(L, STEP, sections);
    for (const x of sections) {
      let [moment, shear] = [0, 0];
      for (const loads of crossings(train, L, STEP)) {
        const at = settled(loads, L);
        moment = Math.max(
          moment,
          answer(at, (solved) => solved.momentAt(x)),
        );
        for (const side of sidesOf(x, L)) shear = Math.max(shear, Math.abs(answer(at, side)));
      }
      expect(Math.abs(greatestMomentAt(train, L, x) - moment), `moment at ${x} ft`).toBeLessThanOrEqual(1e-6);
      expect(Math.abs(greatestShearAt(train, L, x) - shear), `shear at ${x} ft`).toBeLessThanOrEqual(1e-6);
    }
  });

  it.each(CASES)("%s on %f ft: absolute maximum moment", (_, L, train) => {
    const { momentKipFt } = greatestMoment(train, L, 0);
    const beam = new StiffnessBeam(L);
    let densest = 0;
    for (const loads of crossings(train, L, STEP)) {
      const standing = onSpan(loads, L);
      if (standing.length === 0) continue;
      const solved = beam.under(standing);
      for (const { atFt } of standing) densest = Math.max(densest, solved.momentAt(atFt));
    }
    // Under an axle the moment is a parabola of the place, R/L (x - x0)^2 below its top: that much between two places, no more.
    const gap = (gross(train) / L) * (STEP / 2) ** 2;
    expect(momentKipFt).toBeGreaterThanOrEqual(densest - 1e-7);
    expect(momentKipFt).toBeLessThanOrEqual(densest + gap + 1e-7);
  });

  it.each(CASES)("%s on %f ft: deflection at midspan and at a quarter point", (_, L, train) => {
    const sections = [L / 4, L / 2];
    const answer = unitSolutions(L, STEP, sections);
    for (const x of sections) {
      let densest = 0;
      for (const loads of crossings(train, L, STEP))
        densest = Math.max(
          densest,
          answer(loads, (solved) => solved.deflectionAt(x)),
        );
      // An influence line of deflection bends by a moment of 1 kip at the section, at most x (L - x)/L.
      const gap = (((gross(train) * x * (L - x)) / L) * (STEP / 2) ** 2) / 2;
      const greatest = greatestDeflectionAt(train, L, x);
      expect(greatest).toBeGreaterThanOrEqual(densest * (1 - 1e-9));
      expect(greatest).toBeLessThanOrEqual(densest + gap);
    }
  });

  it("with a uniform load the place shifts, and still no place beats it", () => {
    const train = lopsided;
    const w = 1.9;
    for (const L of SPANS) {
      const { momentKipFt } = greatestMoment(train, L, w);
      const beam = new StiffnessBeam(L);
      let densest = 0;
      for (const loads of crossings(train, L, STEP)) {
        const standing = onSpan(loads, L);
        if (standing.length === 0) continue;
        const solved = beam.under(standing, w);
        for (const { atFt } of standing) densest = Math.max(densest, solved.momentAt(atFt));
      }
      expect(momentKipFt).toBeGreaterThanOrEqual(densest - 1e-7);
      expect(momentKipFt).toBeLessThanOrEqual(densest + (gross(train) / L + w / 2) * (STEP / 2) ** 2);
    }
  });
});

describe("both directions", () => {
  it.each(CASES)("%s on %f ft: the train turned round gives the same", (_, L, train) => {
    const turned: AxleTrain = { ...train, axlesKip: [...train.axlesKip].reverse(), spacingsFt: [...train.spacingsFt].reverse() };
    expect(greatestMoment(turned, L, 0).momentKipFt).toBeCloseTo(greatestMoment(train, L, 0).momentKipFt, 9);
    expect(greatestMoment(turned, L, 0.64).momentKipFt).toBeCloseTo(greatestMoment(train, L, 0.64).momentKipFt, 9);
    for (const x of [0, 0.13 * L, 0.5 * L, 0.8 * L]) {
      expect(greatestMomentAt(turned, L, x)).toBeCloseTo(greatestMomentAt(train, L, x), 9);
      expect(greatestShearAt(turned, L, x)).toBeCloseTo(greatestShearAt(train, L, x), 9);
      const deflection = greatestDeflectionAt(train, L, x);
      expect(Math.abs(greatestDeflectionAt(turned, L, x) - deflection)).toBeLessThanOrEqual(1e-9 * deflection);
    }
  });
});

describe("a span that is none", () => {
  it.each([Number.NaN, 0, -60, Number.POSITIVE_INFINITY])("greatestMoment at %f ft", (span) => {
    expect(() => greatestMoment(trainOf("HS20-44"), span, 0)).toThrow(RangeError);
    expect(() => greatestMoment(trainOf("HS20-44"), span, 0.64)).toThrow("spanFt");
  });
});
