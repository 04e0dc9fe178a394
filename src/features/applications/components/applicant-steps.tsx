import { useState } from 'react';
import type { ReactNode } from 'react';
import type { Application, Draft, Step } from '#shared/contracts/api.generated';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { useCaseWrite } from '../../../lib/queries/use-case-write';

type StepName = 'file' | 'withdraw' | 'amend';

const stepOf = (steps: readonly Step[], name: StepName): Step | undefined =>
  steps.find((step) => step.step === name);

interface StepDialogProps {
  application: Application;
  onClose: () => void;
}

function FileDialog({ application, onClose }: StepDialogProps) {
  const file = useCaseWrite('fileApplication', application.number);
  const { version, nextRevision, owner } = application;
  return (
    <WordsDialog
      title={`File revision ${nextRevision}`}
      description={`Everything in the draft is frozen as revision ${nextRevision} and goes to ${owner.name}. Its check runs at once.`}
      label="Words to go with it"
      optional
      confirm={`File revision ${nextRevision}`}
      busy={file.isPending}
      error={file.error}
      onConfirm={(note) =>
        file.mutate({ body: note === '' ? { version } : { version, note } }, { onSuccess: onClose })
      }
      onClose={onClose}
    />
  );
}

function WithdrawDialog({ application, onClose }: StepDialogProps) {
  const withdraw = useCaseWrite('withdrawApplication', application.number);
  const { version, round } = application;
  const what =
    round.kind === 'amendment'
      ? 'The amendment ends; the accepted revision stands as before.'
      : 'The application ends here. What was filed stays on record.';
  return (
    <WordsDialog
      title={round.kind === 'amendment' ? 'Withdraw the amendment' : 'Withdraw the application'}
      description={what}
      label="Reason"
      optional
      confirm="Withdraw"
      kind="destructive"
      busy={withdraw.isPending}
      error={withdraw.error}
      onConfirm={(reason) =>
        withdraw.mutate({ body: reason === '' ? { version } : { version, reason } }, { onSuccess: onClose })
      }
      onClose={onClose}
    />
  );
}

function AmendDialog({ application, onClose }: StepDialogProps) {
  const amend = useCaseWrite('amendApplication', application.number);
  const { version } = application;
  return (
    <WordsDialog
      title="Amend the accepted data"
      description="A new round begins with a draft of what was accepted. The accepted revision stands until the amendment is accepted."
      label="Why the data change"
      confirm="Begin the amendment"
      busy={amend.isPending}
      error={amend.error}
      onConfirm={(reason) => amend.mutate({ body: { version, reason } }, { onSuccess: onClose })}
      onClose={onClose}
    />
  );
}

const DIALOGS = { file: FileDialog, withdraw: WithdrawDialog, amend: AmendDialog } as const;

interface ApplicantStepsProps {
  application: Application;
  draft: Draft | null;
  /** Places to go, between the steps. */
  children?: ReactNode;
}

/** Why filing is closed: the server's reason, else what the draft still lacks. */
function whyClosed(step: Step, draft: Draft | null): string | null {
  if (step.open) return null;
  if (step.reason) return step.reason;
  return draft && !draft.ready ? 'Opens once every line of the draft is complete.' : 'Not open now.';
}

/** What the applicant can do with the case now; a closed step says what opens it. */
export function ApplicantSteps({ application, draft, children }: ApplicantStepsProps) {
  const [asking, setAsking] = useState<StepName | null>(null);
  const { steps, nextRevision, state } = application;
  const file = stepOf(steps, 'file');
  const withdraw = stepOf(steps, 'withdraw');
  const amend = stepOf(steps, 'amend');
  const Asked = asking && DIALOGS[asking];
  const showsFile = file && (state === 'draft' || state === 'returned');
  return (
    <>
      {showsFile && (
        <Button kind="primary" blockedBy={whyClosed(file, draft)} onClick={() => setAsking('file')}>
          {`File revision ${nextRevision}`}
        </Button>
      )}
      {amend?.open && (
        <Button kind="primary" onClick={() => setAsking('amend')}>
          Amend
        </Button>
      )}
      {children}
      {withdraw?.open && (
        <Button kind="plain" onClick={() => setAsking('withdraw')}>
          Withdraw
        </Button>
      )}
      {Asked && <Asked application={application} onClose={() => setAsking(null)} />}
    </>
  );
}
