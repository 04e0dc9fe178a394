import { describe, expect, it } from 'vitest';
import type { ApplicationSummary } from '#shared/contracts/api.generated';
import { dueItems, ruleDays, workCalendar } from '../../../../src/features/queue/model/due-days';

const CALENDAR = workCalendar({
  version: 1,
  timeZone: 'Europe/Oslo',
  weekendDays: [0, 6],
  holidays: [{ day: '2027-03-22', name: 'A holiday' }],
});

describe('the rule of due days', () => {
  it('leaves weekends and holidays out and dates the first day of each week', () => {
    const days = ruleDays('2027-03-04', CALENDAR);
    expect(days.slice(0, 7).map((d) => d.date)).toEqual([
      '2027-03-01',
      '2027-03-02',
      '2027-03-03',
      '2027-03-04',
      '2027-03-05',
      '2027-03-08',
      '2027-03-09',
    ]);
    expect(days.filter((d) => d.weekStart).map((d) => d.text)).toEqual([
      '1 Mar',
      '8 Mar',
      '15 Mar',
      '23 Mar',
      '29 Mar',
      '5 Apr',
    ]);
  });

  it('goes on when today is a Sunday', () => {
    const dates = ruleDays('2027-03-07', CALENDAR).map((d) => d.date);
    expect(dates).not.toContain('2027-03-07');
    expect(dates).toContain('2027-03-08');
  });

  it('stands the worst grade on the due day, in balance where nothing is found', () => {
    const item = (over: Partial<ApplicationSummary>) =>
      ({ id: 'a', dueAt: '2027-03-09T12:00:00Z', worstGrade: null, ...over }) as ApplicationSummary;
    expect(
      dueItems([item({}), item({ id: 'b', worstGrade: 'explain' }), item({ dueAt: null })], CALENDAR),
    ).toEqual([
      { key: 'a', due: '2027-03-09', grade: 'in-balance' },
      { key: 'b', due: '2027-03-09', grade: 'explain' },
    ]);
  });
});
