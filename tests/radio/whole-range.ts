import fc from "fast-check";
import { expect } from "vitest";
import type { Limits } from "../../src/radio/limits.ts";
import { SEEDED, within } from "./samples.ts";

type Named<Name extends string> = Readonly<Record<Name, number>>;

/** Calls a function all over its range, both ends included, and expects a finite number each time. */
export function expectFinite<Name extends string>(
  limits: Readonly<Record<Name, Limits>>,
  call: (input: Named<Name>) => number,
): void {
  const names = Object.keys(limits) as Name[];
  const fields = Object.fromEntries(names.map((name) => [name, within(limits[name])]));
  let calls = 0;
  fc.assert(
    fc.property(fc.record(fields), (input) => {
      expect(Number.isFinite(call(input as Named<Name>))).toBe(true);
      calls += 1;
    }),
    SEEDED,
  );
  expect(calls).toBeGreaterThan(100);
}

/**
 * Hands a function, one argument at a time, what no argument may be and what lies just outside its
 * range, and expects a RangeError that names function, argument and value.
 */
export function expectRefusals<Input extends Readonly<Record<string, number>>>(
  functionName: string,
  limits: { readonly [Name in keyof Input]?: Limits },
  good: Input,
  call: (input: Input) => unknown,
): void {
  expect(() => call(good)).not.toThrow();
  const named = Object.entries<Limits | undefined>(limits);
  expect(named.length).toBeGreaterThan(0);
  for (const [name, range] of named) {
    if (range === undefined) throw new Error(`${name} has no limits`);
    const width = (range.max - range.min) * 1e-6;
    const bads = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];
    for (const bad of [...bads, range.min - width, range.max + width]) {
      let thrown: unknown;
      try {
        call({ ...good, [name]: bad });
      } catch (error) {
        thrown = error;
      }
      expect(thrown, `${functionName} with ${name} ${bad}`).toBeInstanceOf(RangeError);
      expect(String(thrown)).toContain(`RangeError: ${functionName}: ${name} must be from `);
      expect(String(thrown)).toContain(`, got ${bad}`);
    }
  }
}
