// The lane effects go into every moment and shear of every answer: a wrong range of a closed form, an axle kept after it has left the
// span or a lane loading overlooked past 145 ft would pick a stringer too light, with a calculation around it that looks right.
// Closed forms: statics of two and three axles on a simple span, one lane, no impact.
import { describe, expect, it } from "vitest";
import { laneEffects, tenthPoints } from "../../../src/loads/live-load.js";
import { StiffnessBeam } from "../../support/direct-stiffness.js";
import { placed, shipped, trainOf, usersVehicle } from "../../support/vehicles.js";

/** Spans that meet no breakpoint by design, 5 to 300 ft. */
const SPANS = Array.from({ length: 400 }, (_, index) => 5 + index * 0.7371);

function expectClose(actual: number, expected: number, what: string): void {
  expect(Math.abs(actual / expected - 1), `${what}: ${actual} for ${expected}`).toBeLessThanOrEqual(1e-9);
}

/** Larger root of a x^2 + b x + c. */
const root = (a: number, b: number, c: number): number => (-b + Math.sqrt(b * b - 4 * a * c)) / (2 * a);

describe("HS20, one lane", () => {
  const SECOND_AXLE = root(8, -224, 784); // 8 L = 16 L - 224 + 784/L, 23.9 ft
  const THIRD_AXLE = root(2, -56, -392); // 16 L - 224 + 784/L = 18 L - 280 + 392/L, 33.8 ft
  const laneMoment = (L: number) => 0.08 * L ** 2 + 4.5 * L;
  const threeAxles = (L: number) => 18 * L - 280 + 392 / L;
  const LANE = 144.8; // where 18 L - 280 + 392/L = 0.08 L^2 + 4.5 L, to a tenth of a foot

  const moment = (L: number): number => {
    if (L <= SECOND_AXLE) return 8 * L;
    if (L <= THIRD_AXLE) return 16 * L - 224 + 784 / L;
    return L <= LANE ? threeAxles(L) : laneMoment(L);
  };
  const shear = (L: number): number => {
    if (L <= 14) return 32;
    if (L <= 28) return 64 - 448 / L;
    return L <= 127.25 ? 72 - 672 / L : 0.32 * L + 26;
  };

  it.each([
    [SECOND_AXLE, 23.9],
    [THIRD_AXLE, 33.8],
  ])("a breakpoint worked out at %f ft is the one the literature prints, %f", (worked, printed) => {
    expect(Math.abs(worked - printed)).toBeLessThanOrEqual(0.05);
  });

  it("greatest moment by range", () => {
    for (const L of SPANS) {
      if (Math.abs(L - LANE) < 0.1) continue;
      expectClose(laneEffects(shipped("HS20-44"), L).momentKipFt, moment(L), `moment at ${L} ft`);
    }
  });

  it("end shear by range", () => {
    for (const L of SPANS) expectClose(laneEffects(shipped("HS20-44"), L).shearKip, shear(L), `shear at ${L} ft`);
  });

  it.each([
    [144.7, "truck"],
    [144.9, "lane"],
  ])("moment at %f ft is the %s's", (L, governing) => {
    const effects = laneEffects(shipped("HS20-44"), L);
    expect(effects.momentGoverning).toBe(governing);
    expectClose(effects.momentKipFt, Math.max(threeAxles(L), laneMoment(L)), "moment");
  });

  it.each([
    [127.2, "truck"],
    [127.3, "lane"],
  ])("shear at %f ft is the %s's", (L, governing) => {
    expect(laneEffects(shipped("HS20-44"), L).shearGoverning).toBe(governing);
  });

  it("the moment stands under the axle nearest the resultant, or at midspan", () => {
    // Three axles: resultant 4 2/3 ft from the middle axle, so that axle stands half of it off midspan.
    expect(Math.abs(laneEffects(shipped("HS20-44"), 60).momentAtFt - 30)).toBeCloseTo(14 / 3 / 2, 12);
    expect(Math.abs(laneEffects(shipped("HS20-44"), 30).momentAtFt - 15)).toBeCloseTo(14 / 4, 12);
    expect(laneEffects(shipped("HS20-44"), 20).momentAtFt).toBe(10);
    expect(laneEffects(shipped("HS20-44"), 200).momentAtFt).toBe(100);
  });

  it("the other classes are HS20 multiplied", () => {
    for (const L of [12, 31, 60, 150, 250]) {
      const hs20 = laneEffects(shipped("HS20-44"), L);
      for (const [name, factor] of [
        ["HS15-44", 0.75],
        ["HS25", 1.25],
      ] as const) {
        const other = laneEffects(shipped(name), L);
        expectClose(other.momentKipFt, factor * hs20.momentKipFt, `${name} moment`);
        expectClose(other.shearKip, factor * hs20.shearKip, `${name} shear`);
        expectClose(other.midspanDeflectionKipFt3, factor * hs20.midspanDeflectionKipFt3, `${name} deflection`);
      }
    }
  });
});

