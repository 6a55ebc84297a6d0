/** The caution that every answer and record carries. */
export const CAUTION =
  "Preliminary selection by stated rules and assumptions; the deck itself is not designed. A licensed engineer checks it against the " +
  "specification and the owner's requirements in force; local codes govern. Not for an existing bridge's load posting by itself.";
