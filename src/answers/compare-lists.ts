import { COLUMNS, YIELD_COLUMN } from "../catalogue/columns.js";
import { designationKey, type Shape, type ShapeSource } from "../catalogue/shape.js";

/** A figure that two lists give differently under one name. */
export interface DifferingFigure {
  readonly column: string;
  /** null where one list says nothing, as of the yield stress. */
  readonly here: number | null;
  readonly there: number | null;
  /** there / here - 1; null where one of them says nothing. */
  readonly deviation: number | null;
}

/** A name with other figures here than there. */
export interface DifferingShape {
  readonly designation: string;
  readonly here: ShapeSource;
  readonly there: ShapeSource;
  /** The farthest apart first. */
  readonly figures: readonly DifferingFigure[];
}

/** What two lists have in common and what not. */
export interface ListComparison {
  /** How many names stand in both with the same figures. */
  readonly same: number;
  /** The farthest apart first. */
  readonly differing: readonly DifferingShape[];
  readonly onlyHere: readonly Shape[];
  readonly onlyThere: readonly Shape[];
}

/**
 * Compares two lists name by name, figure by figure; stock is not compared.
 *
 * @param here the list in use
 * @param there the list compared with
 */
export function compareLists(here: readonly Shape[], there: readonly Shape[]): ListComparison {
  const byName = new Map(there.map((shape) => [designationKey(shape.designation), shape]));
  const names = new Set(here.map(({ designation }) => designationKey(designation)));
  const differing: DifferingShape[] = [];
  let same = 0;
  for (const shape of here) {
    const other = byName.get(designationKey(shape.designation));
    if (other === undefined) continue;
    const figures = differingFigures(shape, other);
    if (figures.length === 0) same++;
    else differing.push({ designation: shape.designation, here: shape.source, there: other.source, figures });
  }
  return {
    same,
    differing: differing.sort((a, b) => apart(b.figures[0]) - apart(a.figures[0]) || (a.designation < b.designation ? -1 : 1)),
    onlyHere: here.filter(({ designation }) => !byName.has(designationKey(designation))),
    onlyThere: there.filter(({ designation }) => !names.has(designationKey(designation))),
  };
}

function differingFigures(here: Shape, there: Shape): DifferingFigure[] {
  const figures: DifferingFigure[] = [];
  for (const { name } of [...COLUMNS, YIELD_COLUMN]) {
    const [one, other] = [here[name], there[name]];
    if (one !== other)
      figures.push({ column: name, here: one, there: other, deviation: one === null || other === null ? null : other / one - 1 });
  }
  return figures.sort((a, b) => apart(b) - apart(a));
}

const apart = ({ deviation }: DifferingFigure): number => (deviation === null ? Number.POSITIVE_INFINITY : Math.abs(deviation));
