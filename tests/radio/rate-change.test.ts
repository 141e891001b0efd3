import fc from "fast-check";
import { jStat } from "jstat";
import { describe, expect, it } from "vitest";
import {
  type BeforeAndAfter,
  highRateRatio,
  lowRateRatio,
  quietWatchRatio,
  rateChangeProbability,
  rateDropProbability,
} from "../../src/radio/rate-change.ts";
import { anyOf, expectRefusals, expectWithin } from "./refusals.ts";
import { SEEDED } from "./samples.ts";

const COUNTS = {
  beforeCount: { min: 0, max: 10_000 },
  afterCount: { min: 0, max: 10_000 },
  watchRatio: { min: 1e-5, max: 1e5 },
};
const INTERVALS = {
  ...COUNTS,
  beforeCount: { min: 1, max: 10_000 },
  confidenceProbability: { min: 0.5, max: 0.9999 },
};
const FEW = {
  beforeCount: { min: 0, max: 25 },
  afterCount: { min: 0, max: 25 },
  watchRatio: { min: 0.1, max: 10 },
};
type Interval = BeforeAndAfter & { readonly confidenceProbability: number };

const low = ({ confidenceProbability, ...counted }: Interval) =>
  lowRateRatio(counted, confidenceProbability);
const high = ({ confidenceProbability, ...counted }: Interval) =>
  highRateRatio(counted, confidenceProbability);

/** Fay 2022: 2 in 17877 against 9 in 16660. */
const VIGNETTE = { beforeCount: 9, afterCount: 2, watchRatio: 17_877 / 16_660 };

