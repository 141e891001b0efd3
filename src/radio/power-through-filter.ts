import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { FREQUENCY_LIMITS_MHZ, type Limits } from "./limits.ts";
import { powerSumDb } from "./power-sum.ts";
import { requireRange } from "./require-range.ts";

/** What arrives on one frequency: a carrier, or the noise or signal of one channel. */
export interface ReceivedLevel {
  readonly frequencyMhz: number;
  readonly levelDbm: number;
}

export interface FilteredLevels {
  /** In the order that they were handed in. [dBm] */
  readonly levelsDbm: readonly number[];
  /** All together, before and behind the filter: what the first amplifier has to bear. [dBm] */
  readonly beforeDbm: number;
  readonly behindDbm: number;
}

const FILTER_LOSS_LIMITS_DB: Limits = { min: 0, max: 17_000 };

/**
 * What a filter leaves of all that comes in at an antenna, one by one and together.
 *
 *     P = 10·log10(Σ 10^((Pi − A(fi)) / 10))
 *
 * Assumes: each entry narrow beside the filter's slope; entries unrelated, so that powers add.
 * Not for: a wide channel across an edge; cut it into slices.
 *
 * @param received      Frequency and level of each. [MHz], 0.003 to 3 000 000; [dBm], −300 to 300; at least one
 * @param lossAtDb      Loss of the filter at a frequency in MHz, insertion loss included. [dB], 0 to 17 000
 * @returns             Levels behind the filter, and the sums before and behind it. [dBm]
 * @throws RangeError   If there is no entry, or a value lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              none, definition of the decibel
 * @differs             none
 * @checkedBy           none published, see test
 */
export function powerThroughFilter(
  received: readonly ReceivedLevel[],
  lossAtDb: (frequencyMhz: number) => number,
): FilteredLevels {
  const levelsDbm = received.map(({ frequencyMhz, levelDbm }) => {
    requireRange("powerThroughFilter", FREQUENCY_LIMITS_MHZ, { frequencyMhz });
    requireRange("powerThroughFilter", LEVEL_LIMITS_DBM, { levelDbm });
    const lossDb = lossAtDb(frequencyMhz);
    requireRange("powerThroughFilter", FILTER_LOSS_LIMITS_DB, { lossDb });
    return levelDbm - lossDb;
  });
  const beforeDbm = powerSumDb(received.map(({ levelDbm }) => levelDbm));
  return { levelsDbm, beforeDbm, behindDbm: powerSumDb(levelsDbm) };
}
