import type { Bridge } from "../bridge/bridge.js";
import type { Steel } from "../bridge/yield-stress.js";
import type { Shape } from "../catalogue/shape.js";
import { reducedShape } from "../section/reduced-shape.js";

/** Why a shape of the list is not offered at all. */
export interface LeftOut {
  readonly shape: string;
  readonly line: number;
  /** `too-deep`: a depth limit of the bridge; the others are limits of the stock. */
  readonly code: "too-deep" | "too-short" | "too-few" | "nothing-left";
  /** What is needed and what there is: depths in, lengths ft, or pieces. */
  readonly needed: number;
  readonly there: number;
}

/** Length of one piece, ft: the span and what stands over at either end. */
export function pieceLengthFt({ spanFt, pieceOverlapFt }: Bridge): number {
  return spanFt + 2 * pieceOverlapFt;
}

/**
 * Whether the stock has pieces of a shape long enough and as many as the fewest stringers that are asked for.
 *
 * @param fewest fewest stringers of any layout; null for one interior stringer
 * @returns the limit in the way, or null
 */
export function stockLimit(bridge: Bridge, shape: Shape, fewest: number | null): LeftOut | null {
  const { stock, designation, source } = shape;
  if (stock === null) return null;
  const named = { shape: designation, line: source.line };
  const piece = pieceLengthFt(bridge);
  if (stock.usableLengthFt !== null && stock.usableLengthFt < piece - 1e-9) {
    return { ...named, code: "too-short", needed: piece, there: stock.usableLengthFt };
  }
  const needed = fewest ?? 1;
  if (stock.quantity !== null && stock.quantity < needed) return { ...named, code: "too-few", needed, there: stock.quantity };
  return null;
}

/** The shape with as many pieces as anybody wants, of any length. */
export function withoutLimits(shape: Shape): Shape {
  return shape.stock === null ? shape : { ...shape, stock: { ...shape.stock, quantity: null, usableLengthFt: null } };
}

/** The steel with its losses taken off, or null when no sound plate is left. */
export function withLosses(steel: Steel): Steel | null {
  const { stock } = steel.shape;
  const loss = { flangeLossIn: stock?.flangeLossIn ?? 0, webLossIn: stock?.webLossIn ?? 0 };
  if (loss.flangeLossIn === 0 && loss.webLossIn === 0) return steel;
  const figures = reducedShape(steel.shape, loss);
  return figures === null ? null : { ...steel, shape: { ...steel.shape, ...figures } };
}

/** Price of the steel per foot of bridge; null when the row gives no price. */
export function costPerFtOfBridge({ shape }: Pick<Steel, "shape">, count: number | null): number | null {
  const price = shape.stock?.pricePerLb ?? null;
  return price === null ? null : price * shape.weightPlf * (count ?? 1);
}
