import type { Check, Evidence, Knowledge, Moment, Remedy } from "./knowledge.ts";
import { cureMass, expectedSeconds, massesAfter, type PlannedRemedy, tablesOf } from "./plan.ts";

export interface Candidate {
  readonly step: Check | Remedy;
  /** Expected time until audio is back if this is the next step. [s] */
  readonly seconds: number;
  readonly isWorthIt: boolean;
}

const DISTURBANCE = { none: 0, "one-link": 1, "all-links": 2 } as const;
const byDisturbance = (a: { step: Check | Remedy }, b: { step: Check | Remedy }): number =>
  DISTURBANCE[a.step.disruption] - DISTURBANCE[b.step.disruption];

/**
 * A remedy out of its order, because the better one must wait, is worth doing only if less than
 * this share of its time is expected to be wasted. Common practice, no source.
 */
const MOST_WASTED = 0.5;

/** Soonest first; within a second of each other, what disturbs least. */
const byMerit = (a: Candidate, b: Candidate): number =>
  Math.round(a.seconds) - Math.round(b.seconds) ||
  byDisturbance(a, b) ||
  a.step.seconds - b.step.seconds;

/** What has been answered ("can't tell" too), tried, or skipped is not offered again. */
function openSteps(knowledge: Knowledge, evidence: Evidence) {
  const done = new Set([
    ...evidence.answers.map(({ check }) => check),
    ...evidence.trials.map(({ remedy }) => remedy),
    ...evidence.skipped,
  ]);
  const { checks, remedies } = tablesOf(knowledge);
  const isRestored = evidence.trials.some(
    ({ remedy, result }) =>
      result === "cured" && knowledge.remedies.some((one) => one.id === remedy && one.isWorkaround),
  );
  return {
    checks: checks.filter(({ step }) => !done.has(step.id)),
    remedies: remedies
      .filter(({ step }) => !done.has(step.id) && !(isRestored && step.isWorkaround))
      .sort(byDisturbance),
  };
}

/**
 * All steps that are left, of every moment, the best first: those worth their time, then the
 * work-arounds where they only stand by, then the rest.
 *
 * @param masses  Probability of each hypothesis, in the order of the knowledge's list.
 */
export function rankedSteps(
  knowledge: Knowledge,
  evidence: Evidence,
  masses: Float64Array,
  moment: Moment,
): readonly Candidate[] {
  const { fallbackSeconds } = knowledge;
  const { checks, remedies } = openSteps(knowledge, evidence);
  const plan = remedies.filter(({ step }) => moment === "live" || !step.isWorkaround);
  const withoutCheck = expectedSeconds(masses, plan, fallbackSeconds);

  const asked = checks.map(({ step, likelihoods }): Candidate => {
    let seconds = step.seconds;
    for (const row of likelihoods) {
      const answered = masses.map((mass, at) => mass * (row[at] ?? 0));
      seconds += expectedSeconds(answered, plan, fallbackSeconds);
    }
    return { step, seconds, isWorthIt: seconds < withoutCheck };
  });
  const tried = (remedy: PlannedRemedy): Candidate => {
    const { step } = remedy;
    const rest = plan.filter((other) => other !== remedy);
    const after = expectedSeconds(massesAfter(remedy, masses), rest, fallbackSeconds);
    const seconds = step.seconds + after;
    const isWorthIt =
      cureMass(remedy, masses) * fallbackSeconds > step.seconds &&
      seconds - withoutCheck < MOST_WASTED * step.seconds;
    return { step, seconds, isWorthIt };
  };

  const planned = [...asked, ...plan.map(tried)].sort(byMerit);
  const standingBy = remedies.filter((remedy) => !plan.includes(remedy));
  return [
    ...planned.filter(({ isWorthIt }) => isWorthIt),
    ...standingBy.map(tried).sort(byMerit),
    ...planned.filter(({ isWorthIt }) => !isWorthIt),
  ];
}
