// A user types the axles of the truck that really crosses: a slip read as a lighter truck would pass a stringer that truck breaks, so
// every fault must come back with the file, the vehicle and what is allowed, all at once.
import { describe, expect, it } from "vitest";
import { InputError, type InputIssue } from "../../../src/errors.js";
import { readVehicles, vehicleNamed } from "../../../src/loads/vehicles.js";
import { VEHICLES } from "../../support/question.js";
import { shipped } from "../../support/vehicles.js";

const FILE = "county-trucks.json";
const read = (content: unknown, known = VEHICLES) =>
  readVehicles(typeof content === "string" ? content : JSON.stringify(content), FILE, known);

function issuesOf(content: unknown): readonly InputIssue[] {
  try {
    read(content);
  } catch (error) {
    if (error instanceof InputError) return error.issues;
    throw error;
  }
  throw new Error("the file was accepted");
}

const SOUND = { name: "Log truck", axlesKip: [12, 17, 17], spacingsFt: [13, 4.5] };

describe("a sound file", () => {
  it("one train by its axles", () => {
    expect(read([SOUND])).toEqual([
      {
        name: "Log truck",
        aliases: [],
        source: FILE,
        trains: [{ name: "truck", axlesKip: [12, 17, 17], spacingsFt: [13, 4.5] }],
        lane: null,
        dynamicAllowance: null,
        lighterThanH20: false,
      },
    ]);
  });

  it("one axle needs no spacings", () => {
    expect(read([{ name: "Roller", axlesKip: [20] }])[0].trains[0].spacingsFt).toEqual([]);
  });

  it("several trains, lane, allowance, aliases, source", () => {
    const [vehicle] = read([
      {
        name: "Permit",
        aliases: ["P1"],
        source: "county permit office",
        trains: [
          { name: "crane", axlesKip: [30, 30], spacingsFt: [5] },
          { name: "tractor", axlesKip: [10, 22], spacingsFt: [12] },
        ],
        lane: { uniformKlf: 0.5, momentKip: 0, shearKip: 0 },
        together: { dynamicAllowance: 0.2 },
      },
    ]);
    expect(vehicle.aliases).toEqual(["P1"]);
    expect(vehicle.source).toBe("county permit office");
    expect(vehicle.trains.map(({ name, axlesKip }) => [name, axlesKip])).toEqual([
      ["crane", [30, 30]],
      ["tractor", [10, 22]],
    ]);
    expect(vehicle.lane).toEqual({ uniformKlf: 0.5, momentKip: 0, shearKip: 0 });
    expect(vehicle.dynamicAllowance).toBe(0.2);
  });

  it("a byte-order mark before the list is no fault", () => {
    expect(read(`\uFEFF${JSON.stringify([SOUND])}`)).toHaveLength(1);
  });
});

describe("lighter than H20, which brings Group IA", () => {
  it.each([
    [[39.99], true],
    [[40], false],
    [[12, 28], false],
    [[12, 27.9], true],
  ])("axles %j: %s", (axlesKip, lighter) => {
    const spacingsFt = axlesKip.slice(1).map(() => 14);
    expect(read([{ name: "Own", axlesKip, spacingsFt }])[0].lighterThanH20).toBe(lighter);
  });

  it("goes by the heaviest train, and by what the file says before that", () => {
    const trains = [
      { name: "light", axlesKip: [10], spacingsFt: [] },
      { name: "heavy", axlesKip: [20, 20], spacingsFt: [5] },
    ];
    expect(read([{ name: "Own", trains }])[0].lighterThanH20).toBe(false);
    expect(read([{ name: "Own", trains, lighterThanH20: true }])[0].lighterThanH20).toBe(true);
  });

  it("of the shipped vehicles H15 and HS15 alone, though HS15 weighs 54 kip", () => {
    expect(VEHICLES.filter(({ lighterThanH20 }) => lighterThanH20).map(({ name }) => name)).toEqual(["H15-44", "HS15-44"]);
  });
});

