import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { intermodCount } from "../../src/radio/intermod-count.ts";
import {
  FIFTH_ORDER,
  INTERMOD_RECIPES,
  type IntermodKind,
  THIRD_ORDER,
} from "../../src/radio/intermod-kind.ts";
import {
  type IntermodSearch,
  intermodHitCounts,
  intermodHits,
  intermodProducts,
} from "../../src/radio/intermod-products.ts";
import { expectRefused } from "./refused-inputs.ts";
import { SEEDED } from "./samples.ts";

const ALL = [...THIRD_ORDER, ...FIFTH_ORDER];

interface Term {
  readonly kind: IntermodKind;
  readonly carriers: readonly number[];
  readonly hz: number;
}

/** Every product by brute force: all ordered choices of different carriers, doubles by symmetry left out. */
function bruteForce(carriersHz: readonly number[], kinds: readonly IntermodKind[]): Term[] {
  const all: Term[] = [];
  const places = carriersHz.map((_, place) => place);
  const at = (place: number) => carriersHz[place] ?? Number.NaN;
  for (const kind of kinds)
    for (const a of places)
      for (const b of places) {
        if (a === b) continue;
        if (kind === "2A-B") all.push({ kind, carriers: [a, b], hz: 2 * at(a) - at(b) });
        if (kind === "3A-2B") all.push({ kind, carriers: [a, b], hz: 3 * at(a) - 2 * at(b) });
        for (const c of places) {
          if (c === a || c === b) continue;
          const carriers = [a, b, c];
          if (kind === "A+B-C" && a < b) all.push({ kind, carriers, hz: at(a) + at(b) - at(c) });
          if (kind === "3A-B-C" && b < c)
            all.push({ kind, carriers, hz: 3 * at(a) - at(b) - at(c) });
          if (kind === "2A+B-2C") all.push({ kind, carriers, hz: 2 * at(a) + at(b) - 2 * at(c) });
        }
      }
  return all;
}

/** One spelling for a product whichever way carriers that count alike are listed. */
function spelled(kind: IntermodKind, carriers: readonly number[], hz: number): string {
  const [a = -1, b = -1, c = -1] = carriers;
  const sorted = (...places: number[]) => places.sort((x, y) => x - y);
  const ordered =
    kind === "A+B-C" ? [...sorted(a, b), c] : kind === "3A-B-C" ? [a, ...sorted(b, c)] : carriers;
  return `${kind} ${ordered.join(",")} ${Math.abs(hz)}`;
}

const hzOf = (mhz: number) => Math.round(mhz * 1e6);
const listed = (carriersMhz: readonly number[], kinds: readonly IntermodKind[]) =>
  [...intermodProducts(carriersMhz, kinds)].map(({ kind, carriers, frequencyMhz }) =>
    spelled(kind, carriers, hzOf(frequencyMhz)),
  );
const frequenciesOf = (carriersMhz: readonly number[], kinds: readonly IntermodKind[]) =>
  [...new Set([...intermodProducts(carriersMhz, kinds)].map((one) => one.frequencyMhz))].sort(
    (a, b) => a - b,
  );

/** Some on one frequency, some so far apart that differences fall below zero. */
const carrierSets = fc.array(
  fc.oneof(fc.integer({ min: 470_000, max: 470_040 }), fc.integer({ min: 30_000, max: 950_000 })),
  { maxLength: 7 },
);

