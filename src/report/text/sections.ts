import { yieldByYearKsi } from "../../bridge/yield-stress.js";
import type { Shape } from "../../catalogue/shape.js";
import { CAUTION } from "../caution.js";
import { shown } from "../numbers.js";
import { type Style, WIDTH } from "./frame.js";
import { table, wrap } from "./table.js";

/** The answer to `sections` as plain text. */
export function sectionsText(shapes: readonly Shape[], inList: number, style: Style): string {
  const head = style.strong(`${shapes.length} of ${inList} shapes in the list in use, lightest first`);
  const right = (title: string) => ({ title, align: "right" as const });
  const rows = table(
    [
      { title: "shape", align: "left" },
      ...["lb/ft", "A in2", "d in", "bf in", "tw in", "tf in", "Ix in4", "Sx in3", "Zx in3", "Fy ksi"].map(right),
    ],
    shapes.map((shape) => [
      shape.designation,
      shown(shape.weightPlf),
      shown(shape.areaIn2),
      shown(shape.depthIn),
      shown(shape.flangeWidthIn),
      shown(shape.webThicknessIn),
      shown(shape.flangeThicknessIn),
      shown(shape.inertiaXIn4),
      shown(shape.sectionModulusXIn3),
      shown(shape.plasticModulusXIn3),
      yieldText(shape),
    ]),
  );
  const body = shapes.length === 0 ? ["No shape is left within these bounds."] : rows;
  return [head, "", ...body, "", ...wrap(`Caution: ${CAUTION}`, WIDTH, ""), ""].join("\n");
}

/** The row's own yield stress, or that of its year built, marked so. */
function yieldText({ yieldStressKsi, stock }: Shape): string {
  if (yieldStressKsi !== null) return shown(yieldStressKsi);
  return typeof stock?.yearBuilt === "number" ? `${yieldByYearKsi(stock.yearBuilt)} by year` : "-";
}
