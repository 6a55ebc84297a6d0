import type { Specification } from "../contract.js";
import { CompositeStringers } from "./composite.js";
import { NoncompositeStringers } from "./noncomposite.js";

/** Load factor design. Source: AASHTO Standard Specifications, 17th ed. (2002), Divisions 3 and 10. */
export const lfd: Specification = {
  name: "lfd",
  title: "AASHTO Standard Specifications, 17th ed. (2002), load factor design",
  prepare: (design, layout) =>
    design.bridge.deck.composite ? new CompositeStringers(design, layout) : new NoncompositeStringers(design, layout),
};
