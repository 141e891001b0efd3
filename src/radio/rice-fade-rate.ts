import { scaledI0 } from "./bessel-i0.ts";
import { DOPPLER_LIMITS_HZ } from "./doppler.ts";
import type { RayleighWalk } from "./fade-rate.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";
import { riceOutageProbability } from "./rice-outage.ts";
import { BRANCH_COUNT_LIMITS } from "./selection-outage.ts";

/** Where the needed level lies further above the mean, a strong direct wave stays below it for ages. */
const DURATION_MARGIN_LIMITS_DB: Limits = { min: -3, max: 100 };

/** A walk on which one wave stands out from the reflections. */
export interface RiceWalk extends RayleighWalk {
  /** Power of the direct wave over that of all reflections. [dB], −40 to 25 */
  readonly kFactorDb: number;
}

/** Fades a second at one antenna: the density of the amplitude at the bound, times its mean speed downwards. */
function singleRateHz(marginDb: number, kFactorDb: number, shiftHz: number): number {
  const k = 10 ** (kFactorDb / 10);
  const amplitude = 10 ** (-marginDb / 20);
  const root = Math.sqrt(k + 1);
  // e^(−(√K − r·√(K + 1))²) is left when e^(2r·√(K·(K + 1))) has been taken out of I₀.
  return (
    Math.sqrt(2 * Math.PI) *
    root *
    shiftHz *
    amplitude *
    Math.exp(-((Math.sqrt(k) - amplitude * root) ** 2)) *
    scaledI0(2 * amplitude * Math.sqrt(k) * root)
  );
}

/**
 * How often the level falls below what the receiver needs while somebody walks in sight of the
 * antenna, without and with selection diversity.
 *
 *     N₁ = √(2π·(K + 1))·f_d·r·e^(−K − (K + 1)·r²)·I₀(2r·√(K·(K + 1))), r = 10^(−margin / 20);
 *     of n antennas n·N₁·P^(n−1), P from riceOutageProbability
 *
 * Assumes: Rice fading, reflections from all sides in the plane of the path, the direct wave across
 * the path (no Doppler shift of its own), antennas that fade independently. Not for: walking straight at
 * the antenna, where the rate differs by some tens of percent; nor the time in a fade (riceFadeDurationS).
 *
 * @param walk          marginDb [dB], −10 to 100; kFactorDb [dB], −40 to 25; shiftHz [Hz], 10⁻⁶ to 10⁶;
 *                      branchCount [none], 1 to 8
 * @returns             Fades a second; 0 where there are fewer than a computer can tell from none. [Hz]
 * @throws RangeError   If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy            exact for the assumptions; relative, 10⁻¹⁰
 * @source              S. O. Rice, Statistical Properties of a Sine Wave Plus Random Noise, Bell Syst. Tech.
 *                      J. 27 (1948), 109-157; in this form G. L. Stüber, Principles of Mobile
 *                      Communication, section 2.1. From memory, to be verified. Several antennas: as fadeRateHz.
 * @differs             none
 * @checkedBy           none published, see test
 */
export function riceFadeRateHz(walk: RiceWalk): number {
  const { marginDb, kFactorDb, shiftHz, branchCount } = walk;
  requireRange("riceFadeRateHz", DOPPLER_LIMITS_HZ, { shiftHz });
  requireWhole("riceFadeRateHz", BRANCH_COUNT_LIMITS, { branchCount });
  const othersBelow = riceOutageProbability({ marginDb, kFactorDb }) ** (branchCount - 1);
  return branchCount * singleRateHz(marginDb, kFactorDb, shiftHz) * othersBelow;
}

/**
 * How long the level stays below what the receiver needs, on average, once it has fallen below, for
 * somebody who walks in sight of the antenna.
 *
 *     t = P / (n·N₁), P from riceOutageProbability, N₁ the rate of one antenna from riceFadeRateHz
 *
 * Assumes: as riceFadeRateHz. Not for: the longest fade: durations scatter widely around their mean.
 *
 * @param walk          marginDb [dB], −3 to 100; kFactorDb [dB], −40 to 25; shiftHz [Hz], 10⁻⁶ to 10⁶;
 *                      branchCount [none], 1 to 8
 * @returns             Mean duration of a fade. [s]
 * @throws RangeError   If an input lies outside its range or is NaN, or the count is not whole.
 * @accuracy            exact for the assumptions; relative, 10⁻¹⁰
 * @source              as riceFadeRateHz: outage divided by rate
 * @differs             none
 * @checkedBy           none published, see test
 */
export function riceFadeDurationS(walk: RiceWalk): number {
  const { marginDb, kFactorDb, shiftHz, branchCount } = walk;
  requireRange("riceFadeDurationS", DURATION_MARGIN_LIMITS_DB, { marginDb });
  requireRange("riceFadeDurationS", DOPPLER_LIMITS_HZ, { shiftHz });
  requireWhole("riceFadeDurationS", BRANCH_COUNT_LIMITS, { branchCount });
  const outage = riceOutageProbability({ marginDb, kFactorDb });
  return outage / (branchCount * singleRateHz(marginDb, kFactorDb, shiftHz));
}
