import { butterworthLossDb } from "../../../src/radio/butterworth-loss.ts";
import { halfPowerOffsetRatio } from "../../../src/radio/chebyshev-edges.ts";
import { chebyshevLossDb } from "../../../src/radio/chebyshev-loss.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  butterworthLossDb: (row) =>
    butterworthLossDb({
      offsetRatio: take(row, "offsetRatio"),
      order: take(row, "order"),
      edgeLossDb: take(row, "edgeLossDb"),
    }),
  chebyshevLossDb: (row) =>
    chebyshevLossDb({
      offsetRatio: take(row, "offsetRatio"),
      order: take(row, "order"),
      rippleDb: take(row, "rippleDb"),
    }),
  halfPowerOffsetRatio: (row) =>
    halfPowerOffsetRatio({ order: take(row, "order"), rippleDb: take(row, "rippleDb") }),
};
