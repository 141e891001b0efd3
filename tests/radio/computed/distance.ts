import { distanceForChangeM, levelChangeDb } from "../../../src/radio/distance-ratio.ts";
import { farZoneStartM } from "../../../src/radio/far-zone.ts";
import { freeSpaceLossDb } from "../../../src/radio/free-space-loss.ts";
import { wavelengthM } from "../../../src/radio/wavelength.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  wavelengthM: (row) => wavelengthM(take(row, "frequencyMhz")),
  freeSpaceLossDb: (row) => freeSpaceLossDb(take(row, "distanceM"), take(row, "frequencyMhz")),
  levelChangeDb: (row) =>
    levelChangeDb({
      fromM: take(row, "fromM"),
      toM: take(row, "toM"),
      exponent: take(row, "exponent"),
    }),
  distanceForChangeM: (row) =>
    distanceForChangeM({
      fromM: take(row, "fromM"),
      changeDb: take(row, "changeDb"),
      exponent: take(row, "exponent"),
    }),
  farZoneStartM: (row) =>
    farZoneStartM({
      frequencyMhz: take(row, "frequencyMhz"),
      antennaLengthM: take(row, "antennaLengthM"),
    }),
};
