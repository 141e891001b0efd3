import { describe, expect, it } from "vitest";
import { type Computed, ROWS } from "./rows.ts";

/** One file for each topic says how the program computes the quantities of its rows. */
const TOPICS = import.meta.glob<Computed>("./computed/*.ts", { eager: true, import: "COMPUTED" });
const FUNCTIONS: Computed = Object.assign({}, ...Object.values(TOPICS));

describe("published figures", () => {
  it("are there for every topic", () => {
    expect(Object.keys(TOPICS).length).toBeGreaterThan(0);
  });

  it.each(Object.keys(FUNCTIONS))("include at least one for %s", (quantity) => {
    expect(ROWS.filter((row) => row.quantity === quantity).length).toBeGreaterThanOrEqual(1);
  });

  it.each(ROWS.map((row) => [row.id, row] as const))("agree: %s", (_id, row) => {
    const compute = FUNCTIONS[row.quantity];
    if (compute === undefined) throw new Error(`nothing computes ${row.quantity}`);
    expect(Math.abs(compute(row) - row.expected)).toBeLessThanOrEqual(row.tolerance);
  });
});

// What each row must say is held by tests/shared.test.ts.
describe("rows of published figures", () => {
  it.each(ROWS.map((row) => [row.id, row] as const))("allow little: %s", (_id, row) => {
    expect(row.tolerance).toBeGreaterThan(0);
    expect(row.tolerance).toBeLessThan(Math.abs(row.expected) / 100);
  });
});
