import type { FilingLine, Position, Section } from '#shared/contracts/filing.generated';
import { dimensionsAt } from '#shared/checks/rules/drawing/voltage-table';
import type { LineInput, OverheadSection } from '#shared/engine/index';
import { normaliseLine } from '#shared/filing/normalise-line';
import type { NormalisedLine, NormalisedSection } from '#shared/filing/types';
import type { DrawnPosition } from '../../../components/charts/structure/drawn-position';

/** What a frozen line holds, in the filing's own words and ready for the engine. */
export interface FiledLine {
  filed: FilingLine;
  normalised: NormalisedLine;
}

/** Reads a frozen line; it passed the schema when it was filed, so nothing is judged again here. */
export function readFiledLine(line: Record<string, unknown>): FiledLine {
  const filed = line as unknown as FilingLine;
  const { line: normalised } = normaliseLine(filed, { pointer: '', written: {}, assumed: [] });
  return { filed, normalised };
}

/** A section as the engine takes it; null for cables and where the geometry is owed. */
export function overheadOf(section: NormalisedSection | undefined): OverheadSection | null {
  return section?.kind === 'overhead' ? section.input : null;
}

/** The whole line as the engine takes it; null while a section owes its geometry. */
export const engineInputOf = (line: FiledLine): LineInput | null => line.normalised.engineInput;

/** A position's name in tables: "a", "2b" of a second circuit, "gw 1". */
export function positionName(positions: readonly Position[], index: number): string {
  const position = positions[index];
  if (!position) return '';
  if (!position.groundWire) {
    const several = positions.some((p) => (p.circuit ?? 1) > 1);
    return several ? `${position.circuit ?? 1}${position.phase ?? ''}` : (position.phase ?? '');
  }
  const before = positions.slice(0, index + 1).filter((p) => p.groundWire);
  return `gw ${before.length}`;
}

/** Positions as the drawing needs them; those that a finding names are marked. */
export function drawnPositions(section: Section, bad: ReadonlySet<number>): DrawnPosition[] {
  return (section.positions ?? []).map((p, index) => ({
    id: String(index),
    kind: p.groundWire ? 'ground-wire' : 'phase',
    label: p.phase ?? '',
    circuit: p.circuit ?? 1,
    horizontalM: p.horizontalM,
    attachmentHeightM: p.attachmentHeightM,
    sagM: p.sagM ?? 0,
    bundleCount: p.bundleCount ?? 1,
    bundleSpacingM: p.bundleSpacingM ?? 0,
    bad: bad.has(index),
  }));
}

/** The least height over ground of the voltage, where the table of voltages knows one. */
export function leastClearanceM(nominalVoltageKv: number): number | null {
  return dimensionsAt(nominalVoltageKv)?.leastHeightM ?? null;
}

/** How the phases hang, in a word for the title block. */
export function structureWord(section: Section | undefined): string {
  if (!section) return 'not given';
  if (section.kind === 'cable') return 'Cable';
  const phases = (section.positions ?? []).filter((p) => !p.groundWire && (p.circuit ?? 1) === 1);
  if (phases.length === 0) return 'not given';
  const spread = (values: number[]) => Math.max(...values) - Math.min(...values);
  const across = spread(phases.map((p) => p.horizontalM));
  const up = spread(phases.map((p) => p.attachmentHeightM));
  if (up < 0.1 * across) return 'Flat';
  return across < 0.25 * up ? 'Vertical' : 'Triangle';
}
