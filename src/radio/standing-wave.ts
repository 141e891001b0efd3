import { SPEED_LIMITS_M_PER_S } from "./doppler.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

/**
 * Distance from one hole to the next in front of a reflecting wall: how little moving an antenna or a
 * performer may cure or cause a dropout.
 *
 *     period = λ / 2
 *
 * Assumes: direct and reflected wave run against each other. Not for: waves that cross at an angle,
 * whose holes lie farther apart; among many reflections it is the least distance to be expected.
 *
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Distance between holes. [m]
 * @throws RangeError   If the frequency lies outside that range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              R. Blake, Electronic Communication Systems, example 15.11, p. 545. Read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             none
 * @checkedBy           half-metre-period
 */
export function standingWavePeriodM(frequencyMhz: number): number {
  return wavelengthM(frequencyMhz) / 2;
}

/**
 * Time from one hole to the next for somebody who moves through a standing wave.
 *
 *     t = (λ / 2) / v
 *
 * Assumes: as standingWavePeriodM, moving straight along the waves. Not for: counting deep fades among
 * many reflections (fadeRateHz), which are rarer.
 *
 * @param speedMPerS    Speed of the antenna. [m/s], 0.01 to 100
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Time between holes. [s]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as standingWavePeriodM
 * @differs             none
 * @checkedBy           walking-null-interval, blake-15-11-800-mhz, blake-15-11-1900-mhz,
 *                      singal-2-4-900-mhz, singal-2-4-1900-mhz
 */
export function nullIntervalS(speedMPerS: number, frequencyMhz: number): number {
  requireRange("nullIntervalS", SPEED_LIMITS_M_PER_S, { speedMPerS });
  return standingWavePeriodM(frequencyMhz) / speedMPerS;
}
