import type { Finding, LineReport } from '#shared/checks/types';
import type { PointerFault } from '#shared/contracts/faults';
import type { CheckOutcome } from '../worker/messages';
import { allFindings, reportIn } from './report-view';

/** A word at a place of the line. */
export interface Placed {
  pointer: string;
  grade: 'must-answer' | 'explain' | 'note';
  message: string;
  /** Nothing stands there yet. */
  missing?: boolean;
}

/** The place of a finding within its line; of a whole position, its height. */
function placeOf(where: string): string {
  const inLine = where.replace(/^\/lines\/\d+/, '');
  return /\/positions\/\d+$/.test(inLine) ? `${inLine}/attachmentHeightM` : inLine;
}

const isOfDrawing = (f: Finding): boolean => f.family === 'drawing' && f.grade !== 'note';
/** Geometry that is owed may be filed without; it stands in the check and at no field. */
const isOwed = (f: Finding): boolean => f.code === 'drawing.geometry-missing';
const namesAnEntry = (f: Finding): boolean => /\/(positions|conductors)\//.test(f.where);
const isUncomputed = (report: LineReport): boolean => report.circuits.some((c) => c.recomputed === null);

const placed = ({ where, grade, message }: Finding): Placed => ({ pointer: placeOf(where), grade, message });

/** What keeps a line from being filed: faults of its fields, and a geometry that cannot be computed. */
export function blockersOf(outcome: CheckOutcome | null): Placed[] {
  if (!outcome) return [];
  if (outcome.kind === 'faults')
    return outcome.faults.map(({ pointer, value, message }: PointerFault) => ({
      pointer: pointer.replace(/^\/lines\/\d+/, ''),
      grade: 'must-answer',
      message,
      missing: value === null,
    }));
  const { report } = outcome;
  if (!isUncomputed(report)) return [];
  return allFindings(report)
    .filter((f) => isOfDrawing(f) && f.grade === 'must-answer' && !isOwed(f))
    .map(placed);
}

/** Findings about the geometry itself, to be said at the field that they are about. */
export function drawingNotes(outcome: CheckOutcome | null): Placed[] {
  const report = reportIn(outcome);
  if (!report) return [];
  return allFindings(report)
    .filter((f) => isOfDrawing(f) && namesAnEntry(f))
    .map(placed);
}

/** Positions of a section, by index, that a Must answer about the drawing names. */
export function badPositions(outcome: CheckOutcome | null, section: number): Set<number> {
  const report = reportIn(outcome);
  if (!report) return new Set();
  const named = allFindings(report).filter(
    (f) => f.family === 'drawing' && f.grade === 'must-answer' && f.section === section,
  );
  return new Set(named.flatMap((f) => (f.position === undefined ? [] : [f.position])));
}
