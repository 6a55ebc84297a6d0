import fc from "fast-check";
import { compile, type EvalFunction } from "mathjs";
import { describe, expect, it } from "vitest";
import { assessInFull } from "../../src/answers/assessment.js";
import type { Vehicle } from "../../src/loads/vehicles.js";
import type { Line } from "../../src/specs/contract.js";
import { anyBridge, anyShape, anyTrain, candidateOf, passesByRatios, seeded, type Values, withOwn } from "../support/random-bridges.js";

/** A bridge with one of the known vehicles, or one of the user's own. */
const anyQuestion: fc.Arbitrary<readonly [Values, readonly Vehicle[] | undefined]> = fc.oneof(
  { arbitrary: fc.tuple(anyBridge, fc.constant(undefined)), weight: 3 },
  {
    arbitrary: fc
      .tuple(anyBridge, anyTrain)
      .map(([values, train]) => [{ ...values, "liveLoad.vehicle": "Own" }, withOwn(train, values)] as const),
    weight: 1,
  },
);

describe("the recorder and the fast path", () => {
  // Lost without it: the record handed to the checker would show other ratios than those the beam was chosen by.
  it("give identical ratios, verdicts and governing checks", () => {
    fc.assert(
      fc.property(anyQuestion, anyShape, ([values, vehicles], shape) => {
        const { prepared, assessor, steel } = candidateOf(values, shape, vehicles);
        assessor.assess(steel, null);
        const fast = {
          ratios: assessor.ratios.slice(),
          passes: assessor.passes,
          slot: assessor.governingSlot,
          governing: assessor.governingRatio,
        };
        const full = assessInFull(prepared.bridge, assessor, steel);
        assessor.ratios.forEach((ratio, place) => {
          if (!Object.is(ratio, fast.ratios[place])) expect.fail(`place ${place}: ${fast.ratios[place]} fast, ${ratio} recorded`);
        });
        expect(full.passes).toBe(fast.passes);
        expect(full.passes).toBe(passesByRatios(assessor));
        expect(Object.is(full.governing.ratio, fast.governing)).toBe(true);
        expect(full.governing).toMatchObject({ id: assessor.slots[fast.slot].id, position: assessor.slots[fast.slot].position });

        for (const { position, checks } of full.stringers) {
          const slots = assessor.slots.flatMap((slot, place) =>
            slot.position === position ? [{ ...slot, ratio: fast.ratios[place] }] : [],
          );
          const present = slots.filter(({ ratio }) => ratio !== -1);
          for (const { id, kind, ratio } of present) {
            const shown = checks.filter((check) => check.id === id);
            expect(shown.map((check) => check.kind)).toContain(kind);
            expect(shown.some((check) => Object.is(check.ratio, ratio))).toBe(true);
          }
          expect(new Set(checks.map(({ id }) => id))).toEqual(new Set(present.map(({ id }) => id)));
          for (const { ok, ratio, demand, capacity } of checks) {
            expect(ok).toBe(ratio <= 1);
            expect(Math.abs(demand / capacity - ratio) <= 1e-12 * Math.abs(ratio) || Object.is(demand / capacity, ratio)).toBe(true);
          }
        }
      }),
      seeded(500),
    );
  });

  // Lost without it: the search, which stops at the first failing check, could throw away a beam that the full run passes.
  it("agree with the screening of the search", () => {
    let passed = 0;
    fc.assert(
      fc.property(anyQuestion, fc.array(anyShape, { minLength: 5, maxLength: 5 }), ([values, vehicles], shapes) => {
        for (const shape of shapes) {
          const { assessor, steel } = candidateOf(values, shape, vehicles);
          const screened = assessor.screen(steel);
          const [slot, ratio] = [assessor.governingSlot, assessor.governingRatio];
          assessor.assess(steel, null);
          expect(screened).toBe(assessor.passes);
          if (!screened) continue;
          passed++;
          expect(slot).toBe(assessor.governingSlot);
          expect(Object.is(ratio, assessor.governingRatio)).toBe(true);
        }
      }),
      seeded(300),
    );
    expect(passed).toBeGreaterThan(100);
  });

  // Lost without it: a capacity below nothing would make any load upon it look like a pass, for less than nothing is less than one.
  it("never give a ratio below nothing", () => {
    fc.assert(
      fc.property(anyQuestion, anyShape, ([values, vehicles], shape) => {
        const { prepared, assessor, steel } = candidateOf(values, shape, vehicles);
        for (const { position, checks } of assessInFull(prepared.bridge, assessor, steel).stringers) {
          for (const { id, demand, capacity, ratio, ok } of checks) {
            if (ratio < 0) expect.fail(`${position} ${id}: ${demand} / ${capacity} = ${ratio}, ${ok ? "OK" : "NG"}`);
          }
        }
      }),
      seeded(1500),
    );
  });

  // Lost without it: the same beam would pass or fail by which beam happened to be looked at before it.
  it("leave nothing behind: a shape's ratios do not hang on the shape before it", () => {
    fc.assert(
      fc.property(anyBridge, anyShape, anyShape, (values, shape, other) => {
        const { assessor, steel } = candidateOf(values, shape);
        assessor.assess(steel, null);
        const first = assessor.ratios.slice();
        assessor.assess({ ...steel, shape: other }, null);
        assessor.screen({ ...steel, shape: other });
        assessor.assess(steel, null);
        expect(assessor.ratios).toEqual(first);
      }),
      seeded(200),
    );
  });
});

