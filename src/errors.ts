/** One fault in what the user gave: where it stands, what is wrong, what is allowed. */
export interface InputIssue {
  /** File the fault stands in; absent for a flag. */
  readonly file?: string;
  /** Line in that file, from 1. */
  readonly line?: number;
  /** Flag, key or column at fault. */
  readonly field?: string;
  /** What is wrong, in a few words, with the value as given. */
  readonly problem: string;
  /** What would be accepted instead. */
  readonly allowed?: string;
}

/**
 * Faults in the input, all of those found together.
 *
 * A result in which nothing passes is not an error; a broken precondition of our own is a RangeError.
 */
export class InputError extends Error {
  readonly issues: readonly InputIssue[];

  /** @param issues at least one fault */
  constructor(issues: readonly InputIssue[]) {
    super(issues.map(formatIssue).join("\n"));
    this.name = "InputError";
    this.issues = issues;
  }
}

/** One line of text for an issue: place, problem, what is allowed. */
export function formatIssue(issue: InputIssue): string {
  const place = [issue.file, issue.line === undefined ? undefined : `line ${issue.line}`, issue.field]
    .filter((part) => part !== undefined)
    .join(", ");
  const allowed = issue.allowed === undefined ? "" : `; allowed: ${issue.allowed}`;
  return `${place === "" ? "" : `${place}: `}${issue.problem}${allowed}`;
}

/**
 * Throws when a number that our own code must supply is not finite and positive.
 *
 * @param name name of the quantity with its unit, for the message
 * @param value the number
 * @throws {RangeError} if value is not finite or not above zero
 */
export function requirePositive(name: string, value: number): void {
  if (!(value > 0 && value < Number.POSITIVE_INFINITY)) {
    throw new RangeError(`${name} must be finite and above zero, got ${value}`);
  }
}

/**
 * Throws when a number anywhere inside a value is not finite.
 *
 * @param name what the value is, for the message
 * @param value a number, or an object or list that holds some, however deep
 * @throws {RangeError} naming the first number that is NaN or infinite, by its path
 */
export function requireFinite(name: string, value: unknown): void {
  const path = notFinite(value);
  if (path !== null) throw new RangeError(`${name}${path} must be finite`);
}

/** Path to the first number that is not finite, or null. */
function notFinite(value: unknown): string | null {
  if (typeof value === "number") return Number.isFinite(value) ? null : ` (${value})`;
  if (typeof value !== "object" || value === null) return null;
  for (const key in value) {
    const path = notFinite((value as Record<string, unknown>)[key]);
    if (path !== null) return `.${key}${path}`;
  }
  return null;
}
