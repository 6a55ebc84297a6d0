import { describe, expect, it } from "vitest";
import { prepare } from "../../src/answers/question.js";
import type { Shape, ShapeFigures } from "../../src/catalogue/shape.js";
import { InputError } from "../../src/errors.js";
import { nearestMiss, rank } from "../../src/ranking/rank.js";
import { type SearchSpace, searchSpace } from "../../src/search/search.js";
import type { Assessor, Design } from "../../src/specs/contract.js";
import { specificationOf } from "../../src/specs/specification.js";
import { CATALOGUE, preparedOf, questionOf } from "../support/question.js";
import type { Values } from "../support/random-bridges.js";

const BAD = [Number.NaN, Number.POSITIVE_INFINITY];

const LFD = { specification: "lfd", "deck.composite": false };
const FIVE = { spanFt: 40, "deck.outToOutFt": 30, "stringers.count": 5, "stringers.spacingFt": 6 };
const PLANKS = {
  "deck.kind": "timber-plank",
  "deck.thicknessIn": 4,
  "deck.outToOutFt": 16,
  "barriers.baseFt": 0.5,
  "barriers.weightKlf": 0.05,
  "stringers.count": 5,
  "stringers.spacingFt": 3.5,
};
const GIVEN = { "deadLoad.stage1Klf": 0.6, "deadLoad.stage2Klf": 0.1, "deadLoad.wearingKlf": 0.1, "liveLoad.distribution": 1.1 };

/** Bridges on which the shape named passes with everything in order, between them by every specification, route and deck. */
const SOUND: readonly (readonly [string, Values, string])[] = [
  ["held, compact", { ...LFD, ...FIVE, "bracing.topFlange": "held" }, "W33X201"],
  ["diaphragms, partially braced", { ...LFD, ...FIVE }, "W36X210"],
  ["close diaphragms", { ...LFD, ...FIVE, "bracing.diaphragmSpacingFt": 8, "liveLoad.adtt": 300 }, "W33X201"],
  ["one interior stringer", { ...LFD, spanFt: 40, "stringers.spacingFt": 6 }, "W36X210"],
  ["a light vehicle on planks", { specification: "lfd", ...PLANKS, spanFt: 30, "liveLoad.vehicle": "H15-44" }, "W24X131"],
  ["given loads and factor", { ...LFD, ...FIVE, ...GIVEN }, "W36X210"],
  ["lfd composite", { specification: "lfd", ...FIVE }, "W33X201"],
  ["lrfd composite", { specification: "lrfd", ...FIVE }, "W33X201"],
  ["lrfd composite, axis in the web", { specification: "lrfd", ...FIVE, "deck.thicknessIn": 6.5, "liveLoad.adtt": 200 }, "W40X264"],
  ["lrfd noncomposite", { specification: "lrfd", "deck.composite": false, ...FIVE }, "W36X231"],
  ["lrfd, one interior stringer", { specification: "lrfd", spanFt: 50, "stringers.spacingFt": 7 }, "W33X201"],
  ["lrfd on planks", { specification: "lrfd", ...PLANKS, spanFt: 30 }, "W27X161"],
];
/** With every advisory required, so that a number read for an advisory alone counts too. */
const STRICT = { "advisories.depth": "enforce", "advisories.handling": "enforce", "advisories.overhang": "enforce" };

const shapeOf = (name: string): Shape => CATALOGUE.find(({ designation }) => designation === name) ?? failed(name);

function failed(what: string): never {
  throw new Error(what);
}

/** The search space of a question, or null when it is refused outright, which is as good as never passing. */
function spaceUnlessRefused(values: Values, shapes: readonly Shape[]): SearchSpace | null {
  try {
    return preparedOf(values, shapes).space;
  } catch (error) {
    if (error instanceof InputError || error instanceof RangeError) return null;
    throw error;
  }
}

const figures = Object.keys(CATALOGUE[0]).filter((name) => typeof CATALOGUE[0][name as keyof Shape] === "number") as (keyof ShapeFigures)[];

