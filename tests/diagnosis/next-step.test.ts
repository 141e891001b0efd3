import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Knowledge, MOMENTS, type Remedy } from "../../src/diagnosis/knowledge.ts";
import { type Advice, adviseNext, stepAllowed } from "../../src/diagnosis/next-step.ts";
import { anyEvidence, REAL, SEEDED } from "./real-knowledge.ts";
import { answers, cause, check, knowledge, NOTHING, remedy } from "./small-knowledge.ts";

const step = (advice: Advice) => (advice.kind === "step" ? advice.step.id : advice.kind);

/** Two even causes, a sure remedy of 100 s for each, and a check that tells them apart. */
const twoCauses = (checkSeconds: number, rest: Partial<Remedy> = {}) =>
  knowledge({
    hypotheses: [cause("a", 1), cause("b", 1)],
    checks: [check("tell", ["a", "b"], { a: [1, 0], b: [0, 1] }, { seconds: checkSeconds })],
    remedies: [remedy("mend-a", 100, { a: 1 }, rest), remedy("mend-b", 100, { b: 1 }, rest)],
    fallbackSeconds: 1800,
  });

describe("stepAllowed", () => {
  it("allows a step from its moment on", () => {
    const table = MOMENTS.map((earliest) => MOMENTS.map((now) => stepAllowed({ earliest }, now)));
    expect(table).toEqual([
      [true, true, true],
      [false, true, true],
      [false, false, true],
    ]);
  });
});

describe("a check or a remedy", () => {
  // By hand: without the check 100 + 0.5·100 = 150 s; with it, its own seconds + 100.
  it("asks first when the answer saves more than it costs", () => {
    const advice = adviseNext(twoCauses(10), NOTHING, "live");
    expect(advice).toEqual({
      kind: "step",
      step: { kind: "check", id: "tell" },
      expectedSeconds: expect.closeTo(110, 9),
      reason: { kind: "separates", causes: ["a", "b"] },
      others: [
        { kind: "remedy", id: "mend-a" },
        { kind: "remedy", id: "mend-b" },
      ],
    });
  });

  it("acts first when asking would cost more than it saves", () => {
    const advice = adviseNext(twoCauses(60), NOTHING, "live");
    expect(advice).toMatchObject({
      step: { kind: "remedy", id: "mend-a" },
      expectedSeconds: expect.closeTo(150, 9),
      reason: { kind: "likely-cure", cause: "a" },
    });
  });

  it("acts on the answer", () => {
    expect(step(adviseNext(twoCauses(10), answers(["tell", "b"]), "live"))).toBe("mend-b");
  });

  it("does not ask again what could not be told, nor offer what was skipped", () => {
    const untold = adviseNext(twoCauses(10), answers(["tell", "cant-tell"]), "live");
    expect(step(untold)).toBe("mend-a");
    expect(untold).toMatchObject({ others: [{ kind: "remedy", id: "mend-b" }] });
    const skipped = { ...NOTHING, skipped: ["tell", "mend-a"] };
    expect(adviseNext(twoCauses(10), skipped, "live")).toMatchObject({
      step: { id: "mend-b" },
      others: [],
    });
  });

  it("between equals takes what disturbs least", () => {
    const known = knowledge({
      hypotheses: [cause("a", 1), cause("b", 1), cause("c", 1)],
      remedies: [
        remedy("all", 50, { a: 1 }, { disruption: "all-links" }),
        remedy("one", 50, { b: 1 }, { disruption: "one-link" }),
        remedy("none", 50, { c: 1 }),
      ],
      fallbackSeconds: 1800,
    });
    const advice = adviseNext(known, NOTHING, "live");
    expect(step(advice)).toBe("none");
    expect(advice).toMatchObject({ others: [{ id: "one" }, { id: "all" }] });
  });

  it("between checks that tell the same takes the one that disturbs least", () => {
    const one = twoCauses(10);
    const checks = ["loud", "quiet"].flatMap((id) =>
      one.checks.map(
        (same) => ({ ...same, id, disruption: id === "loud" ? "one-link" : "none" }) as const,
      ),
    );
    expect(step(adviseNext({ ...one, checks }, NOTHING, "live"))).toBe("quiet");
  });

  it("names the two probable causes that the check tells apart, never none-of-these", () => {
    const known = knowledge({
      hypotheses: [cause("a", 3), cause("twin", 3), cause("b", 2), cause("none-of-these", 4)],
      checks: [
        check(
          "tell",
          ["x", "y"],
          {
            a: [0.9, 0.1],
            twin: [0.9, 0.1],
            b: [0.1, 0.9],
            "none-of-these": [0.1, 0.9],
          },
          { seconds: 3 },
        ),
      ],
      remedies: [remedy("mend-a", 100, { a: 1, twin: 1 }), remedy("mend-b", 100, { b: 1 })],
      fallbackSeconds: 1800,
    });
    expect(adviseNext(known, NOTHING, "live")).toMatchObject({
      reason: { kind: "separates", causes: ["a", "b"] },
    });
  });
});

