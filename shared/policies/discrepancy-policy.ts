import { unbarredConditions } from './application-policy';
import type { Actor, Can } from './subjects';

/**
 * Rules of discrepancies: raised and settled by reviewers, answered by the applicant.
 * @param can writes a rule
 * @param actor who asks
 */
export function discrepancyPolicy(can: Can, actor: Actor): void {
  if (actor.role === 'applicant') {
    can(['read', 'answer'], 'Discrepancy', { orgId: actor.orgId });
    return;
  }
  can('read', 'Discrepancy', unbarredConditions(actor));
  if (actor.role === 'reviewer') can(['create', 'review'], 'Discrepancy', unbarredConditions(actor));
}
