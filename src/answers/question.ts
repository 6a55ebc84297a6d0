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

/** Everything a question about stringers is asked of. */
export interface Question {
  readonly bridge: Bridge;
  readonly shapes: readonly Shape[];
  readonly vehicles: readonly Vehicle[];
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
): Question {
  return {
    bridge: resolveBridge(layers, { needs, vehicles }),
    shapes,
    vehicles,
    vary: (changes) => ask([...layers, changeLayer(changes)], needs, shapes, vehicles),
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
  /** Shapes of the list that a depth limit of the bridge leaves out. */
  readonly tooDeep: readonly Shape[];
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
  const { bridge, shapes, vehicles } = question;
  const tooDeep = shapes.filter((shape) => !shallowEnough(bridge, shape));
  const steels = gradeShapes(
    bridge,
    shapes.filter((shape) => shallowEnough(bridge, shape)),
  );
  const vehicle = vehicleNamed(vehicles, bridge.liveLoad.vehicle);
  const design: Design = { bridge, vehicle, vehicles, live: laneEffects(vehicle, bridge.spanFt) };
  const layouts = layoutsOf(bridge);
  refuseImpossible(bridge, layouts, steels);
  return { question, bridge, design, layouts, space: searchSpace(specificationOf(bridge), design, layouts.layouts, steels), tooDeep };
}

/** Whether a shape keeps within the bridge's greatest steel depth and structure depth. */
function shallowEnough({ steel, deck }: Bridge, shape: Shape): boolean {
  const structureIn = shape.depthIn + deck.haunchWeightIn + (deck.thicknessIn ?? 0);
  return (
    (steel.maxDepthIn === null || shape.depthIn <= steel.maxDepthIn) &&
    (steel.maxStructureDepthIn === null || structureIn <= steel.maxStructureDepthIn)
  );
}

function refuseImpossible(bridge: Bridge, { layouts }: Layouts, steels: readonly Steel[]): void {
  const { count, spacingFt } = bridge.stringers;
  const [layout] = layouts;
  if (count === null || spacingFt === null || layout === undefined || steels.length === 0) return;
  if (!steels.some((steel) => stands(layout, steel))) {
    throw new InputError([
      {
        field: "stringers.spacingFt",
        problem: `${count} stringers at ${spacingFt} ft on a deck ${bridge.deck.outToOutFt} ft wide leave an overhang of ${layout.overhangFt} ft, less than half a flange`,
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
