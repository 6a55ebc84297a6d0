import type { Bridge } from "../bridge/bridge.js";
import type { Specification } from "./contract.js";
import { lfd } from "./lfd/lfd.js";

/**
 * The specification a bridge asks for.
 *
 * @throws {RangeError} for one that is not built: resolving the bridge refuses it first
 */
export function specificationOf(bridge: Bridge): Specification {
  if (bridge.specification !== "lfd") throw new RangeError(`no checks for ${bridge.specification}`);
  return lfd;
}
