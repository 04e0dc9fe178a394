import type { Finding, RevisionLine } from '#shared/contracts/api.generated';
import { figure } from '#shared/format/numbers';
import { SheetSection } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import type { FiledLine } from '../model/filed-line';
import type { FindingActions } from './balance-section';
import { LooseFindings } from './loose-findings';

const ROWS = [
  { key: 'r0m', name: 'R0m', unit: 'Ω/km' },
  { key: 'x0m', name: 'X0m', unit: 'Ω/km' },
  { key: 'b0m', name: 'B0m', unit: 'µS/km' },
] as const;

interface CouplingSectionProps {
  line: RevisionLine;
  filed: FiledLine;
  findings: readonly Finding[];
  carriers: ReadonlySet<Finding>;
  findingActions?: FindingActions;
}

/** What two circuits on one structure do to each other in zero sequence: declared beside recomputed. */
export function CouplingSection({ line, filed, findings, carriers, findingActions }: CouplingSectionProps) {
  if (line.mutual.length === 0 && findings.length === 0) return null;
  return (
    <SheetSection id="coupling" title="Coupling of the circuits" aside="Zero sequence, per kilometre">
      {line.mutual.map((pair) => {
        const declared = filed.normalised.mutual.find(
          (m) => m.circuits[0] === pair.circuits[0] && m.circuits[1] === pair.circuits[1],
        );
        return (
          <Table key={pair.circuits.join()} label={`Coupling of circuits ${pair.circuits.join(' and ')}`}>
            <TableHead>
              <Row>
                <HeadCell>{`Circuits ${pair.circuits.join(' and ')}`}</HeadCell>
                <HeadCell number>Declared</HeadCell>
                <HeadCell number>Recomputed</HeadCell>
              </Row>
            </TableHead>
            <TableBody>
              {ROWS.map(({ key, name, unit }) => {
                const value = declared?.declared[key];
                return (
                  <Row key={key}>
                    <RowHead>
                      {name} <span className="font-normal text-ink-soft">{unit}</span>
                    </RowHead>
                    <Cell number className="font-semibold text-copper">
                      {value ? (
                        figure(value.perKm)
                      ) : (
                        <span className="font-normal text-ink-soft">not given</span>
                      )}
                    </Cell>
                    <Cell number className="font-semibold text-verdigris">
                      {figure(pair[key])}
                    </Cell>
                  </Row>
                );
              })}
            </TableBody>
          </Table>
        );
      })}
      <LooseFindings findings={findings} carriers={carriers} actions={findingActions} />
    </SheetSection>
  );
}
