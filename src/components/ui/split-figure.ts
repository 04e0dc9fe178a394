/**
 * A written number in two parts, for columns that align on the decimal point: what stands before the
 * point (with its sign) and the point with what follows. A number without a point is all whole part.
 */
export function splitFigure(text: string): readonly [whole: string, fraction: string] {
  const at = text.search(/[.,]/);
  return at < 0 ? [text, ''] : [text.slice(0, at), text.slice(at)];
}