describe("rateDropProbability", () => {
  it("is the binomial chance of so few after, by a general library", () => {
    fc.assert(
      fc.property(anyOf(FEW), (counted) => {
        const { beforeCount, afterCount, watchRatio } = counted;
        const share = watchRatio / (1 + watchRatio);
        const tries = beforeCount + afterCount;
        const few = beforeCount === 0 ? 1 : jStat.binomial.cdf(afterCount, tries, share);
        expect(rateDropProbability(counted)).toBeCloseTo(few, 9);
      }),
      SEEDED,
    );
  });

  it("is neither the mid-p nor the score value that the paper's table has swapped in", () => {
    // TRAP: Gu et al. 2008, example 1: exact 0.000428, mid-p 0.000310, score 0.000316, Wald 0.000356.
    const counted = { beforeCount: 60, afterCount: 30, watchRatio: 54_308.7 / 51_477.5 };
    for (const other of [0.00031, 0.000316, 0.000356])
      expect(Math.abs(rateDropProbability(counted) - other)).toBeGreaterThan(5e-5);
  });

  it("falls with each event fewer after and each more before", () => {
    fc.assert(
      fc.property(anyOf(FEW), (counted) => {
        const here = rateDropProbability(counted);
        const more = { ...counted, beforeCount: counted.beforeCount + 1 };
        expect(rateDropProbability(more)).toBeLessThanOrEqual(here);
        const worse = { ...counted, afterCount: counted.afterCount + 1 };
        expect(rateDropProbability(worse)).toBeGreaterThanOrEqual(here);
      }),
      SEEDED,
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    expectWithin(rateDropProbability, COUNTS, { min: 0, max: 1 });
    expectRefusals(rateDropProbability, COUNTS);
  });
});

describe("rateChangeProbability", () => {
  it("doubles the smaller tail and does not add up the outcomes that are no likelier", () => {
    // The other convention gives 0.0331 and 0.4075 (scipy binomtest).
    expect(rateChangeProbability(VIGNETTE)).toBeCloseTo(0.0501, 4);
    const second = { beforeCount: 5, afterCount: 8, watchRatio: 165.1 / 182.8 };
    expect(rateChangeProbability(second)).toBeCloseTo(0.4601, 4);
  });

  it("is not the unconditional test of the same data", () => {
    // Krishnamoorthy and Thomson 2004, as in the manual of scipy: 0.08837900929 for 0 and 3.
    const counted = { beforeCount: 3, afterCount: 0, watchRatio: 1 };
    expect(rateChangeProbability(counted)).toBeGreaterThan(0.2);
  });

  it("needs six dropouts before and none after, in equal times, to fall below 5 %", () => {
    const p = (beforeCount: number) =>
      rateChangeProbability({ beforeCount, afterCount: 0, watchRatio: 1 });
    expect(p(5)).toBeGreaterThan(0.05);
    expect(p(6)).toBeLessThan(0.05);
  });

  it("is 1 where nothing was counted, and where the counts go with the times", () => {
    expect(rateChangeProbability({ beforeCount: 0, afterCount: 0, watchRatio: 2 })).toBe(1);
    expect(rateChangeProbability({ beforeCount: 4, afterCount: 8, watchRatio: 2 })).toBe(1);
  });

  it("is the same for before and after swapped", () => {
    fc.assert(
      fc.property(anyOf(FEW), ({ beforeCount, afterCount, watchRatio }) => {
        const swapped = {
          beforeCount: afterCount,
          afterCount: beforeCount,
          watchRatio: 1 / watchRatio,
        };
        const here = rateChangeProbability({ beforeCount, afterCount, watchRatio });
        expect(rateChangeProbability(swapped)).toBeCloseTo(here, 10);
      }),
      SEEDED,
    );
  });

  it("cries wolf at most as often as it promises", () => {
    // Both counts Poisson of one rate, all outcomes summed up: p of 5 % or less has a chance of 5 % or less.
    fc.assert(
      fc.property(
        anyOf({ mean: { min: 0.5, max: 8 }, watchRatio: { min: 0.2, max: 3 } }),
        ({ mean, watchRatio }) => {
          let alarms = 0;
          for (let beforeCount = 0; beforeCount < 30; beforeCount += 1) {
            for (let afterCount = 0; afterCount < 50; afterCount += 1) {
              if (rateChangeProbability({ beforeCount, afterCount, watchRatio }) > 0.05) continue;
              alarms +=
                jStat.poisson.pdf(beforeCount, mean) *
                jStat.poisson.pdf(afterCount, mean * watchRatio);
            }
          }
          expect(alarms).toBeLessThanOrEqual(0.05);
        },
      ),
      { ...SEEDED, numRuns: 30 },
    );
  });

  it("is a probability over its whole range and refuses the rest", () => {
    expectWithin(rateChangeProbability, COUNTS, { min: 0, max: 1 });
    expectRefusals(rateChangeProbability, COUNTS);
  });
});

describe("lowRateRatio and highRateRatio", () => {
  it("enclose the ratio that was counted", () => {
    // Fay 2022: 0.2070941557, printed.
    expect(lowRateRatio(VIGNETTE, 0.5)).toBeLessThan(0.2070941557);
    expect(highRateRatio(VIGNETTE, 0.5)).toBeGreaterThan(0.2070941557);
    fc.assert(
      fc.property(anyOf(INTERVALS), (inputs) => {
        const ratio = inputs.afterCount / inputs.beforeCount / inputs.watchRatio;
        expect(low(inputs)).toBeLessThanOrEqual(ratio);
        expect(high(inputs)).toBeGreaterThan(ratio);
      }),
      { ...SEEDED, numRuns: 60 },
    );
  });

  it("leave out 1 exactly when the doubled tail falls below the doubt", () => {
    fc.assert(
      fc.property(
        anyOf({
          ...FEW,
          beforeCount: { min: 1, max: 25 },
          confidenceProbability: { min: 0.5, max: 0.99 },
        }),
        (inputs) => {
          const isApart = low(inputs) > 1 || high(inputs) < 1;
          const p = rateChangeProbability(inputs);
          const doubt = 1 - inputs.confidenceProbability;
          if (Math.abs(p - doubt) < 1e-9) return;
          expect(isApart).toBe(p < doubt);
        },
      ),
      SEEDED,
    );
  });

  it("have each end where the binomial tail of a general library is half the doubt", () => {
    fc.assert(
      fc.property(
        anyOf({
          ...FEW,
          beforeCount: { min: 1, max: 25 },
          afterCount: { min: 1, max: 25 },
          confidenceProbability: { min: 0.5, max: 0.99 },
        }),
        (inputs) => {
          const tail = (1 - inputs.confidenceProbability) / 2;
          const tries = inputs.beforeCount + inputs.afterCount;
          const shareAt = (ratio: number) => 1 - 1 / (1 + ratio * inputs.watchRatio);
          const most = jStat.binomial.cdf(inputs.afterCount, tries, shareAt(high(inputs)));
          const least = 1 - jStat.binomial.cdf(inputs.afterCount - 1, tries, shareAt(low(inputs)));
          expect(most).toBeCloseTo(tail, 8);
          expect(least).toBeCloseTo(tail, 8);
        },
      ),
      SEEDED,
    );
  });

  it("start at 0 after a quiet time", () => {
    expect(lowRateRatio({ beforeCount: 4, afterCount: 0, watchRatio: 1 }, 0.95)).toBe(0);
  });

  it("are finite over their whole range and refuse the rest, a quiet time before included", () => {
    const call = (which: typeof low) => (inputs: Interval) => which(inputs);
    expectWithin(call(low), INTERVALS, { min: 0, max: 1e10 });
    expectWithin(call(high), INTERVALS, { min: 0, max: 1e16 });
    expectRefusals(call(low), INTERVALS);
    expectRefusals(call(high), INTERVALS);
  });
});

describe("quietWatchRatio", () => {
  const ranges = {
    beforeCount: INTERVALS.beforeCount,
    confidenceProbability: INTERVALS.confidenceProbability,
  };
  const call = (inputs: { beforeCount: number; confidenceProbability: number }) =>
    quietWatchRatio(inputs.beforeCount, inputs.confidenceProbability);

  it("is where a quiet time just shows an improvement", () => {
    fc.assert(
      fc.property(
        anyOf({
          beforeCount: { min: 1, max: 200 },
          confidenceProbability: { min: 0.5, max: 0.999 },
        }),
        (inputs) => {
          const { beforeCount, confidenceProbability } = inputs;
          const counted = { beforeCount, afterCount: 0, watchRatio: call(inputs) };
          expect(rateChangeProbability(counted)).toBeCloseTo(1 - confidenceProbability, 9);
        },
      ),
      SEEDED,
    );
  });

  it("is 39 times as long after a single event, at 95 %", () => {
    // 1 / 0.025 less 1, by hand.
    expect(quietWatchRatio(1, 0.95)).toBeCloseTo(39, 9);
  });

  it("is finite and above 0 over its whole range and refuses the rest", () => {
    expectWithin(call, ranges, { min: 1e-4, max: 2e4 });
    expectRefusals(call, ranges);
  });
});
