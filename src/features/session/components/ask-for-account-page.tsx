import type { FormEvent } from 'react';
import { Link } from 'react-router-dom';
import { Notice } from '../../../components/feedback/notice';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { FormText, FormWords } from '../../../components/ui/form-text';
import { useTexts } from '../../../hooks/use-texts';
import { faultsByField } from '../../../lib/field-faults';
import { useAskForAccount } from '../api/ask-for-account';
import { useFrontDoor } from '../api/get-front-door';
import { addressWish, needed } from '../model/wishes';
import { FrontDoor } from './front-door';

/** Asks the grid owner for an account; an administrator approves it. */
export function AskForAccountPage() {
  const { gridOwner } = useFrontDoor();
  const ask = useAskForAccount();
  const form = useTexts(
    { name: '', email: '', organisation: '', message: '' },
    (t) => ({
      name: needed(t.name, 'Your name is needed.'),
      email: addressWish(t.email),
      organisation: needed(t.organisation, 'Say for which organisation you apply.'),
    }),
    faultsByField(ask.error),
  );
  const submit = (event: FormEvent) => {
    event.preventDefault();
    form.submit(({ message, ...rest }) => ask.mutate(message.trim() ? { ...rest, message } : rest));
  };
  const owner = gridOwner?.name ?? 'the grid owner';
  return (
    <FrontDoor
      title="Ask for an account"
      lead={`${owner} looks at each request and answers by mail.`}
      owner={gridOwner?.name ?? null}
      foot={
        <Link to="/sign-in" className="link">
          Back to the sign-in
        </Link>
      }
    >
      {ask.isSuccess ? (
        <Notice grade="in-balance" title="Your request has arrived" announce>
          {`${owner} will write to ${form.texts.email}.`}
        </Notice>
      ) : (
        <form onSubmit={submit} className="grid gap-4" noValidate>
          <ProblemNotice error={ask.error} />
          <FormText label="Your name" autoComplete="name" {...form.field('name')} />
          <FormText label="Email" type="email" autoComplete="email" {...form.field('email')} />
          <FormText label="Organisation" autoComplete="organization" {...form.field('organisation')} />
          <FormWords label="What it is for" optional rows={3} {...form.field('message')} />
          <Button kind="primary" type="submit" busy={ask.isPending} className="mt-2 w-full">
            Ask for an account
          </Button>
        </form>
      )}
    </FrontDoor>
  );
}
