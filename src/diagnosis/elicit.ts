import { type Disruption, type Knowledge, MOMENTS, type Moment } from "./knowledge.ts";

/** Words for the outcomes of a check, the same under each of the causes named. */
interface OutcomeRow {
  readonly causes: readonly string[];
  readonly words: readonly string[];
}

/** The word for how surely a remedy restores audio under each of the causes named. */
interface CureRow {
  readonly causes: readonly string[];
  readonly word: string;
}

interface ElicitedStep {
  readonly id: string;
  /** [s], > 0 */
  readonly seconds: number;
  readonly earliest: string;
  readonly disruption: string;
  readonly cautions: readonly string[];
}

/** What was asked of practitioners, in words: the form that shared/knowledge keeps. */
export interface Elicited {
  readonly scale: {
    /** Each word's number. [%] */
    readonly words: Readonly<Record<string, number>>;
    /** How often a report is wrong. [%], > 0 */
    readonly floorPercent: number;
  };
  /** The causes and, last, `none-of-these`. */
  readonly causes: readonly {
    readonly id: string;
    readonly family: string;
    readonly ratePerHour: number;
  }[];
  readonly checks: readonly (ElicitedStep & {
    readonly topic: string;
    readonly outcomes: readonly string[];
    /** For every hypothesis without a row of its own. */
    readonly otherwise: readonly string[];
    readonly rows: readonly OutcomeRow[];
  })[];
  /** A hypothesis that no row names is not cured. */
  readonly remedies: readonly (ElicitedStep & {
    readonly isWorkaround: boolean;
    readonly provedBy: string;
    readonly cures: readonly CureRow[];
  })[];
  /** [s], > 0 */
  readonly fallbackSeconds: number;
}

const DISRUPTIONS: readonly Disruption[] = ["none", "one-link", "all-links"];

function oneOf<T extends string>(allowed: readonly T[], value: string): T {
  const found = allowed.find((one) => one === value);
  if (found === undefined) throw new RangeError(`fromElicited: unknown word, got ${value}`);
  return found;
}

/**
 * The numbers behind the words.
 *
 * The words of a row are weights: each is raised to the floor if it lies below, then the row is
 * brought to the sum 1. So no likelihood is zero, and no single answer rules a cause out.
 *
 * `none-of-these` takes the `otherwise` row of every check: a cause that is not on the list is
 * expected to do what a check has nothing special to say about. (A flat row would count each
 * unremarkable answer against it.) No remedy cures it unless a row names it.
 *
 * @throws RangeError  If a word, moment or disruption is not one of the known ones.
 * @source  Scale and method: Renooij & Witteman, Int. J. Approximate Reasoning 22 (1999) 169-194.
 */
export function fromElicited(raw: Elicited): Knowledge {
  const floor = raw.scale.floorPercent / 100;
  const share = (word: string): number => {
    const percent = raw.scale.words[word];
    if (percent === undefined) throw new RangeError(`fromElicited: unknown word, got ${word}`);
    return percent / 100;
  };
  const distribution = (words: readonly string[]): readonly number[] => {
    const weights = words.map((word) => Math.max(share(word), floor));
    const sum = weights.reduce((total, weight) => total + weight, 0);
    return weights.map((weight) => weight / sum);
  };
  const step = ({ id, seconds, earliest, disruption, cautions }: ElicitedStep) => ({
    id,
    seconds,
    earliest: oneOf<Moment>(MOMENTS, earliest),
    disruption: oneOf(DISRUPTIONS, disruption),
    cautions,
  });
  return {
    hypotheses: raw.causes,
    floor,
    checks: raw.checks.map((check) => {
      const otherwise = distribution(check.otherwise);
      const likelihood = new Map(raw.causes.map(({ id }) => [id, otherwise]));
      for (const row of check.rows) {
        const numbers = distribution(row.words);
        for (const cause of row.causes) likelihood.set(cause, numbers);
      }
      return { ...step(check), topic: check.topic, outcomes: check.outcomes, likelihood };
    }),
    remedies: raw.remedies.map((remedy) => {
      const cures = new Map<string, number>();
      for (const row of remedy.cures) {
        for (const cause of row.causes) cures.set(cause, Math.min(share(row.word), 1 - floor));
      }
      const { isWorkaround, provedBy } = remedy;
      return { ...step(remedy), isWorkaround, provedBy, cures };
    }),
    fallbackSeconds: raw.fallbackSeconds,
  };
}
