import { IN_PER_FT, KG_PER_LB, KSI_PER_MPA, LB_PER_CWT, LB_PER_KIP, LB_PER_TON, MM_PER_IN, N_PER_LB } from "../../units.js";

/** What is measured; the power of a length stands in the name's place in the tables. */
export type Quantity = "length" | "area" | "modulus" | "inertia" | "warping" | "weight" | "stress" | "price" | "number" | "text";

/** A unit of a column. */
export interface Unit {
  /** As it is written in answers and after --units. */
  readonly name: string;
  readonly quantity: Quantity;
  /** Times a figure in this unit gives one in ours: in and its powers, lb/ft, ksi, money per lb. */
  readonly factor: number;
  readonly system: "us" | "metric" | "none";
}

const POWERS: Readonly<Record<number, Quantity>> = { 1: "length", 2: "area", 3: "modulus", 4: "inertia", 6: "warping" };
const LENGTHS: Readonly<Record<string, { readonly inches: number; readonly system: "us" | "metric" }>> = {
  in: { inches: 1, system: "us" },
  ft: { inches: IN_PER_FT, system: "us" },
  mm: { inches: 1 / MM_PER_IN, system: "metric" },
  cm: { inches: 10 / MM_PER_IN, system: "metric" },
  dm: { inches: 100 / MM_PER_IN, system: "metric" },
  m: { inches: 1000 / MM_PER_IN, system: "metric" },
};
const MM_PER_FT = MM_PER_IN * IN_PER_FT;
const LB_PER_FT_OF_KG_PER_M = MM_PER_FT / 1000 / KG_PER_LB;
const LB_PER_FT_OF_N_PER_M = MM_PER_FT / 1000 / N_PER_LB;

