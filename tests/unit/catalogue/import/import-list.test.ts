// A list comes from a stranger's spreadsheet. Whatever its separators, decimals, units and stray rows, the figures that come out must be those
// that were put in, and a list that can be read two ways must be sent back: a misread figure ends up in a bridge.
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { importList } from "../../../../src/catalogue/import/import-list.js";
import { readShapes } from "../../../../src/catalogue/read-shapes.js";
import type { Shape } from "../../../../src/catalogue/shape.js";
import { listHeader, listRow, OPTIONAL_COLUMNS } from "../../../../src/catalogue/write-shapes.js";
import { InputError } from "../../../../src/errors.js";
import { shapeNamed } from "../../../support/shapes.js";

const bytesOf = (name: string): Uint8Array => readFileSync(new URL(`../../../fixtures/lists/${name}`, import.meta.url));
const imported = (name: string, wishes = { map: [] as string[], units: [] as string[] }) => importList(bytesOf(name), name, wishes);
const example = (name: string) => importList(readFileSync(new URL(`../../../../data/examples/${name}`, import.meta.url)), name);

async function faultsOf(work: Promise<unknown>): Promise<string> {
  try {
    await work;
  } catch (error) {
    if (error instanceof InputError) return error.message;
    throw error;
  }
  throw new Error("the list was accepted");
}

/** Given figures within the rounding of the file, derived ones within 3 % (J, which goes with the cube of a thickness, 12 %). */
function expectFigures(shapes: readonly Shape[], given: number, derivedWithin = 0.03): void {
  for (const shape of shapes) {
    const source = shapeNamed(shape.designation);
    for (const name of [
      "weightPlf",
      "areaIn2",
      "depthIn",
      "flangeWidthIn",
      "webThicknessIn",
      "flangeThicknessIn",
      "inertiaXIn4",
      "sectionModulusXIn3",
    ] as const) {
      expect(Math.abs(shape[name] / source[name] - 1), `${shape.designation} ${name}: ${shape[name]} for ${source[name]}`).toBeLessThan(
        given,
      );
    }
    for (const name of [
      "plasticModulusXIn3",
      "inertiaYIn4",
      "sectionModulusYIn3",
      "radiusXIn",
      "radiusYIn",
      "plasticModulusYIn3",
    ] as const) {
      expect(Math.abs(shape[name] / source[name] - 1), `${shape.designation} ${name}: ${shape[name]} for ${source[name]}`).toBeLessThan(
        derivedWithin,
      );
    }
    expect(Math.abs(shape.torsionJIn4 / source.torsionJIn4 - 1), `${shape.designation} J`).toBeLessThan(4 * derivedWithin);
  }
}

