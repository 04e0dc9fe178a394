import type {
  Calendar as CalendarAnswer,
  SaveCalendarRequest,
} from '../../../shared/contracts/api.generated';
import { recordEvent } from '../../database/audit/record-event';
import type { Transaction } from '../../database/transaction';
import { Calendar, Holiday } from '../../entities/correspondence.entities';
import { invalidContent, stale } from '../../errors/problem';
import { readCalendar } from '../../repositories/calendar-versions.repository';

function requireTimeZone(timeZone: string): void {
  try {
    new Intl.DateTimeFormat('en', { timeZone });
  } catch {
    const message = `There is no time zone "${timeZone}".`;
    throw invalidContent([
      { pointer: '/timeZone', value: timeZone, expected: 'a name such as Europe/Oslo', message },
    ]);
  }
}

function requireSingleDays(holidays: SaveCalendarRequest['holidays']): void {
  const seen = new Set<string>();
  holidays.forEach(({ day }, index) => {
    if (seen.has(day)) {
      const message = `${day} stands there twice.`;
      throw invalidContent([
        { pointer: `/holidays/${index}/day`, value: day, expected: 'each day once', message },
      ]);
    }
    seen.add(day);
  });
}

/** A new version of the working days. Windows that are open keep the due instants they were given. */
export async function saveCalendar(tx: Transaction, request: SaveCalendarRequest): Promise<CalendarAnswer> {
  const { version, reason, timeZone, weekendDays, holidays } = request;
  requireTimeZone(timeZone);
  requireSingleDays(holidays);
  const before = await readCalendar(tx.manager);
  if (before.version !== version) {
    throw stale('Somebody has changed the calendar in the meantime.', { currentVersion: before.version });
  }
  // Two at once both arrive here; the version is unique, so the second is refused by the database.
  const made = await tx.manager.insert(Calendar, {
    version: version + 1,
    timeZone,
    weekendDays,
    createdAt: tx.now,
  });
  const calendarId = String(made.identifiers[0]?.id);
  if (holidays.length > 0) {
    await tx.manager.insert(
      Holiday,
      holidays.map(({ day, name }) => ({ calendarId, day, name })),
    );
  }
  const after = await readCalendar(tx.manager);
  recordEvent(tx, { act: 'calendar.changed', before, after: { ...after, reason } });
  return after;
}
