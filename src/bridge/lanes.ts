/** Width of a traffic lane on which lanes are counted, ft. */
const LANE_WIDTH_FT = 12;
/** Narrowest roadway that carries two lanes, ft. */
const TWO_LANES_FROM_FT = 20;
/** Narrowest lane that the user may ask for, and the narrowest roadway, ft. */
export const NARROWEST_LANE_FT = 10;
const WHOLE = 1e-9;

/**
 * Number of design traffic lanes on a clear roadway.
 *
 * @param roadwayFt curb to curb, ft; >= 10
 * @returns INT(w/12); two from 20 ft to below 24 ft; one from 10 ft to below 20 ft
 * @throws {RangeError} if roadwayFt is not finite or is below 10
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.6; LRFD 9th ed., Art. 3.6.1.1.1.
 */
export function designLanes(roadwayFt: number): number {
  if (!(roadwayFt >= NARROWEST_LANE_FT && roadwayFt < Number.POSITIVE_INFINITY)) {
    throw new RangeError(`roadwayFt must be at least ${NARROWEST_LANE_FT}, got ${roadwayFt}`);
  }
  if (roadwayFt < TWO_LANES_FROM_FT - WHOLE) return 1;
  return Math.max(2, Math.floor(roadwayFt / LANE_WIDTH_FT + WHOLE));
}

/** The most lanes a user may ask for: INT(w/10). */
export function mostLanes(roadwayFt: number): number {
  return Math.floor(roadwayFt / NARROWEST_LANE_FT + WHOLE);
}

/**
 * Roadway at which the lane count next goes up, ft.
 *
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.6.
 */
export function nextLaneStepFt(roadwayFt: number): number {
  const lanes = designLanes(roadwayFt);
  return lanes === 1 ? TWO_LANES_FROM_FT : (lanes + 1) * LANE_WIDTH_FT;
}
