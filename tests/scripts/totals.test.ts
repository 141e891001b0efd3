import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { readTotals } from "../../scripts/totals.mjs";

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "fadewright-totals-"));
});
afterEach(() => rmSync(folder, { recursive: true }));

const write = (name: string, report: unknown) =>
  writeFileSync(join(folder, name), JSON.stringify(report));

// The field names are those of the two runners' own reports.
const unitReport = (passed: number, failed: number, pending: number, todo: number) => ({
  numPassedTests: passed,
  numFailedTests: failed,
  numPendingTests: pending,
  numTodoTests: todo,
});

describe("readTotals", () => {
  it("counts nothing where nothing has run", () => {
    expect(readTotals(folder)).toEqual({ passed: 0, failed: 0, skipped: 0 });
  });

  it("adds up all runners, what is pending or to do as skipped, what is flaky as failed", () => {
    write("unit.json", unitReport(100, 1, 2, 4));
    write("build.json", unitReport(20, 8, 16, 0));
    write("e2e.json", { stats: { expected: 3, unexpected: 32, flaky: 64, skipped: 128 } });
    expect(readTotals(folder)).toEqual({ passed: 123, failed: 105, skipped: 150 });
  });

  it("refuses a report that it can't read", () => {
    writeFileSync(join(folder, "unit.json"), "");
    expect(() => readTotals(folder)).toThrow();
  });
});