const unit = (name: string, quantity: Quantity, factor: number, system: Unit["system"]): Unit => ({ name, quantity, factor, system });
/** Weights per length, stresses and prices, by their words without blanks and points. */
const BY_WORD: readonly (readonly [RegExp, Unit])[] = [
  [/^(?:(?:lbs?f?|#|pounds?)(?:\/|per)(?:ft|lf|linft|foot|')|plf|ppf)$/, unit("lb/ft", "weight", 1, "us")],
  [/^(?:(?:kips?|k)(?:\/|per)(?:ft|lf|foot)|klf)$/, unit("kip/ft", "weight", LB_PER_KIP, "us")],
  [/^(?:kgs?f?|kp|kilograms?)(?:\/|per)(?:m|lfm|ml|lm|mtr|metre|meter)$/, unit("kg/m", "weight", LB_PER_FT_OF_KG_PER_M, "metric")],
  [/^kn(?:\/|per)(?:m|lfm)$/, unit("kN/m", "weight", 1000 * LB_PER_FT_OF_N_PER_M, "metric")],
  [/^n(?:\/|per)m$/, unit("N/m", "weight", LB_PER_FT_OF_N_PER_M, "metric")],
  [/^(?:ksi|kips?\/(?:in\^?2|sqin))$/, unit("ksi", "stress", 1, "us")],
  [/^(?:psi|lbs?\/(?:in\^?2|sqin))$/, unit("psi", "stress", 1 / LB_PER_KIP, "us")],
  [/^(?:mpa|n\/mm\^?2|mn\/m\^?2)$/, unit("MPa", "stress", KSI_PER_MPA, "metric")],
  [/^kn\/cm\^?2$/, unit("kN/cm2", "stress", 10 * KSI_PER_MPA, "metric")],
  [/^(?:money|\$|us\$|c\$|cad|usd|€|eur|euro|£|gbp)?(?:\/|per)(?:lbs?|pound)$/, unit("money/lb", "price", 1, "us")],
  [/^(?:money|\$|us\$|c\$|cad|usd|€|eur|euro|£|gbp)?(?:\/|per)cwt$/, unit("money/cwt", "price", 1 / LB_PER_CWT, "us")],
  [/^(?:money|\$|us\$|c\$|cad|usd|€|eur|euro|£|gbp)?(?:\/|per)(?:shortton|ton|st)$/, unit("money/ton", "price", 1 / LB_PER_TON, "us")],
  [/^(?:money|\$|us\$|c\$|cad|usd|€|eur|euro|£|gbp)?(?:\/|per)kg$/, unit("money/kg", "price", KG_PER_LB, "metric")],
  [
    /^(?:money|\$|us\$|c\$|cad|usd|€|eur|euro|£|gbp)?(?:\/|per)(?:t|tonne|to|metricton)$/,
    unit("money/t", "price", KG_PER_LB / 1000, "metric"),
  ],
];
const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";
const LENGTH_WORDS = "inches|inch|ins|in|mm|cm|dm|m|feet|foot|ft|\"|''|″|'|′";
const ONLY_LENGTH = new RegExp(`^(${LENGTH_WORDS})(?:\\^?([12346]))?$`);
const WORDED_POWER = new RegExp(`^(sq|square|cu|cubic)(${LENGTH_WORDS})$|^(${LENGTH_WORDS})(sq|squared|cu|cubed)$`);
/** A power of ten before or behind: `10^6mm4`, `x10^6mm4`, `10e6mm4`, `106mm4` (a lost superscript), `1000mm3`, `mm4x10^6`, `mm4/10^6`. */
const SCALED_BEFORE = /^x?(?:1(0{2,12})|10\^?e?(-?\d{1,2})|1e\+?(-?\d{1,2}))x?(?=[a-z])(.+)$/;
const SCALED_BEHIND = /^(.+?[2346])[x/](?:1(0{2,12})|10\^?e?(\d{1,2})|1e\+?(\d{1,2}))$/;

/**
 * Reads the words of a unit: `in4`, `in.^4`, `10^6 mm4`, `cm³`, `sq in`, `kg/m`, `plf`, `ksi`.
 *
 * @returns null for what is no unit
 */
export function readUnit(text: string): Unit | null {
  const word = compact(text);
  if (word === "" || word.length > 24) return null;
  const named = BY_WORD.find(([expression]) => expression.test(word));
  if (named !== undefined) return named[1];
  const before = SCALED_BEFORE.exec(word);
  if (before !== null) return scaled(before[4], before[2] ?? before[3], before[1]);
  const behind = SCALED_BEHIND.exec(word);
  if (behind !== null) return scaled(behind[1], behind[3] ?? behind[4], behind[2]);
  return scaled(word, "0", undefined);
}

function compact(text: string): string {
  return text
    .toLowerCase()
    .replace(/[⁰¹²³⁴⁵⁶⁷⁸⁹]+/g, (signs) => `^${[...signs].map((sign) => SUPERSCRIPTS.indexOf(sign)).join("")}`)
    .replace(/[×·∙*](?!\*)/g, (sign) => (sign === "*" ? "*" : "x"))
    .replace(/\*\*/g, "^")
    .replace(/\*/g, "x")
    .replace(/[\s()[\]{}_]/g, "")
    .replace(/\.(?!\d)/g, "");
}

function scaled(word: string, exponent: string | undefined, zeros: string | undefined): Unit | null {
  const length = lengthOf(word);
  if (length === null) return null;
  const tens = zeros === undefined ? Number(exponent ?? 0) : zeros.length;
  if (tens > 12 || tens < -12 || (tens !== 0 && length.power === 1)) return null;
  return lengthUnit(length.base, length.power, tens);
}

function lengthOf(word: string): { readonly base: string; readonly power: number } | null {
  const plain = ONLY_LENGTH.exec(word);
  if (plain !== null) return { base: baseOf(plain[1]), power: Number(plain[2] ?? 1) };
  const worded = WORDED_POWER.exec(word);
  if (worded === null) return null;
  return { base: baseOf(worded[2] ?? worded[3]), power: /^(?:sq|square)/.test(worded[1] ?? worded[4]) ? 2 : 3 };
}

function baseOf(word: string): string {
  if (/^(?:in|"|''|″)/.test(word)) return "in";
  return /^(?:f|'|′)/.test(word) ? "ft" : word;
}

function lengthUnit(base: string, power: number, tens: number): Unit {
  const { inches, system } = LENGTHS[base];
  const name = `${tens === 0 ? "" : `10^${tens} `}${base}${power === 1 ? "" : power}`;
  return unit(name, POWERS[power], inches ** power * 10 ** tens, system);
}

/** Units tried where a list does not say which it has, by quantity; no two of one quantity are nearer than a factor of 1.4. */
export const UNITS_TRIED: Readonly<Record<Quantity, readonly Unit[]>> = {
  length: [lengthUnit("in", 1, 0), lengthUnit("mm", 1, 0), lengthUnit("cm", 1, 0)],
  area: [lengthUnit("in", 2, 0), lengthUnit("mm", 2, 0), lengthUnit("cm", 2, 0), lengthUnit("mm", 2, 3)],
  modulus: [lengthUnit("in", 3, 0), lengthUnit("mm", 3, 0), lengthUnit("cm", 3, 0), lengthUnit("mm", 3, 6)],
  inertia: [lengthUnit("in", 4, 0), lengthUnit("mm", 4, 0), lengthUnit("mm", 4, 3), lengthUnit("cm", 4, 0), lengthUnit("mm", 4, 6)],
  warping: [
    lengthUnit("in", 6, 0),
    lengthUnit("mm", 6, 0),
    lengthUnit("mm", 6, 3),
    lengthUnit("cm", 6, 0),
    lengthUnit("cm", 6, 3),
    lengthUnit("mm", 6, 12),
  ],
  weight: BY_WORD.slice(0, 4).map(([, weight]) => weight),
  stress: [BY_WORD[5][1], BY_WORD[6][1], BY_WORD[7][1]],
  price: [],
  number: [unit("", "number", 1, "none")],
  text: [unit("", "text", 1, "none")],
};
