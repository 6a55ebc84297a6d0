import type { ShapeFigures } from "../catalogue/shape.js";
import { formula, type Recorder } from "../formula.js";
import type { Slab } from "./composite.js";

/** Plastic moment of a composite section and where its axis lies. One object is used again and again. */
export interface PlasticSection {
  place: "slab" | "flange" | "web";
  /** Mp, kip-ft. */
  momentKipFt: number;
  /** Plastic neutral axis below the top of the slab, Dp, in. */
  depthIn: number;
  /** Web in compression at Mp, Dcp, in; 0 unless the axis lies in the web. */
  webInCompressionIn: number;
}

/** A fresh section to be filled. */
export function newPlasticSection(): PlasticSection {
  return { place: "slab", momentKipFt: 0, depthIn: 0, webInCompressionIn: 0 };
}

const SOURCE = "10.50.1.1.1; LRFD D6.1";

/** Greatest force of the slab. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.1; LRFD 9th ed., Art. D6.1. */
export const slabForce = formula(
  "Ps",
  "0.85 * fc * be * ts",
  "kip",
  SOURCE,
  ["fc", "be", "ts"],
  (fc: number, be: number, ts: number) => 0.85 * fc * be * ts,
);
/** Force of the whole shape. Source: as above. */
export const steelForce = formula("P", "A * Fy", "kip", SOURCE, ["A", "Fy"], (A: number, Fy: number) => A * Fy);
/** Force of one flange. Source: as above. */
export const flangeForce = formula(
  "Pf",
  "Fy * bf * tf",
  "kip",
  SOURCE,
  ["Fy", "bf", "tf"],
  (Fy: number, bf: number, tf: number) => Fy * bf * tf,
);
/** Force of the web with the fillets spread over it. Source: as above; statics. */
export const webForce = formula("Pw", "P - 2 * Pf", "kip", SOURCE, ["P", "Pf"], (P: number, Pf: number) => P - 2 * Pf);

/** Axis in the slab. Source: as above. */
export const axisInSlab = formula(
  "Dp",
  "ts * P / Ps",
  "in",
  SOURCE,
  ["ts", "P", "Ps"],
  (ts: number, P: number, Ps: number) => (ts * P) / Ps,
);
export const momentSlab = formula(
  "Mp",
  "P * (d / 2 + th + ts - Dp / 2) / 12",
  "kip-ft",
  SOURCE,
  ["P", "d", "th", "ts", "Dp"],
  (P: number, d: number, th: number, ts: number, Dp: number) => (P * (d / 2 + th + ts - Dp / 2)) / 12,
);
/** Axis below the top of the flange. Source: as above. */
export const axisInFlange = formula(
  "yf",
  "(P - Ps) / 2 / (Fy * bf)",
  "in",
  SOURCE,
  ["P", "Ps", "Fy", "bf"],
  (P: number, Ps: number, Fy: number, bf: number) => (P - Ps) / 2 / (Fy * bf),
);
export const momentFlange = formula(
  "Mp",
  "(Ps * (yf + th + ts / 2) + Fy * bf * (yf^2 + (tf - yf)^2) / 2 + Pw * (d / 2 - yf) + Pf * (d - yf - tf / 2)) / 12",
  "kip-ft",
  SOURCE,
  ["Ps", "yf", "th", "ts", "Fy", "bf", "tf", "Pw", "d", "Pf"],
  (Ps: number, yf: number, th: number, ts: number, Fy: number, bf: number, tf: number, Pw: number, d: number, Pf: number) =>
    (Ps * (yf + th + ts / 2) + (Fy * bf * (yf ** 2 + (tf - yf) ** 2)) / 2 + Pw * (d / 2 - yf) + Pf * (d - yf - tf / 2)) / 12,
);
/** Axis below the top of the web: Dcp. Source: as above. */
export const axisInWeb = formula(
  "Dcp",
  "((P - Ps) / 2 - Pf) / Pw * D",
  "in",
  SOURCE,
  ["P", "Ps", "Pf", "Pw", "D"],
  (P: number, Ps: number, Pf: number, Pw: number, D: number) => (((P - Ps) / 2 - Pf) / Pw) * D,
);
export const momentWeb = formula(
  "Mp",
  "(Ps * (Dcp + tf + th + ts / 2) + Pf * (D + tf) + Pw / D * (Dcp^2 + (D - Dcp)^2) / 2) / 12",
  "kip-ft",
  SOURCE,
  ["Ps", "Dcp", "tf", "th", "ts", "Pf", "D", "Pw"],
  (Ps: number, Dcp: number, tf: number, th: number, ts: number, Pf: number, D: number, Pw: number) =>
    (Ps * (Dcp + tf + th + ts / 2) + Pf * (D + tf) + ((Pw / D) * (Dcp ** 2 + (D - Dcp) ** 2)) / 2) / 12,
);

