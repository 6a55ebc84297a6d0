import * as z from "zod";
import { InputError, type InputIssue } from "../errors.js";
import { readJson } from "../read-json.js";
import { type AxleTrain, grossWeightKip } from "./axle-train.js";

/** A lane loading: uniform load and the concentrated load that goes with it for moment, and for shear. */
export interface LaneLoading {
  readonly uniformKlf: number;
  readonly momentKip: number;
  readonly shearKip: number;
}

/** A design or user's vehicle: its axle trains and lane loading, and how they count. */
export interface Vehicle {
  readonly name: string;
  readonly aliases: readonly string[];
  readonly source: string;
  readonly trains: readonly AxleTrain[];
  readonly lane: LaneLoading | null;
  /** Dynamic allowance on the trains when train and lane act together; null when the greater of them counts, without impact. */
  readonly dynamicAllowance: number | null;
  /** Lighter than H20: Group IA applies. Source: AASHTO Standard Specifications, 17th ed., Art. 3.5.1 and Table 3.22.1A. */
  readonly lighterThanH20: boolean;
}

/** Gross weight of the H20 truck, below which a user's vehicle counts as lighter than H20, kip. */
const H20_GROSS_KIP = 40;

const axlesKip = z.array(z.number().positive().max(300)).min(1).max(60);
const spacingsFt = z.array(z.number().positive().max(200)).max(59);
const train = z.strictObject({ name: z.string().min(1).max(40), axlesKip, spacingsFt, deflection: z.boolean().default(true) });
const common = {
  name: z.string().min(1).max(60),
  aliases: z.array(z.string().min(1).max(60)).optional(),
  source: z.string().max(200).optional(),
  lane: z
    .strictObject({
      uniformKlf: z.number().min(0).max(10),
      momentKip: z.number().min(0).max(300),
      shearKip: z.number().min(0).max(300),
    })
    .optional(),
  together: z.strictObject({ dynamicAllowance: z.number().min(0).max(1) }).optional(),
  lighterThanH20: z.boolean().optional(),
};
const withTrains = z.strictObject({ ...common, trains: z.array(train).min(1).max(10) });
const withAxles = z.strictObject({ ...common, axlesKip, spacingsFt: spacingsFt.default([]) });

const FORM =
  'a list of objects with "name", and "axlesKip" and "spacingsFt" (or "trains", each with name, axlesKip, spacingsFt); ' +
  'optional: "aliases", "source", "lane" {uniformKlf, momentKip, shearKip}, "together" {dynamicAllowance}, "lighterThanH20"';

/**
 * Reads vehicles from JSON.
 *
 * @param text a JSON list; axles in kip (above 0, at most 300), spacings in ft (above 0, at most 200), one fewer than axles
 * @param file its name, for faults
 * @param known vehicles already there, whose names a file may not take
 * @throws {InputError} naming every fault
 */
export function readVehicles(text: string, file: string, known: readonly Vehicle[]): readonly Vehicle[] {
  const read = readJson(text);
  if ("fault" in read) throw new InputError([{ file, ...read.fault, allowed: FORM }]);
  const content = read.value;
  if (!Array.isArray(content)) throw new InputError([{ file, problem: "the file does not hold a list", allowed: FORM }]);
  const issues: InputIssue[] = [];
  const vehicles: Vehicle[] = [];
  const taken = new Set(known.flatMap(({ name, aliases }) => [name, ...aliases]).map((name) => name.toLowerCase()));
  content.forEach((entry: unknown, index) => {
    const vehicle = readVehicle(entry, index, file, issues);
    if (vehicle === null) return;
    for (const name of [vehicle.name, ...vehicle.aliases]) {
      if (taken.has(name.toLowerCase())) {
        issues.push({ file, field: vehicle.name, problem: `the name "${name}" is taken`, allowed: "a name of its own" });
      }
      taken.add(name.toLowerCase());
    }
    vehicles.push(vehicle);
  });
  if (issues.length > 0) throw new InputError(issues);
  return vehicles;
}

function readVehicle(entry: unknown, index: number, file: string, issues: InputIssue[]): Vehicle | null {
  const form = typeof entry === "object" && entry !== null && "trains" in entry ? withTrains : withAxles;
  const read = form.safeParse(entry);
  if (!read.success) {
    for (const issue of read.error.issues) {
      const place = [`vehicle ${index + 1}`, ...issue.path].join(".");
      issues.push({ file, field: place, problem: issue.message, allowed: FORM });
    }
    return null;
  }
  const data = read.data;
  const trains = "trains" in data ? data.trains : [{ name: "truck", axlesKip: data.axlesKip, spacingsFt: data.spacingsFt }];
  const sound = trains.every((one) => one.spacingsFt.length === one.axlesKip.length - 1);
  if (!sound) {
    issues.push({ file, field: data.name, problem: "spacings do not match the axles", allowed: "one spacing fewer than axles" });
    return null;
  }
  return {
    name: data.name,
    aliases: data.aliases ?? [],
    source: data.source ?? file,
    trains,
    lane: data.lane ?? null,
    dynamicAllowance: data.together?.dynamicAllowance ?? null,
    lighterThanH20: data.lighterThanH20 ?? Math.max(...trains.map(grossWeightKip)) < H20_GROSS_KIP,
  };
}

/**
 * The vehicle of a name or alias, case ignored.
 *
 * @throws {RangeError} if there is none: names are checked when the bridge is resolved
 */
export function vehicleNamed(vehicles: readonly Vehicle[], name: string): Vehicle {
  const key = name.toLowerCase();
  const found = vehicles.find((vehicle) => [vehicle.name, ...vehicle.aliases].some((known) => known.toLowerCase() === key));
  if (found === undefined) throw new RangeError(`no vehicle named ${name}`);
  return found;
}
