import type { ShapeFigures } from "../catalogue/shape.js";
import { formula, type Recorder, renamed } from "../formula.js";

/** A concrete slab over a steel shape, of equal strains with it. All lengths in inches. */
export interface Slab {
  /** Effective width be, in. */
  readonly widthIn: number;
  /** Structural thickness ts, wearing allowance left out, in. */
  readonly thicknessIn: number;
  /** Haunch between flange and slab counted in section properties, in; its own concrete counts nowhere. */
  readonly haunchIn: number;
}

/** Elastic properties of a transformed section, in steel. One object is used again and again. */
export interface TransformedSection {
  /** Neutral axis above the bottom of the steel, in. */
  axisIn: number;
  inertiaIn4: number;
  /** Section modulus at the bottom of the steel, in3. */
  bottomIn3: number;
  /** Section modulus at the top of the steel, in3; Infinity or negative when the axis lies at or above it: that flange is then in tension. */
  topIn3: number;
  /** First moment of the transformed slab about the axis, in3. */
  slabMomentIn3: number;
}

/** A fresh section to be filled. */
export function newTransformedSection(): TransformedSection {
  return { axisIn: 0, inertiaIn4: 0, bottomIn3: 0, topIn3: 0, slabMomentIn3: 0 };
}

/** Neutral axis above the bottom of the steel. Source: statics. */
export const transformedAxis = formula(
  "y",
  "(A * d / 2 + be * ts / n * (d + th + ts / 2)) / (A + be * ts / n)",
  "in",
  "statics",
  ["A", "d", "be", "ts", "n", "th"],
  (A: number, d: number, be: number, ts: number, n: number, th: number) => {
    const slab = (be * ts) / n;
    return ((A * d) / 2 + slab * (d + th + ts / 2)) / (A + slab);
  },
);
/** Moment of inertia of the transformed section. Source: statics. */
export const transformedInertia = formula(
  "I",
  "Ix + A * (y - d / 2)^2 + be * ts^3 / (12 * n) + be * ts / n * (d + th + ts / 2 - y)^2",
  "in4",
  "statics",
  ["Ix", "A", "y", "d", "be", "ts", "n", "th"],
  (Ix: number, A: number, y: number, d: number, be: number, ts: number, n: number, th: number) =>
    Ix + A * (y - d / 2) ** 2 + (be * ts ** 3) / (12 * n) + ((be * ts) / n) * (d + th + ts / 2 - y) ** 2,
);
/** Section modulus at the bottom of the steel. Source: statics. */
export const bottomModulus = formula("Sb", "I / y", "in3", "statics", ["I", "y"], (I: number, y: number) => I / y);
/** Section modulus at the top of the steel; negative when that flange is in tension. Source: statics. */
export const topModulus = formula("St", "I / (d - y)", "in3", "statics", ["I", "d", "y"], (I: number, d: number, y: number) => I / (d - y));
/** First moment of the slab about the axis. Source: statics. */
export const slabMoment = formula(
  "Q",
  "be * ts / n * (d + th + ts / 2 - y)",
  "in3",
  "statics",
  ["be", "ts", "n", "d", "th", "y"],
  (be: number, ts: number, n: number, d: number, th: number, y: number) => ((be * ts) / n) * (d + th + ts / 2 - y),
);

/**
 * Elastic properties of shape and slab together, the whole slab counted wherever the axis lies.
 *
 * @param n modular ratio, steel to concrete; > 0 (3n for lasting load)
 * @param mark put behind the symbols in the record, "n" or "3n"
 * @param out filled with the result
 * @param recorder writes the steps down; null in the search
 * Source: statics; AASHTO Standard Specifications, 17th ed., Art. 10.38.1; LRFD 9th ed., Art. 6.10.1.1.1b.
 */
export function transformed(
  shape: ShapeFigures,
  slab: Slab,
  n: number,
  mark: "n" | "3n",
  out: TransformedSection,
  recorder: Recorder | null,
): void {
  const { areaIn2: A, depthIn: d, inertiaXIn4: Ix } = shape;
  const { widthIn: be, thicknessIn: ts, haunchIn: th } = slab;
  const y = transformedAxis.of(A, d, be, ts, n, th);
  const I = transformedInertia.of(Ix, A, y, d, be, ts, n, th);
  out.axisIn = y;
  out.inertiaIn4 = I;
  out.bottomIn3 = bottomModulus.of(I, y);
  out.topIn3 = topModulus.of(I, d, y);
  out.slabMomentIn3 = slabMoment.of(be, ts, n, d, th, y);
  if (recorder === null) return;
  const names = { n: mark === "n" ? "n" : "n3", y: `y${mark}`, I: `I${mark}` };
  recorder.value("th", th, "in", "haunch in section properties");
  recorder.value(names.n, n, "-", mark === "n" ? "modular ratio, live load" : "three times the modular ratio, lasting load");
  recorder.step(renamed(transformedAxis, names.y, names), y, A, d, be, ts, n, th);
  recorder.step(renamed(transformedInertia, names.I, names), I, Ix, A, y, d, be, ts, n, th);
  recorder.step(renamed(bottomModulus, `Sb${mark}`, names), out.bottomIn3, I, y);
  recorder.step(renamed(topModulus, `St${mark}`, names), out.topIn3, I, d, y);
}

/**
 * Stress at the top of the steel from a moment on a transformed section, ksi, compression positive.
 *
 * A flange in tension under the load adds nothing.
 *
 * @param momentKipFt sagging moment, kip-ft
 * @param topIn3 section modulus at the top of the steel, in3
 * Source: statics.
 */
export function topStressKsi(momentKipFt: number, topIn3: number): number {
  return topIn3 > 0 ? (12 * momentKipFt) / topIn3 : 0;
}

/**
 * How much the whole slab overstates the section modulus at the bottom of the steel when the neutral axis lies in the slab.
 *
 * The slab below the axis is in tension. Its part is found anew with the compressed depth alone: its first moment balances that of the
 * steel, so a depth c solves be c^2 / (2 n) = A (d / 2 + th + ts - c) measured from the top of the slab.
 *
 * @param n modular ratio; > 0
 * @returns 0 when the axis lies below the slab; else the overstated part, such as 0.04 for 4 %
 * Source: statics.
 */
export function slabTensionShare(shape: ShapeFigures, slab: Slab, n: number, whole: TransformedSection): number {
  const { areaIn2: A, depthIn: d, inertiaXIn4: Ix } = shape;
  const { widthIn: be, thicknessIn: ts, haunchIn: th } = slab;
  if (whole.axisIn <= d + th) return 0;
  const steelBelowTop = d / 2 + th + ts;
  const width = be / n;
  const c = (-A + Math.sqrt(A * A + 2 * width * A * steelBelowTop)) / width;
  const inertia = Ix + A * (steelBelowTop - c) ** 2 + (width * c ** 3) / 3;
  const bottom = inertia / (d + th + ts - c);
  return whole.bottomIn3 / bottom - 1;
}
