import { requireWhole } from "./require-whole.ts";
import { BRANCH_COUNT_LIMITS, selectionMarginDb } from "./selection-outage.ts";

/**
 * By how much the mean level rises when a receiver takes the strongest of several antennas.
 *
 *     gain = 10·log10(1 + 1/2 + … + 1/N)
 *
 * Assumes: Rayleigh fading, antennas that fade independently and have the same mean power. Not for:
 * judging dropouts: diversity fills the holes, which the mean hardly shows (selectionDiversityGainDb).
 *
 * @param branchCount   Antennas to choose from. [none], 1 to 8
 * @returns             Mean power over that of one antenna. [dB], 0 or more
 * @throws RangeError   If the count lies outside its range, is NaN or not whole.
 * @accuracy            exact for the assumptions
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      eq. 7.62. From memory, to be verified.
 * @differs             none
 * @checkedBy           none published, see test
 */
export function selectionMeanGainDb(branchCount: number): number {
  requireWhole("selectionMeanGainDb", BRANCH_COUNT_LIMITS, { branchCount });
  let sum = 0;
  for (let k = 1; k <= branchCount; k += 1) sum += 1 / k;
  return 10 * Math.log10(sum);
}

/**
 * By how much less margin several antennas need than one, for the same outage.
 *
 *     gain = margin of one antenna − margin of each of N
 *
 * Assumes: as selectionOutageProbability. Not for: antennas close together (correlatedPairGainDb).
 *
 * @param outageProbability  Outage at which they are compared. [none], 10⁻⁹ to 0.999
 * @param branchCount        Antennas to choose from. [none], 1 to 8
 * @returns                  Diversity gain. [dB], 0 or more
 * @throws RangeError        If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy                 exact for the assumptions
 * @source                   as selectionMarginDb, taken twice
 * @differs                  none
 * @checkedBy           selection-gain-1-percent, selection-gain-0-1-percent
 */
export function selectionDiversityGainDb(outageProbability: number, branchCount: number): number {
  return (
    selectionMarginDb(outageProbability, 1) - selectionMarginDb(outageProbability, branchCount)
  );
}
