// The whole chain from a bridge to its ratios, worked by hand once: each rule alone may be right and the chain still wrong where one hands on
// to the next, and then no stringer that the program names is what an engineer's own calculation gives.
// Invented bridge; every step written as its formula with plain numbers, after AASHTO Standard Specifications, 17th ed. (from memory).
// None of the program's formulas is called.
import { describe, expect, it } from "vitest";
import { check } from "../../src/answers/check.js";
import type { CheckId, StringerAssessment } from "../../src/specs/contract.js";
import { preparedOf } from "../support/question.js";
import { shapeNamed } from "../support/shapes.js";

// Quarry Road over Tarn Beck: 54 ft, deck 27 ft with barriers of 1.25 ft, five W30X116 at 5.5 ft, HS20, 4,000 trucks a day.
const QUARRY_ROAD = {
  specification: "lfd",
  spanFt: 54,
  pieceOverlapFt: 0.75,
  "deck.outToOutFt": 27,
  "deck.thicknessIn": 7.5,
  "deck.sacrificialIn": 0.5,
  "deck.haunchWeightIn": 1.5,
  "deck.haunchSectionIn": 0,
  "deck.fcKsi": 3,
  "barriers.baseFt": 1.25,
  "barriers.weightKlf": 0.35,
  wearingPsf: 20,
  "stringers.count": 5,
  "stringers.spacingFt": 5.5,
  "steel.grade": "50",
  "steel.miscFraction": 0.05,
  "liveLoad.adtt": 4000,
  "pour.constructionPsf": 20,
  "studs.diameterIn": 0.75,
  "studs.perRow": 3,
};
// W30X116 as the catalogue has it.
const SHAPE = { A: 34.2, d: 30, bf: 10.5, tf: 0.85, tw: 0.565, k: 1.5, Ix: 4930, Sx: 329, Zx: 378, J: 6.43 };

const { stringers } = check(preparedOf(QUARRY_ROAD), "W30X116").assessment;

const IMPACT = 50 / (54 + 125);
/** One lane of HS20: the truck's closed form, more than the lane loading's 0.08 L^2 + 4.5 L. */
const LANE_MOMENT = 18 * 54 - 280 + 392 / 54;

/** The worst end shear of a stringer, wheel lines of the axle over the bearing and of the others apart, impact in it. */
function endShear(overBearing: number, others: number): number {
  const truck = 32 * overBearing + ((32 * (54 - 14)) / 54 + (8 * (54 - 28)) / 54) * others;
  const laneLoading = 26 * overBearing + ((0.64 * 54) / 2) * others;
  return (Math.max(truck, laneLoading) / 2) * (1 + IMPACT);
}

/** EI times the greatest midspan deflection of one lane: the truck at every place, or the lane loading with its 18 kip. */
function deflectionKipFt3(): number {
  let most = (5 * 0.64 * 54 ** 4) / 384 + (18 * 54 ** 3) / 48;
  for (let step = 0; step <= 200000; step++) {
    const front = 36 + (step * 10) / 200000;
    const under = [front, front - 14, front - 28].map((at) => Math.min(at, 54 - at));
    const sum = [8, 32, 32].reduce((all, kip, axle) => all + (kip * under[axle] * (3 * 54 ** 2 - 4 * under[axle] ** 2)) / 48, 0);
    most = Math.max(most, sum);
  }
  return most;
}

interface OfOneStringer {
  readonly tributaryFt: number;
  readonly widthIn: number;
  /** Wheel lines: moment, axle over the bearing, and one lane loaded. */
  readonly g: number;
  readonly gv: number;
  readonly g1: number;
}

