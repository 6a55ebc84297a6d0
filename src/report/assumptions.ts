import type { Bridge } from "../bridge/bridge.js";
import { askedYieldStress } from "../bridge/yield-stress.js";
import { feetText, shown } from "./numbers.js";

/** Span below which the Alternate Military loading can govern over HS20, ft. Source: statics of the two. */
const MILITARY_GOVERNS_BELOW_FT = 40;

/** Every assumption an answer rests on, a sentence each, with the values in force. */
export function assumptionsOf(bridge: Bridge): string[] {
  const checks = bridge.specification === "lrfd" ? lrfdAssumptions(bridge) : lfdAssumptions(bridge);
  return [...deckAssumptions(bridge), ...loadAssumptions(bridge), ...checks, ...commonAssumptions(bridge)];
}

/** The assumptions under a live-load answer, which needs no stringers. */
export function loadsAssumptions(bridge: Bridge): string[] {
  return [
    "Simple span, one lane, whole axles, both directions, axles off the span left out; exact places, no stepping.",
    "No impact, except HL-93, whose figures hold 33 % on truck or tandem and the lane load.",
    "At each section every effect is at its own worst place of the load.",
    ...military(bridge),
  ];
}

function deckAssumptions(bridge: Bridge): string[] {
  const { deck, barriers, bracing } = bridge;
  const thickness = deck.thicknessIn === null ? "" : `${shown(deck.thicknessIn)} in `;
  const haunch = deck.kind === "concrete" ? `, haunch ${shown(deck.haunchWeightIn)} in over the flange in the weight` : "";
  const given = bridge.deadLoad;
  const list = [
    `Straight, unskewed simple span of ${feetText(bridge.spanFt)} ft, equal shapes at equal spacing; pieces ${feetText(bridge.spanFt + 2 * bridge.pieceOverlapFt)} ft long.`,
    deck.composite ? "Composite with the deck under all load but the first stage." : "Noncomposite: the deck adds weight and no strength.",
  ];
  if (given.stage1Klf === null) list.push(`Deck: ${thickness}${deck.kind}${haunch}; weight ${deckWeightText(bridge)}.`);
  else
    list.push(
      `Stage 1 dead load given: ${shown(given.stage1Klf)} kip/ft on each stringer; the shape and its miscellaneous steel are added.`,
    );
  const barrierText = `two of ${shown(barriers.weightKlf)} kip/ft, base ${feetText(barriers.baseFt)} ft`;
  if (deck.outToOutFt === null) {
    list.push(
      `Only a spacing is given: one interior stringer; deck and wearing surface on the spacing, a quarter of both barriers (${barrierText}); exterior stringers not checked.`,
    );
  } else {
    list.push(
      given.stage2Klf === null
        ? `Barriers: ${barrierText}, placed after the deck and shared equally by all stringers.`
        : `Stage 2 dead load given: ${shown(given.stage2Klf)} kip/ft on each stringer.`,
    );
    list.push(
      given.wearingKlf === null
        ? `Wearing surface ${shown(bridge.wearingPsf)} lb/ft2 on the roadway, shared equally by all stringers.`
        : `Wearing surface given: ${shown(given.wearingKlf)} kip/ft on each stringer.`,
    );
  }
  list.push(`Miscellaneous steel ${shown(bridge.steel.miscFraction * 100)} % of the shape.`);
  const asked = askedYieldStress(bridge);
  list.push(`Fy ${shown(asked.fyKsi)} ksi unless a list's row says otherwise.`);
  list.push(
    bracing.topFlange === "held" || deck.composite
      ? `Compression flange held by the deck in service; diaphragms at ${feetText(bracing.diaphragmSpacingFt)} ft alone while the deck is poured.`
      : `Compression flange braced by diaphragms at ${feetText(bracing.diaphragmSpacingFt)} ft, not by the deck.`,
  );
  return list;
}

function deckWeightText(bridge: Bridge): string {
  const { deckPsf, kind } = bridge.deck;
  if (deckPsf !== null) return `${shown(deckPsf)} lb/ft2 as given`;
  return `thickness times ${kind === "concrete" ? 150 : 50} lb/ft3`;
}

function loadAssumptions(bridge: Bridge): string[] {
  const { lanes, vehicle, distribution } = bridge.liveLoad;
  const laneSource = bridge.sources["liveLoad.lanes"] === "practice" ? "by the width of the roadway" : "as given";
  const list = [
    bridge.roadwayFt === null
      ? `Live load ${vehicle}; ${lanes >= 2 ? "two or more lanes" : "one lane"}.`
      : `Live load ${vehicle}; ${lanes} lane${lanes === 1 ? "" : "s"} ${laneSource} on ${feetText(bridge.roadwayFt)} ft of roadway.`,
    ...military(bridge),
    distribution === null
      ? distributionText(bridge)
      : `Distribution given: ${shown(distribution)} ${bridge.specification === "lrfd" ? "lanes" : "wheel lines"} per stringer for moment and shear, in place of the specification's.`,
    "Impact applies under every kind of deck, for the stringers are steel.",
    "Greatest dead and live effects are added, though they stand at slightly different sections (slightly conservative).",
    "All stringers are equal, so an exterior one is never weaker than an interior one.",
  ];
  return list;
}

