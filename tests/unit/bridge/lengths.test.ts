// Plans say 62'-6": read as 62.6 ft the span grows by an inch, read as 62 the bridge loses half a foot, and a metric figure taken for
// feet makes a footbridge of a highway bridge. What is not understood must be refused, not guessed.
import { describe, expect, it } from "vitest";
import { readFeet, readInches } from "../../../src/bridge/lengths.js";

describe("feet", () => {
  it.each([
    ["62.5", 62.5],
    ["62", 62],
    [" 62.5 ", 62.5],
    ["6.25e1", 62.5],
    [".5", 0.5],
    ["62.5'", 62.5],
    ["62.5 ft", 62.5],
    [`62'-6"`, 62 + 6 / 12],
    [`62'6"`, 62 + 6 / 12],
    [`62' 6"`, 62 + 6 / 12],
    [`62' - 6"`, 62 + 6 / 12],
    ["62 ft 6 in", 62 + 6 / 12],
    [`62'-6 1/2"`, 62 + 6.5 / 12],
    [`62' 6 1/2"`, 62 + 6.5 / 12],
    [`62'-6-1/2"`, 62 + 6.5 / 12],
    [`62' 3/4"`, 62 + 0.75 / 12],
    [`62'-6.5"`, 62 + 6.5 / 12],
    [`62'-0"`, 62],
    [`8 1/2"`, 8.5 / 12],
    [`6"`, 0.5],
    [`62''`, 62 / 12],
    ["62\u2032-6\u2033", 62 + 6 / 12],
    ["62\u2019-6\u201d", 62 + 6 / 12],
  ])("%s", (text, feet) => {
    expect(readFeet(text)).toEqual({ value: expect.closeTo(feet, 12) });
  });

  it("a minus is kept, for the range of the key to refuse", () => {
    expect(readFeet("-5")).toEqual({ value: -5 });
    expect(readFeet(`-5'-6"`)).toEqual({ value: -5.5 });
  });
});

describe("inches", () => {
  it.each([
    ["8.5", 8.5],
    [`8 1/2"`, 8.5],
    [`8-1/2"`, 8.5],
    ["8 1/2 in", 8.5],
    [`1/2"`, 0.5],
    [`8.5"`, 8.5],
    [`0'-8 1/2"`, 8.5],
    [`1'-2"`, 14],
    ["1 ft", 12],
  ])("%s", (text, inches) => {
    expect(readInches(text)).toEqual({ value: expect.closeTo(inches, 12) });
  });
});

describe("metric lengths are refused with the same length in our unit", () => {
  it.each([
    ["19 m", readFeet, `"19 m" is metric; the same in our unit is 62.336 ft`],
    ["19.05m", readFeet, `"19.05m" is metric; the same in our unit is 62.500 ft`],
    ["19,05 m", readFeet, `"19,05 m" is metric; the same in our unit is 62.500 ft`],
    ["1905 cm", readFeet, `"1905 cm" is metric; the same in our unit is 62.500 ft`],
    ["19050 MM", readFeet, `"19050 MM" is metric; the same in our unit is 62.500 ft`],
    ["215.9 mm", readInches, `"215.9 mm" is metric; the same in our unit is 8.500 in`],
    ["0.2159 m", readInches, `"0.2159 m" is metric; the same in our unit is 8.500 in`],
  ])("%s", (text, read, problem) => {
    expect(read(text)).toEqual({ problem });
  });
});

describe("what is no length", () => {
  it.each([
    "",
    " ",
    "abc",
    "sixty",
    "62.5.1",
    "62,5",
    "1,234",
    `6"-62'`,
    `62'-6'`,
    "62 6",
    `8 1/2`,
    `6 1/0"`,
    `0/0"`,
    `62'-abc"`,
    `62'-6"x`,
    "NaN",
    "Infinity",
    "1e",
    "--5",
    "+",
    "'",
    `"`,
    "-",
    "ft",
    "62 yd",
    "62.5 feet and a bit",
    "0x3e",
  ])("%j", (text) => {
    for (const read of [readFeet, readInches]) expect(read(text)).toEqual({ problem: `"${text}" is not a length` });
  });
});
