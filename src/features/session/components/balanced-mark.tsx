import { useWidth } from '../../../hooks/use-width';
import { layOutMark } from '../model/balanced-mark';
import type { MarkDrawing } from '../model/balanced-mark';

const FILLS = { copper: 'fill-copper', verdigris: 'fill-verdigris' } as const;

/** A dimension line with its figure in a gap, arrowheads at both ends. */
function Dimension({ from, to, y, text }: { from: number; to: number; y: number; text: string }) {
  const middle = (from + to) / 2;
  const gap = text.length * 3.6 + 6;
  const head = (x: number, way: 1 | -1) => `M${x} ${y}l${7 * way}-1.9v3.8Z`;
  return (
    <>
      <path
        d={`M${from} ${y}H${middle - gap}M${middle + gap} ${y}H${to}`}
        className="stroke-steel"
        strokeWidth={1}
      />
      <path d={head(from, 1) + head(to, -1)} className="fill-steel" />
      <text
        x={middle}
        y={y + 4}
        textAnchor="middle"
        style={{ fontSize: 13 }}
        className="fill-steel font-semibold"
      >
        {text}
      </text>
    </>
  );
}

function Ground({ mark }: { mark: MarkDrawing }) {
  const marks: string[] = [];
  for (let x = 32; x <= mark.width - 24; x += 9) marks.push(`M${x} ${mark.groundY}l-7 8`);
  return (
    <>
      <path d={marks.join('')} className="stroke-rule-strong" />
      <path d={`M24 ${mark.groundY}H${mark.width - 24}`} strokeWidth={1.5} className="stroke-ink" />
      <path
        d={`M${mark.pivotX} 40V${mark.groundY + 16}`}
        strokeDasharray="14 4 3 4"
        className="stroke-rule-strong"
      />
    </>
  );
}

function Discs({ mark }: { mark: MarkDrawing }) {
  return mark.discs.map(({ x, radius, colour, text }) => {
    const top = mark.beamY - 2 * radius;
    return (
      <g key={colour}>
        <path
          d={`M${x - radius} ${mark.beamY - radius}V${top - 24}M${x + radius} ${mark.beamY - radius}V${top - 24}`}
          className="stroke-rule-strong"
        />
        <circle cx={x} cy={mark.beamY - radius - 1} r={radius} className={FILLS[colour]} />
        <path d={`M${x - radius} ${top - 18}H${x + radius}`} className="stroke-steel" />
        <path
          d={`M${x - radius} ${top - 18}l7-1.9v3.8ZM${x + radius} ${top - 18}l-7-1.9v3.8Z`}
          className="fill-steel"
        />
        <text
          x={x}
          y={top - 27}
          textAnchor="middle"
          style={{ fontSize: 13 }}
          className="fill-steel font-semibold"
        >
          {text}
        </text>
      </g>
    );
  });
}

/** The mark with its dimensions: what the product's name means. */
export function BalancedMark() {
  const [box, width] = useWidth<HTMLDivElement>(640);
  const mark = layOutMark(Math.max(width, 280));
  return (
    <div ref={box} className="w-full min-w-0">
      <svg
        width={mark.width}
        height={mark.height}
        className="drawing block max-w-full"
        role="img"
        aria-label="Two conductors of unequal diameter in balance on a beam: 12.0 squared times 14.0 equals 8.0 squared times 31.5"
      >
        <Ground mark={mark} />
        <Discs mark={mark} />
        <path
          d={`M${mark.beam[0]} ${mark.beamY}H${mark.beam[1]}M${mark.pivotX - mark.legs} ${mark.groundY - 1}L${mark.pivotX} ${mark.beamY + 2}L${mark.pivotX + mark.legs} ${mark.groundY - 1}`}
          fill="none"
          strokeWidth={2.4}
          strokeLinecap="round"
          strokeLinejoin="round"
          className="stroke-ink"
        />
        {mark.arms.map((arm) => (
          <Dimension key={arm.text} {...arm} y={mark.beamY + 40} />
        ))}
        <text
          x={mark.width / 2}
          y={mark.height - 14}
          textAnchor="middle"
          style={{ fontSize: 13 }}
          className="fill-ink font-semibold"
        >
          {mark.sum}
        </text>
      </svg>
    </div>
  );
}
