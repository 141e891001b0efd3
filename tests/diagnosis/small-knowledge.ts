import type { Cause, Check, Evidence, Knowledge, Remedy } from "../../src/diagnosis/knowledge.ts";

export const NOTHING: Evidence = { answers: [], trials: [], skipped: [] };

export const cause = (id: string, ratePerHour: number): Cause => ({
  id,
  family: "any",
  ratePerHour,
});

export function check(
  id: string,
  outcomes: readonly string[],
  likelihood: Readonly<Record<string, readonly number[]>>,
  rest: Partial<Check> = {},
): Check {
  return {
    id,
    outcomes,
    likelihood: new Map(Object.entries(likelihood)),
    seconds: 10,
    earliest: "live",
    disruption: "none",
    cautions: [],
    topic: id,
    ...rest,
  };
}

export function remedy(
  id: string,
  seconds: number,
  cures: Readonly<Record<string, number>>,
  rest: Partial<Remedy> = {},
): Remedy {
  return {
    id,
    seconds,
    cures: new Map(Object.entries(cures)),
    earliest: "live",
    disruption: "none",
    cautions: [],
    isWorkaround: false,
    provedBy: "",
    ...rest,
  };
}

export const knowledge = (parts: Partial<Knowledge>): Knowledge => ({
  hypotheses: [],
  checks: [],
  remedies: [],
  floor: 0,
  fallbackSeconds: 1e6,
  ...parts,
});

export const answers = (...pairs: readonly (readonly [string, string])[]): Evidence => ({
  ...NOTHING,
  answers: pairs.map(([id, outcome]) => ({ check: id, outcome })),
});
