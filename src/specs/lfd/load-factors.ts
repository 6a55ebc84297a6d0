import { formula } from "../../formula.js";

/** All dead moment on the bare section. Source: statics. */
export const deadMoment = formula(
  "MD",
  "M1 + M2 + Mw",
  "kip-ft",
  "statics",
  ["M1", "M2", "Mw"],
  (M1: number, M2: number, Mw: number) => M1 + M2 + Mw,
);
/** Live moment with impact on one stringer. Source: AASHTO Standard Specifications, 17th ed., Art. 3.8.2, 3.23. */
export const liveMoment = formula(
  "ML",
  "MLL / 2 * g * (1 + I)",
  "kip-ft",
  "3.23.2",
  ["MLL", "g", "I"],
  (MLL: number, g: number, I: number) => (MLL / 2) * g * (1 + I),
);
/** Live end shear with impact: the load over the support by the lever rule, the others as for moment. Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.1. */
export const liveShear = formula(
  "VL",
  "(P0 * gv + Vr * g) / 2 * (1 + I)",
  "kip",
  "3.23.1",
  ["P0", "gv", "Vr", "g", "I"],
  (P0: number, gv: number, Vr: number, g: number, I: number) => ((P0 * gv + Vr * g) / 2) * (1 + I),
);
/** Wheel lines that would give the same end shear if every axle went by one factor. Source: statics. */
export const effectiveShearFactor = formula(
  "gveff",
  "2 * VL / (VLL * (1 + I))",
  "wheel lines",
  "3.23.1",
  ["VL", "VLL", "I"],
  (VL: number, VLL: number, I: number) => (2 * VL) / (VLL * (1 + I)),
);

const groupI = (symbol: string, dead: string, live: string, unit: string) =>
  formula(
    symbol,
    `1.3 * (${dead} + 1.67 * ${live})`,
    unit,
    "3.22, Group I",
    [dead, live],
    (D: number, L: number) => 1.3 * (D + GROUP_I_LIVE * L),
  );
const groupIA = (symbol: string, dead: string, live: string, unit: string) =>
  formula(
    symbol,
    `1.3 * (${dead} + 2.20 * ${live})`,
    unit,
    "3.22, Group IA",
    [dead, live],
    (D: number, L: number) => 1.3 * (D + GROUP_IA_LIVE * L),
  );

/** Factored moment and shear, Group I. Source: AASHTO Standard Specifications, 17th ed., Table 3.22.1A. */
export const factoredMoment = groupI("Mu", "MD", "ML", "kip-ft");
export const factoredShear = groupI("Vu", "VD", "VL", "kip");
/** The same, Group IA: vehicles lighter than H20, one lane loaded. Source: AASHTO Standard Specifications, 17th ed., Table 3.22.1A. */
export const factoredMomentIA = groupIA("MuIA", "MD", "ML1", "kip-ft");
export const factoredShearIA = groupIA("VuIA", "VD", "VL1", "kip");

/** Live load factors before the common 1.3, and that of overload. Source: AASHTO Standard Specifications, 17th ed., Table 3.22.1A, Art. 10.57. */
export const GROUP_I_LIVE = 1.67;
export const GROUP_IA_LIVE = 2.2;
export const OVERLOAD_LIVE = 5 / 3;

/** Overload moment; fL is the live moment times 5/3, or for light vehicles times 2.20 with one lane loaded if that is more. Source: AASHTO Standard Specifications, 17th ed., Art. 10.57. */
export const overloadMoment = formula("Mo", "MD + fL", "kip-ft", "10.57", ["MD", "fL"], (MD: number, fL: number) => MD + fL);
/** Overload stress. Source: AASHTO Standard Specifications, 17th ed., Art. 10.57.1. */
export const overloadStress = formula("fo", "12 * Mo / Sx", "ksi", "10.57.1", ["Mo", "Sx"], (Mo: number, Sx: number) => (12 * Mo) / Sx);
export const overloadLimit = formula("Fo", "0.80 * Fy", "ksi", "10.57.1", ["Fy"], (Fy: number) => 0.8 * Fy);
/** S that overload requires. Source: AASHTO Standard Specifications, 17th ed., Art. 10.57.1. */
export const requiredS = formula(
  "Sreq",
  "12 * Mo / (0.80 * Fy)",
  "in3",
  "10.57.1",
  ["Mo", "Fy"],
  (Mo: number, Fy: number) => (12 * Mo) / (0.8 * Fy),
);
