import { FILTER_ORDER_LIMITS, OFFSET_RATIO_LIMITS, RIPPLE_LIMITS_DB } from "./filter-limits.ts";
import { lessOneDb, onePlusDb } from "./one-plus-ratio.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

/**
 * Loss of a Chebyshev (equal ripple) filter; its edges are those of the ripple, not the 3 dB points.
 *
 *     A = 10·log10(1 + ε²·Tn²(W)), ε² = 10^(ripple / 10) − 1, Tn(W) = cosh(n·acosh W) for W > 1
 *
 * Assumes: ideal parts, edges where the loss leaves the ripple for good; rippleEdges converts edges
 * that were stated at 3 dB. Not for: inverse Chebyshev and elliptic filters.
 *
 * @param filter.offsetRatio  Offset W from bandOffsetRatio. [none], 0 to 10⁴⁰
 * @param filter.order        Order of the low-pass behind it: resonators of the band-pass. [none], 1 to 20, whole
 * @param filter.rippleDb     Ripple within the band. [dB], 0.001 to 3
 * @returns                   Loss above the least in the band. [dB], 0 or more
 * @throws RangeError         If an input lies outside its range or is NaN.
 * @accuracy                  exact for the assumption
 * @source                    D. M. Pozar, Microwave Engineering, section 8.3, examples 8.5 and 8.8, read second-hand at
 *                            github.com/FOSSEE/Python-Textbook-Companions; A. Sedra and K. Smith, Microelectronic Circuits,
 *                            problem 17.23, solution read at passeidireto.com/arquivo/194354945; both 2026-12-01.
 * @differs                   none. Charts that take 3 dB for the edge give more loss: 44.9 instead of 42.0 dB at W = 2
 *                            for order 5 and 0.5 dB.
 * @checkedBy                 sedra-17-23-chebyshev, library-chebyshev-3, library-chebyshev-5, library-chebyshev-low-ripple-3,
 *                            library-chebyshev-low-ripple-5
 */
export function chebyshevLossDb(filter: {
  readonly offsetRatio: number;
  readonly order: number;
  readonly rippleDb: number;
}): number {
  const { offsetRatio, order, rippleDb } = filter;
  requireRange("chebyshevLossDb", OFFSET_RATIO_LIMITS, { offsetRatio });
  requireWhole("chebyshevLossDb", FILTER_ORDER_LIMITS, { order });
  requireRange("chebyshevLossDb", RIPPLE_LIMITS_DB, { rippleDb });
  const rippleFactorDb = lessOneDb(rippleDb);
  if (offsetRatio > 1) {
    // ln cosh x = x + ln((1 + e^(−2x)) / 2), which does not overflow.
    const grown = order * Math.acosh(offsetRatio);
    const polynomialDb = (20 / Math.LN10) * (grown + Math.log1p(Math.exp(-2 * grown)) - Math.LN2);
    return onePlusDb(rippleFactorDb + polynomialDb);
  }
  const polynomial = Math.cos(order * Math.acos(offsetRatio));
  return (10 / Math.LN10) * Math.log1p(10 ** (rippleFactorDb / 10) * polynomial ** 2);
}
