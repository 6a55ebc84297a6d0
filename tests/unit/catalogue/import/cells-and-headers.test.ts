// One cell read wrongly is one wrong beam: 1,030 is a thousand and thirty here and a thin web there, and a unit's lost power of ten is a
// thousandfold.
import { describe, expect, it } from "vitest";
import { familyOf } from "../../../../src/catalogue/import/families.js";
import { type Decimal, decimalOf, plainCell, readCell } from "../../../../src/catalogue/import/figures.js";
import { readHeader } from "../../../../src/catalogue/import/header-words.js";
import { splitText } from "../../../../src/catalogue/import/split-rows.js";
import { readFeetAndInches, readPieces } from "../../../../src/catalogue/import/stock-cells.js";
import { readUnit } from "../../../../src/catalogue/import/units.js";

const value = (text: string, decimal: Decimal = "."): number | string => {
  const cell = readCell(plainCell(text), decimal);
  return cell.kind === "figure" ? cell.figure.value : cell.kind;
};

describe("figures", () => {
  it.each([
    ["38.25", ".", 38.25],
    [".625", ".", 0.625],
    ["12.", ".", 12],
    ["1,030", ".", 1030],
    ["1,030.5", ".", 1030.5],
    ["1 234 567", ".", 1234567],
    ["1\u00a0234,5", ",", 1234.5],
    ["1\u202f234", ",", 1234],
    ["1.030", ",", 1030],
    ["1,030", ",", 1.03],
    ["0,625", ",", 0.625],
    ["12'345.6", ".", 12345.6],
    ["6.91E+05", ".", 691000],
    ["38 1/4", ".", 38.25],
    ["38-1/4", ".", 38.25],
    ["5/8", ",", 0.625],
    ["38¼", ".", 38.25],
    ['="36.5"', ".", 36.5],
    ["'36.5", ".", 36.5],
    ["910 mm", ".", 910],
    ["0.00", ",", 0],
  ] as const)("%j with %s is %d", (text, decimal, expected) => {
    expect(value(text, decimal)).toBe(expected);
  });

  it.each(["", "-", "–", "—", "--", "n/a", "N/A", "#N/A", "#DIV/0!", "nil", "?", " \u00a0 "])("%j is a blank", (text) => {
    expect(value(text)).toBe("blank");
  });

  it.each(["12,5", "0,625", "1,23,456", "1.2.3", "-5", "1/3", "9/8", "1e999", "12 34", "W36X150"])(
    "%j is no figure of a list with points",
    (text) => {
      expect(value(text)).toBe("unreadable");
    },
  );

  it.each([
    ["44.8", "."],
    ["0,625", ","],
    ["1,234.5", "."],
    ["1.234,5", ","],
    ["1,234,567", "."],
    ["1,030", "either"],
    ["1.030", "either"],
    ["0.625", "."],
    ["1234,567", ","],
    ["38", null],
    ["0.00", null],
  ])("%j speaks for %j", (text, expected) => {
    expect(decimalOf(text)).toBe(expected);
  });
});

describe("units", () => {
  it.each([
    ["in4", "in4", 1],
    ["in.^4", "in4", 1],
    ["in.⁴", "in4", 1],
    ["inches^4", "in4", 1],
    ["sq in", "in2", 1],
    ["cu. in.", "in3", 1],
    ["cm³", "cm3", 1 / 2.54 ** 3],
    ["10^6 mm4", "10^6 mm4", 1e6 / 25.4 ** 4],
    ["x10^6 mm^4", "10^6 mm4", 1e6 / 25.4 ** 4],
    ["×10⁶ mm⁴", "10^6 mm4", 1e6 / 25.4 ** 4],
    ["mm4 x 10^6", "10^6 mm4", 1e6 / 25.4 ** 4],
    ["mm^4/10^6", "10^6 mm4", 1e6 / 25.4 ** 4],
    ["10**3 mm**3", "10^3 mm3", 1e3 / 25.4 ** 3],
    ["103 mm3", "10^3 mm3", 1e3 / 25.4 ** 3],
    ["1000 mm3", "10^3 mm3", 1e3 / 25.4 ** 3],
    ["10^9 mm^6", "10^9 mm6", 1e9 / 25.4 ** 6],
    ["lbs./ft.", "lb/ft", 1],
    ["plf", "lb/ft", 1],
    ["kg/m", "kg/m", 0.3048 / 0.45359237],
    ["kN/m", "kN/m", (0.3048 * 1000) / (0.45359237 * 9.80665)],
    ["N/mm²", "MPa", 0.1450377377],
    ["EUR/t", "money/t", 0.45359237 / 1000],
  ])("%j is %s", (text, name, factor) => {
    const unit = readUnit(text);
    expect(unit?.name).toBe(name);
    expect((unit?.factor ?? 0) / factor).toBeCloseTo(1, 9);
  });

  it.each(["", "-", "tw", "10", "mm5", "in^8", "furlong", "10^3", "kip"])("%j is none", (text) => {
    expect(readUnit(text)).toBeNull();
  });
});

