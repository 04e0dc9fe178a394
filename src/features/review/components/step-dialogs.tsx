import { useState } from 'react';
import type { Application, Discrepancy } from '#shared/contracts/api.generated';
import { CAUTION } from '#shared/workflow/caution';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Field } from '../../../components/ui/field';
import { Select, TextArea } from '../../../components/ui/inputs';
import { useAcceptApplication } from '../api/accept-application';
import { useDeclineApplication } from '../api/decline-application';
import { useHandOverApplication } from '../api/hand-over-application';
import { useReviewers } from '../api/list-reviewers';
import { usePutBackApplication } from '../api/put-back-application';
import { useReturnApplication } from '../api/return-application';
import { conditionsOf } from '../model/conditions';
import { countOpen, returnLabel } from '../model/head-steps';

export interface StepDialogProps {
  application: Application;
  revision: string;
  discrepancies: readonly Discrepancy[];
  onClose: () => void;
}

/** Returns the case: what the letter takes along stands here once more before it is sent. */
export function ReturnDialog({ application, revision, discrepancies, onClose }: StepDialogProps) {
  const send = useReturnApplication(application.number);
  const open = discrepancies.filter((d) => d.state === 'open');
  return (
    <WordsDialog
      title={returnLabel(countOpen(discrepancies))}
      description={`Revision ${revision} goes back to ${application.applicant.name} with a letter; the window to answer opens.`}
      label="Words to go with the letter"
      optional
      confirm="Return and send the letter"
      busy={send.isPending}
      error={send.error}
      onConfirm={(message) =>
        send.mutate(
          { body: { revision, version: application.version, ...(message ? { message } : {}) } },
          { onSuccess: onClose },
        )
      }
      onClose={onClose}
    >
      <ul aria-label="Discrepancies in the letter" className="text-table">
        {open.map((d) => (
          <li key={d.id} className="border-t border-rule py-1.5">
            <b className="font-semibold">D-{d.number}</b> {d.title}
          </li>
        ))}
      </ul>
    </WordsDialog>
  );
}

/** Accepts the current revision, perhaps with conditions. */
export function AcceptDialog({ application, revision, onClose }: StepDialogProps) {
  const accept = useAcceptApplication(application.number);
  const [conditions, setConditions] = useState('');
  const { version } = application;
  return (
    <WordsDialog
      title={`Accept revision ${revision}`}
      description={`${application.number}, ${application.title}. The accepted record is frozen and mailed to the applicant.`}
      label="Words to go with the decision"
      optional
      confirm={`Accept revision ${revision}`}
      busy={accept.isPending}
      error={accept.error}
      onConfirm={(reason) =>
        accept.mutate(
          {
            body: {
              revision,
              version,
              ...(reason ? { reason } : {}),
              conditions: conditionsOf(conditions),
            },
          },
          { onSuccess: onClose },
        )
      }
      onClose={onClose}
    >
      <Field
        label="Conditions"
        optional
        hint="One a line, such as: as-built data before the line is energised."
      >
        {(ties) => (
          <TextArea
            {...ties}
            rows={3}
            value={conditions}
            onChange={(event) => setConditions(event.target.value)}
          />
        )}
      </Field>
      <p className="caution">{CAUTION}</p>
    </WordsDialog>
  );
}

/** Proposes to decline; it takes effect once a second reviewer has countersigned. */
export function DeclineDialog({ application, revision, onClose }: StepDialogProps) {
  const decline = useDeclineApplication(application.number);
  return (
    <WordsDialog
      title={`Propose to decline revision ${revision}`}
      description="A second reviewer has to countersign before the application is declined."
      label="Reason, as the applicant will read it"
      confirm="Propose to decline"
      kind="destructive"
      busy={decline.isPending}
      error={decline.error}
      onConfirm={(reason) =>
        decline.mutate({ body: { revision, version: application.version, reason } }, { onSuccess: onClose })
      }
      onClose={onClose}
    >
      <p className="caution">{CAUTION}</p>
    </WordsDialog>
  );
}

/** Hands the case to another reviewer. */
export function HandOverDialog({ application, onClose }: StepDialogProps) {
  const handOver = useHandOverApplication(application.number);
  const reviewers = useReviewers(application.number);
  const others = (reviewers.data?.items ?? []).filter((r) => r.id !== application.reviewer?.id);
  const [to, setTo] = useState('');
  const [missing, setMissing] = useState(false);
  return (
    <WordsDialog
      title="Hand the case over"
      description="It stays in review, and its due day stays."
      label="Reason"
      confirm="Hand over"
      busy={handOver.isPending}
      error={handOver.error ?? reviewers.error}
      onConfirm={(reason) => {
        setMissing(to === '');
        if (to === '') return;
        handOver.mutate({ body: { to, reason, version: application.version } }, { onSuccess: onClose });
      }}
      onClose={onClose}
    >
      <Field label="To" error={missing ? 'Choose a reviewer.' : null}>
        {(ties) => (
          <Select
            {...ties}
            value={to}
            none="Choose a reviewer"
            options={others.map((r) => ({ value: r.id, label: `${r.name}, ${r.openCases} in hand` }))}
            onChange={(event) => setTo(event.target.value)}
          />
        )}
      </Field>
    </WordsDialog>
  );
}

/** Puts the case back into the queue for anybody. */
export function PutBackDialog({ application, onClose }: StepDialogProps) {
  const putBack = usePutBackApplication(application.number);
  return (
    <WordsDialog
      title="Put the case back into the queue"
      description="A new window to take it up opens; the review days used so far are kept."
      label="Reason"
      confirm="Put back"
      busy={putBack.isPending}
      error={putBack.error}
      onConfirm={(reason) =>
        putBack.mutate({ body: { reason, version: application.version } }, { onSuccess: onClose })
      }
      onClose={onClose}
    />
  );
}
