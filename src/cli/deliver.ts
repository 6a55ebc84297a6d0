import type { CsvRecord } from "../report/csv.js";
import { requireWritable, type Target, writeWhole } from "./files.js";
import type { Io } from "./io.js";
import type { Flags } from "./options.js";

/** An answer in the forms it may be asked for. */
export interface Deliverable {
  readonly text: () => string;
  readonly json: () => unknown;
  readonly rows: () => readonly CsvRecord[];
}

const csvTargets = (flags: Flags): Target[] => (flags.csv === undefined ? [] : [{ path: flags.csv, flag: "--csv" }]);

/** Checks the files to be written before anything is computed. */
export async function checkTargets(flags: Flags): Promise<void> {
  await requireWritable(csvTargets(flags), { force: flags.force === true });
}

/** Writes the files asked for, then the answer to stdout: nothing on stdout if a file fails. */
export async function deliver(answer: Deliverable, flags: Flags, io: Io): Promise<void> {
  const { jsonText } = await import("../report/json.js");
  const output = flags.json === true ? jsonText(answer.json()) : answer.text();
  for (const target of csvTargets(flags)) {
    const { csvText } = await import("./csv-file.js");
    await writeWhole(target, await csvText(answer.rows()));
  }
  io.stdout(output);
}
