import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { balanceSentence, type BalanceEntry } from '../../../../src/components/charts/balance-entry';
import { BalanceTable } from '../../../../src/components/charts/balance-table';

const written = (text: string) => ({ value: Number(text), text });
const X1: BalanceEntry = {
  key: 'x1',
  name: 'X1',
  unit: 'Ω/km',
  declared: written('0.613'),
  recomputed: written('0.381'),
  typical: { low: written('0.33'), high: written('0.40') },
  outer: { low: written('0.23'), high: written('0.62') },
  difference: { value: 0.609, text: '+60.9 %' },
  tolerance: 0.015,
  grade: 'must-answer',
  findings: [
    {
      key: 'f',
      grade: 'must-answer',
      says: 'X1 is 61 % above what the geometry gives.',
      causes: ['Fits within 0.1 % if the value is per mile.'],
      acts: <button type="button">Raise</button>,
    },
  ],
};
const SPEED: BalanceEntry = {
  ...X1,
  key: 'speed',
  name: 'Wave speed',
  unit: '% of c',
  grade: null,
  remark: 'follows X1',
  findings: [],
};

const show = (entries: BalanceEntry[], live = false) =>
  render(
    <BalanceTable label="Balance" scaleLabel="Scale: outer limits of 345 kV" entries={entries} live={live} />,
  );

describe('balance', () => {
  it('reads a row as one sentence', () => {
    expect(balanceSentence(X1)).toBe(
      'X1: declared 0.613 Ω/km, recomputed 0.381 Ω/km, typical 0.33 to 0.40 Ω/km; difference +60.9 %; Must answer.',
    );
    expect(balanceSentence(SPEED)).toMatch(/follows X1\.$/);
    expect(balanceSentence({ ...X1, declared: null, difference: null })).toMatch(/^X1: not declared, /);
  });

  it('names each strip by that sentence', () => {
    show([X1, SPEED]);
    expect(screen.getByRole('img', { name: balanceSentence(X1) })).toBeInTheDocument();
  });

  it('puts finding, cause and what can be done into the row group, on the wash of the grade', () => {
    show([X1]);
    const group = screen.getByRole('rowheader', { name: /X1/ }).closest('tbody');
    expect(group).toHaveClass('wash-must-answer');
    const inGroup = within(group as HTMLElement);
    expect(inGroup.getByText('Fits within 0.1 % if the value is per mile.')).toHaveClass('cause-must-answer');
    expect(inGroup.getByRole('button', { name: 'Raise' })).toBeInTheDocument();
    expect(inGroup.getByText('Must answer')).toBeInTheDocument();
  });

  it('shows a value that follows another as such, with its tilt but without a grade or wash', () => {
    show([SPEED]);
    const group = screen.getByRole('rowheader', { name: /Wave speed/ }).closest('tbody');
    expect(screen.getByText('follows X1')).toHaveClass('follows');
    expect(group?.className).not.toMatch(/wash/);
    expect((group?.querySelector('.beam-turns') as SVGGElement).style.transform).toBe('rotate(-14deg)');
  });

  it('takes the wash away and outlines the mark once the finding is settled', () => {
    show([{ ...X1, settled: true, remark: 'X1 settled' }]);
    expect(screen.getByText('X1 settled').closest('.grade')).toHaveClass('grade-settled');
    expect(screen.getByRole('rowheader', { name: /X1/ }).closest('tbody')?.className).not.toMatch(/wash/);
  });

  it('says what is missing instead of drawing it', () => {
    show([{ ...X1, declared: null, difference: null, outer: null, grade: null, findings: [] }]);
    expect(screen.getByText('not given')).toBeInTheDocument();
    expect(screen.getByText('no band for this voltage')).toBeInTheDocument();
    expect(document.querySelector('.beam-turns')).toBeNull();
  });

  it('keeps the roles that folding takes away, and beside a form leaves two columns out', () => {
    show([X1], true);
    expect(screen.getByRole('table')).toHaveAttribute('role', 'table');
    expect(screen.getAllByRole('columnheader')).toHaveLength(6);
    expect(screen.queryByText('Finding')).toBeNull();
  });
});