/** Everything of one stringer that hangs on its tributary width, slab and factors. */
function stringer({ tributaryFt: T, widthIn: be, g, gv, g1 }: OfOneStringer) {
  const { A, bf, tf, tw, k, Ix, Sx, J } = SHAPE;
  // Dead load: 7.5 in of deck, a haunch of 1.5 in, the shape and 5 %; two barriers and 20 psf on 24.5 ft shared by five.
  const w1 = (7.5 / 12) * T * 0.15 + ((bf * 1.5) / 144) * 0.15 + 0.116 * 1.05;
  const [w2, ww] = [(2 * 0.35) / 5, (0.02 * 24.5) / 5];
  const [M1, M2, Mw] = [w1, w2, ww].map((w) => (w * 54 ** 2) / 8);
  const ML = (LANE_MOMENT / 2) * g * (1 + IMPACT);
  const VL = endShear(gv, g);
  const Mu = 1.3 * (M1 + M2 + Mw + 1.67 * ML);
  const Vu = 1.3 * (((w1 + w2 + ww) * 54) / 2 + 1.67 * VL);

  // 7 in of slab straight on the flange; n = 9 for 3 ksi, 27 for what lasts.
  const section = (ratio: number) => {
    const As = (be * 7) / ratio;
    const y = (A * 15 + As * 33.5) / (A + As);
    const I = Ix + A * (y - 15) ** 2 + (As * 7 ** 2) / 12 + As * (33.5 - y) ** 2;
    return { I, Sb: I / y, St: I / (30 - y) };
  };
  const [long, short] = [section(27), section(9)];

  // Plastic moment: the slab is weaker than the steel, and the flange takes up the difference.
  const [Ps, P, Pf] = [0.85 * 3 * be * 7, 34.2 * 50, 50 * 10.5 * 0.85];
  expect(Ps).toBeLessThan(P);
  expect((P - Ps) / 2).toBeLessThan(Pf);
  const yf = (P - Ps) / 2 / (50 * 10.5);
  const Pw = P - 2 * Pf;
  const flange = (50 * 10.5 * (yf ** 2 + (0.85 - yf) ** 2)) / 2;
  const Mp = (Ps * (yf + 3.5) + flange + Pw * (15 - yf) + Pf * (30 - yf - 0.425)) / 12;
  const Dp = 7 + yf;
  // First yield by stages, and the line between D' and 5 D'.
  const [Mf1, Mf2] = [1.3 * M1, 1.3 * (M2 + Mw)];
  const left = (Sl: number, Ss: number): number => ((50 - (12 * Mf1) / Sx - (12 * Mf2) / Sl) * Ss) / 12;
  const My = Mf1 + Mf2 + Math.min(left(long.Sb, short.Sb), left(long.St, short.St));
  const Dprime = (0.7 * (30 + 7)) / 7.5;
  expect(Dp).toBeGreaterThan(Dprime);
  const capacity = (5 * Mp - 0.85 * My) / 4 + ((0.85 * My - Mp) / 4) * (Dp / Dprime);

  // Shear of a web 28.3 in deep: 28.3/0.565 = 50.1, below 190 sqrt(5)/sqrt(50) = 60.1.
  const Vcap = 0.58 * 50 * 28.3 * 0.565;

  // Overload; the bottom flange is the worse one of a symmetric shape under a slab.
  const bottom = 12 * (M1 / Sx + (M2 + Mw) / long.Sb + ((5 / 3) * ML) / short.Sb);
  const top = 12 * (M1 / Sx + (M2 + Mw) / long.St + ((5 / 3) * ML) / short.St);

  // Deflection: two lanes on five stringers.
  const deflection = (1728 * 2 * 1 * deflectionKipFt3() * (1 + IMPACT)) / (5 * 29000 * short.I);

  // Fatigue, stiffener weld, 4,000 trucks a day: all lanes against 13 ksi, one lane against 12 ksi.
  const range = (12 * (LANE_MOMENT / 2) * (1 + IMPACT)) / short.Sb;
  const fatigue = (g1 * range) / 12 > (g * range) / 13 ? [g1 * range, 12] : [g * range, 13];

  // Wet deck on the bare shape, diaphragms 54/3 = 18 ft apart, 20 psf on the tributary width.
  const pour = (1.3 * (w1 + 0.02 * T) * 54 ** 2) / 8;
  const Iyc = (0.85 * 10.5 ** 3) / 12;
  const Mr = Math.min(50 * Sx, ((91000 * Iyc) / 216) * Math.sqrt((0.772 * J) / Iyc + 9.87 * (30 / 216) ** 2)) / 12;
  const Fcr = Math.min(50, (69.6 / (10.5 / 1.7)) ** 2);

  // Bearing: the length at which the web takes the reaction, by yielding and by crippling on either side of N/d = 0.2.
  const base = 0.8 * 0.4 * tw ** 2 * Math.sqrt((29000 * 50 * tf) / tw);
  const gain = (tw / tf) ** 1.5;
  const short3 = ((Vu / base - 1) * 30) / (3 * gain);
  const crippling = short3 <= 0.2 * 30 ? short3 : (30 * ((Vu / base - 1) / gain + 0.2)) / 4;
  const length = Math.max(0, Vu / (50 * tw) - 2.5 * k, crippling);

  // Studs of 3/4 in: 0.4 d^2 sqrt(f'c Ec), at most 60 ksi on the area; three in a row.
  const Su = Math.min(0.4 * 0.75 ** 2 * Math.sqrt(3 * 57 * Math.sqrt(3000)), (60 * Math.PI * 0.75 ** 2) / 4);
  const studs = 3 * Math.ceil(Math.min(P, Ps) / (0.85 * Su) / 3);

  return {
    effects: { w1, w2, ww, M1, M2, Mw, ML, VL, Mu, Vu, be, Mp, deflection },
    checks: {
      flexure: [Mu, capacity],
      ductility: [Dp, 5 * Dprime],
      shear: [Vu, Vcap],
      overload: [Math.max(bottom, top), 47.5],
      "live-load-deflection": [deflection, (12 * 54) / 800],
      fatigue,
      "deck-pour": [pour, Math.min(Mr, (Fcr * Sx) / 12)],
      // L/30 of steel is the nearer one: 21.6 of 30 in against L/25, 25.9 of 37 in.
      depth: [(12 * 54) / 30, 30],
      handling: [(12 * 55.5) / 85, 10.5],
      "diaphragm-spacing": [18, 25],
      "deck-thickness": [(12 * 15.5) / 30, 7.5],
      // Two lanes are four wheel lines; five stringers of one each.
      "distribution-sum": [4, 5],
    } as Partial<Record<CheckId, readonly number[]>>,
    support: 0.75 * Vcap,
    length,
    studs,
  };
}

