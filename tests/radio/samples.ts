import fc from "fast-check";
import type { Limits } from "../../src/radio/limits.ts";

export const SEEDED = { seed: 20261201, numRuns: 200 } as const;

/**
 * A value from all over a range. fc.double alone takes bit patterns evenly, so that from 0 to 40 most
 * values lie below 1e-100; here two of three are spread by size, evenly and, above 0, by decades.
 */
export function within(limits: Limits): fc.Arbitrary<number> {
  const { min, max } = limits;
  const share = fc.integer({ min: 0, max: 2 ** 30 }).map((n) => n / 2 ** 30);
  const even = share.map((part) => min + (max - min) * part);
  const byDecades =
    min > 0 ? share.map((part) => Math.min(max, Math.max(min, min * (max / min) ** part))) : even;
  return fc.oneof(fc.double({ min, max, noNaN: true }), even, byDecades);
}

/** What no quantity of the radio path can be; each function is shown all of them. */
export const NEVER = [0, -1, Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
