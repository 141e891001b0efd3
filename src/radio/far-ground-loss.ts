import { HEIGHT_LIMITS_M } from "./height-limits.ts";
import { DISTANCE_LIMITS_M } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * Loss over flat ground far beyond the break point, where it no longer depends on the frequency.
 *
 *     L = 40·log10(d) − 20·log10(h1·h2)
 *
 * Assumes: flat ground that reflects with −1, distance many times breakPointM, antennas without
 * gain. Not for: stage distances, which nearly always lie inside the break point.
 *
 * @param distanceM     Distance along the ground, at least √(h1·h2). [m], 0.01 to 10⁹
 * @param fromHeightM   Height of one antenna above the ground. [m], 0.01 to 1000
 * @param toHeightM     Height of the other. [m], 0.01 to 1000
 * @returns             Loss between antennas without gain, 0 or more. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            At 4 times breakPointM within 0.3 dB of the exact two rays, at 10 times within 0.05 dB;
 *                      nearer it may be wrong by any amount.
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 4.6: Pr = Pt·Gt·Gr·(ht·hr)² / d⁴. Example 4.6 read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 * @differs             none
 * @checkedBy           garg-3-1-reflecting, garg-3-2-reflecting, simulator-two-ray-500m,
 *                      simulator-two-ray-1000m, simulator-two-ray-2000m, simulator-two-ray-raised
 */
export function farGroundLossDb(path: {
  readonly distanceM: number;
  readonly fromHeightM: number;
  readonly toHeightM: number;
}): number {
  const { distanceM, fromHeightM, toHeightM } = path;
  requireRange("farGroundLossDb", HEIGHT_LIMITS_M, { fromHeightM, toHeightM });
  const noLossM = Math.sqrt(fromHeightM * toHeightM);
  requireRange("farGroundLossDb", { min: noLossM, max: DISTANCE_LIMITS_M.max }, { distanceM });
  return 40 * Math.log10(distanceM / noLossM);
}
