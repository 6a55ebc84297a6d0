/** Unit conversions and unit weights. Every conversion in the project goes through a constant of this file. */

/** Inches in a foot. */
export const IN_PER_FT = 12;
/** Square inches in a square foot. */
export const IN2_PER_FT2 = 144;
/** Pounds in a kip. */
export const LB_PER_KIP = 1000;
/** Cubic inches in a cubic foot: turns kip-ft3 / (ksi in4) into inches of deflection. */
export const IN3_PER_FT3 = 1728;

/** Modulus of elasticity of steel, ksi. Source: AASHTO Standard Specifications, 17th ed., Art. 10.2; LRFD 9th ed., Art. 6.4.1. */
export const STEEL_MODULUS_KSI = 29000;

/**
 * Unit weights of materials, lb/ft3.
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.3.6.
 */
export const UNIT_WEIGHT_PCF = {
  steel: 490,
  concrete: 150,
  timber: 50,
  asphalt: 150,
} as const;

/** Millimetres in an inch, exact. */
export const MM_PER_IN = 25.4;
/** Kilograms in a pound (avoirdupois), exact. */
export const KG_PER_LB = 0.45359237;
/** Newtons in a pound of force: KG_PER_LB times standard gravity, 9.80665 m/s2, exact. */
export const N_PER_LB = KG_PER_LB * 9.80665;
/** Kips per square inch in a megapascal (N/mm2). */
export const KSI_PER_MPA = MM_PER_IN ** 2 / (N_PER_LB * LB_PER_KIP);
/** Pounds in a hundredweight, as US steel is priced. */
export const LB_PER_CWT = 100;
/** Pounds in a short ton. */
export const LB_PER_TON = 2000;
