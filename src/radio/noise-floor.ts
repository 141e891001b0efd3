import { NOISE_FIGURE_LIMITS_DB } from "./noise-limits.ts";
import { requireRange } from "./require-range.ts";
import { REFERENCE_TEMPERATURE_K, thermalNoiseDbm } from "./thermal-noise.ts";

/**
 * The receiver's own noise as if it came in at the antenna socket.
 *
 *     N = k·T0·B·F, T0 = 290 K
 *
 * Assumes: a source at 290 K on the socket and nothing else. Not for: the floor on a stage, to which
 * lamps, displays and other transmitters add (noiseRiseDb).
 *
 * @param bandwidthHz    Noise bandwidth of the receiver. [Hz], 1 to 10¹²
 * @param noiseFigureDb  Noise figure of the receiver or of its whole line. [dB], 0 to 400
 * @returns              Noise power referred to the input. [dBm]
 * @throws RangeError    If an input lies outside its range or is NaN.
 * @accuracy             exact for the assumptions
 * @source               D. K. Mishra, Radio-Frequency and Microwave Communication Circuits, section 2.5; examples
 *                       2.10 and 2.15 read second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01;
 *                       section from memory, to be verified.
 * @differs              Books round k·T0 to −174 dBm/Hz; unrounded here, −173.975.
 * @checkedBy            cept-floor-200khz, cept-floor-5mhz, mishra-2-10-floor, mishra-2-15-floor,
 *                       beasley-7-7-floor, beasley-7-8-floor
 */
export function noiseFloorDbm(bandwidthHz: number, noiseFigureDb: number): number {
  requireRange("noiseFloorDbm", NOISE_FIGURE_LIMITS_DB, { noiseFigureDb });
  return thermalNoiseDbm(REFERENCE_TEMPERATURE_K, bandwidthHz) + noiseFigureDb;
}
