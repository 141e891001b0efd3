import { DISTANCE_LIMITS_M, type Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

const ZONE_LIMITS: Limits = { min: 1, max: 1000 };

/**
 * How wide the space around a path is that takes part in carrying the wave, at one point of the path.
 *
 *     Rn = √(n·λ·d1·d2 / (d1 + d2))
 *
 * Assumes: both distances large against the radius. Not for: points close to an antenna, where the
 * zone is a rounded end and not a cross-section.
 *
 * @param fromM         Distance from one antenna to the point. [m], 0.001 to 10⁹
 * @param toM           Distance from the point to the other antenna. [m], 0.001 to 10⁹
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @param order         n, number of the zone: 1 for the first. [none], 1 to 1000
 * @returns             Radius of the outer edge of that zone. [m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            1 % where both distances are 4 times the radius or more
 * @source              Rec. ITU-R P.526-8, Annex 1, section 2, equations (2) and (3). Read at
 *                      studylib.net/doc/5879182, 2026-12-01.
 * @differs             Equation (3) rounds the constant to 550 (km, MHz), 0.5 % more; unrounded here.
 * @checkedBy           ghasemi-6-1, ghasemi-7-5, p526-550
 */
export function fresnelRadiusM(point: {
  readonly fromM: number;
  readonly toM: number;
  readonly frequencyMhz: number;
  readonly order: number;
}): number {
  const { fromM, toM, frequencyMhz, order } = point;
  requireRange("fresnelRadiusM", DISTANCE_LIMITS_M, { fromM, toM });
  requireRange("fresnelRadiusM", ZONE_LIMITS, { order });
  return Math.sqrt((order * wavelengthM(frequencyMhz) * fromM * toM) / (fromM + toM));
}
