/** The one ability: client and server ask it, and the server turns the same rules into where-clauses. */
import { createMongoAbility, type RawRuleOf } from '@casl/ability';
import { applicationPolicy } from './application-policy';
import { auditPolicy } from './audit-policy';
import { correspondencePolicy } from './correspondence-policy';
import { discrepancyPolicy } from './discrepancy-policy';
import { draftPolicy } from './draft-policy';
import { peoplePolicy } from './people-policy';
import { reviewPolicy } from './review-policy';
import { revisionPolicy } from './revision-policy';
import { rulesPolicy } from './rules-policy';
import type { Actor, AppAbility, Can, SubjectRecord } from './subjects';

const POLICIES = [
  applicationPolicy,
  draftPolicy,
  revisionPolicy,
  discrepancyPolicy,
  correspondencePolicy,
  reviewPolicy,
  rulesPolicy,
  peoplePolicy,
  auditPolicy,
];

/**
 * What somebody may do.
 * @param actor who asks; null for nobody signed in, who may do nothing
 * @returns the ability. Rules only add: what no rule allows is not allowed
 * @example defineAbility(reviewer).can('review', { kind: 'Application', orgId, firstFiledAt })
 */
export function defineAbility(actor: Actor | null): AppAbility {
  const rules: RawRuleOf<AppAbility>[] = [];
  const can: Can = (action, subject, conditions) => {
    rules.push(conditions === undefined ? { action, subject } : { action, subject, conditions });
  };
  if (actor !== null) for (const policy of POLICIES) policy(can, actor);
  return createMongoAbility<AppAbility>(rules, {
    detectSubjectType: (record) => (record as SubjectRecord).kind,
  });
}
