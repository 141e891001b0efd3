/** Which carriers make a product: the letters of the trade, each letter a different carrier. */
export type IntermodKind = "2A-B" | "A+B-C" | "3A-2B" | "3A-B-C" | "2A+B-2C";

export interface IntermodRecipe {
  readonly order: 3 | 5;
  /** How often each letter counts, in the order of the letters; they add up to 1. */
  readonly factors: readonly number[];
  /**
   * How many times the voltage of the two-carrier kind of the same order, all carriers being equal:
   * the multinomial coefficients 3, 6 of order 3 and 10, 20, 30 of order 5.
   */
  readonly voltageRatio: number;
}

/**
 * The products of orders 3 and 5 that two or three carriers make near themselves. Sums (2A+B, A+B+C)
 * land near three and five times the carriers' frequency and are left out, as are products of four
 * and five carriers.
 */
export const INTERMOD_RECIPES: Readonly<Record<IntermodKind, IntermodRecipe>> = {
  "2A-B": { order: 3, factors: [2, -1], voltageRatio: 1 },
  "A+B-C": { order: 3, factors: [1, 1, -1], voltageRatio: 2 },
  "3A-2B": { order: 5, factors: [3, -2], voltageRatio: 1 },
  "3A-B-C": { order: 5, factors: [3, -1, -1], voltageRatio: 2 },
  "2A+B-2C": { order: 5, factors: [2, 1, -2], voltageRatio: 3 },
};

export const THIRD_ORDER: readonly IntermodKind[] = ["2A-B", "A+B-C"];
export const FIFTH_ORDER: readonly IntermodKind[] = ["3A-2B", "3A-B-C", "2A+B-2C"];
