// Bridge and Highway Structure Rehabilitation and Repair: Table 4.5, p. 164 (HS20 truck, tandem), the text of p. 167 (truck and lane
// together) and Table 6.7, p. 251 (H20). One lane, no impact. All seen. Tolerance: the printed rounding, but where noted.
//
// Tables of this kind are where a designer looks a moment up: if ours were another, he would be right to trust neither.
import { describe, expect, it } from "vitest";
import { laneEffects, tenthPoints } from "../../src/loads/live-load.js";
import { publishedRows, rounding } from "../support/published.js";
import { shipped, trainOf, usersVehicle } from "../support/vehicles.js";

/** The HS20 truck without its lane loading. */
const truckAlone = usersVehicle({ name: "Truck alone", ...axlesOf("HS20-44") });

function axlesOf(name: string) {
  const { axlesKip, spacingsFt } = trainOf(name);
  return { axlesKip, spacingsFt };
}

interface TruckRow {
  readonly span_ft: number;
  readonly truck_moment_kip_ft: number;
  readonly tandem_midspan_moment_kip_ft: number;
  readonly truck_shear_kip: number;
  readonly tandem_shear_kip: number;
}

describe("Table 4.5 (seen)", () => {
  const rows = publishedRows<TruckRow>("rehabilitation-book-table-4-5.csv");

  it("is read in full", () => {
    expect(rows).toHaveLength(12);
  });

  it.each(rows.map((row) => [row.span_ft, row] as const))("%f ft", (L, row) => {
    const truck = laneEffects(truckAlone, L);
    const tandem = laneEffects(shipped("Tandem"), L);
    // The book's own formula prints its figures; the exact absolute maximum is 0.02 % from it.
    const book = (18 * (L - 1.55) * (L - 14)) / L;
    expect(Math.abs(book - row.truck_moment_kip_ft)).toBeLessThanOrEqual(rounding(2));
    expect(Math.abs(truck.momentKipFt / book - 1)).toBeLessThanOrEqual(0.0002);
    // The book prints the tandem at midspan: one axle there, the other 4 ft off.
    expect(Math.abs(tenthPoints(shipped("Tandem"), L)[5].momentKipFt - row.tandem_midspan_moment_kip_ft)).toBeLessThanOrEqual(rounding(1));
    expect(Math.abs(truck.shearKip - row.truck_shear_kip)).toBeLessThanOrEqual(rounding(2));
    expect(Math.abs(tandem.shearKip - row.tandem_shear_kip)).toBeLessThanOrEqual(rounding(2));
  });
});

interface H20Row {
  readonly span_ft: number;
  readonly governing_moment_kip_ft: number;
  readonly governing_shear_kip: number | null;
}

describe("Table 6.7, H20 (seen)", () => {
  const rows = publishedRows<H20Row>("rehabilitation-book-table-6-7.csv");

  it("is read in full", () => {
    expect(rows).toHaveLength(23);
    expect(rows.filter(({ governing_shear_kip }) => governing_shear_kip !== null)).toHaveLength(20);
  });

  it.each(rows.map((row) => [row.span_ft, row] as const))("%f ft", (L, row) => {
    const { momentKipFt, shearKip } = laneEffects(shipped("H20-44"), L);
    expect(Math.abs(momentKipFt - row.governing_moment_kip_ft)).toBeLessThanOrEqual(rounding(2));
    if (row.governing_shear_kip !== null) expect(Math.abs(shearKip - row.governing_shear_kip)).toBeLessThanOrEqual(rounding(2));
  });
});

describe("p. 167, end shear of truck and lane together, no impact (seen)", () => {
  /** HL-93's truck and lane with no dynamic allowance. */
  const together = usersVehicle({
    name: "Truck and lane",
    ...axlesOf("HS20-44"),
    lane: { uniformKlf: 0.64, momentKip: 0, shearKip: 0 },
    together: { dynamicAllowance: 0 },
  });

  it.each([
    [130, 108.43],
    [140, 112],
    [150, 115.52],
    [160, 119],
    [170, 122.44],
    [180, 125.86],
    [190, 129.26],
  ])("%f ft: %f kip", (L, printed) => {
    const { shearKip } = laneEffects(together, L);
    expect(shearKip).toBeCloseTo(72 - 672 / L + 0.32 * L, 9);
    // The book cuts after the second decimal (170 ft: 122.447 is printed 122.44).
    expect(Math.floor(shearKip * 100 + 1e-6) / 100).toBe(printed);
  });
});
