import { freeSpaceLossDb } from "./free-space-loss.ts";
import { GAIN_LIMITS_DB, LEVEL_LIMITS_DBM } from "./level-limits.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

const TURNAROUND_LIMITS_DB: Limits = { min: 0, max: 200 };
const SPACING_MAX_M = 1e6;

/**
 * How strong the product 2A−B leaves transmitter A when transmitter B stands near it and reaches into
 * its output stage: 6 dB less each time the spacing doubles.
 *
 *     P = PB − 20·log10(4π·d / λ) + GA − t
 *
 * Assumes: at least one wavelength apart, in free space; A at constant power, so that the product
 * follows B dB for dB. Not for: transmitters that touch or share a pocket, where no distance says how
 * they couple.
 *
 * @param pair.neighbourDbm      Power that B radiates over an isotropic antenna. [dBm], −300 to 300
 * @param pair.spacingM          Distance between the antennas. [m], λ to 10⁶
 * @param pair.frequencyMhz      Carrier frequency of B. [MHz], 0.003 to 3 000 000
 * @param pair.gainDbi           Gain of A's antenna towards B. [dBi], −100 to 100
 * @param pair.turnaroundLossDb  How much weaker the product comes out than B's carrier went in. [dB], 0 to 200
 * @returns                      Product at the output of A. [dBm]
 * @throws RangeError            If an input lies outside its range or is NaN, or the spacing is below one wavelength.
 * @accuracy                     the slope with distance is exact in free space; indoors it swings by many dB
 * @source                       Rec. ITU-R SM.1134-1 (02/2007), Annex 1, section 4, power of transmitter intermodulation
 *                               products, of which only the contents list was read at itu.int, 2026-12-01; the method
 *                               from memory, to be verified.
 * @differs                      Coupling there is measured; here it is that of free space.
 * @checkedBy           none published, see test
 */
export function transmitterProductDbm(pair: {
  readonly neighbourDbm: number;
  readonly spacingM: number;
  readonly frequencyMhz: number;
  readonly gainDbi: number;
  readonly turnaroundLossDb: number;
}): number {
  const { neighbourDbm, spacingM, frequencyMhz, gainDbi, turnaroundLossDb } = pair;
  requireRange("transmitterProductDbm", LEVEL_LIMITS_DBM, { neighbourDbm });
  requireRange("transmitterProductDbm", GAIN_LIMITS_DB, { gainDbi });
  requireRange("transmitterProductDbm", TURNAROUND_LIMITS_DB, { turnaroundLossDb });
  const spacingLimits = { min: Math.max(0.001, wavelengthM(frequencyMhz)), max: SPACING_MAX_M };
  requireRange("transmitterProductDbm", spacingLimits, { spacingM });
  return neighbourDbm - freeSpaceLossDb(spacingM, frequencyMhz) + gainDbi - turnaroundLossDb;
}

/**
 * How far apart two transmitters have to be for a given product: the inverse of transmitterProductDbm.
 *
 *     d = λ / 4π·10^((PB + GA − t − P) / 20)
 *
 * Assumes: as transmitterProductDbm. Not for: results below one wavelength, which only say that the
 * wish is met wherever the formula holds; the caller has to compare.
 *
 * @param pair.neighbourDbm      Power that B radiates over an isotropic antenna. [dBm], −300 to 300
 * @param pair.productDbm        Highest product that is acceptable at the output of A. [dBm], −300 to 300
 * @param pair.frequencyMhz      Carrier frequency of B. [MHz], 0.003 to 3 000 000
 * @param pair.gainDbi           Gain of A's antenna towards B. [dBi], −100 to 100
 * @param pair.turnaroundLossDb  How much weaker the product comes out than B's carrier went in. [dB], 0 to 200
 * @returns                      Distance between the antennas; may lie outside what transmitterProductDbm
 *                               accepts. [m], above 0
 * @throws RangeError            If an input lies outside its range or is NaN.
 * @accuracy                     as transmitterProductDbm
 * @source                       as transmitterProductDbm, solved for the spacing
 * @differs                      none
 * @checkedBy           none published, see test
 */
export function spacingForProductM(pair: {
  readonly neighbourDbm: number;
  readonly productDbm: number;
  readonly frequencyMhz: number;
  readonly gainDbi: number;
  readonly turnaroundLossDb: number;
}): number {
  const { neighbourDbm, productDbm, frequencyMhz, gainDbi, turnaroundLossDb } = pair;
  requireRange("spacingForProductM", LEVEL_LIMITS_DBM, { neighbourDbm, productDbm });
  requireRange("spacingForProductM", GAIN_LIMITS_DB, { gainDbi });
  requireRange("spacingForProductM", TURNAROUND_LIMITS_DB, { turnaroundLossDb });
  const allowedLossDb = neighbourDbm + gainDbi - turnaroundLossDb - productDbm;
  return (wavelengthM(frequencyMhz) / (4 * Math.PI)) * 10 ** (allowedLossDb / 20);
}
