import { resolve } from "node:path";
import { writeToString } from "fast-csv";
import type { OpenBytes } from "../catalogue/import/decode.js";
import { type ImportSummary, outcomes, type RowOutcome, Tally } from "../catalogue/import/import-list.js";
import { type ListReading, survey } from "../catalogue/import/survey.js";
import { harmlessText } from "../catalogue/text-cells.js";
import { listHeader, listRow, OPTIONAL_COLUMNS } from "../catalogue/write-shapes.js";
import { InputError } from "../errors.js";
import { importJson, type JsonShape } from "../report/import-json.js";
import { importText } from "../report/text/import.js";
import { requireWritable, type Target } from "./files.js";
import { EXIT, type ExitCode, type Io } from "./io.js";
import { openList } from "./open-list.js";
import type { Flags } from "./options.js";
import { WholeFile } from "./whole-file.js";

/** Refusals and warnings kept for a text answer, which shows the first of them. */
const KEPT_FOR_TEXT = 100;
/** Rows written at a time. */
const BATCH = 500;

/** `leanspan import`: a list in anybody's columns, judged row by row. */
export async function runImport(file: string, flags: Flags, io: Io): Promise<ExitCode> {
  const targets = [target(flags.out, "--out"), target(flags.refused, "--refused")].filter((one) => one !== null);
  demandOtherFile(file, targets);
  await requireWritable(targets, { force: flags.force === true });
  const open = await openList(file);
  const reading = await survey(open, file, { map: flags.map ?? [], units: flags.units ?? [] });
  const summary = await importInto(open, reading, targets, flags.json === true ? Number.POSITIVE_INFINITY : KEPT_FOR_TEXT);
  const written = targets.filter(({ flag }) => flag !== "--out" || summary.accepted > 0);
  if (flags.json === true) {
    for await (const piece of importJson(summary, shapesOf(open, reading))) io.stdout(piece);
  } else io.stdout(importText(summary, written, io.style));
  if (summary.accepted > 0) return EXIT.found;
  io.stderr(`leanspan: ${file}: no row is accepted${flags.out === undefined ? "" : "; --out is not written"}\n`);
  return EXIT.badInput;
}

const target = (path: string | undefined, flag: string): Target | null => (path === undefined ? null : { path, flag });

function demandOtherFile(file: string, targets: readonly Target[]): void {
  const clash = targets.filter(({ path }) => resolve(path) === resolve(file));
  if (clash.length === 0) return;
  throw new InputError(
    clash.map(({ path, flag }) => ({ file: path, field: flag, problem: "this is the list to be read", allowed: "another file" })),
  );
}

/** Judges every row and writes the files as it goes; they appear only when all is done. */
async function importInto(open: OpenBytes, reading: ListReading, targets: readonly Target[], keep: number): Promise<ImportSummary> {
  const tally = new Tally(keep);
  const writers: RowWriter[] = [];
  try {
    for (const one of targets) writers.push(await RowWriter.begin(one, reading));
    for await (const outcome of outcomes(open, reading)) {
      tally.add(outcome);
      for (const writer of writers) await writer.add(outcome);
    }
    const summary = tally.summary(reading);
    const wanted = writers.filter(({ flag }) => flag !== "--out" || summary.accepted > 0);
    for (const writer of wanted) await writer.close();
    for (const writer of wanted) await writer.file.publish();
    for (const writer of writers) if (!wanted.includes(writer)) await writer.file.abandon();
    return summary;
  } catch (error) {
    for (const { file } of writers) await file.abandon();
    throw error;
  }
}

/** Writes accepted rows in our columns, or refused ones with their reasons, some at a time. */
class RowWriter {
  private rows: string[][] = [];

  private constructor(
    readonly file: WholeFile,
    readonly flag: string,
    private readonly rowOf: (outcome: RowOutcome) => string[] | null,
  ) {}

  static async begin(one: Target, reading: ListReading): Promise<RowWriter> {
    const optional = new Set(OPTIONAL_COLUMNS.filter((name) => reading.columns.has(name as never)));
    const accepted = (outcome: RowOutcome): string[] | null => (outcome.type === "accepted" ? listRow(outcome.shape, optional) : null);
    const refused = (outcome: RowOutcome): string[] | null =>
      outcome.type === "refused" ? [String(outcome.line), outcome.reason, ...outcome.cells].map(harmlessText) : null;
    const isOut = one.flag === "--out";
    const writer = new RowWriter(await WholeFile.begin(one), one.flag, isOut ? accepted : refused);
    writer.rows.push(isOut ? listHeader(optional) : ["line", "reason", ...reading.layout.headerCells].map(harmlessText));
    return writer;
  }

  async add(outcome: RowOutcome): Promise<void> {
    const row = this.rowOf(outcome);
    if (row !== null) this.rows.push(row);
    if (this.rows.length >= BATCH) await this.flush();
  }

  async close(): Promise<void> {
    await this.flush();
    await this.file.close();
  }

  private async flush(): Promise<void> {
    if (this.rows.length === 0) return;
    const text = await writeToString(this.rows, { includeEndRowDelimiter: true });
    this.rows = [];
    await this.file.append(text);
  }
}

/** The accepted shapes in one more pass, so that a long list need not be held. */
async function* shapesOf(open: OpenBytes, reading: ListReading): AsyncGenerator<JsonShape> {
  for await (const outcome of outcomes(open, reading)) {
    if (outcome.type === "accepted") yield { shape: outcome.shape, derived: outcome.derived };
  }
}
