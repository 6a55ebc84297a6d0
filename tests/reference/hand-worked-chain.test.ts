// Three stringers of invented bridges worked out by hand, formula by formula, from the engineering basis in plain numbers.
//
// Source: AASHTO Standard Specifications for Highway Bridges, 17th ed. (2002), articles beside each line (rules from memory where the basis
// says so); statics; dimensions of the shapes as steel tables print them (three-digit rounding). The formulas stand here a second time on
// purpose: nothing of the program is called but the check that they are compared with. Tolerance: 1e-9, for both sides are exact.
import { describe, expect, it } from "vitest";
import { check } from "../../src/answers/check.js";
import type { CheckId, StringerAssessment } from "../../src/specs/contract.js";
import { preparedOf } from "../support/question.js";
import type { Values } from "../support/random-bridges.js";

const { ceil, max, min, sqrt } = Math;

interface Worked {
  /** Figures of the effects, by name. */
  readonly effects: Readonly<Record<string, number>>;
  /** Demand and capacity of every check, in the order of the calculation. */
  readonly checks: Readonly<Partial<Record<CheckId, readonly [number, number]>>>;
  /** Results of single steps, by symbol. */
  readonly steps: Readonly<Record<string, number>>;
  /** Shear at the bearing, and the shear up to which no stiffeners are needed. */
  readonly support: readonly [number, number];
}

function near(what: string, actual: number | undefined, expected: number): void {
  const close = actual !== undefined && Math.abs(actual - expected) <= 1e-9 * max(1e-3, Math.abs(expected));
  if (!close) expect.fail(`${what}: worked out ${expected}, the program has ${actual}`);
}

function expectWorked(stringer: StringerAssessment, worked: Worked): void {
  for (const [name, value] of Object.entries(worked.effects)) near(name, stringer.effects[name as "impact"], value);
  const results = stringer.lines.flatMap((line) => (line.type === "step" ? [[line.formula.symbol, line.result] as const] : []));
  for (const [symbol, value] of Object.entries(worked.steps)) near(symbol, results.find(([name]) => name === symbol)?.[1], value);
  expect(stringer.checks.map(({ id }) => id).sort()).toEqual(Object.keys(worked.checks).sort());
  for (const { id, demand, capacity, ratio, ok } of stringer.checks) {
    const [needed, there] = worked.checks[id] ?? [Number.NaN, Number.NaN];
    near(`${id} demand`, demand, needed);
    near(`${id} capacity`, capacity, there);
    near(`${id} ratio`, ratio, needed / there);
    expect(ok).toBe(needed <= there);
  }
  near("factored end shear", stringer.support.shearKip, worked.support[0]);
  near("shear without bearing stiffeners", stringer.support.withoutStiffenersKip, worked.support[1]);
}

function checked(values: Values, shape: string): { readonly interior: StringerAssessment; readonly exterior: StringerAssessment } {
  const { assessment } = check(preparedOf(values), shape);
  const [interior, exterior] = assessment.stringers;
  expect([interior.position, exterior.position]).toEqual(["interior", "exterior"]);
  return { interior, exterior };
}

/** Midspan deflection of 1 kip at a from the nearer support of a span L, times EI, ft3 (statics). */
const ofOneKip = (a: number, L: number): number => (a * (3 * L ** 2 - 4 * a ** 2)) / 48;

