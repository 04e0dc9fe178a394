import { formatDate } from '#shared/format/dates';
import { PrintFrame } from '../../../components/ui/print-frame';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { STATE_WORDS } from '../../../components/ui/stamp';
import { useApplication } from '../../../lib/queries/get-application';
import { voltagesWords } from '../model/words';

interface CasePrintFrameProps {
  number: string;
  /** What the paper is: "Review", "Check report". */
  subject: string;
  /** The revision that it shows; without one the latest. */
  letter?: string;
}

/** Frame, caution and title block of a case's pages on paper. */
export function CasePrintFrame({ number, subject, letter }: CasePrintFrameProps) {
  const application = useApplication(number);
  const { title, applicant, voltagesKv, filedAt, reviewer, state, nextRevision } = application;
  const revision = letter ?? application.revision ?? nextRevision;
  return (
    <PrintFrame
      caution={application.caution}
      cells={[
        { label: 'Application', value: title, span: 6, lead: true },
        { label: 'Subject', value: subject, span: 2 },
        { label: 'Number', value: application.number, span: 2, lead: true },
        { label: 'Revision', value: <RevisionTriangle letter={revision} />, span: 2 },
        { label: 'Applicant', value: applicant.name, span: 3 },
        { label: 'Voltages', value: voltagesKv.length > 0 ? voltagesWords(voltagesKv) : 'none yet', span: 3 },
        { label: 'Filed', value: filedAt ? formatDate(filedAt) : 'not yet', span: 2 },
        { label: 'Reviewer', value: reviewer?.name ?? 'nobody yet', span: 2 },
        { label: 'State', value: STATE_WORDS[state], span: 2 },
      ]}
    />
  );
}
