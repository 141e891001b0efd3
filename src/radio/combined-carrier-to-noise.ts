import type { Limits } from "./limits.ts";
import { powerSumDb } from "./power-sum.ts";
import { requireRange } from "./require-range.ts";

const CARRIER_TO_NOISE_LIMITS_DB: Limits = { min: -400, max: 400 };

/**
 * What is left of a carrier-to-noise ratio when several sources of noise act on one carrier.
 *
 *     1 / (C/N) = Σ 1 / (C/N)i
 *
 * Assumes: sources unrelated to each other, each ratio for the same carrier and band. Not for: a
 * carrier's own distortion, which is no noise.
 *
 * @param ratiosDb      Carrier over each noise alone: floor, mixing noise, products. [dB], −400 to 400, 1 to 10⁶
 * @returns             Carrier over all of them. [dB], below the lowest
 * @throws RangeError   If there is no ratio, or one lies outside its range or is NaN.
 * @accuracy            exact for the assumptions
 * @source              D. Roddy, Satellite Communications, example 12.20, p. 338. Read second-hand at
 *                      github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01.
 * @differs             none
 * @checkedBy           roddy-12-20
 */
export function combinedCarrierToNoiseDb(ratiosDb: readonly number[]): number {
  for (const carrierToNoiseDb of ratiosDb)
    requireRange("combinedCarrierToNoiseDb", CARRIER_TO_NOISE_LIMITS_DB, { carrierToNoiseDb });
  return -powerSumDb(ratiosDb.map((ratioDb) => -ratioDb));
}
