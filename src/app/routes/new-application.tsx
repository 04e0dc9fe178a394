import { useNavigate } from 'react-router-dom';
import { PageHead } from '../../components/ui/page-head';
import { useCreateApplication } from '../../features/applications/api/create-application';
import { ApplicationForm } from '../../features/applications/components/application-form';
import { blankApplication } from '../../features/applications/model/application-texts';
import { useIntention } from '../../lib/api/intention';
import { useSession } from '../../lib/api/session';

/** Begins an application. */
export function Component() {
  const session = useSession();
  const navigate = useNavigate();
  const intention = useIntention();
  const create = useCreateApplication();
  if (!session) return null;
  return (
    <>
      <PageHead
        title="Begin an application"
        crumbs={[{ label: 'Applications', to: '/applications' }, { label: 'new' }]}
        lead="It gets its number at once and stays a draft until you file it. All of this can be changed until then."
      />
      <ApplicationForm
        initial={blankApplication(session.user)}
        confirm="Begin the application"
        backTo="/applications"
        busy={create.isPending}
        error={create.error}
        onSend={(body) =>
          create.mutate(
            { body, idempotencyKey: intention.keyFor(body) },
            {
              onSuccess: ({ number }) => navigate(`/applications/${number}`),
              onSettled: (_, error) => intention.ended(error),
            },
          )
        }
      />
    </>
  );
}
