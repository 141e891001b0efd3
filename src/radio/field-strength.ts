import { FREE_SPACE_IMPEDANCE_OHM } from "./free-space-impedance.ts";
import { FIELD_LIMITS_DBUV_PER_M, LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { DISTANCE_LIMITS_M } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/** From mW to W, and from V/m to µV/m: −30 dB + 120 dB. */
const AT_ONE_METRE_DB = 10 * Math.log10(FREE_SPACE_IMPEDANCE_OHM / (4 * Math.PI)) + 90;

/**
 * The field that a transmitter makes at a distance, with nothing near or between.
 *
 *     e = √(30·p) / d,    in decibels E = P − 20·log10(d) + 104.77
 *
 * Assumes: free space, far field, rms value. Not for: distances nearer than farZoneStartM; places
 * with reflections, where the field swings around this value.
 *
 * @param eirpDbm       Equivalent isotropically radiated power. [dBm], −300 to 300
 * @param distanceM     Distance from the antenna. [m], 0.001 to 10⁹
 * @returns             Rms electric field strength above 1 µV/m. [dBµV/m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              Rec. ITU-R P.525-3, equation (1), and its form for practical units. Equation read
 *                      second-hand at de.scribd.com/document/398029684; constants 74.8 and 145.8 in open
 *                      code after P.525-4, 2026-12-01.
 * @differs             The Recommendation rounds the impedance of free space over 4π to 30 Ω and the constant
 *                      to 74.8 dB (km, dBW); unrounded here, 29.979 Ω and 74.77 dB.
 * @checkedBy           p525-field-1km, rappaport-4-3-field, ghasemi-2-8-field
 */
export function fieldDbuvPerM(eirpDbm: number, distanceM: number): number {
  requireRange("fieldDbuvPerM", LEVEL_LIMITS_DBM, { eirpDbm });
  requireRange("fieldDbuvPerM", DISTANCE_LIMITS_M, { distanceM });
  return eirpDbm - 20 * Math.log10(distanceM) + AT_ONE_METRE_DB;
}

/**
 * The radiated power that makes a field at a distance: the inverse of fieldDbuvPerM.
 *
 *     P = E + 20·log10(d) − 104.77
 *
 * Assumes: as fieldDbuvPerM. Not for: fields measured over reflecting ground, as in most test ranges,
 * where the reading may be up to 6 dB high.
 *
 * @param fieldDbuvPerM Rms electric field strength above 1 µV/m. [dBµV/m], −600 to 600
 * @param distanceM     Distance from the antenna. [m], 0.001 to 10⁹
 * @returns             Equivalent isotropically radiated power. [dBm]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as fieldDbuvPerM, solved for the power
 * @differs             as fieldDbuvPerM
 * @checkedBy           cfr-15-249-eirp, exposure-report-3m
 */
export function eirpForFieldDbm(fieldDbuvPerM: number, distanceM: number): number {
  requireRange("eirpForFieldDbm", FIELD_LIMITS_DBUV_PER_M, { fieldDbuvPerM });
  requireRange("eirpForFieldDbm", DISTANCE_LIMITS_M, { distanceM });
  return fieldDbuvPerM + 20 * Math.log10(distanceM) - AT_ONE_METRE_DB;
}
