import type { RevisionLine } from '#shared/contracts/api.generated';
import { figure, signedPercent } from '#shared/format/numbers';
import { parameterName } from '../../../components/charts/balance-entries';
import { SheetSection } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { sinceBefore, type ChangedValue } from '../model/since-before';

/** Values that moved since the revision before; nothing where none did. */
export function SinceBeforeSection({ line, circuit }: { line: RevisionLine; circuit: number }) {
  const changes = sinceBefore(line, circuit);
  if (changes.length === 0) return null;
  return (
    <SheetSection id="since" title="Since the revision before" aside="Values that moved">
      <Table label="Values that moved since the revision before">
        <TableHead>
          <Row>
            <HeadCell>Value</HeadCell>
            <HeadCell number>before</HeadCell>
            <HeadCell number>{`revision ${line.revision}`}</HeadCell>
            <HeadCell number>moved by</HeadCell>
          </Row>
        </TableHead>
        <TableBody>
          {changes.map((change) => (
            <Row key={`${change.parameter} ${change.what}`}>
              <RowHead>
                {parameterName(change.parameter)}{' '}
                <span className={change.what === 'declared' ? 'text-copper' : 'text-verdigris'}>
                  {change.what}
                </span>
              </RowHead>
              <Cell number>{text(change.parameter, change.before)}</Cell>
              <Cell number className="font-semibold">
                {text(change.parameter, change.after)}
              </Cell>
              <Cell number>{movedBy(change)}</Cell>
            </Row>
          ))}
        </TableBody>
      </Table>
    </SheetSection>
  );
}

const text = (parameter: string, value: number | null) =>
  value === null ? 'none' : figure(parameter === 'waveSpeed' ? value * 100 : value, 4);

function movedBy({ before, after }: ChangedValue): string {
  return before === null || after === null || before === 0 ? '' : signedPercent(after / before - 1);
}
