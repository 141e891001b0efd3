import { INTERMOD_RECIPES, type IntermodKind } from "./intermod-kind.ts";
import { LEVEL_CHANGE_LIMITS_DB } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * What a product gains or loses when its carriers change in power: turning all of them down by 1 dB
 * takes 3 dB off a product of third order and 5 dB off one of fifth.
 *
 *     ΔP = Σ|k|·ΔPk
 *
 * Assumes: the device that makes the product is driven as before otherwise. Not for: products born in
 * a transmitter whose own power is turned down together with its operating point.
 *
 * @param kind          Which carriers take part
 * @param changesDb     Change of each carrier in the order of the letters. [dB], −300 to 300
 * @returns             Change of the product. [dB]
 * @throws RangeError   If a change lies outside its range or is NaN, or they are not one to a letter.
 * @accuracy            as intermodLevelDbm
 * @source              as intermodLevelDbm, the difference of two levels
 * @differs             none
 * @checkedBy           none published, see test
 */
export function intermodLevelChangeDb(kind: IntermodKind, changesDb: readonly number[]): number {
  const { factors } = INTERMOD_RECIPES[kind];
  if (changesDb.length !== factors.length)
    throw new RangeError(
      `intermodLevelChangeDb: changesDb must be ${factors.length} changes, got ${changesDb.length}`,
    );
  return changesDb.reduce((sum, changeDb, place) => {
    requireRange("intermodLevelChangeDb", LEVEL_CHANGE_LIMITS_DB, { changeDb });
    return sum + Math.abs(factors[place] ?? 0) * changeDb;
  }, 0);
}