describe("lists as the world writes them", () => {
  it.each([
    ["semicolon-decimal-comma.csv", 1e-9],
    ["tab-separated.tsv", 1e-9],
    ["utf-16-little-endian.csv", 1e-9],
    ["utf-16-big-endian.csv", 1e-9],
    ["byte-order-mark-crlf.csv", 1e-9],
    ["thousands-commas.csv", 1e-9],
    ["thousands-blanks.csv", 1e-9],
    ["thousands-points.csv", 1e-9],
    ["blank-words.csv", 1e-9],
    ["title-and-total-rows.csv", 1e-9],
    ["units-row.csv", 1e-9],
    ["two-blocks-of-units.csv", 1e-9],
    ["page-breaks.csv", 1e-9],
    ["quoted-newlines.csv", 1e-9],
    ["unused-columns.csv", 1e-9],
    ["repeated-axis-columns.csv", 1e-9],
    ["formula-cells.csv", 1e-9],
    ["yard-columns.csv", 1e-9],
    ["european-axes.csv", 0.006],
    ["british-symbols.csv", 0.006],
    ["metric-no-units.csv", 0.006],
  ])("%s", async (name, within) => {
    const { summary, shapes } = await imported(name);
    expect(summary.refused).toEqual([]);
    expect(summary.warnings).toEqual([]);
    expect(shapes).toHaveLength(10);
    expectFigures(shapes, within);
  });

  it("windows-1252.csv, without inertias: they are derived", async () => {
    const { summary, shapes } = await imported("windows-1252.csv");
    expect([shapes.length, summary.refusedCount, summary.reading.encoding.encoding]).toEqual([10, 0, "windows-1252"]);
    expect(summary.derived.inertiaXIn4).toBe(10);
    expectFigures(shapes, 0.02);
  });

  it("fractions.csv, to the sixteenth and the thirty-second", async () => {
    const { summary, shapes } = await imported("fractions.csv");
    expect([shapes.length, summary.refusedCount]).toEqual([10, 0]);
    for (const shape of shapes) {
      const source = shapeNamed(shape.designation);
      expect(Math.abs(shape.depthIn - source.depthIn)).toBeLessThanOrEqual(1 / 32 + 1e-9);
      expect(Math.abs(shape.webThicknessIn - source.webThicknessIn)).toBeLessThanOrEqual(1 / 64 + 1e-9);
      expect(shape.inertiaXIn4).toBe(source.inertiaXIn4);
    }
  });

  it("metric scalings nobody states are settled by the figures", async () => {
    const { summary } = await imported("metric-no-units.csv");
    const units = Object.fromEntries([...summary.reading.columns].map(([field, { unit }]) => [field, unit.name]));
    expect(units).toMatchObject({ depthIn: "mm", areaIn2: "mm2", weightPlf: "kg/m", inertiaXIn4: "10^6 mm4", sectionModulusXIn3: "cm3" });
  });

  it("strong axes are those of the figures: y in European tables, Z elastic and S plastic in British ones", async () => {
    const european = (await imported("european-axes.csv")).summary.reading.columns;
    expect([european.get("inertiaXIn4")?.header, european.get("inertiaYIn4")?.header]).toEqual(["Iy", "Iz"]);
    const british = (await imported("british-symbols.csv")).summary.reading.columns;
    expect([british.get("sectionModulusXIn3")?.header, british.get("plasticModulusXIn3")?.header]).toEqual(["Zx", "Sx"]);
    expect(british.get("depthIn")?.header).toBe("D");
  });

  it("a second block of units is compared with the first", async () => {
    const text = new TextDecoder().decode(bytesOf("two-blocks-of-units.csv")).replace(/903|911\.9|911,9/, "609.9");
    const { summary } = await importList(text, "blocks.csv");
    expect(summary.warnings).toEqual([{ line: 3, message: expect.stringContaining("d 35.9 is used; column 14 says 609.9 mm") }]);
  });

  it("the line of each row is its own, quoted line breaks and all", async () => {
    const { shapes } = await imported("quoted-newlines.csv");
    const lines = new TextDecoder().decode(bytesOf("quoted-newlines.csv")).split("\n");
    for (const { designation, source } of shapes) expect(lines[source.line - 1]).toContain(designation);
  });

  it("every record is accounted for", async () => {
    const { summary } = await imported("title-and-total-rows.csv");
    expect(summary.passedOver).toEqual({ title: 2, blank: 2, header: 1, total: 2, note: 1 });
    expect((await imported("page-breaks.csv")).summary.passedOver).toEqual({ header: 3 });
  });
});

describe("judgement on each row", () => {
  it("slips, channels, tees, duplicates and impossible plates are refused with the reason, and nothing else", async () => {
    const { summary, shapes } = await imported("slips.csv");
    expect(shapes.map(({ designation }) => designation)).toEqual(["W36X150", "W30X99", "W24X76", "W18X35", "W12X26", "W10X33"]);
    const reasons = new Map(summary.refused.map(({ line, reason }) => [line, reason]));
    expect([...reasons.keys()]).toEqual([3, 5, 7, 9, 12, 13, 14, 15, 16, 17, 18, 19, 20]);
    for (const [line, words] of [
      [3, "Sx 395 should be about 358.7"],
      [5, "Ix 2580 should be about 2852"],
      [9, "weight 28 should be about 81.67 by A"],
      [12, "a channel"],
      [13, "a tee"],
      [14, "stands already on line 2, with the same figures"],
      [15, "stands already on line 4, with other figures"],
      [16, "2 tf >= d"],
      [17, "tw >= bf"],
      [18, "no name"],
      [19, '"see note" is not a number'],
      [20, "no figure for bf"],
    ] as const) {
      expect(reasons.get(line)).toContain(words);
    }
  });

  it("letters for noughts, another list's decimal sign and a figure in a unit of something else are refused with the cell", async () => {
    const text = new TextDecoder()
      .decode(bytesOf("units-row.csv"))
      .replace(",0.625,", ",O.625,")
      .replace(",32.9,", ',"32,9",')
      .replace(",29.7,", ",29.7 lb/ft,");
    const { summary } = await importList(text, "letters.csv");
    expect(summary.refused).toEqual([
      { line: 3, reason: expect.stringContaining('tw "O.625" is not a number') },
      { line: 4, reason: expect.stringContaining('d "32,9" is not a number') },
      { line: 5, reason: expect.stringContaining('d "29.7 lb/ft" is not a number alone') },
    ]);
  });

  it("a figure a little off is warned of and taken as given", async () => {
    const { summary, shapes } = await imported("near-off.csv");
    expect(summary.warnings).toEqual([{ line: 4, message: expect.stringContaining("Zx 322 should be about 313.9") }]);
    expect(shapes[2].plasticModulusXIn3).toBe(322);
  });

  it("the whole catalogue passes without a warning", async () => {
    const { summary } = await importList(readFileSync(new URL("../../../../data/w-shapes.csv", import.meta.url)), "w-shapes.csv");
    expect([summary.accepted, summary.refusedCount, summary.warningCount]).toEqual([289, 0, 0]);
  });
});

