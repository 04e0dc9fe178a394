import { useState } from 'react';
import type { Application, RevisionSummary } from '#shared/contracts/api.generated';
import { Timeline } from '../../../components/charts/timeline';
import { Sheet } from '../../../components/ui/sheet';
import { caseTimeline, timelineEntries } from '../model/case-timeline';

interface CaseTimelineProps {
  application: Application;
  revisions: readonly RevisionSummary[];
}

/** How far the case is: whose turn it was, for how long, what is due. */
export function CaseTimeline({ application, revisions }: CaseTimelineProps) {
  const [now] = useState(() => Date.now());
  return (
    <Sheet main label="How far it is" className="mb-6 px-4 pt-4 pb-3 field:px-6">
      <Timeline
        {...caseTimeline(application, now)}
        revisions={revisions.map(({ letter, filedAt, current }) => ({
          letter,
          at: new Date(filedAt).getTime(),
          current,
        }))}
        entries={timelineEntries(application, revisions)}
      />
    </Sheet>
  );
}
