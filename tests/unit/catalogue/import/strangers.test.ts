// Lists written as strangers write them, each of which was once read wrongly or sent back without need.
import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { importList } from "../../../../src/catalogue/import/import-list.js";

const imported = (name: string) => importList(readFileSync(new URL(`../../../fixtures/lists/${name}`, import.meta.url)), name);
const headersOf = ({ summary }: Awaited<ReturnType<typeof imported>>) =>
  Object.fromEntries([...summary.reading.columns].map(([field, { header, unit }]) => [field, `${header} in ${unit.name}`]));

describe("strangers' lists", () => {
  // The right half of the page would be lost in silence.
  it("two tables side by side are sent back", async () => {
    await expect(imported("side-by-side.csv")).rejects.toThrow(/column 9 "Shape": a second table stands beside the first/);
  });

  it("a and e are web and flange where A is called Section", async () => {
    const list = await imported("french-letters.csv");
    expect(headersOf(list)).toMatchObject({
      webThicknessIn: "a (mm) in mm",
      flangeThicknessIn: "e (mm) in mm",
      areaIn2: "Section (cm2) in cm2",
    });
    expect([list.summary.accepted, list.summary.refusedCount]).toEqual([7, 0]);
  });

  it("depths in cm and plates in mm; marks T0 to T14 are no tees", async () => {
    const list = await imported("centimetres-and-millimetres.csv");
    expect([list.summary.accepted, list.summary.refusedCount]).toEqual([15, 0]);
    expect(list.shapes[0].depthIn).toBeCloseTo(35.9, 1);
    expect(list.shapes[0].webThicknessIn).toBeCloseTo(0.625, 2);
  });

  it("powers of ten in the units row, w for the web", async () => {
    const list = await imported("scaled-units-row.csv");
    expect(headersOf(list)).toMatchObject({
      inertiaXIn4: "Ix in 10^6 mm4",
      torsionJIn4: "J in 10^3 mm4",
      warpingCwIn6: "Cw in 10^9 mm6",
      webThicknessIn: "w in mm",
    });
    expect([list.summary.accepted, list.summary.refusedCount, list.summary.warningCount]).toEqual([15, 0, 0]);
  });

  it("old beams with tapered flanges are accepted, the channel among them refused", async () => {
    const { summary } = await imported("old-capitals.csv");
    expect([summary.accepted, summary.warningCount]).toEqual([9, 0]);
    expect(summary.refused).toEqual([{ line: 13, reason: "a channel, not an I-shape" }]);
  });

  it("units behind every figure", async () => {
    const { summary, shapes } = await imported("units-behind-figures.csv");
    expect([summary.accepted, summary.refusedCount]).toEqual([15, 0]);
    expect(shapes[0].stock?.usableLengthFt).toBeCloseTo(12.5 / 0.3048, 9);
    expect(shapes[3].stock?.quantity).toBe(4);
  });

  it("a nominal depth beside the depth is not taken for it", async () => {
    const { shapes } = await imported("nominal-depth-first.csv");
    expect(shapes.map(({ depthIn }) => depthIn)).toEqual([35.9, 32.9, 29.7, 26.7, 23.9, 20.8]);
  });

  it("a detailing k, larger than the fillet, is left unread and said so", async () => {
    const { summary } = await imported("detailing-k.csv");
    expect(summary.reading.columns.has("kDesignIn")).toBe(false);
    expect(summary.reading.remarks.join()).toContain("detailing distance");
    expect([summary.accepted, summary.warningCount]).toEqual([15, 0]);
  });

  it("web and flange under each other's header are sent back", async () => {
    const text = readFileSync(new URL("../../../fixtures/lists/units-row.csv", import.meta.url), "utf8").replace("tw,tf", "tf,tw");
    await expect(importList(text, "swapped.csv")).rejects.toThrow(/do not fit the dimensions|the figures do not tell which/);
  });
});
