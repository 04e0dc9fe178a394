import { unbarredConditions } from './application-policy';
import type { Actor, Can } from './subjects';

/**
 * Rules of what reviewers have among themselves: proposals for a second reviewer, and notes. No applicant sees either.
 * A reviewer countersigns only what somebody else proposed.
 * @param can writes a rule
 * @param actor who asks
 */
export function reviewPolicy(can: Can, actor: Actor): void {
  if (actor.role !== 'reviewer') return;
  const unbarred = unbarredConditions(actor);
  can(['read', 'create'], 'Countersign', unbarred);
  can('countersign', 'Countersign', { ...unbarred, proposedBy: { $ne: actor.userId } });
  can(['read', 'create'], 'Note', unbarred);
}
