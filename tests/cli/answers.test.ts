import { readFileSync } from "node:fs";
import { join } from "node:path";
import Papa from "papaparse";
import { describe, expect, it } from "vitest";
import { contentsOf, folderWith, leanspan, type Outcome, SHIPPED } from "../support/program.js";

/** A JSON document, loosely. */
// biome-ignore lint/suspicious/noExplicitAny: names and kinds are what is tested
type Json = any;

const QUESTION = ["--span", "60", "--width", "33"];
const LFD = ["--spec", "lfd", "--no-composite"];
const PLANKS = [
  ...["--set", "deck.kind=timber-plank", "--set", "deck.thicknessIn=4"],
  ...["--set", "barriers.baseFt=0.5", "--set", "barriers.weightKlf=0.05"],
];
const ONE = ["W36X160", ...QUESTION, "--count", "4", "--spacing", "8.5", ...LFD];
/** A list with a name a spreadsheet would run, and a shape whose flange no rule of flexure covers. */
const ODD_LIST = [
  readFileSync(join(SHIPPED, "w-shapes.csv"), "utf8").split("\n")[0],
  "=1+1,210,61.9,36.7,12.2,0.83,1.36,2.11,13200,719,14.6,833,411,67.5,2.58,107,28,128000,4.48,39.1",
  "PL40,190,61.9,36.7,30,0.83,0.9,2.11,13200,719,14.6,833,411,67.5,2.58,107,28,128000,16.7,39.1",
].join("\n");

const runs = {
  lightest: ["lightest", ...QUESTION],
  "lightest, lfd": ["lightest", ...QUESTION, ...LFD],
  "lightest, lfd composite": ["lightest", ...QUESTION, "--spec", "lfd", "--composite"],
  "lightest, lrfd noncomposite": ["lightest", ...QUESTION, "--no-composite"],
  "lightest, spacing alone": ["lightest", "--span", "42", "--spacing", "7"],
  "lightest, nothing passes": ["lightest", "--span", "120", "--width", "33", "--max-depth", "20"],
  "lightest, no layout": ["lightest", ...QUESTION, "--set", "stringers.minSpacingFt=11"],
  "lightest, light vehicle": ["lightest", "--span", "35", "--width", "24", ...LFD, "--vehicle", "H15-44", "--grade", "36", "--top", "2"],
  counts: ["counts", ...QUESTION],
  "counts, no count": ["counts", "--span", "120", "--width", "33", "--max-depth", "20"],
  check: ["check", ...ONE],
  "check, passing": ["check", "W36X135", ...QUESTION],
  "check, spacing alone": ["check", "W40X149", "--span", "40", "--spacing", "7"],
  "check, outside the flexure rules": [
    ...["check", "pl40", ...QUESTION, "--count", "4", "--spacing", "8.5", ...LFD],
    ...["--sections", "odd.csv", "--grade", "50"],
  ],
  loads: ["loads", "--span", "60", "--vehicle", "HS20-44"],
  "loads, HL-93": ["loads", "--span", "80"],
} as const;
type Run = keyof typeof runs;
/** Exit codes other than 0. */
const EXIT: Readonly<Partial<Record<Run, number>>> = {
  "lightest, nothing passes": 1,
  "lightest, no layout": 1,
  "counts, no count": 1,
  check: 1,
  "check, outside the flexure rules": 1,
};
const NAMES = Object.keys(runs) as Run[];

const made = new Map<string, Promise<Outcome>>();

/** Each command line is run once, however many tests look at it. */
function run(name: Run, ...more: readonly string[]): Promise<Outcome> {
  const args = [...runs[name], ...more];
  const key = args.join(" ");
  const outcome = made.get(key) ?? leanspan(args, folderWith({ "odd.csv": ODD_LIST }));
  made.set(key, outcome);
  return outcome;
}

const json = async (name: Run): Promise<Json> => JSON.parse((await run(name, "--json")).stdout);

/** Dotted names of all values of the bridge in force. */
function keysOf(inputs: Json): string[] {
  return Object.entries(inputs).flatMap(([group, value]) =>
    typeof value === "object" && value !== null ? Object.keys(value).map((name) => `${group}.${name}`) : [group],
  );
}

