/** Seeded random numbers (mulberry32), so that every run plants the same lines. */
export interface Random {
  /** Even between two bounds. */
  between: (low: number, high: number) => number;
  /** One of a list. */
  pick: <T>(list: readonly T[]) => T;
  /** True with the given chance. */
  chance: (share: number) => boolean;
  /** A whole number from low to high, both included. */
  whole: (low: number, high: number) => number;
}

export function seeded(seed: number): Random {
  let state = seed >>> 0;
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const between = (low: number, high: number): number => low + next() * (high - low);
  return {
    between,
    pick: <T>(list: readonly T[]): T => {
      const item = list[Math.min(list.length - 1, Math.floor(next() * list.length))];
      if (item === undefined) throw new Error('nothing to pick from');
      return item;
    },
    chance: (share) => next() < share,
    whole: (low, high) => Math.floor(between(low, high + 1)),
  };
}

/** Rounds to a number of decimal places. */
export const toPlaces = (value: number, places: number): number => Number(value.toFixed(places));

/** Rounds to a number of significant digits. */
export const toDigits = (value: number, digits: number): number => Number(value.toPrecision(digits));
