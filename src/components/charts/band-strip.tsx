import { scaleLinear } from 'd3-scale';
import { useWidth } from '../../hooks/use-width';
import { binValues, rootHeights } from './histogram';

interface BandStripProps {
  outer: readonly [number, number];
  /** Typical limits of the draft. */
  typical: readonly [number, number];
  /** Typical limits in force, dotted where they differ. */
  inForce?: readonly [number, number] | null;
  /** Values of the accepted fleet. */
  values: readonly number[];
  /** "X1 of 412 accepted lines, band 0.33 to 0.52 Ω/km; 16 outside". */
  label: string;
}

const BASE = 28;
const TOP = 4;
const TALLEST = 20;
const BAR_PITCH = 5.4;

/** A band over the fleet that it judges: what falls outside is ochre. */
export function BandStrip({ outer, typical, inForce, values, label }: BandStripProps) {
  const [box, width] = useWidth<HTMLDivElement>(308);
  const scale = scaleLinear(outer, [4, width - 4]).clamp(true);
  const x = (value: number) => scale(value);
  const bins = binValues(values, outer, Math.max(8, Math.floor((width - 8) / BAR_PITCH)));
  const heights = rootHeights(bins);
  const [low, high] = [x(typical[0]), x(typical[1])];
  const moved = (inForce ?? []).filter((limit, i) => limit !== typical[i]);
  return (
    <div ref={box} className="min-w-0">
      <svg width={width} height={36} viewBox={`0 0 ${width} 36`} role="img" aria-label={label}>
        <rect x={low} y={TOP} width={Math.max(high - low, 0)} height={BASE - TOP} className="fill-band" />
        {bins.map((bin, i) => {
          const middle = (bin.from + bin.to) / 2;
          const inside = middle >= typical[0] && middle <= typical[1];
          const height = bin.count > 0 ? Math.max((heights[i] ?? 0) * TALLEST, 2) : 0;
          return (
            <rect
              key={bin.from}
              x={x(bin.from) + 0.6}
              y={BASE - height}
              width={Math.max(x(bin.to) - x(bin.from) - 1.2, 1)}
              height={height}
              className={inside ? 'fill-steel' : 'fill-ochre'}
            />
          );
        })}
        <path d={`M4 ${BASE}H${width - 4}`} className="stroke-rule-strong" />
        {moved.map((limit) => (
          <path
            key={limit}
            d={`M${x(limit)} ${TOP}V${BASE}`}
            strokeDasharray="2 2"
            className="stroke-rule-strong"
          />
        ))}
        <path d={`M${low} 2V31M${high} 2V31`} strokeWidth={1.25} className="stroke-ink" />
        <path d={`M${low} ${BASE + 2}l3.5 6h-7ZM${high} ${BASE + 2}l3.5 6h-7Z`} className="fill-ink" />
      </svg>
    </div>
  );
}
