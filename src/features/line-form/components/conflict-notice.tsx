import type { DraftLine } from '#shared/contracts/api.generated';
import { formatInstant } from '#shared/format/dates';
import { Notice } from '../../../components/feedback/notice';
import { Button } from '../../../components/ui/button';

interface ConflictNoticeProps {
  theirs: DraftLine | null;
  onKeepMine: () => void;
  onTakeTheirs: () => void;
}

/** Somebody else saved the line in between: both texts still exist, and the writer chooses. */
export function ConflictNotice({ theirs, onKeepMine, onTakeTheirs }: ConflictNoticeProps) {
  return (
    <Notice
      grade="explain"
      title="This line was saved elsewhere while you were writing"
      announce
      className="mb-6"
    >
      <p>
        {theirs ? `The other version was saved on ${formatInstant(theirs.updatedAt)}. ` : ''}
        What you typed stands below and nothing of it is lost. Keep yours and the other version is replaced;
        take the other and yours is given up.
      </p>
      <div className="actions !mt-3">
        <Button
          small
          kind="primary"
          onClick={onKeepMine}
          blockedBy={theirs ? null : 'Reading the other version.'}
        >
          Keep mine
        </Button>
        <Button small onClick={onTakeTheirs} disabled={!theirs}>
          Take the other version
        </Button>
      </div>
    </Notice>
  );
}
