import { randomBytes } from "node:crypto";
import { constants, existsSync, readFileSync, statSync } from "node:fs";
import { access, rename, rm, writeFile } from "node:fs/promises";
import { dirname, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import { InputError, type InputIssue } from "../errors.js";

/** A file's text, or why there is none. */
export type Reading = { readonly text: string } | { readonly issue: InputIssue };

const REASONS: Readonly<Record<string, string>> = {
  ENOENT: "no such file",
  EACCES: "no permission to read it",
  EPERM: "no permission to read it",
  EISDIR: "this is a directory",
  ENAMETOOLONG: "the name is too long",
  ENOTDIR: "a part of the path is not a directory",
};

/** Reads a user's text file; a fault for what cannot be read, or is not UTF-8 text. */
export function readText(path: string): Reading {
  try {
    const bytes = readFileSync(path);
    if (bytes.includes(0)) return { issue: { file: path, problem: "binary data, not text", allowed: "a text file in UTF-8" } };
    return { text: new TextDecoder("utf-8", { fatal: true, ignoreBOM: true }).decode(bytes) };
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code ?? "";
    const problem = error instanceof TypeError ? "not text in UTF-8" : (REASONS[code] ?? `cannot be read (${code})`);
    return { issue: { file: path, problem, allowed: "a readable text file in UTF-8" } };
  }
}

/** Text of a file that comes with the program. */
export function readShipped(name: string): string {
  return readFileSync(fileURLToPath(new URL(`../../data/${name}`, import.meta.url)), "utf8");
}

/** A file to be written: its path, the flag that asks for it. */
export interface Target {
  readonly path: string;
  readonly flag: string;
}

/**
 * Makes sure, before anything is computed, that every file can be written.
 *
 * @param force whether an existing file may be replaced
 * @throws {InputError} naming every target that stands already, lies in no directory, or may not be written
 */
export async function requireWritable(targets: readonly Target[], { force }: { readonly force: boolean }): Promise<void> {
  const issues: InputIssue[] = [];
  const seen = new Set<string>();
  for (const { path, flag } of targets) {
    const full = resolve(path);
    const fault = (problem: string, allowed: string): void => {
      issues.push({ file: path, field: flag, problem, allowed });
    };
    if (seen.has(full)) fault("two answers would go to this file", "a file of its own for each");
    seen.add(full);
    const folder = dirname(full);
    if (!existsSync(folder) || !statSync(folder).isDirectory()) fault("its directory does not exist", "a path in an existing directory");
    else if (existsSync(full) && statSync(full).isDirectory()) fault("this is a directory", "the path of a file");
    else if (existsSync(full) && !force) fault("the file exists", "another name, or --force to replace it");
    else if (!(await allowed(folder))) fault("no permission to write there", "a directory that may be written");
  }
  if (issues.length > 0) throw new InputError(issues);
}

async function allowed(folder: string): Promise<boolean> {
  try {
    await access(folder, constants.W_OK | constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/**
 * Writes a file whole: aside first, then renamed, so that nobody ever meets half of it.
 *
 * @throws {InputError} when the disk is full or the file cannot be written; nothing is left behind
 */
export async function writeWhole({ path, flag }: Target, text: string): Promise<void> {
  const aside = `${resolve(path)}.${randomBytes(4).toString("hex")}.part`;
  try {
    await writeFile(aside, text, { flag: "wx" });
    await rename(aside, path);
  } catch (error) {
    await rm(aside, { force: true });
    const code = (error as NodeJS.ErrnoException).code ?? "";
    const problem = code === "ENOSPC" ? "the disk is full" : `cannot be written (${code})`;
    throw new InputError([{ file: path, field: flag, problem, allowed: "a path that can be written" }]);
  }
}
