import type { Assessment } from "../answers/assessment.js";
import type { Bridge } from "../bridge/bridge.js";
import { GROUP_I_LIVE, GROUP_IA_LIVE } from "../specs/lfd/load-factors.js";
import { feetText, shown } from "./numbers.js";

/**
 * Four lines that anyone can repeat on a calculator, for the governing stringer: w, wL^2/8, the tabulated live moment times factor and
 * impact, and the Z or S required against the shape's.
 *
 * @param shape figures of the shape: Zx and Sx, in3
 */
export function byHandLines(
  bridge: Bridge,
  assessment: Assessment,
  shape: { readonly plasticModulusXIn3: number; readonly sectionModulusXIn3: number },
): string[] {
  const stringer = assessment.stringers.find(({ position }) => position === assessment.governing.position) ?? assessment.stringers[0];
  const { effects, checks } = stringer;
  const L = feetText(bridge.spanFt);
  const w = effects.deadStage1Klf + effects.deadStage2Klf + effects.deadWearingKlf;
  const MD = effects.momentStage1KipFt + effects.momentStage2KipFt + effects.momentWearingKipFt;
  const lighter = effects.oneLaneLiveMomentKipFt;
  const groupIA = lighter !== null && GROUP_IA_LIVE * lighter > GROUP_I_LIVE * effects.liveMomentKipFt;
  const ML = groupIA ? lighter : effects.liveMomentKipFt;
  const factor = groupIA ? (effects.oneLaneDistributionMoment ?? 0) : effects.distributionMoment;
  const lanes = groupIA ? ", one lane loaded (Group IA)" : "";
  const flexure = checks.find(({ id }) => id === "flexure");
  const compact = flexure?.article === "10.48.1";
  const lrfd = effects.distributionPer === "lane";
  const need = requiredText();
  return [
    `w = ${shown(effects.deadStage1Klf)} (deck and steel) + ${shown(effects.deadStage2Klf)} (barriers) + ${shown(effects.deadWearingKlf)} (wearing) = ${shown(w)} kip/ft on the ${stringer.position} stringer`,
    `wL^2/8 = ${shown(w)} x ${L}^2 / 8 = ${shown(MD)} kip-ft dead moment`,
    effects.distributionPer === "lane"
      ? `Live: ${shown(effects.liveMomentPerLaneKipFt)} kip-ft (${bridge.liveLoad.vehicle}, one lane, dynamic allowance and lane load in it) x ${shown(factor)} lanes = ${shown(ML)} kip-ft`
      : `Live: ${shown(effects.liveMomentPerLaneKipFt)} kip-ft (${bridge.liveLoad.vehicle}, one lane, no impact: a moment table or leanspan loads) / 2 x ${shown(factor)} wheel lines x ${shown(1 + effects.impact)} impact = ${shown(ML)} kip-ft${lanes}`,
    need,
  ];

  function requiredText(): string {
    const { requiredZIn3, requiredSIn3 } = effects;
    const strength = lrfd
      ? `1.25 x ${shown(MD - effects.momentWearingKipFt)} + 1.50 x ${shown(effects.momentWearingKipFt)} + 1.75 x ${shown(ML)}`
      : `1.3 x (${shown(MD)} + ${groupIA ? "2.20" : "1.67"} x ${shown(ML)})`;
    if (compact && requiredZIn3 !== null) {
      return `Z: 12 x ${strength} / ${shown(assessment.fyKsi)} = ${shown(requiredZIn3)} in3 required (flexure), ${assessment.shape} has Zx ${shown(shape.plasticModulusXIn3)} in3`;
    }
    const against = flexure?.unit === "ksi" ? "by staged stresses" : `against ${shown(flexure?.capacity ?? 0)} kip-ft`;
    const moment = `flexure: Mu = ${strength} = ${shown(effects.factoredMomentKipFt)} kip-ft ${against}`;
    if (requiredSIn3 === null) return moment;
    const [live, check] = lrfd ? ["1.30", "Service II"] : [groupIA ? "2.20" : "5/3", "overload"];
    return `S: 12 x (${shown(MD)} + ${live} x ${shown(ML)}) / (0.80 x ${shown(assessment.fyKsi)}) = ${shown(requiredSIn3)} in3 required (${check}), ${assessment.shape} has Sx ${shown(shape.sectionModulusXIn3)} in3; ${moment}`;
  }
}
