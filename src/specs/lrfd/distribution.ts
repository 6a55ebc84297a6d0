import type { Bridge, DeckKind } from "../../bridge/bridge.js";
import type { ShapeFigures } from "../../catalogue/shape.js";
import { formula, type Recorder } from "../../formula.js";
import { type LeverStyle, leverExteriorFormula, leverInteriorFormula, leverRuleExterior, leverRuleInterior } from "../lever-rule.js";

/**
 * Multiple presence factor.
 *
 * @param lanes loaded lanes, 1 or more
 * Source: AASHTO LRFD Bridge Design Specifications, 9th ed., Table 3.6.1.1.2-1.
 */
export function multiplePresence(lanes: number): number {
  return lanes === 1 ? 1.2 : lanes === 2 ? 1 : lanes === 3 ? 0.85 : 0.65;
}
const ONE_LANE_PRESENCE = 1.2;
/** Fatigue carries no multiple presence. Source: AASHTO LRFD, 9th ed., Art. 3.6.1.1.2. */
const NO_PRESENCE = (): number => 1;

/** Longitudinal stiffness parameter; eg to the middle of the structural slab. Source: AASHTO LRFD, 9th ed., Art. 4.6.2.2.1. */
export const stiffness = formula(
  "Kg",
  "n * (Ix + A * (d / 2 + th + ts / 2)^2)",
  "in4",
  "4.6.2.2.1",
  ["n", "Ix", "A", "d", "th", "ts"],
  (n: number, Ix: number, A: number, d: number, th: number, ts: number) => n * (Ix + A * (d / 2 + th + ts / 2) ** 2),
);
/** Stiffness term of the moment formulas. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2b-1. */
export const stiffnessTerm = formula(
  "k",
  "(Kg / (12 * L * ts^3))^0.1",
  "-",
  "4.6.2.2.2b",
  ["Kg", "L", "ts"],
  (Kg: number, L: number, ts: number) => (Kg / (12 * L * ts ** 3)) ** 0.1,
);
/** What spacing and span make of the moment formulas, one lane and more. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2b-1. */
export const spacingTermOne = formula(
  "a1",
  "(S / 14)^0.4 * (S / L)^0.3",
  "-",
  "4.6.2.2.2b",
  ["S", "L"],
  (S: number, L: number) => (S / 14) ** 0.4 * (S / L) ** 0.3,
);
export const spacingTermMore = formula(
  "a2",
  "(S / 9.5)^0.6 * (S / L)^0.2",
  "-",
  "4.6.2.2.2b",
  ["S", "L"],
  (S: number, L: number) => (S / 9.5) ** 0.6 * (S / L) ** 0.2,
);
/** Moment, interior, one lane. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2b-1. */
export const momentOneLane = formula("gm1", "0.06 + a1 * k", "lanes", "4.6.2.2.2b", ["a1", "k"], (a1: number, k: number) => 0.06 + a1 * k);
/** Moment, interior, two or more lanes. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2b-1. */
export const momentMoreLanes = formula(
  "gm2",
  "0.075 + a2 * k",
  "lanes",
  "4.6.2.2.2b",
  ["a2", "k"],
  (a2: number, k: number) => 0.075 + a2 * k,
);
/** Shear, interior. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.3a-1. */
export const shearOneLane = formula("gv1", "0.36 + S / 25", "lanes", "4.6.2.2.3a", ["S"], (S: number) => 0.36 + S / 25);
export const shearMoreLanes = formula(
  "gv2",
  "0.2 + S / 12 - (S / 35)^2",
  "lanes",
  "4.6.2.2.3a",
  ["S"],
  (S: number) => 0.2 + S / 12 - (S / 35) ** 2,
);
/** Exterior over interior, two or more lanes. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2d-1; shear Table 4.6.2.2.3b-1 (from memory). */
export const exteriorMoment = formula(
  "ge",
  "(0.77 + de / 9.1) * gm2",
  "lanes",
  "4.6.2.2.2d",
  ["de", "gm2"],
  (de: number, gm2: number) => (0.77 + de / 9.1) * gm2,
);
export const exteriorShear = formula(
  "gve",
  "(0.60 + de / 10) * gv2",
  "lanes",
  "4.6.2.2.3b",
  ["de", "gv2"],
  (de: number, gv2: number) => (0.6 + de / 10) * gv2,
);
/** The cross-section as a rigid body. Source: AASHTO LRFD, 9th ed., Art. C4.6.2.2.2d. */
export const rigidSection = formula(
  "gr",
  "m * (Nt / Nb + X * sume / sumx2)",
  "lanes",
  "C4.6.2.2.2d",
  ["m", "Nt", "Nb", "X", "sume", "sumx2"],
  (m: number, Nt: number, Nb: number, X: number, sume: number, sumx2: number) => m * (Nt / Nb + (X * sume) / sumx2),
);
/** Spacing over the table's divisor, decks other than concrete. Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2a-1. */
export const spacingOverDivisor = formula("g", "S / kd", "lanes", "4.6.2.2.2a", ["S", "kd"], (S: number, kd: number) => S / kd);

