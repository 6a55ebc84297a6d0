/**
 * A number for reading: five significant digits, no exponent for ordinary sizes, no trailing zeros.
 *
 * @returns "infinite" or "not a number" for what is not finite
 */
export function shown(value: number): string {
  if (Number.isNaN(value)) return "not a number";
  if (!Number.isFinite(value)) return "infinite";
  const size = Math.abs(value);
  if (size >= 1e5 && size < 1e9) return String(Math.round(value));
  return String(Number(value.toPrecision(5)));
}

/** A ratio to three decimals; one that fails is never rounded down to 1.000. */
export function ratioText(ratio: number): string {
  if (!Number.isFinite(ratio)) return "none";
  const text = ratio.toFixed(3);
  return ratio > 1 && text === "1.000" ? "1.001" : text;
}

/** A length in feet to at most two decimals. */
export function feetText(lengthFt: number): string {
  return String(Math.round(lengthFt * 100) / 100);
}
