import type { Limits } from "./limits.ts";

/* What the filter functions accept; see limits.ts. */

/** Distance from mid-band over that of the edge: 0 in the middle, 1 at the edge. */
export const OFFSET_RATIO_LIMITS: Limits = { min: 0, max: 1e40 };
export const FILTER_ORDER_LIMITS: Limits = { min: 1, max: 20 };
export const RIPPLE_LIMITS_DB: Limits = { min: 0.001, max: 3 };
