import type { Limits } from "./limits.ts";
import {
  hiddenCorrectionDb,
  LOCATION_LIMITS,
  sightCorrectionDb,
} from "./low-terminal-corrections.ts";
import { requireRange } from "./require-range.ts";
import { sightDistanceM } from "./sight-distance.ts";

const LOW_DISTANCE_LIMITS_M: Limits = { min: 1, max: 3000 };
const LOW_FREQUENCY_LIMITS_MHZ: Limits = { min: 300, max: 3000 };
const URBAN_LIMITS_DB: Limits = { min: 0, max: 30 };
const TRANSITION_LIMITS_M: Limits = { min: 1, max: 100 };

/**
 * Loss between two low antennas among buildings that a share of places does not exceed.
 *
 *     in sight:      32.45 + 20·log10(f) + 20·log10(d) + ΔL
 *     out of sight:  9.5 + 45·log10(f) + 40·log10(d) + Lurban + ΔL    with f in MHz and d in km
 *     between:       a straight line from one to the other
 *
 * Assumes: both antennas 1.9 to 3 m above the street, far below the roof tops. Not for: halls and
 * stages; losses of people around the antennas.
 *
 * @param distanceM     Distance between the antennas. [m], 1 to 3000
 * @param frequencyMhz  Carrier frequency. [MHz], 300 to 3000
 * @param locationProbability  Share of places whose loss is not higher. [none], 0.01 to 0.99
 * @param urbanDb       Lurban: 0 suburban, 6.8 urban, 2.3 dense urban and high-rise. [dB], 0 to 30
 * @param transitionM   Width over which sight is lost; 20 is typical. [m], 1 to 100
 * @returns             Basic transmission loss. [dB]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            as the Recommendation: no figure is given for it
 * @source              Rec. ITU-R P.1411-11, section 4.3.1, equations (58) to (64). Read second-hand at
 *                      github.com/eeveetza/p1411, with its table of results, 2026-12-01.
 * @differs             A share here, percent there. Least distance ours.
 * @checkedBy           p1411-low-300-5-5, p1411-low-300-50-50, p1411-low-300-50-50-wide, p1411-low-300-50-95,
 *                      p1411-low-900-100-10, p1411-low-900-50-75-urban, p1411-low-900-50-75-urban-wide,
 *                      p1411-low-900-2000-50-dense, p1411-low-1800-500-90, p1411-low-1800-50-50-dense-wide,
 *                      p1411-low-2600-10-25, p1411-low-3000-1000-5-urban, p1411-low-3000-2000-95-dense
 */
export function lowTerminalLossDb(path: {
  readonly distanceM: number;
  readonly frequencyMhz: number;
  readonly locationProbability: number;
  readonly urbanDb: number;
  readonly transitionM: number;
}): number {
  const { distanceM, frequencyMhz, locationProbability, urbanDb, transitionM } = path;
  requireRange("lowTerminalLossDb", LOCATION_LIMITS, { locationProbability });
  requireRange("lowTerminalLossDb", LOW_DISTANCE_LIMITS_M, { distanceM });
  requireRange("lowTerminalLossDb", LOW_FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  requireRange("lowTerminalLossDb", URBAN_LIMITS_DB, { urbanDb });
  requireRange("lowTerminalLossDb", TRANSITION_LIMITS_M, { transitionM });
  const frequencyDecades = Math.log10(frequencyMhz);
  const sightDb = (metres: number) =>
    32.45 +
    20 * (frequencyDecades + Math.log10(metres / 1000)) +
    sightCorrectionDb(locationProbability);
  const hiddenDb = (metres: number) =>
    9.5 +
    45 * frequencyDecades +
    40 * Math.log10(metres / 1000) +
    urbanDb +
    hiddenCorrectionDb(locationProbability);
  const sightM = sightDistanceM(locationProbability);
  const hiddenM = sightM + transitionM;
  if (distanceM < sightM) return sightDb(distanceM);
  if (distanceM > hiddenM) return hiddenDb(distanceM);
  const start = sightDb(sightM);
  return start + ((hiddenDb(hiddenM) - start) * (distanceM - sightM)) / transitionM;
}
