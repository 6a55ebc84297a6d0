import type { LfdFatigueDetail } from "../../bridge/bridge.js";
import { formula } from "../../formula.js";

/** Stress ranges allowed at 100,000, 500,000, 2,000,000 and over 2,000,000 cycles, ksi. */
export type AllowedRanges = readonly [number, number, number, number];

/**
 * Allowed stress ranges of redundant load paths, ksi.
 * Source: AASHTO Standard Specifications, 17th ed., Table 10.3.1A (values from memory); C-stiffener: its note for transverse stiffener welds.
 */
export const REDUNDANT_RANGES_KSI: Readonly<Record<LfdFatigueDetail, AllowedRanges>> = {
  A: [63, 37, 24, 24],
  B: [49, 29, 18, 16],
  "B'": [39, 23, 14.5, 12],
  C: [35.5, 21, 13, 10],
  "C-stiffener": [35.5, 21, 13, 12],
  D: [28, 16, 10, 7],
  E: [22, 13, 8, 4.5],
};

/**
 * Allowed stress ranges of nonredundant load paths (two stringers), ksi.
 * Source: AASHTO Standard Specifications, 17th ed., Table 10.3.1A (values from memory).
 */
export const NONREDUNDANT_RANGES_KSI: Readonly<Record<LfdFatigueDetail, AllowedRanges>> = {
  A: [50, 29, 24, 24],
  B: [39, 23, 16, 16],
  "B'": [31, 18, 11, 11],
  C: [28, 16, 10, 9],
  "C-stiffener": [28, 16, 12, 11],
  D: [22, 13, 8, 5],
  E: [17, 10, 6, 2.3],
};

/** Fewest stringers that share their load if one fails. Source: AASHTO Standard Specifications, 17th ed., Art. 10.3.1. */
const REDUNDANT_FROM = 3;

/** The ranges that hold for a number of stringers; an unknown number counts as redundant. */
export function allowedRanges(detail: LfdFatigueDetail, count: number | null): AllowedRanges {
  return (count !== null && count < REDUNDANT_FROM ? NONREDUNDANT_RANGES_KSI : REDUNDANT_RANGES_KSI)[detail];
}

/** What is to be checked: all lanes against a range, and for heavy traffic one lane loaded against the range for more than 2,000,000 cycles. */
export interface FatigueCase {
  readonly allowedKsi: number;
  /** Null when one lane loaded need not be checked. */
  readonly oneLaneAllowedKsi: number | null;
  readonly cycles: string;
}

/** Trucks a day from which a road counts as heavily used, and below which as little used. */
const HEAVY_ADTT = 2500;
const LIGHT_ADTT = 100;

/**
 * Cycles by average daily truck traffic; not given counts as heavy.
 *
 * Source: AASHTO Standard Specifications, 17th ed., Table 10.3.2A (truck loading; 100,000 below 100 trucks a day: common practice).
 */
export function fatigueCase(adtt: number | null, ranges: AllowedRanges): FatigueCase {
  if (adtt === null || adtt >= HEAVY_ADTT) return { allowedKsi: ranges[2], oneLaneAllowedKsi: ranges[3], cycles: "2,000,000" };
  if (adtt < LIGHT_ADTT) return { allowedKsi: ranges[0], oneLaneAllowedKsi: null, cycles: "100,000" };
  return { allowedKsi: ranges[1], oneLaneAllowedKsi: null, cycles: "500,000" };
}

/** Moment range of the fatigue truck with impact on one stringer. Source: AASHTO Standard Specifications, 17th ed., Art. 10.3.1, 3.8.2. */
export const fatigueMoment = formula(
  "Mf",
  "MT / 2 * g * (1 + I)",
  "kip-ft",
  "10.3.1",
  ["MT", "g", "I"],
  (MT: number, g: number, I: number) => (MT / 2) * g * (1 + I),
);
/** Stress range at the extreme tension fibre. Source: AASHTO Standard Specifications, 17th ed., Art. 10.3.1. */
export const fatigueRange = formula("fsr", "12 * Mf / Sf", "ksi", "10.3.1", ["Mf", "Sf"], (Mf: number, Sf: number) => (12 * Mf) / Sf);