/** Every assessment in a document, wherever it stands. */
function assessmentsIn(value: Json): Json[] {
  if (typeof value !== "object" || value === null) return [];
  const inner = Object.values(value).flatMap(assessmentsIn);
  return "stringers" in value && "governing" in value ? [value, ...inner] : inner;
}

function numbersIn(value: Json): number[] {
  if (typeof value === "number") return [value];
  return typeof value === "object" && value !== null ? Object.values(value).flatMap(numbersIn) : [];
}

describe.concurrent("every answer", () => {
  // Lost without it: a script that asks for a hundred bridges could not tell "found" from "nothing passes", or would trip over a stray line.
  it.each(NAMES)("%s: exit code, an answer alone on stdout, nothing on stderr", async (name) => {
    for (const form of [[], ["--json"]]) {
      const { code, stdout, stderr } = await run(name, ...form);
      expect(stderr).toBe("");
      expect(code).toBe(EXIT[name] ?? 0);
      expect(stdout.endsWith("\n")).toBe(true);
      expect(stdout).not.toContain("\u001b");
      expect(stdout).not.toMatch(/NaN|undefined|\[object|Infinity/);
    }
  });

  // Lost without it: what is only a preliminary selection would be read as a finished design.
  it.each(NAMES)("%s, as text: the caution at the end, the assumptions before it, lines that fit a page", async (name) => {
    const { stdout } = await run(name);
    const words = stdout.replace(/\s+/g, " ");
    expect(words).toMatch(/Caution: Preliminary selection .* licensed engineer .* $/);
    expect(words.indexOf(" Assumptions ")).toBeGreaterThan(0);
    expect(words.indexOf(" Assumptions ")).toBeLessThan(words.indexOf("Caution:"));
    const wide = stdout.split("\n").filter((line) => line.length > 80);
    expect(wide.length).toBeLessThan(stdout.split("\n").length / 5);
  });

  // Lost without it: whoever reads the JSON by the names agreed on would find them gone, and their spreadsheet empty.
  it.each(NAMES)("%s, as JSON: version, command, sources of every key, assumptions, caution", async (name) => {
    const document = await json(name);
    expect(document.schemaVersion).toBe(1);
    expect(document.command).toBe(name.split(",")[0]);
    expect(document.specification).toBe((runs[name] as readonly string[]).includes("lfd") ? "lfd" : "lrfd");
    expect(document.caution).toMatch(/Preliminary selection.*licensed engineer/);
    expect(document.assumptions.length).toBeGreaterThan(2);
    for (const sentence of document.assumptions) expect(sentence).toMatch(/^[A-Z].*[.)]$/);
    const keys = keysOf(document.inputs);
    expect(keys.length).toBeGreaterThan(50);
    expect(Object.keys(document.sources).sort()).toEqual([...keys].sort());
    for (const source of Object.values(document.sources)) expect(["practice", "bridge", "list", "flag"]).toContain(source);
    expect(document.sources.spanFt).toBe("flag");
    expect(document.sources.wearingPsf).toBe("practice");
    for (const value of numbersIn(document)) expect(Number.isFinite(value)).toBe(true);
  });

  // Lost without it: a checker would be told "passes" of a candidate one of whose required checks does not hold.
  it.each(NAMES)("%s, as JSON: every assessment has its names, and its verdict follows from its checks", async (name) => {
    for (const assessment of assessmentsIn(await json(name))) {
      expect(Object.keys(assessment)).toEqual(expect.arrayContaining(ASSESSMENT));
      expect(Object.keys(assessment.source).sort()).toEqual(["file", "line"]);
      expect(Object.keys(assessment.layout)).toEqual(expect.arrayContaining(["count", "spacingFt", "overhangFt"]));
      expect(Object.keys(assessment.governing)).toEqual(expect.arrayContaining(["id", "position", "ratio"]));
      const { count, spacingFt, overhangFt } = assessment.layout;
      expect(assessment.stringers.map(({ position }: Json) => position)).toEqual(count === null ? ["interior"] : ["interior", "exterior"]);
      expect(assessment.steelPlfOfBridge).toBe(count === null ? null : count * assessment.weightPlf);
      expect([overhangFt === null, typeof spacingFt]).toEqual([count === null, "number"]);
      let passes = true;
      for (const { effects, checks } of assessment.stringers) {
        expect(Object.keys(effects)).toEqual(expect.arrayContaining(EFFECTS));
        for (const check of checks) {
          expect(Object.keys(check)).toEqual(expect.arrayContaining(CHECK));
          expect(["demand", "limit", "advisory"]).toContain(check.kind);
          expect(check.ok).toBe(check.ratio !== null && check.ratio <= 1);
          if (check.ratio !== null) expect(check.ratio).toBeCloseTo(check.demand / check.capacity, 9);
          if (check.kind !== "advisory" && !check.ok) passes = false;
        }
        const { liveMomentPerLaneKipFt, distributionMoment, impact, liveMomentKipFt } = effects;
        const lfd = effects.distributionPer === "wheel line";
        expect(effects.liveMomentPerLaneIncludesImpact).toBe(!lfd);
        const share = lfd ? (distributionMoment / 2) * (1 + impact) : distributionMoment;
        expect(liveMomentKipFt).toBeCloseTo(liveMomentPerLaneKipFt * share, 6);
      }
      expect(assessment.passes).toBe(passes);
      const { id, position, ratio } = assessment.governing;
      const checks = assessment.stringers.find((one: Json) => one.position === position).checks;
      expect(checks.map((check: Json) => [check.id, check.ratio])).toContainEqual([id, ratio]);
    }
  });
});

