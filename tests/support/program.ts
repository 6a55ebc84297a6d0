import { spawn } from "node:child_process";
import { chmodSync, existsSync, mkdirSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { delimiter, dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll } from "vitest";

const MAIN = fileURLToPath(new URL("../../dist/cli/main.js", import.meta.url));
export const SHIPPED = fileURLToPath(new URL("../../data/", import.meta.url));

/** What a run of the built program came to. */
export interface Outcome {
  readonly code: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

const folders: string[] = [];
afterAll(() => {
  for (const folder of folders) rmSync(folder, { recursive: true, force: true });
});

/** A folder of its own for one run, with the files it needs; gone when the tests of the file are over. */
export function folderWith(files: Readonly<Record<string, string | Uint8Array | null>> = {}): string {
  const folder = mkdtempSync(join(tmpdir(), "leanspan-"));
  folders.push(folder);
  for (const [name, content] of Object.entries(files)) {
    const path = join(folder, name);
    mkdirSync(dirname(path), { recursive: true });
    if (content === null) mkdirSync(path);
    else writeFileSync(path, content);
  }
  return folder;
}

/** Names and contents of everything in a folder, so that two looks can be compared. */
export function contentsOf(folder: string): Record<string, string> {
  const entries = readdirSync(folder, { withFileTypes: true, recursive: true });
  return Object.fromEntries(
    entries.map((entry) => {
      const path = join(entry.parentPath, entry.name);
      return [path, entry.isFile() ? readFileSync(path, "latin1") : "(no file)"];
    }),
  );
}

function finished(command: string, args: readonly string[], cwd: string, path: string): Promise<Outcome> {
  if (!existsSync(MAIN)) throw new Error("the program is not built: npm run build");
  return new Promise((resolve, reject) => {
    const env = { ...process.env, NO_COLOR: "1", PATH: path };
    const child = spawn(command, args, { cwd, env, stdio: ["ignore", "pipe", "pipe"] });
    let [stdout, stderr] = ["", ""];
    child.stdout.setEncoding("utf8").on("data", (text: string) => {
      stdout += text;
    });
    child.stderr.setEncoding("utf8").on("data", (text: string) => {
      stderr += text;
    });
    child.on("error", reject);
    child.on("close", (code) => resolve({ code, stdout, stderr }));
  });
}

/** Runs the built program as a process. */
export function leanspan(args: readonly string[], cwd: string = folderWith()): Promise<Outcome> {
  return finished(process.execPath, [MAIN, ...args], cwd, process.env.PATH ?? "");
}

/** Runs a line of the shell in which `leanspan` is the built program. */
export function shell(line: string, cwd: string = folderWith()): Promise<Outcome> {
  const bin = folderWith({ leanspan: `#!/bin/sh\nexec "${process.execPath}" "${MAIN}" "$@"\n` });
  chmodSync(join(bin, "leanspan"), 0o755);
  return finished("bash", ["-c", line], cwd, `${bin}${delimiter}${process.env.PATH ?? ""}`);
}
