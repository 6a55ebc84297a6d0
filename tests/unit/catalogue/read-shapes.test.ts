// A list comes out of somebody's spreadsheet: a figure read as 0 or a comma taken for a column makes a shape that is not in the yard, and
// a fault reported on the wrong line sends its owner to mend a sound row. Every fault must come back, each on its own line.
import { describe, expect, it } from "vitest";
import { COLUMNS } from "../../../src/catalogue/columns.js";
import { mergeLists } from "../../../src/catalogue/merge-lists.js";
import { readCsvRows } from "../../../src/catalogue/read-rows.js";
import { readShapes } from "../../../src/catalogue/read-shapes.js";
import { designationKey, nominalDepthIn, type Shape } from "../../../src/catalogue/shape.js";
import { InputError, type InputIssue } from "../../../src/errors.js";
import { CATALOGUE } from "../../support/question.js";
import { invented, listText, shapeNamed } from "../../support/shapes.js";

const FILE = "yard.csv";
const read = (text: string) => readShapes(text, FILE, { bundled: false });
const shapesOf = (text: string) => read(text).shapes;

function issuesOf(text: string): readonly InputIssue[] {
  try {
    read(text);
  } catch (error) {
    if (error instanceof InputError) return error.issues;
    throw error;
  }
  throw new Error("the list was accepted");
}
const places = (issues: readonly InputIssue[]) => issues.map(({ file, line, field }) => [file, line, field]);

const three = [
  invented({ d: 24, bf: 9, tf: 0.8, tw: 0.5 }, { designation: "Y24" }),
  invented({ d: 30, bf: 10, tf: 1, tw: 0.5 }, { designation: "Y30" }),
  invented({ d: 36, bf: 12, tf: 1, tw: 0.625 }, { designation: "Y36" }),
];
const [, , third] = three;
const TEXT = listText(three);

