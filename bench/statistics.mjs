/** Value below which a share of the samples lies, by linear interpolation between neighbours. */
export function quantile(samples, share) {
  if (samples.length === 0) throw new RangeError("quantile: samples: none given");
  const sorted = [...samples].sort((a, b) => a - b);
  const position = share * (sorted.length - 1);
  const below = Math.floor(position);
  const above = Math.ceil(position);
  return sorted[below] + (sorted[above] - sorted[below]) * (position - below);
}

export const median = (samples) => quantile(samples, 0.5);

/** Median of the ratios of samples taken next to each other: a drift of the machine cancels out. */
export const pairRatio = (ours, theirs) => median(ours.map((ms, index) => ms / theirs[index]));
