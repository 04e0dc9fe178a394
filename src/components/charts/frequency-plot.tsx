import { scaleLog } from 'd3-scale';
import { line } from 'd3-shape';
import { useWidth } from '../../hooks/use-width';
import { textWidth } from './text-width';
import { frequencyText, logDomain, logTicks, minorTicks } from './log-ticks';

interface Marked {
  value: number;
  /** "declared 0.0401". */
  text: string;
}

interface FrequencyPlotProps {
  title: string;
  unit: string;
  /** [Hz, value], ascending. */
  points: readonly (readonly [number, number])[];
  ratedHz: number;
  declared?: Marked | null;
  recomputed?: Marked | null;
  /** What the plot shows, as a sentence. */
  label: string;
}

const HEIGHT = 264;
const TOP = 34;
const BOTTOM = 230;
const LEFT = 48;
const RIGHT = 16;
const NEAR_PX = 18;

interface Axes {
  x: (hz: number) => number;
  y: (value: number) => number;
  left: number;
  right: number;
  hz: readonly [number, number];
  values: readonly [number, number];
}

function axesFor(props: FrequencyPlotProps, width: number): Axes {
  const right = width - RIGHT;
  const first = props.points[0]?.[0] ?? 1;
  const last = props.points.at(-1)?.[0] ?? 1e6;
  const extra = [props.declared?.value, props.recomputed?.value].filter((v) => v !== undefined);
  const values = logDomain([...props.points.map(([, v]) => v), ...extra]);
  const x = scaleLog([first, last], [LEFT, right]);
  const y = scaleLog(values, [BOTTOM, TOP]);
  return { x: (hz) => x(hz), y: (v) => y(v), left: LEFT, right, hz: [first, last], values };
}

function Grid({ axes }: { axes: Axes }) {
  const decades = logTicks(...axes.hz);
  const shown = axes.right - axes.left < 300 ? decades.filter((_, i) => i % 2 === 0) : decades;
  const rungs = logTicks(...axes.values);
  const anchor = (hz: number) => (hz === axes.hz[0] ? 'start' : hz === axes.hz[1] ? 'end' : 'middle');
  return (
    <>
      <path
        d={
          rungs.map((v) => `M${axes.left} ${axes.y(v)}H${axes.right}`).join('') +
          decades.map((hz) => `M${axes.x(hz)} ${TOP}V${BOTTOM}`).join('')
        }
        className="stroke-rule"
      />
      <path d={`M${axes.left} ${TOP}V${BOTTOM}H${axes.right}`} fill="none" className="stroke-rule-strong" />
      <path
        d={minorTicks(...axes.hz)
          .map((hz) => `M${axes.x(hz)} ${BOTTOM}v3`)
          .join('')}
        className="stroke-rule-strong"
      />
      {rungs.map((v) => (
        <text key={v} x={axes.left - 8} y={axes.y(v) + 4} textAnchor="end">
          {v}
        </text>
      ))}
      {shown.map((hz) => (
        <text key={hz} x={axes.x(hz)} y={BOTTOM + 19} textAnchor={anchor(hz)}>
          {frequencyText(hz)}
        </text>
      ))}
    </>
  );
}

/** Declared as a pointer, recomputed as a dot, both on the line of the rated frequency. */
function AtRated({
  axes,
  ratedHz,
  declared,
  recomputed,
}: { axes: Axes } & Pick<FrequencyPlotProps, 'ratedHz' | 'declared' | 'recomputed'>) {
  const x = axes.x(ratedHz);
  const yd = declared ? axes.y(declared.value) : null;
  const yr = recomputed ? axes.y(recomputed.value) : null;
  const near = yd !== null && yr !== null && Math.abs(yd - yr) < NEAR_PX;
  const leftwards = near && declared && x - 9 - textWidth(declared.text, 11) > axes.left;
  return (
    <>
      <path d={`M${x} ${TOP}V${BOTTOM}`} strokeDasharray="3 3" className="stroke-ink-soft" />
      <text x={x} y={28} textAnchor="middle" className="halo">
        {`${ratedHz}\u2009Hz`}
      </text>
      {recomputed && yr !== null && (
        <>
          <circle cx={x} cy={yr} r={3.5} className="fill-verdigris" />
          <text x={x + 9} y={yr + 17} className="halo !fill-verdigris font-semibold">
            {recomputed.text}
          </text>
        </>
      )}
      {declared && yd !== null && (
        <>
          <path d={`M${x - 5} ${yd - 9}H${x + 5}L${x} ${yd}Z`} className="fill-copper" />
          <text
            x={leftwards ? x - 9 : x + 11}
            y={near ? yd - 8 : yd - 1}
            textAnchor={leftwards ? 'end' : 'start'}
            className="halo !fill-copper font-semibold"
          >
            {declared.text}
          </text>
        </>
      )}
    </>
  );
}

/** A value against frequency, both axes logarithmic, labelled directly. */
export function FrequencyPlot(props: FrequencyPlotProps) {
  const [box, width] = useWidth<HTMLDivElement>(432);
  const axes = axesFor(props, width);
  const curve = line<readonly [number, number]>()
    .defined(([, v]) => v > 0)
    .x(([hz]) => axes.x(hz))
    .y(([, v]) => axes.y(v));
  return (
    <div ref={box} className="min-w-0">
      <p className="text-table">
        <b>{props.title}</b> <span className="text-label text-ink-soft">{props.unit}</span>
      </p>
      <svg
        width={width}
        height={HEIGHT}
        viewBox={`0 0 ${width} ${HEIGHT}`}
        role="img"
        aria-label={props.label}
        className="axis-text"
      >
        <Grid axes={axes} />
        <path
          d={curve(props.points) ?? ''}
          fill="none"
          strokeWidth={2}
          strokeLinejoin="round"
          strokeLinecap="round"
          className="stroke-verdigris"
        />
        <AtRated {...props} axes={axes} />
      </svg>
    </div>
  );
}