describe("H20 and H15, one lane", () => {
  const BOTH_AXLES = root(2, -56, 78.4); // 8 L = 10 L - 56 + 78.4/L
  const moment = (L: number) => Math.max(L <= BOTH_AXLES ? 8 * L : 10 * L - 56 + 78.4 / L, 0.08 * L ** 2 + 4.5 * L);
  const shear = (L: number) => Math.max(L <= 14 ? 32 : 40 - 112 / L, 0.32 * L + 26);

  it("greatest moment and end shear by range", () => {
    for (const L of SPANS) {
      for (const [name, factor] of [
        ["H20-44", 1],
        ["H15-44", 0.75],
      ] as const) {
        const effects = laneEffects(shipped(name), L);
        expectClose(effects.momentKipFt, factor * moment(L), `${name} moment at ${L} ft`);
        expectClose(effects.shearKip, factor * shear(L), `${name} shear at ${L} ft`);
      }
    }
  });
});

describe("two equal axles 4 ft apart", () => {
  it.each([
    ["Tandem", 25],
    ["Alternate Military", 24],
  ])("%s: moment and end shear", (name, P) => {
    const bothAxles = root(1, -8, 8); // one axle at midspan, P L/4 = P (L/2 - 2 + 2/L): 6.83 ft
    for (const L of SPANS.filter((span) => span > bothAxles)) {
      const effects = laneEffects(shipped(name), L);
      expectClose(effects.momentKipFt, P * (L / 2 - 2 + 2 / L), `moment at ${L} ft`);
      expectClose(effects.shearKip, P * (2 - 4 / L), `shear at ${L} ft`);
    }
    const short = laneEffects(shipped(name), 6);
    expectClose(short.momentKipFt, (P * 6) / 4, "one axle alone at midspan");
  });

  it("HS20+military is the worse of both: the military axles from 10.9 to 37.1 ft", () => {
    const military = (L: number) => 24 * (L / 2 - 2 + 2 / L);
    const from = root(4, -48, 48); // 8 L = 12 L - 48 + 48/L
    const to = root(6, -232, 344); // 18 L - 280 + 392/L = 12 L - 48 + 48/L
    for (const [L, governing] of [
      [from - 0.1, "truck"],
      [from + 0.1, "military"],
      [to - 0.1, "military"],
      [to + 0.1, "truck"],
    ] as const) {
      const effects = laneEffects(shipped("HS20+military"), L);
      expect(effects.momentGoverning).toBe(governing);
      expectClose(effects.momentKipFt, Math.max(military(L), laneEffects(shipped("HS20-44"), L).momentKipFt), `moment at ${L} ft`);
    }
  });
});

describe("lane loading", () => {
  /** An axle so light that the lane loading governs everywhere. */
  const laneOnly = usersVehicle({ name: "Lane only", axlesKip: [0.001], lane: { uniformKlf: 0.64, momentKip: 18, shearKip: 26 } });

  it("moment, shear and deflection", () => {
    for (const L of SPANS) {
      const effects = laneEffects(laneOnly, L);
      expectClose(effects.momentKipFt, (0.64 * L ** 2) / 8 + (18 * L) / 4, `moment at ${L} ft`);
      expectClose(effects.shearKip, (0.64 * L) / 2 + 26, `shear at ${L} ft`);
      // The concentrated load of deflection is that of moment.
      expectClose(effects.midspanDeflectionKipFt3, (5 * 0.64 * L ** 4) / 384 + (18 * L ** 3) / 48, `deflection at ${L} ft`);
      expect([effects.momentGoverning, effects.shearGoverning, effects.deflectionGoverning]).toEqual(["lane", "lane", "lane"]);
    }
  });

  it("away from midspan each effect has its own loaded length", () => {
    const L = 80;
    tenthPoints(laneOnly, L).forEach(({ xFt: x, momentKipFt, shearKip, deflectionKipFt3 }) => {
      const far = Math.max(x, L - x);
      expect(momentKipFt).toBeCloseTo((0.64 * x * (L - x)) / 2 + (18 * x * (L - x)) / L, 8);
      expect(shearKip).toBeCloseTo((0.64 * far ** 2) / (2 * L) + (26 * far) / L, 8);
      const uniform = (0.64 * x * (L ** 3 - 2 * L * x ** 2 + x ** 3)) / 24;
      const beam = new StiffnessBeam(L, [x]);
      const loads = Array.from({ length: 801 }, (_, place) => beam.under([{ atFt: place / 10, kip: 18 }]).deflectionAt(x));
      // Densest of places 0.1 ft apart; the influence line bends at most by L/4, so the best between them is no farther above.
      const gap = (18 * (L / 4) * 0.05 ** 2) / 2;
      expect(deflectionKipFt3).toBeGreaterThanOrEqual(uniform + Math.max(...loads) - 1e-6);
      expect(deflectionKipFt3).toBeLessThanOrEqual(uniform + Math.max(...loads) + gap);
    });
  });
});

