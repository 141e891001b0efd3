import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * The ellipse that the field of a wave draws, or that of the wave which an antenna takes best. Both
 * are seen by one observer, so that equal numbers mean a full match.
 */
export interface Polarization {
  /** Direction of the long axis, from any direction across the path that both share. [°], −360 to 360 */
  readonly tiltDeg: number;
  /** Short over long axis: 0 linear, 1 right-hand circular, −1 left-hand circular. [none], −1 to 1 */
  readonly axisRatio: number;
}

export const TILT_LIMITS_DEG: Limits = { min: -360, max: 360 };
export const AXIS_RATIO_LIMITS: Limits = { min: -1, max: 1 };

/**
 * Share of the power of a wave that an antenna takes, for any two polarizations.
 *
 *     p = (cos²t·(1 + m₁·m₂)² + sin²t·(m₁ + m₂)²) / ((1 + m₁²)·(1 + m₂²)), t the difference of the tilts,
 *     m the axis ratios, of the sign of the sense
 *
 * Assumes: pure polarizations. Not for: what a badly turned antenna really loses, which scattering and
 * the antenna's own impurity limit (polarizationLossDb).
 *
 * @param wave.tiltDeg       Tilt of the wave. [°], −360 to 360
 * @param wave.axisRatio     Axis ratio of the wave, negative for left-hand. [none], −1 to 1
 * @param antenna.tiltDeg    Tilt of the antenna. [°], −360 to 360
 * @param antenna.axisRatio  Axis ratio of the antenna, negative for left-hand. [none], −1 to 1
 * @returns                  Polarization efficiency, from 0 to 1. [none]
 * @throws RangeError        If an input lies outside its range or is NaN.
 * @accuracy                 exact for the assumptions; relative also near 0, as only squares are added
 * @source                   The squared product of the complex unit vectors, IEEE Std 145, "polarization
 *                           efficiency" (from memory, to be verified); C. A. Balanis, Antenna Theory, section
 *                           2.12.2, examples 2.11 and 2.12; J. D. Kraus, Antennas and Wave Propagation,
 *                           example 2-17.1. Examples read second-hand at
 *                           github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs                  Books give a term in cos 2t beside ½; it has been turned into squares.
 * @checkedBy           balanis-2-11, mishra-2-3, kraus-2-17-1
 */
export function polarizationEfficiencyRatio(wave: Polarization, antenna: Polarization): number {
  requireRange("polarizationEfficiencyRatio", TILT_LIMITS_DEG, {
    waveTiltDeg: wave.tiltDeg,
    antennaTiltDeg: antenna.tiltDeg,
  });
  requireRange("polarizationEfficiencyRatio", AXIS_RATIO_LIMITS, {
    waveAxisRatio: wave.axisRatio,
    antennaAxisRatio: antenna.axisRatio,
  });
  const { axisRatio: a } = wave;
  const { axisRatio: b } = antenna;
  const tilt = ((wave.tiltDeg - antenna.tiltDeg) * Math.PI) / 180;
  const along = Math.cos(tilt) * (1 + a * b);
  const across = Math.sin(tilt) * (a + b);
  return (along ** 2 + across ** 2) / ((1 + a ** 2) * (1 + b ** 2));
}
