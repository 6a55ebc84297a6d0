import type { Shape } from "../../catalogue/shape.js";
import { formula, type Recorder } from "../../formula.js";

/** Clear depth of web between flanges. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1.1 (D). */
export const webDepth = formula("D", "d - 2 * tf", "in", "10.48.1.1", ["d", "tf"], (d: number, tf: number) => d - 2 * tf);
/** Projecting flange over its thickness. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1.1. */
export const flangeSlenderness = formula("lf", "bf / (2 * tf)", "-", "10.48.1.1", ["bf", "tf"], (bf: number, tf: number) => bf / (2 * tf));
/** Web depth over its thickness. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1.1. */
export const webSlenderness = formula("lw", "D / tw", "-", "10.48.1.1", ["D", "tw"], (D: number, tw: number) => D / tw);

/** Compact limits. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1.1(a), (b). */
export const compactFlangeLimit = formula("lfp", "65.0 / sqrt(Fy)", "-", "10.48.1.1(a)", ["Fy"], (Fy: number) => 65 / Math.sqrt(Fy));
export const compactWebLimit = formula("lwp", "608 / sqrt(Fy)", "-", "10.48.1.1(b)", ["Fy"], (Fy: number) => 608 / Math.sqrt(Fy));
/** Flange and web together, when both exceed 75 % of their limits. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1.1(b). */
export const interaction = formula("lint", "lw + 9.35 * lf", "-", "10.48.1.1(b)", ["lw", "lf"], (lw: number, lf: number) => lw + 9.35 * lf);
export const interactionLimit = formula("lintp", "1064 / sqrt(Fy)", "-", "10.48.1.1(b)", ["Fy"], (Fy: number) => 1064 / Math.sqrt(Fy));
/** Unbraced length of a compact section under the moment at midspan, M1/Mu = 1. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1.1(c). */
export const compactBracing = formula(
  "Lpc",
  "(3600 - 2200 * 1) * ry / Fy",
  "in",
  "10.48.1.1(c)",
  ["ry", "Fy"],
  (ry: number, Fy: number) => ((3600 - 2200) * ry) / Fy,
);
/** Unbraced length of a braced noncompact section. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.2.1(c). */
export const noncompactBracing = formula(
  "Lpn",
  "20000 * bf * tf / (Fy * d)",
  "in",
  "10.48.2.1(c)",
  ["bf", "tf", "Fy", "d"],
  (bf: number, tf: number, Fy: number, d: number) => (20000 * bf * tf) / (Fy * d),
);

/** Capacity of a compact section. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1. */
export const compactMoment = formula("Mcap", "Fy * Zx / 12", "kip-ft", "10.48.1", ["Fy", "Zx"], (Fy: number, Zx: number) => (Fy * Zx) / 12);
/** Flange buckling stress. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.2. */
export const flangeStress = formula("Fcr", "min(Fy, (69.6 / lf)^2)", "ksi", "10.48.2", ["Fy", "lf"], (Fy: number, lf: number) =>
  Math.min(Fy, (69.6 / lf) ** 2),
);
/** Capacity of a braced noncompact section. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.2. */
export const noncompactMoment = formula(
  "Mcap",
  "Fcr * Sx / 12",
  "kip-ft",
  "10.48.2",
  ["Fcr", "Sx"],
  (Fcr: number, Sx: number) => (Fcr * Sx) / 12,
);
/** Inertia of the compression flange about the web's plane. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.4.1. */
export const flangeInertia = formula(
  "Iyc",
  "tf * bf^3 / 12",
  "in4",
  "10.48.4.1",
  ["tf", "bf"],
  (tf: number, bf: number) => (tf * bf ** 3) / 12,
);
/**
 * Lateral torsional buckling moment of a partially braced section, at most first yield. Cb = 1 and Rb = 1.
 * Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.4.1.
 */
