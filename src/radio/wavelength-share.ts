import { SPEED_OF_LIGHT_M_PER_S } from "./constants.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

const SHARE_LIMITS: Limits = { min: 0.001, max: 1000 };
/** Published ones run from 0.66 (solid polyethylene) to 1 (free space); water lies near 0.11. */
const VELOCITY_FACTOR_LIMITS: Limits = { min: 0.01, max: 1 };
const LENGTH_LIMITS_M: Limits = { min: 1e-9, max: 1e9 };

/**
 * The length of a quarter, half or any other share of a wave, on a line or in the open.
 *
 *     l = n·k·λ
 *
 * Assumes: one velocity along the whole length. Not for: cutting a wire antenna, which is shorter than its
 * share of a wave by the end effect, about 5 % for a thin half wave.
 *
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @param share         How many waves, or which part of one: 0.25 for a quarter. [none], 0.001 to 1000
 * @param velocityFactor  Speed on the line over the speed of light: 1 in the open. [none], 0.01 to 1
 * @returns             Length. [m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as wavelengthM; the factor by its definition
 * @differs             Textbooks round c to 3·10⁸ m/s, 0.07 % more; unrounded here.
 * @checkedBy           rappaport-4-6-quarter-length, ghasemi-6-10-ten, ghasemi-6-10-twenty,
 *                      ghasemi-2-2-slow
 */
export function waveShareM(wave: {
  readonly frequencyMhz: number;
  readonly share: number;
  readonly velocityFactor: number;
}): number {
  const { frequencyMhz, share, velocityFactor } = wave;
  requireRange("waveShareM", SHARE_LIMITS, { share });
  requireRange("waveShareM", VELOCITY_FACTOR_LIMITS, { velocityFactor });
  return share * velocityFactor * wavelengthM(frequencyMhz);
}

/**
 * The frequency at which a length is a quarter, half or any other share of a wave: the inverse of waveShareM.
 *
 *     f = n·k·c / l
 *
 * Assumes: as waveShareM. Not for: the resonance of a wire antenna, which lies lower by the end effect.
 *
 * @param lengthM       Length. [m], 10⁻⁹ to 10⁹
 * @param share         How many waves, or which part of one: 0.25 for a quarter. [none], 0.001 to 1000
 * @param velocityFactor  Speed on the line over the speed of light: 1 in the open. [none], 0.01 to 1
 * @returns             Frequency; may lie outside what waveShareM accepts. [MHz], above 0
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as waveShareM, solved for the frequency
 * @differs             as waveShareM
 * @checkedBy           rappaport-4-6-quarter-frequency
 */
export function frequencyForShareMhz(wave: {
  readonly lengthM: number;
  readonly share: number;
  readonly velocityFactor: number;
}): number {
  const { lengthM, share, velocityFactor } = wave;
  requireRange("frequencyForShareMhz", LENGTH_LIMITS_M, { lengthM });
  requireRange("frequencyForShareMhz", SHARE_LIMITS, { share });
  requireRange("frequencyForShareMhz", VELOCITY_FACTOR_LIMITS, { velocityFactor });
  return (share * velocityFactor * SPEED_OF_LIGHT_M_PER_S) / (lengthM * 1e6);
}
