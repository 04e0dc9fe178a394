import type { Transaction } from '../../database/transaction';
import type { CaseWindow } from '../../entities/correspondence.entities';
import { closeWindows, insertWindow } from '../../repositories/correspondence.repository';
import { currentCalendar, windowDays } from '../../repositories/calendar.repository';
import type { Transition } from '../../../shared/workflow/steps';
import { openWindow, type WindowSpan } from '../../../shared/workflow/windows';
import type { CaseFile } from '../cases/case-file';

/** Closes the windows that a step ends and opens the one that it begins, with its due day in the owner's calendar. */
export async function changeWindows(tx: Transaction, file: CaseFile, transition: Transition): Promise<void> {
  const { round, application } = file;
  if (transition.closes.length > 0) await closeWindows(tx.manager, round.id, tx.now);
  if (transition.opens === null) return;
  const { version, calendar } = await currentCalendar(tx.manager);
  const days = await windowDays(tx.manager);
  // a review that was put back goes on where it stopped
  const used = transition.opens === 'review' && transition.from === 'filed' ? round.reviewDaysUsed : 0;
  const span = openWindow(transition.opens, tx.now, days[transition.opens], used, calendar);
  await insertWindow(tx.manager, {
    orgId: application.orgId,
    roundId: round.id,
    kind: span.kind,
    openedAt: span.openedAt,
    dueAt: span.dueAt,
    workingDays: span.totalDays,
    calendarVersion: version,
  });
}

/** A stored window as the calendar's rules read it. */
export function spanOf(window: CaseWindow): WindowSpan {
  const { kind, openedAt, dueAt, closedAt, workingDays } = window;
  return { kind: kind === 'extension' ? 'cure' : kind, openedAt, dueAt, closedAt, totalDays: workingDays };
}
