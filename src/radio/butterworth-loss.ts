import { FILTER_ORDER_LIMITS, OFFSET_RATIO_LIMITS } from "./filter-limits.ts";
import type { Limits } from "./limits.ts";
import { lessOneDb, onePlusDb } from "./one-plus-ratio.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

const EDGE_LOSS_LIMITS_DB: Limits = { min: 0.001, max: 100 };

/**
 * Loss of a Butterworth (maximally flat) filter away from its middle.
 *
 *     A = 10·log10(1 + ε²·W^(2n)), ε² = 10^(Aedge / 10) − 1
 *
 * Assumes: ideal parts. Real ones add insertion loss, most near the edges, and stop falling at 60 to
 * 90 dB (common practice, no source). Not for: filters by another design.
 *
 * @param filter.offsetRatio  Offset W from bandOffsetRatio. [none], 0 to 10⁴⁰
 * @param filter.order        Order of the low-pass behind it: resonators of the band-pass. [none], 1 to 20, whole
 * @param filter.edgeLossDb   Loss that defines the edges: 3.01 for half power. [dB], 0.001 to 100
 * @returns                   Loss above that in the middle. [dB], 0 or more
 * @throws RangeError         If an input lies outside its range or is NaN.
 * @accuracy                  exact for the assumption
 * @source                    D. M. Pozar, Microwave Engineering, example 8.4, p. 447, read second-hand at
 *                            github.com/FOSSEE/Python-Textbook-Companions; A. Sedra and K. Smith, Microelectronic Circuits,
 *                            problem 17.23, solution read at passeidireto.com/arquivo/194354945; both 2026-12-01.
 * @differs                   none
 * @checkedBy                 sedra-17-23-butterworth, pozar-8-4-attenuation, library-butterworth-1, library-butterworth-2,
 *                            library-butterworth-3, library-butterworth-5
 */
export function butterworthLossDb(filter: {
  readonly offsetRatio: number;
  readonly order: number;
  readonly edgeLossDb: number;
}): number {
  const { offsetRatio, order, edgeLossDb } = filter;
  requireRange("butterworthLossDb", OFFSET_RATIO_LIMITS, { offsetRatio });
  requireWhole("butterworthLossDb", FILTER_ORDER_LIMITS, { order });
  requireRange("butterworthLossDb", EDGE_LOSS_LIMITS_DB, { edgeLossDb });
  return onePlusDb(lessOneDb(edgeLossDb) + 20 * order * Math.log10(offsetRatio));
}
