import { describe, expect, it } from "vitest";
import { reducedShape } from "../../../src/section/reduced-shape.js";
import { CATALOGUE } from "../../support/question.js";

/** A closed outline of a doubly symmetric I-shape with fillets, corners counter-clockwise, arcs as fine polygons. */
function outline(d: number, bf: number, tf: number, tw: number, r: number): [number, number][] {
  const steps = 400;
  const quarter: [number, number][] = [];
  // From the web up into the underside of the flange, right-hand top quadrant: the fillet's centre stands at (tw/2 + r, d/2 - tf - r).
  for (let step = 0; step <= steps; step++) {
    const angle = Math.PI - (step / steps) * (Math.PI / 2);
    quarter.push([tw / 2 + r + r * Math.cos(angle), d / 2 - tf - r + r * Math.sin(angle)]);
  }
  const topRight: [number, number][] = [...quarter, [bf / 2, d / 2 - tf], [bf / 2, d / 2]];
  const topLeft = topRight.map(([x, y]): [number, number] => [-x, y]).reverse();
  const bottomLeft = topRight.map(([x, y]): [number, number] => [-x, -y]);
  const bottomRight = topRight.map(([x, y]): [number, number] => [x, -y]).reverse();
  return [...topRight, ...topLeft, ...bottomLeft, ...bottomRight];
}

/** Area and moments of inertia of a polygon about the origin, by the usual sums over its edges. */
function polygon(points: readonly [number, number][]): { area: number; inertiaX: number; inertiaY: number } {
  let [area, inertiaX, inertiaY] = [0, 0, 0];
  points.forEach(([x1, y1], index) => {
    const [x2, y2] = points[(index + 1) % points.length];
    const cross = x1 * y2 - x2 * y1;
    area += cross / 2;
    inertiaX += (cross * (y1 * y1 + y1 * y2 + y2 * y2)) / 12;
    inertiaY += (cross * (x1 * x1 + x1 * x2 + x2 * x2)) / 12;
  });
  return { area: Math.abs(area), inertiaX: Math.abs(inertiaX), inertiaY: Math.abs(inertiaY) };
}

describe("a corroded shape", () => {
  // Old stringers are judged by what is left of their plates: a property carried over from the table would hide the rust.
  const cases = ["W36X150", "W33X130", "W30X99", "W27X84", "W24X76", "W18X50", "W14X90"].flatMap((name) =>
    [
      { flangeLossIn: 0.0625, webLossIn: 0.03 },
      { flangeLossIn: 0.125, webLossIn: 0.125 },
      { flangeLossIn: 0, webLossIn: 0.1 },
    ].map((loss) => [name, loss] as const),
  );
  it.each(cases)("%s with %o agrees with polygon integration", (name, loss) => {
    const shape = CATALOGUE.find(({ designation }) => designation === name);
    if (shape === undefined) throw new Error(name);
    const left = reducedShape(shape, loss);
    if (left === null) throw new Error("nothing left");
    const d = shape.depthIn - 2 * loss.flangeLossIn;
    const tf = shape.flangeThicknessIn - loss.flangeLossIn;
    const tw = shape.webThicknessIn - loss.webLossIn;
    const r = shape.kDesignIn - shape.flangeThicknessIn;
    const { area, inertiaX, inertiaY } = polygon(outline(d, shape.flangeWidthIn, tf, tw, r));
    expect(left.areaIn2 / area).toBeCloseTo(1, 5);
    expect(left.inertiaXIn4 / inertiaX).toBeCloseTo(1, 5);
    expect(left.inertiaYIn4 / inertiaY).toBeCloseTo(1, 5);
    expect(left.sectionModulusXIn3 / (inertiaX / (d / 2))).toBeCloseTo(1, 5);
    expect(left.radiusYIn / Math.sqrt(inertiaY / area)).toBeCloseTo(1, 5);
    expect([left.depthIn, left.flangeThicknessIn, left.webThicknessIn, left.weightPlf]).toEqual([d, tf, tw, shape.weightPlf]);
  });

  it("with nothing left of a plate is no shape", () => {
    const [shape] = CATALOGUE;
    expect(reducedShape(shape, { flangeLossIn: shape.flangeThicknessIn, webLossIn: 0 })).toBeNull();
    expect(reducedShape(shape, { flangeLossIn: 0, webLossIn: shape.webThicknessIn + 0.1 })).toBeNull();
  });
});
