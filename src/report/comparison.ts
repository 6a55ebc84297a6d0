import type { ListComparison } from "../answers/compare-lists.js";
import type { Shape } from "../catalogue/shape.js";
import { CAUTION } from "./caution.js";
import type { CsvRecord } from "./csv.js";
import { SCHEMA_VERSION } from "./json.js";

const placed = ({ designation, weightPlf, source }: Shape) => ({ designation, weightPlf, file: source.file, line: source.line });

/** The document of `sections --against`. @param against the list compared with, as given */
export function comparisonJson({ same, differing, onlyHere, onlyThere }: ListComparison, against: string): unknown {
  return {
    schemaVersion: SCHEMA_VERSION,
    command: "sections",
    caution: CAUTION,
    against,
    comparison: { same, differing, onlyHere: onlyHere.map(placed), onlyThere: onlyThere.map(placed) },
  };
}

/** One row a differing figure, then one a shape that only one list has. */
export function comparisonRows({ differing, onlyHere, onlyThere }: ListComparison): CsvRecord[] {
  const only =
    (what: string) =>
    (shape: Shape): CsvRecord => ({ designation: shape.designation, what, column: null, here: null, there: null, deviation: null });
  return [
    ...differing.flatMap(({ designation, figures }) =>
      figures.map((figure): CsvRecord => ({ designation, what: "other figure", ...figure })),
    ),
    ...onlyHere.map(only("only here")),
    ...onlyThere.map(only("only there")),
  ];
}
