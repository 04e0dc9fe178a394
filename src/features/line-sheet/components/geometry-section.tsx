import { useState } from 'react';
import type { Finding, RevisionLine } from '#shared/contracts/api.generated';
import type { Section } from '#shared/contracts/filing.generated';
import { fixed, THIN_SPACE } from '#shared/format/numbers';
import { StructureDrawing } from '../../../components/charts/structure/structure-drawing';
import { SegmentChoice } from '../../../components/ui/segment';
import { SheetSection } from '../../../components/ui/sheet';
import { drawnPositions, leastClearanceM, type FiledLine } from '../model/filed-line';
import type { FindingActions } from './balance-section';
import { ConductorFacts } from './conductor-facts';
import { LooseFindings } from './loose-findings';
import { PositionsTable } from './positions-table';

interface GeometrySectionProps {
  line: RevisionLine;
  filed: FiledLine;
  findings: readonly Finding[];
  carriers: ReadonlySet<Finding>;
  findingActions?: FindingActions;
}

/** The structure as filed: drawn to scale, its positions, conductors and earth; one section at a time. */
export function GeometrySection({ line, filed, findings, carriers, findingActions }: GeometrySectionProps) {
  const [shown, setShown] = useState('0');
  const { sections } = filed.filed;
  const index = Number(shown);
  const section = sections[index];
  const own = findings.filter((f) => f.section === null || f.section === index + 1);
  return (
    <SheetSection
      id="geometry"
      title="Geometry as filed"
      aside="Drawn to scale from the positions. Hollow discs: height at mid-span after sag."
    >
      {sections.length > 1 && (
        <div className="px-4 pb-3 field:px-6">
          <SegmentChoice
            label="Section"
            value={shown}
            onChange={setShown}
            options={sections.map((s, i) => ({
              value: String(i),
              label: `Section ${i + 1}, ${fixed(s.lengthKm, 1)}${THIN_SPACE}km`,
            }))}
          />
        </div>
      )}
      {section && <SectionGeometry key={shown} line={line} section={section} findings={own} />}
      <LooseFindings findings={findings} carriers={carriers} actions={findingActions} />
    </SheetSection>
  );
}

interface SectionGeometryProps {
  line: RevisionLine;
  section: Section;
  findings: readonly Finding[];
}

function SectionGeometry({ line, section, findings }: SectionGeometryProps) {
  if (section.kind === 'cable') {
    return (
      <p className="sheet-body text-control text-ink-soft">
        A cable of {fixed(section.lengthKm, 2)} km: its values are taken as its maker declares them, and no
        structure is drawn.
      </p>
    );
  }
  if (!section.positions?.length) {
    return (
      <p className="sheet-body text-control text-ink-soft">
        No positions were filed. Without them only physics and typical values are weighed.
      </p>
    );
  }
  const bad = new Set(
    findings.flatMap((f) => (f.stands && f.position !== null && f.grade !== 'note' ? [f.position - 1] : [])),
  );
  const phase = section.positions.find((p) => !p.groundWire);
  const name = phase ? section.conductors?.[phase.conductor]?.name : undefined;
  return (
    <div className="geometry-columns">
      <StructureDrawing
        positions={drawnPositions(section, bad)}
        clearanceM={leastClearanceM(line.nominalVoltageKv)}
        conductorName={name}
      />
      <div className="grid content-start gap-4">
        <PositionsTable section={section} bad={bad} />
        <ConductorFacts section={section} />
      </div>
    </div>
  );
}
