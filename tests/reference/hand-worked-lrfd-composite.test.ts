// The whole chain from a bridge to its ratios, worked by hand once: each rule alone may be right and the chain still wrong where one hands on
// to the next, and then no stringer that the program names is what an engineer's own calculation gives.
// Invented bridge; every step written as its formula with plain numbers, after AASHTO LRFD Bridge Design Specifications, 9th ed. (from memory).
// None of the program's formulas is called.
import { describe, expect, it } from "vitest";
import { check } from "../../src/answers/check.js";
import type { CheckId, StringerAssessment } from "../../src/specs/contract.js";
import { preparedOf } from "../support/question.js";
import { shapeNamed } from "../support/shapes.js";

// Fenwick Lane over Alder Brook: 72 ft, deck 36 ft with barriers of 1.5 ft, four W36X170 at 9.5 ft, 600 trucks a day in one lane.
const FENWICK_LANE = {
  specification: "lrfd",
  spanFt: 72,
  "deck.outToOutFt": 36,
  "deck.thicknessIn": 8.5,
  "deck.sacrificialIn": 0.5,
  "deck.haunchWeightIn": 2,
  "deck.haunchSectionIn": 1,
  "deck.fcKsi": 4,
  "barriers.baseFt": 1.5,
  "barriers.weightKlf": 0.4,
  wearingPsf: 25,
  "stringers.count": 4,
  "stringers.spacingFt": 9.5,
  "steel.grade": "50",
  "steel.miscFraction": 0.05,
  "liveLoad.adtt": 600,
  "pour.constructionPsf": 20,
  "bearing.lengthIn": 10,
  "studs.diameterIn": 0.875,
  "studs.perRow": 3,
};
// W36X170 as the catalogue has it.
const SHAPE = { A: 50, d: 36.2, bf: 12, tf: 1.1, tw: 0.68, k: 1.85, Ix: 10500, Sx: 581, Zx: 668, J: 15.1 };
const [E, L] = [29000, 72];

const { stringers } = check(preparedOf(FENWICK_LANE), "W36X170").assessment;

/** One lane of HL-93, dynamic allowance in it: whole figures of the axles times 1.33, and the lane of 0.64 kip/ft. */
function lane() {
  // Truck 8, 32, 32 kip at 14 ft: resultant 72 kip, 4 2/3 ft behind the middle axle; under that axle the truck and the lane together are greatest.
  const R = 1.33 * 72;
  const e = (32 * 14 - 8 * 14) / 72;
  const x = ((R * (L - e)) / L + (0.64 * L) / 2) / ((2 * R) / L + 0.64);
  const moment = (R * (L - x - e) * x) / L - 1.33 * 8 * 14 + (0.64 * x * (L - x)) / 2;
  const shear = 1.33 * (32 + (32 * (72 - 14)) / 72 + (8 * (72 - 28)) / 72) + (0.64 * 72) / 2;
  // Fatigue truck, rear axles 30 ft apart: the middle axle (resultant 11 7/9 ft behind it) stands half of that before midspan.
  const ef = (32 * 30 - 8 * 14) / 72;
  const fatigue = (72 * ((L - ef) / 2) ** 2) / L - 8 * 14;
  return { moment, shear, fatigue };
}

/** Modular ratio, stiffness and the factors of interior stringers. */
function interiorFactors() {
  const n = E / (120000 * 0.145 ** 2 * 4 ** 0.33);
  const Kg = n * (SHAPE.Ix + SHAPE.A * (36.2 / 2 + 1 + 8 / 2) ** 2);
  const k = (Kg / (12 * 72 * 8 ** 3)) ** 0.1;
  const one = 0.06 + (9.5 / 14) ** 0.4 * (9.5 / 72) ** 0.3 * k;
  const more = 0.075 + (9.5 / 9.5) ** 0.6 * (9.5 / 72) ** 0.2 * k;
  const shear = 0.2 + 9.5 / 12 - (9.5 / 35) ** 2;
  return { n, one, more, shear };
}

/** Lever rule and rigid section of the exterior stringer: overhang 3.75 ft, curb 2.25 ft outside its web. */
function exteriorFactors(more: number, shear: number) {
  // Wheels 2 and 8 ft from the curb, 11.75 ft from the first interior stringer to it.
  const lever = ((11.75 - 2) / 9.5 + (11.75 - 8) / 9.5) / 2;
  // Stringers 14.25 and 4.75 ft either side; trucks 5 and 17 ft from the curb at 16.5 ft; sum of squares 451.25 ft2.
  const squares = 2 * (14.25 ** 2 + 4.75 ** 2);
  const rigidOne = 1 / 4 + (14.25 * 11.5) / squares;
  const rigidTwo = 2 / 4 + (14.25 * (11.5 - 0.5)) / squares;
  const rigid = Math.max(1.2 * rigidOne, rigidTwo);
  return {
    moment: Math.max(1.2 * lever, (0.77 + 2.25 / 9.1) * more, rigid),
    shear: Math.max(1.2 * lever, (0.6 + 2.25 / 10) * shear, rigid),
    fatigue: Math.max(lever, rigidOne),
  };
}

