import type { LrfdFatigueDetail } from "../../bridge/bridge.js";
import type { Layout } from "../../bridge/layouts.js";
import type { Steel } from "../../bridge/yield-stress.js";
import type { Shape } from "../../catalogue/shape.js";
import { greatestMoment } from "../../loads/axle-train.js";
import { constructionLoad, type DeadLoad, deadLoadOf, stage1Klf } from "../../loads/dead-load.js";
import { IN_PER_FT, STEEL_MODULUS_KSI } from "../../units.js";
import { bearingLengthNeededIn, webAtBearingKip } from "../bearing.js";
import type { AssessmentRecorder, Design, Effects, Position } from "../contract.js";
import * as moments from "../dead-moments.js";
import { curbInsideFt, mostTrucks } from "../place.js";
import { recordGiven, recordLaneEffects } from "../record-given.js";
import { StringerAssessor } from "../stringer-assessor.js";
import { type LrfdPlace, type LrfdShare, lrfdFactors, lrfdShare, multiplePresence, newLrfdFactors } from "./distribution.js";
import { type LrfdFatigueCase, lrfdFatigueCase } from "./fatigue.js";
import {
  bareCapacity,
  FLANGE_PROPORTION,
  flangeSlenderness,
  newBareCapacity,
  WEB_PROPORTION,
  webDepth,
  webSlenderness,
} from "./flexure.js";
import * as rules from "./formulas.js";

const E = STEEL_MODULUS_KSI;
/** Fewest stringers for which the distribution formulas were made. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2b-1. */
const FEWEST_STRINGERS = 4;
/** The fatigue truck: the design truck with its rear axles 30 ft apart. Source: AASHTO LRFD, 9th ed., Art. 3.6.1.4.1. */
const FATIGUE_TRUCK = { name: "fatigue truck", axlesKip: [8, 32, 32], spacingsFt: [14, 30] };

/** Everything about one stringer that its shape does not change. */
interface LrfdStringer {
  readonly position: Position;
  readonly dead: DeadLoad;
  readonly share: LrfdShare;
  readonly constructionKlf: number;
}

/** Loads and moments of one stringer with one shape. One object is used again and again. */
export interface LrfdEffects {
  w1: number;
  M1: number;
  M2: number;
  Mw: number;
  VD: number;
  ML: number;
  VL: number;
  Mu: number;
  Vu: number;
}

/** What load and resistance factor design does for noncomposite and composite stringers alike. */
export abstract class LrfdStringers extends StringerAssessor {
  protected readonly design: Design;
  protected readonly stringers: readonly LrfdStringer[];
  protected readonly effects: LrfdEffects = { w1: 0, M1: 0, M2: 0, Mw: 0, VD: 0, ML: 0, VL: 0, Mu: 0, Vu: 0 };
  /** Modular ratio for live load; 1 without a concrete deck, where it plays no part. */
  protected readonly n: number;
  /** Structural slab, in; 0 without a concrete deck. */
  protected readonly ts: number;
  protected readonly diaphragmsIn: number;
  readonly #factors = newLrfdFactors();
  readonly #fatigue: LrfdFatigueCase;
  readonly #fatigueTruckKipFt: number;
  readonly #pour = newBareCapacity();

