import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { DISTANCE_FIELD_IDS, DISTANCE_FIELDS } from "../../../src/calculators/distance/fields.ts";
import {
  type DistanceInputs,
  type DistanceOutcome,
  distanceOutcome,
} from "../../../src/calculators/distance/outcome.ts";
import { SEEDED } from "../../radio/samples.ts";
import { anyInputs, INITIAL } from "./samples.ts";

/** The wavelength is 1 m by the definition of the metre. */
const ONE_METRE_WAVE_MHZ = 299.792458;

type Answer = Extract<DistanceOutcome, { readonly kind: "ok" }>;

function answerTo(inputs: Partial<DistanceInputs>): Answer {
  const outcome = distanceOutcome({ ...INITIAL, ...inputs });
  if (outcome.kind !== "ok") throw new Error(`no answer: ${outcome.reason}`);
  return outcome;
}

describe("distanceOutcome, the figures", () => {
  it("gains 6 dB, four times the power, at half the distance in free space", () => {
    // T. L. Singal, Wireless Communications, example 2.1: twice the distance, -6 dB.
    const { changeDb, powerRatio } = answerTo({ fromM: 30, toM: 15, exponent: 2 });
    expect(changeDb).toBeCloseTo(6.02, 2);
    expect(powerRatio).toBeCloseTo(4, 9);
  });

  it("loses 40 dB at ten times the distance under a fourth-power law", () => {
    // T. L. Singal, Wireless Communications, example 2.2.
    expect(answerTo({ fromM: 15, toM: 150, exponent: 4 }).changeDb).toBeCloseTo(-40, 9);
  });

  it("changes nothing where nothing moves", () => {
    const { changeDb, powerRatio } = answerTo({ fromM: 20, toM: 20 });
    expect(changeDb).toBe(0);
    expect(powerRatio).toBe(1);
  });

  it("finds a wished 20 dB at a tenth of the distance, counted from the old place", () => {
    expect(answerTo({ fromM: 30, toM: 7, wishedGainDb: 20 }).distanceForWishM).toBeCloseTo(3, 9);
  });

  it("finds a wished loss farther away", () => {
    const { distanceForWishM } = answerTo({ fromM: 30, exponent: 4, wishedGainDb: -40 });
    expect(distanceForWishM).toBeCloseTo(300, 9);
  });

  it("ends the near zone one wavelength from a half-wave antenna", () => {
    expect(answerTo({ frequencyMhz: ONE_METRE_WAVE_MHZ }).nearZoneM).toBeCloseTo(1, 12);
  });

  it("has no caution for the inputs that it opens with", () => {
    expect(answerTo({}).cautions).toEqual([]);
  });
});

describe("distanceOutcome, where it warns or is silent", () => {
  const at = (inputs: Partial<DistanceInputs>) =>
    distanceOutcome({ ...INITIAL, frequencyMhz: ONE_METRE_WAVE_MHZ, wishedGainDb: 0, ...inputs });
  const cautionsAt = (inputs: Partial<DistanceInputs>) => {
    const outcome = at(inputs);
    return outcome.kind === "ok" ? outcome.cautions : outcome.reason;
  };

  it.each(["fromM", "toM"] as const)("gives no number within one wavelength: %s", (id) => {
    const outcome = at({ [id]: 0.999 });
    expect(outcome).toEqual({
      kind: "no-answer",
      reason: "inside-near-zone",
      nearZoneM: expect.closeTo(1, 12),
    });
  });

  it.each(["fromM", "toM"] as const)("warns between one and two wavelengths: %s", (id) => {
    expect(cautionsAt({ [id]: 1.001 })).toEqual(["near-zone"]);
    expect(cautionsAt({ [id]: 1.999 })).toEqual(["near-zone"]);
    expect(cautionsAt({ [id]: 2.001 })).toEqual([]);
  });

  it("warns of a wished distance between one and two wavelengths", () => {
    expect(cautionsAt({ fromM: 15, wishedGainDb: 20 })).toEqual(["near-zone"]);
    expect(cautionsAt({ fromM: 25, wishedGainDb: 20 })).toEqual([]);
  });

  it("withholds a wished distance within one wavelength, and keeps the rest", () => {
    const outcome = at({ fromM: 9, toM: 4.5, wishedGainDb: 20 });
    expect(outcome).toMatchObject({
      kind: "ok",
      changeDb: expect.closeTo(6.02, 2),
      distanceForWishM: null,
      cautions: ["wish-inside-near-zone"],
    });
  });

  it("withholds a wished distance beyond what the fields take", () => {
    expect(at({ fromM: 210, wishedGainDb: -20 })).toMatchObject({
      kind: "ok",
      distanceForWishM: null,
      cautions: ["wish-beyond-range"],
    });
    expect(at({ fromM: 190, wishedGainDb: -20 })).toMatchObject({
      distanceForWishM: expect.closeTo(1900, 6),
      cautions: [],
    });
  });

  it("withholds a wished distance below what the fields take, far though it is in wavelengths", () => {
    // 5 cm at 7.2 GHz, where the wavelength is 4.2 cm.
    expect(at({ frequencyMhz: 7200, fromM: 0.5, toM: 0.5, wishedGainDb: 20 })).toMatchObject({
      distanceForWishM: null,
      cautions: ["wish-beyond-range"],
    });
  });

  it("gives both cautions where both hold", () => {
    expect(cautionsAt({ fromM: 1.5, wishedGainDb: 20 })).toEqual([
      "near-zone",
      "wish-inside-near-zone",
    ]);
  });
});

describe("distanceOutcome, everywhere", () => {
  it("never throws inside the ranges, and every number it gives is finite", () => {
    const kinds = new Map<string, number>();
    fc.assert(
      fc.property(anyInputs, (inputs) => {
        const outcome = distanceOutcome(inputs);
        kinds.set(outcome.kind, (kinds.get(outcome.kind) ?? 0) + 1);
        const numbers = Object.values(outcome).filter((value) => typeof value === "number");
        expect(numbers.length).toBeGreaterThan(0);
        for (const value of numbers) expect(value).toSatisfy(Number.isFinite);
        if (outcome.kind === "ok") {
          const isWithheld = outcome.cautions.some((caution) => caution.startsWith("wish-"));
          expect(outcome.distanceForWishM === null).toBe(isWithheld);
        }
      }),
      { ...SEEDED, numRuns: 2000 },
    );
    for (const kind of ["ok", "no-answer"]) expect(kinds.get(kind)).toBeGreaterThan(100);
  });

  it("answers at every corner of the ranges", () => {
    let corners = 0;
    for (let corner = 0; corner < 2 ** DISTANCE_FIELD_IDS.length; corner += 1) {
      const inputs = { ...INITIAL };
      DISTANCE_FIELD_IDS.forEach((id, bit) => {
        const { min, max } = DISTANCE_FIELDS[id];
        Object.assign(inputs, { [id]: corner & (1 << bit) ? max : min });
      });
      expect(["ok", "no-answer"]).toContain(distanceOutcome(inputs).kind);
      corners += 1;
    }
    expect(corners).toBe(32);
  });

  it.each(DISTANCE_FIELD_IDS)("refuses a programmer's mistake and names it: %s", (id) => {
    const { min, max } = DISTANCE_FIELDS[id];
    for (const bad of [Number.NaN, min - 1, max + 1, Number.POSITIVE_INFINITY]) {
      const call = () => distanceOutcome({ ...INITIAL, [id]: bad });
      expect(call).toThrow(RangeError);
      expect(call).toThrow(`distanceOutcome: ${id} `);
      expect(call).toThrow(`got ${bad}`);
    }
  });
});
