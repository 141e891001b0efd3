import fc from "fast-check";
import { expect } from "vitest";
import type { Limits } from "../../src/radio/limits.ts";
import { SEEDED, within } from "./samples.ts";

export type Ranges<Name extends string> = Readonly<Record<Name, Limits>>;
type Inputs<Name extends string> = Readonly<Record<Name, number>>;

/** Inputs that take whole numbers only. */
const isWhole = (name: string) => /(Count|^order)$/.test(name);

/** Anything that the ranges of a docstring allow, the ends included. */
export function anyOf<Name extends string>(ranges: Ranges<Name>): fc.Arbitrary<Inputs<Name>> {
  const models = Object.fromEntries(
    Object.entries<Limits>(ranges).map(([name, limits]) => [
      name,
      isWhole(name) ? fc.integer(limits) : within(limits),
    ]),
  );
  return fc.record(models) as fc.Arbitrary<Inputs<Name>>;
}

/** All inputs in range give finite numbers between two bounds, both allowed. */
export function expectWithin<Name extends string>(
  call: (inputs: Inputs<Name>) => number,
  ranges: Ranges<Name>,
  bounds: Limits,
): void {
  fc.assert(
    fc.property(anyOf(ranges), (inputs) => {
      const value = call(inputs);
      expect(Number.isFinite(value)).toBe(true);
      expect(value).toBeGreaterThanOrEqual(bounds.min);
      expect(value).toBeLessThanOrEqual(bounds.max);
    }),
    SEEDED,
  );
}

/** Each input in turn beyond either end, and what is no number: refused, with its name and value. */
export function expectRefusals<Name extends string>(
  call: (inputs: Inputs<Name>) => unknown,
  ranges: Ranges<Name>,
): void {
  const good = Object.fromEntries(
    Object.entries<Limits>(ranges).map(([name, { max }]) => [name, max]),
  ) as Inputs<Name>;
  expect(() => call(good)).not.toThrow();
  for (const [name, { min, max }] of Object.entries<Limits>(ranges)) {
    const step = (end: number) => (isWhole(name) ? 1 : Math.max(Math.abs(end) * 1e-6, 1e-12));
    const never = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
    const fractions = isWhole(name) ? [min + 0.5] : [];
    for (const bad of [...never, min - step(min), max + step(max), ...fractions]) {
      const refused = () => call({ ...good, [name]: bad });
      expect(refused, `${name} of ${bad}`).toThrow(RangeError);
      expect(refused).toThrow(`${name} must be`);
      expect(refused).toThrow(`got ${bad}`);
    }
  }
}
