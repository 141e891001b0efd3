import { GAIN_LIMITS_DB, LEVEL_LIMITS_DBM, LOSS_LIMITS_DB } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * What a transmitter with its line and antenna sends out in the antenna's best direction.
 *
 *     EIRP = P − L + G
 *
 * Assumes: transmitter, line and antenna matched. Not for: a transmitter with a fixed antenna, whose
 * papers already give the radiated power; a body in the way, which radiates less.
 *
 * @param powerDbm      Power at the transmitter's connector. [dBm], −300 to 300
 * @param lossDb        Loss of cable, connectors and combiner, positive. [dB], 0 to 300
 * @param gainDbi       Gain of the antenna over isotropic. [dBi], −100 to 100
 * @returns             Equivalent isotropically radiated power. [dBm]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              Radio Regulations, No. 1.161; from memory, to be verified
 * @differs             none
 * @checkedBy           eirp-50mw-2db-7dbi, ghasemi-2-8-eirp
 */
export function eirpDbm(transmitter: {
  readonly powerDbm: number;
  readonly lossDb: number;
  readonly gainDbi: number;
}): number {
  const { powerDbm, lossDb, gainDbi } = transmitter;
  requireRange("eirpDbm", LEVEL_LIMITS_DBM, { powerDbm });
  requireRange("eirpDbm", LOSS_LIMITS_DB, { lossDb });
  requireRange("eirpDbm", GAIN_LIMITS_DB, { gainDbi });
  return powerDbm - lossDb + gainDbi;
}

/**
 * The transmitter power that makes a wished radiated power: the inverse of eirpDbm.
 *
 *     P = EIRP + L − G
 *
 * Assumes: as eirpDbm. Not for: deciding whether a set-up may be used; licence and approval do that.
 *
 * @param eirpDbm       Wished equivalent isotropically radiated power. [dBm], −300 to 300
 * @param lossDb        Loss of cable, connectors and combiner, positive. [dB], 0 to 300
 * @param gainDbi       Gain of the antenna over isotropic. [dBi], −100 to 100
 * @returns             Power at the transmitter's connector. [dBm]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              as eirpDbm, solved for the power
 * @differs             none
 * @checkedBy           eirp-limit-50mw, erp-limit-50mw
 */
export function powerForEirpDbm(wish: {
  readonly eirpDbm: number;
  readonly lossDb: number;
  readonly gainDbi: number;
}): number {
  const { eirpDbm, lossDb, gainDbi } = wish;
  requireRange("powerForEirpDbm", LEVEL_LIMITS_DBM, { eirpDbm });
  requireRange("powerForEirpDbm", LOSS_LIMITS_DB, { lossDb });
  requireRange("powerForEirpDbm", GAIN_LIMITS_DB, { gainDbi });
  return eirpDbm + lossDb - gainDbi;
}
