import type { ShapeFigures } from "../../catalogue/shape.js";
import { formula, type Recorder } from "../../formula.js";
import { STEEL_MODULUS_KSI } from "../../units.js";

const E = STEEL_MODULUS_KSI;

/** Clear web. Source: AASHTO LRFD, 9th ed., Art. 6.10.2.1. */
export const webDepth = formula("D", "d - 2 * tf", "in", "6.10.2.1", ["d", "tf"], (d: number, tf: number) => d - 2 * tf);
export const webSlenderness = formula("lw", "D / tw", "-", "6.10.2.1", ["D", "tw"], (D: number, tw: number) => D / tw);
export const flangeSlenderness = formula("lf", "bf / (2 * tf)", "-", "6.10.2.2", ["bf", "tf"], (bf: number, tf: number) => bf / (2 * tf));
/** Proportions, each as required over provided. Source: AASHTO LRFD, 9th ed., Art. 6.10.2.1.1, 6.10.2.2. */
export const WEB_PROPORTION = 150;
export const FLANGE_PROPORTION = 12;

/** Web in compression that stays compact under a composite slab. Source: AASHTO LRFD, 9th ed., Art. 6.10.6.2.2. */
export const compactWebLimit = formula(
  "lwp",
  "3.76 * sqrt(E / Fy)",
  "-",
  "6.10.6.2.2",
  ["E", "Fy"],
  (modulus: number, Fy: number) => 3.76 * Math.sqrt(modulus / Fy),
);
/** Noncompact web. Source: AASHTO LRFD, 9th ed., Art. 6.10.6.2.3, A6.1. */
export const noncompactWebLimit = formula(
  "lrw",
  "5.7 * sqrt(E / Fy)",
  "-",
  "6.10.6.2.3",
  ["E", "Fy"],
  (modulus: number, Fy: number) => 5.7 * Math.sqrt(modulus / Fy),
);

/** First-yield and plastic moment of the bare shape, kip-in. Source: AASHTO LRFD, 9th ed., Art. A6.2. */
export const yieldMomentBare = formula("Myc", "Fy * Sx", "kip-in", "A6.2", ["Fy", "Sx"], (Fy: number, Sx: number) => Fy * Sx);
export const plasticMomentBare = formula("Mpb", "Fy * Zx", "kip-in", "A6.2", ["Fy", "Zx"], (Fy: number, Zx: number) => Fy * Zx);
/** Web that lets the plastic moment develop. Source: AASHTO LRFD, 9th ed., Art. A6.2.1. */
export const plasticWebLimit = formula(
  "lpw",
  "min(5.7 * sqrt(E / Fy), sqrt(E / Fy) / (0.54 * Mpb / Myc - 0.09)^2)",
  "-",
  "A6.2.1",
  ["E", "Fy", "Mpb", "Myc"],
  (modulus: number, Fy: number, Mpb: number, Myc: number) =>
    Math.min(5.7 * Math.sqrt(modulus / Fy), Math.sqrt(modulus / Fy) / ((0.54 * Mpb) / Myc - 0.09) ** 2),
);
/** Web plastification factor, compact web. Source: AASHTO LRFD, 9th ed., Art. A6.2.1. */
export const plastificationCompact = formula("Rpc", "Mpb / Myc", "-", "A6.2.1", ["Mpb", "Myc"], (Mpb: number, Myc: number) => Mpb / Myc);
/** The same, noncompact web. Source: AASHTO LRFD, 9th ed., Art. A6.2.2. */
export const plastificationNoncompact = formula(
  "Rpc",
  "(1 - (1 - Myc / Mpb) * (lw - lpw) / (lrw - lpw)) * Mpb / Myc",
  "-",
  "A6.2.2",
  ["Myc", "Mpb", "lw", "lpw", "lrw"],
  (Myc: number, Mpb: number, lw: number, lpw: number, lrw: number) => ((1 - ((1 - Myc / Mpb) * (lw - lpw)) / (lrw - lpw)) * Mpb) / Myc,
);

