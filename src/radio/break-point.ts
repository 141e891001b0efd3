import { HEIGHT_LIMITS_M } from "./height-limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

/**
 * The distance over flat ground at which the level begins to fall faster than in free space.
 *
 *     Rbp = 4·h1·h2 / λ
 *
 * Assumes: flat ground, heights large against the wavelength. Not for: a sharp border. Up to here the
 * level swings around that of free space; some way beyond it falls by 12 dB for each doubling.
 *
 * @param fromHeightM   Height of one antenna above the ground. [m], 0.01 to 1000
 * @param toHeightM     Height of the other. [m], 0.01 to 1000
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Distance along the ground. [m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            a convention
 * @source              Rec. ITU-R P.1411-12, Annex 1, section 4.1.2, UHF propagation. Read second-hand at
 *                      github.com/ic-crc/crc-covlib, helper for P.1411, 2026-12-01.
 * @differs             none. Other texts call 4π·h1·h2 / λ the crossover distance, which is π times longer.
 * @checkedBy           p1411-break-stage, simulator-crossover, simulator-crossover-raised
 */
export function breakPointM(path: {
  readonly fromHeightM: number;
  readonly toHeightM: number;
  readonly frequencyMhz: number;
}): number {
  const { fromHeightM, toHeightM, frequencyMhz } = path;
  requireRange("breakPointM", HEIGHT_LIMITS_M, { fromHeightM, toHeightM });
  return (4 * fromHeightM * toHeightM) / wavelengthM(frequencyMhz);
}
