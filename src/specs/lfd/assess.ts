import type { Use } from "../../bridge/bridge.js";
import { nextLaneStepFt } from "../../bridge/lanes.js";
import type { Layout } from "../../bridge/layouts.js";
import type { Steel } from "../../bridge/yield-stress.js";
import type { Shape } from "../../catalogue/shape.js";
import { greatestMoment } from "../../loads/axle-train.js";
import { type DeadLoad, deadLoadOf, stage1Klf } from "../../loads/dead-load.js";
import { impactFraction, laneMoment, momentUnderAxle } from "../../loads/formulas.js";
import { vehicleNamed } from "../../loads/vehicles.js";
import { IN_PER_FT, STEEL_MODULUS_KSI } from "../../units.js";
import {
  ABSENT,
  type AssessmentRecorder,
  type Assessor,
  type CheckId,
  type CheckKind,
  type Design,
  type Position,
  type Specification,
} from "../contract.js";
import { greatestOverhang, leastDeckThickness, leastDepth, leastFlangeWidth } from "./advisories.js";
import { allowedDeflection, sharedDeflection, stringerDeflection } from "./deflection.js";
import { type DistributionPlace, exteriorFactors, interiorFactors, laneReduction, type StringerFactors } from "./distribution.js";
import { allowedRanges, type FatigueCase, fatigueCase, fatigueMoment, fatigueRange } from "./fatigue.js";
import {
  type FlexureCapacity,
  flangeStress,
  flexureCapacity,
  newFlexureCapacity,
  partiallyBraced,
  requiredZ,
  webDepth,
} from "./flexure.js";
import * as factors from "./load-factors.js";
import { constructionLoad, pourMoment } from "./pour.js";
import { shearCapacityKip, withoutBearingStiffeners } from "./shear.js";

/** Trucks side by side tried for one interior stringer when nobody said how wide the bridge is. */
const TRUCKS_ON_UNKNOWN_WIDTH = 4;
/** Greatest distance of diaphragms, ft. Source: AASHTO Standard Specifications, 17th ed., Art. 10.20.1. */
const DIAPHRAGMS_AT_MOST_FT = 25;
/** Roadways less than this below the next lane count are pointed out, ft. Source: common practice. */
const LANE_STEP_MARGIN_FT = 2;
/** The fatigue truck. Source: AASHTO Standard Specifications, 17th ed., Art. 10.3.1, 3.7.6. */
const FATIGUE_VEHICLE = "HS20-44";

/** Places of the checks of one stringer, in the order in which they are shown. */
const CHECKS = [
  "flexure",
  "flange-slenderness",
  "web-slenderness",
  "slenderness-interaction",
  "bracing",
  "bracing-advisory",
  "shear",
  "overload",
  "live-load-deflection",
  "fatigue",
  "deck-pour",
  "depth",
  "handling",
  "overhang",
  "layout",
  "lane-step",
  "deck-thickness",
  "distribution-sum",
] as const;
type Slot = (typeof CHECKS)[number];
const PLACE = Object.fromEntries(CHECKS.map((slot, place) => [slot, place])) as Readonly<Record<Slot, number>>;

const KIND: Readonly<Record<Slot, CheckKind>> = {
  flexure: "demand",
  "flange-slenderness": "limit",
  "web-slenderness": "limit",
  "slenderness-interaction": "limit",
  bracing: "limit",
  "bracing-advisory": "advisory",
  shear: "demand",
  overload: "demand",
  "live-load-deflection": "demand",
  fatigue: "demand",
  "deck-pour": "demand",
  depth: "advisory",
  handling: "advisory",
  overhang: "advisory",
  layout: "advisory",
  "lane-step": "advisory",
  "deck-thickness": "advisory",
  "distribution-sum": "advisory",
};

/** Everything about one stringer that its shape does not change. */
interface StringerLoads {
  readonly position: Position;
  readonly dead: DeadLoad;
  readonly factors: StringerFactors;
  readonly constructionKlf: number;
  readonly liveMomentKipFt: number;
  readonly liveShearKip: number;
  readonly shearAxleKip: number;
  readonly shearOthersKip: number;
  readonly oneLaneMomentKipFt: number;
  readonly oneLaneShearKip: number;
  readonly oneLaneShearAxleKip: number;
  readonly oneLaneShearOthersKip: number;
  readonly fatigueMomentKipFt: number;
  readonly oneLaneFatigueMomentKipFt: number;
}

