/** States of a round, and the words that people read for them. */

/** Every state of a round, in the order in which a case usually passes them. */
export const STATES = [
  'draft',
  'filed',
  'in-review',
  'returned',
  'accepted',
  'declined',
  'withdrawn',
] as const;

/** State of a round. */
export type State = (typeof STATES)[number];

/** What stamps and sentences call each state. */
export const STATE_WORDS: Readonly<Record<State, string>> = {
  draft: 'Draft',
  filed: 'Filed',
  'in-review': 'In review',
  returned: 'Returned',
  accepted: 'Accepted',
  declined: 'Declined',
  withdrawn: 'Withdrawn',
};

/** States in which somebody still owes a step. At most one round of an application is in one of them. */
export const OPEN_STATES: readonly State[] = ['draft', 'filed', 'in-review', 'returned'];

/** States that the queue shows: filed and not yet decided. */
export const QUEUE_STATES: readonly State[] = ['filed', 'in-review', 'returned'];

/**
 * Tells whether a round still waits for somebody.
 * @param state state of the round
 * @returns true for Draft, Filed, In review and Returned
 */
export function isOpen(state: State): boolean {
  return OPEN_STATES.includes(state);
}

/**
 * Tells whether the applicant may change the draft of the next revision.
 * @param state state of the round
 * @returns true for Draft and Returned: all else waits for the grid owner or is over
 */
export function isDraftEditable(state: State): boolean {
  return state === 'draft' || state === 'returned';
}
