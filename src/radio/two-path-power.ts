import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const POWER_LIMITS_DBM: Limits = { min: -200, max: 100 };
const PHASE_LIMITS_DEG: Limits = { min: -36_000, max: 36_000 };

/**
 * What arrives when the same carrier comes over two paths.
 *
 *     P = P₁ + P₂ + 2·√(P₁·P₂)·cos φ
 *
 * Assumes: the same polarization, one frequency, delays short beside the modulation. Not for: two
 * transmitters, whose powers add on average.
 *
 * @param paths.firstDbm   Power over the first path alone. [dBm], −200 to 100
 * @param paths.secondDbm  Power over the second path alone. [dBm], −200 to 100
 * @param paths.phaseDeg   Phase between the two. [°], −36 000 to 36 000
 * @returns                Power of both together, 0 or more. [mW]
 * @throws RangeError      If an input lies outside its range or is NaN.
 * @accuracy               exact for the assumptions
 * @source                 T. S. Rappaport, Wireless Communications: Principles and Practice, 2nd ed. (2002),
 *                         example 5.3, p. 190. Read second-hand at
 *                         github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs                Added as amplitudes (P = |a₁ + a₂·e^(iφ)|²), so that the sum cannot fall below 0.
 * @checkedBy           rappaport-5-3-in-phase, rappaport-5-3-apart
 */
export function twoPathPowerMw(paths: {
  readonly firstDbm: number;
  readonly secondDbm: number;
  readonly phaseDeg: number;
}): number {
  const { firstDbm, secondDbm, phaseDeg } = paths;
  requireRange("twoPathPowerMw", POWER_LIMITS_DBM, { firstDbm, secondDbm });
  requireRange("twoPathPowerMw", PHASE_LIMITS_DEG, { phaseDeg });
  const phase = (phaseDeg * Math.PI) / 180;
  const first = 10 ** (firstDbm / 20);
  const second = 10 ** (secondDbm / 20);
  return (first + second * Math.cos(phase)) ** 2 + (second * Math.sin(phase)) ** 2;
}
