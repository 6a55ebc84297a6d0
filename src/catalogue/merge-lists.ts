import { InputError, type InputIssue } from "../errors.js";
import { COLUMNS } from "./columns.js";
import { designationKey, type Shape } from "./shape.js";

/**
 * Puts several lists together into one.
 *
 * @param lists in the order given; of two shapes with the same name and figures the first is kept
 * @throws {InputError} where two lists give one name different figures, naming each pair
 */
export function mergeLists(lists: readonly (readonly Shape[])[]): readonly Shape[] {
  const kept = new Map<string, Shape>();
  const issues: InputIssue[] = [];
  for (const shape of lists.flat()) {
    const key = designationKey(shape.designation);
    const first = kept.get(key);
    if (first === undefined) {
      kept.set(key, shape);
      continue;
    }
    const differing = COLUMNS.filter(({ name }) => first[name] !== shape[name]).map(
      ({ name }) => `${name} ${first[name]} and ${shape[name]}`,
    );
    if (first.yieldStressKsi !== shape.yieldStressKsi && !shape.bundled && !first.bundled) {
      differing.push(`yieldStressKsi ${first.yieldStressKsi ?? "not given"} and ${shape.yieldStressKsi ?? "not given"}`);
    }
    const bothInStock = first.stock !== null && shape.stock !== null;
    if (bothInStock && JSON.stringify(first.stock) !== JSON.stringify(shape.stock)) differing.push("other stock");
    if (differing.length > 0) {
      issues.push({
        file: shape.source.file,
        line: shape.source.line,
        field: shape.designation,
        problem: `other figures than ${first.source.file}, line ${first.source.line}: ${differing.join("; ")}`,
        allowed: "one set of figures for a name; rename one of the two",
      });
    }
  }
  if (issues.length > 0) throw new InputError(issues);
  return [...kept.values()];
}
