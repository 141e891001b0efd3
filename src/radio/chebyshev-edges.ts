import { FILTER_ORDER_LIMITS, RIPPLE_LIMITS_DB } from "./filter-limits.ts";
import { FREQUENCY_LIMITS_MHZ } from "./limits.ts";
import { lessOneDb } from "./one-plus-ratio.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";

export interface BandEdges {
  readonly lowEdgeMhz: number;
  readonly highEdgeMhz: number;
}

export interface ChebyshevDesign {
  readonly order: number;
  readonly rippleDb: number;
}

/**
 * How much farther out the half-power points of a Chebyshev filter lie than its ripple edges.
 *
 *     W3dB = cosh(acosh(1 / ε) / n), ε² = 10^(ripple / 10) − 1
 *
 * Assumes: ideal parts; half power is 3.01 dB. Not for: ripple of half power or more.
 *
 * @param design.order     Order of the low-pass behind it. [none], 1 to 20, whole
 * @param design.rippleDb  Ripple within the band. [dB], 0.001 to 3
 * @returns                Bandwidth between half-power points over that between ripple edges. [none], above 1
 * @throws RangeError      If an input lies outside its range or is NaN.
 * @accuracy               exact for the assumption
 * @source                 A. Zverev, Handbook of Filter Synthesis (1967), from memory, to be verified
 * @differs                none
 * @checkedBy              library-half-power-5, library-half-power-3
 */
export function halfPowerOffsetRatio(design: ChebyshevDesign): number {
  requireWhole("halfPowerOffsetRatio", FILTER_ORDER_LIMITS, { order: design.order });
  requireRange("halfPowerOffsetRatio", RIPPLE_LIMITS_DB, { rippleDb: design.rippleDb });
  const rippleFactor = 10 ** (lessOneDb(design.rippleDb) / 20);
  return Math.cosh(Math.acosh(1 / rippleFactor) / design.order);
}

/**
 * Ripple edges of a Chebyshev band-pass whose edges were stated at 3 dB.
 *
 *     f2 − f1 = B3dB / W3dB with f1·f2 unchanged
 *
 * Assumes: as halfPowerOffsetRatio. Not for: edges stated at another loss than 3.01 dB.
 *
 * @param halfPower     Half-power edges, rising. [MHz], 0.003 to 3 000 000
 * @param design        Order and ripple, as halfPowerOffsetRatio takes them. [none] and [dB]
 * @returns             Ripple edges, inside the others. [MHz]
 * @throws RangeError   If a value lies outside its range or is NaN, or the edges do not rise.
 * @accuracy            exact for the assumption
 * @source              as halfPowerOffsetRatio, by the transformation of bandOffsetRatio
 * @differs             none
 * @checkedBy           none published, see test
 */
export function rippleEdges(halfPower: BandEdges, design: ChebyshevDesign): BandEdges {
  return widened("rippleEdges", halfPower, 1 / halfPowerOffsetRatio(design));
}

/**
 * Half-power edges of a Chebyshev band-pass from its ripple edges: the inverse of rippleEdges.
 *
 *     f2 − f1 = Bripple·W3dB with f1·f2 unchanged
 *
 * Assumes: as halfPowerOffsetRatio. Not for: edges stated at another loss than the ripple.
 *
 * @param ripple        Ripple edges, rising. [MHz], 0.003 to 3 000 000
 * @param design        Order and ripple, as halfPowerOffsetRatio takes them. [none] and [dB]
 * @returns             Half-power edges, outside the others. [MHz]
 * @throws RangeError   If a value lies outside its range or is NaN, or the edges do not rise.
 * @accuracy            exact for the assumption
 * @source              as rippleEdges, solved for the half-power edges
 * @differs             none
 * @checkedBy           none published, see test
 */
export function halfPowerEdges(ripple: BandEdges, design: ChebyshevDesign): BandEdges {
  return widened("halfPowerEdges", ripple, halfPowerOffsetRatio(design));
}

/** Edges around the same geometric middle with another bandwidth. */
function widened(caller: string, edges: BandEdges, ratio: number): BandEdges {
  const { lowEdgeMhz, highEdgeMhz } = edges;
  requireRange(caller, FREQUENCY_LIMITS_MHZ, { lowEdgeMhz, highEdgeMhz });
  if (highEdgeMhz <= lowEdgeMhz)
    throw new RangeError(
      `${caller}: highEdgeMhz must be above lowEdgeMhz ${lowEdgeMhz}, got ${highEdgeMhz}`,
    );
  const half = ((highEdgeMhz - lowEdgeMhz) * ratio) / 2;
  const reach = Math.hypot(half, Math.sqrt(lowEdgeMhz * highEdgeMhz));
  // The lower edge as a quotient: reach − half would cancel in wide bands.
  return { lowEdgeMhz: (lowEdgeMhz * highEdgeMhz) / (reach + half), highEdgeMhz: reach + half };
}
