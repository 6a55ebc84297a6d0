import { formula } from "../../formula.js";

/** Effective slab width of an interior stringer. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.3.1. */
export const interiorWidth = formula(
  "be",
  "min(12 * L / 4, 12 * S, 12 * ts)",
  "in",
  "10.38.3.1",
  ["L", "S", "ts"],
  (L: number, S: number, ts: number) => Math.min(3 * L, 12 * S, 12 * ts),
);
/** The same with a slab on both sides of an exterior stringer. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.3.1. */
export const exteriorWidth = formula(
  "be",
  "bi / 2 + min(bi / 2, 12 * o)",
  "in",
  "10.38.3.1",
  ["bi", "o"],
  (bi: number, o: number) => bi / 2 + Math.min(bi / 2, 12 * o),
);
/** The same where the slab lies on the inner side only. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.3.2. */
export const oneSidedWidth = formula(
  "be",
  "min(12 * L / 12, 6 * ts, 12 * S / 2)",
  "in",
  "10.38.3.2",
  ["L", "ts", "S"],
  (L: number, ts: number, S: number) => Math.min(L, 6 * ts, 6 * S),
);

/** D' of the ductility rule. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.2. */
export const ductilityDepth = formula(
  "Dpr",
  "beta * (d + ts + th) / 7.5",
  "in",
  "10.50.1.1.2",
  ["beta", "d", "ts", "th"],
  (beta: number, d: number, ts: number, th: number) => (beta * (d + ts + th)) / 7.5,
);
/** Capacity between D' and 5 D'. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.2. */
export const reducedPlasticMoment = formula(
  "Mcap",
  "(5 * Mp - 0.85 * My) / 4 + (0.85 * My - Mp) / 4 * (Dp / Dpr)",
  "kip-ft",
  "10.50.1.1.2",
  ["Mp", "My", "Dp", "Dpr"],
  (Mp: number, My: number, Dp: number, Dpr: number) => (5 * Mp - 0.85 * My) / 4 + ((0.85 * My - Mp) / 4) * (Dp / Dpr),
);
/** Web in compression at the plastic moment over its thickness. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.2. */
export const plasticWebSlenderness = formula(
  "lw",
  "2 * Dcp / tw",
  "-",
  "10.50.1.1.2",
  ["Dcp", "tw"],
  (Dcp: number, tw: number) => (2 * Dcp) / tw,
);

/** Moment that brings one flange to yield after the lasting loads. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50(c); statics. */
export const additionalYieldMoment = (symbol: string, mark: string) =>
  formula(
    symbol,
    `(Fy - 12 * Mf1 / Sx - 12 * Mf2 / S${mark}3n) * S${mark}n / 12`,
    "kip-ft",
    "10.50",
    ["Fy", "Mf1", "Sx", "Mf2", `S${mark}3n`, `S${mark}n`],
    (Fy: number, Mf1: number, Sx: number, Mf2: number, S3n: number, Sn: number) => ((Fy - (12 * Mf1) / Sx - (12 * Mf2) / S3n) * Sn) / 12,
  );
export const additionalBottom = additionalYieldMoment("Mab", "b");
export const additionalTop = additionalYieldMoment("Mat", "t");
/** First-yield moment. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50(c). */
export const yieldMoment = formula(
  "My",
  "Mf1 + Mf2 + Ma",
  "kip-ft",
  "10.50",
  ["Mf1", "Mf2", "Ma"],
  (Mf1: number, Mf2: number, Ma: number) => Mf1 + Mf2 + Ma,
);

/** Staged stress at the bottom of the steel. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50(b); statics. */
export const bottomStress = formula(
  "fb",
  "12 * M1 / Sx + 12 * M2w / Sb3n + 12 * fL / Sbn",
  "ksi",
  "10.50(b)",
  ["M1", "Sx", "M2w", "Sb3n", "fL", "Sbn"],
  (M1: number, Sx: number, M2w: number, Sb3n: number, fL: number, Sbn: number) => (12 * M1) / Sx + (12 * M2w) / Sb3n + (12 * fL) / Sbn,
);
/** Staged stress at the top of the steel; what is in tension there is put in as 0. Source: as the bottom's. */
export const topStress = formula(
  "ft",
  "12 * M1 / Sx + ft3n + ftn",
  "ksi",
  "10.50(b)",
  ["M1", "Sx", "ft3n", "ftn"],
  (M1: number, Sx: number, ft3n: number, ftn: number) => (12 * M1) / Sx + ft3n + ftn,
);
/** Overload limit of composite stringers. Source: AASHTO Standard Specifications, 17th ed., Art. 10.57.2. */
export const compositeOverloadLimit = formula("Fo", "0.95 * Fy", "ksi", "10.57.2", ["Fy"], (Fy: number) => 0.95 * Fy);

/** Least depths of composite stringers. Source: AASHTO Standard Specifications, 17th ed., Art. 10.5.2. */
export const leastWholeDepth = formula("hmin", "12 * L / 25", "in", "10.5.2", ["L"], (L: number) => (12 * L) / 25);
export const leastSteelDepth = formula("dmin", "12 * L / 30", "in", "10.5.2", ["L"], (L: number) => (12 * L) / 30);

/** Force that studs carry between midspan and either end. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.5.1.2; LRFD 9th ed., Art. 6.10.10.4.2. */
export const studForce = formula("Pst", "min(Ps, P)", "kip", "10.38.5.1.2", ["Ps", "P"], (Ps: number, P: number) => Math.min(Ps, P));
/** Ultimate strength of one stud, at most 60 ksi on its area. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.5.1.2. */
export const studStrength = formula(
  "Su",
  "min(0.4 * ds^2 * sqrt(fc * Ec), 60 * pi * ds^2 / 4)",
  "kip",
  "10.38.5.1.2",
  ["ds", "fc", "Ec"],
  (ds: number, fc: number, Ec: number) => Math.min(0.4 * ds * ds * Math.sqrt(fc * Ec), (60 * Math.PI * ds * ds) / 4),
);
/** Modulus of concrete from its strength. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.5.1.2 (normal weight). */
export const concreteModulus = formula("Ec", "57 * sqrt(1000 * fc)", "ksi", "8.7.1", ["fc"], (fc: number) => 57 * Math.sqrt(1000 * fc));
/** Studs between midspan and either end, before rounding up. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.5.1.2. */
export const studCount = formula(
  "N1",
  "Pst / (0.85 * Su)",
  "-",
  "10.38.5.1.2",
  ["Pst", "Su"],
  (Pst: number, Su: number) => Pst / (0.85 * Su),
);

/** f'c below which each modular ratio holds, ksi. Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.1.3. */
const MODULAR_RATIOS: readonly (readonly [belowKsi: number, ratio: number])[] = [
  [2.4, 11],
  [2.9, 10],
  [3.6, 9],
  [4.6, 8],
  [6.0, 7],
  [Number.POSITIVE_INFINITY, 6],
];

/**
 * Modular ratio of steel to normal-weight concrete.
 *
 * @param fcKsi 28-day strength, ksi; > 0
 * Source: AASHTO Standard Specifications, 17th ed., Art. 10.38.1.3.
 */
export function modularRatio(fcKsi: number): number {
  const found = MODULAR_RATIOS.find(([below]) => fcKsi < below);
  if (found === undefined) throw new RangeError(`fcKsi must be a number, got ${fcKsi}`);
  return found[1];
}

/** beta of D'. Source: AASHTO Standard Specifications, 17th ed., Art. 10.50.1.1.2. */
export function ductilityBeta(Fy: number): number {
  return Fy <= 36 ? 0.9 : 0.7;
}
