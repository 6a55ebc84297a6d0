import type { Bridge } from "../bridge/bridge.js";
import { deckUnitWeightPcf } from "../bridge/resolve.js";
import type { Shape } from "../catalogue/shape.js";
import { formula, type Recorder } from "../formula.js";
import { IN2_PER_FT2, LB_PER_KIP, UNIT_WEIGHT_PCF } from "../units.js";

const CONCRETE_KCF = UNIT_WEIGHT_PCF.concrete / LB_PER_KIP;

/** Weight of a deck of solid material on one stringer. Source: AASHTO Standard Specifications, 17th ed., Art. 3.3.6; statics. */
export const deckByThickness = formula(
  "wdeck",
  "t / 12 * T * gamma / 1000",
  "kip/ft",
  "3.3.6; LRFD 3.5.1",
  ["t", "T", "gamma"],
  (t: number, T: number, gamma: number) => ((t / 12) * T * gamma) / 1000,
);
/** Weight of a deck given by area on one stringer. Source: statics. */
export const deckByArea = formula("wdeck", "p * T / 1000", "kip/ft", "statics", ["p", "T"], (p: number, T: number) => (p * T) / 1000);
/** Weight of the haunch over the flange. Source: AASHTO Standard Specifications, 17th ed., Art. 3.3.6. */
export const haunchWeight = formula(
  "whaunch",
  "bf * thw / 144 * 0.150",
  "kip/ft",
  "3.3.6; LRFD 3.5.1",
  ["bf", "thw"],
  (bf: number, thw: number) => ((bf * thw) / IN2_PER_FT2) * CONCRETE_KCF,
);
/** Weight of stay-in-place forms between the flanges. Source: statics. */
export const formsWeight = formula(
  "wforms",
  "pf * (T - bf / 12) / 1000",
  "kip/ft",
  "statics",
  ["pf", "T", "bf"],
  (pf: number, T: number, bf: number) => (pf * (T - bf / 12)) / 1000,
);
/** The shape and its miscellaneous steel. Source: common practice for the fraction. */
export const steelWeight = formula(
  "wsteel",
  "w * (1 + c) / 1000",
  "kip/ft",
  "statics",
  ["w", "c"],
  (w: number, c: number) => (w * (1 + c)) / 1000,
);
/** All of stage 1. Source: statics. */
export const stage1Weight = formula(
  "w1",
  "wdeck + whaunch + wforms + wsteel",
  "kip/ft",
  "statics",
  ["wdeck", "whaunch", "wforms", "wsteel"],
  (wdeck: number, whaunch: number, wforms: number, wsteel: number) => wdeck + whaunch + wforms + wsteel,
);
/** Stage 1 with everything but the steel given by the user. Source: statics. */
export const stage1Given = formula(
  "w1",
  "wgiven + wsteel",
  "kip/ft",
  "statics",
  ["wgiven", "wsteel"],
  (wgiven: number, wsteel: number) => wgiven + wsteel,
);
/** Both barriers shared by all stringers. Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.2.3.1.1. */
export const barrierShare = formula(
  "w2",
  "2 * wb / Nb",
  "kip/ft",
  "3.23.2.3.1.1; LRFD 4.6.2.2.1",
  ["wb", "Nb"],
  (wb: number, Nb: number) => (2 * wb) / Nb,
);
/** A quarter of both barriers, for one interior stringer of unknown neighbours. Source: common practice. */
export const barrierQuarter = formula("w2", "2 * wb / 4", "kip/ft", "common practice", ["wb"], (wb: number) => (2 * wb) / 4);
/** Wearing surface shared by all stringers. Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.2.3.1.1. */
export const wearingShare = formula(
  "ww",
  "pw * wr / Nb / 1000",
  "kip/ft",
  "3.23.2.3.1.1; LRFD 4.6.2.2.1",
  ["pw", "wr", "Nb"],
  (pw: number, wr: number, Nb: number) => (pw * wr) / Nb / 1000,
);
/** Wearing surface on the spacing, for one interior stringer. Source: statics. */
export const wearingOnSpacing = formula(
  "ww",
  "pw * S / 1000",
  "kip/ft",
  "statics",
  ["pw", "S"],
  (pw: number, S: number) => (pw * S) / 1000,
);

/** Construction load on the tributary width. Source: common practice (the load); statics. */
export const constructionLoad = formula("wc", "q * T / 1000", "kip/ft", "statics", ["q", "T"], (q: number, T: number) => (q * T) / 1000);