describe("lists that cannot be read", () => {
  it.each([
    ["no-units-two-readings.csv", ["two readings fit", "d as depthIn in in", "in cm", "--units us"]],
    ["contradicted-unit.csv", ['"Ix (cm4)"', "says cm4", "fit in4", '--units "Ix (cm4)=in4"']],
    ["two-tables.csv", ["line 7", "a second table begins here"]],
    ["half-a-file.csv", ["line 11", "breaks off", '"bf (in)"']],
    ["lone-quote.csv", ["line 5", "column 1", "does not end"]],
    ["nul-byte.csv", ["line 4", "column 4", "NUL"]],
    ["no-header.csv", ["no header row"]],
    ["one-column.csv", ["only one column"]],
    ["decimal-signs-mixed.csv", ["line 2", "line 3", "both occur"]],
    ["decimal-commas-between-commas.csv", ["line 2", "more cells than the header"]],
    ["empty.csv", ["the file is empty"]],
    ["binary.csv", ["line 3", "NUL"]],
  ])("%s", async (name, words) => {
    const faults = await faultsOf(imported(name));
    for (const word of words) expect(faults).toContain(word);
  });

  it("too many columns, and a line of ten million characters", async () => {
    const wide = Array.from({ length: 10_000 }, (_, index) => `c${index}`).join();
    expect(await faultsOf(importList(`${wide}\n${wide}\n`, "wide.csv"))).toContain("10000 columns");
    const text = new TextDecoder().decode(bytesOf("units-row.csv"));
    expect(await faultsOf(importList(`${text}${"x".repeat(10_000_000)}\n`, "long.csv"))).toContain("line 13: a line of more than");
  });

  it("missing columns are all named, with what was understood", async () => {
    const faults = await faultsOf(importList("Shape,Wt,d,Sx\nW36X150,150,35.9,504\n", "few.csv"));
    for (const word of ["flangeWidthIn", "webThicknessIn", "flangeThicknessIn", "--map flangeWidthIn=HEADER"])
      expect(faults).toContain(word);
  });
});

describe("what the user says of columns and units", () => {
  const odd = "Mark,Tall,Wide,Steg,Gurt,plf\nB1,35.9,12.0,0.625,0.940,150\nB2,32.9,11.5,0.550,0.740,118\nB3,29.7,10.5,0.520,0.670,99\n";

  it("--map names columns by header or by place", async () => {
    const map = ["depthIn=tall", "flangeWidthIn=#3", "webThicknessIn=Steg", "flangeThicknessIn=Gurt"];
    const { shapes } = await importList(odd, "odd.csv", { map, units: [] });
    expect(shapes.map(({ depthIn, flangeThicknessIn }) => [depthIn, flangeThicknessIn])).toEqual([
      [35.9, 0.94],
      [32.9, 0.74],
      [29.7, 0.67],
    ]);
  });

  it("--units settles what two readings leave open", async () => {
    const us = await imported("no-units-two-readings.csv", { map: [], units: ["us"] });
    const metric = await imported("no-units-two-readings.csv", { map: [], units: ["metric"] });
    expect(us.shapes[0].depthIn).toBe(35.9);
    expect(metric.shapes[0].depthIn).toBeCloseTo(35.9 / 2.54, 9);
  });

  it("--units overrides a header that says something else", async () => {
    const { shapes } = await imported("contradicted-unit.csv", { map: [], units: ["Ix (cm4)=in4"] });
    expect(shapes.map(({ inertiaXIn4 }) => inertiaXIn4)).toEqual(shapes.map(({ designation }) => shapeNamed(designation).inertiaXIn4));
  });

  it("--map unread leaves a column aside", async () => {
    const { summary } = await imported("contradicted-unit.csv", { map: ["unread=Ix (cm4)"], units: [] });
    expect([summary.accepted, summary.derived.inertiaXIn4]).toEqual([10, 10]);
  });

  it.each([
    [{ map: ["depthInn=d"], units: [] }, "did you mean depthIn?"],
    [{ map: ["depthIn=Height"], units: [] }, 'no column is called "Height"'],
    [{ map: [], units: ["imperial"] }, "us, metric, or COLUMN=UNIT"],
    [{ map: [], units: ["d (in)=furlong"] }, "COLUMN=UNIT with a unit"],
    [{ map: [], units: ["d (in)=in4"] }, "not measured in in4"],
    [{ map: [], units: ["us", "metric"] }, "both us and metric"],
  ])("%j is refused", async (wishes, words) => {
    expect(await faultsOf(imported("tab-separated.tsv", wishes))).toContain(words);
  });
});

