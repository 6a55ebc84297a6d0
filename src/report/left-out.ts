import type { LeftOut } from "../answers/stock.js";
import { feetText, shown } from "./numbers.js";

/** Why one shape of the list is not offered, a phrase. */
export function leftOutText({ code, needed, there }: LeftOut): string {
  switch (code) {
    case "too-deep":
      return `${shown(needed)} in deep, the bridge allows ${shown(there)} in`;
    case "too-short":
      return `pieces ${feetText(there)} ft long, ${feetText(needed)} ft needed`;
    case "too-few":
      return `${there} piece${there === 1 ? "" : "s"} on hand, ${needed} needed at least`;
    case "nothing-left":
      return "no sound plate is left";
  }
}
