import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { CANT_TELL, type Evidence, type Knowledge } from "../../src/diagnosis/knowledge.ts";
import { suspects } from "../../src/diagnosis/suspects.ts";
import { anyEvidence, REAL, SEEDED } from "./real-knowledge.ts";
import { answers, cause, check, knowledge, NOTHING, remedy } from "./small-knowledge.ts";

const probability = (known: Knowledge, evidence: Evidence, id: string): number =>
  suspects(known, evidence).find((one) => one.cause === id)?.probability ?? Number.NaN;

/** Probabilities by cause, rounded far below anything that matters. */
const table = (known: Knowledge, evidence: Evidence) =>
  Object.fromEntries(
    suspects(known, evidence).map((one) => [one.cause, one.probability.toFixed(10)]),
  );

describe("suspects, held against published examples", () => {
  // J. A. Rice, Mathematical Statistics and Data Analysis, 3rd ed.: prior 1 %, detected 80 %,
  // false alarm 10 %; printed answer 7.5 %. Read second-hand in a question that quotes it.
  it("gives 7.5 % for the screening example", () => {
    const known = knowledge({
      hypotheses: [cause("ill", 1), cause("well", 99)],
      checks: [check("screen", ["positive", "negative"], { ill: [0.8, 0.2], well: [0.1, 0.9] })],
    });
    // Tolerance: printed to a tenth of a per cent.
    expect(
      Math.abs(probability(known, answers(["screen", "positive"]), "ill") - 0.075),
    ).toBeLessThan(0.0005);
  });

  // The bolt factory of school textbooks: shares 25, 35, 40 %; faulty 5, 4, 2 %; printed answer
  // 28/69 for the second machine. Read at vidyadip.com (question 68739) and askfilo.com.
  it("gives 28/69 for the bolt of three machines", () => {
    const known = knowledge({
      hypotheses: [cause("a", 25), cause("b", 35), cause("c", 40)],
      checks: [
        check("bolt", ["faulty", "good"], { a: [0.05, 0.95], b: [0.04, 0.96], c: [0.02, 0.98] }),
      ],
    });
    expect(probability(known, answers(["bolt", "faulty"]), "b")).toBeCloseTo(28 / 69, 12);
  });

  // General Report on Tunny (1945), page 39: twenty heads, prior odds of one in ten thousand for a
  // double-headed penny, printed posterior odds 100:1. Read at ellsbury.com/tunny/tunny-039.htm.
  it("comes to odds of 100 to 1 after twenty heads", () => {
    const tosses = Array.from({ length: 20 }, (_, at) =>
      check(`toss-${at}`, ["heads", "tails"], { double: [1, 0], fair: [0.5, 0.5] }),
    );
    const known = knowledge({
      hypotheses: [cause("double", 1), cause("fair", 10_000)],
      checks: tosses,
    });
    const share = probability(
      known,
      answers(...tosses.map(({ id }) => [id, "heads"] as const)),
      "double",
    );
    // Tolerance: the report takes 3 for 3.01 decibans twenty times over, 0.2 in all.
    expect(Math.abs(10 * Math.log10(share / (1 - share)) - 20)).toBeLessThan(0.25);
  });
});

