import type { Assessment } from "../../src/answers/assessment.js";
import type { Prepared } from "../../src/answers/question.js";
import type { Bridge } from "../../src/bridge/bridge.js";
import type { Steel } from "../../src/bridge/yield-stress.js";
import type { Assessor } from "../../src/specs/contract.js";
import { specificationOf } from "../../src/specs/specification.js";
import { passesByRatios } from "./random-bridges.js";

/** One candidate with all its ratios, as plain enumeration finds it. */
export interface Candidate {
  readonly steel: Steel;
  readonly count: number | null;
  readonly spacingFt: number;
  readonly overhangFt: number | null;
  readonly passes: boolean;
  /** The worst failing required ratio, else the worst required demand; Infinity for what is not a number. */
  readonly governingRatio: number;
  readonly ratios: Float64Array;
  readonly slots: Assessor["slots"];
}

interface PlainLayout {
  readonly count: number | null;
  readonly spacingFt: number;
  readonly overhangFt: number | null;
}

const nanofeet = (lengthFt: number): number => Math.round(lengthFt * 1e9) / 1e9;

/**
 * Layouts by the table of what may be given: width alone, every count on the grid; with a count, that count; with a spacing, every count
 * whose overhang fits; all three, the one; a spacing alone, one interior stringer.
 */
export function plainLayouts(bridge: Bridge): PlainLayout[] {
  const { stringers: rules, deck } = bridge;
  const width = deck.outToOutFt;
  if (width === null) return [{ count: null, spacingFt: rules.spacingFt ?? Number.NaN, overhangFt: null }];
  const most = Math.min(rules.maxSpacingFt, deck.maxSpacingFt) + 1e-9;
  const spacings: number[] = [];
  if (rules.spacingFt !== null) spacings.push(rules.spacingFt);
  else
    for (let step = 0; rules.minSpacingFt + step * rules.spacingStepFt <= most; step++)
      spacings.push(nanofeet(rules.minSpacingFt + step * rules.spacingStepFt));
  const all: PlainLayout[] = [];
  for (let count = rules.count ?? rules.minCount; count <= (rules.count ?? rules.maxCount); count++) {
    for (const spacingFt of spacings) all.push({ count, spacingFt, overhangFt: nanofeet((width - (count - 1) * spacingFt) / 2) });
  }
  if (rules.count !== null && rules.spacingFt !== null) return all;
  return all.filter(({ overhangFt, spacingFt }) => {
    const overhang = overhangFt ?? Number.NaN;
    return (
      overhang >= rules.minOverhangFt - 1e-9 &&
      overhang <= rules.maxOverhangFt + 1e-9 &&
      overhang / spacingFt <= rules.maxOverhangPerSpacing + 1e-9
    );
  });
}

function governing({ ratios, slots }: Assessor, passes: boolean): number {
  let worst = 0;
  slots.forEach(({ kind }, place) => {
    const ratio = ratios[place];
    if (kind === "advisory" || ratio === -1) return;
    if (passes && kind === "demand") worst = Math.max(worst, ratio);
    if (!passes && !(ratio <= 1)) worst = Math.max(worst, ratio > 1 ? ratio : Number.POSITIVE_INFINITY);
  });
  return worst;
}

/** Every candidate of a question, each assessed in full, none skipped. */
export function everyCandidate({ bridge, design, space }: Prepared): Candidate[] {
  return plainLayouts(bridge).flatMap(({ count, spacingFt, overhangFt }) => {
    const broken = space.assessors.find(({ layout }) => layout.count === count && layout.spacingFt === spacingFt)?.layout.broken ?? [];
    const assessor = specificationOf(bridge).prepare(design, { count, spacingFt, overhangFt, broken });
    return space.steels.flatMap((steel): Candidate[] => {
      if (overhangFt !== null && overhangFt < steel.shape.flangeWidthIn / 24 - 1e-9) return [];
      assessor.assess(steel, null);
      const passes = passesByRatios(assessor);
      return [
        {
          steel,
          count,
          spacingFt,
          overhangFt,
          passes,
          governingRatio: governing(assessor, passes),
          ratios: assessor.ratios.slice(),
          slots: assessor.slots,
        },
      ];
    });
  });
}

