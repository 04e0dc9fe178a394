import type { Rules } from '#shared/contracts/api.generated';
import { Sheet } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { parameterName } from '../../../components/charts/balance-entries';
import { shareText, toleranceRows, uncertaintyRows } from '../../../lib/rule-words';

/** How far a declared value may part from the recomputed one, and how exactly each input is taken to be known. */
export function TolerancesSheet({ rules }: { rules: Rules }) {
  return (
    <Sheet title="Tolerances and uncertainties" aside="As they are in force">
      <div className="grid gap-6 pb-4 cols:grid-cols-2">
        <Table label="Tolerances">
          <TableHead>
            <Row>
              <HeadCell>Parameter</HeadCell>
              <HeadCell number>Tolerance</HeadCell>
              <HeadCell number>Widened to at most</HeadCell>
            </Row>
          </TableHead>
          <TableBody>
            {toleranceRows(rules.tolerances).map(({ parameter, relative, cap }) => (
              <Row key={parameter}>
                <RowHead>{parameterName(parameter)}</RowHead>
                <Cell number>{shareText(relative)}</Cell>
                <Cell number>{shareText(cap)}</Cell>
              </Row>
            ))}
          </TableBody>
        </Table>
        <Table label="Uncertainties of the inputs">
          <TableHead>
            <Row>
              <HeadCell>Input</HeadCell>
              <HeadCell number>Known to</HeadCell>
            </Row>
          </TableHead>
          <TableBody>
            {uncertaintyRows(rules.uncertainties).map(({ key, label, text }) => (
              <Row key={key}>
                <RowHead>{label}</RowHead>
                <Cell number>{text}</Cell>
              </Row>
            ))}
          </TableBody>
        </Table>
      </div>
    </Sheet>
  );
}
