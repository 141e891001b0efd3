import { besselj } from "bessel";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  envelopeCorrelationRatio,
  fieldCorrelationRatio,
  spacingForCorrelationM,
  zeroSpacingM,
} from "../../src/radio/antenna-correlation.ts";
import { seededChance } from "./chance.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

/** By the definition of the metre the wavelength is 1 m here. */
const ONE_METRE_WAVE_MHZ = 299.792458;
const FREQUENCY = { min: 0.003, max: 3e6 };
/** 0.1 m is the wavelength at 2997.9 MHz and a thousand of them are 100 m. */
const SPACINGS = { spacingM: { min: 0, max: 99.9 }, frequencyMhz: { min: 0.003, max: 2997 } };
const ZEROS = { frequencyMhz: FREQUENCY, order: { min: 1, max: 100 } };
const WISHES = { correlationRatio: { min: 0, max: 1 }, frequencyMhz: FREQUENCY };

describe("fieldCorrelationRatio", () => {
  it("is what waves from all sides leave between two places", () => {
    // Clarke's model from its definition: the mean of the phase shift over evenly spread directions.
    fc.assert(
      fc.property(anyOf({ spacingM: { min: 0, max: 20 } }), ({ spacingM }) => {
        let sum = 0;
        for (let n = 0; n < 720; n += 1)
          sum += Math.cos(2 * Math.PI * spacingM * Math.cos((2 * Math.PI * n) / 720));
        expect(fieldCorrelationRatio(spacingM, ONE_METRE_WAVE_MHZ)).toBeCloseTo(sum / 720, 11);
      }),
      SEEDED,
    );
  });

  it("is the Bessel function of a general library", () => {
    fc.assert(
      fc.property(anyOf({ spacingM: { min: 0, max: 10 } }), ({ spacingM }) => {
        const library = besselj(2 * Math.PI * spacingM, 0);
        expect(fieldCorrelationRatio(spacingM, ONE_METRE_WAVE_MHZ)).toBeCloseTo(library, 7);
      }),
      SEEDED,
    );
  });

  it("goes with the spacing in wavelengths", () => {
    expect(fieldCorrelationRatio(0.2, 600)).toBeCloseTo(fieldCorrelationRatio(0.1, 1200), 13);
  });

  it("lies between -0.403 and 1 over its range and refuses the rest", () => {
    expectWithin(
      ({ spacingM, frequencyMhz }) => fieldCorrelationRatio(spacingM, frequencyMhz),
      SPACINGS,
      { min: -0.4028, max: 1 },
    );
    expectRefusals(({ spacingM }) => fieldCorrelationRatio(spacingM, ONE_METRE_WAVE_MHZ), {
      spacingM: { min: 0, max: 1000 },
    });
    expectRefusals(({ frequencyMhz }) => fieldCorrelationRatio(1e-5, frequencyMhz), {
      frequencyMhz: FREQUENCY,
    });
  });
});

describe("envelopeCorrelationRatio", () => {
  it("stays below one half from a quarter of a wavelength on, and below 0.17 from 0.3 on", () => {
    // Below 0.5 a correlation "may be used in practice": abstract on selection in correlated fading,
    // researchgate.net/publication/224110661, read 2026-12-01. So the rule of half a wavelength holds.
    for (let spacingM = 0.25; spacingM < 20; spacingM += 0.01) {
      const correlation = envelopeCorrelationRatio(spacingM, ONE_METRE_WAVE_MHZ);
      expect(correlation).toBeLessThan(0.5);
      if (spacingM >= 0.3) expect(correlation).toBeLessThan(0.17);
    }
  });

  it("is the correlation of the powers in simulated fields", () => {
    // 60 plane waves of random phase; 4000 fields. The standard error is near 0.02.
    const chance = seededChance(7);
    for (const spacing of [0.1, 0.25, 0.6]) {
      const pairs = Array.from({ length: 4000 }, () => {
        const field = [0, 0, 0, 0];
        for (let n = 0; n < 60; n += 1) {
          const phase = 2 * Math.PI * chance();
          const shifted = phase + 2 * Math.PI * spacing * Math.cos((2 * Math.PI * n) / 60);
          const parts = [Math.cos(phase), Math.sin(phase), Math.cos(shifted), Math.sin(shifted)];
          parts.forEach((part, at) => {
            field[at] = (field[at] ?? 0) + part;
          });
        }
        const [a = 0, b = 0, c = 0, d = 0] = field;
        return [(a ** 2 + b ** 2) / 60, (c ** 2 + d ** 2) / 60] as const;
      });
      const mean = (of: (pair: readonly [number, number]) => number) =>
        pairs.reduce((sum, pair) => sum + of(pair), 0) / pairs.length;
      const [one, two] = [mean(([p]) => p), mean(([, q]) => q)];
      const covariance = mean(([p, q]) => (p - one) * (q - two));
      const spread = Math.sqrt(mean(([p]) => (p - one) ** 2) * mean(([, q]) => (q - two) ** 2));
      const expected = envelopeCorrelationRatio(spacing, ONE_METRE_WAVE_MHZ);
      expect(Math.abs(covariance / spread - expected)).toBeLessThan(0.06);
    }
  });
});

describe("zeroSpacingM", () => {
  it("gives zeros of a general library's Bessel function, in order and about half a wave apart", () => {
    let before = 0;
    for (let order = 1; order <= 12; order += 1) {
      const spacingM = zeroSpacingM(ONE_METRE_WAVE_MHZ, order);
      expect(besselj(2 * Math.PI * spacingM, 0)).toBeCloseTo(0, 7);
      if (order > 1) expect(spacingM - before).toBeCloseTo(0.5, 2);
      before = spacingM;
    }
  });

  it("is a finite length over its whole range and refuses the rest", () => {
    const call = (inputs: { frequencyMhz: number; order: number }) =>
      zeroSpacingM(inputs.frequencyMhz, inputs.order);
    expectWithin(call, ZEROS, { min: 3e-5, max: 6e6 });
    expectRefusals(call, ZEROS);
  });
});

describe("spacingForCorrelationM", () => {
  it("is the inverse of envelopeCorrelationRatio", () => {
    fc.assert(
      fc.property(anyOf(WISHES), ({ correlationRatio, frequencyMhz }) => {
        const spacingM = spacingForCorrelationM(correlationRatio, frequencyMhz);
        expect(envelopeCorrelationRatio(spacingM, frequencyMhz)).toBeCloseTo(correlationRatio, 12);
      }),
      SEEDED,
    );
  });

  it("runs from no spacing for correlation 1 to the first zero for none", () => {
    expect(spacingForCorrelationM(1, ONE_METRE_WAVE_MHZ)).toBeCloseTo(0, 7);
    // First zero of J0, 2.4048255577 (Abramowitz and Stegun, Table 9.5), over 2π.
    const firstM = 2.4048255577 / (2 * Math.PI);
    expect(spacingForCorrelationM(0, ONE_METRE_WAVE_MHZ)).toBeCloseTo(firstM, 9);
  });

  it("refuses what lies outside its ranges", () => {
    expectRefusals(
      ({ correlationRatio, frequencyMhz }) =>
        spacingForCorrelationM(correlationRatio, frequencyMhz),
      WISHES,
    );
  });
});
