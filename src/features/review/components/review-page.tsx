import { useState, type ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import type { Application, Discrepancy, Finding, Revision } from '#shared/contracts/api.generated';
import { EmptyState } from '../../../components/feedback/empty-state';
import { PageHead } from '../../../components/ui/page-head';
import { useSession } from '../../../lib/api/session';
import { useApplication } from '../../../lib/queries/get-application';
import { useRevision } from '../../../lib/queries/get-revision';
import { useDiscrepancies } from '../../../lib/queries/list-discrepancies';
import { useSelection, type Selection } from '../hooks/use-selection';
import { isOpen } from '../model/head-steps';
import { connectionWords, reviewLead } from '../model/lead';
import { ApplicationBlock } from './application-block';
import { DecisionSheet } from './decision-sheet';
import { DiscrepanciesMini } from './discrepancies-mini';
import { DiscrepanciesSheet } from './discrepancies-sheet';
import { FindingActions } from './finding-actions';
import { HeadActions } from './head-actions';
import { LinesNav } from './lines-nav';
import { RaiseDialog } from './raise-dialog';
import { RevisionsMini } from './revisions-mini';
import { RunsMini } from './runs-mini';
import { SelectionBar } from './selection-bar';

/** What the page is composed of, given by the route: parts of other features. */
export interface ReviewSlots {
  lineSheet: (props: {
    letter: string;
    lineKey: string;
    findingActions: (finding: Finding) => ReactNode;
  }) => ReactNode;
  /** Proposals that wait for a second reviewer. */
  countersigns?: ReactNode;
  attachments?: (discrepancy: Discrepancy, mayAdd: boolean) => ReactNode;
  /** Files of the application and its letters, for the left column. */
  papers?: ReactNode;
}

interface ReviewPageProps {
  number: string;
  slots: ReviewSlots;
}

/** The review sheet: the case and its steps on top, its lines at the left, one line's balance at the right. */
export function ReviewPage({ number, slots }: ReviewPageProps) {
  const application = useApplication(number);
  const [params] = useSearchParams();
  const crumbs = useCrumbs(application);
  const letter = params.get('revision') ?? application.revision;
  if (letter === null || application.revision === null) {
    return (
      <>
        <PageHead title={application.title} crumbs={crumbs} />
        <EmptyState title="Nothing has been filed yet.">
          The applicant is still drafting. The review begins with the first revision.
        </EmptyState>
      </>
    );
  }
  return (
    <FiledReview application={application} current={application.revision} letter={letter} slots={slots} />
  );
}

const IN_QUEUE: readonly Application['state'][] = ['filed', 'in-review', 'returned'];

/** Back to the queue for a reviewer whose case stands in it: nobody else has one. */
function useCrumbs({ number, state }: Application) {
  const inQueue = useSession()?.role === 'reviewer' && IN_QUEUE.includes(state);
  const above = inQueue ? { label: 'Queue', to: '/queue' } : { label: 'Applications', to: '/applications' };
  return [above, { label: number }];
}

/** "you" where the case is the reader's own, else who has it. */
function useReviewerWords({ reviewer }: Application): string {
  const session = useSession();
  if (reviewer === null) return 'its reviewer';
  return reviewer.id === session?.user.id ? 'you' : reviewer.name;
}

interface FiledReviewProps {
  application: Application;
  /** The latest revision: what steps are taken on. */
  current: string;
  /** The revision shown. */
  letter: string;
  slots: ReviewSlots;
}

function FiledReview({ application, current, letter, slots }: FiledReviewProps) {
  const { number } = application;
  const crumbs = useCrumbs(application);
  const revision = useRevision(number, letter);
  const discrepancies = useDiscrepancies(number).items;
  const selection = useSelection();
  const [raising, setRaising] = useState<readonly Finding[] | null>(null);
  const nextName = `D-${Math.max(0, ...discrepancies.map((d) => d.number)) + 1}`;
  const mayAct = letter === current && isOpen(application, 'raise');
  const reviewer = useReviewerWords(application);
  return (
    <>
      <PageHead
        title={`${application.title}, ${connectionWords(application)}`}
        documentTitle={`${number} ${application.title}`}
        crumbs={crumbs}
        lead={reviewLead(application, discrepancies, reviewer)}
        actions={
          <HeadActions
            application={application}
            discrepancies={discrepancies}
            revision={current}
            before={revisionBefore(current)}
          />
        }
        block={<ApplicationBlock application={application} />}
      />
      {slots.countersigns}
      <DecisionSheet application={application} />
      <div className="two-columns review-columns">
        <SideColumn
          revision={revision}
          discrepancies={discrepancies}
          application={application}
          mayAct={mayAct}
          papers={slots.papers}
        />
        <div>
          <ShownLine {...{ revision, selection, mayAct, nextName, number, slots }} onRaise={setRaising} />
          <DiscrepanciesSheet
            discrepancies={discrepancies}
            context={{ number, revision: current, mayAct, attachments: slots.attachments }}
            onRaise={mayAct ? () => setRaising([]) : null}
          />
          <p className="caution mt-6">{application.caution}</p>
        </div>
      </div>
      <SelectionBar
        selection={selection}
        nextName={nextName}
        onRaise={() => setRaising(selection.findings)}
      />
      {raising && (
        <RaiseDialog
          number={number}
          revision={current}
          findings={raising}
          lines={revision.lines}
          name={nextName}
          onRaised={() => {
            selection.clear();
            setRaising(null);
          }}
          onClose={() => setRaising(null)}
        />
      )}
    </>
  );
}

/** The letter before a single one; two-letter revisions are compared from the list of revisions. */
function revisionBefore(letter: string): string | null {
  if (letter.length !== 1 || letter === 'A') return null;
  return String.fromCharCode(letter.charCodeAt(0) - 1);
}

interface SideColumnProps {
  revision: Revision;
  application: Application;
  discrepancies: readonly Discrepancy[];
  mayAct: boolean;
  papers?: ReactNode;
}

function SideColumn({ revision, application, discrepancies, mayAct, papers }: SideColumnProps) {
  const [params] = useSearchParams();
  const shown = params.get('line') ?? revision.lines[0]?.lineKey ?? null;
  const { number } = application;
  const reviewer = useReviewerWords(application);
  const lineHref = (lineKey: string) => `?revision=${revision.letter}&line=${lineKey}`;
  return (
    <div>
      <LinesNav lines={revision.lines} shown={shown} hrefOf={lineHref} />
      <div className="side-rest">
        <DiscrepanciesMini items={discrepancies} state={application.state} reviewer={reviewer} />
        <RevisionsMini
          number={number}
          shown={revision.letter}
          hrefOf={(letter) => `?revision=${letter}${shown ? `&line=${shown}` : ''}`}
        />
        <RunsMini number={number} letter={revision.letter} mayRun={mayAct} />
        {papers}
      </div>
    </div>
  );
}

interface ShownLineProps {
  number: string;
  revision: Revision;
  selection: Selection;
  mayAct: boolean;
  nextName: string;
  slots: ReviewSlots;
  onRaise: (findings: readonly Finding[]) => void;
}

function ShownLine({ number, revision, selection, mayAct, nextName, slots, onRaise }: ShownLineProps) {
  const [params] = useSearchParams();
  const asked = params.get('line');
  const line = revision.lines.find((l) => l.lineKey === asked) ?? revision.lines[0];
  if (!line) return <EmptyState title="This revision has no lines." />;
  return slots.lineSheet({
    letter: revision.letter,
    lineKey: line.lineKey,
    findingActions: (finding) => (
      <FindingActions
        number={number}
        revision={revision.letter}
        finding={finding}
        selection={selection}
        mayAct={mayAct}
        nextName={nextName}
        onRaise={onRaise}
      />
    ),
  });
}
