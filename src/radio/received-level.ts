import { FREE_SPACE_IMPEDANCE_OHM } from "./free-space-impedance.ts";
import { FIELD_LIMITS_DBUV_PER_M, GAIN_LIMITS_DB, LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

/** What an antenna without gain takes from a field of 1 µV/m: λ² / 4π times the flux density. */
function levelFromOneMicrovoltDbm(frequencyMhz: number): number {
  const apertureM2 = wavelengthM(frequencyMhz) ** 2 / (4 * Math.PI);
  return 10 * Math.log10(apertureM2 / FREE_SPACE_IMPEDANCE_OHM) - 90;
}

/**
 * The level that an antenna in a field hands to a matched receiver.
 *
 *     p = (e² / 120π)·(g·λ² / 4π),    in decibels P = E − 20·log10(f) − 77.2 + G
 *
 * Assumes: plane wave, antenna matched, turned and polarized to suit the wave. Not for: antennas on a
 * body or against metal, which have another gain there.
 *
 * @param fieldDbuvPerM Rms electric field strength above 1 µV/m. [dBµV/m], −600 to 600
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @param gainDbi       Gain of the antenna over isotropic. [dBi], −100 to 100
 * @returns             Level at the receiver. [dBm]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              Rec. ITU-R P.525, isotropically received power for a given field strength, constant
 *                      167.2 (GHz, dBW); from memory, to be verified. Constant 107.2 (MHz, dBW) read second-hand
 *                      in A. Ghasemi, Propagation Engineering in Wireless Communications, example 5.8, p. 202, at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             unrounded here: 77.216 dB (MHz, dBm)
 * @checkedBy           p525-isotropic, ghasemi-5-8, protected-68dbuv-550mhz
 */
export function receivedDbm(antenna: {
  readonly fieldDbuvPerM: number;
  readonly frequencyMhz: number;
  readonly gainDbi: number;
}): number {
  const { fieldDbuvPerM, frequencyMhz, gainDbi } = antenna;
  requireRange("receivedDbm", FIELD_LIMITS_DBUV_PER_M, { fieldDbuvPerM });
  requireRange("receivedDbm", GAIN_LIMITS_DB, { gainDbi });
  return fieldDbuvPerM + levelFromOneMicrovoltDbm(frequencyMhz) + gainDbi;
}

/**
 * The field in which an antenna receives a wished level: the inverse of receivedDbm.
 *
 *     E = P + 20·log10(f) + 77.2 − G
 *
 * Assumes: as receivedDbm. Not for: a receiver fed over a long cable, whose loss comes on top.
 *
 * @param receivedDbm   Level at the receiver. [dBm], −300 to 300
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @param gainDbi       Gain of the antenna over isotropic. [dBi], −100 to 100
 * @returns             Rms electric field strength above 1 µV/m. [dBµV/m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as receivedDbm, solved for the field strength
 * @differs             as receivedDbm
 * @checkedBy           protected-64dbm-550mhz
 */
export function fieldForLevelDbuvPerM(wish: {
  readonly receivedDbm: number;
  readonly frequencyMhz: number;
  readonly gainDbi: number;
}): number {
  const { receivedDbm, frequencyMhz, gainDbi } = wish;
  requireRange("fieldForLevelDbuvPerM", LEVEL_LIMITS_DBM, { receivedDbm });
  requireRange("fieldForLevelDbuvPerM", GAIN_LIMITS_DB, { gainDbi });
  return receivedDbm - levelFromOneMicrovoltDbm(frequencyMhz) - gainDbi;
}
