import type { ImportSummary } from "../catalogue/import/import-list.js";
import type { Shape, ShapeFigures } from "../catalogue/shape.js";
import { CAUTION } from "./caution.js";
import { SCHEMA_VERSION } from "./json.js";

/** An accepted shape with the figures that were derived for it. */
export interface JsonShape {
  readonly shape: Shape;
  readonly derived: readonly (keyof ShapeFigures)[];
}

/**
 * The document of `import`, piece by piece, for a list may have a million rows.
 *
 * @param summary what became of the list, with every refusal and warning
 * @param shapes the accepted shapes in the order of the file
 */
export async function* importJson(summary: ImportSummary, shapes: AsyncIterable<JsonShape> | Iterable<JsonShape>): AsyncGenerator<string> {
  const { reading, accepted, refused, passedOver, derived, warnings } = summary;
  const columns = [...reading.columns.values()];
  const head = {
    schemaVersion: SCHEMA_VERSION,
    command: "import",
    caution: CAUTION,
    import: {
      file: reading.file,
      units: Object.fromEntries(columns.filter(({ unit }) => unit.name !== "").map(({ field, unit }) => [field, unit.name])),
      columns: {
        designation: reading.layout.columns[reading.nameAt]?.header ?? "",
        ...Object.fromEntries(columns.map(({ field, header }) => [field, header])),
      },
      accepted,
      refused,
      derived,
      warnings,
      passedOver,
      remarks: reading.remarks,
      encoding: reading.encoding.encoding,
      separator: reading.layout.delimiter,
      decimal: reading.decimal,
      headerLine: reading.layout.headerLine,
    },
  };
  yield `${JSON.stringify(head, null, 2).slice(0, -2)},\n  "shapes": [`;
  let pieces: string[] = [];
  let first = true;
  for await (const { shape, derived: fields } of shapes) {
    const { designation, source, bundled: _, yieldStressKsi, stock, ...figures } = shape;
    const row = { designation, line: source.line, ...figures, yieldStressKsi, stock, derived: fields };
    pieces.push(`${first ? "" : ","}\n    ${JSON.stringify(row)}`);
    first = false;
    if (pieces.length >= 500) {
      yield pieces.join("");
      pieces = [];
    }
  }
  yield `${pieces.join("")}${first ? "" : "\n  "}]\n}\n`;
}
