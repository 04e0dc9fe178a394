import type { Application, ApplicationSummary, Discrepancy } from '#shared/contracts/api.generated';
import { plainQuantity } from '../../../lib/plain-number';

export const CONNECTION_KINDS = [
  { value: 'generation', label: 'Generation' },
  { value: 'storage', label: 'Storage' },
  { value: 'load', label: 'Load' },
  { value: 'network', label: 'Network' },
] as const;

type Place = Pick<ApplicationSummary, 'capacityMw' | 'pointOfConnection'>;
type Titled = Place & Pick<ApplicationSummary, 'title'>;

/** "480 MW at Sarn", or "at Sarn" where no capacity is asked for. */
export function connectionWords({ capacityMw, pointOfConnection }: Place): string {
  if (capacityMw === null) return `at ${pointOfConnection}`;
  return `${plainQuantity(capacityMw, 'MW')} at ${pointOfConnection}`;
}

/** What is to be said behind a title: nothing where the title names the place itself. */
export const besideTitle = (application: Titled): string | undefined =>
  application.title.includes(`at ${application.pointOfConnection}`)
    ? undefined
    : connectionWords(application);

/** "5, together 153.9 km". */
export function linesWords(lineCount: number, totalLengthKm: number): string {
  if (lineCount === 0) return 'none yet';
  if (totalLengthKm === 0) return String(lineCount);
  return `${lineCount}, together ${plainQuantity(totalLengthKm, 'km', 1)}`;
}

/** "345 kV, 230 kV". */
export const voltagesWords = (voltagesKv: readonly number[]): string =>
  voltagesKv.length === 0 ? 'none yet' : voltagesKv.map((kv) => plainQuantity(kv, 'kV')).join(', ');

/** "1 open, 1 answered, 1 settled": states that none is in are left out. */
export function discrepanciesWords(discrepancies: readonly Pick<Discrepancy, 'state'>[]): string {
  const states = ['open', 'answered', 'settled', 'waived'] as const;
  const counts = states.map((state) => [discrepancies.filter((d) => d.state === state).length, state]);
  return counts
    .filter(([count]) => count !== 0)
    .map(([count, state]) => `${count} ${state}`)
    .join(', ');
}

/** Whether the application has a draft that its applicant may change. */
export const hasDraft = ({ state }: Pick<Application, 'state'>): boolean =>
  state === 'draft' || state === 'returned';

/** What the due date is for, in the words of the title block. */
export function dueWords({ state }: Pick<Application, 'state'>): string {
  if (state === 'returned') return 'Answers due';
  if (state === 'filed') return 'Taken up by';
  return state === 'in-review' ? 'Review due' : 'Due';
}
