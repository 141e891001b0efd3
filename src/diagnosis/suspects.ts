import type { Evidence, Knowledge } from "./knowledge.ts";
import { findings } from "./likelihood.ts";

export interface Suspect {
  /** Id of a cause, or `none-of-these`. */
  readonly cause: string;
  /** 0…1; all together 1 */
  readonly probability: number;
}

/**
 * Probability of each hypothesis in the order of the knowledge's list.
 *
 * Bayes' rule over single causes: the rates, brought to the sum 1, are the priors; findings are
 * taken as independent given the cause. Sums of logarithms, so that no number of answers underflows.
 *
 * @throws RangeError  If the evidence is impossible under every hypothesis (only with `floor` 0).
 */
export function posterior(knowledge: Knowledge, evidence: Evidence): readonly number[] {
  const seen = findings(knowledge, evidence);
  const logs = knowledge.hypotheses.map(({ ratePerHour }, index) =>
    seen.reduce(
      (sum, { likelihoods }) => sum + Math.log(likelihoods[index] ?? 1),
      Math.log(ratePerHour),
    ),
  );
  const highest = Math.max(...logs);
  if (!Number.isFinite(highest)) {
    throw new RangeError(`posterior: no hypothesis allows the evidence, got ${highest}`);
  }
  const weights = logs.map((log) => Math.exp(log - highest));
  const sum = weights.reduce((total, weight) => total + weight, 0);
  return weights.map((weight) => weight / sum);
}

/** Who it may be, the most probable first; equals stay in the order of the knowledge's list. */
export function suspects(knowledge: Knowledge, evidence: Evidence): readonly Suspect[] {
  const probabilities = posterior(knowledge, evidence);
  return knowledge.hypotheses
    .map(({ id }, index) => ({ cause: id, probability: probabilities[index] ?? 0 }))
    .sort((a, b) => b.probability - a.probability);
}