describe("intermodProducts", () => {
  it("makes every product once and no other", () => {
    let products = 0;
    fc.assert(
      fc.property(carrierSets, (khz) => {
        const expected = bruteForce(
          khz.map((each) => each * 1000),
          ALL,
        ).map(({ kind, carriers, hz }) => spelled(kind, carriers, hz));
        expect(
          listed(
            khz.map((each) => each / 1000),
            ALL,
          ).sort(),
        ).toEqual(expected.sort());
        products += expected.length;
      }),
      SEEDED,
    );
    expect(products).toBeGreaterThan(10_000);
  });

  it("puts two carriers' products where a textbook lists them", () => {
    // T. S. Rappaport, Wireless Communications, example 9.1 (p. 451), read second-hand: 1930 and 1932 MHz
    // make 1920, 1922, … 1940 MHz; orders 3 and 5 are those nearest to the carriers.
    expect(frequenciesOf([1930, 1932], THIRD_ORDER)).toEqual([1928, 1934]);
    expect(frequenciesOf([1930, 1932], FIFTH_ORDER)).toEqual([1926, 1936]);
  });

  it("agrees with a listed example of four carriers", () => {
    // rfessentials.com, knowledge base, levels of intermodulation products, read 2026-12-01: 1000, 1010,
    // 1020 and 1030 MHz make 990, 980 and 1040 beside the carriers, and land on 1000, 1030 and 1010.
    const carriers = [1000, 1010, 1020, 1030];
    const lands = frequenciesOf(carriers, THIRD_ORDER);
    expect(lands).toEqual(expect.arrayContaining([980, 990, 1040, 1000, 1010, 1030]));
    // Equal spacing, worked out independently by enumeration: 10 different frequencies, 970 to 1060.
    expect(lands).toEqual([970, 980, 990, 1000, 1010, 1020, 1030, 1040, 1050, 1060]);
  });

  it("mirrors what falls below zero", () => {
    // 2·200 − 600 = −200 MHz comes out at 200 MHz.
    expect(frequenciesOf([200, 600], ["2A-B"])).toEqual([200, 1000]);
  });

  it("adds up the carriers that it names, in the order of the letters", () => {
    const carriersMhz = [614.4, 606.125, 622.775, 598.2];
    for (const { kind, carriers, frequencyMhz } of intermodProducts(carriersMhz, ALL)) {
      const { factors } = INTERMOD_RECIPES[kind];
      expect(carriers).toHaveLength(factors.length);
      const sum = factors.reduce(
        (total, factor, place) => total + factor * (carriersMhz[carriers[place] ?? -1] ?? 0),
        0,
      );
      expect(frequencyMhz).toBeCloseTo(sum, 6);
    }
  });

  it("makes them one by one: the first is there although a thousand carriers make 10⁹", () => {
    const many = Array.from({ length: 1000 }, (_, index) => 400 + index / 10);
    const first = intermodProducts(many, ["2A+B-2C"]).next();
    expect(first.done).toBe(false);
  });

  it("makes none of fewer carriers than it takes", () => {
    expect(listed([], ALL)).toEqual([]);
    expect(listed([600], ALL)).toEqual([]);
    expect(listed([600, 601], ["A+B-C", "3A-B-C", "2A+B-2C"])).toEqual([]);
  });

  it("refuses a carrier that is none before the first product", () => {
    expectRefused(
      "intermodProducts",
      ({ carrierMhz }) => intermodProducts([600, carrierMhz], ALL),
      { carrierMhz: 601 },
      { carrierMhz: [0, -1, 4e6] },
    );
  });
});

describe("intermodCount", () => {
  // Worked out independently by enumeration: two carriers 2A−B, three carriers A+B−C, their sum.
  it.each([
    [2, 2, 0, 2],
    [3, 6, 3, 9],
    [4, 12, 12, 24],
    [5, 20, 30, 50],
    [8, 56, 168, 224],
    [10, 90, 360, 450],
    [16, 240, 1680, 1920],
    [32, 992, 14_880, 15_872],
  ])("counts those of %s carriers", (carrierCount, two, three, total) => {
    expect(intermodCount("2A-B", carrierCount)).toBe(two);
    expect(intermodCount("A+B-C", carrierCount)).toBe(three);
    expect(two + three).toBe(total);
  });

  it("does not follow a page that prints 12 for three carriers and 30 for four", () => {
    // rfessentials.com, as above; its own formula N²·(N − 1)/2 gives 9 and 24.
    const third = (count: number) =>
      THIRD_ORDER.reduce((sum, kind) => sum + intermodCount(kind, count), 0);
    expect([third(3), third(4)]).toEqual([9, 24]);
  });

  it.each(ALL)("counts as many %s as there are, up to twelve carriers", (kind) => {
    for (let count = 0; count <= 12; count += 1) {
      const carriersHz = Array.from({ length: count }, (_, index) => 6e8 + index * 12_345);
      expect(intermodCount(kind, count)).toBe(bruteForce(carriersHz, [kind]).length);
    }
  });

  it("refuses half a carrier", () => {
    expectRefused(
      "intermodCount",
      ({ carrierCount }) => intermodCount("2A-B", carrierCount),
      { carrierCount: 3 },
      { carrierCount: [-1, 2.5, 1_000_001] },
    );
  });
});

/** Hits by brute force, as spelled products with their victim. */
function bruteHits({ carriersMhz, victimsMhz, withinMhz, kinds }: IntermodSearch): string[] {
  return bruteForce(carriersMhz.map(hzOf), kinds).flatMap(({ kind, carriers, hz }) =>
    victimsMhz.flatMap((victimMhz, victim) =>
      Math.abs(Math.abs(hz) - hzOf(victimMhz)) <= hzOf(withinMhz)
        ? [`${spelled(kind, carriers, hz)} on ${victim}`]
        : [],
    ),
  );
}

const hitsOf = (search: IntermodSearch) =>
  [...intermodHits(search)].map(
    ({ kind, carriers, frequencyMhz, victim }) =>
      `${spelled(kind, carriers, hzOf(frequencyMhz))} on ${victim}`,
  );

/** Carriers on a grid, so that products land on victims and on the very edge of the distance. */
const searches = fc
  .record({
    carriers: fc.array(fc.integer({ min: 0, max: 60 }), { maxLength: 8 }),
    far: fc.array(fc.integer({ min: 30, max: 900 }), { maxLength: 2 }),
    victims: fc.array(fc.integer({ min: -20, max: 80 }), { maxLength: 6 }),
    steps: fc.integer({ min: 0, max: 40 }),
  })
  .map(({ carriers, far, victims, steps }) => ({
    carriersMhz: [...carriers.map((step) => 600 + step * 0.025), ...far],
    victimsMhz: [...victims.map((step) => 600 + step * 0.025), ...far],
    withinMhz: steps * 0.025,
    kinds: ALL,
  }));

