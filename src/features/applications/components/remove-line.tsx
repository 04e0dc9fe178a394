import { useState } from 'react';
import type { DraftLine } from '#shared/contracts/api.generated';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { useDeleteDraftLine } from '../api/delete-draft-line';

/** Takes a line out of the draft, after a word on what that means. */
export function RemoveLine({ number, line }: { number: string; line: DraftLine }) {
  const [asking, setAsking] = useState(false);
  const remove = useDeleteDraftLine(number);
  const name = line.name ?? 'this line';
  const { lineKey, version } = line;
  return (
    <>
      <Button
        small
        kind="plain"
        aria-label={`Remove ${line.name ?? lineKey}`}
        onClick={() => setAsking(true)}
      >
        Remove
      </Button>
      <Dialog
        open={asking}
        onOpenChange={setAsking}
        title={`Remove ${name} from the draft?`}
        description="Revisions that were filed keep the line as it was."
        foot={
          <>
            <Button
              kind="destructive"
              busy={remove.isPending}
              onClick={() => remove.mutate({ lineKey, version }, { onSuccess: () => setAsking(false) })}
            >
              Remove the line
            </Button>
            <Button onClick={() => setAsking(false)}>Keep it</Button>
          </>
        }
      >
        <ProblemNotice error={remove.error} />
      </Dialog>
    </>
  );
}
