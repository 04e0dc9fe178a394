import type { Finding, Run } from '#shared/contracts/api.generated';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { SkeletonLines } from '../../../components/feedback/skeleton';
import { Dialog } from '../../../components/ui/dialog';
import { GradeMark } from '../../../components/ui/grade-mark';
import { GRADE_WORDS } from '../../../components/ui/grades';
import { useRunComparison } from '../api/compare-runs';

interface RunComparisonDialogProps {
  number: string;
  letter: string;
  from: Run;
  to: Run;
  onClose: () => void;
}

/** Two checks of one revision side by side: what appeared, what is gone, how much stayed. */
export function RunComparisonDialog({ number, letter, from, to, onClose }: RunComparisonDialogProps) {
  const { data, error } = useRunComparison(number, letter, from.ordinal, to.ordinal);
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      wide
      title={`Check ${to.ordinal} against check ${from.ordinal}`}
      description={`Revision ${letter}. ${versions(to)}; ${versions(from)}.`}
    >
      <ProblemNotice error={error} />
      {!data && !error && <SkeletonLines lines={4} />}
      {data && (
        <div className="grid gap-4 text-table">
          <Findings title={`Only in check ${to.ordinal}`} findings={data.appeared} />
          <Findings title={`Only in check ${from.ordinal}`} findings={data.gone} />
          <p className="text-ink-soft">
            {data.kept === 1 ? 'One finding is' : `${data.kept} findings are`} in both.
          </p>
        </div>
      )}
    </Dialog>
  );
}

const versions = ({ ordinal, engine, ruleSet }: Run) =>
  `Check ${ordinal}: engine ${engine ?? 'unknown'}, rules ${ruleSet ?? 'unknown'}`;

function Findings({ title, findings }: { title: string; findings: readonly Finding[] }) {
  return (
    <section>
      <h3>{title}</h3>
      {findings.length === 0 ? (
        <p className="text-ink-soft">None.</p>
      ) : (
        <ul className="mt-1">
          {findings.map((finding) => (
            <li
              key={`${finding.lineKey} ${finding.fingerprint}`}
              className="flex gap-2 border-t border-rule py-2"
            >
              <GradeMark grade={finding.grade} label={GRADE_WORDS[finding.grade]} />
              <span>
                <b className="font-semibold">{finding.lineKey}</b> {finding.message}
              </span>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}
