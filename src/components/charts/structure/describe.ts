import { isTooLow, lengthText, midSpanM, type DrawingUnit, type DrawnPosition } from './drawn-position';

function across(position: DrawnPosition, unit: DrawingUnit): string {
  if (Math.abs(position.horizontalM) < 0.005) return 'on the centre line';
  const side = position.horizontalM < 0 ? 'left' : 'right';
  return `${lengthText(Math.abs(position.horizontalM), unit)} ${side} of the centre line`;
}

/** What a position is called: "Phase a", "Phase 2b" as its disc says, "Ground wire 1". */
export function positionName(position: DrawnPosition, circuits: number): string {
  if (position.kind === 'ground-wire') return `Ground wire ${position.label}`.trimEnd();
  return circuits > 1 ? `Phase ${position.circuit}${position.label}` : `Phase ${position.label}`;
}

/** One position as a sentence. */
export function describePosition(position: DrawnPosition, circuits: number, unit: DrawingUnit): string {
  const sag = position.sagM > 0 ? `, ${lengthText(midSpanM(position), unit)} at mid-span` : '';
  const height = lengthText(position.attachmentHeightM, unit);
  return `${positionName(position, circuits)}: ${across(position, unit)}, ${height} high${sag}`;
}

/** The whole drawing as a sentence, for those who hear it. */
export function describeStructure(
  positions: readonly DrawnPosition[],
  circuits: number,
  unit: DrawingUnit,
  clearanceM: number | null,
): string {
  if (positions.length === 0) return 'Cross-section: no position is entered yet.';
  const all = positions.map((p) => describePosition(p, circuits, unit)).join('; ');
  const low = positions.filter((p) => isTooLow(p, clearanceM)).map((p) => positionName(p, circuits));
  const warning = low.length > 0 ? ` Below the least clearance: ${low.join(', ')}.` : '';
  return `Cross-section in ${unit.name}: ${all}.${warning}`;
}
