import { ask, type Question } from "../answers/question.js";
import { type FlagValue, flagLayer, type Layer, readLayer } from "../bridge/layers.js";
import type { ResolveOptions } from "../bridge/resolve.js";
import { mergeLists } from "../catalogue/merge-lists.js";
import { readShapes } from "../catalogue/read-shapes.js";
import { designationKey, type Shape } from "../catalogue/shape.js";
import { InputError, type InputIssue } from "../errors.js";
import { readVehicles, type Vehicle } from "../loads/vehicles.js";
import { didYouMean } from "../nearest.js";
import { readShipped, readText } from "./files.js";
import type { Flags } from "./options.js";

/** Everything a command works from, read and checked. */
export interface Gathered {
  readonly question: Question;
  /** Remarks for stderr. */
  readonly remarks: readonly string[];
}

/** What a command needs beside the bridge itself. */
export interface Needs {
  readonly bridge: ResolveOptions["needs"];
  readonly shapes: boolean;
  /** A shape named on the command line, to be found in the list. */
  readonly shape?: string;
}

/** Flags that set one key of the bridge file. */
const KEY_OF_FLAG = {
  spec: ["--spec", "specification"],
  span: ["--span", "spanFt"],
  width: ["--width", "deck.outToOutFt"],
  count: ["--count", "stringers.count"],
  spacing: ["--spacing", "stringers.spacingFt"],
  grade: ["--grade", "steel.grade"],
  fy: ["--fy", "steel.fyKsi"],
  vehicle: ["--vehicle", "liveLoad.vehicle"],
  maxDepth: ["--max-depth", "steel.maxDepthIn"],
} as const;

/**
 * Reads every file and flag of a command.
 *
 * @throws {InputError} with the faults of all of them together
 */
export function gather(flags: Flags, needs: Needs): Gathered {
  const remarks: string[] = [];
  const { issues, attempt, file } = collector();
  const vehicles = gatherVehicles(flags, file, attempt);
  const shapes = needs.shapes ? gatherShapes(flags, file, attempt, remarks) : [];
  if (needs.shape !== undefined && issues.length === 0) requireShape(needs.shape, shapes, issues);
  const layers = gatherLayers(flags, file, issues);
  const question = attempt(() => ask(layers, needs.bridge, shapes, vehicles, needs.shape === undefined ? "limits" : "aside"), null);
  if (issues.length > 0 || question === null) throw new InputError(issues);
  return { question, remarks };
}

/** Reads and works on, keeping every fault met for one message at the end. */
function collector(): { readonly issues: InputIssue[]; readonly attempt: Attempt; readonly file: ReadFile } {
  const issues: InputIssue[] = [];
  return {
    issues,
    attempt: (work, instead) => {
      try {
        return work();
      } catch (error) {
        if (!(error instanceof InputError)) throw error;
        issues.push(...error.issues);
        return instead;
      }
    },
    file: (path) => {
      const reading = readText(path);
      if ("text" in reading) return reading.text;
      issues.push(reading.issue);
      return null;
    },
  };
}

type ReadFile = (path: string) => string | null;
type Attempt = <T>(work: () => T, instead: T) => T;

function gatherVehicles(flags: Flags, file: ReadFile, attempt: Attempt): readonly Vehicle[] {
  let vehicles = readVehicles(readShipped("vehicles.json"), "vehicles.json", []);
  for (const path of flags.vehicles ?? []) {
    const text = file(path);
    if (text !== null) vehicles = [...vehicles, ...attempt(() => readVehicles(text, path, vehicles), [])];
  }
  return vehicles;
}

function gatherShapes(flags: Flags, file: ReadFile, attempt: Attempt, remarks: string[]): readonly Shape[] {
  const all = readLists(flags, file, attempt, remarks);
  return all.length === 0 ? all : attempt(() => selectShapes(all, flags), []);
}

function readLists(flags: Flags, file: ReadFile, attempt: Attempt, remarks: string[]): readonly Shape[] {
  const bundled = (): readonly Shape[] => readShapes(readShipped("w-shapes.csv"), "w-shapes.csv", { bundled: true }).shapes;
  const lists = (flags.sections ?? ["bundled"]).map((path): readonly Shape[] => {
    if (path === "bundled") return bundled();
    const text = file(path);
    const list = text === null ? null : attempt(() => readShapes(text, path, { bundled: false }), null);
    remarks.push(...(list?.remarks ?? []));
    return list?.shapes ?? [];
  });
  return attempt(() => mergeLists(lists), []);
}