/** Dead load on one stringer that does not hang on its shape. */
export interface DeadLoad {
  /** Width of deck the stringer carries, ft. */
  readonly tributaryFt: number;
  /** Deck slab alone, kip/ft; 0 when stage 1 is given. */
  readonly deckKlf: number;
  /** Everything of stage 1 but the steel, as given by the user, kip/ft; null for the take-down. */
  readonly stage1GivenKlf: number | null;
  readonly stage2Klf: number;
  readonly wearingKlf: number;
}

/** What the take-down needs of a layout. */
export interface Tributary {
  readonly tributaryFt: number;
  readonly spacingFt: number;
  /** Null for one interior stringer of unknown neighbours. */
  readonly count: number | null;
}

/**
 * Take-down of the dead load that does not hang on the shape.
 *
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.3, 3.23.2.3.1.1.
 */
export function deadLoadOf(bridge: Bridge, place: Tributary, recorder: Recorder | null): DeadLoad {
  const { tributaryFt, spacingFt, count } = place;
  const given = bridge.deadLoad;
  return {
    tributaryFt,
    deckKlf: given.stage1Klf === null ? deckWeight(bridge, tributaryFt, recorder) : 0,
    stage1GivenKlf: given.stage1Klf,
    stage2Klf: given.stage2Klf ?? stage2(),
    wearingKlf: given.wearingKlf ?? wearing(),
  };

  function stage2(): number {
    const wb = bridge.barriers.weightKlf;
    if (count === null) {
      const share = barrierQuarter.of(wb);
      recorder?.step(barrierQuarter, share, wb);
      return share;
    }
    const share = barrierShare.of(wb, count);
    recorder?.step(barrierShare, share, wb, count);
    return share;
  }

  function wearing(): number {
    if (count === null || bridge.roadwayFt === null) {
      const share = wearingOnSpacing.of(bridge.wearingPsf, spacingFt);
      recorder?.step(wearingOnSpacing, share, bridge.wearingPsf, spacingFt);
      return share;
    }
    const share = wearingShare.of(bridge.wearingPsf, bridge.roadwayFt, count);
    recorder?.step(wearingShare, share, bridge.wearingPsf, bridge.roadwayFt, count);
    return share;
  }
}

function deckWeight(bridge: Bridge, T: number, recorder: Recorder | null): number {
  const { deckPsf, thicknessIn, kind } = bridge.deck;
  const gamma = deckUnitWeightPcf(kind);
  if (deckPsf !== null) {
    const weight = deckByArea.of(deckPsf, T);
    recorder?.step(deckByArea, weight, deckPsf, T);
    return weight;
  }
  if (thicknessIn === null || gamma === null) throw new RangeError("a deck without weight was let through");
  const weight = deckByThickness.of(thicknessIn, T, gamma);
  recorder?.step(deckByThickness, weight, thicknessIn, T, gamma);
  return weight;
}

/**
 * Stage 1 dead load on one stringer, its own steel included, kip/ft.
 *
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.3.
 */
export function stage1Klf(bridge: Bridge, dead: DeadLoad, shape: Shape, recorder: Recorder | null): number {
  const wsteel = steelWeight.of(shape.weightPlf, bridge.steel.miscFraction);
  recorder?.step(steelWeight, wsteel, shape.weightPlf, bridge.steel.miscFraction);
  if (dead.stage1GivenKlf !== null) {
    const w1 = stage1Given.of(dead.stage1GivenKlf, wsteel);
    recorder?.step(stage1Given, w1, dead.stage1GivenKlf, wsteel);
    return w1;
  }
  const whaunch = haunchWeight.of(shape.flangeWidthIn, bridge.deck.haunchWeightIn);
  recorder?.step(haunchWeight, whaunch, shape.flangeWidthIn, bridge.deck.haunchWeightIn);
  const wforms = formsWeight.of(bridge.deck.formsPsf, dead.tributaryFt, shape.flangeWidthIn);
  recorder?.step(formsWeight, wforms, bridge.deck.formsPsf, dead.tributaryFt, shape.flangeWidthIn);
  const w1 = stage1Weight.of(dead.deckKlf, whaunch, wforms, wsteel);
  recorder?.step(stage1Weight, w1, dead.deckKlf, whaunch, wforms, wsteel);
  return w1;
}
