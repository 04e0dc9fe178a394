/**
 * Values of one number at which a function is zero: scans a grid for changes of sign, then closes in by halving and
 * chords.
 *
 * @param difference the function; null where it has no value
 * @param grid values in rising order
 * @param steps refinements of each root
 * @returns the roots found
 */
export function fitOne(
  difference: (value: number) => number | null,
  grid: readonly number[],
  steps = 12,
): number[] {
  const roots: number[] = [];
  let lastValue = NaN;
  let last: number | null = null;
  for (const value of grid) {
    const here = difference(value);
    if (here !== null && last !== null && here * last <= 0) {
      roots.push(closeIn(difference, lastValue, last, value, here, steps));
    }
    lastValue = value;
    last = here;
  }
  return roots;
}

function closeIn(
  difference: (value: number) => number | null,
  low: number,
  atLow: number,
  high: number,
  atHigh: number,
  steps: number,
): number {
  let [a, fa, b, fb] = [low, atLow, high, atHigh];
  for (let step = 0; step < steps; step++) {
    // Illinois: a chord, with the stale end's weight halved so that both ends move.
    const middle = fa === fb ? (a + b) / 2 : b - (fb * (b - a)) / (fb - fa);
    const value = difference(middle);
    if (value === null || value === 0 || Math.abs(b - a) < 1e-12) return middle;
    if (value * fb < 0) [a, fa] = [b, fb];
    else fa /= 2;
    [b, fb] = [middle, value];
  }
  return b;
}

/** A grid of values in equal steps, or in equal ratios. */
export function gridOf(low: number, high: number, count: number, isLog = false): number[] {
  return Array.from({ length: count }, (_, index) => {
    const share = index / (count - 1);
    return isLog ? low * (high / low) ** share : low + share * (high - low);
  });
}
