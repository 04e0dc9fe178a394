import { Link } from 'react-router-dom';
import type { ApplicationSummary } from '#shared/contracts/api.generated';
import { formatDate, leftInTable } from '#shared/format/dates';
import { WindowMeter } from '../../../components/charts/window-meter';
import { FilterInput } from '../../../components/ui/filter-input';
import { GradeSlots } from '../../../components/ui/grade-counts';
import { Select } from '../../../components/ui/inputs';
import { STATE_WORDS, Stamp } from '../../../components/ui/stamp';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import type { ListControls } from '../../../hooks/use-list-view';
import type { Role } from '../../../lib/api/session';
import { sortedBy } from '../../../lib/list-view';
import { applicationPath } from '../../../lib/paths';
import type { ApplicationFilter } from '../model/applications-list';
import { besideTitle, voltagesWords } from '../model/words';

const STATES = Object.entries(STATE_WORDS).map(([value, label]) => ({ value, label }));
const GRADES = [
  { value: 'must-answer', label: 'Must answer' },
  { value: 'explain', label: 'Explain' },
  { value: 'note', label: 'Note' },
  { value: 'none', label: 'In balance' },
];

interface ApplicationsTableProps {
  items: readonly ApplicationSummary[];
  controls: ListControls<ApplicationFilter>;
  role: Role;
}

function Heads({ controls: { view, setSort }, role }: Omit<ApplicationsTableProps, 'items'>) {
  const sorts = (column: string) => ({ sorted: sortedBy(view, column), onSort: () => setSort(column) });
  return (
    <Row>
      <HeadCell {...sorts('number')}>Number</HeadCell>
      <HeadCell {...sorts('title')}>Application</HeadCell>
      {role !== 'applicant' && <HeadCell {...sorts('applicant')}>Applicant</HeadCell>}
      <HeadCell>Voltages</HeadCell>
      <HeadCell number>Lines</HeadCell>
      <HeadCell>Rev.</HeadCell>
      <HeadCell {...sorts('state')}>State</HeadCell>
      <HeadCell>Findings</HeadCell>
      <HeadCell {...sorts('due')} colSpan={3}>
        Due
      </HeadCell>
    </Row>
  );
}

/** The filters that stand in the table's head; on narrow screens they stand over it. */
export function ApplicationFilterControl({
  name,
  controls,
  small,
}: {
  name: 'search' | 'state' | 'grade';
  controls: ListControls<ApplicationFilter>;
  small?: boolean;
}) {
  const value = controls.view.filters[name];
  const change = (next: string) => controls.setFilter(name, next);
  if (name === 'search')
    return (
      <FilterInput
        small={small}
        label="Filter by number, title or place"
        placeholder="number, title, place"
        value={value}
        onChange={change}
      />
    );
  return (
    <Select
      small={small}
      aria-label={name === 'state' ? 'Filter by state' : 'Filter by worst finding'}
      none={name === 'state' ? 'all states' : 'all findings'}
      options={name === 'state' ? STATES : GRADES}
      value={value}
      onChange={(event) => change(event.target.value)}
    />
  );
}

function Filters({ controls, role }: Omit<ApplicationsTableProps, 'items'>) {
  return (
    <Row filters>
      <th role="cell" />
      <th role="cell">
        <ApplicationFilterControl small name="search" controls={controls} />
      </th>
      {role !== 'applicant' && <th role="cell" />}
      <th role="cell" />
      <th role="cell" />
      <th role="cell" />
      <th role="cell" className="w-[116px]">
        <ApplicationFilterControl small name="state" controls={controls} />
      </th>
      <th role="cell" className="w-[132px]">
        <ApplicationFilterControl small name="grade" controls={controls} />
      </th>
      <th role="cell" colSpan={3} />
    </Row>
  );
}

function Findings({ item: { grades, check } }: { item: ApplicationSummary }) {
  if (check && check.state !== 'done')
    return (
      <span className="text-ink-soft">
        {check.state === 'failed' ? 'check failed' : `checking, ${check.linesChecked} of ${check.lineCount}`}
      </span>
    );
  if (!grades) return null;
  return (
    <GradeSlots counts={{ 'must-answer': grades.mustAnswer, explain: grades.explain, note: grades.note }} />
  );
}

function ApplicationRow({ item, role }: { item: ApplicationSummary; role: Role }) {
  const left = item.window?.left;
  return (
    <Row selectable>
      <Cell oneLine>{item.number}</Cell>
      <RowHead fold="row">
        <Link to={applicationPath(role, item.number)} className="link-ink font-semibold">
          {item.title}
        </Link>{' '}
        <span className="font-normal text-ink-soft">{besideTitle(item)}</span>
      </RowHead>
      {role !== 'applicant' && <Cell fold="row">{item.applicant.name}</Cell>}
      <Cell fold="hide">{item.voltagesKv.length > 0 ? voltagesWords(item.voltagesKv) : ''}</Cell>
      <Cell number foldLabel="Lines">
        {item.lineCount}
      </Cell>
      <Cell foldLabel="Revision" fold="end">
        {item.revision ?? (
          <span className="text-ink-soft">
            {item.nextRevision}
            <span className="sr-only">, not filed yet</span>
          </span>
        )}
      </Cell>
      <Cell>
        <Stamp state={item.state} />
      </Cell>
      <Cell oneLine fold="end">
        <Findings item={item} />
      </Cell>
      <Cell oneLine>{item.dueAt ? formatDate(item.dueAt) : ''}</Cell>
      <Cell fold="hide">
        {item.window && <WindowMeter used={item.window.used} total={item.window.total} />}
      </Cell>
      <Cell
        oneLine
        fold="end"
        className={left !== undefined && left < 0 ? 'font-semibold text-vermilion' : undefined}
      >
        {left === undefined ? '' : leftInTable(left)}
      </Cell>
    </Row>
  );
}

/** Applications as a table: sorted and filtered in its heads, each row leading to its case. */
export function ApplicationsTable({ items, controls, role }: ApplicationsTableProps) {
  return (
    <Table label="Applications" folds>
      <TableHead>
        <Heads controls={controls} role={role} />
        <Filters controls={controls} role={role} />
      </TableHead>
      <TableBody>
        {items.map((item) => (
          <ApplicationRow key={item.id} item={item} role={role} />
        ))}
      </TableBody>
    </Table>
  );
}
