// Every answer says where each value came from. A practice that silently wins over the bridge's own file, or a timber deck that takes
// the concrete deck's thickness and barriers, gives a sound calculation of another bridge.
import { describe, expect, it } from "vitest";
import { type FlagValue, flagLayer, type Layer, readLayer } from "../../../src/bridge/layers.js";
import { type ResolveOptions, resolveBridge } from "../../../src/bridge/resolve.js";
import { InputError, type InputIssue } from "../../../src/errors.js";
import { bridgeFile, PRACTICE, VEHICLES } from "../../support/question.js";

const BASE = { specification: "lfd", "deck.composite": false, spanFt: 60, "deck.outToOutFt": 33 };
const file = (values: Readonly<Record<string, unknown>>): Layer => readLayer(bridgeFile(values), "otter-creek.json", "bridge");
const practice = (values: Readonly<Record<string, unknown>>): Layer => readLayer(bridgeFile(values), "agency.json", "practice");
const flags = (values: Readonly<Record<string, string>>): Layer =>
  flagLayer(Object.entries(values).map(([key, text]): FlagValue => ({ flag: `--set ${key}`, key, text })));
const resolve = (layers: readonly Layer[], needs: ResolveOptions["needs"] = "layout") =>
  resolveBridge(layers, { needs, vehicles: VEHICLES });
const bridgeOf = (values: Readonly<Record<string, unknown>>) => resolve([PRACTICE, file({ ...BASE, ...values })]);

function issuesOf(work: () => unknown): readonly InputIssue[] {
  try {
    work();
  } catch (error) {
    if (error instanceof InputError) return error.issues;
    throw error;
  }
  throw new Error("nothing was refused");
}

describe("practice < bridge < flag", () => {
  it("each value by the strongest that gives it, and its source", () => {
    const layers = [
      PRACTICE,
      practice({ wearingPsf: 30, "barriers.weightKlf": 0.5, "deflection.spanOver": 900 }),
      file({ ...BASE, "barriers.weightKlf": 0.42, "deflection.spanOver": 1000, title: "Otter Creek" }),
      flags({ "deflection.spanOver": "1200", spanFt: `58'-6"` }),
    ];
    const bridge = resolve(layers);
    expect(bridge.wearingPsf).toBe(30);
    expect(bridge.barriers.weightKlf).toBe(0.42);
    expect(bridge.deflection.spanOver).toBe(1200);
    expect(bridge.spanFt).toBe(58.5);
    expect(bridge.sources).toMatchObject({
      wearingPsf: "practice",
      "barriers.weightKlf": "bridge",
      "deflection.spanOver": "flag",
      spanFt: "flag",
      title: "bridge",
      "deck.outToOutFt": "bridge",
      "barriers.baseFt": "practice",
    });
  });

  it("null in a stronger layer asks for the default again", () => {
    const layers = [
      PRACTICE,
      file({ ...BASE, "liveLoad.adtt": 300, "liveLoad.lanes": 1 }),
      flags({ "liveLoad.adtt": "null", "liveLoad.lanes": "null" }),
    ];
    const bridge = resolve(layers);
    expect(bridge.liveLoad.adtt).toBeNull();
    expect(bridge.liveLoad.lanes).toBe(2);
  });

  it("every key of the bridge file has a value and a source", () => {
    const { sources } = bridgeOf({});
    const known = new Set(["practice", "bridge"]);
    expect(Object.values(sources).every((source) => known.has(source))).toBe(true);
    expect(
      Object.entries(sources)
        .filter(([, source]) => source === "bridge")
        .map(([key]) => key)
        .sort(),
    ).toEqual(Object.keys(BASE).sort());
  });

  it("a practice may not give what belongs to one bridge", () => {
    const issues = issuesOf(() => resolve([PRACTICE, practice({ spanFt: 60, "deck.outToOutFt": 30 }), file(BASE)]));
    expect(issues.map(({ file: name, field }) => [name, field])).toEqual([
      ["agency.json", "spanFt"],
      ["agency.json", "deck.outToOutFt"],
    ]);
  });
});

