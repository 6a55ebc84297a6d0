// Nobody tells in which columns, units and signs the next list comes. Whatever they are, the figures read are those put in, within their
// rounding, or the list is sent back whole; and lists within the stated forms are not sent back.
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { importList } from "../../src/catalogue/import/import-list.js";
import type { Shape, ShapeFigures } from "../../src/catalogue/shape.js";
import { InputError } from "../../src/errors.js";
import { CATALOGUE } from "../support/question.js";

type Figure = keyof ShapeFigures;
type System = "us" | "metric";
interface Way {
  readonly header: readonly string[];
  readonly unit: string;
  /** How many of the unit go into ours. */
  readonly per: number;
}

const [IN, CM, MM] = [1, 2.54, 25.4];
const way = (header: string, unit: string, per: number): Way => ({ header: header.split("|"), unit, per });
/** Ways of writing each figure, by system of units. */
const WAYS: Readonly<Record<System, Partial<Record<Figure, readonly Way[]>>>> = {
  us: {
    weightPlf: [way("Wt.|Weight|W|Nominal weight", "lb/ft", 1), way("Weight", "plf", 1)],
    areaIn2: [way("A|Area", "in2", 1), way("A", "in.^2", 1), way("Area", "sq in", 1)],
    depthIn: [way("d|Depth|Depth d", "in", IN), way("D", "in.", IN)],
    flangeWidthIn: [way("bf|b_f|Flange width|Width bf", "in", IN)],
    webThicknessIn: [way("tw|Web thickness|t_w|Web", "in", IN)],
    flangeThicknessIn: [way("tf|Flange thickness|t_f", "in", IN)],
    kDesignIn: [way("k|kdes|k des", "in", IN)],
    inertiaXIn4: [way("Ix|I_x|Ixx|Moment of inertia Ix|I x-x", "in4", 1), way("Ix", "in^4", 1)],
    sectionModulusXIn3: [way("Sx|S_x|Section modulus Sx", "in3", 1), way("Sx", "in³", 1)],
    plasticModulusXIn3: [way("Zx|Z_x|Plastic modulus Zx", "in3", 1)],
    inertiaYIn4: [way("Iy|Iyy|I_y", "in4", 1)],
    radiusYIn: [way("ry|r_y", "in", IN)],
    torsionJIn4: [way("J|Torsion constant J", "in4", 1)],
    warpingCwIn6: [way("Cw|Warping constant", "in6", 1)],
  },
  metric: {
    weightPlf: [way("G|Mass|Masse|Mass per metre", "kg/m", 1.4881639)],
    areaIn2: [
      way("A|Area", "mm2", MM ** 2),
      way("A", "cm2", CM ** 2),
      way("A|Fläche", "cm²", CM ** 2),
      way("A", "10^3 mm2", MM ** 2 / 1e3),
    ],
    depthIn: [way("h|Height|Depth|Höhe", "mm", MM), way("h", "cm", CM)],
    flangeWidthIn: [way("b|bf|Breite|Width", "mm", MM)],
    webThicknessIn: [way("tw|Web thickness|Stegdicke|s", "mm", MM)],
    flangeThicknessIn: [way("tf|Flange thickness|Flanschdicke|t", "mm", MM)],
    inertiaXIn4: [
      way("Ix|Strong axis inertia", "cm4", CM ** 4),
      way("Ix", "10^6 mm4", MM ** 4 / 1e6),
      way("Ix", "x10^4 mm4", MM ** 4 / 1e4),
      way("Ix", "mm4 x 10^6", MM ** 4 / 1e6),
    ],
    sectionModulusXIn3: [way("Wel,x|Sx", "cm3", CM ** 3), way("Sx", "10^3 mm3", MM ** 3 / 1e3), way("Sx", "10³ mm³", MM ** 3 / 1e3)],
    plasticModulusXIn3: [way("Wpl,x|Zx", "cm3", CM ** 3), way("Zx", "10^3 mm3", MM ** 3 / 1e3)],
    inertiaYIn4: [way("Iy", "cm4", CM ** 4), way("Iy", "10^6 mm4", MM ** 4 / 1e6)],
    radiusYIn: [way("iy|ry", "cm", CM), way("ry", "mm", MM)],
    torsionJIn4: [way("It|J", "cm4", CM ** 4), way("J", "10^3 mm4", MM ** 4 / 1e3)],
    warpingCwIn6: [way("Iw|Cw", "cm6", CM ** 6), way("Cw", "10^9 mm6", MM ** 6 / 1e9)],
  },
};
const DIMENSIONS: readonly Figure[] = ["depthIn", "flangeWidthIn", "webThicknessIn", "flangeThicknessIn"];
const BLANKS = ["", "-", "–", "n/a", "N/A", "0.00", "--"];

interface Recipe {
  readonly system: System;
  readonly rows: readonly number[];
  readonly choices: readonly number[];
  readonly order: readonly number[];
  readonly separator: string;
  readonly decimal: "." | ",";
  readonly grouping: "none" | "sign" | "blank";
  readonly unitsIn: "header" | "row" | "nowhere";
  readonly noise: readonly number[];
  readonly blanks: readonly number[];
  readonly digits: number;
  readonly lineEnd: string;
}

