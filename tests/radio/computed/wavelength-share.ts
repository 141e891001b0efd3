import { frequencyForShareMhz, waveShareM } from "../../../src/radio/wavelength-share.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  waveShareM: (row) =>
    waveShareM({
      frequencyMhz: take(row, "frequencyMhz"),
      share: take(row, "share"),
      velocityFactor: take(row, "velocityFactor"),
    }),
  frequencyForShareMhz: (row) =>
    frequencyForShareMhz({
      lengthM: take(row, "lengthM"),
      share: take(row, "share"),
      velocityFactor: take(row, "velocityFactor"),
    }),
};
