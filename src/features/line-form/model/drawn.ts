import type { DrawnPosition } from '../../../components/charts/structure/drawn-position';
import { convert } from './convert';
import type { PositionForm, SectionForm, Typed } from './form-types';
import { readNumber, writeNumber } from './number-text';

function metres(field: Typed): number {
  const reading = readNumber(field.text);
  return reading.kind === 'number' ? convert(reading.value, field.unit, 'm') : Number.NaN;
}

const metresOr = (field: Typed, otherwise: number): number =>
  field.text.trim() === '' ? otherwise : metres(field);

function drawn(position: PositionForm, index: number, label: string, bad: boolean): DrawnPosition {
  const phase = position.kind === 'phase' ? position : null;
  const count = phase ? readNumber(phase.bundleCount) : null;
  return {
    id: String(index),
    kind: position.kind,
    label,
    circuit: phase?.circuit ?? 0,
    horizontalM: metres(position.horizontalM),
    attachmentHeightM: metres(position.attachmentHeightM),
    sagM: metresOr(position.sagM, 0),
    bundleCount: count?.kind === 'number' ? Math.min(8, Math.max(1, Math.round(count.value))) : 1,
    bundleSpacingM: phase ? metresOr(phase.bundleSpacingM, 0) : 0,
    bad,
  };
}

/** The letter of a phase; the number of a ground wire where there are several. */
function labelAt(section: SectionForm, index: number): string {
  const at = section.positions[index];
  if (at?.kind === 'phase') return at.phase;
  const isGround = (p: PositionForm): boolean => p.kind === 'ground-wire';
  if (section.positions.filter(isGround).length < 2) return '';
  return String(section.positions.slice(0, index + 1).filter(isGround).length);
}

/** The positions of a section that can be drawn: those whose figures are numbers. Ids are their indices. */
export function drawnPositions(section: SectionForm, bad?: ReadonlySet<number>): DrawnPosition[] {
  return section.positions
    .map((p, i) => drawn(p, i, labelAt(section, i), bad?.has(i) ?? false))
    .filter((p) => [p.horizontalM, p.attachmentHeightM, p.sagM].every(Number.isFinite))
    .map((p) => (Number.isFinite(p.bundleSpacingM) ? p : { ...p, bundleSpacingM: 0 }));
}

/** A length as the form writes it after a drag: in the unit of its field, to the centimetre or tenth of a foot. */
function written(lengthM: number, unit: string): Typed {
  const decimals = unit === 'ft' ? 1 : 2;
  return { text: writeNumber(Number(convert(lengthM, 'm', unit).toFixed(decimals))), unit };
}

/** Puts a position where the drawing moved it. */
export function movePosition(
  section: SectionForm,
  id: string,
  to: { horizontalM: number; attachmentHeightM: number },
): SectionForm {
  const positions = section.positions.map((p, i) =>
    String(i) === id
      ? {
          ...p,
          horizontalM: written(to.horizontalM, p.horizontalM.unit),
          attachmentHeightM: written(to.attachmentHeightM, p.attachmentHeightM.unit),
        }
      : p,
  );
  return { ...section, positions };
}
