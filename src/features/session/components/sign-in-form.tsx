import { useState, type FormEvent } from 'react';
import type { TotpEnrolment } from '#shared/contracts/api.generated';
import { Notice } from '../../../components/feedback/notice';
import { Button } from '../../../components/ui/button';
import { Field } from '../../../components/ui/field';
import { TextInput } from '../../../components/ui/inputs';
import { ApiProblem } from '../../../lib/api/problem';
import { useEnrolTotp, useSignIn, type Session, type SignInStep } from '../../../lib/api/session';

interface SignInFormProps {
  /** Set when the same person comes back: the address is shown and stays. */
  email?: string;
  /** Filled in beforehand, from the list of demo accounts. */
  preset?: { email: string; password: string };
  onSignedIn?: (session: Session) => void;
}

function reasonOf(error: Error): string {
  if (error instanceof ApiProblem && error.problem === 'sign-in-refused')
    return 'Address and password do not fit each other. Check both and try again.';
  return error.message;
}

interface CredentialFieldsProps {
  email: string;
  fixed: boolean;
  password: string;
  onEmail: (email: string) => void;
  onPassword: (password: string) => void;
}

function CredentialFields({ email, fixed, password, onEmail, onPassword }: CredentialFieldsProps) {
  return (
    <>
      <Field label="Email">
        {(ties) => (
          <TextInput
            {...ties}
            type="email"
            value={email}
            readOnly={fixed}
            onChange={(event) => onEmail(event.target.value)}
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
            onChange={(event) => onPassword(event.target.value)}
            autoComplete="current-password"
            required
          />
        )}
      </Field>
    </>
  );
}

/** The key of a new second step, to be put into an authenticator once. */
function EnrolmentWords({ secret, uri }: TotpEnrolment) {
  return (
    <Notice title="Your role needs a second step">
      <p>
        Put this key into an authenticator, by hand or{' '}
        <a className="link" href={uri}>
          by opening it there
        </a>
        , then enter the code that it shows.
      </p>
      <p className="mt-1 font-mono break-all">{secret}</p>
    </Notice>
  );
}

function CodeField({ code, onCode }: { code: string; onCode: (code: string) => void }) {
  return (
    <Field label="Code" hint="Six digits from your authenticator.">
      {(ties) => (
        <TextInput
          {...ties}
          value={code}
          onChange={(event) => onCode(event.target.value)}
          autoComplete="one-time-code"
          inputMode="numeric"
          autoFocus
          required
        />
      )}
    </Field>
  );
}

/** Address and password, then the code of the second step where the account has one. */
export function SignInForm({ email: fixedEmail, preset, onSignedIn }: SignInFormProps) {
  const [email, setEmail] = useState(fixedEmail ?? preset?.email ?? '');
  const [password, setPassword] = useState(preset?.password ?? '');
  const [code, setCode] = useState('');
  const [step, setStep] = useState<'password' | 'code'>('password');
  const signIn = useSignIn();
  const enrol = useEnrolTotp();

  const goOn = (next: SignInStep) => {
    if (next.next === 'in') return onSignedIn?.(next.session);
    setStep('code');
    if (next.next === 'totp-enrolment') enrol.mutate();
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    const input = step === 'code' ? { code: code.trim() } : { email: email.trim(), password };
    signIn.mutate(input, { onSuccess: goOn });
  };
  const error = signIn.error ?? enrol.error;

  return (
    <form onSubmit={submit} className="grid gap-4" noValidate>
      {error && (
        <Notice grade="must-answer" announce>
          {reasonOf(error)}
        </Notice>
      )}
      {enrol.data && <EnrolmentWords {...enrol.data} />}
      {step === 'code' ? (
        <CodeField code={code} onCode={setCode} />
      ) : (
        <CredentialFields
          email={email}
          fixed={fixedEmail !== undefined}
          password={password}
          onEmail={setEmail}
          onPassword={setPassword}
        />
      )}
      <Button kind="primary" type="submit" busy={signIn.isPending} className="mt-2 w-full">
        {signIn.isPending ? 'Signing in' : 'Sign in'}
      </Button>
    </form>
  );
}
