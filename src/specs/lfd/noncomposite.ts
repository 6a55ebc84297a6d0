import type { Layout } from "../../bridge/layouts.js";
import type { Steel } from "../../bridge/yield-stress.js";
import type { Shape } from "../../catalogue/shape.js";
import { IN_PER_FT } from "../../units.js";
import type { AssessmentRecorder, Design } from "../contract.js";
import { leastDepth } from "./advisories.js";
import { type FlexureCapacity, flexureCapacity, newFlexureCapacity, requiredZ } from "./flexure.js";
import { LfdStringers } from "./lfd-stringers.js";
import * as factors from "./load-factors.js";

/** Noncomposite stringers by load factor design. Source: AASHTO Standard Specifications, 17th ed. (2002), Divisions 3 and 10. */
export class NoncompositeStringers extends LfdStringers {
  readonly #unbracedIn: number;
  readonly #capacity: FlexureCapacity = newFlexureCapacity();

  constructor(design: Design, layout: Layout) {
    super(design, layout);
    this.#unbracedIn = design.bridge.bracing.topFlange === "held" ? 0 : this.diaphragmsIn;
  }

  protected override assessStringer(index: number, steel: Steel, recorder: AssessmentRecorder | null): void {
    const { shape, fyKsi: Fy } = steel;
    if (recorder !== null) this.recordBefore(index, steel, recorder);
    this.workOutEffects(this.stringers[index], shape, recorder);
    this.#checkFlexure(index, steel, recorder);
    if (this.settled) return;
    const Zreq = requiredZ.of(this.effects.Mu, Fy);
    recorder?.step(requiredZ, Zreq, this.effects.Mu, Fy);
    this.checkShear(index, steel, recorder);
    if (this.settled) return;
    const Sreq = this.#checkOverload(index, steel, recorder);
    if (this.settled) return;
    const deflectionIn = this.checkDeflection(index, shape.inertiaXIn4, recorder);
    if (this.settled) return;
    this.checkFatigue(index, shape.sectionModulusXIn3, recorder);
    if (this.settled) return;
    this.checkPour(index, steel, recorder);
    this.advise(index, shape, recorder);
    if (recorder === null) return;
    const own = { requiredZIn3: Zreq, requiredSIn3: Sreq, effectiveWidthIn: null, plasticMomentKipFt: null, deflectionIn };
    this.recordEffects(index, own, recorder);
  }

  #checkFlexure(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const flexure = this.#capacity;
    const { spanFt } = this.design.bridge;
    recorder?.topic("flexure");
    recorder?.value("Lb", this.#unbracedIn, "in", this.design.bridge.bracing.topFlange === "held" ? "top flange held" : "diaphragms");
    flexureCapacity(shape, Fy, this.#unbracedIn, flexure, recorder);
    recorder?.note("flexure-route", flexure.route);
    if (flexure.capacityKipFt === 0) recorder?.note("outside-flexure-rules", flexure.flangeSlenderness, flexure.webSlenderness);
    this.check(index, "flexure", this.effects.Mu, flexure.capacityKipFt, "kip-ft", flexure.article, recorder);
    this.check(index, "flange-slenderness", flexure.flangeSlenderness, flexure.flangeLimit, "-", flexure.article, recorder);
    this.check(index, "web-slenderness", flexure.webSlenderness, flexure.webLimit, "-", flexure.article, recorder);
    if (flexure.route === "compact") {
      this.check(index, "slenderness-interaction", flexure.interaction, flexure.interactionLimit, "-", "10.48.1.1(b)", recorder);
    }
    // The partially braced capacity takes the unbraced length in, so only the span bounds it there.
    const limit = flexure.route === "partially-braced" ? spanFt * IN_PER_FT : flexure.bracingLimitIn;
    this.check(index, "bracing", this.#unbracedIn, limit, "in", flexure.article, recorder);
  }

  /** Overload stress in either flange; returns the S it requires, in3. */
  #checkOverload(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): number {
    const { MD, overloadLive } = this.effects;
    recorder?.topic("overload");
    recorder?.value("fL", overloadLive, "kip-ft", "live moment times its overload factor: 5/3, or 2.20 of one lane where Group IA governs");
    const Mo = factors.overloadMoment.of(MD, overloadLive);
    recorder?.step(factors.overloadMoment, Mo, MD, overloadLive);
    const fo = factors.overloadStress.of(Mo, shape.sectionModulusXIn3);
    recorder?.step(factors.overloadStress, fo, Mo, shape.sectionModulusXIn3);
    const Fo = factors.overloadLimit.of(Fy);
    recorder?.step(factors.overloadLimit, Fo, Fy);
    this.check(index, "overload", fo, Fo, "ksi", "10.57.1", recorder);
    const Sreq = factors.requiredS.of(Mo, Fy);
    recorder?.step(factors.requiredS, Sreq, Mo, Fy);
    return Sreq;
  }

  protected override adviseDepth(index: number, shape: Shape, recorder: AssessmentRecorder | null): void {
    const { spanFt } = this.design.bridge;
    const dmin = leastDepth.of(spanFt);
    recorder?.step(leastDepth, dmin, spanFt);
    this.check(index, "depth", dmin, shape.depthIn, "in", "10.5.1", recorder);
  }
}
