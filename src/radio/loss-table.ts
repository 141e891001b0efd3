import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/** What sources print for one frequency, from the lowest to the highest of them. */
export interface LossPoint {
  readonly frequencyMhz: number;
  readonly lowDb: number;
  readonly highDb: number;
}

/** A loss as well as it is known. [dB] */
export interface LossRange {
  readonly lowDb: number;
  readonly highDb: number;
}

const TABLE_FREQUENCY_LIMITS_MHZ: Limits = { min: 0.1, max: 100_000 };
const TABLE_LOSS_LIMITS_DB: Limits = { min: 1e-6, max: 10_000 };

/**
 * Loss at any frequency from the few that a table prints.
 *
 *     a / √f runs straight in √f from point to point, so that a = k1·√f + k2·f between them
 *
 * Assumes: loss in conductors (∝ √f) and in the dielectric (∝ f), as in cable and connectors. Beyond
 * the table it lies between all of the one and all of the other: the range opens there. Not for:
 * filters and anything else that resonates.
 *
 * @param points        The table, rising in frequency. [MHz], 0.1 to 100 000, and [dB], 10⁻⁶ to 10 000;
 *                      at least one point; the low figure not above the high one
 * @param frequencyMhz  Carrier frequency. [MHz], 0.1 to 100 000
 * @returns             Lowest and highest loss, for the length that the table is for. [dB]
 * @throws RangeError   If there is no point, they do not rise, or a value lies outside its range or is NaN.
 * @accuracy            exact at the points and, between them, for cable that follows the two-term law
 * @source              The two-term law: R. A. Chipman, Theory and Problems of Transmission Lines (1968), from memory,
 *                      to be verified; as a formula for tables at github.com/Kibabalu/free42, coax_atten.py, read
 *                      2026-12-01.
 * @differs             Fitted there by least squares over the whole table, which misses the points; here it goes through.
 * @checkedBy           none published, see test
 */
export function tableLossDb(points: readonly LossPoint[], frequencyMhz: number): LossRange {
  requireTable(points);
  requireRange("tableLossDb", TABLE_FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  const above = points.findIndex((point) => point.frequencyMhz >= frequencyMhz);
  const next = points[above];
  const before = points[above < 0 ? points.length - 1 : above - 1];
  if (next?.frequencyMhz === frequencyMhz) return { lowDb: next.lowDb, highDb: next.highDb };
  if (next !== undefined && before !== undefined) {
    const root = Math.sqrt(frequencyMhz);
    const rootBefore = Math.sqrt(before.frequencyMhz);
    const rootNext = Math.sqrt(next.frequencyMhz);
    const share = (root - rootBefore) / (rootNext - rootBefore);
    const between = (lossBefore: number, lossNext: number) =>
      root * ((1 - share) * (lossBefore / rootBefore) + share * (lossNext / rootNext));
    return {
      lowDb: between(before.lowDb, next.lowDb),
      highDb: between(before.highDb, next.highDb),
    };
  }
  const end = next ?? before;
  if (end === undefined) throw new RangeError("tableLossDb: points must not be empty");
  const ratio = frequencyMhz / end.frequencyMhz;
  return {
    lowDb: end.lowDb * Math.min(ratio, Math.sqrt(ratio)),
    highDb: end.highDb * Math.max(ratio, Math.sqrt(ratio)),
  };
}

function requireTable(points: readonly LossPoint[]): void {
  let previousMhz = 0;
  for (const { frequencyMhz, lowDb, highDb } of points) {
    requireRange("tableLossDb", TABLE_FREQUENCY_LIMITS_MHZ, {
      "points frequencyMhz": frequencyMhz,
    });
    if (frequencyMhz <= previousMhz)
      throw new RangeError(`tableLossDb: points must rise in frequency, got ${frequencyMhz}`);
    requireRange("tableLossDb", TABLE_LOSS_LIMITS_DB, { "points lowDb": lowDb });
    requireRange(
      "tableLossDb",
      { ...TABLE_LOSS_LIMITS_DB, min: lowDb },
      { "points highDb": highDb },
    );
    previousMhz = frequencyMhz;
  }
}
