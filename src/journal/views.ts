import type {
  Ending,
  JournalRecord,
  LinkKind,
  Moment,
  StagePlace,
  TrialResult,
} from "./records.ts";

/** What the folds make of the records: plain, read-only, made anew from the records each time. */

export interface LinkView {
  readonly id: string;
  readonly name: string;
  readonly kind: LinkKind;
  readonly frequencyMhz: number | null;
}

export interface MarkView {
  readonly id: string;
  readonly at: number;
  readonly links: readonly string[];
  readonly place: StagePlace | null;
}

export interface AnswerView {
  readonly record: string;
  readonly at: number;
  readonly check: string;
  readonly outcome: string;
}

export interface TrialView {
  readonly record: string;
  readonly at: number;
  readonly remedy: string;
  readonly result: TrialResult;
}

export interface VerdictView {
  readonly record: string;
  readonly at: number;
  readonly causes: readonly string[];
  readonly ending: Ending;
  readonly remedy: string | null;
  readonly note: string;
}

export interface FaultView {
  readonly id: string;
  readonly openedAt: number;
  /** Moment of the show when it was opened. */
  readonly moment: Moment;
  readonly marks: readonly MarkView[];
  /** One for each check: the latest answer that stands. */
  readonly answers: readonly AnswerView[];
  readonly trials: readonly TrialView[];
  readonly skipped: readonly string[];
  /** Null while the fault is open. */
  readonly verdict: VerdictView | null;
}

export interface TimelineEntry {
  readonly record: JournalRecord;
  /** By itself, or with the fault or mark that it belongs to. */
  readonly isWithdrawn: boolean;
  /** Ids of the withdrawals of this very record that stand: withdrawing them restores it. */
  readonly withdrawals: readonly string[];
}

export interface ShowView {
  readonly id: string;
  readonly name: string;
  readonly place: string;
  readonly timeZone: string;
  readonly openedAt: number;
  /** Null while the show is open. */
  readonly closedAt: number | null;
  readonly moment: Moment;
  readonly links: readonly LinkView[];
  /** Oldest first. */
  readonly faults: readonly FaultView[];
  /** Every record of the show in journal order, withdrawn ones too; withdrawals themselves left out. */
  readonly timeline: readonly TimelineEntry[];
}
