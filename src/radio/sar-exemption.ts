import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const SAR_FREQUENCY_LIMITS_MHZ: Limits = { min: 300, max: 6000 };
const SAR_DISTANCE_LIMITS_M: Limits = { min: 0.005, max: 0.4 };
/** From here to the farthest distance the threshold stays the same. */
const FLAT_FROM_M = 0.2;

/** ERP20cm and the exponent x of the rule. */
function thresholdTerms(frequencyMhz: number): { readonly flatMw: number; readonly slope: number } {
  const flatMw = frequencyMhz < 1500 ? 2.04 * frequencyMhz : 3060;
  return { flatMw, slope: Math.log10((flatMw * Math.sqrt(frequencyMhz / 1000)) / 60) };
}

/**
 * The power up to which the rules of the USA ask for no exposure evaluation of one source near the body.
 *
 *     Pth = ERP20·(d / 20 cm)^x up to 20 cm,  ERP20 from there to 40 cm
 *     ERP20 = 2040·f below 1.5 GHz, else 3060 mW;  x = −log10(60 / (ERP20·√f)),  f in GHz
 *
 * Assumes: one source; the larger of conducted power and ERP, averaged over time. Not for: saying that
 * more power breaks a rule, since above it the device is tested instead; several sources at once; devices
 * that are approved with a spacing, which then holds; implants; other countries.
 *
 * @param distanceM     Distance from the body to the device or antenna. [m], 0.005 to 0.4
 * @param frequencyMhz  Carrier frequency. [MHz], 300 to 6000
 * @returns             Threshold for the larger of conducted power and ERP. [mW]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the rule
 * @source              47 CFR 1.1307(b)(3)(i)(B), in force since 3 May 2021; FCC 19-126 (2019), p. 23. Read
 *                      second-hand at github.com/zimolzak/fcc-rf-formulas; limits of distance and frequency in a
 *                      published test report, device.report, 2026-12-01.
 * @differs             Metres and MHz here.
 * @checkedBy           fcc-300mhz-10mm, fcc-300mhz-15mm, fcc-300mhz-20mm, fcc-450mhz-15mm, fcc-450mhz-20mm,
 *                      fcc-835mhz-20mm, fcc-1900mhz-40mm, fcc-2450mhz-50mm, fcc-3600mhz-45mm, fcc-5800mhz-50mm,
 *                      fcc-code-450mhz-10mm,
 *                      exempt-550mhz-5mm, exempt-550mhz-10mm, exempt-550mhz-25mm, exempt-550mhz-50mm,
 *                      exempt-550mhz-100mm, exempt-550mhz-200mm, exempt-550mhz-400mm
 */
export function sarExemptMw(distanceM: number, frequencyMhz: number): number {
  requireRange("sarExemptMw", SAR_DISTANCE_LIMITS_M, { distanceM });
  requireRange("sarExemptMw", SAR_FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  const { flatMw, slope } = thresholdTerms(frequencyMhz);
  return flatMw * Math.min(1, distanceM / FLAT_FROM_M) ** slope;
}

/**
 * The distance from which on a power needs no exposure evaluation in the USA: the inverse of sarExemptMw.
 *
 *     d = 20 cm·(P / ERP20)^(1 / x)
 *
 * Assumes: as sarExemptMw. Not for: powers above ERP20, which no distance up to 40 cm exempts; all that
 * sarExemptMw is not for.
 *
 * @param powerMw       The larger of conducted power and ERP, averaged over time. [mW], 10⁻³⁰ to ERP20
 * @param frequencyMhz  Carrier frequency. [MHz], 300 to 6000
 * @returns             Distance, 0.005 where the rule would allow less. [m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the rule
 * @source              as sarExemptMw, solved for the distance; the rule begins at 5 mm
 * @differs             none
 * @checkedBy           exempt-50mw-distance, exempt-100mw-distance, exempt-250mw-distance
 */
export function sarExemptDistanceM(powerMw: number, frequencyMhz: number): number {
  requireRange("sarExemptDistanceM", SAR_FREQUENCY_LIMITS_MHZ, { frequencyMhz });
  const { flatMw, slope } = thresholdTerms(frequencyMhz);
  requireRange("sarExemptDistanceM", { min: 1e-30, max: flatMw }, { powerMw });
  return Math.max(SAR_DISTANCE_LIMITS_M.min, FLAT_FROM_M * (powerMw / flatMw) ** (1 / slope));
}