describe("faults", () => {
  it.each([
    ["too few spacings", { ...SOUND, spacingsFt: [13] }, "spacings do not match"],
    ["too many spacings", { ...SOUND, spacingsFt: [13, 4, 4] }, "spacings do not match"],
    ["spacings left out", { name: "Log truck", axlesKip: [12, 17] }, "spacings do not match"],
    [
      "a train of several with the wrong count",
      { name: "Own", trains: [{ name: "a", axlesKip: [9, 9], spacingsFt: [] }] },
      "spacings do not match",
    ],
  ])("%s", (_, entry, problem) => {
    const [issue, ...others] = issuesOf([entry]);
    expect(others).toEqual([]);
    expect(issue).toMatchObject({ file: FILE, field: entry.name });
    expect(issue.problem).toContain(problem);
    expect(issue.allowed).toBe("one spacing fewer than axles");
  });

  it.each([
    ["a negative axle", { ...SOUND, axlesKip: [12, -17, 17] }, "vehicle 1.axlesKip.1"],
    ["an axle of nothing", { ...SOUND, axlesKip: [12, 0, 17] }, "vehicle 1.axlesKip.1"],
    ["an axle beyond belief", { ...SOUND, axlesKip: [12, 301, 17] }, "vehicle 1.axlesKip.1"],
    ["an axle as text", { ...SOUND, axlesKip: [12, "17", 17] }, "vehicle 1.axlesKip.1"],
    ["a negative spacing", { ...SOUND, spacingsFt: [13, -4] }, "vehicle 1.spacingsFt.1"],
    ["axles on one spot", { ...SOUND, spacingsFt: [13, 0] }, "vehicle 1.spacingsFt.1"],
    ["no axles", { name: "Own", axlesKip: [], spacingsFt: [] }, "vehicle 1.axlesKip"],
    ["no name", { axlesKip: [12], spacingsFt: [] }, "vehicle 1.name"],
    ["an empty name", { ...SOUND, name: "" }, "vehicle 1.name"],
    ["an unknown key", { ...SOUND, axleKip: [12] }, "vehicle 1"],
    ["axles and trains at once", { ...SOUND, trains: [{ name: "a", axlesKip: [9], spacingsFt: [] }] }, "vehicle 1"],
    ["half a lane loading", { ...SOUND, lane: { uniformKlf: 0.64 } }, "vehicle 1.lane.momentKip"],
    ["a number where a vehicle belongs", 7, "vehicle 1"],
  ])("%s", (_, entry, field) => {
    const issues = issuesOf([entry]);
    expect(issues.map((issue) => issue.field)).toContain(field);
    for (const issue of issues) {
      expect(issue.file).toBe(FILE);
      expect(issue.allowed).toContain('"axlesKip"');
    }
  });

  it("the unknown key is named", () => {
    expect(issuesOf([{ ...SOUND, axleKip: [12] }])[0].problem).toContain("axleKip");
  });

  it("an axle that JSON turns into infinity is refused", () => {
    expect(issuesOf('[{"name":"Own","axlesKip":[1e999],"spacingsFt":[]}]')[0].field).toBe("vehicle 1.axlesKip.0");
  });

  it.each([
    ["of a shipped vehicle, in other letters", [{ ...SOUND, name: "hs20-44" }], "hs20-44"],
    ["that is a shipped alias", [{ ...SOUND, name: "HS20" }], "HS20"],
    ["as an alias", [{ ...SOUND, aliases: ["tandem"] }], "tandem"],
    ["twice in the file", [SOUND, { ...SOUND, name: "LOG TRUCK" }], "LOG TRUCK"],
    ["twice in one vehicle", [{ ...SOUND, aliases: ["log truck"] }], "log truck"],
  ])("a name that is taken: %s", (_, entries, name) => {
    const issues = issuesOf(entries);
    expect(issues).toHaveLength(1);
    expect(issues[0].problem).toBe(`the name "${name}" is taken`);
    expect(issues[0].allowed).toBe("a name of its own");
  });

  it.each([
    ["an object", "{}"],
    ["one vehicle without a list", JSON.stringify(SOUND)],
    ["null", "null"],
    ["a text", '"HS20"'],
  ])("not a list: %s", (_, text) => {
    const issues = issuesOf(text);
    expect(issues).toHaveLength(1);
    expect(issues[0]).toMatchObject({ file: FILE, problem: "the file does not hold a list" });
    expect(issues[0].allowed).toContain("a list of objects");
  });

  it.each(["", "[", '[{"name": "x",}]'])("not JSON: %j", (text) => {
    expect(issuesOf(text)[0].problem).toMatch(/^not JSON: /);
  });

  it("all faults of a file come back together", () => {
    const issues = issuesOf([
      { ...SOUND, axlesKip: [12, -17, 17] },
      { ...SOUND, name: "Second", spacingsFt: [1] },
      { ...SOUND, name: "HS20" },
    ]);
    expect(issues.map(({ field }) => field)).toEqual(["vehicle 1.axlesKip.1", "Second", "HS20"]);
  });
});