/** Within these the concrete deck's formulas hold. Source: AASHTO LRFD, 9th ed., Tables 4.6.2.2.2b-1, 4.6.2.2.2d-1. */
export const RANGES = {
  spacingFt: [3.5, 16],
  spanFt: [20, 240],
  slabIn: [4.5, 12],
  stiffnessIn4: [1e4, 7e6],
  curbInsideFt: [-1, 5.5],
} as const;
const within = (value: number, [from, to]: readonly [number, number]): boolean => value >= from && value <= to;

/** Lanes per stringer of decks other than concrete: S over a divisor, up to a spacing. */
interface OtherDeckRow {
  readonly kind: DeckKind;
  readonly fromIn: number;
  readonly belowIn: number;
  readonly oneLane: { readonly divisor: number; readonly toFt: number };
  readonly moreLanes: { readonly divisor: number; readonly toFt: number };
  /** Whether shear goes by the same factor; else by the lever rule. */
  readonly shearAlike: boolean;
}
const ANY = Number.POSITIVE_INFINITY;
/** Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2a-1, Art. 4.6.2.2.3a (values from memory). */
export const OTHER_DECKS: readonly OtherDeckRow[] = [
  {
    kind: "timber-plank",
    fromIn: 0,
    belowIn: ANY,
    oneLane: { divisor: 6.7, toFt: 5 },
    moreLanes: { divisor: 7.5, toFt: 5 },
    shearAlike: true,
  },
  {
    kind: "nail-laminated",
    fromIn: 0,
    belowIn: ANY,
    oneLane: { divisor: 8.3, toFt: 6 },
    moreLanes: { divisor: 8.5, toFt: 6 },
    shearAlike: true,
  },
  { kind: "glulam", fromIn: 0, belowIn: ANY, oneLane: { divisor: 8.8, toFt: 6 }, moreLanes: { divisor: 9.0, toFt: 6 }, shearAlike: true },
  {
    kind: "steel-grid",
    fromIn: 0,
    belowIn: 4,
    oneLane: { divisor: 7.5, toFt: 6 },
    moreLanes: { divisor: 8.0, toFt: 10.5 },
    shearAlike: false,
  },
  {
    kind: "steel-grid",
    fromIn: 4,
    belowIn: ANY,
    oneLane: { divisor: 10, toFt: 6 },
    moreLanes: { divisor: 10, toFt: 10.5 },
    shearAlike: false,
  },
];

/** Lanes per stringer, and the rule that governs each. One object is used again and again. */
export interface LrfdFactors {
  moment: number;
  shear: number;
  /** One truck, no multiple presence. */
  fatigue: number;
  momentRule: string;
  shearRule: string;
}

/** A fresh set to be filled. */
export const newLrfdFactors = (): LrfdFactors => ({ moment: 0, shear: 0, fatigue: 0, momentRule: "", shearRule: "" });

/** What the factors of one stringer hang on, its shape left out. */
export interface LrfdPlace {
  readonly position: "interior" | "exterior";
  readonly spacingFt: number;
  readonly spanFt: number;
  /** Structural slab, in; null without a concrete one. */
  readonly slabIn: number | null;
  readonly haunchIn: number;
  /** Null for one interior stringer of unknown neighbours. */
  readonly count: number | null;
  readonly curbInsideFt: number | null;
  readonly roadwayFt: number | null;
  readonly lanes: number;
  readonly mostTrucks: number;
}

/** The factors of one stringer worked out as far as the shape does not matter. */
export interface LrfdShare {
  readonly place: LrfdPlace;
  readonly given: number | null;
  /** Lever rule, all numbers of trucks with their presence; one truck with 1.20; one truck alone. In lanes. */
  readonly lever: number;
  readonly leverOne: number;
  readonly leverFatigue: number;
  /** Rigid section: the worst of 1 to NL trucks with presence, and one truck alone; 0 for interior stringers. */
  readonly rigid: number;
  readonly rigidOne: number;
  /** Whether the concrete formulas hold as far as the shape does not matter; of the exterior stringer, de too. */
  readonly inRange: boolean;
  /** What spacing and span make of the moment formulas. */
  readonly termOne: number;
  readonly termMore: number;
  readonly other: { readonly moment: number; readonly shear: number; readonly fatigue: number; readonly rule: string } | null;
}

