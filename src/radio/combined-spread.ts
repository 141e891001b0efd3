import { requireRange } from "./require-range.ts";

/**
 * One standard deviation for two independent causes of spread.
 *
 *     σ = √(σ1² + σ2²)
 *
 * Assumes: independent, both normally distributed in dB. Not for: causes that move together, as two
 * ends of one link behind the same crowd.
 *
 * @param firstDb       Standard deviation from one cause. [dB], 0 to 300
 * @param secondDb      Standard deviation from the other. [dB], 0 to 300
 * @returns             Standard deviation from both. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              A. Ghasemi, Propagation Engineering in Wireless Communications, example 6.7, p. 241. Read
 *                      second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             none
 * @checkedBy           ghasemi-6-7-uhf, ghasemi-6-7-vhf
 */
export function combinedSpreadDb(firstDb: number, secondDb: number): number {
  requireRange("combinedSpreadDb", { min: 0, max: 300 }, { firstDb, secondDb });
  return Math.hypot(firstDb, secondDb);
}
