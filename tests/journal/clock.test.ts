import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { afterSeeing, compareRecords, isClock, nextClock } from "../../src/journal/clock.ts";

const RUNS = { seed: 20261201, numRuns: 200 };
const FIVE_MINUTES_MS = 300_000;
const wallMs = fc.integer({ min: 0, max: Date.UTC(2148, 0, 1) });

describe("nextClock", () => {
  it("writes milliseconds and counter in base 36 with the device behind them", () => {
    // 2025-01-01T00:00:00Z is 1735689600000 ms; base 36 worked out by repeated division in another language.
    expect(nextClock(null, Date.UTC(2025, 0, 1), "phone")).toBe("0m5d4ruo0-0000-phone");
  });

  it("sorts as text in the order of time", () => {
    fc.assert(
      fc.property(wallMs, wallMs, (a, b) => {
        const [first, second] = [nextClock(null, a, "d"), nextClock(null, b, "d")];
        expect(first < second).toBe(a < b);
      }),
      RUNS,
    );
  });

  it("never runs backwards on one device, whatever its wall clock does", () => {
    fc.assert(
      fc.property(fc.array(wallMs, { minLength: 2 }), (walls) => {
        let last: string | null = null;
        for (const now of walls) {
          const next = nextClock(last, now, "d");
          if (last !== null) expect(next > last).toBe(true);
          expect(isClock(next)).toBe(true);
          last = next;
        }
      }),
      RUNS,
    );
  });

  it("goes on in the next millisecond when the counter is full", () => {
    expect(nextClock("0m5d4ruo0-zzzz-d", 0, "d")).toBe("0m5d4ruo1-0000-d");
  });

  it.each([
    [null, -1, "d"],
    [null, Number.NaN, "d"],
    [null, 1.5, "d"],
    [null, Date.UTC(2149, 0, 1), "d"],
    [null, 0, ""],
    [null, 0, "d".repeat(50)],
    ["yesterday", 0, "d"],
  ])("refuses previous %s, nowMs %s, device %s", (previous, nowMs, device) => {
    expect(() => nextClock(previous, nowMs, device)).toThrow(RangeError);
  });

  it("fits the longest device id into the 64 characters of a record's field", () => {
    expect(nextClock(null, 0, "d".repeat(49))).toHaveLength(64);
  });
});

describe("afterSeeing", () => {
  const now = Date.UTC(2026, 11, 1);

  it("takes the later of the two clocks", () => {
    const early = nextClock(null, now - 1000, "a");
    const late = nextClock(null, now, "b");
    expect(afterSeeing(early, late, now)).toBe(late);
    expect(afterSeeing(late, early, now)).toBe(late);
    expect(afterSeeing(null, early, now)).toBe(early);
  });

  it("follows a clock that is 5 minutes ahead, and not one that is a millisecond more", () => {
    const own = nextClock(null, now, "a");
    const limit = nextClock(null, now + FIVE_MINUTES_MS, "b");
    const beyond = nextClock(null, now + FIVE_MINUTES_MS + 1, "b");
    expect(afterSeeing(own, limit, now)).toBe(limit);
    expect(afterSeeing(own, beyond, now)).toBe(own);
    expect(afterSeeing(null, beyond, now)).toBeNull();
  });

  it.each(["", "zzzzzzzzz-0000-b", "0m5d4ruo0", "0m5d4ruo0-0000-"])(
    "stays where it is when it sees %j, which is no clock",
    (seen) => {
      expect(afterSeeing(null, seen, now)).toBeNull();
    },
  );
});

describe("three devices that exchange records", () => {
  // The property the published clock is made for: what happened before sorts before.
  const step = fc.record({
    device: fc.nat({ max: 2 }),
    reads: fc.option(fc.nat({ max: 2 }), { nil: null }),
    passesMs: fc.nat({ max: 2000 }),
  });
  const skews = fc.tuple(
    fc.integer({ min: -120_000, max: 120_000 }),
    fc.integer({ min: -120_000, max: 120_000 }),
    fc.integer({ min: -120_000, max: 120_000 }),
  );

  it("sort every record after all that its device had seen, and stay near wall time", () => {
    fc.assert(
      fc.property(skews, fc.array(step, { minLength: 1, maxLength: 60 }), (skewMs, steps) => {
        const seen = [new Set<string>(), new Set<string>(), new Set<string>()];
        const last: (string | null)[] = [null, null, null];
        let trueMs = Date.UTC(2026, 11, 1);
        for (const { device, reads, passesMs } of steps) {
          trueMs += passesMs;
          const now = trueMs + (skewMs[device] ?? 0);
          for (const clock of reads === null ? [] : [...(seen[reads] ?? [])]) {
            last[device] = afterSeeing(last[device] ?? null, clock, now);
            seen[device]?.add(clock);
          }
          const made = nextClock(last[device] ?? null, now, `d${device}`);
          for (const earlier of seen[device] ?? []) expect(made > earlier).toBe(true);
          // 4 minutes is the widest skew drawn here.
          expect(made < nextClock(null, now + 240_001, "!")).toBe(true);
          seen[device]?.add(made);
          last[device] = made;
        }
      }),
      RUNS,
    );
  });
});

describe("compareRecords", () => {
  it("orders by clock, then by id, and finds a record equal to itself only", () => {
    expect(compareRecords({ clock: "a", id: "2" }, { clock: "b", id: "1" })).toBe(-1);
    expect(compareRecords({ clock: "b", id: "1" }, { clock: "a", id: "2" })).toBe(1);
    expect(compareRecords({ clock: "a", id: "1" }, { clock: "a", id: "2" })).toBe(-1);
    expect(compareRecords({ clock: "a", id: "2" }, { clock: "a", id: "1" })).toBe(1);
    expect(compareRecords({ clock: "a", id: "1" }, { clock: "a", id: "1" })).toBe(0);
  });
});
