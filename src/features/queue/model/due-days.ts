import type { ApplicationSummary } from '#shared/contracts/api.generated';
import { formatDay } from '#shared/format/dates';
import type { DueItem, RuleDay } from '../../../components/charts/due-rule-layout';
import { worstGrade, type Grade } from '../../../components/ui/grades';

const DAY_MS = 86_400_000;
/** Working days shown before today: those overdue by more stand at the first. */
const DAYS_BEFORE = 3;
const DAYS_AFTER = 21;

/** The calendar day of an instant where the reader is, YYYY-MM-DD. */
export function dayOf(instant: string | Date): string {
  const date = new Date(instant);
  const two = (n: number) => String(n).padStart(2, '0');
  return `${date.getFullYear()}-${two(date.getMonth() + 1)}-${two(date.getDate())}`;
}

const noon = (day: string) => new Date(`${day}T12:00:00`);
const step = (day: string, days: number) => dayOf(new Date(noon(day).getTime() + days * DAY_MS));
const isWeekday = (day: string) => ![0, 6].includes(noon(day).getDay());

/** Days of the week from one on, forwards or backwards, without Saturdays and Sundays. */
function weekdays(from: string, count: number, direction: 1 | -1): string[] {
  const days: string[] = [];
  for (let day = step(from, direction); days.length < count; day = step(day, direction)) {
    if (isWeekday(day)) days.push(day);
  }
  return direction === 1 ? days : days.reverse();
}

const isMonday = (day: string) => noon(day).getDay() === 1;

/** The rule's days around today; the first of each week carries its date. */
export function ruleDays(today: string): RuleDay[] {
  const days = [
    ...weekdays(today, DAYS_BEFORE, -1),
    ...(isWeekday(today) ? [today] : []),
    ...weekdays(today, DAYS_AFTER, 1),
  ];
  return days.map((date, i) => {
    const previous = days[i - 1];
    const weekStart = isMonday(date) || (previous !== undefined && weekOf(previous) !== weekOf(date));
    return { date, text: formatDay(noon(date)), weekStart };
  });
}

/** Weeks counted from a Monday long ago, so that a holiday on Monday gives the tall tick to Tuesday. */
const weekOf = (day: string) => Math.floor((noon(day).getTime() / DAY_MS + 3) / 7);

/** Each application that has a due day, with its worst grade. */
export function dueItems(items: readonly ApplicationSummary[]): DueItem<Grade>[] {
  return items.flatMap(({ id, dueAt, worstGrade: worst }) =>
    dueAt === null ? [] : [{ key: id, due: dayOf(dueAt), grade: worst ?? worstGrade({}) }],
  );
}
