import { InputError } from "../../errors.js";

/** One record of a list: its cells, trimmed, trailing blank ones left out, with the line it begins on, from 1. */
export interface ListRow {
  readonly line: number;
  readonly cells: readonly string[];
  /** False for a last record without a line end after it. */
  readonly ended: boolean;
}

/** Bounds beyond which a file is no list of shapes. */
export const MOST_CHARACTERS = 1_000_000;
export const MOST_COLUMNS = 1000;
const MOST_QUOTED_LINES = 50;
const [LF, CR, QUOTE] = [10, 13, 34];

/**
 * Splits text into records.
 *
 * A quote opens a quoted cell only at the cell's beginning; elsewhere it is a character like any other (`36"` for inches).
 * Our own splitter: it takes text in pieces, keeps a true count of lines within quoted cells, and can say where a quote stands astray.
 *
 * @param text pieces of the file's text
 * @param delimiter one character
 * @param file the file's name, for the faults
 * @throws {InputError} on a quote that never ends or text after a closing quote, with line and column; on a record too long or with too many cells
 */
export async function* splitRows(text: AsyncIterable<string> | Iterable<string>, delimiter: string, file: string): AsyncGenerator<ListRow> {
  const splitter = new RowSplitter(delimiter, file);
  for await (const piece of text) yield* splitter.rows(piece, false);
  yield* splitter.rows("", true);
}

/** The records of a text that is at hand whole; `sample` for the head of a file, whose last record may be incomplete and is left out. */
export function splitText(text: string, delimiter: string, file: string, { sample }: { readonly sample: boolean }): ListRow[] {
  return [...new RowSplitter(delimiter, file).rows(text, !sample)];
}

class RowSplitter {
  private buffer = "";
  private line = 1;
  private readonly separator: number;

  constructor(
    delimiter: string,
    private readonly file: string,
  ) {
    this.separator = delimiter.charCodeAt(0);
  }

  *rows(piece: string, last: boolean): Generator<ListRow> {
    this.buffer += piece;
    let at = 0;
    while (at < this.buffer.length) {
      const next = this.row(at, last);
      if (next === null) break;
      at = next.after;
      if (next.cells.length > 0) yield { line: this.line, cells: next.cells, ended: next.ended };
      else if (next.ended) yield { line: this.line, cells: [], ended: true };
      this.line += next.breaks;
    }
    this.buffer = this.buffer.slice(at);
    if (this.buffer.length > MOST_CHARACTERS) this.tooLong();
  }

  /** The record that begins at a place, or null when more text is needed to see its end. */
  private row(from: number, last: boolean) {
    const { buffer, separator } = this;
    const cells: string[] = [];
    let lastFilled = 0;
    let breaks = 0;
    let at = from;
    const push = (cell: string): void => {
      const trimmed = cell.trim();
      cells.push(trimmed);
      if (trimmed !== "") lastFilled = cells.length;
    };
    const done = (after: number, ended: boolean) => {
      if (after - from > MOST_CHARACTERS) this.tooLong();
      if (lastFilled > MOST_COLUMNS) {
        const problem = `${lastFilled} columns`;
        throw new InputError([{ file: this.file, line: this.line, problem, allowed: `at most ${MOST_COLUMNS} columns` }]);
      }
      cells.length = lastFilled;
      return { cells, after, ended, breaks: ended ? breaks + 1 : breaks };
    };
    while (true) {
      let start = at;
      while (start < buffer.length && buffer.charCodeAt(start) === 32 && separator !== 32) start++;
      if (start < buffer.length && buffer.charCodeAt(start) === QUOTE) {
        const quoted = this.quoted(start, from, breaks, last);
        if (quoted === null) return null;
        push(quoted.cell);
        breaks = quoted.breaks;
        at = quoted.after;
      } else {
        let end = start;
        for (; end < buffer.length; end++) {
          const code = buffer.charCodeAt(end);
          if (code === separator || code === LF || code === CR) break;
        }
        if (end === buffer.length && !last) return null;
        push(buffer.slice(at, end));
        at = end;
      }
      if (at === buffer.length) return last ? done(at, false) : null;
      const code = buffer.charCodeAt(at);
      if (code === separator) {
        at++;
        continue;
      }
      // A carriage return at the end of a piece may yet be followed by its line feed.
      if (code === CR && at + 1 === buffer.length && !last) return null;
      return done(code === CR && buffer.charCodeAt(at + 1) === LF ? at + 2 : at + 1, true);
    }
  }

  private quoted(open: number, rowStart: number, breaksBefore: number, last: boolean) {
    const { buffer } = this;
    let breaks = breaksBefore;
    let cell = "";
    let at = open + 1;
    let from = at;
    const astray = (problem: string): never => {
      const lineStart = Math.max(buffer.lastIndexOf("\n", open - 1), buffer.lastIndexOf("\r", open - 1), rowStart - 1) + 1;
      const place = `column ${open - lineStart + 1}: ${problem}`;
      throw new InputError([
        { file: this.file, line: this.line + breaksBefore, problem: place, allowed: "quotes in pairs, doubled within a quoted cell" },
      ]);
    };
    for (; at < buffer.length; at++) {
      const code = buffer.charCodeAt(at);
      if (code === QUOTE) {
        if (at + 1 === buffer.length && !last) return null;
        if (buffer.charCodeAt(at + 1) === QUOTE) {
          cell += buffer.slice(from, at + 1);
          at++;
          from = at + 1;
          continue;
        }
        cell += buffer.slice(from, at);
        let after = at + 1;
        while (after < buffer.length && buffer.charCodeAt(after) === 32) after++;
        const next = buffer.charCodeAt(after);
        if (after < buffer.length && next !== this.separator && next !== LF && next !== CR)
          astray("a quote opens this cell and text follows where it ends");
        if (after === buffer.length && !last) return null;
        return { cell, after, breaks };
      }
      if (code === LF || (code === CR && buffer.charCodeAt(at + 1) !== LF)) breaks++;
      if (breaks - breaksBefore > MOST_QUOTED_LINES) astray("a quote opens this cell and does not end");
    }
    return last ? astray("a quote opens this cell and does not end") : null;
  }

  private tooLong(): never {
    throw new InputError([
      {
        file: this.file,
        line: this.line,
        problem: `a line of more than ${MOST_CHARACTERS} characters`,
        allowed: "one shape a line, as CSV text",
      },
    ]);
  }
}