  constructor(design: Design, layout: Layout) {
    const { bridge } = design;
    super(design, layout);
    this.design = design;
    const { deck } = bridge;
    const concrete = deck.kind === "concrete" && deck.fcKsi !== null && deck.thicknessIn !== null;
    this.n = concrete ? (deck.modularRatio ?? rules.modularRatio.of(E, rules.concreteModulus.of(deck.fcKsi as number))) : 1;
    this.ts = concrete ? (deck.thicknessIn as number) - deck.sacrificialIn : 0;
    this.diaphragmsIn = bridge.bracing.diaphragmSpacingFt * IN_PER_FT;
    this.#fatigue = lrfdFatigueCase(bridge.liveLoad.fatigueDetail as LrfdFatigueDetail, bridge.liveLoad.adtt);
    this.#fatigueTruckKipFt = greatestMoment(FATIGUE_TRUCK, bridge.spanFt, 0).momentKipFt;
    this.stringers = this.positions.map((position) => this.#stringer(position, null));
  }

  #stringer(position: Position, recorder: AssessmentRecorder | null): LrfdStringer {
    const { bridge } = this.design;
    const { count, spacingFt, overhangFt } = this.layout;
    const tributaryFt = position === "interior" ? spacingFt : spacingFt / 2 + (overhangFt ?? 0);
    recorder?.topic("dead-load");
    recorder?.value("T", tributaryFt, "ft", "tributary width");
    const dead = deadLoadOf(bridge, { tributaryFt, spacingFt, count }, recorder);
    recorder?.topic("distribution");
    const constructionKlf = constructionLoad.of(bridge.pour.constructionPsf, tributaryFt);
    return { position, dead, share: lrfdShare(bridge, this.#place(position), recorder), constructionKlf };
  }

  #place(position: Position): LrfdPlace {
    const { bridge } = this.design;
    const { lanes } = bridge.liveLoad;
    return {
      position,
      spacingFt: this.layout.spacingFt,
      spanFt: bridge.spanFt,
      slabIn: this.ts === 0 ? null : this.ts,
      haunchIn: bridge.deck.haunchSectionIn,
      count: this.layout.count,
      curbInsideFt: curbInsideFt(this.design.bridge, this.layout),
      roadwayFt: bridge.roadwayFt,
      lanes,
      mostTrucks: mostTrucks(bridge),
    };
  }

  /** Writes down all that stands before the shape comes in, then works out the effects, writing them down too. */
  protected workOutEffects(index: number, steel: Steel, recorder: AssessmentRecorder | null): void {
    const { bridge, live } = this.design;
    const { shape } = steel;
    const stringer = this.stringers[index];
    const out = this.effects;
    if (recorder !== null) this.#recordBefore(stringer, steel, recorder);
    const g = this.#factors;
    lrfdFactors(stringer.share, shape, this.n, g, recorder);
    recorder?.value("g", g.moment, "lanes", g.momentRule);
    recorder?.value("gv", g.shear, "lanes", g.shearRule);
    recorder?.value("gf", g.fatigue, "lanes", "one truck, no multiple presence");
    recorder?.note("distribution-lanes", g.momentRule, g.shearRule);
    recorder?.topic("effects");
    const L = bridge.spanFt;
    const { stage2Klf: w2, wearingKlf: ww } = stringer.dead;
    out.w1 = stage1Klf(bridge, stringer.dead, shape, recorder);
    out.M1 = moments.momentStage1.of(out.w1, L);
    recorder?.step(moments.momentStage1, out.M1, out.w1, L);
    out.M2 = moments.momentStage2.of(w2, L);
    recorder?.step(moments.momentStage2, out.M2, w2, L);
    out.Mw = moments.momentWearing.of(ww, L);
    recorder?.step(moments.momentWearing, out.Mw, ww, L);
    out.VD = moments.deadShear.of(out.w1, w2, ww, L);
    recorder?.step(moments.deadShear, out.VD, out.w1, w2, ww, L);
    out.ML = rules.liveMoment.of(live.momentKipFt, g.moment);
    recorder?.step(rules.liveMoment, out.ML, live.momentKipFt, g.moment);
    out.VL = rules.liveShear.of(live.shearKip, g.shear);
    recorder?.step(rules.liveShear, out.VL, live.shearKip, g.shear);
    out.Mu = rules.strengthMoment.of(out.M1, out.M2, out.Mw, out.ML);
    recorder?.step(rules.strengthMoment, out.Mu, out.M1, out.M2, out.Mw, out.ML);
    out.Vu = rules.strengthShear.of(out.w1, w2, ww, L, out.VL);
    recorder?.step(rules.strengthShear, out.Vu, out.w1, w2, ww, L, out.VL);
  }

  #recordBefore({ position }: LrfdStringer, steel: Steel, recorder: AssessmentRecorder): void {
    recorder.stringer(position);
    recordGiven(this.design, this.layout, curbInsideFt(this.design.bridge, this.layout), steel, recorder);
    recordLaneEffects(this.design, 0, recorder);
    this.#stringer(position, recorder);
    if (this.ts > 0) recorder.value("n", this.n, "-", "modular ratio");
  }

