/** What a name tells of the kind of section. */
export interface Family {
  /** Why a row of this name is no rolled I-shape; null where nothing in the name says so. */
  readonly refused: string | null;
  /** Whether the flanges taper (American standard beams, European I of the old kind): their figures lie farther from parallel plates. */
  readonly tapered: boolean;
}

const CHANNEL = "a channel, not an I-shape";
const TEE = "a tee, not an I-shape";
const ANGLE = "an angle, not an I-shape";

/** Names of what is no I-shape, by the letters before the first figure. Source: common practice of US and European tables. */
const REFUSED: readonly (readonly [RegExp, string])[] = [
  [/^(?:MC|PFC|RSC|UPN|UNP|UPE|UAP|CHAN(?:NEL)?S?|U-PROFIL)$/, CHANNEL],
  [/^(?:[WMS]T|TEES?|TPS|T-PROFIL|TPH|TPB|UBT|UCT)$/, TEE],
  [/^(?:[2L]L|RSA|ANGLES?|LNP)$/, ANGLE],
  [/^(?:HSS|TS|PIPE|RHS|SHS|CHS|TUBES?|ROHR|QRO|RRO)$/, "a hollow section, not an I-shape"],
];
/** One letter may be a mark of the yard's own; with depth and weight behind it, it is the kind of section. */
const REFUSED_LETTERS: readonly (readonly [RegExp, string])[] = [
  [/^C\s?\d+(?:\.\d+)?\s?[X×*]\s?\d/, CHANNEL],
  [/^U\s?(?:[4-9]\d|[1-4]\d\d)$/, CHANNEL],
  [/^L\s?\d[\d./ -]*[X×*]\s?\d/, ANGLE],
  [/^2\s?L\s?\d/, ANGLE],
  // Old names put the depth first: 15C33.9, 15[33.9.
  [/^\d+(?:\.\d+)?\s?(?:C|\[|\]|U)\s?\d/, CHANNEL],
  [/^\d+(?:\.\d+)?\s?(?:WT|ST|T)\s?\d/, TEE],
];
const TAPERED = /^(?:S|I|IPN|INP|RSJ|CBI|J|PN|NP|I-PROFIL)$/;
const WORDS: readonly (readonly [RegExp, string])[] = [
  [/\bchannels?\b|\bu-?profil/i, CHANNEL],
  [/\btees?\b|\bt-?profil/i, TEE],
  [/\bangles?\b|\bwinkel/i, ANGLE],
];

/**
 * Reads the kind of section out of a name: `C15X50`, `WT12X34`, `UPN 200`, `15[33.9`, `S24X80`.
 *
 * A name that says nothing is left to the figures.
 */
export function familyOf(name: string): Family {
  const upper = name.toUpperCase();
  const letters = (/^[^0-9]*/.exec(upper)?.[0] ?? "").replace(/[\s.]+/g, "");
  const between = /^\d+(?:\.\d+)?\s*([A-Z]+)\s*\d/.exec(upper)?.[1] ?? "";
  const refused =
    REFUSED.find(([expression]) => expression.test(letters)) ??
    REFUSED_LETTERS.find(([expression]) => expression.test(upper)) ??
    WORDS.find(([expression]) => expression.test(name));
  return { refused: refused?.[1] ?? null, tapered: TAPERED.test(letters) || TAPERED.test(between) };
}
