import type { Specification } from "../contract.js";
import { CompositeLrfdStringers } from "./composite.js";
import { NoncompositeLrfdStringers } from "./noncomposite.js";

/** Load and resistance factor design. Source: AASHTO LRFD Bridge Design Specifications, 9th ed. (2020). */
export const lrfd: Specification = {
  name: "lrfd",
  title: "AASHTO LRFD Bridge Design Specifications, 9th ed. (2020)",
  prepare: (design, layout) =>
    design.bridge.deck.composite ? new CompositeLrfdStringers(design, layout) : new NoncompositeLrfdStringers(design, layout),
};
