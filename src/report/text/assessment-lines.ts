import type { Assessment } from "../../answers/assessment.js";
import type { Topic } from "../../formula.js";
import type { Check, Line, StringerAssessment } from "../../specs/contract.js";
import { feetText, ratioText, shown } from "../numbers.js";
import { type Style, WIDTH } from "./frame.js";
import { table } from "./table.js";

/** Stringers and spacing in words: "4 at 8.5", or the spacing alone. */
export function layoutText({ layout }: Assessment): string {
  return layout.count === null ? `at ${feetText(layout.spacingFt)}` : `${layout.count} at ${feetText(layout.spacingFt)}`;
}

/** The governing check in words: "exterior flexure". */
export function governingText({ governing }: Assessment): string {
  return `${governing.position} ${governing.id}`;
}

/** The same for a narrow column, with the ratio: "ext flexure 0.93". */
export function shortGoverning({ governing }: Assessment): string {
  const id = governing.id === "live-load-deflection" ? "deflection" : governing.id;
  return `${governing.position.slice(0, 3)} ${id} ${ratioText(governing.ratio)}`;
}

/** What is said of the pieces on hand and of old steel: a sentence each. */
export function stockLines({ shape, stock, fyKsi, fySource }: Assessment): string[] {
  const lines: string[] = [];
  if (fySource === "year built" && stock !== null) {
    lines.push(
      `${shape}: Fy ${shown(fyKsi)} ksi by the year built, ${stock.yearBuilt} (steel of unknown make, values from memory); test a coupon.`,
    );
  }
  const [flange, web] = [stock?.flangeLossIn ?? 0, stock?.webLossIn ?? 0];
  if (flange > 0 || web > 0) {
    lines.push(
      `${shape}: checked with ${shown(flange)} in off the outer face of each flange and ${shown(web)} in off the web; properties recomputed from what is left, the weight kept.`,
    );
  }
  const hand = [
    stock?.quantity == null ? "" : `${stock.quantity} pieces`,
    stock?.usableLengthFt == null ? "" : `${feetText(stock.usableLengthFt)} ft long`,
    stock?.place == null ? "" : stock.place,
  ].filter((part) => part !== "");
  if (hand.length > 0) lines.push(`${shape} on hand: ${hand.join(", ")}.`);
  return lines;
}

/** Required checks that an assessment fails: "flexure 1.08, overload 1.02", the worse position of each. */
export function failingText(assessment: Assessment): string {
  const worst = new Map<string, number>();
  for (const { checks } of assessment.stringers) {
    for (const { id, kind, ok, ratio } of checks) {
      if (kind !== "advisory" && !ok)
        worst.set(id, Math.max(worst.get(id) ?? 0, Number.isFinite(ratio) ? ratio : Number.POSITIVE_INFINITY));
    }
  }
  return [...worst].map(([id, ratio]) => `${id} ${ratioText(ratio)}`).join(", ");
}

/** Advisories that an assessment does not meet, each once. */
export function advisoryLines(assessment: Assessment): string[] {
  const seen = new Map<string, string>();
  for (const { position, checks } of assessment.stringers) {
    for (const check of checks) {
      if (check.kind !== "advisory" || check.ok) continue;
      const key = `${check.id} ${check.article}`;
      if (!seen.has(key)) seen.set(key, `${check.id}: ${advisoryWords(check)}${check.id === "overhang" ? ` (${position})` : ""}`);
    }
  }
  return [...seen.values()];
}

function advisoryWords({ id, demand, capacity, unit, article }: Check): string {
  const [required, provided] = [`${shown(demand)} ${unit}`, `${shown(capacity)} ${unit}`];
  switch (id) {
    case "diaphragm-spacing":
      return `diaphragms at ${required}, at most ${provided} (${article})`;
    case "overhang":
      return `${required} is beyond ${provided}; twisting of the fascia stringer at the pour is not computed`;
    case "lane-step":
      return `the roadway is ${provided} short of carrying one lane more (${article})`;
    case "layout":
      return `${article}: ${required} against ${provided}${article.startsWith("practice") ? ", as explicitly given" : ""}`;
    case "distribution-sum":
      return `the factors of all stringers add up to ${provided}, the lanes bring ${required}`;
    case "depth":
    case "handling":
    case "deck-thickness":
      return `${provided} where ${required} is advised (${article})`;
    default:
      return `${required} against ${provided} (${article})`;
  }
}

