/**
 * Places of the subconductors of a bundle about its centre, as unit steps of a regular polygon whose
 * circumscribed circle has radius 1; y upwards. Two lie level, three stand on a level base, four form an
 * upright square, five and seven have one on top, six and eight have one at the right.
 */
export function bundlePolygon(count: number): readonly (readonly [number, number])[] {
  if (count <= 1) return [[0, 0]];
  const first = count === 4 ? Math.PI / 4 : count % 2 === 1 ? Math.PI / 2 : 0;
  return Array.from({ length: count }, (_, i) => {
    const angle = first + (2 * Math.PI * i) / count;
    return [Math.cos(angle), Math.sin(angle)] as const;
  });
}

/** The two neighbours whose distance the magnifier dimensions: the pair that lies lowest and most level. */
export function spacingPair(count: number): readonly [number, number] {
  const points = bundlePolygon(count);
  const pairs = points.map((_, i) => [i, (i + 1) % count] as const);
  const weigh = ([i, j]: readonly [number, number]) => {
    const [a, b] = [points[i] ?? [0, 0], points[j] ?? [0, 0]];
    return a[1] + b[1] + 4 * Math.abs(a[1] - b[1]);
  };
  return pairs.reduce((best, pair) => (weigh(pair) < weigh(best) - 1e-9 ? pair : best));
}