describe("farm lane over Marten Creek: five W30X148 at 6 ft, span 48 ft, diaphragms by default", () => {
  const bridge = {
    title: "Farm lane over Marten Creek",
    specification: "lfd",
    "deck.composite": false,
    spanFt: 48,
    "deck.outToOutFt": 28,
    "deck.thicknessIn": 8,
    "deck.haunchWeightIn": 1.5,
    "deck.formsPsf": 12,
    "barriers.baseFt": 1.25,
    "barriers.weightKlf": 0.35,
    wearingPsf: 30,
    "stringers.count": 5,
    "stringers.spacingFt": 6,
    "steel.grade": "50",
    "liveLoad.vehicle": "HS20-44",
    "liveLoad.adtt": 1200,
  };
  const [L, S, Nb, Fy] = [48, 6, 5, 50];
  // W30X148
  const [w, d, bf, tf, tw, Ix, Sx, J] = [148, 30.7, 10.5, 1.18, 0.65, 6680, 436, 14.5];
  const o = (28 - 4 * 6) / 2; // 2 ft
  const de = o - 1.25; // web to curb face, 0.75 ft
  const roadway = 28 - 2 * 1.25; // 25.5 ft
  const NL = 2; // INT(25.5/12), 3.6

  // 3.7, 3.8: the truck governs moment, shear and deflection at 48 ft; the lane loading has 0.08 x 48^2 + 4.5 x 48 = 400 kip-ft
  const MLL = 18 * L - 280 + 392 / L;
  const VLL = 72 - 672 / L;
  const I = min(0.3, 50 / (L + 125));
  // middle axle s ft past midspan where the sum's slope is zero: s^2 + (140 - 9L) s + 42L - 588 = 0
  const s = (9 * L - 140 - sqrt((9 * L - 140) ** 2 - 4 * (42 * L - 588))) / 2;
  const Y = 32 * ofOneKip(L / 2 - s, L) + 32 * ofOneKip(L / 2 - 14 + s, L) + 8 * ofOneKip(L / 2 - 14 - s, L);
  const others = (32 * (L - 14)) / L + (8 * (L - 28)) / L; // rear axle over the support

  // 10.48.4: unbraced 24 ft, half the span, for 48 ft take two bays of at most 25 ft
  const Lb = (12 * L) / ceil(L / 25);
  const D = d - 2 * tf;
  const lf = bf / (2 * tf);
  const lw = D / tw;
  const Iyc = (tf * bf ** 3) / 12;
  const Mr = min(Fy * Sx, ((91000 * Iyc) / Lb) * sqrt((0.772 * J) / Iyc + 9.87 * (d / Lb) ** 2)) / 12;
  const Fcr = min(Fy, (69.6 / lf) ** 2);
  const Mcap = min(Mr, (Fcr * Sx) / 12);
  const Vcap = 0.58 * Fy * D * tw; // D/tw = 43.6 below 190 sqrt(5)/sqrt(50) = 60.1, 10.48.8

  const worked = (T: number, g: number, gv: number, steps: Readonly<Record<string, number>>): Worked => {
    const wdeck = (8 / 12) * T * 0.15;
    const whaunch = ((bf * 1.5) / 144) * 0.15;
    const wforms = 0.012 * (T - bf / 12);
    const wsteel = (w * 1.05) / 1000;
    const w1 = wdeck + whaunch + wforms + wsteel;
    const w2 = (2 * 0.35) / Nb;
    const ww = (0.03 * roadway) / Nb;
    const MD = ((w1 + w2 + ww) * L ** 2) / 8;
    const VD = ((w1 + w2 + ww) * L) / 2;
    const ML = (MLL / 2) * g * (1 + I);
    const VL = ((32 * gv + others * g) / 2) * (1 + I);
    const Mu = 1.3 * (MD + 1.67 * ML);
    const Vu = 1.3 * (VD + 1.67 * VL);
    const Mo = MD + (5 / 3) * ML;
    const delta = (1728 * NL * 1.0 * Y * (1 + I)) / (Nb * 29000 * Ix);
    const fatigue = (12 * (MLL / 2) * g * (1 + I)) / Sx;
    const pour = (1.3 * (w1 + 0.02 * T) * L ** 2) / 8;
    return {
      effects: {
        deadStage1Klf: w1,
        deadStage2Klf: w2,
        deadWearingKlf: ww,
        momentStage1KipFt: (w1 * L ** 2) / 8,
        momentStage2KipFt: (w2 * L ** 2) / 8,
        momentWearingKipFt: (ww * L ** 2) / 8,
        liveMomentPerLaneKipFt: MLL,
        liveShearPerLaneKip: VLL,
        impact: I,
        distributionMoment: g,
        distributionShear: (2 * VL) / (VLL * (1 + I)),
        liveMomentKipFt: ML,
        liveShearKip: VL,
        deadShearKip: VD,
        factoredMomentKipFt: Mu,
        factoredShearKip: Vu,
        requiredZIn3: (12 * Mu) / Fy,
        requiredSIn3: (12 * Mo) / (0.8 * Fy),
        deflectionIn: delta,
      },
      steps: {
        wdeck,
        whaunch,
        wforms,
        wsteel,
        MD,
        D,
        lf,
        lw,
        Lpc: (1400 * 2.28) / Fy,
        Lpn: (20000 * bf * tf) / (Fy * d),
        Iyc,
        Mr,
        ...steps,
      },
      checks: {
        flexure: [Mu, Mcap],
        "flange-slenderness": [lf, 12],
        "web-slenderness": [lw, 150],
        bracing: [Lb, 12 * L], // beyond 20000 Af/(Fy d) = 161 in: partially braced, a capacity for any length up to the span
        "diaphragm-spacing": [Lb / 12, 25], // 10.20.1
        shear: [Vu, Vcap],
        overload: [(12 * Mo) / Sx, 0.8 * Fy],
        "live-load-deflection": [delta, (12 * L) / 800],
        fatigue: [fatigue, 21], // 1200 trucks a day: 500,000 cycles; stiffener weld
        "deck-pour": [pour, Mcap],
        depth: [(12 * L) / 25, d],
        handling: [(12 * (L + 2 * 0.75)) / 85, bf],
        "lane-step": [2, 36 - roadway],
        "deck-thickness": [(12 * (S + 10)) / 30, 8],
        "distribution-sum": [2 * NL * 1.0, 3 * (S / 5.5) + 2 * (S / 5.5)],
      },
      support: [Vu, 0.75 * Vcap],
    };
  };

  const { interior, exterior } = checked(bridge, "W30X148");

  // Lost without it: an engineer who repeats the calculation line by line, as a checker will, would not get the program's figures.
  it("the interior stringer, step by step", () => {
    // S/5.5; the axle at the support by the lever rule: a wheel over the stringer, the next truck's 4 ft off
    const g = S / 5.5;
    const gv = 1 + (S - 4) / S;
    expectWorked(interior, worked(S, g, gv, { g, g1: S / 7, gv, gv1: 1 }));
    expect(interior.effects.distributionRule).toBe("S/5.5");
  });

  // Lost without it: the fascia stringer, which the deck's edge and the curb load differently, would be checked with the wrong share.
  it("the exterior stringer, step by step", () => {
    // lever rule: one wheel 2 ft from the curb; not below S/5.5 on four stringers or more with S <= 6 (3.23.2.3.1.5)
    const lever = (S + de - 2) / S;
    const g = max(lever, S / 5.5);
    const { checks, ...rest } = worked(S / 2 + o, g, lever, { glever: lever, g1: lever, gmin: S / 5.5 });
    expectWorked(exterior, { ...rest, checks: { ...checks, overhang: [o, min(3, (1.3 * d) / 12)] } });
  });
});

