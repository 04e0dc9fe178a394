import { describe, expect, it } from 'vitest';
import { calendarForm, readCalendarForm } from '../../../../src/features/bands/model/calendar-form';

const CALENDAR = {
  version: 2,
  timeZone: 'Europe/Oslo',
  weekendDays: [0, 6],
  holidays: [
    { day: '2027-01-01', name: 'New Year' },
    { day: '2027-05-17', name: 'Constitution Day' },
  ],
};

describe('the calendar as it is typed', () => {
  it('comes back from its form', () => {
    const { version: _version, ...rest } = CALENDAR;
    expect(readCalendarForm(calendarForm(CALENDAR))).toEqual({ calendar: rest, faults: [] });
  });

  it('takes empty lines and any order', () => {
    const form = { ...calendarForm(CALENDAR), holidays: '\n2027-12-25 Christmas\n\n2027-01-01  New Year ' };
    expect(readCalendarForm(form).calendar.holidays.map((h) => h.day)).toEqual(['2027-01-01', '2027-12-25']);
  });

  it('names the lines that are no holidays, a zone that is none, and a week without work', () => {
    const form = {
      timeZone: 'Europe/Nowhere',
      weekendDays: [0, 1, 2, 3, 4, 5, 6],
      holidays: '2027-02-30 No day\n2027-03-01\n1.5.2027 May\n2027-05-01 May',
    };
    const { faults, calendar } = readCalendarForm(form);
    expect(faults.map((f) => f.field)).toEqual(['timeZone', 'weekendDays', 'holidays']);
    expect(faults.at(-1)?.message).toContain('Line 1, 2, 3');
    expect(calendar.holidays).toEqual([{ day: '2027-05-01', name: 'May' }]);
  });
});
