import type { LfdFatigueDetail } from "../../bridge/bridge.js";
import type { Layout } from "../../bridge/layouts.js";
import { DIAPHRAGMS_AT_MOST_FT } from "../../bridge/resolve.js";
import type { Steel } from "../../bridge/yield-stress.js";
import type { Shape } from "../../catalogue/shape.js";
import { renamed } from "../../formula.js";
import { constructionLoad, stage1Klf } from "../../loads/dead-load.js";
import { IN_PER_FT, STEEL_MODULUS_KSI } from "../../units.js";
import { bearingLengthNeededIn } from "../bearing.js";
import type { AssessmentRecorder, Design, Effects, Position } from "../contract.js";
import * as moments from "../dead-moments.js";
import { recordGiven, recordLaneEffects } from "../record-given.js";
import { StringerAssessor } from "../stringer-assessor.js";
import { leastDeckThickness, leastFlangeWidth } from "./advisories.js";
import { allowedDeflection, sharedDeflection, stringerDeflection } from "./deflection.js";
import { laneReduction } from "./distribution.js";
import { allowedRanges, type FatigueCase, fatigueCase, fatigueMoment, fatigueRange } from "./fatigue.js";
import {
  flangeSlenderness,
  flangeStress,
  NONCOMPACT_FLANGE_LIMIT,
  NONCOMPACT_WEB_LIMIT,
  partiallyBraced,
  webDepth,
  webSlenderness,
} from "./flexure.js";
import * as factors from "./load-factors.js";
import { pourMoment } from "./pour.js";
import { shearCapacityKip, withoutBearingStiffeners } from "./shear.js";
import { FATIGUE_VEHICLE, type LfdLayout, lfdLayout, type StringerLoads, stringerLoads } from "./stringer-loads.js";

/** Loads and moments of one stringer with one shape. One object is used again and again. */
export interface LfdEffects {
  w1: number;
  M1: number;
  M2: number;
  Mw: number;
  MD: number;
  VD: number;
  ML: number;
  VL: number;
  /** Factored moment and shear, the greater of Group I and, for light vehicles, Group IA. */
  Mu: number;
  Vu: number;
  /** Live part of the factored moment before the common 1.3: 1.67 or 2.20 times the live moment. */
  factoredLive: number;
  /** Live part of overload: 5/3 or 2.20 times the live moment. */
  overloadLive: number;
}

/** What load factor design does for noncomposite and composite stringers alike. */
export abstract class LfdStringers extends StringerAssessor {
  protected readonly fixed: LfdLayout;
  protected readonly design: Design;
  protected readonly stringers: readonly StringerLoads[];
  protected readonly effects: LfdEffects = {
    w1: 0,
    M1: 0,
    M2: 0,
    Mw: 0,
    MD: 0,
    VD: 0,
    ML: 0,
    VL: 0,
    Mu: 0,
    Vu: 0,
    factoredLive: 0,
    overloadLive: 0,
  };
  /** Distance of the diaphragms, in. */
  protected readonly diaphragmsIn: number;
  readonly #fatigue: FatigueCase;
  /** Sum of the moment factors of all stringers, wheel lines. */
  readonly #factorSum: number;

  constructor(design: Design, layout: Layout) {
    const { bridge } = design;
    super(design, layout);
    this.design = design;
    this.fixed = lfdLayout(design, layout);
    this.stringers = this.positions.map((position) => stringerLoads(this.fixed, position, null));
    const factorOf = (position: Position): number => this.stringers.find((one) => one.position === position)?.factors.moment.factor ?? 0;
    this.#factorSum = ((layout.count ?? 0) - 2) * factorOf("interior") + 2 * factorOf("exterior");
    this.diaphragmsIn = bridge.bracing.diaphragmSpacingFt * IN_PER_FT;
    this.#fatigue = fatigueCase(bridge.liveLoad.adtt, allowedRanges(bridge.liveLoad.fatigueDetail as LfdFatigueDetail, layout.count));
  }

  /** Writes down all that stands before the shape comes in. */
  protected recordBefore(index: number, steel: Steel, recorder: AssessmentRecorder): void {
    const stringer = this.stringers[index];
    recorder.stringer(stringer.position);
    recordGiven(this.design, this.layout, this.fixed.place.curbInsideFt, steel, recorder);
    recordLaneEffects(this.design, this.fixed.impact, recorder);
    recorder.value("P0", stringer.live.overSupportKip, "kip", "load over the support in the worst place for this stringer");
    recorder.value("Vr", stringer.live.othersKip, "kip", "end shear of the rest of the load");
    stringerLoads(this.fixed, stringer.position, recorder);
    recorder.note("distribution", stringer.factors.moment.rule, stringer.factors.endShear.rule);
  }

