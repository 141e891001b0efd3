import type { Evidence, Knowledge } from "./knowledge.ts";

/** One thing that was seen or tried, and how probable it was under each hypothesis. */
export interface Finding {
  readonly kind: "check" | "remedy";
  readonly id: string;
  /** Outcome of the check, or result of the trial. */
  readonly outcome: string;
  /** In the order of the knowledge's hypotheses. 0…1 */
  readonly likelihoods: readonly number[];
}

/**
 * How much a trial's result counts: the share of its decibans that is believed.
 *
 * - cured: whole, but a work-around changes place, frequency, microphone and person at once, so
 *   that its success says little of what was wrong: a tenth.
 * - better: half of what "cured" would count. Part of the symptom may have gone by itself, or one
 *   of two causes.
 * - no change, worse: whole.
 *
 * Common practice, no source.
 */
const SHARE_OF_CURED = 1;
const SHARE_OF_BETTER = 0.5;
const SHARE_OF_WORKAROUND = 0.1;

function answerFindings(knowledge: Knowledge, evidence: Evidence): Finding[] {
  const latest = new Map(evidence.answers.map(({ check, outcome }) => [check, outcome]));
  return knowledge.checks.flatMap((check): Finding[] => {
    const outcome = latest.get(check.id);
    const index = outcome === undefined ? -1 : check.outcomes.indexOf(outcome);
    if (outcome === undefined || index < 0) return [];
    const likelihoods = knowledge.hypotheses.map(
      ({ id }) => check.likelihood.get(id)?.[index] ?? 1,
    );
    return [{ kind: "check", id: check.id, outcome, likelihoods }];
  });
}

function trialFindings(knowledge: Knowledge, evidence: Evidence): Finding[] {
  const latest = new Map(evidence.trials.map(({ remedy, result }) => [remedy, result]));
  return knowledge.remedies.flatMap((remedy): Finding[] => {
    const result = latest.get(remedy.id);
    if (result === undefined) return [];
    const hasHelped = result === "cured" || result === "better";
    const share =
      (result === "better" ? SHARE_OF_BETTER : SHARE_OF_CURED) *
      (hasHelped && remedy.isWorkaround ? SHARE_OF_WORKAROUND : 1);
    const likelihoods = knowledge.hypotheses.map(({ id }) => {
      // A fault may stop by itself just then, and a sure cure may fail.
      const cured = Math.max(remedy.cures.get(id) ?? 0, knowledge.floor);
      return hasHelped ? cured ** share : 1 - cured;
    });
    return [{ kind: "remedy", id: remedy.id, outcome: result, likelihoods }];
  });
}

/**
 * Everything in the evidence that says something, each step once: of several answers to one check,
 * or trials of one remedy, the last counts. "Can't tell", and ids that the knowledge does not hold
 * (an older journal), say nothing and are left out.
 */
export const findings = (knowledge: Knowledge, evidence: Evidence): readonly Finding[] => [
  ...answerFindings(knowledge, evidence),
  ...trialFindings(knowledge, evidence),
];
