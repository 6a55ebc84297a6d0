/** The public names of the library. It reads no files: hand it texts, and it hands back answers. */

export type { Assessment } from "./answers/assessment.js";
export { type CheckAnswer, check } from "./answers/check.js";
export { type CountRow, type CountsAnswer, counts } from "./answers/counts.js";
export { type LightestAnswer, lightest, type RankedOption } from "./answers/lightest.js";
export { ask, type Examined, type Prepared, prepare, type Question } from "./answers/question.js";
export { type WhyNotLighter, whyNotLighter } from "./answers/why-not-lighter.js";
export type { Bridge, BridgeValues, Source } from "./bridge/bridge.js";
export { type FlagValue, flagLayer, type Layer, readLayer } from "./bridge/layers.js";
export { type Layout, layoutsOf } from "./bridge/layouts.js";
export { type ResolveOptions, resolveBridge } from "./bridge/resolve.js";
export { gradeShapes, type Steel, yieldStress } from "./bridge/yield-stress.js";
export { propertiesFromDimensions, type RolledDimensions } from "./catalogue/from-dimensions.js";
export { type ImportedList, type ImportSummary, importList } from "./catalogue/import/import-list.js";
export { mergeLists } from "./catalogue/merge-lists.js";
export { readShapes, type ShapeList } from "./catalogue/read-shapes.js";
export type { Shape, ShapeFigures } from "./catalogue/shape.js";
export { InputError, type InputIssue } from "./errors.js";
export { type LaneEffects, laneEffects, type SectionEffects, tenthPoints } from "./loads/live-load.js";
export { readVehicles, type Vehicle, vehicleNamed } from "./loads/vehicles.js";
export { assumptionsOf } from "./report/assumptions.js";
export { CAUTION } from "./report/caution.js";
export type { Check, CheckId, CheckKind, Effects, Position, StringerAssessment } from "./specs/contract.js";
