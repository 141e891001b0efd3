import fc from "fast-check";
import type { Limits } from "../../src/radio/limits.ts";

export const SEEDED = { seed: 20261201, numRuns: 200 } as const;

/** Any value between two limits, both ends and awkward fractions included. */
export const within = ({ min, max }: Limits): fc.Arbitrary<number> =>
  fc.double({ min, max, noNaN: true });

/** What no quantity of the radio path can be; each function is shown all of them. */
export const NEVER = [0, -1, Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
