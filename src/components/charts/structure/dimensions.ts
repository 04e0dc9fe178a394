import { isTooLow, lengthText, midSpanM, type DrawingUnit, type DrawnPosition } from './drawn-position';

/** A length to be dimensioned, in metres and by rank; where it stands on the paper comes later. */
export interface HeightDimension {
  fromM: number;
  toM: number;
  /** Column, counted outwards from the drawing. */
  column: number;
  /** Where the extension line begins: the position that the height is read at. */
  reachM: number;
  prefix?: string;
  bad?: boolean;
}

export interface OffsetDimension {
  fromM: number;
  toM: number;
  /** Row, counted outwards. */
  row: number;
}

const SAME_M = 0.005;
const MOST_COLUMNS = 5;

function distinct(values: readonly number[]): number[] {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted.filter((v, i) => i === 0 || v - (sorted[i - 1] ?? v) > SAME_M);
}

/** Attachment heights at the left, the lowest innermost; what is at fault is dimensioned at the right. */
export function attachmentHeights(positions: readonly DrawnPosition[]): HeightDimension[] {
  const phases = distinct(positions.filter((p) => p.kind === 'phase').map((p) => p.attachmentHeightM));
  const all = distinct(positions.map((p) => p.attachmentHeightM));
  const shown = all.length <= MOST_COLUMNS ? all : phases.slice(0, MOST_COLUMNS);
  return shown
    .filter((height) => height > 0)
    .map((height, column) => ({
      fromM: 0,
      toM: height,
      column,
      reachM: Math.min(
        ...positions
          .filter((p) => Math.abs(p.attachmentHeightM - height) <= SAME_M)
          .map((p) => p.horizontalM),
      ),
    }));
}

/** At the right: sag and height left at mid-span of the lowest phase. */
export function sagAndClearance(positions: readonly DrawnPosition[]): HeightDimension[] {
  const phases = positions.filter((p) => p.kind === 'phase');
  const lowest = [...phases].sort((a, b) => midSpanM(a) - midSpanM(b) || b.horizontalM - a.horizontalM)[0];
  if (!lowest || midSpanM(lowest) <= 0) return [];
  const mid = midSpanM(lowest);
  const clearance = { fromM: 0, toM: mid, column: 0, reachM: lowest.horizontalM };
  if (lowest.sagM <= 0) return [clearance];
  const sag = { fromM: mid, toM: lowest.attachmentHeightM, column: 0, reachM: lowest.horizontalM };
  return [clearance, { ...sag, prefix: 'sag ' }];
}

/** At the right instead, where something hangs too low: its two heights, each in its own column. */
export function brokenHeights(
  positions: readonly DrawnPosition[],
  clearanceM: number | null,
): HeightDimension[] {
  return positions
    .filter((p) => p.bad || isTooLow(p, clearanceM))
    .slice(0, 2)
    .flatMap((p, i) => {
      const mid = { fromM: 0, toM: midSpanM(p), column: 2 * i, reachM: p.horizontalM, bad: true };
      const top = { fromM: 0, toM: p.attachmentHeightM, column: 2 * i + 1, reachM: p.horizontalM, bad: true };
      return p.sagM > 0 && mid.toM > 0 ? [mid, top] : [{ ...top, column: 2 * i }];
    });
}

/**
 * Horizontal places of one kind of position. Where neighbours stand far enough apart for figures, one
 * chain through all of them and the centre line; else each from the centre line, in rows of its own.
 */
export function offsets(
  positions: readonly DrawnPosition[],
  kind: DrawnPosition['kind'],
  pixelsPerM: number,
  leastPixels: number,
): OffsetDimension[] {
  const xs = distinct(positions.filter((p) => p.kind === kind).map((p) => p.horizontalM));
  if (xs.every((x) => Math.abs(x) <= SAME_M)) return [];
  const stops = distinct([...xs, 0]);
  const chain = stops.slice(1).map((to, i) => ({ fromM: stops[i] ?? to, toM: to, row: 0 }));
  if (chain.every(({ fromM, toM }) => (toM - fromM) * pixelsPerM >= leastPixels)) return chain;
  const side = (sign: 1 | -1) =>
    xs
      .filter((x) => sign * x > SAME_M)
      .sort((a, b) => sign * (a - b))
      .map((x, row) => ({ fromM: Math.min(0, x), toM: Math.max(0, x), row }));
  return [...side(-1), ...side(1)];
}

/** The figure on a dimension line. */
export function dimensionText(dimension: { fromM: number; toM: number; prefix?: string }, unit: DrawingUnit) {
  return (dimension.prefix ?? '') + lengthText(Math.abs(dimension.toM - dimension.fromM), unit);
}