/** Ten digits: both sides are the same arithmetic, written twice. */
const same = (ours: number, hand: number, said: string): void =>
  expect(Math.abs(ours / hand - 1), `${said}: ${ours}, by hand ${hand}`).toBeLessThan(1e-9);

function compare(ours: StringerAssessment, hand: ReturnType<typeof stringer>): void {
  const { effects } = ours;
  const { w1, w2, ww, M1, M2, Mw, ML, VL, Mu, Vu, be, Mp, deflection } = hand.effects;
  same(effects.deadStage1Klf, w1, "w1");
  same(effects.deadStage2Klf, w2, "w2");
  same(effects.deadWearingKlf, ww, "ww");
  same(effects.momentStage1KipFt, M1, "M1");
  same(effects.momentStage2KipFt, M2, "M2");
  same(effects.momentWearingKipFt, Mw, "Mw");
  same(effects.liveMomentKipFt, ML, "ML");
  same(effects.liveShearKip, VL, "VL");
  same(effects.factoredMomentKipFt, Mu, "Mu");
  same(effects.factoredShearKip, Vu, "Vu");
  same(effects.effectiveWidthIn ?? 0, be, "be");
  same(effects.plasticMomentKipFt ?? 0, Mp, "Mp");
  same(effects.deflectionIn, deflection, "deflection");
  for (const [id, [demand, capacity]] of Object.entries(hand.checks)) {
    const found = ours.checks.find((one) => one.id === id);
    same(found?.demand ?? Number.NaN, demand, `${id}, demand`);
    same(found?.capacity ?? Number.NaN, capacity, `${id}, capacity`);
  }
  same(ours.support.withoutStiffenersKip, hand.support, "shear without stiffeners");
  expect(ours.support.stiffenersNeeded).toBe(Vu > hand.support);
  if (hand.length > 0) same(ours.support.bearingLengthNeededIn, hand.length, "bearing length");
  else expect(ours.support.bearingLengthNeededIn).toBe(0);
  expect(ours.studs?.perHalfSpan).toBe(hand.studs);
}

describe("Quarry Road", () => {
  it("is on the shape the hand calculation is for", () => {
    const { areaIn2, depthIn, flangeWidthIn, flangeThicknessIn, webThicknessIn, kDesignIn } = shapeNamed("W30X116");
    const { inertiaXIn4, sectionModulusXIn3, plasticModulusXIn3, torsionJIn4 } = shapeNamed("W30X116");
    const { A, d, bf, tf, tw, k, Ix, Sx, Zx, J } = SHAPE;
    expect([areaIn2, depthIn, flangeWidthIn, flangeThicknessIn, webThicknessIn, kDesignIn]).toEqual([A, d, bf, tf, tw, k]);
    expect([inertiaXIn4, sectionModulusXIn3, plasticModulusXIn3, torsionJIn4]).toEqual([Ix, Sx, Zx, J]);
  });

  it("interior stringer", () => {
    // Two lanes S/5.5 = 1, one lane S/7; over the bearing two wheels 4 ft apart astride the stringer: 2 (5.5 - 2)/5.5.
    // Slab: the least of 54/4 ft, 5.5 ft and 12 x 7 in.
    compare(stringers[0], stringer({ tributaryFt: 5.5, widthIn: 66, g: 1, gv: (2 * 3.5) / 5.5, g1: 5.5 / 7 }));
  });

  it("exterior stringer, overhang 2.5 ft, curb 1.25 ft outside its web", () => {
    // Lever rule: the wheel 2 ft from the curb, 6.75 ft from the first interior stringer to it: 0.864; the floor S/5.5 = 1 is more.
    // Slab: half of 66 in, and outside the lesser of that and 30 in.
    const lever = (6.75 - 2) / 5.5;
    compare(stringers[1], stringer({ tributaryFt: 2.75 + 2.5, widthIn: 63, g: 1, gv: lever, g1: lever }));
  });
});
