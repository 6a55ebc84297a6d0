import type { Assessment } from "../answers/assessment.js";
import type { CheckAnswer } from "../answers/check.js";
import type { CountsAnswer } from "../answers/counts.js";
import type { LightestAnswer } from "../answers/lightest.js";
import type { LeftOut } from "../answers/stock.js";
import type { WhyNotLighter } from "../answers/why-not-lighter.js";
import type { Bridge, BridgeValues } from "../bridge/bridge.js";
import type { Shape } from "../catalogue/shape.js";
import type { LaneEffects, SectionEffects } from "../loads/live-load.js";
import type { Line, StringerAssessment } from "../specs/contract.js";
import { assumptionsOf, loadsAssumptions } from "./assumptions.js";
import { byHandLines } from "./by-hand.js";
import { CAUTION } from "./caution.js";
import { assumptionText, changeText, flippedText, restsOnText } from "./explanations.js";
import { leftOutText } from "./left-out.js";
import { advisoryLines } from "./text/assessment-lines.js";
import { noteText } from "./text/check.js";
import { countReason } from "./text/counts.js";
import type { InTheWay } from "./text/lightest.js";

/** Version of the JSON documents; it grows when a name or meaning changes. */
export const SCHEMA_VERSION = 1;

/** A JSON document as text; what is not finite becomes null. */
export function jsonText(document: unknown): string {
  return `${JSON.stringify(document, null, 2)}\n`;
}

function frame(command: string, bridge: Bridge, assumptions: readonly string[]): Record<string, unknown> {
  const { sources, ...inputs } = bridge;
  return {
    schemaVersion: SCHEMA_VERSION,
    command,
    specification: bridge.specification,
    inputs: inputs satisfies BridgeValues,
    sources,
    assumptions,
    caution: CAUTION,
  };
}

/** The document of `lightest`. */
export function lightestJson(bridge: Bridge, answer: LightestAnswer, inTheWay: InTheWay): unknown {
  const why = answer.whyNotLighter;
  return {
    ...frame("lightest", bridge, assumptionsOf(bridge)),
    examined: answer.examined,
    rankedBy: answer.rankedBy,
    withoutPrice: answer.withoutPrice,
    leftOut: answer.leftOut.map(leftOutJson),
    noLayout: inTheWay.length === 0 ? null : inTheWay,
    options: answer.options.map(({ rank, spacingRangeFt, assessment }) => ({
      rank,
      spacingRangeFt,
      assessment: assessmentJson(assessment),
    })),
    nearestMiss: answer.nearestMiss === null ? null : assessmentJson(answer.nearestMiss),
    whyNotLighter:
      why === null
        ? null
        : {
            lighterShapes: why.lighterShapes,
            failing: why.failing,
            nearest: why.nearest.map((one) => assessmentJson(one)),
            rescue: rescueJson(why),
          },
    byDepth: answer.byDepth.map((row) => ({ ...row, assessment: assessmentJson(row.assessment) })),
    restsOn: answer.restsOn.map((found) => ({
      assumption: assumptionText(found),
      flippedTo: flippedText(found),
      outcome: found.outcome,
      assessment: assessmentJson(found.assessment),
      instead: found.instead === null ? null : assessmentJson(found.instead),
      key: found.key,
      value: found.flippedTo,
      sentence: restsOnText(found, answer.rankedBy),
    })),
    byHand: answer.byHand === null ? [] : byHandLines(bridge, answer.byHand.assessment, answer.byHand.figures),
  };
}

const leftOutJson = (one: LeftOut): unknown => ({ ...one, reason: leftOutText(one) });

function rescueJson({ rescue }: WhyNotLighter): unknown {
  if (rescue === null) return null;
  const { assessment, change, lighterThanAnswer } = rescue;
  return { change: changeText(change), assessment: assessmentJson(assessment), lighterThanAnswer };
}

/** The document of `counts`. */
export function countsJson(bridge: Bridge, answer: CountsAnswer, inTheWay: InTheWay): unknown {
  return {
    ...frame("counts", bridge, assumptionsOf(bridge)),
    examined: answer.examined,
    leftOut: answer.leftOut.map(leftOutJson),
    noLayout: inTheWay.length === 0 ? null : inTheWay,
    counts: answer.counts.map((row) => ({
      count: row.count,
      best: row.best === null ? null : assessmentJson(row.best),
      reason: countReason(row),
      spacingRangeFt: row.spacingRangeFt,
      nearestMiss: row.nearestMiss === null ? null : assessmentJson(row.nearestMiss),
    })),
    lightestCount: answer.lightestCount,
    fewestWithin5Percent: answer.fewestWithin5Percent,
  };
}

/** The document of `check`, with every step of both stringers; the assessment is null when no layout fits. */
export function checkJson(bridge: Bridge, answer: CheckAnswer | null, inTheWay: InTheWay): unknown {
  return {
    ...frame("check", bridge, assumptionsOf(bridge)),
    noLayout: inTheWay.length === 0 ? null : inTheWay,
    layoutsTried: answer?.layoutsTried ?? 0,
    assessment:
      answer === null
        ? null
        : {
            ...assessmentJson(answer.assessment),
            stringers: answer.assessment.stringers.map((stringer) => ({ ...stringerJson(stringer), steps: stringer.lines.map(lineJson) })),
          },
  };
}

/** The document of `loads`. */
export function loadsJson(bridge: Bridge, live: LaneEffects, tenthPoints: readonly SectionEffects[]): unknown {
  const { momentOfTrain: _, endPlaces: __, lane: ___, ...loads } = live;
  return { ...frame("loads", bridge, loadsAssumptions(bridge)), loads: { ...loads, tenthPoints } };
}

/** The document of `sections`. */
export function sectionsJson(shapes: readonly Shape[], inList: number): unknown {
  return {
    schemaVersion: SCHEMA_VERSION,
    command: "sections",
    caution: CAUTION,
    inList,
    sections: shapes.map(({ designation, source, yieldStressKsi, bundled, ...figures }) => ({
      designation,
      file: source.file,
      line: source.line,
      bundled,
      yieldStressKsi,
      ...figures,
    })),
  };
}

function assessmentJson(assessment: Assessment): Record<string, unknown> {
  const { stringers, ...rest } = assessment;
  return { ...rest, advisories: advisoryLines(assessment), stringers: stringers.map(stringerJson) };
}

function stringerJson({ position, effects, checks, support, studs, notes }: StringerAssessment): Record<string, unknown> {
  return { position, effects, checks, support, studs, notes: notes.map(noteText) };
}

function lineJson(line: Line): unknown {
  switch (line.type) {
    case "step": {
      const { symbol, expression, unit, article, given } = line.formula;
      const numbers = Object.fromEntries(given.map((name, index) => [name, line.numbers[index]]));
      return { type: "step", symbol, expression, numbers, result: line.result, unit, article };
    }
    case "check":
      return { type: "check", id: line.check.id };
    default:
      return line;
  }
}