describe("suspects", () => {
  it("starts from the rates alone", () => {
    const known = knowledge({ hypotheses: [cause("rare", 1), cause("common", 3)] });
    expect(suspects(known, NOTHING)).toEqual([
      { cause: "common", probability: expect.closeTo(0.75, 12) },
      { cause: "rare", probability: expect.closeTo(0.25, 12) },
    ]);
  });

  it("sums to 1 and never reaches 0 or 1, whatever was answered and tried", () => {
    fc.assert(
      fc.property(anyEvidence, (evidence) => {
        const list = suspects(REAL, evidence).map((one) => one.probability);
        expect(list).toHaveLength(REAL.hypotheses.length);
        expect(list.reduce((sum, share) => sum + share, 0)).toBeCloseTo(1, 9);
        for (const share of list) expect(share > 0 && share < 1).toBe(true);
      }),
      SEEDED,
    );
  });

  it("does not mind the order of the answers and trials", () => {
    fc.assert(
      fc.property(anyEvidence, (evidence) => {
        const turned: Evidence = {
          answers: evidence.answers.toReversed(),
          trials: evidence.trials.toReversed(),
          skipped: evidence.skipped.toReversed(),
        };
        expect(table(REAL, turned)).toEqual(table(REAL, evidence));
      }),
      SEEDED,
    );
  });

  it("forgets a withdrawn answer entirely, and moves when one is added", () => {
    const before = answers(["which-links", "one"], ["meters-did", "both-fell"]);
    const added = answers(["which-links", "one"], ["twist", "falls"], ["meters-did", "both-fell"]);
    const withdrawn = { ...added, answers: added.answers.filter((one) => one.check !== "twist") };
    expect(table(REAL, added)).not.toEqual(table(REAL, before));
    expect(table(REAL, withdrawn)).toEqual(table(REAL, before));
  });

  it("is not moved by can't tell, by a skip, or by ids of another version", () => {
    fc.assert(
      fc.property(anyEvidence, fc.constantFrom(...REAL.checks), (evidence, one) => {
        const without = evidence.answers.filter((answer) => answer.check !== one.id);
        const more: Evidence = {
          answers: [
            ...without,
            { check: one.id, outcome: CANT_TELL },
            { check: "retired-check", outcome: "yes" },
          ],
          trials: [...evidence.trials, { remedy: "retired-remedy", result: "cured" }],
          skipped: [],
        };
        expect(table(REAL, more)).toEqual(table(REAL, { ...evidence, answers: without }));
      }),
      SEEDED,
    );
  });

  it("counts the same check once, by its last answer", () => {
    const twice = answers(["twist", "same"], ["twist", "falls"], ["twist", "falls"]);
    expect(table(REAL, twice)).toEqual(table(REAL, answers(["twist", "falls"])));
  });

  it("survives two thousand answers that all speak one way", () => {
    const checks = Array.from({ length: 2000 }, (_, at) =>
      check(`c-${at}`, ["yes", "no"], { a: [0.02, 0.98], b: [0.01, 0.99] }),
    );
    const known = knowledge({ hypotheses: [cause("a", 1), cause("b", 1)], checks });
    const list = suspects(known, answers(...checks.map(({ id }) => [id, "yes"] as const)));
    expect(list[0]).toEqual({ cause: "a", probability: 1 });
    expect(list.every((one) => Number.isFinite(one.probability))).toBe(true);
  });

  it("refuses evidence that no hypothesis allows", () => {
    const known = knowledge({
      hypotheses: [cause("a", 1)],
      checks: [check("c", ["yes", "no"], { a: [1, 0] })],
    });
    expect(() => suspects(known, answers(["c", "no"]))).toThrow(RangeError);
  });
});

describe("a remedy that was tried", () => {
  const known = knowledge({
    hypotheses: [cause("a", 1), cause("b", 1)],
    floor: 0.02,
    remedies: [
      remedy("mend-a", 60, { a: 0.8, b: 0.2 }),
      remedy("only-a", 60, { a: 0.8 }),
      remedy("swap", 15, { a: 0.9, b: 0.3 }, { isWorkaround: true }),
    ],
  });
  const tried = (id: string, result: "cured" | "better" | "no-change" | "worse") =>
    probability(known, { ...NOTHING, trials: [{ remedy: id, result }] }, "a");

  // By hand from Bayes' rule with even priors: 0.8 / (0.8 + 0.2), 0.2 / (0.2 + 0.8).
  it("speaks for what it cures by its success, against it by its failure", () => {
    expect(tried("mend-a", "cured")).toBeCloseTo(0.8, 12);
    expect(tried("mend-a", "no-change")).toBeCloseTo(0.2, 12);
    expect(tried("mend-a", "worse")).toBeCloseTo(0.2, 12);
  });

  // By hand: half the decibans of 4 to 1 is 2 to 1.
  it("counts half, in decibans, when it only got better", () => {
    expect(tried("mend-a", "better")).toBeCloseTo(2 / 3, 12);
  });

  // By hand: 0.8 against 0.02, forty to one.
  it("leaves room for a fault that stopped by itself", () => {
    expect(tried("only-a", "cured")).toBeCloseTo(40 / 41, 12);
  });

  it("says next to nothing when a work-around helped, and much when it did not", () => {
    // Three to one counts a tenth of its 4.8 decibans: less than the smallest step that people can
    // feel, one deciban (Good, by the encyclopaedia articles on the ban).
    const share = tried("swap", "cured");
    expect(share).toBeGreaterThan(0.5);
    expect(10 * Math.log10(share / (1 - share))).toBeLessThan(1);
    // By hand: 0.1 / (0.1 + 0.7).
    expect(tried("swap", "no-change")).toBeCloseTo(0.125, 12);
  });
});
