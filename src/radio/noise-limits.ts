import type { Limits } from "./limits.ts";

/* What the functions for noise accept; see limits.ts. */

export const NOISE_FIGURE_LIMITS_DB: Limits = { min: 0, max: 400 };
export const BANDWIDTH_LIMITS_HZ: Limits = { min: 1, max: 1e12 };
export const TEMPERATURE_LIMITS_K: Limits = { min: 0.001, max: 1e6 };
