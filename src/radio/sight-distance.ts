import { LOCATION_LIMITS } from "./low-terminal-corrections.ts";
import { requireRange } from "./require-range.ts";

/**
 * The distance up to which a share of places near street level still are in sight.
 *
 *     d = 212·(log10 p)² − 64·log10 p  for p below 0.45,  else  79.2 − 70·p
 *
 * Assumes: streets of a town. Not for: halls, stages, open fields.
 *
 * @param locationProbability  Share of places. [none], 0.01 to 0.99
 * @returns             Distance. [m]
 * @throws RangeError   If the share lies outside that range or is NaN.
 * @accuracy            the two parts meet within 0.1 m
 * @source              Rec. ITU-R P.1411-11, section 4.3.1, equation (64). Read second-hand at
 *                      github.com/eeveetza/p1411, 2026-12-01.
 * @differs             A share here, percent there.
 * @checkedBy           p1411-sight-distance-1, p1411-sight-distance-10
 */
export function sightDistanceM(locationProbability: number): number {
  requireRange("sightDistanceM", LOCATION_LIMITS, { locationProbability });
  const logShare = Math.log10(locationProbability);
  return locationProbability < 0.45
    ? 212 * logShare ** 2 - 64 * logShare
    : 79.2 - 70 * locationProbability;
}
