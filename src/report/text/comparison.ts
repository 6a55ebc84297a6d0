import type { DifferingShape, ListComparison } from "../../answers/compare-lists.js";
import type { Shape } from "../../catalogue/shape.js";
import { CAUTION } from "../caution.js";
import { shown } from "../numbers.js";
import { type Style, WIDTH } from "./frame.js";
import { table, wrap } from "./table.js";

/** Differing shapes shown with their figures; --json and --csv give all. */
const SHOWN = 40;

/** The answer to `sections --against` as plain text. @param against the list compared with, as given */
export function comparisonText({ same, differing, onlyHere, onlyThere }: ListComparison, against: string, style: Style): string {
  const head = `Against ${against}: ${same} shapes alike, ${differing.length} with other figures, ${onlyHere.length} only here, ${onlyThere.length} only there`;
  return [
    ...wrap(head, WIDTH, "").map(style.strong),
    ...(differing.length === 0 ? [] : ["", "Same name, other figures", ...differingLines(differing)]),
    ...nameLines("Only here", onlyHere),
    ...nameLines("Only there", onlyThere),
    "",
    ...wrap(`Caution: ${CAUTION}`, WIDTH, ""),
    "",
  ].join("\n");
}

function differingLines(differing: readonly DifferingShape[]): string[] {
  const right = (title: string) => ({ title, align: "right" as const });
  const figure = (value: number | null): string => (value === null ? "-" : shown(value));
  const rows = differing
    .slice(0, SHOWN)
    .flatMap(({ designation, here, there, figures }) =>
      figures.map(({ column, here: one, there: other, deviation }, index) => [
        index === 0 ? designation : "",
        index === 0 ? `${here.line}/${there.line}` : "",
        column,
        figure(one),
        figure(other),
        deviation === null ? "" : `${deviation > 0 ? "+" : ""}${shown(Number((100 * deviation).toPrecision(2)))} %`,
      ]),
    );
  const lines = table(
    [
      { title: "shape", align: "left" },
      { title: "lines", align: "left" },
      { title: "figure", align: "left" },
      right("here"),
      right("there"),
      right("off"),
    ],
    rows,
  );
  return differing.length > SHOWN ? [...lines, `and ${differing.length - SHOWN} more shapes (--json, --csv FILE)`] : lines;
}

function nameLines(title: string, shapes: readonly Shape[]): string[] {
  return shapes.length === 0 ? [] : ["", title, ...wrap(shapes.map(({ designation }) => designation).join(", "), WIDTH, "  ")];
}
