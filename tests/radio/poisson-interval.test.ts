import fc from "fast-check";
import { jStat } from "jstat";
import { describe, expect, it } from "vitest";
import { poissonHighCount, poissonLowCount } from "../../src/radio/poisson-interval.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const RANGES = {
  eventCount: { min: 0, max: 10_000 },
  confidenceProbability: { min: 0.5, max: 0.9999 },
};
type Inputs = Readonly<Record<keyof typeof RANGES, number>>;

const low = ({ eventCount, confidenceProbability }: Inputs) =>
  poissonLowCount(eventCount, confidenceProbability);
const high = ({ eventCount, confidenceProbability }: Inputs) =>
  poissonHighCount(eventCount, confidenceProbability);

describe("poissonLowCount and poissonHighCount", () => {
  it("leave half of the doubt on each side, by a general library's Poisson distribution", () => {
    fc.assert(
      fc.property(
        anyOf({ eventCount: { min: 1, max: 60 }, confidenceProbability: { min: 0.5, max: 0.999 } }),
        (inputs) => {
          const { eventCount, confidenceProbability } = inputs;
          const tail = (1 - confidenceProbability) / 2;
          const orMore = 1 - jStat.poisson.cdf(eventCount - 1, low(inputs));
          expect(orMore).toBeCloseTo(tail, 9);
          expect(jStat.poisson.cdf(eventCount, high(inputs))).toBeCloseTo(tail, 9);
        },
      ),
      SEEDED,
    );
  });

  it("agree with the chi-squared quantiles of a general library", () => {
    for (const eventCount of [1, 4, 17, 50]) {
      const inputs = { eventCount, confidenceProbability: 0.95 };
      expect(low(inputs) / (jStat.chisquare.inv(0.025, 2 * eventCount) / 2)).toBeCloseTo(1, 6);
      expect(high(inputs) / (jStat.chisquare.inv(0.975, 2 * eventCount + 2) / 2)).toBeCloseTo(1, 6);
    }
  });

  it("hold the true mean at least as often as they promise", () => {
    // Every count that has a chance, summed up.
    fc.assert(
      fc.property(
        anyOf({ mean: { min: 0.05, max: 20 }, confidenceProbability: { min: 0.5, max: 0.99 } }),
        ({ mean, confidenceProbability }) => {
          let covered = 0;
          for (let eventCount = 0; eventCount < 80; eventCount += 1) {
            const inputs = { eventCount, confidenceProbability };
            if (low(inputs) <= mean && mean <= high(inputs))
              covered += jStat.poisson.pdf(eventCount, mean);
          }
          expect(covered).toBeGreaterThanOrEqual(confidenceProbability - 1e-9);
        },
      ),
      { ...SEEDED, numRuns: 40 },
    );
  });

  it("say 0 to 3.689 after a quiet time, and three by the one-sided rule", () => {
    // −ln 0.025 and −ln 0.05 from any table.
    expect(poissonLowCount(0, 0.95)).toBe(0);
    expect(poissonHighCount(0, 0.95)).toBeCloseTo(3.6889, 4);
    expect(poissonHighCount(0, 0.9)).toBeCloseTo(2.9957, 4);
  });

  it("enclose the count, the wider the surer", () => {
    fc.assert(
      fc.property(
        anyOf({ ...RANGES, confidenceProbability: { min: 0.5, max: 0.95 } }),
        (inputs) => {
          const surer = { ...inputs, confidenceProbability: inputs.confidenceProbability + 0.04 };
          expect(low(inputs)).toBeLessThanOrEqual(inputs.eventCount);
          expect(high(inputs)).toBeGreaterThan(inputs.eventCount);
          expect(low(surer)).toBeLessThanOrEqual(low(inputs));
          expect(high(surer)).toBeGreaterThan(high(inputs));
        },
      ),
      { ...SEEDED, numRuns: 60 },
    );
  });

  it("are finite over their whole range and refuse the rest", () => {
    expectWithin(low, RANGES, { min: 0, max: 10_000 });
    expectWithin(high, RANGES, { min: 0.5, max: 11_000 });
    expectRefusals(low, RANGES);
    expectRefusals(high, RANGES);
  });
});
