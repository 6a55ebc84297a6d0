import type { Layout } from "../../bridge/layouts.js";
import type { Steel } from "../../bridge/yield-stress.js";
import type { Shape } from "../../catalogue/shape.js";
import { newTransformedSection, type Slab, slabTensionShare, topStressKsi, transformed } from "../../section/composite.js";
import { newPlasticSection, plasticMoment, slabForce, steelForce } from "../../section/plastic-moment.js";
import { IN_PER_FT } from "../../units.js";
import type { AssessmentRecorder, Design } from "../contract.js";
import * as composite from "./composite-formulas.js";
import { compactWebLimit, NONCOMPACT_WEB_LIMIT, webDepth, webSlenderness } from "./flexure.js";
import { LfdStringers } from "./lfd-stringers.js";

/** Load factor of all loads together, Group I and IA. Source: AASHTO Standard Specifications, 17th ed., Table 3.22.1A. */
const GAMMA = 1.3;
/** Beyond D' times this the section is refused. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.2. */
const DUCTILITY_LIMIT = 5;
/** Outer slab narrower than half a flange and this counts for nothing, in. Source: our reading of Art. 10.38.3.2. */
const OUTER_SLAB_IN = 6;

/** Composite stringers by load factor design. Source: AASHTO Standard Specifications, 17th ed. (2002), Art. 10.38, 10.50. */
export class CompositeStringers extends LfdStringers {
  readonly #fc: number;
  readonly #n: number;
  readonly #ts: number;
  readonly #slab: { widthIn: number; readonly thicknessIn: number; readonly haunchIn: number };
  readonly #short = newTransformedSection();
  readonly #long = newTransformedSection();
  readonly #plastic = newPlasticSection();

  constructor(design: Design, layout: Layout) {
    super(design, layout);
    const { deck } = design.bridge;
    if (deck.fcKsi === null || deck.thicknessIn === null)
      throw new RangeError("a composite deck without strength or thickness was let through");
    this.#fc = deck.fcKsi;
    this.#n = deck.modularRatio ?? composite.modularRatio(deck.fcKsi);
    this.#ts = deck.thicknessIn - deck.sacrificialIn;
    this.#slab = { widthIn: 0, thicknessIn: this.#ts, haunchIn: deck.haunchSectionIn };
  }

