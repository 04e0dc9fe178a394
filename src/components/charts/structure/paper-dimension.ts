import { textWidth } from '../text-width';
import { dimensionText, type HeightDimension, type OffsetDimension } from './dimensions';
import type { DrawingUnit } from './drawn-position';
import type { Frame } from './frame';
import { placeLabels, type Box, type LabelOnLine } from './label-placing';

export const DIMENSION_TEXT_PX = 11.5;
const TEXT_HEIGHT = 14;
const COLUMN = 37;
const ROW = 18;
const WIDE_COLUMN = 46;
/** Below this length a line has no room for its figure: it stands beside. */
const LEAST_FOR_GAP = 34;

/** A dimension line on the paper, in pixels. */
export interface PaperDimension {
  along: 'x' | 'y';
  /** The line's place across its direction. */
  at: number;
  from: number;
  to: number;
  /** Extension lines, each from the thing measured out to the line. */
  extensions: readonly (readonly [x1: number, y1: number, x2: number, y2: number])[];
  text: string;
  box: Box;
  /** The figure stands in a gap of the line, not beside it. */
  inGap: boolean;
  bad: boolean;
}

/** The sides of what is drawn, beyond which dimension lines stand. */
export interface Sides {
  left: number;
  right: number;
  top: number;
  discRadius: number;
}

const boxOf = (text: string, x: number, y: number): Box => ({
  x,
  y,
  width: textWidth(text, DIMENSION_TEXT_PX) + 6,
  height: TEXT_HEIGHT,
});

function finish(parts: Omit<PaperDimension, 'text' | 'box' | 'inGap'>, text: string): PaperDimension {
  const [x, y] =
    parts.along === 'x' ? [(parts.from + parts.to) / 2, parts.at] : [parts.at, (parts.from + parts.to) / 2];
  const box = boxOf(text, x, y);
  const length = Math.abs(parts.to - parts.from);
  const inGap = length >= (parts.along === 'x' ? box.width + 10 : LEAST_FOR_GAP);
  if (inGap) return { ...parts, text, box, inGap };
  const beside = parts.along === 'x' ? { ...box, y: y - 9 } : { ...box, x: x + box.width / 2 + 3 };
  return { ...parts, text, box: beside, inGap };
}

/** Room at the left for so many columns of heights. */
export const leftRoom = (columns: number) => (columns === 0 ? 24 : 46 + (columns - 1) * COLUMN);

/** Room at the right for so many wide columns. */
export const rightRoom = (columns: number) => (columns === 0 ? 24 : 72 + (columns - 1) * WIDE_COLUMN);

export const rowsRoom = (rows: number) => (rows === 0 ? 0 : 12 + rows * ROW);

export function heightsAtLeft(
  dims: readonly HeightDimension[],
  frame: Frame,
  sides: Sides,
  unit: DrawingUnit,
) {
  return dims.map((dim) => {
    const at = sides.left - sides.discRadius - 18 - dim.column * COLUMN;
    const y = frame.y(dim.toM);
    return finish(
      {
        along: 'y',
        at,
        from: frame.y(dim.fromM),
        to: y,
        extensions: [[frame.x(dim.reachM) - sides.discRadius - 2, y, at - 4, y]],
        bad: false,
      },
      dimensionText(dim, unit),
    );
  });
}

export function heightsAtRight(
  dims: readonly HeightDimension[],
  frame: Frame,
  sides: Sides,
  unit: DrawingUnit,
) {
  return dims.map((dim) => {
    const at = sides.right + sides.discRadius + 26 + dim.column * WIDE_COLUMN;
    const reach = frame.x(dim.reachM) + sides.discRadius + 2;
    return finish(
      {
        along: 'y',
        at,
        from: frame.y(dim.fromM),
        to: frame.y(dim.toM),
        extensions: [[reach, frame.y(dim.toM), at + 4, frame.y(dim.toM)]],
        bad: dim.bad ?? false,
      },
      dimensionText(dim, unit),
    );
  });
}

export function offsetsBelow(dims: readonly OffsetDimension[], frame: Frame, unit: DrawingUnit) {
  return dims.map((dim) => {
    const at = frame.groundY + 14 + (dim.row + 1) * ROW;
    const ends = [frame.x(dim.fromM), frame.x(dim.toM)] as const;
    return finish(
      {
        along: 'x',
        at,
        from: ends[0],
        to: ends[1],
        extensions: ends.map((x) => [x, frame.groundY + 12, x, at + 5] as const),
        bad: false,
      },
      dimensionText(dim, unit),
    );
  });
}

export function offsetsAbove(
  dims: readonly OffsetDimension[],
  heightM: number,
  frame: Frame,
  sides: Sides,
  unit: DrawingUnit,
) {
  return dims.map((dim) => {
    const at = sides.top - 4 - (dim.row + 1) * ROW;
    const ends = [frame.x(dim.fromM), frame.x(dim.toM)] as const;
    return finish(
      {
        along: 'x',
        at,
        from: ends[0],
        to: ends[1],
        extensions: ends
          .filter((x) => Math.abs(x - frame.centreX) > 0.5)
          .map((x) => [x, frame.y(heightM) - 8, x, at - 5] as const),
        bad: false,
      },
      dimensionText(dim, unit),
    );
  });
}

/** Moves the figures along their lines until none covers another. */
export function clearLabels(dimensions: readonly PaperDimension[], taken: readonly Box[]): PaperDimension[] {
  const labels: LabelOnLine[] = dimensions.map((d) => ({
    from: d.from,
    to: d.to,
    box: d.box,
    along: d.along,
  }));
  const boxes = placeLabels(labels, taken);
  return dimensions.map((dimension, i) => ({ ...dimension, box: boxes[i] ?? dimension.box }));
}
