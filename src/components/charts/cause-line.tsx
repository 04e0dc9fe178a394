import type { ReactNode } from 'react';
import { GradeMark } from '../ui/grade-mark';
import type { Grade } from '../ui/grades';

interface CauseLineProps {
  grade: Grade | 'settled';
  children: ReactNode;
}

/** Behind an elbow in the grade's colour: what would explain the finding. */
export function CauseLine({ grade, children }: CauseLineProps) {
  return <p className={`cause cause-${grade}`}>{children}</p>;
}

interface FindingWordsProps {
  says: ReactNode;
  /** Cause lines. */
  children?: ReactNode;
  /** Buttons at the right. */
  acts?: ReactNode;
}

/** What a finding says, its causes under it, what can be done beside it. */
export function FindingWords({ says, children, acts }: FindingWordsProps) {
  return (
    <div className="finding">
      <div>
        <p className="finding-says">{says}</p>
        {children}
      </div>
      {acts && <div className="finding-acts no-print">{acts}</div>}
    </div>
  );
}

interface LooseFindingProps extends FindingWordsProps {
  grade: Grade;
  settled?: boolean;
}

/** A finding that belongs to no row: of the whole line, a section, a position. */
export function LooseFinding({ grade, settled, ...words }: LooseFindingProps) {
  const wash = !settled && (grade === 'must-answer' || grade === 'explain') ? `wash-${grade}` : '';
  return (
    <div className={`loose-finding ${wash}`}>
      <GradeMark grade={grade} settled={settled} />
      <FindingWords {...words} />
    </div>
  );
}
