import type { FormEvent } from 'react';
import { Link } from 'react-router-dom';
import { Notice } from '../../../components/feedback/notice';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { FormText } from '../../../components/ui/form-text';
import { useTexts } from '../../../hooks/use-texts';
import { ApiProblem } from '../../../lib/api/problem';
import { faultsByField } from '../../../lib/field-faults';
import { useAcceptInvitation } from '../api/accept-invitation';
import { useFrontDoor } from '../api/get-front-door';
import { LEAST_PASSWORD, needed, passwordWish } from '../model/wishes';
import { FrontDoor } from './front-door';

function TakeUp({ token, owner }: { token: string; owner: string }) {
  const accept = useAcceptInvitation();
  const form = useTexts(
    { name: '', password: '' },
    (t) => ({ name: needed(t.name, 'Your name is needed.'), password: passwordWish(t.password) }),
    faultsByField(accept.error),
  );
  const submit = (event: FormEvent) => {
    event.preventDefault();
    form.submit(({ name, password }) => accept.mutate({ token, name: name.trim(), password }));
  };
  const isGone = accept.error instanceof ApiProblem && accept.error.problem === 'gone';
  if (isGone)
    return (
      <Notice grade="must-answer" title="This link has been used or has expired" announce>
        {`Ask ${owner} to send another one.`}
      </Notice>
    );
  if (accept.isSuccess)
    return (
      <Notice grade="in-balance" title="Your account is open" announce>
        <Link to="/sign-in" className="link">
          Sign in with your address and password
        </Link>
      </Notice>
    );
  return (
    <form onSubmit={submit} className="grid gap-4" noValidate>
      <ProblemNotice error={accept.error} />
      <FormText label="Your name" hint="as others will see it" autoComplete="name" {...form.field('name')} />
      <FormText
        label="Password"
        type="password"
        autoComplete="new-password"
        hint={`${LEAST_PASSWORD} characters or more`}
        {...form.field('password')}
      />
      <Button kind="primary" type="submit" busy={accept.isPending} className="mt-2 w-full">
        Open the account
      </Button>
      <p className="text-label text-ink-soft">
        An account that your address has already keeps its name and password; the new role joins it.
      </p>
    </form>
  );
}

/** Where the link of an invitation leads: the invited person takes the account up. */
export function InvitationPage({ token }: { token: string }) {
  const { gridOwner } = useFrontDoor();
  const owner = gridOwner?.name ?? 'the grid owner';
  return (
    <FrontDoor
      title="Open your account"
      lead={`You are invited to the line data of ${owner}.`}
      owner={gridOwner?.name ?? null}
      foot={
        <Link to="/sign-in" className="link">
          Back to the sign-in
        </Link>
      }
    >
      {token ? (
        <TakeUp token={token} owner={owner} />
      ) : (
        <Notice grade="must-answer" title="The link is not whole">
          Open it from the mail once more, or copy all of it.
        </Notice>
      )}
    </FrontDoor>
  );
}
