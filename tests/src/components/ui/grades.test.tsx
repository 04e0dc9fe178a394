import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { GradeCountsInline, GradeSlots } from '../../../../src/components/ui/grade-counts';
import { GradeLabel, GradeMark } from '../../../../src/components/ui/grade-mark';
import { gradeSentence, worstGrade, type Grade } from '../../../../src/components/ui/grades';

describe('grades', () => {
  it.each([
    ['must-answer', 'Must answer', 'rect'],
    ['explain', 'Explain', 'path'],
    ['note', 'Note', 'circle'],
    ['in-balance', 'In balance', 'path'],
  ] as [Grade, string, string][])('%s has its word and its own shape', (grade, word, shape) => {
    const { container } = render(<GradeLabel grade={grade} />);
    expect(screen.getByText(word)).toBeInTheDocument();
    expect(container.querySelector('svg')?.querySelector(shape)).not.toBeNull();
  });

  it('keeps the shape of a settled finding, outlined, with its own words', () => {
    const { container } = render(
      <GradeLabel grade="explain" settled>
        X0 settled
      </GradeLabel>,
    );
    expect(screen.getByText('X0 settled').closest('.grade')).toHaveClass('grade-settled');
    expect(container.querySelector('g')).toHaveAttribute('fill', 'none');
  });

  it('is decoration beside words, and an image with a name where it stands alone', () => {
    const { container } = render(<GradeMark grade="note" />);
    expect(container.querySelector('svg')).toHaveAttribute('aria-hidden', 'true');
    render(<GradeMark grade="note" label="One note" />);
    expect(screen.getByRole('img', { name: 'One note' })).toBeInTheDocument();
  });

  it('says counts in words, worst first, and finds the worst', () => {
    expect(gradeSentence({ note: 1, 'must-answer': 2 })).toBe('2 must answer, 1 note');
    expect(gradeSentence({ explain: 0 })).toBe('In balance');
    expect(worstGrade({ note: 3, explain: 1 })).toBe('explain');
    expect(worstGrade({})).toBe('in-balance');
  });

  it('counts have their words in the accessible name, in tables and in lists', () => {
    render(<GradeSlots counts={{ 'must-answer': 1, note: 2 }} />);
    render(<GradeCountsInline counts={{ explain: 4 }} />);
    expect(screen.getByRole('img', { name: '1 must answer, 2 notes' })).toBeInTheDocument();
    expect(screen.getByRole('img', { name: '4 explain' })).toBeInTheDocument();
  });
});
