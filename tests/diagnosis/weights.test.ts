import { describe, expect, it } from "vitest";
import { evidenceWeights, roundedPercent, strengthWord } from "../../src/diagnosis/weights.ts";
import { answers, cause, check, knowledge, NOTHING, remedy } from "./small-knowledge.ts";

const known = knowledge({
  hypotheses: [cause("a", 1), cause("b", 3)],
  checks: [
    check("ten", ["yes", "no"], { a: [0.5, 0.5], b: [0.05, 0.95] }),
    check("two", ["yes", "no"], { a: [0.5, 0.5], b: [0.25, 0.75] }),
    check("half", ["yes", "no"], { a: [0.25, 0.75], b: [0.5, 0.5] }),
    check("even", ["yes", "no"], { a: [0.3, 0.7], b: [0.3, 0.7] }),
  ],
  remedies: [remedy("mend", 60, { a: 0.8, b: 0.08 })],
});
const weightDb = (id: string) =>
  evidenceWeights(known, answers([id, "yes"]), "a").map((one) => one.weightDb);

describe("evidenceWeights", () => {
  // General Report on Tunny (1945), page 39: ten times the common logarithm of the factor; a factor
  // of 2 is printed as 3 decibans. Read at ellsbury.com/tunny/tunny-039.htm.
  it("gives 10 decibans for a factor of ten and 3.01 for a factor of two, whatever the rates", () => {
    expect(weightDb("ten")).toEqual([expect.closeTo(10, 10)]);
    // log10(2) = 0.30103 in every table of logarithms.
    expect(weightDb("two")).toEqual([expect.closeTo(3.0103, 4)]);
    expect(weightDb("half")).toEqual([expect.closeTo(-3.0103, 4)]);
    expect(weightDb("even")).toEqual([expect.closeTo(0, 10)]);
  });

  it("weighs a remedy that cured like any other finding", () => {
    const trials = [{ remedy: "mend", result: "cured" as const }];
    const [weight] = evidenceWeights(known, { ...NOTHING, trials }, "a");
    expect(weight).toEqual({
      kind: "remedy",
      id: "mend",
      outcome: "cured",
      weightDb: expect.closeTo(10, 10),
    });
  });

  it("puts the heaviest first, for or against, and leaves can't tell out", () => {
    const evidence = answers(
      ["even", "yes"],
      ["two", "cant-tell"],
      ["half", "yes"],
      ["ten", "yes"],
    );
    expect(evidenceWeights(known, evidence, "a").map(({ id }) => id)).toEqual([
      "ten",
      "half",
      "even",
    ]);
  });

  it("takes all other hypotheses together, by their rates", () => {
    const three = knowledge({
      hypotheses: [cause("a", 5), cause("b", 1), cause("c", 3)],
      checks: [check("look", ["yes", "no"], { a: [0.8, 0.2], b: [0.2, 0.8], c: [0.04, 0.96] })],
    });
    // By hand: (1·0.2 + 3·0.04) / 4 = 0.08, and 0.8 is ten times that.
    expect(evidenceWeights(three, answers(["look", "yes"]), "a")[0]?.weightDb).toBeCloseTo(10, 10);
  });

  it("refuses a cause that is not a hypothesis", () => {
    expect(() => evidenceWeights(known, NOTHING, "gremlins")).toThrow(/gremlins/);
  });
});

describe("words and figures for a probability", () => {
  it("calls leading what outweighs all others, unlikely what is below one in ten", () => {
    expect([1, 0.5, 0.49, 0.1, 0.09, 0].map(strengthWord)).toEqual([
      "leading",
      "leading",
      "possible",
      "possible",
      "unlikely",
      "unlikely",
    ]);
  });

  it("rounds to the nearest five and says neither 0 nor 100", () => {
    const shares = [0, 0.049, 0.05, 0.074, 0.076, 0.5, 0.93, 0.95, 0.96, 1];
    expect(shares.map(roundedPercent)).toEqual([
      "<5",
      "<5",
      "5",
      "5",
      "10",
      "50",
      "95",
      "95",
      ">95",
      ">95",
    ]);
  });
});
