import {
  attachmentHeights,
  brokenHeights,
  offsets,
  sagAndClearance,
  type HeightDimension,
  type OffsetDimension,
} from './dimensions';
import { drawable, isTooLow, midSpanM, type DrawingUnit, type DrawnPosition } from './drawn-position';
import { discRadius, extentOf, frameFor, type Extent, type Frame } from './frame';
import type { Box } from './label-placing';
import { placeLens, type LensPlace } from './lens-placing';
import {
  clearLabels,
  heightsAtLeft,
  heightsAtRight,
  leftRoom,
  offsetsAbove,
  offsetsBelow,
  rightRoom,
  rowsRoom,
  type PaperDimension,
  type Sides,
} from './paper-dimension';

export interface StructureOptions {
  width: number;
  tallest: number;
  unit: DrawingUnit;
  clearanceM: number | null;
  /** Kept while something is dragged, so that the scale does not move under the hand. */
  extent?: Extent;
}

/** A position on the paper. */
export interface Mark {
  position: DrawnPosition;
  x: number;
  y: number;
  /** Height of its mid-span point, or null without sag. */
  midY: number | null;
  bad: boolean;
}

export interface Lens {
  place: LensPlace;
  radius: number;
  position: DrawnPosition;
  /** From the position to the rim; null where the magnifier stands apart from the drawing. */
  lead: readonly [number, number, number, number] | null;
}

export interface StructureLayout {
  frame: Frame;
  height: number;
  extent: Extent;
  circuits: number;
  discRadius: number;
  marks: readonly Mark[];
  dimensions: readonly PaperDimension[];
  ground: readonly [number, number];
  zone: { y: number; height: number } | null;
  lenses: readonly Lens[];
}

const LEAST_CHAIN_PX = 44;
const LENS_RADIUS = 48;

interface Lengths {
  left: HeightDimension[];
  right: HeightDimension[];
  below: OffsetDimension[];
  above: OffsetDimension[];
}

const rows = (dims: readonly OffsetDimension[]) => Math.max(0, ...dims.map((d) => d.row + 1));
const columns = (dims: readonly HeightDimension[]) => Math.max(0, ...dims.map((d) => d.column + 1));

function lengthsOf(
  positions: readonly DrawnPosition[],
  clearanceM: number | null,
  pixelsPerM: number,
): Lengths {
  const broken = brokenHeights(positions, clearanceM);
  const sound = positions.filter((p) => !p.bad && !isTooLow(p, clearanceM));
  return {
    left: attachmentHeights(broken.length > 0 ? sound : positions),
    right: broken.length > 0 ? broken : sagAndClearance(positions),
    below: offsets(positions, 'phase', pixelsPerM, LEAST_CHAIN_PX),
    above: offsets(positions, 'ground-wire', pixelsPerM, LEAST_CHAIN_PX),
  };
}

/** The scale depends on the room for dimension lines, and their rows on the scale: two rounds settle it. */
function fit(positions: readonly DrawnPosition[], extent: Extent, options: StructureOptions) {
  let lengths = lengthsOf(positions, options.clearanceM, Infinity);
  let frame: Frame | undefined;
  for (let round = 0; round < 2; round += 1) {
    const margins = {
      left: leftRoom(columns(lengths.left)),
      right: rightRoom(columns(lengths.right)),
      top: 16 + rowsRoom(rows(lengths.above)),
      bottom: 20 + rowsRoom(rows(lengths.below)),
    };
    frame = frameFor(extent, margins, options.width, options.tallest);
    lengths = lengthsOf(positions, options.clearanceM, frame.pixelsPerM);
  }
  const below = rows(lengths.below);
  const settled =
    frame ?? frameFor(extent, { left: 0, right: 0, top: 0, bottom: 0 }, options.width, options.tallest);
  return { lengths, frame: { ...settled, height: settled.groundY + 20 + rowsRoom(below) } };
}

function marksOf(positions: readonly DrawnPosition[], frame: Frame, clearanceM: number | null): Mark[] {
  return positions.map((position) => ({
    position,
    x: frame.x(position.horizontalM),
    y: frame.y(position.attachmentHeightM),
    midY: position.sagM > 0 ? frame.y(midSpanM(position)) : null,
    bad: position.bad === true || isTooLow(position, clearanceM),
  }));
}

function takenBy(marks: readonly Mark[], radius: number): Box[] {
  return marks.flatMap(({ x, y, midY }) => {
    const size = 2 * radius + 4;
    const disc = { x, y, width: size, height: size };
    if (midY === null) return [disc];
    const drop = { x, y: (y + midY) / 2, width: 4, height: Math.abs(midY - y) };
    return [disc, drop, { x, y: midY, width: size - 4, height: size - 4 }];
  });
}

/** Positions by the bundle that hangs there, rightmost first; two kinds of bundle at most. */
function bundlesToMagnify(marks: readonly Mark[]): Mark[][] {
  const byKind = new Map<string, Mark[]>();
  for (const mark of marks) {
    const { kind, bundleCount, bundleSpacingM } = mark.position;
    if (kind !== 'phase' || bundleCount < 2 || !(bundleSpacingM > 0)) continue;
    const key = `${bundleCount}:${bundleSpacingM}`;
    byKind.set(
      key,
      [...(byKind.get(key) ?? []), mark].sort((a, b) => b.x - a.x),
    );
  }
  return [...byKind.values()].slice(0, 2);
}

