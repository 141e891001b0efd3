import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const INDEX_LIMITS: Limits = { min: 0.001, max: 1e6 };

/**
 * How much better the audio of an analogue link is than its carrier-to-noise ratio.
 *
 *     (S/N) / (C/N) = 3·β²·(β + 1), β = Δf / fm
 *
 * Assumes: one full tone, C/N in the Carson bandwidth and above threshold (about 10 dB, from memory, to
 * be verified). Not for: links with compander or pre-emphasis, which add to it; digital links.
 *
 * @param modulationIndexRatio  Peak deviation over highest audio frequency. [none], 0.001 to 10⁶
 * @returns                     Signal-to-noise ratio of the audio over carrier-to-noise ratio. [dB]
 * @throws RangeError           If the index lies outside that range or is NaN.
 * @accuracy                    exact for the assumptions
 * @source                      T. S. Rappaport, Wireless Communications: Principles and Practice, section 6.3, FM
 *                              versus AM; formula from memory, to be verified; example 6.5 read second-hand at
 *                              github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs                     none
 * @checkedBy           none published, see test
 */
export function fmDetectionGainDb(modulationIndexRatio: number): number {
  requireRange("fmDetectionGainDb", INDEX_LIMITS, { modulationIndexRatio });
  return 10 * Math.log10(3 * modulationIndexRatio ** 2 * (modulationIndexRatio + 1));
}
