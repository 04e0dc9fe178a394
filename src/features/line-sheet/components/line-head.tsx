import type { RevisionLine } from '#shared/contracts/api.generated';
import { fixed, THIN_SPACE } from '#shared/format/numbers';
import { RevisionTriangle } from '../../../components/ui/revision-triangle';
import { TitleBlock } from '../../../components/ui/title-block';
import { structureWord, type FiledLine } from '../model/filed-line';

interface LineHeadProps {
  line: RevisionLine;
  filed: FiledLine;
  titleId: string;
  /** Parts of the sheet that can be jumped to, by their ids. */
  jumps: readonly { id: string; label: string }[];
}

/** The head of a line's sheet, its title block docked into the corner. */
export function LineHead({ line, filed, titleId, jumps }: LineHeadProps) {
  const structures = new Set(filed.filed.sections.map(structureWord));
  return (
    <div className="line-head">
      <div>
        <h2 id={titleId}>{line.name}</h2>
        <p className="text-table text-ink-soft">
          {line.from} to {line.to}
        </p>
        <nav className="jump" aria-label="Parts of this sheet">
          {jumps.map(({ id, label }) => (
            <a key={id} className="link" href={`#${id}`}>
              {label}
            </a>
          ))}
        </nav>
      </div>
      <TitleBlock
        label="Title block of the line"
        cells={[
          { label: 'Line', value: line.lineKey, span: 3, lead: true },
          { label: 'Voltage', value: `${line.nominalVoltageKv}${THIN_SPACE}kV`, span: 3 },
          { label: 'Length', value: `${fixed(line.lengthKm, 1)}${THIN_SPACE}km`, span: 3 },
          { label: 'Revision', value: <RevisionTriangle letter={line.revision} />, span: 3 },
          { label: 'Circuits', value: line.circuitCount, span: 3 },
          { label: 'Sections', value: line.sectionCount, span: 3 },
          { label: 'Frequency', value: `${line.frequencyHz}${THIN_SPACE}Hz`, span: 3 },
          { label: 'Structure', value: structures.size === 1 ? [...structures][0] : 'Several', span: 3 },
        ]}
      />
    </div>
  );
}