/** Load factor design of noncomposite stringers. Source: AASHTO Standard Specifications, 17th ed. (2002), Divisions 3 and 10. */
export const lfd: Specification = {
  name: "lfd",
  title: "AASHTO Standard Specifications, 17th ed. (2002), load factor design",
  prepare: (design, layout) => new NoncompositeStringers(design, layout),
};

class NoncompositeStringers implements Assessor {
  readonly layout: Layout;
  readonly positions: readonly Position[];
  readonly ratios: Float64Array;
  readonly slots: readonly { readonly position: Position; readonly id: CheckId; readonly kind: CheckKind }[];
  passes = false;
  governingRatio = Number.POSITIVE_INFINITY;
  governingSlot = 0;

  readonly #design: Design;
  readonly #place: DistributionPlace;
  readonly #stringers: readonly StringerLoads[];
  readonly #kinds: readonly CheckKind[];
  readonly #used: readonly boolean[];
  readonly #impact: number;
  readonly #fatigueTruckKipFt: number;
  readonly #fatigue: FatigueCase;
  readonly #unbracedIn: number;
  readonly #diaphragmsIn: number;
  readonly #capacity: FlexureCapacity = newFlexureCapacity();
  readonly #advisoriesRequired: boolean;
  /** Whether the run may end at the first failing required check. */
  #screening = false;
  /** Whether it has met one. */
  #settled = false;

