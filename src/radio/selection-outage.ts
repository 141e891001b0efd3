import type { Limits } from "./limits.ts";
import { OUTAGE_LIMITS, rayleighMarginDb, rayleighOutageProbability } from "./rayleigh-outage.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

export const BRANCH_COUNT_LIMITS: Limits = { min: 1, max: 8 };

/**
 * Share of places in which the level of every antenna falls short at once, where the receiver always
 * takes the strongest.
 *
 *     P = (1 − e^(−x))^N, x = 10^(−margin / 10)
 *
 * Assumes: Rayleigh fading, antennas that fade independently and have the same mean power. Not for:
 * antennas close together (correlatedPairOutageProbability), or of which one hears less.
 *
 * @param marginDb      Mean power of each antenna over the needed power. [dB], −10 to 100
 * @param branchCount   Antennas to choose from. [none], 1 to 8
 * @returns             Outage, from 0 to 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy            exact for the assumptions
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 7.10.1, example 7.4. Read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 * @differs             none
 * @checkedBy           rappaport-7-4-four-branches, goldsmith-7-1-two-branches,
 *                      two-branches-at-20-db
 */
export function selectionOutageProbability(marginDb: number, branchCount: number): number {
  requireWhole("selectionOutageProbability", BRANCH_COUNT_LIMITS, { branchCount });
  return rayleighOutageProbability(marginDb) ** branchCount;
}

/**
 * The margin that each antenna needs to keep the outage at a wished share: the inverse of
 * selectionOutageProbability.
 *
 *     margin = −10·log10(−ln(1 − P^(1/N)))
 *
 * Assumes: as selectionOutageProbability. Not for: promises: the mean is never known to the last decibel.
 *
 * @param outageProbability  Wished outage. [none], 10⁻⁹ to 0.999
 * @param branchCount        Antennas to choose from. [none], 1 to 8
 * @returns                  Mean power of each antenna over the needed power. [dB], −10 to 90
 * @throws RangeError        If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy                 exact for the assumptions
 * @source                   as selectionOutageProbability, solved for the margin
 * @differs                  none
 * @checkedBy           selection-margin-1-percent, selection-margin-0-1-percent
 */
export function selectionMarginDb(outageProbability: number, branchCount: number): number {
  requireRange("selectionMarginDb", OUTAGE_LIMITS, { outageProbability });
  requireWhole("selectionMarginDb", BRANCH_COUNT_LIMITS, { branchCount });
  return rayleighMarginDb(outageProbability ** (1 / branchCount));
}
