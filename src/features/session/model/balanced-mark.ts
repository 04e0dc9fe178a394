/** The mark as a dimensioned drawing: pivot, beam and two discs in true balance (diameter² × arm alike). */
export interface MarkDrawing {
  width: number;
  height: number;
  groundY: number;
  beamY: number;
  pivotX: number;
  beam: readonly [number, number];
  /** How far the pivot's feet stand apart from its tip. */
  legs: number;
  discs: readonly { x: number; radius: number; colour: 'copper' | 'verdigris'; text: string }[];
  arms: readonly { from: number; to: number; text: string }[];
  sum: string;
}

/** Diameters and arms of the mark; 12² × 14 = 8² × 31.5. */
const LARGE = { diameter: 12, arm: 14 };
const SMALL = { diameter: 8, arm: 31.5 };
/** Length of the beam with what stands over at both ends, in the same units. */
const SPAN = 60;

/** Lays the mark out for a width, everything in one scale. */
export function layOutMark(width: number): MarkDrawing {
  const unit = (width - 48) / SPAN;
  const pivotX = 24 + 20.6 * unit;
  const beamY = 52 + LARGE.diameter * unit;
  const left = pivotX - LARGE.arm * unit;
  const right = pivotX + SMALL.arm * unit;
  const groundY = beamY + Math.max(10 * unit, 62);
  return {
    width,
    height: groundY + 58,
    groundY,
    beamY,
    pivotX,
    beam: [left - 6.4 * unit, right + 5 * unit],
    legs: 5.2 * unit,
    discs: [
      { x: left, radius: (LARGE.diameter * unit) / 2, colour: 'copper', text: 'd 12.0' },
      { x: right, radius: (SMALL.diameter * unit) / 2, colour: 'verdigris', text: 'd 8.0' },
    ],
    arms: [
      { from: left, to: pivotX, text: '14.0' },
      { from: pivotX, to: right, text: '31.5' },
    ],
    sum: '12.0² × 14.0 = 8.0² × 31.5',
  };
}
