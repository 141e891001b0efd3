import { describe, expect, it } from "vitest";
import causesFile from "../../shared/knowledge/causes.json";
import checksFile from "../../shared/knowledge/checks.json";
import remediesFile from "../../shared/knowledge/remedies.json";
import scaleFile from "../../shared/knowledge/scale.json";
import type { Elicited } from "../../src/diagnosis/elicit.ts";
import { EXPERTISE } from "../../src/facts/expertise.ts";
import type { Wording } from "../../src/facts/wording.ts";
import { knowledgeProblems } from "./knowledge-problems.ts";

const ELICITED = EXPERTISE.elicited;
const WORDING = EXPERTISE.wording;

type Writable<T> = { -readonly [K in keyof T]: Writable<T[K]> };
type Draft = { raw: Writable<Elicited>; wording: Writable<Wording> };

/** A deep copy of the real knowledge and wording with one thing broken. */
function broken(spoil: (draft: Draft) => void): readonly string[] {
  const draft = structuredClone({ raw: ELICITED, wording: WORDING }) as Draft;
  spoil(draft);
  return knowledgeProblems(draft.raw, draft.wording);
}

function found<T extends { id: string }>(list: T[], id: string): T {
  const one = list.find((item) => item.id === id);
  if (one === undefined) throw new RangeError(`found: no ${id}`);
  return one;
}

/** The vocabulary's causes. Common practice, no source. */
const VOCABULARY: Readonly<Record<string, readonly string[]>> = {
  range: ["distance", "body-block", "obstruction"],
  multipath: ["reflections", "diversity-too-close"],
  polarization: ["tilt-mismatch", "inear-single-antenna"],
  interference: [
    "co-channel",
    "strong-neighbour",
    "noise-floor",
    "own-mixing",
    "own-duplicate",
    "busy-shared-band",
  ],
  power: ["too-much-power", "overdriven-line", "low-power", "power-loss"],
  placement: ["bad-antenna-spot"],
  hardware: ["feeder-fault", "transmitter-fault", "receiver-fault"],
  setting: ["receiver-setting", "sync-timing", "off-or-muted"],
  "not-radio": ["audio-chain"],
  unlisted: ["none-of-these"],
};

