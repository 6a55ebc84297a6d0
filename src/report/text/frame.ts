import type { Bridge } from "../../bridge/bridge.js";
import { CAUTION } from "../caution.js";
import { feetText, shown } from "../numbers.js";
import { wrap } from "./table.js";

/** Width within which text keeps where it can. */
export const WIDTH = 80;

/** Marks words for a terminal; plain text gets them back unchanged. */
export interface Style {
  readonly good: (text: string) => string;
  readonly bad: (text: string) => string;
  readonly strong: (text: string) => string;
}

/** No marks at all. */
export const PLAIN: Style = { good: (text) => text, bad: (text) => text, strong: (text) => text };

/** First line of an answer: specification and edition, composite or not, deck, span. */
export function firstLine(bridge: Bridge): string {
  const { deck } = bridge;
  const thickness = deck.thicknessIn === null ? "" : `${shown(deck.thicknessIn)} in `;
  const action = deck.composite ? "composite" : "noncomposite";
  const edition = bridge.specification === "lrfd" ? "LRFD, AASHTO 9th ed. (2020)" : "LFD, AASHTO Standard Specs 17th ed. (2002)";
  return `${edition}; ${action}; ${thickness}${deck.kind}; ${feetText(bridge.spanFt)} ft`;
}

/** Title lines under the first: what the bridge is called, how wide it is. */
export function bridgeLines(bridge: Bridge): string[] {
  const { outToOutFt } = bridge.deck;
  const width =
    outToOutFt === null
      ? `one interior stringer at ${feetText(bridge.stringers.spacingFt ?? 0)} ft`
      : `deck ${feetText(outToOutFt)} ft wide, roadway ${feetText(bridge.roadwayFt ?? 0)} ft, ${bridge.liveLoad.lanes} lane${bridge.liveLoad.lanes === 1 ? "" : "s"}`;
  return [...(bridge.title === "" ? [] : [bridge.title]), `${width}, ${bridge.liveLoad.vehicle}`];
}

/** The closing part of an answer: assumptions, then the caution. */
export function closing(assumptions: readonly string[]): string[] {
  return ["", "Assumptions", ...assumptions.flatMap((text) => bullet(text)), "", ...wrap(`Caution: ${CAUTION}`, WIDTH, "")];
}

/** A sentence as an item of a list. */
export function bullet(text: string): string[] {
  const [first, ...rest] = wrap(text, WIDTH, "  ");
  return [`- ${first.trimStart()}`, ...rest];
}
