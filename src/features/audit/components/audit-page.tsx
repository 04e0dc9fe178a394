import { Link } from 'react-router-dom';
import type { AuditEvent } from '#shared/contracts/api.generated';
import { formatInstant } from '#shared/format/dates';
import { EmptyState } from '../../../components/feedback/empty-state';
import { ProblemNotice } from '../../../components/feedback/problem-notice';
import { SkeletonRows } from '../../../components/feedback/skeleton';
import { Button } from '../../../components/ui/button';
import { Disclosure } from '../../../components/ui/disclosure';
import { FilterInput } from '../../../components/ui/filter-input';
import { Select } from '../../../components/ui/inputs';
import { ListPages } from '../../../components/ui/list-pages';
import { PageHead } from '../../../components/ui/page-head';
import { Sheet } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { useListView, type ListControls } from '../../../hooks/use-list-view';
import { isFiltered } from '../../../lib/list-view';
import { useActors } from '../api/list-actors';
import { actWords } from '../model/act-words';
import { AUDIT_LIST, useAuditEvents, type AuditFilter } from '../api/list-audit-events';

/** The audit trail of the whole house, newest first. Nothing in it can be changed. */
export function AuditPage() {
  const controls = useListView(AUDIT_LIST);
  const { data: page, error } = useAuditEvents(controls.view);
  return (
    <>
      <PageHead
        title="Record"
        lead="Everything that happened, newest first. The database itself refuses to change an entry, and each carries a hash over the one before."
      />
      <ProblemNotice error={error} className="mb-4" />
      <AuditFilters controls={controls} />
      <Sheet main label="Record">
        {page ? <AuditTable items={page.items} /> : <SkeletonRows rows={10} label="Loading the record" />}
        {page?.items.length === 0 && (
          <EmptyState
            title="No entry fits these filters."
            actions={isFiltered(controls.view) && <Button onClick={controls.clear}>Show all</Button>}
          />
        )}
        <div className="sheet-foot">
          {page && <ListPages page={{ items: page.items, nextCursor: page.next }} controls={controls} />}
        </div>
      </Sheet>
    </>
  );
}

function AuditFilters({ controls: { view, setFilter } }: { controls: ListControls<AuditFilter> }) {
  const people = useActors();
  return (
    <div className="filter-row" role="search" aria-label="Filter the record">
      <FilterInput
        type="search"
        label="What was done, or its beginning"
        placeholder="Act, such as discrepancy"
        maxLength={60}
        value={view.filters.act}
        onChange={(value) => setFilter('act', value)}
      />
      <FilterInput
        type="search"
        label="Number of the application"
        placeholder="Number, 27-0418"
        maxLength={7}
        value={view.filters.application}
        onChange={(value) => setFilter('application', value)}
      />
      <Select
        aria-label="Who did it"
        none="Anybody"
        options={people.map(({ id, name }) => ({ value: id, label: name }))}
        value={view.filters.actor}
        onChange={(event) => setFilter('actor', event.target.value)}
      />
    </div>
  );
}

function AuditTable({ items }: { items: readonly AuditEvent[] }) {
  return (
    <Table label="Entries of the record" folds>
      <TableHead>
        <Row>
          <HeadCell number>No.</HeadCell>
          <HeadCell>When</HeadCell>
          <HeadCell>What</HeadCell>
          <HeadCell>Who</HeadCell>
          <HeadCell>Application</HeadCell>
          <HeadCell>Entry</HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {items.map((event) => (
          <Row key={event.seq} className="align-top">
            <Cell number foldLabel="No.">
              {event.seq}
            </Cell>
            <Cell oneLine>{formatInstant(event.at)}</Cell>
            <RowHead fold="row">
              {actWords(event.act)}
              <code className="block text-axis font-normal text-ink-soft">{event.act}</code>
            </RowHead>
            <Cell fold="row">
              {event.actor} <span className="text-ink-soft">{event.actorRole}</span>
            </Cell>
            <Cell oneLine>
              {event.applicationNumber && (
                <Link className="link" to={`/applications/${event.applicationNumber}/review`}>
                  {event.applicationNumber}
                </Link>
              )}
            </Cell>
            <Cell fold="row">
              <Disclosure summary={<code>{event.hash.slice(0, 12)}</code>}>
                <pre className="max-w-[48ch] overflow-x-auto whitespace-pre-wrap break-words py-2">
                  {JSON.stringify({ before: event.before, after: event.after }, null, 2)}
                </pre>
              </Disclosure>
            </Cell>
          </Row>
        ))}
      </TableBody>
    </Table>
  );
}
