import { LEVEL_LIMITS_DBM, POWER_LIMITS_MW, POWER_LIMITS_W } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * A power as a level above one milliwatt.
 *
 *     P = 10·log10(p / 1 mW)
 *
 * Assumes: average power. Not for: no power at all, which has no level.
 *
 * @param powerMw       Power. [mW], 10⁻³⁰ to 10³⁰
 * @returns             Level. [dBm]
 * @throws RangeError   If the power lies outside that range or is NaN.
 * @accuracy            exact
 * @source              Rec. ITU-R V.574-5 (2015), use of the decibel, symbol dBm; from memory, to be verified
 * @differs             none
 * @checkedBy           ghasemi-7-6-transmitter
 */
export function levelDbm(powerMw: number): number {
  requireRange("levelDbm", POWER_LIMITS_MW, { powerMw });
  return 10 * Math.log10(powerMw);
}

/**
 * The power behind a level: the inverse of levelDbm.
 *
 *     p = 1 mW·10^(P / 10)
 *
 * Assumes: as levelDbm. Not for: adding levels; the powers add.
 *
 * @param powerDbm      Level. [dBm], −300 to 300
 * @returns             Power. [mW], above 0
 * @throws RangeError   If the level lies outside that range or is NaN.
 * @accuracy            exact
 * @source              as levelDbm, solved for the power
 * @differs             none
 * @checkedBy           eirp-22dbm
 */
export function powerMw(powerDbm: number): number {
  requireRange("powerMw", LEVEL_LIMITS_DBM, { powerDbm });
  return 10 ** (powerDbm / 10);
}

/**
 * A power in watts as a level above one milliwatt.
 *
 *     P = 10·log10(p / 1 W) + 30
 *
 * Assumes: average power. Not for: no power at all, which has no level.
 *
 * @param powerW        Power. [W], 10⁻³³ to 10²⁷
 * @returns             Level. [dBm]; 30 less is the level in dBW
 * @throws RangeError   If the power lies outside that range or is NaN.
 * @accuracy            exact
 * @source              as levelDbm, symbol dBW
 * @differs             none
 * @checkedBy           rappaport-4-2-transmitter
 */
export function levelOfWattsDbm(powerW: number): number {
  requireRange("levelOfWattsDbm", POWER_LIMITS_W, { powerW });
  return 10 * Math.log10(powerW) + 30;
}

/**
 * The power in watts behind a level: the inverse of levelOfWattsDbm.
 *
 *     p = 1 W·10^((P − 30) / 10)
 *
 * Assumes: as levelOfWattsDbm. Not for: adding levels; the powers add.
 *
 * @param powerDbm      Level. [dBm], −300 to 300
 * @returns             Power. [W], above 0
 * @throws RangeError   If the level lies outside that range or is NaN.
 * @accuracy            exact
 * @source              as levelDbm, solved for the power
 * @differs             none
 * @checkedBy           ghasemi-2-8-eirp-watts
 */
export function powerW(powerDbm: number): number {
  requireRange("powerW", LEVEL_LIMITS_DBM, { powerDbm });
  return 10 ** ((powerDbm - 30) / 10);
}
