import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { lessOneDb, onePlusDb } from "./one-plus-ratio.ts";
import { requireRange } from "./require-range.ts";

/**
 * How much gain a weak wanted carrier loses beside a strong one in the same amplifier: more than the
 * strong one loses itself.
 *
 *     ΔG = 20·log10(2·(1 + y)^1.5 / (2 + y)), y = (10^0.1 − 1)·10^((P − P1dB) / 10)
 *
 * Assumes: the law of gainCompressionDb; the wanted carrier is far weaker, on another frequency.
 * Not for: receivers whose automatic gain control or selectivity acts before the amplifier.
 *
 * @param blockerDbm           Strong carrier at the input. [dBm], −300 to 300
 * @param compressionPointDbm  1 dB compression point at the input. [dBm], −300 to 300
 * @returns                    Loss of gain for the wanted carrier: 1.94 dB when the blocker is at that point. [dB], 0 or more
 * @throws RangeError          If an input lies outside its range or is NaN.
 * @accuracy                   exact for the model. Far below the point the loss is twice that of gainCompressionDb, far
 *                             above it 6.02 dB more: the suppression of a weak signal in an ideal limiter.
 * @source                     Mean of gain and slope of the saturation law, worked out for this program. 6 dB: J. J. Jones,
 *                             Hard-limiting of two signals in random noise, IEEE Trans. Information Theory 9 (1963) 34,
 *                             as reported at microwavejournal.com/articles/3596, read 2026-12-01.
 * @differs                    The cubic law of textbooks agrees up to about 10 dB below the point and breaks down above it.
 * @checkedBy           none published, see test
 */
export function blockingLossDb(blockerDbm: number, compressionPointDbm: number): number {
  requireRange("blockingLossDb", LEVEL_LIMITS_DBM, { blockerDbm, compressionPointDbm });
  const driveDb = blockerDbm - compressionPointDbm + lessOneDb(1);
  // 2 + y over 2 is one plus y/2.
  return 3 * onePlusDb(driveDb) - 2 * onePlusDb(driveDb - 20 * Math.log10(Math.SQRT2));
}
