import type { Bridge } from "../../bridge/bridge.js";
import type { LaneEffects, SectionEffects } from "../../loads/live-load.js";
import { loadsAssumptions } from "../assumptions.js";
import { feetText, shown } from "../numbers.js";
import { closing, type Style } from "./frame.js";
import { table } from "./table.js";

/** The answer to `loads` as plain text. */
export function loadsText(bridge: Bridge, live: LaneEffects, tenths: readonly SectionEffects[], style: Style): string {
  const inIt = live.includesImpact ? "dynamic allowance and lane load in it" : "no impact";
  return [
    style.strong(`${live.vehicle} on a simple span of ${feetText(live.spanFt)} ft; one lane, whole axles, ${inIt}`),
    "",
    `Greatest moment     ${shown(live.momentKipFt)} kip-ft at ${feetText(live.momentAtFt)} ft (${live.momentGoverning})`,
    `Greatest end shear  ${shown(live.shearKip)} kip (${live.shearGoverning})`,
    `Midspan deflection  ${shown(live.midspanDeflectionKipFt3)} kip-ft3 / EI (${live.deflectionGoverning})`,
    "",
    ...table(
      [
        { title: "x ft", align: "right" },
        { title: "moment kip-ft", align: "right" },
        { title: "shear kip", align: "right" },
        { title: "deflection x EI kip-ft3", align: "right" },
      ],
      tenths.map(({ xFt, momentKipFt, shearKip, deflectionKipFt3 }) => [
        feetText(xFt),
        shown(momentKipFt),
        shown(shearKip),
        shown(deflectionKipFt3),
      ]),
    ),
    ...closing(loadsAssumptions(bridge)),
    "",
  ].join("\n");
}
