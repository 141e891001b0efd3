import { GAIN_LIMITS_DB } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * Gain of a half-wave dipole over an isotropic radiator. [dB]
 * @source Radio Regulations, Nos. 1.161 and 1.162, and Rec. ITU-R BS.561: 2.15 dB; from memory, to be
 * verified. The integral over the pattern of a thin dipole gives 2.151; some texts print 2.14 or 2.2.
 */
export const DIPOLE_GAIN_DB = 2.15;

/**
 * The gain over isotropic of an antenna whose gain is given over a half-wave dipole.
 *
 *     Gi = Gd + 2.15
 *
 * Assumes: a lossless thin half-wave dipole as reference. Not for: gains given over a short
 * vertical antenna or over a quarter wave above ground.
 *
 * @param gainDbd       Gain over a half-wave dipole. [dBd], −100 to 100
 * @returns             Gain over isotropic. [dBi]
 * @throws RangeError   If the gain lies outside that range or is NaN.
 * @accuracy            within 0.002 dB of the exact dipole
 * @source              as DIPOLE_GAIN_DB
 * @differs             none
 * @checkedBy           dipole-in-dbi
 */
export function gainDbi(gainDbd: number): number {
  requireRange("gainDbi", GAIN_LIMITS_DB, { gainDbd });
  return gainDbd + DIPOLE_GAIN_DB;
}

/**
 * The gain over a half-wave dipole of an antenna whose gain is given over isotropic: the inverse of gainDbi.
 *
 *     Gd = Gi − 2.15
 *
 * Assumes: as gainDbi. Not for: gains given over other references.
 *
 * @param gainDbi       Gain over isotropic. [dBi], −100 to 100
 * @returns             Gain over a half-wave dipole. [dBd]
 * @throws RangeError   If the gain lies outside that range or is NaN.
 * @accuracy            as gainDbi
 * @source              as gainDbi, solved for the other gain
 * @differs             none
 * @checkedBy           ghasemi-6-12-dbd
 */
export function gainDbd(gainDbi: number): number {
  requireRange("gainDbd", GAIN_LIMITS_DB, { gainDbi });
  return gainDbi - DIPOLE_GAIN_DB;
}
