import * as z from "zod";
import { DECK_KINDS, GRADES, LFD_FATIGUE_DETAILS, LRFD_FATIGUE_DETAILS, TOP_FLANGES, USES } from "./bridge.js";
import { readFeet, readInches } from "./lengths.js";

/** One key of the bridge file: how a value is checked, and what is allowed in words. */
export interface Field {
  readonly schema: z.ZodType;
  readonly allowed: string;
  /** Turns the text of a flag into the value a file would hold. */
  readonly fromText: (text: string) => unknown;
}

interface Bounds {
  readonly min: number;
  readonly max: number;
  readonly unit?: string;
  readonly nullable?: true;
  readonly integer?: true;
}

const numberFromText = (text: string): unknown => (/^[+-]?(\d+(\.\d*)?|\.\d+)([eE][+-]?\d+)?$/.test(text.trim()) ? Number(text) : text);

function orNull(field: Field, nullable: true | undefined): Field {
  if (nullable === undefined) return field;
  return {
    schema: field.schema.nullable(),
    allowed: `${field.allowed}, or null`,
    fromText: (text) => (text.trim() === "null" ? null : field.fromText(text)),
  };
}

function number({ min, max, unit, nullable, integer }: Bounds): Field {
  const base = z.number().min(min).max(max);
  const allowed = `${integer ? "a whole number" : "a number"} from ${min} to ${max}${unit === undefined ? "" : ` ${unit}`}`;
  return orNull({ schema: integer ? base.int() : base, allowed, fromText: numberFromText }, nullable);
}

function length({ min, max, unit, nullable }: Bounds & { readonly unit: "ft" | "in" }): Field {
  const read = unit === "ft" ? readFeet : readInches;
  const schema = z
    .union([z.number(), z.string()])
    .transform((value, context) => {
      if (typeof value === "number") return value;
      const reading = read(value);
      if ("value" in reading) return reading.value;
      context.addIssue({ code: "custom", message: reading.problem });
      return z.NEVER;
    })
    .pipe(z.number().min(min).max(max));
  const form = unit === "ft" ? `62.5 or 62'-6"` : `8.5 or 8 1/2"`;
  return orNull({ schema, allowed: `a length from ${min} to ${max} ${unit}, written as ${form}`, fromText: (text) => text }, nullable);
}

const feet = (min: number, max: number, nullable?: true): Field => length({ min, max, unit: "ft", ...(nullable && { nullable }) });
const inches = (min: number, max: number, nullable?: true): Field => length({ min, max, unit: "in", ...(nullable && { nullable }) });

function choice(names: readonly string[], nullable?: true): Field {
  return orNull({ schema: z.enum(names as [string, ...string[]]), allowed: names.join(", "), fromText: (text) => text }, nullable);
}

const yesNo = (nullable?: true): Field =>
  orNull(
    {
      schema: z.boolean(),
      allowed: "true or false",
      fromText: (text) => (text === "true" ? true : text === "false" ? false : text),
    },
    nullable,
  );

const words = (max: number, nullable?: true): Field =>
  orNull(
    {
      schema: z.string().regex(new RegExp(`^[^\\u0000-\\u001f]{0,${max}}$`)),
      allowed: `text of at most ${max} characters on one line`,
      fromText: (text) => text,
    },
    nullable,
  );

/** Every key of the bridge file, in the order in which files are written. */
export const FIELDS: Readonly<Record<string, Field>> = {
  title: words(120),
  spanFt: feet(5, 300),
  skewDeg: {
    schema: z.literal(0),
    allowed: "0: the rules for skewed bridges are not built",
    fromText: numberFromText,
  },
  pieceOverlapFt: feet(0, 5),
  specification: choice(["lfd", "lrfd"]),
  "deck.kind": choice(DECK_KINDS),
  "deck.outToOutFt": feet(10, 200, true),
  "deck.thicknessIn": inches(1, 24, true),
  "deck.sacrificialIn": inches(0, 2),
  "deck.haunchWeightIn": inches(0, 12),
  "deck.haunchSectionIn": inches(0, 12),
  "deck.maxSpacingFt": feet(0.5, 20, true),
  "deck.fcKsi": number({ min: 2, max: 10, unit: "ksi", nullable: true }),
  "deck.modularRatio": number({ min: 4, max: 15, nullable: true }),
  "deck.composite": yesNo(true),
  "deck.formsPsf": number({ min: 0, max: 50, unit: "lb/ft2" }),
  "deck.deckPsf": number({ min: 1, max: 400, unit: "lb/ft2", nullable: true }),
  "barriers.baseFt": feet(0, 10),
  "barriers.weightKlf": number({ min: 0, max: 5, unit: "kip/ft" }),
  wearingPsf: number({ min: 0, max: 300, unit: "lb/ft2" }),
  roadwayFt: feet(10, 200, true),
  "stringers.minCount": number({ min: 2, max: 60, integer: true }),
  "stringers.maxCount": number({ min: 2, max: 60, integer: true }),
  "stringers.minSpacingFt": feet(0.5, 20),
  "stringers.maxSpacingFt": feet(0.5, 20),
  "stringers.spacingStepFt": feet(0.01, 5),
  "stringers.minOverhangFt": feet(0, 12),
  "stringers.maxOverhangFt": feet(0, 12),
  "stringers.maxOverhangPerSpacing": number({ min: 0, max: 2 }),
  "stringers.count": number({ min: 2, max: 60, integer: true, nullable: true }),
  "stringers.spacingFt": feet(0.5, 20, true),
  "steel.grade": choice(GRADES),
  "steel.fyKsi": number({ min: 20, max: 70, unit: "ksi", nullable: true }),
  "steel.miscFraction": number({ min: 0, max: 0.5 }),
  "steel.maxDepthIn": inches(3, 80, true),
  "steel.maxStructureDepthIn": inches(4, 120, true),
  "bracing.topFlange": choice(TOP_FLANGES, true),
  "bracing.diaphragmSpacingFt": feet(1, 300, true),
  "liveLoad.vehicle": words(60, true),
  "liveLoad.lanes": number({ min: 1, max: 19, integer: true, nullable: true }),
  "liveLoad.adtt": number({ min: 0, max: 50000, unit: "trucks a day", nullable: true }),
  "liveLoad.fatigueDetail": choice([...new Set([...LFD_FATIGUE_DETAILS, ...LRFD_FATIGUE_DETAILS])], true),
  "liveLoad.distribution": number({ min: 0.05, max: 10, unit: "wheel lines (lfd) or lanes (lrfd) per stringer", nullable: true }),
  "deadLoad.stage1Klf": number({ min: 0, max: 20, unit: "kip/ft", nullable: true }),
  "deadLoad.stage2Klf": number({ min: 0, max: 20, unit: "kip/ft", nullable: true }),
  "deadLoad.wearingKlf": number({ min: 0, max: 20, unit: "kip/ft", nullable: true }),
  "deflection.use": choice(USES),
  "deflection.spanOver": number({ min: 100, max: 5000 }),
  "pour.constructionPsf": number({ min: 0, max: 200, unit: "lb/ft2" }),
  "pour.lateralBendingKsi": number({ min: 0, max: 70, unit: "ksi" }),
  "bearing.lengthIn": inches(1, 60),
  "studs.diameterIn": inches(0.5, 1.25),
  "studs.perRow": number({ min: 1, max: 6, integer: true }),
  "advisories.depth": choice(USES),
  "advisories.handling": choice(USES),
  "advisories.overhang": choice(USES),
};

/** Dotted names of every key. */
export const KEYS: readonly string[] = Object.keys(FIELDS);
