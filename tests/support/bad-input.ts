import { readFileSync } from "node:fs";
import { join } from "node:path";
import { SHIPPED } from "./program.js";

type Files = Readonly<Record<string, string | Uint8Array | null>>;

/** One kind of bad input: what is typed after the command, the files it needs, and what the message must say. */
export interface BadInput {
  readonly name: string;
  readonly args: readonly string[];
  readonly files?: Files;
  /** The commands it is tried in. */
  readonly commands?: readonly string[];
  /** The place, the fault and what is allowed, each of which the message names. */
  readonly says: readonly RegExp[];
}

const [HEADER, ...ROWS] = readFileSync(join(SHIPPED, "w-shapes.csv"), "utf8").trimEnd().split("\n");
const rowOf = (name: string): string => ROWS.find((row) => row.startsWith(`${name},`)) ?? "";
const BEAM = rowOf("W36X160");
/** The row of a beam with one cell put in place of its own. */
const withCell = (column: string, cell: string): string =>
  BEAM.split(",")
    .map((own, place) => (HEADER.split(",")[place] === column ? cell : own))
    .join(",");
const list = (...rows: readonly string[]): string => `${[HEADER, ...rows].join("\n")}\n`;

const Q = ["--span", "60", "--width", "33"];
const STRINGERS = ["lightest", "counts"];
const SPAN_ONLY = ["lightest", "loads"];
const allowed = /allowed: /;
const SPAN = /--span: .*allowed: a length from 5 to 300 ft/;

const bridge = (content: unknown): Files => ({ "lane.json": typeof content === "string" ? content : JSON.stringify(content) });
const FILE = ["--bridge", "lane.json"];
const YARD = ["--sections", "yard.csv"];

/** The commands in turn, for a kind of slip that stands here several times over. */
const inTurn = (place: number): readonly string[] => [STRINGERS[place % STRINGERS.length]];

/** Slips so common that every command is tried with them; the rarer ones go through the same reading. */
const COMMON = ["negative", "zero", "huge", "infinite", "NaN", "text", "metric"];

/** A span that cannot be, as a flag. */
const spans: readonly BadInput[] = (
  [
    ["negative", "-60", /"-60"/],
    ["zero", "0", /"0"/],
    ["huge", "1e6", /"1e6"/],
    ["infinite", "1e999", /"1e999"/],
    ["NaN", "NaN", /"NaN"/],
    ["Infinity in words", "Infinity", /"Infinity"/],
    ["text", "sixty", /"sixty"/],
    ["empty", "", /""/],
    ["metric", "18m", /"18m" is metric; the same in our unit is 59\.055 ft/],
    ["metric with a comma", "18,3 m", /"18,3 m" is metric; .* 60\.039 ft/],
    ["hexadecimal", "0x3c", /"0x3c"/],
    ["two numbers", "60 62", /"60 62"/],
  ] as const
).map(([name, text, says]) => ({
  name: `a span that is ${name}`,
  args: ["--span", text],
  commands: COMMON.includes(name) ? SPAN_ONLY : ["lightest"],
  says: [SPAN, says],
}));