describe("the knowledge of the app", () => {
  it("has no problem that the validator knows of", () => {
    expect(knowledgeProblems(ELICITED, WORDING)).toEqual([]);
  });

  it("holds every cause of the vocabulary, in its family", () => {
    const pairs = Object.entries(VOCABULARY).flatMap(([family, ids]) =>
      ids.map((id) => `${family}/${id}`),
    );
    expect(ELICITED.causes.map(({ family, id }) => `${family}/${id}`)).toEqual(pairs);
  });

  it("has at least 22 checks out of all four groups, and at least 20 remedies", () => {
    expect(ELICITED.checks.length).toBeGreaterThanOrEqual(22);
    expect(ELICITED.remedies.length).toBeGreaterThanOrEqual(20);
    expect([...new Set(checksFile.checks.map(({ group }) => group))].sort().join("")).toBe("ABCD");
  });

  it("asks the questions of group A in live, in five seconds at most", () => {
    const first = checksFile.checks.filter(({ group }) => group === "A");
    expect(first).toHaveLength(4);
    for (const check of first) {
      expect(check.seconds).toBeLessThanOrEqual(5);
      expect(check.earliest).toBe("live");
    }
  });

  it("sends nobody up a ladder, to the mains or into silence while it is live", () => {
    const live = [...ELICITED.checks, ...ELICITED.remedies].filter(
      ({ earliest }) => earliest === "live",
    );
    expect(live.length).toBeGreaterThan(15);
    const barred = ["height", "mains", "licence", "other-departments"];
    for (const step of live) {
      expect(step.cautions.filter((caution) => barred.includes(caution))).toEqual([]);
      expect(step.disruption).not.toBe("all-links");
    }
    const checks = ELICITED.checks.filter(({ earliest }) => earliest === "live");
    expect(checks.every(({ disruption }) => disruption === "none")).toBe(true);
  });

  it("keeps the caution of hearing on every step that interrupts all links", () => {
    const steps = [...ELICITED.checks, ...ELICITED.remedies].filter(
      ({ disruption }) => disruption === "all-links",
    );
    expect(steps.length).toBeGreaterThan(10);
    for (const { id, cautions } of steps) expect(cautions, id).toContain("hearing");
  });

  it("calls nothing legal or safe", () => {
    const said = JSON.stringify(WORDING);
    expect(said.length).toBeGreaterThan(10_000);
    expect(said).not.toMatch(/\b(legal|legally|safe|safely|harmless|no risk)\b/i);
  });

  it("defers to competent people and local rules where work can hurt", () => {
    for (const id of ["height", "mains", "licence"]) {
      expect(WORDING.cautions[id]?.text).toMatch(/competent|trained|local codes|licence/);
    }
  });

  it("has two work-arounds that may be done in live", () => {
    const ids = ELICITED.remedies.filter(({ isWorkaround }) => isWorkaround);
    expect(ids.map(({ id }) => id)).toEqual(["hand-over-spare", "go-to-cable"]);
    expect(ids.every(({ earliest }) => earliest === "live")).toBe(true);
  });

  it("gives a reason for every cause, row and cure, and a source for every file", () => {
    const rows = [
      ...causesFile.causes,
      ...checksFile.checks.flatMap(({ rows }) => rows),
      ...remediesFile.remedies.flatMap(({ cures }) => cures),
      scaleFile,
      remediesFile,
    ];
    expect(rows.length).toBeGreaterThan(200);
    for (const { because } of rows) expect(because.length).toBeGreaterThan(5);
    for (const { source } of [causesFile, checksFile, remediesFile, scaleFile]) {
      expect(source.length).toBeGreaterThan(10);
    }
  });

  // Renooij & Witteman, Int. J. Approximate Reasoning 22 (1999) 169-194, as listed under the
  // authors' names in a public repository's specification; the paper itself was not seen.
  it("uses the published verbal scale", () => {
    expect(scaleFile.words).toEqual({
      certain: 100,
      probable: 85,
      expected: 75,
      "fifty-fifty": 50,
      uncertain: 25,
      improbable: 15,
      impossible: 0,
    });
  });
});

