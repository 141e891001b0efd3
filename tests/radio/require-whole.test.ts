import { describe, expect, it } from "vitest";
import { requireWhole } from "../../src/radio/require-whole.ts";

const LIMITS = { min: 1, max: 8 };

describe("requireWhole", () => {
  it.each([1, 3, 8])("lets %s through where 1 to 8 is allowed", (branchCount) => {
    expect(() => requireWhole("f", LIMITS, { branchCount })).not.toThrow();
  });

  it.each([0, 9, 1.5, Number.NaN, Number.POSITIVE_INFINITY])(
    "stops %s where 1 to 8 is allowed, and says so",
    (branchCount) => {
      const call = () => requireWhole("f", LIMITS, { branchCount });
      expect(call).toThrow(RangeError);
      expect(call).toThrow("f: branchCount must be");
      expect(call).toThrow(`got ${branchCount}`);
    },
  );
});
