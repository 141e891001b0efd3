import type { Limits } from "./limits.ts";
import { lessOneDb } from "./one-plus-ratio.ts";
import { powerSumDb } from "./power-sum.ts";
import { requireRange } from "./require-range.ts";

/** What an antenna picks up, over kT0B: 0 dB if all around it is at 290 K. */
export const ANTENNA_NOISE_LIMITS_DB: Limits = { min: -100, max: 300 };
/** Of a whole line, which may lose more than any stage of it. */
const LINE_FIGURE_LIMITS_DB: Limits = { min: 0, max: 15_000 };

/**
 * Noise of a receiver with its antenna, when the surroundings are noisier or quieter than 290 K.
 *
 *     f = fa + fr − 1
 *
 * Assumes: an antenna without loss; fr includes the whole line behind it. Not for: one strong carrier
 * at the input, which is no noise.
 *
 * @param antennaNoiseDb  External noise over kT0B, as manMadeNoise gives it. [dB], −100 to 300
 * @param noiseFigureDb   Noise figure of line and receiver. [dB], 0 to 15 000
 * @returns               Noise over kT0B that the carrier has to stand above. [dB]
 * @throws RangeError     If an input lies outside its range or is NaN.
 * @accuracy              exact for the assumptions
 * @source                Rec. ITU-R P.372, system noise factor, with the losses of antenna and line taken into fr; from
 *                        memory, to be verified.
 * @differs               none
 * @checkedBy           none published, see test
 */
export function systemNoiseFigureDb(antennaNoiseDb: number, noiseFigureDb: number): number {
  requireRange("systemNoiseFigureDb", ANTENNA_NOISE_LIMITS_DB, { antennaNoiseDb });
  requireRange("systemNoiseFigureDb", LINE_FIGURE_LIMITS_DB, { noiseFigureDb });
  // Less would vanish beside any antenna noise, and has no decibels at 0.
  if (noiseFigureDb < 1e-300) return antennaNoiseDb;
  return powerSumDb([antennaNoiseDb, lessOneDb(noiseFigureDb)]);
}
