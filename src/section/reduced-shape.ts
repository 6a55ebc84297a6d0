import { propertiesFromDimensions } from "../catalogue/from-dimensions.js";
import type { ShapeFigures } from "../catalogue/shape.js";

/** Thickness lost by corrosion, in: from the outer face of each flange, and from the web (both faces together). */
export interface ThicknessLoss {
  readonly flangeLossIn: number;
  readonly webLossIn: number;
}

/**
 * What is left of a shape after corrosion: every property recomputed from the reduced plates, tabulated properties not used.
 *
 * The flanges lose their outer faces, so the depth shrinks too (conservative); the fillets stay; the weight stays, for the load of the
 * lost steel is small and leaving it in is safe.
 *
 * @param loss thickness lost, in; each 0 or more
 * @returns figures of the reduced shape; null when no sound plate is left
 * Source: statics; the place of the loss is our choice.
 */
export function reducedShape(shape: ShapeFigures, loss: ThicknessLoss): ShapeFigures | null {
  const { flangeLossIn, webLossIn } = loss;
  const dimensions = {
    depthIn: shape.depthIn - 2 * flangeLossIn,
    flangeWidthIn: shape.flangeWidthIn,
    webThicknessIn: shape.webThicknessIn - webLossIn,
    flangeThicknessIn: shape.flangeThicknessIn - flangeLossIn,
    kDesignIn: shape.kDesignIn - flangeLossIn,
  };
  if (!(dimensions.webThicknessIn > 0 && dimensions.flangeThicknessIn > 0)) return null;
  const properties = propertiesFromDimensions(dimensions);
  return {
    ...shape,
    ...dimensions,
    ...properties,
    flangeSlenderness: dimensions.flangeWidthIn / (2 * dimensions.flangeThicknessIn),
    webSlenderness: (dimensions.depthIn - 2 * dimensions.kDesignIn) / dimensions.webThicknessIn,
  };
}
