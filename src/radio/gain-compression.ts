import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import type { Limits } from "./limits.ts";
import { lessOneDb, onePlusDb } from "./one-plus-ratio.ts";
import { requireRange } from "./require-range.ts";

const COMPRESSION_LIMITS_DB: Limits = { min: 1e-6, max: 300 };

/**
 * How much gain an amplifier has lost to a strong carrier that it amplifies itself.
 *
 *     ΔG = 10·log10(1 + y), y = (10^0.1 − 1)·10^((P − P1dB) / 10)
 *
 * Assumes: output voltage g·v/√(1 + (g·v/vs)²), the saturation law of smoothness 1, laid through the
 * stated 1 dB point. Not for: amplifiers with a sharper knee, which lose less below the 1 dB point and
 * more above it.
 *
 * @param levelDbm             Carrier at the input. [dBm], −300 to 300
 * @param compressionPointDbm  1 dB compression point at the input. [dBm], −300 to 300
 * @returns                    Loss of gain: 1 dB at that point by definition. [dB], 0 or more
 * @throws RangeError          If an input lies outside its range or is NaN.
 * @accuracy                   exact at the 1 dB point and far below it; a model in between and beyond
 * @source                     C. Rapp, Effects of HPA-nonlinearity on a 4-DPSK/OFDM-signal for a digital sound broadcasting
 *                             system, 2nd European Conf. on Satellite Communications (1991), with p = 1. Formula read
 *                             second-hand at hermespy.org, RappPowerAmplifier, 2026-12-01; reference from memory, to be
 *                             verified.
 * @differs                    Stated there by the saturation level; here by the 1 dB point, 5.87 dB above which lies
 *                             the input that would saturate a linear amplifier.
 * @checkedBy           none published, see test
 */
export function gainCompressionDb(levelDbm: number, compressionPointDbm: number): number {
  requireRange("gainCompressionDb", LEVEL_LIMITS_DBM, { levelDbm, compressionPointDbm });
  return onePlusDb(levelDbm - compressionPointDbm + lessOneDb(1));
}

/**
 * Which carrier costs an amplifier a given part of its gain: the inverse of gainCompressionDb.
 *
 *     P = P1dB + 10·log10((10^(ΔG / 10) − 1) / (10^0.1 − 1))
 *
 * Assumes: as gainCompressionDb. Not for: a loss of 0, which no carrier causes.
 *
 * @param compressionDb        Loss of gain. [dB], 10⁻⁶ to 300
 * @param compressionPointDbm  1 dB compression point at the input. [dBm], −300 to 300
 * @returns                    Carrier at the input. [dBm]
 * @throws RangeError          If an input lies outside its range or is NaN.
 * @accuracy                   as gainCompressionDb
 * @source                     as gainCompressionDb, solved for the level
 * @differs                    none
 * @checkedBy           none published, see test
 */
export function levelForCompressionDbm(compressionDb: number, compressionPointDbm: number): number {
  requireRange("levelForCompressionDbm", COMPRESSION_LIMITS_DB, { compressionDb });
  requireRange("levelForCompressionDbm", LEVEL_LIMITS_DBM, { compressionPointDbm });
  return compressionPointDbm + lessOneDb(compressionDb) - lessOneDb(1);
}
