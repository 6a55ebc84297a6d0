import { formula } from "../../formula.js";

/** Modulus of normal-weight concrete, wc 0.145 kip/ft3, K1 1.0. Source: AASHTO LRFD, 9th ed., Art. 5.4.2.4. */
export const concreteModulus = formula(
  "Ec",
  "120000 * 0.145^2 * fc^0.33",
  "ksi",
  "5.4.2.4",
  ["fc"],
  (fc: number) => 120000 * 0.145 ** 2 * fc ** 0.33,
);
/** Modular ratio. Source: AASHTO LRFD, 9th ed., Art. 6.10.1.1.1b. */
export const modularRatio = formula("n", "E / Ec", "-", "6.10.1.1.1b", ["E", "Ec"], (E: number, Ec: number) => E / Ec);

/** Strength I. Source: AASHTO LRFD, 9th ed., Tables 3.4.1-1, 3.4.1-2. */
export const strengthMoment = formula(
  "Mu",
  "1.25 * (M1 + M2) + 1.50 * Mw + 1.75 * ML",
  "kip-ft",
  "3.4.1, Strength I",
  ["M1", "M2", "Mw", "ML"],
  (M1: number, M2: number, Mw: number, ML: number) => 1.25 * (M1 + M2) + 1.5 * Mw + 1.75 * ML,
);
export const strengthShear = formula(
  "Vu",
  "(1.25 * (w1 + w2) + 1.50 * ww) * L / 2 + 1.75 * VL",
  "kip",
  "3.4.1, Strength I",
  ["w1", "w2", "ww", "L", "VL"],
  (w1: number, w2: number, ww: number, L: number, VL: number) => ((1.25 * (w1 + w2) + 1.5 * ww) * L) / 2 + 1.75 * VL,
);
/** Live effects on one stringer, dynamic allowance and lane load in them. Source: AASHTO LRFD, 9th ed., Art. 3.6.1.3.1, 4.6.2.2. */
export const liveMoment = formula("ML", "MLL * g", "kip-ft", "4.6.2.2.2", ["MLL", "g"], (MLL: number, g: number) => MLL * g);
export const liveShear = formula("VL", "VLL * gv", "kip", "4.6.2.2.3", ["VLL", "gv"], (VLL: number, gv: number) => VLL * gv);

/** Service II stresses, staged. Source: AASHTO LRFD, 9th ed., Art. 6.10.4.2.2. */
export const serviceBottom = formula(
  "fb",
  "12 * M1 / Sx + 12 * M2w / Sb3n + 12 * 1.30 * ML / Sbn",
  "ksi",
  "6.10.4.2.2",
  ["M1", "Sx", "M2w", "Sb3n", "ML", "Sbn"],
  (M1: number, Sx: number, M2w: number, Sb3n: number, ML: number, Sbn: number) =>
    (12 * M1) / Sx + (12 * M2w) / Sb3n + (12 * 1.3 * ML) / Sbn,
);
/** What is in tension at the top is put in as 0. Source: as the bottom's. */
export const serviceTop = formula(
  "ft",
  "12 * M1 / Sx + ft3n + ftn",
  "ksi",
  "6.10.4.2.2",
  ["M1", "Sx", "ft3n", "ftn"],
  (M1: number, Sx: number, ft3n: number, ftn: number) => (12 * M1) / Sx + ft3n + ftn,
);
/** Limits. Source: AASHTO LRFD, 9th ed., Art. 6.10.4.2.2. */
export const serviceLimitComposite = formula("Fs", "0.95 * Fy", "ksi", "6.10.4.2.2", ["Fy"], (Fy: number) => 0.95 * Fy);
export const serviceLimitBare = formula("Fs", "0.80 * Fy", "ksi", "6.10.4.2.2", ["Fy"], (Fy: number) => 0.8 * Fy);
export const serviceStressBare = formula(
  "fs",
  "12 * (M1 + M2w + 1.30 * ML) / Sx",
  "ksi",
  "6.10.4.2.2",
  ["M1", "M2w", "ML", "Sx"],
  (M1: number, M2w: number, ML: number, Sx: number) => (12 * (M1 + M2w + 1.3 * ML)) / Sx,
);
/** Strength I stresses of a composite section whose web is not compact, staged. Source: AASHTO LRFD, 9th ed., Art. 6.10.7.2. */
export const strengthBottom = formula(
  "fbu",
  "12 * 1.25 * M1 / Sx + 12 * (1.25 * M2 + 1.50 * Mw) / Sb3n + 12 * 1.75 * ML / Sbn",
  "ksi",
  "6.10.7.2",
  ["M1", "Sx", "M2", "Mw", "Sb3n", "ML", "Sbn"],
  (M1: number, Sx: number, M2: number, Mw: number, Sb3n: number, ML: number, Sbn: number) =>
    (12 * 1.25 * M1) / Sx + (12 * (1.25 * M2 + 1.5 * Mw)) / Sb3n + (12 * 1.75 * ML) / Sbn,
);