const FEW_STRINGERS = 3;
const style: LeverStyle = { article: "C4.6.2.2.1", per: "lane" };

/**
 * Works out what of a stringer's factors does not hang on its shape.
 *
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO LRFD, 9th ed., Art. 4.6.2.2.
 */
export function lrfdShare(bridge: Bridge, place: LrfdPlace, recorder: Recorder | null): LrfdShare {
  const lever = leverLanes(place, place.mostTrucks, multiplePresence, "gl", recorder);
  const leverOne = leverLanes(place, 1, multiplePresence, "gl1", recorder);
  const leverFatigue = leverLanes(place, 1, NO_PRESENCE, "glf", recorder);
  const rigid = rigidLanes(place, recorder);
  const termOne = spacingTermOne.of(place.spacingFt, place.spanFt);
  const termMore = spacingTermMore.of(place.spacingFt, place.spanFt);
  if (bridge.deck.kind === "concrete") {
    recorder?.step(spacingTermOne, termOne, place.spacingFt, place.spanFt);
    recorder?.step(spacingTermMore, termMore, place.spacingFt, place.spanFt);
  }
  return {
    termOne,
    termMore,
    place,
    given: bridge.liveLoad.distribution,
    lever,
    leverOne,
    leverFatigue,
    rigid: rigid.worst,
    rigidOne: rigid.oneTruck,
    inRange: formulasHold(place),
    other: bridge.deck.kind === "concrete" ? null : otherDeck(bridge, place, { lever, leverOne, leverFatigue }, recorder),
  };
}

function formulasHold({ spacingFt, spanFt, slabIn, count, position, curbInsideFt }: LrfdPlace): boolean {
  return (
    within(spacingFt, RANGES.spacingFt) &&
    within(spanFt, RANGES.spanFt) &&
    slabIn !== null &&
    within(slabIn, RANGES.slabIn) &&
    (count === null || count >= FEW_STRINGERS) &&
    (position === "interior" || (curbInsideFt !== null && within(curbInsideFt, RANGES.curbInsideFt)))
  );
}

function leverLanes(
  place: LrfdPlace,
  trucks: number,
  presence: (lanes: number) => number,
  symbol: string,
  recorder: Recorder | null,
): number {
  const { spacingFt: S, curbInsideFt: de, position } = place;
  if (position === "interior") {
    const arrangement = leverRuleInterior(S, trucks, presence);
    recorder?.step(
      leverInteriorFormula(symbol, style, arrangement),
      arrangement.factor / 2,
      arrangement.reduction,
      S,
      ...arrangement.distancesFt,
    );
    return arrangement.factor / 2;
  }
  if (de === null) throw new RangeError("an exterior stringer needs a width");
  const arrangement = leverRuleExterior(S, de, trucks, presence);
  recorder?.step(
    leverExteriorFormula(symbol, style, arrangement),
    arrangement.factor / 2,
    arrangement.reduction,
    S,
    de,
    ...arrangement.distancesFt,
  );
  return arrangement.factor / 2;
}

/** Centre of the truck nearest the curb, ft: 2 ft to the wheel and half a gauge. Source: AASHTO LRFD, 9th ed., Art. 3.6.1.3.1. */
const TRUCK_CENTRE_FROM_CURB_FT = 5;
const LANE_FT = 12;

