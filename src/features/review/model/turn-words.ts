import type { Application, Discrepancy } from '#shared/contracts/api.generated';

/** Whose turn a discrepancy is, or when it was closed, in a few words; `reviewer` is the name, or "you". */
export function turnWords(
  { state, entries }: Pick<Discrepancy, 'state' | 'entries'>,
  caseState: Application['state'],
  reviewer: string,
): string {
  if (state === 'settled' || state === 'waived') {
    const closing = entries.findLast((entry) => entry.kind === state);
    return closing ? `${state} on revision ${closing.revision}` : state;
  }
  if (caseState === 'returned') return state === 'open' ? 'with the applicant' : 'answered by the applicant';
  return state === 'open'
    ? 'goes with the letter'
    : `answered, ${reviewer === 'you' ? 'your turn' : `with ${reviewer}`}`;
}