/**
 * The list in use with the patterns applied, for a command that lists shapes: leaving none is an answer there.
 *
 * @throws {InputError} with the faults of every list
 */
export function gatherList(flags: Flags): {
  readonly shapes: readonly Shape[];
  readonly inList: number;
  readonly remarks: readonly string[];
} {
  const remarks: string[] = [];
  const { issues, attempt, file } = collector();
  const all = readLists(flags, file, attempt, remarks);
  if (issues.length > 0) throw new InputError(issues);
  return { shapes: matching(all, flags), inList: all.length, remarks };
}

/** Shapes whose name matches the patterns of --shapes, if any, and none of --without. */
function matching(shapes: readonly Shape[], flags: Flags): readonly Shape[] {
  const matches = (patterns: readonly string[]) => {
    const expressions = patterns.map(patternExpression);
    return ({ designation }: Shape): boolean => expressions.some((expression) => expression.test(designationKey(designation)));
  };
  const wanted = flags.shapes === undefined ? shapes : shapes.filter(matches(flags.shapes));
  const unwanted = matches(flags.without ?? []);
  return wanted.filter((shape) => !unwanted(shape));
}

function selectShapes(shapes: readonly Shape[], flags: Flags): readonly Shape[] {
  const kept = matching(shapes, flags);
  if (kept.length > 0) return kept;
  const names = shapes.map(({ designation }) => designation);
  const hint = (flags.shapes ?? []).map((pattern) => didYouMean(pattern, names)).find((text) => text !== "") ?? "";
  const field = flags.shapes === undefined ? "--without" : "--shapes";
  throw new InputError([{ field, problem: `no shape of the list is left${hint}`, allowed: "a pattern such as W30X*" }]);
}

function patternExpression(pattern: string): RegExp {
  const escaped = designationKey(pattern).replace(/[.+^${}()|[\]\\]/g, "\\$&");
  return new RegExp(`^${escaped.replaceAll("*", ".*").replaceAll("?", ".")}$`);
}

function requireShape(name: string, shapes: readonly Shape[], issues: InputIssue[]): void {
  const key = designationKey(name);
  if (shapes.some(({ designation }) => designationKey(designation) === key)) return;
  const names = shapes.map(({ designation }) => designation);
  issues.push({
    field: "SHAPE",
    problem: `no shape "${name}" in the list${didYouMean(name, names)}`,
    allowed: `a designation of the list, such as ${names[0] ?? ""}`,
  });
}

function gatherLayers(flags: Flags, file: ReadFile, issues: InputIssue[]): Layer[] {
  const layers = [readLayer(readShipped("practice.json"), "practice.json", "practice")];
  const sources = [
    [flags.practice, "practice", "--practice"],
    [flags.bridge, "bridge", "--bridge"],
  ] as const;
  for (const [paths, source, flag] of sources) {
    if (paths !== undefined && paths.length > 1)
      issues.push({ field: flag, problem: `${paths.length} files are given`, allowed: "one file" });
    const text = paths === undefined ? null : file(paths[0]);
    if (paths !== undefined && text !== null) layers.push(readLayer(text, paths[0], source));
  }
  return [...layers, flagLayer(flagValues(flags, issues))];
}

function flagValues(flags: Flags, issues: InputIssue[]): FlagValue[] {
  const values: FlagValue[] = [];
  for (const [name, [flag, key]] of Object.entries(KEY_OF_FLAG)) {
    for (const text of flags[name as keyof typeof KEY_OF_FLAG] ?? []) values.push({ flag, key, text });
  }
  const words = new Set(flags.compositeWords ?? []);
  for (const word of words) values.push({ flag: word, key: "deck.composite", text: String(word === "--composite") });
  for (const text of flags.dead ?? []) {
    values.push({ flag: "--dead", key: "deadLoad.stage1Klf", text });
    values.push({ flag: "--dead", key: "deadLoad.stage2Klf", text: "0" });
    values.push({ flag: "--dead", key: "deadLoad.wearingKlf", text: "0" });
  }
  for (const setting of flags.set ?? []) {
    const equals = setting.indexOf("=");
    if (equals < 1) issues.push({ field: "--set", problem: `"${setting}"`, allowed: "KEY=VALUE, such as deck.thicknessIn=8" });
    else values.push({ flag: "--set", key: setting.slice(0, equals).trim(), text: setting.slice(equals + 1).trim() });
  }
  return values;
}
