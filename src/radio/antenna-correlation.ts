import { besselJ0 } from "./bessel-j0.ts";
import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { requireWhole } from "./require-whole.ts";
import { solveRising } from "./solve-rising.ts";
import { wavelengthM } from "./wavelength.ts";

const MOST_WAVELENGTHS = 1000;
const CORRELATION_LIMITS: Limits = { min: 0, max: 1 };
const ORDER_LIMITS: Limits = { min: 1, max: 100 };

/**
 * How alike the field is at two antennas that stand some way apart.
 *
 *     ρ = J₀(2π·d / λ)
 *
 * Assumes: many reflections that arrive evenly from all sides in the plane of the antennas (Clarke's
 * model). Not for: antennas high above the stage or far from it, which see it under a narrow angle and
 * need many times the spacing; nor what close antennas do to each other.
 *
 * @param spacingM      Distance between the antennas. [m], 0 to 1000 wavelengths
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Correlation of the complex field, from −0.403 to 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions, to 10⁻¹³
 * @source              R. H. Clarke, A Statistical Theory of Mobile-Radio Reception, Bell Syst. Tech. J. 47
 *                      (1968), 957-1000; W. C. Jakes, Microwave Mobile Communications (1974), section 1.3.
 *                      From memory, to be verified.
 * @differs             none
 * @checkedBy           spacing-0-1-field, spacing-0-25-field, spacing-0-5-field, spacing-1-field
 */
export function fieldCorrelationRatio(spacingM: number, frequencyMhz: number): number {
  const wavelength = wavelengthM(frequencyMhz);
  requireRange(
    "fieldCorrelationRatio",
    { min: 0, max: MOST_WAVELENGTHS * wavelength },
    { spacingM },
  );
  return besselJ0((2 * Math.PI * spacingM) / wavelength);
}

/**
 * How alike the level is at two antennas that stand some way apart: what diversity has to fear.
 *
 *     ρ = J₀(2π·d / λ)²
 *
 * Assumes: as fieldCorrelationRatio. Not for: reading a promise into a zero: past it the correlation
 * rises again, to 0.16 at 0.61 wavelengths.
 *
 * @param spacingM      Distance between the antennas. [m], 0 to 1000 wavelengths
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns             Correlation of the received powers, from 0 to 1. [none]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the powers; for the amplitudes within 0.03
 * @source              as fieldCorrelationRatio: powers of complex Gaussian fields correlate as the square
 * @differs             none
 * @checkedBy           spacing-0-1-envelope, spacing-0-25-envelope, spacing-0-5-envelope,
 *                      spacing-1-envelope
 */
export function envelopeCorrelationRatio(spacingM: number, frequencyMhz: number): number {
  return fieldCorrelationRatio(spacingM, frequencyMhz) ** 2;
}

/**
 * Distances at which two antennas fade independently.
 *
 *     J₀(2π·d / λ) = 0
 *
 * Assumes: as fieldCorrelationRatio. Not for: setting up to the centimetre: real rooms have no such zeros.
 *
 * @param frequencyMhz  Carrier frequency. [MHz], 0.003 to 3 000 000
 * @param order         Which of the distances, 1 for the shortest. [none], 1 to 100
 * @returns             Distance between the antennas. [m]
 * @throws RangeError   If an input lies outside its range or is NaN, or the order is not whole.
 * @accuracy            exact for the assumptions, to 10⁻¹³
 * @source              As fieldCorrelationRatio. The n-th zero of J₀ lies between (n − ¼)·π and (n − ⅛)·π:
 *                      NIST Digital Library of Mathematical Functions, section 10.21, from memory, to be
 *                      verified.
 * @differs             none
 * @checkedBy           first-zero-spacing, second-zero-spacing
 */
export function zeroSpacingM(frequencyMhz: number, order: number): number {
  requireWhole("zeroSpacingM", ORDER_LIMITS, { order });
  const limits = { min: (order - 0.25) * Math.PI, max: (order - 0.125) * Math.PI };
  // J₀ falls through its first zero, rises through the second, and so on.
  const zero = solveRising((x) => besselJ0(x) * (-1) ** order, 0, limits);
  return (zero / (2 * Math.PI)) * wavelengthM(frequencyMhz);
}

/**
 * How far apart two antennas have to stand for a wished correlation of their levels: the inverse of
 * envelopeCorrelationRatio up to its first zero.
 *
 *     J₀(2π·d / λ)² = wished
 *
 * Assumes: as fieldCorrelationRatio. Not for: the same correlation farther out, where it swings.
 *
 * @param correlationRatio  Wished correlation of the received powers. [none], 0 to 1
 * @param frequencyMhz      Carrier frequency. [MHz], 0.003 to 3 000 000
 * @returns                 Shortest such distance. [m], 0 to 0.383 wavelengths
 * @throws RangeError       If an input lies outside its range or is NaN.
 * @accuracy                10⁻⁷ of a wavelength near correlation 1, where the curve is flat, else 10⁻¹³
 * @source                  as envelopeCorrelationRatio, solved for the distance
 * @differs                 none
 * @checkedBy           none published, see test
 */
export function spacingForCorrelationM(correlationRatio: number, frequencyMhz: number): number {
  requireRange("spacingForCorrelationM", CORRELATION_LIMITS, { correlationRatio });
  const firstZeroM = zeroSpacingM(frequencyMhz, 1);
  const limits = { min: 0, max: 1 };
  const unlike = (share: number) => -fieldCorrelationRatio(share * firstZeroM, frequencyMhz);
  return solveRising(unlike, -Math.sqrt(correlationRatio), limits) * firstZeroM;
}
