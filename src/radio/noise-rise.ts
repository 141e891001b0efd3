import type { Limits } from "./limits.ts";
import { lessOneDb, onePlusDb } from "./one-plus-ratio.ts";
import { requireRange } from "./require-range.ts";

export const INTERFERENCE_LIMITS_DB: Limits = { min: -400, max: 400 };
export const NOISE_RISE_LIMITS_DB: Limits = { min: 1e-12, max: 400 };

/**
 * How much an added source of noise lifts the floor, which is how much sensitivity it costs.
 *
 *     D = 10·log10(1 + I / N)
 *
 * Assumes: interference that acts like noise. Not for: a steady carrier on the channel, which can
 * capture an analogue receiver long before the floor has risen.
 *
 * @param interferenceToNoiseDb  Added power over the floor before, in the same band. [dB], −400 to 400
 * @returns                      Rise of the floor. [dB], 0 or more
 * @throws RangeError            If the ratio lies outside that range or is NaN.
 * @accuracy                     exact for the assumption
 * @source                       CEPT, Monte Carlo simulation handbook, page 505674, desensitisation. Read at
 *                               ecowiki.atlassian.net, 2026-12-01.
 * @differs                      none
 * @checkedBy                    cept-equal-powers, cept-one-decibel, cept-half-decibel
 */
export function noiseRiseDb(interferenceToNoiseDb: number): number {
  requireRange("noiseRiseDb", INTERFERENCE_LIMITS_DB, { interferenceToNoiseDb });
  return onePlusDb(interferenceToNoiseDb);
}

/**
 * How strong an added source may be for a given rise of the floor: the inverse of noiseRiseDb.
 *
 *     I / N = 10·log10(10^(D / 10) − 1)
 *
 * Assumes: as noiseRiseDb. Not for: a rise of 0, which no source causes.
 *
 * @param riseDb        Rise of the floor, or loss of sensitivity. [dB], 10⁻¹² to 400
 * @returns             Interference over noise. [dB]
 * @throws RangeError   If the rise lies outside that range or is NaN.
 * @accuracy            exact for the assumption
 * @source              as noiseRiseDb, which prints this form
 * @differs             none
 * @checkedBy           cept-one-decibel-back, cept-half-decibel-back
 */
export function interferenceToNoiseDb(riseDb: number): number {
  requireRange("interferenceToNoiseDb", NOISE_RISE_LIMITS_DB, { riseDb });
  return lessOneDb(riseDb);
}