  /** Dead, live and factored effects of a stringer, into `effects`. Source: AASHTO Standard Specifications, 17th ed., Table 3.22.1A. */
  protected workOutEffects(
    { dead, live, oneLane, factors: share }: StringerLoads,
    shape: Shape,
    recorder: AssessmentRecorder | null,
  ): void {
    const { bridge, live: lane, vehicle } = this.design;
    const L = bridge.spanFt;
    const I = this.fixed.impact;
    const out = this.effects;
    recorder?.topic("effects");
    out.w1 = stage1Klf(bridge, dead, shape, recorder);
    const { stage2Klf: w2, wearingKlf: ww } = dead;
    out.M1 = moments.momentStage1.of(out.w1, L);
    recorder?.step(moments.momentStage1, out.M1, out.w1, L);
    out.M2 = moments.momentStage2.of(w2, L);
    recorder?.step(moments.momentStage2, out.M2, w2, L);
    out.Mw = moments.momentWearing.of(ww, L);
    recorder?.step(moments.momentWearing, out.Mw, ww, L);
    out.MD = factors.deadMoment.of(out.M1, out.M2, out.Mw);
    recorder?.step(factors.deadMoment, out.MD, out.M1, out.M2, out.Mw);
    out.VD = moments.deadShear.of(out.w1, w2, ww, L);
    recorder?.step(moments.deadShear, out.VD, out.w1, w2, ww, L);
    out.ML = live.momentKipFt;
    recorder?.step(factors.liveMoment, out.ML, lane.momentKipFt, share.moment.factor, I);
    out.VL = live.shearKip;
    recorder?.step(factors.liveShear, out.VL, live.overSupportKip, share.endShear.factor, live.othersKip, share.moment.factor, I);
    out.Mu = factors.factoredMoment.of(out.MD, out.ML);
    recorder?.step(factors.factoredMoment, out.Mu, out.MD, out.ML);
    out.Vu = factors.factoredShear.of(out.VD, out.VL);
    recorder?.step(factors.factoredShear, out.Vu, out.VD, out.VL);
    out.factoredLive = factors.GROUP_I_LIVE * out.ML;
    out.overloadLive = factors.OVERLOAD_LIVE * out.ML;
    if (!vehicle.lighterThanH20) return;
    const ML1 = oneLane.momentKipFt;
    const VL1 = oneLane.shearKip;
    const MuIA = factors.factoredMomentIA.of(out.MD, ML1);
    const VuIA = factors.factoredShearIA.of(out.VD, VL1);
    if (recorder !== null) {
      recorder.step(renamed(factors.liveMoment, "ML1", { g: "g1" }), ML1, lane.momentKipFt, share.oneLaneMoment.factor, I);
      const { overSupportKip: P0, othersKip: Vr } = oneLane;
      recorder.step(
        renamed(factors.liveShear, "VL1", { g: "g1", gv: "gv1", P0: "P01", Vr: "Vr1" }),
        VL1,
        P0,
        share.oneLaneEndShear.factor,
        Vr,
        share.oneLaneMoment.factor,
        I,
      );
      recorder.step(factors.factoredMomentIA, MuIA, out.MD, ML1);
      recorder.step(factors.factoredShearIA, VuIA, out.VD, VL1);
    }
    out.Mu = Math.max(out.Mu, MuIA);
    out.Vu = Math.max(out.Vu, VuIA);
    out.factoredLive = Math.max(out.factoredLive, factors.GROUP_IA_LIVE * ML1);
    out.overloadLive = Math.max(out.overloadLive, factors.GROUP_IA_LIVE * ML1);
    recorder?.value("Mu", out.Mu, "kip-ft", "the greater of Group I and Group IA");
    recorder?.value("Vu", out.Vu, "kip", "the greater of Group I and Group IA");
  }

  /** Web shear and whether bearing stiffeners are needed. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.8, 10.33.2. */
  protected checkShear(index: number, { shape, fyKsi }: Steel, recorder: AssessmentRecorder | null): void {
    recorder?.topic("shear");
    const D = webDepth.of(shape.depthIn, shape.flangeThicknessIn);
    recorder?.step(webDepth, D, shape.depthIn, shape.flangeThicknessIn);
    const Vcap = shearCapacityKip(fyKsi, D, shape.webThicknessIn, recorder);
    this.check(index, "shear", this.effects.Vu, Vcap, "kip", "10.48.8", recorder);
    const Vbs = withoutBearingStiffeners.of(Vcap);
    recorder?.step(withoutBearingStiffeners, Vbs, Vcap);
    recorder?.support("10.33.2", this.effects.Vu, Vbs, bearingLengthNeededIn(shape, fyKsi, this.effects.Vu));
  }

