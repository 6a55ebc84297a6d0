import { writeSync } from "node:fs";
import type { Reporter, SerializedError, TestModule, TestRunEndReason } from "vitest/node";

/**
 * Closes a run with `N passed, N failed` alone on the last line.
 *
 * Files that cannot be loaded, failing hooks and errors nobody caught count as failed, so that a green line is never printed over them. It
 * is written when the process ends, after everything else has been.
 */
export default class ClosingLineReporter implements Reporter {
  onTestRunEnd(modules: readonly TestModule[], errors: readonly SerializedError[], reason: TestRunEndReason): void {
    let [passed, failed, skipped] = [0, errors.length, 0];
    for (const module of modules) {
      let failedTests = 0;
      for (const test of module.children.allTests()) {
        const { state } = test.result();
        if (state === "passed") passed++;
        else if (state === "skipped") skipped++;
        else failedTests++;
      }
      // A file or a suite may fail without any of its tests failing: it did not load, or a hook broke.
      const suiteErrors = [...module.children.allSuites()].reduce((sum, suite) => sum + suite.errors().length, module.errors().length);
      failed += failedTests + suiteErrors;
      if (module.state() === "failed" && failedTests + suiteErrors === 0) failed++;
    }
    if (reason !== "passed" && failed === 0) failed = 1;
    if (passed + failed === 0) failed = 1;
    const line = `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ""}\n`;
    process.once("exit", () => writeSync(1, line));
  }
}
