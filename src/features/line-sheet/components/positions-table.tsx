import type { Section } from '#shared/contracts/filing.generated';
import { fixed } from '#shared/format/numbers';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { positionName } from '../model/filed-line';

/** Where each phase and each ground wire hangs, in metres. */
export function PositionsTable({ section, bad }: { section: Section; bad: ReadonlySet<number> }) {
  const positions = section.positions ?? [];
  return (
    <div>
      <h3 className="text-table leading-[18px]">Positions, metres</h3>
      <Table label="Positions in metres" flush className="positions-table">
        <TableHead>
          <Row>
            <HeadCell>
              <span className="sr-only">Position</span>
            </HeadCell>
            <HeadCell number>across</HeadCell>
            <HeadCell number>height</HeadCell>
            <HeadCell number>sag</HeadCell>
            <HeadCell number>mid-span</HeadCell>
          </Row>
        </TableHead>
        <TableBody>
          {positions.map((p, index) => (
            <Row key={index} className={bad.has(index) ? 'text-vermilion' : undefined}>
              <RowHead>{positionName(positions, index)}</RowHead>
              <Cell number>{fixed(p.horizontalM, 2)}</Cell>
              <Cell number>{fixed(p.attachmentHeightM, 2)}</Cell>
              <Cell number>{fixed(p.sagM ?? 0, 2)}</Cell>
              <Cell number>{fixed(p.attachmentHeightM - (p.sagM ?? 0), 2)}</Cell>
            </Row>
          ))}
        </TableBody>
      </Table>
    </div>
  );
}
