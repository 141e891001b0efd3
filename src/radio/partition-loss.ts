import { LOSS_LIMITS_DB } from "./level-limits.ts";
import { DISTANCE_LIMITS_M, EXPONENT_LIMITS } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * Average loss in a building from a measured loss nearby, plus what floors and walls between take away.
 *
 *     L(d) = L(d0) + 10·n·log10(d / d0) + FAF + ΣPAF
 *
 * Assumes: far field at both distances, walls and floors that each take a known loss. Not for: adding
 * walls to an exponent that was measured across walls: they would count twice.
 *
 * @param nearLossDb    Loss at the near distance. [dB], 0 to 300
 * @param nearM         Near distance. [m], 0.001 to 10⁹
 * @param distanceM     Straight-line distance between the antennas. [m], the near distance to 10⁹
 * @param exponent      How fast power falls with distance on one floor. [none], 0.5 to 10
 * @param floorsDb      Loss of all floors between, 0 on one floor or with an exponent across floors. [dB], 0 to 300
 * @param wallsDb       Loss of all walls and other blocks between. [dB], 0 to 300
 * @returns             Average loss. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            Standard deviation 4 to 13 dB in the source's buildings; from memory, to be verified.
 * @source              T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                      section 4.11.5, attenuation factor model; example 4.11, p. 166, read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 * @differs             none
 * @checkedBy           rappaport-4-11-one-floor, rappaport-4-11-many-floors, simulator-log-distance-10m,
 *                      simulator-log-distance-80m, garg-3-8-radius
 */
export function partitionLossDb(path: {
  readonly nearLossDb: number;
  readonly nearM: number;
  readonly distanceM: number;
  readonly exponent: number;
  readonly floorsDb: number;
  readonly wallsDb: number;
}): number {
  const { nearLossDb, nearM, distanceM, exponent, floorsDb, wallsDb } = path;
  requireRange("partitionLossDb", LOSS_LIMITS_DB, { nearLossDb, floorsDb, wallsDb });
  requireRange("partitionLossDb", DISTANCE_LIMITS_M, { nearM });
  requireRange("partitionLossDb", { min: nearM, max: DISTANCE_LIMITS_M.max }, { distanceM });
  requireRange("partitionLossDb", EXPONENT_LIMITS, { exponent });
  return nearLossDb + 10 * exponent * Math.log10(distanceM / nearM) + floorsDb + wallsDb;
}
