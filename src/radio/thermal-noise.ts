import { BANDWIDTH_LIMITS_HZ, TEMPERATURE_LIMITS_K } from "./noise-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * Boltzmann constant. [J/K], exact since 2019.
 * @source BIPM, SI Brochure, 9th ed. (2019), section 2.2, defining constant k; value from memory, to be verified.
 */
const BOLTZMANN_J_PER_K = 1.380649e-23;

/** The temperature that noise figures refer to (IEEE, ITU-R P.372: T0 = 290 K). [K] */
export const REFERENCE_TEMPERATURE_K = 290;

/**
 * Noise that anything warm delivers into a matched receiver: the floor that nothing can go below.
 *
 *     N = k·T·B
 *
 * Assumes: matched load, radio frequencies (far below the infrared). Not for: noise that is picked
 * up from machines and displays, which comes on top.
 *
 * @param temperatureK  Temperature of the source. [K], 0.001 to 10⁶
 * @param bandwidthHz   Noise bandwidth of the receiver. [Hz], 1 to 10¹²
 * @returns             Available noise power. [dBm]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions; the quantum term h·f / 2kT leaves out 0.02 % at 2 GHz and 290 K
 * @source              H. Nyquist, Thermal agitation of electric charge in conductors, Phys. Rev. 32 (1928) 110,
 *                      from memory, to be verified. Examples: CEPT, Monte Carlo simulation handbook, page 493997,
 *                      read at ecowiki.atlassian.net, 2026-12-01.
 * @differs             Handbooks round k·T0 to −174 dBm/Hz or use k = 1.38·10⁻²³; unrounded here, −173.975.
 * @checkedBy           boltzmann-1hz, cept-ktb-1hz, cept-ktb-200khz, glossary-ktb-1khz, glossary-ktb-1mhz,
 *                      glossary-ktb-1ghz
 */
export function thermalNoiseDbm(temperatureK: number, bandwidthHz: number): number {
  requireRange("thermalNoiseDbm", TEMPERATURE_LIMITS_K, { temperatureK });
  requireRange("thermalNoiseDbm", BANDWIDTH_LIMITS_HZ, { bandwidthHz });
  return 10 * Math.log10(BOLTZMANN_J_PER_K * 1000 * temperatureK * bandwidthHz);
}