  /** Cross-section proportions, the worst of four, each as required over provided. Source: AASHTO LRFD, 9th ed., Art. 6.10.2. */
  protected checkProportions(index: number, shape: Shape, recorder: AssessmentRecorder | null): void {
    const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, webThicknessIn: tw } = shape;
    const D = webDepth.of(d, tf);
    const web = webSlenderness.of(D, tw) / WEB_PROPORTION;
    const flange = flangeSlenderness.of(bf, tf) / FLANGE_PROPORTION;
    const width = D / 6 / bf;
    const thickness = (1.1 * tw) / tf;
    const worst = Math.max(web, flange, width, thickness);
    if (worst === thickness) this.check(index, "proportions", 1.1 * tw, tf, "in", "6.10.2.2-3", recorder);
    else if (worst === width) this.check(index, "proportions", D / 6, bf, "in", "6.10.2.2-2", recorder);
    else if (worst === flange) this.check(index, "proportions", flange * FLANGE_PROPORTION, FLANGE_PROPORTION, "-", "6.10.2.2-1", recorder);
    else this.check(index, "proportions", web * WEB_PROPORTION, WEB_PROPORTION, "-", "6.10.2.1.1", recorder);
  }

  /** Web shear; web at the supports. Source: AASHTO LRFD, 9th ed., Art. 6.10.9, D6.5. */
  protected checkShear(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { Vu } = this.effects;
    recorder?.topic("shear");
    const D = webDepth.of(shape.depthIn, shape.flangeThicknessIn);
    recorder?.step(webDepth, D, shape.depthIn, shape.flangeThicknessIn);
    const Vn = this.#shearKip(D, shape.webThicknessIn, Fy, recorder);
    this.check(index, "shear", Vu, Vn, "kip", "6.10.9.2", recorder);
    if (recorder === null) return;
    recorder.topic("supports");
    const R = webAtBearingKip(shape, Fy, this.design.bridge.bearing.lengthIn, recorder);
    recorder.support("D6.5", Vu, R, bearingLengthNeededIn(shape, Fy, Vu));
  }

  #shearKip(D: number, tw: number, Fy: number, recorder: AssessmentRecorder | null): number {
    const q = rules.shearRoot.of(E, Fy);
    recorder?.step(rules.shearRoot, q, E, Fy);
    if (D / tw <= 1.12 * q) {
      const Vn = rules.shearYielding.of(Fy, D, tw);
      recorder?.step(rules.shearYielding, Vn, Fy, D, tw);
      return Vn;
    }
    const rule = D / tw <= 1.4 * q ? rules.shearInelastic : rules.shearElastic;
    const Vn = rule.of(Fy, D, tw, q);
    recorder?.step(rule, Vn, Fy, D, tw, q);
    return Vn;
  }

  /** Live-load deflection, in; of the section that carries the live load. Source: AASHTO LRFD, 9th ed., Art. 2.5.2.6.2. */
  protected checkDeflection(index: number, inertiaIn4: number, recorder: AssessmentRecorder | null): number {
    const { bridge, live } = this.design;
    const { count } = this.layout;
    const Y = live.midspanDeflectionKipFt3;
    recorder?.topic("deflection");
    recorder?.value("Id", inertiaIn4, "in4", "moment of inertia for live load");
    let delta: number;
    if (count === null) {
      const g = this.#factors.moment;
      delta = rules.stringerDeflection.of(g, Y, E, inertiaIn4);
      recorder?.step(rules.stringerDeflection, delta, g, Y, E, inertiaIn4);
    } else {
      const { lanes } = bridge.liveLoad;
      const m = multiplePresence(lanes);
      delta = rules.sharedDeflection.of(m, lanes, Y, count, E, inertiaIn4);
      recorder?.step(rules.sharedDeflection, delta, m, lanes, Y, count, E, inertiaIn4);
    }
    const dall = rules.allowedDeflection.of(bridge.spanFt, bridge.deflection.spanOver);
    recorder?.step(rules.allowedDeflection, dall, bridge.spanFt, bridge.deflection.spanOver);
    this.check(index, "live-load-deflection", delta, dall, "in", "2.5.2.6.2", recorder);
    return delta;
  }

  /** Fatigue at the bottom of the steel. Source: AASHTO LRFD, 9th ed., Art. 6.6.1.2. */
  protected checkFatigue(index: number, modulusIn3: number, recorder: AssessmentRecorder | null): void {
    const { gamma, resistanceKsi, limitState } = this.#fatigue;
    const gf = this.#factors.fatigue;
    const MT = this.#fatigueTruckKipFt;
    recorder?.topic("fatigue");
    recorder?.value("MT", MT, "kip-ft", "fatigue truck, 8-32-32 kip at 14 and 30 ft, absolute maximum");
    recorder?.value("Sf", modulusIn3, "in3", "section modulus at the bottom of the steel for live load");
    const range = rules.fatigueRange.of(gamma, MT, gf, modulusIn3);
    recorder?.step(rules.fatigueRange, range, gamma, MT, gf, modulusIn3);
    recorder?.value("Fr", resistanceKsi, "ksi", `${limitState}, detail ${this.design.bridge.liveLoad.fatigueDetail}`);
    recorder?.note("fatigue-state", limitState);
    this.check(index, "fatigue", range, resistanceKsi, "ksi", "6.6.1.2", recorder);
  }

  /** The bare shape under the wet deck, the worst of three conditions. Source: AASHTO LRFD, 9th ed., Art. 3.4.2.1, 6.10.3.2; flange buckling by 6.10.8.2.2, for A6 may stand in for lateral buckling alone. */
  protected checkPour(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { bridge } = this.design;
    if (bridge.deck.kind !== "concrete") return;
    const { w1 } = this.effects;
    const wc = this.stringers[index].constructionKlf;
    const Sx = shape.sectionModulusXIn3;
    const fl = bridge.pour.lateralBendingKsi;
    recorder?.topic("deck-pour");
    recorder?.step(constructionLoad, wc, bridge.pour.constructionPsf, this.stringers[index].dead.tributaryFt);
    recorder?.value("Lb", this.diaphragmsIn, "in", "diaphragms alone brace the flange while the deck is wet");
    const Ma = rules.pourMomentStrength.of(w1, wc, bridge.spanFt);
    recorder?.step(rules.pourMomentStrength, Ma, w1, wc, bridge.spanFt);
    const Mb = rules.pourMomentDead.of(w1, wc, bridge.spanFt);
    recorder?.step(rules.pourMomentDead, Mb, w1, wc, bridge.spanFt);
    const fbu = rules.pourStress.of(Ma, Mb, Sx);
    recorder?.step(rules.pourStress, fbu, Ma, Mb, Sx);
    const bare = this.#pour;
    bareCapacity(shape, Fy, this.diaphragmsIn, bare, recorder);
    const lf = bare.flangeSlenderness;
    const lpf = rules.pourFlangeLimit.of(E, Fy);
    recorder?.step(rules.pourFlangeLimit, lpf, E, Fy);
    const Fflb = rules.pourFlange.of(lf, lpf, E, Fy);
    recorder?.step(rules.pourFlange, Fflb, lf, lpf, E, Fy);
    const Fnc = rules.pourResistance.of(Fy, Fflb, bare.lateralKipIn, Sx);
    recorder?.step(rules.pourResistance, Fnc, Fy, Fflb, bare.lateralKipIn, Sx);
    let demand = rules.pourBuckling.of(fbu, fl);
    recorder?.step(rules.pourBuckling, demand, fbu, fl);
    let capacity = Fnc;
    const yielding = rules.pourYielding.of(fbu, fl);
    recorder?.step(rules.pourYielding, yielding, fbu, fl);
    if (yielding / Fy > demand / capacity) {
      demand = yielding;
      capacity = Fy;
    }
    const Fl = rules.lateralLimit.of(Fy);
    recorder?.step(rules.lateralLimit, Fl, Fy);
    if (fl / Fl > demand / capacity) {
      demand = fl;
      capacity = Fl;
    }
    if (fl === 0) recorder?.note("brackets-not-covered");
    this.check(index, "deck-pour", demand, capacity, "ksi", "6.10.3.2", recorder);
  }

  /** Advisories. Source: AASHTO LRFD, 9th ed., Art. 2.5.2.6.3, C6.10.2.2, 9.7.1.1. */
  protected advise(index: number, shape: Shape, recorder: AssessmentRecorder | null): void {
    if (this.advisoriesOff) return;
    const { bridge } = this.design;
    const L = bridge.spanFt;
    recorder?.topic("advisories");
    const composite = bridge.deck.composite;
    const whole = composite ? shape.depthIn + bridge.deck.haunchSectionIn + this.ts : shape.depthIn;
    const hmin = rules.leastWholeDepth.of(L);
    recorder?.step(rules.leastWholeDepth, hmin, L);
    const dmin = rules.leastSteelDepth.of(L);
    recorder?.step(rules.leastSteelDepth, dmin, L);
    const steelGoverns = dmin / shape.depthIn > hmin / whole;
    this.check(index, "depth", steelGoverns ? dmin : hmin, steelGoverns ? shape.depthIn : whole, "in", "2.5.2.6.3", recorder);
    const bmin = rules.leastFlangeWidth.of(L);
    recorder?.step(rules.leastFlangeWidth, bmin, L);
    this.check(index, "handling", bmin, shape.flangeWidthIn, "in", "C6.10.2.2", recorder);
    this.adviseLayout(index, bridge, shape, recorder);
    const { count } = this.layout;
    if (count !== null && count < FEWEST_STRINGERS)
      this.check(index, "layout", FEWEST_STRINGERS, count, "-", "4.6.2.2.2b, Nb >= 4", recorder);
    if (bridge.deck.kind === "concrete" && bridge.deck.thicknessIn !== null) {
      this.check(index, "deck-thickness", rules.LEAST_DECK_IN, bridge.deck.thicknessIn, "in", "9.7.1.1", recorder);
      if (this.ts < rules.LEAST_DECK_IN) recorder?.note("deck-without-sacrificial", this.ts, rules.LEAST_DECK_IN);
    }
  }

  /** Hands the effects of a stringer over; what only some sections have comes in `own`. */
  protected recordEffects(
    index: number,
    own: Pick<Effects, "requiredZIn3" | "requiredSIn3" | "effectiveWidthIn" | "plasticMomentKipFt" | "deflectionIn">,
    recorder: AssessmentRecorder,
  ): void {
    const { live } = this.design;
    const { dead } = this.stringers[index];
    const { w1, M1, M2, Mw, ML, VL, VD, Mu, Vu } = this.effects;
    recorder.effects({
      deadStage1Klf: w1,
      deadStage2Klf: dead.stage2Klf,
      deadWearingKlf: dead.wearingKlf,
      momentStage1KipFt: M1,
      momentStage2KipFt: M2,
      momentWearingKipFt: Mw,
      liveMomentPerLaneKipFt: live.momentKipFt,
      liveMomentPerLaneIncludesImpact: true,
      liveShearPerLaneKip: live.shearKip,
      impact: this.design.vehicle.dynamicAllowance ?? 0,
      distributionMoment: this.#factors.moment,
      distributionShear: this.#factors.shear,
      distributionPer: "lane",
      distributionRule: this.#factors.momentRule,
      liveMomentKipFt: ML,
      liveShearKip: VL,
      oneLaneLiveMomentKipFt: null,
      oneLaneDistributionMoment: null,
      deadShearKip: VD,
      factoredMomentKipFt: Mu,
      factoredShearKip: Vu,
      ...own,
    });
  }
}
