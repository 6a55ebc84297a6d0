// Beyond the tables the lever rule alone says how much of a truck one stringer carries. A worse place of the wheels left untried is live
// load left out, on the exterior stringer of every bridge.
import { describe, expect, it } from "vitest";
import { leverExteriorFormula, leverInteriorFormula, leverRuleExterior, leverRuleInterior } from "../../../src/specs/lever-rule.js";
import { laneReduction } from "../../../src/specs/lfd/distribution.js";
import { exteriorShare, interiorShare, searchedWheelLines } from "../../support/wheel-search.js";

/** Every place of the first wheel, ft; spacings and distances below are whole multiples, so that no best place falls between. */
const STEP = 0.05;
const SPACINGS = [2.5, 3.5, 4, 4.75, 5.5, 6, 6.05, 7.25, 8, 9.95, 10, 10.05, 12, 14, 14.05, 17.5, 20];
const TRUCKS = [1, 2, 3, 4, 5];

/** Gaps between neighbouring trucks: all 4 ft, and some of them wider. */
const gapsOf = (trucks: number): number[][] => {
  const closest = new Array<number>(trucks - 1).fill(4);
  const wider = closest.flatMap((_, place) => [4.5, 6, 8, 13].map((gap) => closest.map((own, other) => (other === place ? gap : own))));
  return [closest, ...wider];
};

describe("interior stringer", () => {
  it.each(SPACINGS)("S = %f ft: no place of 1 to 5 trucks is worse", (S) => {
    let searched = 0;
    for (const mostTrucks of TRUCKS) {
      for (const gaps of gapsOf(mostTrucks)) {
        const reach = S + 10 * mostTrucks + 15;
        searched = Math.max(searched, laneReduction(mostTrucks) * searchedWheelLines(interiorShare(S), gaps, -reach, S, STEP));
      }
      expect(leverRuleInterior(S, mostTrucks, laneReduction).factor, `${mostTrucks} trucks`).toBeCloseTo(searched, 9);
    }
  });

  it("names wheels and reduction that give its factor", () => {
    for (const S of SPACINGS) {
      for (const mostTrucks of TRUCKS) {
        const arrangement = leverRuleInterior(S, mostTrucks, laneReduction);
        const { factor, reduction, trucks, distancesFt } = arrangement;
        expect(reduction).toBe(laneReduction(trucks));
        expect(trucks).toBeLessThanOrEqual(mostTrucks);
        expect(reduction * distancesFt.reduce((sum, distance) => sum + interiorShare(S)(distance), 0)).toBeCloseTo(factor, 10);
        const printed = leverInteriorFormula("g", { article: "3.23.1.2", per: "wheel line" }, arrangement);
        expect(printed.of(reduction, S, ...distancesFt)).toBeCloseTo(factor, 12);
        expect(printed.given).toHaveLength(distancesFt.length + 2);
      }
    }
  });
});

describe("exterior stringer", () => {
  const CURBS = [-2.5, -1, 0, 0.5, 1.25, 2, 3.5, 5];

  it.each(SPACINGS)("S = %f ft: no place of 1 to 5 trucks inside the curb is worse", (S) => {
    for (const de of CURBS) {
      let searched = 0;
      for (const mostTrucks of TRUCKS) {
        for (const gaps of gapsOf(mostTrucks)) {
          const worst = laneReduction(mostTrucks) * searchedWheelLines(exteriorShare(S, de), gaps, 2, S + 7, STEP);
          searched = Math.max(searched, worst);
        }
        expect(leverRuleExterior(S, de, mostTrucks, laneReduction).factor, `de ${de} ft, ${mostTrucks} trucks`).toBeCloseTo(searched, 9);
      }
    }
  });

  it("a stringer so far inside the curb that no wheel reaches it carries none", () => {
    expect(leverRuleExterior(3.5, -1.5, 2, laneReduction)).toMatchObject({ factor: 0, distancesFt: [] });
    expect(leverRuleExterior(3.5, -1.45, 2, laneReduction).factor).toBeCloseTo(0.05 / 3.5, 12);
  });

  it("a wheel on the overhang counts for more than one", () => {
    // de 4 ft: the first wheel stands 2 ft outside the web, the second 4 ft inside it; S 8 ft.
    expect(leverRuleExterior(8, 4, 1, laneReduction).factor).toBeCloseTo((8 + 2) / 8 + (8 - 4) / 8, 12);
  });

  it("more trucks are taken only if their reduction leaves more", () => {
    // At 20 ft two trucks stand within reach; a third adds little and costs a tenth.
    const two = leverRuleExterior(20, 1, 2, laneReduction);
    const three = leverRuleExterior(20, 1, 3, laneReduction);
    expect(two.factor).toBeCloseTo((19 + 13 + 9 + 3) / 20, 12);
    expect(three).toEqual(two);
  });

  it("names wheels and reduction that give its factor, per wheel line or per lane", () => {
    for (const S of SPACINGS) {
      const de = 1.25;
      const arrangement = leverRuleExterior(S, de, 3, laneReduction);
      const { factor, reduction, distancesFt } = arrangement;
      const ofLines = leverExteriorFormula("g", { article: "3.23.2.3.1.2", per: "wheel line" }, arrangement);
      const ofLanes = leverExteriorFormula("g", { article: "C4.6.2.2.1", per: "lane" }, arrangement);
      expect(ofLines.of(reduction, S, de, ...distancesFt)).toBeCloseTo(factor, 12);
      expect(ofLanes.of(reduction, S, de, ...distancesFt)).toBeCloseTo(factor / 2, 12);
      expect([ofLines.unit, ofLanes.unit]).toEqual(["wheel lines", "lanes"]);
    }
  });
});
