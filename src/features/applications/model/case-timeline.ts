import type { Application, RevisionSummary, Window } from '#shared/contracts/api.generated';
import { formatDate, formatDay } from '#shared/format/dates';
import type { TimelineEntry } from '../../../components/charts/timeline';
import type { Stretch, TimelineInput } from '../../../components/charts/timeline-layout';

const at = (instant: string): number => new Date(instant).getTime();
const DAY_MS = 86_400_000;

const WORDS = {
  'take-up': { label: 'Filed', turn: 'owner' },
  review: { label: 'In review', turn: 'owner' },
  cure: { label: 'Returned', turn: 'applicant' },
} as const;

const isOpen = (state: Application['state']): boolean =>
  state === 'filed' || state === 'in-review' || state === 'returned';

function stretchOf(window: Window, now: number): Stretch {
  const { label, turn } = WORDS[window.kind];
  return {
    key: `${window.kind}-${window.openedAt}`,
    turn,
    label,
    note: `${window.used} of ${window.total}`,
    from: at(window.openedAt),
    to: window.closedAt ? at(window.closedAt) : now,
  };
}

function draftStretch(application: Application, firstOpened: number, now: number): Stretch {
  const from = at(application.createdAt);
  return {
    key: 'draft',
    turn: 'draft',
    label: 'Draft',
    from,
    to: Math.max(from, Math.min(firstOpened, now)),
  };
}

/** First days of the weeks between two instants, thinned so that a long case stays readable. */
function weeksBetween(from: number, to: number): TimelineInput['weeks'] {
  const monday = from - ((new Date(from).getUTCDay() + 6) % 7) * DAY_MS;
  const first = Math.floor(monday / DAY_MS) * DAY_MS;
  const weeks: { at: number; text: string }[] = [];
  for (let day = first; day <= to; day += 7 * DAY_MS)
    if (day >= from - DAY_MS) weeks.push({ at: day, text: formatDay(new Date(day)) });
  return weeks;
}

const DUE_WORDS = {
  'take-up': 'to be taken up by',
  review: 'review due',
  cure: 'answer and file by',
} as const;

/** The stretches of a case: whose turn it was and for how many working days, and what is due. */
export function caseTimeline(application: Application, today: number): TimelineInput {
  const { windows, window, state } = application;
  // A closed case ends with its last step: nothing has happened since.
  const over = windows.at(-1)?.closedAt ?? application.updatedAt;
  const now = isOpen(state) || state === 'draft' ? today : at(over);
  const stretches = windows.map((w) => stretchOf(w, now));
  const first = stretches[0]?.from ?? now;
  const all = [draftStretch(application, first, now), ...stretches];
  const due =
    window && isOpen(state)
      ? { at: at(window.dueAt), text: `${DUE_WORDS[window.kind]} ${formatDay(window.dueAt)}` }
      : null;
  const end = Math.max(...all.map((s) => s.to), due?.at ?? 0);
  return { stretches: all, now, due, weeks: weeksBetween(at(application.createdAt), end) };
}

function windowEntry({ kind, openedAt, closedAt, used, total }: Window): TimelineEntry {
  const what = { 'take-up': 'Filed', review: 'In review', cure: 'Returned' }[kind];
  return {
    key: `${kind}-${openedAt}`,
    date: formatDay(openedAt),
    what,
    detail: `${used} of ${total} working days${closedAt ? '' : ' so far'}`,
    mark: closedAt ? undefined : 'now',
  };
}

/** The same in words, oldest first: drafts, filings, windows, what is due. */
export function timelineEntries(
  application: Application,
  revisions: readonly RevisionSummary[],
): TimelineEntry[] {
  const { createdAt, windows, window, state, nextRevision } = application;
  const dated = [
    { at: at(createdAt), entry: { key: 'draft', date: formatDay(createdAt), what: 'Draft begun' } },
    ...revisions.map((r) => ({
      at: at(r.filedAt),
      entry: {
        key: `filed-${r.letter}`,
        date: formatDay(r.filedAt),
        what: `Filed as ${r.letter}`,
        detail: r.change,
      },
    })),
    ...windows
      .filter((w) => w.kind !== 'take-up')
      .map((w) => ({ at: at(w.openedAt) + 1, entry: windowEntry(w) })),
  ].sort((a, b) => a.at - b.at);
  const next: TimelineEntry[] =
    window && isOpen(state)
      ? [
          {
            key: 'due',
            date: formatDate(window.dueAt),
            what: window.kind === 'cure' ? `Due as ${nextRevision}` : 'Due',
            mark: 'next',
          },
        ]
      : [];
  return [...dated.map((d): TimelineEntry => d.entry), ...next];
}
