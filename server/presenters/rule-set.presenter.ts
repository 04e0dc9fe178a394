import type { RuleSetSummary } from '../../shared/contracts/api.generated';
import type { RuleSet } from '../entities/rules.entities';
import type { PeopleById } from '../repositories/people-names.repository';

export function presentRuleSet(set: RuleSet, people: PeopleById, inForceVersion: number): RuleSetSummary {
  const { version, status, effectiveFrom, reason, publishedBy } = set;
  return {
    version,
    status,
    effectiveFrom: effectiveFrom?.toISOString() ?? null,
    reason,
    publishedBy: publishedBy === null ? null : (people.get(publishedBy) ?? null),
    inForce: version === inForceVersion,
  };
}
