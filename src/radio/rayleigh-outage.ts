import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/** How far the mean power lies above the level that the receiver needs. */
export const MARGIN_LIMITS_DB: Limits = { min: -10, max: 100 };
/** What a margin can be asked for. */
export const OUTAGE_LIMITS: Limits = { min: 1e-9, max: 0.999 };
/** Of one branch among several: eight that each fail with 0.9999 fail together with 0.9992. */
const BRANCH_OUTAGE_LIMITS: Limits = { min: OUTAGE_LIMITS.min, max: 0.9999 };

/**
 * Share of places, or of time while walking, in which the level falls below what the receiver needs:
 * many reflections, none of them stronger than the rest together.
 *
 *     P = 1 − e^(−x), x = 10^(−margin / 10)
 *
 * Assumes: Rayleigh fading, one antenna, a mean that stays the same. Not for: places in plain sight of
 * the antenna (riceOutageProbability), nor people and walls, which move the mean itself.
 *
 * @param marginDb      Mean power over the needed power. [dB], −10 to 100
 * @returns             Outage, from 0 to 1. [none]
 * @throws RangeError   If the margin lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 7.10.1. Read second-hand at github.com/FOSSEE/Python-Textbook-Companions,
 *                      2026-12-01; section from memory.
 * @differs             none
 * @checkedBy           rappaport-7-4-one-branch, garg-10-6-one-branch, goldsmith-7-1-one-branch,
 *                      rayleigh-10-db
 */
export function rayleighOutageProbability(marginDb: number): number {
  requireRange("rayleighOutageProbability", MARGIN_LIMITS_DB, { marginDb });
  return -Math.expm1(-(10 ** (-marginDb / 10)));
}

/**
 * The margin that keeps the outage at a wished share: the inverse of rayleighOutageProbability.
 *
 *     margin = −10·log10(−ln(1 − P))
 *
 * Assumes: as rayleighOutageProbability. Not for: promises: the mean is never known to the last decibel.
 *
 * @param outageProbability  Wished outage. [none], 10⁻⁹ to 0.9999
 * @returns                  Mean power over the needed power. [dB], −10 to 90
 * @throws RangeError        If the outage lies outside its range or is NaN.
 * @accuracy                 exact for the assumptions
 * @source                   as rayleighOutageProbability, solved for the margin
 * @differs                  none
 * @checkedBy           rayleigh-margin-1-percent, rayleigh-margin-0-1-percent
 */
export function rayleighMarginDb(outageProbability: number): number {
  requireRange("rayleighMarginDb", BRANCH_OUTAGE_LIMITS, { outageProbability });
  return -10 * Math.log10(-Math.log1p(-outageProbability));
}
