// The lane count picks the column of the distribution table, the trucks of the lever rule and the deflection: a roadway of exactly 20
// or 24 ft put on the wrong side of its step is a lane of trucks too few on the bridge.
// Steps: AASHTO Standard Specifications, 17th ed., Art. 3.6; LRFD 9th ed., Art. 3.6.1.1.1 (seen).
import { describe, expect, it } from "vitest";
import { designLanes, mostLanes, nextLaneStepFt } from "../../../src/bridge/lanes.js";

describe("design lanes of a roadway", () => {
  it.each([
    [10, 1],
    [12, 1],
    [19.99, 1],
    [20, 2],
    [23.99, 2],
    [24, 2],
    [35.99, 2],
    [36, 3],
    [47.99, 3],
    [48, 4],
    [60, 5],
  ])("%f ft: %i", (roadwayFt, lanes) => {
    expect(designLanes(roadwayFt)).toBe(lanes);
  });

  it.each([
    [64.6, 2.3],
    [65.6, 2.8],
  ])("%f ft less two barriers of %f ft counts as the 60 ft it is, though binary numbers leave it short", (widthFt, baseFt) => {
    expect(widthFt - 2 * baseFt).toBeLessThan(60);
    expect(designLanes(widthFt - 2 * baseFt)).toBe(5);
  });

  it.each([9.99, 0, -24, Number.NaN, Number.POSITIVE_INFINITY])("refuses %f ft", (roadwayFt) => {
    expect(() => designLanes(roadwayFt)).toThrow(RangeError);
  });
});

describe("the most lanes a user may ask for", () => {
  it.each([
    [10, 1],
    [19.99, 1],
    [20, 2],
    [29.99, 2],
    [30, 3],
    [48, 4],
  ])("%f ft: INT(w/10) = %i", (roadwayFt, lanes) => {
    expect(mostLanes(roadwayFt)).toBe(lanes);
  });
});

describe("where the next lane comes", () => {
  it.each([
    [10, 20],
    [19.99, 20],
    [20, 36],
    [24, 36],
    [35.99, 36],
    [36, 48],
    [48, 60],
  ])("%f ft: at %f ft", (roadwayFt, next) => {
    expect(nextLaneStepFt(roadwayFt)).toBe(next);
    expect(designLanes(next)).toBe(designLanes(roadwayFt) + 1);
    expect(designLanes(next - 0.001)).toBe(designLanes(roadwayFt));
  });
});
