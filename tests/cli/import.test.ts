// The built program on files: what it writes must be whole or not there at all, and stdout must hold the answer alone.
import { spawnSync } from "node:child_process";
import { chmodSync, existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, it } from "vitest";

const root = fileURLToPath(new URL("../../", import.meta.url));
const fixture = (name: string): string => join(root, "tests", "fixtures", "lists", name);
const example = (name: string): string => join(root, "data", "examples", name);
let folder = "";

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "leanspan-import-"));
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

function leanspan(...args: readonly string[]) {
  const { status, stdout, stderr } = spawnSync(process.execPath, [join(root, "dist", "cli", "main.js"), ...args], {
    encoding: "utf8",
    env: { ...process.env, NO_COLOR: "1" },
    maxBuffer: 1 << 28,
  });
  return { status, stdout, stderr };
}

describe("import", () => {
  it("reads the example yard, and says how", () => {
    const { status, stdout, stderr } = leanspan("import", example("county-yard.csv"));
    expect([status, stderr]).toEqual([0, ""]);
    expect(stdout).toContain("15 of 15 rows accepted, 0 refused");
    expect(stdout).toContain("Cells apart by semicolon, decimals by comma");
    expect(stdout).toContain("21 records = 15 accepted + 0 refused");
    expect(stdout).toContain("Caution:");
  });

  it("--json names columns, units, refusals and shapes", () => {
    const { status, stdout } = leanspan("import", fixture("slips.csv"), "--json");
    expect(status).toBe(0);
    const answer = JSON.parse(stdout);
    expect(Object.keys(answer)).toEqual(["schemaVersion", "command", "caution", "import", "shapes"]);
    expect(answer.import).toMatchObject({
      accepted: 6,
      columns: { depthIn: "d (in)" },
      units: { depthIn: "in" },
      derived: { inertiaYIn4: 6 },
      warnings: [],
    });
    expect(answer.import.refused).toHaveLength(13);
    expect(answer.import.refused[4]).toEqual({ line: 12, reason: "a channel, not an I-shape" });
    expect(answer.shapes).toHaveLength(6);
    expect(answer.shapes[0]).toMatchObject({ designation: "W36X150", line: 2, weightPlf: 150, depthIn: 35.9 });
  });

  it("--out and --refused together hold every row; --out is a list for every command", () => {
    const out = join(folder, "out.csv");
    const refused = join(folder, "refused.csv");
    expect(leanspan("import", fixture("slips.csv"), "--out", out, "--refused", refused).status).toBe(0);
    expect(readFileSync(out, "utf8").trimEnd().split("\n")).toHaveLength(1 + 6);
    const lines = readFileSync(refused, "utf8").trimEnd().split("\n");
    expect(lines).toHaveLength(1 + 13);
    expect(lines[0]).toContain("line,reason,Shape,Wt (lb/ft)");
    expect(lines[5]).toContain('12,"a channel, not an I-shape",C15X50,50');
    const listed = leanspan("sections", "--sections", out, "--json");
    expect(JSON.parse(listed.stdout).sections).toHaveLength(6);
    expect(leanspan("import", fixture("slips.csv"), "--out", out).status).toBe(2);
    expect(leanspan("import", fixture("slips.csv"), "--out", out, "--force").status).toBe(0);
  });

  it("our own list, written and imported again, is the same file", () => {
    const [first, second] = [join(folder, "first.csv"), join(folder, "second.csv")];
    expect(leanspan("import", example("service-centre.csv"), "--out", first).status).toBe(0);
    expect(leanspan("import", first, "--out", second).status).toBe(0);
    expect(readFileSync(second, "utf8")).toBe(readFileSync(first, "utf8"));
  });

  it("exits with 2 when no row is accepted, and writes no list", () => {
    const list = join(folder, "wrong.csv");
    const out = join(folder, "none.csv");
    writeFileSync(list, "Shape,d (in),bf (in),tw (in),tf (in),A (in2)\nB1,30,10,0.5,0.7,99\n");
    const { status, stdout, stderr } = leanspan("import", list, "--out", out);
    expect(status).toBe(2);
    expect(stdout).toContain("0 of 1 rows accepted");
    expect(stderr).toContain("no row is accepted");
    expect(existsSync(out)).toBe(false);
  });

  it.each([
    ["a missing file", () => join(folder, "nowhere.csv"), "no such file"],
    ["a directory", () => folder, "this is a directory"],
    ["a path through a file", () => join(example("county-yard.csv"), "x"), "a part of the path is not a directory"],
    ["a device", () => "/dev/null", "a device"],
  ])("%s is refused with 2", (_, path, words) => {
    const { status, stdout, stderr } = leanspan("import", path());
    expect([status, stdout]).toEqual([2, ""]);
    expect(stderr).toContain(words);
  });

  it.skipIf(process.getuid?.() === 0)("a file nobody may read is refused with 2", () => {
    const list = join(folder, "locked.csv");
    writeFileSync(list, "x");
    chmodSync(list, 0o000);
    const { status, stderr } = leanspan("import", list);
    expect(status).toBe(2);
    expect(stderr).toContain("no permission to read it");
  });

  it.skipIf(!existsSync("/dev/full"))("a full disk leaves nothing behind", () => {
    const list = example("county-yard.csv");
    const before = readdirSync(folder);
    const { status, stdout, stderr } = leanspan("import", list, "--out", "/dev/full", "--refused", join(folder, "left.csv"), "--force");
    expect([status, stdout]).toEqual([2, ""]);
    expect(stderr).toMatch(/the disk is full|no permission to write there/);
    expect(readdirSync(folder)).toEqual(before);
  });

  it("the list itself is not overwritten", () => {
    const list = join(folder, "own.csv");
    writeFileSync(list, readFileSync(fixture("units-row.csv")));
    const { status, stderr } = leanspan("import", list, "--out", list, "--force");
    expect(status).toBe(2);
    expect(stderr).toContain("this is the list to be read");
  });

  it("flags are checked: a bad name, a bad unit, a missing directory, all with what is allowed", () => {
    for (const args of [
      ["--map", "depth=H"],
      ["--units", "imperial"],
      ["--out", join(folder, "no", "where.csv")],
    ]) {
      const { status, stderr } = leanspan("import", fixture("units-row.csv"), ...args);
      expect(status).toBe(2);
      expect(stderr).toContain("allowed:");
    }
  });

  it("help ends in examples that run", () => {
    const { stdout } = leanspan("import", "--help");
    const examples = [...stdout.matchAll(/^ {2}leanspan (.+)$/gm)].map(([, line]) => line.split(" "));
    expect(examples.length).toBeGreaterThanOrEqual(2);
    for (const args of examples) {
      const inRoot = args.map((arg) => (arg.startsWith("data/") ? join(root, arg) : arg));
      expect(leanspan(...inRoot).status, args.join(" ")).toBe(0);
    }
  });
});

