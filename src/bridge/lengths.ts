import { IN_PER_FT } from "../units.js";

const NUMBER = String.raw`\d+(?:\.\d+)?|\.\d+`;
const INCHES = String.raw`(?:(\d+)[ -]+)?(\d+)\/(\d+)|(${NUMBER})`;
const MARKED = new RegExp(String.raw`^(-)?(?:(${NUMBER})\s*(?:'|ft))?\s*-?\s*(?:(?:${INCHES})\s*(?:"|in))?$`);
const METRIC = /^-?(\d{1,3}(?:,\d{3})+(?:\.\d+)?|\d+(?:[.,]\d+)?|[.,]\d+)\s*(mm|cm|m)$/i;
const FT_PER_M = 1 / 0.3048;

/** A length understood, in the unit asked for, or what is wrong with the text. */
export type LengthReading = { readonly value: number } | { readonly problem: string };

/**
 * Reads a length in feet: `62.5`, `62.5 ft`, `62'-6"`, `62' 6 1/2"`.
 *
 * @param text what was typed
 * @returns feet, or the fault; a metric suffix gets the same length in feet as a hint
 */
export function readFeet(text: string): LengthReading {
  return readLength(text, "ft");
}

/**
 * Reads a length in inches: `8.5`, `8 1/2"`, `8.5 in`, `0'-8 1/2"`.
 *
 * @param text what was typed
 * @returns inches, or the fault; a metric suffix gets the same length in inches as a hint
 */
export function readInches(text: string): LengthReading {
  return readLength(text, "in");
}

function readLength(text: string, unit: "ft" | "in"): LengthReading {
  const typed = text
    .trim()
    .replace(/[\u2019\u2032]/g, "'")
    .replace(/[\u201d\u2033]|''/g, '"');
  if (/^[+-]?(\d+(\.\d*)?|\.\d+)([eE][+-]?\d+)?$/.test(typed)) return { value: Number(typed) };
  const metric = METRIC.exec(typed);
  if (metric !== null) return { problem: metricHint(typed, metric[1] as string, (metric[2] as string).toLowerCase(), unit) };
  const marked = MARKED.exec(typed);
  if (marked === null || typed === "") return { problem: `"${text}" is not a length` };
  const [, minus, feet, whole, over, under, inches] = marked;
  if (feet === undefined && over === undefined && inches === undefined) return { problem: `"${text}" is not a length` };
  const improper = over !== undefined && Number(over) >= Number(under);
  const wholeInches = Number(whole ?? 0) + Number(inches ?? 0);
  if (improper || (feet !== undefined && wholeInches >= IN_PER_FT)) return { problem: `"${text}" is not a length` };
  const fraction = over === undefined ? 0 : Number(whole ?? 0) + Number(over) / Number(under);
  const totalIn = Number(feet ?? 0) * IN_PER_FT + fraction + Number(inches ?? 0);
  if (!Number.isFinite(totalIn)) return { problem: `"${text}" is not a length` };
  const signed = minus === undefined ? totalIn : -totalIn;
  return { value: unit === "ft" ? signed / IN_PER_FT : signed };
}

function metricHint(text: string, digits: string, suffix: string, unit: "ft" | "in"): string {
  const plain = /,\d{3}(?!\d)/.test(digits) ? digits.replaceAll(",", "") : digits.replace(",", ".");
  const feet = Number(plain) * { m: 1, cm: 0.01, mm: 0.001 }[suffix as "m" | "cm" | "mm"] * FT_PER_M;
  const same = unit === "ft" ? `${feet.toFixed(3)} ft` : `${(feet * IN_PER_FT).toFixed(3)} in`;
  return `"${text}" is metric; the same in our unit is ${same}`;
}
