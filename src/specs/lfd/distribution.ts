import type { Bridge, DeckKind } from "../../bridge/bridge.js";
import { formula, type Recorder } from "../../formula.js";
import { type LeverArrangement, leverExteriorFormula, leverInteriorFormula, leverRuleExterior, leverRuleInterior } from "../lever-rule.js";

/** A row of the table of wheel lines per stringer: S over a divisor, up to a spacing beyond which the lever rule serves. */
export interface DistributionRow {
  readonly kind: DeckKind;
  /** Deck thickness or depth from which the row holds, in; inclusive. */
  readonly fromIn: number;
  /** Thickness below which it holds, in. */
  readonly belowIn: number;
  readonly oneLane: { readonly divisor: number; readonly toFt: number };
  readonly moreLanes: { readonly divisor: number; readonly toFt: number };
}

const ANY = Number.POSITIVE_INFINITY;

/**
 * Wheel lines per stringer for moment. Half axles.
 *
 * Source: AASHTO Standard Specifications, 17th ed., Table 3.23.1 (values from memory).
 */
export const DISTRIBUTION_TABLE: readonly DistributionRow[] = [
  { kind: "concrete", fromIn: 0, belowIn: ANY, oneLane: { divisor: 7.0, toFt: 10 }, moreLanes: { divisor: 5.5, toFt: 14 } },
  { kind: "timber-plank", fromIn: 0, belowIn: ANY, oneLane: { divisor: 4.0, toFt: ANY }, moreLanes: { divisor: 3.75, toFt: ANY } },
  { kind: "nail-laminated", fromIn: 4, belowIn: 6, oneLane: { divisor: 4.5, toFt: ANY }, moreLanes: { divisor: 4.0, toFt: ANY } },
  { kind: "nail-laminated", fromIn: 6, belowIn: ANY, oneLane: { divisor: 5.0, toFt: 5 }, moreLanes: { divisor: 4.25, toFt: 6.5 } },
  { kind: "glulam", fromIn: 4, belowIn: 6, oneLane: { divisor: 4.5, toFt: ANY }, moreLanes: { divisor: 4.0, toFt: ANY } },
  { kind: "glulam", fromIn: 6, belowIn: ANY, oneLane: { divisor: 5.25, toFt: 5.5 }, moreLanes: { divisor: 4.5, toFt: 7 } },
  { kind: "steel-grid", fromIn: 0, belowIn: 4, oneLane: { divisor: 4.5, toFt: ANY }, moreLanes: { divisor: 4.0, toFt: ANY } },
  { kind: "steel-grid", fromIn: 4, belowIn: ANY, oneLane: { divisor: 6.0, toFt: 6 }, moreLanes: { divisor: 5.0, toFt: 10.5 } },
  { kind: "corrugated-steel", fromIn: 2, belowIn: ANY, oneLane: { divisor: 5.5, toFt: ANY }, moreLanes: { divisor: 4.5, toFt: ANY } },
];

/** The row of a deck, or null when it is thinner than any row of its kind. Source: as the table. */
export function distributionRow(kind: DeckKind, thicknessIn: number): DistributionRow | null {
  return DISTRIBUTION_TABLE.find((row) => row.kind === kind && thicknessIn >= row.fromIn && thicknessIn < row.belowIn) ?? null;
}

/**
 * Reduction of the live load for improbable coincidence of loaded lanes.
 *
 * @param lanes loaded lanes, 1 or more
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.12.1.
 */
export function laneReduction(lanes: number): number {
  return lanes <= 2 ? 1 : lanes === 3 ? 0.9 : 0.75;
}

/** The lever rule of an interior stringer with the reductions of 3.12, wheel lines. Source: AASHTO Standard Specifications, 17th ed., Table 3.23.1 note f, Art. 3.12.1. */
export const leverInterior = (spacingFt: number, mostTrucks: number): LeverArrangement =>
  leverRuleInterior(spacingFt, mostTrucks, laneReduction);
/** The same of the exterior stringer. Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.2.3.1.2, 3.12.1. */
export const leverExterior = (spacingFt: number, curbInsideFt: number, mostTrucks: number): LeverArrangement =>
  leverRuleExterior(spacingFt, curbInsideFt, mostTrucks, laneReduction);

/** S over the table's divisor. Source: AASHTO Standard Specifications, 17th ed., Table 3.23.1. */
export const spacingOverDivisor = formula("g", "S / kd", "wheel lines", "Table 3.23.1", ["S", "kd"], (S: number, kd: number) => S / kd);
/** Floor for the exterior stringer under concrete, S <= 6 ft. Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.2.3.1.5. */
export const exteriorFloorNarrow = formula("gmin", "S / 5.5", "wheel lines", "3.23.2.3.1.5", ["S"], (S: number) => S / 5.5);
/** The same, 6 < S <= 14 ft. Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.2.3.1.5. */
export const exteriorFloorWide = formula(
  "gmin",
  "S / (4.0 + 0.25 * S)",
  "wheel lines",
  "3.23.2.3.1.5",
  ["S"],
  (S: number) => S / (4 + 0.25 * S),
);

const EXTERIOR_FLOOR = { narrowToFt: 6, toFt: 14, fromStringers: 4 } as const;

/** Wheel lines per stringer and the rule they come from. */
export interface Factor {
  readonly factor: number;
  /** "table", "lever rule", "floor 3.23.2.3.1.5" or "given". */
  readonly rule: string;
}

