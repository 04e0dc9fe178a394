import { useState } from 'react';
import type { PeopleEntry } from '#shared/contracts/api.generated';
import { formatInstant } from '#shared/format/dates';
import { WordsDialog } from '../../../components/feedback/words-dialog';
import { Button } from '../../../components/ui/button';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { useSession } from '../../../lib/api/session';
import { useSetPersonStatus } from '../api/set-person-status';
import { ROLE_WORDS } from '../model/roles';
import { RolesDialog } from './roles-dialog';

type Acting = { person: PeopleEntry; how: 'status' | 'roles' };

/** Everybody with an account: roles, last sign-in, whether a second factor is in place. */
export function PeopleTable({ people }: { people: readonly PeopleEntry[] }) {
  const session = useSession();
  // The demo lets everybody in by the password alone.
  const asksForSecond = session?.demo !== true;
  const [acting, setActing] = useState<Acting | null>(null);
  // The roles dialog shows the person as read last, not as read when it was opened.
  const current = people.find((person) => person.id === acting?.person.id);
  const close = () => setActing(null);
  return (
    <>
      <Table label="Accounts" folds>
        <TableHead>
          <Row>
            <HeadCell>Name</HeadCell>
            <HeadCell>Roles</HeadCell>
            <HeadCell>Second factor</HeadCell>
            <HeadCell>Last sign-in</HeadCell>
            <HeadCell>Account</HeadCell>
          </Row>
        </TableHead>
        <TableBody>
          {people.map((person) => (
            <Row key={person.id}>
              <RowHead fold="row">
                {person.name} <span className="block font-normal text-ink-soft">{person.email}</span>
              </RowHead>
              <Cell fold="row">
                {person.memberships.map((m) => `${ROLE_WORDS[m.role]}, ${m.organisationName}`).join('; ') || (
                  <span className="text-ink-soft">none</span>
                )}
                {person.bars.map((bar) => (
                  <span key={bar.organisationId} className="block text-ink-soft">
                    kept from {bar.organisationName}: {bar.reason}
                  </span>
                ))}
              </Cell>
              <Cell foldLabel="Second factor">
                {person.hasSecondFactor ? 'in place' : asksForSecond ? 'not yet' : 'not asked for'}
              </Cell>
              <Cell foldLabel="Last sign-in">
                {person.lastSignInAt ? formatInstant(person.lastSignInAt) : 'never'}
              </Cell>
              <Cell fold="row">
                <span className="flex flex-wrap items-center gap-2">
                  <span className="min-w-[56px]">{person.status}</span>
                  <Button
                    small
                    aria-label={`Roles of ${person.name}`}
                    onClick={() => setActing({ person, how: 'roles' })}
                  >
                    Roles
                  </Button>
                  {person.id !== session?.user.id && (
                    <Button
                      small
                      aria-label={`${statusVerb(person)} the account of ${person.name}`}
                      onClick={() => setActing({ person, how: 'status' })}
                    >
                      {statusVerb(person)}
                    </Button>
                  )}
                </span>
              </Cell>
            </Row>
          ))}
        </TableBody>
      </Table>
      {acting?.how === 'status' && current && <StatusDialog person={current} onClose={close} />}
      {acting?.how === 'roles' && current && <RolesDialog person={current} onClose={close} />}
    </>
  );
}

const statusVerb = ({ status }: PeopleEntry) => (status === 'active' ? 'Disable' : 'Enable');

function StatusDialog({ person, onClose }: { person: PeopleEntry; onClose: () => void }) {
  const set = useSetPersonStatus();
  const disable = person.status === 'active';
  return (
    <WordsDialog
      title={disable ? `Disable the account of ${person.name}` : `Let ${person.name} in again`}
      description={disable ? 'Their sessions end at once; what they did stays on record.' : undefined}
      label="Reason"
      confirm={disable ? 'Disable' : 'Enable'}
      kind={disable ? 'destructive' : 'primary'}
      busy={set.isPending}
      error={set.error}
      onConfirm={(reason) =>
        set.mutate({ id: person.id, status: disable ? 'disabled' : 'active', reason }, { onSuccess: onClose })
      }
      onClose={onClose}
    />
  );
}
