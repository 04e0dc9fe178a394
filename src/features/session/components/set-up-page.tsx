import type { FormEvent } from 'react';
import { Link } from 'react-router-dom';
import { Notice } from '../../../components/feedback/notice';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { FormText } from '../../../components/ui/form-text';
import { useTexts } from '../../../hooks/use-texts';
import { ApiProblem } from '../../../lib/api/problem';
import { faultsByField } from '../../../lib/field-faults';
import { useFrontDoor } from '../api/get-front-door';
import { useSetUp } from '../api/set-up';
import { LEAST_PASSWORD, addressWish, needed, passwordWish } from '../model/wishes';
import { FrontDoor } from './front-door';

function SetUpForm() {
  const setUp = useSetUp();
  const tokenIsWrong = setUp.error instanceof ApiProblem && setUp.error.problem === 'gone';
  const form = useTexts(
    { token: '', organisation: '', name: '', email: '', password: '' },
    (t) => ({
      token: needed(t.token, 'The token stands where the product was started.'),
      organisation: needed(t.organisation, 'The grid owner’s name stands on every letter.'),
      name: needed(t.name, 'Your name is needed.'),
      email: addressWish(t.email),
      password: passwordWish(t.password),
    }),
    tokenIsWrong
      ? { token: 'This token does not hold. Take the one that was printed at the last start.' }
      : faultsByField(setUp.error),
  );
  const submit = (event: FormEvent) => {
    event.preventDefault();
    form.submit((texts) => setUp.mutate({ ...texts, token: texts.token.trim(), email: texts.email.trim() }));
  };
  return (
    <form onSubmit={submit} className="grid gap-4" noValidate>
      {!tokenIsWrong && <ProblemNotice error={setUp.error} />}
      <FormText
        label="Token"
        hint="Printed in the terminal in which the product was started."
        autoComplete="off"
        spellCheck={false}
        {...form.field('token')}
      />
      <FormText label="Grid owner" autoComplete="organization" {...form.field('organisation')} />
      <FormText label="Your name" autoComplete="name" {...form.field('name')} />
      <FormText label="Email" type="email" autoComplete="username" {...form.field('email')} />
      <FormText
        label="Password"
        type="password"
        autoComplete="new-password"
        hint={`${LEAST_PASSWORD} characters or more`}
        {...form.field('password')}
      />
      <Button kind="primary" type="submit" busy={setUp.isPending} className="mt-2 w-full">
        Set up
      </Button>
    </form>
  );
}

/** The first start: who the grid owner is, and its first administrator. */
export function SetUpPage() {
  const { gridOwner, setUpNeeded } = useFrontDoor();
  return (
    <FrontDoor
      title="First set-up"
      lead="Names the grid owner and its first administrator. Done once."
      owner={gridOwner?.name ?? null}
    >
      {setUpNeeded ? (
        <SetUpForm />
      ) : (
        <Notice grade="in-balance" title="The product is set up">
          <Link to="/sign-in" className="link">
            Go to the sign-in
          </Link>
        </Notice>
      )}
    </FrontDoor>
  );
}