/** The distribution factors of one stringer, wheel lines. */
export interface StringerFactors {
  /** All lanes, for moment. */
  readonly moment: Factor;
  /** One lane loaded, for moment: fatigue and Group IA. No floor. */
  readonly oneLaneMoment: Factor;
  /** The axle over the support, all lanes and one lane. */
  readonly endShear: Factor;
  readonly oneLaneEndShear: Factor;
}

/** What the factors of a layout hang on. */
export interface DistributionPlace {
  readonly spacingFt: number;
  /** Stringers across; null for one interior stringer of unknown neighbours. */
  readonly count: number | null;
  /** de of the exterior stringer, ft; null with the count. */
  readonly curbInsideFt: number | null;
  readonly lanes: number;
  /** Trucks side by side at most; as many as lanes, or 4 when nobody said how wide the bridge is. */
  readonly mostTrucks: number;
}

/**
 * Distribution factors of an interior stringer.
 *
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO Standard Specifications, 17th ed., Table 3.23.1, Art. 3.23.1, 3.23.2.2.
 */
export function interiorFactors(bridge: Bridge, place: DistributionPlace, recorder: Recorder | null): StringerFactors {
  const given = givenFactors(bridge);
  if (given !== null) return given;
  const row = distributionRow(bridge.deck.kind, bridge.deck.thicknessIn ?? 0);
  if (row === null) throw new RangeError("a deck outside the distribution table was let through");
  const { spacingFt: S, lanes, mostTrucks } = place;
  const lever = (trucks: number, symbol: string): Factor => {
    const arrangement = leverInterior(S, trucks);
    recorder?.step(
      leverInteriorFormula(symbol, { article: "3.23.1.2", per: "wheel line" }, arrangement),
      arrangement.factor,
      arrangement.reduction,
      S,
      ...arrangement.distancesFt,
    );
    return { factor: arrangement.factor, rule: "lever rule" };
  };
  const column = ({ divisor, toFt }: DistributionRow["oneLane"], trucks: number, symbol: string): Factor => {
    if (S > toFt) return lever(trucks, symbol);
    const factor = spacingOverDivisor.of(S, divisor);
    recorder?.step({ ...spacingOverDivisor, symbol }, factor, S, divisor);
    return { factor, rule: `S/${divisor.toFixed(2).replace(/0$/, "")}` };
  };
  return {
    moment: lanes >= 2 ? column(row.moreLanes, mostTrucks, "g") : column(row.oneLane, 1, "g"),
    oneLaneMoment: column(row.oneLane, 1, "g1"),
    endShear: lever(mostTrucks, "gv"),
    oneLaneEndShear: lever(1, "gv1"),
  };
}

/**
 * Distribution factors of the exterior stringer: the lever rule; under concrete on four stringers or more not below the floor.
 *
 * @param recorder writes the steps down; null in the search
 * @throws {RangeError} if the layout has no exterior stringer
 * Source: AASHTO Standard Specifications, 17th ed., Art. 3.23.1.2, 3.23.2.3.1.
 */
export function exteriorFactors(bridge: Bridge, place: DistributionPlace, recorder: Recorder | null): StringerFactors {
  const given = givenFactors(bridge);
  if (given !== null) return given;
  const { spacingFt: S, curbInsideFt: de, count, mostTrucks } = place;
  if (de === null || count === null) throw new RangeError("an exterior stringer needs a width");
  const lever = (trucks: number, symbol: string): Factor => {
    const arrangement = leverExterior(S, de, trucks);
    recorder?.step(
      leverExteriorFormula(symbol, { article: "3.23.2.3.1.2", per: "wheel line" }, arrangement),
      arrangement.factor,
      arrangement.reduction,
      S,
      de,
      ...arrangement.distancesFt,
    );
    return { factor: arrangement.factor, rule: "lever rule" };
  };
  const all = lever(mostTrucks, "glever");
  const one = lever(1, "g1");
  const floor = exteriorFloor(bridge, S, count, recorder);
  const moment = floor !== null && floor > all.factor ? { factor: floor, rule: "floor of 3.23.2.3.1.5" } : all;
  recorder?.value("g", moment.factor, "wheel lines", moment.rule);
  recorder?.value("gv", all.factor, "wheel lines", "lever rule, axle over the support");
  recorder?.value("gv1", one.factor, "wheel lines", "lever rule, one truck");
  return { moment, oneLaneMoment: one, endShear: all, oneLaneEndShear: one };
}

function exteriorFloor(bridge: Bridge, S: number, count: number, recorder: Recorder | null): number | null {
  if (bridge.deck.kind !== "concrete" || count < EXTERIOR_FLOOR.fromStringers || S > EXTERIOR_FLOOR.toFt) return null;
  const rule = S <= EXTERIOR_FLOOR.narrowToFt ? exteriorFloorNarrow : exteriorFloorWide;
  const floor = rule.of(S);
  recorder?.step(rule, floor, S);
  return floor;
}

function givenFactors(bridge: Bridge): StringerFactors | null {
  const factor = bridge.liveLoad.distribution;
  if (factor === null) return null;
  const given = { factor, rule: "given" };
  return { moment: given, oneLaneMoment: given, endShear: given, oneLaneEndShear: given };
}
