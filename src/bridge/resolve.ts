import { InputError, type InputIssue } from "../errors.js";
import { didYouMean } from "../nearest.js";
import { UNIT_WEIGHT_PCF } from "../units.js";
import { type Bridge, type BridgeValues, type DeckKind, LFD_FATIGUE_DETAILS, LRFD_FATIGUE_DETAILS, type Source } from "./bridge.js";
import { KEYS } from "./fields.js";
import { designLanes, mostLanes, NARROWEST_LANE_FT } from "./lanes.js";
import type { Layer } from "./layers.js";
import { GRADE_YIELD_KSI } from "./yield-stress.js";

/** What a bridge is resolved for. */
export interface ResolveOptions {
  /** `layout`: a width or a spacing is needed; `width`: a width is; `span`: the span is enough. */
  readonly needs: "layout" | "width" | "span";
  /** Vehicles that may be named. */
  readonly vehicles: readonly { readonly name: string; readonly aliases: readonly string[]; readonly dynamicAllowance: number | null }[];
}

/** Keys whose values belong to one kind of deck and never pass to another. */
export const DECK_BOUND: readonly string[] = [
  "deck.thicknessIn",
  "deck.sacrificialIn",
  "deck.haunchWeightIn",
  "deck.haunchSectionIn",
  "deck.maxSpacingFt",
  "deck.fcKsi",
  "deck.modularRatio",
  "deck.composite",
  "deck.formsPsf",
  "deck.deckPsf",
  "barriers.baseFt",
  "barriers.weightKlf",
];

/** What a deck other than concrete has where it says nothing. */
const OTHER_DECK_DEFAULTS: Readonly<Record<string, unknown>> = {
  "deck.thicknessIn": null,
  "deck.sacrificialIn": 0,
  "deck.haunchWeightIn": 0,
  "deck.haunchSectionIn": 0,
  "deck.maxSpacingFt": null,
  "deck.fcKsi": null,
  "deck.modularRatio": null,
  "deck.composite": null,
  "deck.formsPsf": 0,
  "deck.deckPsf": null,
};
const CONCRETE_ONLY: readonly string[] = [
  "deck.sacrificialIn",
  "deck.haunchWeightIn",
  "deck.haunchSectionIn",
  "deck.formsPsf",
  "deck.fcKsi",
  "deck.modularRatio",
];

/**
 * Thinnest deck of a kind that the live-load distribution covers, in.
 * Source: AASHTO Standard Specifications, 17th ed., Table 3.23.1.
 */
const LEAST_THICKNESS_IN: Readonly<Partial<Record<DeckKind, number>>> = { "nail-laminated": 4, glulam: 4, "corrugated-steel": 2 };

/** Diaphragms at most this far apart when nobody says where, ft. Source: AASHTO Standard Specifications, 17th ed., Art. 10.20.1. */
export const DIAPHRAGMS_AT_MOST_FT = 25;
const WITHIN = 1e-9;

/**
 * Lays practice, bridge file and flags over one another and gives every key its value in force.
 *
 * @param layers weakest first: practice, agency practice, bridge file, flags
 * @returns the bridge, defaults that hang on other values worked out, each value with its source
 * @throws {InputError} naming every fault of every layer, every value missing and every contradiction
 */
export function resolveBridge(layers: readonly Layer[], options: ResolveOptions): Bridge {
  const issues: InputIssue[] = layers.flatMap((layer) => layer.issues);
  const merged = merge(layers);
  const at = (key: string): Pick<InputIssue, "file" | "field"> => merged.layers.get(key)?.place(key) ?? { field: key };
  const draft = new Draft(merged, at, issues);
  draft.requireSpan(options.needs);
  const deck = draft.settleDeck();
  draft.settleRoadway(options.needs);
  draft.settleVehicle(options.vehicles);
  draft.settleSpecification(deck, options.needs);
  draft.settleBracing();
  draft.settleSteel();
  draft.checkOrder();
  if (issues.length > 0) throw new InputError(issues);
  return draft.bridge();
}

interface Merged {
  readonly values: Map<string, unknown>;
  readonly layers: Map<string, Layer>;
}

/** The strongest value of each key; what is bound to a deck counts only where its layer speaks of the deck in force. */
function merge(layers: readonly Layer[]): Merged {
  const kindAt: (DeckKind | undefined)[] = [];
  let kind: DeckKind | undefined;
  for (const layer of layers) {
    kind = (layer.values.get("deck.kind") as DeckKind | undefined) ?? kind;
    kindAt.push(kind);
  }
  const values = new Map<string, unknown>();
  const from = new Map<string, Layer>();
  layers.forEach((layer, index) => {
    for (const [key, value] of layer.values) {
      if (DECK_BOUND.includes(key) && kindAt[index] !== kind) continue;
      // A null over a null says nothing new: the rule behind it stays the practice's.
      if (value === null && values.get(key) === null) continue;
      values.set(key, value);
      from.set(key, layer);
    }
  });
  return { values, layers: from };
}