describe("sections --against", () => {
  it("finds the same name with other figures, and names that only one list has", () => {
    const [one, other] = [join(folder, "one.csv"), join(folder, "other.csv")];
    const lines = readFileSync(join(root, "data", "w-shapes.csv"), "utf8").split("\n");
    writeFileSync(one, lines.slice(0, 6).join("\n"));
    writeFileSync(other, [lines[0], lines[1], lines[2].replace(",1560,", ",1570,"), ...lines.slice(4, 8)].join("\n"));
    const { status, stdout } = leanspan("sections", "--sections", one, "--against", other, "--json");
    expect(status).toBe(0);
    const { comparison } = JSON.parse(stdout);
    expect(comparison.same).toBe(3);
    expect(comparison.differing).toHaveLength(1);
    expect(comparison.differing[0]).toMatchObject({
      designation: "W44X368",
      here: { line: 3 },
      there: { line: 3 },
      figures: [{ column: "sectionModulusXIn3", here: 1560, there: 1570 }],
    });
    expect(comparison.onlyHere.map(({ designation }: { designation: string }) => designation)).toEqual(["W44X335"]);
    expect(comparison.onlyThere).toHaveLength(2);
    expect(leanspan("sections", "--sections", one, "--against", other).stdout).toContain("Same name, other figures");
  });

  it("the catalogue against itself has nothing to tell", () => {
    const { status, stdout } = leanspan("sections", "--against", join(root, "data", "w-shapes.csv"));
    expect(status).toBe(0);
    // The head line breaks where the path of the list makes it, so blanks are taken as one.
    expect(stdout.replace(/\s+/g, " ")).toContain("289 shapes alike, 0 with other figures");
  });
});