describe("intermodHits and intermodHitCounts", () => {
  it("find what brute force finds, edges included", () => {
    let hits = 0;
    fc.assert(
      fc.property(searches, (search) => {
        const expected = bruteHits(search);
        expect(hitsOf(search).sort()).toEqual([...expected].sort());
        const counts = search.victimsMhz.map(
          (_, victim) => expected.filter((hit) => hit.endsWith(` on ${victim}`)).length,
        );
        expect(intermodHitCounts(search)).toEqual(counts);
        hits += expected.length;
      }),
      SEEDED,
    );
    expect(hits).toBeGreaterThan(10_000);
  });

  it("find what lands on the mirror image, and no more, close to zero", () => {
    // 2·200 − 600 = −200; a victim at 0.01 MHz with 0.05 MHz of reach touches both sides of zero.
    const search = {
      carriersMhz: [200, 600, 300.02, 600.02],
      victimsMhz: [200, 0.01],
      withinMhz: 0.05,
      kinds: ALL,
    };
    expect(hitsOf(search).sort()).toEqual(bruteHits(search).sort());
    expect(hitsOf(search).length).toBeGreaterThan(1);
  });

  it("count four and six hits on four equally spaced carriers, and none on a ruler", () => {
    // Worked out independently by enumeration; 0-1-4-9-11 is a Golomb ruler, no difference twice.
    const onCarriers = (carriersMhz: readonly number[], kind: IntermodKind) =>
      intermodHitCounts({ carriersMhz, victimsMhz: carriersMhz, withinMhz: 0, kinds: [kind] });
    const total = (counts: readonly number[]) => counts.reduce((sum, count) => sum + count, 0);
    const equal = [1000, 1010, 1020, 1030];
    expect(total(onCarriers(equal, "2A-B"))).toBe(4);
    expect(total(onCarriers(equal, "A+B-C"))).toBe(6);
    const ruler = [0, 1, 4, 9, 11].map((mark) => 600 + mark * 0.4);
    for (const kind of THIRD_ORDER) expect(total(onCarriers(ruler, kind))).toBe(0);
  });

  it("say how far beside the victim a product lands", () => {
    const [hit] = intermodHits({
      carriersMhz: [600, 600.4],
      victimsMhz: [599.65],
      withinMhz: 0.1,
      kinds: ["2A-B"],
    });
    expect(hit?.frequencyMhz).toBe(599.6);
    expect(hit?.offsetMhz).toBe(-0.05);
    expect(hit?.carriers).toEqual([0, 1]);
  });

  it("agree with brute force for eighty carriers in two bands", () => {
    // In steps of 25 kHz; squares keep the differences from repeating.
    const steps = Array.from(
      { length: 80 },
      (_, index) =>
        (index % 2 === 0 ? 18_800 : 24_240) + ((index * index * 37 + index * 911) % 3520),
    );
    const carriersMhz = steps.map((step) => step * 0.025);
    const search = { carriersMhz, victimsMhz: carriersMhz, withinMhz: 0.1, kinds: THIRD_ORDER };
    // How many products land on each step: all ordered pairs, and all pairs with a third.
    const landed = new Map<number, number>();
    const land = (step: number) => landed.set(step, (landed.get(step) ?? 0) + 1);
    for (const [i, a] of steps.entries())
      for (const [j, b] of steps.entries()) {
        if (i !== j) land(2 * a - b);
        if (i < j) for (const [k, c] of steps.entries()) if (k !== i && k !== j) land(a + b - c);
      }
    // 0.1 MHz are four steps either way.
    const counts = steps.map((victim) =>
      [-4, -3, -2, -1, 0, 1, 2, 3, 4].reduce(
        (sum, off) => sum + (landed.get(victim + off) ?? 0),
        0,
      ),
    );
    expect(intermodHitCounts(search)).toEqual(counts);
    const hits = [...intermodHits(search)].length;
    expect(hits).toBe(counts.reduce((sum, count) => sum + count, 0));
    expect(hits).toBeGreaterThan(1000);
  });

  it("refuse what is out of range before the first hit", () => {
    const call =
      (find: (search: IntermodSearch) => unknown) =>
      ({ carrierMhz, victimMhz, withinMhz }: Readonly<Record<string, number>>) =>
        find({
          carriersMhz: [600, carrierMhz ?? 0],
          victimsMhz: [victimMhz ?? 0],
          withinMhz: withinMhz ?? -1,
          kinds: ALL,
        });
    const good = { carrierMhz: 601, victimMhz: 602, withinMhz: 0 };
    const outside = { carrierMhz: [0, -1, 4e6], victimMhz: [0, -1, 4e6], withinMhz: [-0.1, 4e6] };
    expectRefused("intermodHits", call(intermodHits), good, outside);
    expectRefused("intermodHitCounts", call(intermodHitCounts), good, outside);
  });
});
