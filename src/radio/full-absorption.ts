import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

const SAR_LIMITS_W_PER_KG: Limits = { min: 1e-6, max: 1000 };
const TISSUE_LIMITS_G: Limits = { min: 0.1, max: 200_000 };

/**
 * The power that could not exceed a limit of absorption even if the tissue took all of it.
 *
 *     P = SAR·m
 *
 * Assumes: average power, one source. Not for: powers above it, of which it says nothing: most of a
 * transmitter's power goes elsewhere; rules that do not know this argument; implants.
 *
 * @param sarWPerKg     Limit of the specific absorption rate. [W/kg], 10⁻⁶ to 1000
 * @param tissueG       Mass that the rule averages over. [g], 0.1 to 200 000
 * @returns             Power. [mW]
 * @throws RangeError   If an input lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              EN IEC 62479:2010 and EN 50663:2017, low-power exclusion level; from memory, to be verified
 * @differs             none
 * @checkedBy           none published, see test
 */
export function fullAbsorptionMw(sarWPerKg: number, tissueG: number): number {
  requireRange("fullAbsorptionMw", SAR_LIMITS_W_PER_KG, { sarWPerKg });
  requireRange("fullAbsorptionMw", TISSUE_LIMITS_G, { tissueG });
  // W/kg times g is mW.
  return sarWPerKg * tissueG;
}
