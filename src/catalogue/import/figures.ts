/** The sign between whole numbers and decimals. */
export type Decimal = "." | ",";

/** A number as a cell writes it, in the cell's own unit. */
export interface Figure {
  readonly value: number;
  /** Decimals written. */
  readonly decimals: number;
  /** Digits written, without leading zeros. */
  readonly digits: number;
  /** Denominator of a common fraction, such as 16; null for a decimal number. */
  readonly denominator: number | null;
  /** A unit written behind the number, such as `mm`; empty for none. */
  readonly suffix: string;
}

/** What stands in a cell: nothing, a number, or something else. */
export type Cell = { readonly kind: "blank" } | { readonly kind: "figure"; readonly figure: Figure } | { readonly kind: "unreadable" };

const BLANK: Cell = { kind: "blank" };
const UNREADABLE: Cell = { kind: "unreadable" };
const BLANK_WORDS = new Set(
  ["", ".", "..", "...", "?", "*", "n/a", "na", "n.a.", "n.a", "#n/a", "#na", "nan", "nil", "none", "null", "tbd", "k.a.", "s/o"].concat([
    "#div/0!",
    "#ref!",
    "#value!",
    "#name?",
    "#null!",
    "#num!",
    "not available",
    "not given",
    "unknown",
    "keine",
    "entf.",
    "entfällt",
  ]),
);
const DASHES = /^[-\u2010-\u2015\u2212_=~]+$/;
const VULGAR: Readonly<Record<string, string>> = { "¼": "1/4", "½": "1/2", "¾": "3/4", "⅛": "1/8", "⅜": "3/8", "⅝": "5/8", "⅞": "7/8" };
const FRACTION = /^(?:(\d{1,4})[ -]+)?(\d{1,2}) ?[/\u2044] ?(\d{1,2})( ?[^\d].*)?$/;
const NUMBER = /^\+?(\d(?:[\d.,' \u2019]*\d)?[.,]?|[.,]\d+)(?:[eE]([+-]?\d{1,3}))?( ?[^\d.,' \u2019].*)?$/;
const GROUPED = {
  ".": /^[1-9]\d{0,2}(?:(?:,\d{3})+|(?: \d{3})+|(?:['\u2019]\d{3})+)(?:\.\d*)?$/,
  ",": /^[1-9]\d{0,2}(?:(?:\.\d{3})+|(?: \d{3})+|(?:['\u2019]\d{3})+)(?:,\d*)?$/,
} as const;
const PLAIN = { ".": /^(?:\d+(?:\.\d*)?|\.\d+)$/, ",": /^(?:\d+(?:,\d*)?|,\d+)$/ } as const;

/** A cell's text with blanks of every width made one plain blank, and the armour spreadsheets put around text taken off. */
export function plainCell(text: string): string {
  const tidy = /[^\u0021-\u007e]/.test(text) ? text.replace(/[\s\u00a0\u2000-\u200b\u202f\u205f\u3000\ufeff]+/g, " ").trim() : text;
  if (tidy.startsWith('="') && tidy.endsWith('"') && tidy.length > 3) return tidy.slice(2, -1);
  return /^'[\d.,]/.test(tidy) ? tidy.slice(1) : tidy;
}

/** Whether a cell says nothing: empty, dashes, `n/a` and their like. */
export function saysNothing(text: string): boolean {
  return text === "" || DASHES.test(text) || BLANK_WORDS.has(text.toLowerCase());
}

/**
 * Reads a cell as a number: decimals, thousands by comma, point, blank or apostrophe, exponents, fractions such as `38 1/4`.
 *
 * Thousands count only where they are grouped in threes, so that a decimal sign of the other kind is never taken for them in silence.
 *
 * @param text a cell as `plainCell` leaves it
 * @param decimal the list's decimal sign
 */
export function readCell(text: string, decimal: Decimal): Cell {
  if (saysNothing(text)) return BLANK;
  const withFractions = /[\u00bc-\u00be\u215b-\u215e]/.test(text)
    ? text.replace(/ ?([¼½¾⅛⅜⅝⅞])/, (_, sign: string) => ` ${VULGAR[sign]}`).trim()
    : text;
  const fraction = withFractions.includes("/") || withFractions.includes("\u2044") ? FRACTION.exec(withFractions) : null;
  if (fraction !== null) return readFraction(fraction);
  // Nought is nought by either sign.
  if (/^0[.,]0*$/.test(text)) return { kind: "figure", figure: { value: 0, decimals: 0, digits: 0, denominator: null, suffix: "" } };
  const found = NUMBER.exec(text);
  if (found === null) return UNREADABLE;
  const [, body, exponent = "", suffix = ""] = found;
  const groups = !PLAIN[decimal].test(body);
  if (groups && !GROUPED[decimal].test(body)) return UNREADABLE;
  const bare = groups ? body.replace(decimal === "." ? /[, '\u2019]/g : /[. '\u2019]/g, "") : body;
  const written = decimal === "," ? bare.replace(",", ".") : bare;
  const value = Number(exponent === "" ? written : `${written}e${exponent}`);
  if (!Number.isFinite(value)) return UNREADABLE;
  const point = written.indexOf(".");
  const decimals = (point < 0 ? 0 : written.length - point - 1) - (exponent === "" ? 0 : Number(exponent));
  const digits = written.replace(".", "").replace(/^0+/, "").length;
  return { kind: "figure", figure: { value, decimals, digits, denominator: null, suffix: suffix.trim() } };
}

function readFraction([, whole, numerator, denominator, suffix = ""]: RegExpExecArray): Cell {
  const parts = Number(denominator);
  const count = Number(numerator);
  if (![2, 4, 8, 16, 32, 64].includes(parts) || count >= parts) return UNREADABLE;
  const value = Number(whole ?? 0) + count / parts;
  return { kind: "figure", figure: { value, decimals: 0, digits: 3, denominator: parts, suffix: suffix.trim() } };
}

/**
 * Which decimal sign a cell speaks for.
 *
 * @returns null when it has none, or a single one before three digits, which may just as well mark thousands
 */
export function decimalOf(text: string): Decimal | "either" | null {
  const found = NUMBER.exec(text);
  if (found === null || /^[0.,]+$/.test(text)) return null;
  const body = found[1];
  const point = body.lastIndexOf(".");
  const comma = body.lastIndexOf(",");
  if (point < 0 && comma < 0) return null;
  if (point >= 0 && comma >= 0) return point > comma ? "." : ",";
  const sign: Decimal = point >= 0 ? "." : ",";
  const other: Decimal = sign === "." ? "," : ".";
  const at = Math.max(point, comma);
  if (body.indexOf(sign) !== at) return other;
  const before = body.slice(0, at);
  const grouped = body.length - at - 1 === 3 && /^[1-9]\d{0,2}$/.test(before);
  return grouped ? "either" : sign;
}
