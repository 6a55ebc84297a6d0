// Highway structures handbook, live-load deflection of a simple span under the HS20 truck in its maximum-moment place:
// 324 P_T (L^3 - 555 L + 4780)/(E I), in, with P_T the front axle, 8 kip, L ft, spans from 35 ft. From memory; statics agrees within
// 0.05 %. The true maximum at midspan is larger: 2.3 % at 40 ft, 0.9 % at 60 ft, 0.3 % at 100 ft.
//
// Deflection sizes long slender stringers: taken with the truck where the moment is greatest it comes out too small on short spans.
import { describe, expect, it } from "vitest";
import { greatestDeflectionAt } from "../../src/loads/axle-train.js";
import { laneEffects } from "../../src/loads/live-load.js";
import { IN3_PER_FT3 } from "../../src/units.js";
import { StiffnessBeam } from "../support/direct-stiffness.js";
import { rounding } from "../support/published.js";
import { placed, trainOf, usersVehicle } from "../support/vehicles.js";

const FRONT_AXLE_KIP = 8;
const truck = trainOf("HS20-44");
/** E I times the deflection, kip-in3; E I in kip-in2. */
const published = (L: number): number => 324 * FRONT_AXLE_KIP * (L ** 3 - 555 * L + 4780);

describe("truck in its maximum-moment place (from memory)", () => {
  // The middle axle stands half of its distance from the resultant, 14/3 ft, short of midspan.
  it.each([35, 40, 45, 50, 60, 75, 90, 100, 120])("%f ft, within 0.05 %", (L) => {
    const inPlace = new StiffnessBeam(L, [L / 2]).under(placed(truck, 1, L / 2 - 14 / 3 / 2)).deflectionAt(L / 2);
    expect(Math.abs((inPlace * IN3_PER_FT3) / published(L) - 1)).toBeLessThanOrEqual(0.0005);
  });
});

describe("the true maximum at midspan (from memory)", () => {
  it.each([
    [40, 2.3],
    [60, 0.9],
    [100, 0.3],
  ])("%f ft: %f % more", (L, percent) => {
    const more = ((greatestDeflectionAt(truck, L, L / 2) * IN3_PER_FT3) / published(L) - 1) * 100;
    expect(Math.abs(more - percent)).toBeLessThanOrEqual(rounding(1));
  });

  it("is what the lane effects hand on", () => {
    const alone = usersVehicle({ name: "Truck alone", axlesKip: truck.axlesKip, spacingsFt: truck.spacingsFt });
    for (const L of [40, 60, 100]) {
      expect(laneEffects(alone, L).midspanDeflectionKipFt3).toBe(greatestDeflectionAt(truck, L, L / 2));
    }
  });
});
