/**
 * A formula as it stands in a calculation: what is printed and what is computed, side by side.
 *
 * `expression` is written in plain arithmetic over the names in `given`, so that anyone (and a test) can evaluate it again.
 */
export interface Formula<A extends number[] = number[]> {
  /** Symbol of the result. */
  readonly symbol: string;
  /** The right-hand side in the symbols of `given`. */
  readonly expression: string;
  /** Unit of the result; "-" for a pure number. */
  readonly unit: string;
  /** Article of the specification, or "statics". */
  readonly article: string;
  /** Symbols in the order of the arguments of `of`. */
  readonly given: { readonly [K in keyof A]: string };
  /** The computation itself. */
  readonly of: (...numbers: A) => number;
}

/** Builds a formula; the arguments of `of` are named by `given`, in order. */
export function formula<A extends number[]>(
  symbol: string,
  expression: string,
  unit: string,
  article: string,
  given: { readonly [K in keyof A]: string },
  of: (...numbers: A) => number,
): Formula<A> {
  return { symbol, expression, unit, article, given, of };
}

/**
 * The same formula under another symbol, with symbols of its inputs exchanged.
 *
 * @param symbols new name of each input that changes
 */
export function renamed<A extends number[]>(rule: Formula<A>, symbol: string, symbols: Readonly<Record<string, string>>): Formula<A> {
  const rename = (name: string): string => symbols[name] ?? name;
  return {
    ...rule,
    symbol,
    expression: rule.expression.replace(/[A-Za-z][A-Za-z0-9]*/g, rename),
    given: rule.given.map(rename) as unknown as Formula<A>["given"],
  };
}

/** A heading under which steps of a calculation stand. The report has the words. */
export type Topic =
  | "section"
  | "dead-load"
  | "live-load"
  | "distribution"
  | "effects"
  | "composite-section"
  | "flexure"
  | "shear"
  | "overload"
  | "service-ii"
  | "deflection"
  | "fatigue"
  | "deck-pour"
  | "studs"
  | "supports"
  | "advisories";

/**
 * Writes down a calculation as it is made.
 *
 * The search passes none and pays nothing: every call is written `recorder?.step(...)`, which skips its arguments too.
 */
export interface Recorder {
  /** Opens a heading. */
  topic(topic: Topic): void;
  /** One formula worked out: its result and the numbers put in, in the order of `given`. */
  step<A extends number[]>(formula: Formula<A>, result: number, ...numbers: A): void;
  /** A value taken from input, table or envelope under a symbol. */
  value(symbol: string, value: number, unit: string, from: string): void;
}