/** Flange limits. Source: AASHTO LRFD, 9th ed., Art. A6.3.2; kc = 0.76 of rolled shapes. */
export const compactFlangeLimit = formula(
  "lpf",
  "0.38 * sqrt(E / Fy)",
  "-",
  "A6.3.2",
  ["E", "Fy"],
  (modulus: number, Fy: number) => 0.38 * Math.sqrt(modulus / Fy),
);
export const noncompactFlangeLimit = formula(
  "lrf",
  "0.95 * sqrt(0.76 * E / Fyr)",
  "-",
  "A6.3.2",
  ["E", "Fyr"],
  (modulus: number, Fyr: number) => 0.95 * Math.sqrt((0.76 * modulus) / Fyr),
);
/** Stress at which yielding begins with residual stress. Source: AASHTO LRFD, 9th ed., Art. A6.3.2. */
export const residualYield = formula("Fyr", "0.7 * Fy", "ksi", "A6.3.2", ["Fy"], (Fy: number) => 0.7 * Fy);
/** Capacity that the web alone limits. Source: AASHTO LRFD, 9th ed., Art. A6.3.1. */
export const fullMoment = formula("Mmax", "Rpc * Myc", "kip-in", "A6.3", ["Rpc", "Myc"], (Rpc: number, Myc: number) => Rpc * Myc);
/** Straight line of flange buckling. Source: AASHTO LRFD, 9th ed., Art. A6.3.2. */
export const flangeBuckling = formula(
  "Mflb",
  "(1 - (1 - Fyr * Sx / Mmax) * (lf - lpf) / (lrf - lpf)) * Mmax",
  "kip-in",
  "A6.3.2",
  ["Fyr", "Sx", "Mmax", "lf", "lpf", "lrf"],
  (Fyr: number, Sx: number, Mmax: number, lf: number, lpf: number, lrf: number) =>
    (1 - ((1 - (Fyr * Sx) / Mmax) * (lf - lpf)) / (lrf - lpf)) * Mmax,
);

/** Radius of gyration of the flange and a third of the web in compression. Source: AASHTO LRFD, 9th ed., Art. A6.3.3. */
export const torsionalRadius = formula(
  "rt",
  "bf / sqrt(12 * (1 + D / 2 * tw / (3 * bf * tf)))",
  "in",
  "A6.3.3",
  ["bf", "D", "tw", "tf"],
  (bf: number, D: number, tw: number, tf: number) => bf / Math.sqrt(12 * (1 + ((D / 2) * tw) / (3 * bf * tf))),
);
export const plasticLength = formula(
  "Lp",
  "rt * sqrt(E / Fy)",
  "in",
  "A6.3.3",
  ["rt", "E", "Fy"],
  (rt: number, modulus: number, Fy: number) => rt * Math.sqrt(modulus / Fy),
);
export const elasticLength = formula(
  "Lr",
  "1.95 * rt * E / Fyr * sqrt(J / (Sx * h)) * sqrt(1 + sqrt(1 + 6.76 * (Fyr * Sx * h / (E * J))^2))",
  "in",
  "A6.3.3",
  ["rt", "E", "Fyr", "J", "Sx", "h"],
  (rt: number, modulus: number, Fyr: number, J: number, Sx: number, h: number) =>
    ((1.95 * rt * modulus) / Fyr) * Math.sqrt(J / (Sx * h)) * Math.sqrt(1 + Math.sqrt(1 + 6.76 * ((Fyr * Sx * h) / (modulus * J)) ** 2)),
);
/** Straight line of lateral torsional buckling, Cb = 1.0 at midspan. Source: AASHTO LRFD, 9th ed., Art. A6.3.3. */
export const inelasticBuckling = formula(
  "Mltb",
  "(1 - (1 - Fyr * Sx / Mmax) * (Lb - Lp) / (Lr - Lp)) * Mmax",
  "kip-in",
  "A6.3.3",
  ["Fyr", "Sx", "Mmax", "Lb", "Lp", "Lr"],
  (Fyr: number, Sx: number, Mmax: number, Lb: number, Lp: number, Lr: number) =>
    (1 - ((1 - (Fyr * Sx) / Mmax) * (Lb - Lp)) / (Lr - Lp)) * Mmax,
);
/** Elastic lateral torsional buckling, Cb = 1.0, at most Rpc Myc. Source: AASHTO LRFD, 9th ed., Art. A6.3.3. */
export const elasticBuckling = formula(
  "Mltb",
  "min(Mmax, pi^2 * E / (Lb / rt)^2 * sqrt(1 + 0.078 * J / (Sx * h) * (Lb / rt)^2) * Sx)",
  "kip-in",
  "A6.3.3",
  ["Mmax", "E", "Lb", "rt", "J", "Sx", "h"],
  (Mmax: number, modulus: number, Lb: number, rt: number, J: number, Sx: number, h: number) =>
    Math.min(Mmax, ((Math.PI ** 2 * modulus) / (Lb / rt) ** 2) * Math.sqrt(1 + ((0.078 * J) / (Sx * h)) * (Lb / rt) ** 2) * Sx),
);