describe("values that hang on others", () => {
  it("roadway from width and barriers, lanes from the roadway", () => {
    const bridge = bridgeOf({ "deck.outToOutFt": 39.5, "barriers.baseFt": 1.75 });
    expect(bridge.roadwayFt).toBe(36);
    expect(bridge.liveLoad.lanes).toBe(3);
  });

  it("a roadway given stands, and counts the lanes", () => {
    const bridge = bridgeOf({ "deck.outToOutFt": 40, roadwayFt: 23 });
    expect(bridge.roadwayFt).toBe(23);
    expect(bridge.liveLoad.lanes).toBe(2);
  });

  it.each([
    [25, 25],
    [25.01, 25.01 / 2],
    [60, 20],
    [100, 25],
    [101, 101 / 5],
  ])("span %f ft: diaphragms at %f ft, L over the next whole number of L/25", (spanFt, spacingFt) => {
    expect(bridgeOf({ spanFt }).bracing.diaphragmSpacingFt).toBeCloseTo(spacingFt, 12);
  });

  it("the compression flange is held if the deck is composite, else braced by diaphragms, unless somebody says otherwise", () => {
    expect(bridgeOf({}).bracing.topFlange).toBe("diaphragms");
    expect(bridgeOf({ "deck.composite": true }).bracing.topFlange).toBe("held");
    expect(bridgeOf({ "deck.composite": null }).bracing.topFlange).toBe("held");
    expect(bridgeOf({ "bracing.topFlange": "held" }).bracing.topFlange).toBe("held");
    expect(bridgeOf({ "deck.composite": true, "bracing.topFlange": "diaphragms" }).bracing.topFlange).toBe("diaphragms");
  });

  it("the live load of the specification, by name or alias, whatever its letters", () => {
    expect(bridgeOf({}).liveLoad.vehicle).toBe("HS20-44");
    expect(bridgeOf({ "liveLoad.vehicle": "hs25-44" }).liveLoad.vehicle).toBe("HS25");
  });

  it.each([
    [8.5, 11.25],
    [7, 7.5],
    [9, 12.5],
  ])("a concrete deck of %f in spans %f ft at most: 30 t/12 - 10", (thicknessIn, most) => {
    expect(bridgeOf({ "deck.thicknessIn": thicknessIn }).deck.maxSpacingFt).toBeCloseTo(most, 12);
  });
});

