import type { Limits } from "./limits.ts";
import { NOISE_FIGURE_LIMITS_DB } from "./noise-limits.ts";
import { lessOneDb, onePlusDb } from "./one-plus-ratio.ts";
import { powerSumDb } from "./power-sum.ts";
import { requireRange } from "./require-range.ts";

/** One part of a receiving chain. [dB] both; a loss is a gain below 0. */
export interface NoiseStage {
  readonly gainDb: number;
  readonly noiseFigureDb: number;
}

/** Of a chain; an antenna line has about ten stages. */
export const STAGE_COUNT_LIMITS: Limits = { min: 1, max: 40 };
/** As wide as a loss may be, for a stage may be a long cable. */
const STAGE_GAIN_LIMITS_DB: Limits = { min: -300, max: 300 };
/** A stage with less than this adds nothing that a number could hold. */
const SILENT_BELOW_DB = 1e-300;

/**
 * Noise figure of a whole chain; the first stages decide unless they lose signal.
 *
 *     F = F1 + (F2 − 1)/G1 + (F3 − 1)/(G1·G2) + …
 *
 * Assumes: every stage matched, the noise figures stated for 290 K and the same band. Not for: stages
 * driven into compression, nor images that a mixer lets through.
 *
 * @param stages        Gain and noise figure of each, in the order of the signal. [dB], −300 to 300 and
 *                      0 to 400, 1 to 40 of them; the gain of the last has no effect
 * @returns             Noise figure of the chain, referred to its input. [dB], 0 or more
 * @throws RangeError   If there is no stage or too many, or a value lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              H. T. Friis, Noise figures of radio receivers, Proc. IRE 32 (1944) 419, from memory, to be
 *                      verified. Examples read second-hand at github.com/FOSSEE/Python-Textbook-Companions,
 *                      2026-12-01: D. K. Mishra 2.11 and 2.12, R. Blake 1.12, T. S. Rappaport B.2, D. Roddy and
 *                      J. Coolen 4.15.1, J. S. Beasley and G. M. Miller 7.8.
 * @differs             none; added up in decibels so that no long line can overflow
 * @checkedBy           rappaport-b-2, blake-1-12-cascade, mishra-2-12, mishra-2-12-swapped, roddy-4-15-1,
 *                      beasley-7-8-cascade
 */
export function cascadeNoiseFigureDb(stages: readonly NoiseStage[]): number {
  requireRange("cascadeNoiseFigureDb", STAGE_COUNT_LIMITS, { stageCount: stages.length });
  const addedDb: number[] = [];
  let gainBeforeDb = 0;
  for (const { gainDb, noiseFigureDb } of stages) {
    requireRange("cascadeNoiseFigureDb", STAGE_GAIN_LIMITS_DB, { gainDb });
    requireRange("cascadeNoiseFigureDb", NOISE_FIGURE_LIMITS_DB, { noiseFigureDb });
    if (noiseFigureDb > SILENT_BELOW_DB) addedDb.push(lessOneDb(noiseFigureDb) - gainBeforeDb);
    gainBeforeDb += gainDb;
  }
  return addedDb.length === 0 ? 0 : onePlusDb(powerSumDb(addedDb));
}
