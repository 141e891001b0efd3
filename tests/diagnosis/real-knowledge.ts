import fc from "fast-check";
import { fromElicited } from "../../src/diagnosis/elicit.ts";
import { CANT_TELL, type Evidence } from "../../src/diagnosis/knowledge.ts";
import { EXPERTISE } from "../../src/facts/expertise.ts";

export const REAL = fromElicited(EXPERTISE.elicited);

export const SEEDED = { seed: 20261201, numRuns: 200 } as const;

const answer = fc.constantFrom(...REAL.checks).chain((check) =>
  fc.record({
    check: fc.constant(check.id),
    outcome: fc.constantFrom(...check.outcomes, CANT_TELL),
  }),
);

const trial = fc.record({
  remedy: fc.constantFrom(...REAL.remedies.map(({ id }) => id)),
  result: fc.constantFrom(
    "cured" as const,
    "better" as const,
    "no-change" as const,
    "worse" as const,
  ),
});

/** Any evidence that a journal could hold: each step answered or tried once at most. */
export const anyEvidence: fc.Arbitrary<Evidence> = fc.record({
  answers: fc.uniqueArray(answer, { selector: ({ check }) => check, maxLength: 39 }),
  trials: fc.uniqueArray(trial, { selector: ({ remedy }) => remedy, maxLength: 12 }),
  skipped: fc.uniqueArray(
    fc.constantFrom(...REAL.checks, ...REAL.remedies).map(({ id }) => id),
    {
      maxLength: 10,
    },
  ),
});
