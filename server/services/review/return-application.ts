import type { Discrepancy } from '../../entities/review.entities';
import { currentCalendar } from '../../repositories/calendar.repository';
import { windowsOfRound } from '../../repositories/correspondence.repository';
import { discrepanciesOfRound, entriesOf, raisedFrom } from '../../repositories/discrepancy.repository';
import { findingsOfRun } from '../../repositories/run.repository';
import type { Finding } from '../../entities/verdict.entities';
import type { ReturnApplicationRequest } from '../../../shared/contracts/api.generated';
import type { Cause } from '../../../shared/checks/types';
import { formatDate } from '../../../shared/format/dates';
import { worstGrade } from '../../../shared/workflow/dispositions';
import { revisionLetter } from '../../../shared/workflow/revision-letters';
import type { Caller } from '../cases/caller';
import { filedRevision, holdCase, type CaseFile } from '../cases/case-file';
import { gatherFacts } from '../cases/gather-facts';
import { recordStep } from '../cases/record-step';
import { requireRevision } from '../cases/revision-changes';
import { moveRound, requireStep, requireVersion } from '../cases/take-step';
import { findingsAbout } from '../findings/finding-views';
import { issueLetter } from '../letters/issue-letter';
import type { LetterItem } from '../letters/render-letter';

/** Returns a case: the letter with its open discrepancies goes out, and the window for answers opens. */
export async function returnApplication(
  caller: Caller,
  reference: string,
  request: ReturnApplicationRequest,
): Promise<void> {
  const { tx } = caller;
  const file = await holdCase(caller, reference, 'review');
  await requireRevision(caller, file, request.revision);
  const transition = requireStep(caller, 'return', await gatherFacts(caller, file));
  requireVersion(file, request.version);
  await moveRound(caller, file, transition);
  const open = (await discrepanciesOfRound(tx.manager, file.round.id)).filter((d) => d.state === 'open');
  await sendLetter(caller, file, open, request.message ?? null);
  recordStep(tx, file, 'application.returned', {
    state: transition.to,
    discrepancies: open.map((d) => `D-${d.number}`),
  });
}

async function sendLetter(
  caller: Caller,
  file: CaseFile,
  open: readonly Discrepancy[],
  message: string | null,
): Promise<void> {
  const { tx } = caller;
  const revision = filedRevision(file);
  const { calendar } = await currentCalendar(tx.manager);
  const date = (instant: Date) => formatDate(instant, calendar.timeZone);
  const cure = (await windowsOfRound(tx.manager, file.round.id)).find((w) => w.closedAt === null);
  if (cure === undefined) throw new Error('a returned case has no window for answers');
  const due = date(cure.dueAt);
  const next = revisionLetter(revision.ordinal + 1);
  const heading = `${counted(open.length)} to answer by ${due}`;
  const number = file.application.number;
  await issueLetter(caller, file, {
    kind: 'return',
    heading,
    subject: heading,
    intro: [
      `We reviewed revision ${revision.letter} of application ${number}, filed on ${date(revision.filedAt)}. ` +
        `Before we can accept its line data we need an answer to what follows.`,
      ...(message === null ? [] : [message]),
    ],
    items: await itemsOf(caller, file, open),
    closingHeading: 'How to answer',
    closing: [
      `Open ${number}, answer each discrepancy by a change or an explanation, and file revision ${next} by ${due}, ` +
        `${cure.workingDays} working days from today.`,
    ],
    mail: [
      `Revision ${revision.letter} is returned with ${counted(open.length).toLowerCase()}.`,
      `Please answer and file revision ${next} by ${due}. The letter is attached.`,
    ],
    dueAt: cure.dueAt,
    discrepancies: open,
    state: 'returned',
  });
}

const NUMBERS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine', 'Ten'];

function counted(count: number): string {
  return `${NUMBERS[count] ?? count} ${count === 1 ? 'discrepancy' : 'discrepancies'}`;
}

async function itemsOf({ tx }: Caller, file: CaseFile, open: readonly Discrepancy[]): Promise<LetterItem[]> {
  const ids = open.map((d) => d.id);
  const links = await raisedFrom(tx.manager, ids);
  const entries = await entriesOf(tx.manager, ids);
  const findings = file.run === null ? [] : await findingsOfRun(tx.manager, file.run.id);
  return open.map((discrepancy) => {
    const own = findingsAbout(
      links.filter((l) => l.discrepancyId === discrepancy.id),
      findings,
    );
    const found = own.filter((finding) => finding.follows === null).flatMap(sentencesOf);
    const last = entries.filter((e) => e.discrepancyId === discrepancy.id && e.kind === 'reopened').at(-1);
    return {
      label: `D-${discrepancy.number}`,
      grade: worstGrade(own.map((f) => f.grade)),
      title: discrepancy.title,
      // what only follows from a questioned value is not said, nor what the reviewer's own words say already
      body: [
        ...found.filter((sentence) => !discrepancy.questioned.includes(sentence)),
        discrepancy.questioned,
        ...(last === undefined ? [] : [last.text]),
      ],
      ask: discrepancy.wouldSettle,
    };
  });
}

/** A finding's sentence, and the best of its causes. */
function sentencesOf(finding: Finding): string[] {
  const [best] = finding.causes as Cause[];
  return [finding.message, ...(best === undefined ? [] : [best.sentence])];
}
