import type { Layout } from "../bridge/layouts.js";
import type { Steel } from "../bridge/yield-stress.js";
import { impactFraction, laneMoment, momentUnderAxle, momentUnderAxleAndLane } from "../loads/formulas.js";
import { STEEL_MODULUS_KSI } from "../units.js";
import type { AssessmentRecorder, Design } from "./contract.js";

/** Writes down what a stringer's calculation starts from: bridge, layout, shape. */
export function recordGiven(
  { bridge }: Design,
  layout: Layout,
  curbInsideFt: number | null,
  { shape, fyKsi }: Steel,
  recorder: AssessmentRecorder,
): void {
  const { deck, barriers, steel, pour } = bridge;
  const name = shape.designation;
  recorder.topic("section");
  recorder.value("L", bridge.spanFt, "ft", "span");
  recorder.value("S", layout.spacingFt, "ft", "stringer spacing");
  if (layout.count !== null) recorder.value("Nb", layout.count, "-", "stringers");
  if (layout.overhangFt !== null) recorder.value("o", layout.overhangFt, "ft", "overhang");
  if (curbInsideFt !== null) recorder.value("de", curbInsideFt, "ft", "web of the outer stringer to the curb face");
  if (bridge.roadwayFt !== null) recorder.value("wr", bridge.roadwayFt, "ft", "clear roadway");
  recorder.value("NL", bridge.liveLoad.lanes, "-", "lanes");
  recorder.value("Fy", fyKsi, "ksi", "yield stress");
  recorder.value("w", shape.weightPlf, "lb/ft", name);
  recorder.value("A", shape.areaIn2, "in2", name);
  recorder.value("d", shape.depthIn, "in", name);
  recorder.value("bf", shape.flangeWidthIn, "in", name);
  recorder.value("tf", shape.flangeThicknessIn, "in", name);
  recorder.value("tw", shape.webThicknessIn, "in", name);
  recorder.value("Ix", shape.inertiaXIn4, "in4", name);
  recorder.value("Sx", shape.sectionModulusXIn3, "in3", name);
  recorder.value("Zx", shape.plasticModulusXIn3, "in3", name);
  recorder.value("ry", shape.radiusYIn, "in", name);
  recorder.value("kdes", shape.kDesignIn, "in", `${name}, face to toe of fillet`);
  recorder.value("J", shape.torsionJIn4, "in4", name);
  recorder.value("h/tw", shape.webSlenderness, "-", "clear of the fillets, as the list prints it; for comparison with D/tw");
  if (deck.thicknessIn !== null) recorder.value("t", deck.thicknessIn, "in", "deck, total thickness");
  recorder.value("thw", deck.haunchWeightIn, "in", "haunch in the weight");
  recorder.value("wb", barriers.weightKlf, "kip/ft", "one barrier");
  recorder.value("pw", bridge.wearingPsf, "lb/ft2", "wearing surface");
  if (deck.deckPsf !== null) recorder.value("p", deck.deckPsf, "lb/ft2", "deck");
  recorder.value("pf", deck.formsPsf, "lb/ft2", "forms that stay in place");
  recorder.value("c", steel.miscFraction, "-", "miscellaneous steel, fraction of the shape");
  recorder.value("q", pour.constructionPsf, "lb/ft2", "construction load at the pour");
  recorder.value("a", bridge.pieceOverlapFt, "ft", "piece beyond the bearing at either end");
  if (deck.fcKsi !== null) recorder.value("fc", deck.fcKsi, "ksi", "f'c of the deck");
  if (deck.composite) recorder.value("ds", bridge.studs.diameterIn, "in", "stud");
  recorder.value("N", bridge.bearing.lengthIn, "in", "bearing length");
  recorder.value("ko", bridge.deflection.spanOver, "-", "span over allowed deflection");
  recorder.value("E", STEEL_MODULUS_KSI, "ksi", "steel");
}

/** Writes down the greatest effects of one lane and the impact. */
export function recordLaneEffects({ bridge, live, vehicle }: Design, impact: number, recorder: AssessmentRecorder): void {
  recorder.topic("live-load");
  const train = live.momentOfTrain;
  if (train !== null) {
    const { resultantKip: R, atFt: x, eccentricityFt: e, earlierAxlesKipFt: Me } = train;
    recorder.value("R", R, "kip", `axles on the span: ${vehicle.name} ${live.momentGoverning}`);
    recorder.value("x", x, "ft", "place of the axle the moment stands under");
    recorder.value("e", e, "ft", "place of the resultant minus place of that axle");
    recorder.value("Me", Me, "kip-ft", "axles before that one, about it");
    if (live.includesImpact) {
      const wl = live.lane?.uniformKlf ?? 0;
      recorder.value("wl", wl, "kip/ft", "uniform lane load; the axles hold the dynamic allowance");
      recorder.step(momentUnderAxleAndLane, live.momentKipFt, R, bridge.spanFt, x, e, Me, wl);
    } else recorder.step(momentUnderAxle, live.momentKipFt, R, bridge.spanFt, x, e, Me);
  } else if (live.lane !== null) {
    recorder.step(laneMoment, live.momentKipFt, live.lane.uniformKlf, bridge.spanFt, live.lane.momentKip);
  }
  recorder.value("VLL", live.shearKip, "kip", `end shear of one lane: ${vehicle.name} ${live.shearGoverning}`);
  recorder.value("Y", live.midspanDeflectionKipFt3, "kip-ft3", `EI times midspan deflection of one lane: ${live.deflectionGoverning}`);
  if (!live.includesImpact) recorder.step(impactFraction, impact, bridge.spanFt);
}
