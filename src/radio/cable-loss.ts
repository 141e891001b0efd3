import type { Limits } from "./limits.ts";
import { type LossPoint, type LossRange, tableLossDb } from "./loss-table.ts";
import { requireRange } from "./require-range.ts";

const CABLE_LENGTH_LIMITS_M: Limits = { min: 0, max: 10_000 };

/**
 * What a length of coaxial cable loses at one frequency, from a table for its type.
 *
 *     L = a(f)·l / 100 m
 *
 * Assumes: matched, dry, not kinked, at room temperature. Not for: old or wet cable, which loses more
 * than any table says; two figures for one type differ by 15 to 20 %, which the range keeps.
 *
 * @param cable.points        Table of the type, per 100 m, as tableLossDb takes it. [MHz], [dB]
 * @param cable.frequencyMhz  Carrier frequency. [MHz], 0.1 to 100 000
 * @param cable.lengthM       Length of the cable. [m], 0 to 10 000
 * @returns                   Lowest and highest loss to expect. [dB], 0 or more
 * @throws RangeError         If an input lies outside its range or is NaN, or the table is none.
 * @accuracy                  that of the table; see tableLossDb
 * @source                    R. Blake, Electronic Communication Systems, p. 481, worked as loss per metre times length.
 *                            Read second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs                   none
 * @checkedBy                 blake-14-10-cable
 */
export function cableLossDb(cable: {
  readonly points: readonly LossPoint[];
  readonly frequencyMhz: number;
  readonly lengthM: number;
}): LossRange {
  const { points, frequencyMhz, lengthM } = cable;
  requireRange("cableLossDb", CABLE_LENGTH_LIMITS_M, { lengthM });
  const { lowDb, highDb } = tableLossDb(points, frequencyMhz);
  return { lowDb: (lowDb * lengthM) / 100, highDb: (highDb * lengthM) / 100 };
}