function rigidLanes(place: LrfdPlace, recorder: Recorder | null): { worst: number; oneTruck: number } {
  const { position, count: Nb, spacingFt: S, curbInsideFt: de, roadwayFt, lanes } = place;
  if (position === "interior" || Nb === null || de === null || roadwayFt === null) return { worst: 0, oneTruck: 0 };
  const X = ((Nb - 1) * S) / 2;
  let sumx2 = 0;
  for (let stringer = 0; stringer < Nb; stringer++) sumx2 += (X - stringer * S) ** 2;
  const lane = roadwayFt >= 20 && roadwayFt < 24 ? roadwayFt / 2 : LANE_FT;
  let sume = 0;
  let worst = { factor: 0, m: 1, N: 1, sume: 0 };
  let oneTruck = 0;
  for (let N = 1; N <= lanes; N++) {
    sume += X + de - (TRUCK_CENTRE_FROM_CURB_FT + (N - 1) * lane);
    const m = multiplePresence(N);
    const factor = rigidSection.of(m, N, Nb, X, sume, sumx2);
    if (N === 1) oneTruck = rigidSection.of(1, 1, Nb, X, sume, sumx2);
    if (N === 1) recorder?.value("X", X, "ft", "outer stringer from the middle of the group");
    if (N === 1) recorder?.value("sumx2", sumx2, "ft2", "squares of the stringers' distances from the middle");
    if (N === 1) recorder?.value("sume", sume, "ft", "one truck from the middle of the group");
    if (N === 1) recorder?.step({ ...rigidSection, symbol: "grf" }, oneTruck, 1, 1, Nb, X, sume, sumx2);
    if (factor > worst.factor) worst = { factor, m, N, sume };
  }
  recorder?.value("sume", worst.sume, "ft", `sum of ${worst.N} trucks' distances from the middle, the worst number of trucks`);
  recorder?.step(rigidSection, worst.factor, worst.m, worst.N, Nb, X, worst.sume, sumx2);
  return { worst: worst.factor, oneTruck };
}

/** Source: AASHTO LRFD, 9th ed., Table 4.6.2.2.2a-1; exterior stringers and what lies beyond the table by the lever rule. */
function otherDeck(
  bridge: Bridge,
  { position, spacingFt: S, lanes }: LrfdPlace,
  { lever, leverOne, leverFatigue }: { readonly lever: number; readonly leverOne: number; readonly leverFatigue: number },
  recorder: Recorder | null,
): LrfdShare["other"] {
  const thickness = bridge.deck.thicknessIn ?? 0;
  const row = OTHER_DECKS.find(({ kind, fromIn, belowIn }) => kind === bridge.deck.kind && thickness >= fromIn && thickness < belowIn);
  const byLever = { moment: lever, shear: lever, fatigue: leverFatigue, rule: "lever rule" };
  if (position === "exterior" || row === undefined) return byLever;
  const byColumn = ({ divisor, toFt }: OtherDeckRow["oneLane"], beyond: number, symbol: string): { factor: number; rule: string } => {
    if (S > toFt) return { factor: beyond, rule: "lever rule" };
    const factor = spacingOverDivisor.of(S, divisor);
    recorder?.step({ ...spacingOverDivisor, symbol }, factor, S, divisor);
    return { factor, rule: `S/${divisor}` };
  };
  const one = byColumn(row.oneLane, leverOne, "g1");
  const more = lanes >= 2 ? byColumn(row.moreLanes, lever, "g2") : one;
  // One loaded lane remains a case on a wider bridge, so the larger column governs, as under concrete.
  const moment = more.factor >= one.factor ? more : one;
  const fatigue = S > row.oneLane.toFt ? leverFatigue : one.factor / ONE_LANE_PRESENCE;
  return { moment: moment.factor, shear: row.shearAlike ? moment.factor : lever, fatigue, rule: moment.rule };
}

/**
 * The factors of one stringer with one shape.
 *
 * @param n modular ratio
 * @param out filled with the result, lanes per stringer
 * @param recorder writes the steps down; null in the search
 * Source: AASHTO LRFD, 9th ed., Art. 4.6.2.2.2, 4.6.2.2.3; the rigid section is held as a minimum of exterior stringers beyond the
 * formulas' range too, as Art. 4.6.2.2.2d has it.
 */
export function lrfdFactors(share: LrfdShare, shape: ShapeFigures, n: number, out: LrfdFactors, recorder: Recorder | null): void {
  if (share.given !== null) {
    fill(out, share.given, share.given, share.given, "given", "given");
    return;
  }
  if (share.other !== null) {
    const { moment, shear, fatigue, rule } = share.other;
    fill(out, moment, shear, fatigue, rule, shear === moment ? rule : "lever rule");
    return;
  }
  const { place } = share;
  const { slabIn: ts, haunchIn: th, spanFt: L } = place;
  byLeverRule(share, out);
  if (!share.inRange || ts === null) return;
  shearByFormula(share, out, recorder);
  const Kg = stiffness.of(n, shape.inertiaXIn4, shape.areaIn2, shape.depthIn, th, ts);
  recorder?.step(stiffness, Kg, n, shape.inertiaXIn4, shape.areaIn2, shape.depthIn, th, ts);
  if (!within(Kg, RANGES.stiffnessIn4)) return;
  const k = stiffnessTerm.of(Kg, L, ts);
  recorder?.step(stiffnessTerm, k, Kg, L, ts);
  if (place.position === "interior") interiorMoment(share, k, out, recorder);
  else exteriorMomentOf(share, k, out, recorder);
}

