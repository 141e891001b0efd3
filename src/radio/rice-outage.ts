import type { Limits } from "./limits.ts";
import { marcumProbability } from "./marcum.ts";
import { MARGIN_LIMITS_DB, OUTAGE_LIMITS } from "./rayleigh-outage.ts";
import { requireRange } from "./require-range.ts";
import { solveRising } from "./solve-rising.ts";

/** From hardly a direct wave to hardly anything else. */
const K_FACTOR_LIMITS_DB: Limits = { min: -40, max: 25 };

/**
 * Share of places in which the level falls below what the receiver needs, where one wave, mostly the
 * direct one, stands out from the reflections.
 *
 *     P = 1 − Q₁(√(2K), √(2·(1 + K)·x)), K = 10^(kFactor / 10), x = 10^(−margin / 10)
 *
 * Assumes: Rice fading, one antenna, a mean that stays the same. Not for: a direct path that people
 * step into: then there is no direct wave, and rayleighOutageProbability holds.
 *
 * @param fading.marginDb   Mean power, direct and reflected together, over the needed power. [dB], −10 to 100
 * @param fading.kFactorDb  Power of the direct wave over that of all reflections. [dB], −40 to 25
 * @returns                 Outage, from 0 to 1. [none]
 * @throws RangeError       If an input lies outside its range or is NaN.
 * @accuracy                relative, 10⁻¹¹, also where the result is tiny (marcumProbability)
 * @source                  S. O. Rice, Mathematical Analysis of Random Noise, Bell Syst. Tech. J. 24 (1945),
 *                          section 3.10; in Marcum's function from memory, to be verified. Agrees with the
 *                          distribution of the amplitude at mathworks.com/help/stats/rician-distribution.html,
 *                          read 2026-12-01.
 * @differs                 none
 * @checkedBy           rice-k-6-db, rice-k-9-db, rice-k-0-db
 */
export function riceOutageProbability(fading: {
  readonly marginDb: number;
  readonly kFactorDb: number;
}): number {
  const { marginDb, kFactorDb } = fading;
  requireRange("riceOutageProbability", MARGIN_LIMITS_DB, { marginDb });
  requireRange("riceOutageProbability", K_FACTOR_LIMITS_DB, { kFactorDb });
  const k = 10 ** (kFactorDb / 10);
  return marcumProbability(Math.sqrt(2 * k), Math.sqrt(2 * (1 + k) * 10 ** (-marginDb / 10)));
}

/**
 * The margin that keeps the outage at a wished share: the inverse of riceOutageProbability.
 *
 *     P(margin, K) = wished
 *
 * Assumes: as riceOutageProbability. Not for: promises: the mean is never known to the last decibel.
 *
 * @param fading.outageProbability  Wished outage. [none], 10⁻⁹ to 0.999
 * @param fading.kFactorDb          Power of the direct wave over that of all reflections. [dB], −40 to 25
 * @returns                         Mean power over the needed power. [dB], −10 to 90
 * @throws RangeError               If an input lies outside its range or is NaN.
 * @accuracy                        10⁻⁸ dB
 * @source                          as riceOutageProbability, solved for the margin
 * @differs                         none
 * @checkedBy           none published, see test
 */
export function riceMarginDb(fading: {
  readonly outageProbability: number;
  readonly kFactorDb: number;
}): number {
  const { outageProbability, kFactorDb } = fading;
  requireRange("riceMarginDb", OUTAGE_LIMITS, { outageProbability });
  requireRange("riceMarginDb", K_FACTOR_LIMITS_DB, { kFactorDb });
  const reached = (marginDb: number) => -riceOutageProbability({ marginDb, kFactorDb });
  return solveRising(reached, -outageProbability, MARGIN_LIMITS_DB);
}
