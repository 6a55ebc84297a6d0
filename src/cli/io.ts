import type { Style } from "../report/text/frame.js";

/** Where a command reads and writes beside files. */
export interface Io {
  readonly stdout: (text: string) => void;
  readonly stderr: (text: string) => void;
  /** Whether stdout is a terminal that takes colour. */
  readonly colour: boolean;
  readonly style: Style;
}

/** Exit codes. */
export const EXIT = { found: 0, nothing: 1, badInput: 2, defect: 3 } as const;
export type ExitCode = (typeof EXIT)[keyof typeof EXIT];
