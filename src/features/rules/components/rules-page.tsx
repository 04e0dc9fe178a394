import { useMemo } from 'react';
import { EmptyState } from '../../../components/feedback/empty-state';
import { Button } from '../../../components/ui/button';
import { FilterInput } from '../../../components/ui/filter-input';
import { GRADE_WORDS } from '../../../components/ui/grades';
import { Select } from '../../../components/ui/inputs';
import { PageHead } from '../../../components/ui/page-head';
import { Sheet } from '../../../components/ui/sheet';
import { useListView } from '../../../hooks/use-list-view';
import { useRules } from '../../../lib/queries/get-rules';
import { RULE_COUNT, RULE_LIST, rulesOf } from '../model/rule-list';
import { RulesTable } from './rules-table';
import { TolerancesSheet } from './tolerances-sheet';

const FAMILIES = [
  { value: 'physics', label: 'Physics' },
  { value: 'geometry', label: 'Geometry' },
  { value: 'typical', label: 'Typical' },
  { value: 'drawing', label: 'Drawing' },
];
const GRADE_OPTIONS = (['must-answer', 'explain', 'note'] as const).map((value) => ({
  value,
  label: GRADE_WORDS[value],
}));

/** What the check looks for: every rule with its grade, what it needs and where it comes from. */
export function RulesPage() {
  const controls = useListView(RULE_LIST);
  const { view, setFilter, clear } = controls;
  const inForce = useRules();
  const { search, family, grade } = view.filters;
  const rules = useMemo(
    () => rulesOf({ filters: { search, family, grade }, sort: '', cursor: null }),
    [search, family, grade],
  );
  return (
    <>
      <PageHead
        title="Rules of the check"
        lead={`${RULE_COUNT} rules in four families. Bands ${inForce.bandsVersion} and tolerances ${inForce.tolerancesVersion} are in force.`}
      />
      <div className="filter-row" role="search" aria-label="Filter the rules">
        <FilterInput
          type="search"
          label="Rule contains"
          placeholder="Code, sentence or source"
          value={search}
          onChange={(value) => setFilter('search', value)}
        />
        <Select
          aria-label="Family"
          none="Any family"
          options={FAMILIES}
          value={family}
          onChange={(event) => setFilter('family', event.target.value)}
        />
        <Select
          aria-label="Grade"
          none="Any grade"
          options={GRADE_OPTIONS}
          value={grade}
          onChange={(event) => setFilter('grade', event.target.value)}
        />
      </div>
      <Sheet main label="Rules">
        <RulesTable rules={rules} controls={controls} />
        {rules.length === 0 && (
          <EmptyState
            title="No rule fits these filters."
            actions={<Button onClick={clear}>Show all</Button>}
          />
        )}
        <div className="sheet-foot text-ink-soft">
          {rules.length} of {RULE_COUNT} shown. This view is kept in the page’s address.
        </div>
      </Sheet>
      <TolerancesSheet rules={inForce} />
    </>
  );
}
