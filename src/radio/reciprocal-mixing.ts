import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import type { Limits } from "./limits.ts";
import { BANDWIDTH_LIMITS_HZ } from "./noise-limits.ts";
import { requireRange } from "./require-range.ts";

const PHASE_NOISE_LIMITS_DBC: Limits = { min: -300, max: 0 };

/**
 * Noise that a strong neighbour makes in the channel by way of the receiver's own oscillator.
 *
 *     N = P + L(Δf) + 10·log10 B
 *
 * Assumes: phase noise flat across the channel, unrelated to the carrier's modulation. Not for: the
 * noise that the neighbour sends out itself, which no receiver can remove.
 *
 * @param mixing.blockerDbm     Strong carrier at the receiver's input. [dBm], −300 to 300
 * @param mixing.phaseNoiseDbc  Oscillator's noise at the offset of the blocker, over 1 Hz. [dBc/Hz], −300 to 0
 * @param mixing.bandwidthHz    Noise bandwidth of the receiver. [Hz], 1 to 10¹²
 * @returns                     Noise power referred to the input. [dBm]
 * @throws RangeError           If an input lies outside its range or is NaN.
 * @accuracy                    exact for the assumptions
 * @source                      rfessentials.com, RF glossary, reciprocal mixing. Read 2026-12-01.
 * @differs                     The page adds its example to a floor of −121 dBm and prints −115.8 dBm and 5.2 dB; the powers
 *                              add up to −115.5 dBm and 5.5 dB.
 * @checkedBy                   glossary-mixing-noise
 */
export function reciprocalMixingNoiseDbm(mixing: {
  readonly blockerDbm: number;
  readonly phaseNoiseDbc: number;
  readonly bandwidthHz: number;
}): number {
  const { blockerDbm, phaseNoiseDbc, bandwidthHz } = mixing;
  requireRange("reciprocalMixingNoiseDbm", LEVEL_LIMITS_DBM, { blockerDbm });
  requireRange("reciprocalMixingNoiseDbm", PHASE_NOISE_LIMITS_DBC, { phaseNoiseDbc });
  requireRange("reciprocalMixingNoiseDbm", BANDWIDTH_LIMITS_HZ, { bandwidthHz });
  return blockerDbm + phaseNoiseDbc + 10 * Math.log10(bandwidthHz);
}

/**
 * Strongest neighbour for a given mixing noise: the inverse of reciprocalMixingNoiseDbm.
 *
 *     P = N − L(Δf) − 10·log10 B
 *
 * Assumes: as reciprocalMixingNoiseDbm. Not for: blockers so strong that the input is overdriven first.
 *
 * @param mixing.noiseDbm       Highest mixing noise that is acceptable, at the input. [dBm], −300 to 300
 * @param mixing.phaseNoiseDbc  Oscillator's noise at the offset of the blocker, over 1 Hz. [dBc/Hz], −300 to 0
 * @param mixing.bandwidthHz    Noise bandwidth of the receiver. [Hz], 1 to 10¹²
 * @returns                     Blocker at the receiver's input. [dBm]
 * @throws RangeError           If an input lies outside its range or is NaN.
 * @accuracy                    exact for the assumptions
 * @source                      as reciprocalMixingNoiseDbm, solved for the blocker
 * @differs                     none
 * @checkedBy                   glossary-mixing-blocker
 */
export function blockerForMixingNoiseDbm(mixing: {
  readonly noiseDbm: number;
  readonly phaseNoiseDbc: number;
  readonly bandwidthHz: number;
}): number {
  const { noiseDbm, phaseNoiseDbc, bandwidthHz } = mixing;
  requireRange("blockerForMixingNoiseDbm", LEVEL_LIMITS_DBM, { noiseDbm });
  requireRange("blockerForMixingNoiseDbm", PHASE_NOISE_LIMITS_DBC, { phaseNoiseDbc });
  requireRange("blockerForMixingNoiseDbm", BANDWIDTH_LIMITS_HZ, { bandwidthHz });
  return noiseDbm - phaseNoiseDbc - 10 * Math.log10(bandwidthHz);
}
