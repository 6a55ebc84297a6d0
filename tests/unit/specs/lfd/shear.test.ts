// Deep thin webs buckle before they yield: without C the deepest shape of a list would look strongest in shear.
// AASHTO Standard Specifications, 17th ed., Art. 10.48.8.1, k = 5 (seen).
import { describe, expect, it } from "vitest";
import { shearCapacityKip, withoutBearingStiffeners } from "../../../../src/specs/lfd/shear.js";

const HAIR = 1e-9;
const yielding = (Fy: number, D: number, tw: number) => 0.58 * Fy * D * tw;

describe.each([33, 36, 50])("Fy %i ksi", (Fy) => {
  const first = (190 * Math.sqrt(5)) / Math.sqrt(Fy);
  const second = (237 * Math.sqrt(5)) / Math.sqrt(Fy);
  const D = 33;
  /** Capacity and C of a web of a given slenderness. */
  const web = (slenderness: number) => {
    const tw = D / slenderness;
    const capacity = shearCapacityKip(Fy, D, tw, null);
    return { capacity, C: capacity / yielding(Fy, D, tw) };
  };

  it("C = 1 up to 190 sqrt(k)/sqrt(Fy)", () => {
    for (const slenderness of [10, 0.5 * first, first * (1 - HAIR)]) expect(web(slenderness).C).toBeCloseTo(1, 12);
  });

  it("then that limit over D/tw, without a step, up to 237 sqrt(k)/sqrt(Fy)", () => {
    expect(web(first * (1 + HAIR)).C).toBeCloseTo(1, 8);
    for (const slenderness of [first * 1.001, first * 1.05, first * 1.1, second * (1 - HAIR)]) {
      expect(web(slenderness).C).toBeCloseTo((190 * Math.sqrt(5)) / (slenderness * Math.sqrt(Fy)), 12);
    }
    expect(web(second * (1 - HAIR)).C).toBeCloseTo(190 / 237, 8);
  });

  it("then 45000 k/((D/tw)^2 Fy)", () => {
    for (const slenderness of [second * (1 + HAIR), second * 1.001, second * 1.1, 150]) {
      expect(web(slenderness).C).toBeCloseTo((45000 * 5) / (slenderness ** 2 * Fy), 12);
    }
    // The two rules meet within a tenth of a per cent where one takes over from the other: 45000/237^2 against 190/237.
    expect(web(second * (1 + HAIR)).C).toBeCloseTo(45000 / 237 ** 2, 8);
    expect(Math.abs(45000 / 237 ** 2 - 190 / 237)).toBeLessThan(0.001);
  });
});

describe("bearing stiffeners, 10.33.2", () => {
  it("are needed beyond three quarters of the web's capacity", () => {
    expect(withoutBearingStiffeners.of(400)).toBe(300);
  });
});
