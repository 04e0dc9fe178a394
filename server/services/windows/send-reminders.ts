import { system } from '../../database/actor';
import { queueMail } from '../../database/outbox';
import { inTransaction, type Transaction } from '../../database/transaction';
import type { Surroundings } from '../../integrations/surroundings';
import { currentCalendar } from '../../repositories/calendar.repository';
import { openWindowsUntil, type OpenWindow } from '../../repositories/correspondence.repository';
import { addressOf, memberAddresses, reviewersFor } from '../../repositories/people-names.repository';
import { formatDate, leftInWords } from '../../../shared/format/dates';
import { localDay, workingDaysLeft, type WorkCalendar } from '../../../shared/workflow/calendar';
import { caseMail } from '../letters/mail-texts';

const DAYS_BEFORE = 2;
const LOOK_AHEAD_MS = 14 * 86_400_000;

/** What is owed in each window. */
const OWED: Readonly<Record<OpenWindow['kind'], string>> = {
  'take-up': 'The case waits to be taken up',
  review: 'The review is to be ended',
  cure: 'The discrepancies are to be answered and the next revision filed',
  extension: 'The discrepancies are to be answered and the next revision filed',
};

/**
 * Mails those whom a window waits for, two working days before it ends and on its last day. May run as often as one
 * likes: the outbox takes each reminder once. Answers how many windows were looked at.
 */
export async function sendReminders(surroundings: Surroundings): Promise<number> {
  return inTransaction(surroundings, system('reminders'), async (tx) => {
    const { calendar } = await currentCalendar(tx.manager);
    const windows = await openWindowsUntil(tx.manager, new Date(tx.now.getTime() + LOOK_AHEAD_MS));
    for (const window of windows) await remind(tx, window, calendar);
    return windows.length;
  });
}

async function remind(tx: Transaction, window: OpenWindow, calendar: WorkCalendar): Promise<void> {
  const left = workingDaysLeft(tx.now, window.dueAt, calendar);
  const isOver = localDay(tx.now, calendar.timeZone) > localDay(window.dueAt, calendar.timeZone);
  if (isOver || (left !== 0 && left !== DAYS_BEFORE)) return;
  const due = formatDate(window.dueAt, calendar.timeZone);
  const isApplicants = window.kind === 'cure' || window.kind === 'extension';
  for (const recipient of await recipientsOf(tx, window, isApplicants)) {
    await queueMail(tx, {
      kind: 'reminder',
      causeId: `${window.id} ${left}`,
      orgId: isApplicants ? window.orgId : null,
      recipient,
      subject: `${window.number}: ${left === 0 ? 'due today' : `due on ${due}`}`,
      body: caseMail(window, tx.tools.publicUrl, [`${OWED[window.kind]} by ${due}: ${leftInWords(left)}.`]),
    });
  }
}

async function recipientsOf(
  { manager }: Transaction,
  window: OpenWindow,
  isApplicants: boolean,
): Promise<string[]> {
  if (isApplicants) return memberAddresses(manager, window.orgId);
  const ids =
    window.reviewerId === null
      ? (await reviewersFor(manager, window.orgId)).map((reviewer) => reviewer.id)
      : [window.reviewerId];
  const addresses: string[] = [];
  for (const id of ids) {
    const address = await addressOf(manager, id);
    if (address !== null) addresses.push(address);
  }
  return addresses;
}
