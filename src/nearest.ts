import { distance } from "fastest-levenshtein";

/**
 * The known name closest to a misspelt one.
 *
 * @param given what was typed
 * @param known the names that exist
 * @returns the nearest name by edit distance, case ignored; null when none is within a third of the longer length (at least 2 edits)
 */
export function nearest(given: string, known: readonly string[]): string | null {
  const typed = given.toLowerCase();
  let best: string | null = null;
  let bestDistance = Number.POSITIVE_INFINITY;
  for (const name of known) {
    const edits = distance(typed, name.toLowerCase());
    const within = Math.max(2, Math.ceil(Math.max(typed.length, name.length) / 3));
    if (edits <= within && edits < bestDistance) {
      best = name;
      bestDistance = edits;
    }
  }
  return best;
}

/** " (did you mean X?)", or nothing when no known name is near. */
export function didYouMean(given: string, known: readonly string[]): string {
  const name = nearest(given, known);
  return name === null ? "" : ` (did you mean ${name}?)`;
}
