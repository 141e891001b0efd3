/** Points as they were read: the first `count` places hold them. */
export interface ReadPoints {
  readonly frequencies: Float64Array;
  readonly levels: Float64Array;
  readonly count: number;
}

/**
 * The points by rising frequency, each frequency once with the highest of its levels: a carrier that
 * one of two overlapping sweeps has seen must stay.
 */
export function sortedPoints({ frequencies, levels, count }: ReadPoints): {
  readonly frequencies: Float64Array;
  readonly levels: Float64Array;
  readonly duplicateCount: number;
} {
  const order = orderOf(frequencies.subarray(0, count));
  const sorted = new Float64Array(count);
  const highest = new Float64Array(count);
  let kept = 0;
  for (const place of order) {
    const frequency = frequencies[place] ?? Number.NaN;
    const level = levels[place] ?? Number.NaN;
    const previous = kept - 1;
    if (sorted[previous] === frequency) {
      highest[previous] = Math.max(highest[previous] ?? level, level);
    } else {
      sorted[kept] = frequency;
      highest[kept] = level;
      kept += 1;
    }
  }
  return {
    frequencies: sorted.slice(0, kept),
    levels: highest.slice(0, kept),
    duplicateCount: count - kept,
  };
}

/** The places in the order of their values; most scans rise or fall, which takes no sorting. */
function orderOf(values: Float64Array): Uint32Array {
  const order = Uint32Array.from(values, (_, place) => place);
  const at = (place: number) => values[place] ?? Number.NaN;
  const isMonotone = (sign: number) => {
    for (let place = 1; place < values.length; place += 1)
      if (sign * at(place - 1) > sign * at(place)) return false;
    return true;
  };
  if (isMonotone(1)) return order;
  return isMonotone(-1) ? order.reverse() : order.sort((one, two) => at(one) - at(two));
}