describe("a figure of a shape that is not finite", () => {
  // Lost without it: these tests would say nothing, for what fails anyway fails with a bad figure too.
  it.each(SOUND)("the sound shape passes: %s", (_, values, name) => {
    expect(rank(preparedOf({ ...values, ...STRICT }, [shapeOf(name)]).space, 1)).toHaveLength(1);
  });

  /** What a shape with one bad figure gets away with, and on how many bridges. */
  function findings(figure: keyof ShapeFigures): string[] {
    const found = new Map<string, number>();
    for (const [, values, name] of SOUND) {
      for (const bad of BAD) {
        const note = (what: string): void => {
          const finding = `${figure} ${bad} ${what}`;
          found.set(finding, (found.get(finding) ?? 0) + 1);
        };
        const shape: Shape = { ...shapeOf(name), [figure]: bad };
        const weak = { ...shapeOf("W12X14"), designation: "sound but weak" };
        const beside = spaceUnlessRefused({ ...values, ...STRICT }, [shape, weak]);
        if (beside === null) continue;
        const { assessors } = beside;
        const steels = beside.steels.filter((steel) => steel.shape.designation === name);
        for (const assessor of assessors) {
          for (const steel of steels) {
            assessor.assess(steel, null);
            if (assessor.passes) note("passes");
            if (assessor.screen(steel)) note("is screened as passing");
          }
        }
        if (rank({ ...beside, steels }, 50).length > 0) note("ranks");
        const nearest = rank(beside, 1)[0] ?? nearestMiss(beside);
        if (nearest?.steel.shape.designation !== "sound but weak") note("comes before a sound shape");
      }
    }
    return [...found].map(([finding, bridges]) => `${finding} (${bridges} of ${SOUND.length} bridges)`);
  }

  /** Figures that some check of some sound bridge reads. */
  function figuresRead(): Set<string> {
    const read = new Set<string>();
    for (const [, values, name] of SOUND) {
      const { assessors } = preparedOf({ ...values, ...STRICT }, [shapeOf(name)]).space;
      const watched = new Proxy(shapeOf(name), {
        get: (target, figure) => {
          read.add(String(figure));
          return Reflect.get(target, figure);
        },
      });
      for (const assessor of assessors) assessor.assess({ shape: watched, fyKsi: 50 }, null);
    }
    return read;
  }

  // Lost without it: a blank in somebody's list, read as "not a number", would sail through every check and be the lightest beam of all.
  it("never passes, never ranks and is no nearest miss before a sound shape, where a check reads it", () => {
    const read = figures.filter((figure) => figuresRead().has(figure));
    expect(read.length).toBeGreaterThan(8);
    expect(read.flatMap(findings)).toEqual([]);
  });

  // Lost without it: a figure read only by the next specification, or the record, would bring a broken row into an answer that looks sound.
  it("never passes, never ranks and is no nearest miss before a sound shape, where no check of this specification reads it", () => {
    expect(figures.filter((figure) => !figuresRead().has(figure)).flatMap(findings)).toEqual([]);
  });

  // Lost without it: steel of no known strength would carry the bridge.
  it("its yield stress: never passes", () => {
    for (const [, values, name] of SOUND) {
      const { space } = preparedOf({ ...values, ...STRICT }, [shapeOf(name)]);
      for (const fyKsi of BAD) {
        for (const assessor of space.assessors) {
          assessor.assess({ shape: shapeOf(name), fyKsi }, null);
          expect([fyKsi, assessor.passes]).toEqual([fyKsi, false]);
        }
      }
    }
  });
});

type Place = readonly (string | number)[];

/** Every number inside a value, by its path. */
function numbersIn(value: unknown, path: Place = []): Place[] {
  if (typeof value === "number") return [path];
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([name, inner]) => numbersIn(inner, [...path, name]));
}

/** A copy with the number at a path replaced. */
function replaced<T>(value: T, [name, ...rest]: Place, by: number): T {
  if (name === undefined) return by as T;
  const copy = (Array.isArray(value) ? [...value] : { ...value }) as Record<string | number, unknown>;
  copy[name] = replaced(copy[name], rest, by);
  return copy as T;
}

