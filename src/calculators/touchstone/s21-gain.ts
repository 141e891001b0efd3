import { requireRange } from "../../radio/require-range.ts";
import type { Network, TwoPortPoint } from "./network.ts";

export type S21Gain =
  /** Below 0 for a loss. [dB] */
  | { readonly kind: "ok"; readonly gainDb: number }
  /** S21 is 0 at this frequency or beside it, which has no decibels. */
  | { readonly kind: "nothing-passes" }
  /** The sweep of the file ends before it gets there. */
  | { readonly kind: "outside" }
  /** Nothing comes out of a part with one port. */
  | { readonly kind: "one-port" };

/**
 * Gain from port 1 to port 2 at any frequency within a file's sweep: exact at its points, straight in
 * dB between them. Holds between ends that match the reference resistance.
 *
 * @param network       As readTouchstone gives it
 * @param frequencyMhz  Frequency of interest. [MHz], 0 or more
 * @throws RangeError   if the frequency is below zero, infinite or NaN
 */
export function s21Gain(network: Network, frequencyMhz: number): S21Gain {
  requireRange("s21Gain", { min: 0, max: Number.MAX_VALUE }, { frequencyMhz });
  if (network.portCount === 1) return { kind: "one-port" };
  const above = network.points.findIndex((point) => point.frequencyMhz >= frequencyMhz);
  const next = network.points[above];
  const before = next?.frequencyMhz === frequencyMhz ? next : network.points[above - 1];
  if (next === undefined || before === undefined) return { kind: "outside" };
  const span = next.frequencyMhz - before.frequencyMhz;
  const share = span === 0 ? 0 : (frequencyMhz - before.frequencyMhz) / span;
  const [beforeDb, nextDb] = [gainDbOf(before), gainDbOf(next)];
  if (beforeDb === null || nextDb === null) return { kind: "nothing-passes" };
  return { kind: "ok", gainDb: (1 - share) * beforeDb + share * nextDb };
}

function gainDbOf({ s21 }: TwoPortPoint): number | null {
  const magnitude = Math.hypot(s21.re, s21.im);
  return magnitude === 0 ? null : 20 * Math.log10(magnitude);
}