/** Everything of one stringer that hangs on its tributary width and factors. */
function stringer(T: number, g: number, gv: number, gf: number, n: number) {
  const { A, d, bf, tf, tw, k, Ix, Sx, Zx, J } = SHAPE;
  const { moment, shear, fatigue } = lane();
  // Dead load: 8.5 in of deck, a haunch of 2 in, the shape and 5 %; two barriers and 25 psf on 33 ft shared by four.
  const w1 = (8.5 / 12) * T * 0.15 + ((bf * 2) / 144) * 0.15 + 0.17 * 1.05;
  const [w2, ww] = [(2 * 0.4) / 4, (0.025 * 33) / 4];
  const [M1, M2, Mw] = [w1, w2, ww].map((w) => (w * 72 ** 2) / 8);
  const [ML, VL] = [g * moment, gv * shear];
  const Mu = 1.25 * (M1 + M2) + 1.5 * Mw + 1.75 * ML;
  const Vu = ((1.25 * (w1 + w2) + 1.5 * ww) * 72) / 2 + 1.75 * VL;

  // Slab of the tributary width, 8 in on 1 in of haunch.
  const be = 12 * T;
  const section = (ratio: number) => {
    const As = (be * 8) / ratio;
    const y = (A * 18.1 + As * (36.2 + 1 + 4)) / (A + As);
    const I = Ix + A * (y - 18.1) ** 2 + (As * 8 ** 2) / 12 + As * (41.2 - y) ** 2;
    return { I, Sb: I / y, St: I / (36.2 - y) };
  };
  const [long, short] = [section(3 * n), section(n)];

  // Plastic moment: the slab is the stronger, so the axis lies in it.
  const [Ps, P] = [0.85 * 4 * be * 8, 50 * 50];
  expect(Ps).toBeGreaterThan(P);
  const Dp = (8 * P) / Ps;
  const Mp = (P * (18.1 + 1 + 8 - Dp / 2)) / 12;
  const Dt = 36.2 + 1 + 8;
  expect(Dp).toBeGreaterThan(0.1 * Dt);
  const Mn = Mp * (1.07 - (0.7 * Dp) / Dt);

  // Shear of a web 34 in deep: 34/0.68 = 50, below 1.12 sqrt(5 x 29000/50) = 60.3.
  const Vn = 0.58 * 50 * 34 * 0.68;

  // Service II; the bottom flange is the worse one of a symmetric shape under a slab.
  const bottom = 12 * (M1 / Sx + (M2 + Mw) / long.Sb + (1.3 * ML) / short.Sb);
  const top = 12 * (M1 / Sx + (M2 + Mw) / long.St + (1.3 * ML) / short.St);

  // Deflection: the truck alone with 33 %, two lanes on four stringers. On 72 ft the middle axle does not stand at midspan; the place is searched.
  let Y = 0;
  for (let step = 0; step <= 200000; step++) {
    const front = 45 + (step * 10) / 200000;
    const under = [front, front - 14, front - 28].map((at) => Math.min(at, 72 - at));
    Y = Math.max(
      Y,
      [8, 32, 32].reduce((sum, kip, axle) => sum + (kip * under[axle] * (3 * 72 ** 2 - 4 * under[axle] ** 2)) / 48, 0),
    );
  }
  const deflection = (1728 * 1 * 2 * 1.33 * Y) / (4 * 29000 * short.I);

  // Fatigue II, detail C': 600 trucks a day are fewer than 44e8/(365 x 75 ((0.80/1.75) 12)^3) = 974.
  const range = (12 * 0.8 * 1.15 * gf * fatigue) / short.Sb;
  const resistance = (44e8 / (365 * 75 * 600)) ** (1 / 3);

  // Wet deck on the bare shape, diaphragms 72/3 = 24 ft apart, 20 psf on the tributary width.
  const wc = 0.02 * T;
  const pour = (12 * ((Math.max(1.25 * w1 + 1.5 * wc, 1.4 * (w1 + wc)) * 72 ** 2) / 8)) / Sx;
  const h = 36.2 - 1.1;
  const rt = 12 / Math.sqrt(12 * (1 + (17 * 0.68) / (3 * 12 * 1.1)));
  const Lp = rt * Math.sqrt(29000 / 50);
  const squeeze = (35 * Sx * h) / (29000 * J);
  const Lr = 1.95 * rt * (29000 / 35) * Math.sqrt(J / (Sx * h)) * Math.sqrt(1 + Math.sqrt(1 + 6.76 * squeeze ** 2));
  // Web 50 and flange 12/2.2 = 5.45 are compact, so the line starts from Fy Zx.
  const Mnc = 50 * Zx * (1 - (1 - (35 * Sx) / (50 * Zx)) * ((288 - Lp) / (Lr - Lp)));
  expect(288).toBeGreaterThan(Lp);
  expect(288).toBeLessThan(Lr);

  // Web over 10 in of bearing: 10/36.2 = 0.28.
  const yielding = (2.5 * k + 10) * 50 * tw;
  const crippling = 0.8 * 0.4 * tw ** 2 * (1 + ((4 * 10) / d - 0.2) * (tw / tf) ** 1.5) * Math.sqrt((29000 * 50 * tf) / tw);

  // Studs of 7/8 in: Ec, 0.5 Asc sqrt(f'c Ec), three in a row.
  const Asc = (Math.PI * 0.875 ** 2) / 4;
  const Qn = Math.min(0.5 * Asc * Math.sqrt(4 * 120000 * 0.145 ** 2 * 4 ** 0.33), 60 * Asc);
  const studs = 3 * Math.ceil(Math.min(P, Ps) / (0.85 * Qn) / 3);

  return {
    effects: { w1, w2, ww, M1, M2, Mw, ML, VL, Mu, Vu, be, Mp, deflection },
    checks: {
      flexure: [Mu, Mn],
      ductility: [Dp, 0.42 * Dt],
      shear: [Vu, Vn],
      "service-ii": [Math.max(bottom, top), 47.5],
      "live-load-deflection": [deflection, (12 * 72) / 800],
      fatigue: [range, resistance],
      "deck-pour": [pour, Math.min(50, Mnc / Sx)],
      // 150, 12, D/6 and 1.1 tw: 1.1 x 0.68 over 1.1 in is the worst of the four.
      proportions: [1.1 * 0.68, 1.1],
      // 0.033 L of steel, 0.040 L in all: 28.5 in of 36.2, 34.6 in of 45.2.
      depth: [12 * 0.033 * 72, 36.2],
      handling: [(12 * 72) / 85, 12],
    } satisfies Partial<Record<CheckId, readonly [number, number]>>,
    support: Math.min(yielding, crippling),
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
  same(ours.support.withoutStiffenersKip, hand.support, "web over the bearing");
  expect(ours.support.stiffenersNeeded).toBe(Vu > hand.support);
  expect(ours.studs?.perHalfSpan).toBe(hand.studs);
}

describe("Fenwick Lane", () => {
  const { n, one, more, shear } = interiorFactors();
  const ofExterior = exteriorFactors(more, shear);

  it("is on the shape the hand calculation is for", () => {
    const { areaIn2, depthIn, flangeWidthIn, flangeThicknessIn, webThicknessIn, kDesignIn } = shapeNamed("W36X170");
    const { inertiaXIn4, sectionModulusXIn3, plasticModulusXIn3, torsionJIn4 } = shapeNamed("W36X170");
    const { A, d, bf, tf, tw, k, Ix, Sx, Zx, J } = SHAPE;
    expect([areaIn2, depthIn, flangeWidthIn, flangeThicknessIn, webThicknessIn, kDesignIn]).toEqual([A, d, bf, tf, tw, k]);
    expect([inertiaXIn4, sectionModulusXIn3, plasticModulusXIn3, torsionJIn4]).toEqual([Ix, Sx, Zx, J]);
  });

  it("one lane, and the factors", () => {
    const { moment, shear: laneShear } = lane();
    const [inner, outer] = stringers.map(({ effects }) => effects);
    same(inner.liveMomentPerLaneKipFt, moment, "moment of a lane");
    same(inner.liveShearPerLaneKip, laneShear, "shear of a lane");
    expect(more).toBeGreaterThan(one);
    same(inner.distributionMoment, more, "interior moment");
    same(inner.distributionShear, shear, "interior shear");
    same(outer.distributionMoment, ofExterior.moment, "exterior moment");
    same(outer.distributionShear, ofExterior.shear, "exterior shear");
  });

  it("interior stringer", () => {
    compare(stringers[0], stringer(9.5, more, shear, one / 1.2, n));
  });

  it("exterior stringer, tributary width 4.75 + 3.75 ft", () => {
    compare(stringers[1], stringer(8.5, ofExterior.moment, ofExterior.shear, ofExterior.fatigue, n));
  });
});
