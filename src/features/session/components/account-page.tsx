import type { FormEvent } from 'react';
import { Notice } from '../../../components/feedback/notice';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { Button } from '../../../components/ui/button';
import { FormText } from '../../../components/ui/form-text';
import { PageHead } from '../../../components/ui/page-head';
import { Sheet } from '../../../components/ui/sheet';
import { useTexts } from '../../../hooks/use-texts';
import { useSession, type Session } from '../../../lib/api/session';
import { faultsByField } from '../../../lib/field-faults';
import { useChangePassword } from '../api/change-password';
import { LEAST_PASSWORD, passwordWish } from '../model/wishes';

const presentWish = (text: string) => (text === '' ? 'Enter the password that holds now.' : undefined);

function PasswordForm() {
  const change = useChangePassword();
  const form = useTexts(
    { present: '', password: '' },
    (t) => ({ present: presentWish(t.present), password: passwordWish(t.password) }),
    faultsByField(change.error),
  );
  const submit = (event: FormEvent) => {
    event.preventDefault();
    form.submit((body) => change.mutate(body));
  };
  return (
    <form onSubmit={submit} className="grid max-w-[420px] gap-4" noValidate>
      <ProblemNotice error={change.error} />
      {change.isSuccess && (
        <Notice grade="in-balance" announce>
          The new password holds. Other devices are signed out.
        </Notice>
      )}
      <FormText
        label="Present password"
        type="password"
        autoComplete="current-password"
        {...form.field('present')}
      />
      <FormText
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`${LEAST_PASSWORD} characters or more`}
        {...form.field('password')}
      />
      <p>
        <Button kind="primary" type="submit" busy={change.isPending}>
          Change the password
        </Button>
      </p>
    </form>
  );
}

function Memberships({ session }: { session: Session }) {
  return (
    <dl className="facts">
      {session.memberships.map(({ organisationId, organisationName, role }) => (
        <div key={`${organisationId}:${role}`} className="contents">
          <dt>{organisationName}</dt>
          <dd>
            {role}
            {organisationId === session.organisation.id && role === session.role && ', now'}
          </dd>
        </div>
      ))}
    </dl>
  );
}

/** One's own account: the password, and the organisations that one works for. */
export function AccountPage() {
  const session = useSession();
  if (!session) return null;
  return (
    <>
      <PageHead title="Your account" lead={`${session.user.name}, ${session.user.email}`} />
      <div className="aside-columns">
        <Sheet main title="Password">
          <div className="sheet-body">
            <PasswordForm />
          </div>
        </Sheet>
        <Sheet title="You work for" className="!mt-0">
          <div className="sheet-body">
            <Memberships session={session} />
          </div>
        </Sheet>
      </div>
    </>
  );
}