const ASSESSMENT = ["shape", "weightPlf", "depthIn", "fyKsi", "source", "layout", "steelPlfOfBridge", "passes", "governing", "stringers"];
const CHECK = ["id", "kind", "article", "demand", "capacity", "unit", "ratio", "ok"];
const EFFECTS = [
  ...["deadStage1Klf", "deadStage2Klf", "deadWearingKlf", "momentStage1KipFt", "momentStage2KipFt", "momentWearingKipFt"],
  ...["liveMomentPerLaneKipFt", "liveMomentPerLaneIncludesImpact", "liveShearPerLaneKip", "impact", "distributionMoment"],
  ...["distributionShear", "distributionPer", "distributionRule", "liveMomentKipFt", "liveShearKip", "factoredMomentKipFt"],
  ...["factoredShearKip", "requiredZIn3", "effectiveWidthIn", "plasticMomentKipFt", "deflectionIn"],
];

describe.concurrent("lightest", () => {
  // Lost without it: the county engineer's first line would not say by which rules, on what deck and span the beam was chosen.
  it.each([
    ["lightest", /^LRFD.*9th ed.*2020.*; composite; 8\.5 in concrete; 60 ft$/],
    ["lightest, lfd", /^LFD.*17th ed.*2002.*; noncomposite; 8\.5 in concrete; 60 ft$/],
    ["lightest, lfd composite", /^LFD.*17th ed.*2002.*; composite; 8\.5 in concrete; 60 ft$/],
    ["lightest, lrfd noncomposite", /^LRFD.*9th ed.*2020.*; noncomposite; 8\.5 in concrete; 60 ft$/],
  ] as const)("%s opens with specification, edition, composite or not, deck and span; then the options, best first", async (name, head) => {
    const lines = (await run(name)).stdout.split("\n");
    expect(lines[0]).toMatch(head);
    const table = lines.findIndex((line) => /stringers .*shape .*lb\/ft .*steel .*depth .*governed by/.test(line));
    expect(table).toBeGreaterThan(0);
    const options = lines.slice(table + 1, table + 6);
    for (const [place, option] of options.entries()) {
      expect(option).toMatch(new RegExp(`^${place + 1} +\\d+ at [\\d.]+ .*W\\d+X\\d+ .*0\\.\\d{3}$`));
    }
    for (const heading of ["Why not lighter", "Lightest by depth", "By hand", "Examined:"]) {
      expect(lines.some((line) => line.startsWith(heading))).toBe(true);
    }
  });

  // Lost without it: the figures in somebody's spreadsheet would be others than those on the printed page.
  it("has its names in JSON, and says the same as the text", async () => {
    const document = await json("lightest");
    expect(Object.keys(document)).toEqual(
      expect.arrayContaining(["examined", "options", "nearestMiss", "whyNotLighter", "byDepth", "restsOn", "byHand"]),
    );
    const { layouts, shapes, candidates } = document.examined;
    expect([shapes, candidates]).toEqual([289, layouts * shapes]);
    expect(document.nearestMiss).toBeNull();
    expect(document.options.map(({ rank }: Json) => rank)).toEqual([1, 2, 3, 4, 5]);
    const { stdout } = await run("lightest");
    for (const { spacingRangeFt, assessment } of document.options) {
      expect(assessment.passes).toBe(true);
      expect(spacingRangeFt[0]).toBeLessThanOrEqual(assessment.layout.spacingFt);
      expect(spacingRangeFt[1]).toBeGreaterThanOrEqual(assessment.layout.spacingFt);
      expect(stdout).toMatch(
        new RegExp(`${assessment.shape} .* ${assessment.steelPlfOfBridge} .* ${assessment.governing.ratio.toFixed(3)}`),
      );
    }
    const weights = document.options.map(({ assessment }: Json) => assessment.steelPlfOfBridge);
    expect(weights).toEqual([...weights].sort((a, b) => a - b));
    const why = document.whyNotLighter;
    expect(Object.keys(why)).toEqual(expect.arrayContaining(["lighterShapes", "failing", "nearest", "rescue"]));
    expect(why.nearest).toHaveLength(5);
    for (const nearest of why.nearest) expect(nearest.passes).toBe(false);
    expect(Math.max(...(Object.values(why.failing) as number[]))).toBeLessThanOrEqual(why.lighterShapes);
    expect(Object.keys(why.rescue)).toEqual(expect.arrayContaining(["change", "assessment", "lighterThanAnswer"]));
    for (const row of document.byDepth)
      expect(Object.keys(row)).toEqual(expect.arrayContaining(["nominalDepthIn", "assessment", "extraPlfOfBridge"]));
    expect(document.restsOn.length).toBeGreaterThan(0);
    for (const one of document.restsOn) {
      expect(Object.keys(one)).toEqual(expect.arrayContaining(["assumption", "flippedTo", "outcome", "assessment"]));
      expect(["passes lighter", "fails", "other shape"]).toContain(one.outcome);
    }
    expect(document.byHand).toHaveLength(4);
  });

  // Lost without it: asking for more options would change which is first, and with it the beam that is ordered.
  it("lists as many options as asked for, the same ones first", async () => {
    const first = (document: Json): string[] => document.options.map(({ assessment }: Json) => assessment.shape + assessment.layout.count);
    const five = first(await json("lightest"));
    const answer = await leanspan([...runs.lightest, "--top", "12", "--json"]);
    expect(first(JSON.parse(answer.stdout)).slice(0, 5)).toEqual(five);
    expect(first(JSON.parse(answer.stdout))).toHaveLength(12);
  });

  // Lost without it: an engineer for whom nothing passes would learn neither what came nearest nor by how much it fails.
  it("when nothing passes, shows what came nearest and what it fails", async () => {
    const document = await json("lightest, nothing passes");
    expect([document.options, document.whyNotLighter, document.byDepth, document.restsOn, document.byHand]).toEqual([[], null, [], [], []]);
    const { shape, passes, governing } = document.nearestMiss;
    expect(passes).toBe(false);
    const { stdout } = await run("lightest, nothing passes");
    expect(stdout).toContain("Nothing passes.");
    expect(stdout.replace(/\s+/g, " ")).toMatch(new RegExp(`Nearest: .*${shape}.* at ${governing.ratio.toFixed(3)}\\. It fails: `));
  });

  // Lost without it: an engineer whose limits exclude every layout would not know which of them to give up.
  it("when no layout fits, names the limit in the way", async () => {
    expect((await run("lightest, no layout")).stdout).toMatch(/No layout fits this deck\.\nIn the way: stringers\.minOverhangFt 1/);
    const document = await json("lightest, no layout");
    expect([document.options, document.nearestMiss, document.examined.candidates]).toEqual([[], null, 0]);
  });

  // Lost without it: a weight per foot of bridge would be read that nobody can know without the number of stringers.
  it("for one interior stringer, leaves out what hangs on the count", async () => {
    const [{ assessment }] = (await json("lightest, spacing alone")).options;
    expect([assessment.layout.count, assessment.layout.overhangFt, assessment.steelPlfOfBridge]).toEqual([null, null, null]);
    const weights = (await json("lightest, spacing alone")).options.map((option: Json) => option.assessment.weightPlf);
    expect(weights).toEqual([...weights].sort((a, b) => a - b));
  });
});

