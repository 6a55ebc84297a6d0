// A second opinion that is itself wrong would either hide a wrong envelope or accuse a right one: the stiffness beam is held to the
// closed forms every handbook of beams prints.
import { describe, expect, it } from "vitest";
import { StiffnessBeam } from "./direct-stiffness.js";

describe("the stiffness beam", () => {
  const L = 63;

  it.each([7.875, 20, 31.5, 50])("under one load at %f ft", (a) => {
    const P = 17;
    const b = L - a;
    const sections = [12, 31.5, 40];
    const solved = new StiffnessBeam(L, sections).under([{ atFt: a, kip: P }]);
    expect(solved.leftReaction()).toBeCloseTo((P * b) / L, 9);
    expect(solved.rightReaction()).toBeCloseTo((P * a) / L, 9);
    expect(solved.momentAt(a)).toBeCloseTo((P * a * b) / L, 8);
    expect(solved.shearLeftOf(a)).toBeCloseTo((P * b) / L, 9);
    expect(solved.shearRightOf(a)).toBeCloseTo((-P * a) / L, 9);
    for (const x of sections) {
      expect(solved.momentAt(x)).toBeCloseTo(x <= a ? (P * b * x) / L : (P * a * (L - x)) / L, 8);
      const [near, far] = x <= a ? [x, b] : [L - x, a];
      expect(solved.deflectionAt(x)).toBeCloseTo((P * far * near * (L ** 2 - far ** 2 - near ** 2)) / (6 * L), 5);
    }
  });

  it("under a uniform load", () => {
    const w = 0.64;
    const solved = new StiffnessBeam(L, [L / 2]).under([], w);
    expect(solved.momentAt(L / 2)).toBeCloseTo((w * L ** 2) / 8, 9);
    expect(solved.momentAt(10)).toBeCloseTo((w * 10 * (L - 10)) / 2, 9);
    expect(solved.shearRightOf(10)).toBeCloseTo(w * (L / 2 - 10), 9);
    expect(solved.deflectionAt(L / 2)).toBeCloseTo((5 * w * L ** 4) / 384, 6);
  });

  it("takes a load over the bearing straight down, and leaves out what is off the span", () => {
    const solved = new StiffnessBeam(L).under([
      { atFt: 0, kip: 5 },
      { atFt: -1, kip: 8 },
      { atFt: L + 1, kip: 8 },
    ]);
    expect(solved.leftReaction()).toBeCloseTo(5, 12);
    expect(solved.momentAt(L / 2)).toBeCloseTo(0, 12);
  });
});
