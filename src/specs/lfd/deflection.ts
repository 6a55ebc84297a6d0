import { formula } from "../../formula.js";
import { IN_PER_FT, IN3_PER_FT3 } from "../../units.js";

/** Live-load deflection, all lanes shared equally by all stringers. Source: AASHTO Standard Specifications, 17th ed., Art. 10.6.4; statics. */
export const sharedDeflection = formula(
  "delta",
  "1728 * NL * m * Y * (1 + I) / (Nb * E * Id)",
  "in",
  "10.6.4",
  ["NL", "m", "Y", "I", "Nb", "E", "Id"],
  (NL: number, m: number, Y: number, I: number, Nb: number, E: number, Id: number) => (IN3_PER_FT3 * NL * m * Y * (1 + I)) / (Nb * E * Id),
);
/** Live-load deflection of one stringer by its moment factor. Source: AASHTO Standard Specifications, 17th ed., Art. 10.6; statics. */
export const stringerDeflection = formula(
  "delta",
  "1728 * Y / 2 * g * (1 + I) / (E * Id)",
  "in",
  "10.6.2",
  ["Y", "g", "I", "E", "Id"],
  (Y: number, g: number, I: number, E: number, Id: number) => (((IN3_PER_FT3 * Y) / 2) * g * (1 + I)) / (E * Id),
);
/** Deflection allowed. Source: AASHTO Standard Specifications, 17th ed., Art. 10.6.2. */
export const allowedDeflection = formula(
  "dall",
  "12 * L / ko",
  "in",
  "10.6.2",
  ["L", "ko"],
  (L: number, ko: number) => (IN_PER_FT * L) / ko,
);
