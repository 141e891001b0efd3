import { LEVEL_CHANGE_LIMITS_DB, type Limits } from "./limits.ts";
import { normalProbability, normalQuantile } from "./normal.ts";
import { requireRange } from "./require-range.ts";

/** Published ones run from 2 dB (slow changes at one place) to 14 dB (many floors). */
const SPREAD_LIMITS_DB: Limits = { min: 0.01, max: 40 };

/**
 * How far the median level has to stand above the needed one for a wished share of places.
 *
 *     M = σ·Φ⁻¹(p)
 *
 * Assumes: levels that are normally distributed in dB around the median, as shadowing makes them.
 * Not for: the fast fading within a few wavelengths, which has another distribution and comes on top.
 *
 * @param placesProbability  Wished share of places (or moments). [none], 10⁻¹² to 1 − 10⁻¹²
 * @param spreadDb      σ, standard deviation of the level from place to place. [dB], 0.01 to 40
 * @returns             Margin, negative for less than half of the places. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions; shares above 0.99 ask more of the normal distribution
 *                      than measurements have shown
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 4.9.2, log-normal shadowing; example 4.9, p. 143, read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 * @differs             none
 * @checkedBy           ghasemi-6-6-margin, p1411-spread-90
 */
export function shadowMarginDb(placesProbability: number, spreadDb: number): number {
  requireRange("shadowMarginDb", SPREAD_LIMITS_DB, { spreadDb });
  return spreadDb * normalQuantile(placesProbability);
}

/**
 * The share of places in which a margin suffices: the inverse of shadowMarginDb.
 *
 *     p = Φ(M / σ)
 *
 * Assumes: as shadowMarginDb. Not for: the share of an area around a transmitter, most of which is
 * nearer than its edge.
 *
 * @param marginDb      Median level over the needed one. [dB], −300 to 300
 * @param spreadDb      σ, standard deviation of the level from place to place. [dB], 0.01 to 40
 * @returns             Share of places. [none], 0 to 1
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            as shadowMarginDb
 * @source              as shadowMarginDb, solved for the share
 * @differs             none
 * @checkedBy           rappaport-4-9-share, garg-3-9-share
 */
export function placesProbability(marginDb: number, spreadDb: number): number {
  requireRange("placesProbability", LEVEL_CHANGE_LIMITS_DB, { marginDb });
  requireRange("placesProbability", SPREAD_LIMITS_DB, { spreadDb });
  return normalProbability(marginDb / spreadDb);
}
