import { Link } from 'react-router-dom';
import type { Letter } from '#shared/contracts/api.generated';
import { formatDate } from '#shared/format/dates';
import { EmptyState } from '../../../components/feedback/empty-state';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { SkeletonRows } from '../../../components/feedback/skeleton';
import { FilterInput } from '../../../components/ui/filter-input';
import { Select } from '../../../components/ui/inputs';
import { ListPages } from '../../../components/ui/list-pages';
import { PageHead } from '../../../components/ui/page-head';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Sheet } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { useListView, type ListControls } from '../../../hooks/use-list-view';
import type { Role } from '../../../lib/api/session';
import { isFiltered, sortedBy } from '../../../lib/list-view';
import { applicationPath } from '../../../lib/paths';
import { LETTER_LIST, useLetterList, type LetterFilter } from '../api/list-letters';
import { discrepancyWords, KIND_WORDS } from '../model/letter-words';
import { LetterLinks } from './letter-links';

const KINDS = (Object.keys(KIND_WORDS) as Letter['kind'][]).map((value) => ({
  value,
  label: KIND_WORDS[value],
}));

/** Every letter that was sent, as it was sent. */
export function LettersPage({ role }: { role: Role }) {
  const controls = useListView(LETTER_LIST);
  const { data: page, error } = useLetterList(controls.view);
  return (
    <>
      <PageHead title="Letters" lead="Receipts, discrepancy letters and decisions, as they were sent." />
      <ProblemNotice error={error} className="mb-4" />
      <div className="filter-row" role="search" aria-label="Filter the letters">
        <FilterInput
          type="search"
          label="Number or title contains"
          placeholder="Number or title"
          value={controls.view.filters.search}
          onChange={(value) => controls.setFilter('search', value)}
        />
        <Select
          aria-label="Kind"
          none="Any kind"
          options={KINDS}
          value={controls.view.filters.kind}
          onChange={(event) => controls.setFilter('kind', event.target.value)}
        />
      </div>
      <Sheet main label="Letters">
        {page ? (
          <LetterTable items={page.items} controls={controls} role={role} />
        ) : (
          <SkeletonRows rows={8} label="Loading the letters" />
        )}
        {page?.items.length === 0 && (
          <EmptyState
            title={
              isFiltered(controls.view) ? 'No letter fits these filters.' : 'No letter has been sent yet.'
            }
          >
            A letter is written when an application is filed, returned or decided.
          </EmptyState>
        )}
        <div className="sheet-foot">{page && <ListPages page={page} controls={controls} />}</div>
      </Sheet>
    </>
  );
}

interface LetterTableProps {
  items: readonly Letter[];
  controls: ListControls<LetterFilter>;
  role: Role;
}

function LetterTable({ items, controls: { view, setSort }, role }: LetterTableProps) {
  const sorts = (column: string) => ({ sorted: sortedBy(view, column), onSort: () => setSort(column) });
  return (
    <Table label="Letters" folds>
      <TableHead>
        <Row>
          <HeadCell {...sorts('sent')}>Sent</HeadCell>
          <HeadCell>Letter</HeadCell>
          <HeadCell {...sorts('number')}>Application</HeadCell>
          <HeadCell>Rev.</HeadCell>
          <HeadCell>Discrepancies</HeadCell>
          <HeadCell>Answers due</HeadCell>
          <HeadCell>PDF</HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {items.map((letter) => (
          <Row key={`${letter.applicationId} ${letter.number}`} selectable>
            <Cell oneLine>{formatDate(letter.sentAt)}</Cell>
            <RowHead fold="row">
              {letter.subject}
              <span className="block font-normal text-ink-soft">{KIND_WORDS[letter.kind]}</span>
            </RowHead>
            <Cell fold="row">
              <Link className="link" to={applicationPath(role, letter.applicationNumber)}>
                {letter.applicationNumber}
              </Link>{' '}
              <span className="text-ink-soft">{letter.applicationTitle}</span>
            </Cell>
            <Cell>
              <RevisionTriangle letter={letter.revision} />
            </Cell>
            <Cell>{discrepancyWords(letter.discrepancies)}</Cell>
            <Cell oneLine foldLabel={letter.dueAt ? 'Answers due' : undefined}>
              {letter.dueAt && formatDate(letter.dueAt)}
            </Cell>
            <Cell oneLine fold="row">
              <LetterLinks letter={letter} />
            </Cell>
          </Row>
        ))}
      </TableBody>
    </Table>
  );
}
