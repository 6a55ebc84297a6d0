import type { AxleTrain } from "../../src/loads/axle-train.js";
import { readVehicles, type Vehicle, vehicleNamed } from "../../src/loads/vehicles.js";
import type { PointLoad } from "./direct-stiffness.js";
import { VEHICLES } from "./question.js";

/** A vehicle of the shipped file. */
export const shipped = (name: string): Vehicle => vehicleNamed(VEHICLES, name);

/** The first axle train of a shipped vehicle. */
export const trainOf = (name: string): AxleTrain => shipped(name).trains[0];

/** A vehicle as a user would hand it in. */
export function usersVehicle(entry: Readonly<Record<string, unknown>>): Vehicle {
  return readVehicles(JSON.stringify([entry]), "own-vehicles.json", VEHICLES)[0];
}

/** The axles of a train as loads, one of them at a given place and those behind it farther from the left bearing. */
export function placed(train: AxleTrain, axle: number, atFt: number): PointLoad[] {
  const behindFirst = train.axlesKip.map((_, index) => train.spacingsFt.slice(0, index).reduce((sum, gap) => sum + gap, 0));
  return train.axlesKip.map((kip, index) => ({ kip, atFt: atFt + behindFirst[index] - behindFirst[axle] }));
}
