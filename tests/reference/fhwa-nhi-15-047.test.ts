// FHWA NHI-15-047, Load and Resistance Factor Design for Highway Bridge Superstructures, 4.4.2.2.2.2: lever rule for an exterior girder,
// S = 12 ft, one lane: 0.750 lanes, 0.900 with the multiple presence factor 1.20. Seen; de = 2.0 ft is inferred from the figures.
//
// Our function counts wheel lines, two to a lane: half of it must be the published lanes, or lanes and wheel lines have been mixed up.
import { describe, expect, it } from "vitest";
import { leverRuleExterior } from "../../src/specs/lever-rule.js";
import { leverExterior } from "../../src/specs/lfd/distribution.js";
import { rounding } from "../support/published.js";

const WHEEL_LINES_PER_LANE = 2;
const [S, de] = [12, 2];

describe("lever rule, exterior girder, one lane (seen)", () => {
  it("0.750 lanes, which are 1.5 wheel lines", () => {
    // One truck: wheels 2 and 8 ft from the curb.
    const { factor, distancesFt } = leverExterior(S, de, 1);
    expect(factor).toBeCloseTo(1.5, 12);
    expect(Math.abs(factor / WHEEL_LINES_PER_LANE - 0.75)).toBeLessThanOrEqual(rounding(3));
    expect(distancesFt).toEqual([2, 8]);
  });

  it("0.900 lanes with 1.20", () => {
    const { factor } = leverRuleExterior(S, de, 1, () => 1.2);
    expect(Math.abs(factor / WHEEL_LINES_PER_LANE - 0.9)).toBeLessThanOrEqual(rounding(3));
  });
});