describe.concurrent("counts", () => {
  // Lost without it: an estimator comparing four, five and six stringers would not see which is lightest and which nearly is.
  it("has a row for each count, marks the lightest and the fewest within 5 %", async () => {
    const document = await json("counts");
    expect(Object.keys(document)).toEqual(expect.arrayContaining(["counts", "lightestCount", "fewestWithin5Percent"]));
    const { stdout } = await run("counts");
    const rows = stdout.split("\n").filter((line) => /^[*+ ]+\d+ +[\d.]+ +[\d.]+ +W\d+X/.test(line));
    expect(rows).toHaveLength(document.counts.length);
    let least = Number.POSITIVE_INFINITY;
    for (const [place, row] of document.counts.entries()) {
      expect(Object.keys(row)).toEqual(expect.arrayContaining(["count", "best", "reason"]));
      expect(row.reason === null).toBe(row.best !== null);
      expect(rows[place]).toContain(` ${row.best.shape} `);
      expect(rows[place].includes("*")).toBe(row.count === document.lightestCount);
      expect(rows[place].includes("+")).toBe(row.count === document.fewestWithin5Percent);
      least = Math.min(least, row.best.steelPlfOfBridge);
    }
    const lightest = document.counts.find(({ count }: Json) => count === document.lightestCount);
    expect(lightest.best.steelPlfOfBridge).toBe(least);
  });

  // Lost without it: the two commands would name two beams for one bridge, and nobody could say which to trust.
  it("agrees with lightest", async () => {
    const [{ assessment }] = (await json("lightest")).options;
    const { counts, lightestCount } = await json("counts");
    const { best } = counts.find(({ count }: Json) => count === lightestCount);
    expect([best.shape, best.layout]).toEqual([assessment.shape, assessment.layout]);
  });

  // Lost without it: an empty row would look like a slip of the program instead of an answer about the bridge.
  it("says why no shape passes", async () => {
    const document = await json("counts, no count");
    expect([document.lightestCount, document.fewestWithin5Percent]).toEqual([null, null]);
    for (const { best, reason } of document.counts) {
      expect(best).toBeNull();
      expect(reason).toMatch(/none passes; nearest W\d+X\d+ .*\d/);
    }
  });
});

