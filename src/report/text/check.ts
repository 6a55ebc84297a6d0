import type { CheckAnswer } from "../../answers/check.js";
import type { Bridge } from "../../bridge/bridge.js";
import type { Effects, Note, StringerAssessment, StudCount } from "../../specs/contract.js";
import { assumptionsOf } from "../assumptions.js";
import { feetText, ratioText, shown } from "../numbers.js";
import { checkTable, governingText, layoutText, stepLines, stockLines } from "./assessment-lines.js";
import { bridgeLines, closing, firstLine, type Style, WIDTH } from "./frame.js";
import { wrap } from "./table.js";

/** The answer to `check` as plain text: verdict, the checks of both stringers, then every step. */
export function checkText(bridge: Bridge, { assessment, layoutsTried }: CheckAnswer, style: Style): string {
  const { layout, source } = assessment;
  const overhang = layout.overhangFt === null ? "" : `, overhang ${feetText(layout.overhangFt)} ft`;
  const verdict = assessment.passes ? style.good("OK") : style.bad("NG");
  const lines = [
    style.strong(firstLine(bridge)),
    ...bridgeLines(bridge),
    "",
    `${assessment.shape} (${source.file}, line ${source.line}), Fy ${shown(assessment.fyKsi)} ksi, ${layoutText(assessment)} ft${overhang}: ${verdict}`,
    `Governing: ${governingText(assessment)}, ratio ${ratioText(assessment.governing.ratio)}`,
  ];
  lines.push(...stockLines(assessment).flatMap((sentence) => wrap(sentence, WIDTH, "")));
  if (layoutsTried > 1) {
    lines.push(`${layoutsTried} layouts tried; the one shown ${assessment.passes ? "ranks first" : "has the smallest governing ratio"}.`);
  }
  for (const stringer of assessment.stringers) {
    lines.push(
      "",
      style.strong(`${capital(stringer.position)} stringer: checks`),
      ...checkTable(stringer, style),
      ...supportLines(stringer),
    );
    lines.push(...stringer.notes.flatMap((note) => wrap(noteText(note), WIDTH, "")));
  }
  for (const stringer of assessment.stringers) {
    lines.push("", style.strong(`${capital(stringer.position)} stringer: calculation`), ...stepLines(stringer, style));
  }
  return [...lines, ...closing(assumptionsOf(bridge)), ""].join("\n");
}

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);

function supportLines({ support, effects, studs }: StringerAssessment): string[] {
  const needed = support.stiffenersNeeded ? "needed" : "not needed";
  return [
    ...wrap(
      `Bearing stiffeners ${needed}: factored shear ${shown(support.shearKip)} kip, none needed to ${shown(support.withoutStiffenersKip)} kip (${support.article}). By web yielding and crippling (LRFD D6.5) a bearing ${shown(support.bearingLengthNeededIn)} in long is enough without.`,
      WIDTH,
      "",
    ),
    ...wrap(
      `Reaction, unfactored: dead ${shown(effects.deadShearKip)} kip, live with impact ${shown(effects.liveShearKip)} kip. ${requiredText(effects)}`,
      WIDTH,
      "",
    ),
    ...(studs === null ? [] : wrap(studsText(studs), WIDTH, "")),
  ];
}

/** Studs by strength in words. */
export function studsText({ perHalfSpan, perStringer, strengthKip, forceKip, article }: StudCount): string {
  return `Studs by strength: ${perHalfSpan} in each half span, ${perStringer} a stringer (${shown(forceKip)} kip, ${shown(strengthKip)} kip a stud; ${article}); fatigue pitch not computed.`;
}

function requiredText({ requiredZIn3, requiredSIn3, plasticMomentKipFt, effectiveWidthIn }: Effects): string {
  if (requiredZIn3 !== null && requiredSIn3 !== null) {
    return `Required: Z ${shown(requiredZIn3)} in3 (flexure, if compact), S ${shown(requiredSIn3)} in3 (service).`;
  }
  return `Effective slab ${shown(effectiveWidthIn ?? 0)} in wide, plastic moment ${shown(plasticMomentKipFt ?? 0)} kip-ft.`;
}

/** A note of the calculation in words. */
export function noteText({ code, args }: Note): string {
  switch (code) {
    case "flexure-route":
      return {
        compact: "Flexure: compact section (10.48.1).",
        noncompact: "Flexure: braced noncompact section (10.48.2).",
        "partially-braced": "Flexure: partially braced section (10.48.4).",
      }[String(args[0])] as string;
    case "composite-route":
      return `Flexure: composite section, ${
        { plastic: "full plastic moment", reduced: "plastic moment reduced for ductility", "first-yield": "first-yield moment" }[
          String(args[0])
        ]
      }; plastic neutral axis in the ${args[1]}.`;
    case "distribution":
      return `Distribution: moment by ${args[0]}, axle over the support by ${args[1]}.`;
    case "distribution-lanes":
      return `Distribution, lanes: moment by ${args[0]}, shear by ${args[1]}.`;
    case "fatigue-state":
      return `Fatigue: ${args[0]}.`;
    case "brackets-not-covered":
      return "Deck pour: lateral bending by overhang brackets is not covered (pour.lateralBendingKsi 0).";
    case "deck-without-sacrificial":
      return `Deck: ${shown(Number(args[0]))} in without its sacrificial part; 9.7.1.1 asks for ${args[1]} in so counted, unless the owner approves.`;
    case "slab-in-tension":
      return `The neutral axis for live load lies in the slab: with its tensile part left out the section modulus at the bottom would be ${Number(args[0]).toFixed(1)} % less.`;
    case "outside-flexure-rules":
      return `Outside the flexure rules: bf/2tf ${shown(Number(args[0]))}, D/tw ${shown(Number(args[1]))}; no capacity is counted.`;
    default:
      return code;
  }
}
