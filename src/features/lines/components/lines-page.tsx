import { Link } from 'react-router-dom';
import type { LineList } from '#shared/contracts/api.generated';
import { fixed } from '#shared/format/numbers';
import { EmptyState } from '../../../components/feedback/empty-state';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { SkeletonRows } from '../../../components/feedback/skeleton';
import { Button } from '../../../components/ui/button';
import { FilterInput } from '../../../components/ui/filter-input';
import { GradeKey, GradeSlots } from '../../../components/ui/grade-counts';
import { GRADE_WORDS } from '../../../components/ui/grades';
import { Select } from '../../../components/ui/inputs';
import { ListPages } from '../../../components/ui/list-pages';
import { PageHead } from '../../../components/ui/page-head';
import { Sheet } from '../../../components/ui/sheet';
import { Stamp, STATE_WORDS } from '../../../components/ui/stamp';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { useListView, type ListControls } from '../../../hooks/use-list-view';
import type { Role } from '../../../lib/api/session';
import { isFiltered, sortedBy } from '../../../lib/list-view';
import { applicationPath, linePath } from '../../../lib/paths';
import { LINE_LIST, useLines, type LineFilter } from '../api/list-lines';

type LineItem = LineList['items'][number];

const GRADES = [
  ...(['must-answer', 'explain', 'note'] as const).map((value) => ({ value, label: GRADE_WORDS[value] })),
  { value: 'none', label: GRADE_WORDS['in-balance'] },
];
const STATES = (['filed', 'in-review', 'returned', 'accepted', 'declined', 'withdrawn'] as const).map(
  (value) => ({ value, label: STATE_WORDS[value] }),
);

/** Every filed line that the reader may see, over all applications, as its latest revision has it. */
export function LinesPage({ role }: { role: Role }) {
  const controls = useListView(LINE_LIST);
  const { data: page, error } = useLines(controls.view);
  return (
    <>
      <PageHead title="Lines" lead="Every filed line, as the latest revision of its application has it." />
      <ProblemNotice error={error} className="mb-4" />
      <LineFilters controls={controls} />
      <Sheet main label="Lines">
        {page ? (
          <LineTable items={page.items} controls={controls} role={role} />
        ) : (
          <SkeletonRows rows={10} label="Loading the lines" />
        )}
        {page?.items.length === 0 && (
          <EmptyState
            title={isFiltered(controls.view) ? 'No line fits these filters.' : 'No line has been filed yet.'}
            actions={isFiltered(controls.view) && <Button onClick={controls.clear}>Show all lines</Button>}
          />
        )}
        <div className="sheet-foot">
          <GradeKey />
          {page && <ListPages page={page} controls={controls} />}
        </div>
      </Sheet>
    </>
  );
}

function LineFilters({ controls: { view, setFilter } }: { controls: ListControls<LineFilter> }) {
  return (
    <div className="filter-row" role="search" aria-label="Filter the lines">
      <FilterInput
        type="search"
        label="Line, place or application contains"
        placeholder="Line, place or application"
        value={view.filters.search}
        onChange={(value) => setFilter('search', value)}
      />
      <FilterInput
        label="Nominal voltage in kV"
        placeholder="kV"
        value={view.filters.voltage}
        maxLength={6}
        onChange={(value) => setFilter('voltage', value)}
      />
      <Select
        aria-label="State"
        none="Any state"
        options={STATES}
        value={view.filters.state}
        onChange={(event) => setFilter('state', event.target.value)}
      />
      <Select
        aria-label="Findings"
        none="Any findings"
        options={GRADES}
        value={view.filters.grade}
        onChange={(event) => setFilter('grade', event.target.value)}
      />
    </div>
  );
}

interface LineTableProps {
  items: readonly LineItem[];
  controls: ListControls<LineFilter>;
  role: Role;
}

function LineTable({ items, controls: { view, setSort }, role }: LineTableProps) {
  const sorts = (column: string) => ({ sorted: sortedBy(view, column), onSort: () => setSort(column) });
  return (
    <Table label="Lines" folds>
      <TableHead>
        <Row>
          <HeadCell {...sorts('name')}>Line</HeadCell>
          <HeadCell {...sorts('number')}>Application</HeadCell>
          <HeadCell {...sorts('voltage')} number>
            kV
          </HeadCell>
          <HeadCell {...sorts('length')} number>
            km
          </HeadCell>
          <HeadCell>Phases</HeadCell>
          <HeadCell>Rev.</HeadCell>
          <HeadCell>State</HeadCell>
          <HeadCell {...sorts('grade')}>Findings</HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {items.map((item) => (
          <LineRow key={`${item.applicationId} ${item.lineKey}`} item={item} role={role} />
        ))}
      </TableBody>
    </Table>
  );
}

function LineRow({ item, role }: { item: LineItem; role: Role }) {
  const { grades, applicationNumber: number } = item;
  return (
    <Row selectable>
      <RowHead>
        <Link className="link-ink" to={linePath(role, number, item.revision, item.lineKey)}>
          {item.name}
        </Link>
      </RowHead>
      <Cell fold="row">
        <Link className="link" to={applicationPath(role, number)}>
          {number}
        </Link>{' '}
        <span className="text-ink-soft">{item.applicant.name}</span>
      </Cell>
      <Cell number foldLabel="kV">
        {item.nominalVoltageKv}
      </Cell>
      <Cell number foldLabel="km">
        {fixed(item.lengthKm, 1)}
      </Cell>
      <Cell fold="row">
        {item.conductors}
        {item.circuitCount > 1 && <span className="text-ink-soft">, {item.circuitCount} circuits</span>}
      </Cell>
      <Cell foldLabel="Revision">{item.revision}</Cell>
      <Cell fold="end">
        <Stamp state={item.state} />
      </Cell>
      <Cell oneLine fold="row">
        {grades && (
          <GradeSlots
            counts={{ 'must-answer': grades.mustAnswer, explain: grades.explain, note: grades.note }}
          />
        )}
      </Cell>
    </Row>
  );
}
