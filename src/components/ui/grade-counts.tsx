import { GradeLabel, GradeMark } from './grade-mark';
import {
  FINDING_GRADES,
  GRADE_WORDS,
  countWords,
  gradeSentence,
  worstGrade,
  type GradeCounts,
} from './grades';

/** Counts in three fixed slots, so that a column of them can be compared; for dense tables. */
export function GradeSlots({ counts }: { counts: GradeCounts }) {
  if (worstGrade(counts) === 'in-balance') return <GradeLabel grade="in-balance" />;
  return (
    <span className="grade-slots" role="img" aria-label={gradeSentence(counts)}>
      {FINDING_GRADES.map((grade) =>
        counts[grade] ? (
          <span key={grade} aria-hidden="true">
            <GradeMark grade={grade} />
            {counts[grade]}
          </span>
        ) : (
          <span key={grade} className="none" aria-hidden="true">
            ·
          </span>
        ),
      )}
    </span>
  );
}

/** Counts one after another, those that occur only; for lists. */
export function GradeCountsInline({ counts }: { counts: GradeCounts }) {
  const shown = FINDING_GRADES.filter((grade) => (counts[grade] ?? 0) > 0);
  return (
    <span
      className="inline-flex items-center gap-2 text-label font-semibold"
      role="img"
      aria-label={gradeSentence(counts)}
    >
      {shown.length === 0 && <GradeMark grade="in-balance" />}
      {shown.map((grade) => (
        <span key={grade} className="inline-flex items-center gap-1" aria-hidden="true">
          <GradeMark grade={grade} />
          {counts[grade]}
        </span>
      ))}
    </span>
  );
}

/** The row above a line's balance: how many findings of each grade, how many values in balance. */
export function GradeTally({
  counts,
  inBalance,
  follows,
}: {
  counts: GradeCounts;
  inBalance?: number;
  follows?: string;
}) {
  return (
    <p className="tally">
      {FINDING_GRADES.filter((grade) => (counts[grade] ?? 0) > 0).map((grade) => (
        <GradeLabel key={grade} grade={grade}>
          {countWords(counts[grade] ?? 0, grade)}
        </GradeLabel>
      ))}
      {inBalance !== undefined && inBalance > 0 && (
        <GradeLabel grade="in-balance">{`${inBalance} in balance`}</GradeLabel>
      )}
      {follows && <span className="text-ink-soft">{follows}</span>}
    </p>
  );
}

/** The words of the four shapes, under a table that shows shapes and counts. */
export function GradeKey() {
  return (
    <p className="key">
      {[...FINDING_GRADES, 'in-balance' as const].map((grade) => (
        <span key={grade}>
          <GradeMark grade={grade} />
          {GRADE_WORDS[grade]}
        </span>
      ))}
    </p>
  );
}