describe("the validator", () => {
  const cases: readonly (readonly [string, string, (draft: Draft) => void])[] = [
    [
      "an unknown cause in a check",
      "twist: unknown cause gremlins",
      ({ raw }) => found(raw.checks, "twist").rows[0]?.causes.push("gremlins"),
    ],
    [
      "none-of-these in a check",
      "twist: unknown cause none-of-these",
      ({ raw }) => found(raw.checks, "twist").rows[0]?.causes.push("none-of-these"),
    ],
    [
      "an unknown cause in a remedy",
      "retune: unknown cause gremlins",
      ({ raw }) => found(raw.remedies, "retune").cures[0]?.causes.push("gremlins"),
    ],
    [
      "an unknown proving check",
      "retune: proved by an unknown check",
      ({ raw }) => {
        found(raw.remedies, "retune").provedBy = "crystal-ball";
      },
    ],
    [
      "a word off the scale",
      "twist: unknown word in maybe,probable",
      ({ raw }) => {
        found(raw.checks, "twist").otherwise = ["maybe", "probable"];
      },
    ],
    [
      "a check without rows",
      "twist: missing rows",
      ({ raw }) => {
        found(raw.checks, "twist").rows = [];
      },
    ],
    [
      "a row with a word too few",
      "twist: a word missing or too many",
      ({ raw }) => found(raw.checks, "twist").otherwise.pop(),
    ],
    [
      "a remedy without rows",
      "retune: missing rows",
      ({ raw }) => {
        found(raw.remedies, "retune").cures = [];
      },
    ],
    [
      "two rows for one cause",
      "twist: two rows for body-block",
      ({ raw }) => found(raw.checks, "twist").rows[0]?.causes.push("body-block"),
    ],
    [
      "a sum above 1.15",
      "twist: words sum to 1.35",
      ({ raw }) => {
        found(raw.checks, "twist").otherwise = ["probable", "fifty-fifty"];
      },
    ],
    [
      "a sum below 0.85",
      "twist: words sum to 0.75",
      ({ raw }) => {
        found(raw.checks, "twist").otherwise = ["uncertain", "fifty-fifty"];
      },
    ],
    [
      "an id twice",
      "id twice: twist",
      ({ raw }) => {
        found(raw.remedies, "retune").id = "twist";
      },
    ],
    [
      "an outcome twice",
      "id twice: falls",
      ({ raw }) => {
        found(raw.checks, "twist").outcomes = ["falls", "falls"];
      },
    ],
    [
      "silence in live",
      "others-off: would silence everything in live",
      ({ raw }) => {
        found(raw.checks, "others-off").earliest = "live";
      },
    ],
    [
      "a check that separates nothing",
      "twist: separates nothing",
      ({ raw }) => {
        for (const row of found(raw.checks, "twist").rows) row.words = ["improbable", "probable"];
      },
    ],
    [
      "a cause that no check can confirm",
      "receiver-fault: no check can confirm it",
      ({ raw }) => {
        for (const check of raw.checks) {
          for (const row of check.rows) {
            row.causes = row.causes.filter((cause) => cause !== "receiver-fault");
          }
        }
      },
    ],
    [
      "a cause that no remedy cures",
      "noise-floor: no remedy cures it",
      ({ raw }) => {
        for (const row of found(raw.remedies, "quieten-source").cures) row.word = "expected";
      },
    ],
    [
      "two families that no check separates",
      "placement and not-radio: not separated",
      ({ raw }) => {
        for (const check of raw.checks) {
          for (const row of check.rows) {
            row.causes = row.causes.filter(
              (cause) => cause !== "audio-chain" && cause !== "bad-antenna-spot",
            );
          }
        }
      },
    ],
    [
      "a cause without text",
      "cause distance: no text",
      ({ wording }) => delete wording.causes["distance"],
    ],
    [
      "a family without text",
      "family range: no text",
      ({ wording }) => delete wording.families["range"],
    ],
    [
      "a check without text",
      "check twist: no text",
      ({ wording }) => delete wording.checks["twist"],
    ],
    [
      "an outcome without text",
      "twist outcome falls: no text",
      ({ wording }) => delete wording.checks["twist"]?.outcomes["falls"],
    ],
    [
      "a remedy without text",
      "remedy retune: no text",
      ({ wording }) => delete wording.remedies["retune"],
    ],
    [
      "a caution without text",
      "caution mains: no text",
      ({ wording }) => delete wording.cautions["mains"],
    ],
    [
      "text for nothing",
      "remedy pray: text without id",
      ({ wording }) => {
        wording.remedies["pray"] = { title: "Pray", how: "Kneel." };
      },
    ],
    [
      "a question of twelve words",
      "twist: question of twelve words",
      ({ wording }) => {
        const text = wording.checks["twist"];
        if (text) text.question = "one two three four five six seven eight nine ten eleven twelve";
      },
    ],
    [
      "a how of three sentences",
      "retune: how is too long",
      ({ wording }) => {
        const text = wording.remedies["retune"];
        if (text) text.how = "Look. Listen. Tune to 2.4 GHz.";
      },
    ],
    [
      "a label too long for its button",
      "twist: label too long",
      ({ wording }) => {
        const text = wording.checks["twist"];
        if (text) text.outcomes["falls"] = "It falls, and it does not come back again";
      },
    ],
  ];

  it.each(cases)("refuses %s", (_, problem, spoil) => {
    expect(broken(spoil).some((line) => line.startsWith(problem))).toBe(true);
  });
});
