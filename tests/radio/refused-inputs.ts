import { expect } from "vitest";

const NOT_FINITE = [Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY];

/**
 * Shows a function, one argument at a time, what it must refuse: what is not finite, and what lies
 * outside its range. The error has to name function, argument and value.
 */
export function expectRefused<Inputs extends Readonly<Record<string, number>>>(
  functionName: string,
  call: (inputs: Inputs) => unknown,
  good: Inputs,
  outside: Readonly<Partial<Record<keyof Inputs, readonly number[]>>>,
): void {
  expect(() => call(good)).not.toThrow();
  for (const name of Object.keys(good))
    for (const bad of [...NOT_FINITE, ...(outside[name] ?? [])]) {
      const refused = () => call({ ...good, [name]: bad });
      expect(refused, `${name} ${bad}`).toThrow(RangeError);
      expect(refused).toThrow(`${functionName}: ${name}`);
      expect(refused).toThrow(`got ${bad}`);
    }
}
