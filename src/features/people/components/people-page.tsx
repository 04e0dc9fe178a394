import { useState } from 'react';
import { Button } from '../../../components/ui/button';
import { PageHead } from '../../../components/ui/page-head';
import { Sheet } from '../../../components/ui/sheet';
import { usePeople } from '../api/list-people';
import { InviteDialog } from './invite-dialog';
import { OrganisationsSheet } from './organisations-sheet';
import { PeopleTable } from './people-table';
import { RequestsSheet } from './requests-sheet';

/** Who may sign in, for which organisation and in which role. */
export function PeoplePage() {
  const people = usePeople();
  const [inviting, setInviting] = useState(false);
  return (
    <>
      <PageHead
        title="People"
        lead="Accounts are by invitation, or asked for on the sign-in page and approved here."
        actions={
          <Button kind="primary" onClick={() => setInviting(true)}>
            Invite somebody
          </Button>
        }
      />
      <RequestsSheet />
      <Sheet main title="Accounts" aside={people.length}>
        <PeopleTable people={people} />
      </Sheet>
      <OrganisationsSheet />
      {inviting && <InviteDialog onClose={() => setInviting(false)} />}
    </>
  );
}
