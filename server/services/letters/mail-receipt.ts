import { queueMail } from '../../database/outbox';
import { asSystem } from '../../database/transaction';
import type { Revision } from '../../entities/filed.entities';
import { currentCalendar } from '../../repositories/calendar.repository';
import { windowsOfRound } from '../../repositories/correspondence.repository';
import { memberAddresses } from '../../repositories/people-names.repository';
import { linesOfRevision } from '../../repositories/revision.repository';
import { formatDate } from '../../../shared/format/dates';
import type { Caller } from '../cases/caller';
import type { CaseFile } from '../cases/case-file';
import { caseMail } from './mail-texts';

/** Mails the receipt of a filing to everybody of the applicant's organisation. */
export async function mailReceipt({ tx }: Caller, file: CaseFile, revision: Revision): Promise<void> {
  const { application, round } = file;
  const lines = await linesOfRevision(tx.manager, revision.id);
  const { calendar } = await currentCalendar(tx.manager);
  const open = (await windowsOfRound(tx.manager, round.id)).find((window) => window.closedAt === null);
  const count = lines.length === 1 ? 'one line' : `${lines.length} lines`;
  const next =
    revision.ordinal === 1 || round.state === 'draft' ? 'A reviewer takes it up' : 'The review goes on';
  const body = caseMail(application, tx.tools.publicUrl, [
    `Revision ${revision.letter} was filed on ${formatDate(revision.filedAt, calendar.timeZone)} with ${count}.`,
    `Its content is kept under SHA-256 ${revision.contentHash}.`,
    open === undefined ? '' : `${next} by ${formatDate(open.dueAt, calendar.timeZone)}.`,
  ]);
  await mailMembers({ tx }, file, {
    kind: 'receipt',
    causeId: revision.id,
    subject: `${application.number}: revision ${revision.letter} is filed`,
    body,
    letterId: null,
  });
}

/** Puts a mail about a case into the outbox for each member of the case's own organisation, and for nobody else. */
export async function mailMembers(
  { tx }: Pick<Caller, 'tx'>,
  { application }: Pick<CaseFile, 'application'>,
  mail: { kind: string; causeId: string; subject: string; body: string; letterId: string | null },
): Promise<void> {
  const addresses = await asSystem(tx, (manager) => memberAddresses(manager, application.orgId));
  for (const recipient of addresses) await queueMail(tx, { ...mail, orgId: application.orgId, recipient });
}