describe("quarry lane over Heron Slough: four W40X149 of 65 ksi at 8 ft, span 66 ft, top flange held", () => {
  const bridge = {
    title: "Quarry lane over Heron Slough",
    specification: "lfd",
    "deck.composite": false,
    spanFt: 66,
    "deck.outToOutFt": 31,
    "deck.thicknessIn": 9,
    "deck.haunchWeightIn": 2,
    "barriers.baseFt": 1,
    "barriers.weightKlf": 0.42,
    wearingPsf: 25,
    "stringers.count": 4,
    "stringers.spacingFt": 8,
    "steel.fyKsi": 65,
    "bracing.topFlange": "held",
    "liveLoad.vehicle": "HS20-44",
  };
  const [L, S, Nb, Fy] = [66, 8, 4, 65];
  // W40X149
  const [w, d, bf, tf, tw, Ix, Sx, Zx, ry, J] = [149, 38.2, 11.8, 0.83, 0.63, 9800, 513, 598, 2.29, 9.36];
  const o = (31 - 3 * 8) / 2; // 3.5 ft
  const de = o - 1; // 2.5 ft
  const roadway = 31 - 2 * 1; // 29 ft
  const NL = 2;

  const MLL = 18 * L - 280 + 392 / L;
  const VLL = 72 - 672 / L;
  const I = min(0.3, 50 / (L + 125));
  const s = (9 * L - 140 - sqrt((9 * L - 140) ** 2 - 4 * (42 * L - 588))) / 2;
  const Y = 32 * ofOneKip(L / 2 - s, L) + 32 * ofOneKip(L / 2 - 14 + s, L) + 8 * ofOneKip(L / 2 - 14 - s, L);
  const others = (32 * (L - 14)) / L + (8 * (L - 28)) / L;

  // 10.48.1: compact, flange and web both beyond 75 % of their limits, so together too
  const D = d - 2 * tf;
  const lf = bf / (2 * tf);
  const lw = D / tw;
  const together = lw + 9.35 * lf;
  // 10.48.8: D/tw = 58 lies between 190 sqrt(5)/sqrt(65) = 52.7 and 237 sqrt(5)/sqrt(65) = 65.7
  const C = (190 * sqrt(5)) / sqrt(Fy) / lw;
  const Vcap = 0.58 * Fy * D * tw * C;
  // 10.61: while the deck is wet the diaphragms brace alone, at 66/3 = 22 ft
  const Lb = (12 * L) / ceil(L / 25);
  const Iyc = (tf * bf ** 3) / 12;
  const Mr = min(Fy * Sx, ((91000 * Iyc) / Lb) * sqrt((0.772 * J) / Iyc + 9.87 * (d / Lb) ** 2)) / 12;
  const wet = min(Mr, (min(Fy, (69.6 / lf) ** 2) * Sx) / 12);

  const lever = (S + de - 2) / S + (S + de - 8) / S; // both wheels of one truck, 2 and 8 ft from the curb
  const factorOf = { interior: S / 5.5, exterior: max(lever, S / (4 + 0.25 * S)) };

  const worked = (T: number, g: number, g1: number, gv: number, steps: Readonly<Record<string, number>>): Worked => {
    const w1 = (9 / 12) * T * 0.15 + ((bf * 2) / 144) * 0.15 + (w * 1.05) / 1000;
    const w2 = (2 * 0.42) / Nb;
    const ww = (0.025 * roadway) / Nb;
    const MD = ((w1 + w2 + ww) * L ** 2) / 8;
    const VD = ((w1 + w2 + ww) * L) / 2;
    const ML = (MLL / 2) * g * (1 + I);
    const VL = ((32 * gv + others * g) / 2) * (1 + I);
    const Mu = 1.3 * (MD + 1.67 * ML);
    const Vu = 1.3 * (VD + 1.67 * VL);
    const Mo = MD + (5 / 3) * ML;
    const delta = (1728 * NL * 1.0 * Y * (1 + I)) / (Nb * 29000 * Ix);
    // traffic not given: all lanes against 13 ksi (2,000,000), one lane against 12 ksi (over 2,000,000); the worse counts
    const all = (12 * (MLL / 2) * g * (1 + I)) / Sx;
    const one = (12 * (MLL / 2) * g1 * (1 + I)) / Sx;
    return {
      effects: {
        deadStage1Klf: w1,
        deadStage2Klf: w2,
        deadWearingKlf: ww,
        liveMomentPerLaneKipFt: MLL,
        liveShearPerLaneKip: VLL,
        impact: I,
        distributionMoment: g,
        distributionShear: (2 * VL) / (VLL * (1 + I)),
        liveMomentKipFt: ML,
        liveShearKip: VL,
        deadShearKip: VD,
        factoredMomentKipFt: Mu,
        factoredShearKip: Vu,
        requiredZIn3: (12 * Mu) / Fy,
        requiredSIn3: (12 * Mo) / (0.8 * Fy),
        deflectionIn: delta,
      },
      steps: { MD, lfp: 65 / sqrt(Fy), lwp: 608 / sqrt(Fy), lint: together, lintp: 1064 / sqrt(Fy), fsr: all, fsr1: one, Mr, ...steps },
      checks: {
        flexure: [Mu, (Fy * Zx) / 12],
        "flange-slenderness": [lf, 65 / sqrt(Fy)],
        "web-slenderness": [lw, 608 / sqrt(Fy)],
        "slenderness-interaction": [together, 1064 / sqrt(Fy)],
        bracing: [0, ((3600 - 2200) * ry) / Fy],
        "diaphragm-spacing": [Lb / 12, 25],
        shear: [Vu, Vcap],
        overload: [(12 * Mo) / Sx, 0.8 * Fy],
        "live-load-deflection": [delta, (12 * L) / 800],
        fatigue: one / 12 > all / 13 ? [one, 12] : [all, 13],
        "deck-pour": [(1.3 * (w1 + 0.02 * T) * L ** 2) / 8, wet],
        depth: [(12 * L) / 25, d],
        handling: [(12 * (L + 2 * 0.75)) / 85, bf],
        "lane-step": [2, 36 - roadway],
        "deck-thickness": [(12 * (S + 10)) / 30, 9],
        "distribution-sum": [2 * NL * 1.0, 2 * factorOf.interior + 2 * factorOf.exterior],
      },
      support: [Vu, 0.75 * Vcap],
    };
  };

  const { interior, exterior } = checked(bridge, "W40X149");

  // Lost without it: the worked figures below would belong to another rule than the one they are meant to show.
  it("the compact route is the one the figures ask for", () => {
    expect(lf).toBeGreaterThan((0.75 * 65) / sqrt(Fy));
    expect(lw).toBeGreaterThan((0.75 * 608) / sqrt(Fy));
    expect(together).toBeLessThan(1064 / sqrt(Fy));
  });

  // Lost without it: a compact shape would be given more, or less, than Fy Z over the length its flange is held.
  it("the interior stringer, step by step", () => {
    // end shear, two trucks: a wheel over the stringer, one 4 ft off on one side, one 6 ft off on the other
    const gv = 1 + (S - 4) / S + (S - 6) / S;
    expectWorked(interior, worked(S, factorOf.interior, S / 7, gv, { g: S / 5.5, g1: S / 7, gv, gv1: 1 + (S - 6) / S }));
  });

  // Lost without it: the crack that one heavy lane at the curb starts would be missed.
  it("the exterior stringer, step by step: the lever rule is above the floor, and one lane loaded governs fatigue", () => {
    const { checks, ...rest } = worked(S / 2 + o, factorOf.exterior, lever, lever, { glever: lever, gmin: 8 / 6, g1: lever });
    expect(factorOf.exterior).toBe(lever);
    expect(checks.fatigue?.[1]).toBe(12);
    expectWorked(exterior, { ...rest, checks: { ...checks, overhang: [o, min(3, (1.3 * d) / 12)] } });
  });
});

