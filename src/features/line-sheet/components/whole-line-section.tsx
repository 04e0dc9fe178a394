import type { RevisionLine } from '#shared/contracts/api.generated';
import { figure, fixed, THIN_SPACE } from '#shared/format/numbers';
import { SheetSection } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';

const COLUMNS = [
  { key: 'r', label: 'R', unit: 'Ω' },
  { key: 'x', label: 'X', unit: 'Ω' },
  { key: 'b', label: 'B', unit: 'µS' },
  { key: 'r0', label: 'R0', unit: 'Ω' },
  { key: 'x0', label: 'X0', unit: 'Ω' },
  { key: 'b0', label: 'B0', unit: 'µS' },
] as const;

/** The whole line as one pi, and the geometry that the declared values would need. */
export function WholeLineSection({ line, circuit }: { line: RevisionLine; circuit: number }) {
  const implied = line.impliedGeometry.filter((g) => g.circuit === circuit);
  const totals = line.equivalents.filter((e) => e.circuit === circuit);
  if (implied.length === 0 && totals.length === 0) return null;
  return (
    <SheetSection
      id="whole-line"
      title="Whole line"
      aside={`Exact equivalent pi over ${fixed(line.lengthKm, 1)}${THIN_SPACE}km`}
    >
      {totals.length > 0 && (
        <div className="scrolls" tabIndex={0} role="region" aria-label="Equivalent pi of the whole line">
          <Table label="Equivalent pi of the whole line">
            <TableHead>
              <Row>
                <HeadCell>Circuit</HeadCell>
                {COLUMNS.map(({ key, label, unit }) => (
                  <HeadCell key={key} number>{`${label}, ${unit}`}</HeadCell>
                ))}
              </Row>
            </TableHead>
            <TableBody>
              {totals.map((total) => (
                <Row key={total.circuit}>
                  <RowHead>{total.circuit}</RowHead>
                  {COLUMNS.map(({ key }) => (
                    <Cell key={key} number className="font-semibold text-verdigris">
                      {figure(total[key], 4)}
                    </Cell>
                  ))}
                </Row>
              ))}
            </TableBody>
          </Table>
        </div>
      )}
      {implied.map((geometry) => (
        <p key={geometry.circuit} className="border-t border-rule px-4 py-3 text-table field:px-6">
          <b className="font-strong">Implied geometry.</b> {geometry.sentence}
        </p>
      ))}
    </SheetSection>
  );
}
