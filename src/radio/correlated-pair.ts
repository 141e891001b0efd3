import { gammaProbability } from "./incomplete-gamma.ts";
import type { Limits } from "./limits.ts";
import { logGamma } from "./log-gamma.ts";
import { MARGIN_LIMITS_DB, OUTAGE_LIMITS, rayleighMarginDb } from "./rayleigh-outage.ts";
import { requireRange } from "./require-range.ts";
import { solveRising } from "./solve-rising.ts";

/** Above, the two antennas are one: selectionOutageProbability with one branch. */
const CORRELATION_LIMITS: Limits = { min: 0, max: 0.999 };

/**
 * Share of places in which both of two antennas fall short at once, where they stand so close that
 * they fade partly together.
 *
 *     P = (1 − ρ)·Σ ρ^k·P(k + 1, x / (1 − ρ))² for k = 0, 1, 2, …, x = 10^(−margin / 10),
 *     P(a, y) the incomplete gamma function (gammaProbability)
 *
 * Assumes: Rayleigh fading, the same mean power at both antennas, the stronger taken. Not for: pairs of
 * which one hears less; nor for ρ above 0.999, where the two are one.
 *
 * @param pair.marginDb          Mean power of each antenna over the needed power. [dB], −10 to 100
 * @param pair.correlationRatio  ρ, correlation of the two powers, as envelopeCorrelationRatio gives it:
 *                               the square of the correlation of the fields. [none], 0 to 0.999
 * @returns                      Outage, from 0 to 1. [none]
 * @throws RangeError            If an input lies outside its range or is NaN.
 * @accuracy                     Relative, 10⁻¹⁰, also where the result is tiny: every term is above 0, and
 *                               those left out are together below 10⁻¹² of the sum
 * @source                       M. Schwartz, W. R. Bennett, S. Stein, Communication Systems and Techniques
 *                               (1966), section 10-5, in Marcum Q functions; from memory, to be verified.
 *                               As a series by integrating that of the bivariate Rayleigh density term by
 *                               term.
 * @differs                      The series instead of the Q functions, whose two terms are easily swapped
 *                               and cancel where the outage is small.
 * @checkedBy           pair-0-7-at-20-db
 */
export function correlatedPairOutageProbability(pair: {
  readonly marginDb: number;
  readonly correlationRatio: number;
}): number {
  const { marginDb, correlationRatio } = pair;
  requireRange("correlatedPairOutageProbability", MARGIN_LIMITS_DB, { marginDb });
  requireRange("correlatedPairOutageProbability", CORRELATION_LIMITS, { correlationRatio });
  const y = 10 ** (-marginDb / 10) / (1 - correlationRatio);
  // Squared, each P beyond this is below 10⁻¹⁶ of the first one's square, and ρ^k comes on top.
  const last = Math.ceil(y + 8 * Math.sqrt(y) + 8);
  let below = gammaProbability(last + 1, y);
  let step = Math.exp(last * Math.log(y) - y - logGamma(last + 1));
  let sum = 0;
  for (let k = last; k >= 0; k -= 1) {
    sum = sum * correlationRatio + below ** 2;
    below += step;
    step *= k / y;
  }
  return (1 - correlationRatio) * sum;
}

/**
 * The margin that each of two antennas needs to keep the outage at a wished share: the inverse of
 * correlatedPairOutageProbability.
 *
 *     P(margin, ρ) = wished
 *
 * Assumes: as correlatedPairOutageProbability. Not for: promises: the mean is never known to the last
 * decibel.
 *
 * @param pair.outageProbability  Wished outage. [none], 10⁻⁹ to 0.999
 * @param pair.correlationRatio   Correlation of the two powers. [none], 0 to 0.999
 * @returns                       Mean power of each antenna over the needed power. [dB], −10 to 90
 * @throws RangeError             If an input lies outside its range or is NaN.
 * @accuracy                      10⁻⁸ dB
 * @source                        as correlatedPairOutageProbability, solved for the margin
 * @differs                       none
 * @checkedBy           none published, see test
 */
export function correlatedPairMarginDb(pair: {
  readonly outageProbability: number;
  readonly correlationRatio: number;
}): number {
  const { outageProbability, correlationRatio } = pair;
  requireRange("correlatedPairMarginDb", OUTAGE_LIMITS, { outageProbability });
  requireRange("correlatedPairMarginDb", CORRELATION_LIMITS, { correlationRatio });
  const reached = (marginDb: number) =>
    -correlatedPairOutageProbability({ marginDb, correlationRatio });
  return solveRising(reached, -outageProbability, MARGIN_LIMITS_DB);
}

/**
 * By how much less margin a pair of antennas needs than one, for the same outage.
 *
 *     gain = margin of one antenna − margin of each of the two
 *
 * Assumes: as correlatedPairOutageProbability. Not for: unequal antennas.
 *
 * @param pair.outageProbability  Outage at which they are compared. [none], 10⁻⁹ to 0.999
 * @param pair.correlationRatio   Correlation of the two powers. [none], 0 to 0.999
 * @returns                       Diversity gain. [dB], 0 or more
 * @throws RangeError             If an input lies outside its range or is NaN.
 * @accuracy                      10⁻⁸ dB
 * @source                        as correlatedPairMarginDb and rayleighMarginDb
 * @differs                       none
 * @checkedBy           none published, see test
 */
export function correlatedPairGainDb(pair: {
  readonly outageProbability: number;
  readonly correlationRatio: number;
}): number {
  return rayleighMarginDb(pair.outageProbability) - correlatedPairMarginDb(pair);
}
