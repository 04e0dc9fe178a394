import { unbarredConditions } from './application-policy';
import type { Actor, Can } from './subjects';

/**
 * Rules of what was filed and of its check runs: read by both sides, checked again by reviewers, changed by nobody.
 * @param can writes a rule
 * @param actor who asks
 */
export function revisionPolicy(can: Can, actor: Actor): void {
  if (actor.role === 'applicant') {
    can('read', 'Revision', { orgId: actor.orgId });
    return;
  }
  can('read', 'Revision', unbarredConditions(actor));
  if (actor.role === 'reviewer') can('review', 'Revision', unbarredConditions(actor));
}
