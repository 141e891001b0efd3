import fc from "fast-check";
import { DISTANCE_FIELDS } from "../../../src/calculators/distance/fields.ts";
import type { DistanceInputs } from "../../../src/calculators/distance/outcome.ts";
import { within } from "../../radio/samples.ts";

/** What the calculator shows when it is opened for the first time. */
export const INITIAL: DistanceInputs = {
  fromM: DISTANCE_FIELDS.fromM.initial,
  toM: DISTANCE_FIELDS.toM.initial,
  frequencyMhz: DISTANCE_FIELDS.frequencyMhz.initial,
  exponent: DISTANCE_FIELDS.exponent.initial,
  wishedGainDb: DISTANCE_FIELDS.wishedGainDb.initial,
};

/** Lengths as they occur: as many between 0.1 and 1 m as between 100 and 1000 m, and both ends. */
const lengths = fc.oneof(
  { weight: 4, arbitrary: within({ min: -1, max: 3.3 }).map((power) => 10 ** power) },
  { weight: 1, arbitrary: within(DISTANCE_FIELDS.fromM) },
);

export const anyInputs: fc.Arbitrary<DistanceInputs> = fc.record({
  fromM: lengths,
  toM: lengths,
  frequencyMhz: within(DISTANCE_FIELDS.frequencyMhz),
  exponent: within(DISTANCE_FIELDS.exponent),
  wishedGainDb: within(DISTANCE_FIELDS.wishedGainDb),
});
