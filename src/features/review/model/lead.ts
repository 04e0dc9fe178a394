import type { Application, Discrepancy } from '#shared/contracts/api.generated';
import { THIN_SPACE } from '#shared/format/numbers';

/** "480 MW at Sarn", or the place alone. */
export function connectionWords({
  capacityMw,
  pointOfConnection,
}: Pick<Application, 'capacityMw' | 'pointOfConnection'>): string {
  const at = `at ${pointOfConnection}`;
  return capacityMw === null ? at : `${capacityMw}${THIN_SPACE}MW ${at}`;
}

const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten'];
const inWords = (n: number) => NUMBERS[n] ?? String(n);
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
const many = (n: number, one: string, more: string) => `${inWords(n)} ${n === 1 ? one : more}`;

/** What the findings that still stand ask for. */
export function gradeLead(grades: Application['grades']): string {
  if (grades === null) return '';
  const { mustAnswer, explain } = grades;
  if (mustAnswer === 0 && explain === 0) return 'Nothing has to be answered or explained.';
  const parts = [
    mustAnswer > 0 ? `${many(mustAnswer, 'finding', 'findings')} must be answered` : '',
    explain > 0
      ? `${mustAnswer > 0 ? inWords(explain) : many(explain, 'finding', 'findings')} ${explain === 1 ? 'wants' : 'want'} an explanation`
      : '',
  ].filter(Boolean);
  return `${capital(parts.join(', '))}.`;
}

/** What is to do with the discrepancies, and by whom: `reviewer` is the name, or "you". */
export function discrepancyLead(
  items: readonly Pick<Discrepancy, 'number' | 'state'>[],
  reviewer = 'you',
): string {
  const answered = items.filter((d) => d.state === 'answered').map((d) => `D-${d.number}`);
  const open = items.filter((d) => d.state === 'open').map((d) => `D-${d.number}`);
  const list = (names: string[]) =>
    names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`;
  const is = (names: string[]) => (names.length === 1 ? 'is' : 'are');
  return [
    answered.length > 0
      ? `${list(answered)} ${is(answered)} answered: ${reviewer === 'you' ? 'your turn' : `${reviewer} settles or asks again`}.`
      : '',
    open.length > 0 ? `${list(open)} ${is(open)} open and would go with the letter.` : '',
  ]
    .filter(Boolean)
    .join(' ');
}

/** The sentences under the heading: where the case stands and what comes next. */
export function reviewLead(
  application: Pick<Application, 'state' | 'grades' | 'check' | 'revision' | 'reviewer'>,
  discrepancies: readonly Pick<Discrepancy, 'number' | 'state'>[],
  who = 'you',
): string {
  const { state, grades, check, revision, reviewer } = application;
  if (check && check.state !== 'done') {
    return check.state === 'failed'
      ? `The check of revision ${revision ?? ''} failed: ${check.failure ?? ''}`
      : `Revision ${revision ?? ''} is being checked: ${check.linesChecked} of ${check.lineCount} lines.`;
  }
  switch (state) {
    case 'filed':
      return `${gradeLead(grades)} Nobody has taken the case yet.`.trim();
    case 'in-review':
      return [gradeLead(grades), discrepancyLead(discrepancies, who)].filter(Boolean).join(' ');
    case 'returned':
      return 'The applicant has the letter; the case comes back once revised and filed again.';
    case 'accepted':
      return `Revision ${revision ?? ''} is accepted.`;
    case 'declined':
      return `Revision ${revision ?? ''} is declined.`;
    case 'withdrawn':
      return 'The applicant has withdrawn the application.';
    default:
      return `Not filed yet${reviewer ? `; ${reviewer.name} reviews it` : ''}.`;
  }
}