function military(bridge: Bridge): string[] {
  if (bridge.liveLoad.vehicle !== "HS20-44" || bridge.spanFt >= MILITARY_GOVERNS_BELOW_FT) return [];
  return ["The Alternate Military loading of Interstate bridges is left out; it can govern under 40 ft (vehicle HS20+military)."];
}

function distributionText({ specification, deck }: Bridge): string {
  const trucks = "trucks 4 ft apart regardless of lane lines, curbs ignored for interior stringers (conservative)";
  if (specification === "lfd") {
    return `Live load to each stringer by Table 3.23.1 in wheel lines, the lever rule beyond its range and for exterior stringers, under concrete with the floor of 3.23.2.3.1.5 but for one lane loaded; ${trucks}.`;
  }
  const rule =
    deck.kind === "concrete"
      ? "the formulas of 4.6.2.2, the lever rule beyond their range, the rigid section as a minimum of exterior stringers"
      : "the larger column of Table 4.6.2.2.2a-1, the lever rule beyond it and for exterior stringers";
  return `Live load to each stringer in lanes by ${rule}; ${trucks}.`;
}

function lfdAssumptions(bridge: Bridge): string[] {
  const { adtt, fatigueDetail } = bridge.liveLoad;
  const traffic = adtt === null ? "truck traffic not given, taken as 2,500 a day or more" : `${shown(adtt)} trucks a day`;
  const list = [
    `Fatigue: HS20 truck, detail ${fatigueDetail === "C-stiffener" ? "C of a stiffener weld" : fatigueDetail}, redundant load paths from three stringers up, ${traffic}; checked at the extreme tension fibre; cycles of the lane loading are not checked.`,
  ];
  if (bridge.deck.composite) list.push(...compositeAssumptions(bridge));
  else {
    list.push(
      "Noncompact shapes take the braced noncompact or partially braced capacity; the straight line that 10.48.3 allows is not used (conservative).",
    );
  }
  if (bridge.deck.kind === "concrete") {
    list.push(
      `Deck pour: 1.3 times wet deck, steel and ${shown(bridge.pour.constructionPsf)} lb/ft2 on the bare shape (the factor is our choice); twisting of the fascia stringer by overhang brackets is not computed.`,
    );
  }
  return list;
}

function lrfdAssumptions(bridge: Bridge): string[] {
  const { adtt, fatigueDetail } = bridge.liveLoad;
  const traffic = adtt === null ? "truck traffic in one lane not given, infinite life checked" : `${shown(adtt)} trucks a day in one lane`;
  const list = [
    "Load modifier and resistance factors of flexure and shear 1.0; Strength I, Service II, Fatigue I or II.",
    `Fatigue: truck with rear axles 30 ft apart, one lane, detail ${fatigueDetail} at the bottom flange, one cycle a truck, ${traffic}.`,
  ];
  if (bridge.deck.composite) list.push(...compositeAssumptions(bridge));
  if (bridge.stringers.count === 2) list.push("Two stringers are a nonredundant load path; the specification asks for four.");
  if (bridge.deck.kind === "concrete") {
    const brackets =
      bridge.pour.lateralBendingKsi === 0
        ? "overhang brackets not covered"
        : `${shown(bridge.pour.lateralBendingKsi)} ksi of lateral bending as given, factored and amplified`;
    list.push(
      `Deck pour: the worse of 1.25 dead + 1.5 construction and 1.4 of both, ${shown(bridge.pour.constructionPsf)} lb/ft2, on the bare shape; ${brackets}.`,
    );
  }
  return list;
}

function compositeAssumptions({ deck }: Bridge): string[] {
  const ratio = deck.modularRatio === null ? "by the specification" : `${shown(deck.modularRatio)} as given`;
  return [
    `Composite: unshored, slab of f'c ${shown(deck.fcKsi ?? 0)} ksi less ${shown(deck.sacrificialIn)} in, haunch ${shown(deck.haunchSectionIn)} in in section properties, modular ratio ${ratio}, three times it for lasting load; the whole slab counts in elastic properties even if the axis lies in it (check prints what that overstates: about 1 % as a rule, more on short spans); reinforcement left out.`,
  ];
}

function commonAssumptions(bridge: Bridge): string[] {
  const list: string[] = [];
  if (bridge.deflection.use !== "off") {
    const use = bridge.deflection.use === "report" ? ", reported only" : "";
    const share =
      bridge.deck.outToOutFt === null
        ? "by the stringer's moment factor"
        : "all lanes loaded, shared equally by all stringers (presumes diaphragms)";
    list.push(`Live-load deflection at most span/${shown(bridge.deflection.spanOver)}${use}; ${share}.`);
  }
  list.push("Not covered: deck design, skew, sidewalk load, wind, earthquake, splices, bearings, substructure.");
  return list;
}
