import { SPEED_OF_LIGHT_M_PER_S } from "./constants.ts";
import { FREQUENCY_LIMITS_MHZ } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * Length of one wave in free space.
 *
 *     λ = c / f
 *
 * Assumes: free space; air shortens it by 0.03 %. Not for: waves inside cable or dielectric.
 *
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Wavelength. [m]
 * @throws RangeError   If the frequency lies outside that range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              BIPM, SI Brochure, 9th ed. (2019): definition of the metre. From memory, to be verified.
 * @differs             Textbooks round c to 3·10⁸ m/s, 0.07 % more; unrounded here.
 * @checkedBy           si-metre-definition, ghasemi-6-10-twenty-wavelengths, garg-3-1-wavelength,
 *                      rappaport-4-6-quarter-wave
 */
export function wavelengthM(frequencyMhz: number): number {
  requireRange("wavelengthM", FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  return SPEED_OF_LIGHT_M_PER_S / (frequencyMhz * 1e6);
}
