import type { Bridge } from "../bridge/bridge.js";
import type { Layer } from "../bridge/layers.js";
import { type Layouts, layoutsOf } from "../bridge/layouts.js";
import { type ResolveOptions, resolveBridge } from "../bridge/resolve.js";
import { gradeShapes, type Steel } from "../bridge/yield-stress.js";
import type { Shape } from "../catalogue/shape.js";
import { InputError } from "../errors.js";
import { laneEffects } from "../loads/live-load.js";
import { type Vehicle, vehicleNamed } from "../loads/vehicles.js";
import { type SearchSpace, searchSpace, stands } from "../search/search.js";
import type { Design } from "../specs/contract.js";
import { specificationOf } from "../specs/specification.js";
import { type LeftOut, stockLimit, withLosses, withoutLimits } from "./stock.js";

/** Everything a question about stringers is asked of. */
export interface Question {
  readonly bridge: Bridge;
  readonly shapes: readonly Shape[];
  readonly vehicles: readonly Vehicle[];
  /** Whether the stock of a list limits what is offered, or is left aside, as when one shape is checked. */
  readonly stock: "limits" | "aside";
  /**
   * The same question with keys of the bridge file changed, as if flags had said so.
   *
   * @param changes values by dotted key
   * @throws {InputError} if the changed bridge cannot be
   */
  readonly vary: (changes: Readonly<Record<string, unknown>>) => Question;
}

/**
 * Asks a question of layers of input.
 *
 * @param layers weakest first: practice, bridge file, flags
 * @throws {InputError} naming every fault of the layers
 */
export function ask(
  layers: readonly Layer[],
  needs: ResolveOptions["needs"],
  shapes: readonly Shape[],
  vehicles: readonly Vehicle[],
  stock: Question["stock"] = "limits",
): Question {
  return {
    bridge: resolveBridge(layers, { needs, vehicles }),
    shapes,
    vehicles,
    stock,
    vary: (changes) => ask([...layers, changeLayer(changes)], needs, shapes, vehicles, stock),
  };
}

function changeLayer(changes: Readonly<Record<string, unknown>>): Layer {
  return { source: "flag", values: new Map(Object.entries(changes)), place: (key) => ({ field: key }), issues: [] };
}

/** A question with its layouts and shapes ready to be searched. */
export interface Prepared {
  readonly question: Question;
  readonly bridge: Bridge;
  readonly design: Design;
  readonly layouts: Layouts;
  readonly space: SearchSpace;
  /** Shapes of the list that are not offered, and why. */
  readonly leftOut: readonly LeftOut[];
}

/** How much was looked at. */
export interface Examined {
  readonly layouts: number;
  readonly shapes: number;
  readonly candidates: number;
}

/**
 * Prepares a question.
 *
 * @throws {InputError} for a shape without a yield stress, and for one explicit layout under which no shape can stand
 */
export function prepare(question: Question): Prepared {
  const { bridge, vehicles } = question;
  const vehicle = vehicleNamed(vehicles, bridge.liveLoad.vehicle);
  const design: Design = { bridge, vehicle, vehicles, live: laneEffects(vehicle, bridge.spanFt) };
  const layouts = layoutsOf(bridge);
  const { steels, leftOut } = offered(question, layouts);
  refuseImpossible(bridge, layouts, steels);
  const space = searchSpace(specificationOf(bridge), design, layouts.layouts, steels);
  return { question, bridge, design, layouts, space, leftOut };
}

/** Shapes that bridge and stock let stand, with their yield stress and their losses taken off. */
function offered({ bridge, shapes, stock }: Question, { layouts }: Layouts): { steels: readonly Steel[]; leftOut: readonly LeftOut[] } {
  const counts = layouts.flatMap(({ count }) => (count === null ? [] : [count]));
  const fewest = counts.length === 0 ? null : Math.min(...counts);
  const leftOut: LeftOut[] = [];
  const listed = stock === "limits" ? shapes : shapes.map(withoutLimits);
  const kept = listed.filter((shape) => {
    const reason = tooDeep(bridge, shape) ?? stockLimit(bridge, shape, fewest);
    if (reason !== null) leftOut.push(reason);
    return reason === null;
  });
  const steels = gradeShapes(bridge, kept).flatMap((steel) => {
    const left = withLosses(steel);
    if (left !== null) return [left];
    leftOut.push({ shape: steel.shape.designation, line: steel.shape.source.line, code: "nothing-left", needed: 0, there: 0 });
    return [];
  });
  return { steels, leftOut };
}

/** A shape beyond the bridge's greatest steel depth or structure depth, with the depth it may have; null within them. */
function tooDeep({ steel, deck }: Bridge, shape: Shape): LeftOut | null {
  const structure = (steel.maxStructureDepthIn ?? Number.POSITIVE_INFINITY) - deck.haunchWeightIn - (deck.thicknessIn ?? 0);
  const there = Math.min(steel.maxDepthIn ?? Number.POSITIVE_INFINITY, structure);
  if (shape.depthIn <= there) return null;
  return { shape: shape.designation, line: shape.source.line, code: "too-deep", needed: shape.depthIn, there };
}

function refuseImpossible(bridge: Bridge, { layouts }: Layouts, steels: readonly Steel[]): void {
  const { count, spacingFt } = bridge.stringers;
  const [layout] = layouts;
  if (count === null || spacingFt === null || layout === undefined || steels.length === 0) return;
  if (!steels.some((steel) => stands(layout, steel))) {
    throw new InputError([
      {
        field: "stringers.spacingFt",
        problem: `${count} stringers at ${spacingFt} ft on a deck ${bridge.deck.outToOutFt} ft wide leave an overhang of ${layout.overhangFt} ft: less than half a flange, or flanges overlap`,
        allowed: "fewer stringers, a smaller spacing or a wider deck",
      },
    ]);
  }
}

/**
 * Refuses to choose among two-stringer bridges where the specification only lets them be checked.
 *
 * @throws {InputError} for lrfd and a count of two
 */
export function refuseTwoStringers({ bridge, layouts }: Prepared): void {
  if (bridge.specification !== "lrfd" || !layouts.layouts.some(({ count }) => count === 2)) return;
  throw new InputError([
    {
      field: "stringers.count",
      problem: "two stringers are a nonredundant load path, which lrfd here checks but does not choose",
      allowed: "three stringers or more, or the command check",
    },
  ]);
}

/** Counts layouts, shapes and candidates of a prepared question. */
export function examined({ space }: Prepared): Examined {
  const [layouts, shapes] = [space.assessors.length, space.steels.length];
  return { layouts, shapes, candidates: layouts * shapes };
}
