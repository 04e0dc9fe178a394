import type { Actor, Can } from './subjects';

/**
 * Rules of what filings are weighed against: everybody who is signed in reads the rules in force and the conductor
 * library, since the live check needs them; an administrator changes them.
 * @param can writes a rule
 * @param actor who asks
 */
export function rulesPolicy(can: Can, actor: Actor): void {
  can('read', 'RuleSet');
  can('read', 'Conductor');
  can('read', 'Calendar');
  if (actor.role !== 'administrator') return;
  can(['create', 'update', 'publish'], 'RuleSet');
  can(['create', 'update'], 'Conductor');
  can('update', 'Calendar');
}
