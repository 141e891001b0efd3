import type { Limits } from "./limits.ts";
import { NOISE_FIGURE_LIMITS_DB } from "./noise-limits.ts";
import { requireRange } from "./require-range.ts";

const NOISE_FACTOR_LIMITS: Limits = { min: 1, max: 1e40 };

/**
 * Noise figure as a plain ratio: by how many times a stage worsens signal over noise.
 *
 *     F = 10^(NF / 10)
 *
 * Assumes: input noise of 290 K. Not for: what a stage does to a signal whose noise is higher already.
 *
 * @param noiseFigureDb  Noise figure. [dB], 0 to 400
 * @returns              Noise factor. [none], 1 or more
 * @throws RangeError    If the noise figure lies outside that range or is NaN.
 * @accuracy             exact
 * @source               H. T. Friis, Noise figures of radio receivers, Proc. IRE 32 (1944) 419, from memory, to be
 *                       verified. Example: D. K. Mishra, as in noiseFloorDbm.
 * @differs              Some books call the ratio noise figure too; here the figure is in dB and the factor is not.
 * @checkedBy            mishra-2-10-factor
 */
export function noiseFactor(noiseFigureDb: number): number {
  requireRange("noiseFactor", NOISE_FIGURE_LIMITS_DB, { noiseFigureDb });
  return 10 ** (noiseFigureDb / 10);
}

/**
 * Noise factor in decibels: the inverse of noiseFactor.
 *
 *     NF = 10·log10 F
 *
 * Assumes: as noiseFactor. Not for: ratios below 1, which no stage can have.
 *
 * @param factor         Noise factor. [none], 1 to 10⁴⁰
 * @returns              Noise figure. [dB], 0 or more
 * @throws RangeError    If the factor lies outside that range or is NaN.
 * @accuracy             exact
 * @source               as noiseFactor, solved for the figure
 * @differs              none
 * @checkedBy            mishra-2-11-line-first, mishra-2-11-amplifier-first
 */
export function noiseFigureDb(factor: number): number {
  requireRange("noiseFigureDb", NOISE_FACTOR_LIMITS, { factor });
  return 10 * Math.log10(factor);
}