describe("contradictions", () => {
  it.each([
    ["a roadway wider than its deck", { roadwayFt: 34 }, "roadwayFt"],
    ["barriers that leave less than 10 ft", { "deck.outToOutFt": 13, "barriers.baseFt": 1.6 }, "barriers.baseFt"],
    ["three lanes on 29.9 ft", { "deck.outToOutFt": 40, roadwayFt: 29.9, "liveLoad.lanes": 3 }, "liveLoad.lanes"],
    ["diaphragms farther apart than the span is long", { "bracing.diaphragmSpacingFt": 60.5 }, "bracing.diaphragmSpacingFt"],
    ["more sacrificial thickness than deck", { "deck.thicknessIn": 1.5, "deck.sacrificialIn": 1.5 }, "deck.sacrificialIn"],
    ["a least count above the greatest", { "stringers.minCount": 6, "stringers.maxCount": 5 }, "stringers.minCount"],
    ["a least spacing above the greatest", { "stringers.minSpacingFt": 9, "stringers.maxSpacingFt": 8 }, "stringers.minSpacingFt"],
    ["a least overhang above the greatest", { "stringers.minOverhangFt": 5 }, "stringers.minOverhangFt"],
    ["a skewed bridge", { skewDeg: 15 }, "skewDeg"],
    ["a vehicle nobody knows", { "liveLoad.vehicle": "HS21" }, "liveLoad.vehicle"],
    ["a metric length", { spanFt: "19 m" }, "spanFt"],
  ])("%s", (_, values, field) => {
    const issues = issuesOf(() => bridgeOf(values));
    expect(issues.map((issue) => issue.field)).toContain(field);
    for (const issue of issues) expect(issue.allowed, issue.problem).toBeTruthy();
  });

  it("at the limit nothing is refused", () => {
    expect(bridgeOf({ roadwayFt: 33 }).roadwayFt).toBe(33);
    expect(bridgeOf({ "deck.outToOutFt": 13, "barriers.baseFt": 1.5 }).liveLoad.lanes).toBe(1);
    expect(bridgeOf({ "deck.outToOutFt": 40, roadwayFt: 30, "liveLoad.lanes": 3 }).liveLoad.lanes).toBe(3);
    expect(bridgeOf({ "bracing.diaphragmSpacingFt": 60 }).bracing.diaphragmSpacingFt).toBe(60);
  });

  it("every fault of every layer comes back together, each with its place", () => {
    const issues = issuesOf(() =>
      resolve([
        PRACTICE,
        practice({ wearingPsf: -1 }),
        file({ ...BASE, spanft: 60, "deck.fcKsi": "four" }),
        flags({ "pour.constructionPsf": "999" }),
      ]),
    );
    expect(issues.map(({ file: name, field }) => [name, field])).toEqual([
      ["agency.json", "wearingPsf"],
      ["otter-creek.json", "deck.fcKsi"],
      ["otter-creek.json", "spanft"],
      [undefined, "--set pour.constructionPsf"],
    ]);
    expect(issues[2].problem).toContain("did you mean spanFt?");
  });

  it.each([Number.NaN, Number.POSITIVE_INFINITY, 0, -60, 1e9])("a span of %f", (spanFt) => {
    // JSON has no NaN: it writes null, which a span may not be either.
    expect(issuesOf(() => bridgeOf({ spanFt })).map(({ field }) => field)).toContain("spanFt");
  });

  it.each(["", "NaN", "Infinity", "1e999", "sixty", "-60", "0"])("a span flag %j", (text) => {
    expect(issuesOf(() => resolve([PRACTICE, file(BASE), flags({ spanFt: text })])).map(({ field }) => field)).toEqual(["--set spanFt"]);
  });
});

