import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  sortFn_alphanumeric,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import { useMemo } from 'react';
import { GRADES } from '#shared/checks/types';
import { GradeLabel } from '../../../components/ui/grade-mark';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import type { ListControls } from '../../../hooks/use-list-view';
import { sortedBy } from '../../../lib/list-view';
import type { RuleFilter, RuleRow } from '../model/rule-list';

const features = tableFeatures({
  rowSortingFeature,
  sortedRowModel: createSortedRowModel(),
  sortFns: { alphanumeric: sortFn_alphanumeric },
});
const helper = createColumnHelper<typeof features, RuleRow>();
const worstRank = ({ grades }: RuleRow) => Math.min(...grades.map((grade) => GRADES.indexOf(grade)));
const columns = helper.columns([
  helper.accessor('code', { id: 'code', sortFn: 'alphanumeric' }),
  helper.accessor('family', { id: 'family', sortFn: 'alphanumeric' }),
  helper.accessor(worstRank, { id: 'grade', sortFn: 'alphanumeric' }),
]);

interface RulesTableProps {
  rules: RuleRow[];
  controls: ListControls<RuleFilter>;
}

/** The rules as a table, sorted as the address says. */
export function RulesTable({ rules, controls: { view, setSort } }: RulesTableProps) {
  const sorting = useMemo(
    () => (view.sort === '' ? [] : [{ id: view.sort.replace(/^-/, ''), desc: view.sort.startsWith('-') }]),
    [view.sort],
  );
  const table = useTable({ features, columns, data: rules, state: { sorting } });
  const sorts = (column: string) => ({ sorted: sortedBy(view, column), onSort: () => setSort(column) });
  return (
    <Table label="Rules of the check" folds>
      <TableHead>
        <Row>
          <HeadCell {...sorts('code')}>Code</HeadCell>
          <HeadCell {...sorts('family')}>Family</HeadCell>
          <HeadCell {...sorts('grade')}>Grade</HeadCell>
          <HeadCell>What it holds</HeadCell>
          <HeadCell>Needs</HeadCell>
          <HeadCell>Source</HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {table.getRowModel().rows.map(({ original: rule }) => (
          <Row key={rule.code} className="align-top">
            <RowHead className="font-mono text-label">{rule.code}</RowHead>
            <Cell fold="end" className="capitalize">
              {rule.family}
            </Cell>
            <Cell oneLine fold="row">
              <span className="grid gap-1">
                {rule.grades.map((grade) => (
                  <GradeLabel key={grade} grade={grade} />
                ))}
              </span>
            </Cell>
            <Cell fold="row">{rule.sentence}</Cell>
            <Cell fold="row" foldLabel="Needs" className="text-ink-soft">
              {rule.needs}
            </Cell>
            <Cell fold="row" foldLabel="Source" className="text-ink-soft">
              {rule.source}
            </Cell>
          </Row>
        ))}
      </TableBody>
    </Table>
  );
}
