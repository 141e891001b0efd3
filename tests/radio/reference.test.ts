import { describe, expect, it } from "vitest";
import { sourcesBelow } from "../architecture/tree.ts";
import { EXPOSURE_RULES } from "./exposure-rules.ts";
import {
  BODY_LOSSES,
  FLOORS_LOSSES,
  SAR_LIMITS,
  SHADOW_SPREADS,
  SITE_LOSSES,
} from "./reference-rows.ts";

interface Sourced {
  readonly id: string;
  readonly source?: unknown;
}

const TABLES: readonly (readonly [string, readonly Sourced[]])[] = [
  ["body-loss", BODY_LOSSES],
  ["site-general-loss", SITE_LOSSES],
  ["shadow-spread", SHADOW_SPREADS],
  ["floors-loss", FLOORS_LOSSES],
  ["exposure-limits", EXPOSURE_RULES],
  ["sar-limits", SAR_LIMITS],
];

describe.each(TABLES)("the rows of %s", (_name, rows) => {
  it("have ids that are used once", () => {
    expect(rows.length).toBeGreaterThan(1);
    expect(new Set(rows.map(({ id }) => id)).size).toBe(rows.length);
  });

  it("name a source, where it was read, and how far it can be trusted", () => {
    for (const { id, source } of rows) {
      const fields = source as Readonly<Record<string, string>>;
      expect(Object.keys(fields).sort(), id).toEqual(
        "body document edition readAt readOn standing where".split(" "),
      );
      for (const text of Object.values(fields)) expect(text.trim(), id).not.toBe("");
      const standings = ["read", "second-hand", "common-practice", "from-memory"];
      expect(standings, id).toContain(fields["standing"]);
      expect(fields["readOn"], id).toMatch(/^\d{4}-\d\d-\d\d$/);
      // What nobody has read cannot pass for read.
      if (fields["readAt"] === "not read") expect(fields["standing"], id).toBe("from-memory");
    }
  });
});

describe("losses of bodies and crowds", () => {
  it("are ranges of plausible losses in plausible bands, each with its caution", () => {
    for (const row of BODY_LOSSES) {
      expect(row.lowDb, row.id).toBeGreaterThanOrEqual(0);
      expect(row.highDb ?? row.lowDb, row.id).toBeGreaterThanOrEqual(row.lowDb);
      expect(row.highDb ?? row.lowDb, row.id).toBeLessThanOrEqual(40);
      expect(row.fromMhz, row.id).toBeGreaterThanOrEqual(30);
      expect(row.toMhz, row.id).toBeGreaterThanOrEqual(row.fromMhz);
      expect(row.case.length, row.id).toBeGreaterThan(20);
      expect(row.caution.length, row.id).toBeGreaterThan(20);
    }
  });

  it("have no upper figure only where the source has none, and say so", () => {
    const open = BODY_LOSSES.filter(({ highDb }) => highDb === null);
    expect(open.map(({ id }) => id)).toEqual(["person-in-path-vhf"]);
    for (const { caution } of open) expect(caution).toMatch(/more than/i);
  });

  it("rank a pack on the belt above a transmitter in the hand, as regulators do", () => {
    // Assumptions of CEPT reports, from memory, to be verified: 3 to 6 dB and 6 to 14 dB.
    const row = (id: string) => BODY_LOSSES.find((each) => each.id === id);
    expect([row("hand-held")?.lowDb, row("hand-held")?.highDb]).toEqual([3, 6]);
    expect([row("worn-on-belt")?.lowDb, row("worn-on-belt")?.highDb]).toEqual([6, 14]);
  });

  it("call a figure that nobody printed common practice", () => {
    for (const id of ["turned-away", "wall-of-people"])
      expect(BODY_LOSSES.find((each) => each.id === id)?.source.standing).toBe("common-practice");
  });
});

