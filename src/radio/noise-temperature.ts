import type { Limits } from "./limits.ts";
import { NOISE_FIGURE_LIMITS_DB } from "./noise-limits.ts";
import { requireRange } from "./require-range.ts";
import { REFERENCE_TEMPERATURE_K } from "./thermal-noise.ts";

const NOISE_TEMPERATURE_LIMITS_K: Limits = { min: 0, max: 1e43 };

/**
 * How warm a source would have to be to make the noise that a stage adds.
 *
 *     Te = T0·(F − 1), T0 = 290 K
 *
 * Assumes: noise figure stated for 290 K, as is usual. Not for: the temperature of the device itself.
 *
 * @param noiseFigureDb  Noise figure. [dB], 0 to 400
 * @returns              Equivalent noise temperature. [K], 0 or more
 * @throws RangeError    If the noise figure lies outside that range or is NaN.
 * @accuracy             exact
 * @source               R. Blake, Electronic Communication Systems, examples 1.11 and 1.12, pp. 27 and 29. Read
 *                       second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs              none
 * @checkedBy            blake-1-11-temperature, blake-1-12-temperature
 */
export function noiseTemperatureK(noiseFigureDb: number): number {
  requireRange("noiseTemperatureK", NOISE_FIGURE_LIMITS_DB, { noiseFigureDb });
  return REFERENCE_TEMPERATURE_K * Math.expm1((noiseFigureDb * Math.LN10) / 10);
}

/**
 * Noise figure of a stage whose noise temperature is stated: the inverse of noiseTemperatureK.
 *
 *     NF = 10·log10(1 + Te / T0), T0 = 290 K
 *
 * Assumes: as noiseTemperatureK. Not for: the temperature that an antenna sees.
 *
 * @param temperatureK   Equivalent noise temperature. [K], 0 to 10⁴³
 * @returns              Noise figure. [dB], 0 or more
 * @throws RangeError    If the temperature lies outside that range or is NaN.
 * @accuracy             exact
 * @source               as noiseTemperatureK, solved for the noise figure
 * @differs              none
 * @checkedBy            blake-1-11-back
 */
export function noiseFigureFromTemperatureDb(temperatureK: number): number {
  requireRange("noiseFigureFromTemperatureDb", NOISE_TEMPERATURE_LIMITS_K, { temperatureK });
  return (10 / Math.LN10) * Math.log1p(temperatureK / REFERENCE_TEMPERATURE_K);
}