describe("decks other than concrete inherit nothing from the concrete deck", () => {
  const TIMBER = { "deck.kind": "timber-plank", "deck.thicknessIn": 4, "barriers.baseFt": 0.75, "barriers.weightKlf": 0.05 };
  // The base file of these bridges says nothing of composite action, which belongs to the deck.
  const other = (values: Readonly<Record<string, unknown>>) =>
    resolve([PRACTICE, file({ specification: "lfd", spanFt: 40, "deck.outToOutFt": 18, ...values })]);

  it.each(["timber-plank", "nail-laminated", "glulam"])("%s: thickness and barriers must be given", (kind) => {
    const issues = issuesOf(() => other({ "deck.kind": kind }));
    expect(issues.map(({ field }) => field)).toEqual(expect.arrayContaining(["deck.thicknessIn", "barriers.baseFt", "barriers.weightKlf"]));
    expect(issues.map(({ field }) => field)).not.toContain("deck.deckPsf");
  });

  it.each(["steel-grid", "corrugated-steel"])("%s: weight and greatest spacing too, for thickness does not tell them", (kind) => {
    const issues = issuesOf(() => other({ "deck.kind": kind }));
    expect(issues.map(({ field }) => field)).toEqual(
      expect.arrayContaining(["deck.thicknessIn", "barriers.baseFt", "barriers.weightKlf", "deck.deckPsf", "deck.maxSpacingFt"]),
    );
  });

  it("what the concrete deck has by practice, this one has not", () => {
    const { deck, barriers, bracing } = other(TIMBER);
    expect(deck).toEqual({
      kind: "timber-plank",
      outToOutFt: 18,
      thicknessIn: 4,
      sacrificialIn: 0,
      haunchWeightIn: 0,
      haunchSectionIn: 0,
      maxSpacingFt: 4,
      fcKsi: null,
      modularRatio: null,
      composite: false,
      formsPsf: 0,
      deckPsf: null,
    });
    expect(barriers).toEqual({ baseFt: 0.75, weightKlf: 0.05 });
    expect(bracing.topFlange).toBe("diaphragms");
  });

  it("nor does an agency's practice for concrete pass on, unless it speaks of this kind", () => {
    const concrete = practice({ "deck.thicknessIn": 9, "barriers.baseFt": 2, "barriers.weightKlf": 0.6 });
    const timber = practice({ "deck.kind": "timber-plank", "barriers.baseFt": 0.5, "barriers.weightKlf": 0.02 });
    const wanted = file({ specification: "lfd", spanFt: 40, "deck.outToOutFt": 18, "deck.kind": "timber-plank", "deck.thicknessIn": 4 });
    expect(issuesOf(() => resolve([PRACTICE, concrete, wanted])).map(({ field }) => field)).toEqual([
      "barriers.baseFt",
      "barriers.weightKlf",
    ]);
    expect(resolve([PRACTICE, timber, wanted]).barriers).toEqual({ baseFt: 0.5, weightKlf: 0.02 });
  });

  it("a flag that changes the kind leaves the file's deck behind, in both directions", () => {
    const concrete = file({ ...BASE, "deck.thicknessIn": 9 });
    const kind = flags({ "deck.kind": "glulam", "deck.thicknessIn": "6.75", "barriers.baseFt": "0.5", "barriers.weightKlf": "0.04" });
    const turned = resolve([PRACTICE, concrete, kind]);
    expect([turned.deck.thicknessIn, turned.deck.haunchWeightIn, turned.deck.maxSpacingFt]).toEqual([6.75, 0, 6]);
    expect(issuesOf(() => resolve([PRACTICE, concrete, flags({ "deck.kind": "glulam" })])).map(({ field }) => field)).toContain(
      "deck.thicknessIn",
    );
    const back = resolve([PRACTICE, file({ ...BASE, ...TIMBER }), flags({ "deck.kind": "concrete" })]);
    expect([back.deck.thicknessIn, back.barriers.baseFt, back.barriers.weightKlf]).toEqual([8.5, 1.5, 0.4]);
  });

  it("composite action is refused", () => {
    expect(issuesOf(() => other({ ...TIMBER, "deck.composite": true })).map(({ field }) => field)).toEqual(["deck.composite"]);
    expect(other({ ...TIMBER, "deck.composite": false }).deck.composite).toBe(false);
  });

  it.each(["sacrificialIn", "haunchWeightIn", "haunchSectionIn", "formsPsf", "fcKsi", "modularRatio"])(
    "a %s, which belongs to concrete, is refused and not left unread",
    (name) => {
      const value = name === "modularRatio" ? 8 : 2;
      expect(issuesOf(() => other({ ...TIMBER, [`deck.${name}`]: value })).map(({ field }) => field)).toEqual([`deck.${name}`]);
    },
  );

  it.each([
    ["nail-laminated", 3.99, 4],
    ["glulam", 3.99, 4],
    ["corrugated-steel", 1.99, 2],
  ])("%s of %f in has no distribution rule", (kind, thin, least) => {
    const deck = { ...TIMBER, "deck.kind": kind, "deck.deckPsf": 20, "deck.maxSpacingFt": 5 };
    expect(issuesOf(() => other({ ...deck, "deck.thicknessIn": thin })).map(({ field, allowed }) => [field, allowed])).toEqual([
      ["deck.thicknessIn", `at least ${least} in`],
    ]);
    expect(other({ ...deck, "deck.thicknessIn": least }).deck.thicknessIn).toBe(least);
  });

  it.each([
    ["timber-plank", 4, 4],
    ["timber-plank", 5.5, 5.5],
    ["nail-laminated", 6, 6],
    ["glulam", 8.5, 6],
  ])("%s of %f in spans %f ft at most unless given", (kind, thicknessIn, most) => {
    expect(other({ ...TIMBER, "deck.kind": kind, "deck.thicknessIn": thicknessIn }).deck.maxSpacingFt).toBe(most);
    expect(other({ ...TIMBER, "deck.kind": kind, "deck.thicknessIn": thicknessIn, "deck.maxSpacingFt": 3.25 }).deck.maxSpacingFt).toBe(
      3.25,
    );
  });
});
