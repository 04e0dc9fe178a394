import { useState } from 'react';
import type { Invitation } from '#shared/contracts/api.generated';
import { formatDate, formatInstant } from '#shared/format/dates';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Sheet } from '../../../components/ui/sheet';
import { useApproveInvitation } from '../api/approve-invitation';
import { useInvitations } from '../api/list-invitations';
import { useOrganisations } from '../api/list-organisations';
import { useRefuseInvitation } from '../api/refuse-invitation';
import { ROLE_WORDS } from '../model/roles';
import { RoleFields, type RoleChoice } from './role-fields';

/** Accounts that somebody asked for, each to be granted or refused; and invitations on their way. */
export function RequestsSheet() {
  const items = useInvitations();
  const [acting, setActing] = useState<{ item: Invitation; how: 'approve' | 'refuse' } | null>(null);
  const asked = items.filter((item) => item.status === 'asked');
  const sent = items.filter((item) => item.status === 'sent');
  const close = () => setActing(null);
  if (asked.length === 0 && sent.length === 0) return null;
  return (
    <Sheet
      title="Asked for and invited"
      aside={asked.length > 0 ? `${asked.length} to decide` : 'nothing to decide'}
      className="mb-6"
    >
      <ul className="countersigns">
        {asked.map((item) => (
          <li key={item.id} className="!grid-cols-[minmax(0,1fr)_auto]">
            <div>
              <p>
                <b className="font-semibold">{item.name}</b>{' '}
                <span className="text-ink-soft">{item.email}</span>
              </p>
              <p className="text-table text-ink-soft">
                {`Asked on ${formatDate(item.createdAt)} for ${item.askedOrganisation ?? item.organisation?.name ?? 'an organisation not named'}. `}
                {item.message}
              </p>
            </div>
            <div className="flex flex-wrap gap-2">
              <Button small kind="primary" onClick={() => setActing({ item, how: 'approve' })}>
                Approve
              </Button>
              <Button small onClick={() => setActing({ item, how: 'refuse' })}>
                Refuse
              </Button>
            </div>
          </li>
        ))}
        {sent.map((item) => (
          <li key={item.id} className="!grid-cols-[minmax(0,1fr)_auto]">
            <div>
              <b className="font-semibold">{item.name}</b> <span className="text-ink-soft">{item.email}</span>
            </div>
            <span className="text-table text-ink-soft">
              {`invited as ${ROLE_WORDS[item.role].toLowerCase()}${item.organisation ? ` of ${item.organisation.name}` : ''}`}
              {item.expiresAt && `, until ${formatInstant(item.expiresAt)}`}
            </span>
          </li>
        ))}
      </ul>
      {acting?.how === 'approve' && <ApproveDialog item={acting.item} onClose={close} />}
      {acting?.how === 'refuse' && <RefuseDialog item={acting.item} onClose={close} />}
    </Sheet>
  );
}

interface ActProps {
  item: Invitation;
  onClose: () => void;
}

function ApproveDialog({ item, onClose }: ActProps) {
  const organisations = useOrganisations();
  const approve = useApproveInvitation();
  const like = organisations.find((o) => o.name === (item.askedOrganisation ?? item.organisation?.name));
  const [choice, setChoice] = useState<RoleChoice>({
    organisationId: like?.id ?? '',
    role: like ? item.role : '',
  });
  const [tried, setTried] = useState(false);
  const send = () => {
    setTried(true);
    const { organisationId, role } = choice;
    if (organisationId === '' || role === '') return;
    approve.mutate({ id: item.id, organisationId, role }, { onSuccess: onClose });
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Let ${item.name} in`}
      description={`${item.email} asked for ${item.askedOrganisation ?? 'an organisation not named'}. Choose where they belong; a mail with a link goes out.`}
    >
      <div className="grid gap-4">
        <RoleFields organisations={organisations} value={choice} onChange={setChoice} tried={tried} />
        <ProblemNotice error={approve.error} />
        <div className="flex flex-wrap gap-3">
          <Button kind="primary" busy={approve.isPending} onClick={send}>
            Approve
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </div>
      </div>
    </Dialog>
  );
}

function RefuseDialog({ item, onClose }: ActProps) {
  const refuse = useRefuseInvitation();
  return (
    <WordsDialog
      title={`Refuse an account to ${item.name}`}
      label="Reason"
      confirm="Refuse"
      kind="destructive"
      busy={refuse.isPending}
      error={refuse.error}
      onConfirm={(reason) => refuse.mutate({ id: item.id, reason }, { onSuccess: onClose })}
      onClose={onClose}
    />
  );
}
