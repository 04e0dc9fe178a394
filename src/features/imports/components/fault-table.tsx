import type { Fault } from '#shared/contracts/api.generated';
import { Cell, HeadCell, Row, Table, TableBody, TableHead } from '../../../components/ui/table';

function valueText(value: unknown): string {
  if (value === null || value === undefined || value === '') return 'nothing';
  const text = typeof value === 'string' ? value : JSON.stringify(value);
  return text.length > 60 ? `${text.slice(0, 57)}…` : text;
}

/** Each fault of a file: where, what is there, what is wanted. */
export function FaultTable({ faults }: { faults: readonly Fault[] }) {
  const inRows = faults.some((f) => f.row !== undefined);
  return (
    <Table label="What to look at" folds flush>
      <TableHead>
        <Row>
          {inRows ? (
            <>
              <HeadCell number>Row</HeadCell>
              <HeadCell>Column</HeadCell>
            </>
          ) : (
            <HeadCell>Place</HeadCell>
          )}
          <HeadCell>There is</HeadCell>
          <HeadCell>Wanted</HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {faults.map((fault, i) => (
          <Row key={i}>
            {inRows ? (
              <>
                <Cell number foldLabel="Row">
                  {fault.row}
                </Cell>
                <Cell className="font-mono text-label" fold="end">
                  {fault.column}
                </Cell>
              </>
            ) : (
              <Cell className="font-mono text-label" fold="row">
                {fault.pointer}
              </Cell>
            )}
            <Cell fold="row" foldLabel="There is" className="[overflow-wrap:anywhere]">
              {valueText(fault.value)}
            </Cell>
            <Cell fold="row" foldLabel="Wanted">
              {fault.expected}
              <span className="block text-label text-ink-soft">{fault.message}</span>
            </Cell>
          </Row>
        ))}
      </TableBody>
    </Table>
  );
}
