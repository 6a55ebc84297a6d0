/** Where a value in force came from. */
export type Source = "practice" | "bridge" | "list" | "flag";

export type SpecificationName = "lfd" | "lrfd";
export const DECK_KINDS = ["concrete", "timber-plank", "nail-laminated", "glulam", "steel-grid", "corrugated-steel"] as const;
export type DeckKind = (typeof DECK_KINDS)[number];
export const GRADES = ["36", "50", "50W"] as const;
export type Grade = (typeof GRADES)[number];
/** Whether a rule's finding stops a candidate, is only shown, or is left out. */
export const USES = ["enforce", "report", "off"] as const;
export type Use = (typeof USES)[number];
export const TOP_FLANGES = ["held", "diaphragms"] as const;
export type TopFlange = (typeof TOP_FLANGES)[number];
/** Fatigue details by specification; C-stiffener is detail C with the ranges of transverse stiffener welds. */
export const LFD_FATIGUE_DETAILS = ["A", "B", "B'", "C", "C-stiffener", "D", "E"] as const;
export type LfdFatigueDetail = (typeof LFD_FATIGUE_DETAILS)[number];
export const LRFD_FATIGUE_DETAILS = ["A", "B", "B'", "C", "C'", "D", "E", "E'"] as const;
export type LrfdFatigueDetail = (typeof LRFD_FATIGUE_DETAILS)[number];
export type FatigueDetail = LfdFatigueDetail | LrfdFatigueDetail;

/** Every key of the bridge file with its value in force. Units stand in the names. */
export interface BridgeValues {
  readonly title: string;
  /** Span between bearings, ft. */
  readonly spanFt: number;
  readonly skewDeg: number;
  /** Length of each piece beyond the bearing at either end, ft. */
  readonly pieceOverlapFt: number;
  readonly specification: SpecificationName;
  readonly deck: {
    readonly kind: DeckKind;
    /** Width of the deck from edge to edge, ft; null when only a spacing is given. */
    readonly outToOutFt: number | null;
    /** Total thickness, wearing allowance included, in. */
    readonly thicknessIn: number | null;
    readonly sacrificialIn: number;
    /** Haunch thickness counted in the weight, in. */
    readonly haunchWeightIn: number;
    /** Haunch thickness counted in section properties, in. */
    readonly haunchSectionIn: number;
    /** Greatest stringer spacing the deck allows, ft. */
    readonly maxSpacingFt: number;
    readonly fcKsi: number | null;
    readonly modularRatio: number | null;
    readonly composite: boolean;
    readonly formsPsf: number;
    /** Weight of the deck, lb/ft2, if given instead of thickness times unit weight. */
    readonly deckPsf: number | null;
  };
  /** One barrier: its base width and its weight. There are two. */
  readonly barriers: { readonly baseFt: number; readonly weightKlf: number };
  readonly wearingPsf: number;
  /** Clear roadway between curbs, ft; null when only a spacing is given. */
  readonly roadwayFt: number | null;
  readonly stringers: {
    readonly minCount: number;
    readonly maxCount: number;
    readonly minSpacingFt: number;
    readonly maxSpacingFt: number;
    readonly spacingStepFt: number;
    readonly minOverhangFt: number;
    readonly maxOverhangFt: number;
    readonly maxOverhangPerSpacing: number;
    readonly count: number | null;
    readonly spacingFt: number | null;
  };
  readonly steel: {
    readonly grade: Grade;
    readonly fyKsi: number | null;
    /** Diaphragms, stiffeners and the like as a fraction of the shape's weight. */
    readonly miscFraction: number;
    readonly maxDepthIn: number | null;
    /** Greatest depth from the underside of the steel to the top of the deck, in. */
    readonly maxStructureDepthIn: number | null;
  };
  readonly bracing: {
    readonly topFlange: TopFlange;
    readonly diaphragmSpacingFt: number;
  };
  readonly liveLoad: {
    readonly vehicle: string;
    readonly lanes: number;
    /** Trucks a day; null when not given, which counts as many. */
    readonly adtt: number | null;
    readonly fatigueDetail: FatigueDetail;
    /** Distribution factor of the user's own, wheel lines per stringer; null for the specification's. */
    readonly distribution: number | null;
  };
  readonly deadLoad: {
    readonly stage1Klf: number | null;
    readonly stage2Klf: number | null;
    readonly wearingKlf: number | null;
  };
  readonly deflection: { readonly use: Use; readonly spanOver: number };
  readonly pour: { readonly constructionPsf: number; readonly lateralBendingKsi: number };
  readonly bearing: { readonly lengthIn: number };
  readonly studs: { readonly diameterIn: number; readonly perRow: number };
  readonly advisories: { readonly depth: Use; readonly handling: Use; readonly overhang: Use };
}

/** A bridge with every value in force and the source of each, by dotted key. */
export interface Bridge extends BridgeValues {
  readonly sources: Readonly<Record<string, Source>>;
}