export const partiallyBracedMoment = formula(
  "Mr",
  "min(Fy * Sx, 91000 * Cb * Iyc / Lb * sqrt(0.772 * J / Iyc + 9.87 * (d / Lb)^2)) / 12",
  "kip-ft",
  "10.48.4.1",
  ["Fy", "Sx", "Cb", "Iyc", "Lb", "J", "d"],
  (Fy: number, Sx: number, Cb: number, Iyc: number, Lb: number, J: number, d: number) =>
    Math.min(Fy * Sx, ((91000 * Cb * Iyc) / Lb) * Math.sqrt((0.772 * J) / Iyc + 9.87 * (d / Lb) ** 2)) / 12,
);
/** The lesser of lateral and flange buckling. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.4. */
export const partiallyBracedCapacity = formula(
  "Mcap",
  "min(Mr, Fcr * Sx / 12)",
  "kip-ft",
  "10.48.4",
  ["Mr", "Fcr", "Sx"],
  (Mr: number, Fcr: number, Sx: number) => Math.min(Mr, (Fcr * Sx) / 12),
);

/** Widest flange and thinnest web of a shape without web stiffeners. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.2.1(a), (b). */
export const NONCOMPACT_FLANGE_LIMIT = 12;
export const NONCOMPACT_WEB_LIMIT = 150;
/** Rb = 1 while D/(2 tw) <= 487/sqrt(Fy) (value from memory). Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.4.1. */
const RB_CONSTANT = 487;
/** Moment gradient factor at midspan. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.4.1. */
const CB_MIDSPAN = 1;

/** The rule by which a noncomposite section's capacity is found. */
export type FlexureRoute = "compact" | "noncompact" | "partially-braced";

/** Capacity in flexure of a bare shape and what it was found from. One object is used again and again. */
export interface FlexureCapacity {
  route: FlexureRoute;
  /** Mu of the route, kip-ft; 0 where the section lies outside every rule here. */
  capacityKipFt: number;
  flangeSlenderness: number;
  webSlenderness: number;
  flangeLimit: number;
  webLimit: number;
  /** D/tw + 9.35 bf/2tf; it can only bind when both exceed 75 % of their limits. */
  interaction: number;
  interactionLimit: number;
  /** Greatest unbraced length of the route, in; Infinity on the partially braced route, whose capacity takes the length in. */
  bracingLimitIn: number;
  article: string;
}

/** A fresh capacity to be filled. */
export function newFlexureCapacity(): FlexureCapacity {
  return {
    route: "compact",
    capacityKipFt: 0,
    flangeSlenderness: 0,
    webSlenderness: 0,
    flangeLimit: 0,
    webLimit: 0,
    interaction: 0,
    interactionLimit: 0,
    bracingLimitIn: 0,
    article: "",
  };
}

/**
 * Capacity in flexure of a noncomposite shape: compact, else braced noncompact, else partially braced.
 *
 * @param shape rolled I-shape
 * @param Fy yield stress, ksi
 * @param unbracedLengthIn between brace points of the compression flange, in; 0 when it is held
 * @param out filled with the result
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1, 10.48.2, 10.48.4; the straight line that 10.48.3 allows between
 * compact and noncompact is not used (conservative).
 */
