/** Sets of steps within a decade, from coarse to fine. */
const STEP_SETS: readonly (readonly number[])[] = [
  [1],
  [1, 2, 5],
  [1, 1.5, 2, 3, 5, 7],
  [1, 1.2, 1.4, 1.6, 1.8, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 9],
];
const FEWEST = 3;

function within(steps: readonly number[], low: number, high: number): number[] {
  const ticks: number[] = [];
  for (let p = Math.floor(Math.log10(low)); p <= Math.ceil(Math.log10(high)); p += 1)
    for (const step of steps) {
      const value = Number((step * 10 ** p).toPrecision(6));
      if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) ticks.push(value);
    }
  return ticks;
}

/** Ticks of a logarithmic axis: powers of ten where three fit, else finer steps until three do. */
export function logTicks(low: number, high: number): number[] {
  for (const steps of STEP_SETS) {
    const ticks = within(steps, low, high);
    if (ticks.length >= FEWEST) return ticks;
  }
  return [low, high];
}

/** Unlabelled ticks: two to nine times every power of ten. */
export function minorTicks(low: number, high: number): number[] {
  return within([2, 3, 4, 5, 6, 7, 8, 9], low, high);
}

const NARROWEST = 4;
const AIR = 1.6;

/**
 * The range of a logarithmic axis that holds all values with some air. A curve that hardly moves still
 * gets a factor of four, so that a level line looks level.
 */
export function logDomain(values: readonly number[]): readonly [number, number] {
  const positive = values.filter((v) => Number.isFinite(v) && v > 0);
  if (positive.length === 0) return [0.1, 10];
  const low = Math.min(...positive) / AIR;
  const high = Math.max(...positive) * AIR;
  if (high / low >= NARROWEST) return [low, high];
  const middle = Math.sqrt(low * high);
  return [middle / Math.sqrt(NARROWEST), middle * Math.sqrt(NARROWEST)];
}

/** A frequency on the axis: "1 Hz", "10", "1 kHz", "1 MHz"; the unit stands where it changes. */
export function frequencyText(hz: number): string {
  if (hz >= 1e6) return `${hz / 1e6}${hz === 1e6 ? '\u2009MHz' : ''}`;
  if (hz >= 1e3) return `${hz / 1e3}${hz === 1e3 ? '\u2009kHz' : ''}`;
  return `${hz}${hz === 1 ? '\u2009Hz' : ''}`;
}
