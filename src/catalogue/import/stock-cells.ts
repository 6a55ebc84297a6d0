import { IN_PER_FT } from "../../units.js";

const FEET_AND_INCHES =
  /^(\d+(?:\.\d+)?) ?(?:'|′|’|ft\.?|feet|foot)(?: ?-? ?(\d+(?:\.\d+)?)(?: (\d{1,2})\/(\d{1,2}))? ?(?:"|″|''|in\.?|inches)?)?$/i;
const PIECES = /^(\d+)(?:[.,]0{1,2})? ?(?:pcs?\.?|pieces?|ea\.?|each|nos?\.?|st(?:k|ck|ück|\.)?\.?|off)?$/i;

/** A length such as `40'`, `40'-6"` or `40 ft 6 in`, in; null for anything else. */
export function readFeetAndInches(text: string): number | null {
  const found = FEET_AND_INCHES.exec(text);
  if (found === null) return null;
  const [, feet, inches = "0", numerator = "0", denominator = "1"] = found;
  const over = Number(inches) + Number(numerator) / Number(denominator);
  return over < IN_PER_FT ? Number(feet) * IN_PER_FT + over : null;
}

/** A whole number of pieces, such as `8`, `8 pcs` or `8 Stk`; null for anything else. */
export function readPieces(text: string): number | null {
  const found = PIECES.exec(text);
  return found === null ? null : Number(found[1]);
}
