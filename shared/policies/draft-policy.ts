import type { Actor, Can } from './subjects';

/**
 * Rules of drafts and of files read into them: the applicant's own, whoever else may see the application.
 * @param can writes a rule
 * @param actor who asks
 */
export function draftPolicy(can: Can, actor: Actor): void {
  if (actor.role !== 'applicant') return;
  can(['read', 'update'], 'Draft', { orgId: actor.orgId });
  can(['read', 'create', 'update'], 'Import', { orgId: actor.orgId });
}