const figures: readonly BadInput[] = (
  [
    ["width", "--width", "-33", /--width: "-33".*10 to 200 ft/],
    ["width", "--width", "1e999", /--width: .*10 to 200 ft/],
    ["width", "--width", "10m", /--width: "10m" is metric.*32\.808 ft/],
    ["count", "--count", "1", /--count: 1; allowed: a whole number from 2 to 60/],
    ["count", "--count", "4.5", /--count: 4\.5; allowed: a whole number/],
    ["count", "--count", "four", /--count: "four"; allowed: a whole number/],
    ["count", "--count", "1e999", /--count: .*; allowed: a whole number/],
    ["spacing", "--spacing", "0", /--spacing: "0".*0\.5 to 20 ft/],
    ["spacing", "--spacing", "NaN", /--spacing: "NaN".*0\.5 to 20 ft/],
    ["spacing", "--spacing", "2.4m", /--spacing: "2.4m" is metric; .*7\.874 ft/],
    ["yield stress", "--fy", "500", /--fy: 500; allowed: a number from 20 to 70 ksi/],
    ["yield stress", "--fy", "345MPa", /--fy: "345MPa"; allowed: a number from 20 to 70 ksi/],
    ["yield stress", "--fy", "1e999", /--fy: .*allowed: a number from 20 to 70 ksi/],
    ["dead load", "--dead", "-1", /--dead: -1; allowed: a number from 0 to 20 kip\/ft/],
    ["dead load", "--dead", "heavy", /--dead: "heavy"; allowed: a number from 0 to 20 kip\/ft/],
    ["greatest depth", "--max-depth", "900mm", /--max-depth: "900mm" is metric; .*35\.433 in/],
    ["greatest depth", "--max-depth", "0", /--max-depth: "0".*3 to 80 in/],
    ["grade", "--grade", "55", /--grade: "55".*allowed: 36, 50, 50W/],
    ["grade", "--grade", "A36", /--grade: "A36" \(did you mean 36\?\)/],
  ] as const
).map(([what, flag, text, says], place) => ({
  name: `a ${what} of ${text}`,
  args: flag === "--width" ? ["--span", "60", flag, text] : [...Q, flag, text],
  commands: inTurn(place),
  says: [says],
}));