/** Shear of a web without stiffeners. Source: AASHTO LRFD, 9th ed., Art. 6.10.9.2, 6.10.9.3.2, k = 5. */
export const shearYielding = formula(
  "Vn",
  "0.58 * Fy * D * tw",
  "kip",
  "6.10.9.2",
  ["Fy", "D", "tw"],
  (Fy: number, D: number, tw: number) => 0.58 * Fy * D * tw,
);
export const shearInelastic = formula(
  "Vn",
  "0.58 * Fy * D * tw * 1.12 * qv / (D / tw)",
  "kip",
  "6.10.9.3.2",
  ["Fy", "D", "tw", "qv"],
  (Fy: number, D: number, tw: number, qv: number) => (0.58 * Fy * D * tw * 1.12 * qv) / (D / tw),
);
export const shearElastic = formula(
  "Vn",
  "0.58 * Fy * D * tw * 1.57 * qv^2 / (D / tw)^2",
  "kip",
  "6.10.9.3.2",
  ["Fy", "D", "tw", "qv"],
  (Fy: number, D: number, tw: number, qv: number) => (0.58 * Fy * D * tw * 1.57 * qv ** 2) / (D / tw) ** 2,
);
export const shearRoot = formula("qv", "sqrt(5 * E / Fy)", "-", "6.10.9.3.2", ["E", "Fy"], (E: number, Fy: number) =>
  Math.sqrt((5 * E) / Fy),
);

/** Live-load deflection, all lanes shared equally. Source: AASHTO LRFD, 9th ed., Art. 2.5.2.6.2, 3.6.1.3.2. */
export const sharedDeflection = formula(
  "delta",
  "1728 * m * NL * Y / (Nb * E * Id)",
  "in",
  "2.5.2.6.2",
  ["m", "NL", "Y", "Nb", "E", "Id"],
  (m: number, NL: number, Y: number, Nb: number, E: number, Id: number) => (1728 * m * NL * Y) / (Nb * E * Id),
);
export const stringerDeflection = formula(
  "delta",
  "1728 * g * Y / (E * Id)",
  "in",
  "2.5.2.6.2",
  ["g", "Y", "E", "Id"],
  (g: number, Y: number, E: number, Id: number) => (1728 * g * Y) / (E * Id),
);
export const allowedDeflection = formula("dall", "12 * L / ko", "in", "2.5.2.6.2", ["L", "ko"], (L: number, ko: number) => (12 * L) / ko);

/** Stress range of the fatigue truck, 15 % dynamic allowance. Source: AASHTO LRFD, 9th ed., Art. 3.6.1.4, 6.6.1.2.2. */
export const fatigueRange = formula(
  "fsr",
  "12 * gamma * MT * 1.15 * gf / Sf",
  "ksi",
  "6.6.1.2.2",
  ["gamma", "MT", "gf", "Sf"],
  (gamma: number, MT: number, gf: number, Sf: number) => (12 * gamma * MT * 1.15 * gf) / Sf,
);