const recipe: fc.Arbitrary<Recipe> = fc.record({
  system: fc.constantFrom<System>("us", "metric"),
  rows: fc.uniqueArray(fc.nat(CATALOGUE.length - 1), { minLength: 6, maxLength: 25 }),
  choices: fc.array(fc.nat(1000), { minLength: 40, maxLength: 40 }),
  order: fc.array(fc.nat(1000), { minLength: 20, maxLength: 20 }),
  separator: fc.constantFrom(",", ";", "\t"),
  decimal: fc.constantFrom<"." | ",">(".", ","),
  grouping: fc.constantFrom<"none" | "sign" | "blank">("none", "sign", "blank"),
  unitsIn: fc.constantFrom<"header" | "row" | "nowhere">("header", "row", "nowhere"),
  noise: fc.array(fc.nat(5), { maxLength: 4 }),
  blanks: fc.array(fc.nat(1000), { maxLength: 6 }),
  digits: fc.constantFrom(4, 5),
  lineEnd: fc.constantFrom("\n", "\r\n"),
});

/** A figure written to so many digits, none of them an exponent, in the list's own signs. */
function written(value: number, digits: number, { decimal, grouping }: Recipe): string {
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(value)));
  const step = 10 ** Math.max(0, Math.floor(Math.log10(value)) + 1 - digits);
  const [whole, part = ""] = (step > 1 ? Math.round(value / step) * step : value).toFixed(Math.min(decimals, 12)).split(".");
  const sign = grouping === "blank" ? " " : decimal === "." ? "," : ".";
  const grouped = grouping === "none" ? whole : whole.replace(/\B(?=(\d{3})+$)/g, sign);
  return part === "" ? grouped : `${grouped}${decimal}${part}`;
}

function build(given: Recipe): {
  readonly text: string;
  readonly figures: readonly Figure[];
  readonly shapes: readonly Shape[];
  readonly blanked: ReadonlySet<string>;
} {
  const ways = WAYS[given.system];
  const optional = (Object.keys(ways) as Figure[]).filter((name) => !DIMENSIONS.includes(name));
  // Weight and area stay: without either there may be two readings, and the list may rightly be sent back.
  const figures = [
    ...DIMENSIONS,
    ...optional.filter((name, at) => name === "weightPlf" || name === "areaIn2" || given.choices[at] % 3 > 0),
  ];
  const columns = figures.map((name, at) => {
    const options = ways[name] ?? [];
    const one = options[given.choices[at + 12] % options.length];
    return { name, one, word: one.header[given.choices[at + 24] % one.header.length], order: given.order[at] };
  });
  columns.sort((a, b) => a.order - b.order);
  const quoted = (cell: string): string =>
    cell.includes(given.separator) || /["\n]/.test(cell) ? `"${cell.replaceAll('"', '""')}"` : cell;
  const line = (cells: readonly string[]): string => cells.map(quoted).join(given.separator);
  const header = line(["Shape", ...columns.map(({ word, one }) => (given.unitsIn === "header" ? `${word} (${one.unit})` : word))]);
  const units = given.unitsIn === "row" ? [line(["", ...columns.map(({ one }) => one.unit)])] : [];
  const shapes = given.rows.map((row) => CATALOGUE[row]);
  const blanked = new Set<string>();
  const rows = shapes.map((shape, row) =>
    line([
      shape.designation,
      ...columns.map(({ name, one }, at) => {
        const blank = given.blanks.some((place) => place % shapes.length === row && place % columns.length === at);
        if (blank && !DIMENSIONS.includes(name) && name !== "areaIn2") {
          blanked.add(`${shape.designation} ${name}`);
          return BLANKS[(row + at) % BLANKS.length];
        }
        return written(shape[name] * one.per, given.digits, given);
      }),
    ]),
  );
  const noise = ["Example county: steel on hand", "", line(["", "", ""]), "Printed for the yard", header, `Total${given.separator}`];
  const above = given.noise.filter((kind) => kind < 4).map((kind) => noise[kind]);
  const amid = given.noise.filter((kind) => kind >= 3).map((kind) => noise[kind]);
  const half = Math.floor(rows.length / 2);
  const lines = [...above, header, ...units, ...rows.slice(0, half), ...amid, ...rows.slice(half)];
  return { text: `${lines.join(given.lineEnd)}${given.lineEnd}`, figures, shapes, blanked };
}

let read = 0;
let sentBack = 0;

describe("lists in random columns, units and signs", () => {
  it("give back the figures put in, or are refused", async () => {
    await fc.assert(
      fc.asyncProperty(recipe, async (given) => {
        const { text, figures, shapes, blanked } = build(given);
        let result: Awaited<ReturnType<typeof importList>>;
        try {
          result = await importList(text, "random.csv");
        } catch (error) {
          if (!(error instanceof InputError)) throw error;
          sentBack++;
          return;
        }
        read++;
        expect(result.summary.refused).toEqual([]);
        expect(result.shapes.map(({ designation }) => designation)).toEqual(shapes.map(({ designation }) => designation));
        result.shapes.forEach((shape, row) => {
          for (const name of figures) {
            if (blanked.has(`${shape.designation} ${name}`)) continue;
            expect(
              Math.abs(shape[name] / shapes[row][name] - 1),
              `${shape.designation} ${name}: ${shape[name]} for ${shapes[row][name]}`,
            ).toBeLessThan(0.0008);
          }
        });
      }),
      { numRuns: 400, seed: 4 },
    );
    expect(read / (read + sentBack)).toBeGreaterThanOrEqual(0.95);
  }, 120_000);
});