/** The list with one cell of its second shape, line 3 of the file, replaced by other text, quoted where it must be. */
function withCell(column: string, text: string): string {
  const lines = TEXT.split("\n");
  const place = lines[0].split(",").indexOf(column);
  const cells = lines[2].split(",");
  cells[place] = /[",\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text;
  lines[2] = cells.join(",");
  return lines.join("\n");
}

describe("a sound list", () => {
  it("keeps every figure, name, place and order", () => {
    expect(shapesOf(TEXT)).toEqual(three.map((shape, index) => ({ ...shape, source: { file: FILE, line: index + 2 } })));
  });

  it("says whether it is the bundled catalogue", () => {
    expect(readShapes(TEXT, FILE, { bundled: true }).shapes.every(({ bundled }) => bundled)).toBe(true);
    expect(shapesOf(TEXT).some(({ bundled }) => bundled)).toBe(false);
  });

  it("takes columns in any order", () => {
    const turned = TEXT.split("\n")
      .map((line) => line.split(",").reverse().join(","))
      .join("\n");
    expect(shapesOf(turned)).toEqual(shapesOf(TEXT));
  });

  it("the row's own Fy, where the list has that column; an empty cell says nothing", () => {
    const fy: Readonly<Record<string, string>> = { Y24: "33", Y30: "", Y36: "50.5" };
    const text = listText(three, { yieldStressKsi: ({ designation }) => fy[designation] });
    expect(shapesOf(text).map(({ yieldStressKsi }) => yieldStressKsi)).toEqual([33, null, 50.5]);
  });

  it("a column of somebody's own is left unread, with a remark and a guess at what was meant", () => {
    const text = listText(three, { heat: () => "A7", yieldStresKsi: () => "33" });
    const { shapes, remarks } = read(text);
    expect(shapes.map(({ yieldStressKsi }) => yieldStressKsi)).toEqual([null, null, null]);
    expect(remarks).toEqual([
      expect.stringContaining("yard.csv, line 1, heat: not one of our columns"),
      expect.stringContaining("did you mean yieldStressKsi?"),
    ]);
  });

  it.each([" 24 ", "24.0", "+24", "2.4e1", "024"])("a figure written %j is 24", (text) => {
    expect(shapesOf(withCell("depthIn", text))[1].depthIn).toBe(24);
  });
});

describe("line numbers and line ends", () => {
  it("a byte-order mark belongs to no column", () => {
    expect(shapesOf(`\uFEFF${TEXT}`)).toEqual(shapesOf(TEXT));
  });

  it.each([
    ["CRLF", "\r\n"],
    ["CR", "\r"],
  ])("%s, with and without a last line end", (_, lineEnd) => {
    const text = TEXT.replaceAll("\n", lineEnd);
    expect(shapesOf(text)).toEqual(shapesOf(TEXT));
    expect(shapesOf(text + lineEnd)).toEqual(shapesOf(TEXT));
  });

  it("blank lines are skipped and counted", () => {
    const [header, ...rows] = TEXT.split("\n");
    const text = `\n${header}\n\n${rows[0]}\n , ,\n${rows[1]}\n\n\n${rows[2]}\n\n`;
    expect(shapesOf(text).map(({ source }) => source.line)).toEqual([4, 6, 9]);
  });

  it.each([
    ["LF within LF", "\n", "\n"],
    ["CRLF within CRLF", "\r\n", "\r\n"],
    ["LF within CRLF, as spreadsheets write it", "\r\n", "\n"],
  ])("a quoted line break in a note shifts no later line: %s", (_, lineEnd, within) => {
    const notes: Readonly<Record<string, string>> = { Y24: '"bent@at one@end"', Y30: "sound", Y36: "sound" };
    const text = listText(three, { note: ({ designation }) => notes[designation] })
      .replaceAll("\n", lineEnd)
      .replaceAll("@", within);
    expect(shapesOf(text).map(({ source }) => source.line)).toEqual([2, 5, 6]);
    const wrong = text.replace(`Y36,${third.weightPlf}`, "Y36,heavy");
    expect(places(issuesOf(wrong))).toEqual([[FILE, 6, "weightPlf"]]);
  });

  it("a quoted comma and a doubled quote stay within their cell", () => {
    const text = listText(three, { note: () => `"8 pieces, 20' long, marked ""B"""` });
    expect(shapesOf(text).map(({ designation }) => designation)).toEqual(["Y24", "Y30", "Y36"]);
    expect(readCsvRows(text, FILE)[1].cells.at(-1)).toBe(`8 pieces, 20' long, marked "B"`);
  });

  it("a quote that never ends is a fault of its own line", () => {
    const text = listText(three, { note: ({ designation }) => (designation === "Y30" ? `"bent` : "sound") });
    const issues = issuesOf(text);
    expect(issues[0]).toMatchObject({ file: FILE, line: 3 });
    expect(issues[0].allowed).toContain("quotes in pairs");
  });
});

describe("columns", () => {
  it("missing ones are all named, and what the list should have", () => {
    const lines = TEXT.split("\n").map((line) => line.split(","));
    const [d, Zx] = [lines[0].indexOf("depthIn"), lines[0].indexOf("plasticModulusXIn3")];
    const text = lines.map((cells) => cells.filter((_cell, place) => place !== d && place !== Zx).join(",")).join("\n");
    const issues = issuesOf(text);
    expect(places(issues)).toEqual([
      [FILE, 1, "depthIn"],
      [FILE, 1, "plasticModulusXIn3"],
    ]);
    for (const { problem, allowed } of issues) {
      expect(problem).toBe("this column is missing");
      for (const { name } of COLUMNS) expect(allowed).toContain(name);
    }
  });

  it("without the designation column there is no list", () => {
    expect(places(issuesOf(TEXT.replace("designation", "name")))).toEqual([[FILE, 1, "designation"]]);
  });

  it("one that stands twice is refused, not renamed or overwritten", () => {
    const text = listText(three, { depthIn: () => "99" });
    const issues = issuesOf(text);
    expect(places(issues)).toEqual([[FILE, 1, "depthIn"]]);
    expect(issues[0]).toMatchObject({ problem: "this column stands twice", allowed: "each column once" });
  });

  it("names are taken as they stand: other letters are another column", () => {
    expect(places(issuesOf(TEXT.replace("depthIn", "DepthIn")))).toEqual([[FILE, 1, "depthIn"]]);
  });

  it.each([
    ["a cell too many", (line: string) => `${line},1`],
    ["a cell too few", (line: string) => line.slice(0, line.lastIndexOf(","))],
  ])("a row with %s", (_, change) => {
    const lines = TEXT.split("\n");
    lines[3] = change(lines[3]);
    const issues = issuesOf(lines.join("\n"));
    expect(issues[0]).toMatchObject({ file: FILE, line: 4, field: "row", allowed: "as many cells as columns" });
  });
});

describe("figures", () => {
  const numeric = COLUMNS.map(({ name }) => name);

  it.each([
    "",
    " ",
    "1,234",
    "NaN",
    "Infinity",
    "-Infinity",
    "-3",
    "0",
    "1e9",
    "1e999",
    "twenty",
    "12in",
    "0x10",
    "1.2.3",
    "12 1/2",
    "\u201312",
    "-",
    "--",
    "1e",
    ".",
    "#N/A",
  ])("%j in any column is refused on its line, with what is allowed", (text) => {
    for (const column of numeric) {
      const issues = issuesOf(withCell(column, text));
      const own = issues.find(({ field }) => field === column);
      expect(own, column).toMatchObject({ file: FILE, line: 3 });
      expect(own?.problem).toBe(text.trim() === "" ? "no figure" : `"${text}"`);
      expect(own?.allowed).toMatch(/^a plain number from [\d.]+ to \d+$/);
      expect(issues.every(({ line }) => line === 3)).toBe(true);
    }
  });

  it("limits of a column are inclusive", () => {
    for (const { name, min, max } of COLUMNS.filter(
      ({ name: own }) => own === "weightPlf" || own === "torsionJIn4" || own === "radiusYIn",
    )) {
      expect(shapesOf(withCell(name, String(min)))[1][name]).toBe(min);
      expect(shapesOf(withCell(name, String(max)))[1][name]).toBe(max);
      expect(places(issuesOf(withCell(name, String(min * 0.999))))).toEqual([[FILE, 3, name]]);
      expect(places(issuesOf(withCell(name, String(max * 1.001))))).toEqual([[FILE, 3, name]]);
    }
  });

  it.each(["19.9", "70.1", "A36", "0", "-36", "NaN"])("an Fy of %j is refused", (text) => {
    const list = listText(three, { yieldStressKsi: ({ designation }) => (designation === "Y30" ? text : "") });
    expect(places(issuesOf(list))).toEqual([[FILE, 3, "yieldStressKsi"]]);
  });

  it.each(["20", "70"])("an Fy of %j is taken", (text) => {
    expect(shapesOf(listText(three, { yieldStressKsi: () => text }))[0].yieldStressKsi).toBe(Number(text));
  });

  it("all faults of all rows come back together", () => {
    const lines = TEXT.split("\n");
    lines[1] = lines[1].replace("Y24", "");
    lines[3] = lines[3].replace(String(third.weightPlf), "heavy").replace(/[^,]*$/, "");
    expect(places(issuesOf(lines.join("\n")))).toEqual([
      [FILE, 2, "designation"],
      [FILE, 4, "weightPlf"],
      [FILE, 4, "webSlenderness"],
    ]);
  });
});

describe("plates that make no shape", () => {
  it.each([
    ["two flanges as deep as the shape", "depthIn", "2", "flangeThicknessIn"],
    ["a web thicker than the flange is wide", "webThicknessIn", "8", "webThicknessIn"],
    ["k less than the flange", "kDesignIn", "0.99", "kDesignIn"],
  ])("%s", (_, column, text, field) => {
    const base = column === "webThicknessIn" ? withCell("flangeWidthIn", "7.9") : null;
    const list = base === null ? withCell(column, text) : withCells({ flangeWidthIn: "7.9", webThicknessIn: text });
    expect(places(issuesOf(list))).toEqual([[FILE, 3, field]]);
  });

  it("2 tf = d is refused, a hair less is taken", () => {
    // The second shape has tf 1 in.
    expect(places(issuesOf(withCell("depthIn", "2.0")))).toEqual([[FILE, 3, "flangeThicknessIn"]]);
    expect(issuesOf(withCell("depthIn", "2.0"))[0].allowed).toBe("2 tf < d");
    expect(shapesOf(withCell("depthIn", "2.0001"))[1].depthIn).toBe(2.0001);
  });

  function withCells(change: Readonly<Record<string, string>>): string {
    const lines = TEXT.split("\n").map((line) => line.split(","));
    for (const [column, text] of Object.entries(change)) lines[2][lines[0].indexOf(column)] = text;
    return lines.map((cells) => cells.join(",")).join("\n");
  }
});

describe("names", () => {
  it.each([
    ["the same", "Y24"],
    ["in other letters", "y24"],
    ["with blanks", "Y 24"],
  ])("a designation that stands already: %s", (_, name) => {
    const issues = issuesOf(TEXT.replace("Y36", name));
    expect(places(issues)).toEqual([[FILE, 4, "designation"]]);
    expect(issues[0]).toMatchObject({ problem: `${name} stands already on line 2`, allowed: "each designation once" });
  });

  it.each([
    ["none", ""],
    ["longer than 60 characters", "W".repeat(61)],
    ["one with a line break", `"Y\n30"`],
  ])("a designation of a kind nobody can print: %s", (_, name) => {
    expect(issuesOf(TEXT.replace("Y30", name))[0]).toMatchObject({ line: 3, field: "designation" });
  });

  it("two rows without a name are two faults, not a repetition", () => {
    const issues = issuesOf(TEXT.replace("Y30", "").replace("Y36", ""));
    expect(issues.map(({ problem }) => problem)).toEqual(["no designation", "no designation"]);
  });

  it.each([
    ["W30X116", "W30X116"],
    ["w 30 x 116", "W30X116"],
    [" w30\tx116 ", "W30X116"],
  ])("%j counts as %s", (typed, key) => {
    expect(designationKey(typed)).toBe(key);
  });

  it.each([
    ["W30X116", 30],
    ["w36x150", 36],
    ["36WF194", 30],
    ["B 12.5 x 20", 13],
    ["Y-17", 30],
  ])("nominal depth of %s: %f in, by its name or else to the nearest inch", (designation, depth) => {
    const real = designation === "B 12.5 x 20" ? 13 : 30.01;
    expect(nominalDepthIn(invented({ d: real, bf: 10, tf: 1, tw: 0.5 }, { designation }))).toBe(depth);
  });
});

describe("a list without shapes", () => {
  it.each([
    ["empty", ""],
    ["a byte-order mark alone", "\uFEFF"],
    ["blank lines alone", "\n\r\n ,,\n"],
  ])("%s", (_, text) => {
    const issues = issuesOf(text);
    expect(issues).toHaveLength(1);
    expect(issues[0]).toMatchObject({ file: FILE, problem: "the list is empty" });
    expect(issues[0].allowed).toContain("designation, weightPlf");
  });

  it("a header alone", () => {
    const [header] = TEXT.split("\n");
    for (const text of [header, `${header}\n`, `${header}\r\n\r\n`]) {
      expect(issuesOf(text)).toEqual([{ file: FILE, line: 1, problem: "the list has a header but no shapes", allowed: "one row a shape" }]);
    }
  });
});

describe("several lists together", () => {
  const from = (file: string, shape: Shape, change: Partial<Shape> = {}): Shape => ({ ...shape, source: { file, line: 2 }, ...change });
  const [first, second] = three;

  it("keeps their order, and the first of two equal shapes however its name is written", () => {
    const merged = mergeLists([
      [from("a.csv", first)],
      [from("b.csv", first, { designation: " y 24" }), from("b.csv", second)],
      [from("c.csv", third)],
    ]);
    expect(merged.map(({ designation, source }) => [designation, source.file])).toEqual([
      ["Y24", "a.csv"],
      ["Y30", "b.csv"],
      ["Y36", "c.csv"],
    ]);
  });

  it("the same name with other figures is refused, with both places and each figure", () => {
    const other = from("b.csv", first, { weightPlf: first.weightPlf + 1, inertiaXIn4: 9999 });
    const work = () => mergeLists([[from("a.csv", first)], [other, from("b.csv", second)], [from("c.csv", second, { depthIn: 30.5 })]]);
    expect(work).toThrow(InputError);
    try {
      work();
    } catch (error) {
      const { issues } = error as InputError;
      expect(places(issues)).toEqual([
        ["b.csv", 2, "Y24"],
        ["c.csv", 2, "Y30"],
      ]);
      expect(issues[0].problem).toBe(
        `other figures than a.csv, line 2: weightPlf ${first.weightPlf} and ${first.weightPlf + 1}; inertiaXIn4 ${first.inertiaXIn4} and 9999`,
      );
      expect(issues[1].problem).toContain("depthIn 30 and 30.5");
    }
  });

  it("another Fy is another figure", () => {
    const work = () => mergeLists([[from("a.csv", first)], [from("b.csv", first, { yieldStressKsi: 33 })]]);
    expect(work).toThrow("yieldStressKsi not given and 33");
  });

  it("nothing at all stays nothing", () => {
    expect(mergeLists([])).toEqual([]);
    expect(mergeLists([[], []])).toEqual([]);
  });
});

describe("the shipped catalogue", () => {
  it("289 shapes of different names, every one with its line", () => {
    expect(CATALOGUE).toHaveLength(289);
    expect(new Set(CATALOGUE.map(({ designation }) => designation)).size).toBe(289);
    expect(CATALOGUE.map(({ source }) => source.line)).toEqual(CATALOGUE.map((_, index) => index + 2));
    expect(shapeNamed("W44X408").source.line).toBe(2);
  });
});