describe.concurrent("check", () => {
  // Lost without it: the checker would have numbers without the formula, the unit and the article they are to be checked by.
  it("prints every step with formula, numbers put in, result, unit and article", async () => {
    const document = await json("check");
    const { stdout } = await run("check");
    for (const { position, steps } of document.assessment.stringers) {
      const start = stdout.indexOf(`${position === "interior" ? "Interior" : "Exterior"} stringer: calculation`);
      expect(start).toBeGreaterThan(0);
      const text = stdout.slice(start).replace(/\s+/g, " ");
      const lines = steps.filter(({ type }: Json) => type === "step");
      expect(lines.length).toBeGreaterThan(45);
      for (const { symbol, expression, numbers, result, unit, article } of lines) {
        expect(text).toContain(`${symbol} = ${expression}`);
        expect(text).toContain(article);
        expect(typeof result).toBe("number");
        expect(unit).not.toBe("");
        for (const name of Object.keys(numbers)) expect(expression).toContain(name);
      }
    }
    expect(stdout).toContain("MLL = R * (L - x - e) / L * x - Me");
    expect(stdout.replace(/\s+/g, " ")).toContain("= 72 * (60 - 27.667 - 4.6667) / 60 * 27.667 - 112 = 806.53 kip-ft");
  });

  // Lost without it: the eye that runs down the column of marks would pass over the check that fails.
  it("marks what fails NG and what holds OK, in both positions", async () => {
    const { stdout } = await run("check");
    expect(stdout).toMatch(/^W36X160 .*w-shapes\.csv, line \d+.*: NG$/m);
    expect(stdout).toMatch(/^fatigue +demand .* 1\.348 +NG +10\.3$/m);
    expect(stdout).toMatch(/^shear +demand .* 0\.\d{3} +OK +10\.48\.8$/m);
    expect((await run("check, passing")).stdout).toMatch(/^W36X135 .*: OK$/m);
  });

  // Lost without it: a checker would not know that the layout shown was chosen from many, nor by which rule.
  it("with the layout left open, says how many were tried and shows the ranker's", async () => {
    const [{ assessment }] = (await json("lightest")).options;
    const passing = await json("check, passing");
    expect(passing.assessment.layout).toEqual(assessment.layout);
    expect(passing.layoutsTried).toBe((await json("lightest")).examined.layouts);
    expect((await run("check, passing")).stdout).toContain(`${passing.layoutsTried} layouts tried`);
  });

  // Lost without it: a name typed as the mill writes it would be unknown, and the reader would think the shape is missing.
  it("takes the shape's name in any case, with blanks", async () => {
    const { code, stdout } = await leanspan(["check", " w36 x160", ...ONE.slice(1)]);
    expect([code, stdout]).toEqual([1, (await run("check")).stdout]);
  });

  // Lost without it: a shape no rule covers would show a ratio that is no number, and a program reading it would call that a pass.
  it("turns what is not finite into null that is not ok", async () => {
    const { assessment } = await json("check, outside the flexure rules");
    const [{ checks }] = assessment.stringers;
    const flexure = checks.find(({ id }: Json) => id === "flexure");
    expect([flexure.ratio, flexure.ok, flexure.capacity]).toEqual([null, false, 0]);
    expect([assessment.governing.id, assessment.governing.ratio, assessment.passes]).toEqual(["flexure", null, false]);
  });
});

