import type { ConductorList, Rules } from '#shared/contracts/api.generated';
import type { RuleSet } from '#shared/checks/rule-set';
import type { LibraryConductor } from '#shared/library/types';
import type { CheckBasis } from '../worker/messages';

/** What the API says of rules and conductors, as the check takes it: the answers are written from these types. */
export function checkBasis(rules: Rules, { version, items }: ConductorList): CheckBasis {
  const conductors = items.filter((c) => !c.retired).map((c) => c.row as unknown as LibraryConductor);
  return { rules: rules as unknown as RuleSet, library: { version, conductors } };
}
