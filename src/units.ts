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
