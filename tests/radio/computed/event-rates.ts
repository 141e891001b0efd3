import { poissonHighCount, poissonLowCount } from "../../../src/radio/poisson-interval.ts";
import {
  type BeforeAndAfter,
  highRateRatio,
  lowRateRatio,
  quietWatchRatio,
  rateChangeProbability,
  rateDropProbability,
} from "../../../src/radio/rate-change.ts";
import { type Computed, type Row, take } from "../rows.ts";

const counted = (row: Row): BeforeAndAfter => ({
  beforeCount: take(row, "beforeCount"),
  afterCount: take(row, "afterCount"),
  watchRatio: take(row, "watchRatio"),
});

const confidence = (row: Row): number => take(row, "confidenceProbability");

export const COMPUTED: Computed = {
  poissonLowCount: (row) => poissonLowCount(take(row, "eventCount"), confidence(row)),
  poissonHighCount: (row) => poissonHighCount(take(row, "eventCount"), confidence(row)),
  rateDropProbability: (row) => rateDropProbability(counted(row)),
  rateChangeProbability: (row) => rateChangeProbability(counted(row)),
  lowRateRatio: (row) => lowRateRatio(counted(row), confidence(row)),
  highRateRatio: (row) => highRateRatio(counted(row), confidence(row)),
  quietWatchRatio: (row) => quietWatchRatio(take(row, "beforeCount"), confidence(row)),
};
