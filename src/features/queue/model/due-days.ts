import type { ApplicationSummary, Calendar } from '#shared/contracts/api.generated';
import { formatDay } from '#shared/format/dates';
import { isWorkingDay, localDay, type WorkCalendar } from '#shared/workflow/calendar';
import type { DueItem, RuleDay } from '../../../components/charts/due-rule-layout';
import { worstGrade, type Grade } from '../../../components/ui/grades';

const DAY_MS = 86_400_000;
/** Working days shown before today: those overdue by more stand at the first. */
const DAYS_BEFORE = 3;
const DAYS_AFTER = 21;
/** A calendar without working days would be searched for ever. */
const SEARCH_DAYS = 400;

/** The owner's calendar as the workflow reckons with it. */
export function workCalendar({ timeZone, weekendDays, holidays }: Calendar): WorkCalendar {
  return { timeZone, weekendDays, holidays: new Set(holidays.map(({ day }) => day)) };
}

const noon = (day: string) => new Date(`${day}T12:00:00Z`);
const step = (day: string, days: number) =>
  new Date(noon(day).getTime() + days * DAY_MS).toISOString().slice(0, 10);

/** Working days from a day on, forwards or backwards. */
function workingDays(from: string, count: number, direction: 1 | -1, calendar: WorkCalendar): string[] {
  const days: string[] = [];
  for (let i = 1; days.length < count && i < SEARCH_DAYS; i += 1) {
    const day = step(from, direction * i);
    if (isWorkingDay(day, calendar)) days.push(day);
  }
  return direction === 1 ? days : days.reverse();
}

/** Weeks counted from a Monday long ago, so that after a holiday on Monday the tall tick stands at Tuesday. */
const weekOf = (day: string) => Math.floor((noon(day).getTime() / DAY_MS + 3) / 7);
const isMonday = (day: string) => noon(day).getUTCDay() === 1;

/** The rule's days around today; the first of each week carries its date. */
export function ruleDays(today: string, calendar: WorkCalendar): RuleDay[] {
  const days = [
    ...workingDays(today, DAYS_BEFORE, -1, calendar),
    ...(isWorkingDay(today, calendar) ? [today] : []),
    ...workingDays(today, DAYS_AFTER, 1, calendar),
  ];
  return days.map((date, i) => {
    const previous = days[i - 1];
    const weekStart = isMonday(date) || (previous !== undefined && weekOf(previous) !== weekOf(date));
    return { date, text: formatDay(noon(date), 'UTC'), weekStart };
  });
}

/** Each application that has a due day, with its worst grade. */
export function dueItems(
  items: readonly ApplicationSummary[],
  { timeZone }: Pick<WorkCalendar, 'timeZone'>,
): DueItem<Grade>[] {
  return items.flatMap(({ id, dueAt, worstGrade: worst }) =>
    dueAt === null
      ? []
      : [{ key: id, due: localDay(new Date(dueAt), timeZone), grade: worst ?? worstGrade({}) }],
  );
}
