import type { Limits } from "./limits.ts";
import { type Polarization, polarizationEfficiencyRatio } from "./polarization-efficiency.ts";
import { requireRange } from "./require-range.ts";

/** 0: the two polarizations cannot be told apart; 100: as good as pure. */
const RATIO_LIMITS_DB: Limits = { min: 0, max: 100 };

/** What keeps a crossed antenna from losing everything. */
export interface CrossPolarLimits {
  /** Power that the antenna takes from its own polarization over that from the opposite one. [dB], 0 to 100 */
  readonly isolationDb: number;
  /** Power that the surroundings leave in the sent polarization over that in the opposite one. [dB], 0 to 100 */
  readonly crossRatioDb: number;
}

/**
 * What an antenna loses by its polarization, against one that matches the wave in the same place.
 *
 *     L = −10·log10(p + (1 − p)·c), c = (a + s) / (1 + a·s), a = 10^(−isolation / 10), s = 10^(−crossRatio / 10)
 *
 * Assumes: what the surroundings turn, and what the antenna takes wrongly, have random phases, so that
 * powers add and the figure is a mean. Not for: one spot, where the two parts may cancel.
 *
 * @param match.wave          Polarization that was sent: tiltDeg [°], −360 to 360; axisRatio [none], −1 to 1
 * @param match.antenna       Polarization that is taken best: likewise
 * @param match.isolationDb   Cross-polar isolation of the antenna, 10 to 15 for a whip on a body, 20 to 30 for
 *                            a good dipole (common practice, no source). [dB], 0 to 100
 * @param match.crossRatioDb  Cross-polar ratio of the surroundings, about 10 indoors (3GPP TR 38.901, Table
 *                            7.5-6, second-hand). [dB], 0 to 100; 100 for none
 * @returns                   Loss, 0 or more and at most about 97. [dB]
 * @throws RangeError         If an input lies outside its range or is NaN.
 * @accuracy                  exact for the assumptions
 * @source                    p: as polarizationEfficiencyRatio. Cross-polar ratio of the surroundings as power
 *                            beside the sent polarization: 3GPP TR 38.901, section 7.5, step 9, from memory, to
 *                            be verified. Taking both limits together: common practice, no source; each
 *                            mixes the two polarizations, one after the other.
 * @differs                   none
 * @checkedBy           kraus-21-5-1, turned-30-deg, turned-45-deg, turned-60-deg, turned-80-deg,
 *                      axial-1-db-to-linear-best, axial-3-db-to-linear-best,
 *                      axial-6-db-to-linear-best
 */
export function polarizationLossDb(
  match: { readonly wave: Polarization; readonly antenna: Polarization } & CrossPolarLimits,
): number {
  const { wave, antenna, isolationDb, crossRatioDb } = match;
  requireRange("polarizationLossDb", RATIO_LIMITS_DB, { isolationDb, crossRatioDb });
  const efficiency = polarizationEfficiencyRatio(wave, antenna);
  const impurity = 10 ** (-isolationDb / 10);
  const scattered = 10 ** (-crossRatioDb / 10);
  const floor = (impurity + scattered) / (1 + impurity * scattered);
  // Two fully matched states may give an efficiency of 1 + 10⁻¹⁶, which is no gain.
  return Math.max(0, -10 * Math.log10(efficiency + (1 - efficiency) * floor));
}
