import type { QueryClient } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { PageHead } from '../../components/ui/page-head';
import { ApplicationForm } from '../../features/applications/components/application-form';
import { textsOf } from '../../features/applications/model/application-texts';
import { applicationQuery, useApplication } from '../../lib/queries/get-application';
import { useCaseWrite } from '../../lib/queries/use-case-write';

export const prefetch = (
  client: QueryClient,
  { number = '' }: Readonly<Record<string, string | undefined>>,
) => client.prefetchQuery(applicationQuery(number));

/** Changes the head of an application. */
export function Component() {
  const { number = '' } = useParams();
  const application = useApplication(number);
  const navigate = useNavigate();
  const update = useCaseWrite('updateApplication', number);
  const { version } = application;
  return (
    <>
      <PageHead
        title={`Change ${application.title}`}
        crumbs={[
          { label: 'Applications', to: '/applications' },
          { label: number, to: `/applications/${number}` },
          { label: 'change' },
        ]}
      />
      <ApplicationForm
        initial={textsOf(application)}
        confirm="Save"
        backTo={`/applications/${number}`}
        busy={update.isPending}
        error={update.error}
        onSend={(body) =>
          update.mutate(
            { body: { ...body, version } },
            { onSuccess: () => navigate(`/applications/${number}`) },
          )
        }
      />
    </>
  );
}
