import { type LUDecomposition, lup, lusolve, type Matrix } from "mathjs";

/** A concentrated load, downward, kip. */
export interface PointLoad {
  readonly atFt: number;
  readonly kip: number;
}

/** Beam elements between supports and sections, at the least. */
const LEAST_ELEMENTS = 8;
const SAME_PLACE_FT = 1e-9;

/**
 * A simply supported beam of EI = 1 kip-ft2 by the direct stiffness method, as a second opinion: no influence line and no closed form of
 * the program is used. Elements are cubic, so deflections and rotations of the nodes are exact wherever the loads stand.
 *
 * @param spanFt bearing to bearing
 * @param sectionsFt sections at which deflections are wanted; each becomes a node
 */
export class StiffnessBeam {
  readonly #nodesFt: readonly number[];
  readonly #factors: LUDecomposition;
  /** Row of each degree of freedom in the equations, or -1 where a bearing holds it. */
  readonly #rows: readonly number[];

  constructor(spanFt: number, sectionsFt: readonly number[] = []) {
    const parts = Array.from({ length: LEAST_ELEMENTS + 1 }, (_, part) => (spanFt * part) / LEAST_ELEMENTS);
    const sorted = [...parts, ...sectionsFt].sort((a, b) => a - b);
    this.#nodesFt = sorted.filter((at, place) => place === 0 || at - sorted[place - 1] > SAME_PLACE_FT);
    const nodes = this.#nodesFt.length;
    let row = 0;
    this.#rows = Array.from({ length: 2 * nodes }, (_, freedom) => (freedom === 0 || freedom === 2 * nodes - 2 ? -1 : row++));
    const K = Array.from({ length: row }, () => new Array<number>(row).fill(0));
    for (let element = 0; element + 1 < nodes; element++) {
      const k = elementStiffness(this.#lengthOf(element));
      k.forEach((line, i) => {
        line.forEach((value, j) => {
          const [r, c] = [this.#rows[2 * element + i], this.#rows[2 * element + j]];
          if (r >= 0 && c >= 0) K[r][c] += value;
        });
      });
    }
    this.#factors = lup(K);
  }

  #lengthOf(element: number): number {
    return this.#nodesFt[element + 1] - this.#nodesFt[element];
  }

  /** Solves for concentrated loads (those off the span are left out) and a uniform load over the whole span, kip/ft. */
  under(loads: readonly PointLoad[], uniformKlf = 0): SolvedBeam {
    const nodes = this.#nodesFt;
    const spanFt = nodes[nodes.length - 1];
    const onSpan = loads.filter(({ atFt }) => atFt >= 0 && atFt <= spanFt);
    const forces = nodes.slice(1).map(() => [0, 0, 0, 0]);
    for (const { atFt, kip } of onSpan) {
      const element = nodes.findIndex((at, place) => place + 1 < nodes.length && atFt <= nodes[place + 1] && atFt >= at);
      hermite((atFt - nodes[element]) / this.#lengthOf(element), this.#lengthOf(element)).forEach((shape, i) => {
        forces[element][i] += kip * shape;
      });
    }
    forces.forEach((force, element) => {
      const l = this.#lengthOf(element);
      [l / 2, l ** 2 / 12, l / 2, -(l ** 2) / 12].forEach((shape, i) => {
        force[i] += uniformKlf * shape;
      });
    });
    const equations = Math.max(...this.#rows) + 1;
    const b = new Array<number>(equations).fill(0);
    forces.forEach((force, element) => {
      force.forEach((value, i) => {
        const r = this.#rows[2 * element + i];
        if (r >= 0) b[r] += value;
      });
    });
    const solution = (lusolve(this.#factors, b) as Matrix).toArray() as number[][];
    const u = this.#rows.map((r) => (r < 0 ? 0 : solution[r][0]));
    const ends = forces.map((force, element) =>
      elementStiffness(this.#lengthOf(element)).map((line, i) => line.reduce((sum, k, j) => sum + k * u[2 * element + j], 0) - force[i]),
    );
    return new SolvedBeam(nodes, u, ends, onSpan, uniformKlf);
  }
}

/** A beam solved: what its element end forces and nodes say. */
export class SolvedBeam {
  readonly #nodesFt: readonly number[];
  readonly #displacements: readonly number[];
  readonly #ends: readonly (readonly number[])[];
  readonly #loads: readonly PointLoad[];
  readonly #uniformKlf: number;

  constructor(
    nodesFt: readonly number[],
    displacements: readonly number[],
    ends: readonly (readonly number[])[],
    loads: readonly PointLoad[],
    uniformKlf: number,
  ) {
    this.#nodesFt = nodesFt;
    this.#displacements = displacements;
    this.#ends = ends;
    this.#loads = loads;
    this.#uniformKlf = uniformKlf;
  }

  /** Bending moment, kip-ft, positive when it sags: from the end forces of the element the section lies in. */
  momentAt(xFt: number): number {
    const element = this.#nodesFt.findIndex(
      (at, place) => place + 1 < this.#nodesFt.length && xFt >= at && xFt <= this.#nodesFt[place + 1],
    );
    const startFt = this.#nodesFt[element];
    const [force, moment] = this.#ends[element];
    // A load at a node belongs to the element that ends there, a load over the left bearing to the first element.
    const within = this.#loads.filter(({ atFt }) => atFt < xFt && (element === 0 || atFt > startFt));
    const reach = xFt - startFt;
    return (
      moment - force * reach - (this.#uniformKlf * reach ** 2) / 2 - within.reduce((sum, { atFt, kip }) => sum + kip * (xFt - atFt), 0)
    );
  }

  /** Shear just left of a section, kip, positive when the left part is pushed up. */
  shearLeftOf(xFt: number): number {
    return this.#shear(xFt, ({ atFt }) => atFt < xFt - SAME_PLACE_FT);
  }

  /** Shear just right of a section, kip. */
  shearRightOf(xFt: number): number {
    return this.#shear(xFt, ({ atFt }) => atFt <= xFt + SAME_PLACE_FT);
  }

  /** Deflection times EI, kip-ft3, downward positive, at a section that is a node. */
  deflectionAt(sectionFt: number): number {
    const node = this.#nodesFt.findIndex((at) => Math.abs(at - sectionFt) <= SAME_PLACE_FT);
    if (node < 0) throw new Error(`${sectionFt} ft is no node`);
    return this.#displacements[2 * node];
  }

  /** Upward force of the left bearing, kip; a load that stands over the bearing goes straight into it. */
  leftReaction(): number {
    return -this.#ends[0][0];
  }

  /** Upward force of the right bearing, kip. */
  rightReaction(): number {
    return -this.#ends[this.#ends.length - 1][2];
  }

  #shear(xFt: number, counts: (load: PointLoad) => boolean): number {
    // From the left bearing on, so that a load at a node is counted once.
    const before = this.#loads.filter(counts).reduce((sum, { kip }) => sum + kip, 0);
    return this.leftReaction() - before - this.#uniformKlf * xFt;
  }
}

/** Stiffness of a beam element of EI = 1: deflection and slope at its left end, then at its right. */
function elementStiffness(l: number): number[][] {
  const [a, b, c, d] = [12 / l ** 3, 6 / l ** 2, 4 / l, 2 / l];
  return [
    [a, b, -a, b],
    [b, c, -b, d],
    [-a, -b, a, -b],
    [b, d, -b, c],
  ];
}

/** Cubic shape functions at a fraction of an element. */
function hermite(s: number, l: number): number[] {
  return [1 - 3 * s ** 2 + 2 * s ** 3, l * s * (1 - s) ** 2, 3 * s ** 2 - 2 * s ** 3, l * s ** 2 * (s - 1)];
}
