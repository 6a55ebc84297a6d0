/**
 * The five dimensions that draw a rolled I-shape, in; each > 0.
 *
 * Source: nominal dimensions as steel tables print them (ASTM A6).
 */
export interface RolledDimensions {
  /** out to out of the flanges; > 2 flangeThicknessIn */
  readonly depthIn: number;
  readonly flangeWidthIn: number;
  /** at most flangeWidthIn */
  readonly webThicknessIn: number;
  readonly flangeThicknessIn: number;
  /** outer face of the flange to the toe of the fillet; flangeThicknessIn (no fillet) to depthIn / 2 */
  readonly kDesignIn: number;
}

/**
 * What follows from the dimensions, in powers of inches; each > 0. x is the strong axis.
 *
 * Source: statics.
 */
export interface RolledProperties {
  readonly areaIn2: number;
  readonly inertiaXIn4: number;
  readonly sectionModulusXIn3: number;
  readonly plasticModulusXIn3: number;
  readonly radiusXIn: number;
  readonly inertiaYIn4: number;
  readonly sectionModulusYIn3: number;
  readonly plasticModulusYIn3: number;
  readonly radiusYIn: number;
  readonly torsionJIn4: number;
  readonly warpingCwIn6: number;
}

/**
 * Properties of a doubly symmetric rolled I-shape: two flanges, a web, and in each of the four
 * corners between them a fillet of radius r = k - tf. Exact but for J and Cw.
 *
 * J is fitted to rolled proportions (about tw <= tf <= bf / 3); the farther from them, the rougher.
 * Cw takes each flange as a thin plate.
 *
 * @param dimensions in; each finite and > 0
 * @returns areas in2, moduli in3, inertias and J in4, Cw in6, radii of gyration in; each > 0
 * @throws {RangeError} if a dimension is not finite or not positive
 * @throws {RangeError} if 2 tf >= d or tw > bf: there is no I
 * @throws {RangeError} if k < tf, 2 k > d or 2 r > bf - tw: there is no fillet, or no room for it
 * @throws {RangeError} if the approximation for J gives none above 0: not the proportions of a rolled shape
 * Source: statics; J: see torsionConstantIn4; Cw: thin-walled torsion of an I-shape, Iy h^2 / 4.
 */
export function propertiesFromDimensions(dimensions: RolledDimensions): RolledProperties {
  demandAnIShape(dimensions);
  const { depthIn: d, flangeWidthIn: bf, webThicknessIn: tw, flangeThicknessIn: tf } = dimensions;
  const r = dimensions.kDesignIn - tf;
  const hw = d - 2 * tf;

  const fillet = filletSpandrel(r);
  const filletX = tw / 2 + fillet.offsetIn;
  const filletY = hw / 2 - fillet.offsetIn;

  const A = 2 * bf * tf + hw * tw + 4 * fillet.areaIn2;
  const Ix = (bf * d ** 3 - (bf - tw) * hw ** 3) / 12 + 4 * (fillet.ownInertiaIn4 + fillet.areaIn2 * filletY ** 2);
  const Iy = (2 * tf * bf ** 3 + hw * tw ** 3) / 12 + 4 * (fillet.ownInertiaIn4 + fillet.areaIn2 * filletX ** 2);
  const Zx = bf * tf * (d - tf) + (tw * hw ** 2) / 4 + 4 * fillet.areaIn2 * filletY;
  const Zy = (tf * bf ** 2) / 2 + (hw * tw ** 2) / 4 + 4 * fillet.areaIn2 * filletX;

  return {
    areaIn2: A,
    inertiaXIn4: Ix,
    sectionModulusXIn3: Ix / (d / 2),
    plasticModulusXIn3: Zx,
    radiusXIn: Math.sqrt(Ix / A),
    inertiaYIn4: Iy,
    sectionModulusYIn3: Iy / (bf / 2),
    plasticModulusYIn3: Zy,
    radiusYIn: Math.sqrt(Iy / A),
    torsionJIn4: torsionConstantIn4(dimensions),
    warpingCwIn6: (Iy * (d - tf) ** 2) / 4,
  };
}

/**
 * The concave spandrel a fillet fills: a square of side r less a quarter circle of radius r about
 * the corner in the open. It is the same about x and about y, so one set of figures serves both.
 *
 * @returns area; distance of its centroid from web and flange alike; inertia about its own centroid
 */
function filletSpandrel(r: number) {
  const areaIn2 = (1 - Math.PI / 4) * r ** 2;
  // First moment r^3/2 - r^3/3 and inertia r^4/3 - pi r^4/16, both about an axis through the
  // circle's centre; dividing by (1 - pi/4) r^2 in symbols keeps r = 0 from becoming 0/0.
  const fromCentreIn = r / 6 / (1 - Math.PI / 4);
  const inertiaAboutCentreIn4 = (1 / 3 - Math.PI / 16) * r ** 4;
  return {
    areaIn2,
    offsetIn: r - fromCentreIn,
    ownInertiaIn4: inertiaAboutCentreIn4 - areaIn2 * fromCentreIn ** 2,
  };
}

/**
 * St. Venant torsion constant: three thin plates, plus the two junctions by the circle inscribed
 * in each (diameter D), less the loss at the four flange tips.
 *
 * @returns in4
 * @throws {RangeError} if the result is not above 0
 * Source: El Darwish and Johnston, "Torsion of Structural Shapes", Journal of the Structural
 * Division, ASCE, vol. 91, ST1, 1965; parallel flanges (constants from memory).
 */
function torsionConstantIn4(dimensions: RolledDimensions): number {
  const { depthIn: d, flangeWidthIn: bf, webThicknessIn: tw, flangeThicknessIn: tf } = dimensions;
  const r = dimensions.kDesignIn - tf;
  const D = ((tf + r) ** 2 + tw * (r + tw / 4)) / (2 * r + tf);
  const alpha = -0.042 + (0.2204 * tw) / tf + (0.1355 * r) / tf - (0.0865 * r * tw) / tf ** 2 - (0.0725 * tw ** 2) / tf ** 2;
  const plates = (2 / 3) * bf * tf ** 3 + (1 / 3) * (d - 2 * tf) * tw ** 3;
  const J = plates + 2 * alpha * D ** 4 - 0.42 * tf ** 4;
  if (!(J > 0)) throw new RangeError(`torsion constant must come out > 0, not ${J} in4`);
  return J;
}

function demandAnIShape(dimensions: RolledDimensions): void {
  const { depthIn: d, flangeWidthIn: bf, webThicknessIn: tw, flangeThicknessIn: tf } = dimensions;
  const k = dimensions.kDesignIn;
  for (const [name, value] of Object.entries({
    depthIn: d,
    flangeWidthIn: bf,
    webThicknessIn: tw,
    flangeThicknessIn: tf,
    kDesignIn: k,
  })) {
    if (!(Number.isFinite(value) && value > 0)) {
      throw new RangeError(`${name} must be finite and > 0, not ${value}`);
    }
  }
  if (2 * tf >= d) throw new RangeError(`two flanges of ${tf} in fill the depth of ${d} in`);
  if (tw > bf) throw new RangeError(`web of ${tw} in is thicker than the flange is wide, ${bf} in`);
  if (k < tf) throw new RangeError(`kDesignIn ${k} is less than flangeThicknessIn ${tf}`);
  if (2 * k > d) throw new RangeError(`fillets with k ${k} in overlap within the depth of ${d} in`);
  if (2 * (k - tf) > bf - tw) throw new RangeError(`fillets of ${k - tf} in are wider than the flange`);
}
