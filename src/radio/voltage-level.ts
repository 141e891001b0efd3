import { IMPEDANCE_LIMITS_OHM, LEVEL_LIMITS_DBM, VOLTAGE_LIMITS_DBUV } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * The voltage that a power makes across a load.
 *
 *     U = P + 10·log10(R) + 90,    from u = √(p·R)
 *
 * Assumes: rms voltage across a load that takes the whole power. Not for: the open-circuit voltage
 * of an antenna or generator, which is twice that, 6.02 dB more, when the load is matched.
 *
 * @param powerDbm      Level of the power in the load. [dBm], −300 to 300
 * @param impedanceOhm  Resistance of the load. [Ω], 0.01 to 10⁶
 * @returns             Level of the voltage above 1 µV. [dBµV]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact
 * @source              Rec. ITU-R V.574-5 (2015), use of the decibel, symbol dBµV; from memory, to be
 *                      verified. 107.0 dB between dBm and dBµV in 50 Ω is common practice.
 * @differs             none
 * @checkedBy           zero-dbm-50-ohm, zero-dbm-75-ohm
 */
export function voltageDbuv(powerDbm: number, impedanceOhm: number): number {
  requireRange("voltageDbuv", LEVEL_LIMITS_DBM, { powerDbm });
  requireRange("voltageDbuv", IMPEDANCE_LIMITS_OHM, { impedanceOhm });
  return powerDbm + 10 * Math.log10(impedanceOhm) + 90;
}

/**
 * The power that a voltage puts into a load: the inverse of voltageDbuv.
 *
 *     P = U − 10·log10(R) − 90
 *
 * Assumes: as voltageDbuv. Not for: a figure in "µV e.m.f.", which is twice the voltage at the load.
 *
 * @param voltageDbuv   Level of the rms voltage across the load above 1 µV. [dBµV], −300 to 500
 * @param impedanceOhm  Resistance of the load. [Ω], 0.01 to 10⁶
 * @returns             Level of the power in the load. [dBm]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact
 * @source              as voltageDbuv, solved for the power
 * @differs             none
 * @checkedBy           none published, see test
 */
export function levelOfVoltageDbm(voltageDbuv: number, impedanceOhm: number): number {
  requireRange("levelOfVoltageDbm", VOLTAGE_LIMITS_DBUV, { voltageDbuv });
  requireRange("levelOfVoltageDbm", IMPEDANCE_LIMITS_OHM, { impedanceOhm });
  return voltageDbuv - 10 * Math.log10(impedanceOhm) - 90;
}
