import type { InputIssue } from "../errors.js";
import { didYouMean } from "../nearest.js";
import { readJson } from "../read-json.js";
import type { Source } from "./bridge.js";
import { FIELDS, KEYS } from "./fields.js";

/** The values one source gives, by dotted key, checked one by one, with the faults met on the way. */
export interface Layer {
  readonly source: Source;
  readonly values: ReadonlyMap<string, unknown>;
  /** Where a key's value stands, for faults found later. */
  readonly place: (key: string) => Pick<InputIssue, "file" | "field">;
  readonly issues: readonly InputIssue[];
}

/** A flag as typed: which key of the bridge file it sets, and its text. */
export interface FlagValue {
  /** The flag as the user knows it, such as `--span`. */
  readonly flag: string;
  readonly key: string;
  readonly text: string;
}

/** Keys a practice may not hold, for they belong to one bridge alone. */
const NOT_IN_PRACTICE: readonly string[] = ["spanFt", "deck.outToOutFt"];

/**
 * Reads a practice or a bridge file.
 *
 * @param text the JSON text
 * @param file the file's name, for faults
 * @param source "practice" or "bridge"
 * @returns the values that are sound, and a fault for each that is not: unknown keys, wrong kinds, out of range, malformed JSON
 */
export function readLayer(text: string, file: string, source: "practice" | "bridge"): Layer {
  const values = new Map<string, unknown>();
  const issues: InputIssue[] = [];
  const place = (key: string): Pick<InputIssue, "file" | "field"> => ({ file, field: key });
  const read = readJson(text);
  if ("fault" in read) {
    issues.push({ file, ...read.fault, allowed: "one JSON object with the keys of a bridge file" });
    return { source, values, place, issues };
  }
  walk(read.value, "");
  return { source, values, place, issues };

  function walk(value: unknown, path: string): void {
    if (typeof value !== "object" || value === null || Array.isArray(value)) {
      const shown = path === "" ? "the file does not hold an object" : `${show(value)} stands where an object is needed`;
      issues.push({ file, ...(path !== "" && { field: path }), problem: shown, allowed: `an object with ${keysUnder(path).join(", ")}` });
      return;
    }
    for (const [name, inner] of Object.entries(value)) {
      const key = path === "" ? name : `${path}.${name}`;
      const field = Object.hasOwn(FIELDS, key) ? FIELDS[key] : undefined;
      if (field !== undefined) {
        if (source === "practice" && NOT_IN_PRACTICE.includes(key)) {
          issues.push({ ...place(key), problem: "a practice cannot give this", allowed: "this key in a bridge file or as a flag" });
        } else keep(key, inner);
      } else if (keysUnder(key).length > 0) walk(inner, key);
      else issues.push({ ...place(key), problem: `unknown key${suggestKey(name, path)}`, allowed: keysUnder(path).join(", ") });
    }
  }

  function keep(key: string, value: unknown): void {
    const checked = checkValue(key, value);
    if ("issue" in checked) issues.push({ ...place(key), ...checked.issue });
    else values.set(key, checked.value);
  }
}

/**
 * Reads the flags that set keys of the bridge file.
 *
 * @param flags as typed; a key set twice with different text is a fault
 */
export function flagLayer(flags: readonly FlagValue[]): Layer {
  const values = new Map<string, unknown>();
  const issues: InputIssue[] = [];
  const setBy = new Map<string, FlagValue>();
  for (const { flag, key, text } of flags) {
    const field = Object.hasOwn(FIELDS, key) ? FIELDS[key] : undefined;
    if (field === undefined) {
      issues.push({ field: flag, problem: `unknown key "${key}"${didYouMean(key, KEYS)}`, allowed: KEYS.join(", ") });
      continue;
    }
    const before = setBy.get(key);
    if (before !== undefined && before.text !== text) {
      issues.push({ field: flag, problem: `${key} is set twice, to "${before.text}" and to "${text}"`, allowed: "each value once" });
    }
    setBy.set(key, { flag, key, text });
    const checked = checkValue(key, field.fromText(text));
    if ("issue" in checked) issues.push({ field: flag, ...checked.issue, allowed: field.allowed.replace(/, or null$/, "") });
    else values.set(key, checked.value);
  }
  return { source: "flag", values, issues, place: (key) => ({ field: setBy.get(key)?.flag ?? key }) };
}

function checkValue(key: string, value: unknown): { readonly value: unknown } | { readonly issue: InputIssue } {
  const field = FIELDS[key];
  if (field === undefined) throw new RangeError(`no such key: ${key}`);
  const result = field.schema.safeParse(value);
  if (result.success) return { value: result.data };
  const hint = result.error.issues.find((issue) => issue.message.includes("is metric"))?.message ?? deepHint(result.error.issues);
  const names = field.allowed.includes(" ") && !field.allowed.includes(", ") ? "" : didYouMean(String(value), field.allowed.split(", "));
  return { issue: { problem: hint ?? `${show(value)}${typeof value === "string" ? names : ""}`, allowed: field.allowed } };
}

/** A message about metric units may sit inside the branches of a union. */
function deepHint(issues: readonly unknown[]): string | undefined {
  const text = JSON.stringify(issues);
  const found = /"(\\"[^"]*\\" is metric; [^"]*)"/.exec(text);
  return found?.[1]?.replaceAll('\\"', '"');
}

function keysUnder(path: string): string[] {
  const start = path === "" ? "" : `${path}.`;
  const names = KEYS.filter((key) => key.startsWith(start)).map((key) => key.slice(start.length).split(".")[0] as string);
  return [...new Set(names)];
}

function suggestKey(name: string, path: string): string {
  const here = didYouMean(name, keysUnder(path));
  return here === "" ? didYouMean(name, KEYS) : here;
}

function show(value: unknown): string {
  const text = typeof value === "string" ? `"${value}"` : (JSON.stringify(value) ?? String(value));
  return text.length > 60 ? `${text.slice(0, 57)}...` : text;
}
