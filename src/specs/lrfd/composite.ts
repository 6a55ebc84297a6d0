import type { Layout } from "../../bridge/layouts.js";
import type { Steel } from "../../bridge/yield-stress.js";
import { renamed } from "../../formula.js";
import { newTransformedSection, slabTensionShare, topStressKsi, transformed } from "../../section/composite.js";
import { newPlasticSection, plasticMoment, slabForce, steelForce } from "../../section/plastic-moment.js";
import { STEEL_MODULUS_KSI } from "../../units.js";
import type { AssessmentRecorder, Design } from "../contract.js";
import * as flexure from "./flexure.js";
import * as rules from "./formulas.js";
import { LrfdStringers } from "./lrfd-stringers.js";

const E = STEEL_MODULUS_KSI;
/** Steel beyond this takes no plastic moment. Source: AASHTO LRFD, 9th ed., Art. 6.10.6.2.2. */
const COMPACT_FY_KSI = 70;
/** Part of the whole depth down to which the plastic neutral axis costs nothing. Source: AASHTO LRFD, 9th ed., Art. 6.10.7.1.2. */
const FREE_DEPTH = 0.1;

/** Composite stringers by load and resistance factor design. Source: AASHTO LRFD, 9th ed. (2020), Art. 6.10. */
export class CompositeLrfdStringers extends LrfdStringers {
  readonly #fc: number;
  readonly #slab: { widthIn: number; readonly thicknessIn: number; readonly haunchIn: number };
  readonly #short = newTransformedSection();
  readonly #long = newTransformedSection();
  readonly #plastic = newPlasticSection();

  constructor(design: Design, layout: Layout) {
    super(design, layout);
    const { fcKsi, haunchSectionIn } = design.bridge.deck;
    if (fcKsi === null || this.ts <= 0) throw new RangeError("a composite deck without strength or thickness was let through");
    this.#fc = fcKsi;
    this.#slab = { widthIn: 0, thicknessIn: this.ts, haunchIn: haunchSectionIn };
  }

