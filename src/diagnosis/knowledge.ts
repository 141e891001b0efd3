/**
 * What the fault finder knows, in numbers. Made from the elicited form in shared/knowledge by
 * `fromElicited`; everything in this folder takes it as an argument.
 */

/** Moments of a show, in rising freedom to act. */
export const MOMENTS = ["live", "between", "off-air"] as const;
export type Moment = (typeof MOMENTS)[number];

/** Whom a step interrupts while it is done. */
export type Disruption = "none" | "one-link" | "all-links";

/** Possible verdict beside the causes: whatever is not on the list. */
export const NONE_OF_THESE = "none-of-these";
/** The answer that every check takes, and that changes nothing. */
export const CANT_TELL = "cant-tell";

export interface Cause {
  readonly id: string;
  readonly family: string;
  /** How often it is met in practice, relative to the others. [1/h], > 0 */
  readonly ratePerHour: number;
}

interface Step {
  readonly id: string;
  /** Time it takes. [s], > 0 */
  readonly seconds: number;
  /** First moment at which it may be done. */
  readonly earliest: Moment;
  readonly disruption: Disruption;
  /** Ids of cautions that stand beside it. */
  readonly cautions: readonly string[];
}

export interface Check extends Step {
  /** Checks of one topic say nearly the same thing. */
  readonly topic: string;
  readonly outcomes: readonly string[];
  /** Probability of each outcome, in the order of `outcomes`, under each hypothesis; sums to 1. */
  readonly likelihood: ReadonlyMap<string, readonly number[]>;
}

export interface Remedy extends Step {
  /** True where it restores audio without curing anything (a spare, a cable). */
  readonly isWorkaround: boolean;
  /** Probability that it restores audio; a hypothesis not in the map is not cured. 0…1 */
  readonly cures: ReadonlyMap<string, number>;
  /** The check that shows whether it helped. */
  readonly provedBy: string;
}

export interface Knowledge {
  /** The causes and, last, `none-of-these`. */
  readonly hypotheses: readonly Cause[];
  readonly checks: readonly Check[];
  readonly remedies: readonly Remedy[];
  /** How often a report is wrong, so that nothing tried counts as proof. 0…0.5 */
  readonly floor: number;
  /** Time until audio is back when nothing on the list has helped. [s], > 0 */
  readonly fallbackSeconds: number;
}

export interface Evidence {
  readonly answers: readonly { readonly check: string; readonly outcome: string }[];
  readonly trials: readonly {
    readonly remedy: string;
    readonly result: "cured" | "better" | "no-change" | "worse";
  }[];
  /** Steps the user does not want to be offered again for this fault. */
  readonly skipped: readonly string[];
}
