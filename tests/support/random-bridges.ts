import fc from "fast-check";
import type { Prepared } from "../../src/answers/question.js";
import type { Steel } from "../../src/bridge/yield-stress.js";
import type { Shape } from "../../src/catalogue/shape.js";
import { readVehicles, type Vehicle } from "../../src/loads/vehicles.js";
import type { Assessor } from "../../src/specs/contract.js";
import { CATALOGUE, preparedOf, VEHICLES } from "./question.js";

/** Values of a bridge file by dotted key. */
export type Values = Readonly<Record<string, unknown>>;

/** Every random test runs on the same cases each time. */
export const seeded = (numRuns: number): fc.Parameters<unknown> => ({ seed: 17_2002, numRuns });

/** Numbers from least to greatest in steps, as people write them. */
export const stepped = (min: number, max: number, step: number): fc.Arbitrary<number> =>
  fc.integer({ min: 0, max: Math.round((max - min) / step) }).map((steps) => tidy(min + steps * step));

const tidy = (value: number): number => Math.round(value * 1e6) / 1e6;
const orNone = (numbers: fc.Arbitrary<number>): fc.Arbitrary<number> => fc.oneof(fc.constant(0), numbers);
const orNull = (numbers: fc.Arbitrary<number>): fc.Arbitrary<number | null> => fc.option(numbers, { nil: null, freq: 2 });

/** A shape of the catalogue. */
export const anyShape: fc.Arbitrary<Shape> = fc.constantFrom(...CATALOGUE);

/** An axle train of the user's own: 1 to 6 axles. */
export const anyTrain = fc.integer({ min: 1, max: 6 }).chain((axles) =>
  fc.record({
    axlesKip: fc.array(stepped(2, 40, 0.5), { minLength: axles, maxLength: axles }),
    spacingsFt: fc.array(stepped(3, 32, 0.25), { minLength: axles - 1, maxLength: axles - 1 }),
  }),
);

/**
 * The known vehicles and one of the user's own, called Own.
 *
 * @param values the bridge it is for: lrfd takes a vehicle only if it says how train and lane act together
 */
export function withOwn(own: Readonly<Record<string, unknown>>, values: Values = {}): readonly Vehicle[] {
  const together = values.specification === "lrfd" ? { together: { dynamicAllowance: 0.33 } } : {};
  return [...VEHICLES, ...readVehicles(JSON.stringify([{ name: "Own", ...together, ...own }]), "own.json", VEHICLES)];
}

const concrete = fc.record({
  "deck.composite": fc.constantFrom(null, true, false),
  "deck.thicknessIn": stepped(6, 12, 0.25),
  "deck.sacrificialIn": stepped(0, 1, 0.25),
  "deck.haunchWeightIn": stepped(0, 4, 0.25),
  "deck.haunchSectionIn": stepped(0, 3, 0.25),
  "deck.fcKsi": stepped(2.5, 7, 0.25),
  "deck.modularRatio": orNull(stepped(6, 12, 1)),
  "deck.formsPsf": stepped(0, 20, 1),
  "deck.deckPsf": orNull(stepped(60, 180, 1)),
});
const solidTimber = (kind: string, least: number) =>
  fc.record({ "deck.kind": fc.constant(kind), "deck.thicknessIn": stepped(least, 12, 0.25), "deck.deckPsf": orNull(stepped(8, 60, 1)) });
const made = (kind: string) =>
  fc.record({
    "deck.kind": fc.constant(kind),
    "deck.thicknessIn": stepped(2, 7, 0.25),
    "deck.deckPsf": stepped(12, 70, 1),
    "deck.maxSpacingFt": stepped(3, 14, 0.5),
  });

/** A deck of any kind, with what its kind needs. */
const deck: fc.Arbitrary<Values> = fc.oneof(
  { arbitrary: concrete, weight: 4 },
  solidTimber("timber-plank", 3),
  solidTimber("nail-laminated", 4),
  solidTimber("glulam", 4),
  made("steel-grid"),
  made("corrugated-steel"),
);

const loads = fc.record({
  "barriers.weightKlf": stepped(0, 0.6, 0.01),
  wearingPsf: stepped(0, 60, 1),
  "deadLoad.stage1Klf": orNull(stepped(0, 3, 0.01)),
  "deadLoad.stage2Klf": orNull(stepped(0, 1, 0.01)),
  "deadLoad.wearingKlf": orNull(stepped(0, 1, 0.01)),
  "pour.constructionPsf": stepped(0, 100, 5),
  "steel.miscFraction": stepped(0, 0.2, 0.01),
  pieceOverlapFt: stepped(0, 2, 0.25),
});

