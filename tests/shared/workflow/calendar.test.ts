import { describe, expect, it } from 'vitest';
import {
  dueAt,
  endOfDay,
  isTimeZone,
  isWorkingDay,
  localDay,
  workingDaysLeft,
} from '#shared/workflow/calendar';
import type { WorkCalendar } from '#shared/workflow/calendar';

const oslo = (holidays: string[] = []): WorkCalendar => ({
  timeZone: 'Europe/Oslo',
  weekendDays: [0, 6],
  holidays: new Set(holidays),
});

describe('localDay and endOfDay', () => {
  it.each([
    ['2027-03-04T22:59:59Z', 'Europe/Oslo', '2027-03-04'],
    ['2027-03-04T23:00:00Z', 'Europe/Oslo', '2027-03-05'],
    ['2027-03-04T23:00:00Z', 'America/Chicago', '2027-03-04'],
    ['2027-03-04T11:00:00Z', 'Pacific/Auckland', '2027-03-05'],
    ['2027-03-04T18:31:00Z', 'Asia/Kolkata', '2027-03-05'],
  ])('%s in %s is %s', (instant, zone, day) => {
    expect(localDay(new Date(instant), zone)).toBe(day);
  });

  it.each([
    ['2027-03-04', 'Europe/Oslo', '2027-03-04T22:59:59.000Z'],
    ['2027-07-04', 'Europe/Oslo', '2027-07-04T21:59:59.000Z'],
    // clocks go forward on 28 March 2027 and back on 31 October 2027 (European rule)
    ['2027-03-28', 'Europe/Oslo', '2027-03-28T21:59:59.000Z'],
    ['2027-10-31', 'Europe/Oslo', '2027-10-31T22:59:59.000Z'],
    ['2027-03-04', 'America/Chicago', '2027-03-05T05:59:59.000Z'],
    ['2027-03-04', 'Asia/Kolkata', '2027-03-04T18:29:59.000Z'],
  ])('%s ends in %s at %s', (day, zone, instant) => {
    expect(endOfDay(day, zone).toISOString()).toBe(instant);
  });

  it('knows a zone from a word', () => {
    expect(isTimeZone('America/Chicago')).toBe(true);
    expect(isTimeZone('Northmoor/Harrow')).toBe(false);
  });
});

describe('dueAt', () => {
  it('does not count the day of opening, nor weekends', () => {
    // Thursday 4 March 2027 + 5: Fri 5, Mon 8, Tue 9, Wed 10, Thu 11
    expect(localDay(dueAt(new Date('2027-03-04T09:00:00Z'), 5, oslo()), 'Europe/Oslo')).toBe('2027-03-11');
  });

  it('passes over holidays', () => {
    const due = dueAt(new Date('2027-03-04T09:00:00Z'), 5, oslo(['2027-03-08', '2027-03-09']));
    expect(localDay(due, 'Europe/Oslo')).toBe('2027-03-15');
  });

  it('opened on a weekend counts from Monday', () => {
    expect(localDay(dueAt(new Date('2027-03-06T09:00:00Z'), 1, oslo()), 'Europe/Oslo')).toBe('2027-03-08');
  });

  it('goes by the owner’s day, not by UTC’s', () => {
    // 23:30 UTC on Thursday is Friday in Oslo
    expect(localDay(dueAt(new Date('2027-03-04T23:30:00Z'), 1, oslo()), 'Europe/Oslo')).toBe('2027-03-08');
  });

  it('of no days ends with the day of opening', () => {
    expect(dueAt(new Date('2027-03-04T09:00:00Z'), 0, oslo()).toISOString()).toBe('2027-03-04T22:59:59.000Z');
  });

  it('says so when the calendar has no working day', () => {
    const none = { ...oslo(), weekendDays: [0, 1, 2, 3, 4, 5, 6] };
    expect(() => dueAt(new Date('2027-03-04T09:00:00Z'), 1, none)).toThrow(/no working days/);
  });
});

describe('workingDaysLeft', () => {
  const due = endOfDay('2027-03-09', 'Europe/Oslo');
  it.each([
    ['2027-03-04T10:00:00Z', 3],
    ['2027-03-06T10:00:00Z', 2],
    ['2027-03-09T22:59:00Z', 0],
    ['2027-03-09T23:00:00Z', -1],
    ['2027-03-11T10:00:00Z', -2],
    ['2027-03-13T10:00:00Z', -3],
  ])('at %s: %i', (now, left) => {
    expect(workingDaysLeft(new Date(now), due, oslo())).toBe(left);
  });

  it('is never minus zero', () => {
    // Saturday after a Friday: no working day has passed
    const friday = endOfDay('2027-03-05', 'Europe/Oslo');
    expect(Object.is(workingDaysLeft(new Date('2027-03-06T10:00:00Z'), friday, oslo()), 0)).toBe(true);
  });

  it('agrees with dueAt: as many left at opening as were granted', () => {
    for (let day = 1; day <= 28; day++) {
      const opened = new Date(Date.UTC(2027, 2, day, 9));
      for (const days of [1, 5, 10, 20]) {
        expect(workingDaysLeft(opened, dueAt(opened, days, oslo(['2027-03-25'])), oslo(['2027-03-25']))).toBe(
          days,
        );
      }
    }
  });
});

describe('isWorkingDay', () => {
  it.each([
    ['2027-03-05', true],
    ['2027-03-06', false],
    ['2027-03-07', false],
    ['2027-03-08', false],
  ])('%s: %s', (day, works) => {
    expect(isWorkingDay(day, oslo(['2027-03-08']))).toBe(works);
  });
});
