/**
 * The mark: a level beam on a pivot in three strokes, and on it two conductors of unequal diameter
 * in true balance. The pivot stands nearer the larger: diameter² × arm is equal on both sides
 * (12² × 14 = 8² × 31.5, to the drawing's scale). Screen, tab icon and PDF draw it from here.
 */

/** Size of the box that the mark is drawn in, in its own units. */
export const MARK_BOX = { width: 44, height: 30 } as const;

/** The three strokes as SVG path data, drawn in ink with round ends. */
export const MARK_STROKES = ['M2.5 16.5H41.7', 'M17.4 17.4 11.4 28.4', 'M17.4 17.4 23.4 28.4'] as const;

/** Width of the strokes, in the box's units. */
export const MARK_STROKE_WIDTH = 2.2;

/** The two conductors: the larger in copper at the left, the smaller in verdigris at the right. */
export const MARK_DISCS = [
  { x: 8.6, y: 9.3, radius: 6, colour: 'copper' },
  { x: 37.2, y: 11.3, radius: 4, colour: 'verdigris' },
] as const;

/**
 * The mark as a file of its own, for places where no style sheet reaches.
 * @param colour gives the value of a colour token
 * @returns an SVG document
 */
export function markSvg(colour: (token: 'ink' | 'copper' | 'verdigris') => string): string {
  const strokes = MARK_STROKES.map((d) => `<path d="${d}"/>`).join('');
  const discs = MARK_DISCS.map(
    (c) => `<circle cx="${c.x}" cy="${c.y}" r="${c.radius}" fill="${colour(c.colour)}"/>`,
  ).join('');
  return (
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${MARK_BOX.width} ${MARK_BOX.height}">` +
    `<g fill="none" stroke="${colour('ink')}" stroke-width="${MARK_STROKE_WIDTH}" stroke-linecap="round">${strokes}</g>` +
    `${discs}</svg>`
  );
}
