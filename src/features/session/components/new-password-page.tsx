import type { FormEvent } from 'react';
import { Link } from 'react-router-dom';
import { Notice } from '../../../components/feedback/notice';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { FormText } from '../../../components/ui/form-text';
import { useTexts } from '../../../hooks/use-texts';
import { faultsByField } from '../../../lib/field-faults';
import { useFrontDoor } from '../api/get-front-door';
import { useAskForReset, useResetPassword } from '../api/reset-password';
import { LEAST_PASSWORD, addressWish, passwordWish } from '../model/wishes';
import { FrontDoor } from './front-door';

function AskByMail() {
  const ask = useAskForReset();
  const form = useTexts({ email: '' }, (t) => ({ email: addressWish(t.email) }), faultsByField(ask.error));
  const submit = (event: FormEvent) => {
    event.preventDefault();
    form.submit(({ email }) => ask.mutate(email.trim()));
  };
  if (ask.isSuccess)
    return (
      <Notice grade="in-balance" title="Look into your mail" announce>
        If the address has an account, a link to a new password is on its way.
      </Notice>
    );
  return (
    <form onSubmit={submit} className="grid gap-4" noValidate>
      <ProblemNotice error={ask.error} />
      <FormText label="Email" type="email" autoComplete="username" {...form.field('email')} />
      <Button kind="primary" type="submit" busy={ask.isPending} className="w-full">
        Send me a link
      </Button>
    </form>
  );
}

function ChoosePassword({ token }: { token: string }) {
  const reset = useResetPassword();
  const form = useTexts(
    { password: '' },
    (t) => ({ password: passwordWish(t.password) }),
    faultsByField(reset.error),
  );
  const submit = (event: FormEvent) => {
    event.preventDefault();
    form.submit(({ password }) => reset.mutate({ token, password }));
  };
  if (reset.isSuccess)
    return (
      <Notice grade="in-balance" title="The new password holds" announce>
        <Link to="/sign-in" className="link">
          Sign in with it
        </Link>
      </Notice>
    );
  return (
    <form onSubmit={submit} className="grid gap-4" noValidate>
      <ProblemNotice error={reset.error} />
      <FormText
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`${LEAST_PASSWORD} characters or more`}
        {...form.field('password')}
      />
      <Button kind="primary" type="submit" busy={reset.isPending} className="w-full">
        Set the new password
      </Button>
    </form>
  );
}

/** A new password: asked for by mail, chosen by the link in it. */
export function NewPasswordPage({ token }: { token: string | null }) {
  const { gridOwner } = useFrontDoor();
  return (
    <FrontDoor
      title="Set a new password"
      lead={token ? 'Choose it here; the old one ends.' : 'We send a link to the address of your account.'}
      owner={gridOwner?.name ?? null}
      foot={
        <Link to="/sign-in" className="link">
          Back to the sign-in
        </Link>
      }
    >
      {token ? <ChoosePassword token={token} /> : <AskByMail />}
    </FrontDoor>
  );
}
