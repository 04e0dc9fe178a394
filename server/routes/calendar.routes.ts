import { readCalendar } from '../repositories/calendar-versions.repository';
import { saveCalendar } from '../services/rules/save-calendar';
import { route } from './route';

/** The owner's working days: windows are reckoned in them. */
export const calendarRoutes = [
  route('getCalendar', {
    summary: 'Working days: time zone, weekend, holidays',
    access: { can: 'read', on: 'Calendar' },
    answers: { 200: 'calendar' },
    handler: ({ tx }) => readCalendar(tx.manager),
  }),
  route('saveCalendar', {
    summary: 'Working days from now on, with a reason',
    access: { can: 'update', on: 'Calendar' },
    answers: { 200: 'calendar' },
    versioned: true,
    idempotent: true,
    handler: ({ tx, body }) => saveCalendar(tx, body),
  }),
];