describe("HL-93, truck or tandem with its allowance and lane load at one section", () => {
  it("truck that governs from about 40 ft, tandem below, each with the lane's moment at the same section", () => {
    for (const [L, governing] of [
      [20, "tandem"],
      [30, "tandem"],
      [60, "truck"],
      [120, "truck"],
    ] as const) {
      const effects = laneEffects(shipped("HL-93"), L);
      expect(effects.momentGoverning).toBe(governing);
      const { axlesKip, spacingsFt } = shipped("HL-93").trains[governing === "truck" ? 0 : 1];
      const train = { name: governing, axlesKip: axlesKip.map((axle) => 1.33 * axle), spacingsFt };
      // Every place 0.02 ft apart of every axle, by the stiffness beam at that axle.
      const beam = new StiffnessBeam(L);
      const step = 0.02;
      let densest = 0;
      for (let axle = 0; axle < axlesKip.length; axle++) {
        for (let x = 0.4 * L; x <= 0.6 * L; x += step) densest = Math.max(densest, beam.under(placed(train, axle, x), 0.64).momentAt(x));
      }
      const R = train.axlesKip.reduce((sum, axle) => sum + axle, 0);
      const gap = (R / L + 0.32) * (step / 2) ** 2;
      expect(effects.momentKipFt).toBeGreaterThanOrEqual(densest - 1e-7);
      expect(effects.momentKipFt).toBeLessThanOrEqual(densest + gap);
      expect(effects.includesImpact).toBe(true);
    }
  });

  it("end shear is 1.33 times the heavier train plus half the lane", () => {
    for (const L of [30, 60, 120]) {
      expectClose(laneEffects(shipped("HL-93"), L).shearKip, 1.33 * Math.max(72 - 672 / L, 50 - 100 / L) + 0.32 * L, `shear at ${L} ft`);
    }
  });

  it("deflection is the truck alone on short spans, a quarter of it with the lane on long ones, never the tandem", () => {
    for (const [L, alone] of [
      [25, true],
      [60, true],
      [300, false],
    ] as const) {
      const truck = 1.33 * laneEffects(usersVehicle({ name: "Truck alone", ...trainAsEntry("HS20-44") }), L).midspanDeflectionKipFt3;
      const lane = (5 * 0.64 * L ** 4) / 384;
      const effects = laneEffects(shipped("HL-93"), L);
      expectClose(effects.midspanDeflectionKipFt3, alone ? truck : truck / 4 + lane, `deflection at ${L} ft`);
      expect(alone).toBe(truck > truck / 4 + lane);
    }
  });
});

describe("tenth points", () => {
  it.each(["HS20-44", "H15-44", "HS20+military", "Type 3S2", "SU7", "EV3", "HL-93"])("%s: symmetric about midspan", (name) => {
    // A train drives both ways, so the left tenth is no better off than the right one.
    for (const L of [17.3, 60, 131.7]) {
      const points = tenthPoints(shipped(name), L);
      expect(points).toHaveLength(11);
      for (let tenth = 0; tenth <= 10; tenth++) {
        const [here, there] = [points[tenth], points[10 - tenth]];
        expect(here.xFt).toBeCloseTo((L * tenth) / 10, 12);
        for (const effect of ["momentKipFt", "shearKip", "deflectionKipFt3"] as const) {
          const scale = Math.max(...points.map((point) => point[effect]));
          expect(Math.abs(here[effect] - there[effect]), `${effect} at ${here.xFt} ft`).toBeLessThanOrEqual(1e-9 * scale);
        }
      }
    }
  });

  it("nothing bends or sinks over the bearings, and the shear there is the end shear", () => {
    for (const name of ["HS20-44", "HL-93", "SU6"]) {
      const [end] = tenthPoints(shipped(name), 72);
      expect(end.momentKipFt).toBe(0);
      expect(end.deflectionKipFt3).toBe(0);
      expectClose(end.shearKip, laneEffects(shipped(name), 72).shearKip, name);
    }
  });

  it("no tenth point exceeds the absolute maximum", () => {
    for (const name of ["HS20-44", "Type 3-3", "HL-93"]) {
      for (const L of [20, 45, 110]) {
        const greatest = Math.max(...tenthPoints(shipped(name), L).map(({ momentKipFt }) => momentKipFt));
        const { momentKipFt } = laneEffects(shipped(name), L);
        expect(greatest).toBeLessThanOrEqual(momentKipFt * (1 + 1e-12));
        expect(greatest).toBeGreaterThan(0.9 * momentKipFt);
      }
    }
  });
});

describe("a span that is none", () => {
  // NaN compared with "<" reads as a load that fits: a span must be refused, not answered with 0 or NaN.
  const bad = [Number.NaN, 0, -60, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];

  it.each(bad)("laneEffects at %f ft", (span) => {
    for (const name of ["HS20-44", "HL-93", "Alternate Military"]) {
      expect(() => laneEffects(shipped(name), span)).toThrow(RangeError);
      expect(() => laneEffects(shipped(name), span)).toThrow("spanFt");
    }
  });

  it.each(bad)("tenthPoints at %f ft", (span) => {
    for (const name of ["HS20-44", "HL-93"]) expect(() => tenthPoints(shipped(name), span)).toThrow(RangeError);
  });
});

function trainAsEntry(name: string) {
  const { axlesKip, spacingsFt } = trainOf(name);
  return { axlesKip, spacingsFt };
}
