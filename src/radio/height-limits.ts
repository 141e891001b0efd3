import type { Limits } from "./limits.ts";

/** Heights above flat ground. */
export const HEIGHT_LIMITS_M: Limits = { min: 0.01, max: 1000 };
