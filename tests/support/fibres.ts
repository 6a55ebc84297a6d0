import type { ShapeFigures } from "../../src/catalogue/shape.js";
import type { Slab } from "../../src/section/composite.js";

/** A thin level strip of a section. */
interface Fibre {
  /** Middle of the strip above the bottom of the steel, in. */
  readonly atIn: number;
  readonly thicknessIn: number;
  readonly widthIn: number;
  readonly of: "steel" | "slab";
}

/** Where the area of the four fillets is put: in its corners, or spread over the web as the specifications' plastic moment has it. */
export type Fillets = "in their corners" | "spread over the web";

/** Strips in a flange, in a fillet, in the clear web and in the slab. */
const STRIPS = { flange: 40, fillet: 60, web: 240, slab: 160 } as const;

/**
 * A shape cut into level strips from bottom to top, as a second opinion: no formula of the program is used.
 *
 * @param fillets radius r = k - tf; where they are spread, the whole area is the tabulated one
 */
export function steelFibres(shape: ShapeFigures, fillets: Fillets): readonly Fibre[] {
  const { depthIn: d, flangeWidthIn: bf, flangeThicknessIn: tf, webThicknessIn: tw, areaIn2, kDesignIn } = shape;
  if (fillets === "spread over the web") {
    const width = (areaIn2 - 2 * bf * tf) / (d - 2 * tf);
    return [
      ...strips(0, tf, STRIPS.flange, () => bf, "steel"),
      ...strips(tf, d - tf, STRIPS.web, () => width, "steel"),
      ...strips(d - tf, d, STRIPS.flange, () => bf, "steel"),
    ];
  }
  const r = kDesignIn - tf;
  /** Width where a quarter circle of radius r about the open corner leaves the fillet, at a height above the flange's inner face. */
  const overFlange = (height: number): number => tw + 2 * (r - Math.sqrt(r ** 2 - (r - height) ** 2));
  return [
    ...strips(0, tf, STRIPS.flange, () => bf, "steel"),
    ...strips(tf, kDesignIn, STRIPS.fillet, (at) => overFlange(at - tf), "steel"),
    ...strips(kDesignIn, d - kDesignIn, STRIPS.web, () => tw, "steel"),
    ...strips(d - kDesignIn, d - tf, STRIPS.fillet, (at) => overFlange(d - tf - at), "steel"),
    ...strips(d - tf, d, STRIPS.flange, () => bf, "steel"),
  ];
}

/** The slab over a shape cut into level strips from bottom to top; the haunch is a gap. */
export function slabFibres(shape: ShapeFigures, slab: Slab): readonly Fibre[] {
  const from = shape.depthIn + slab.haunchIn;
  return strips(from, from + slab.thicknessIn, STRIPS.slab, () => slab.widthIn, "slab");
}

function strips(fromIn: number, toIn: number, count: number, widthAt: (atIn: number) => number, of: Fibre["of"]): Fibre[] {
  const thicknessIn = (toIn - fromIn) / count;
  if (!(thicknessIn > 0)) return [];
  return Array.from({ length: count }, (_, strip) => {
    const atIn = fromIn + (strip + 0.5) * thicknessIn;
    return { atIn, thicknessIn, widthIn: widthAt(atIn), of };
  });
}

/** Elastic properties summed over fibres, in steel. */
export interface FibreSection {
  readonly areaIn2: number;
  readonly axisIn: number;
  readonly inertiaIn4: number;
}

/**
 * Elastic properties of fibres, concrete counted at 1/n.
 *
 * @param n modular ratio
 * @param cracked whether concrete below the axis, in tension, counts for nothing
 */
export function elasticByFibres(fibres: readonly Fibre[], n: number, cracked = false): FibreSection {
  let section = summed(fibres, n, Number.NEGATIVE_INFINITY);
  for (let round = 0; cracked && round < 60; round++) section = summed(fibres, n, section.axisIn);
  return section;
}

