/**
 * Working days of the owner's calendar.
 *
 * A window of n working days that is opened on a day ends with the n-th working day after it: the day of opening does
 * not count, the last one counts to its end. Days are days of the owner's time zone, whoever asks from wherever.
 */

/** The owner's calendar. */
export interface WorkCalendar {
  /** IANA time zone, such as Europe/Oslo. */
  timeZone: string;
  /** Days of the week without work; 0 is Sunday. */
  weekendDays: readonly number[];
  /** Days without work, as YYYY-MM-DD. */
  holidays: ReadonlySet<string>;
}

const DAY_MS = 86_400_000;
const MINUTE_MS = 60_000;
/** A window that finds no working day in so many days has a calendar without any. */
const SEARCH_LIMIT_DAYS = 4_000;

/** Formatters are costly to make and a server meets a handful of zones. */
const formatters = new Map<string, Intl.DateTimeFormat>();

function formatterFor(timeZone: string): Intl.DateTimeFormat {
  let formatter = formatters.get(timeZone);
  if (formatter === undefined) {
    formatter = new Intl.DateTimeFormat('en-CA', {
      timeZone,
      hourCycle: 'h23',
      year: 'numeric',
      month: '2-digit',
      day: '2-digit',
      hour: '2-digit',
      minute: '2-digit',
      second: '2-digit',
    });
    formatters.set(timeZone, formatter);
  }
  return formatter;
}

/** The clock on the wall, read as if it were UTC: differences to the instant are the zone's offset. */
function wallClockMs(instant: Date, timeZone: string): number {
  const read: Record<string, number> = {};
  for (const part of formatterFor(timeZone).formatToParts(instant)) read[part.type] = Number(part.value);
  const { year = 0, month = 1, day = 1, hour = 0, minute = 0, second = 0 } = read;
  return Date.UTC(year, month - 1, day, hour, minute, second);
}

/**
 * The calendar day of an instant in a zone.
 * @param instant the instant
 * @param timeZone IANA time zone
 * @returns YYYY-MM-DD
 * @throws RangeError for an unknown zone or an invalid date
 */
export function localDay(instant: Date, timeZone: string): string {
  return new Date(wallClockMs(instant, timeZone)).toISOString().slice(0, 10);
}

/**
 * The last second of a day in a zone.
 * @param day YYYY-MM-DD
 * @param timeZone IANA time zone
 * @returns the instant at which its clocks show 23:59:59
 * @throws RangeError for an unknown zone or an invalid day
 */
export function endOfDay(day: string, timeZone: string): Date {
  const wall = Date.parse(`${day}T23:59:59Z`);
  let guess = wall;
  // the offset is asked for at the guess itself, which settles in two rounds even where clocks change that night
  for (let round = 0; round < 3; round++) {
    guess -= wallClockMs(new Date(guess), timeZone) - wall;
  }
  return new Date(guess);
}

/**
 * Tells whether a day is worked.
 * @param day YYYY-MM-DD
 * @param calendar the owner's calendar
 * @returns false on weekend days and holidays
 */
export function isWorkingDay(day: string, calendar: WorkCalendar): boolean {
  return !calendar.weekendDays.includes(weekday(day)) && !calendar.holidays.has(day);
}

/**
 * When a window ends.
 * @param openedAt when it was opened
 * @param workingDays how many working days it grants; 0 ends it with the day of opening
 * @param calendar the owner's calendar
 * @returns the last second of its last working day
 * @throws RangeError when the calendar has no working days
 */
export function dueAt(openedAt: Date, workingDays: number, calendar: WorkCalendar): Date {
  let day = localDay(openedAt, calendar.timeZone);
  let searched = 0;
  for (let granted = 0; granted < workingDays;) {
    if (++searched > SEARCH_LIMIT_DAYS) throw new RangeError('the calendar has no working days');
    day = nextDay(day);
    if (isWorkingDay(day, calendar)) granted++;
  }
  return endOfDay(day, calendar.timeZone);
}

/**
 * Working days that are left of a window.
 * @param now the instant to count from
 * @param due when the window ends
 * @param calendar the owner's calendar
 * @returns working days after today up to the due day; 0 on the due day; negative by the working days since
 */
export function workingDaysLeft(now: Date, due: Date, calendar: WorkCalendar): number {
  const today = localDay(now, calendar.timeZone);
  const last = localDay(due, calendar.timeZone);
  const count = today <= last ? countBetween(today, last, calendar) : -countBetween(last, today, calendar);
  // −0 would print as "−0 left"
  return count === 0 ? 0 : count;
}

/** Working days after one day up to and with another, later one. */
function countBetween(after: string, upTo: string, calendar: WorkCalendar): number {
  let count = 0;
  for (let day = nextDay(after); day <= upTo; day = nextDay(day)) {
    if (isWorkingDay(day, calendar)) count++;
  }
  return count;
}

function weekday(day: string): number {
  return new Date(`${day}T12:00:00Z`).getUTCDay();
}

/** Noon of UTC keeps clear of every clock change. */
function nextDay(day: string): string {
  return new Date(Date.parse(`${day}T12:00:00Z`) + DAY_MS).toISOString().slice(0, 10);
}

/**
 * Tells whether a name is a time zone that dates can be reckoned in.
 * @param timeZone name to try
 * @returns false when the platform does not know it
 */
export function isTimeZone(timeZone: string): boolean {
  try {
    return wallClockMs(new Date(MINUTE_MS), timeZone) >= -DAY_MS;
  } catch {
    return false;
  }
}
