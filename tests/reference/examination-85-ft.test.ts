// Worked solution of a professional engineering examination, quoted in an engineers' forum (seen): simple span 85 ft, stringers at
// 8.5 ft, two lanes, concrete deck, HS20: I = 0.24, factor 1.55, table 1254.7/2, live moment 1206 kip-ft with these rounded factors,
// 1200.4 without rounding them.
//
// The whole chain from table to stringer in one line: half axles, S/5.5 and impact each in their place, or the figure is far off.
import { describe, expect, it } from "vitest";
import { check } from "../../src/answers/check.js";
import { impactFraction } from "../../src/loads/formulas.js";
import { laneEffects } from "../../src/loads/live-load.js";
import { spacingOverDivisor } from "../../src/specs/lfd/distribution.js";
import { liveMoment } from "../../src/specs/lfd/load-factors.js";
import { rounding } from "../support/published.js";
import { preparedOf } from "../support/question.js";
import { shipped } from "../support/vehicles.js";

const L = 85;
const S = 8.5;
const TABLE_KIP_FT = 1254.7;
/** Within which exact statics agrees with the table of the Standard Specifications, kip-ft. */
const TABLE_TOLERANCE_KIP_FT = 0.15;
const [impact, factor] = [impactFraction.of(L), spacingOverDivisor.of(S, 5.5)];

describe("85 ft, two lanes (seen)", () => {
  it("impact 0.24 and factor 1.55", () => {
    expect(Math.abs(impact - 0.24)).toBeLessThanOrEqual(rounding(2));
    expect(Math.abs(factor - 1.55)).toBeLessThanOrEqual(rounding(2));
  });

  it("table 1254.7 kip-ft", () => {
    expect(Math.abs(laneEffects(shipped("HS20-44"), L).momentKipFt - TABLE_KIP_FT)).toBeLessThanOrEqual(TABLE_TOLERANCE_KIP_FT);
  });

  it("live moment: 1206 by the rounded factors, 1200.4 by the unrounded", () => {
    expect(Math.abs(liveMoment.of(TABLE_KIP_FT, 1.55, 0.24) - 1206)).toBeLessThanOrEqual(rounding(0));
    expect(Math.abs(liveMoment.of(TABLE_KIP_FT, factor, impact) - 1200.4)).toBeLessThanOrEqual(rounding(1));
  });

  it("the program's own interior stringer carries that moment", () => {
    const bridge = { specification: "lfd", "deck.composite": false, spanFt: L, "stringers.spacingFt": S, "deck.thicknessIn": 8.5 };
    const [{ position, effects }] = check(preparedOf(bridge), "W40X297").assessment.stringers;
    expect(position).toBe("interior");
    expect(effects).toMatchObject({ impact, distributionMoment: factor, distributionPer: "wheel line" });
    // The table's tolerance goes through the same factors.
    const tolerance = (TABLE_TOLERANCE_KIP_FT / 2) * (8.5 / 5.5) * (1 + 50 / 210) + rounding(1);
    expect(Math.abs(effects.liveMomentKipFt - 1200.4)).toBeLessThanOrEqual(tolerance);
  });
});