class Draft {
  readonly #values: Map<string, unknown>;
  readonly #layers: ReadonlyMap<string, Layer>;
  readonly #at: (key: string) => Pick<InputIssue, "file" | "field">;
  readonly #issues: InputIssue[];
  #knownVehicles: readonly string[] = [];
  #togetherVehicles: readonly string[] = [];

  constructor(merged: Merged, at: (key: string) => Pick<InputIssue, "file" | "field">, issues: InputIssue[]) {
    this.#values = merged.values;
    this.#layers = merged.layers;
    this.#at = at;
    this.#issues = issues;
  }

  #number(key: string): number | null {
    return (this.#values.get(key) as number | null | undefined) ?? null;
  }

  #fault(key: string, problem: string, allowed: string): void {
    this.#issues.push({ ...this.#at(key), problem, allowed });
  }

  /** True when a layer already complained of this key: then it is not missing as well. */
  #spoiled(...names: string[]): boolean {
    return this.#issues.some((issue) => issue.field !== undefined && names.includes(issue.field));
  }

  requireSpan(needs: ResolveOptions["needs"]): void {
    if (this.#number("spanFt") === null && !this.#spoiled("spanFt", "--span")) {
      this.#issues.push({ field: "spanFt", problem: "missing", allowed: "--span, or spanFt in the bridge file" });
    }
    if (needs === "span") return;
    const width = this.#number("deck.outToOutFt");
    const spacing = this.#number("stringers.spacingFt");
    if (width !== null || this.#spoiled("deck.outToOutFt", "--width")) return;
    if (needs === "width") {
      this.#issues.push({ field: "deck.outToOutFt", problem: "missing", allowed: "--width, or deck.outToOutFt in the bridge file" });
    } else if (this.#number("stringers.count") !== null) {
      this.#fault("stringers.count", "a count needs the width of the deck", "--width too, or --spacing alone for one interior stringer");
    } else if (spacing === null && !this.#spoiled("stringers.spacingFt", "--spacing")) {
      this.#issues.push({
        field: "deck.outToOutFt",
        problem: "neither a width nor a spacing is given",
        allowed: "--width (deck.outToOutFt), or --spacing (stringers.spacingFt) for one interior stringer",
      });
    }
  }

  settleDeck(): DeckKind {
    const kind = (this.#values.get("deck.kind") as DeckKind | undefined) ?? "concrete";
    if (kind !== "concrete") this.#settleOtherDeck(kind);
    else this.#settleConcreteDeck();
    const thickness = this.#number("deck.thicknessIn");
    if (this.#number("deck.maxSpacingFt") === null) {
      const most = greatestSpacingFt(kind, thickness);
      if (most !== null) this.#values.set("deck.maxSpacingFt", most);
      else if (!byThickness(kind) && !this.#spoiled("deck.maxSpacingFt")) {
        this.#fault("deck.maxSpacingFt", `a ${kind} deck needs its greatest stringer spacing`, "a length in feet from the deck's maker");
      }
    }
    const sacrificial = this.#number("deck.sacrificialIn") ?? 0;
    if (thickness !== null && sacrificial >= thickness) {
      this.#fault("deck.sacrificialIn", `${sacrificial} in of a ${thickness} in deck`, "less than the thickness");
    }
    return kind;
  }

  #settleConcreteDeck(): void {
    if (this.#number("deck.thicknessIn") === null && !this.#spoiled("deck.thicknessIn")) {
      this.#fault("deck.thicknessIn", "a concrete deck needs its thickness", "a total thickness in inches");
    }
    if (this.#number("deck.fcKsi") === null && !this.#spoiled("deck.fcKsi")) {
      this.#fault("deck.fcKsi", "a concrete deck needs its strength", "f'c in ksi");
    }
  }

  #settleOtherDeck(kind: DeckKind): void {
    for (const key of CONCRETE_ONLY) {
      const value = this.#number(key);
      if (value !== null && value !== 0) this.#fault(key, `${value} belongs to a concrete deck, this one is ${kind}`, "leave it out");
    }
    for (const [key, value] of Object.entries(OTHER_DECK_DEFAULTS)) {
      if (!this.#values.has(key)) this.#values.set(key, value);
    }
    const missing = (key: string, what: string): void => {
      if (!this.#spoiled(key)) this.#fault(key, `missing: a ${kind} deck takes nothing from the concrete defaults`, what);
    };
    if (this.#number("deck.thicknessIn") === null) missing("deck.thicknessIn", "thickness in inches");
    const [thickness, least] = [this.#number("deck.thicknessIn"), LEAST_THICKNESS_IN[kind] ?? 0];
    if (thickness !== null && thickness < least) {
      this.#fault("deck.thicknessIn", `${thickness} in: no distribution rule for so thin a ${kind} deck`, `at least ${least} in`);
    }
    if (this.#number("barriers.baseFt") === null) missing("barriers.baseFt", "width of a curb or barrier base in feet, 0 for none");
    if (this.#number("barriers.weightKlf") === null) missing("barriers.weightKlf", "weight of one curb or barrier in kip/ft");
    if (this.#number("deck.deckPsf") === null && deckUnitWeightPcf(kind) === null) {
      missing("deck.deckPsf", "weight of the deck in lb/ft2 from the deck's maker");
    }
  }

  settleRoadway(needs: ResolveOptions["needs"]): void {
    const width = this.#number("deck.outToOutFt");
    const base = this.#number("barriers.baseFt");
    const given = this.#number("roadwayFt");
    const lanes = this.#number("liveLoad.lanes");
    if (width === null || needs === "span") {
      if (this.#number("liveLoad.lanes") === null) this.#values.set("liveLoad.lanes", 2);
      return;
    }
    if (base === null) return;
    const roadway = given ?? width - 2 * base;
    if (roadway > width + WITHIN) this.#fault("roadwayFt", `${roadway} ft on a deck ${width} ft wide`, "at most the deck's width");
    if (roadway < NARROWEST_LANE_FT - WITHIN) {
      const from = given === null ? "barriers.baseFt" : "roadwayFt";
      this.#fault(from, `the clear roadway is ${round(roadway)} ft`, `at least ${NARROWEST_LANE_FT} ft between the curbs`);
      return;
    }
    this.#values.set("roadwayFt", roadway);
    if (lanes === null) this.#values.set("liveLoad.lanes", designLanes(roadway));
    else if (lanes > mostLanes(roadway)) {
      this.#fault("liveLoad.lanes", `${lanes} lanes on a roadway of ${round(roadway)} ft`, `at most ${mostLanes(roadway)}, 10 ft each`);
    }
  }

  settleVehicle(vehicles: ResolveOptions["vehicles"]): void {
    this.#knownVehicles = vehicles.map(({ name }) => name);
    this.#togetherVehicles = vehicles.filter(({ dynamicAllowance }) => dynamicAllowance !== null).map(({ name }) => name);
    const asked = this.#values.get("liveLoad.vehicle") as string | null | undefined;
    if (asked === null || asked === undefined) {
      this.#values.set("liveLoad.vehicle", this.#values.get("specification") === "lrfd" ? "HL-93" : "HS20-44");
      return;
    }
    const key = asked.toLowerCase();
    const found = vehicles.find(({ name, aliases }) => [name, ...aliases].some((known) => known.toLowerCase() === key));
    const names = vehicles.map(({ name }) => name);
    if (found !== undefined) this.#values.set("liveLoad.vehicle", found.name);
    else this.#fault("liveLoad.vehicle", `unknown vehicle "${asked}"${didYouMean(asked, names)}`, names.join(", "));
  }

  settleSpecification(kind: DeckKind, needs: ResolveOptions["needs"]): void {
    const asked = this.#values.get("deck.composite") as boolean | null | undefined;
    if (asked === true && kind !== "concrete") {
      this.#fault("deck.composite", `a ${kind} deck does not act with the stringers`, "false, or a concrete deck");
    }
    const composite = asked ?? kind === "concrete";
    this.#values.set("deck.composite", composite);
    if (needs !== "span") this.#settleVehicleOfSpecification();
    this.#settleFatigueDetail();
  }

  /** HL-93 is lrfd's, whole trucks and lanes without dynamic allowance are lfd's; lrfd takes a user's vehicle that says how it combines. */
  #settleVehicleOfSpecification(): void {
    const vehicle = this.#values.get("liveLoad.vehicle") as string;
    const together = this.#togetherVehicles.includes(vehicle);
    if (!this.#knownVehicles.includes(vehicle)) return;
    if (this.#values.get("specification") === "lrfd" && !together) {
      this.#fault("liveLoad.vehicle", `${vehicle} is not a live load of lrfd`, `${this.#togetherVehicles.join(", ")}, or --spec lfd`);
    }
    if (this.#values.get("specification") !== "lrfd" && together) {
      this.#fault(
        "liveLoad.vehicle",
        `${vehicle} belongs to lrfd`,
        "a truck or lane loading of the Standard Specifications, or --spec lrfd",
      );
    }
  }

  #settleFatigueDetail(): void {
    const lrfd = this.#values.get("specification") === "lrfd";
    const detail = (this.#values.get("liveLoad.fatigueDetail") ?? null) as string | null;
    const known: readonly string[] = lrfd ? LRFD_FATIGUE_DETAILS : LFD_FATIGUE_DETAILS;
    if (detail === null) this.#values.set("liveLoad.fatigueDetail", lrfd ? "C'" : "C-stiffener");
    else if (!known.includes(detail)) {
      this.#fault("liveLoad.fatigueDetail", `detail ${detail} is not one of ${lrfd ? "lrfd" : "lfd"}`, known.join(", "));
    }
  }

  settleBracing(): void {
    const span = this.#number("spanFt");
    const composite = this.#values.get("deck.composite") === true;
    if ((this.#values.get("bracing.topFlange") ?? null) === null) {
      this.#values.set("bracing.topFlange", composite ? "held" : "diaphragms");
    }
    if (span === null) return;
    const spacing = this.#number("bracing.diaphragmSpacingFt");
    if (spacing === null) this.#values.set("bracing.diaphragmSpacingFt", span / Math.ceil(span / DIAPHRAGMS_AT_MOST_FT - WITHIN));
    else if (spacing > span + WITHIN) {
      this.#fault("bracing.diaphragmSpacingFt", `${spacing} ft on a span of ${span} ft`, "at most the span");
    }
  }

  /** In one file fyKsi stands for the grade; typed together they contradict each other. */
  settleSteel(): void {
    const fy = this.#number("steel.fyKsi");
    const grade = this.#values.get("steel.grade") as keyof typeof GRADE_YIELD_KSI;
    const [gradeLayer, stressLayer] = [this.#layers.get("steel.grade"), this.#layers.get("steel.fyKsi")];
    if (fy !== null && gradeLayer === stressLayer && stressLayer?.source === "flag" && GRADE_YIELD_KSI[grade] !== fy) {
      this.#fault("steel.fyKsi", `Fy ${fy} ksi and grade ${grade} together`, "one of the two");
    }
  }

  checkOrder(): void {
    const pairs = [
      ["stringers.minCount", "stringers.maxCount"],
      ["stringers.minSpacingFt", "stringers.maxSpacingFt"],
      ["stringers.minOverhangFt", "stringers.maxOverhangFt"],
    ] as const;
    for (const [low, high] of pairs) {
      const [least, most] = [this.#number(low), this.#number(high)];
      if (least !== null && most !== null && least > most) this.#fault(low, `${least} is above ${high} ${most}`, `at most ${most}`);
    }
  }

  bridge(): Bridge {
    const nested: Record<string, unknown> = {};
    const sources: Record<string, Source> = {};
    for (const key of KEYS) {
      const [group, name] = key.split(".") as [string, string | undefined];
      const value = this.#values.get(key) ?? null;
      if (name === undefined) nested[group] = value;
      else nested[group] = { ...(nested[group] as object | undefined), [name]: value };
      sources[key] = this.#layers.get(key)?.source ?? "practice";
    }
    return { ...(nested as unknown as BridgeValues), sources };
  }
}

/**
 * Greatest stringer spacing a deck allows when nobody gives it, ft; null when its maker must say.
 *
 * Source: concrete: AASHTO Standard Specifications, 17th ed., Art. 8.9.2, LRFD 9th ed., Art. 2.5.2.6.3 (t >= (S + 10)/30);
 * plank (1 ft per inch), nail-laminated and glulam (6 ft): common practice.
 */
function greatestSpacingFt(kind: DeckKind, thicknessIn: number | null): number | null {
  if (kind === "nail-laminated" || kind === "glulam") return 6;
  if (thicknessIn === null || kind === "steel-grid" || kind === "corrugated-steel") return null;
  return kind === "timber-plank" ? thicknessIn : (30 * thicknessIn) / 12 - 10;
}

/** Whether a deck's greatest spacing follows from its thickness. */
const byThickness = (kind: DeckKind): boolean => kind === "concrete" || kind === "timber-plank";

/** Unit weight of a deck of solid material, lb/ft3; null where thickness alone does not tell the weight. */
export function deckUnitWeightPcf(kind: DeckKind): number | null {
  if (kind === "concrete") return UNIT_WEIGHT_PCF.concrete;
  return kind === "steel-grid" || kind === "corrugated-steel" ? null : UNIT_WEIGHT_PCF.timber;
}

const round = (value: number): number => Math.round(value * 1000) / 1000;
