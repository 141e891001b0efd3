import type { Limits } from "./limits.ts";
import { requireRange } from "./require-range.ts";

/**
 * Stops counts that are no whole numbers, besides those outside their range.
 *
 *     min ≤ value ≤ max, value a whole number
 *
 * Assumes: the value does not come straight from a user. Not for: typed text, which gets an outcome.
 *
 * @param functionName  Name of the function that was called, for the message
 * @param limits        Range that the argument must lie in; both ends allowed
 * @param args          The argument under its name: `{ branchCount }`; several may share the limits
 * @returns             nothing
 * @throws RangeError   If a value is not whole, lies outside or is NaN; names function, argument and value.
 * @accuracy            exact
 * @source              none
 * @differs             none
 * @checkedBy           none published, see test
 */
export function requireWhole(
  functionName: string,
  limits: Limits,
  args: Readonly<Record<string, number>>,
): void {
  requireRange(functionName, limits, args);
  for (const [name, value] of Object.entries(args)) {
    if (!Number.isInteger(value)) {
      throw new RangeError(`${functionName}: ${name} must be a whole number, got ${value}`);
    }
  }
}
