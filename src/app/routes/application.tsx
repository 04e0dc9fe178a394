import { useQuery } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import { Navigate, useParams } from 'react-router-dom';
import { ButtonLink } from '../../components/ui/button';
import { PageHead } from '../../components/ui/page-head';
import { ApplicantSteps } from '../../features/applications/components/applicant-steps';
import { ApplicationTitleBlock } from '../../features/applications/components/application-title-block';
import { CasePrintFrame } from '../../features/applications/components/case-print-frame';
import { CaseTimeline } from '../../features/applications/components/case-timeline';
import { CheckProgress } from '../../features/applications/components/check-progress';
import { DraftFaults } from '../../features/applications/components/draft-faults';
import { LettersAndRevisions } from '../../features/applications/components/letters-and-revisions';
import { LinesSheet } from '../../features/applications/components/lines-sheet';
import { ToAnswer } from '../../features/applications/components/to-answer';
import { nextStepSentence } from '../../features/applications/model/next-step';
import { hasDraft } from '../../features/applications/model/words';
import { AttachButton } from '../../features/attachments/components/attach-button';
import { AttachmentsSheet } from '../../features/attachments/components/attachments-sheet';
import { FileList } from '../../features/attachments/components/file-list';
import { ImportPanel } from '../../features/imports/components/import-panel';
import { useSession } from '../../lib/api/session';
import { applicationPath } from '../../lib/paths';
import { applicationQuery, useApplication } from '../../lib/queries/get-application';
import { draftQuery } from '../../lib/queries/get-draft';
import { revisionQuery } from '../../lib/queries/get-revision';
import { applicationLettersQuery, useApplicationLetters } from '../../lib/queries/list-application-letters';
import { attachmentsQuery, useAttachments } from '../../lib/queries/list-attachments';
import { discrepanciesQuery, useDiscrepancies } from '../../lib/queries/list-discrepancies';
import { revisionsQuery, useRevisions } from '../../lib/queries/list-revisions';

type Params = Readonly<Record<string, string | undefined>>;

export const prefetch = (client: QueryClient, { number = '' }: Params) =>
  Promise.all([
    client.prefetchQuery(applicationQuery(number)),
    client.prefetchQuery(revisionsQuery(number)),
    client.prefetchQuery(discrepanciesQuery(number)),
    client.prefetchQuery(applicationLettersQuery(number)),
    client.prefetchQuery(attachmentsQuery(number)),
  ]);

/** Everything that the page shows; the draft and the revision only where the case has them. */
function useCase(number: string) {
  const application = useApplication(number);
  const open = hasDraft(application);
  const { revision } = application;
  const draft = useQuery({ ...draftQuery(number), enabled: open }).data ?? null;
  const filed = useQuery({ ...revisionQuery(number, revision ?? ''), enabled: revision !== null }).data;
  return {
    application,
    open,
    draft: open ? draft : null,
    filed: filed ? { letter: filed.letter, lines: filed.lines } : null,
    revisions: useRevisions(number).items,
    discrepancies: useDiscrepancies(number).items,
    letters: useApplicationLetters(number).items,
    files: useAttachments(number).items,
  };
}

function ApplicationPage({ number }: { number: string }) {
  const { application, open, draft, filed, revisions, discrepancies, letters, files } = useCase(number);
  const letter = letters[0];
  const filesOf = (discrepancy: number) => {
    const own = files.filter((f) => f.subject.discrepancy === discrepancy);
    return own.length > 0 && <FileList files={own} />;
  };
  return (
    <>
      <CasePrintFrame number={number} subject="Application" />
      <PageHead
        title={application.title}
        documentTitle={`${number} ${application.title}`}
        crumbs={[{ label: 'Applications', to: '/applications' }, { label: number }]}
        lead={nextStepSentence(application, draft, discrepancies)}
        actions={
          <>
            <ApplicantSteps application={application} draft={draft}>
              {letter && (
                <a className="button" href={letter.href}>
                  Read the letter
                </a>
              )}
              {open && <ButtonLink to={`/applications/${number}/edit`}>Edit</ButtonLink>}
            </ApplicantSteps>
          </>
        }
        block={<ApplicationTitleBlock application={application} />}
      />
      {application.windows.length > 0 && <CaseTimeline application={application} revisions={revisions} />}
      <CheckProgress check={application.check} revision={application.revision} />
      <div className="aside-columns">
        <div className="min-w-0">
          <ToAnswer
            application={application}
            discrepancies={discrepancies}
            attachTo={(discrepancy) => <AttachButton number={number} subject={{ discrepancy }} />}
            filesOf={filesOf}
          />
          <LinesSheet application={application} draft={draft} filed={filed} />
          {draft && <DraftFaults number={number} draft={draft} />}
        </div>
        <div className="grid min-w-0 grid-cols-[minmax(0,1fr)] gap-6 [&>.sheet]:mt-0">
          {draft && (
            <ImportPanel
              number={number}
              hasLines={draft.lines.length > 0}
              incomplete={draft.lines.filter((l) => !l.complete).map((l) => l.lineKey)}
            />
          )}
          <LettersAndRevisions number={number} letters={letters} revisions={revisions} />
          <AttachmentsSheet number={number} files={files} open={open} />
        </div>
      </div>
      {application.decision && <p className="mt-6 text-label text-ink-soft">{application.caution}</p>}
    </>
  );
}

/** An application as its applicant sees it; the owner's people have their own sheet of it. */
export function Component() {
  const { number = '' } = useParams();
  const session = useSession();
  if (!session) return null;
  if (session.role !== 'applicant') return <Navigate to={applicationPath(session.role, number)} replace />;
  return <ApplicationPage number={number} />;
}