describe("coefficients of losses in places", () => {
  it("are those of Table 2 of Rec. ITU-R P.1238-11 and Table 4 of P.1411-11, as read", () => {
    // Second-hand at github.com/aajuvonen/octave-rxt and github.com/eeveetza/p1411: α, β, γ, σ.
    const table = SITE_LOSSES.map(({ id, exponent, offsetDb, frequencyExponent, spreadDb }) =>
      [id, exponent, offsetDb, frequencyExponent, spreadDb].join(" "),
    );
    expect(table).toEqual([
      "office-in-sight 1.46 34.62 2.03 3.76",
      "office-hidden 2.46 29.53 2.38 5.04",
      "corridor-in-sight 1.63 28.12 2.25 4.07",
      "corridor-hidden 2.77 29.27 2.48 7.63",
      "industrial-in-sight 2.31 24.52 2.06 2.69",
      "industrial-hidden 3.79 21.01 1.34 9.05",
      "street-in-sight 2.12 29.2 2.11 5.06",
      "street-high-rise-hidden 4 10.2 2.36 7.6",
      "street-residential-hidden 3.01 18.8 2.07 3.07",
    ]);
  });

  it("say where they hold", () => {
    for (const row of SITE_LOSSES) {
      expect(row.fromMhz, row.id).toBeLessThan(row.toMhz);
      expect(row.fromM, row.id).toBeLessThan(row.toM);
    }
  });

  it("spread as much in offices as another body's table has it, within 4 dB", () => {
    // 3GPP TR 38.901, Table 7.5-6, second-hand: 3 dB in sight and 8.03 dB out of sight; P.1238-11 has 3.76 and 5.04.
    expect(SHADOW_SPREADS.map(({ spreadDb }) => spreadDb)).toEqual([3, 8.03]);
    for (const { id, spreadDb, sameOverM } of SHADOW_SPREADS) {
      const same = SITE_LOSSES.find((each) => each.id === id);
      expect(Math.abs((same?.spreadDb ?? 0) - spreadDb), id).toBeLessThan(4);
      expect(sameOverM, id).toBeGreaterThan(1);
    }
  });

  it("let floors add up, each one by more than nothing", () => {
    for (const { id, floorsDb } of FLOORS_LOSSES)
      for (const [index, lossDb] of floorsDb.entries())
        expect(lossDb, id).toBeGreaterThan(floorsDb[index - 1] ?? 0);
  });

  it("let floors follow the rules that a simulator has for 2 GHz", () => {
    // Open network simulator after Rec. ITU-R P.1238: 4·n, 15 + 4·(n − 1), 6 + 3·(n − 1) dB.
    const floors = (id: string) => FLOORS_LOSSES.find((each) => each.id === id)?.floorsDb;
    expect(floors("homes-2ghz")).toEqual([4, 8, 12]);
    expect(floors("office-2ghz")).toEqual([15, 19, 23]);
    expect(floors("shops-2ghz")).toEqual([6, 9, 12]);
  });
});

describe("limits of exposure", () => {
  it("have bands in rising order without gaps, and say what they do not cover", () => {
    for (const { id, steps, doesNotCover, averagingMinutes } of EXPOSURE_RULES) {
      expect(steps.length, id).toBeGreaterThan(0);
      for (const [index, step] of steps.entries()) {
        expect(step.fromMhz, id).toBeLessThan(step.toMhz);
        expect(step.fromMhz, id).toBe(steps[index - 1]?.toMhz ?? step.fromMhz);
        expect(step.factor, id).toBeGreaterThan(0);
      }
      expect(doesNotCover.length, id).toBeGreaterThan(40);
      expect([6, 30], id).toContain(averagingMinutes);
    }
  });

  it("are five times as high at work as for the public, in absorption too", () => {
    const publicRows = SAR_LIMITS.filter(({ group }) => group === "public");
    expect(publicRows.length).toBeGreaterThan(5);
    for (const row of publicRows) {
      const id = row.id.replace("-public", "-occupational");
      const atWork = SAR_LIMITS.find((each) => each.id === id);
      expect((atWork?.limitWPerKg ?? 0) / row.limitWPerKg, row.id).toBeCloseTo(5, 9);
    }
  });

  it("are those of 47 CFR 1.1310 and ICNIRP for the public, in W/kg", () => {
    // 47 CFR 1.1310(c), read; ICNIRP's of 1998, second-hand; IEEE C95.1-2019 from memory, to be verified.
    const limits = Object.fromEntries(SAR_LIMITS.map(({ id, limitWPerKg }) => [id, limitWPerKg]));
    expect(limits).toMatchObject({
      "fcc-whole-body-public": 0.08,
      "fcc-local-public": 1.6,
      "fcc-limbs-public": 4,
      "icnirp-whole-body-public": 0.08,
      "icnirp-local-public": 2,
      "icnirp-limbs-public": 4,
      "ieee-local-public": 2,
    });
  });

  it("never call anything safe, in data or code that speaks of exposure", () => {
    const word = ["sa", "fe"].join("");
    const files = [
      ...sourcesBelow(["src/radio"], [".ts"]),
      ...sourcesBelow(["shared/reference"], [".json"]),
    ].filter(({ source }) => /exposure|absorption rate/i.test(source));
    expect(files.length).toBeGreaterThan(5);
    for (const { path, source } of files)
      expect(source, path).not.toMatch(new RegExp(`\\b${word}(ly|ty)?\\b`, "i"));
  });
});
