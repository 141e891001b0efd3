import { type Candidate, rankedSteps } from "./candidates.ts";
import { type Evidence, type Knowledge, MOMENTS, type Moment } from "./knowledge.ts";
import { type Reason, reasonFor } from "./reason.ts";
import { posterior } from "./suspects.ts";

export interface StepName {
  readonly kind: "check" | "remedy";
  readonly id: string;
}

export type Advice =
  | {
      readonly kind: "step";
      readonly step: StepName;
      /** Expected time until audio is back, this step first. [s] */
      readonly expectedSeconds: number;
      readonly reason: Reason;
      /** What else may be done now, the best first. */
      readonly others: readonly StepName[];
    }
  | {
      readonly kind: "wait";
      readonly until: Moment;
      /** The steps worth waiting for, the best first. */
      readonly others: readonly StepName[];
    }
  | { readonly kind: "exhausted" };

/** Whether a step may be done in this moment of the show. */
export const stepAllowed = (step: { readonly earliest: Moment }, moment: Moment): boolean =>
  MOMENTS.indexOf(step.earliest) <= MOMENTS.indexOf(moment);

const nameOf = ({ step }: Candidate): StepName => ({
  kind: "outcomes" in step ? "check" : "remedy",
  id: step.id,
});

/**
 * The step that makes the expected time until audio is back shortest, with one check of look-ahead.
 *
 * A check is worth its time if its seconds, and the expected seconds after each answer weighed by
 * how likely that answer is, come to less than the expected seconds without it; a remedy, if it
 * saves more of the fallback's time than it takes. Remedies that must wait for a later moment stay
 * in the plan, so that in `live` the questions are asked that pay off in the pause.
 *
 * Work-arounds: in `live` they compete with everything else, for the audience is waiting. In the
 * other moments the time is for finding the fault, and they come when nothing else is worth doing.
 * Once one has restored the audio no other is offered.
 *
 * @source  Kalagnanam & Henrion, UAI 1990; Heckerman, Breese & Rommelse, Comm. ACM 38(3) 1995;
 *          Jensen et al., AI EDAM 15 (2001). Method; read second-hand.
 */
export function adviseNext(knowledge: Knowledge, evidence: Evidence, moment: Moment): Advice {
  const masses = Float64Array.from(posterior(knowledge, evidence));
  const ranked = rankedSteps(knowledge, evidence, masses, moment);
  const allowed = ranked.filter(({ step }) => stepAllowed(step, moment));
  const best = allowed.find(({ isWorthIt }) => isWorthIt);
  if (best !== undefined) {
    return {
      kind: "step",
      step: nameOf(best),
      expectedSeconds: best.seconds,
      reason: reasonFor(knowledge, masses, best.step),
      others: allowed.filter((one) => one !== best).map(nameOf),
    };
  }
  const waiting = ranked.filter((one) => one.isWorthIt && !stepAllowed(one.step, moment));
  const until = MOMENTS.find((later) => waiting.some(({ step }) => stepAllowed(step, later)));
  return until === undefined
    ? { kind: "exhausted" }
    : { kind: "wait", until, others: waiting.map(nameOf) };
}
