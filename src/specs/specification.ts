import type { Bridge } from "../bridge/bridge.js";
import type { Specification } from "./contract.js";
import { lfd } from "./lfd/lfd.js";
import { lrfd } from "./lrfd/lrfd.js";

/** The specification a bridge asks for. */
export function specificationOf(bridge: Bridge): Specification {
  return bridge.specification === "lrfd" ? lrfd : lfd;
}
