/** What the fault finder says, by id: shared/wording, one file for each language. */
export interface Wording {
  readonly families: Readonly<Record<string, string>>;
  readonly causes: Readonly<Record<string, CauseWording>>;
  readonly checks: Readonly<Record<string, CheckWording>>;
  readonly remedies: Readonly<Record<string, RemedyWording>>;
  readonly cautions: Readonly<Record<string, CautionWording>>;
}

interface CauseWording {
  readonly name: string;
  /** What is wrong, in one line for somebody who knows no radio. */
  readonly plain: string;
}

interface CheckWording {
  /** Under twelve words. */
  readonly question: string;
  /** How to find out, in one or two sentences. */
  readonly how: string;
  /** Button label of each outcome. */
  readonly outcomes: Readonly<Record<string, string>>;
}

interface RemedyWording {
  /** What to do, as an order. */
  readonly title: string;
  /** How, in one or two sentences. */
  readonly how: string;
}

/** Stands beside the steps that name it, and on the page of all cautions. */
export interface CautionWording {
  readonly title: string;
  readonly text: string;
}
