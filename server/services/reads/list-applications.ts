import { draftLines } from '../../repositories/draft.repository';
import {
  listOverview,
  queueCounts,
  type OverviewQuery,
  type OverviewRow,
} from '../../repositories/overview.repository';
import type { OverviewFilters } from '../../repositories/overview-filters';
import { decodeCursor, readLimit } from '../../repositories/paging';
import { currentCalendar } from '../../repositories/calendar.repository';
import { draftTotals } from '../../presenters/draft.presenter';
import { presentSummary, type Reading } from '../../presenters/application.presenter';
import type * as Api from '../../../shared/contracts/api.generated';
import { endOfDay, localDay } from '../../../shared/workflow/calendar';
import { QUEUE_STATES } from '../../../shared/workflow/states';
import { sightOf, type Caller } from '../cases/caller';

const DAY_MS = 86_400_000;
const SECOND_MS = 1000;

/** What windows are read by in this transaction. */
export async function readingOf({ tx }: Caller): Promise<Reading> {
  const { calendar } = await currentCalendar(tx.manager);
  return { now: tx.now, calendar };
}

/** A page of the applications that the caller may see. */
export async function listApplications(
  caller: Caller,
  query: Api.ListApplicationsRequest,
): Promise<Api.ApplicationList> {
  const reading = await readingOf(caller);
  const page = await listOverview(
    caller.tx.manager,
    caller.ability,
    overviewQuery(caller, query, reading, { sort: '-updated', states: [] }),
  );
  const items: Api.ApplicationSummary[] = [];
  for (const row of page.items) items.push(presentSummary(await withDraft(caller, row), reading));
  return { ...page, items };
}

/** Before the first filing the voltages and the length are those of the draft. */
async function withDraft({ tx }: Caller, row: OverviewRow): Promise<OverviewRow> {
  if (row.revision !== null || row.lineCount === 0) return row;
  return { ...row, ...draftTotals(await draftLines(tx.manager, row.roundId)) };
}

/** A page of the open applications, due first, with counts over all of them. */
export async function listQueue(caller: Caller, query: Api.ListQueueRequest): Promise<Api.Queue> {
  const { tx, ability, actor } = caller;
  const reading = await readingOf(caller);
  const asked = overviewQuery(caller, query, reading, { sort: 'due', states: QUEUE_STATES });
  const open = asked.filters.states.filter((state) => (QUEUE_STATES as string[]).includes(state));
  // no filter at all would let every state through
  const states = open.length === 0 ? ['none'] : open;
  const page = await listOverview(tx.manager, ability, { ...asked, filters: { ...asked.filters, states } });
  const counts = await queueCounts(tx.manager, ability, actor.userId, startOfToday(reading));
  return { ...page, items: page.items.map((row) => presentSummary(row, reading)), counts };
}

function overviewQuery(
  caller: Caller,
  query: Api.ListQueueRequest | Api.ListApplicationsRequest,
  reading: Reading,
  usual: { sort: string; states: readonly string[] },
): OverviewQuery {
  return {
    sight: sightOf(caller.actor),
    sort: query.sort ?? usual.sort,
    limit: readLimit(query.limit),
    cursor: decodeCursor(query.cursor),
    filters: {
      states: listOf(query['filter[state]'], usual.states),
      applicant: query['filter[applicant]'] ?? null,
      voltagesKv: listOf(query['filter[voltage]']).map(Number),
      grades: listOf(query['filter[grade]']),
      reviewer: reviewerOf(query['filter[reviewer]'], caller.actor.userId),
      search: query['filter[search]'] ?? null,
      number: query['filter[number]'] ?? null,
      due: dueOf(query['filter[due]'], reading),
    },
  };
}

export function listOf(text: string | undefined, usual: readonly string[] = []): readonly string[] {
  return text === undefined ? usual : text.split(',');
}

const NOBODY_ID = '00000000-0000-0000-0000-000000000000';

function reviewerOf(text: string | undefined, userId: string): OverviewFilters['reviewer'] {
  if (text === undefined) return null;
  if (text === 'nobody') return 'nobody';
  if (text === 'me') return { id: userId };
  return { id: /^[0-9a-f-]{36}$/i.test(text) ? text : NOBODY_ID };
}

/** The first instant of today in the owner's zone: what was due before it is overdue. */
function startOfToday({ now, calendar }: Reading): Date {
  const yesterday = localDay(new Date(now.getTime() - DAY_MS), calendar.timeZone);
  const end = endOfDay(yesterday, calendar.timeZone).getTime() + SECOND_MS;
  return new Date(end);
}

function dueOf(text: string | undefined, reading: Reading): OverviewFilters['due'] {
  if (text === undefined) return null;
  const today = startOfToday(reading);
  if (text === 'overdue') return { from: null, to: today };
  return { from: today, to: new Date(today.getTime() + (text === 'today' ? 1 : 7) * DAY_MS) };
}
