import type { Queue } from '#shared/contracts/api.generated';
import { formatDay } from '#shared/format/dates';
import { localDay } from '#shared/workflow/calendar';
import { DueRule } from '../../../components/charts/due-rule';
import { SegmentLinks } from '../../../components/ui/segment';
import { useDocumentTitle } from '../../../hooks/use-document-title';
import type { ListControls } from '../../../hooks/use-list-view';
import { writeListView } from '../../../lib/list-view';
import { useCalendar } from '../../../lib/queries/get-calendar';
import { dueItems, ruleDays, workCalendar } from '../model/due-days';
import { QUEUE_LIST, queueLead, whoseOf, withWhose, type QueueFilter, type Whose } from '../model/queue-list';

const WORDS: Readonly<Record<Whose, string>> = {
  mine: 'Mine',
  everyone: 'Everyone’s',
  nobody: 'Nobody’s yet',
};

interface QueueHeadProps {
  overview: Queue;
  controls: ListControls<QueueFilter>;
}

/** The heading, what the queue holds in words, whose it is, and the rule of due days. */
export function QueueHead({ overview, controls: { view } }: QueueHeadProps) {
  useDocumentTitle('Queue');
  const { counts, items } = overview;
  const current = whoseOf(view);
  return (
    <div className="queue-head">
      <div>
        <h1>Queue</h1>
        <p className="lead">{queueLead(counts.everyone, items)}</p>
        <div className="mt-4">
          <SegmentLinks
            label="Whose"
            items={(['mine', 'everyone', 'nobody'] as const).map((whose) => ({
              key: whose,
              label: `${WORDS[whose]} ${counts[whose]}`,
              to: `?${writeListView(QUEUE_LIST, withWhose(view, whose))}`,
              current: current === whose,
            }))}
          />
        </div>
      </div>
      {items.length > 0 && <Dues overview={overview} />}
    </div>
  );
}

/** The rule of due days with each application's worst grade standing on its day. */
function Dues({ overview: { items } }: { overview: Queue }) {
  const calendar = workCalendar(useCalendar());
  const now = new Date();
  const today = localDay(now, calendar.timeZone);
  return (
    <DueRule
      days={ruleDays(today, calendar)}
      today={{ date: today, text: `Today, ${formatDay(now, calendar.timeZone)}` }}
      items={dueItems(items, calendar)}
      label={`Due days of ${items.length} open applications, each with its worst finding. ${queueLead(items.length, items)}`}
    />
  );
}
