import type { Limits } from "./limits.ts";

/**
 * Where a rising function reaches a wished value.
 *
 *     f(x) = wished, by halving the interval until its ends are neighbouring numbers
 *
 * Assumes: f does not fall anywhere between the limits. Not for: functions that are slow, it asks for
 * about 60 values and for more where the answer is tiny beside the interval.
 *
 * @param valueAt       The function, in whatever units
 * @param wished        The value to reach, in the unit of the function
 * @param limits        Where to look, in the unit of the argument; must enclose the answer
 * @returns             The argument, in its own unit
 * @throws RangeError   If the function does not reach the wished value between the limits, or one is NaN.
 * @accuracy            As the function: no neighbouring number comes nearer
 * @source              common practice, no source
 * @differs             none
 * @checkedBy           none published, see test
 */
export function solveRising(
  valueAt: (x: number) => number,
  wished: number,
  limits: Limits,
): number {
  let { min, max } = limits;
  if (!(valueAt(min) <= wished && valueAt(max) >= wished)) {
    throw new RangeError(
      `solveRising: wished must be reached from ${min} to ${max}, got ${wished}`,
    );
  }
  for (;;) {
    const middle = min + (max - min) / 2;
    if (middle <= min || middle >= max) return middle;
    if (valueAt(middle) < wished) min = middle;
    else max = middle;
  }
}
