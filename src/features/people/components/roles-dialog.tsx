import { useState } from 'react';
import type { PeopleEntry } from '#shared/contracts/api.generated';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { useGrantRole } from '../api/grant-role';
import { useOrganisations } from '../api/list-organisations';
import { useRemoveRole } from '../api/remove-role';
import { ROLE_WORDS } from '../model/roles';
import { RoleFields, type RoleChoice } from './role-fields';

/** The roles of one person: those they have, and one more. */
export function RolesDialog({ person, onClose }: { person: PeopleEntry; onClose: () => void }) {
  const organisations = useOrganisations();
  const grant = useGrantRole();
  const remove = useRemoveRole();
  const [choice, setChoice] = useState<RoleChoice>({ organisationId: '', role: '' });
  const [tried, setTried] = useState(false);
  const add = () => {
    const { organisationId, role } = choice;
    setTried(true);
    if (organisationId === '' || role === '') return;
    grant.mutate(
      { id: person.id, organisationId, role },
      {
        onSuccess: () => {
          setTried(false);
          setChoice({ organisationId: '', role: '' });
        },
      },
    );
  };
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title={`Roles of ${person.name}`}>
      <ul className="mb-4 text-table">
        {person.memberships.map((m) => (
          <li
            key={m.organisationId}
            className="flex items-center justify-between gap-3 border-t border-rule py-2"
          >
            <span>{`${ROLE_WORDS[m.role]}, ${m.organisationName}`}</span>
            <Button
              small
              busy={remove.isPending}
              aria-label={`Take away: ${ROLE_WORDS[m.role]}, ${m.organisationName}`}
              onClick={() => remove.mutate({ id: person.id, organisationId: m.organisationId })}
            >
              Take away
            </Button>
          </li>
        ))}
      </ul>
      <div className="grid gap-4">
        <RoleFields organisations={organisations} value={choice} onChange={setChoice} tried={tried} />
        <ProblemNotice error={grant.error ?? remove.error} />
        <div className="flex flex-wrap gap-3">
          <Button kind="primary" busy={grant.isPending} onClick={add}>
            Give this role
          </Button>
          <Button onClick={onClose}>Close</Button>
        </div>
      </div>
    </Dialog>
  );
}