describe("headers", () => {
  it.each([
    ["Ix (in4)", "inertiaXIn4", "in4"],
    ["I_x [cm⁴]", "inertiaXIn4", "cm4"],
    ["Moment of inertia Ix, 10^6 mm4", "inertiaXIn4", "10^6 mm4"],
    ["Depth of section D mm", "depthIn", "mm"],
    ["h_mm", "depthIn", "mm"],
    ["tw / mm", "webThicknessIn", "mm"],
    ["kg/m", "weightPlf", "kg/m"],
    ["Wel,y (cm3)", "sectionModulusXIn3", "cm3"],
    ["bf/2tf", "flangeSlenderness", undefined],
    ["h/tw", "webSlenderness", undefined],
    ["Flächenträgheitsmoment Iy cm4", "inertiaXIn4", "cm4"],
    ["depthIn", "depthIn", "in"],
    ["s (mm)", "webThicknessIn", "mm"],
    ["Price ($/lb)", "pricePerLb", "money/lb"],
  ])("%j may be %s", (header, field, unit) => {
    const words = readHeader(header);
    expect(words.meanings).toContain(field);
    expect(words.unit?.name).toBe(unit);
  });

  it.each(["kdet", "Painted?", "Heat", "surface m2/t", "Nominal depth", "k1", "", "x".repeat(5000)])("%j is not read", (header) => {
    expect(readHeader(header).meanings).toEqual([]);
  });
});

describe("names", () => {
  it.each(["C15X50", "MC12X31", "UPN 200", "15[33.9", "WT12X34", "L6X4X1/2", "HSS8X8", "Channel 10 in"])("%s is no I-shape", (name) => {
    expect(familyOf(name).refused).not.toBeNull();
  });

  it.each(["W36X150", "36WF150", "HEB 300", "IPE 600", "UB 914x305x253", "HP14X73", "M12X10", "S24X80", "T4", "C1", "B911-224", "Lot 7"])(
    "%s may be one",
    (name) => {
      expect(familyOf(name).refused).toBeNull();
    },
  );
});

describe("stock cells", () => {
  it.each([
    ["40'", 480],
    [`40'-6"`, 486],
    [`40' 6 1/2"`, 486.5],
    ["40 ft 6 in", 486],
    ["12.5", null],
    [`40'-13"`, null],
  ])("%j is %j in", (text, inches) => {
    expect(readFeetAndInches(text)).toBe(inches);
  });

  it.each([
    ["8", 8],
    ["8 pcs", 8],
    ["8 Stk", 8],
    ["8.0", 8],
    ["8.5", null],
    ["1.000", null],
  ])("%j is %j pieces", (text, pieces) => {
    expect(readPieces(text)).toBe(pieces);
  });
});

describe("records", () => {
  it("cells in pieces of any size are the same cells", () => {
    const text = 'a,"b\r\n""c""",d\r\n36",1/2 ,\n\n"x" ,y\r';
    const rows = splitText(text, ",", "x.csv", { sample: false });
    expect(rows.map(({ line, cells }) => [line, cells])).toEqual([
      [1, ["a", 'b\r\n"c"', "d"]],
      [3, ['36"', "1/2"]],
      [4, []],
      [5, ["x", "y"]],
    ]);
  });
});
