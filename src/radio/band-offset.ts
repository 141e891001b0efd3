import { FREQUENCY_LIMITS_MHZ } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * How far a frequency lies outside a band-pass, as the low-pass behind its formulas sees it.
 *
 *     W = |f/f0 − f0/f|·f0 / (f2 − f1), f0 = √(f1·f2)
 *
 * Assumes: a filter made from a low-pass by the usual transformation: both edges get W = 1. Not for:
 * ceramic and cavity filters with notches, whose data sheets say more.
 *
 * @param band.frequencyMhz  Frequency of interest. [MHz], 0.003 to 3 000 000
 * @param band.lowEdgeMhz    Lower band edge. [MHz], 0.003 to 3 000 000
 * @param band.highEdgeMhz   Upper band edge, above the lower one. [MHz], to 3 000 000
 * @returns                  Offset: 0 in the middle, 1 at the edges, more outside. [none]
 * @throws RangeError        If a frequency lies outside its range or is NaN, or the edges do not rise.
 * @accuracy                 exact for the assumption
 * @source                   D. M. Pozar, Microwave Engineering, section 8.4, from memory, to be verified; example 8.8 read
 *                           second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs                  The book allows the arithmetic mean for f0 in narrow bands; the geometric one here.
 * @checkedBy           none published, see test
 */
export function bandOffsetRatio(band: {
  readonly frequencyMhz: number;
  readonly lowEdgeMhz: number;
  readonly highEdgeMhz: number;
}): number {
  const { frequencyMhz, lowEdgeMhz, highEdgeMhz } = band;
  requireRange("bandOffsetRatio", FREQUENCY_LIMITS_MHZ, { frequencyMhz, lowEdgeMhz, highEdgeMhz });
  if (highEdgeMhz <= lowEdgeMhz)
    throw new RangeError(
      `bandOffsetRatio: highEdgeMhz must be above lowEdgeMhz ${lowEdgeMhz}, got ${highEdgeMhz}`,
    );
  const middleMhz = Math.sqrt(lowEdgeMhz * highEdgeMhz);
  const offsetMhz = (frequencyMhz - middleMhz) * (1 + middleMhz / frequencyMhz);
  return Math.abs(offsetMhz) / (highEdgeMhz - lowEdgeMhz);
}
