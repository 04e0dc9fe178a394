/** A label's box, by its middle. */
export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export function overlaps(a: Box, b: Box): boolean {
  return Math.abs(a.x - b.x) * 2 < a.width + b.width && Math.abs(a.y - b.y) * 2 < a.height + b.height;
}

export interface LabelOnLine {
  /** The line's ends along its direction, in pixels; the label may stand anywhere between. */
  from: number;
  to: number;
  box: Box;
  along: 'x' | 'y';
}

const STEP = 7;

/**
 * Moves each label along its own line until it covers none placed before it nor anything in `taken`.
 * Starts in the middle and tries ever farther places; one that finds no free place stays in the middle.
 */
export function placeLabels(labels: readonly LabelOnLine[], taken: readonly Box[]): Box[] {
  const placed: Box[] = [];
  for (const label of labels) {
    const size = label.along === 'x' ? label.box.width : label.box.height;
    const room = Math.max((Math.abs(label.to - label.from) - size) / 2 - 8, 0);
    const middle = (label.from + label.to) / 2;
    const shifts = [0];
    for (let d = STEP; d <= room; d += STEP) shifts.push(d, -d);
    const at = (shift: number): Box => ({ ...label.box, [label.along]: middle + shift });
    const free = shifts.map(at).find((box) => [...taken, ...placed].every((other) => !overlaps(box, other)));
    placed.push(free ?? at(0));
  }
  return placed;
}