/** Pour moments. Source: AASHTO LRFD, 9th ed., Art. 3.4.2.1. */
export const pourMomentStrength = formula(
  "Ma",
  "(1.25 * w1 + 1.5 * wc) * L^2 / 8",
  "kip-ft",
  "3.4.2.1",
  ["w1", "wc", "L"],
  (w1: number, wc: number, L: number) => ((1.25 * w1 + 1.5 * wc) * L * L) / 8,
);
export const pourMomentDead = formula(
  "Mb",
  "1.4 * (w1 + wc) * L^2 / 8",
  "kip-ft",
  "3.4.2.1",
  ["w1", "wc", "L"],
  (w1: number, wc: number, L: number) => (1.4 * (w1 + wc) * L * L) / 8,
);
export const pourStress = formula(
  "fbu",
  "12 * max(Ma, Mb) / Sx",
  "ksi",
  "6.10.3.2.1",
  ["Ma", "Mb", "Sx"],
  (Ma: number, Mb: number, Sx: number) => (12 * Math.max(Ma, Mb)) / Sx,
);
/** Flange buckling of the bare shape: compact, and on the straight line to 0.7 Fy. Source: AASHTO LRFD, 9th ed., Art. 6.10.8.2.2. */
export const pourFlangeLimit = formula(
  "lpf",
  "0.38 * sqrt(E / Fy)",
  "-",
  "6.10.8.2.2",
  ["E", "Fy"],
  (E: number, Fy: number) => 0.38 * Math.sqrt(E / Fy),
);
export const pourFlange = formula(
  "Fflb",
  "(1 - 0.3 * max(0, lf - lpf) / (0.56 * sqrt(E / (0.7 * Fy)) - lpf)) * Fy",
  "ksi",
  "6.10.8.2.2",
  ["lf", "lpf", "E", "Fy"],
  (lf: number, lpf: number, E: number, Fy: number) => (1 - (0.3 * Math.max(0, lf - lpf)) / (0.56 * Math.sqrt(E / (0.7 * Fy)) - lpf)) * Fy,
);
/** The lesser of flange buckling, lateral buckling by Appendix A6, and yield. Source: AASHTO LRFD, 9th ed., Art. 6.10.3.2.1, A6.3.3. */
export const pourResistance = formula(
  "Fnc",
  "min(Fy, Fflb, Mltb / Sx)",
  "ksi",
  "6.10.3.2.1",
  ["Fy", "Fflb", "Mltb", "Sx"],
  (Fy: number, Fflb: number, Mltb: number, Sx: number) => Math.min(Fy, Fflb, Mltb / Sx),
);
export const pourBuckling = formula("fnc", "fbu + fl / 3", "ksi", "6.10.3.2.1", ["fbu", "fl"], (fbu: number, fl: number) => fbu + fl / 3);
export const pourYielding = formula("fny", "fbu + fl", "ksi", "6.10.3.2.1", ["fbu", "fl"], (fbu: number, fl: number) => fbu + fl);
export const lateralLimit = formula("Fl", "0.6 * Fy", "ksi", "6.10.1.6", ["Fy"], (Fy: number) => 0.6 * Fy);

/** Depths. Source: AASHTO LRFD, 9th ed., Table 2.5.2.6.3-1. */
export const leastSteelDepth = formula("dmin", "12 * 0.033 * L", "in", "2.5.2.6.3", ["L"], (L: number) => 12 * 0.033 * L);
export const leastWholeDepth = formula("hmin", "12 * 0.040 * L", "in", "2.5.2.6.3", ["L"], (L: number) => 12 * 0.04 * L);
/** Flange that can be handled. Source: AASHTO LRFD, 9th ed., Art. C6.10.2.2. */
export const leastFlangeWidth = formula("bmin", "12 * L / 85", "in", "C6.10.2.2", ["L"], (L: number) => (12 * L) / 85);
/** Least concrete deck, in; the article leaves a sacrificial surface out. Source: AASHTO LRFD, 9th ed., Art. 9.7.1.1. */
export const LEAST_DECK_IN = 7;

/** Studs by strength. Source: AASHTO LRFD, 9th ed., Art. 6.10.10.4. */
export const studStrength = formula(
  "Qn",
  "min(0.5 * pi * ds^2 / 4 * sqrt(fc * Ec), 60 * pi * ds^2 / 4)",
  "kip",
  "6.10.10.4.3",
  ["ds", "fc", "Ec"],
  (ds: number, fc: number, Ec: number) => {
    const Asc = (Math.PI * ds * ds) / 4;
    return Math.min(0.5 * Asc * Math.sqrt(fc * Ec), 60 * Asc);
  },
);
export const studForce = formula("Pst", "min(Ps, P)", "kip", "6.10.10.4.2", ["Ps", "P"], (Ps: number, P: number) => Math.min(Ps, P));
export const studCount = formula(
  "N1",
  "Pst / (0.85 * Qn)",
  "-",
  "6.10.10.4.1",
  ["Pst", "Qn"],
  (Pst: number, Qn: number) => Pst / (0.85 * Qn),
);
/** Tributary width as effective slab width. Source: AASHTO LRFD, 9th ed., Art. 4.6.2.6.1. */
export const effectiveWidth = formula("be", "12 * T", "in", "4.6.2.6.1", ["T"], (T: number) => 12 * T);