describe.concurrent("loads", () => {
  // Lost without it: whoever asks what a truck does to a span would have the figure and not know which load it comes from, or where.
  it("has the envelope with what governs, in text and JSON", async () => {
    const { loads } = await json("loads");
    expect(Object.keys(loads)).toEqual(
      expect.arrayContaining([
        ...["vehicle", "spanFt", "momentGoverning", "shearGoverning", "momentKipFt", "momentAtFt", "shearKip", "midspanDeflectionKipFt3"],
        "tenthPoints",
      ]),
    );
    expect([loads.vehicle, loads.spanFt, loads.momentGoverning, loads.shearGoverning]).toEqual(["HS20-44", 60, "truck", "truck"]);
    expect(loads.momentKipFt).toBeCloseTo(18 * 60 - 280 + 392 / 60, 6);
    expect(loads.shearKip).toBeCloseTo(72 - 672 / 60, 6);
    expect(loads.tenthPoints).toHaveLength(11);
    for (const [tenth, point] of loads.tenthPoints.entries()) {
      expect(Object.keys(point)).toEqual(expect.arrayContaining(["xFt", "momentKipFt", "shearKip", "deflectionKipFt3"]));
      expect(point.xFt).toBeCloseTo(6 * tenth, 9);
    }
    const { stdout } = await run("loads");
    expect(stdout).toContain("806.53 kip-ft at 27.67 ft (truck)");
    expect(stdout).toContain("60.8 kip (truck)");
  });

  // Lost without it: the dynamic allowance would be added a second time by a reader who took the figure for the bare load.
  it("has HL-93 with its 33 % and lane load in it, and says so", async () => {
    const { loads } = await json("loads, HL-93");
    const truck = (x: number): number => Math.max((72 * x * (80 - x - 14 / 3)) / 80 - 112, 0);
    expect(loads.momentKipFt).toBeGreaterThan(1.33 * truck(37.5) + (0.64 * 37.5 * 42.5) / 2 - 0.01);
    expect(loads.shearKip).toBeCloseTo(1.33 * (72 - 672 / 80) + 0.32 * 80, 6);
    expect((await run("loads, HL-93")).stdout).toMatch(/33 %.*lane load|lane load in it/);
  });
});

