import { bundlePolygon, spacingPair } from './bundle';
import { smallLengthText, type DrawingUnit } from './drawn-position';
import type { Lens } from './structure-layout';

interface BundleLensProps {
  lens: Lens;
  unit: DrawingUnit;
  /** What hangs there, as the filing names it. */
  conductorName?: string;
}

const LONGEST_NAME = 12;

/** The bundle in a round magnifier, to its own scale, with the spacing of two neighbours. */
export function BundleLens({ lens, unit, conductorName }: BundleLensProps) {
  const { place, radius, position, lead } = lens;
  const count = position.bundleCount;
  const spread = count === 2 ? 26 : 20;
  const lift = count === 2 ? 6 : 2;
  const points = bundlePolygon(count).map(([x, y]) => [x * spread, -y * spread + lift] as const);
  const [i, j] = spacingPair(count);
  const [a, b] = [points[i] ?? [0, 0], points[j] ?? [0, 0]];
  const [from, to] = a[0] < b[0] ? [a, b] : [b, a];
  const y = Math.max(from[1], to[1]) + 13;
  const name = conductorName && conductorName.length <= LONGEST_NAME ? conductorName : 'wires';
  return (
    <g>
      {lead && <path d={`M${lead[0]} ${lead[1]}L${lead[2]} ${lead[3]}`} className="stroke-ink" />}
      <g transform={`translate(${place.x} ${place.y})`}>
        <circle r={radius} strokeWidth={1.25} className="fill-sheet stroke-ink" />
        <text y={-radius + 18} textAnchor="middle" style={{ fontSize: 11 }} className="fill-ink-soft">
          {`${count} × ${name}`}
        </text>
        {points.map(([px, py]) => (
          <circle key={`${px}:${py}`} cx={px} cy={py} r={2.6} className="fill-ink" />
        ))}
        <path
          d={`M${from[0]} ${from[1] + 5}V${y + 3}M${to[0]} ${to[1] + 5}V${y + 3}`}
          strokeWidth={0.75}
          strokeOpacity={0.6}
          className="stroke-steel"
        />
        <path d={`M${from[0]} ${y}H${to[0]}`} className="stroke-steel" />
        <path d={`M${from[0]} ${y}l6-1.8v3.6ZM${to[0]} ${y}l-6-1.8v3.6Z`} className="fill-steel" />
        <text y={y + 13} textAnchor="middle" style={{ fontSize: 11 }} className="fill-steel font-medium">
          {smallLengthText(position.bundleSpacingM, unit)}
        </text>
      </g>
    </g>
  );
}
