/** Where a shape's row stands: the list's name as given, and the line in it. */
export interface ShapeSource {
  readonly file: string;
  readonly line: number;
}

/** Dimensions and properties of a rolled wide-flange shape, as its list gives them. */
export interface ShapeFigures {
  /** Weight per length, lb/ft. */
  readonly weightPlf: number;
  /** Area A, in2. */
  readonly areaIn2: number;
  /** Depth d over all, in. */
  readonly depthIn: number;
  /** Flange width bf, in. */
  readonly flangeWidthIn: number;
  /** Web thickness tw, in. */
  readonly webThicknessIn: number;
  /** Flange thickness tf, in. */
  readonly flangeThicknessIn: number;
  /** Design distance k from the outer face of the flange to the toe of the fillet, in. */
  readonly kDesignIn: number;
  /** Moment of inertia Ix about the strong axis, in4. */
  readonly inertiaXIn4: number;
  /** Elastic section modulus Sx, in3. */
  readonly sectionModulusXIn3: number;
  /** Radius of gyration rx, in. */
  readonly radiusXIn: number;
  /** Plastic section modulus Zx, in3. */
  readonly plasticModulusXIn3: number;
  /** Moment of inertia Iy about the weak axis, in4. */
  readonly inertiaYIn4: number;
  /** Elastic section modulus Sy, in3. */
  readonly sectionModulusYIn3: number;
  /** Radius of gyration ry, in. */
  readonly radiusYIn: number;
  /** Plastic section modulus Zy, in3. */
  readonly plasticModulusYIn3: number;
  /** St. Venant torsion constant J, in4. */
  readonly torsionJIn4: number;
  /** Warping constant Cw, in6. */
  readonly warpingCwIn6: number;
  /** bf/2tf as the list prints it. */
  readonly flangeSlenderness: number;
  /** h/tw clear of the fillets as the list prints it. */
  readonly webSlenderness: number;
}

/** What a yard says of its pieces of one shape; null wherever it says nothing. */
export interface Stock {
  /** Pieces on hand. */
  readonly quantity: number | null;
  /** Usable length of each piece, ft. */
  readonly usableLengthFt: number | null;
  /** Year in which the steel was built in, or rolled. */
  readonly yearBuilt: number | null;
  /** Price, in any money per lb. */
  readonly pricePerLb: number | null;
  /** Where it lies, or a note. */
  readonly place: string | null;
  /** Thickness lost from each flange, in. */
  readonly flangeLossIn: number | null;
  /** Thickness lost from the web, in. */
  readonly webLossIn: number | null;
}

/** One shape of a list. */
export interface Shape extends ShapeFigures {
  readonly designation: string;
  /** Yield stress the row itself gives, ksi; null when the list says nothing of it. */
  readonly yieldStressKsi: number | null;
  /** What the row says of the pieces on hand; null when it says nothing. */
  readonly stock: Stock | null;
  readonly source: ShapeSource;
  /** True for the open catalogue that comes with the program, false for somebody's own list. */
  readonly bundled: boolean;
}

/** The name under which two spellings of a designation are the same shape: upper case, no blanks. */
export function designationKey(designation: string): string {
  return designation.toUpperCase().replace(/\s+/g, "");
}

/**
 * Nominal depth of a shape, in: the first number of its designation, or the depth to the nearest inch.
 *
 * Source: common practice (W30X116 is nominally 30 in deep and weighs 116 lb/ft).
 */
export function nominalDepthIn(shape: Shape): number {
  const named = /^[A-Za-z]*(\d+(?:\.\d+)?)\s*[xX]/.exec(shape.designation);
  return named === null ? Math.round(shape.depthIn) : Number(named[1]);
}
