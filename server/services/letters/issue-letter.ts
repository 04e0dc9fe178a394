import type { Discrepancy } from '../../entities/review.entities';
import { insertLetter, nextLetterNumber } from '../../repositories/correspondence.repository';
import { currentCalendar } from '../../repositories/calendar.repository';
import { gridOwner, namesOf, organisationNames } from '../../repositories/people-names.repository';
import { linesOfRevision } from '../../repositories/revision.repository';
import { formatDate } from '../../../shared/format/dates';
import { quantity } from '../../../shared/format/numbers';
import { STATE_WORDS, type State } from '../../../shared/workflow/states';
import type { Caller } from '../cases/caller';
import { filedRevision, type CaseFile } from '../cases/case-file';
import { sha256 } from '../filing/line-hash';
import { renderLetter, type LetterContent } from './render-letter';
import { caseMail } from './mail-texts';
import { mailMembers } from './mail-receipt';

/** What one kind of letter says; the rest follows from the case. */
export interface LetterText {
  kind: 'return' | 'decision';
  heading: string;
  subject: string;
  intro: string[];
  items: LetterContent['items'];
  closingHeading: string;
  closing: string[];
  /** What the mail says. */
  mail: string[];
  dueAt: Date | null;
  discrepancies: readonly Discrepancy[];
  state: State;
}

/** Writes a letter, keeps its bytes with their SHA-256, and mails it to the applicant's organisation. */
export async function issueLetter(caller: Caller, file: CaseFile, text: LetterText): Promise<string> {
  const { tx, actor } = caller;
  const { application, round } = file;
  const revision = filedRevision(file);
  const bytes = await renderLetter(await contentOf(caller, file, text));
  const letterId = await insertLetter(
    tx.manager,
    {
      orgId: application.orgId,
      applicationId: application.id,
      roundId: round.id,
      number: await nextLetterNumber(tx.manager, application.id),
      kind: text.kind,
      revisionId: revision.id,
      subject: text.subject,
      mediaType: 'application/pdf',
      bytes,
      sha256: sha256(bytes),
      dueAt: text.dueAt,
      issuedBy: actor.userId,
      issuedAt: tx.now,
    },
    text.discrepancies.map((d) => d.id),
  );
  await mailMembers(caller, file, {
    kind: text.kind,
    causeId: letterId,
    subject: `${application.number}: ${text.subject}`,
    body: caseMail(application, tx.tools.publicUrl, text.mail),
    letterId,
  });
  return letterId;
}

async function contentOf({ tx, actor }: Caller, file: CaseFile, text: LetterText): Promise<LetterContent> {
  const { application, round } = file;
  const revision = filedRevision(file);
  const { calendar } = await currentCalendar(tx.manager);
  const owner = await gridOwner(tx.manager);
  const applicant = (await organisationNames(tx.manager, [application.orgId])).get(application.orgId);
  const people = await namesOf(tx.manager, [round.reviewerId]);
  const voltages = new Set((await linesOfRevision(tx.manager, revision.id)).map((l) => l.nominalVoltageKv));
  const date = (instant: Date) => formatDate(instant, calendar.timeZone);
  return {
    owner: owner.name,
    applicant: applicant?.name ?? '',
    contactName: application.contactName,
    date: date(tx.now),
    heading: text.heading,
    intro: text.intro,
    items: text.items,
    closingHeading: text.closingHeading,
    closing: text.closing,
    signedBy: actor.name,
    createdAt: tx.now,
    block: {
      application: connectionWords(application),
      subject: text.kind === 'return' ? 'Discrepancy letter' : 'Decision',
      number: application.number,
      revision: revision.letter,
      voltages: [...voltages]
        .sort((a, b) => b - a)
        .map((kv) => `${kv} kV`)
        .join(', '),
      filed: date(revision.filedAt),
      reviewer: people.get(round.reviewerId ?? '')?.name ?? '',
      state: STATE_WORDS[text.state],
    },
  };
}

/** "Fellgate Wind, 480 MW at Sarn". */
function connectionWords({ title, capacityMw, pointOfConnection }: CaseFile['application']): string {
  return capacityMw === null ? title : `${title}, ${quantity(capacityMw, 'MW')} at ${pointOfConnection}`;
}
