import type { Actor, Can } from './subjects';

/**
 * Rules of the audit trail: an administrator reads all of it; the two sides of a case read the case's part through
 * its timeline, which their right to read the application opens. Nobody changes it.
 * @param can writes a rule
 * @param actor who asks
 */
export function auditPolicy(can: Can, actor: Actor): void {
  if (actor.role === 'administrator') can('read', 'AuditEvent');
}
