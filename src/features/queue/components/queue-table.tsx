import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { ApplicationSummary } from '#shared/contracts/api.generated';
import { formatDate, leftInTable } from '#shared/format/dates';
import { WindowMeter } from '../../../components/charts/window-meter';
import { Button } from '../../../components/ui/button';
import { GradeSlots } from '../../../components/ui/grade-counts';
import { Stamp } from '../../../components/ui/stamp';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import type { ListControls } from '../../../hooks/use-list-view';
import { sortedBy } from '../../../lib/list-view';
import { applicationPath } from '../../../lib/paths';
import type { QueueFilter } from '../model/queue-list';
import { QueueFilterControl, type QueueChoices } from './queue-filters';

interface QueueTableProps {
  items: readonly ApplicationSummary[];
  controls: ListControls<QueueFilter>;
  choices: QueueChoices;
  /** The application that is being taken now. */
  taking: string | null;
  onTake: (item: ApplicationSummary) => void;
}

/** The queue as a table: what each column filters stands under its head. Narrow, each row folds into a block. */
export function QueueTable({ items, controls, choices, taking, onTake }: QueueTableProps) {
  return (
    <Table label="Applications in the queue" folds className="queue-table">
      <TableHead>
        <Heads controls={controls} />
        <Filters controls={controls} choices={choices} />
      </TableHead>
      <TableBody>
        {items.map((item) => (
          <QueueRow key={item.id} item={item} taking={taking === item.number} onTake={onTake} />
        ))}
      </TableBody>
    </Table>
  );
}

function Heads({ controls: { view, setSort } }: { controls: ListControls<QueueFilter> }) {
  const sorts = (column: string) => ({ sorted: sortedBy(view, column), onSort: () => setSort(column) });
  return (
    <Row>
      <HeadCell {...sorts('number')}>Number</HeadCell>
      <HeadCell {...sorts('applicant')}>Applicant and connection</HeadCell>
      <HeadCell {...sorts('voltage')} className="wide-kv">
        kV
      </HeadCell>
      <HeadCell {...sorts('lines')} number className="wide-lines">
        Lines
      </HeadCell>
      <HeadCell className="wide-lines">Rev.</HeadCell>
      <HeadCell {...sorts('state')}>State</HeadCell>
      <HeadCell {...sorts('grade')}>Findings</HeadCell>
      <HeadCell>Window, working days</HeadCell>
      <HeadCell {...sorts('due')} colSpan={2}>
        Due
      </HeadCell>
      <HeadCell {...sorts('reviewer')}>Reviewer</HeadCell>
    </Row>
  );
}

function Filters({ controls, choices }: Pick<QueueTableProps, 'controls' | 'choices'>) {
  const head = (name: QueueFilter | null, className?: string, key?: string): ReactNode => (
    <th key={key ?? name} role="cell" className={className}>
      {name && <QueueFilterControl small name={name} controls={controls} choices={choices} />}
    </th>
  );
  return (
    <Row filters>
      {head('number', 'w-[90px]')}
      {head('search')}
      {head('voltage', 'wide-kv w-[86px]')}
      {head(null, 'wide-lines', 'lines')}
      {head(null, 'wide-lines', 'revision')}
      {head('state', 'w-[104px]')}
      {head('grade', 'w-[126px]')}
      {head(null, undefined, 'window')}
      {head('due', 'w-[110px]')}
      {head(null, undefined, 'left')}
      {head('reviewer', 'w-[138px]')}
    </Row>
  );
}

function connection({ capacityMw, pointOfConnection }: ApplicationSummary): string {
  return capacityMw === null ? `at ${pointOfConnection}` : `${capacityMw} MW at ${pointOfConnection}`;
}

function QueueRow({
  item,
  taking,
  onTake,
}: {
  item: ApplicationSummary;
  taking: boolean;
  onTake: (item: ApplicationSummary) => void;
}) {
  const kv = item.voltagesKv.join(', ');
  return (
    <Row selectable>
      <Cell oneLine className="queue-number">
        {item.number}
      </Cell>
      <RowHead className="queue-who" title={`${item.title}, ${item.applicant.name}, ${connection(item)}`}>
        <Link to={applicationPath('reviewer', item.number)} className="link-ink">
          {item.title}
        </Link>{' '}
        <span className="queue-connection">
          {`${item.applicant.name}, ${connection(item)}`}
          <span className="narrow-kv">, {kv} kV</span>
        </span>
      </RowHead>
      <Cell oneLine className="wide-kv queue-kv" title={kv}>
        {kv}
      </Cell>
      <Cell number className="wide-lines">
        {item.lineCount}
      </Cell>
      <Cell className="wide-lines">{item.revision}</Cell>
      <Cell className="queue-state">
        <Stamp state={item.state} />
      </Cell>
      <Cell oneLine className="queue-findings">
        <Findings item={item} />
      </Cell>
      <Cell className="queue-window">
        {item.window && <WindowMeter used={item.window.used} total={item.window.total} />}
      </Cell>
      <Cell oneLine className="queue-due">
        {item.dueAt && formatDate(item.dueAt)}
      </Cell>
      <Cell oneLine className="queue-left">
        {item.window && <span className={leftLooks(item.window.left)}>{leftInTable(item.window.left)}</span>}
      </Cell>
      <Cell oneLine className="queue-reviewer">
        <Holder item={item} taking={taking} onTake={onTake} />
      </Cell>
    </Row>
  );
}

const NEAR_DAYS = 3;

function leftLooks(left: number): string | undefined {
  if (left <= 0) return 'font-semibold text-vermilion';
  return left <= NEAR_DAYS ? 'font-semibold' : undefined;
}

function Findings({ item: { grades, check } }: { item: ApplicationSummary }) {
  if (check && check.state !== 'done') {
    return (
      <span className="text-ink-soft">
        {check.state === 'failed' ? 'check failed' : `checking, ${check.linesChecked} of ${check.lineCount}`}
      </span>
    );
  }
  return (
    grades && (
      <GradeSlots counts={{ 'must-answer': grades.mustAnswer, explain: grades.explain, note: grades.note }} />
    )
  );
}

interface HolderProps {
  item: ApplicationSummary;
  taking: boolean;
  onTake: (item: ApplicationSummary) => void;
}

/** Who has the case; or, while nobody has, the way to take it. */
function Holder({ item, taking, onTake }: HolderProps) {
  if (item.reviewer) return item.reviewer.name;
  if (item.state !== 'filed') return null;
  return (
    <Button
      small
      busy={taking}
      aria-label={`Take ${item.number}, ${item.title}`}
      onClick={() => onTake(item)}
    >
      Take
    </Button>
  );
}
