/** One bar of a histogram. */
export interface Bin {
  from: number;
  to: number;
  count: number;
}

/** Sorts values into bins of equal width over a scale; what lies beyond goes to the bins at its ends. */
export function binValues(
  values: readonly number[],
  [low, high]: readonly [number, number],
  count: number,
): Bin[] {
  const step = (high - low) / count;
  const bins = Array.from({ length: count }, (_, i) => ({
    from: low + i * step,
    to: low + (i + 1) * step,
    count: 0,
  }));
  for (const value of values) {
    const index = Math.min(Math.max(Math.floor((value - low) / step), 0), count - 1);
    const bin = bins[index];
    if (bin) bin.count += 1;
  }
  return bins;
}

/** Heights by the square root, so that single values beside a crowd are still seen; 0 to 1. */
export function rootHeights(bins: readonly Bin[]): number[] {
  const most = Math.max(1, ...bins.map((bin) => bin.count));
  return bins.map((bin) => Math.sqrt(bin.count / most));
}