/** Every kind of bad input; the common ones are met in two commands, the others in one or the other. */
export const BAD_INPUT: readonly BadInput[] = [
  { name: "no span", commands: STRINGERS, args: ["--width", "33"], says: [/spanFt: missing; allowed: --span/] },
  { name: "no span for the loads", args: [], commands: ["loads", "lightest"], says: [/spanFt: missing; allowed: --span/] },
  ...spans,
  ...figures,

  // What belongs together
  {
    name: "neither width nor spacing",
    args: ["--span", "60"],
    commands: ["lightest", "check W36X160"],
    says: [/neither a width nor a spacing/, allowed, /--spacing/],
  },
  {
    name: "no width for counts",
    args: ["--span", "60", "--spacing", "7"],
    commands: ["counts"],
    says: [/deck\.outToOutFt: missing; allowed: --width/],
  },
  {
    name: "a count without width",
    args: ["--span", "60", "--count", "5"],
    commands: ["lightest", "check W36X160"],
    says: [/--count: .*needs the width/, allowed],
  },
  {
    name: "a count and a spacing without width",
    args: ["--span", "60", "--count", "5", "--spacing", "7"],
    commands: ["lightest", "check W36X160"],
    says: [/--count: .*needs the width/, allowed],
  },
  {
    name: "Fy and a grade",
    commands: STRINGERS,
    args: [...Q, "--fy", "36", "--grade", "50"],
    says: [/--fy: Fy 36 ksi and grade 50 together; allowed: one of the two/],
  },
  {
    name: "fewest stringers above the most",
    commands: STRINGERS,
    args: [...Q, "--set", "stringers.minCount=9", "--set", "stringers.maxCount=5"],
    says: [/9 is above stringers\.maxCount 5; allowed: at most 5/],
  },
  {
    name: "least spacing above the greatest",
    args: [...Q, "--set", "stringers.minSpacingFt=13"],
    says: [/13 is above stringers\.maxSpacingFt 12/, allowed],
  },
  {
    name: "composite on and off",
    commands: STRINGERS,
    args: [...Q, "--composite", "--no-composite"],
    says: [/--(no-)?composite: deck\.composite is set twice, to "true" and to "false"/, allowed],
  },
  {
    name: "a span given twice",
    commands: STRINGERS,
    args: ["--span", "60", "--span", "61", "--width", "33"],
    says: [/--span: spanFt is set twice, to "60" and to "61"; allowed: each value once/],
  },
  {
    name: "a span given twice, once by --set",
    args: [...Q, "--set", "spanFt=80"],
    says: [/spanFt is set twice, to "60" and to "80"; allowed: each value once/],
  },
  {
    name: "two bridge files",
    args: [...Q, ...FILE, "--bridge", "other.json"],
    files: { ...bridge({}), "other.json": "{}" },
    says: [/--bridge: 2 files are given; allowed: one file/],
  },
  { name: "one CSV named twice", args: [...Q, "--csv", "a.csv", "--csv", "b.csv"], says: [/--csv/, /twice/] },
  {
    name: "more lanes than fit",
    commands: STRINGERS,
    args: [...Q, "--set", "liveLoad.lanes=4"],
    says: [/4 lanes on a roadway of 30 ft; allowed: at most 3/],
  },
  {
    name: "a roadway too narrow",
    commands: STRINGERS,
    args: ["--span", "60", "--width", "12"],
    says: [/barriers\.baseFt: the clear roadway is 9 ft; allowed: at least 10 ft/],
  },
  { name: "a roadway wider than the deck", args: [...Q, "--set", "roadwayFt=40"], says: [/40 ft on a deck 33 ft wide; allowed: at most/] },
  {
    name: "a skew",
    commands: STRINGERS,
    args: [...Q, "--set", "skewDeg=15"],
    says: [/--set: 15; allowed: 0: the rules for skewed bridges are not built/],
  },
  { name: "another specification", commands: STRINGERS, args: [...Q, "--spec", "lsd"], says: [/--spec: "lsd".*allowed: lfd, lrfd/] },
  {
    name: "composite timber",
    args: [
      ...Q,
      "--composite",
      "--set",
      "deck.kind=glulam",
      "--set",
      "deck.thicknessIn=6",
      "--set",
      "barriers.baseFt=1",
      "--set",
      "barriers.weightKlf=0.1",
    ],
    says: [/--composite: a glulam deck does not act with the stringers; allowed: false/],
  },
  {
    name: "a timber deck that says nothing of itself",
    args: [...Q, "--set", "deck.kind=timber-plank"],
    says: [/deck\.thicknessIn: missing/, /barriers\.baseFt: missing/, /barriers\.weightKlf: missing/, allowed],
  },
  {
    name: "an unknown deck",
    args: [...Q, "--set", "deck.kind=steelgrid"],
    says: [/"steelgrid" \(did you mean steel-grid\?\); allowed: concrete, timber-plank/],
  },
  { name: "HL-93 by lfd", args: [...Q, "--spec", "lfd", "--vehicle", "HL-93"], says: [/--vehicle: HL-93 belongs to lrfd; allowed: /] },
  { name: "HS20 by lrfd", args: [...Q, "--vehicle", "HS20"], says: [/--vehicle: HS20-44 is not a live load of lrfd; allowed: HL-93/] },
  {
    name: "a detail of the other specification",
    args: [...Q, "--set", "liveLoad.fatigueDetail=C-stiffener"],
    says: [/--set: detail C-stiffener is not one of lrfd; allowed: A, B, /],
  },
  {
    name: "two stringers to choose by lrfd",
    args: ["--span", "60", "--width", "16", "--count", "2"],
    says: [/stringers\.count: two stringers are a nonredundant load path.*; allowed: three stringers or more, or the command check/],
  },
  {
    name: "diaphragms farther apart than the span",
    args: [...Q, "--set", "bracing.diaphragmSpacingFt=70"],
    says: [/70 ft on a span of 60 ft; allowed: at most the span/],
  },
  {
    name: "an overhang that cannot be",
    args: [...Q, "--count", "8", "--spacing", "6"],
    commands: ["lightest", "counts", "check W36X160"],
    says: [/8 stringers at 6 ft on a deck 33 ft wide leave an overhang of -4\.5 ft/, allowed],
  },
  {
    name: "an overhang less than half a flange",
    args: [...Q, "--count", "4", "--spacing", "10.9"],
    commands: ["lightest", "counts", "check W36X160"],
    says: [/overhang of 0\.15 ft.*half a flange/, allowed],
  },

  // Names
  {
    name: "an unknown vehicle",
    args: [...Q, "--vehicle", "HS22-44"],
    commands: ["lightest", "loads"],
    says: [/--vehicle: unknown vehicle "HS22-44" \(did you mean HS2[05]/, /allowed: H15-44, /],
  },
  {
    name: "an unknown shape",
    args: Q,
    commands: ["check W36X161"],
    says: [/SHAPE: no shape "W36X161" in the list \(did you mean W36X\d+\?\)/, allowed],
  },
  { name: "a pattern that leaves no shape", args: [...Q, "--shapes", "W99X*"], says: [/--shapes: no shape of the list is left/, allowed] },
  {
    name: "a shape that is deeper than allowed",
    args: [...Q, "--max-depth", "24"],
    commands: ["check W36X160"],
    says: [/W36X160 is left out: deeper than the bridge allows/, allowed],
  },
  {
    name: "an unknown flag",
    commands: STRINGERS,
    args: [...Q, "--vehicel", "H20"],
    says: [/unknown option '--vehicel'/, /Did you mean --vehicle\?/],
  },
  { name: "a flag without its value", args: ["--width", "33", "--span"], says: [/--span <ft>.*argument missing/] },
  { name: "a word too many", args: [...Q, "sixty"], says: [/too many arguments/] },
  { name: "no shape at all", args: Q, commands: ["check"], says: [/missing required argument 'shape'/] },
  {
    name: "an unknown command",
    args: Q,
    commands: ["lightst", "chek"],
    says: [/unknown command '(lightst|chek)'/, /Did you mean (lightest|check)\?/],
  },
  {
    name: "a number of options that is none",
    args: [...Q, "--top", "0"],
    commands: ["lightest"],
    says: [/--top/, /whole number from 1 to 1000/],
  },
  {
    name: "an unknown key by --set",
    args: [...Q, "--set", "deck.thickness=8"],
    says: [/--set: unknown key "deck\.thickness" \(did you mean deck\.thicknessIn\?\)/, allowed],
  },
  { name: "a --set without a value", args: [...Q, "--set", "deck.thicknessIn"], says: [/--set: "deck\.thicknessIn"; allowed: KEY=VALUE/] },
  { name: "a --set out of range", args: [...Q, "--set", "wearingPsf=-5"], says: [/--set: -5; allowed: a number from 0 to 300 lb\/ft2/] },

  // Bridge, practice and vehicle files
  {
    name: "an unknown key in a bridge file",
    commands: STRINGERS,
    args: [...Q, ...FILE],
    files: bridge({ barriers: { baseFeet: 1.5 } }),
    says: [/lane\.json, barriers\.baseFeet: unknown key \(did you mean baseFt\?\); allowed: baseFt, weightKlf/],
  },
  {
    name: "an unknown key at the top of a bridge file",
    args: [...FILE],
    files: bridge({ spanFeet: 60 }),
    commands: ["lightest", "loads"],
    says: [/lane\.json, spanFeet: unknown key \(did you mean spanFt\?\)/, allowed],
  },
  {
    name: "malformed JSON",
    args: [...Q, ...FILE],
    files: bridge('{\n  "spanFt": 60,\n  "wearingPsf": 25,,\n}\n'),
    commands: ["lightest", "loads"],
    says: [/lane\.json, line 3: not JSON/, allowed],
  },
  {
    name: "JSON that ends too soon",
    args: [...Q, ...FILE],
    files: bridge('{\n  "spanFt": 60,\n'),
    says: [/lane\.json, line 3: not JSON/, allowed],
  },
  {
    name: "a comment in JSON",
    args: [...Q, ...FILE],
    files: bridge('{\n  // the span\n  "spanFt": 60\n}\n'),
    says: [/lane\.json, line 2: not JSON/, allowed],
  },
  { name: "an empty bridge file", args: [...Q, ...FILE], files: bridge(""), says: [/lane\.json.*not JSON/, allowed] },
  {
    name: "a JSON array for a bridge",
    commands: STRINGERS,
    args: [...Q, ...FILE],
    files: bridge([{ spanFt: 60 }]),
    says: [/lane\.json: the file does not hold an object; allowed: an object with title, spanFt/],
  },
  {
    name: "a number where a group is needed",
    args: [...Q, ...FILE],
    files: bridge({ deck: 8.5 }),
    says: [/lane\.json, deck: 8\.5 stands where an object is needed; allowed: an object with kind/],
  },
  {
    name: "a group where a number is needed",
    args: [...Q, ...FILE],
    files: bridge({ wearingPsf: { value: 25 } }),
    says: [/lane\.json, wearingPsf: \{"value":25\}; allowed: a number from 0 to 300/],
  },
  {
    name: "text where a number is needed",
    args: [...Q, ...FILE],
    files: bridge({ wearingPsf: "25" }),
    says: [/lane\.json, wearingPsf: "25"; allowed: a number from 0 to 300/],
  },
  {
    name: "null for a span",
    args: [...FILE],
    files: bridge({ spanFt: null, deck: { outToOutFt: 33 } }),
    says: [/lane\.json, spanFt: null; allowed: a length from 5 to 300 ft/],
  },
  {
    name: "an infinite figure in a bridge file",
    commands: STRINGERS,
    args: [...Q, ...FILE],
    files: bridge('{ "wearingPsf": 1e999 }'),
    says: [/lane\.json, wearingPsf: .*allowed: a number from 0 to 300/],
  },
  {
    name: "a metric length in a bridge file",
    commands: STRINGERS,
    args: [...FILE],
    files: bridge({ spanFt: "18 m", deck: { outToOutFt: 33 } }),
    says: [/lane\.json, spanFt: "18 m" is metric; .*59\.055 ft/],
  },
  {
    name: "a practice that gives a span",
    args: [...Q, "--practice", "lane.json"],
    files: bridge({ spanFt: 60 }),
    says: [/lane\.json, spanFt: a practice cannot give this; allowed: /],
  },
  {
    name: "malformed JSON in vehicles",
    args: [...Q, "--vehicles", "trucks.json"],
    files: { "trucks.json": '[\n  {"name": "Log truck",\n   "axlesKip": [10, 20}\n]\n' },
    commands: SPAN_ONLY,
    says: [/trucks\.json, line 3: not JSON/, allowed],
  },
  {
    name: "an axle that weighs nothing",
    args: [...Q, "--vehicles", "trucks.json"],
    files: { "trucks.json": '[{"name": "Log truck", "axlesKip": [10, 0], "spacingsFt": [12]}]' },
    commands: SPAN_ONLY,
    says: [/trucks\.json, vehicle 1\.axlesKip\.1/, allowed],
  },
  {
    name: "an axle of infinite weight",
    args: [...Q, "--vehicles", "trucks.json"],
    files: { "trucks.json": '[{"name": "Log truck", "axlesKip": [10, 1e999], "spacingsFt": [12]}]' },
    commands: SPAN_ONLY,
    says: [/trucks\.json, vehicle 1\.axlesKip\.1/, allowed],
  },
  {
    name: "spacings that do not match the axles",
    args: [...Q, "--vehicles", "trucks.json"],
    files: { "trucks.json": '[{"name": "Log truck", "axlesKip": [10, 20], "spacingsFt": [12, 4]}]' },
    commands: SPAN_ONLY,
    says: [/trucks\.json, Log truck: spacings do not match the axles; allowed: one spacing fewer/],
  },
  {
    name: "a vehicle's name that is taken",
    args: [...Q, "--vehicles", "trucks.json"],
    files: { "trucks.json": '[{"name": "hs20", "axlesKip": [10, 20], "spacingsFt": [12]}]' },
    commands: SPAN_ONLY,
    says: [/trucks\.json, hs20: the name "hs20" is taken; allowed: /],
  },

  // Lists of shapes
  {
    name: "malformed CSV",
    commands: STRINGERS,
    args: [...Q, ...YARD],
    files: { "yard.csv": list(BEAM, withCell("designation", '"W36X161')) },
    says: [/yard\.csv, line 3: .*[Qq]uote/, allowed],
  },
  {
    name: "an empty CSV",
    commands: STRINGERS,
    args: [...Q, ...YARD],
    files: { "yard.csv": "" },
    says: [/yard\.csv: the list is empty; allowed: a header line/],
  },
  {
    name: "a CSV of a header alone",
    args: [...Q, ...YARD],
    files: { "yard.csv": list() },
    says: [/yard\.csv, line 1: .*no shapes; allowed: one row a shape/],
  },
  {
    name: "a missing column",
    commands: STRINGERS,
    args: [...Q, ...YARD],
    files: { "yard.csv": list(BEAM).replace("depthIn", "height") },
    says: [/yard\.csv, line 1, depthIn: this column is missing; allowed: /],
  },
  {
    name: "a column that stands twice",
    args: [...Q, ...YARD],
    files: { "yard.csv": `${HEADER},depthIn\n${BEAM},36\n` },
    says: [/yard\.csv, line 1, depthIn: this column stands twice; allowed: each column once/],
  },
  {
    name: "a duplicate designation",
    commands: STRINGERS,
    args: [...Q, ...YARD],
    files: { "yard.csv": list(BEAM, rowOf("W30X99"), withCell("designation", "w36 x160")) },
    says: [/yard\.csv, line 4, designation: w36 x160 stands already on line 2; allowed: each designation once/],
  },
  ...(
    [
      ["text", "36 in"],
      ["nothing", ""],
      ["NaN", "NaN"],
      ["infinity", "1e999"],
      ["a negative figure", "-36"],
      ["zero", "0"],
      ["a figure far too large", "360"],
    ] as const
  ).map(([what, cell], place) => ({
    name: `${what} for a depth in a CSV`,
    commands: inTurn(place),
    args: [...Q, ...YARD, "--grade", "50"],
    files: { "yard.csv": list(rowOf("W30X99"), withCell("depthIn", cell)) },
    says: [new RegExp(`yard\\.csv, line 3, depthIn: ${cell === "" ? "no figure" : `"${cell}"`}; allowed: a plain number from 2 to 80`)],
  })),
  {
    name: "a bad figure below a cell with a line break",
    args: [...Q, ...YARD],
    files: { "yard.csv": list(withCell("designation", '"W36\nX160"'), withCell("weightPlf", "heavy")) },
    says: [/yard\.csv, line 4, weightPlf: "heavy"; allowed: a plain number from 1 to 2000/],
  },
  {
    name: "a row too short",
    args: [...Q, ...YARD],
    files: { "yard.csv": list(BEAM, BEAM.split(",").slice(0, -2).join(",")) },
    says: [/yard\.csv, line 3, row: 18 cells where the header has 20; allowed: as many cells as columns/],
  },
  {
    name: "a shape that is no I",
    commands: STRINGERS,
    args: [...Q, ...YARD],
    files: { "yard.csv": list(withCell("flangeThicknessIn", "9.99").replace(",36.0,", ",19,")) },
    says: [/yard\.csv, line 2, flangeThicknessIn: two flanges are as deep as the shape or deeper; allowed: 2 tf < d/],
  },
  {
    name: "steel nobody names",
    commands: STRINGERS,
    args: [...Q, ...YARD],
    files: { "yard.csv": list(BEAM) },
    says: [/yard\.csv, line 2, W36X160: nothing says what steel this is; allowed: .*--fy/],
  },
  {
    name: "a flag above the row's own steel",
    args: [...Q, ...YARD, "--fy", "50"],
    files: { "yard.csv": `${HEADER},yieldStressKsi\n${BEAM},33\n` },
    says: [/yard\.csv, line 2, W36X160: the flag asks for Fy 50 ksi, the row's own steel has 33 ksi; allowed: Fy up to 33 ksi/],
  },
  {
    name: "one name with two sets of figures",
    args: [...Q, ...YARD, "--sections", "bundled", "--grade", "50"],
    files: { "yard.csv": list(withCell("weightPlf", "161")) },
    says: [/w-shapes\.csv, line \d+, W36X160: other figures than yard\.csv, line 2: weightPlf 161 and 160; allowed: /],
  },

  // Files that cannot be read
  ...(
    [
      ["missing", "nowhere.json", {}, /nowhere\.json: no such file; allowed: a readable text file/],
      ["a directory", "folder", { folder: null }, /folder: this is a directory; allowed: /],
      ["under a file", "lane.json/x.json", bridge("{}"), /lane\.json\/x\.json: a part of the path is not a directory; allowed: /],
      ["named too long", `${"long".repeat(100)}.json`, {}, /: the name is too long; allowed: /],
      ["binary", "lane.json", { "lane.json": new Uint8Array([123, 0, 1, 2, 125]) }, /lane\.json: binary data, not text; allowed: /],
      ["not UTF-8", "lane.json", { "lane.json": new Uint8Array([123, 34, 255, 34, 125]) }, /lane\.json: not text in UTF-8; allowed: /],
    ] as const
  ).flatMap(([what, path, files, says], place) => [
    { name: `a bridge file that is ${what}`, args: [...Q, "--bridge", path], files, says: [says], commands: SPAN_ONLY },
    { name: `a list that is ${what}`, args: [...Q, "--sections", path], files, says: [says], commands: inTurn(place) },
  ]),
  { name: "a practice that is missing", args: [...Q, "--practice", "nowhere.json"], says: [/nowhere\.json: no such file/, allowed] },
  {
    name: "vehicles that are missing",
    args: [...Q, "--vehicles", "nowhere.json"],
    commands: SPAN_ONLY,
    says: [/nowhere\.json: no such file/, allowed],
  },

  // Files to be written
  {
    name: "a CSV that exists",
    commands: STRINGERS,
    args: [...Q, "--csv", "old.csv"],
    files: { "old.csv": "mine" },
    says: [/old\.csv, --csv: the file exists; allowed: another name, or --force/],
  },
  {
    name: "a CSV into a missing directory",
    commands: STRINGERS,
    args: [...Q, "--csv", "nowhere/new.csv"],
    says: [/nowhere\/new\.csv, --csv: its directory does not exist; allowed: /],
  },
  {
    name: "a CSV that is a directory",
    args: [...Q, "--csv", "folder", "--force"],
    files: { folder: null },
    says: [/folder, --csv: this is a directory; allowed: /],
  },
  {
    name: "a CSV under a file",
    args: [...Q, "--csv", "old.csv/new.csv"],
    files: { "old.csv": "mine" },
    says: [/old\.csv\/new\.csv, --csv: its directory does not exist; allowed: /],
  },
].map((one, place) => ({ commands: inTurn(place), ...one }));

/** Command lines of the commands that take no span, met beside the others. */
export const BAD_SECTIONS: readonly BadInput[] = [
  { name: "a depth of text", args: ["--max-depth", "deep"], says: [/--max-depth: "deep" is not a length; allowed: /] },
  { name: "an infinite weight", args: ["--max-weight", "1e999"], says: [/--max-weight: "1e999"; allowed: /] },
  { name: "a negative depth", args: ["--min-depth", "-1"], says: [/--min-depth: "-1"; allowed: /] },
  {
    name: "a least depth above the greatest",
    args: ["--min-depth", "30", "--max-depth", "20"],
    says: [/--min-depth: 30 is above the greatest, 20; allowed: at most 20/],
  },
  {
    name: "a bad list",
    args: YARD,
    files: { "yard.csv": list(withCell("depthIn", "deep")) },
    says: [/yard\.csv, line 2, depthIn: "deep"/],
  },
];
