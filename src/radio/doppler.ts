import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

/** From one step in a minute to a fast car. */
export const SPEED_LIMITS_M_PER_S: Limits = { min: 0.01, max: 100 };
export const DOPPLER_LIMITS_HZ: Limits = { min: 1e-6, max: 1e6 };

/**
 * Largest shift of frequency that a moving antenna sees, which sets the pace of its fading.
 *
 *     f_d = v / λ
 *
 * Assumes: speeds far below that of light, waves from all sides. Not for: the shift of one wave, which
 * goes with the cosine of the angle to the path.
 *
 * @param speedMPerS    Speed of the antenna. [m/s], 0.01 to 100
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Doppler frequency. [Hz]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 5.1, example 5.7. Read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 * @differs             none
 * @checkedBy           walking-doppler
 */
export function dopplerHz(speedMPerS: number, frequencyMhz: number): number {
  requireRange("dopplerHz", SPEED_LIMITS_M_PER_S, { speedMPerS });
  return speedMPerS / wavelengthM(frequencyMhz);
}

/**
 * The speed that gives a wished Doppler frequency: the inverse of dopplerHz.
 *
 *     v = f_d·λ
 *
 * Assumes: as dopplerHz. Not for: results near the speed of light; the caller has to compare.
 *
 * @param shiftHz       Doppler frequency. [Hz], 10⁻⁶ to 10⁶
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Speed; may lie outside what dopplerHz accepts. [m/s], above 0
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as dopplerHz, solved for the speed
 * @differs             none
 * @checkedBy           rappaport-5-7-speed
 */
export function speedForDopplerMPerS(shiftHz: number, frequencyMhz: number): number {
  requireRange("speedForDopplerMPerS", DOPPLER_LIMITS_HZ, { shiftHz });
  return shiftHz * wavelengthM(frequencyMhz);
}