/** Capacity of a bare shape by Appendix A6. One object is used again and again. */
export interface BareCapacity {
  /** Rpc Myc, the lesser of flange and lateral buckling, kip-in; 0 outside the rules. */
  momentKipIn: number;
  /** Lateral torsional buckling alone, kip-in; 0 outside the rules. */
  lateralKipIn: number;
  flangeSlenderness: number;
  webSlenderness: number;
  flangeLimit: number;
  webLimit: number;
  /** Lp within it, Lr between, Infinity beyond, in. */
  bracingLimitIn: number;
}

/** A fresh capacity to be filled. */
export const newBareCapacity = (): BareCapacity => ({
  momentKipIn: 0,
  lateralKipIn: 0,
  flangeSlenderness: 0,
  webSlenderness: 0,
  flangeLimit: 0,
  webLimit: 0,
  bracingLimitIn: 0,
});

/**
 * Capacity in flexure of a bare shape.
 *
 * @param Fy yield stress, ksi
 * @param Lb unbraced length, in; 0 when the flange is held, and then only the web limits it
 * @param out filled with the result
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO LRFD, 9th ed., Appendix A6.
 */
export function bareCapacity(shape: ShapeFigures, Fy: number, Lb: number, out: BareCapacity, recorder: Recorder | null): void {
  const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, webThicknessIn: tw, torsionJIn4: J } = shape;
  const { sectionModulusXIn3: Sx, plasticModulusXIn3: Zx } = shape;
  const D = webDepth.of(d, tf);
  recorder?.step(webDepth, D, d, tf);
  const lw = webSlenderness.of(D, tw);
  recorder?.step(webSlenderness, lw, D, tw);
  const lf = flangeSlenderness.of(bf, tf);
  recorder?.step(flangeSlenderness, lf, bf, tf);
  const Mmax = webLimitedMoment(Fy, Sx, Zx, lw, out, recorder);
  const lpf = compactFlangeLimit.of(E, Fy);
  recorder?.step(compactFlangeLimit, lpf, E, Fy);
  out.flangeSlenderness = lf;
  out.webSlenderness = lw;
  out.flangeLimit = lf <= lpf ? lpf : FLANGE_PROPORTION;
  out.bracingLimitIn = 0;
  let capacity = Mmax;
  let lateral = Mmax;
  if (Lb > 0) {
    const Fyr = residualYield.of(Fy);
    recorder?.step(residualYield, Fyr, Fy);
    if (lf > lpf) {
      const lrf = noncompactFlangeLimit.of(E, Fyr);
      recorder?.step(noncompactFlangeLimit, lrf, E, Fyr);
      capacity = flangeBuckling.of(Fyr, Sx, Mmax, lf, lpf, lrf);
      recorder?.step(flangeBuckling, capacity, Fyr, Sx, Mmax, lf, lpf, lrf);
    }
    lateral = lateralBuckling({ D, bf, tf, tw, J, Sx, h: d - tf }, Fy, Fyr, Mmax, Lb, out, recorder);
    capacity = Math.min(capacity, lateral);
  }
  const sound = lw <= WEB_PROPORTION && lf <= FLANGE_PROPORTION && lw <= noncompactWebLimit.of(E, Fy);
  out.momentKipIn = sound ? capacity : 0;
  out.lateralKipIn = sound ? lateral : 0;
}

