import type { Assessment } from "../../answers/assessment.js";
import type { DepthRow } from "../../answers/by-depth.js";
import type { LightestAnswer } from "../../answers/lightest.js";
import type { LeftOut } from "../../answers/stock.js";
import type { WhyNotLighter } from "../../answers/why-not-lighter.js";
import type { Bridge } from "../../bridge/bridge.js";
import { assumptionsOf } from "../assumptions.js";
import { byHandLines } from "../by-hand.js";
import { changeText, restsOnText } from "../explanations.js";
import { leftOutText } from "../left-out.js";
import { feetText, ratioText, shown } from "../numbers.js";
import { advisoryLines, failingText, governingText, layoutText, shortGoverning, stockLines } from "./assessment-lines.js";
import { bridgeLines, bullet, closing, firstLine, type Style, WIDTH } from "./frame.js";
import { table, wrap } from "./table.js";

/** Shapes left out that are named one by one. */
const LEFT_OUT_SHOWN = 8;

/** Limits that leave no layout, as data of `layoutsOf`. */
export type InTheWay = readonly { readonly key: string; readonly limit: number; readonly trials: number }[];

/** The answer to `lightest` as plain text. */
export function lightestText(bridge: Bridge, answer: LightestAnswer, inTheWay: InTheWay, style: Style): string {
  const { layouts, shapes, candidates } = answer.examined;
  const lines = [style.strong(firstLine(bridge)), ...bridgeLines(bridge), ""];
  if (answer.options.length === 0) lines.push(...nothing(answer.nearestMiss, inTheWay, style));
  else lines.push(...optionTable(answer), ...orderLines(answer), ...ofStock(answer), ...remarks(answer.options[0].assessment));
  if (answer.whyNotLighter !== null) lines.push("", ...whyNotLighterLines(answer.whyNotLighter, answer.rankedBy, style));
  if (answer.byDepth.length > 0)
    lines.push("", style.strong(answer.rankedBy === "cost" ? "Cheapest by depth" : "Lightest by depth"), ...depthTable(answer));
  if (answer.restsOn.length > 0) {
    lines.push("", style.strong("Rests on"), ...answer.restsOn.flatMap((found) => bullet(restsOnText(found, answer.rankedBy))));
  }
  if (answer.byHand !== null) {
    const { assessment, figures } = answer.byHand;
    lines.push("", style.strong("By hand"), ...byHandLines(bridge, assessment, figures).flatMap(bullet));
  }
  lines.push(...leftOutLines(answer.leftOut));
  lines.push("", `Examined: ${layouts} layouts x ${shapes} shapes = ${candidates} candidates.`);
  return [...lines, ...closing(assumptionsOf(bridge)), ""].join("\n");
}

function optionTable({ options }: LightestAnswer): string[] {
  const range = ([from, to]: readonly [number, number]): string => (from === to ? "" : `${feetText(from)}-${feetText(to)}`);
  return table(
    [
      { title: "#", align: "right" },
      { title: "stringers", align: "left" },
      { title: "passes at", align: "left" },
      { title: "shape", align: "left" },
      { title: "lb/ft", align: "right" },
      { title: "steel", align: "right" },
      { title: "kip", align: "right" },
      { title: "depth", align: "right" },
      { title: "governed by", align: "left" },
    ],
    options.map(({ rank, assessment, spacingRangeFt }) => [
      String(rank),
      layoutText(assessment),
      range(spacingRangeFt),
      assessment.shape,
      shown(assessment.weightPlf),
      shown(assessment.steelPlfOfBridge ?? assessment.weightPlf),
      assessment.steel === null ? "-" : assessment.steel.totalKip.toFixed(1),
      shown(assessment.depthIn),
      shortGoverning(assessment),
    ]),
  );
}

function remarks(best: Assessment): string[] {
  const overhang = best.layout.overhangFt === null ? "" : ` Overhang ${feetText(best.layout.overhangFt)} ft.`;
  const lines = [
    ...wrap(
      best.layout.count === null
        ? "Spacing in ft; steel is lb per ft of the stringer; depth in inches."
        : `Spacings in ft; steel is lb per ft of bridge, kip all steel with pieces at full length and miscellaneous steel; depth in inches; int and ext are the interior and exterior stringer.${overhang}`,
      WIDTH,
      "",
    ),
  ];
  const advisories = advisoryLines(best);
  if (advisories.length > 0) {
    lines.push("", `Advisories for ${best.shape} (reported, not required)`, ...advisories.flatMap((text) => wrap(text, WIDTH, "  ")));
  }
  const studs = Math.max(0, ...best.stringers.map((stringer) => stringer.studs?.perStringer ?? 0));
  const supports = best.stringers.filter(({ support }) => support.stiffenersNeeded);
  lines.push(
    "",
    supports.length === 0
      ? `Bearing stiffeners: none needed (${best.stringers[0].support.article}).`
      : `Bearing stiffeners: needed at the ${supports.map(({ position }) => position).join(" and ")} stringers (${supports[0].support.article}).`,
  );
  if (studs > 0) lines.push(`Studs by strength: ${studs} a stringer at most; fatigue pitch not computed.`);
  return lines;
}