  /**
   * Live-load deflection, in.
   *
   * @param inertiaIn4 of the section that carries the live load
   * Source: AASHTO Standard Specifications, 17th ed., Art. 10.6.
   */
  protected checkDeflection(index: number, inertiaIn4: number, recorder: AssessmentRecorder | null): number {
    const { bridge } = this.design;
    recorder?.topic("deflection");
    recorder?.value("Id", inertiaIn4, "in4", "moment of inertia for live load");
    const delta = this.#deflectionIn(this.stringers[index], inertiaIn4, recorder);
    const dall = allowedDeflection.of(bridge.spanFt, bridge.deflection.spanOver);
    recorder?.step(allowedDeflection, dall, bridge.spanFt, bridge.deflection.spanOver);
    this.check(index, "live-load-deflection", delta, dall, "in", "10.6.2", recorder);
    return delta;
  }

  #deflectionIn(stringer: StringerLoads, inertiaIn4: number, recorder: AssessmentRecorder | null): number {
    const { bridge, live } = this.design;
    const { count } = this.layout;
    const Y = live.midspanDeflectionKipFt3;
    const I = this.fixed.impact;
    if (count === null) {
      const g = stringer.factors.moment.factor;
      const delta = stringerDeflection.of(Y, g, I, STEEL_MODULUS_KSI, inertiaIn4);
      recorder?.step(stringerDeflection, delta, Y, g, I, STEEL_MODULUS_KSI, inertiaIn4);
      return delta;
    }
    const { lanes } = bridge.liveLoad;
    const m = laneReduction(lanes);
    const delta = sharedDeflection.of(lanes, m, Y, I, count, STEEL_MODULUS_KSI, inertiaIn4);
    recorder?.step(sharedDeflection, delta, lanes, m, Y, I, count, STEEL_MODULUS_KSI, inertiaIn4);
    return delta;
  }

  /**
   * Stress range of the fatigue truck at the extreme tension fibre.
   *
   * @param modulusIn3 section modulus there of the section that carries the live load
   * Source: AASHTO Standard Specifications, 17th ed., Art. 10.3.
   */
  protected checkFatigue(index: number, modulusIn3: number, recorder: AssessmentRecorder | null): void {
    const stringer = this.stringers[index];
    const { allowedKsi, oneLaneAllowedKsi, cycles } = this.#fatigue;
    const { fatigueTruckKipFt: MT, fatigueImpact } = this.fixed;
    recorder?.topic("fatigue");
    recorder?.value("MT", MT, "kip-ft", `${FATIGUE_VEHICLE} truck, absolute maximum`);
    recorder?.value("Sf", modulusIn3, "in3", "section modulus at the tension fibre for live load");
    const Mf = stringer.fatigueMomentKipFt;
    recorder?.step(fatigueMoment, Mf, MT, stringer.factors.moment.factor, fatigueImpact);
    const range = fatigueRange.of(Mf, modulusIn3);
    recorder?.step(fatigueRange, range, Mf, modulusIn3);
    recorder?.value("Fsr", allowedKsi, "ksi", `${this.design.bridge.liveLoad.fatigueDetail}, ${cycles} cycles`);
    if (oneLaneAllowedKsi === null) {
      this.check(index, "fatigue", range, allowedKsi, "ksi", "10.3", recorder);
      return;
    }
    const Mf1 = stringer.oneLaneFatigueMomentKipFt;
    const oneLaneRange = fatigueRange.of(Mf1, modulusIn3);
    if (recorder !== null) {
      recorder.step(renamed(fatigueMoment, "Mf1", { g: "g1" }), Mf1, MT, stringer.factors.oneLaneMoment.factor, fatigueImpact);
      recorder.step(renamed(fatigueRange, "fsr1", { Mf: "Mf1" }), oneLaneRange, Mf1, modulusIn3);
      recorder.value("Fsr1", oneLaneAllowedKsi, "ksi", "one lane loaded, over 2,000,000 cycles");
    }
    const oneLaneWorse = oneLaneRange / oneLaneAllowedKsi > range / allowedKsi;
    this.check(
      index,
      "fatigue",
      oneLaneWorse ? oneLaneRange : range,
      oneLaneWorse ? oneLaneAllowedKsi : allowedKsi,
      "ksi",
      "10.3",
      recorder,
    );
  }

  /** The bare shape under the wet deck, braced by diaphragms alone. Source: AASHTO Standard Specifications, 17th ed., Art. 10.61, 10.48.4. */
  protected checkPour(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { bridge } = this.design;
    if (bridge.deck.kind !== "concrete") return;
    const { tributaryFt } = this.stringers[index].dead;
    recorder?.topic("deck-pour");
    const wc = constructionLoad.of(bridge.pour.constructionPsf, tributaryFt);
    recorder?.step(constructionLoad, wc, bridge.pour.constructionPsf, tributaryFt);
    const moment = pourMoment.of(this.effects.w1, wc, bridge.spanFt);
    recorder?.step(pourMoment, moment, this.effects.w1, wc, bridge.spanFt);
    const lf = flangeSlenderness.of(shape.flangeWidthIn, shape.flangeThicknessIn);
    const lw = webSlenderness.of(webDepth.of(shape.depthIn, shape.flangeThicknessIn), shape.webThicknessIn);
    const Fcr = flangeStress.of(Fy, lf);
    recorder?.step(flangeStress, Fcr, Fy, lf);
    recorder?.value("Lb", this.diaphragmsIn, "in", "diaphragms alone brace the flange while the deck is wet");
    const sound = lf <= NONCOMPACT_FLANGE_LIMIT && lw <= NONCOMPACT_WEB_LIMIT;
    const capacity = partiallyBraced(shape, Fy, Fcr, lw, this.diaphragmsIn, recorder);
    this.check(index, "deck-pour", moment, sound ? capacity : 0, "kip-ft", "10.61", recorder);
  }

  /** Depth: each specification and action has its own rule. */
  protected abstract adviseDepth(index: number, shape: Shape, recorder: AssessmentRecorder | null): void;

  /** Advisories, which are reported and not required unless the bridge asks for it. */
  protected advise(index: number, shape: Shape, recorder: AssessmentRecorder | null): void {
    if (this.advisoriesOff) return;
    const { bridge } = this.design;
    const { spacingFt } = this.layout;
    recorder?.topic("advisories");
    this.adviseDepth(index, shape, recorder);
    const bmin = leastFlangeWidth.of(bridge.spanFt, bridge.pieceOverlapFt);
    recorder?.step(leastFlangeWidth, bmin, bridge.spanFt, bridge.pieceOverlapFt);
    this.check(index, "handling", bmin, shape.flangeWidthIn, "in", "common practice", recorder);
    this.check(index, "diaphragm-spacing", bridge.bracing.diaphragmSpacingFt, DIAPHRAGMS_AT_MOST_FT, "ft", "10.20.1", recorder);
    this.adviseLayout(index, bridge, shape, recorder);
    if (bridge.deck.kind === "concrete" && bridge.deck.thicknessIn !== null) {
      const tmin = leastDeckThickness.of(spacingFt);
      recorder?.step(leastDeckThickness, tmin, spacingFt);
      this.check(index, "deck-thickness", tmin, bridge.deck.thicknessIn, "in", "8.9.2", recorder);
    }
    if (this.layout.count !== null) {
      const { lanes } = bridge.liveLoad;
      const needed = 2 * lanes * laneReduction(lanes);
      this.check(index, "distribution-sum", needed, this.#factorSum, "wheel lines", "statics", recorder);
    }
  }

  /** Hands the effects of a stringer over; what only some sections have comes in `own`. */
  protected recordEffects(
    index: number,
    own: Pick<Effects, "requiredZIn3" | "requiredSIn3" | "effectiveWidthIn" | "plasticMomentKipFt" | "deflectionIn">,
    recorder: AssessmentRecorder,
  ): void {
    const { live: lane, vehicle } = this.design;
    const { dead, factors: share, oneLane } = this.stringers[index];
    const { w1, M1, M2, Mw, ML, VL, VD, Mu, Vu } = this.effects;
    const gveff = factors.effectiveShearFactor.of(VL, lane.shearKip, this.fixed.impact);
    recorder.effects({
      deadStage1Klf: w1,
      deadStage2Klf: dead.stage2Klf,
      deadWearingKlf: dead.wearingKlf,
      momentStage1KipFt: M1,
      momentStage2KipFt: M2,
      momentWearingKipFt: Mw,
      liveMomentPerLaneKipFt: lane.momentKipFt,
      liveMomentPerLaneIncludesImpact: lane.includesImpact,
      liveShearPerLaneKip: lane.shearKip,
      impact: this.fixed.impact,
      distributionMoment: share.moment.factor,
      distributionShear: gveff,
      distributionPer: "wheel line",
      distributionRule: share.moment.rule,
      liveMomentKipFt: ML,
      liveShearKip: VL,
      oneLaneLiveMomentKipFt: vehicle.lighterThanH20 ? oneLane.momentKipFt : null,
      oneLaneDistributionMoment: vehicle.lighterThanH20 ? share.oneLaneMoment.factor : null,
      deadShearKip: VD,
      factoredMomentKipFt: Mu,
      factoredShearKip: Vu,
      ...own,
    });
  }
}
