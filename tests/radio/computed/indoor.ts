import { floorsLossDb } from "../../../src/radio/floors-loss.ts";
import { partitionLossDb } from "../../../src/radio/partition-loss.ts";
import { siteGeneralLossDb } from "../../../src/radio/site-general-loss.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  siteGeneralLossDb: (row) =>
    siteGeneralLossDb({
      distanceM: take(row, "distanceM"),
      frequencyMhz: take(row, "frequencyMhz"),
      exponent: take(row, "exponent"),
      offsetDb: take(row, "offsetDb"),
      frequencyExponent: take(row, "frequencyExponent"),
    }),
  floorsLossDb: (row) =>
    floorsLossDb({
      distanceM: take(row, "distanceM"),
      frequencyMhz: take(row, "frequencyMhz"),
      perDecadeDb: take(row, "perDecadeDb"),
      floorsDb: take(row, "floorsDb"),
    }),
  partitionLossDb: (row) =>
    partitionLossDb({
      nearLossDb: take(row, "nearLossDb"),
      nearM: take(row, "nearM"),
      distanceM: take(row, "distanceM"),
      exponent: take(row, "exponent"),
      floorsDb: take(row, "floorsDb"),
      wallsDb: take(row, "wallsDb"),
    }),
};
