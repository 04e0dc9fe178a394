import { GradeMark } from '../../../components/ui/grade-mark';
import { gradeSentence, worstGrade } from '../../../components/ui/grades';
import type { LiveCheck } from '../hooks/use-live-check';
import { countFindings, reportIn } from '../model/report-view';

/** On a phone the count of findings stays at the foot of the screen and leads to the check. */
export function FindingCount({ check }: { check: LiveCheck }) {
  const report = reportIn(check.outcome);
  const counts = report ? countFindings(report) : null;
  // Of a line that is not whole nobody can say that it is in balance.
  const isOpen = check.outcome?.kind === 'faults' && counts && worstGrade(counts) === 'in-balance';
  return (
    <a
      href="#live-check"
      className="no-print sticky bottom-0 z-10 -mx-4 mt-6 flex min-h-11 items-center gap-2 border-t border-rule-strong bg-sheet px-4 text-control field:hidden"
    >
      {isOpen && <span>Nothing found so far</span>}
      {!counts && <span>The check waits for values</span>}
      {counts && !isOpen && (
        <>
          <GradeMark grade={worstGrade(counts)} />
          <b>{gradeSentence(counts)}</b>
        </>
      )}
      <span className="link ml-auto">go to the check</span>
    </a>
  );
}
