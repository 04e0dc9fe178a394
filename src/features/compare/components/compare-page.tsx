import { Link, useSearchParams } from 'react-router-dom';
import type { RevisionComparison } from '#shared/contracts/api.generated';
import { EmptyState } from '../../../components/feedback/empty-state';
import { Field } from '../../../components/ui/field';
import { Select } from '../../../components/ui/inputs';
import { PageHead } from '../../../components/ui/page-head';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { Sheet } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import type { Role } from '../../../lib/api/session';
import { applicationPath, linePath } from '../../../lib/paths';
import { useRevisionComparison } from '../../../lib/queries/compare-revisions';
import { useRevisions } from '../../../lib/queries/list-revisions';
import { placeWords, valueWords } from '../model/pointer-words';

type ComparedLine = RevisionComparison['lines'][number];

interface ComparePageProps {
  number: string;
  role: Role;
}

/** Two revisions of an application: which lines came, went or changed, and every field that differs. */
export function ComparePage({ number, role }: ComparePageProps) {
  const { items } = useRevisions(number);
  const [params, setParams] = useSearchParams();
  const to = params.get('to') ?? items[0]?.letter ?? null;
  const from = params.get('from') ?? items[1]?.letter ?? null;
  const choose = (name: 'from' | 'to', letter: string) =>
    setParams(
      (before) => {
        const after = new URLSearchParams(before);
        after.set(name, letter);
        return after;
      },
      { replace: true },
    );
  const options = items.map(({ letter }) => ({ value: letter, label: `Revision ${letter}` }));
  return (
    <>
      <PageHead
        title={from && to ? `Revision ${to} against ${from}` : 'Compare revisions'}
        documentTitle={`${number}, revisions compared`}
        crumbs={[{ label: number, to: applicationPath(role, number) }, { label: 'Compare' }]}
        actions={
          <>
            <Field label="Earlier">
              {(ties) => (
                <Select
                  {...ties}
                  value={from ?? ''}
                  options={options}
                  onChange={(event) => choose('from', event.target.value)}
                />
              )}
            </Field>
            <Field label="Later">
              {(ties) => (
                <Select
                  {...ties}
                  value={to ?? ''}
                  options={options}
                  onChange={(event) => choose('to', event.target.value)}
                />
              )}
            </Field>
          </>
        }
      />
      {from && to ? (
        <Comparison number={number} role={role} from={from} to={to} />
      ) : (
        <EmptyState title="There is only one revision.">
          The next one is compared with it here once it is filed.
        </EmptyState>
      )}
    </>
  );
}

const CHANGE_WORDS: Readonly<Record<ComparedLine['change'], string>> = {
  new: 'new',
  changed: 'changed',
  same: 'the same',
  removed: 'removed',
};

interface ComparisonProps extends ComparePageProps {
  from: string;
  to: string;
}

function Comparison({ number, role, from, to }: ComparisonProps) {
  const { lines } = useRevisionComparison(number, from, to);
  const differing = lines.filter((line) => line.change !== 'same');
  const same = lines.filter((line) => line.change === 'same');
  return (
    <>
      {differing.length === 0 && (
        <Sheet main label="Comparison">
          <EmptyState title="No line differs.">
            Both revisions hold the same lines, field by field.
          </EmptyState>
        </Sheet>
      )}
      {differing.map((line) => (
        <Sheet key={line.lineKey} title={`${line.lineKey} ${line.name}`} aside={CHANGE_WORDS[line.change]}>
          {line.change === 'changed' ? (
            <Changes line={line} from={from} to={to} />
          ) : (
            <p className="sheet-body text-control text-ink-soft">
              {line.change === 'new' ? `Not in revision ${from}.` : `Not in revision ${to} any more.`}
            </p>
          )}
          <div className="sheet-foot">
            {line.change !== 'removed' && (
              <Link className="link" to={linePath(role, number, to, line.lineKey)}>
                See it in revision {to}
              </Link>
            )}
            {line.limitReached && <span>More fields differ than are listed: the limit is reached.</span>}
          </div>
        </Sheet>
      ))}
      {same.length > 0 && (
        <p className="mt-4 text-table text-ink-soft">
          The same in both: {same.map((line) => `${line.lineKey} ${line.name}`).join(', ')}.
        </p>
      )}
    </>
  );
}

function Changes({ line, from, to }: { line: ComparedLine; from: string; to: string }) {
  return (
    <Table label={`Fields of ${line.name} that differ`} folds>
      <TableHead>
        <Row>
          <HeadCell>Field</HeadCell>
          <HeadCell>
            <span className="inline-flex items-center gap-2">
              <RevisionTriangle letter={from} older /> before
            </span>
          </HeadCell>
          <HeadCell>
            <span className="inline-flex items-center gap-2">
              <RevisionTriangle letter={to} /> after
            </span>
          </HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {line.changes.map((change) => (
          <Row key={change.pointer}>
            <RowHead fold="row">{placeWords(change.pointer)}</RowHead>
            <Cell foldLabel="before" className="break-words">
              {valueWords(change.before)}
            </Cell>
            <Cell foldLabel="after" className="break-words font-semibold">
              {valueWords(change.after)}
            </Cell>
          </Row>
        ))}
      </TableBody>
    </Table>
  );
}
