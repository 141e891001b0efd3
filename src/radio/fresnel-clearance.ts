import { fresnelRadiusM } from "./fresnel-zone.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const CLEARANCE_LIMITS_M: Limits = { min: -10_000, max: 10_000 };
const CLEARANCE_RATIO_LIMITS: Limits = { min: -1000, max: 1000 };

/**
 * How much of the first Fresnel zone stays clear between the straight path and an obstacle.
 *
 *     q = c / R1
 *
 * Assumes: one obstacle, all else clear. Not for: obstacles smaller than the zone; a person does not
 * fill it at UHF, so more gets past than this says.
 *
 * @param clearanceM    Distance from the path to the obstacle, negative if it rises above the path. [m],
 *                      −10 000 to 10 000
 * @param fromM         Distance from one antenna to the obstacle. [m], 0.001 to 10⁹
 * @param toM           Distance from the obstacle to the other antenna. [m], 0.001 to 10⁹
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Clearance in radii of the first zone; from 0.6 on an edge takes nothing away. Its
 *                      square is the number of the zone that the obstacle reaches. [none]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            as fresnelRadiusM
 * @source              Rec. ITU-R P.526-8, Annex 1, section 2: in sight if the first zone is free of obstacles,
 *                      read at studylib.net/doc/5879182, 2026-12-01. The share 0.6: Rec. ITU-R P.530; from
 *                      memory, to be verified.
 * @differs             none
 * @checkedBy           ghasemi-6-3-ratio
 */
export function clearanceRatio(obstacle: {
  readonly clearanceM: number;
  readonly fromM: number;
  readonly toM: number;
  readonly frequencyMhz: number;
}): number {
  requireRange("clearanceRatio", CLEARANCE_LIMITS_M, { clearanceM: obstacle.clearanceM });
  return obstacle.clearanceM / fresnelRadiusM({ ...obstacle, order: 1 });
}

/**
 * The clearance that leaves a wished part of the first Fresnel zone free: the inverse of clearanceRatio.
 *
 *     c = q·R1
 *
 * Assumes: as clearanceRatio. Not for: raising antennas beyond what the site's rules allow.
 *
 * @param clearanceRatio  Wished clearance in radii of the first zone: 0.6 is the usual wish. [none],
 *                      −1000 to 1000
 * @param fromM         Distance from one antenna to the obstacle. [m], 0.001 to 10⁹
 * @param toM           Distance from the obstacle to the other antenna. [m], 0.001 to 10⁹
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Distance from the path to the obstacle. [m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            as fresnelRadiusM
 * @source              as clearanceRatio, solved for the distance
 * @differs             none
 * @checkedBy           none published, see test
 */
export function clearanceForRatioM(wish: {
  readonly clearanceRatio: number;
  readonly fromM: number;
  readonly toM: number;
  readonly frequencyMhz: number;
}): number {
  const { clearanceRatio } = wish;
  requireRange("clearanceForRatioM", CLEARANCE_RATIO_LIMITS, { clearanceRatio });
  return clearanceRatio * fresnelRadiusM({ ...wish, order: 1 });
}
