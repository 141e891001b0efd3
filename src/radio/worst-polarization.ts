import type { Limits } from "./limits.ts";
import {
  AXIS_RATIO_LIMITS,
  type Polarization,
  polarizationEfficiencyRatio,
  TILT_LIMITS_DEG,
} from "./polarization-efficiency.ts";
import { type CrossPolarLimits, polarizationLossDb } from "./polarization-loss.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

const ANTENNA_COUNT_LIMITS: Limits = { min: 1, max: 8 };

/** A transmitter that may be held at any tilt, and antennas of which the best is taken. */
export interface AnyTilt {
  /** Axis ratio of the wave: 0 for a whip. [none], −1 to 1 */
  readonly waveAxisRatio: number;
  /** 1 to 8 antennas. */
  readonly antennas: readonly Polarization[];
}

/**
 * How a transmitter is held when the best of the receiver's antennas takes least from it.
 *
 *     the tilt t where max pᵢ(t) is least; pᵢ = Pᵢ + Qᵢ·cos 2(t − τᵢ), so it is a tilt across an
 *     antenna or one where two of them take the same, Pᵢ − Pⱼ + Qᵢ·cos 2(t − τᵢ) − Qⱼ·cos 2(t − τⱼ) = 0
 *
 * Assumes: pure polarizations, turning about the line between the antennas. Not for: pointing the end
 * of a whip at the antenna, which is a hole in its pattern, not of its polarization.
 *
 * @param turn.waveAxisRatio  Axis ratio of the wave, negative for left-hand. [none], −1 to 1
 * @param turn.antennas       1 to 8 antennas: tiltDeg [°], −360 to 360; axisRatio [none], −1 to 1
 * @returns                   Worst tilt of the wave; one of several if they are equally bad. [°], 0 to 180
 * @throws RangeError         If an input lies outside its range or is NaN.
 * @accuracy                  Exact for the assumptions: closed form, no search; rounding is below 10⁻⁶°
 * @source                    polarizationEfficiencyRatio, of which the least value is sought by hand
 * @differs                   none
 * @checkedBy           none published, see test
 */
export function worstWaveTiltDeg(turn: AnyTilt): number {
  const { waveAxisRatio, antennas } = turn;
  requireWhole("worstWaveTiltDeg", ANTENNA_COUNT_LIMITS, { antennaCount: antennas.length });
  requireRange("worstWaveTiltDeg", AXIS_RATIO_LIMITS, { waveAxisRatio });
  for (const { tiltDeg, axisRatio } of antennas) {
    requireRange("worstWaveTiltDeg", TILT_LIMITS_DEG, { tiltDeg });
    requireRange("worstWaveTiltDeg", AXIS_RATIO_LIMITS, { axisRatio });
  }
  const taken = (tiltDeg: number) =>
    Math.max(
      ...antennas.map((antenna) =>
        polarizationEfficiencyRatio({ tiltDeg, axisRatio: waveAxisRatio }, antenna),
      ),
    );
  const swings = antennas.map((antenna) => swingOf(waveAxisRatio, antenna));
  const candidates = [
    ...antennas.map(({ tiltDeg }) => tiltDeg + 90),
    ...swings.flatMap((one, index) => swings.slice(index + 1).flatMap((two) => equalAt(one, two))),
  ].map((tiltDeg) => ((tiltDeg % 180) + 180) % 180);
  return candidates.reduce((worst, next) => (taken(next) < taken(worst) ? next : worst));
}

/** p over the wave's tilt t: middle + x·cos 2t + y·sin 2t. */
interface Swing {
  readonly middle: number;
  readonly x: number;
  readonly y: number;
}

function swingOf(waveAxisRatio: number, { tiltDeg, axisRatio }: Polarization): Swing {
  const along = polarizationEfficiencyRatio(
    { tiltDeg: 0, axisRatio: waveAxisRatio },
    { tiltDeg: 0, axisRatio },
  );
  const across = polarizationEfficiencyRatio(
    { tiltDeg: 90, axisRatio: waveAxisRatio },
    { tiltDeg: 0, axisRatio },
  );
  const twice = (2 * tiltDeg * Math.PI) / 180;
  const half = (along - across) / 2;
  return { middle: (along + across) / 2, x: half * Math.cos(twice), y: half * Math.sin(twice) };
}

/** The tilts at which two antennas take the same, if there are such. [°] */
function equalAt(one: Swing, two: Swing): number[] {
  const x = one.x - two.x;
  const y = one.y - two.y;
  const height = (two.middle - one.middle) / Math.hypot(x, y);
  if (!(Math.abs(height) <= 1)) return [];
  const toDeg = 90 / Math.PI;
  return [1, -1].map((side) => (Math.atan2(y, x) + side * Math.acos(height)) * toDeg);
}

/**
 * What polarization costs at worst, however the transmitter is held, when the receiver takes the best
 * of its antennas: one, a parallel pair, a pair crossed at any angle, a circular one.
 *
 *     polarizationLossDb at worstWaveTiltDeg, for the antenna that takes most
 *
 * Assumes: as polarizationLossDb and worstWaveTiltDeg. Not for: fading, which selection fights too.
 *
 * @param turn.waveAxisRatio  Axis ratio of the wave, negative for left-hand. [none], −1 to 1
 * @param turn.antennas       1 to 8 antennas: tiltDeg [°], −360 to 360; axisRatio [none], −1 to 1
 * @param turn.isolationDb    Cross-polar isolation of each antenna. [dB], 0 to 100
 * @param turn.crossRatioDb   Cross-polar ratio of the surroundings. [dB], 0 to 100
 * @returns                   Worst loss, 0 or more. [dB]
 * @throws RangeError         If an input lies outside its range or is NaN.
 * @accuracy                  exact for the assumptions
 * @source                    as polarizationLossDb; the isolation limits all antennas alike, so that the
 *                            worst tilt stays where it is
 * @differs                   none
 * @checkedBy           axial-1-db-to-linear-worst, axial-3-db-to-linear-worst,
 *                      axial-6-db-to-linear-worst
 */
export function worstPolarizationLossDb(turn: AnyTilt & CrossPolarLimits): number {
  const { waveAxisRatio, antennas, isolationDb, crossRatioDb } = turn;
  const wave = { tiltDeg: worstWaveTiltDeg(turn), axisRatio: waveAxisRatio };
  return Math.min(
    ...antennas.map((antenna) => polarizationLossDb({ wave, antenna, isolationDb, crossRatioDb })),
  );
}