/** Rpc Myc, kip-in. Source: AASHTO LRFD, 9th ed., Art. A6.2. */
function webLimitedMoment(Fy: number, Sx: number, Zx: number, lw: number, out: BareCapacity, recorder: Recorder | null): number {
  const Myc = yieldMomentBare.of(Fy, Sx);
  recorder?.step(yieldMomentBare, Myc, Fy, Sx);
  const Mpb = plasticMomentBare.of(Fy, Zx);
  recorder?.step(plasticMomentBare, Mpb, Fy, Zx);
  const lpw = plasticWebLimit.of(E, Fy, Mpb, Myc);
  recorder?.step(plasticWebLimit, lpw, E, Fy, Mpb, Myc);
  const lrw = noncompactWebLimit.of(E, Fy);
  recorder?.step(noncompactWebLimit, lrw, E, Fy);
  let Rpc: number;
  if (lw <= lpw) {
    Rpc = plastificationCompact.of(Mpb, Myc);
    recorder?.step(plastificationCompact, Rpc, Mpb, Myc);
  } else {
    Rpc = plastificationNoncompact.of(Myc, Mpb, lw, lpw, lrw);
    recorder?.step(plastificationNoncompact, Rpc, Myc, Mpb, lw, lpw, lrw);
  }
  out.webLimit = lw <= lpw ? lpw : lrw;
  const Mmax = fullMoment.of(Rpc, Myc);
  recorder?.step(fullMoment, Mmax, Rpc, Myc);
  return Mmax;
}

interface FlangeAndWeb {
  readonly D: number;
  readonly bf: number;
  readonly tf: number;
  readonly tw: number;
  readonly J: number;
  readonly Sx: number;
  readonly h: number;
}

/** Source: AASHTO LRFD, 9th ed., Art. A6.3.3. */
function lateralBuckling(
  { D, bf, tf, tw, J, Sx, h }: FlangeAndWeb,
  Fy: number,
  Fyr: number,
  Mmax: number,
  Lb: number,
  out: BareCapacity,
  recorder: Recorder | null,
): number {
  recorder?.value("h", h, "in", "between the centroids of the flanges");
  const rt = torsionalRadius.of(bf, D, tw, tf);
  recorder?.step(torsionalRadius, rt, bf, D, tw, tf);
  const Lp = plasticLength.of(rt, E, Fy);
  recorder?.step(plasticLength, Lp, rt, E, Fy);
  out.bracingLimitIn = Lp;
  if (Lb <= Lp) return Mmax;
  const Lr = elasticLength.of(rt, E, Fyr, J, Sx, h);
  recorder?.step(elasticLength, Lr, rt, E, Fyr, J, Sx, h);
  if (Lb <= Lr) {
    out.bracingLimitIn = Lr;
    const moment = inelasticBuckling.of(Fyr, Sx, Mmax, Lb, Lp, Lr);
    recorder?.step(inelasticBuckling, moment, Fyr, Sx, Mmax, Lb, Lp, Lr);
    return moment;
  }
  out.bracingLimitIn = Number.POSITIVE_INFINITY;
  const moment = elasticBuckling.of(Mmax, E, Lb, rt, J, Sx, h);
  recorder?.step(elasticBuckling, moment, Mmax, E, Lb, rt, J, Sx, h);
  return moment;
}

/** Composite section that stays ductile. Source: AASHTO LRFD, 9th ed., Art. 6.10.7.1.2. */
export const compositeReduced = formula(
  "Mn",
  "Mp * (1.07 - 0.7 * Dp / Dt)",
  "kip-ft",
  "6.10.7.1.2",
  ["Mp", "Dp", "Dt"],
  (Mp: number, Dp: number, Dt: number) => Mp * (1.07 - (0.7 * Dp) / Dt),
);
/** Whole depth. Source: AASHTO LRFD, 9th ed., Art. 6.10.7.1.2. */
export const wholeDepth = formula(
  "Dt",
  "d + th + ts",
  "in",
  "6.10.7.1.2",
  ["d", "th", "ts"],
  (d: number, th: number, ts: number) => d + th + ts,
);
/** Greatest depth of the plastic neutral axis. Source: AASHTO LRFD, 9th ed., Art. 6.10.7.3. */
export const ductilityLimit = formula("Dlim", "0.42 * Dt", "in", "6.10.7.3", ["Dt"], (Dt: number) => 0.42 * Dt);
export const plasticWebSlenderness = formula(
  "lwc",
  "2 * Dcp / tw",
  "-",
  "6.10.6.2.2",
  ["Dcp", "tw"],
  (Dcp: number, tw: number) => (2 * Dcp) / tw,
);