describe.concurrent("where values come from", () => {
  const agency = JSON.stringify({ wearingPsf: 35, steel: { grade: "36" }, barriers: { weightKlf: 0.3 } });
  const bridge = JSON.stringify({ spanFt: "48'-6\"", deck: { outToOutFt: 30 }, steel: { grade: "50W" }, barriers: { baseFt: 1.25 } });

  // Lost without it: nobody could say whether a value in the record is the owner's, the agency's or merely the program's.
  it("practice, then bridge file, then flags", async () => {
    const folder = folderWith({ "agency.json": agency, "lane.json": bridge });
    const { stdout, code } = await leanspan(
      ["lightest", "--practice", "agency.json", "--bridge", "lane.json", "--width", "31", "--set", "barriers.baseFt=1.5", "--json"],
      folder,
    );
    expect(code).toBe(0);
    const { inputs, sources } = JSON.parse(stdout);
    const told = (key: string): unknown[] => {
      const [group, name] = key.split(".");
      return [name === undefined ? inputs[group] : inputs[group][name], sources[key]];
    };
    expect(told("spanFt")).toEqual([48.5, "bridge"]);
    expect(told("deck.outToOutFt")).toEqual([31, "flag"]);
    expect(told("barriers.baseFt")).toEqual([1.5, "flag"]);
    expect(told("barriers.weightKlf")).toEqual([0.3, "practice"]);
    expect(told("wearingPsf")).toEqual([35, "practice"]);
    expect(told("steel.grade")).toEqual(["50W", "bridge"]);
    expect(told("roadwayFt")).toEqual([28, "practice"]);
  });

  // Lost without it: the first bridge file a newcomer tries would be refused.
  it("the shipped example bridges are answered", async () => {
    for (const name of ["county-road", "forest-road", "town-bridge"]) {
      const { code, stderr } = await leanspan(["counts", "--bridge", join(SHIPPED, "examples", `${name}.json`)]);
      expect([name, code, stderr]).toEqual([name, 0, ""]);
    }
  });
});

describe.concurrent("--csv", () => {
  const parsed = (text: string): { header: readonly string[]; rows: readonly Record<string, string>[] } => {
    const { data, meta, errors } = Papa.parse<Record<string, string>>(text, { header: true, skipEmptyLines: true });
    expect(errors).toEqual([]);
    return { header: meta.fields ?? [], rows: data };
  };

  // Lost without it: a table for the plan set would have columns without units, or rows that are not those of the answer.
  it.each([
    ["lightest", ["lightest", ...QUESTION], 5, "service-ii.demandKsi"],
    ["counts", ["counts", ...QUESTION, ...LFD], 6, "overload.demandKsi"],
    ["check", ["check", ...ONE], 1, "overload.demandKsi"],
  ] as const)("%s writes its rows, the figures of the JSON under names with units", async (command, args, rows, own) => {
    const folder = folderWith();
    const { stdout, stderr } = await leanspan([...args, "--csv", "answer.csv", "--json"], folder);
    expect(stderr).toBe("");
    const document = JSON.parse(stdout);
    const table = parsed(readFileSync(join(folder, "answer.csv"), "utf8"));
    expect(table.rows).toHaveLength(rows);
    expect(Object.keys(contentsOf(folder))).toHaveLength(1);
    for (const name of [
      "shape",
      "weightPlf",
      "depthIn",
      "fyKsi",
      "layout.count",
      "layout.spacingFt",
      "layout.overhangFt",
      "steelPlfOfBridge",
    ]) {
      expect(table.header).toContain(name);
    }
    for (const position of ["interior", "exterior"]) {
      for (const name of ["factoredMomentKipFt", "flexure.demandKipFt", "shear.capacityKip", own, "flexure.ratio", "flexure.ok"]) {
        expect(table.header).toContain(`${position}.${name}`);
      }
    }
    const assessments =
      command === "lightest"
        ? document.options.map(({ assessment }: Json) => assessment)
        : command === "counts"
          ? document.counts.map(({ best }: Json) => best)
          : [document.assessment];
    for (const [place, row] of table.rows.entries()) {
      const assessment = assessments[place];
      expect(row.shape).toBe(assessment.shape);
      expect(Number(row["governing.ratio"])).toBe(assessment.governing.ratio);
      expect(row.passes).toBe(String(assessment.passes));
      for (const { position, effects, checks } of assessment.stringers) {
        expect(Number(row[`${position}.factoredMomentKipFt`])).toBe(effects.factoredMomentKipFt);
        for (const { id, ratio } of checks) if (id !== "layout") expect(Number(row[`${position}.${id}.ratio`])).toBe(ratio);
      }
    }
  });

  // Lost without it: whoever draws the envelope from the table would draw it with points missing.
  it("loads writes the tenth points", async () => {
    const folder = folderWith();
    await leanspan(["loads", "--span", "60", "--csv", "loads.csv"], folder);
    const { header, rows } = parsed(readFileSync(join(folder, "loads.csv"), "utf8"));
    expect(header).toEqual(["xFt", "momentKipFt", "shearKip", "deflectionKipFt3"]);
    expect(rows).toHaveLength(11);
  });

  // Lost without it: last year's table would be gone because this year's has the same name.
  it("replaces an existing file with --force, and only then", async () => {
    const folder = folderWith({ "loads.csv": "mine" });
    expect((await leanspan(["loads", "--span", "60", "--csv", "loads.csv"], folder)).code).toBe(2);
    expect(readFileSync(join(folder, "loads.csv"), "utf8")).toBe("mine");
    expect((await leanspan(["loads", "--span", "60", "--csv", "loads.csv", "--force"], folder)).code).toBe(0);
    expect(readFileSync(join(folder, "loads.csv"), "utf8")).toMatch(/^xFt,/);
  });

  // Lost without it: opening the table in a spreadsheet would run what somebody put in as a shape's name.
  it("writes no cell that a spreadsheet would run", async () => {
    const folder = folderWith({ "odd.csv": ODD_LIST });
    await leanspan(["check", "=1+1", ...ONE.slice(1), "--sections", "odd.csv", "--grade", "50", "--csv", "answer.csv"], folder);
    const [row] = parsed(readFileSync(join(folder, "answer.csv"), "utf8")).rows;
    expect(row.shape).toBe("'=1+1");
  });

  // Lost without it: a table would be missing, or say less than the screen does, for just the bridges that need a second look.
  it("is written too when nothing passes, with its header or rows and no more", async () => {
    const folder = folderWith();
    const { code } = await leanspan(["counts", "--span", "120", "--width", "33", "--max-depth", "20", "--csv", "answer.csv"], folder);
    expect(code).toBe(1);
    const { rows } = parsed(readFileSync(join(folder, "answer.csv"), "utf8"));
    expect(rows.length).toBeGreaterThan(0);
    for (const row of rows) expect(row.passes).toBe("false");
  });
});

