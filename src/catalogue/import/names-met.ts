import { COLUMNS } from "../columns.js";
import { designationKey, type Shape } from "../shape.js";

/** A name met before: the line it stands on, and whether its figures are the same there. */
export interface MetBefore {
  readonly line: number;
  readonly same: boolean;
}

const WORDS = 4;
const FULL = 0.6;

/**
 * The names of a list met so far, by a 64-bit print of each: a list may have a million, and they need not be held.
 *
 * Two names of a million share a print once in thirty million lists.
 */
export class NamesMet {
  private table = new Uint32Array(WORDS * 1024);
  private count = 0;

  /**
   * Notes a shape's name.
   *
   * @returns null for a new name
   */
  add(shape: Shape): MetBefore | null {
    const name = designationKey(shape.designation);
    const first = hash(name, 0x811c9dc5);
    // Zero marks a free place.
    const second = hash(name, 0x2545f491) || 1;
    const figures = COLUMNS.reduce((print, column) => hash(String(shape[column.name]), print), 7);
    const at = this.placeOf(first, second);
    if (this.table[at + 1] !== 0) return { line: this.table[at + 2], same: this.table[at + 3] === figures };
    this.table.set([first, second, shape.source.line, figures], at);
    this.count++;
    if (this.count > (FULL * this.table.length) / WORDS) this.grow();
    return null;
  }

  private placeOf(first: number, second: number): number {
    const { table } = this;
    const places = table.length / WORDS;
    let place = first % places;
    while (table[place * WORDS + 1] !== 0 && (table[place * WORDS] !== first || table[place * WORDS + 1] !== second))
      place = (place + 1) % places;
    return place * WORDS;
  }

  private grow(): void {
    const before = this.table;
    this.table = new Uint32Array(before.length * 2);
    for (let at = 0; at < before.length; at += WORDS) {
      if (before[at + 1] !== 0) this.table.set(before.subarray(at, at + WORDS), this.placeOf(before[at], before[at + 1]));
    }
  }
}

/** A print of a text, 0 to 2^32 - 1, well mixed so that two seeds give prints that know nothing of each other. */
function hash(text: string, seed: number): number {
  let print = seed;
  for (let at = 0; at < text.length; at++) print = Math.imul(print ^ text.charCodeAt(at), 0x5bd1e995) + (print >>> 15);
  print = Math.imul(print ^ (print >>> 16), 0x85ebca6b);
  print = Math.imul(print ^ (print >>> 13), 0xc2b2ae35);
  return (print ^ (print >>> 16)) >>> 0;
}
