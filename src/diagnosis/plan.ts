import type { Check, Knowledge, Remedy } from "./knowledge.ts";

/** A remedy with the hypotheses it cures, as positions in the knowledge's list. */
export interface PlannedRemedy {
  readonly step: Remedy;
  readonly cured: readonly { readonly at: number; readonly probability: number }[];
}

/** A check with, for each outcome, its likelihood under each hypothesis. */
interface PlannedCheck {
  readonly step: Check;
  readonly likelihoods: readonly (readonly number[])[];
}

interface Tables {
  readonly checks: readonly PlannedCheck[];
  readonly remedies: readonly PlannedRemedy[];
}

const made = new WeakMap<Knowledge, Tables>();

/** The knowledge by position instead of by id, made once for each knowledge. */
export function tablesOf(knowledge: Knowledge): Tables {
  const known = made.get(knowledge);
  if (known !== undefined) return known;
  const ids = knowledge.hypotheses.map(({ id }) => id);
  const tables: Tables = {
    checks: knowledge.checks.map((step) => ({
      step,
      likelihoods: step.outcomes.map((_, outcome) =>
        ids.map((id) => step.likelihood.get(id)?.[outcome] ?? 1 / step.outcomes.length),
      ),
    })),
    remedies: knowledge.remedies.map((step) => ({
      step,
      cured: ids.flatMap((id, at) => {
        const probability = step.cures.get(id) ?? 0;
        return probability > 0 ? [{ at, probability }] : [];
      }),
    })),
  };
  made.set(knowledge, tables);
  return tables;
}

/** Probability that the remedy restores audio, given what each hypothesis still weighs. 0…1 */
export function cureMass({ cured }: PlannedRemedy, masses: Float64Array): number {
  let mass = 0;
  for (const { at, probability } of cured) mass += (masses[at] ?? 0) * probability;
  return mass;
}

/** What the hypotheses weigh after the remedy has been tried in vain. */
export function massesAfter({ cured }: PlannedRemedy, masses: Float64Array): Float64Array {
  const left = masses.slice();
  for (const { at, probability } of cured) left[at] = (left[at] ?? 0) * (1 - probability);
  return left;
}

/**
 * Expected time until audio is back, without any further check.
 *
 *     sum over the order of: seconds of the step · probability that it is still needed
 *
 * The order is by cure probability per second, the greatest first, worked out again after each
 * failure; it ends with the fallback, which always helps, as soon as no remedy is worth its time
 * against it. The order is optimal when each cause has one remedy that always cures it (Kadane &
 * Simon 1977); with shared and unsure cures it is the usual heuristic.
 *
 * @param masses     What each hypothesis weighs. Need not sum to 1: the time is scaled alike.
 * @param remedies   What may be tried, those that disturb least first: that decides between equals.
 * @source  Kalagnanam & Henrion, UAI 1990; Heckerman, Breese & Rommelse, Comm. ACM 38(3) 1995;
 *          Jensen et al., AI EDAM 15 (2001). Method; read second-hand.
 */
export function expectedSeconds(
  masses: Float64Array,
  remedies: readonly PlannedRemedy[],
  fallbackSeconds: number,
): number {
  // A remedy's rate only ever falls, so the last one worked out bounds it from above and most need
  // not be worked out again (lazy greedy: M. Minoux, Lecture Notes in Control and Information
  // Sciences 7, 1978; from memory, to be verified).
  const bounds = new Float64Array(remedies.length).fill(Number.POSITIVE_INFINITY);
  let left = masses;
  let mass = masses.reduce((sum, one) => sum + one, 0);
  let seconds = 0;
  for (let tried = 0; tried < remedies.length; tried++) {
    let best = -1;
    let bestRate = mass / fallbackSeconds;
    remedies.forEach((remedy, at) => {
      if (!((bounds[at] ?? 0) > bestRate)) return;
      const rate = cureMass(remedy, left) / remedy.step.seconds;
      bounds[at] = rate;
      if (rate > bestRate) {
        best = at;
        bestRate = rate;
      }
    });
    const remedy = remedies[best];
    if (remedy === undefined) break;
    bounds[best] = Number.NEGATIVE_INFINITY;
    seconds += remedy.step.seconds * mass;
    mass -= bestRate * remedy.step.seconds;
    left = massesAfter(remedy, left);
  }
  return seconds + mass * fallbackSeconds;
}
