import { describe, expect, it } from "vitest";
import { BAD_INPUT, BAD_SECTIONS, type BadInput } from "../support/bad-input.js";
import { contentsOf, folderWith, leanspan } from "../support/program.js";

/** Runs a bad command line and demands what holds for every one: exit 2, silence on stdout, one message, nothing written, no stack. */
async function refused(command: string, { args, files }: Pick<BadInput, "args" | "files">): Promise<string> {
  const folder = folderWith(files);
  const before = contentsOf(folder);
  const writes = args.includes("--csv") || command.startsWith("init") ? [] : ["--csv", "answer.csv"];
  // A span is all that loads asks of a bridge: it has no flag for the width of the deck.
  const own = command === "loads" ? args.filter((arg, place) => arg !== "--width" && args[place - 1] !== "--width") : args;
  const { code, stdout, stderr } = await leanspan([...command.split(" "), ...writes, ...own], folder);
  expect(stdout).toBe("");
  expect(stderr).not.toMatch(/^ {4}at |defect|Error:|undefined|\[object/m);
  expect(stderr).toMatch(/^(leanspan: (a fault|\d+ faults) in the input\n( {2}\S.*\n)+|error: .*\n(\(Did you mean .*\)\n)?)$/);
  expect(code).toBe(2);
  expect(contentsOf(folder)).toEqual(before);
  return stderr;
}

const met = BAD_INPUT.flatMap((one) => (one.commands ?? []).map((command) => [one.name, command, one] as const));

describe.concurrent("bad input", () => {
  // Lost without it: a slip of the keyboard would give an answer for another bridge, or a page of stack instead of the place of the slip.
  it.each(met)("%s, in %s: the place, the fault, what is allowed", async (_, command, one) => {
    const message = await refused(command, one);
    for (const words of one.says) expect(message).toMatch(words);
  });

  // Lost without it: a bound mistyped would list other shapes than were asked for.
  it.each(BAD_SECTIONS.map((one) => [one.name, one] as const))("%s, in sections", async (_, one) => {
    const message = await refused("sections", one);
    for (const words of one.says) expect(message).toMatch(words);
  });

  // Lost without it: a bridge file somebody has worked on would be replaced by an empty form.
  it("init refuses an existing file and bad values, and writes nothing", async () => {
    expect(await refused("init lane.json", { args: [], files: { "lane.json": "mine" } })).toMatch(
      /lane\.json, FILE: the file exists; allowed: .*--force/,
    );
    expect(await refused("init lane.json", { args: ["--span", "zero"] })).toMatch(/--span: "zero"/);
    expect(await refused("init nowhere/lane.json", { args: [] })).toMatch(/nowhere\/lane\.json, FILE: its directory does not exist/);
  });

  // Lost without it: a script that forgot its command would count the page of help as an answer.
  it("no command at all is bad usage, with the help on stderr", async () => {
    const { code, stdout, stderr } = await leanspan([]);
    expect([code, stdout]).toEqual([2, ""]);
    expect(stderr).toMatch(/^Usage: leanspan/);
  });
});

describe.concurrent("several faults", () => {
  // Lost without it: an engineer would mend one fault, run again, meet the next, and give up at the fifth.
  it.each(["lightest", "counts", "check W36X160"])("%s names all at once: flags", async (command) => {
    const args = ["--span", "NaN", "--width", "-3", "--count", "2.5", "--grade", "60", "--vehicle", "HS21", "--set", "deck.thicknes=8"];
    const message = await refused(command, { args });
    for (const place of [
      /--span: "NaN"/,
      /--width: "-3"/,
      /--count: 2\.5/,
      /--grade: "60"/,
      /--vehicle: unknown vehicle "HS21"/,
      /"deck\.thicknes"/,
    ]) {
      expect(message).toMatch(place);
    }
    const [, ...faults] = message.trimEnd().split("\n");
    for (const fault of faults) expect(fault).toContain("allowed: ");
  });

  // Lost without it: one slip told twice would be looked for twice.
  it("are as many as were made: one slip is one fault", async () => {
    for (const slip of [
      ["--vehicle", "HS21"],
      ["--grade", "60"],
      ["--span", "61m"],
      ["--set", "deck.kind=concret"],
    ]) {
      const question = slip[0] === "--span" ? ["--width", "33"] : ["--span", "60", "--width", "33"];
      expect(await refused("lightest", { args: [...question, ...slip] })).toMatch(/^leanspan: a fault in the input\n/);
    }
  });

  // Lost without it: with four files at hand, the faults would be found one file at a time.
  it.each(["lightest", "counts"])("%s names all at once: every file and every flag", async (command) => {
    const files = {
      "lane.json": JSON.stringify({ spanFt: 0, deck: { outToOutFt: "30m", colour: "grey" }, wearingPfs: 25 }),
      "yard.csv": "designation,weightPlf\nW36X160,160\n",
      "trucks.json": "{}",
    };
    const args = [
      "--bridge",
      "lane.json",
      "--sections",
      "yard.csv",
      "--vehicles",
      "trucks.json",
      "--practice",
      "nowhere.json",
      "--fy",
      "5",
    ];
    const message = await refused(command, { args, files });
    const places = [
      /lane\.json, spanFt: 0/,
      /lane\.json, deck\.outToOutFt: "30m" is metric/,
      /lane\.json, deck\.colour: unknown key/,
      /lane\.json, wearingPfs: unknown key \(did you mean wearingPsf\?\)/,
      /yard\.csv, line 1, depthIn: this column is missing/,
      /yard\.csv, line 1, torsionJIn4: this column is missing/,
      /trucks\.json: the file does not hold a list/,
      /nowhere\.json: no such file/,
      /--fy: 5/,
    ];
    for (const place of places) expect(message).toMatch(place);
  });

  // Lost without it: a yard keeper with a long list would mend it cell by cell, one run each.
  it.each(["lightest", "sections"])("%s names all at once: every bad cell of a list", async (command) => {
    const [header, beam] = [
      "designation,weightPlf,areaIn2,depthIn,flangeWidthIn,webThicknessIn,flangeThicknessIn,kDesignIn,inertiaXIn4,sectionModulusXIn3,radiusXIn,plasticModulusXIn3,inertiaYIn4,sectionModulusYIn3,radiusYIn,plasticModulusYIn3,torsionJIn4,warpingCwIn6,flangeSlenderness,webSlenderness",
      "B1,160,47.0,36.0,12.0,0.650,1.02,1.77,9760,542,14.4,624,295,49.1,2.50,77.3,12.4,90200,5.88,49.9",
    ];
    const rows = [beam, beam.replace("B1,160", "B2,NaN"), beam.replace("B1", "").replace(",9760,", ",,"), beam.replace("2.50", "1e999")];
    const question = command === "lightest" ? ["--span", "60", "--width", "33", "--grade", "50"] : [];
    const message = await refused(command, {
      args: [...question, "--sections", "yard.csv"],
      files: { "yard.csv": [header, ...rows].join("\n") },
    });
    expect(message).toMatch(/^leanspan: 5 faults in the input\n/);
    for (const place of [
      /yard\.csv, line 3, weightPlf: "NaN"/,
      /yard\.csv, line 4, designation: no designation/,
      /yard\.csv, line 4, inertiaXIn4: no figure/,
      /yard\.csv, line 5, radiusYIn: "1e999"/,
      /yard\.csv, line 5, designation: B1 stands already on line 2/,
    ]) {
      expect(message).toMatch(place);
    }
  });
});
