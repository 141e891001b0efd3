/** What a scan may hold at most. Larger ones are refused, not cut. */
export const SCAN_LIMITS = {
  bytes: 32_000_000,
  points: 200_000,
  columns: 64,
  lineLength: 4000,
} as const;

export type FrequencyUnit = "hz" | "khz" | "mhz" | "ghz";
export type LevelUnit = "dbm" | "dbuv";

/** A unit that the text names, or one that its numbers suggest, which the user should confirm. */
export interface UnitGuess<Unit> {
  readonly unit: Unit;
  readonly isNamed: boolean;
}

/** Rising frequencies, each once, and the level at each, in the unit that goes with them. */
export interface ScanPoints {
  readonly frequencyMhz: Float64Array;
  readonly level: Float64Array;
}

/** How many lines gave no point of their own, by reason. */
export interface SkippedLines {
  blank: number;
  comment: number;
  /** Before the first line with two numbers: names of columns, settings. */
  preamble: number;
  /** After it: a number is missing, or is none. */
  unreadable: number;
  /** No frequency above 0, or a level beyond ±300. */
  outOfRange: number;
  /** A frequency that was there already; the higher level stays. */
  duplicate: number;
}

export type ScanProblemCode =
  | "too-large"
  | "empty"
  | "not-text"
  | "line-too-long"
  | "too-many-columns"
  | "no-numbers"
  | "one-column"
  /** More than two columns of numbers, and no names that tell frequency and level. */
  | "which-columns"
  /** Commas between the columns and inside the numbers cannot be told apart. */
  | "ambiguous-commas"
  | "too-many-points"
  | "too-few-points";

export interface ScanProblem {
  readonly kind: "problem";
  readonly code: ScanProblemCode;
  /** Where it was met, from 1; null where it is the text as a whole. */
  readonly line: number | null;
}

export type ScanReading =
  | {
      readonly kind: "ok";
      readonly points: ScanPoints;
      readonly frequencyUnit: UnitGuess<FrequencyUnit>;
      readonly levelUnit: UnitGuess<LevelUnit>;
      readonly skipped: Readonly<SkippedLines>;
    }
  | ScanProblem;
