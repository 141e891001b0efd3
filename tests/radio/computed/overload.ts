import {
  blockerForMixingNoiseDbm,
  reciprocalMixingNoiseDbm,
} from "../../../src/radio/reciprocal-mixing.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  reciprocalMixingNoiseDbm: (row) =>
    reciprocalMixingNoiseDbm({
      blockerDbm: take(row, "blockerDbm"),
      phaseNoiseDbc: take(row, "phaseNoiseDbc"),
      bandwidthHz: take(row, "bandwidthHz"),
    }),
  blockerForMixingNoiseDbm: (row) =>
    blockerForMixingNoiseDbm({
      noiseDbm: take(row, "noiseDbm"),
      phaseNoiseDbc: take(row, "phaseNoiseDbc"),
      bandwidthHz: take(row, "bandwidthHz"),
    }),
};