type Step = Extract<Line, { type: "step" }>;

const compiled = new Map<string, EvalFunction>();

/** The printed expression, worked out by a general expression parser with the numbers put in. */
function evaluated({ formula, numbers }: Step): number {
  const code = compiled.get(formula.expression) ?? compile(formula.expression);
  compiled.set(formula.expression, code);
  return code.evaluate(Object.fromEntries(formula.given.map((name, place) => [name, numbers[place]]))) as number;
}

describe("every recorded step", () => {
  const stepsOf = (values: Values, shape: Parameters<typeof candidateOf>[1], vehicles: readonly Vehicle[] | undefined): Step[] => {
    const { prepared, assessor, steel } = candidateOf(values, shape, vehicles);
    const { stringers } = assessInFull(prepared.bridge, assessor, steel);
    return stringers.flatMap(({ lines }) => lines.filter((line) => line.type === "step"));
  };

  // Lost without it: a checker who works a printed line out on a calculator would get another number than the one the beam hangs on.
  it("prints what it computes, and computes what it prints", () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(anyQuestion, anyShape, ([values, vehicles], shape) => {
        for (const step of stepsOf(values, shape, vehicles)) {
          const { formula, numbers, result } = step;
          const words = `${formula.symbol} = ${formula.expression} with ${formula.given.map((name, place) => `${name} ${numbers[place]}`)}`;
          seen.add(`${formula.symbol} = ${formula.expression}`);
          if (!Object.is(formula.of(...numbers), result)) expect.fail(`${words}: of() ${formula.of(...numbers)}, recorded ${result}`);
          const printed = evaluated(step);
          if (!(Math.abs(printed - result) <= 1e-9 * Math.abs(result))) expect.fail(`${words}: printed ${printed}, recorded ${result}`);
        }
      }),
      seeded(250),
    );
    expect(seen.size).toBeGreaterThan(60);
  });

  // Lost without it: a line would name a number it does not use, or leave the checker without one it does.
  it("names each number it puts in once, and uses every one", () => {
    fc.assert(
      fc.property(anyQuestion, anyShape, ([values, vehicles], shape) => {
        for (const { formula, numbers } of stepsOf(values, shape, vehicles)) {
          const names = new Set(formula.expression.match(/[A-Za-z][A-Za-z0-9]*/g) ?? []);
          for (const word of ["min", "max", "sqrt", "pi"]) names.delete(word);
          expect(new Set(formula.given).size).toBe(formula.given.length);
          expect(numbers).toHaveLength(formula.given.length);
          const used = formula.given.filter((name) => names.has(name));
          expect([...names].sort()).toEqual([...used].sort());
          expect(formula.article).not.toBe("");
          expect(formula.unit).not.toBe("");
          // A lever rule that no wheel reaches is the one line that may leave numbers unused.
          if (!formula.expression.startsWith("m * (0)")) expect(used).toHaveLength(formula.given.length);
        }
      }),
      seeded(150),
    );
  });

  // Lost without it: a number would turn up in the middle of the calculation that stands nowhere above it under that symbol.
  it("puts in the numbers that stand above it under the same symbols", () => {
    fc.assert(
      fc.property(anyQuestion, anyShape, ([values, vehicles], shape) => {
        const { prepared, assessor, steel } = candidateOf(values, shape, vehicles);
        for (const { position, lines } of assessInFull(prepared.bridge, assessor, steel).stringers) {
          const above = new Map<string, number>();
          for (const line of lines) {
            if (line.type === "value") above.set(line.symbol, line.value);
            if (line.type !== "step") continue;
            line.formula.given.forEach((name, place) => {
              const stands = above.get(name);
              if (stands === undefined || Object.is(stands, line.numbers[place])) return;
              expect.fail(
                `${position}: ${line.formula.symbol} = ${line.formula.expression} puts ${line.numbers[place]} for ${name}, above ${stands}`,
              );
            });
            above.set(line.formula.symbol, line.result);
          }
        }
      }),
      seeded(250),
    );
  });
});
