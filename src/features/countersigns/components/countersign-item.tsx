import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Countersign } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { applicationPath } from '../../../lib/paths';
import { useDecideCountersign } from '../api/decide-countersign';

interface CountersignItemProps {
  item: Countersign;
  userId: string;
  /** Reviewers decide; administrators read. */
  mayDecide: boolean;
}

/** A proposal that a second reviewer has to agree to: what, why, by whom, and the second word. */
export function CountersignItem({ item, userId, mayDecide }: CountersignItemProps) {
  const [deciding, setDeciding] = useState<'granted' | 'refused' | null>(null);
  const own = item.proposedBy.id === userId;
  const what = item.subject === 'decline' ? 'Decline the application' : `Waive: ${item.finding ?? ''}`;
  return (
    <li className="countersign">
      <RevisionTriangle letter={item.revision} />
      <div className="min-w-0">
        <p>
          <Link className="link-ink" to={applicationPath('reviewer', item.number)}>
            {item.number}
          </Link>{' '}
          <span className="font-semibold">{what}</span>
        </p>
        <p className="text-table text-ink-soft">
          {`${item.proposedBy.name}, ${formatDate(item.proposedAt)}: `}
          {item.reason}
        </p>
      </div>
      {mayDecide && (
        <div className="flex flex-wrap items-center gap-2">
          {own ? (
            <span className="text-table text-ink-soft">A second reviewer decides, not you.</span>
          ) : (
            <>
              <Button small kind="primary" onClick={() => setDeciding('granted')}>
                Countersign
              </Button>
              <Button small onClick={() => setDeciding('refused')}>
                Refuse
              </Button>
            </>
          )}
        </div>
      )}
      {deciding && (
        <DecideDialog item={item} what={what} outcome={deciding} onClose={() => setDeciding(null)} />
      )}
    </li>
  );
}

interface DecideDialogProps {
  item: Countersign;
  what: string;
  outcome: 'granted' | 'refused';
  onClose: () => void;
}

function DecideDialog({ item, what, outcome, onClose }: DecideDialogProps) {
  const decide = useDecideCountersign(item);
  const granted = outcome === 'granted';
  return (
    <WordsDialog
      title={granted ? 'Countersign' : 'Refuse to countersign'}
      description={`${what} On revision ${item.revision} of ${item.number}. ${item.proposedBy.name} gives as reason: ${item.reason}`}
      label={granted ? 'Words to go with it' : 'Reason'}
      optional={granted}
      confirm={granted ? 'Countersign' : 'Refuse'}
      kind={granted && item.subject === 'decline' ? 'destructive' : 'primary'}
      busy={decide.isPending}
      error={decide.error}
      onConfirm={(remark) =>
        decide.mutate({ outcome, ...(remark ? { remark } : {}) }, { onSuccess: onClose })
      }
      onClose={onClose}
    />
  );
}
