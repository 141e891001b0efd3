import type { Evidence, Knowledge } from "./knowledge.ts";
import { type Finding, findings } from "./likelihood.ts";

/** How far one finding speaks for a cause (above 0) or against it (below 0). */
export interface EvidenceWeight {
  readonly kind: Finding["kind"];
  readonly id: string;
  readonly outcome: string;
  /** [deciban] */
  readonly weightDb: number;
}

/**
 * What each finding adds to the odds of one cause, the heaviest first.
 *
 *     weight = 10·log10( P(finding | cause) / P(finding | not the cause) )
 *
 * "Not the cause" is all other hypotheses by their prior shares, whatever else was found: so a
 * finding's weight does not depend on the order of the answers. With more than two hypotheses the
 * weights of several findings therefore do not add up to the exact change of the odds.
 *
 * @param cause       Id of a cause, or `none-of-these`.
 * @throws RangeError If the knowledge has no such hypothesis.
 * @source            I. J. Good, Probability and the Weighing of Evidence (Griffin, 1950); the
 *                    deciban as in Good, Michie and Timms, General Report on Tunny (1945), sec. 21(g).
 */
export function evidenceWeights(
  knowledge: Knowledge,
  evidence: Evidence,
  cause: string,
): readonly EvidenceWeight[] {
  const at = knowledge.hypotheses.findIndex(({ id }) => id === cause);
  if (at < 0) throw new RangeError(`evidenceWeights: cause must be a hypothesis, got ${cause}`);
  return findings(knowledge, evidence)
    .map(({ kind, id, outcome, likelihoods }) => {
      let others = 0;
      let rates = 0;
      knowledge.hypotheses.forEach(({ ratePerHour }, index) => {
        if (index === at) return;
        rates += ratePerHour;
        others += ratePerHour * (likelihoods[index] ?? 1);
      });
      const ratio = ((likelihoods[at] ?? 1) * rates) / others;
      return { kind, id, outcome, weightDb: 10 * Math.log10(ratio) };
    })
    .sort((a, b) => Math.abs(b.weightDb) - Math.abs(a.weightDb));
}

export type Strength = "leading" | "possible" | "unlikely";

/**
 * A word for a probability: "leading" from 0.5 (more likely than all others together), "unlikely"
 * below 0.1 (under one in ten). The limits are common practice, no source.
 */
export const strengthWord = (probability: number): Strength =>
  probability >= 0.5 ? "leading" : probability >= 0.1 ? "possible" : "unlikely";

/** Steps of 5: elicited words cannot carry more. */
const PERCENT_STEP = 5;

/** Per cent to the nearest 5, and "<5" or ">95" at the ends: nothing is ever nought or certain. */
export function roundedPercent(probability: number): string {
  const percent = probability * 100;
  if (percent < PERCENT_STEP) return `<${PERCENT_STEP}`;
  if (percent > 100 - PERCENT_STEP) return `>${100 - PERCENT_STEP}`;
  return String(Math.round(percent / PERCENT_STEP) * PERCENT_STEP);
}