describe.concurrent("sections and init", () => {
  // Lost without it: a yard keeper would look for the lightest beam of a list in the wrong end of it.
  it("sections lists the shapes within bounds, lightest first, and ends with 1 when none is left", async () => {
    const { stdout } = await leanspan(["sections", "--max-depth", "24", "--min-weight", "50", "--max-weight", "100", "--json"]);
    const { schemaVersion, command, sections, caution } = JSON.parse(stdout);
    expect([schemaVersion, command]).toEqual([1, "sections"]);
    expect(caution).toMatch(/licensed engineer/);
    expect(sections.length).toBeGreaterThan(20);
    const weights = sections.map(({ weightPlf }: Json) => weightPlf);
    expect(weights).toEqual([...weights].sort((a, b) => a - b));
    for (const { depthIn, weightPlf } of sections) expect([depthIn <= 24, weightPlf >= 50, weightPlf <= 100]).toEqual([true, true, true]);
    const none = await leanspan(["sections", "--min-weight", "1900"]);
    expect([none.code, none.stderr]).toEqual([1, ""]);
  });

  // Lost without it: the file handed out to start from would not give the answer its own flags give.
  it.each([
    ["lrfd", ["--span", "52", "--width", "31"]],
    ["lfd", ["--span", "52", "--width", "31", ...LFD, "--vehicle", "H20-44"]],
    ["a deck of planks", ["--span", "30", "--width", "17", ...PLANKS]],
  ] as const)("init writes every key, and its file gives the same answer as the flags: %s", async (_, flags) => {
    const folder = folderWith();
    const made = await leanspan(["init", "lane.json", ...flags], folder);
    expect([made.code, made.stderr]).toEqual([0, ""]);
    const byFile = JSON.parse((await leanspan(["lightest", "--bridge", "lane.json", "--json"], folder)).stdout);
    const byFlags = JSON.parse((await leanspan(["lightest", ...flags, "--json"], folder)).stdout);
    expect(keysOf(JSON.parse(readFileSync(join(folder, "lane.json"), "utf8"))).sort()).toEqual(keysOf(byFlags.inputs).sort());
    const chosen = (document: Json) =>
      document.options.map(({ assessment }: Json) => [assessment.shape, assessment.layout, assessment.governing]);
    expect(chosen(byFile)).toEqual(chosen(byFlags));
  });
});
