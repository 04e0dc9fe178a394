import { describe, expect, it } from 'vitest';
import {
  formatDate,
  formatDay,
  formatInstant,
  formatTime,
  leftInTable,
  leftInWords,
} from '#shared/format/dates';

describe('dates', () => {
  it('are written as days of a place', () => {
    expect(formatDate('2027-03-04T12:00:00Z', 'UTC')).toBe('4 Mar 2027');
    expect(formatDate('2027-03-04T23:30:00Z', 'Europe/Oslo')).toBe('5 Mar 2027');
    expect(formatDay('2026-12-31T12:00:00Z', 'UTC')).toBe('31 Dec');
    expect(formatTime('2027-03-04T00:06:00Z', 'UTC')).toBe('00:06');
    expect(formatInstant(new Date('2027-03-04T14:06:00Z'), 'UTC')).toBe('4 Mar 2027, 14:06');
  });

  it('refuse what is no instant', () => {
    expect(() => formatDate('soon')).toThrow(RangeError);
  });

  it('count what is left in working days', () => {
    expect([3, 1, 0, -1, -2].map(leftInWords)).toEqual([
      '3 working days left',
      '1 working day left',
      'due today',
      '1 working day over',
      '2 working days over',
    ]);
    expect([3, 0, -2].map(leftInTable)).toEqual(['3 left', 'today', '2 over']);
  });
});
