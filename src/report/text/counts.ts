import type { CountRow, CountsAnswer } from "../../answers/counts.js";
import type { Bridge } from "../../bridge/bridge.js";
import { assumptionsOf } from "../assumptions.js";
import { feetText, shown } from "../numbers.js";
import { failingText, shortGoverning } from "./assessment-lines.js";
import { bridgeLines, closing, firstLine, type Style, WIDTH } from "./frame.js";
import { type InTheWay, leftOutLines, noLayoutLines } from "./lightest.js";
import { table, wrap } from "./table.js";

/** Why no shape passes at a count, in words; null when one does. */
export function countReason({ best, nearestMiss }: CountRow): string | null {
  if (best !== null) return null;
  if (nearestMiss === null) return "no shape can be used: too few pieces on hand, or flanges too wide for the layout";
  return `none passes; nearest ${nearestMiss.shape} at ${feetText(nearestMiss.layout.spacingFt)} ft: ${failingText(nearestMiss)}`;
}

/** The answer to `counts` as plain text. */
export function countsText(bridge: Bridge, answer: CountsAnswer, inTheWay: InTheWay, style: Style): string {
  const { layouts, shapes, candidates } = answer.examined;
  const lines = [style.strong(firstLine(bridge)), ...bridgeLines(bridge), ""];
  if (inTheWay.length > 0) lines.push(...noLayoutLines(inTheWay, style));
  else lines.push(...countTable(answer), ...reasons(answer, style), ...marks(answer));
  lines.push(...leftOutLines(answer.leftOut));
  lines.push("", `Examined: ${layouts} layouts x ${shapes} shapes = ${candidates} candidates.`);
  return [...lines, ...closing(assumptionsOf(bridge)), ""].join("\n");
}

function countTable(answer: CountsAnswer): string[] {
  return table(
    [
      { title: "count", align: "right" },
      { title: "S ft", align: "right" },
      { title: "over", align: "right" },
      { title: "shape", align: "left" },
      { title: "lb/ft", align: "right" },
      { title: "steel", align: "right" },
      { title: "psf", align: "right" },
      { title: "depth", align: "right" },
      { title: "defl", align: "right" },
      { title: "governed by", align: "left" },
    ],
    answer.counts.map(({ count, best }) => {
      const mark = `${count === answer.lightestCount ? "*" : ""}${count === answer.fewestWithin5Percent ? "+" : ""}`;
      if (best === null) return [`${count}`, "", "", "none"];
      return [
        `${mark} ${count}`,
        feetText(best.layout.spacingFt),
        feetText(best.layout.overhangFt ?? 0),
        best.shape,
        shown(best.weightPlf),
        shown(best.steelPlfOfBridge ?? 0),
        best.steel?.psfOfDeck?.toFixed(1) ?? "-",
        shown(best.depthIn),
        best.stringers[0].effects.deflectionIn.toFixed(2),
        shortGoverning(best),
      ];
    }),
  );
}

function reasons({ counts }: CountsAnswer, style: Style): string[] {
  return counts.flatMap((row) => {
    const reason = countReason(row);
    return reason === null ? [] : wrap(`${row.count} stringers: ${style.bad("NG")}, ${reason}.`, WIDTH, "");
  });
}

function marks({ lightestCount, fewestWithin5Percent }: CountsAnswer): string[] {
  if (lightestCount === null) return [];
  return wrap(
    `* the lightest (${lightestCount}); + the fewest stringers within 5 % of it (${fewestWithin5Percent}). S is the spacing, over the overhang; steel is lb per ft of bridge, psf all steel per ft2 of deck; depth and live-load deflection in inches; int and ext are the interior and exterior stringer.`,
    WIDTH,
    "",
  );
}
