import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Session } from '../../../lib/api/session';
import { useFrontDoor } from '../api/get-front-door';
import { DemoAccounts } from './demo-accounts';
import { FrontDoor } from './front-door';
import { SignInForm } from './sign-in-form';

/** Sign in; in the demo with an account of its list. */
export function SignInPage({ onSignedIn }: { onSignedIn: (session: Session) => void }) {
  const { gridOwner, demo } = useFrontDoor();
  const [preset, setPreset] = useState<{ email: string; password: string } | undefined>();
  const owner = gridOwner?.name ?? 'the grid owner';
  return (
    <FrontDoor
      title="Sign in"
      lead={`to the line data of ${owner}`}
      owner={gridOwner?.name ?? null}
      foot={
        <>
          New applicant?{' '}
          <Link to="/ask-for-account" className="link">
            {`Ask ${owner} for an account`}
          </Link>
          .
        </>
      }
    >
      <SignInForm key={preset?.email} preset={preset} onSignedIn={onSignedIn} />
      <p className="mt-5 text-table">
        <Link to="/new-password" className="link">
          Set a new password
        </Link>
      </p>
      {demo && <DemoAccounts onChoose={(email, password) => setPreset({ email, password })} />}
    </FrontDoor>
  );
}
