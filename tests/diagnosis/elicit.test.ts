import { describe, expect, it } from "vitest";
import { type Elicited, fromElicited } from "../../src/diagnosis/elicit.ts";

const STEP = { seconds: 5, earliest: "live", disruption: "none", cautions: [] };

const RAW: Elicited = {
  // Renooij & Witteman 1999: certain 100, expected 75, fifty-fifty 50, uncertain 25, impossible 0.
  scale: {
    words: { certain: 100, expected: 75, "fifty-fifty": 50, uncertain: 25, impossible: 0 },
    floorPercent: 4,
  },
  causes: [
    { id: "one", family: "any", ratePerHour: 1 },
    { id: "two", family: "any", ratePerHour: 1 },
    { id: "none-of-these", family: "unlisted", ratePerHour: 1 },
  ],
  checks: [
    {
      ...STEP,
      id: "look",
      topic: "sight",
      outcomes: ["seen", "unseen"],
      otherwise: ["uncertain", "expected"],
      rows: [{ causes: ["one"], words: ["certain", "impossible"] }],
    },
  ],
  remedies: [
    {
      ...STEP,
      id: "mend",
      isWorkaround: false,
      provedBy: "look",
      cures: [
        { causes: ["one"], word: "certain" },
        { causes: ["two"], word: "fifty-fifty" },
      ],
    },
  ],
  fallbackSeconds: 100,
};

describe("fromElicited", () => {
  const [look] = fromElicited(RAW).checks;

  it("lifts an impossible outcome to the floor, and brings the row to the sum 1", () => {
    // By hand: weights 1.00 and 0.04, sum 1.04.
    expect(look?.likelihood.get("one")?.map((share) => share * 1.04)).toEqual([
      expect.closeTo(1, 12),
      expect.closeTo(0.04, 12),
    ]);
  });

  it("gives the otherwise row to causes without a row, and to none-of-these", () => {
    expect(look?.likelihood.get("two")).toEqual([0.25, 0.75]);
    expect(look?.likelihood.get("none-of-these")).toEqual([0.25, 0.75]);
  });

  it("lets the surest cure fail as often as the floor says, and cures nothing unnamed", () => {
    const cures = fromElicited(RAW).remedies[0]?.cures;
    expect(cures?.get("one")).toBeCloseTo(0.96, 12);
    expect(cures?.get("two")).toBe(0.5);
    expect(cures?.get("none-of-these")).toBeUndefined();
  });

  it("refuses a word, a moment or a disruption that it does not know, and names it", () => {
    const [check] = RAW.checks;
    if (check === undefined) throw new RangeError("no check");
    const spoilt = (part: object) => () =>
      fromElicited({ ...RAW, checks: [{ ...check, ...part }] });
    expect(spoilt({ otherwise: ["maybe", "certain"] })).toThrow(/maybe/);
    expect(spoilt({ earliest: "tomorrow" })).toThrow(/tomorrow/);
    expect(spoilt({ disruption: "huge" })).toThrow(RangeError);
  });
});
