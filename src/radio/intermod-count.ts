import type { IntermodKind } from "./intermod-kind.ts";
import type { Limits } from "./limits.ts";
import { requireWhole } from "./require-whole.ts";

const CARRIER_COUNT_LIMITS: Limits = { min: 0, max: 1_000_000 };

/**
 * How many products of one kind a number of carriers makes, wherever they land.
 *
 *     2A−B and 3A−2B: N·(N − 1); A+B−C and 3A−B−C: N·(N − 1)·(N − 2)/2; 2A+B−2C: N·(N − 1)·(N − 2)
 *
 * Assumes: products that land on one frequency are counted one by one. Not for: how many of them
 * disturb, which depends on the frequencies (intermodHitCounts).
 *
 * @param kind          Which carriers take part
 * @param carrierCount  Carriers that are on the air together. [none], 0 to 10⁶, whole
 * @returns             Number of products. [none]
 * @throws RangeError   If the count lies outside its range, is not whole or is NaN.
 * @accuracy            exact up to 2⁵³, which is beyond 200 000 carriers
 * @source              combinatorics; the sum N²·(N − 1)/2 for order 3 read at rfessentials.com, knowledge base, levels of
 *                      intermodulation products in a multi-carrier system, 2026-12-01.
 * @differs             That page prints 12 and 30 products for 3 and 4 carriers against its own formula: 9 and 24.
 * @checkedBy           none published, see test
 */
export function intermodCount(kind: IntermodKind, carrierCount: number): number {
  requireWhole("intermodCount", CARRIER_COUNT_LIMITS, { carrierCount });
  const pairs = carrierCount * Math.max(carrierCount - 1, 0);
  const triples = pairs * Math.max(carrierCount - 2, 0);
  switch (kind) {
    case "2A-B":
    case "3A-2B":
      return pairs;
    case "A+B-C":
    case "3A-B-C":
      return triples / 2;
    case "2A+B-2C":
      return triples;
  }
}
