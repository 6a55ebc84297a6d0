import type { Steel } from "../../bridge/yield-stress.js";
import type { AssessmentRecorder } from "../contract.js";
import { bareCapacity, newBareCapacity } from "./flexure.js";
import * as rules from "./formulas.js";
import { LrfdStringers } from "./lrfd-stringers.js";

/** Noncomposite stringers by load and resistance factor design. Source: AASHTO LRFD, 9th ed. (2020), Art. 6.10, Appendix A6. */
export class NoncompositeLrfdStringers extends LrfdStringers {
  readonly #bare = newBareCapacity();

  protected override assessStringer(index: number, steel: Steel, recorder: AssessmentRecorder | null): void {
    const { shape } = steel;
    this.workOutEffects(index, steel, recorder);
    this.#checkFlexure(index, steel, recorder);
    if (this.settled) return;
    this.checkShear(index, steel, recorder);
    if (this.settled) return;
    this.#checkService(index, steel, recorder);
    if (this.settled) return;
    const deflectionIn = this.checkDeflection(index, shape.inertiaXIn4, recorder);
    if (this.settled) return;
    this.checkFatigue(index, shape.sectionModulusXIn3, recorder);
    if (this.settled) return;
    this.checkPour(index, steel, recorder);
    this.checkProportions(index, shape, recorder);
    this.advise(index, shape, recorder);
    if (recorder === null) return;
    const { Mu, M1, M2, Mw, ML } = this.effects;
    const own = {
      requiredZIn3: (12 * Mu) / steel.fyKsi,
      requiredSIn3: (12 * (M1 + M2 + Mw + 1.3 * ML)) / (0.8 * steel.fyKsi),
      effectiveWidthIn: null,
      plasticMomentKipFt: null,
      deflectionIn,
    };
    this.recordEffects(index, own, recorder);
  }

  /** Source: AASHTO LRFD, 9th ed., Art. A6.1 to A6.3. */
  #checkFlexure(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const held = this.design.bridge.bracing.topFlange === "held";
    const Lb = held ? 0 : this.diaphragmsIn;
    const bare = this.#bare;
    recorder?.topic("flexure");
    recorder?.value("Lb", Lb, "in", held ? "top flange held" : "diaphragms");
    bareCapacity(shape, Fy, Lb, bare, recorder);
    if (bare.momentKipIn === 0) recorder?.note("outside-flexure-rules", bare.flangeSlenderness, bare.webSlenderness);
    this.check(index, "flexure", this.effects.Mu, bare.momentKipIn / 12, "kip-ft", held ? "A6.1" : "A6.3", recorder);
    this.check(index, "flange-slenderness", bare.flangeSlenderness, bare.flangeLimit, "-", "A6.3.2", recorder);
    this.check(index, "web-slenderness", bare.webSlenderness, bare.webLimit, "-", "A6.2", recorder);
    if (held) this.check(index, "bracing", 0, this.diaphragmsIn, "in", "A6.3.3", recorder);
    else if (bare.bracingLimitIn < Number.POSITIVE_INFINITY)
      this.check(index, "bracing", Lb, bare.bracingLimitIn, "in", "A6.3.3", recorder);
  }

  /** Service II. Source: AASHTO LRFD, 9th ed., Art. 6.10.4.2. */
  #checkService(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { M1, M2, Mw, ML } = this.effects;
    const M2w = M2 + Mw;
    const Sx = shape.sectionModulusXIn3;
    recorder?.topic("service-ii");
    recorder?.value("M2w", M2w, "kip-ft", "stage 2 and wearing surface");
    const fs = rules.serviceStressBare.of(M1, M2w, ML, Sx);
    recorder?.step(rules.serviceStressBare, fs, M1, M2w, ML, Sx);
    const Fs = rules.serviceLimitBare.of(Fy);
    recorder?.step(rules.serviceLimitBare, Fs, Fy);
    this.check(index, "service-ii", fs, Fs, "ksi", "6.10.4.2", recorder);
  }
}
