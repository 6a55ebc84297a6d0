import { COLUMNS } from "../../src/catalogue/columns.js";
import type { Shape } from "../../src/catalogue/shape.js";
import { CATALOGUE } from "./question.js";

/** A shape of the shipped catalogue. */
export function shapeNamed(designation: string): Shape {
  const shape = CATALOGUE.find((candidate) => candidate.designation === designation);
  if (shape === undefined) throw new Error(`${designation} is not in the catalogue`);
  return shape;
}

/** Plates of an invented I-shape, in, without fillets. */
export interface Plates {
  readonly d: number;
  readonly bf: number;
  readonly tf: number;
  readonly tw: number;
}

/** An invented I-shape of three plates, its properties by statics; J by thin plates. */
export function invented({ d, bf, tf, tw }: Plates, change: Partial<Shape> = {}): Shape {
  const D = d - 2 * tf;
  const A = 2 * bf * tf + D * tw;
  const Ix = (bf * d ** 3 - (bf - tw) * D ** 3) / 12;
  const Iy = (2 * tf * bf ** 3 + D * tw ** 3) / 12;
  return {
    designation: `P${d}X${bf}`,
    stock: null,
    weightPlf: (A * 490) / 144,
    areaIn2: A,
    depthIn: d,
    flangeWidthIn: bf,
    webThicknessIn: tw,
    flangeThicknessIn: tf,
    kDesignIn: tf,
    inertiaXIn4: Ix,
    sectionModulusXIn3: Ix / (d / 2),
    radiusXIn: Math.sqrt(Ix / A),
    plasticModulusXIn3: bf * tf * (d - tf) + (tw * D ** 2) / 4,
    inertiaYIn4: Iy,
    sectionModulusYIn3: Iy / (bf / 2),
    radiusYIn: Math.sqrt(Iy / A),
    plasticModulusYIn3: (tf * bf ** 2) / 2 + (D * tw ** 2) / 4,
    torsionJIn4: (2 * bf * tf ** 3 + D * tw ** 3) / 3,
    warpingCwIn6: (Iy * (d - tf) ** 2) / 4,
    flangeSlenderness: bf / (2 * tf),
    webSlenderness: D / tw,
    yieldStressKsi: null,
    source: { file: "invented.csv", line: 2 },
    bundled: false,
    ...change,
  };
}

/** A list of shapes as CSV text in our columns; `extra` columns come last. */
export function listText(shapes: readonly Shape[], extra: Readonly<Record<string, (shape: Shape) => string>> = {}): string {
  const header = ["designation", ...COLUMNS.map(({ name }) => name), ...Object.keys(extra)];
  const rows = shapes.map((shape) => [
    shape.designation,
    ...COLUMNS.map(({ name }) => String(shape[name])),
    ...Object.values(extra).map((of) => of(shape)),
  ]);
  return [header, ...rows].map((cells) => cells.join(",")).join("\n");
}
