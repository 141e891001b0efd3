import { breakPointM } from "./break-point.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

const UHF_LIMITS_MHZ: Limits = { min: 300, max: 3000 };
const STREET_HEIGHT_LIMITS_M: Limits = { min: 0.5, max: 100 };
const STREET_DISTANCE_LIMITS_M: Limits = { min: 1, max: 1000 };
/** Nearer than this share of the break point, 10^(−14/5), the upper line dips below the median. */
const LEAST_BREAK_POINTS = 10 ** -2.8;

/** Median loss and the two lines that it swings between. */
export interface StreetLoss {
  readonly lowerDb: number;
  readonly medianDb: number;
  readonly upperDb: number;
}

/**
 * Loss at the break point on the lower of the two lines that the level swings between.
 *
 *     Lbp = |20·log10(λ² / (8π·h1·h2))|
 *
 * Assumes: as breakPointM. Not for: antennas so low that h1·h2 is below λ² / 8π.
 *
 * @param fromHeightM   Height of one antenna above the ground. [m], 0.5 to 100
 * @param toHeightM     Height of the other. [m], 0.5 to 100
 * @param frequencyMhz  Carrier frequency. [MHz], 300 to 3000
 * @returns             Basic transmission loss. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            6.02 dB below free space at that distance: both rays in step
 * @source              Rec. ITU-R P.1411-12, Annex 1, section 4.1.2, UHF propagation. Read second-hand at
 *                      github.com/ic-crc/crc-covlib, helper for P.1411, 2026-12-01.
 * @differs             none
 * @checkedBy           p1411-break-loss-stage
 */
export function breakPointLossDb(path: {
  readonly fromHeightM: number;
  readonly toHeightM: number;
  readonly frequencyMhz: number;
}): number {
  const { fromHeightM, toHeightM, frequencyMhz } = path;
  requireRange("breakPointLossDb", STREET_HEIGHT_LIMITS_M, { fromHeightM, toHeightM });
  requireRange("breakPointLossDb", UHF_LIMITS_MHZ, { frequencyMhz });
  return 20 * Math.log10((8 * Math.PI * fromHeightM * toHeightM) / wavelengthM(frequencyMhz) ** 2);
}

/**
 * Loss in sight over ground, between the lines that the reflections make it swing between.
 *
 *     up to Rbp:    Ll = Lbp + 20·log10(d / Rbp),  Lm = Ll + 6,  Lu = Lbp + 20 + 25·log10(d / Rbp)
 *     beyond Rbp:   Ll = Lbp + 40·log10(d / Rbp),  Lm = Ll + 6,  Lu = Ll + 20
 *
 * Assumes: both ends in sight of each other between buildings, UHF. Not for: rooms, crowds, people in
 * the way; a promise, as the lines hold the bulk of measured levels and not all of them.
 *
 * @param distanceM     Distance between the antennas, at least Rbp / 631. [m], 1 to 1000
 * @param fromHeightM   Height of one antenna above the ground. [m], 0.5 to 100
 * @param toHeightM     Height of the other. [m], 0.5 to 100
 * @param frequencyMhz  Carrier frequency. [MHz], 300 to 3000
 * @returns             Lower, median and upper basic transmission loss. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            as the Recommendation: no figure is given for it
 * @source              Rec. ITU-R P.1411-12, Annex 1, section 4.1.2, UHF propagation. Read second-hand at
 *                      github.com/ic-crc/crc-covlib, helper for P.1411, 2026-12-01.
 * @differs             The Recommendation has no least distance. Nearer than Rbp / 631 its upper line falls below
 *                      its median: refused here. Height limits are ours.
 * @checkedBy           none published, see test
 */
export function streetLossDb(path: {
  readonly distanceM: number;
  readonly fromHeightM: number;
  readonly toHeightM: number;
  readonly frequencyMhz: number;
}): StreetLoss {
  const { distanceM } = path;
  const atBreakDb = breakPointLossDb(path);
  const breakM = breakPointM(path);
  const { min, max } = STREET_DISTANCE_LIMITS_M;
  const limits = { min: Math.max(min, LEAST_BREAK_POINTS * breakM), max };
  requireRange("streetLossDb", limits, { distanceM });
  const decades = Math.log10(distanceM / breakM);
  const isNear = decades <= 0;
  const lowerDb = atBreakDb + (isNear ? 20 : 40) * decades;
  return {
    lowerDb,
    medianDb: lowerDb + 6,
    upperDb: atBreakDb + 20 + (isNear ? 25 : 40) * decades,
  };
}
