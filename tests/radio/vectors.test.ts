import { describe, expect, it } from "vitest";
import { type Computed, ROWS } from "./rows.ts";

/** One file for each topic says how the program computes the quantities of its rows. */
const TOPICS = import.meta.glob<Computed>("./computed/*.ts", { eager: true, import: "COMPUTED" });
const FUNCTIONS: Computed = Object.assign({}, ...Object.values(TOPICS));

/** All carry their unit at the end of the name, but for plain numbers, which are listed. */
const NAMED_WITH_UNIT =
  /^(exponent|order|count|branchCount|level|ratio|shares?)$|(M|Mm|Km|Mhz|Khz|Hz|Db|Dbm|Dbi|Dbd|Dbc|Mw|W|K|Deg|S|Ms|MPerS|Percent|Probability|Count|Ratio|Order|Exponent|Factor)$/;

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

describe("rows of published figures", () => {
  it("have ids that are used once", () => {
    expect(new Set(ROWS.map(({ id }) => id)).size).toBe(ROWS.length);
  });

  it.each(ROWS.map((row) => [row.id, row] as const))("say all that %s rests on", (_id, row) => {
    expect(Object.keys(row).sort()).toEqual(
      "basis expected id input quantity source tolerance toleranceReason".split(" "),
    );
    expect(Object.keys(row.source).sort()).toEqual(
      "body document edition readAt readOn standing where".split(" "),
    );
    for (const text of [row.toleranceReason, row.basis, ...Object.values(row.source)])
      expect(text.trim()).not.toBe("");
    expect(["read", "second-hand", "common-practice", "from-memory"]).toContain(
      row.source["standing"],
    );
    expect(row.source["readOn"]).toMatch(/^\d{4}-\d\d-\d\d$/);
    for (const name of Object.keys(row.input)) expect(name).toMatch(NAMED_WITH_UNIT);
  });

  it.each(ROWS.map((row) => [row.id, row] as const))("allow little: %s", (_id, row) => {
    expect(row.tolerance).toBeGreaterThan(0);
    expect(row.tolerance).toBeLessThan(Math.abs(row.expected) / 100);
  });
});
