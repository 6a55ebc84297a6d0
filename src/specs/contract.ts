import type { Bridge } from "../bridge/bridge.js";
import type { Layout } from "../bridge/layouts.js";
import type { Steel } from "../bridge/yield-stress.js";
import type { Formula, Recorder, Topic } from "../formula.js";
import type { LaneEffects } from "../loads/live-load.js";
import type { Vehicle } from "../loads/vehicles.js";

export type Position = "interior" | "exterior";
/** `demand`: strength, stress, deflection, fatigue; `limit`: a rule's bound; `advisory`: reported, not required. */
export type CheckKind = "demand" | "limit" | "advisory";
export type CheckId =
  | "flexure"
  | "flange-slenderness"
  | "web-slenderness"
  | "slenderness-interaction"
  | "bracing"
  | "diaphragm-spacing"
  | "ductility"
  | "shear"
  | "overload"
  | "service-ii"
  | "live-load-deflection"
  | "fatigue"
  | "deck-pour"
  | "proportions"
  | "depth"
  | "handling"
  | "overhang"
  | "layout"
  | "lane-step"
  | "deck-thickness"
  | "distribution-sum";

/** One check with its figures; `ratio` is demand over capacity, or required over provided for a minimum. */
export interface Check {
  readonly id: CheckId;
  readonly kind: CheckKind;
  readonly article: string;
  readonly demand: number;
  readonly capacity: number;
  readonly unit: string;
  readonly ratio: number;
  /** ratio <= 1; never true of what is not a number. */
  readonly ok: boolean;
}

/** What acts on one stringer. */
export interface Effects {
  deadStage1Klf: number;
  deadStage2Klf: number;
  deadWearingKlf: number;
  momentStage1KipFt: number;
  momentStage2KipFt: number;
  momentWearingKipFt: number;
  liveMomentPerLaneKipFt: number;
  liveMomentPerLaneIncludesImpact: boolean;
  liveShearPerLaneKip: number;
  impact: number;
  distributionMoment: number;
  distributionShear: number;
  distributionPer: "wheel line" | "lane";
  distributionRule: string;
  liveMomentKipFt: number;
  liveShearKip: number;
  /** Live moment with one lane loaded and the factor it comes by, where Group IA counts; else null. */
  oneLaneLiveMomentKipFt: number | null;
  oneLaneDistributionMoment: number | null;
  /** Shear at the bearing of all dead load, unfactored, kip. */
  deadShearKip: number;
  factoredMomentKipFt: number;
  factoredShearKip: number;
  /** Z that flexure would need of a compact shape, in3; null for composite stringers. */
  requiredZIn3: number | null;
  /** S that overload needs, in3; null for composite stringers. */
  requiredSIn3: number | null;
  effectiveWidthIn: number | null;
  plasticMomentKipFt: number | null;
  deflectionIn: number;
}

/** A note on how an answer came about: data, put in words by the report. */
export interface Note {
  readonly code: string;
  readonly args: readonly (number | string)[];
}

/** Takes down everything of one stringer's assessment. */
export interface AssessmentRecorder extends Recorder {
  /** Steps and checks that follow belong to this stringer. */
  stringer(position: Position): void;
  effects(effects: Effects): void;
  check(check: Check): void;
  note(code: string, ...args: readonly (number | string)[]): void;
  /**
   * Whether bearing stiffeners are needed: factored shear and the shear up to which none are, kip; and the bearing length at which the
   * web takes the reaction by yielding and crippling, in.
   */
  support(article: string, shearKip: number, withoutStiffenersKip: number, bearingLengthIn: number): void;
  /** Studs between midspan and either end by strength: the force they carry, the strength of one, how many, and how many stand in a row. */
  studs(article: string, forceKip: number, strengthKip: number, perHalfSpan: number, perRow: number): void;
}

/** One line of a calculation as recorded. */
export type Line =
  | { readonly type: "topic"; readonly topic: Topic }
  | { readonly type: "step"; readonly formula: Formula; readonly numbers: readonly number[]; readonly result: number }
  | { readonly type: "value"; readonly symbol: string; readonly value: number; readonly unit: string; readonly from: string }
  | { readonly type: "check"; readonly check: Check };

/** Studs that composite action needs by strength, whole rows. */
export interface StudCount {
  readonly article: string;
  readonly forceKip: number;
  readonly strengthKip: number;
  /** Between midspan and either end, rounded up to whole rows. */
  readonly perHalfSpan: number;
  readonly perStringer: number;
}

/** A stringer's assessment in full. */
export interface StringerAssessment {
  readonly position: Position;
  readonly effects: Effects;
  readonly checks: readonly Check[];
  readonly support: {
    readonly article: string;
    readonly shearKip: number;
    readonly withoutStiffenersKip: number;
    /** Bearing length at which the web takes the reaction by yielding and crippling (LRFD D6.5), in. */
    readonly bearingLengthNeededIn: number;
    readonly stiffenersNeeded: boolean;
  };
  /** Studs by strength; null for noncomposite stringers. */
  readonly studs: StudCount | null;
  readonly notes: readonly Note[];
  readonly lines: readonly Line[];
}

/** Marks a check that does not arise for a stringer. A ratio is never negative. */
export const ABSENT = -1;

/** What a bridge fixes before any layout is tried. */
export interface Design {
  readonly bridge: Bridge;
  readonly vehicle: Vehicle;
  readonly vehicles: readonly Vehicle[];
  readonly live: LaneEffects;
}

/**
 * The checks of one bridge and layout, ready to take shape after shape.
 *
 * `assess` without a recorder writes ratios into `ratios` and allocates nothing; the verdict stands in the fields until the next call.
 */
export interface Assessor {
  readonly layout: Layout;
  readonly positions: readonly Position[];
  /** Ratios of the last shape, position by position; ABSENT where a check does not arise. */
  readonly ratios: Float64Array;
  /** Check of each place in `ratios`. */
  readonly slots: readonly { readonly position: Position; readonly id: CheckId; readonly kind: CheckKind }[];
  readonly passes: boolean;
  /** Worst failing required ratio, else worst required demand; Infinity for what is not a number. */
  readonly governingRatio: number;
  /** Place of the governing check in `ratios`. */
  readonly governingSlot: number;
  assess(steel: Steel, recorder: AssessmentRecorder | null): void;
  /**
   * Whether a shape passes, by the same checks ended at the first that fails. When it passes, the governing check stands in the fields as
   * after `assess`; advisories that are only reported are left out of `ratios`.
   */
  screen(steel: Steel): boolean;
}

/** A design specification: what it is called, and how it prepares a layout's checks. */
export interface Specification {
  readonly name: "lfd" | "lrfd";
  readonly title: string;
  /** Load factors, resistance and rules that hold for every answer, as notes. */
  prepare(design: Design, layout: Layout): Assessor;
}
