import type { ListApplicationsRequest } from '#shared/contracts/api.generated';
import { EmptyState } from '../../../components/feedback/empty-state';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { SkeletonRows } from '../../../components/feedback/skeleton';
import { Button, ButtonLink } from '../../../components/ui/button';
import { GradeKey } from '../../../components/ui/grade-counts';
import { ListPages } from '../../../components/ui/list-pages';
import { PageHead } from '../../../components/ui/page-head';
import { Sheet } from '../../../components/ui/sheet';
import { useListView } from '../../../hooks/use-list-view';
import type { ListControls } from '../../../hooks/use-list-view';
import type { Role } from '../../../lib/api/session';
import { isFiltered, listQueryOf } from '../../../lib/list-view';
import { useApplications } from '../api/list-applications';
import { APPLICATIONS_LIST } from '../model/applications-list';
import type { ApplicationFilter } from '../model/applications-list';
import { ApplicationFilterControl, ApplicationsTable } from './applications-table';

function Nothing({ controls, role }: { controls: ListControls<ApplicationFilter>; role: Role }) {
  if (isFiltered(controls.view))
    return (
      <EmptyState
        title="No application fits these filters"
        actions={<Button onClick={controls.clear}>Clear the filters</Button>}
      />
    );
  if (role === 'applicant')
    return (
      <EmptyState
        title="No application yet"
        actions={
          <ButtonLink kind="primary" to="/applications/new">
            Begin an application
          </ButtonLink>
        }
      >
        Begin one: name the connection, then declare its lines by the form or from a file.
      </EmptyState>
    );
  return <EmptyState title="No application has been filed yet" />;
}

/** The applications that one may see, with their state, findings and due dates. */
export function ApplicationsPage({ role, organisation }: { role: Role; organisation: string }) {
  const controls = useListView(APPLICATIONS_LIST);
  const { data, isPending, error } = useApplications(listQueryOf(controls.view) as ListApplicationsRequest);
  const empty = data?.items.length === 0;
  return (
    <>
      <PageHead
        title="Applications"
        lead={
          role === 'applicant'
            ? `What ${organisation} has begun, filed and been answered.`
            : 'Every application that was ever filed.'
        }
        block={
          role === 'applicant' && !(empty && !isFiltered(controls.view)) ? (
            <ButtonLink kind="primary" to="/applications/new" className="self-end">
              Begin an application
            </ButtonLink>
          ) : undefined
        }
      />
      <ProblemNotice error={error} className="mb-6" />
      <div className="table-tools">
        <ApplicationFilterControl name="search" controls={controls} />
        <ApplicationFilterControl name="state" controls={controls} />
        <ApplicationFilterControl name="grade" controls={controls} />
      </div>
      <Sheet main label="Applications">
        {isPending && <SkeletonRows />}
        {data && empty && <Nothing controls={controls} role={role} />}
        {data && !empty && (
          <>
            <ApplicationsTable items={data.items} controls={controls} role={role} />
            <div className="sheet-foot">
              <ListPages page={data} controls={controls} />
              <GradeKey />
            </div>
          </>
        )}
      </Sheet>
    </>
  );
}