export function flexureCapacity(shape: Shape, Fy: number, unbracedLengthIn: number, out: FlexureCapacity, recorder: Recorder | null): void {
  const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, webThicknessIn: tw } = shape;
  const { sectionModulusXIn3: Sx, plasticModulusXIn3: Zx, radiusYIn: ry } = shape;
  const D = webDepth.of(d, tf);
  recorder?.step(webDepth, D, d, tf);
  const lf = flangeSlenderness.of(bf, tf);
  recorder?.step(flangeSlenderness, lf, bf, tf);
  const lw = webSlenderness.of(D, tw);
  recorder?.step(webSlenderness, lw, D, tw);
  const lfp = compactFlangeLimit.of(Fy);
  recorder?.step(compactFlangeLimit, lfp, Fy);
  const lwp = compactWebLimit.of(Fy);
  recorder?.step(compactWebLimit, lwp, Fy);
  out.flangeSlenderness = lf;
  out.webSlenderness = lw;
  out.interaction = interaction.of(lw, lf);
  recorder?.step(interaction, out.interaction, lw, lf);
  out.interactionLimit = interactionLimit.of(Fy);
  recorder?.step(interactionLimit, out.interactionLimit, Fy);
  const interacting = lf > 0.75 * lfp && lw > 0.75 * lwp;
  const Lpc = compactBracing.of(ry, Fy);
  recorder?.step(compactBracing, Lpc, ry, Fy);
  if (lf <= lfp && lw <= lwp && (!interacting || out.interaction <= out.interactionLimit) && unbracedLengthIn <= Lpc) {
    out.route = "compact";
    out.article = "10.48.1";
    out.flangeLimit = lfp;
    out.webLimit = lwp;
    out.bracingLimitIn = Lpc;
    out.capacityKipFt = compactMoment.of(Fy, Zx);
    recorder?.step(compactMoment, out.capacityKipFt, Fy, Zx);
    return;
  }
  out.flangeLimit = NONCOMPACT_FLANGE_LIMIT;
  out.webLimit = NONCOMPACT_WEB_LIMIT;
  const Fcr = flangeStress.of(Fy, lf);
  const Lpn = noncompactBracing.of(bf, tf, Fy, d);
  recorder?.step(noncompactBracing, Lpn, bf, tf, Fy, d);
  recorder?.step(flangeStress, Fcr, Fy, lf);
  if (unbracedLengthIn <= Lpn) {
    out.route = "noncompact";
    out.article = "10.48.2";
    out.bracingLimitIn = Lpn;
    out.capacityKipFt = noncompactMoment.of(Fcr, Sx);
    recorder?.step(noncompactMoment, out.capacityKipFt, Fcr, Sx);
  } else {
    out.route = "partially-braced";
    out.article = "10.48.4";
    out.bracingLimitIn = Number.POSITIVE_INFINITY;
    out.capacityKipFt = partiallyBraced(shape, Fy, Fcr, lw, unbracedLengthIn, recorder);
  }
  if (lf > NONCOMPACT_FLANGE_LIMIT || lw > NONCOMPACT_WEB_LIMIT) out.capacityKipFt = 0;
}

/**
 * Capacity of a bare shape braced at a given length, never above first yield: min(Mr, Fcr S), kip-ft; 0 outside the rule's range.
 *
 * @param Fcr flange buckling stress, ksi
 * @param lw D/tw
 * @param Lb unbraced length, in; > 0
 * Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.4.
 */
export function partiallyBraced(shape: Shape, Fy: number, Fcr: number, lw: number, Lb: number, recorder: Recorder | null): number {
  const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, sectionModulusXIn3: Sx, torsionJIn4: J } = shape;
  if (lw / 2 > RB_CONSTANT / Math.sqrt(Fy)) return 0;
  const Iyc = flangeInertia.of(tf, bf);
  recorder?.step(flangeInertia, Iyc, tf, bf);
  const Mr = partiallyBracedMoment.of(Fy, Sx, CB_MIDSPAN, Iyc, Lb, J, d);
  recorder?.step(partiallyBracedMoment, Mr, Fy, Sx, CB_MIDSPAN, Iyc, Lb, J, d);
  const capacity = partiallyBracedCapacity.of(Mr, Fcr, Sx);
  recorder?.step(partiallyBracedCapacity, capacity, Mr, Fcr, Sx);
  return capacity;
}

/** Z required of a compact shape. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.1. */
export const requiredZ = formula("Zreq", "12 * Mu / Fy", "in3", "10.48.1", ["Mu", "Fy"], (Mu: number, Fy: number) => (12 * Mu) / Fy);
