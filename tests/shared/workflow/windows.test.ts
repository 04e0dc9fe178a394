import { describe, expect, it } from 'vitest';
import type { WorkCalendar } from '#shared/workflow/calendar';
import { openWindow, readWindow, reviewDaysUsed } from '#shared/workflow/windows';

const calendar: WorkCalendar = { timeZone: 'UTC', weekendDays: [0, 6], holidays: new Set() };
const at = (day: string) => new Date(`${day}T10:00:00Z`);

describe('windows', () => {
  it('reads used, granted and left', () => {
    const window = openWindow('review', at('2027-02-09'), 20, 0, calendar);
    expect(window.dueAt.toISOString().slice(0, 10)).toBe('2027-03-09');
    expect(readWindow(window, at('2027-03-04'), calendar)).toEqual({ used: 17, total: 20, left: 3 });
  });

  it('reads a closed window as of its closing', () => {
    const window = { ...openWindow('cure', at('2027-01-26'), 10, 0, calendar), closedAt: at('2027-02-08') };
    expect(readWindow(window, at('2027-06-01'), calendar)).toEqual({ used: 9, total: 10, left: 1 });
  });

  it('counts on when it is over', () => {
    const window = openWindow('review', at('2027-02-01'), 5, 0, calendar);
    expect(readWindow(window, at('2027-02-10'), calendar)).toEqual({ used: 7, total: 5, left: -2 });
  });

  it('keeps the review days used when a case is put back', () => {
    const filed = at('2027-02-01');
    const first = { ...openWindow('review', at('2027-02-02'), 20, 0, calendar), closedAt: at('2027-02-08') };
    const used = reviewDaysUsed([first], filed, at('2027-02-09'), calendar);
    expect(used).toBe(4);
    const second = openWindow('review', at('2027-02-10'), 20, used, calendar);
    expect(readWindow(second, at('2027-02-10'), calendar)).toEqual({ used: 4, total: 20, left: 16 });
    const again = { ...second, closedAt: at('2027-02-12') };
    expect(reviewDaysUsed([first, again], filed, at('2027-02-15'), calendar)).toBe(6);
  });

  it('starts anew after the next filing', () => {
    const first = { ...openWindow('review', at('2027-02-02'), 20, 0, calendar), closedAt: at('2027-02-08') };
    expect(reviewDaysUsed([first], at('2027-02-20'), at('2027-02-22'), calendar)).toBe(0);
  });

  it('is due at once when all its days are used', () => {
    const window = openWindow('review', at('2027-02-02'), 20, 25, calendar);
    expect(readWindow(window, at('2027-02-02'), calendar)).toEqual({ used: 20, total: 20, left: 0 });
  });
});