function fill(out: LrfdFactors, moment: number, shear: number, fatigue: number, momentRule: string, shearRule: string): void {
  out.moment = moment;
  out.shear = shear;
  out.fatigue = fatigue;
  out.momentRule = momentRule;
  out.shearRule = shearRule;
}

function byLeverRule(share: LrfdShare, out: LrfdFactors): void {
  const all = Math.max(share.lever, share.rigid);
  const rule = share.rigid > share.lever ? "rigid section (formulas out of range)" : "lever rule (formulas out of range)";
  fill(out, all, all, Math.max(share.leverFatigue, share.rigidOne), rule, rule);
}

/** Shear has no range of Kg. Source: AASHTO LRFD, 9th ed., Tables 4.6.2.2.3a-1, 4.6.2.2.3b-1; Art. 4.6.2.2.2d for the rigid section. */
function shearByFormula({ place, lever, leverOne, rigid }: LrfdShare, out: LrfdFactors, recorder: Recorder | null): void {
  const { position, spacingFt: S, lanes, count, curbInsideFt } = place;
  if (count === FEW_STRINGERS) {
    out.shear = lever;
    out.shearRule = "lever rule (three stringers)";
  } else if (position === "interior") {
    out.shear = shearOneLane.of(S);
    out.shearRule = "formula";
    recorder?.step(shearOneLane, out.shear, S);
  } else {
    out.shear = leverOne;
    out.shearRule = "lever rule, one truck";
  }
  if (lanes >= 2 && count !== FEW_STRINGERS) {
    const more = shearMoreLanes.of(S);
    recorder?.step(shearMoreLanes, more, S);
    if (position === "interior") out.shear = Math.max(out.shear, more);
    else {
      const de = curbInsideFt ?? 0;
      const gve = exteriorShear.of(de, more);
      recorder?.step(exteriorShear, gve, de, more);
      if (gve > out.shear) {
        out.shear = gve;
        out.shearRule = "(0.60 + de/10) times the formula";
      }
    }
  }
  if (rigid > out.shear) {
    out.shear = rigid;
    out.shearRule = "rigid section";
  }
}

function interiorMoment(
  { place, lever, leverFatigue, termOne, termMore }: LrfdShare,
  k: number,
  out: LrfdFactors,
  recorder: Recorder | null,
): void {
  const { lanes, count } = place;
  const one = momentOneLane.of(termOne, k);
  recorder?.step(momentOneLane, one, termOne, k);
  out.moment = one;
  out.fatigue = one / ONE_LANE_PRESENCE;
  out.momentRule = "formula";
  if (lanes >= 2) {
    const more = momentMoreLanes.of(termMore, k);
    recorder?.step(momentMoreLanes, more, termMore, k);
    out.moment = Math.max(one, more);
  }
  if (count !== FEW_STRINGERS) return;
  out.momentRule = lever < out.moment ? "lever rule (three stringers)" : "formula (three stringers)";
  out.moment = Math.min(out.moment, lever);
  out.fatigue = Math.min(out.fatigue, leverFatigue);
}

function exteriorMomentOf(share: LrfdShare, k: number, out: LrfdFactors, recorder: Recorder | null): void {
  const { place, lever, leverOne, leverFatigue, rigid, rigidOne, termMore } = share;
  const { lanes, count, curbInsideFt } = place;
  out.moment = leverOne;
  out.momentRule = "lever rule, one truck";
  out.fatigue = Math.max(leverFatigue, rigidOne);
  if (lanes >= 2) {
    const de = curbInsideFt ?? 0;
    const more = momentMoreLanes.of(termMore, k);
    recorder?.step(momentMoreLanes, more, termMore, k);
    const ge = exteriorMoment.of(de, more);
    recorder?.step(exteriorMoment, ge, de, more);
    const few = count === FEW_STRINGERS && lever < ge;
    const several = few ? lever : ge;
    if (several > out.moment) {
      out.moment = several;
      out.momentRule = few ? "lever rule (three stringers)" : "(0.77 + de/9.1) times the formula";
    }
  }
  if (rigid > out.moment) {
    out.moment = rigid;
    out.momentRule = "rigid section";
  }
}