  constructor(design: Design, layout: Layout) {
    const { bridge, live } = design;
    this.#design = design;
    this.layout = layout;
    this.positions = layout.count === null ? ["interior"] : ["interior", "exterior"];
    this.#impact = live.includesImpact ? 0 : impactFraction.of(bridge.spanFt);
    const fatigueTruck = vehicleNamed(design.vehicles, FATIGUE_VEHICLE).trains[0];
    this.#fatigueTruckKipFt = greatestMoment(fatigueTruck, bridge.spanFt, 0).momentKipFt;
    this.#fatigue = fatigueCase(bridge.liveLoad.adtt, allowedRanges(bridge.liveLoad.fatigueDetail, layout.count));
    this.#diaphragmsIn = bridge.bracing.diaphragmSpacingFt * IN_PER_FT;
    this.#unbracedIn = bridge.bracing.topFlange === "held" ? 0 : this.#diaphragmsIn;
    const { lanes } = bridge.liveLoad;
    this.#place = {
      spacingFt: layout.spacingFt,
      count: layout.count,
      curbInsideFt: curbInsideFt(design, layout),
      lanes,
      mostTrucks: bridge.deck.outToOutFt === null && lanes >= 2 ? TRUCKS_ON_UNKNOWN_WIDTH : lanes,
    };
    this.#stringers = this.positions.map((position) => this.#stringerLoads(position, null));
    const kinds = { ...KIND };
    const used = (use: Use, slot: Slot, enforced: CheckKind): boolean => {
      kinds[slot] = use === "enforce" ? enforced : "advisory";
      return use !== "off";
    };
    const shown: Partial<Record<Slot, boolean>> = {
      "live-load-deflection": used(bridge.deflection.use, "live-load-deflection", "demand"),
      depth: used(bridge.advisories.depth, "depth", "limit"),
      handling: used(bridge.advisories.handling, "handling", "limit"),
      overhang: used(bridge.advisories.overhang, "overhang", "limit"),
      "deck-pour": bridge.deck.kind === "concrete",
    };
    this.#kinds = CHECKS.map((slot) => kinds[slot]);
    this.#used = CHECKS.map((slot) => shown[slot] ?? true);
    this.#advisoriesRequired = [bridge.advisories.depth, bridge.advisories.handling, bridge.advisories.overhang].includes("enforce");
    this.ratios = new Float64Array(this.positions.length * CHECKS.length).fill(ABSENT);
    this.slots = this.positions.flatMap((position) =>
      CHECKS.map((slot, place) => ({ position, id: slot === "bracing-advisory" ? "bracing" : slot, kind: this.#kinds[place] })),
    );
  }

  #stringerLoads(position: Position, recorder: AssessmentRecorder | null): StringerLoads {
    const { bridge, live } = this.#design;
    const { count, spacingFt, overhangFt } = this.layout;
    const tributaryFt = position === "interior" ? spacingFt : spacingFt / 2 + (overhangFt ?? 0);
    recorder?.topic("dead-load");
    recorder?.value("T", tributaryFt, "ft", "tributary width");
    const dead = deadLoadOf(bridge, { tributaryFt, spacingFt, count }, recorder);
    recorder?.topic("distribution");
    const share = (position === "interior" ? interiorFactors : exteriorFactors)(bridge, this.#place, recorder);
    const g = share.moment.factor;
    const g1 = share.oneLaneMoment.factor;
    const shear = worstEndShear(this.#design, share.endShear.factor, g, this.#impact);
    const oneLaneShear = worstEndShear(this.#design, share.oneLaneEndShear.factor, g1, this.#impact);
    const impact = impactFraction.of(bridge.spanFt);
    return {
      position,
      dead,
      factors: share,
      constructionKlf: constructionLoad.of(bridge.pour.constructionPsf, tributaryFt),
      liveMomentKipFt: factors.liveMoment.of(live.momentKipFt, g, this.#impact),
      liveShearKip: shear.shearKip,
      shearAxleKip: shear.overSupportKip,
      shearOthersKip: shear.othersKip,
      oneLaneMomentKipFt: factors.liveMoment.of(live.momentKipFt, g1, this.#impact),
      oneLaneShearKip: oneLaneShear.shearKip,
      oneLaneShearAxleKip: oneLaneShear.overSupportKip,
      oneLaneShearOthersKip: oneLaneShear.othersKip,
      fatigueMomentKipFt: fatigueMoment.of(this.#fatigueTruckKipFt, g, impact),
      oneLaneFatigueMomentKipFt: fatigueMoment.of(this.#fatigueTruckKipFt, g1, impact),
    };
  }

  assess(steel: Steel, recorder: AssessmentRecorder | null): void {
    this.#screening = false;
    this.#run(steel, recorder);
  }

  screen(steel: Steel): boolean {
    this.#screening = true;
    this.#run(steel, null);
    return this.passes;
  }

  #run(steel: Steel, recorder: AssessmentRecorder | null): void {
    this.ratios.fill(ABSENT);
    this.#settled = false;
    for (let index = 0; index < this.#stringers.length && !this.#settled; index++) {
      this.#assessStringer(this.#stringers[index], index * CHECKS.length, steel, recorder);
    }
    this.#decide();
  }

  #assessStringer(stringer: StringerLoads, base: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { bridge, live, vehicle } = this.#design;
    const L = bridge.spanFt;
    const { sectionModulusXIn3: Sx, flangeThicknessIn: tf, webThicknessIn: tw, depthIn: d } = shape;
    const I = this.#impact;
    if (recorder !== null) this.#recordGiven(stringer, shape, Fy, recorder);

    recorder?.topic("effects");
    const w1 = stage1Klf(bridge, stringer.dead, shape, recorder);
    const { stage2Klf: w2, wearingKlf: ww } = stringer.dead;
    const M1 = factors.momentStage1.of(w1, L);
    recorder?.step(factors.momentStage1, M1, w1, L);
    const M2 = factors.momentStage2.of(w2, L);
    recorder?.step(factors.momentStage2, M2, w2, L);
    const Mw = factors.momentWearing.of(ww, L);
    recorder?.step(factors.momentWearing, Mw, ww, L);
    const MD = factors.deadMoment.of(M1, M2, Mw);
    recorder?.step(factors.deadMoment, MD, M1, M2, Mw);
    const VD = factors.deadShear.of(w1, w2, ww, L);
    recorder?.step(factors.deadShear, VD, w1, w2, ww, L);
    const ML = stringer.liveMomentKipFt;
    recorder?.step(factors.liveMoment, ML, live.momentKipFt, stringer.factors.moment.factor, I);
    const VL = stringer.liveShearKip;
    recorder?.step(
      factors.liveShear,
      VL,
      stringer.shearAxleKip,
      stringer.factors.endShear.factor,
      stringer.shearOthersKip,
      stringer.factors.moment.factor,
      I,
    );
    let Mu = factors.factoredMoment.of(MD, ML);
    recorder?.step(factors.factoredMoment, Mu, MD, ML);
    let Vu = factors.factoredShear.of(VD, VL);
    recorder?.step(factors.factoredShear, Vu, VD, VL);
    let Mo = factors.overloadMoment.of(MD, ML);
    recorder?.step(factors.overloadMoment, Mo, MD, ML);
    if (vehicle.lighterThanH20) {
      const ML1 = stringer.oneLaneMomentKipFt;
      const VL1 = stringer.oneLaneShearKip;
      const MuIA = factors.factoredMomentIA.of(MD, ML1);
      const VuIA = factors.factoredShearIA.of(VD, VL1);
      const MoIA = factors.overloadMomentIA.of(MD, ML1);
      if (recorder !== null) {
        recorder.step({ ...factors.liveMoment, symbol: "ML1" }, ML1, live.momentKipFt, stringer.factors.oneLaneMoment.factor, I);
        const { oneLaneShearAxleKip: P0, oneLaneShearOthersKip: Vr, factors: share } = stringer;
        recorder.step({ ...factors.liveShear, symbol: "VL1" }, VL1, P0, share.oneLaneEndShear.factor, Vr, share.oneLaneMoment.factor, I);
        recorder.step(factors.factoredMomentIA, MuIA, MD, ML1);
        recorder.step(factors.factoredShearIA, VuIA, VD, VL1);
        recorder.step(factors.overloadMomentIA, MoIA, MD, ML1);
      }
      Mu = Math.max(Mu, MuIA);
      Vu = Math.max(Vu, VuIA);
      Mo = Math.max(Mo, MoIA);
      recorder?.value("Mu", Mu, "kip-ft", "the greater of Group I and Group IA");
      recorder?.value("Vu", Vu, "kip", "the greater of Group I and Group IA");
      recorder?.value("Mo", Mo, "kip-ft", "the greater of Group I and Group IA");
    }

    recorder?.topic("flexure");
    const flexure = this.#capacity;
    recorder?.value("Lb", this.#unbracedIn, "in", bridge.bracing.topFlange === "held" ? "top flange held" : "diaphragms");
    flexureCapacity(shape, Fy, this.#unbracedIn, flexure, recorder);
    recorder?.note("flexure-route", flexure.route);
    if (flexure.capacityKipFt === 0) recorder?.note("outside-flexure-rules", flexure.flangeSlenderness, flexure.webSlenderness);
    this.#check(base, "flexure", Mu, flexure.capacityKipFt, "kip-ft", flexure.article, recorder);
    this.#check(base, "flange-slenderness", flexure.flangeSlenderness, flexure.flangeLimit, "-", flexure.article, recorder);
    this.#check(base, "web-slenderness", flexure.webSlenderness, flexure.webLimit, "-", flexure.article, recorder);
    if (flexure.interaction > 0) {
      this.#check(base, "slenderness-interaction", flexure.interaction, flexure.interactionLimit, "-", "10.48.1.1(b)", recorder);
    }
    if (flexure.bracingLimitIn < Number.POSITIVE_INFINITY) {
      this.#check(base, "bracing", this.#unbracedIn, flexure.bracingLimitIn, "in", flexure.article, recorder);
    } else {
      this.#check(base, "bracing-advisory", this.#unbracedIn / IN_PER_FT, DIAPHRAGMS_AT_MOST_FT, "ft", "10.20.1", recorder);
    }
    if (this.#settled) return;
    const Zreq = requiredZ.of(Mu, Fy);
    recorder?.step(requiredZ, Zreq, Mu, Fy);

    recorder?.topic("shear");
    const D = webDepth.of(d, tf);
    const Vcap = shearCapacityKip(Fy, D, tw, recorder);
    this.#check(base, "shear", Vu, Vcap, "kip", "10.48.8", recorder);
    const Vbs = withoutBearingStiffeners.of(Vcap);
    recorder?.step(withoutBearingStiffeners, Vbs, Vcap);
    recorder?.support("10.33.2", Vu, Vbs);

    if (this.#settled) return;
    recorder?.topic("overload");
    const fo = factors.overloadStress.of(Mo, Sx);
    recorder?.step(factors.overloadStress, fo, Mo, Sx);
    const Fo = factors.overloadLimit.of(Fy);
    recorder?.step(factors.overloadLimit, Fo, Fy);
    this.#check(base, "overload", fo, Fo, "ksi", "10.57.1", recorder);
    const Sreq = factors.requiredS.of(Mo, Fy);
    recorder?.step(factors.requiredS, Sreq, Mo, Fy);

    if (this.#settled) return;
    recorder?.topic("deflection");
    const delta = this.#deflectionIn(stringer, shape, recorder);
    const dall = allowedDeflection.of(L, bridge.deflection.spanOver);
    recorder?.step(allowedDeflection, dall, L, bridge.deflection.spanOver);
    this.#check(base, "live-load-deflection", delta, dall, "in", "10.6.2", recorder);

    if (this.#settled) return;
    recorder?.topic("fatigue");
    this.#checkFatigue(stringer, base, Sx, recorder);
    if (this.#used[PLACE["deck-pour"]]) this.#checkPour(stringer, base, shape, Fy, w1, recorder);
    if (!this.#screening || this.#advisoriesRequired) this.#advise(stringer, base, shape, recorder);

    recorder?.effects({
      deadStage1Klf: w1,
      deadStage2Klf: w2,
      deadWearingKlf: ww,
      momentStage1KipFt: M1,
      momentStage2KipFt: M2,
      momentWearingKipFt: Mw,
      liveMomentPerLaneKipFt: live.momentKipFt,
      liveMomentPerLaneIncludesImpact: live.includesImpact,
      liveShearPerLaneKip: live.shearKip,
      impact: I,
      distributionMoment: stringer.factors.moment.factor,
      distributionShear: effectiveFactor(VL, live.shearKip, I),
      distributionPer: "wheel line",
      distributionRule: stringer.factors.moment.rule,
      liveMomentKipFt: ML,
      liveShearKip: VL,
      oneLaneLiveMomentKipFt: vehicle.lighterThanH20 ? stringer.oneLaneMomentKipFt : null,
      oneLaneDistributionMoment: vehicle.lighterThanH20 ? stringer.factors.oneLaneMoment.factor : null,
      deadShearKip: VD,
      factoredMomentKipFt: Mu,
      factoredShearKip: Vu,
      requiredZIn3: Zreq,
      requiredSIn3: Sreq,
      effectiveWidthIn: null,
      plasticMomentKipFt: null,
      deflectionIn: delta,
    });
  }

  #deflectionIn(stringer: StringerLoads, shape: Shape, recorder: AssessmentRecorder | null): number {
    const { bridge, live } = this.#design;
    const { count } = this.layout;
    const Y = live.midspanDeflectionKipFt3;
    const I = this.#impact;
    const Ix = shape.inertiaXIn4;
    if (count === null) {
      const g = stringer.factors.moment.factor;
      const delta = stringerDeflection.of(Y, g, I, STEEL_MODULUS_KSI, Ix);
      recorder?.step(stringerDeflection, delta, Y, g, I, STEEL_MODULUS_KSI, Ix);
      return delta;
    }
    const lanes = bridge.liveLoad.lanes;
    const reduction = laneReduction(lanes);
    const delta = sharedDeflection.of(lanes, reduction, Y, I, count, STEEL_MODULUS_KSI, Ix);
    recorder?.step(sharedDeflection, delta, lanes, reduction, Y, I, count, STEEL_MODULUS_KSI, Ix);
    return delta;
  }

  #checkFatigue(stringer: StringerLoads, base: number, Sx: number, recorder: AssessmentRecorder | null): void {
    const impact = impactFraction.of(this.#design.bridge.spanFt);
    const { allowedKsi, oneLaneAllowedKsi, cycles } = this.#fatigue;
    recorder?.value("MT", this.#fatigueTruckKipFt, "kip-ft", `${FATIGUE_VEHICLE} truck, absolute maximum`);
    const Mf = stringer.fatigueMomentKipFt;
    recorder?.step(fatigueMoment, Mf, this.#fatigueTruckKipFt, stringer.factors.moment.factor, impact);
    const range = fatigueRange.of(Mf, Sx);
    recorder?.step(fatigueRange, range, Mf, Sx);
    recorder?.value("Fsr", allowedKsi, "ksi", `${this.#design.bridge.liveLoad.fatigueDetail}, ${cycles} cycles`);
    if (oneLaneAllowedKsi === null) {
      this.#check(base, "fatigue", range, allowedKsi, "ksi", "10.3", recorder);
      return;
    }
    const Mf1 = stringer.oneLaneFatigueMomentKipFt;
    const oneLaneRange = fatigueRange.of(Mf1, Sx);
    if (recorder !== null) {
      recorder.step({ ...fatigueMoment, symbol: "Mf1" }, Mf1, this.#fatigueTruckKipFt, stringer.factors.oneLaneMoment.factor, impact);
      recorder.step({ ...fatigueRange, symbol: "fsr1" }, oneLaneRange, Mf1, Sx);
      recorder.value("Fsr1", oneLaneAllowedKsi, "ksi", "one lane loaded, over 2,000,000 cycles");
    }
    const oneLaneWorse = oneLaneRange / oneLaneAllowedKsi > range / allowedKsi;
    this.#check(
      base,
      "fatigue",
      oneLaneWorse ? oneLaneRange : range,
      oneLaneWorse ? oneLaneAllowedKsi : allowedKsi,
      "ksi",
      "10.3",
      recorder,
    );
  }

  #checkPour(stringer: StringerLoads, base: number, shape: Shape, Fy: number, w1: number, recorder: AssessmentRecorder | null): void {
    const { bridge } = this.#design;
    recorder?.topic("deck-pour");
    const wc = stringer.constructionKlf;
    recorder?.step(constructionLoad, wc, bridge.pour.constructionPsf, stringer.dead.tributaryFt);
    const moment = pourMoment.of(w1, wc, bridge.spanFt);
    recorder?.step(pourMoment, moment, w1, wc, bridge.spanFt);
    const lf = this.#capacity.flangeSlenderness;
    const Fcr = flangeStress.of(Fy, lf);
    recorder?.step(flangeStress, Fcr, Fy, lf);
    recorder?.value("Lb", this.#diaphragmsIn, "in", "diaphragms alone brace the flange while the deck is wet");
    const sound = this.#capacity.capacityKipFt > 0;
    const capacity = partiallyBraced(shape, Fy, Fcr, this.#capacity.webSlenderness, this.#diaphragmsIn, recorder);
    this.#check(base, "deck-pour", moment, sound ? capacity : 0, "kip-ft", "10.61", recorder);
  }

  #advise(stringer: StringerLoads, base: number, shape: Shape, recorder: AssessmentRecorder | null): void {
    const { bridge } = this.#design;
    const { spacingFt, overhangFt, broken } = this.layout;
    recorder?.topic("advisories");
    const dmin = leastDepth.of(bridge.spanFt);
    recorder?.step(leastDepth, dmin, bridge.spanFt);
    this.#check(base, "depth", dmin, shape.depthIn, "in", "10.5.1", recorder);
    const bmin = leastFlangeWidth.of(bridge.spanFt, bridge.pieceOverlapFt);
    recorder?.step(leastFlangeWidth, bmin, bridge.spanFt, bridge.pieceOverlapFt);
    this.#check(base, "handling", bmin, shape.flangeWidthIn, "in", "common practice", recorder);
    if (stringer.position === "exterior" && overhangFt !== null) {
      const omax = greatestOverhang.of(shape.depthIn);
      recorder?.step(greatestOverhang, omax, shape.depthIn);
      this.#check(base, "overhang", overhangFt, omax, "ft", "common practice", recorder);
    }
    for (const limit of broken) {
      const [required, provided] = limit.value > limit.limit ? [limit.value, limit.limit] : [limit.limit, limit.value];
      if (limit.ratio > this.ratios[base + PLACE.layout])
        this.#check(base, "layout", required, provided, "-", `practice ${limit.key}`, null);
      recorder?.check({
        id: "layout",
        kind: "advisory",
        article: `practice ${limit.key}`,
        demand: required,
        capacity: provided,
        unit: limit.key.endsWith("Ft") ? "ft" : "-",
        ratio: limit.ratio,
        ok: false,
      });
    }
    if (bridge.roadwayFt !== null && bridge.sources["liveLoad.lanes"] === "practice") {
      const gap = nextLaneStepFt(bridge.roadwayFt) - bridge.roadwayFt;
      this.#check(base, "lane-step", LANE_STEP_MARGIN_FT, gap, "ft", "3.6", recorder);
    }
    if (bridge.deck.kind === "concrete" && bridge.deck.thicknessIn !== null) {
      const tmin = leastDeckThickness.of(spacingFt);
      recorder?.step(leastDeckThickness, tmin, spacingFt);
      this.#check(base, "deck-thickness", tmin, bridge.deck.thicknessIn, "in", "8.9.2", recorder);
    }
    if (this.layout.count !== null) {
      const lanes = bridge.liveLoad.lanes;
      const needed = 2 * lanes * laneReduction(lanes);
      const [interior, exterior] = this.#stringers;
      const sum = (this.layout.count - 2) * interior.factors.moment.factor + 2 * exterior.factors.moment.factor;
      this.#check(base, "distribution-sum", needed, sum, "wheel lines", "statics", recorder);
    }
  }

  #recordGiven(stringer: StringerLoads, shape: Shape, Fy: number, recorder: AssessmentRecorder): void {
    const { bridge, live, vehicle } = this.#design;
    recorder.stringer(stringer.position);
    recorder.topic("section");
    recorder.value("L", bridge.spanFt, "ft", "span");
    recorder.value("S", this.layout.spacingFt, "ft", "stringer spacing");
    if (this.layout.count !== null) recorder.value("Nb", this.layout.count, "-", "stringers");
    if (this.layout.overhangFt !== null) recorder.value("o", this.layout.overhangFt, "ft", "overhang");
    if (this.#place.curbInsideFt !== null)
      recorder.value("de", this.#place.curbInsideFt, "ft", "web of the outer stringer to the curb face");
    if (bridge.roadwayFt !== null) recorder.value("wr", bridge.roadwayFt, "ft", "clear roadway");
    recorder.value("NL", bridge.liveLoad.lanes, "-", "lanes");
    recorder.value("Fy", Fy, "ksi", "yield stress");
    recorder.value("w", shape.weightPlf, "lb/ft", shape.designation);
    recorder.value("d", shape.depthIn, "in", shape.designation);
    recorder.value("bf", shape.flangeWidthIn, "in", shape.designation);
    recorder.value("tf", shape.flangeThicknessIn, "in", shape.designation);
    recorder.value("tw", shape.webThicknessIn, "in", shape.designation);
    recorder.value("Ix", shape.inertiaXIn4, "in4", shape.designation);
    recorder.value("Sx", shape.sectionModulusXIn3, "in3", shape.designation);
    recorder.value("Zx", shape.plasticModulusXIn3, "in3", shape.designation);
    recorder.value("ry", shape.radiusYIn, "in", shape.designation);
    recorder.value("J", shape.torsionJIn4, "in4", shape.designation);
    recorder.value("h/tw", shape.webSlenderness, "-", "clear of the fillets, as the list prints it; for comparison with D/tw");
    const { deck, barriers, steel, pour } = bridge;
    if (deck.thicknessIn !== null) recorder.value("t", deck.thicknessIn, "in", "deck, total thickness");
    recorder.value("th", deck.haunchWeightIn, "in", "haunch in the weight");
    recorder.value("wb", barriers.weightKlf, "kip/ft", "one barrier");
    recorder.value("pw", bridge.wearingPsf, "lb/ft2", "wearing surface");
    if (deck.deckPsf !== null) recorder.value("p", deck.deckPsf, "lb/ft2", "deck");
    recorder.value("pf", deck.formsPsf, "lb/ft2", "forms that stay in place");
    recorder.value("c", steel.miscFraction, "-", "miscellaneous steel, fraction of the shape");
    recorder.value("q", pour.constructionPsf, "lb/ft2", "construction load at the pour");
    recorder.value("a", bridge.pieceOverlapFt, "ft", "piece beyond the bearing at either end");
    recorder.value("E", STEEL_MODULUS_KSI, "ksi", "steel");
    recorder.topic("live-load");
    const train = live.momentOfTrain;
    if (train !== null) {
      const { resultantKip: R, atFt: x, eccentricityFt: e, earlierAxlesKipFt: Me } = train;
      recorder.value("R", R, "kip", `axles on the span: ${vehicle.name} ${live.momentGoverning}`);
      recorder.value("x", x, "ft", "place of the axle the moment stands under");
      recorder.value("e", e, "ft", "place of the resultant minus place of that axle");
      recorder.value("Me", Me, "kip-ft", "axles before that one, about it");
      recorder.step(momentUnderAxle, live.momentKipFt, R, bridge.spanFt, x, e, Me);
    } else if (live.lane !== null) {
      recorder.step(laneMoment, live.momentKipFt, live.lane.uniformKlf, bridge.spanFt, live.lane.momentKip);
    }
    recorder.value("VLL", live.shearKip, "kip", `end shear of one lane: ${vehicle.name} ${live.shearGoverning}`);
    recorder.value("P0", stringer.shearAxleKip, "kip", "load over the support in the worst place for this stringer");
    recorder.value("Vr", stringer.shearOthersKip, "kip", "end shear of the rest of the load");
    recorder.value("Y", live.midspanDeflectionKipFt3, "kip-ft3", `EI times midspan deflection of one lane: ${live.deflectionGoverning}`);
    if (!live.includesImpact) recorder.step(impactFraction, this.#impact, bridge.spanFt);
    this.#stringerLoads(stringer.position, recorder);
    recorder.note("distribution", stringer.factors.moment.rule, stringer.factors.endShear.rule);
  }

  #check(
    base: number,
    slot: Slot,
    demand: number,
    capacity: number,
    unit: string,
    article: string,
    recorder: AssessmentRecorder | null,
  ): void {
    const place = PLACE[slot];
    if (!this.#used[place]) return;
    const ratio = demand / capacity;
    this.ratios[base + place] = ratio;
    if (this.#screening && !(ratio <= 1) && this.#kinds[place] !== "advisory") this.#settled = true;
    recorder?.check({ id: this.slots[base + place].id, kind: this.#kinds[place], article, demand, capacity, unit, ratio, ok: ratio <= 1 });
  }

  /** The worst failing required check, else the worst required demand; what is not a number fails as infinity. */
  #decide(): void {
    let failing = -1;
    let failingRatio = 0;
    let worst = -1;
    let worstRatio = -1;
    for (let place = 0; place < this.ratios.length; place++) {
      const kind = this.#kinds[place % CHECKS.length];
      const ratio = this.ratios[place];
      if (kind === "advisory" || ratio === ABSENT) continue;
      if (!(ratio <= 1)) {
        const fails = ratio > 1 ? ratio : Number.POSITIVE_INFINITY;
        if (fails > failingRatio) {
          failing = place;
          failingRatio = fails;
        }
      } else if (kind === "demand" && ratio > worstRatio) {
        worst = place;
        worstRatio = ratio;
      }
    }
    this.passes = failing < 0 && worst >= 0;
    this.governingSlot = failing >= 0 ? failing : worst;
    this.governingRatio = failing >= 0 ? failingRatio : worstRatio;
  }
}

/** de: web of the exterior stringer to the curb face, ft; null for one interior stringer. */
function curbInsideFt({ bridge }: Design, layout: Layout): number | null {
  const { outToOutFt } = bridge.deck;
  if (layout.overhangFt === null || outToOutFt === null || bridge.roadwayFt === null) return null;
  return layout.overhangFt - (outToOutFt - bridge.roadwayFt) / 2;
}

interface EndShear {
  readonly shearKip: number;
  readonly overSupportKip: number;
  readonly othersKip: number;
}

/** The worst live end shear on a stringer over every place of every train with an axle at the support, and the lane loading. */
function worstEndShear({ live, bridge }: Design, supportFactor: number, otherFactor: number, impact: number): EndShear {
  let worst: EndShear = { shearKip: 0, overSupportKip: 0, othersKip: 0 };
  const consider = (overSupportKip: number, othersKip: number): void => {
    const shearKip = factors.liveShear.of(overSupportKip, supportFactor, othersKip, otherFactor, impact);
    if (shearKip > worst.shearKip) worst = { shearKip, overSupportKip, othersKip };
  };
  for (const place of live.endPlaces) consider(place.axleOverSupportKip, place.othersKip);
  if (live.lane !== null && !live.includesImpact) consider(live.lane.shearKip, (live.lane.uniformKlf * bridge.spanFt) / 2);
  return worst;
}

function effectiveFactor(liveShearKip: number, perLaneKip: number, impact: number): number {
  return factors.effectiveShearFactor.of(liveShearKip, perLaneKip, impact);
}
