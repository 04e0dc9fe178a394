import { useMemo } from 'react';
import { handCheck, sectionMatrices, type HandCheck, type OverheadSection } from '#shared/engine/index';
import { figure, signedPercent } from '#shared/format/numbers';
import { Disclosure } from '../../../components/ui/disclosure';
import { SheetSection } from '../../../components/ui/sheet';
import { Cell, HeadCell, Row, RowHead, Table, TableBody, TableHead } from '../../../components/ui/table';
import { shareText } from '../../../lib/rule-words';
import { handSteps, shortcutRows } from '../model/hand-steps';

interface HandCheckSectionProps {
  section: OverheadSection | null;
  frequencyHz: number;
  circuit: number;
  /** Named where the line has several sections. */
  where: string;
}

/** For the reader who checks by hand: the textbook shortcut step by step, and the unbalance of the phases. */
export function HandCheckSection({ section, frequencyHz, circuit, where }: HandCheckSectionProps) {
  const result = useMemo(
    () => (section === null ? null : handCheck(section, frequencyHz, circuit)),
    [section, frequencyHz, circuit],
  );
  const unbalance = useMemo(() => {
    const matrices = section === null ? null : sectionMatrices(section, frequencyHz);
    return matrices?.ok ? (matrices.value.unbalance[circuit - 1] ?? null) : null;
  }, [section, frequencyHz, circuit]);
  if (!result?.ok) return null;
  return (
    <SheetSection
      id="hand-check"
      title="By hand"
      aside={`${where}GMD and GMR, the shortcut of the textbooks`}
    >
      <div className="sheet-body">
        <p className="mb-3 max-w-prose text-table text-ink-soft">
          Nothing is judged by these values: they stand here for whoever checks with a calculator.
          {unbalance &&
            ` Without transposition the unbalance would be ${shareText(unbalance.negative)} in negative and ${shareText(unbalance.zero)} in zero sequence.`}
        </p>
        <ShortcutTable check={result.value} />
        <Disclosure summary="Every step" className="mt-3">
          <StepTable check={result.value} />
        </Disclosure>
      </div>
    </SheetSection>
  );
}

function ShortcutTable({ check }: { check: HandCheck }) {
  return (
    <Table label="Shortcut beside the full method" folds flush>
      <TableHead>
        <Row>
          <HeadCell>Parameter</HeadCell>
          <HeadCell number>Shortcut</HeadCell>
          <HeadCell number>Full method</HeadCell>
          <HeadCell number>Difference</HeadCell>
          <HeadCell>Because of</HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {shortcutRows(check).map(({ name, unit, value, because }) => (
          <Row key={name}>
            <RowHead oneLine>
              {name} <span className="font-normal text-ink-soft">{unit}</span>
            </RowHead>
            <Cell number foldLabel="Shortcut">
              {figure(value.shortcut, 4)}
            </Cell>
            <Cell number foldLabel="Full" className="font-semibold text-verdigris">
              {figure(value.full, 4)}
            </Cell>
            <Cell number foldLabel="Difference">
              {value.full === 0 ? '' : signedPercent(value.difference / value.full)}
            </Cell>
            <Cell fold="row" className="text-ink-soft">
              {because}
            </Cell>
          </Row>
        ))}
      </TableBody>
    </Table>
  );
}

function StepTable({ check }: { check: HandCheck }) {
  return (
    <Table label="Steps of the shortcut" folds flush>
      <TableHead>
        <Row>
          <HeadCell>Step</HeadCell>
          <HeadCell>How</HeadCell>
          <HeadCell number>Result</HeadCell>
        </Row>
      </TableHead>
      <TableBody>
        {handSteps(check).map(({ what, how, result }) => (
          <Row key={what}>
            <RowHead>{what}</RowHead>
            <Cell fold="row" className="text-ink-soft">
              {how}
            </Cell>
            <Cell number fold="end">
              {result}
            </Cell>
          </Row>
        ))}
      </TableBody>
    </Table>
  );
}