const use = fc.constantFrom("enforce", "report", "off");
/** A specification with the live loads and details that are its own. */
const specification: fc.Arbitrary<Values> = fc.oneof(
  fc.record({
    specification: fc.constant("lfd"),
    "liveLoad.vehicle": fc.constantFrom(...VEHICLES.filter((one) => one.dynamicAllowance === null).map(({ name }) => name)),
    "liveLoad.fatigueDetail": fc.constantFrom(null, "A", "B", "B'", "C", "C-stiffener", "D", "E"),
  }),
  fc.record({
    specification: fc.constant("lrfd"),
    "liveLoad.vehicle": fc.constant("HL-93"),
    "liveLoad.fatigueDetail": fc.constantFrom(null, "A", "B", "B'", "C", "C'", "D", "E", "E'"),
  }),
);
const rules = fc.record({
  "bracing.topFlange": fc.constantFrom(null, "held", "diaphragms"),
  "liveLoad.adtt": fc.constantFrom(null, 0, 99, 100, 450, 2499, 2500, 20_000),
  "liveLoad.distribution": fc.option(stepped(0.3, 3, 0.01), { nil: null, freq: 5 }),
  "deflection.use": use,
  "deflection.spanOver": stepped(300, 1200, 50),
  "advisories.depth": use,
  "advisories.handling": use,
  "advisories.overhang": use,
  "steel.grade": fc.constantFrom("36", "50", "50W"),
  "steel.fyKsi": fc.option(fc.constantFrom(26, 33, 46, 65, 70), { nil: null, freq: 3 }),
  "bearing.lengthIn": stepped(4, 16, 1),
  "pour.lateralBendingKsi": orNone(stepped(1, 20, 1)),
});

/** A deck of a width, n stringers at a spacing whose overhang leaves room for any flange. */
const across: fc.Arbitrary<Values> = fc
  .record({
    base: stepped(0, 2, 0.25),
    roadway: stepped(10.5, 60, 0.25),
    count: fc.integer({ min: 2, max: 12 }),
    overhang: stepped(0.8, 5, 0.05),
    lanes: fc.integer({ min: 0, max: 6 }),
  })
  .map(({ base, roadway, count, overhang, lanes }) => {
    const width = tidy(roadway + 2 * base);
    const stringers = Math.max(count, Math.ceil((width - 2 * overhang) / 19) + 1);
    return {
      "barriers.baseFt": base,
      "deck.outToOutFt": width,
      "stringers.count": stringers,
      "stringers.spacingFt": tidy((width - 2 * overhang) / (stringers - 1)),
      "liveLoad.lanes": lanes >= 1 && lanes <= roadway / 10 ? lanes : null,
    };
  })
  // No flange of the catalogue is as wide as 2 ft, so stringers never overlap.
  .filter((values) => values["stringers.spacingFt"] >= 2);

const oneInterior: fc.Arbitrary<Values> = fc.record({
  "barriers.baseFt": stepped(0, 2, 0.25),
  "stringers.spacingFt": stepped(2, 18, 0.25),
  "liveLoad.lanes": fc.constantFrom(null, 1, 2, 3),
});

const layout: fc.Arbitrary<Values> = fc.oneof({ arbitrary: across, weight: 4 }, { arbitrary: oneInterior, weight: 1 });

const diaphragmsPerSpan = fc.constantFrom(null, 1, 2, 3, 4, 6, 9);

/** A bridge with every kind of deck, load, rule and layout; the layout is fixed, one candidate a shape. */
export const anyBridge: fc.Arbitrary<Values> = fc
  .record({ spanFt: stepped(12, 150, 0.5), layout, deck, loads, rules, specification, diaphragmsPerSpan })
  .map(({ spanFt, diaphragmsPerSpan: bays, ...parts }) => ({
    spanFt,
    ...parts.deck,
    ...parts.loads,
    ...parts.rules,
    ...parts.specification,
    ...parts.layout,
    "bracing.diaphragmSpacingFt": bays === null ? null : spanFt / bays,
  }));

/** A deck of a width whose layouts are left to the grid. */
export const anyOpenBridge: fc.Arbitrary<Values> = fc
  .record({
    spanFt: stepped(20, 110, 0.5),
    base: stepped(0.25, 1.75, 0.25),
    roadway: stepped(14, 48, 0.5),
    deck,
    loads,
    rules,
    specification,
    minCount: fc.integer({ min: 3, max: 5 }),
    count: fc.option(fc.integer({ min: 3, max: 8 }), { nil: null, freq: 2 }),
    spacing: fc.option(stepped(3, 11, 0.25), { nil: null, freq: 2 }),
    step: fc.constantFrom(0.25, 0.5, 1, 0.125),
  })
  .map(({ spanFt, base, roadway, minCount, count, spacing, step, ...parts }) => ({
    spanFt,
    ...parts.deck,
    ...parts.loads,
    ...parts.rules,
    ...parts.specification,
    "barriers.baseFt": base,
    "deck.outToOutFt": roadway + 2 * base,
    "stringers.minCount": minCount,
    "stringers.spacingStepFt": step,
    ...(count !== null && spacing === null && { "stringers.count": count }),
    ...(spacing !== null && count === null && { "stringers.spacingFt": spacing }),
  }));

/** The one candidate of a bridge whose layout is fixed. */
export function candidateOf(
  values: Values,
  shape: Shape,
  vehicles: readonly Vehicle[] = VEHICLES,
): { readonly prepared: Prepared; readonly assessor: Assessor; readonly steel: Steel } {
  const prepared = preparedOf(values, [shape], vehicles);
  const [assessor] = prepared.space.assessors;
  const [steel] = prepared.space.steels;
  if (prepared.space.assessors.length !== 1 || assessor === undefined || steel === undefined) {
    throw new Error(`not one candidate: ${JSON.stringify(values)}`);
  }
  return { prepared, assessor, steel };
}

/** Whether every required check is met, read off the ratios alone; nothing required is no pass. */
export function passesByRatios({ ratios, slots }: Assessor): boolean {
  const required = slots.flatMap(({ kind }, place) => (kind === "advisory" || ratios[place] === -1 ? [] : [ratios[place]]));
  return required.length > 0 && required.every((ratio) => Number.isFinite(ratio) && ratio <= 1);
}
