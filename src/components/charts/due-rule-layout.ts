/** A working day on the rule. */
export interface RuleDay {
  /** ISO date. */
  date: string;
  /** How it is written under its tick. */
  text: string;
  /** First working day of its week: a taller tick with its date. */
  weekStart: boolean;
}

export interface DueItem<G> {
  key: string;
  /** ISO date of the day it is due. */
  due: string;
  grade: G;
}

export interface Standing<G> {
  key: string;
  x: number;
  /** Level from the rule upwards. */
  level: number;
  grade: G;
}

export interface RuleLayout<G> {
  days: readonly { x: number; text: string; weekStart: boolean }[];
  start: number;
  end: number;
  todayX: number | null;
  standing: readonly Standing<G>[];
  /** Days whose stack is cut: how many more are due there. */
  more: readonly { x: number; count: number }[];
  /** Items due after the last day shown. */
  later: number;
}

const MARGIN = 26;
const LEAST_DAY = 25;
const WIDEST_DAY = 32.4;
const LEVELS = 3;

/** The last shown day that is not after the due day; what was due before the first stands on the first. */
function indexOfDay(days: readonly RuleDay[], due: string): number {
  let index = 0;
  days.forEach((day, i) => {
    if (day.date <= due) index = i;
  });
  return index;
}

/** Places every item on its due day, stacked upwards; as many days are shown as the width holds. */
export function layOutRule<G>(
  allDays: readonly RuleDay[],
  today: string,
  items: readonly DueItem<G>[],
  width: number,
): RuleLayout<G> {
  const room = width - 2 * MARGIN;
  const held = Math.min(allDays.length, Math.max(2, Math.floor(room / LEAST_DAY) + 1));
  const shown = allDays.slice(0, held);
  const perDay = Math.min(WIDEST_DAY, room / Math.max(held - 1, 1));
  const x = (index: number) => MARGIN + index * perDay;
  const last = shown.at(-1)?.date ?? today;
  const byDay = new Map<number, DueItem<G>[]>();
  for (const item of items.filter(({ due }) => due <= last)) {
    const index = indexOfDay(shown, item.due);
    byDay.set(index, [...(byDay.get(index) ?? []), item]);
  }
  const standing: Standing<G>[] = [];
  const more: { x: number; count: number }[] = [];
  for (const [index, due] of byDay) {
    const cut = due.length > LEVELS ? LEVELS - 1 : due.length;
    due.slice(0, cut).forEach(({ key, grade }, level) => standing.push({ key, x: x(index), level, grade }));
    if (due.length > cut) more.push({ x: x(index), count: due.length - cut });
  }
  const todayIndex = shown.findIndex((day) => day.date >= today);
  return {
    days: shown.map(({ text, weekStart }, i) => ({ x: x(i), text, weekStart })),
    start: x(0),
    end: x(held - 1),
    todayX: todayIndex < 0 ? null : x(todayIndex),
    standing,
    more,
    later: items.filter(({ due }) => due > last).length,
  };
}
