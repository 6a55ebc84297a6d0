import type { Bridge } from "../bridge/bridge.js";
import type { Layout } from "../bridge/layouts.js";

/** Trucks side by side tried for one interior stringer when nobody said how wide the bridge is. */
const TRUCKS_ON_UNKNOWN_WIDTH = 4;

/** Trucks side by side at most: as many as lanes, or 4 for two lanes or more on a bridge of unknown width. Source: our choice (conservative). */
export function mostTrucks({ deck, liveLoad }: Bridge): number {
  return deck.outToOutFt === null && liveLoad.lanes >= 2 ? TRUCKS_ON_UNKNOWN_WIDTH : liveLoad.lanes;
}

/**
 * de: web of the exterior stringer to the curb face, ft; positive when the web stands inside the curb, null for one interior stringer.
 *
 * Source: AASHTO LRFD, 9th ed., Art. 4.6.2.2.1; statics.
 */
export function curbInsideFt({ deck, roadwayFt }: Bridge, { overhangFt }: Layout): number | null {
  if (overhangFt === null || deck.outToOutFt === null || roadwayFt === null) return null;
  return overhangFt - (deck.outToOutFt - roadwayFt) / 2;
}
