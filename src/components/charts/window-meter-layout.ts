/** A notch on the meter's rule; every fifth is taller. */
export interface Notch {
  x: number;
  tall: boolean;
}

export interface MeterLayout {
  /** Where the window ends. */
  end: number;
  width: number;
  used: number;
  /** Length run past the frame, to the tip of its arrowhead; 0 while in time. */
  over: number;
  notches: readonly Notch[];
  near: boolean;
}

const START = 1;
/** Days past the frame beyond which the arrow grows no longer; the words beside it say how many. */
const LONGEST_OVER = 4;
const NEAR_DAYS = 3;

/** The window meter's measures at so many pixels a day; `used` beyond `total` is overdue. */
export function layOutMeter(used: number, total: number, perDay: number): MeterLayout {
  const end = START + total * perDay;
  const inside = Math.min(Math.max(used, 0), total);
  const overdue = Math.max(used - total, 0);
  const over = overdue > 0 ? Math.min(overdue, LONGEST_OVER) * perDay + 5 : 0;
  return {
    end,
    width: end + over + 2,
    used: inside * perDay,
    over,
    near: total - used <= NEAR_DAYS,
    notches: Array.from({ length: Math.max(total - 1, 0) }, (_, i) => ({
      x: START + (i + 1) * perDay,
      tall: (i + 1) % 5 === 0,
    })),
  };
}
