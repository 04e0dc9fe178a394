import type { RuleFacts } from '#shared/checks/rules/rule';
import { RULES } from '#shared/checks/rules/table';
import type { ListSpec, ListView } from '../../../lib/list-view';

export const RULE_FILTERS = ['search', 'family', 'grade'] as const;
export type RuleFilter = (typeof RULE_FILTERS)[number];

/** The list of rules as its address keeps it; in the order of the check itself unless somebody sorts it. */
export const RULE_LIST: ListSpec<RuleFilter> = { filters: RULE_FILTERS, sort: '' };

/** A rule as its row shows it. */
export type RuleRow = Pick<RuleFacts, 'code' | 'family' | 'grades' | 'needs' | 'sentence' | 'source'>;

const ALL: readonly RuleRow[] = RULES.map(({ code, family, grades, needs, sentence, source }) => ({
  code,
  family,
  grades,
  needs,
  sentence,
  source,
}));

/** How many rules there are. */
export const RULE_COUNT = ALL.length;

/** The rules that fit the filters of a view, in the order of the check. */
export function rulesOf({ filters }: ListView<RuleFilter>): RuleRow[] {
  const wanted = filters.search.toLowerCase();
  return ALL.filter(
    (rule) =>
      (filters.family === '' || rule.family === filters.family) &&
      (filters.grade === '' || rule.grades.some((grade) => grade === filters.grade)) &&
      [rule.code, rule.sentence, rule.source, rule.needs].some((text) => text.toLowerCase().includes(wanted)),
  );
}
