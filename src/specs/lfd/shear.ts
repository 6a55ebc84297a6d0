import { formula, type Recorder } from "../../formula.js";

/** Plate buckling coefficient of a web without stiffeners. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.8.1. */
const K = 5;

/** Web that yields in shear. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.8.1. */
export const shearYielding = formula(
  "Vcap",
  "0.58 * Fy * D * tw",
  "kip",
  "10.48.8.1",
  ["Fy", "D", "tw"],
  (Fy: number, D: number, tw: number) => 0.58 * Fy * D * tw,
);
/** Web that buckles beyond yielding. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.8.1. */
export const shearInelastic = formula(
  "Vcap",
  "0.58 * Fy * D * tw * 190 * sqrt(kv) / sqrt(Fy) / (D / tw)",
  "kip",
  "10.48.8.1",
  ["Fy", "D", "tw", "kv"],
  (Fy: number, D: number, tw: number, kv: number) => (0.58 * Fy * D * tw * 190 * Math.sqrt(kv)) / Math.sqrt(Fy) / (D / tw),
);
/** Web that buckles elastically. Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.8.1. */
export const shearElastic = formula(
  "Vcap",
  "0.58 * Fy * D * tw * 45000 * kv / ((D / tw)^2 * Fy)",
  "kip",
  "10.48.8.1",
  ["Fy", "D", "tw", "kv"],
  (Fy: number, D: number, tw: number, kv: number) => (0.58 * Fy * D * tw * 45000 * kv) / ((D / tw) ** 2 * Fy),
);

/**
 * Shear capacity of a web without stiffeners, kip.
 *
 * @param Fy yield stress, ksi
 * @param D web depth between flanges, in
 * @param tw web thickness, in
 * Source: AASHTO Standard Specifications, 17th ed., Art. 10.48.8.1.
 */
export function shearCapacityKip(Fy: number, D: number, tw: number, recorder: Recorder | null): number {
  const slenderness = D / tw;
  const root = Math.sqrt(K) / Math.sqrt(Fy);
  if (slenderness <= 190 * root) {
    const capacity = shearYielding.of(Fy, D, tw);
    recorder?.step(shearYielding, capacity, Fy, D, tw);
    return capacity;
  }
  const rule = slenderness <= 237 * root ? shearInelastic : shearElastic;
  const capacity = rule.of(Fy, D, tw, K);
  recorder?.step(rule, capacity, Fy, D, tw, K);
  return capacity;
}

/** Shear up to which no bearing stiffeners are needed. Source: AASHTO Standard Specifications, 17th ed., Art. 10.33.2. */
export const withoutBearingStiffeners = formula("Vbs", "0.75 * Vcap", "kip", "10.33.2", ["Vcap"], (Vcap: number) => 0.75 * Vcap);