/** Whether a number at a path is read when the layout's checks are prepared and a shape is assessed. */
function readsOf(design: Design, run: (watched: Design) => void): Set<string> {
  const seen = new Set<string>();
  const watch = (value: unknown, path: Place): unknown => {
    if (typeof value !== "object" || value === null) return value;
    return new Proxy(value, {
      get: (target, name, receiver) => {
        const inner: unknown = Reflect.get(target, name, receiver);
        if (typeof name === "symbol" || typeof inner === "function") return inner;
        const at = [...path, name];
        if (typeof inner === "number") seen.add(at.join("."));
        return watch(inner, at);
      },
    });
  };
  run(watch(design, []) as Design);
  return seen;
}

describe("a number the assessor reads that is not finite", () => {
  // Stringers and lanes are counted through one by one, so that an endless number of them has no end; what is no number is tried there.
  const triedAt = (path: string): readonly number[] => (/\.(lanes|count)$/.test(path) ? [Number.NaN] : BAD);

  const outcome = (design: Design, layout: Assessor["layout"], steel: Parameters<Assessor["assess"]>[0]): "passes" | "fails" => {
    let assessor: Assessor;
    try {
      assessor = specificationOf(design.bridge).prepare(design, layout);
      assessor.assess(steel, null);
    } catch (error) {
      if (error instanceof RangeError) return "fails";
      throw error;
    }
    const ranked = rank(searchSpace(specificationOf(design.bridge), design, [layout], [steel]), 1);
    assessor.assess(steel, null);
    return assessor.passes || ranked.length > 0 ? "passes" : "fails";
  };

  // Lost without it: one number gone wrong upstream of the checks would turn into a beam that passes them all.
  it("never passes", () => {
    const found = new Map<string, number>();
    for (const [, values, name] of SOUND) {
      const { design, space } = preparedOf({ ...values, ...STRICT }, [shapeOf(name)]);
      const [{ layout }] = space.assessors;
      const [steel] = space.steels;
      const note = (place: string, bad: number): void => {
        const finding = `${place} = ${bad}`;
        found.set(finding, (found.get(finding) ?? 0) + 1);
      };
      expect(outcome(design, layout, steel)).toBe("passes");
      const read = readsOf(design, (watched) => {
        const [assessor] = searchSpace(specificationOf(watched.bridge), watched, [layout], [steel]).assessors;
        assessor.assess(steel, null);
      });
      const tried = numbersIn(design).filter((path) => read.has(path.join(".")));
      expect(tried.length).toBeGreaterThan(15);
      for (const path of tried) {
        for (const bad of triedAt(path.join("."))) {
          if (outcome(replaced(design, path, bad), layout, steel) === "passes") note(`design.${path.join(".")}`, bad);
        }
      }
      for (const key of ["spacingFt", "overhangFt", "count"] as const) {
        if (layout[key] === null) continue;
        for (const bad of triedAt(`layout.${key}`)) {
          if (outcome(design, { ...layout, [key]: bad }, steel) === "passes") note(`layout.${key}`, bad);
        }
      }
    }
    expect([...found].map(([finding, bridges]) => `${finding} (${bridges} of ${SOUND.length} bridges)`)).toEqual([]);
  });

  // Lost without it: a truck with a blank for an axle would weigh nothing, and every beam would carry it.
  it.each([
    ["lfd", "HS20-44"],
    ["lrfd", "HL-93"],
  ])("in the vehicle itself, by %s: never passes", (specification, name) => {
    const question = questionOf({ specification, "deck.composite": false, spanFt: 40, "deck.outToOutFt": 30 });
    const base = question.vehicles.find((one) => one.name === name) ?? failed(name);
    expect(rank(prepare(question).space, 1)).toHaveLength(1);
    const found: string[] = [];
    for (const path of numbersIn({ trains: base.trains, lane: base.lane, dynamicAllowance: base.dynamicAllowance })) {
      for (const bad of BAD) {
        const vehicle = replaced(base, path, bad);
        const others = question.vehicles.map((one) => (one.name === name ? vehicle : one));
        try {
          if (rank(prepare({ ...question, vehicles: others }).space, 1).length > 0) found.push(`${name}.${path.join(".")} = ${bad}`);
        } catch (error) {
          if (!(error instanceof RangeError || error instanceof InputError)) throw error;
        }
      }
    }
    expect(found).toEqual([]);
  });
});
