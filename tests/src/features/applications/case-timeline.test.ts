import { describe, expect, it } from 'vitest';
import { caseTimeline, timelineEntries } from '../../../../src/features/applications/model/case-timeline';
import { aWindow, anApplication } from './case';

const at = (day: string) => new Date(`${day}T10:00:00Z`).getTime();
const windows = [
  aWindow('take-up', '2027-01-19T10:00:00Z', '2027-01-20T10:00:00Z'),
  aWindow('review', '2027-01-20T10:00:00Z', '2027-01-27T10:00:00Z'),
  aWindow('cure', '2027-01-27T10:00:00Z', null),
];
const returned = anApplication({ state: 'returned', windows, window: windows[2] ?? null });

describe('the stretches of a case', () => {
  it('follow each other without a gap, the running one up to now', () => {
    const { stretches } = caseTimeline(returned, at('2027-02-01'));
    expect(stretches.map((s) => [s.label, s.turn])).toEqual([
      ['Draft', 'draft'],
      ['Filed', 'owner'],
      ['In review', 'owner'],
      ['Returned', 'applicant'],
    ]);
    stretches.slice(1).forEach((s, i) => expect(s.from).toBe(stretches[i]?.to));
    expect(stretches.at(-1)?.to).toBe(at('2027-02-01'));
  });

  it('say what is due, and reach to it', () => {
    const { due, weeks } = caseTimeline(returned, at('2027-02-01'));
    expect(due?.text).toBe('answer and file by 23 Mar');
    expect(weeks.length).toBeGreaterThan(8);
    weeks.forEach((week) => expect(new Date(week.at).getUTCDay()).toBe(1));
  });

  it('end with the last step of a case that is over', () => {
    const closed = windows.map((w) => ({ ...w, closedAt: w.closedAt ?? '2027-02-09T10:00:00Z' }));
    const accepted = anApplication({ state: 'accepted', windows: closed, window: null });
    const { due, now } = caseTimeline(accepted, at('2027-06-01'));
    expect(due).toBeNull();
    expect(now).toBe(at('2027-02-09'));
  });
});

describe('the same in words', () => {
  it('lists filings and windows in their order, what runs, and what comes next', () => {
    const revision = {
      letter: 'A',
      ordinal: 1,
      round: 1,
      filedAt: '2027-01-19T10:00:00Z',
      filedBy: { id: 'p', name: 'P' },
      contentHash: '',
      lineCount: 5,
      totalLengthKm: 1,
      change: 'first filing',
      note: null,
      current: true,
    };
    expect(timelineEntries(returned, [revision]).map((e) => [e.what, e.mark])).toEqual([
      ['Draft begun', undefined],
      ['Filed as A', undefined],
      ['In review', undefined],
      ['Returned', 'now'],
      ['Due as A', 'next'],
    ]);
  });
});
