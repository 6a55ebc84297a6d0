// Old steel taken for today's 50 ksi is half as strong again on paper as in the yard. One function says what Fy is, and whoever does not
// know the steel must be told so, not given the practice's grade.
import { describe, expect, it } from "vitest";
import { flagLayer, readLayer } from "../../../src/bridge/layers.js";
import { resolveBridge } from "../../../src/bridge/resolve.js";
import { askedYieldStress, gradeShapes, yieldStress } from "../../../src/bridge/yield-stress.js";
import type { Shape } from "../../../src/catalogue/shape.js";
import { InputError } from "../../../src/errors.js";
import { bridgeFile, PRACTICE, VEHICLES } from "../../support/question.js";
import { invented } from "../../support/shapes.js";

const plates = { d: 24, bf: 9, tf: 0.8, tw: 0.5 };
const bundled: Shape = invented(plates, { designation: "C1", bundled: true });
const own: Shape = invented(plates, { designation: "Y1", source: { file: "yard.csv", line: 7 } });
const ownOf = (fyKsi: number): Shape => ({ ...own, designation: "Y2", yieldStressKsi: fyKsi });

function bridgeOf(file: Readonly<Record<string, unknown>> = {}, typed: Readonly<Record<string, string>> = {}) {
  const base = { specification: "lfd", "deck.composite": false, spanFt: 60, "deck.outToOutFt": 33 };
  const flags = Object.entries(typed).map(([key, text]) => ({ flag: key === "steel.grade" ? "--grade" : "--fy", key, text }));
  const layers = [PRACTICE, readLayer(bridgeFile({ ...base, ...file }), "bridge.json", "bridge"), flagLayer(flags)];
  return resolveBridge(layers, { needs: "layout", vehicles: VEHICLES });
}

describe("the bundled catalogue", () => {
  it.each([
    ["the practice's grade", {}, {}, 50, "practice"],
    ["the file's grade", { "steel.grade": "36" }, {}, 36, "bridge"],
    ["the file's weathering grade", { "steel.grade": "50W" }, {}, 50, "bridge"],
    ["the file's Fy before the practice's grade", { "steel.fyKsi": 42 }, {}, 42, "bridge"],
    ["the flag's grade before the file's", { "steel.grade": "50" }, { "steel.grade": "36" }, 36, "flag"],
    ["the flag's grade before the file's Fy", { "steel.fyKsi": 33 }, { "steel.grade": "50" }, 50, "flag"],
    ["the flag's Fy before the file's grade", { "steel.grade": "36" }, { "steel.fyKsi": "46" }, 46, "flag"],
    ["the flag's Fy before the file's Fy", { "steel.fyKsi": 33 }, { "steel.fyKsi": "46" }, 46, "flag"],
  ] as const)("%s", (_, file, typed, fyKsi, source) => {
    const bridge = bridgeOf(file, typed);
    expect(askedYieldStress(bridge)).toEqual({ fyKsi, source });
    expect(yieldStress(bridge, bundled)).toEqual({ fyKsi, source });
  });

  it("a grade and an Fy typed together must agree", () => {
    expect(() => bridgeOf({}, { "steel.grade": "36", "steel.fyKsi": "50" })).toThrow(InputError);
    expect(askedYieldStress(bridgeOf({}, { "steel.grade": "50W", "steel.fyKsi": "50" }))).toEqual({ fyKsi: 50, source: "flag" });
  });
});

describe("a list of one's own", () => {
  it("the row's own Fy before file and practice, higher or lower", () => {
    expect(yieldStress(bridgeOf(), ownOf(33))).toEqual({ fyKsi: 33, source: "list" });
    expect(yieldStress(bridgeOf({ "steel.grade": "36" }), ownOf(50))).toEqual({ fyKsi: 50, source: "list" });
    expect(yieldStress(bridgeOf({ "steel.fyKsi": 60 }), ownOf(50))).toEqual({ fyKsi: 50, source: "list" });
  });

  it("a flag up to the row's Fy is taken, one above it refused with the place of the row", () => {
    expect(yieldStress(bridgeOf({}, { "steel.fyKsi": "30" }), ownOf(33))).toEqual({ fyKsi: 30, source: "flag" });
    expect(yieldStress(bridgeOf({}, { "steel.fyKsi": "33" }), ownOf(33))).toEqual({ fyKsi: 33, source: "flag" });
    const refused = yieldStress(bridgeOf({}, { "steel.grade": "36" }), ownOf(33));
    expect(refused).toMatchObject({ issue: { file: "yard.csv", line: 7, field: "Y2", allowed: "Fy up to 33 ksi" } });
  });

  it("a row without Fy takes file or flag, never the practice's grade", () => {
    expect(yieldStress(bridgeOf({ "steel.grade": "36" }), own)).toEqual({ fyKsi: 36, source: "bridge" });
    expect(yieldStress(bridgeOf({ "steel.fyKsi": 30 }), own)).toEqual({ fyKsi: 30, source: "bridge" });
    expect(yieldStress(bridgeOf({}, { "steel.grade": "50" }), own)).toEqual({ fyKsi: 50, source: "flag" });
    const unknown = yieldStress(bridgeOf(), own);
    expect(unknown).toMatchObject({ issue: { file: "yard.csv", line: 7, field: "Y1", problem: "nothing says what steel this is" } });
  });

  it("an Fy in an agency's practice is a practice all the same", () => {
    const agency = readLayer(bridgeFile({ "steel.fyKsi": 46 }), "agency.json", "practice");
    const file = readLayer(
      bridgeFile({ specification: "lfd", "deck.composite": false, spanFt: 60, "deck.outToOutFt": 33 }),
      "b.json",
      "bridge",
    );
    const bridge = resolveBridge([PRACTICE, agency, file], { needs: "layout", vehicles: VEHICLES });
    expect(yieldStress(bridge, bundled)).toEqual({ fyKsi: 46, source: "practice" });
    expect(yieldStress(bridge, own)).toHaveProperty("issue");
  });
});

describe("a whole list", () => {
  it("each shape with its Fy, in order", () => {
    const graded = gradeShapes(bridgeOf({ "steel.grade": "36" }), [ownOf(33), bundled, own]);
    expect(graded.map(({ shape, fyKsi }) => [shape.designation, fyKsi])).toEqual([
      ["Y2", 33],
      ["C1", 36],
      ["Y1", 36],
    ]);
  });

  it("every shape at fault is named at once", () => {
    const work = () => gradeShapes(bridgeOf(), [own, bundled, { ...own, designation: "Y3", source: { file: "yard.csv", line: 9 } }]);
    expect(work).toThrow(InputError);
    expect(work).toThrow(/yard\.csv, line 7, Y1: .*\nyard\.csv, line 9, Y3: /);
  });
});
