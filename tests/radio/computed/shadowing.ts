import { combinedSpreadDb } from "../../../src/radio/combined-spread.ts";
import { normalProbability, normalQuantile } from "../../../src/radio/normal.ts";
import { placesProbability, shadowMarginDb } from "../../../src/radio/shadow-margin.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  normalProbability: (row) => normalProbability(take(row, "deviationRatio")),
  normalQuantile: (row) => normalQuantile(take(row, "wishedProbability")),
  shadowMarginDb: (row) => shadowMarginDb(take(row, "placesProbability"), take(row, "spreadDb")),
  placesProbability: (row) => placesProbability(take(row, "marginDb"), take(row, "spreadDb")),
  combinedSpreadDb: (row) => combinedSpreadDb(take(row, "firstDb"), take(row, "secondDb")),
};