  protected override assessStringer(index: number, steel: Steel, recorder: AssessmentRecorder | null): void {
    const { shape } = steel;
    this.workOutEffects(index, steel, recorder);
    this.#workOutSection(index, steel, recorder);
    this.#checkFlexure(index, steel, recorder);
    if (this.settled) return;
    this.checkShear(index, steel, recorder);
    if (this.settled) return;
    this.#checkService(index, steel, recorder);
    if (this.settled) return;
    const deflectionIn = this.checkDeflection(index, this.#short.inertiaIn4, recorder);
    if (this.settled) return;
    this.checkFatigue(index, this.#short.bottomIn3, recorder);
    if (this.settled) return;
    this.checkPour(index, steel, recorder);
    this.checkProportions(index, shape, recorder);
    this.advise(index, shape, recorder);
    if (recorder === null) return;
    this.#recordStuds(steel, recorder);
    const own = {
      requiredZIn3: null,
      requiredSIn3: null,
      effectiveWidthIn: this.#slab.widthIn,
      plasticMomentKipFt: this.#plastic.momentKipFt,
      deflectionIn,
    };
    this.recordEffects(index, own, recorder);
  }

  #workOutSection(index: number, { shape }: Steel, recorder: AssessmentRecorder | null): void {
    const { tributaryFt } = this.stringers[index].dead;
    recorder?.topic("composite-section");
    recorder?.value("ts", this.ts, "in", "structural slab");
    this.#slab.widthIn = rules.effectiveWidth.of(tributaryFt);
    recorder?.step(rules.effectiveWidth, this.#slab.widthIn, tributaryFt);
    transformed(shape, this.#slab, 3 * this.n, "3n", this.#long, recorder);
    transformed(shape, this.#slab, this.n, "n", this.#short, recorder);
    if (recorder === null) return;
    const overstated = slabTensionShare(shape, this.#slab, this.n, this.#short);
    if (overstated > 0) recorder.note("slab-in-tension", 100 * overstated);
  }

  /** Source: AASHTO LRFD, 9th ed., Art. 6.10.6.2, 6.10.7. */
  #checkFlexure(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { depthIn: d, webThicknessIn: tw, flangeThicknessIn: tf } = shape;
    const { thicknessIn: ts, haunchIn: th } = this.#slab;
    const plastic = this.#plastic;
    recorder?.topic("flexure");
    plasticMoment(shape, this.#slab, Fy, this.#fc, plastic, recorder);
    const { momentKipFt: Mp, depthIn: Dp } = plastic;
    const Dt = flexure.wholeDepth.of(d, th, ts);
    recorder?.step(flexure.wholeDepth, Dt, d, th, ts);
    const lwc = flexure.plasticWebSlenderness.of(plastic.webInCompressionIn, tw);
    recorder?.step(flexure.plasticWebSlenderness, lwc, plastic.webInCompressionIn, tw);
    const lwp = flexure.compactWebLimit.of(E, Fy);
    recorder?.step(flexure.compactWebLimit, lwp, E, Fy);
    const lw = flexure.webSlenderness.of(flexure.webDepth.of(d, tf), tw);
    const compact = lw <= flexure.WEB_PROPORTION && lwc <= lwp && Fy <= COMPACT_FY_KSI;
    recorder?.note("composite-route", compact ? (Dp > FREE_DEPTH * Dt ? "reduced" : "plastic") : "first-yield", plastic.place);
    if (compact) {
      let Mn = Mp;
      if (Dp > FREE_DEPTH * Dt) {
        Mn = flexure.compositeReduced.of(Mp, Dp, Dt);
        recorder?.step(flexure.compositeReduced, Mn, Mp, Dp, Dt);
      }
      this.check(index, "flexure", this.effects.Mu, Mn, "kip-ft", "6.10.7.1", recorder);
      this.check(index, "web-slenderness", lwc, lwp, "-", "6.10.6.2.2", recorder);
    } else {
      this.#checkNoncompact(index, shape.sectionModulusXIn3, Fy, recorder);
      this.check(index, "web-slenderness", lw, flexure.WEB_PROPORTION, "-", "6.10.2.1.1", recorder);
    }
    this.check(index, "bracing", 0, this.diaphragmsIn, "in", "6.10.7", recorder);
    const Dlim = flexure.ductilityLimit.of(Dt);
    recorder?.step(flexure.ductilityLimit, Dlim, Dt);
    this.check(index, "ductility", Dp, Dlim, "in", "6.10.7.3", recorder);
  }

  /** Staged stress at Strength I in either flange against Fy. Source: AASHTO LRFD, 9th ed., Art. 6.10.7.2. */
  #checkNoncompact(index: number, Sx: number, Fy: number, recorder: AssessmentRecorder | null): void {
    const { M1, M2, Mw, ML } = this.effects;
    const fbu = rules.strengthBottom.of(M1, Sx, M2, Mw, this.#long.bottomIn3, ML, this.#short.bottomIn3);
    recorder?.step(rules.strengthBottom, fbu, M1, Sx, M2, Mw, this.#long.bottomIn3, ML, this.#short.bottomIn3);
    const ft3n = topStressKsi(1.25 * M2 + 1.5 * Mw, this.#long.topIn3);
    const ftn = topStressKsi(1.75 * ML, this.#short.topIn3);
    recorder?.value("ft3n", ft3n, "ksi", "top of the steel, lasting load; 0 where it would be tension");
    recorder?.value("ftn", ftn, "ksi", "top of the steel, live load; 0 where it would be tension");
    const ftu = rules.serviceTop.of(1.25 * M1, Sx, ft3n, ftn);
    recorder?.value("Mf1", 1.25 * M1, "kip-ft", "1.25 times stage 1");
    recorder?.step(renamed(rules.serviceTop, "ftu", { M1: "Mf1" }), ftu, 1.25 * M1, Sx, ft3n, ftn);
    this.check(index, "flexure", Math.max(fbu, ftu), Fy, "ksi", "6.10.7.2", recorder);
  }

  /** Service II, staged, both flanges. Source: AASHTO LRFD, 9th ed., Art. 6.10.4.2. */
  #checkService(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { M1, M2, Mw, ML } = this.effects;
    const Sx = shape.sectionModulusXIn3;
    const M2w = M2 + Mw;
    recorder?.topic("service-ii");
    recorder?.value("M2w", M2w, "kip-ft", "stage 2 and wearing surface");
    const fb = rules.serviceBottom.of(M1, Sx, M2w, this.#long.bottomIn3, ML, this.#short.bottomIn3);
    recorder?.step(rules.serviceBottom, fb, M1, Sx, M2w, this.#long.bottomIn3, ML, this.#short.bottomIn3);
    const ft3n = topStressKsi(M2w, this.#long.topIn3);
    const ftn = topStressKsi(1.3 * ML, this.#short.topIn3);
    recorder?.value("ft3n", ft3n, "ksi", "top of the steel, lasting load; 0 where it would be tension");
    recorder?.value("ftn", ftn, "ksi", "top of the steel, live load; 0 where it would be tension");
    const ft = rules.serviceTop.of(M1, Sx, ft3n, ftn);
    recorder?.step(rules.serviceTop, ft, M1, Sx, ft3n, ftn);
    const Fs = rules.serviceLimitComposite.of(Fy);
    recorder?.step(rules.serviceLimitComposite, Fs, Fy);
    this.check(index, "service-ii", Math.max(fb, ft), Fs, "ksi", "6.10.4.2", recorder);
  }

  /** Studs by strength. Source: AASHTO LRFD, 9th ed., Art. 6.10.10.4. */
  #recordStuds({ shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder): void {
    const { diameterIn: ds, perRow } = this.design.bridge.studs;
    const fc = this.#fc;
    recorder.topic("studs");
    const Ps = slabForce.of(fc, this.#slab.widthIn, this.ts);
    const P = steelForce.of(shape.areaIn2, Fy);
    const Pst = rules.studForce.of(Ps, P);
    recorder.step(rules.studForce, Pst, Ps, P);
    const Ec = rules.concreteModulus.of(fc);
    recorder.step(rules.concreteModulus, Ec, fc);
    const Qn = rules.studStrength.of(ds, fc, Ec);
    recorder.step(rules.studStrength, Qn, ds, fc, Ec);
    const N1 = rules.studCount.of(Pst, Qn);
    recorder.step(rules.studCount, N1, Pst, Qn);
    recorder.studs("6.10.10.4", Pst, Qn, N1, perRow);
  }
}
