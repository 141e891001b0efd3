import { FREE_SPACE_IMPEDANCE_OHM } from "./free-space-impedance.ts";
import { FIELD_LIMITS_DBUV_PER_M } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/** From V/m to µV/m, and the impedance that the square of the field is divided by. */
const FIELD_OVER_FLUX_DB = 120 + 10 * Math.log10(FREE_SPACE_IMPEDANCE_OHM);

/**
 * The power that a wave carries through each square metre.
 *
 *     s = e² / 120π,    in decibels S = E − 145.8
 *
 * Assumes: one plane wave, far field, rms field strength. Not for: a peak value of the field, which
 * gives 3 dB too much; sums of waves, where the local field says nothing of the flux.
 *
 * @param fieldDbuvPerM Rms electric field strength above 1 µV/m. [dBµV/m], −600 to 600
 * @returns             Power flux density above 1 W/m². [dBW/m²]
 * @throws RangeError   If the field strength lies outside that range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              Rec. ITU-R P.525, power flux density for a given field strength, constant 145.8 read
 *                      second-hand in open code after P.525-4, 2026-12-01
 * @differs             unrounded here: 145.760 dB; with 120π it would be 145.763 dB
 * @checkedBy           p525-flux
 */
export function fluxDbwPerM2(fieldDbuvPerM: number): number {
  requireRange("fluxDbwPerM2", FIELD_LIMITS_DBUV_PER_M, { fieldDbuvPerM });
  return fieldDbuvPerM - FIELD_OVER_FLUX_DB;
}

/**
 * The field strength of a wave of known power flux density: the inverse of fluxDbwPerM2.
 *
 *     E = S + 145.8
 *
 * Assumes: as fluxDbwPerM2. Not for: peak values, which are 3 dB above this.
 *
 * @param fluxDbwPerM2  Power flux density above 1 W/m². [dBW/m²], −700 to 400
 * @returns             Rms electric field strength above 1 µV/m. [dBµV/m]
 * @throws RangeError   If the density lies outside that range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as fluxDbwPerM2, solved for the field strength
 * @differs             as fluxDbwPerM2
 * @checkedBy           none published, see test
 */
export function fieldOfFluxDbuvPerM(fluxDbwPerM2: number): number {
  requireRange("fieldOfFluxDbuvPerM", { min: -700, max: 400 }, { fluxDbwPerM2 });
  return fluxDbwPerM2 + FIELD_OVER_FLUX_DB;
}
