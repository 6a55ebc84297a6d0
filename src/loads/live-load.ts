import { requirePositive } from "../errors.js";
import {
  type AxleTrain,
  type EndPlace,
  endPlaces,
  type GreatestMoment,
  greatestDeflectionAt,
  greatestMoment,
  greatestMomentAt,
  greatestShearAt,
  scaled,
} from "./axle-train.js";
import { laneMoment } from "./formulas.js";
import type { LaneLoading, Vehicle } from "./vehicles.js";

/** Effects at one section of the span, one lane. */
export interface SectionEffects {
  readonly xFt: number;
  readonly momentKipFt: number;
  readonly shearKip: number;
  /** EI times the greatest deflection there, kip-ft3. */
  readonly deflectionKipFt3: number;
}

/** Greatest effects of one lane of a vehicle on a simple span. */
export interface LaneEffects {
  readonly vehicle: string;
  readonly spanFt: number;
  /** Whether the dynamic allowance is in the figures already. */
  readonly includesImpact: boolean;
  /** Name of the train, or "lane". */
  readonly momentGoverning: string;
  readonly momentKipFt: number;
  readonly momentAtFt: number;
  /** How the governing train's moment comes about; null when the lane loading governs. */
  readonly momentOfTrain: GreatestMoment | null;
  readonly shearGoverning: string;
  readonly shearKip: number;
  readonly deflectionGoverning: string;
  /** EI times the greatest midspan deflection, kip-ft3. */
  readonly midspanDeflectionKipFt3: number;
  /** Every place with an axle over the support, of every train. */
  readonly endPlaces: readonly EndPlace[];
  readonly lane: LaneLoading | null;
}

interface Named<T> {
  readonly name: string;
  readonly value: T;
}

/**
 * Greatest moment, end shear and midspan deflection of one lane.
 *
 * Without a dynamic allowance: the greater of each train and the lane loading, no impact. With one: the greatest train with the
 * allowance plus the uniform lane load, both at one section; for deflection the greater of the train alone and a quarter of it plus
 * the lane load.
 *
 * @param spanFt bearing to bearing, ft
 * @throws {RangeError} if spanFt is not finite or not positive
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.7 and 3.11; LRFD 9th ed., Art. 3.6.1.2, 3.6.1.3; statics.
 */
export function laneEffects(vehicle: Vehicle, spanFt: number): LaneEffects {
  const { lane } = vehicle;
  const together = vehicle.dynamicAllowance !== null;
  const trains = factoredTrains(vehicle);
  const withLane = together && lane !== null ? lane.uniformKlf : 0;
  const moments = trains.map((train) => ({ name: train.name, value: greatestMoment(train, spanFt, withLane) }));
  const moment = moments.reduce((best, next) => (next.value.momentKipFt > best.value.momentKipFt ? next : best));
  const midspan = sectionEffectsByName(vehicle, spanFt, spanFt / 2);
  const ends = sectionEffectsByName(vehicle, spanFt, 0);
  const laneAlone = lane !== null && !together ? laneMoment.of(lane.uniformKlf, spanFt, lane.momentKip) : 0;
  const laneGoverns = laneAlone > moment.value.momentKipFt;
  return {
    vehicle: vehicle.name,
    spanFt,
    includesImpact: together,
    momentGoverning: laneGoverns ? "lane" : moment.name,
    momentKipFt: laneGoverns ? laneAlone : moment.value.momentKipFt,
    momentAtFt: laneGoverns ? spanFt / 2 : moment.value.atFt,
    momentOfTrain: laneGoverns ? null : moment.value,
    shearGoverning: ends.shear.name,
    shearKip: ends.shear.value,
    deflectionGoverning: midspan.deflection.name,
    midspanDeflectionKipFt3: midspan.deflection.value,
    endPlaces: trains.flatMap((train) => endPlaces(train, spanFt)),
    lane,
  };
}

/**
 * Greatest effects at the tenth points of a simple span, one lane; each at the load's worst place for that effect and section.
 *
 * Source: as `laneEffects`.
 */
export function tenthPoints(vehicle: Vehicle, spanFt: number): readonly SectionEffects[] {
  requirePositive("spanFt", spanFt);
  return Array.from({ length: 11 }, (_, tenth) => {
    const xFt = (spanFt * tenth) / 10;
    const effects = sectionEffectsByName(vehicle, spanFt, xFt);
    return {
      xFt,
      momentKipFt: effects.moment.value,
      shearKip: effects.shear.value,
      deflectionKipFt3: effects.deflection.value,
    };
  });
}

const factoredTrains = (vehicle: Vehicle): readonly AxleTrain[] =>
  vehicle.trains.map((train) => scaled(train, 1 + (vehicle.dynamicAllowance ?? 0)));

interface NamedEffects {
  readonly moment: Named<number>;
  readonly shear: Named<number>;
  readonly deflection: Named<number>;
}

function sectionEffectsByName(vehicle: Vehicle, L: number, x: number): NamedEffects {
  const { lane } = vehicle;
  const together = vehicle.dynamicAllowance !== null;
  const farther = Math.max(x, L - x);
  const uniform = lane?.uniformKlf ?? 0;
  const ofUniform = {
    moment: (uniform * x * (L - x)) / 2,
    shear: (uniform * farther * farther) / (2 * L),
    deflection: (uniform * x * (L * L * L - 2 * L * x * x + x * x * x)) / 24,
  };
  const added = together ? ofUniform : { moment: 0, shear: 0, deflection: 0 };
  const candidates = factoredTrains(vehicle).map((train) => {
    const deflection = train.deflection === false ? 0 : greatestDeflectionAt(train, L, x);
    return {
      name: train.name,
      moment: greatestMomentAt(train, L, x) + added.moment,
      shear: greatestShearAt(train, L, x) + added.shear,
      deflection: together && train.deflection !== false ? Math.max(deflection, 0.25 * deflection + added.deflection) : deflection,
    };
  });
  if (lane !== null && !together) {
    const concentrated = (kip: number): AxleTrain => ({ name: "lane", axlesKip: [kip], spacingsFt: [] });
    candidates.push({
      name: "lane",
      moment: ofUniform.moment + greatestMomentAt(concentrated(lane.momentKip), L, x),
      shear: ofUniform.shear + greatestShearAt(concentrated(lane.shearKip), L, x),
      deflection: ofUniform.deflection + greatestDeflectionAt(concentrated(lane.momentKip), L, x),
    });
  }
  const greatest = (effect: "moment" | "shear" | "deflection"): Named<number> =>
    candidates.map((one) => ({ name: one.name, value: one[effect] })).reduce((best, next) => (next.value > best.value ? next : best));
  return { moment: greatest("moment"), shear: greatest("shear"), deflection: greatest("deflection") };
}
