import { readFileSync } from "node:fs";
import { ask, type Prepared, prepare, type Question } from "../../src/answers/question.js";
import { type Layer, readLayer } from "../../src/bridge/layers.js";
import { readShapes } from "../../src/catalogue/read-shapes.js";
import type { Shape } from "../../src/catalogue/shape.js";
import { readVehicles, type Vehicle } from "../../src/loads/vehicles.js";

const data = (name: string): string => readFileSync(new URL(`../../data/${name}`, import.meta.url), "utf8");

/** The shipped practice, vehicles and catalogue. */
export const PRACTICE: Layer = readLayer(data("practice.json"), "practice.json", "practice");
export const VEHICLES: readonly Vehicle[] = readVehicles(data("vehicles.json"), "vehicles.json", []);
export const CATALOGUE: readonly Shape[] = readShapes(data("w-shapes.csv"), "w-shapes.csv", { bundled: true }).shapes;

/** A nested bridge from dotted keys, as a bridge file would hold it. */
export function bridgeFile(values: Readonly<Record<string, unknown>>): string {
  const file: Record<string, unknown> = {};
  for (const [key, value] of Object.entries(values)) {
    const [group, name] = key.split(".") as [string, string | undefined];
    file[group] = name === undefined ? value : { ...(file[group] as object | undefined), [name]: value };
  }
  return JSON.stringify(file);
}

/** A question by keys of the bridge file over the shipped practice. */
export function questionOf(
  values: Readonly<Record<string, unknown>>,
  shapes: readonly Shape[] = CATALOGUE,
  vehicles: readonly Vehicle[] = VEHICLES,
): Question {
  return ask([PRACTICE, readLayer(bridgeFile(values), "bridge.json", "bridge")], "layout", shapes, vehicles);
}

/** The same, ready to be searched. */
export const preparedOf = (...given: Parameters<typeof questionOf>): Prepared => prepare(questionOf(...given));
