import { unbarredConditions } from './application-policy';
import type { Actor, Can } from './subjects';

/**
 * Rules of attachments and letters: both sides of a case read them and add files; letters are made by steps alone.
 * @param can writes a rule
 * @param actor who asks
 */
export function correspondencePolicy(can: Can, actor: Actor): void {
  if (actor.role === 'applicant') {
    can(['read', 'create'], 'Attachment', { orgId: actor.orgId });
    can('read', 'Letter', { orgId: actor.orgId });
    return;
  }
  can('read', 'Attachment', unbarredConditions(actor));
  can('read', 'Letter', unbarredConditions(actor));
  if (actor.role === 'reviewer') can('create', 'Attachment', unbarredConditions(actor));
}
