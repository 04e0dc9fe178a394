import type { EntityManager } from 'typeorm';
import { Calendar, Holiday } from '../entities/correspondence.entities';
import type { WorkCalendar } from '../../shared/workflow/calendar';
import type { WindowDays } from '../../shared/workflow/windows';
import { currentRuleSet } from './rule-set.repository';

/** The owner's calendar as it stands now, with its version. */
export async function currentCalendar(
  manager: EntityManager,
): Promise<{ version: number; calendar: WorkCalendar }> {
  const [stored] = await manager.find(Calendar, { order: { version: 'DESC' }, take: 1 });
  if (stored === undefined) throw new Error('the owner has no calendar');
  const holidays = await manager.findBy(Holiday, { calendarId: stored.id });
  const { version, timeZone, weekendDays } = stored;
  return {
    version,
    calendar: { timeZone, weekendDays, holidays: new Set(holidays.map((holiday) => holiday.day)) },
  };
}

/** Working days that each window grants, as the owner has set them. */
export async function windowDays(manager: EntityManager): Promise<WindowDays> {
  return (await currentRuleSet(manager)).settings.windowDays;
}
