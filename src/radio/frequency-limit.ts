import { FREQUENCY_LIMITS_MHZ } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/** A band in which a limit follows one power of the frequency. */
export interface FrequencyStep {
  readonly fromMhz: number;
  readonly toMhz: number;
  /** The limit at 1 MHz on this band's line, in the unit of the limit. */
  readonly factor: number;
  readonly exponent: number;
}

/**
 * The limit that a rule sets at a frequency, from the rule's table.
 *
 *     limit = a·f^b    with f in MHz, and a and b of the band that holds f
 *
 * Assumes: bands in rising order without gaps. Not for: frequencies outside the table; anything that
 * the table's own row says it does not cover.
 *
 * @param frequencyMhz  Carrier frequency. [MHz], as far as the bands reach
 * @param steps         Bands of the rule. Where two meet, the upper one holds; the last holds its end too.
 * @returns             The limit, in the unit of the table
 * @throws RangeError   If no band holds the frequency, or it is NaN.
 * @accuracy            exact for the table
 * @source              The rule that the table was taken from; it stands beside the table.
 * @differs             Some rules give the meeting point to the lower band. The limits there differ by less than
 *                      1 % in the exposure rules of FCC and ICNIRP.
 * @checkedBy           none published, see test
 */
export function frequencyLimit(frequencyMhz: number, steps: readonly FrequencyStep[]): number {
  requireRange("frequencyLimit", FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  const step = steps.findLast(({ fromMhz }) => fromMhz <= frequencyMhz);
  if (step === undefined || frequencyMhz > step.toMhz)
    throw new RangeError(`frequencyLimit: frequencyMhz lies in no band, got ${frequencyMhz}`);
  return step.factor * frequencyMhz ** step.exponent;
}
