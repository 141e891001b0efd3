import { LOSS_LIMITS_DB } from "./level-limits.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const FLOORS_DISTANCE_LIMITS_M: Limits = { min: 1, max: 1000 };
const FLOORS_FREQUENCY_LIMITS_MHZ: Limits = { min: 300, max: 100_000 };
const PER_DECADE_LIMITS_DB: Limits = { min: 10, max: 60 };

/**
 * Average loss inside a building, with a term for the floors between the two ends.
 *
 *     L = 20·log10(f) + N·log10(d) + Lf(n) − 28    with f in MHz and d in m
 *
 * Assumes: both ends in one building; walls are part of N. Not for: one particular spot; places where the
 * signal finds a way outside or through a stairwell, which bounds the loss of many floors.
 *
 * @param distanceM     Straight-line distance between the antennas. [m], 1 to 1000
 * @param frequencyMhz  Carrier frequency. [MHz], 300 to 100 000
 * @param perDecadeDb   N, loss for each tenfold distance: 20 in the open, 28 to 33 indoors. [dB], 10 to 60
 * @param floorsDb      Lf, loss of all floors between, 0 on one floor. [dB], 0 to 300
 * @returns             Average transmission loss. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            Standard deviation 8 dB (homes), 10 dB (offices, shops) at 1.8 to 2 GHz; from memory, to be
 *                      verified.
 * @source              Rec. ITU-R P.1238, editions to -9, section 3.1, equation (1). Formula and values for 2 GHz
 *                      read second-hand at github.com/nsnam/ns-3-dev-git, src/buildings, 2026-12-01; the values for
 *                      900 MHz from memory, to be verified.
 * @differs             none. Edition -11 has replaced this by siteGeneralLossDb, which knows no floors.
 * @checkedBy           simulator-two-floors
 */
export function floorsLossDb(path: {
  readonly distanceM: number;
  readonly frequencyMhz: number;
  readonly perDecadeDb: number;
  readonly floorsDb: number;
}): number {
  const { distanceM, frequencyMhz, perDecadeDb, floorsDb } = path;
  requireRange("floorsLossDb", FLOORS_DISTANCE_LIMITS_M, { distanceM });
  requireRange("floorsLossDb", FLOORS_FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  requireRange("floorsLossDb", PER_DECADE_LIMITS_DB, { perDecadeDb });
  requireRange("floorsLossDb", LOSS_LIMITS_DB, { floorsDb });
  return 20 * Math.log10(frequencyMhz) + perDecadeDb * Math.log10(distanceM) + floorsDb - 28;
}
