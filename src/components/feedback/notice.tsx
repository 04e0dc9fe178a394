import type { ReactNode } from 'react';
import { GradeMark } from '../ui/grade-mark';
import { classNames } from '../ui/class-names';
import type { Grade } from '../ui/grades';

const LOOKS: Record<Grade, string> = {
  'must-answer': 'bg-vermilion-wash text-vermilion',
  explain: 'bg-ochre-wash text-ochre',
  note: 'bg-steel-wash text-steel',
  'in-balance': 'bg-verdigris-wash text-verdigris',
};

interface NoticeProps {
  /** How much it matters, in the same four shapes as findings. */
  grade?: Grade;
  title?: ReactNode;
  children?: ReactNode;
  /** Said at once by screen readers: for what has just happened. */
  announce?: boolean;
  className?: string;
}

/** A word to the reader, within the page. */
export function Notice({ grade = 'note', title, children, announce, className }: NoticeProps) {
  const role = announce ? (grade === 'must-answer' ? 'alert' : 'status') : undefined;
  return (
    <div className={classNames('notice', LOOKS[grade], className)} role={role}>
      <GradeMark grade={grade} />
      <div>
        {title && <p className="font-semibold">{title}</p>}
        {children}
      </div>
    </div>
  );
}
