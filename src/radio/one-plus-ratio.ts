import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/** 10 decibels make one neper of power times this: ln 10 / 10. */
const NEPER_PER_DB = Math.LN10 / 10;
const RATIO_LIMITS_DB: Limits = { min: Number.NEGATIVE_INFINITY, max: 20_000 };
const MORE_THAN_ONE_LIMITS_DB: Limits = { min: 1e-300, max: 20_000 };

/**
 * The decibels of one plus a power ratio, which is what a second, unrelated power adds to a first.
 *
 *     10·log10(1 + 10^(x / 10))
 *
 * Assumes: powers that add, so no phase between them. Not for: two carriers on one frequency.
 *
 * @param ratioDb       Second power over the first. [dB], −∞ (nothing added) to 20 000
 * @returns             Both together over the first. [dB], 0 or more
 * @throws RangeError   If the ratio lies outside that range or is NaN.
 * @accuracy            exact; neither a tiny nor a huge ratio is lost in rounding
 * @source              none, definition of the decibel
 * @differs             none
 * @checkedBy           none published, see test
 */
export function onePlusDb(ratioDb: number): number {
  requireRange("onePlusDb", RATIO_LIMITS_DB, { ratioDb });
  const small = Math.log1p(Math.exp(-Math.abs(ratioDb) * NEPER_PER_DB)) / NEPER_PER_DB;
  return Math.max(ratioDb, 0) + small;
}

/**
 * Which power ratio makes one plus it so many decibels: the inverse of onePlusDb.
 *
 *     10·log10(10^(y / 10) − 1)
 *
 * Assumes: as onePlusDb. Not for: 0 dB, where nothing was added and no decibels can say so.
 *
 * @param sumDb         Both powers together over the first. [dB], 10⁻³⁰⁰ to 20 000
 * @returns             Second power over the first. [dB]
 * @throws RangeError   If the sum lies outside that range or is NaN.
 * @accuracy            exact; neither a tiny nor a huge ratio is lost in rounding
 * @source              as onePlusDb, solved for the ratio
 * @differs             none
 * @checkedBy           none published, see test
 */
export function lessOneDb(sumDb: number): number {
  requireRange("lessOneDb", MORE_THAN_ONE_LIMITS_DB, { sumDb });
  return sumDb + 10 * Math.log10(-Math.expm1(-sumDb * NEPER_PER_DB));
}
