import { InputError } from "../../errors.js";
import type { Shape, ShapeFigures } from "../shape.js";
import { decode, type OpenBytes } from "./decode.js";
import { DIMENSIONS } from "./fields.js";
import { judgeRow, type Verdict } from "./judge-row.js";
import type { ColumnWishes } from "./layout.js";
import { NamesMet } from "./names-met.js";
import { type KindInput, kindOf, type RowKind } from "./row-kind.js";
import { type ListRow, splitRows } from "./split-rows.js";
import { type ListReading, survey } from "./survey.js";

/** What became of one record of the file. */
export type RowOutcome =
  | {
      readonly type: "accepted";
      readonly line: number;
      readonly shape: Shape;
      readonly derived: readonly (keyof ShapeFigures)[];
      readonly warnings: readonly string[];
    }
  | { readonly type: "refused"; readonly line: number; readonly reason: string; readonly cells: readonly string[] }
  | { readonly type: "passed-over"; readonly line: number; readonly kind: Exclude<RowKind, "shape"> };

/** Everything that became of a list: the counts add up to its records. */
export interface ImportSummary {
  readonly reading: ListReading;
  readonly accepted: number;
  readonly refusedCount: number;
  /** Refused rows with their reasons; the first ones where `keep` bounds them. */
  readonly refused: readonly { readonly line: number; readonly reason: string }[];
  /** Records that are no shapes, by kind. */
  readonly passedOver: Readonly<Partial<Record<RowKind, number>>>;
  /** How many rows had each figure derived. */
  readonly derived: Readonly<Partial<Record<keyof ShapeFigures, number>>>;
  readonly warningCount: number;
  readonly warnings: readonly { readonly line: number; readonly message: string }[];
}

/** A list imported whole, for lists that fit in memory. */
export interface ImportedList {
  readonly summary: ImportSummary;
  readonly shapes: readonly Shape[];
}

/**
 * Second pass: what becomes of each record, in the order of the file.
 *
 * @param open the file's bytes, as the survey read them
 * @param reading what the survey found
 * @throws {InputError} where the file breaks off within a row, or a second table with other columns begins
 */
export async function* outcomes(open: OpenBytes, reading: ListReading): AsyncGenerator<RowOutcome> {
  const { layout, file, encoding } = reading;
  const kinds: KindInput = {
    layout,
    decimal: reading.decimal,
    nameAt: reading.nameAt,
    dimensionsAt: DIMENSIONS.map((field) => reading.columns.get(field)?.index ?? -1),
  };
  const names = new NamesMet();
  let shortest = Number.POSITIVE_INFINITY;
  for await (const row of splitRows(decode(open, encoding), layout.delimiter, file)) {
    const kind = row.line < layout.headerLine ? above(row) : (layout.headKinds.get(row.line) ?? kindOf(row.cells, kinds));
    if (kind === "second-header") throw secondTable(row, reading);
    if (kind !== "shape") {
      yield { type: "passed-over", line: row.line, kind };
      continue;
    }
    if (!row.ended && (row.cells.length < shortest || encoding.cutShort) && shortest < Number.POSITIVE_INFINITY)
      throw brokenOff(row, reading);
    if (row.cells.length < shortest) shortest = row.cells.length;
    yield outcomeOf(row, judgeRow(row.cells, row.line, reading), names);
  }
}

const above = ({ cells }: ListRow): "blank" | "title" => (cells.length === 0 ? "blank" : "title");

function outcomeOf({ line, cells }: ListRow, verdict: Verdict, names: NamesMet): RowOutcome {
  if (!verdict.accepted) return { type: "refused", line, reason: verdict.reason, cells };
  const before = names.add(verdict.shape);
  if (before === null) return { type: "accepted", line, ...verdict };
  const reason = `${verdict.shape.designation} stands already on line ${before.line}, with ${before.same ? "the same" : "other"} figures; each name once`;
  return { type: "refused", line, reason, cells };
}

function secondTable({ line, cells }: ListRow, { file, layout }: ListReading): InputError {
  return new InputError([
    {
      file,
      line,
      problem: `a second table begins here, with other columns than line ${layout.headerLine} (${cells
        .filter((cell) => cell !== "")
        .slice(0, 12)
        .join(", ")})`,
      allowed: "one table a file: split it in two",
    },
  ]);
}

function brokenOff({ line, cells }: ListRow, { file, layout }: ListReading): InputError {
  const last = layout.columns[cells.length - 1]?.header ?? "";
  const place = `after ${cells.length} of ${layout.headerCells.length} columns${last === "" ? "" : `, in "${last}"`}`;
  return new InputError([
    { file, line, problem: `the file breaks off in this row, ${place}`, allowed: "a whole file, each row with all its cells" },
  ]);
}

/**
 * Counts outcomes as they pass, and keeps the first of the refusals and warnings.
 *
 * @param keep how many refusals and warnings are kept
 */
export class Tally {
  private accepted = 0;
  private refusedCount = 0;
  private warningCount = 0;
  private readonly refused: { line: number; reason: string }[] = [];
  private readonly warnings: { line: number; message: string }[] = [];
  private readonly derived: Partial<Record<keyof ShapeFigures, number>> = {};
  private readonly passedOver: Partial<Record<RowKind, number>> = {};

  constructor(private readonly keep: number) {}

  add(outcome: RowOutcome): void {
    const { line } = outcome;
    if (outcome.type === "passed-over") {
      this.passedOver[outcome.kind] = (this.passedOver[outcome.kind] ?? 0) + 1;
    } else if (outcome.type === "refused") {
      this.refusedCount++;
      if (this.refused.length < this.keep) this.refused.push({ line, reason: outcome.reason });
    } else {
      this.accepted++;
      for (const field of outcome.derived) this.derived[field] = (this.derived[field] ?? 0) + 1;
      this.warningCount += outcome.warnings.length;
      for (const message of outcome.warnings) if (this.warnings.length < this.keep) this.warnings.push({ line, message });
    }
  }

  /** @param reading what the list was read by */
  summary(reading: ListReading): ImportSummary {
    const { accepted, refusedCount, refused, passedOver, derived, warningCount, warnings } = this;
    return { reading, accepted, refusedCount, refused, passedOver, derived, warningCount, warnings };
  }
}

/**
 * Imports a list whole.
 *
 * @param source its bytes, or its text
 * @param file its name, for sources and faults
 * @param wishes what the user says of columns and units
 * @throws {InputError} where the file is no such list, or its columns or units are open
 */
export async function importList(
  source: Uint8Array | string,
  file: string,
  wishes: ColumnWishes = { map: [], units: [] },
): Promise<ImportedList> {
  const bytes = typeof source === "string" ? new TextEncoder().encode(source) : source;
  const open: OpenBytes = () => [bytes];
  const reading = await survey(open, file, wishes);
  const tally = new Tally(Number.POSITIVE_INFINITY);
  const shapes: Shape[] = [];
  for await (const outcome of outcomes(open, reading)) {
    tally.add(outcome);
    if (outcome.type === "accepted") shapes.push(outcome.shape);
  }
  return { summary: tally.summary(reading), shapes };
}
