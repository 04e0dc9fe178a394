import { useMediaQuery } from '../../hooks/use-media-query';
import { useWidth } from '../../hooks/use-width';
import {
  layOutStrip,
  type DimensionLayout,
  type Place,
  type StripLayout,
  type StripValues,
} from './strip-layout';

interface StripProps {
  values: StripValues;
  /** The outer limits as written under the scale's ends. */
  endTexts: readonly [string, string];
  /** The row as a sentence. */
  label: string;
}

const TOP = 12;
const BASE = 29;
const HEIGHT = 44;
const WIDEST = 520;
const PRINTED_WIDTH = 146;

/** A triangle on its tip above the value; lying outward when the value is beyond the scale. */
function DeclaredPointer({ x, pinned }: Place) {
  const path =
    pinned === null
      ? `M${x - 5} 2.5H${x + 5}L${x} 11.5Z`
      : pinned === 'low'
        ? `M${x - 6} 7l9-5v10Z`
        : `M${x + 6} 7l-9-5v10Z`;
  return <path d={path} className="fill-copper" />;
}

function RecomputedBar({ x, pinned }: Place) {
  if (pinned === null)
    return <rect x={x - 2} y={TOP} width={4} height={BASE - TOP} className="fill-verdigris" />;
  const path = pinned === 'low' ? `M${x - 6} 20.5l9-5v10Z` : `M${x + 6} 20.5l-9-5v10Z`;
  return <path d={path} className="fill-verdigris" />;
}

function Whisker({ from, to }: { from: number; to: number }) {
  return (
    <path
      d={`M${from} 20.5H${to}M${from} 17.5v6M${to} 17.5v6`}
      fill="none"
      strokeWidth={1.5}
      className="stroke-verdigris"
    />
  );
}

const arrow = (x: number, towards: 1 | -1) => `M${x} 23.5l${-6.5 * towards}-2v4Z`;

/** The dimension line between bar and pointer, with the ratio of the two. */
function Ratio({ from, to, arrows, text, textX, anchor }: DimensionLayout) {
  const outside = arrows === 'outside';
  const line = outside ? `M${from - 11} 23.5H${from}M${to} 23.5H${to + 11}` : `M${from} 23.5H${to}`;
  return (
    <>
      <path d={line} className="stroke-ink" fill="none" />
      <path d={arrow(from, outside ? 1 : -1) + arrow(to, outside ? -1 : 1)} className="fill-ink" />
      <text
        x={textX}
        y={anchor === 'middle' ? 20.5 : 27}
        textAnchor={anchor}
        className="halo halo-thin fill-ink text-axis font-semibold"
      >
        {text}
      </text>
    </>
  );
}

function Scale({ layout }: { layout: StripLayout }) {
  const { start, end, ticks, band } = layout;
  return (
    <>
      <rect x={band[0]} y={TOP} width={band[1] - band[0]} height={BASE - TOP} className="fill-band" />
      <path d={`M${band[0]} ${TOP}V${BASE}M${band[1]} ${TOP}V${BASE}`} className="stroke-band-edge" />
      <path
        d={`M${start} ${BASE}H${end}M${start} 25v8M${end} 25v8${ticks.map((t) => `M${t} ${BASE}v3`).join('')}`}
        fill="none"
        className="stroke-rule-strong"
      />
    </>
  );
}

/**
 * Declared, recomputed and typical on the scale of the parameter and its voltage class. The scale is
 * the same for every line of the class, so that lines compare by eye; it is redrawn for its width.
 */
export function Strip({ values, endTexts, label }: StripProps) {
  const [box, width] = useWidth<HTMLDivElement>(272);
  // Paper is not measured: the column has this width on an A4 page.
  const printed = useMediaQuery('print');
  const layout = layOutStrip(values, printed ? PRINTED_WIDTH : Math.min(width, WIDEST));
  const { declared, recomputed, whisker, dimension } = layout;
  return (
    <div ref={box} className="min-w-0">
      <svg
        width={layout.end + 8}
        height={HEIGHT}
        viewBox={`0 0 ${layout.end + 8} ${HEIGHT}`}
        role="img"
        aria-label={label}
      >
        <Scale layout={layout} />
        <g className="axis-text">
          <text x={4} y={43}>
            {endTexts[0]}
          </text>
          <text x={layout.end + 4} y={43} textAnchor="end">
            {endTexts[1]}
          </text>
        </g>
        {whisker && <Whisker from={whisker[0]} to={whisker[1]} />}
        {recomputed && <RecomputedBar {...recomputed} />}
        {dimension && declared?.pinned === null && (
          <path d={`M${declared.x} ${TOP}V${BASE}`} className="stroke-copper" />
        )}
        {dimension && <Ratio {...dimension} />}
        {declared && <DeclaredPointer {...declared} />}
      </svg>
    </div>
  );
}
