import type { LrfdFatigueDetail } from "../../bridge/bridge.js";

/** Detail constant A, 10^8 ksi^3, and constant-amplitude threshold, ksi. */
interface DetailConstants {
  readonly A: number;
  readonly thresholdKsi: number;
}

/** Source: AASHTO LRFD, 9th ed., Tables 6.6.1.2.5-1, 6.6.1.2.5-3. */
export const DETAIL_CONSTANTS: Readonly<Record<LrfdFatigueDetail, DetailConstants>> = {
  A: { A: 250, thresholdKsi: 24 },
  B: { A: 120, thresholdKsi: 16 },
  "B'": { A: 61, thresholdKsi: 12 },
  C: { A: 44, thresholdKsi: 10 },
  "C'": { A: 44, thresholdKsi: 12 },
  D: { A: 22, thresholdKsi: 7 },
  E: { A: 11, thresholdKsi: 4.5 },
  "E'": { A: 3.9, thresholdKsi: 2.6 },
};

/** Load factors of Fatigue I and II. Source: AASHTO LRFD, 9th ed., Table 3.4.1-1 (8th ed. on). */
const INFINITE_LIFE = 1.75;
const FINITE_LIFE = 0.8;
/** Days in a design life of 75 years, one cycle a truck. Source: AASHTO LRFD, 9th ed., Art. 6.6.1.2.5. */
const DAYS = 365 * 75;

/**
 * Trucks a day in one lane above which infinite life governs.
 *
 * @returns ADTT_SL, trucks a day
 * Source: AASHTO LRFD, 9th ed., Art. 6.6.1.2.3 (follows from A and the threshold).
 */
export function infiniteLifeAdtt(detail: LrfdFatigueDetail): number {
  const { A, thresholdKsi } = DETAIL_CONSTANTS[detail];
  return (A * 1e8) / (DAYS * ((FINITE_LIFE / INFINITE_LIFE) * thresholdKsi) ** 3);
}

/** Which fatigue limit state governs, its load factor and its resistance. */
export interface LrfdFatigueCase {
  readonly limitState: "Fatigue I" | "Fatigue II";
  readonly gamma: number;
  readonly resistanceKsi: number;
}

/**
 * Fatigue I for heavy or unknown traffic, Fatigue II below.
 *
 * @param adttSl trucks a day in one lane; null when not given
 * Source: AASHTO LRFD, 9th ed., Art. 6.6.1.2.3, 6.6.1.2.5.
 */
export function lrfdFatigueCase(detail: LrfdFatigueDetail, adttSl: number | null): LrfdFatigueCase {
  const { A, thresholdKsi } = DETAIL_CONSTANTS[detail];
  if (adttSl === null || adttSl > infiniteLifeAdtt(detail)) {
    return { limitState: "Fatigue I", gamma: INFINITE_LIFE, resistanceKsi: thresholdKsi };
  }
  const cycles = DAYS * Math.max(1, adttSl);
  return { limitState: "Fatigue II", gamma: FINITE_LIFE, resistanceKsi: ((A * 1e8) / cycles) ** (1 / 3) };
}