function summed(fibres: readonly Fibre[], n: number, concreteFromIn: number): FibreSection {
  let A = 0;
  let Ay = 0;
  let Ayy = 0;
  for (const { atIn, thicknessIn, widthIn, of } of fibres) {
    if (of === "slab" && atIn < concreteFromIn) continue;
    const area = (widthIn * thicknessIn) / (of === "slab" ? n : 1);
    A += area;
    Ay += area * atIn;
    Ayy += area * (atIn ** 2 + thicknessIn ** 2 / 12);
  }
  const axisIn = Ay / A;
  return { areaIn2: A, axisIn, inertiaIn4: Ayy - A * axisIn ** 2 };
}

/** What full yielding gives. */
export interface FibrePlastic {
  readonly momentKipFt: number;
  /** Axis above the bottom of the steel, in. */
  readonly axisIn: number;
  /** Thickness of the strip the axis lies in: the axis is known to this, in. */
  readonly stripIn: number;
}

/**
 * Plastic moment of fibres under sagging: steel at Fy either way, concrete at 0.85 f'c above the axis and nothing below it.
 *
 * The axis is where, going up, the compression above no longer exceeds the tension below; within its strip it is taken in proportion.
 */
export function plasticByFibres(fibres: readonly Fibre[], Fy: number, fc: number): FibrePlastic {
  const push = ({ thicknessIn, widthIn, of }: Fibre): number => thicknessIn * widthIn * (of === "slab" ? 0.85 * fc : Fy);
  const pull = (fibre: Fibre): number => (fibre.of === "slab" ? 0 : push(fibre));
  let excess = fibres.reduce((sum, fibre) => sum + push(fibre), 0);
  let place = 0;
  while (place + 1 < fibres.length && excess - push(fibres[place]) - pull(fibres[place]) > 0) {
    excess -= push(fibres[place]) + pull(fibres[place]);
    place++;
  }
  const at = fibres[place];
  const part = excess / (push(at) + pull(at));
  const axisIn = at.atIn - at.thicknessIn / 2 + part * at.thicknessIn;
  let moment = 0;
  fibres.forEach((fibre, index) => {
    if (index === place) {
      moment += (push(at) * (1 - part) ** 2 * at.thicknessIn) / 2 + (pull(at) * part ** 2 * at.thicknessIn) / 2;
    } else moment += (index < place ? pull(fibre) : push(fibre)) * Math.abs(fibre.atIn - axisIn);
  });
  return { momentKipFt: moment / 12, axisIn, stripIn: at.thicknessIn };
}

/** Moments of the stages before the live load, factored, kip-ft. */
export interface LastingMoments {
  readonly onSteelKipFt: number;
  readonly onLongTermKipFt: number;
}

/**
 * Moment at which the first flange yields, by stages: the strain of each stage on its own section, added up at the outermost steel.
 *
 * Live load is raised by halving until the worse flange stands at Fy. A top flange that a stage would stretch is taken as untouched by it.
 *
 * @param n modular ratio for the live load; three times it for what lasts
 * @returns all moment together, kip-ft
 */
export function firstYieldByFibres(shape: ShapeFigures, slab: Slab, n: number, Fy: number, lasting: LastingMoments): number {
  const steel = steelFibres(shape, "in their corners");
  const both = [...steel, ...slabFibres(shape, slab)];
  const [bare, long, short] = [elasticByFibres(steel, 1), elasticByFibres(both, 3 * n), elasticByFibres(both, n)];
  const bottom = (moment: number, section: FibreSection): number => (12 * moment * section.axisIn) / section.inertiaIn4;
  const top = (moment: number, section: FibreSection): number =>
    Math.max(0, (12 * moment * (shape.depthIn - section.axisIn)) / section.inertiaIn4);
  const { onSteelKipFt: M1, onLongTermKipFt: M2 } = lasting;
  const worse = (live: number): number =>
    Math.max(bottom(M1, bare) + bottom(M2, long) + bottom(live, short), top(M1, bare) + top(M2, long) + top(live, short));
  let [low, high] = [0, 1e6];
  for (let halving = 0; halving < 60; halving++) {
    const middle = (low + high) / 2;
    if (worse(middle) < Fy) low = middle;
    else high = middle;
  }
  return M1 + M2 + low;
}
