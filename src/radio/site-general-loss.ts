import { EXPONENT_LIMITS, type Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const SITE_DISTANCE_LIMITS_M: Limits = { min: 1, max: 10_000 };
const SITE_FREQUENCY_LIMITS_MHZ: Limits = { min: 100, max: 500_000 };
const OFFSET_LIMITS_DB: Limits = { min: -100, max: 200 };
const FREQUENCY_EXPONENT_LIMITS: Limits = { min: 0, max: 10 };

/**
 * Median loss in a kind of place, from coefficients that were fitted to measurements there.
 *
 *     L = 10·α·log10(d) + β + 10·γ·log10(f)    with d in m and f in GHz
 *
 * Assumes: the kind of place, distances and frequencies that the coefficients were fitted for; they stand
 * with them in the table. Not for: one particular spot: half of all places have more loss than this.
 *
 * @param distanceM     Straight-line distance between the antennas. [m], 1 to 10 000
 * @param frequencyMhz  Carrier frequency, in MHz here as everywhere. [MHz], 100 to 500 000
 * @param exponent      α, how fast power falls with distance. [none], 0.5 to 10
 * @param offsetDb      β, loss at 1 m and 1 GHz on the fitted line. [dB], −100 to 200
 * @param frequencyExponent  γ, how fast power falls with frequency: 2 in free space. [none], 0 to 10
 * @returns             Median basic transmission loss. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            The standard deviation σ that the table gives beside the coefficients, 2.7 to 9.3 dB.
 * @source              Rec. ITU-R P.1238-11, section 3.1, equation (1), Table 2 (indoors), read second-hand at
 *                      github.com/aajuvonen/octave-rxt; Rec. ITU-R P.1411-11, section 4.1.1, Table 4 (below roof
 *                      tops), read second-hand at github.com/eeveetza/p1411, 2026-12-01.
 * @differs             none. A published program feeds MHz into this formula for GHz, 30·γ dB too much.
 * @checkedBy           p1238-office-sight, p1238-office-hidden, p1238-corridor-sight, p1238-corridor-hidden,
 *                      p1238-industrial-sight, p1238-industrial-hidden, p1411-below-roof-sight,
 *                      p1411-below-roof-hidden
 */
export function siteGeneralLossDb(path: {
  readonly distanceM: number;
  readonly frequencyMhz: number;
  readonly exponent: number;
  readonly offsetDb: number;
  readonly frequencyExponent: number;
}): number {
  const { distanceM, frequencyMhz, exponent, offsetDb, frequencyExponent } = path;
  requireRange("siteGeneralLossDb", SITE_DISTANCE_LIMITS_M, { distanceM });
  requireRange("siteGeneralLossDb", SITE_FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  requireRange("siteGeneralLossDb", EXPONENT_LIMITS, { exponent });
  requireRange("siteGeneralLossDb", OFFSET_LIMITS_DB, { offsetDb });
  requireRange("siteGeneralLossDb", FREQUENCY_EXPONENT_LIMITS, { frequencyExponent });
  const decades = exponent * Math.log10(distanceM);
  const frequencyDecades = frequencyExponent * Math.log10(frequencyMhz / 1000);
  return 10 * (decades + frequencyDecades) + offsetDb;
}
