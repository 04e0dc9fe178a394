import { useMemo } from 'react';
import { FEET, METRES } from '../../../components/charts/structure/drawn-position';
import { StructureDrawing } from '../../../components/charts/structure/structure-drawing';
import { Sheet } from '../../../components/ui/sheet';
import { useLineFormView } from '../hooks/form-context';
import { changeSection, heightUnit, phasesOf } from '../model/edit';
import { drawnPositions, movePosition } from '../model/drawn';

interface LineDrawingProps {
  /** The section on the table. */
  shown: number;
  /** The least height above ground at mid-span, where the rules know one. */
  clearanceM?: number | null;
  /** Positions that a finding is about, by index. */
  bad?: ReadonlySet<number>;
}

/** The structure as it was entered, redrawn at each keystroke; what is dragged in it is written to the form. */
export function LineDrawing({ shown, clearanceM = null, bad }: LineDrawingProps) {
  const { form, change } = useLineFormView();
  const section = form.sections[shown];
  const positions = useMemo(() => (section ? drawnPositions(section, bad) : []), [section, bad]);
  if (!section || section.kind === 'cable' || !section.hasGeometry) return null;
  const unit = heightUnit(section) === 'ft' ? FEET : METRES;
  const conductor = section.conductors[phasesOf(section)[0]?.conductor ?? ''];
  const name = conductor?.source === 'own' ? conductor.name : conductor?.library;
  const several = form.sections.length > 1 ? `section ${shown + 1}, ` : '';
  return (
    <Sheet title="As it hangs" aside={`${several}to scale; hollow discs: mid-span`}>
      <div className="px-4 pb-4 field:px-6">
        {positions.length === 0 ? (
          <p className="py-6 text-control text-ink-soft">
            Each position appears here once it has its offset and height.
          </p>
        ) : (
          <StructureDrawing
            positions={positions}
            unit={unit}
            clearanceM={clearanceM}
            conductorName={name}
            tallest={400}
            onMove={(id, to) => change((f) => changeSection(f, shown, (s) => movePosition(s, id, to)))}
          />
        )}
      </div>
    </Sheet>
  );
}