function nothing(nearest: Assessment | null, inTheWay: InTheWay, style: Style): string[] {
  if (inTheWay.length > 0) return noLayoutLines(inTheWay, style);
  if (nearest === null) return [style.bad("Nothing passes: no shape is left to try.")];
  return [
    style.bad("Nothing passes."),
    ...wrap(
      `Nearest: ${layoutText(nearest)} ft, ${nearest.shape}, ${governingText(nearest)} at ${ratioText(nearest.governing.ratio)}. It fails: ${failingText(nearest)}.`,
      WIDTH,
      "",
    ),
  ];
}

/** Shapes of the list that are not offered: how many, and the first of them with their reasons. */
export function leftOutLines(leftOut: readonly LeftOut[]): string[] {
  if (leftOut.length === 0) return [];
  const first = leftOut.slice(0, LEFT_OUT_SHOWN).map((one) => `  ${one.shape} (line ${one.line}): ${leftOutText(one)}`);
  const more = leftOut.length > LEFT_OUT_SHOWN ? [`  and ${leftOut.length - LEFT_OUT_SHOWN} more (all in --json)`] : [];
  return ["", `Left out of the list: ${leftOut.length}`, ...first, ...more];
}

/** What the list says of the shapes shown, each once. */
function ofStock({ options }: LightestAnswer): string[] {
  const sentences = new Set(options.flatMap(({ assessment }) => stockLines(assessment)));
  return [...sentences].flatMap((sentence) => wrap(sentence, WIDTH, ""));
}

function orderLines({ rankedBy, withoutPrice, options }: LightestAnswer): string[] {
  if (rankedBy === "cost") {
    const costs = options.map(({ rank, assessment }) => `${rank}: ${shown(assessment.costPerFtOfBridge ?? 0)}`);
    return wrap(`Ranked by cost of the steel per ft of bridge: ${costs.join(", ")}.`, WIDTH, "");
  }
  if (withoutPrice.length === 0) return [];
  return wrap(`Ranked by weight, for these that pass have no price: ${withoutPrice.slice(0, LEFT_OUT_SHOWN).join(", ")}.`, WIDTH, "");
}

function depthTable({ byDepth, rankedBy, options }: LightestAnswer): string[] {
  const extra = ({ assessment, extraPlfOfBridge }: DepthRow): number =>
    rankedBy === "cost" ? (assessment.costPerFtOfBridge ?? 0) - (options[0].assessment.costPerFtOfBridge ?? 0) : extraPlfOfBridge;
  return table(
    [
      { title: "nominal in", align: "right" },
      { title: "shape", align: "left" },
      { title: "stringers", align: "left" },
      { title: "lb/ft", align: "right" },
      { title: rankedBy === "cost" ? "extra cost" : "extra", align: "right" },
      { title: "governed by", align: "left" },
    ],
    byDepth.map((row) => [
      shown(row.nominalDepthIn),
      row.assessment.shape,
      layoutText(row.assessment),
      shown(row.assessment.weightPlf),
      shown(extra(row)),
      shortGoverning(row.assessment),
    ]),
  );
}

/** Says which limits leave no layout. */
export function noLayoutLines(inTheWay: InTheWay, style: Style): string[] {
  const what = inTheWay.map(({ key, limit, trials }) => `${key} ${shown(limit)}${trials === 0 ? "" : ` (stops ${trials} trials)`}`);
  return [style.bad("No layout fits this deck."), ...wrap(`In the way: ${what.join("; ")}.`, WIDTH, "")];
}

function whyNotLighterLines(why: WhyNotLighter, rankedBy: "weight" | "cost", style: Style): string[] {
  const less = rankedBy === "cost" ? "cheaper" : "lighter";
  const lines = [style.strong(`Why not ${less}`)];
  if (why.lighterShapes === 0) return [...lines, `No shape of the list is ${less}.`];
  const failing = Object.entries(why.failing)
    .sort((a, b) => b[1] - a[1])
    .map(([id, count]) => `${count} in ${id}`);
  lines.push(...wrap(`On the first layout ${why.lighterShapes} shapes are ${less} and fail: ${failing.join(", ")}. Nearest:`, WIDTH, ""));
  lines.push(
    ...table(
      [
        { title: "  shape", align: "left" },
        { title: "lb/ft", align: "right" },
        { title: "fails", align: "left" },
      ],
      why.nearest.map((assessment) => [`  ${assessment.shape}`, shown(assessment.weightPlf), failingText(assessment)]),
    ),
    ...rescueLines(why, less),
  );
  return lines;
}

function rescueLines({ rescue, nearest }: WhyNotLighter, word: string): string[] {
  if (rescue === null) return wrap(`No single change lets ${nearest[0]?.shape ?? "one"} pass.`, WIDTH, "");
  const { assessment, change, lighterThanAnswer } = rescue;
  const weight = shown(assessment.steelPlfOfBridge ?? assessment.weightPlf);
  const less = `${lighterThanAnswer ? "" : "not "}${word} than the answer`;
  return wrap(
    `${assessment.shape} would pass with ${changeText(change)}: ${shortGoverning(assessment)}, steel ${weight} lb/ft of bridge, ${less}.`,
    WIDTH,
    "",
  );
}