/** The checks of one stringer as a table: id, demand, capacity, unit, ratio, mark, article. */
export function checkTable({ checks }: StringerAssessment, style: Style): string[] {
  const rows = checks.map((check) => [
    check.id,
    check.kind,
    shown(check.demand),
    shown(check.capacity),
    check.unit,
    ratioText(check.ratio),
    check.ok ? "OK" : "NG",
    check.article,
  ]);
  const lines = table(
    [
      { title: "check", align: "left" },
      { title: "kind", align: "left" },
      { title: "demand", align: "right" },
      { title: "capacity", align: "right" },
      { title: "unit", align: "left" },
      { title: "ratio", align: "right" },
      { title: "", align: "left" },
      { title: "article", align: "left" },
    ],
    rows,
  );
  return lines.map((line, index) => (index > 0 && !checks[index - 1].ok ? line.replace(" NG ", ` ${style.bad("NG")} `) : line));
}

const TOPIC_WORDS: Readonly<Record<Topic, string>> = {
  section: "Given",
  "live-load": "Live load, one lane",
  "dead-load": "Dead load that the shape does not change",
  distribution: "Distribution to the stringer",
  effects: "Load effects",
  "composite-section": "Composite section",
  flexure: "Flexure",
  shear: "Shear",
  overload: "Overload",
  "service-ii": "Service II",
  deflection: "Live-load deflection",
  fatigue: "Fatigue",
  "deck-pour": "Deck pour on the bare shape",
  studs: "Studs by strength",
  supports: "Web at the supports",
  advisories: "Advisories",
};

/** Every step of one stringer's calculation: symbol, formula, numbers put in, result, unit, article. */
export function stepLines({ lines }: StringerAssessment, style: Style): string[] {
  return lines.flatMap((line) => oneStep(line, style));
}

function oneStep(line: Line, style: Style): string[] {
  switch (line.type) {
    case "topic":
      return ["", style.strong(TOPIC_WORDS[line.topic])];
    case "value":
      return aligned(`  ${line.symbol} = ${shown(line.value)}${unitText(line.unit)}`, line.from);
    case "step": {
      const { symbol, expression, unit, article } = line.formula;
      const put = putIn(expression, line.formula.given, line.numbers);
      const result = `${shown(line.result)}${unitText(unit)}`;
      const whole = `  ${symbol} = ${expression} = ${put} = ${result}`;
      if (whole.length + article.length + 2 <= WIDTH) return aligned(whole, article);
      return [...aligned(`  ${symbol} = ${expression}`, article), `    = ${put}`, `    = ${result}`];
    }
    case "check": {
      const { id, demand, capacity, unit, ratio, ok, article, kind } = line.check;
      const mark = ok ? style.good("OK") : style.bad("NG");
      const note = kind === "advisory" ? ", advisory" : "";
      return aligned(`  -> ${id}: ${shown(demand)} / ${shown(capacity)}${unitText(unit)} = ${ratioText(ratio)} ${mark}${note}`, article);
    }
  }
}

const unitText = (unit: string): string => (unit === "-" ? "" : ` ${unit}`);

function aligned(left: string, right: string): string[] {
  const gap = WIDTH - left.length - right.length;
  return gap >= 2 ? [left + " ".repeat(gap) + right] : [left, right.padStart(WIDTH)];
}

/** The expression with numbers in place of symbols. */
function putIn(expression: string, given: readonly string[], numbers: readonly number[]): string {
  const values = new Map(given.map((name, index) => [name, numbers[index]]));
  return expression.replace(/[A-Za-z][A-Za-z0-9]*/g, (name) => {
    const value = values.get(name);
    if (value === undefined) return name;
    return value < 0 ? `(${shown(value)})` : shown(value);
  });
}
