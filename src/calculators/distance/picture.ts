import { levelChangeDb } from "../../radio/distance-ratio.ts";
import { requireRange } from "../../radio/require-range.ts";
import { type DistanceInputs, nearZoneEndM } from "./outcome.ts";

interface CurvePoint {
  readonly distanceM: number;
  /** Against the old distance, where it is 0. [dB] */
  readonly changeDb: number;
}

export interface DistanceCurve {
  /** By rising distance. */
  readonly points: readonly CurvePoint[];
  readonly from: CurvePoint;
  readonly to: CurvePoint;
}

/** How far the drawing reaches past the two distances, as a factor on either side. */
const MARGIN = 2;

/**
 * Points for a drawing of level against distance, from half the nearer distance (but not from inside
 * the near zone) to twice the farther one. They are spaced by equal ratios: the level falls by the
 * same amount from point to point, so the steep part near the antenna is as smooth as the flat part,
 * on a linear axis as well as on a logarithmic one.
 *
 * @param pointCount  2 to 1000, whole
 * @returns           The curve, or null where distanceOutcome has no answer to draw
 * @throws RangeError if pointCount or a distance is out of range
 */
export function distanceCurve(inputs: DistanceInputs, pointCount: number): DistanceCurve | null {
  requireRange("distanceCurve", { min: 2, max: 1000 }, { pointCount });
  if (!Number.isInteger(pointCount))
    throw new RangeError(`distanceCurve: pointCount must be whole, got ${pointCount}`);
  const { fromM, toM, frequencyMhz, exponent } = inputs;
  const nearZoneM = nearZoneEndM(frequencyMhz);
  const nearerM = Math.min(fromM, toM);
  if (nearerM < nearZoneM) return null;
  const pointAt = (distanceM: number): CurvePoint => ({
    distanceM,
    changeDb: levelChangeDb({ fromM, toM: distanceM, exponent }),
  });
  const startM = Math.max(nearerM / MARGIN, nearZoneM);
  const ratio = (Math.max(fromM, toM) * MARGIN) / startM;
  return {
    points: Array.from({ length: pointCount }, (_, index) =>
      pointAt(startM * ratio ** (index / (pointCount - 1))),
    ),
    from: pointAt(fromM),
    to: pointAt(toM),
  };
}
