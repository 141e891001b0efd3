import { DOPPLER_LIMITS_HZ } from "./doppler.ts";
import { MARGIN_LIMITS_DB, rayleighOutageProbability } from "./rayleigh-outage.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";
import { BRANCH_COUNT_LIMITS } from "./selection-outage.ts";

/** A walk through Rayleigh fading. */
export interface RayleighWalk {
  /** Mean power of each antenna over the needed power. [dB], −10 to 100 */
  readonly marginDb: number;
  /** Largest Doppler frequency, from dopplerHz. [Hz], 10⁻⁶ to 10⁶ */
  readonly shiftHz: number;
  /** Antennas of which the strongest is taken. [none], 1 to 8 */
  readonly branchCount: number;
}

/**
 * How often the level falls below what the receiver needs while somebody walks: the level crossing
 * rate, without and with selection diversity.
 *
 *     N₁ = √(2π)·f_d·r·e^(−r²), r = 10^(−margin / 20); of n antennas n·N₁·(1 − e^(−r²))^(n−1)
 *
 * Assumes: Rayleigh fading, waves from all sides in the plane of the path, antennas that fade
 * independently. Not for: antennas close together, nor the time in a fade (fadeDurationS).
 *
 * @param walk          marginDb [dB], −10 to 100; shiftHz [Hz], 10⁻⁶ to 10⁶; branchCount [none], 1 to 8
 * @returns             Fades a second; 0 where there are fewer than a computer can tell from none. [Hz]
 * @throws RangeError   If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy            exact for the assumptions
 * @source              One antenna: T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd
 *                      ed. (2002), section 5.7.3, examples 5.7 to 5.9. Read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01; section from memory.
 *                      Several: J. C. S. Santos Filho, M. D. Yacoub, G. Fraidenraich, The General Solution
 *                      for Crossing Rates and Fade Durations of Selection Combining, SBrT 2004,
 *                      doi 10.14209/sbrt.2004.240, of which the abstract was read at
 *                      biblioteca.sbrt.org.br/articles/3479, 2026-12-01. For independent branches it is
 *                      one line: the last of them falls below while all the others are below already.
 * @differs             none
 * @checkedBy           rappaport-5-7-rate, garg-3-6-rate, walking-rate-10-db, walking-rate-20-db
 */
export function fadeRateHz(walk: RayleighWalk): number {
  const { marginDb, shiftHz, branchCount } = walk;
  requireRange("fadeRateHz", DOPPLER_LIMITS_HZ, { shiftHz });
  requireWhole("fadeRateHz", BRANCH_COUNT_LIMITS, { branchCount });
  const othersBelow = rayleighOutageProbability(marginDb) ** (branchCount - 1);
  const amplitude = 10 ** (-marginDb / 20);
  const single = Math.sqrt(2 * Math.PI) * shiftHz * amplitude * Math.exp(-(amplitude ** 2));
  return branchCount * single * othersBelow;
}

/**
 * How long the level stays below what the receiver needs, on average, once it has fallen below.
 *
 *     t = (e^(r²) − 1) / (n·r·f_d·√(2π)), r = 10^(−margin / 20)
 *
 * Assumes: as fadeRateHz. Not for: the longest fade: durations scatter widely around their mean.
 *
 * @param walk          marginDb [dB], −10 to 100; shiftHz [Hz], 10⁻⁶ to 10⁶; branchCount [none], 1 to 8
 * @returns             Mean duration of a fade. [s]
 * @throws RangeError   If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy            exact for the assumptions
 * @source              as fadeRateHz: outage divided by rate, of which the chance that the other
 *                      antennas are below cancels
 * @differs             none
 * @checkedBy           rappaport-5-8-r-0-01, rappaport-5-8-r-0-1, rappaport-5-8-r-1,
 *                      rappaport-5-9-r-0-707, rappaport-5-9-r-0-1, singal-2-9-r-0-01,
 *                      singal-2-9-r-0-1, singal-2-9-r-1, walking-duration-10-db,
 *                      walking-duration-20-db
 */
export function fadeDurationS(walk: RayleighWalk): number {
  const { marginDb, shiftHz, branchCount } = walk;
  requireRange("fadeDurationS", MARGIN_LIMITS_DB, { marginDb });
  requireRange("fadeDurationS", DOPPLER_LIMITS_HZ, { shiftHz });
  requireWhole("fadeDurationS", BRANCH_COUNT_LIMITS, { branchCount });
  const amplitude = 10 ** (-marginDb / 20);
  const crossings = Math.sqrt(2 * Math.PI) * shiftHz * amplitude * branchCount;
  return Math.expm1(amplitude ** 2) / crossings;
}
