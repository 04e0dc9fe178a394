import type { Actor, Can } from './subjects';

/**
 * Rules of applications.
 *
 * An applicant sees and moves the own organisation's; a reviewer sees what was ever filed, except by organisations
 * that he or she is barred from, and works on it; an administrator reads what was filed and decides no case.
 * @param can writes a rule
 * @param actor who asks
 */
export function applicationPolicy(can: Can, actor: Actor): void {
  if (actor.role === 'applicant') {
    can(['read', 'create', 'update', 'file', 'answer', 'withdraw', 'amend'], 'Application', {
      orgId: actor.orgId,
    });
    return;
  }
  can('read', 'Application', filedConditions(actor));
  if (actor.role === 'reviewer') can(['review', 'decide'], 'Application', filedConditions(actor));
}

/**
 * Conditions of what the owner's people may see of a case.
 * @param actor one of the owner's people
 * @returns conditions on fields of an application
 */
export function filedConditions(actor: Actor): Record<string, unknown> {
  const filed = { firstFiledAt: { $ne: null } };
  return actor.barredOrgIds.length === 0 ? filed : { ...filed, orgId: { $nin: [...actor.barredOrgIds] } };
}

/**
 * Conditions on records that carry only the organisation, of an application that was read under the rules before.
 * @param actor one of the owner's people
 * @returns conditions on `orgId`, or none
 */
export function unbarredConditions(actor: Actor): Record<string, unknown> | undefined {
  return actor.barredOrgIds.length === 0 ? undefined : { orgId: { $nin: [...actor.barredOrgIds] } };
}
