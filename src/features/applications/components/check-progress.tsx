import type { CheckState } from '#shared/contracts/api.generated';
import { Notice } from '../../../components/feedback/notice';
import { Progress } from '../../../components/feedback/progress';
import { Sheet } from '../../../components/ui/sheet';

/** The check after filing while it waits or runs, with its counts; nothing once it is done. */
export function CheckProgress({ check, revision }: { check: CheckState | null; revision: string | null }) {
  if (!check || check.state === 'done') return null;
  if (check.state === 'failed')
    return (
      <Notice grade="must-answer" className="mb-6" title={`The check of revision ${revision ?? ''} failed`}>
        {check.failure ?? 'The grid owner sees this and can have it checked again.'}
      </Notice>
    );
  const { linesChecked, lineCount } = check;
  return (
    <Sheet
      title={`Checking revision ${revision ?? ''}`}
      aside={check.state === 'queued' ? 'waiting its turn' : 'running'}
      className="mb-6"
    >
      <div className="sheet-body" role="status">
        <Progress label="Lines checked" done={linesChecked} total={lineCount} />
        <p className="mt-2 text-table text-ink-soft">
          {`${linesChecked} of ${lineCount} lines checked. You may leave this page; the check goes on.`}
        </p>
      </div>
    </Sheet>
  );
}
