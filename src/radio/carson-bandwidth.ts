import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const AUDIO_LIMITS_HZ: Limits = { min: 1, max: 1e9 };
const DEVIATION_LIMITS_HZ: Limits = { min: 0, max: 1e9 };

/**
 * Bandwidth that a frequency-modulated carrier fills.
 *
 *     B = 2·(Δf + fm)
 *
 * Assumes: about 98 % of the power is to lie inside. Not for: digital modulation, nor the width down
 * to −60 dB that a transmitter mask asks about, which is more.
 *
 * @param deviationHz   Peak deviation. [Hz], 0 to 10⁹
 * @param audioHz       Highest modulating frequency, pilot tone included. [Hz], 1 to 10⁹
 * @returns             Occupied bandwidth. [Hz]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            a rule of thumb: 98 to 99.9 % of the power of a sine-modulated carrier lies inside
 * @source              J. R. Carson, Notes on the theory of modulation, Proc. IRE 10 (1922) 57, from memory, to be
 *                      verified. Examples: T. S. Rappaport, Wireless Communications: Principles and Practice, 6.3 and
 *                      6.5, read second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             none
 * @checkedBy           rappaport-6-3, rappaport-6-5-index-3, rappaport-6-5-index-5
 */
export function carsonBandwidthHz(deviationHz: number, audioHz: number): number {
  requireRange("carsonBandwidthHz", DEVIATION_LIMITS_HZ, { deviationHz });
  requireRange("carsonBandwidthHz", AUDIO_LIMITS_HZ, { audioHz });
  return 2 * (deviationHz + audioHz);
}

/**
 * Largest peak deviation that fits into a channel: the inverse of carsonBandwidthHz.
 *
 *     Δf = B / 2 − fm
 *
 * Assumes: as carsonBandwidthHz. Not for: channels narrower than twice the highest audio frequency.
 *
 * @param bandwidthHz   Width of the channel. [Hz], 2·audioHz to 4·10⁹
 * @param audioHz       Highest modulating frequency. [Hz], 1 to 10⁹
 * @returns             Peak deviation. [Hz], 0 or more
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            as carsonBandwidthHz
 * @source              as carsonBandwidthHz, solved for the deviation
 * @differs             none
 * @checkedBy           rappaport-6-3-back, rappaport-6-5-back
 */
export function carsonDeviationHz(bandwidthHz: number, audioHz: number): number {
  requireRange("carsonDeviationHz", AUDIO_LIMITS_HZ, { audioHz });
  requireRange("carsonDeviationHz", { min: 2 * audioHz, max: 4e9 }, { bandwidthHz });
  return bandwidthHz / 2 - audioHz;
}
