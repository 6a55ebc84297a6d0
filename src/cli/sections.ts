import { compareLists } from "../answers/compare-lists.js";
import { type SectionFilter, sections } from "../answers/sections.js";
import { readInches } from "../bridge/lengths.js";
import type { Shape } from "../catalogue/shape.js";
import { InputError, type InputIssue } from "../errors.js";
import { comparisonJson, comparisonRows } from "../report/comparison.js";
import { sectionRows } from "../report/csv.js";
import { sectionsJson } from "../report/json.js";
import { comparisonText } from "../report/text/comparison.js";
import { sectionsText } from "../report/text/sections.js";
import { checkTargets, deliver } from "./deliver.js";
import { gatherList } from "./gather.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import type { Flags } from "./options.js";

const GREATEST = { depthIn: 80, weightPlf: 2000, fyKsi: 70 } as const;

/** `leanspan sections`: what is in the list in use. */
export async function runSections(flags: Flags, io: Io): Promise<ExitCode> {
  const filter = readFilter(flags);
  const { shapes, inList, remarks } = gatherList(flags);
  await checkTargets(flags);
  for (const remark of remarks) io.stderr(`leanspan: ${remark}\n`);
  const listed = sections(shapes, filter);
  if (flags.against !== undefined) return compare(listed, filter, flags, flags.against, io);
  await deliver(
    {
      text: () => sectionsText(listed, inList, io.style),
      json: () => sectionsJson(listed, inList),
      rows: () => sectionRows(listed),
    },
    flags,
    io,
  );
  return listed.length > 0 ? EXIT.found : EXIT.nothing;
}

/** The list in use beside another, both within the same bounds. */
async function compare(here: readonly Shape[], filter: SectionFilter, flags: Flags, against: string, io: Io): Promise<ExitCode> {
  const other = gatherList({ ...flags, sections: [against] });
  for (const remark of other.remarks) io.stderr(`leanspan: ${remark}\n`);
  const comparison = compareLists(here, sections(other.shapes, filter));
  await deliver(
    {
      text: () => comparisonText(comparison, against, io.style),
      json: () => comparisonJson(comparison, against),
      rows: () => comparisonRows(comparison),
    },
    flags,
    io,
  );
  return EXIT.found;
}

function readFilter(flags: Flags): SectionFilter {
  const issues: InputIssue[] = [];
  const bound = (texts: string[] | undefined, flag: string, max: number, unit: string): number | null => {
    if (texts === undefined) return null;
    const reading = texts.length === 1 ? readInches(texts[0]) : { problem: `${texts.length} values are given` };
    const value = "value" in reading ? reading.value : Number.NaN;
    if (!(value > 0 && value <= max)) {
      const problem = "problem" in reading ? reading.problem : `"${texts[0]}"`;
      issues.push({ field: flag, problem, allowed: `one number above 0, to ${max} ${unit}` });
    }
    return value;
  };
  const filter = {
    minDepthIn: bound(flags.minDepth, "--min-depth", GREATEST.depthIn, "in"),
    maxDepthIn: bound(flags.maxDepth, "--max-depth", GREATEST.depthIn, "in"),
    minWeightPlf: bound(flags.minWeight, "--min-weight", GREATEST.weightPlf, "lb/ft"),
    maxWeightPlf: bound(flags.maxWeight, "--max-weight", GREATEST.weightPlf, "lb/ft"),
    fyKsi: bound(flags.fy, "--fy", GREATEST.fyKsi, "ksi"),
  };
  const order = (low: number | null, high: number | null, flag: string): void => {
    if (low !== null && high !== null && low > high)
      issues.push({ field: flag, problem: `${low} is above the greatest, ${high}`, allowed: `at most ${high}` });
  };
  order(filter.minDepthIn, filter.maxDepthIn, "--min-depth");
  order(filter.minWeightPlf, filter.maxWeightPlf, "--min-weight");
  if (issues.length > 0) throw new InputError(issues);
  return filter;
}
