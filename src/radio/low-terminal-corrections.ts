import type { Limits } from "./limits.ts";
import { normalQuantile } from "./normal.ts";
import { requireRange } from "./require-range.ts";

/** The Recommendation's own table runs from 1 % to 99 %. */
export const LOCATION_LIMITS: Limits = { min: 0.01, max: 0.99 };
const SPREAD_DB = 7;

/**
 * How much more than the median loss in sight has to be allowed for a share of places.
 *
 *     ΔL = 1.5624·σ·(√(−2·ln(1 − p)) − 1.1774),  σ = 7 dB
 *
 * Assumes: both ends near street level, in sight of each other. Not for: one place over time.
 *
 * @param locationProbability  Share of places whose loss is not higher. [none], 0.01 to 0.99
 * @returns             Correction to the median, negative below a half. [dB]
 * @throws RangeError   If the share lies outside that range or is NaN.
 * @accuracy            as the Recommendation: no figure is given for it
 * @source              Rec. ITU-R P.1411-11, section 4.3.1, equation (59). Read second-hand at
 *                      github.com/eeveetza/p1411, 2026-12-01.
 * @differs             A share here, percent there.
 * @checkedBy           p1411-sight-correction-1, p1411-sight-correction-10, p1411-sight-correction-90,
 *                      p1411-sight-correction-99
 */
export function sightCorrectionDb(locationProbability: number): number {
  requireRange("sightCorrectionDb", LOCATION_LIMITS, { locationProbability });
  return 1.5624 * SPREAD_DB * (Math.sqrt(-2 * Math.log(1 - locationProbability)) - 1.1774);
}

/**
 * How much more than the median loss out of sight has to be allowed for a share of places.
 *
 *     ΔL = σ·Φ⁻¹(p),  σ = 7 dB
 *
 * Assumes: both ends near street level, out of sight of each other. Not for: one place over time.
 *
 * @param locationProbability  Share of places whose loss is not higher. [none], 0.01 to 0.99
 * @returns             Correction to the median, negative below a half. [dB]
 * @throws RangeError   If the share lies outside that range or is NaN.
 * @accuracy            as the Recommendation: no figure is given for it
 * @source              Rec. ITU-R P.1411-11, section 4.3.1, equation (62). Read second-hand at
 *                      github.com/eeveetza/p1411, 2026-12-01.
 * @differs             A share here, percent there.
 * @checkedBy           p1411-hidden-correction-1, p1411-hidden-correction-10, p1411-hidden-correction-90,
 *                      p1411-hidden-correction-99
 */
export function hiddenCorrectionDb(locationProbability: number): number {
  requireRange("hiddenCorrectionDb", LOCATION_LIMITS, { locationProbability });
  return SPREAD_DB * normalQuantile(locationProbability);
}
