import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";

/** Adds up what the test runners have written into a folder. A runner that has not run adds nothing. */
export function readTotals(folder) {
  const reports = [
    ...["unit.json", "build.json"].map((name) => readReport(join(folder, name), fromVitest)),
    readReport(join(folder, "e2e.json"), fromPlaywright),
  ];
  const sum = (field) => reports.reduce((total, report) => total + (report?.[field] ?? 0), 0);
  return { passed: sum("passed"), failed: sum("failed"), skipped: sum("skipped") };
}

function readReport(path, read) {
  return existsSync(path) ? read(JSON.parse(readFileSync(path, "utf8"))) : null;
}

const fromVitest = ({ numPassedTests, numFailedTests, numPendingTests, numTodoTests }) => ({
  passed: numPassedTests,
  failed: numFailedTests,
  skipped: numPendingTests + numTodoTests,
});

/** A flaky test has failed at least once, and counts as failed. */
const fromPlaywright = ({ stats: { expected, unexpected, flaky, skipped } }) => ({
  passed: expected,
  failed: unexpected + flaky,
  skipped,
});