describe("stock columns", () => {
  it("are read with their units and carried", async () => {
    const { shapes } = await imported("yard-columns.csv");
    expect(shapes[0]).toMatchObject({
      yieldStressKsi: 33,
      stock: { quantity: 1, usableLengthFt: 40.5, yearBuilt: 1936, pricePerLb: 0.45, place: "Bay 0", flangeLossIn: 0, webLossIn: null },
    });
    expect(shapes[1]).toMatchObject({
      yieldStressKsi: null,
      stock: { quantity: 2, usableLengthFt: 38.5, flangeLossIn: 0.05, webLossIn: 0.0625 },
    });
    expect(shapes[4].stock?.usableLengthFt).toBe(30);
  });

  it("metric ones are turned into ours", async () => {
    const { shapes } = await example("service-centre.csv");
    expect(shapes[0].stock?.usableLengthFt).toBeCloseTo(12 / 0.3048, 9);
    expect(shapes[0].stock?.pricePerLb).toBeCloseTo((890 * 0.45359237) / 1000, 9);
  });
});

describe("the shipped examples", () => {
  it("the county yard: every row accepted, with losses, lengths and years", async () => {
    const { summary, shapes } = await example("county-yard.csv");
    expect([summary.accepted, summary.refusedCount, summary.warningCount]).toEqual([15, 0, 0]);
    expectFigures(shapes, 1e-9);
    expect(shapes[0].stock).toMatchObject({ quantity: 5, usableLengthFt: 62.5, yearBuilt: 1968, flangeLossIn: 0.03, webLossIn: 0.02 });
  });

  it("the service centre: every row accepted", async () => {
    const { summary, shapes } = await example("service-centre.csv");
    expect([summary.accepted, summary.refusedCount, summary.warningCount]).toEqual([20, 0, 0]);
    expect(shapes[0].depthIn).toBeCloseTo(shapeNamed("W40X215").depthIn, 1);
  });
});

describe("our own format", () => {
  const written = (shapes: readonly Shape[]): string => {
    const optional = new Set(OPTIONAL_COLUMNS);
    const quoted = (cell: string): string => (/[",]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell);
    return [listHeader(optional), ...shapes.map((shape) => listRow(shape, optional))].map((row) => row.map(quoted).join()).join("\n");
  };

  it.each(["european-axes.csv", "formula-cells.csv", "yard-columns.csv"])(
    "%s, written and read back, is the same to the last digit",
    async (name) => {
      const { shapes } = await imported(name);
      const back = readShapes(written(shapes), name, { bundled: false }).shapes;
      const again = (await importList(written(shapes), name)).shapes;
      const without = (list: readonly Shape[]) => list.map(({ source: _, ...rest }) => rest);
      expect(without(back)).toEqual(without(shapes));
      expect(without(again)).toEqual(without(shapes));
    },
  );

  it("cells a spreadsheet would run are escaped", async () => {
    const { shapes } = await imported("formula-cells.csv");
    expect(shapes.map(({ stock }) => stock?.place)).toEqual(expect.arrayContaining(["=1+1", "+rack 2", "-north", "@yard"]));
    expect(shapes[0].designation).toBe("W36X150");
    expect(written(shapes)).toContain("'=1+1");
  });
});
