import { useState, type FormEvent } from 'react';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { Dialog } from '../../../components/ui/dialog';
import { Field } from '../../../components/ui/field';
import { TextInput } from '../../../components/ui/inputs';
import { useInvitePerson } from '../api/invite-person';
import { useOrganisations } from '../api/list-organisations';
import { RoleFields, type RoleChoice } from './role-fields';

const EMAIL = /^\S+@\S+\.\S+$/;

/** Invites somebody by mail: the link in it lets them choose their password. */
export function InviteDialog({ onClose }: { onClose: () => void }) {
  const organisations = useOrganisations();
  const invite = useInvitePerson();
  const [name, setName] = useState('');
  const [email, setEmail] = useState('');
  const [choice, setChoice] = useState<RoleChoice>({ organisationId: '', role: '' });
  const [tried, setTried] = useState(false);
  const nameFault = name.trim() === '' ? 'Write the name as others will see it.' : null;
  const emailFault = EMAIL.test(email.trim()) ? null : 'Write an address such as name@company.example.';
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    const { organisationId, role } = choice;
    if (nameFault || emailFault || organisationId === '' || role === '') return;
    invite.mutate({ name: name.trim(), email: email.trim(), organisationId, role }, { onSuccess: onClose });
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title="Invite somebody"
      description="They get a mail with a link that is good for 30 minutes."
    >
      <form onSubmit={submit} className="grid gap-4" noValidate>
        <Field label="Name" error={tried ? nameFault : null}>
          {(ties) => (
            <TextInput
              {...ties}
              autoComplete="off"
              maxLength={120}
              value={name}
              onChange={(e) => setName(e.target.value)}
            />
          )}
        </Field>
        <Field label="Email" error={tried ? emailFault : null}>
          {(ties) => (
            <TextInput
              {...ties}
              type="email"
              autoComplete="off"
              maxLength={254}
              value={email}
              onChange={(e) => setEmail(e.target.value)}
            />
          )}
        </Field>
        <RoleFields organisations={organisations} value={choice} onChange={setChoice} tried={tried} />
        <ProblemNotice error={invite.error} />
        <div className="flex flex-wrap gap-3">
          <Button type="submit" kind="primary" busy={invite.isPending}>
            Send the invitation
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </div>
      </form>
    </Dialog>
  );
}
