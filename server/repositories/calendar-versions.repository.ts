import type { EntityManager } from 'typeorm';
import type { Calendar as CalendarAnswer } from '../../shared/contracts/api.generated';
import { Calendar, Holiday } from '../entities/correspondence.entities';

/** The newest version of the owner's calendar, with the holidays' names. */
export async function readCalendar(manager: EntityManager): Promise<CalendarAnswer> {
  const [stored] = await manager.find(Calendar, { order: { version: 'DESC' }, take: 1 });
  if (!stored) throw new Error('the owner has no calendar');
  const { id, version, timeZone, weekendDays } = stored;
  const holidays = await manager.find(Holiday, { where: { calendarId: id }, order: { day: 'ASC' } });
  return { version, timeZone, weekendDays, holidays: holidays.map(({ day, name }) => ({ day, name })) };
}
