import type { Calendar } from '#shared/contracts/api.generated';
import { isTimeZone } from '#shared/workflow/calendar';

/** The calendar as it is typed: holidays one a line, day first. */
export interface CalendarForm {
  timeZone: string;
  weekendDays: readonly number[];
  holidays: string;
}

export const WEEKDAYS = [
  'Sunday',
  'Monday',
  'Tuesday',
  'Wednesday',
  'Thursday',
  'Friday',
  'Saturday',
] as const;

export function calendarForm({ timeZone, weekendDays, holidays }: Calendar): CalendarForm {
  return { timeZone, weekendDays, holidays: holidays.map(({ day, name }) => `${day} ${name}`).join('\n') };
}

export interface CalendarFault {
  field: keyof CalendarForm;
  message: string;
}

const LINE = /^(\d{4}-\d{2}-\d{2})\s+(\S.*)$/;

const isDay = (text: string) => {
  const date = new Date(`${text}T12:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(text);
};

/** Reads the holidays; a line that is none is given back by its number. */
function readHolidays(text: string): { holidays: Calendar['holidays']; wrong: number[] } {
  const holidays: Calendar['holidays'] = [];
  const wrong: number[] = [];
  text.split('\n').forEach((line, i) => {
    if (line.trim() === '') return;
    const [, day, name] = LINE.exec(line.trim()) ?? [];
    if (day === undefined || name === undefined || !isDay(day)) wrong.push(i + 1);
    else holidays.push({ day, name });
  });
  return { holidays: holidays.sort((a, b) => a.day.localeCompare(b.day)), wrong };
}

/** The calendar that a form stands for, and what is wrong with it. */
export function readCalendarForm(form: CalendarForm): {
  calendar: Omit<Calendar, 'version'>;
  faults: CalendarFault[];
} {
  const { holidays, wrong } = readHolidays(form.holidays);
  const faults: CalendarFault[] = [
    ...(isTimeZone(form.timeZone)
      ? []
      : [{ field: 'timeZone' as const, message: 'Write a time zone such as Europe/Oslo.' }]),
    ...(form.weekendDays.length < 7
      ? []
      : [{ field: 'weekendDays' as const, message: 'At least one day of the week has to be worked.' }]),
    ...(wrong.length === 0
      ? []
      : [
          {
            field: 'holidays' as const,
            message: `Line ${wrong.join(', ')}: write the day as YYYY-MM-DD and a name behind it.`,
          },
        ]),
  ];
  const calendar = { timeZone: form.timeZone.trim(), weekendDays: [...form.weekendDays].sort(), holidays };
  return { calendar, faults };
}
