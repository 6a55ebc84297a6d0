import type { Layout } from "../../bridge/layouts.js";
import { requireFinite } from "../../errors.js";
import { greatestMoment } from "../../loads/axle-train.js";
import { type DeadLoad, deadLoadOf } from "../../loads/dead-load.js";
import { impactFraction } from "../../loads/formulas.js";
import { vehicleNamed } from "../../loads/vehicles.js";
import type { AssessmentRecorder, Design, Position } from "../contract.js";
import { curbInsideFt, mostTrucks } from "../place.js";
import { type DistributionPlace, exteriorFactors, interiorFactors, type StringerFactors } from "./distribution.js";
import { fatigueMoment } from "./fatigue.js";
import * as factors from "./load-factors.js";

/** The fatigue truck. Source: AASHTO Standard Specifications, 17th ed., Art. 10.3.1, 3.7.6. */
export const FATIGUE_VEHICLE = "HS20-44";

/** Everything about one stringer that its shape does not change. */
export interface StringerLoads {
  readonly position: Position;
  readonly dead: DeadLoad;
  readonly factors: StringerFactors;
  readonly live: LiveOnStringer;
  /** One lane loaded: Group IA. */
  readonly oneLane: LiveOnStringer;
  readonly fatigueMomentKipFt: number;
  readonly oneLaneFatigueMomentKipFt: number;
}

/** Live load with impact on one stringer. */
export interface LiveOnStringer {
  readonly momentKipFt: number;
  readonly shearKip: number;
  /** Load over the support, and the end shear of the rest, in the worst place for this stringer, kip. */
  readonly overSupportKip: number;
  readonly othersKip: number;
}

/** What a bridge and a layout fix for load factor design. */
export interface LfdLayout {
  readonly design: Design;
  readonly layout: Layout;
  readonly place: DistributionPlace;
  /** Impact on the design vehicle; 0 when its figures hold it already. */
  readonly impact: number;
  /** Impact on the fatigue truck. */
  readonly fatigueImpact: number;
  /** Absolute maximum moment of the fatigue truck, one lane, no impact. */
  readonly fatigueTruckKipFt: number;
}

/** Works out what a bridge and a layout fix. */
export function lfdLayout(design: Design, layout: Layout): LfdLayout {
  const { bridge, live } = design;
  const { lanes } = bridge.liveLoad;
  const fatigueImpact = impactFraction.of(bridge.spanFt);
  const fatigueTruck = vehicleNamed(design.vehicles, FATIGUE_VEHICLE).trains[0];
  requireFinite("fatigue truck", fatigueTruck);
  return {
    design,
    layout,
    place: {
      spacingFt: layout.spacingFt,
      count: layout.count,
      curbInsideFt: curbInsideFt(bridge, layout),
      lanes,
      mostTrucks: mostTrucks(bridge),
    },
    impact: live.includesImpact ? 0 : fatigueImpact,
    fatigueImpact,
    fatigueTruckKipFt: greatestMoment(fatigueTruck, bridge.spanFt, 0).momentKipFt,
  };
}

/**
 * Loads on one stringer.
 *
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.3, 3.8, 3.23.
 */
export function stringerLoads(fixed: LfdLayout, position: Position, recorder: AssessmentRecorder | null): StringerLoads {
  const { design, layout, place, impact, fatigueImpact, fatigueTruckKipFt } = fixed;
  const { bridge, live } = design;
  const { count, spacingFt, overhangFt } = layout;
  const tributaryFt = position === "interior" ? spacingFt : spacingFt / 2 + (overhangFt ?? 0);
  recorder?.topic("dead-load");
  recorder?.value("T", tributaryFt, "ft", "tributary width");
  const dead = deadLoadOf(bridge, { tributaryFt, spacingFt, count }, recorder);
  recorder?.topic("distribution");
  const share = (position === "interior" ? interiorFactors : exteriorFactors)(bridge, place, recorder);
  const g = share.moment.factor;
  const g1 = share.oneLaneMoment.factor;
  return {
    position,
    dead,
    factors: share,
    live: {
      momentKipFt: factors.liveMoment.of(live.momentKipFt, g, impact),
      ...worstEndShear(design, share.endShear.factor, g, impact),
    },
    oneLane: {
      momentKipFt: factors.liveMoment.of(live.momentKipFt, g1, impact),
      ...worstEndShear(design, share.oneLaneEndShear.factor, g1, impact),
    },
    fatigueMomentKipFt: fatigueMoment.of(fatigueTruckKipFt, g, fatigueImpact),
    oneLaneFatigueMomentKipFt: fatigueMoment.of(fatigueTruckKipFt, g1, fatigueImpact),
  };
}

/** The worst live end shear on a stringer over every place of every train with an axle at the support, and the lane loading. */
function worstEndShear(
  { live, bridge }: Design,
  supportFactor: number,
  otherFactor: number,
  impact: number,
): Omit<LiveOnStringer, "momentKipFt"> {
  let worst = { shearKip: 0, overSupportKip: 0, othersKip: 0 };
  const consider = (overSupportKip: number, othersKip: number): void => {
    const shearKip = factors.liveShear.of(overSupportKip, supportFactor, othersKip, otherFactor, impact);
    if (shearKip > worst.shearKip) worst = { shearKip, overSupportKip, othersKip };
  };
  for (const place of live.endPlaces) consider(place.axleOverSupportKip, place.othersKip);
  if (live.lane !== null && !live.includesImpact) consider(live.lane.shearKip, (live.lane.uniformKlf * bridge.spanFt) / 2);
  return worst;
}
