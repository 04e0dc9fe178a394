import { useState, type FormEvent } from 'react';
import { Notice } from '../../../components/feedback/notice';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { TextInput } from '../../../components/ui/inputs';
import { ApiProblem } from '../../../lib/api/problem';
import { useSignIn, type Session } from '../../../lib/api/session';

interface SignInFormProps {
  /** Set when the same person comes back: the address is shown and stays. */
  email?: string;
  onSignedIn?: (session: Session) => void;
}

function reasonOf(error: Error): string {
  if (error instanceof ApiProblem && error.problem === 'sign-in-refused')
    return 'Address and password do not fit each other. Check both and try again.';
  return error.message;
}

/** Address and password, then the code of the second step where the account has one. */
export function SignInForm({ email: fixedEmail, onSignedIn }: SignInFormProps) {
  const [email, setEmail] = useState(fixedEmail ?? '');
  const [password, setPassword] = useState('');
  const [code, setCode] = useState('');
  const [asksForCode, setAsksForCode] = useState(false);
  const signIn = useSignIn();

  const submit = (event: FormEvent) => {
    event.preventDefault();
    signIn.mutate(asksForCode ? { code: code.trim() } : { email: email.trim(), password }, {
      onSuccess: (step) => {
        if (step.next === 'totp') setAsksForCode(true);
        else onSignedIn?.(step.session);
      },
    });
  };

  return (
    <form onSubmit={submit} className="grid gap-4" noValidate>
      {signIn.error && (
        <Notice grade="must-answer" announce>
          {reasonOf(signIn.error)}
        </Notice>
      )}
      {asksForCode ? (
        <Field label="Code" hint="Six digits from your authenticator, or one of your recovery codes.">
          {(ties) => (
            <TextInput
              {...ties}
              value={code}
              onChange={(event) => setCode(event.target.value)}
              autoComplete="one-time-code"
              inputMode="numeric"
              autoFocus
              required
            />
          )}
        </Field>
      ) : (
        <>
          <Field label="Email">
            {(ties) => (
              <TextInput
                {...ties}
                type="email"
                value={email}
                readOnly={fixedEmail !== undefined}
                onChange={(event) => setEmail(event.target.value)}
                autoComplete="username"
                required
              />
            )}
          </Field>
          <Field label="Password">
            {(ties) => (
              <TextInput
                {...ties}
                type="password"
                value={password}
                onChange={(event) => setPassword(event.target.value)}
                autoComplete="current-password"
                required
              />
            )}
          </Field>
        </>
      )}
      <Button kind="primary" type="submit" busy={signIn.isPending} className="mt-2 w-full">
        {signIn.isPending ? 'Signing in' : 'Sign in'}
      </Button>
    </form>
  );
}
