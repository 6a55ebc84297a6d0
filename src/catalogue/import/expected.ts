import { IN2_PER_FT2, UNIT_WEIGHT_PCF } from "../../units.js";
import { propertiesFromDimensions } from "../from-dimensions.js";
import type { Property } from "./fields.js";

/** Plates of a row, in; the fillet's radius r is k - tf. */
export interface Plates {
  readonly depthIn: number;
  readonly flangeWidthIn: number;
  readonly webThicknessIn: number;
  readonly flangeThicknessIn: number;
  readonly filletRadiusIn: number;
}

/** Weight of steel, lb/ft for each in2. Source: 490 lb/ft3. */
export const PLF_PER_IN2 = UNIT_WEIGHT_PCF.steel / IN2_PER_FT2;

/**
 * What the plates make of every property, in our units.
 *
 * @throws {RangeError} where they make no I-shape
 */
export function expectedOf(plates: Plates): Readonly<Record<Property, number>> {
  const { depthIn, flangeWidthIn, webThicknessIn, flangeThicknessIn, filletRadiusIn } = plates;
  const kDesignIn = flangeThicknessIn + filletRadiusIn;
  const properties = propertiesFromDimensions({ depthIn, flangeWidthIn, webThicknessIn, flangeThicknessIn, kDesignIn });
  return {
    ...properties,
    weightPlf: properties.areaIn2 * PLF_PER_IN2,
    flangeSlenderness: flangeWidthIn / (2 * flangeThicknessIn),
    webSlenderness: (depthIn - 2 * kDesignIn) / webThicknessIn,
  };
}

/** The same, or null where the plates make no I-shape. */
export function expectedOrNull(plates: Plates): Readonly<Record<Property, number>> | null {
  try {
    return expectedOf(plates);
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}

/** Largest fillet a rolled shape may have, in: 33 mm, or 2.8 times the flange's thickness (the lightest shapes). Source: common practice. */
export function largestFilletIn(flangeThicknessIn: number): number {
  return Math.min(1.3, 2.8 * flangeThicknessIn);
}

/**
 * Radius of the fillets that an area leaves for them.
 *
 * @param areaIn2 the whole area
 * @param sharp the plates with a fillet of 0
 * @returns in; 0 where the plates alone are as large, at most the largest of a rolled shape
 * Source: statics (four spandrels of (1 - pi/4) r^2).
 */
export function filletOfAreaIn(areaIn2: number, sharp: Plates): number {
  const { depthIn, flangeWidthIn, webThicknessIn, flangeThicknessIn } = sharp;
  const room = Math.min(depthIn / 2 - flangeThicknessIn, (flangeWidthIn - webThicknessIn) / 2, largestFilletIn(flangeThicknessIn));
  return Math.min(room, Math.sqrt(Math.max(0, areaIn2 - areaOfPlates(sharp)) / (4 - Math.PI)));
}

/** Area of the three plates without fillets, in2. Source: statics. */
export function areaOfPlates({ depthIn, flangeWidthIn, webThicknessIn, flangeThicknessIn }: Plates): number {
  return 2 * flangeWidthIn * flangeThicknessIn + (depthIn - 2 * flangeThicknessIn) * webThicknessIn;
}
