import { INTERMOD_RECIPES, type IntermodKind, type IntermodRecipe } from "./intermod-kind.ts";
import { LEVEL_LIMITS_DBM } from "./level-limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * How strong a product comes out of an amplifier or a receiver's front end.
 *
 *     P = Σ|k|·Pk − (n − 1)·IPn + 20·log10 w; so 2·PA + PB − 2·IP3 for 2A−B, and 6.02 dB more for A+B−C
 *
 * Assumes: levels and intercept point at the same place (all at the input or all at the output), well
 * below compression. Not for: levels within some 10 dB of the compression point, where higher orders
 * join in; products made in a transmitter's output stage (transmitterProductDbm).
 *
 * @param product.kind          Which carriers take part
 * @param product.levelsDbm     Levels of the carriers in the order of the letters. [dBm], −300 to 300
 * @param product.interceptDbm  Intercept point of that order: IP3 or IP5. [dBm], −300 to 300
 * @returns                     Level of the product, referred to where the levels are. [dBm]
 * @throws RangeError           If a value lies outside its range or is NaN, or the levels are not one to a letter.
 * @accuracy                    exact for a third- or fifth-order characteristic; real ones within a few dB
 * @source                      D. K. Mishra, Radio-Frequency and Microwave Communication Circuits, example 2.14, p. 51. Read
 *                              second-hand at github.com/FOSSEE/Python-Textbook-Companions, 2026-12-01. 6 dB for
 *                              three carriers: microwavejournal.com/articles/3377, read 2026-12-01.
 * @differs                     none
 * @checkedBy                   mishra-2-14-product
 */
export function intermodLevelDbm(product: {
  readonly kind: IntermodKind;
  readonly levelsDbm: readonly number[];
  readonly interceptDbm: number;
}): number {
  const recipe = INTERMOD_RECIPES[product.kind];
  requireRange("intermodLevelDbm", LEVEL_LIMITS_DBM, { interceptDbm: product.interceptDbm });
  const drivingDbm = drivingSumDbm("intermodLevelDbm", recipe, product.levelsDbm);
  return drivingDbm - (recipe.order - 1) * product.interceptDbm;
}

/**
 * Intercept point from a product that was measured: the inverse of intermodLevelDbm.
 *
 *     IPn = (Σ|k|·Pk + 20·log10 w − P) / (n − 1)
 *
 * Assumes: as intermodLevelDbm; the product stands clear of the noise. Not for: a product that was
 * made in the measuring receiver itself.
 *
 * @param product.kind        Which carriers take part
 * @param product.levelsDbm   Levels of the carriers in the order of the letters. [dBm], −300 to 300
 * @param product.productDbm  Level of the product at the same place. [dBm], −300 to 300
 * @returns                   Intercept point of that order at the same place. [dBm]
 * @throws RangeError         If a value lies outside its range or is NaN, or the levels are not one to a letter.
 * @accuracy                  as intermodLevelDbm
 * @source                    as intermodLevelDbm, solved for the intercept point
 * @differs                   none
 * @checkedBy                 mishra-2-14-intercept
 */
export function interceptFromProductDbm(product: {
  readonly kind: IntermodKind;
  readonly levelsDbm: readonly number[];
  readonly productDbm: number;
}): number {
  const recipe = INTERMOD_RECIPES[product.kind];
  requireRange("interceptFromProductDbm", LEVEL_LIMITS_DBM, { productDbm: product.productDbm });
  const drivingDbm = drivingSumDbm("interceptFromProductDbm", recipe, product.levelsDbm);
  return (drivingDbm - product.productDbm) / (recipe.order - 1);
}

/**
 * How strong equal carriers may arrive before their product reaches a given level.
 *
 *     Pk = (P + (n − 1)·IPn − 20·log10 w) / n
 *
 * Assumes: as intermodLevelDbm, all carriers equal. Not for: one strong carrier among weak ones.
 *
 * @param product.kind          Which carriers take part
 * @param product.productDbm    Highest product that is acceptable, at the input. [dBm], −300 to 300
 * @param product.interceptDbm  Intercept point of that order at the input. [dBm], −300 to 300
 * @returns                     Level of each carrier at the input. [dBm]
 * @throws RangeError           If a value lies outside its range or is NaN.
 * @accuracy                    as intermodLevelDbm
 * @source                      as intermodLevelDbm, solved for equal levels
 * @differs                     none
 * @checkedBy                   mishra-2-14-carriers
 */
export function carriersForProductDbm(product: {
  readonly kind: IntermodKind;
  readonly productDbm: number;
  readonly interceptDbm: number;
}): number {
  const { productDbm, interceptDbm } = product;
  requireRange("carriersForProductDbm", LEVEL_LIMITS_DBM, { productDbm, interceptDbm });
  const { order, voltageRatio } = INTERMOD_RECIPES[product.kind];
  return (productDbm + (order - 1) * interceptDbm - 20 * Math.log10(voltageRatio)) / order;
}

function drivingSumDbm(caller: string, recipe: IntermodRecipe, levelsDbm: readonly number[]) {
  const { factors, voltageRatio } = recipe;
  if (levelsDbm.length !== factors.length)
    throw new RangeError(
      `${caller}: levelsDbm must be ${factors.length} levels, got ${levelsDbm.length}`,
    );
  return levelsDbm.reduce((sum, levelDbm, place) => {
    requireRange(caller, LEVEL_LIMITS_DBM, { levelDbm });
    return sum + Math.abs(factors[place] ?? 0) * levelDbm;
  }, 20 * Math.log10(voltageRatio));
}
