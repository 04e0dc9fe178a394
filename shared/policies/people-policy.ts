import type { Actor, Can } from './subjects';

/**
 * Rules of people: everybody reads the own account and the own organisation's members; an administrator administers
 * all, but grants nothing to himself or herself.
 * @param can writes a rule
 * @param actor who asks
 */
export function peoplePolicy(can: Can, actor: Actor): void {
  can(['read', 'update'], 'User', { id: actor.userId });
  can('read', 'Organisation', { id: actor.orgId });
  can('read', 'Membership', { orgId: actor.orgId });
  if (actor.role !== 'administrator') return;
  can(['read', 'administer'], 'User');
  can(['read', 'create', 'update', 'administer'], 'Organisation');
  can('read', 'Membership');
  can(['create', 'update', 'administer'], 'Membership', { userId: { $ne: actor.userId } });
  can(['read', 'create', 'update', 'administer'], 'Invitation');
}
