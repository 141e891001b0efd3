import {
  envelopeCorrelationRatio,
  fieldCorrelationRatio,
  zeroSpacingM,
} from "../../../src/radio/antenna-correlation.ts";
import { correlatedPairOutageProbability } from "../../../src/radio/correlated-pair.ts";
import { rayleighMarginDb, rayleighOutageProbability } from "../../../src/radio/rayleigh-outage.ts";
import { selectionDiversityGainDb } from "../../../src/radio/selection-gain.ts";
import {
  selectionMarginDb,
  selectionOutageProbability,
} from "../../../src/radio/selection-outage.ts";
import { type Computed, take } from "../rows.ts";

export const COMPUTED: Computed = {
  fieldCorrelationRatio: (row) =>
    fieldCorrelationRatio(take(row, "spacingM"), take(row, "frequencyMhz")),
  envelopeCorrelationRatio: (row) =>
    envelopeCorrelationRatio(take(row, "spacingM"), take(row, "frequencyMhz")),
  zeroSpacingM: (row) => zeroSpacingM(take(row, "frequencyMhz"), take(row, "order")),
  rayleighOutageProbability: (row) => rayleighOutageProbability(take(row, "marginDb")),
  rayleighMarginDb: (row) => rayleighMarginDb(take(row, "outageProbability")),
  selectionOutageProbability: (row) =>
    selectionOutageProbability(take(row, "marginDb"), take(row, "branchCount")),
  selectionMarginDb: (row) =>
    selectionMarginDb(take(row, "outageProbability"), take(row, "branchCount")),
  selectionDiversityGainDb: (row) =>
    selectionDiversityGainDb(take(row, "outageProbability"), take(row, "branchCount")),
  correlatedPairOutageProbability: (row) =>
    correlatedPairOutageProbability({
      marginDb: take(row, "marginDb"),
      correlationRatio: take(row, "correlationRatio"),
    }),
};
