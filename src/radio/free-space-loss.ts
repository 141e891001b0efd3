import { DISTANCE_LIMITS_M } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

/**
 * Loss between two antennas without gain, with nothing near them or between them.
 *
 *     L = 20·log10(4π·d / λ)
 *
 * Assumes: free space, far field at both ends (farZoneStartM says from where). Not for: paths with
 * people, walls or reflections, where it is the level that the real one swings around or lies below.
 *
 * @param distanceM     Straight-line distance between the antennas. [m], λ/4π to 10⁹
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Basic transmission loss, 0 or more. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              Rec. ITU-R P.525-5 (11/2024), free-space basic transmission loss, point-to-point links.
 *                      Read second-hand at probsee.com/p/itu_r_p525, 2026-12-01.
 * @differs             The Recommendation rounds the constant to 32.4 (km, MHz); unrounded here, 32.4478.
 *                      Below λ/4π the formula turns into a gain: refused here, where others set 0 dB.
 * @checkedBy           p525-1km-100mhz, p525-10m-1ghz, dsp-manual-1km-1ghz, dsp-manual-2km-1ghz,
 *                      dsp-manual-1km-2ghz, rappaport-4-2-100m, rappaport-4-3-10km, ghasemi-7-6,
 *                      garg-3-1-free-space
 */
export function freeSpaceLossDb(distanceM: number, frequencyMhz: number): number {
  const noLossM = wavelengthM(frequencyMhz) / (4 * Math.PI);
  const limits = { min: Math.max(DISTANCE_LIMITS_M.min, noLossM), max: DISTANCE_LIMITS_M.max };
  requireRange("freeSpaceLossDb", limits, { distanceM });
  return 20 * Math.log10(distanceM / noLossM);
}