const perFootOfBridge = ({ count, steel }: Candidate): number => (count ?? 1) * steel.shape.weightPlf;

/** Keys of the total order: the first that differs decides. */
const keys = (candidate: Candidate): (number | string)[] => [
  perFootOfBridge(candidate),
  candidate.count ?? 1,
  Math.round(candidate.governingRatio * 1e9),
  (candidate.overhangFt ?? 0) / candidate.spacingFt,
  candidate.spacingFt,
  candidate.steel.shape.designation,
];

/** The total order: steel per foot of bridge, fewer stringers, ratio to 1e-9, overhang over spacing, spacing, name. */
export function totalOrder(a: Candidate, b: Candidate): number {
  const [left, right] = [keys(a), keys(b)];
  const place = left.findIndex((key, index) => key !== right[index]);
  return place < 0 ? 0 : left[place] < right[place] ? -1 : 1;
}

/** The passing candidates in order, the best of each count and shape. */
export function bestOfEach(candidates: readonly Candidate[]): Candidate[] {
  const best = new Map<string, Candidate>();
  for (const candidate of candidates.filter(({ passes }) => passes).sort(totalOrder)) {
    const key = `${candidate.count} ${candidate.steel.shape.designation}`;
    if (!best.has(key)) best.set(key, candidate);
  }
  return [...best.values()];
}

/** The candidate with the smallest governing ratio, then by the total order; undefined when there is none. */
export function plainNearest(candidates: readonly Candidate[]): Candidate | undefined {
  return [...candidates].sort((a, b) =>
    a.governingRatio === b.governingRatio ? totalOrder(a, b) : a.governingRatio - b.governingRatio,
  )[0];
}

/** The neighbouring spacings of the grid, the shown one among them, at all of which a shape passes. */
export function plainRange(candidates: readonly Candidate[], chosen: Candidate, bridge: Bridge): [number, number] {
  const passing = new Set(
    candidates
      .filter(({ passes, count, steel }) => passes && count === chosen.count && steel.shape.designation === chosen.steel.shape.designation)
      .map(({ spacingFt }) => spacingFt),
  );
  const grid = plainLayouts(bridge)
    .filter(({ count }) => count === chosen.count)
    .map(({ spacingFt }) => spacingFt)
    .sort((a, b) => a - b);
  const at = grid.indexOf(chosen.spacingFt);
  let [from, to] = [at, at];
  while (passing.has(grid[from - 1])) from--;
  while (passing.has(grid[to + 1])) to++;
  return [grid[from], grid[to]];
}

/** What of an answer must equal plain enumeration: the candidate, its governing ratio, and every ratio of every check. */
export function figuresOf(assessment: Assessment): Record<string, unknown> {
  const ratios = assessment.stringers.flatMap(({ position, checks }) => checks.map(({ id, ratio }) => `${position} ${id} ${ratio}`));
  return {
    shape: assessment.shape,
    ...assessment.layout,
    passes: assessment.passes,
    governingRatio: assessment.governing.ratio,
    ratios: [...new Set(ratios)].filter((line) => !line.includes(" layout ")).sort(),
  };
}

/** The same of a candidate of plain enumeration. */
export function figuresOfCandidate({
  steel,
  count,
  spacingFt,
  overhangFt,
  passes,
  governingRatio,
  ratios,
  slots,
}: Candidate): Record<string, unknown> {
  const lines = slots.flatMap(({ position, id }, place) =>
    ratios[place] === -1 || id === "layout" ? [] : [`${position} ${id} ${ratios[place]}`],
  );
  return { shape: steel.shape.designation, count, spacingFt, overhangFt, passes, governingRatio, ratios: lines.sort() };
}
