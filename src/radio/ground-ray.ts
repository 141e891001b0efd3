import { HEIGHT_LIMITS_M } from "./height-limits.ts";
import { DISTANCE_LIMITS_M, type Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

const REFLECTION_LIMITS: Limits = { min: -1, max: 1 };

/**
 * How much a reflection from flat ground raises or lowers the level that free space alone would give.
 *
 *     ΔP = 20·log10 |1 + (r1 / r2)·Γ·exp(−j·k·(r2 − r1))|
 *
 * Assumes: flat, smooth ground, far field, antennas that send as much at the ground as straight
 * ahead. Not for: one particular spot in a room, where walls and people add more rays than the ground's one.
 *
 * @param distanceM     Distance along the ground. [m], 0.001 to 10⁹
 * @param fromHeightM   Height of one antenna above the ground. [m], 0.01 to 1000
 * @param toHeightM     Height of the other. [m], 0.01 to 1000
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @param reflectionFactor  Γ, field after over field before: −1 for any ground at grazing incidence and for
 *                      horizontal polarization over metal, 1 for vertical over metal. [none], −1 to 1
 * @returns             Level over that of free space, at most 6.02, without a lowest value. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions. Γ is real here; that of real ground away from grazing is not.
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 4.6, ground reflection (two-ray) model. Example read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 * @differs             The path difference is 4·h1·h2 / (r1 + r2), which is the same without loss of digits.
 * @checkedBy           none published, see test
 */
export function groundRayChangeDb(path: {
  readonly distanceM: number;
  readonly fromHeightM: number;
  readonly toHeightM: number;
  readonly frequencyMhz: number;
  readonly reflectionFactor: number;
}): number {
  const { distanceM, fromHeightM, toHeightM, frequencyMhz, reflectionFactor } = path;
  requireRange("groundRayChangeDb", DISTANCE_LIMITS_M, { distanceM });
  requireRange("groundRayChangeDb", HEIGHT_LIMITS_M, { fromHeightM, toHeightM });
  requireRange("groundRayChangeDb", REFLECTION_LIMITS, { reflectionFactor });
  const directM = Math.hypot(distanceM, fromHeightM - toHeightM);
  const reflectedM = Math.hypot(distanceM, fromHeightM + toHeightM);
  const longerM = (4 * fromHeightM * toHeightM) / (directM + reflectedM);
  const halfPhase = (Math.PI * longerM) / wavelengthM(frequencyMhz);
  const second = (reflectionFactor * directM) / reflectedM;
  // |1 + a·exp(−2jφ)|², written so that a deep null keeps its digits and never becomes zero.
  const weaker = (reflectionFactor * longerM) / reflectedM;
  const power =
    second < 0
      ? (1 + reflectionFactor - weaker) ** 2 - 4 * second * Math.sin(halfPhase) ** 2
      : (1 - reflectionFactor + weaker) ** 2 + 4 * second * Math.cos(halfPhase) ** 2;
  return 10 * Math.log10(power);
}
