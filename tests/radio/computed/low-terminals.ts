import {
  hiddenCorrectionDb,
  sightCorrectionDb,
} from "../../../src/radio/low-terminal-corrections.ts";
import { lowTerminalLossDb } from "../../../src/radio/low-terminal-loss.ts";
import { sightDistanceM } from "../../../src/radio/sight-distance.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  sightCorrectionDb: (row) => sightCorrectionDb(take(row, "locationProbability")),
  hiddenCorrectionDb: (row) => hiddenCorrectionDb(take(row, "locationProbability")),
  sightDistanceM: (row) => sightDistanceM(take(row, "locationProbability")),
  lowTerminalLossDb: (row) =>
    lowTerminalLossDb({
      distanceM: take(row, "distanceM"),
      frequencyMhz: take(row, "frequencyMhz"),
      locationProbability: take(row, "locationProbability"),
      urbanDb: take(row, "urbanDb"),
      transitionM: take(row, "transitionM"),
    }),
};
