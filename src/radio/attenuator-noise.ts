import { LOSS_LIMITS_DB } from "./level-limits.ts";
import { TEMPERATURE_LIMITS_K } from "./noise-limits.ts";
import { noiseFigureFromTemperatureDb } from "./noise-temperature.ts";
import { requireRange } from "./require-range.ts";

/**
 * Noise figure of anything that only loses signal: cable, connector, splitter, passive filter.
 *
 *     F = 1 + (L − 1)·T / T0, T0 = 290 K
 *
 * Assumes: matched at both ends, the same temperature all along. Not for: filters with an amplifier
 * in them, nor the loss by a splitter's ports that are fed from elsewhere.
 *
 * @param lossDb        Loss from input to output. [dB], 0 to 300
 * @param temperatureK  Its own temperature. [K], 0.001 to 10⁶; at 290 the noise figure equals the loss
 * @returns             Noise figure. [dB], 0 or more
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              D. K. Mishra, Radio-Frequency and Microwave Communication Circuits, example 2.11, p. 42. Read
 *                      second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             none
 * @checkedBy           none published, see test
 */
export function attenuatorNoiseFigureDb(lossDb: number, temperatureK: number): number {
  requireRange("attenuatorNoiseFigureDb", LOSS_LIMITS_DB, { lossDb });
  requireRange("attenuatorNoiseFigureDb", TEMPERATURE_LIMITS_K, { temperatureK });
  return noiseFigureFromTemperatureDb(temperatureK * Math.expm1((lossDb * Math.LN10) / 10));
}
