import type { ApplicationSummary } from '#shared/contracts/api.generated';
import type { ListSpec, ListView } from '../../../lib/list-view';

export const QUEUE_FILTERS = ['number', 'search', 'voltage', 'state', 'grade', 'due', 'reviewer'] as const;

export type QueueFilter = (typeof QUEUE_FILTERS)[number];

/** The queue as its address keeps it; due first unless somebody sorts it. */
export const QUEUE_LIST: ListSpec<QueueFilter> = { filters: QUEUE_FILTERS, sort: 'due' };

/** Whose cases the queue shows; the words under its heading. */
export type Whose = 'mine' | 'everyone' | 'nobody';

const WHOSE_REVIEWER: Readonly<Record<Whose, string>> = { mine: 'me', everyone: '', nobody: 'nobody' };

/** Which of the three a view is; null where it is one colleague's. */
export function whoseOf(view: ListView<QueueFilter>): Whose | null {
  const found = (Object.keys(WHOSE_REVIEWER) as Whose[]).find(
    (whose) => WHOSE_REVIEWER[whose] === view.filters.reviewer,
  );
  return found ?? null;
}

/** The same view of somebody else's cases. */
export function withWhose(view: ListView<QueueFilter>, whose: Whose): ListView<QueueFilter> {
  return { ...view, filters: { ...view.filters, reviewer: WHOSE_REVIEWER[whose] }, cursor: null };
}

/** The voltages that occur, highest first, for the filter's list. */
export function voltagesOf(items: readonly ApplicationSummary[]): number[] {
  return [...new Set(items.flatMap((item) => item.voltagesKv))].sort((a, b) => b - a);
}

/** Reviewers that have a case, by name, for the filter's list. */
export function reviewersOf(items: readonly ApplicationSummary[]): { id: string; name: string }[] {
  const byId = new Map(items.flatMap((item) => (item.reviewer ? [[item.reviewer.id, item.reviewer]] : [])));
  return [...byId.values()].sort((a, b) => a.name.localeCompare(b.name));
}

const count = (n: number, one: string, many: string) => (n === 1 ? `one ${one}` : `${n} ${many}`);

function sentence(text: string): string {
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;
}

/** What the queue holds, as the sentences under its heading. */
export function queueLead(total: number, items: readonly ApplicationSummary[]): string {
  if (total === 0) return 'No application waits for the grid owner.';
  const left = items.flatMap((item) => (item.window ? [item.window.left] : []));
  const overdue = left.filter((days) => days < 0);
  const today = left.filter((days) => days === 0).length;
  const tomorrow = left.filter((days) => days === 1).length;
  const worst = Math.min(0, ...overdue);
  const dues = [
    overdue.length === 1 ? `one is ${count(-worst, 'working day', 'working days')} overdue` : '',
    overdue.length > 1
      ? `${overdue.length} are overdue, one by ${count(-worst, 'working day', 'working days')}`
      : '',
    today > 0 ? `${count(today, 'is', 'are')} due today` : '',
    tomorrow > 0 ? `${count(tomorrow, 'is', 'are')} due on the next working day` : '',
  ].filter(Boolean);
  const open = `${count(total, 'open application', 'open applications')}`;
  return [sentence(open), dues.length > 0 ? sentence(dues.join(', ')) : ''].filter(Boolean).join(' ');
}
