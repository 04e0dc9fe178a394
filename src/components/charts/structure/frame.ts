import { midSpanM, type DrawnPosition } from './drawn-position';

/** What a drawing must hold, in metres. */
export interface Extent {
  left: number;
  right: number;
  top: number;
}

/** Room kept around the drawing for its dimension lines, in pixels. */
export interface Margins {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** From metres to pixels. One scale for both directions: the drawing is to scale. */
export interface Frame {
  pixelsPerM: number;
  width: number;
  height: number;
  groundY: number;
  centreX: number;
  x: (horizontalM: number) => number;
  y: (heightM: number) => number;
}

const LEAST_HEIGHT_M = 5;
const LEAST_HALF_WIDTH_M = 2;

/** The smallest extent that holds all positions, their mid-span points, the ground and the centre line. */
export function extentOf(positions: readonly DrawnPosition[], clearanceM: number | null): Extent {
  const xs = positions.map((p) => p.horizontalM);
  const tops = positions.map((p) => Math.max(p.attachmentHeightM, midSpanM(p)));
  return {
    left: Math.min(-LEAST_HALF_WIDTH_M, ...xs),
    right: Math.max(LEAST_HALF_WIDTH_M, ...xs),
    top: Math.max(LEAST_HEIGHT_M, clearanceM ?? 0, ...tops),
  };
}

/** Fits an extent into a width and a greatest height. */
export function frameFor(extent: Extent, margins: Margins, width: number, tallest: number): Frame {
  const across = Math.max(width - margins.left - margins.right, 40);
  const up = Math.max(tallest - margins.top - margins.bottom, 80);
  const spanM = extent.right - extent.left;
  const pixelsPerM = Math.min(across / spanM, up / extent.top);
  const slack = across - spanM * pixelsPerM;
  const leftX = margins.left + slack / 2;
  const groundY = margins.top + extent.top * pixelsPerM;
  const x = (horizontalM: number) => leftX + (horizontalM - extent.left) * pixelsPerM;
  return {
    pixelsPerM,
    width,
    height: groundY + margins.bottom,
    groundY,
    centreX: x(0),
    x,
    y: (heightM) => groundY - heightM * pixelsPerM,
  };
}

/** Radius of the phases' discs: 9 px, less where two stand so close that they would touch. */
export function discRadius(positions: readonly DrawnPosition[], frame: Frame): number {
  const points = positions
    .filter((p) => p.kind === 'phase')
    .map((p) => [frame.x(p.horizontalM), frame.y(p.attachmentHeightM)] as const);
  let nearest = Infinity;
  points.forEach((a, i) => {
    for (const b of points.slice(i + 1)) nearest = Math.min(nearest, Math.hypot(a[0] - b[0], a[1] - b[1]));
  });
  return Math.max(4, Math.min(9, nearest / 2 - 1));
}
