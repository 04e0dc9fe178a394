import { useState, type ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { EmptyState } from '../../../components/feedback/empty-state';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { SkeletonRows } from '../../../components/feedback/skeleton';
import { Button } from '../../../components/ui/button';
import { GradeKey } from '../../../components/ui/grade-counts';
import { ListPages } from '../../../components/ui/list-pages';
import { Sheet } from '../../../components/ui/sheet';
import { useListView, type ListControls } from '../../../hooks/use-list-view';
import { isFiltered } from '../../../lib/list-view';
import { applicationPath } from '../../../lib/paths';
import { useQueue, useQueueOverview } from '../api/list-queue';
import { useTakeApplication } from '../api/take-application';
import { QUEUE_LIST, reviewersOf, voltagesOf, type QueueFilter } from '../model/queue-list';
import { QueueHead } from './queue-head';
import { QueueTable } from './queue-table';
import { QueueTools } from './queue-tools';

/** What waits for the grid owner, due first; a reviewer takes it from here. */
export function QueuePage({ aside }: { aside?: ReactNode }) {
  const navigate = useNavigate();
  const controls = useListView(QUEUE_LIST);
  const overview = useQueueOverview();
  const { data: page, error } = useQueue(controls.view);
  const take = useTakeApplication();
  const [taking, setTaking] = useState<string | null>(null);
  const choices = { voltages: voltagesOf(overview.items), reviewers: reviewersOf(overview.items) };
  return (
    <>
      <QueueHead overview={overview} controls={controls} />
      {aside}
      <ProblemNotice error={take.error ?? error} className="mb-4" />
      <QueueTools controls={controls} choices={choices} />
      <Sheet main label="Queue">
        {page ? (
          <QueueTable
            items={page.items}
            controls={controls}
            choices={choices}
            taking={take.isPending ? taking : null}
            onTake={({ number, version }) => {
              setTaking(number);
              take.mutate(
                { number, version },
                { onSuccess: () => navigate(applicationPath('reviewer', number)) },
              );
            }}
          />
        ) : (
          <SkeletonRows rows={10} label="Loading the queue" />
        )}
        {page?.items.length === 0 && <NothingHere controls={controls} />}
        <div className="sheet-foot">
          <GradeKey />
          {page && <ListPages page={page} controls={controls} />}
        </div>
      </Sheet>
    </>
  );
}

function NothingHere({ controls }: { controls: ListControls<QueueFilter> }) {
  if (isFiltered(controls.view)) {
    return (
      <EmptyState
        title="No application fits these filters."
        actions={<Button onClick={controls.clear}>Clear the filters</Button>}
      />
    );
  }
  return <EmptyState title="The queue is empty.">What applicants file from now on stands here.</EmptyState>;
}
