/** Windows: how many working days a step may take, and what each step does to them. */
import { dueAt, workingDaysLeft, type WorkCalendar } from './calendar';

/** Kinds of window. */
export const WINDOW_KINDS = ['take-up', 'review', 'cure'] as const;

/** Kind of a window: taking a filed case up, reviewing it, answering its discrepancies. */
export type WindowKind = (typeof WINDOW_KINDS)[number];

/** Working days granted by kind; settings of the owner. */
export type WindowDays = Readonly<Record<WindowKind, number>>;

/**
 * Working days where the owner has set none: the order of magnitude of public interconnection procedures, 3–15 to
 * acknowledge and check completeness, 10 to cure. Common practice, no one source; the owner's rules govern.
 */
export const DEFAULT_WINDOW_DAYS: WindowDays = { 'take-up': 5, review: 20, cure: 10 };

/** What titles and sentences call each window. */
export const WINDOW_WORDS: Readonly<Record<WindowKind, string>> = {
  'take-up': 'taking up',
  review: 'review',
  cure: 'answers',
};

/** A window as it is stored: due days are reckoned once, when it is opened. */
export interface WindowSpan {
  kind: WindowKind;
  openedAt: Date;
  dueAt: Date;
  closedAt: Date | null;
  /** Working days granted in all. */
  totalDays: number;
}

/** A window as it is shown, in working days. */
export interface WindowReading {
  used: number;
  total: number;
  /** Negative when it is over. */
  left: number;
}

/**
 * Opens a window.
 * @param kind its kind
 * @param openedAt when
 * @param totalDays working days that it grants in all
 * @param usedDays working days of it that are used already, as of a review that was put back
 * @param calendar the owner's calendar
 * @returns the window with its due day; one whose days are all used is due on the day of opening
 */
export function openWindow(
  kind: WindowKind,
  openedAt: Date,
  totalDays: number,
  usedDays: number,
  calendar: WorkCalendar,
): WindowSpan {
  const due = dueAt(openedAt, Math.max(0, totalDays - usedDays), calendar);
  return { kind, openedAt, dueAt: due, closedAt: null, totalDays };
}

/**
 * Reads a window's meter.
 * @param window the window
 * @param now the present; a closed window is read as of its closing
 * @param calendar the owner's calendar
 * @returns working days used, granted and left
 */
export function readWindow(window: WindowSpan, now: Date, calendar: WorkCalendar): WindowReading {
  const left = workingDaysLeft(window.closedAt ?? now, window.dueAt, calendar);
  return { used: Math.max(0, window.totalDays - left), total: window.totalDays, left };
}

/**
 * Working days of review that a case has used since its last filing, over one or several takings.
 * @param windows all windows of the round
 * @param filedAt when the current revision was filed
 * @param now the present
 * @param calendar the owner's calendar
 * @returns working days; 0 when nobody had it yet
 */
export function reviewDaysUsed(
  windows: readonly WindowSpan[],
  filedAt: Date,
  now: Date,
  calendar: WorkCalendar,
): number {
  const since = windows.filter((w) => w.kind === 'review' && w.openedAt >= filedAt);
  const last = since.reduce<WindowSpan | null>(
    (latest, w) => (latest === null || w.openedAt >= latest.openedAt ? w : latest),
    null,
  );
  // each taking starts where the one before stopped, so the last one has counted them all
  return last === null ? 0 : readWindow(last, now, calendar).used;
}
