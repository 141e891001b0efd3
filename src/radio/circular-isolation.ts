import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const AXIAL_RATIO_LIMITS_DB: Limits = { min: 0.001, max: 100 };

/**
 * How far a circular antenna holds off the opposite sense, from its axial ratio.
 *
 *     isolation = 20·log10((r + 1) / (r − 1)), r = 10^(axialRatio / 20)
 *
 * Assumes: the wave is purely circular. Not for: a linear wave, of which any circular antenna takes
 * about half. The formula is its own inverse: given the isolation, it gives the axial ratio.
 *
 * @param axialRatioDb  Long over short axis of the ellipse. [dB], 0.001 to 100
 * @returns             Cross-polar isolation. [dB], above 0
 * @throws RangeError   If the axial ratio lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              Table of axial ratio and cross-polar discrimination at satsig.net/axial.htm, read
 *                      2026-12-01; the formula follows from the two circular parts of an ellipse, (r ± 1) / 2.
 * @differs             Written with the hyperbolic tangent: (r − 1) / (r + 1) = tanh(½·ln r).
 * @checkedBy           satsig-0-3-db, satsig-0-51-db, satsig-0-83-db, satsig-1-01-db,
 *                      satsig-1-58-db
 */
export function circularIsolationDb(axialRatioDb: number): number {
  requireRange("circularIsolationDb", AXIAL_RATIO_LIMITS_DB, { axialRatioDb });
  return -20 * Math.log10(Math.tanh((axialRatioDb * Math.LN10) / 40));
}
