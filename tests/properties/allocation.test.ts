import { setFlagsFromString } from "node:v8";
import { runInNewContext } from "node:vm";
import { describe, expect, it } from "vitest";
import { assessInFull } from "../../src/answers/assessment.js";
import type { Steel } from "../../src/bridge/yield-stress.js";
import type { Assessor } from "../../src/specs/contract.js";
import { preparedOf } from "../support/question.js";

const ROUNDS = 9;
/** Most that one assessment may leave for the collector, bytes: the engine boxes single numbers on their way; a record leaves 20 times more. */
const PASSING_BYTES = 2000;
/** Most that may stay after tens of thousands of assessments, bytes. */
const STAYING_BYTES = 200_000;

setFlagsFromString("--expose-gc");
const collect = runInNewContext("gc") as () => void;
const heapUsed = (): number => process.memoryUsage().heapUsed;

/** Bytes that one assessment adds to the heap, the median of several rounds, for a round in which the collector runs tells nothing. */
function bytesEach(assessors: readonly Assessor[], steels: readonly Steel[], assess: (assessor: Assessor, steel: Steel) => void): number {
  const growths: number[] = [];
  for (let round = 0; round < ROUNDS; round++) {
    const before = heapUsed();
    for (const assessor of assessors) for (const steel of steels) assess(assessor, steel);
    growths.push((heapUsed() - before) / (assessors.length * steels.length));
  }
  return growths.sort((a, b) => a - b)[(ROUNDS - 1) / 2];
}

describe("assessing without a recorder", () => {
  // Lost without it: tables for 20,000 bridges would spend their time clearing away what every single assessment leaves behind.
  it.each([
    ["lfd", false],
    ["lfd", true],
    ["lrfd", false],
    ["lrfd", true],
  ] as const)("leaves next to nothing on the heap: %s, composite %s", (specification, composite) => {
    const { bridge, space } = preparedOf({ specification, "deck.composite": composite, spanFt: 60, "deck.outToOutFt": 33 });
    const fast = (assessor: Assessor, steel: Steel): void => assessor.assess(steel, null);
    bytesEach(space.assessors, space.steels, fast);
    collect();
    const before = heapUsed();
    const passing = bytesEach(space.assessors, space.steels, fast);
    collect();
    expect(heapUsed() - before).toBeLessThan(STAYING_BYTES);
    expect(passing).toBeLessThan(PASSING_BYTES);

    const recorded = bytesEach(space.assessors.slice(0, 2), space.steels.slice(0, 3), (assessor, steel) => {
      assessInFull(bridge, assessor, steel);
    });
    expect(recorded).toBeGreaterThan(10 * passing);
  });
});
