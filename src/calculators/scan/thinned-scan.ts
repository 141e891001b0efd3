import { requireRange } from "../../radio/require-range.ts";
import type { ScanPoints } from "./scan.ts";

/** What of a scan is drawn, and on how many columns of the picture. */
export interface ScanWindow {
  readonly fromMhz: number;
  readonly toMhz: number;
  readonly columnCount: number;
}

/** Columns that hold points, from the left, with the lowest and the highest level in each. */
export interface ThinnedScan {
  readonly column: Uint32Array;
  readonly lowest: Float64Array;
  readonly highest: Float64Array;
}

const COLUMN_LIMITS = { min: 1, max: 10_000 };
/** [MHz] */
const WINDOW_LIMITS = { min: 0, max: 3e6 };

/**
 * A scan for drawing: a line from lowest to highest in each column of the picture. No peak is lost,
 * however narrow; a column without points is left out, so that a gap in the scan can stay one.
 *
 * @param points       Rising frequencies and their levels
 * @param window       fromMhz below toMhz, 0 to 3 000 000; columnCount 1 to 10 000; both ends are drawn
 * @throws RangeError  If the window is empty, a value lies outside its range or is NaN.
 */
export function thinnedScan(
  { frequencyMhz, level }: ScanPoints,
  { fromMhz, toMhz, columnCount }: ScanWindow,
): ThinnedScan {
  requireRange("thinnedScan", COLUMN_LIMITS, { columnCount });
  requireRange("thinnedScan", WINDOW_LIMITS, { fromMhz, toMhz });
  if (!(fromMhz < toMhz))
    throw new RangeError(`thinnedScan: fromMhz must be below toMhz, got ${fromMhz} and ${toMhz}`);
  const column: number[] = [];
  const lowest: number[] = [];
  const highest: number[] = [];
  for (let place = firstAtLeast(frequencyMhz, fromMhz); place < frequencyMhz.length; place += 1) {
    const frequency = frequencyMhz[place] ?? Number.POSITIVE_INFINITY;
    if (frequency > toMhz) break;
    const value = level[place] ?? Number.NaN;
    const share = (frequency - fromMhz) / (toMhz - fromMhz);
    const at = Math.min(Math.floor(share * columnCount), columnCount - 1);
    const last = column.length - 1;
    if (column[last] === at) {
      lowest[last] = Math.min(lowest[last] ?? value, value);
      highest[last] = Math.max(highest[last] ?? value, value);
    } else {
      column.push(at);
      lowest.push(value);
      highest.push(value);
    }
  }
  return {
    column: Uint32Array.from(column),
    lowest: Float64Array.from(lowest),
    highest: Float64Array.from(highest),
  };
}

/** The first place whose value is not below the wanted one, by halving. */
function firstAtLeast(rising: Float64Array, wanted: number): number {
  let low = 0;
  let high = rising.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((rising[middle] ?? wanted) < wanted) low = middle + 1;
    else high = middle;
  }
  return low;
}
