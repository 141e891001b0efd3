import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const SUMMED_LIMITS_DB: Limits = { min: -20_000, max: 20_000 };
const SUMMED_COUNT_LIMITS: Limits = { min: 1, max: 1e6 };

/**
 * What several unrelated signals carry together.
 *
 *     P = 10·log10(Σ 10^(Pi / 10))
 *
 * Assumes: signals on different frequencies, or noise: powers add. Not for: peaks, which add by
 * voltage: N equal carriers reach N² times the power of one now and then.
 *
 * @param levelsDb      Levels over one reference (dBm, dB over kT0B). [dB], −20 000 to 20 000, 1 to 10⁶ of them
 * @returns             Level of the sum over the same reference. [dB]
 * @throws RangeError   If there is no level, or one lies outside its range or is NaN.
 * @accuracy            exact
 * @source              none, definition of the decibel
 * @differs             none
 * @checkedBy           none published, see test
 */
export function powerSumDb(levelsDb: readonly number[]): number {
  requireRange("powerSumDb", SUMMED_COUNT_LIMITS, { count: levelsDb.length });
  let highest = Number.NEGATIVE_INFINITY;
  for (const levelDb of levelsDb) {
    requireRange("powerSumDb", SUMMED_LIMITS_DB, { levelDb });
    highest = Math.max(highest, levelDb);
  }
  const sum = levelsDb.reduce((total, levelDb) => total + 10 ** ((levelDb - highest) / 10), 0);
  return highest + 10 * Math.log10(sum);
}
