import type { ReactNode } from 'react';
import { classNames } from './class-names';
import { GRADE_WORDS, type Grade } from './grades';

const SHAPES: Record<Grade, (stroked: boolean) => ReactNode> = {
  'must-answer': (stroked) => (
    <rect x={2} y={2} width={10} height={10} className={stroked ? undefined : 'fill-vermilion'} />
  ),
  explain: (stroked) => <path d="M7 .6 13.4 7 7 13.4.6 7Z" className={stroked ? undefined : 'fill-ochre'} />,
  note: (stroked) => (
    <circle
      cx={7}
      cy={7}
      r={4.6}
      fill="none"
      strokeWidth={1.75}
      className={stroked ? undefined : 'stroke-steel'}
    />
  ),
  'in-balance': () => (
    <>
      <path d="M1 4.5H13" fill="none" strokeWidth={1.75} className="stroke-verdigris" />
      <path d="M7 5.5 10.4 12H3.6Z" className="fill-verdigris" />
    </>
  ),
};

interface GradeMarkProps {
  grade: Grade;
  /** A finding that a reviewer has settled keeps its shape, outlined. */
  settled?: boolean;
  /** A name of its own; without it the mark is decoration beside words that say the grade. */
  label?: string;
}

/** The shape of a grade: square, diamond, circle, level beam. Never colour alone. */
export function GradeMark({ grade, settled = false, label }: GradeMarkProps) {
  const named = label ? { role: 'img', 'aria-label': label } : { 'aria-hidden': true };
  const outlined = settled && grade !== 'in-balance';
  return (
    <svg className="grade-mark" viewBox="0 0 14 14" width={14} height={14} {...named}>
      {outlined ? (
        <g fill="none" strokeWidth={1.5} className="stroke-ink-soft">
          {SHAPES[grade](true)}
        </g>
      ) : (
        SHAPES[grade](false)
      )}
    </svg>
  );
}

interface GradeLabelProps {
  grade: Grade;
  settled?: boolean;
  children?: ReactNode;
  className?: string;
}

/** A grade's shape with its word, or with the words given. */
export function GradeLabel({ grade, settled, children, className }: GradeLabelProps) {
  return (
    <span className={classNames('grade', `grade-${settled ? 'settled' : grade}`, className)}>
      <GradeMark grade={grade} settled={settled} />
      <span>{children ?? GRADE_WORDS[grade]}</span>
    </span>
  );
}
