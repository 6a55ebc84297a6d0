import { randomBytes } from "node:crypto";
import { statSync } from "node:fs";
import { type FileHandle, open, rename, rm } from "node:fs/promises";
import { resolve } from "node:path";
import { InputError } from "../errors.js";
import type { Target } from "./files.js";

/** A file written piece by piece aside, and put in its place only when all of it is there. */
export class WholeFile {
  private constructor(
    private readonly target: Target,
    private readonly aside: string | null,
    private readonly handle: FileHandle,
  ) {}

  /**
   * Begins a file. A device, such as a full disk's, is written to directly: it must not be replaced.
   *
   * @throws {InputError} when it cannot be written
   */
  static async begin(target: Target): Promise<WholeFile> {
    const place = resolve(target.path);
    const existing = statSync(place, { throwIfNoEntry: false });
    const aside = existing === undefined || existing.isFile() ? `${place}.${randomBytes(4).toString("hex")}.part` : null;
    const handle = await guarded(target, () => open(aside ?? place, aside === null ? "w" : "wx"));
    return new WholeFile(target, aside, handle);
  }

  /** @throws {InputError} when the disk is full or the file cannot be written; what was written aside is gone then */
  async append(text: string): Promise<void> {
    try {
      await guarded(this.target, () => this.handle.appendFile(text));
    } catch (error) {
      await this.abandon();
      throw error;
    }
  }

  /** Closes the file without yet putting it in its place, so that several files can be sure of each other. */
  async close(): Promise<void> {
    try {
      await guarded(this.target, () => this.handle.close());
    } catch (error) {
      await this.abandon();
      throw error;
    }
  }

  /** Puts the closed file in its place. */
  async publish(): Promise<void> {
    const { aside } = this;
    if (aside !== null) await guarded(this.target, () => rename(aside, resolve(this.target.path)));
  }

  /** Leaves nothing behind. */
  async abandon(): Promise<void> {
    await this.handle.close().catch(() => undefined);
    if (this.aside !== null) await rm(this.aside, { force: true });
  }
}

async function guarded<T>({ path, flag }: Target, work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code ?? "";
    const problem = code === "ENOSPC" ? "the disk is full" : `cannot be written (${code})`;
    throw new InputError([{ file: path, field: flag, problem, allowed: "a path that can be written" }]);
  }
}
