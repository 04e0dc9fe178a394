import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { layOutRule, type RuleDay } from '../../../../src/components/charts/due-rule-layout';
import { binValues, rootHeights } from '../../../../src/components/charts/histogram';
import { frequencyText, logDomain, logTicks, minorTicks } from '../../../../src/components/charts/log-ticks';
import { layOutTimeline } from '../../../../src/components/charts/timeline-layout';
import { WindowMeter } from '../../../../src/components/charts/window-meter';
import { layOutMeter } from '../../../../src/components/charts/window-meter-layout';

describe('window meter', () => {
  it('has the same length a day for every window', () => {
    const [short, long] = [layOutMeter(0, 5, 6.5), layOutMeter(0, 20, 6.5)];
    expect(long.end - short.end).toBeCloseTo(15 * 6.5, 9);
    expect(long.notches).toHaveLength(19);
    expect(long.notches.filter((n) => n.tall)).toHaveLength(3);
  });

  it('turns copper with three days left and runs past its frame when overdue', () => {
    expect(layOutMeter(16, 20, 6.5).near).toBe(false);
    expect(layOutMeter(17, 20, 6.5).near).toBe(true);
    const late = layOutMeter(22, 20, 6.5);
    expect(late.used).toBe(130);
    expect(late.over).toBeGreaterThan(13);
    expect(late.width).toBeGreaterThan(late.end);
    expect(layOutMeter(99, 20, 6.5).over).toBe(layOutMeter(24, 20, 6.5).over);
  });

  it('says its days', () => {
    render(<WindowMeter used={17} total={20} />);
    render(<WindowMeter used={22} total={20} />);
    expect(screen.getByRole('img', { name: '17 of 20 working days used' })).toBeInTheDocument();
    expect(screen.getByRole('img', { name: '20 working days, 2 over' })).toBeInTheDocument();
  });
});

const days: RuleDay[] = [1, 2, 3, 4, 5, 8, 9, 10, 11, 12, 15, 16, 17, 18, 19].map((d) => ({
  date: `2027-03-${String(d).padStart(2, '0')}`,
  text: `${d} Mar`,
  weekStart: [1, 8, 15].includes(d),
}));
const due = (...dates: string[]) => dates.map((date, i) => ({ key: String(i), due: date, grade: 'note' }));

describe('rule of due days', () => {
  it('stands items on their day and stacks those of one day', () => {
    const rule = layOutRule(days, '2027-03-04', due('2027-03-09', '2027-03-09', '2027-03-02'), 700);
    expect(rule.standing.map((s) => [Math.round((s.x - 26) / 32.4), s.level])).toEqual([
      [6, 0],
      [6, 1],
      [1, 0],
    ]);
    expect(rule.todayX).toBeCloseTo(26 + 3 * 32.4, 9);
  });

  it('stands an item that is due on a day off on the working day before', () => {
    expect(layOutRule(days, '2027-03-04', due('2027-03-07'), 700).standing[0]?.x).toBeCloseTo(
      26 + 4 * 32.4,
      9,
    );
  });

  it('counts what its height or its width does not hold, and loses nothing', () => {
    const items = due(...Array<string>(5).fill('2027-03-05'), '2027-03-19');
    const rule = layOutRule(days, '2027-03-04', items, 260);
    const counted = rule.standing.length + rule.more.reduce((n, m) => n + m.count, 0) + rule.later;
    expect(rule.later).toBe(1);
    expect(rule.more[0]?.count).toBe(3);
    expect(counted).toBe(items.length);
  });
});

describe('timeline', () => {
  const stretches = [
    { key: 'a', turn: 'draft' as const, label: 'Draft', from: 0, to: 100 },
    { key: 'b', turn: 'owner' as const, label: 'In review', note: '6 of 20', from: 100, to: 110 },
  ];

  it('is to scale and keeps only words that fit', () => {
    const layout = layOutTimeline({ stretches, now: 110, due: { at: 200, text: 'due' }, weeks: [] }, 1016);
    expect(layout.stretches[0]).toMatchObject({ x: 8, width: 498.5, label: 'Draft' });
    expect(layout.stretches[1]).toMatchObject({ label: 'In review', note: '6 of 20' });
    expect(layout.left?.x).toBeCloseTo(558, 6);
    expect(layout.left?.width).toBeCloseTo(450, 6);
    const tight = layOutTimeline({ stretches, now: 110, due: null, weeks: [] }, 400);
    expect(tight.stretches[1]?.label).toBe('');
  });

  it('thins out the dates until they stand clear', () => {
    const weeks = Array.from({ length: 20 }, (_, i) => ({ at: i * 10, text: `w${i}` }));
    const layout = layOutTimeline({ stretches, now: 200, weeks }, 600);
    const shown = layout.weeks.filter((w) => w.text).map((w) => w.x);
    expect(shown.length).toBeLessThan(20);
    shown.slice(1).forEach((x, i) => expect(x - (shown[i] ?? 0)).toBeGreaterThanOrEqual(52));
  });
});

describe('logarithmic axes', () => {
  it('ticks decades, and finer where there are few', () => {
    expect(logTicks(1, 1e6)).toEqual([1, 10, 100, 1000, 10000, 100000, 1000000]);
    expect(logTicks(0.05, 5)).toEqual([0.05, 0.1, 0.2, 0.5, 1, 2, 5]);
    expect(logTicks(0.5, 2)).toEqual([0.5, 1, 2]);
    expect(minorTicks(1, 10)).toEqual([2, 3, 4, 5, 6, 7, 8, 9]);
  });

  it('gives a level curve a factor of four, and a steep one its own range with air', () => {
    const [low, high] = logDomain([1, 1.01]);
    expect(high / low).toBeCloseTo(4, 9);
    const [from, to] = logDomain([0.04, 5]);
    expect(from).toBeLessThan(0.04);
    expect(to).toBeGreaterThan(5);
    expect(logDomain([NaN, -1])).toEqual([0.1, 10]);
  });

  it('writes the unit where it changes', () => {
    expect([1, 10, 1000, 1e4, 1e6].map(frequencyText)).toEqual([
      '1\u2009Hz',
      '10',
      '1\u2009kHz',
      '10',
      '1\u2009MHz',
    ]);
  });
});

describe('histogram of the fleet', () => {
  it('counts every value once, those beyond the scale at its ends', () => {
    const bins = binValues([-5, 0, 0.49, 0.5, 1, 7], [0, 1], 2);
    expect(bins.map((b) => b.count)).toEqual([3, 3]);
  });

  it('draws heights by the square root', () => {
    expect(rootHeights([1, 4, 16].map((count) => ({ from: 0, to: 1, count })))).toEqual([0.25, 0.5, 1]);
  });
});
