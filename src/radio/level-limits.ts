import type { Limits } from "./limits.ts";

/*
 * What the functions for levels, gains and fields accept: wide enough for every published example
 * and for each other's results, narrow enough that nothing overflows.
 */

export const LEVEL_LIMITS_DBM: Limits = { min: -300, max: 300 };
export const POWER_LIMITS_MW: Limits = { min: 1e-30, max: 1e30 };
export const POWER_LIMITS_W: Limits = { min: 1e-33, max: 1e27 };
export const RATIO_LIMITS: Limits = { min: 1e-30, max: 1e30 };
export const GAIN_LIMITS_DB: Limits = { min: -100, max: 100 };
/** A loss is a positive number: a gain has a name of its own. */
export const LOSS_LIMITS_DB: Limits = { min: 0, max: 300 };
export const VOLTAGE_LIMITS_DBUV: Limits = { min: -300, max: 500 };
export const IMPEDANCE_LIMITS_OHM: Limits = { min: 0.01, max: 1e6 };
export const FIELD_LIMITS_DBUV_PER_M: Limits = { min: -600, max: 600 };