describe("sheep lane over Cold Spring Run: six W27X94 of 36 ksi at 4 ft under laminated timber, span 40 ft, H15-44", () => {
  const bridge = {
    title: "Sheep lane over Cold Spring Run",
    specification: "lfd",
    spanFt: 40,
    "deck.kind": "nail-laminated",
    "deck.outToOutFt": 22,
    "deck.thicknessIn": 6,
    "barriers.baseFt": 0.75,
    "barriers.weightKlf": 0.06,
    wearingPsf: 20,
    "stringers.count": 6,
    "stringers.spacingFt": 4,
    "steel.grade": "36",
    "bracing.diaphragmSpacingFt": 10,
    "liveLoad.vehicle": "H15-44",
    "liveLoad.adtt": 80,
  };
  const [L, S, Nb, Fy] = [40, 4, 6, 36];
  // W27X94
  const [w, d, bf, tf, tw, Ix, Sx, ry] = [94, 26.9, 10, 0.745, 0.49, 3270, 243, 2.12];
  const o = (22 - 5 * 4) / 2; // 1 ft
  const de = o - 0.75; // 0.25 ft
  const roadway = 22 - 2 * 0.75; // 20.5 ft
  const NL = 2; // 20 to 24 ft: two lanes of half the roadway

  // 24 and 6 kip at 14 ft: R = 30, 2.8 ft before the rear axle; R and the axle astride midspan. Lane: 0.06 x 40^2 + 3.375 x 40 = 231
  const MLL = (30 * (L / 2 - 1.4) ** 2) / L;
  // the lane loading governs the end shear: 0.48 x 20 + 19.5 = 29.1 against 24 + 6 x 26/40 = 27.9
  const VLL = 0.48 * (L / 2) + 19.5;
  const I = min(0.3, 50 / (L + 125)); // 0.303: at most 0.30
  // rear axle s ft past midspan: 3 s^2 + (28 - 5L) s + 14L - 196 = 0 (lane: 34,000 kip-ft3, less)
  const s = (5 * L - 28 - sqrt((5 * L - 28) ** 2 - 12 * (14 * L - 196))) / 6;
  const Y = 24 * ofOneKip(L / 2 - s, L) + 6 * ofOneKip(L / 2 - 14 + s, L);
  const MT = 18 * L - 280 + 392 / L; // fatigue: HS20 truck whatever the design vehicle, 10.3.1

  // 10.48.2: 120 in lies between 1400 ry/Fy = 82 in and 20000 Af/(Fy d) = 154 in
  const Lb = 120;
  const D = d - 2 * tf;
  const lf = bf / (2 * tf);
  const Fcr = min(Fy, (69.6 / lf) ** 2);
  const Vcap = 0.58 * Fy * D * tw;

  const lever = (S + de - 2) / S;
  const factorOf = { interior: S / 4.25, exterior: lever };

  const worked = (T: number, g: number, g1: number, gv: number, steps: Readonly<Record<string, number>>): Worked => {
    const w1 = (6 / 12) * T * 0.05 + (w * 1.05) / 1000;
    const w2 = (2 * 0.06) / Nb;
    const ww = (0.02 * roadway) / Nb;
    const MD = ((w1 + w2 + ww) * L ** 2) / 8;
    const VD = ((w1 + w2 + ww) * L) / 2;
    const ML = (MLL / 2) * g * (1 + I);
    const ML1 = (MLL / 2) * g1 * (1 + I);
    // the worse of the truck with its rear axle over the support, and the lane loading with its 19.5 kip there
    const endShear = (over: number, rest: number): number =>
      (max(24 * over + 6 * ((L - 14) / L) * rest, 19.5 * over + 0.48 * (L / 2) * rest) / 2) * (1 + I);
    const VL = endShear(gv, g);
    const VL1 = endShear(gv, g1);
    // 3.22: Group I with all lanes, Group IA with one lane, for a vehicle lighter than H20
    const Mu = max(1.3 * (MD + 1.67 * ML), 1.3 * (MD + 2.2 * ML1));
    const Vu = max(1.3 * (VD + 1.67 * VL), 1.3 * (VD + 2.2 * VL1));
    const Mo = max(MD + (5 / 3) * ML, MD + 2.2 * ML1);
    const delta = (1728 * NL * 1.0 * Y * (1 + I)) / (Nb * 29000 * Ix);
    const fatigue = (12 * (MT / 2) * g * (1 + I)) / Sx;
    return {
      effects: {
        deadStage1Klf: w1,
        deadStage2Klf: w2,
        deadWearingKlf: ww,
        liveMomentPerLaneKipFt: MLL,
        liveShearPerLaneKip: VLL,
        impact: I,
        distributionMoment: g,
        distributionShear: (2 * VL) / (VLL * (1 + I)),
        liveMomentKipFt: ML,
        liveShearKip: VL,
        oneLaneLiveMomentKipFt: ML1,
        oneLaneDistributionMoment: g1,
        deadShearKip: VD,
        factoredMomentKipFt: Mu,
        factoredShearKip: Vu,
        requiredZIn3: (12 * Mu) / Fy,
        requiredSIn3: (12 * Mo) / (0.8 * Fy),
        deflectionIn: delta,
      },
      steps: {
        MD,
        ML1,
        VL1,
        MuIA: 1.3 * (MD + 2.2 * ML1),
        VuIA: 1.3 * (VD + 2.2 * VL1),
        Mo,
        Lpc: (1400 * ry) / Fy,
        Mf: (MT / 2) * g * (1 + I),
        ...steps,
      },
      checks: {
        flexure: [Mu, (Fcr * Sx) / 12],
        "flange-slenderness": [lf, 12],
        "web-slenderness": [D / tw, 150],
        bracing: [Lb, (20000 * bf * tf) / (Fy * d)],
        "diaphragm-spacing": [Lb / 12, 25],
        shear: [Vu, Vcap],
        overload: [(12 * Mo) / Sx, 0.8 * Fy],
        "live-load-deflection": [delta, (12 * L) / 800],
        fatigue: [fatigue, 35.5], // 80 trucks a day: 100,000 cycles
        depth: [(12 * L) / 25, d],
        handling: [(12 * (L + 2 * 0.75)) / 85, bf],
        "lane-step": [2, 36 - roadway],
        "distribution-sum": [2 * NL * 1.0, 4 * factorOf.interior + 2 * factorOf.exterior],
      },
      support: [Vu, 0.75 * Vcap],
    };
  };

  const { interior, exterior } = checked(bridge, "W27X94");

  // Lost without it: a lane posted for light trucks would be designed for all lanes at 1.67 and miss one lane at 2.20.
  it("the interior stringer, step by step: Group IA governs", () => {
    // lever rule at 4 ft: one wheel over the stringer, the next truck's over its neighbour
    const [g, g1] = [factorOf.interior, S / 5];
    expect(2.2 * g1).toBeGreaterThan(1.67 * g);
    expectWorked(interior, worked(S, g, g1, 1, { g, g1, gv: 1, gv1: 1 }));
  });

  // Lost without it: timber decks would be given the concrete deck's least share, and lanes that need little steel too much of it.
  it("the exterior stringer, step by step: no floor under timber", () => {
    const { checks, ...rest } = worked(S / 2 + o, lever, lever, lever, { glever: lever, g1: lever });
    expectWorked(exterior, { ...rest, checks: { ...checks, overhang: [o, min(3, (1.3 * d) / 12)] } });
  });
});
