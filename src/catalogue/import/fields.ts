import type { COLUMNS, STOCK_COLUMNS } from "../columns.js";
import type { Quantity } from "./units.js";

/** A column a list may have: our own names, and the radius of the fillet, from which k follows. */
export type Field =
  | (typeof COLUMNS)[number]["name"]
  | (typeof STOCK_COLUMNS)[number]["name"]
  | "designation"
  | "yieldStressKsi"
  | "place"
  | "filletRadiusIn";

/** What each field measures. Lengths of pieces come out in inches and are turned to feet where they are used. */
export const QUANTITY: Readonly<Record<Field, Quantity>> = {
  designation: "text",
  place: "text",
  weightPlf: "weight",
  areaIn2: "area",
  depthIn: "length",
  flangeWidthIn: "length",
  webThicknessIn: "length",
  flangeThicknessIn: "length",
  kDesignIn: "length",
  filletRadiusIn: "length",
  inertiaXIn4: "inertia",
  sectionModulusXIn3: "modulus",
  radiusXIn: "length",
  plasticModulusXIn3: "modulus",
  inertiaYIn4: "inertia",
  sectionModulusYIn3: "modulus",
  radiusYIn: "length",
  plasticModulusYIn3: "modulus",
  torsionJIn4: "inertia",
  warpingCwIn6: "warping",
  flangeSlenderness: "number",
  webSlenderness: "number",
  yieldStressKsi: "stress",
  yearBuilt: "number",
  quantity: "number",
  usableLengthFt: "length",
  pricePerLb: "price",
  flangeLossIn: "length",
  webLossIn: "length",
};

/** The four dimensions no list can do without. */
export const DIMENSIONS = ["depthIn", "flangeWidthIn", "webThicknessIn", "flangeThicknessIn"] as const;
export type Dimension = (typeof DIMENSIONS)[number];

/** Fields that follow from the dimensions, and so are compared with them. */
export const PROPERTIES = [
  "weightPlf",
  "areaIn2",
  "inertiaXIn4",
  "sectionModulusXIn3",
  "radiusXIn",
  "plasticModulusXIn3",
  "inertiaYIn4",
  "sectionModulusYIn3",
  "radiusYIn",
  "plasticModulusYIn3",
  "torsionJIn4",
  "warpingCwIn6",
  "flangeSlenderness",
  "webSlenderness",
] as const;
export type Property = (typeof PROPERTIES)[number];

/** Fields that tell of the pieces and their steel, not of the shape. */
export const STOCK_FIELDS = [
  "yieldStressKsi",
  "yearBuilt",
  "quantity",
  "usableLengthFt",
  "pricePerLb",
  "place",
  "flangeLossIn",
  "webLossIn",
] as const;

export const isProperty = (field: Field): field is Property => (PROPERTIES as readonly string[]).includes(field);
export const isDimension = (field: Field): field is Dimension => (DIMENSIONS as readonly string[]).includes(field);
export const isStock = (field: Field): boolean => (STOCK_FIELDS as readonly string[]).includes(field);
