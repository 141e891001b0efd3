import type { Limits } from "./limits.ts";

/**
 * Stops a programmer's mistake before it can turn into a wrong figure.
 *
 *     min ≤ value ≤ max, asked so that NaN fails too
 *
 * Assumes: the value does not come straight from a user. Not for: typed text, which gets an outcome.
 *
 * @param functionName  Name of the function that was called, for the message
 * @param limits        Range that the argument must lie in, in its own unit; both ends allowed
 * @param args          The argument under its name: `{ distanceM }`; several may share the limits
 * @returns             nothing
 * @throws RangeError   If a value lies outside or is NaN; names function, argument and value.
 * @accuracy            exact
 * @source              none
 * @differs             none
 * @checkedBy           none published, see test
 */
export function requireRange(
  functionName: string,
  limits: Limits,
  args: Readonly<Record<string, number>>,
): void {
  for (const [name, value] of Object.entries(args)) {
    if (!(value >= limits.min && value <= limits.max)) {
      throw new RangeError(
        `${functionName}: ${name} must be from ${limits.min} to ${limits.max}, got ${value}`,
      );
    }
  }
}