describe("a vehicle by name", () => {
  it("by name or alias, case ignored", () => {
    expect(vehicleNamed(VEHICLES, "hs20")).toBe(shipped("HS20-44"));
    expect(vehicleNamed(VEHICLES, "TYPE3S2")).toBe(shipped("Type 3S2"));
  });

  it("an unknown one is our own defect, not an undefined vehicle", () => {
    expect(() => vehicleNamed(VEHICLES, "HS21")).toThrow(RangeError);
  });
});

describe("the shipped vehicles", () => {
  // A digit wrong in an axle is a wrong answer for everybody: axles and spacings as the specifications give them.
  it.each([
    ["H15-44", [[6, 24]], [[14]], [0.48, 13.5, 19.5]],
    ["H20-44", [[8, 32]], [[14]], [0.64, 18, 26]],
    ["HS15-44", [[6, 24, 24]], [[14, 14]], [0.48, 13.5, 19.5]],
    ["HS20-44", [[8, 32, 32]], [[14, 14]], [0.64, 18, 26]],
    ["HS25", [[10, 40, 40]], [[14, 14]], [0.8, 22.5, 32.5]],
    ["Alternate Military", [[24, 24]], [[4]], null],
    [
      "HL-93",
      [
        [8, 32, 32],
        [25, 25],
      ],
      [[14, 14], [4]],
      [0.64, 0, 0],
    ],
    ["Tandem", [[25, 25]], [[4]], null],
    ["Type 3", [[16, 17, 17]], [[15, 4]], null],
    ["Type 3S2", [[10, 15.5, 15.5, 15.5, 15.5]], [[11, 4, 22, 4]], null],
    ["Type 3-3", [[12, 12, 12, 16, 14, 14]], [[15, 4, 15, 16, 4]], null],
    ["SU4", [[12, 8, 17, 17]], [[10, 4, 4]], null],
    ["SU5", [[12, 8, 8, 17, 17]], [[10, 4, 4, 4]], null],
    ["SU6", [[11.5, 8, 8, 17, 17, 8]], [[10, 4, 4, 4, 4]], null],
    ["SU7", [[11.5, 8, 8, 17, 17, 8, 8]], [[10, 4, 4, 4, 4, 4]], null],
    ["EV2", [[24, 33.5]], [[15]], null],
    ["EV3", [[24, 31, 31]], [[15, 4]], null],
  ])("%s", (name, axles, spacings, lane) => {
    const vehicle = shipped(name);
    expect(vehicle.trains.map(({ axlesKip }) => axlesKip)).toEqual(axles);
    expect(vehicle.trains.map(({ spacingsFt }) => spacingsFt)).toEqual(spacings);
    expect(vehicle.lane && [vehicle.lane.uniformKlf, vehicle.lane.momentKip, vehicle.lane.shearKip]).toEqual(lane);
  });

  it.each([
    ["Type 3", 50, 19],
    ["Type 3S2", 72, 41],
    ["Type 3-3", 80, 54],
    ["SU4", 54, 18],
    ["SU5", 62, 22],
    ["SU6", 69.5, 26],
    ["SU7", 77.5, 30],
    ["EV2", 57.5, 15],
    ["EV3", 86, 19],
  ])("%s: gross weight %f kip on a wheelbase of %f ft (seen)", (name, kip, ft) => {
    const { axlesKip, spacingsFt } = shipped(name).trains[0];
    expect(axlesKip.reduce((sum, axle) => sum + axle, 0)).toBe(kip);
    expect(spacingsFt.reduce((sum, gap) => sum + gap, 0)).toBe(ft);
  });
});