function leadLine(mark: Mark, place: LensPlace, from: number, radius: number): Lens['lead'] {
  const [dx, dy] = [place.x - mark.x, place.y - mark.y];
  const distance = Math.hypot(dx, dy);
  const [ux, uy] = [dx / distance, dy / distance];
  return [mark.x + ux * from, mark.y + uy * from, place.x - ux * radius, place.y - uy * radius];
}

interface LensSite {
  mark: Mark;
  place: LensPlace;
}

/** Among the wires if there is room, else beside them at whichever position is nearest, else null. */
function lensSite(
  marks: readonly Mark[],
  frame: Frame,
  sides: Sides,
  taken: readonly Box[],
): LensSite | null {
  const among = { left: sides.left - sides.discRadius, right: sides.right + sides.discRadius };
  const beside = { left: 4, right: frame.width - 4 };
  for (const reach of [among, beside]) {
    const sites = marks.flatMap((mark) => {
      const place = placeLens(mark, LENS_RADIUS, frame, reach, taken);
      return place ? [{ mark, place, distance: Math.hypot(place.x - mark.x, place.y - mark.y) }] : [];
    });
    const nearest = sites.sort((a, b) => Math.round(a.distance - b.distance))[0];
    if (nearest) return nearest;
  }
  return null;
}

function lensesOf(
  marks: readonly Mark[],
  frame: Frame,
  sides: Sides,
  taken: readonly Box[],
): { lenses: Lens[]; below: number } {
  const occupied = [...taken];
  const lenses: Lens[] = [];
  let apart = 0;
  for (const alike of bundlesToMagnify(marks)) {
    const site = lensSite(alike, frame, sides, occupied);
    const mark = site?.mark ?? alike[0];
    if (!mark) continue;
    const place = site?.place ?? {
      x: LENS_RADIUS + 8 + apart * (2 * LENS_RADIUS + 16),
      y: frame.height + LENS_RADIUS + 4,
    };
    if (!site) apart += 1;
    occupied.push({ ...place, width: 2 * LENS_RADIUS, height: 2 * LENS_RADIUS });
    const lead = site ? leadLine(mark, place, sides.discRadius + 1, LENS_RADIUS) : null;
    lenses.push({ place, radius: LENS_RADIUS, position: mark.position, lead });
  }
  return { lenses, below: apart > 0 ? 2 * LENS_RADIUS + 16 : 0 };
}

/** Upright lines and their figures, as boxes that a magnifier must keep clear of. */
function dimensionBoxes(dimensions: readonly PaperDimension[]): Box[] {
  return dimensions.flatMap((d) => {
    const [middle, length] = [(d.from + d.to) / 2, Math.abs(d.to - d.from)];
    const line =
      d.along === 'y'
        ? { x: d.at, y: middle, width: 6, height: length }
        : { x: middle, y: d.at, width: length, height: 6 };
    return [d.box, line];
  });
}

/** Everything that the drawing shows, in pixels. */
export function layOutStructure(all: readonly DrawnPosition[], options: StructureOptions): StructureLayout {
  const positions = drawable(all);
  const { unit, clearanceM } = options;
  const extent = options.extent ?? extentOf(positions, clearanceM);
  const { lengths, frame } = fit(positions, extent, options);
  const radius = discRadius(positions, frame);
  const marks = marksOf(positions, frame, clearanceM);
  const sides: Sides = {
    left: frame.x(extent.left),
    right: frame.x(extent.right),
    top: frame.y(extent.top),
    discRadius: radius,
  };
  const wires = positions.filter((p) => p.kind === 'ground-wire');
  const wireTop = Math.max(0, ...wires.map((p) => p.attachmentHeightM));
  const raw = [
    ...heightsAtLeft(lengths.left, frame, sides, unit),
    ...heightsAtRight(lengths.right, frame, sides, unit),
    ...offsetsBelow(lengths.below, frame, unit),
    ...offsetsAbove(lengths.above, wireTop, frame, sides, unit),
  ];
  const taken = takenBy(marks, radius);
  const dimensions = clearLabels(raw, taken);
  const centre: Box = { x: frame.centreX, y: frame.groundY / 2, width: 4, height: frame.groundY };
  const { lenses, below } = lensesOf(marks, frame, sides, [...taken, centre, ...dimensionBoxes(dimensions)]);
  const broken = clearanceM !== null && marks.some((mark) => isTooLow(mark.position, clearanceM));
  const ys = dimensions.filter((d) => d.along === 'y').map((d) => d.at);
  return {
    frame,
    height: frame.height + below,
    extent,
    circuits: Math.max(1, ...positions.filter((p) => p.kind === 'phase').map((p) => p.circuit)),
    discRadius: radius,
    marks,
    dimensions,
    ground: [Math.min(sides.left - 16, ...ys) - 6, Math.max(sides.right + 16, ...ys) + 6],
    zone:
      broken && clearanceM !== null
        ? { y: frame.y(clearanceM), height: clearanceM * frame.pixelsPerM }
        : null,
    lenses,
  };
}
