import type { InputIssue } from "./errors.js";

/** A JSON text understood, or what is wrong with it and on which line. */
export type JsonReading = { readonly value: unknown } | { readonly fault: Pick<InputIssue, "line" | "problem"> };

/**
 * Reads a JSON text, a leading byte-order mark left aside.
 *
 * @returns the value; or the fault with its line, from 1
 */
export function readJson(text: string): JsonReading {
  const body = text.replace(/^\uFEFF/, "");
  try {
    return { value: JSON.parse(body) };
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    const position = /position (\d+)/.exec(message)?.[1];
    const before = position === undefined ? body : body.slice(0, Number(position));
    return { fault: { line: before.split("\n").length, problem: `not JSON: ${message.replace(/ in JSON at position \d+.*$/s, "")}` } };
  }
}
