import { DIPOLE_GAIN_DB } from "./dipole-gain.ts";
import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * A radiated power that is given relative to a half-wave dipole, relative to isotropic.
 *
 *     EIRP = ERP + 2.15
 *
 * Assumes: ERP as the Radio Regulations have it, over a half-wave dipole. Not for: power at the
 * transmitter's connector, which is neither.
 *
 * @param erpDbm        Effective radiated power. [dBm], −300 to 300
 * @returns             Equivalent isotropically radiated power. [dBm]
 * @throws RangeError   If the power lies outside that range or is NaN.
 * @accuracy            within 0.002 dB of the exact dipole
 * @source              Radio Regulations, Nos. 1.161 and 1.162; from memory, to be verified
 * @differs             Many rules print the factor 1.64, which is 2.148 dB.
 * @checkedBy           erp-10mw, erp-50mw, erp-100mw
 */
export function eirpFromErpDbm(erpDbm: number): number {
  requireRange("eirpFromErpDbm", LEVEL_LIMITS_DBM, { erpDbm });
  return erpDbm + DIPOLE_GAIN_DB;
}

/**
 * A radiated power that is given relative to isotropic, relative to a half-wave dipole: the inverse
 * of eirpFromErpDbm.
 *
 *     ERP = EIRP − 2.15
 *
 * Assumes: as eirpFromErpDbm. Not for: power at the transmitter's connector, which is neither.
 *
 * @param eirpDbm       Equivalent isotropically radiated power. [dBm], −300 to 300
 * @returns             Effective radiated power. [dBm]
 * @throws RangeError   If the power lies outside that range or is NaN.
 * @accuracy            as eirpFromErpDbm
 * @source              as eirpFromErpDbm, solved for the other power
 * @differs             as eirpFromErpDbm
 * @checkedBy           erp-of-82mw
 */
export function erpFromEirpDbm(eirpDbm: number): number {
  requireRange("erpFromEirpDbm", LEVEL_LIMITS_DBM, { eirpDbm });
  return eirpDbm - DIPOLE_GAIN_DB;
}