/**
 * Plastic moment of a shape under a slab in compression: slab at 0.85 f'c, steel at Fy, the fillets' area spread over the web,
 * reinforcement left out.
 *
 * @param Fy yield stress, ksi
 * @param fc concrete strength, ksi
 * @param out filled with the result
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.1; LRFD 9th ed., Art. D6.1.
 */
export function plasticMoment(
  shape: ShapeFigures,
  slab: Slab,
  Fy: number,
  fc: number,
  out: PlasticSection,
  recorder: Recorder | null,
): void {
  const { areaIn2: A, depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf } = shape;
  const { widthIn: be, thicknessIn: ts, haunchIn: th } = slab;
  const D = d - 2 * tf;
  const Ps = slabForce.of(fc, be, ts);
  recorder?.step(slabForce, Ps, fc, be, ts);
  const P = steelForce.of(A, Fy);
  recorder?.step(steelForce, P, A, Fy);
  if (Ps >= P) {
    out.place = "slab";
    out.depthIn = axisInSlab.of(ts, P, Ps);
    recorder?.step(axisInSlab, out.depthIn, ts, P, Ps);
    out.webInCompressionIn = 0;
    out.momentKipFt = momentSlab.of(P, d, th, ts, out.depthIn);
    recorder?.step(momentSlab, out.momentKipFt, P, d, th, ts, out.depthIn);
    return;
  }
  const Pf = flangeForce.of(Fy, bf, tf);
  recorder?.step(flangeForce, Pf, Fy, bf, tf);
  const Pw = webForce.of(P, Pf);
  recorder?.step(webForce, Pw, P, Pf);
  if ((P - Ps) / 2 <= Pf) {
    const yf = axisInFlange.of(P, Ps, Fy, bf);
    recorder?.step(axisInFlange, yf, P, Ps, Fy, bf);
    out.place = "flange";
    out.depthIn = ts + th + yf;
    out.webInCompressionIn = 0;
    out.momentKipFt = momentFlange.of(Ps, yf, th, ts, Fy, bf, tf, Pw, d, Pf);
    recorder?.step(momentFlange, out.momentKipFt, Ps, yf, th, ts, Fy, bf, tf, Pw, d, Pf);
  } else {
    const Dcp = axisInWeb.of(P, Ps, Pf, Pw, D);
    recorder?.step(axisInWeb, Dcp, P, Ps, Pf, Pw, D);
    out.place = "web";
    out.depthIn = ts + th + tf + Dcp;
    out.webInCompressionIn = Dcp;
    out.momentKipFt = momentWeb.of(Ps, Dcp, tf, th, ts, Pf, D, Pw);
    recorder?.step(momentWeb, out.momentKipFt, Ps, Dcp, tf, th, ts, Pf, D, Pw);
  }
  recorder?.value("Dp", out.depthIn, "in", `plastic neutral axis in the ${out.place}, below the top of the slab`);
}
