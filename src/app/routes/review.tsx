import type { QueryClient } from '@tanstack/react-query';
import { Suspense, type ReactNode } from 'react';
import { Link, useParams } from 'react-router-dom';
import type { Discrepancy } from '#shared/contracts/api.generated';
import { SkeletonLines } from '../../components/feedback/skeleton';
import { Sheet } from '../../components/ui/sheet';
import { CasePrintFrame } from '../../features/applications/components/case-print-frame';
import { AttachButton } from '../../features/attachments/components/attach-button';
import { FileList } from '../../features/attachments/components/file-list';
import { CountersignSheet } from '../../features/countersigns/components/countersign-sheet';
import { CaseLetters } from '../../features/letters/components/case-letters';
import { LineSheet } from '../../features/line-sheet/components/line-sheet';
import { ReviewPage } from '../../features/review/components/review-page';
import { applicationQuery, useApplication } from '../../lib/queries/get-application';
import { revisionQuery } from '../../lib/queries/get-revision';
import { discrepanciesQuery } from '../../lib/queries/list-discrepancies';
import { attachmentsQuery, useAttachments } from '../../lib/queries/list-attachments';
import { revisionsQuery } from '../../lib/queries/list-revisions';

type Params = Readonly<Record<string, string | undefined>>;

export async function prefetch(client: QueryClient, { number = '' }: Params, url: URL) {
  void client.prefetchQuery(discrepanciesQuery(number));
  void client.prefetchQuery(revisionsQuery(number));
  void client.prefetchQuery(attachmentsQuery(number));
  const application = await client.ensureQueryData(applicationQuery(number));
  const letter = url.searchParams.get('revision') ?? application.revision;
  if (letter) await client.prefetchQuery(revisionQuery(number, letter));
}

/** The review sheet of an application, composed of the case, the line's sheet, its files and its letters. */
export function Component() {
  const { number = '' } = useParams();
  return (
    <>
      <CasePrintFrame number={number} subject="Review" />
      <ReviewPage
        number={number}
        slots={{
          lineSheet: (props) => (
            <Suspense fallback={<LinePlace />}>
              <LineSheet applicationNumber={number} {...props} />
            </Suspense>
          ),
          countersigns: <CaseCountersigns number={number} />,
          attachments: (discrepancy, mayAdd) => (
            <DiscrepancyFiles number={number} discrepancy={discrepancy} mayAdd={mayAdd} />
          ),
          papers: <Papers number={number} />,
        }}
      />
    </>
  );
}

/** The place of a line's sheet while it is on its way. */
function LinePlace() {
  return (
    <div className="sheet sheet-main p-6">
      <SkeletonLines lines={12} label="Loading the line" />
    </div>
  );
}

function CaseCountersigns({ number }: { number: string }) {
  return <CountersignSheet items={useApplication(number).pendingCountersigns} />;
}

interface DiscrepancyFilesProps {
  number: string;
  discrepancy: Discrepancy;
  mayAdd: boolean;
}

function DiscrepancyFiles({ number, discrepancy, mayAdd }: DiscrepancyFilesProps): ReactNode {
  if (discrepancy.attachments.length === 0 && !mayAdd) return null;
  return (
    <div className="discrepancy-files">
      <FileList files={discrepancy.attachments} />
      {mayAdd && (
        <AttachButton
          number={number}
          subject={{ discrepancy: discrepancy.number }}
          label={`Attach a file to D-${discrepancy.number}`}
        />
      )}
    </div>
  );
}

function Papers({ number }: { number: string }) {
  const { items } = useAttachments(number);
  return (
    <>
      <Suspense fallback={null}>
        <CaseLetters number={number} />
      </Suspense>
      <Sheet side title="Files" aside={items.length === 0 ? 'none' : items.length}>
        <div className="px-4 pb-4">
          <FileList files={items} />
        </div>
      </Sheet>
      <p className="no-print mt-4 text-table">
        <Link className="link" to={`/applications/${number}/record`}>
          Record of this application
        </Link>
      </p>
    </>
  );
}
