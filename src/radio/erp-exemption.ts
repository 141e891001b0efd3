import { type FrequencyStep, frequencyLimit } from "./frequency-limit.ts";
import { POWER_LIMITS_W } from "./level-limits.ts";
import { DISTANCE_LIMITS_M } from "./limits.ts";
import { requireRange } from "./require-range.ts";
import { wavelengthM } from "./wavelength.ts";

/** Nearer than this the field is not yet a wave, and the rule does not apply. */
const nearestM = (frequencyMhz: number): number => wavelengthM(frequencyMhz) / (2 * Math.PI);

/**
 * The ERP up to which the rules of the USA ask for no exposure evaluation of one source at a distance.
 *
 *     ERPth = a·f^b·R²    with f in MHz, R in m, and a and b of the band that holds f
 *
 * Assumes: one source, power averaged over time. Not for: distances below λ / 2π; several sources at
 * once; saying that more power breaks a rule, since above it an evaluation is due; other countries.
 *
 * @param distanceM     Distance from people to the antenna, at least λ / 2π. [m], 0.001 to 10⁹
 * @param frequencyMhz  Carrier frequency. [MHz], 0.3 to 100 000
 * @param steps         Bands of the rule, limit at 1 m in W
 * @returns             Threshold for the ERP. [W]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the rule
 * @source              47 CFR 1.1307(b)(3)(i)(C), in force since 3 May 2021; FCC 19-126 (2019), Table 2, p. 26.
 *                      Read second-hand at github.com/zimolzak/fcc-rf-formulas, 2026-12-01.
 * @differs             none. That code has 33450 where only 3450 joins the bands; tables here hold 3450.
 * @checkedBy           fcc-code-444mhz-1m, notes-915mhz-20cm
 */
export function erpExemptW(
  place: { readonly distanceM: number; readonly frequencyMhz: number },
  steps: readonly FrequencyStep[],
): number {
  const { distanceM, frequencyMhz } = place;
  const atOneMetreW = frequencyLimit(frequencyMhz, steps);
  const limits = { min: nearestM(frequencyMhz), max: DISTANCE_LIMITS_M.max };
  requireRange("erpExemptW", limits, { distanceM });
  return atOneMetreW * distanceM ** 2;
}

/**
 * The distance from which on an ERP needs no exposure evaluation in the USA: the inverse of erpExemptW.
 *
 *     R = √(ERP / (a·f^b)),  λ / 2π at least
 *
 * Assumes: as erpExemptW. Not for: anything worn on the body, for which sarExemptMw asks the question
 * that fits; all that erpExemptW is not for.
 *
 * @param erpW          Effective radiated power, averaged over time. [W], 10⁻³³ to 10²⁷
 * @param frequencyMhz  Carrier frequency. [MHz], 0.3 to 100 000
 * @param steps         Bands of the rule, limit at 1 m in W
 * @returns             Distance, λ / 2π where the table would allow less. [m]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the rule
 * @source              as erpExemptW, solved for the distance
 * @differs             none
 * @checkedBy           exempt-erp-10mw, exempt-erp-100mw, exempt-erp-250mw
 */
export function erpExemptDistanceM(
  source: { readonly erpW: number; readonly frequencyMhz: number },
  steps: readonly FrequencyStep[],
): number {
  const { erpW, frequencyMhz } = source;
  requireRange("erpExemptDistanceM", POWER_LIMITS_W, { erpW });
  return Math.max(nearestM(frequencyMhz), Math.sqrt(erpW / frequencyLimit(frequencyMhz, steps)));
}
