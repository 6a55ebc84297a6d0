import { createReadStream, statSync } from "node:fs";
import type { OpenBytes } from "../catalogue/import/decode.js";
import { InputError } from "../errors.js";

const REASONS: Readonly<Record<string, string>> = {
  ENOENT: "no such file",
  EACCES: "no permission to read it",
  EPERM: "no permission to read it",
  ENAMETOOLONG: "the name is too long",
  ENOTDIR: "a part of the path is not a directory",
  ELOOP: "links that lead in a circle",
};
/** Most that is read from a pipe, which cannot be opened twice. */
const MOST_PIPED_BYTES = 256 * 1024 * 1024;

/**
 * A user's list as bytes that can be opened for each pass over it; a pipe is read once and kept.
 *
 * @throws {InputError} where there is no such file, or it cannot be read
 */
export async function openList(path: string): Promise<OpenBytes> {
  const kind = guarded(path, () => statSync(path));
  if (kind.isDirectory()) throw unreadable(path, "this is a directory");
  if (kind.isFile()) return () => pieces(path);
  if (!kind.isFIFO() && !kind.isSocket()) throw unreadable(path, "this is a device, not a file");
  const kept: Uint8Array[] = [];
  let length = 0;
  for await (const piece of pieces(path)) {
    kept.push(piece);
    length += piece.length;
    if (length > MOST_PIPED_BYTES) throw unreadable(path, `more than ${MOST_PIPED_BYTES} bytes through a pipe`);
  }
  return () => kept;
}

async function* pieces(path: string): AsyncGenerator<Uint8Array> {
  try {
    yield* createReadStream(path, { highWaterMark: 256 * 1024 });
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    throw code === undefined ? error : unreadable(path, REASONS[code] ?? `cannot be read (${code})`);
  }
}

function guarded<T>(path: string, work: () => T): T {
  try {
    return work();
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code;
    throw code === undefined ? error : unreadable(path, REASONS[code] ?? `cannot be read (${code})`);
  }
}

const unreadable = (file: string, problem: string): InputError =>
  new InputError([{ file, problem, allowed: "a readable file of CSV text" }]);
