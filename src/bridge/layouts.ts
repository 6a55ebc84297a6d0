import type { Bridge } from "./bridge.js";

/** Stringers across a deck: how many, how far apart, how far the deck stands out; or one interior stringer of unknown neighbours. */
export interface Layout {
  /** Null when only a spacing is given: one interior stringer. */
  readonly count: number | null;
  readonly spacingFt: number;
  /** From the outer stringer's web to the edge of the deck, ft; null with the count. */
  readonly overhangFt: number | null;
  /** Limits of the practice that explicit values break. */
  readonly broken: readonly BrokenLimit[];
}

/** A practice's limit broken by a value given explicitly. */
export interface BrokenLimit {
  readonly key: string;
  readonly value: number;
  readonly limit: number;
  /** Above 1: value over limit, or limit over value for a minimum. */
  readonly ratio: number;
}

/** Layouts to try, or the limits that leave none. */
export interface Layouts {
  readonly layouts: readonly Layout[];
  /** Why there is none: each limit in the way with how many trials it stopped; empty when there are layouts. */
  readonly inTheWay: readonly { readonly key: string; readonly limit: number; readonly trials: number }[];
}

/** Tolerance within which a limit counts as met, ft. */
const INCLUSIVE_FT = 1e-9;

/**
 * Every layout that bridge and practice allow.
 *
 * Width alone: every count, spacings on the grid. Width and count: that count. Width and spacing: every count whose overhang fits.
 * All three: the one layout, its overhang following. Spacing alone: one interior stringer.
 *
 * @returns layouts by count, then by spacing
 * @throws {RangeError} if the bridge has neither width nor spacing
 */
export function layoutsOf(bridge: Bridge): Layouts {
  const { outToOutFt, maxSpacingFt } = bridge.deck;
  const { count, spacingFt } = bridge.stringers;
  if (outToOutFt === null) {
    if (spacingFt === null) throw new RangeError("layoutsOf needs a width or a spacing");
    return { layouts: [{ count: null, spacingFt, overhangFt: null, broken: brokenBy(bridge, { spacingFt }) }], inTheWay: [] };
  }
  const rules = bridge.stringers;
  const spacings = spacingFt === null ? grid(bridge, Math.min(rules.maxSpacingFt, maxSpacingFt)) : [spacingFt];
  const counts = count === null ? range(rules.minCount, rules.maxCount) : [count];
  const given = { ...(count !== null && { count }), ...(spacingFt !== null && { spacingFt }) };
  const layouts: Layout[] = [];
  const stops = new Map<string, { key: string; limit: number; trials: number }>();
  const overhangFollows = count !== null && spacingFt !== null;
  for (const stringers of counts) {
    for (const spacing of spacings) {
      const overhangFt = tidy((outToOutFt - (stringers - 1) * spacing) / 2);
      const stop = overhangFollows ? null : overhangStop(bridge, overhangFt, spacing);
      if (stop === null) {
        const broken = brokenBy(bridge, overhangFollows ? { ...given, overhangFt, perSpacing: overhangFt / spacing } : given);
        layouts.push({ count: stringers, spacingFt: spacing, overhangFt, broken });
      } else {
        const seen = stops.get(stop);
        if (seen === undefined) stops.set(stop, { key: `stringers.${stop}`, limit: rules[stop], trials: 1 });
        else seen.trials++;
      }
    }
  }
  if (layouts.length > 0) return { layouts, inTheWay: [] };
  if (stops.size === 0) {
    const [key, limit] =
      maxSpacingFt < rules.maxSpacingFt ? ["deck.maxSpacingFt", maxSpacingFt] : ["stringers.maxSpacingFt", rules.maxSpacingFt];
    return { layouts, inTheWay: [{ key: key as string, limit: limit as number, trials: 0 }] };
  }
  return { layouts, inTheWay: [...stops.values()].sort((a, b) => b.trials - a.trials) };
}

function grid(bridge: Bridge, mostFt: number): number[] {
  const { minSpacingFt, spacingStepFt } = bridge.stringers;
  const steps = Math.floor((mostFt - minSpacingFt + INCLUSIVE_FT) / spacingStepFt);
  return range(0, steps).map((step) => tidy(minSpacingFt + step * spacingStepFt));
}

type OverhangLimit = "minOverhangFt" | "maxOverhangFt" | "maxOverhangPerSpacing";

/** The limit an overhang breaks, or null. */
function overhangStop({ stringers }: Bridge, overhangFt: number, spacingFt: number): OverhangLimit | null {
  if (overhangFt < stringers.minOverhangFt - INCLUSIVE_FT) return "minOverhangFt";
  if (overhangFt > stringers.maxOverhangFt + INCLUSIVE_FT) return "maxOverhangFt";
  return overhangFt / spacingFt > stringers.maxOverhangPerSpacing + INCLUSIVE_FT ? "maxOverhangPerSpacing" : null;
}

interface LayoutValues {
  readonly count?: number;
  readonly spacingFt?: number;
  readonly overhangFt?: number;
  readonly perSpacing?: number;
}

function brokenBy(bridge: Bridge, values: LayoutValues): BrokenLimit[] {
  const rules = bridge.stringers;
  const broken: BrokenLimit[] = [];
  const least = (key: string, value: number | undefined, limit: number): void => {
    if (value !== undefined && value < limit - INCLUSIVE_FT) broken.push({ key, value, limit, ratio: limit / value });
  };
  const most = (key: string, value: number | undefined, limit: number): void => {
    if (value !== undefined && value > limit + INCLUSIVE_FT) broken.push({ key, value, limit, ratio: value / limit });
  };
  least("stringers.minCount", values.count, rules.minCount);
  most("stringers.maxCount", values.count, rules.maxCount);
  least("stringers.minSpacingFt", values.spacingFt, rules.minSpacingFt);
  most("stringers.maxSpacingFt", values.spacingFt, rules.maxSpacingFt);
  most("deck.maxSpacingFt", values.spacingFt, bridge.deck.maxSpacingFt);
  least("stringers.minOverhangFt", values.overhangFt, rules.minOverhangFt);
  most("stringers.maxOverhangFt", values.overhangFt, rules.maxOverhangFt);
  most("stringers.maxOverhangPerSpacing", values.perSpacing, rules.maxOverhangPerSpacing);
  return broken;
}

const range = (from: number, to: number): number[] => Array.from({ length: Math.max(0, to - from + 1) }, (_, step) => from + step);
/** Rids a length of the last digits that binary fractions leave. */
const tidy = (lengthFt: number): number => Math.round(lengthFt * 1e9) / 1e9;
