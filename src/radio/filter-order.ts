import { FILTER_ORDER_LIMITS } from "./filter-limits.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const WANTED_LOSS_LIMITS_DB: Limits = { min: 0.001, max: 300 };

/**
 * The smallest filter that suppresses as much as is wanted.
 *
 *     n = min { n : A(n) ≥ Awanted }
 *
 * Assumes: a loss that grows with the order, as outside the edges it does. Not for: what a shop has;
 * orders above 7 are rare (common practice, no source).
 *
 * @param wantedLossDb    Loss that is wanted. [dB], 0.001 to 300
 * @param lossOfOrderDb   Loss of the kind of filter at the frequency, for an order from 1 to 20
 * @returns               Smallest order from 1 to 20, or null if none is enough. [none]
 * @throws RangeError     If the wanted loss lies outside its range or is NaN; whatever lossOfOrderDb throws.
 * @accuracy              exact for the loss handed in
 * @source                D. M. Pozar, Microwave Engineering, example 8.4, p. 447. Read second-hand at
 *                        github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs               Read off a chart there; tried one by one here.
 * @checkedBy           none published, see test
 */
export function smallestFilterOrder(
  wantedLossDb: number,
  lossOfOrderDb: (order: number) => number,
): number | null {
  requireRange("smallestFilterOrder", WANTED_LOSS_LIMITS_DB, { wantedLossDb });
  for (let order = FILTER_ORDER_LIMITS.min; order <= FILTER_ORDER_LIMITS.max; order += 1)
    if (lossOfOrderDb(order) >= wantedLossDb) return order;
  return null;
}
