import { DISTANCE_LIMITS_M, EXPONENT_LIMITS, LEVEL_CHANGE_LIMITS_DB } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * How much louder a carrier arrives when the distance to its transmitter changes.
 *
 *     ΔP = −10·n·log10(d2 / d1)
 *
 * Assumes: far field at both distances, the same antennas and surroundings before and after.
 * Not for: one particular spot indoors, where reflections add swings of many dB to this trend.
 *
 * @param fromM         Distance before. [m], 0.001 to 10⁹
 * @param toM           Distance after. [m], 0.001 to 10⁹
 * @param exponent      How fast power falls with distance: 2 in free space. [none], 0.5 to 10
 * @returns             Change of the received level, positive when nearer. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 4.9, log-distance path loss model. Formula and examples read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 * @differs             Without the random term for shadowing: it gives the trend, not one place.
 * @checkedBy           singal-2-1-twice, singal-2-1-ten-times, singal-2-2-twice, singal-2-2-ten-times,
 *                      rappaport-4-2-step, rappaport-4-11-same-floor, rappaport-4-11-several-floors,
 *                      garg-3-3-step
 */
export function levelChangeDb(move: {
  readonly fromM: number;
  readonly toM: number;
  readonly exponent: number;
}): number {
  const { fromM, toM, exponent } = move;
  requireRange("levelChangeDb", DISTANCE_LIMITS_M, { fromM, toM });
  requireRange("levelChangeDb", EXPONENT_LIMITS, { exponent });
  return 10 * exponent * Math.log10(fromM / toM);
}

/**
 * Where a carrier would arrive louder by the wished amount: the inverse of levelChangeDb.
 *
 *     d2 = d1·10^(−ΔP / (10·n))
 *
 * Assumes: as levelChangeDb. Not for: results inside the near field; the caller has to compare.
 *
 * @param fromM         Distance before. [m], 0.001 to 10⁹
 * @param changeDb      Wished change of the received level, positive for louder. [dB], −300 to 300
 * @param exponent      How fast power falls with distance: 2 in free space. [none], 0.5 to 10
 * @returns             Distance after; may lie outside what levelChangeDb accepts. [m], above 0
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as levelChangeDb, solved for the second distance
 * @differs             none
 * @checkedBy           singal-2-1-back, singal-2-2-back, rappaport-4-2-back, rappaport-4-11-back,
 *                      garg-3-4-separation
 */
export function distanceForChangeM(wish: {
  readonly fromM: number;
  readonly changeDb: number;
  readonly exponent: number;
}): number {
  const { fromM, changeDb, exponent } = wish;
  requireRange("distanceForChangeM", DISTANCE_LIMITS_M, { fromM });
  requireRange("distanceForChangeM", LEVEL_CHANGE_LIMITS_DB, { changeDb });
  requireRange("distanceForChangeM", EXPONENT_LIMITS, { exponent });
  return fromM * 10 ** (-changeDb / (10 * exponent));
}
