import type { ShapeFigures } from "./shape.js";

/** A numeric column of a shape list in our own format: its name carries its unit. */
export interface Column {
  readonly name: keyof ShapeFigures;
  /** Least and greatest figure accepted; far wider than any rolled shape, so that only slips fall outside. */
  readonly min: number;
  readonly max: number;
}

/** Numeric columns of a shape list, in the order in which they are written. */
export const COLUMNS: readonly Column[] = [
  { name: "weightPlf", min: 1, max: 2000 },
  { name: "areaIn2", min: 0.3, max: 600 },
  { name: "depthIn", min: 2, max: 80 },
  { name: "flangeWidthIn", min: 1, max: 40 },
  { name: "webThicknessIn", min: 0.05, max: 8 },
  { name: "flangeThicknessIn", min: 0.05, max: 10 },
  { name: "kDesignIn", min: 0.05, max: 12 },
  { name: "inertiaXIn4", min: 0.5, max: 500000 },
  { name: "sectionModulusXIn3", min: 0.5, max: 20000 },
  { name: "radiusXIn", min: 0.3, max: 40 },
  { name: "plasticModulusXIn3", min: 0.5, max: 20000 },
  { name: "inertiaYIn4", min: 0.05, max: 50000 },
  { name: "sectionModulusYIn3", min: 0.05, max: 5000 },
  { name: "radiusYIn", min: 0.1, max: 20 },
  { name: "plasticModulusYIn3", min: 0.05, max: 5000 },
  { name: "torsionJIn4", min: 0.0005, max: 20000 },
  { name: "warpingCwIn6", min: 0.05, max: 20000000 },
  { name: "flangeSlenderness", min: 0.5, max: 40 },
  { name: "webSlenderness", min: 1, max: 300 },
];

/** Column of the shape's name. */
export const DESIGNATION_COLUMN = "designation";
/** Optional column: the yield stress of the row's own steel, ksi. */
export const YIELD_COLUMN = { name: "yieldStressKsi", min: 20, max: 70 } as const;

/** Optional numeric columns of a yard's own list. */
export const STOCK_COLUMNS = [
  { name: "yearBuilt", min: 1850, max: 2100, whole: true },
  { name: "quantity", min: 0, max: 1000000, whole: true },
  { name: "usableLengthFt", min: 1, max: 400, whole: false },
  { name: "pricePerLb", min: 0.0001, max: 1000, whole: false },
  { name: "flangeLossIn", min: 0, max: 5, whole: false },
  { name: "webLossIn", min: 0, max: 5, whole: false },
] as const;
/** Optional text column: where the pieces lie, or a note. */
export const PLACE_COLUMN = "place";