  protected override assessStringer(index: number, steel: Steel, recorder: AssessmentRecorder | null): void {
    const { shape } = steel;
    if (recorder !== null) this.recordBefore(index, steel, recorder);
    this.workOutEffects(this.stringers[index], shape, recorder);
    this.#workOutSection(index, steel, recorder);
    this.#checkFlexure(index, steel, recorder);
    if (this.settled) return;
    this.checkShear(index, steel, recorder);
    if (this.settled) return;
    this.#checkOverload(index, steel, recorder);
    if (this.settled) return;
    const deflectionIn = this.checkDeflection(index, this.#short.inertiaIn4, recorder);
    if (this.settled) return;
    this.checkFatigue(index, this.#short.bottomIn3, recorder);
    if (this.settled) return;
    this.checkPour(index, steel, recorder);
    this.advise(index, shape, recorder);
    if (recorder === null) return;
    this.#recordStuds(steel, recorder);
    const { widthIn } = this.#slab;
    const { momentKipFt } = this.#plastic;
    const own = { requiredZIn3: null, requiredSIn3: null, effectiveWidthIn: widthIn, plasticMomentKipFt: momentKipFt, deflectionIn };
    this.recordEffects(index, own, recorder);
  }

  #workOutSection(index: number, { shape }: Steel, recorder: AssessmentRecorder | null): void {
    recorder?.topic("composite-section");
    recorder?.value("ts", this.#ts, "in", "structural slab");
    this.#slab.widthIn = this.#effectiveWidthIn(index, shape, recorder);
    transformed(shape, this.#slab, 3 * this.#n, "3n", this.#long, recorder);
    transformed(shape, this.#slab, this.#n, "n", this.#short, recorder);
    if (recorder === null) return;
    const overstated = slabTensionShare(shape, this.#slab, this.#n, this.#short);
    if (overstated > 0) recorder.note("slab-in-tension", 100 * overstated);
  }

  /** Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.3. */
  #effectiveWidthIn(index: number, shape: Shape, recorder: AssessmentRecorder | null): number {
    const { spanFt: L } = this.design.bridge;
    const { spacingFt: S, overhangFt: o } = this.layout;
    const ts = this.#ts;
    const outer = this.positions[index] === "exterior" && o !== null;
    if (outer && o * IN_PER_FT < shape.flangeWidthIn / 2 + OUTER_SLAB_IN) {
      const be = composite.oneSidedWidth.of(L, ts, S);
      recorder?.step(composite.oneSidedWidth, be, L, ts, S);
      return be;
    }
    const bi = composite.interiorWidth.of(L, S, ts);
    recorder?.step(outer ? { ...composite.interiorWidth, symbol: "bi" } : composite.interiorWidth, bi, L, S, ts);
    if (!outer) return bi;
    const be = composite.exteriorWidth.of(bi, o);
    recorder?.step(composite.exteriorWidth, be, bi, o);
    return be;
  }

  /** Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1. */
  #checkFlexure(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { depthIn: d, webThicknessIn: tw, flangeThicknessIn: tf } = shape;
    const { thicknessIn: ts, haunchIn: th } = this.#slab;
    const plastic = this.#plastic;
    recorder?.topic("flexure");
    plasticMoment(shape, this.#slab as Slab, Fy, this.#fc, plastic, recorder);
    const { momentKipFt: Mp, depthIn: Dp } = plastic;
    const beta = composite.ductilityBeta(Fy);
    const Dpr = composite.ductilityDepth.of(beta, d, ts, th);
    recorder?.step(composite.ductilityDepth, Dpr, beta, d, ts, th);
    const lw = composite.plasticWebSlenderness.of(plastic.webInCompressionIn, tw);
    recorder?.step(composite.plasticWebSlenderness, lw, plastic.webInCompressionIn, tw);
    const lwp = compactWebLimit.of(Fy);
    recorder?.step(compactWebLimit, lwp, Fy);
    const lwAll = webSlenderness.of(webDepth.of(d, tf), tw);
    const compact = lw <= lwp;
    let capacity = Mp;
    if (!compact || Dp > Dpr) {
      const My = this.#yieldMoment(shape, Fy, recorder);
      capacity = My;
      if (compact) {
        capacity = composite.reducedPlasticMoment.of(Mp, My, Dp, Dpr);
        recorder?.step(composite.reducedPlasticMoment, capacity, Mp, My, Dp, Dpr);
      }
    }
    if (Dp > DUCTILITY_LIMIT * Dpr || lwAll > NONCOMPACT_WEB_LIMIT) capacity = 0;
    recorder?.note("composite-route", compact ? (Dp > Dpr ? "reduced" : "plastic") : "first-yield", plastic.place);
    this.check(index, "flexure", this.effects.Mu, capacity, "kip-ft", "10.50.1.1", recorder);
    if (compact && lwAll <= NONCOMPACT_WEB_LIMIT) this.check(index, "web-slenderness", lw, lwp, "-", "10.50.1.1.2", recorder);
    else this.check(index, "web-slenderness", lwAll, NONCOMPACT_WEB_LIMIT, "-", "10.50.1.2", recorder);
    this.check(index, "bracing", 0, this.diaphragmsIn, "in", "10.50", recorder);
    this.check(index, "ductility", Dp, DUCTILITY_LIMIT * Dpr, "in", "10.50.1.1.2", recorder);
  }

  /** Factored stage moments on their sections until the first flange yields, kip-ft. */
  #yieldMoment({ sectionModulusXIn3: Sx }: Shape, Fy: number, recorder: AssessmentRecorder | null): number {
    const { M1, M2, Mw } = this.effects;
    const Mf1 = GAMMA * M1;
    const Mf2 = GAMMA * (M2 + Mw);
    recorder?.value("Mf1", Mf1, "kip-ft", "1.3 times stage 1");
    recorder?.value("Mf2", Mf2, "kip-ft", "1.3 times stage 2 and wearing surface");
    const [long, short] = [this.#long, this.#short];
    let Ma = composite.additionalBottom.of(Fy, Mf1, Sx, Mf2, long.bottomIn3, short.bottomIn3);
    recorder?.step(composite.additionalBottom, Ma, Fy, Mf1, Sx, Mf2, long.bottomIn3, short.bottomIn3);
    if (short.topIn3 > 0) {
      const St3n = long.topIn3 > 0 ? long.topIn3 : Number.POSITIVE_INFINITY;
      const Mat = composite.additionalTop.of(Fy, Mf1, Sx, Mf2, St3n, short.topIn3);
      recorder?.step(composite.additionalTop, Mat, Fy, Mf1, Sx, Mf2, St3n, short.topIn3);
      Ma = Math.min(Ma, Mat);
    }
    const My = composite.yieldMoment.of(Mf1, Mf2, Ma);
    recorder?.step(composite.yieldMoment, My, Mf1, Mf2, Ma);
    return My;
  }

  /** Staged stress in either flange. Source: AASHTO Standard Specifications, 17th ed., Art. 10.57.2. */
  #checkOverload(index: number, { shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder | null): void {
    const { M1, M2, Mw, overloadLive: fL } = this.effects;
    const Sx = shape.sectionModulusXIn3;
    const lasting = M2 + Mw;
    recorder?.topic("overload");
    recorder?.value("M2w", lasting, "kip-ft", "stage 2 and wearing surface");
    recorder?.value("fL", fL, "kip-ft", "live moment times its overload factor: 5/3, or 2.20 of one lane where Group IA governs");
    const fb = composite.bottomStress.of(M1, Sx, lasting, this.#long.bottomIn3, fL, this.#short.bottomIn3);
    recorder?.step(composite.bottomStress, fb, M1, Sx, lasting, this.#long.bottomIn3, fL, this.#short.bottomIn3);
    const ft3n = topStressKsi(lasting, this.#long.topIn3);
    const ftn = topStressKsi(fL, this.#short.topIn3);
    recorder?.value("ft3n", ft3n, "ksi", "top of the steel, lasting load; 0 where it would be tension");
    recorder?.value("ftn", ftn, "ksi", "top of the steel, live load; 0 where it would be tension");
    const ft = composite.topStress.of(M1, Sx, ft3n, ftn);
    recorder?.step(composite.topStress, ft, M1, Sx, ft3n, ftn);
    const Fo = composite.compositeOverloadLimit.of(Fy);
    recorder?.step(composite.compositeOverloadLimit, Fo, Fy);
    this.check(index, "overload", Math.max(fb, ft), Fo, "ksi", "10.57.2", recorder);
  }

  protected override adviseDepth(index: number, shape: Shape, recorder: AssessmentRecorder | null): void {
    const { spanFt: L } = this.design.bridge;
    const whole = shape.depthIn + this.#slab.haunchIn + this.#ts;
    const hmin = composite.leastWholeDepth.of(L);
    recorder?.step(composite.leastWholeDepth, hmin, L);
    const dmin = composite.leastSteelDepth.of(L);
    recorder?.step(composite.leastSteelDepth, dmin, L);
    const steelGoverns = dmin / shape.depthIn > hmin / whole;
    this.check(index, "depth", steelGoverns ? dmin : hmin, steelGoverns ? shape.depthIn : whole, "in", "10.5.2", recorder);
  }

  /** Studs by strength. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.5.1.2. */
  #recordStuds({ shape, fyKsi: Fy }: Steel, recorder: AssessmentRecorder): void {
    const { diameterIn: ds, perRow } = this.design.bridge.studs;
    const fc = this.#fc;
    recorder.topic("studs");
    const Ps = slabForce.of(fc, this.#slab.widthIn, this.#ts);
    const P = steelForce.of(shape.areaIn2, Fy);
    const Pst = composite.studForce.of(Ps, P);
    recorder.step(composite.studForce, Pst, Ps, P);
    const Ec = composite.concreteModulus.of(fc);
    recorder.step(composite.concreteModulus, Ec, fc);
    const Su = composite.studStrength.of(ds, fc, Ec);
    recorder.step(composite.studStrength, Su, ds, fc, Ec);
    const N1 = composite.studCount.of(Pst, Su);
    recorder.step(composite.studCount, N1, Pst, Su);
    recorder.studs("10.38.5.1.2", Pst, Su, N1, perRow);
  }
}