describe("the moment of the show", () => {
  const known: Knowledge = knowledge({
    hypotheses: [cause("a", 6), cause("b", 3), cause("c", 1)],
    checks: [
      check("tell", ["a", "b"], { a: [1, 0], b: [0, 1], c: [0, 1] }, { earliest: "between" }),
    ],
    remedies: [
      remedy("mend-a", 100, { a: 0.9 }, { earliest: "off-air" }),
      remedy("mend-b", 100, { b: 0.9 }, { earliest: "off-air" }),
      remedy("swap", 20, { a: 0.9, b: 0.9, c: 0.9 }, { isWorkaround: true }),
    ],
    floor: 0.02,
    fallbackSeconds: 1800,
  });
  const swapped = (result: "cured" | "no-change") => ({
    ...NOTHING,
    trials: [{ remedy: "swap", result }],
  });

  it("saves the show first while it is live", () => {
    expect(adviseNext(known, NOTHING, "live")).toMatchObject({
      step: { kind: "remedy", id: "swap" },
      reason: { kind: "saves-the-show" },
    });
  });

  it("waits once the show is saved, and names what waits and until when", () => {
    expect(adviseNext(known, swapped("cured"), "live")).toEqual({
      kind: "wait",
      until: "between",
      others: [
        { kind: "check", id: "tell" },
        { kind: "remedy", id: "mend-a" },
        { kind: "remedy", id: "mend-b" },
      ],
    });
  });

  it("looks for the fault in the pause, and takes the work-around before going on", () => {
    expect(step(adviseNext(known, NOTHING, "between"))).toBe("tell");
    expect(step(adviseNext(known, answers(["tell", "a"]), "between"))).toBe("swap");
    const done = { ...answers(["tell", "a"]), trials: swapped("cured").trials };
    expect(adviseNext(known, done, "between")).toMatchObject({ kind: "wait", until: "off-air" });
    expect(step(adviseNext(known, done, "off-air"))).toBe("mend-a");
  });

  it("does not do in a pause what would most likely be wasted, while the better cure waits", () => {
    const remedies = [
      remedy("late-a", 100, { a: 0.9 }, { earliest: "off-air" }),
      remedy("now-c", 60, { c: 0.9 }),
    ];
    const hypotheses = [cause("a", 9), cause("c", 1)];
    const unlikely = knowledge({ ...known, checks: [], remedies, hypotheses });
    // By hand: one chance in ten saves 162 s of the fallback, but four fifths of the 60 s are wasted.
    expect(step(adviseNext(unlikely, NOTHING, "live"))).toBe("wait");
    const likely = { ...unlikely, hypotheses: [cause("a", 6), cause("c", 4)] };
    expect(step(adviseNext(likely, NOTHING, "live"))).toBe("now-c");
  });

  it("offers no second work-around when the first has brought the audio back", () => {
    const two = knowledge({
      ...known,
      remedies: [
        ...known.remedies,
        remedy("cable", 30, { a: 0.9, b: 0.9 }, { isWorkaround: true }),
      ],
    });
    expect(step(adviseNext(two, swapped("no-change"), "live"))).toBe("cable");
    expect(step(adviseNext(two, swapped("cured"), "live"))).toBe("wait");
  });

  it("says so when there is nothing left", () => {
    const all = {
      ...answers(["tell", "a"]),
      trials: [...swapped("no-change").trials],
      skipped: ["mend-a", "mend-b"],
    };
    expect(adviseNext(known, all, "off-air")).toEqual({ kind: "exhausted" });
  });

  it("never advises or lists what is barred, done or skipped, whatever the evidence", () => {
    const steps = new Map([...REAL.checks, ...REAL.remedies].map((one) => [one.id, one]));
    fc.assert(
      fc.property(anyEvidence, fc.constantFrom(...MOMENTS), (evidence, moment) => {
        const advice = adviseNext(REAL, evidence, moment);
        if (advice.kind === "exhausted") return;
        const named = [...(advice.kind === "step" ? [advice.step] : []), ...advice.others];
        const gone = [
          ...evidence.answers.map((one) => one.check),
          ...evidence.trials.map((one) => one.remedy),
          ...evidence.skipped,
        ];
        expect(new Set(named.map(({ id }) => id)).size).toBe(named.length);
        for (const { id } of named) {
          expect(gone).not.toContain(id);
          const earliest = steps.get(id)?.earliest ?? "live";
          expect(stepAllowed({ earliest }, moment)).toBe(advice.kind === "step");
        }
      }),
      SEEDED,
    );
  });

  it("does not mind the order of the answers", () => {
    fc.assert(
      fc.property(anyEvidence, fc.constantFrom(...MOMENTS), (evidence, moment) => {
        const turned = {
          answers: evidence.answers.toReversed(),
          trials: evidence.trials.toReversed(),
          skipped: evidence.skipped.toReversed(),
        };
        expect(adviseNext(REAL, turned, moment)).toEqual(adviseNext(REAL, evidence, moment));
      }),
      SEEDED,
    );
  });
});
