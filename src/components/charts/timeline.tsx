import { useWidth } from '../../hooks/use-width';
import { layOutTimeline, type TimelineInput, type TimelineLayout, type Turn } from './timeline-layout';

/** One event as a line of the list that takes the drawing's place on narrow screens. */
export interface TimelineEntry {
  key: string;
  date: string;
  what: string;
  detail?: string;
  /** The running stretch, or what comes next. */
  mark?: 'now' | 'next';
}

interface TimelineProps extends TimelineInput {
  revisions: readonly { letter: string; at: number; current: boolean }[];
  /** The same events in words. */
  entries: readonly TimelineEntry[];
}

const TURN_FILL: Record<Turn, string> = {
  draft: 'fill-rule',
  owner: 'fill-steel',
  applicant: 'fill-copper',
};
const LEAST_WIDTH = 560;
const BASE = 70.5;

function EntryList({ entries }: { entries: readonly TimelineEntry[] }) {
  return (
    <ol className="text-control">
      {entries.map(({ key, date, what, detail, mark }) => (
        <li
          key={key}
          className="grid grid-cols-[72px_minmax(0,1fr)] gap-x-3 border-t border-rule py-2 first:border-t-0"
        >
          <span className="text-ink-soft">{date}</span>
          <span className={mark ? 'font-semibold text-copper' : 'font-semibold'}>{what}</span>
          {detail && <span className="col-start-2 text-label text-ink-soft">{detail}</span>}
        </li>
      ))}
    </ol>
  );
}

function Weeks({ layout, width }: { layout: TimelineLayout; width: number }) {
  return (
    <g className="axis-text">
      <path
        d={layout.weeks.map(({ x, text }) => `M${x} ${BASE + 0.5}v${text ? 7 : 4}`).join('')}
        className="stroke-rule-strong"
      />
      <path d={`M8 ${BASE}H${width - 8}`} strokeWidth={1.25} className="stroke-ink" />
      {layout.weeks.map(
        ({ x, text }) =>
          text && (
            <text key={text} x={x} y={93} textAnchor={x < 30 ? 'start' : x > width - 30 ? 'end' : 'middle'}>
              {text}
            </text>
          ),
      )}
    </g>
  );
}

function Stretches({ layout }: { layout: TimelineLayout }) {
  return (
    <>
      {layout.stretches.map(({ key, turn, x, width, label, note }) => (
        <g key={key}>
          <rect x={x} y={58} width={width} height={12} className={TURN_FILL[turn]} />
          <text x={x + 5} y={49} style={{ fontSize: 12.5 }} className="fill-ink font-semibold">
            {label}
            {note && (
              <tspan dx={5} style={{ fontSize: 11.5 }} className="fill-ink-soft font-normal">
                {note}
              </tspan>
            )}
          </text>
        </g>
      ))}
      {layout.left && (
        <rect
          x={layout.left.x}
          y={58.6}
          width={layout.left.width}
          height={10.8}
          fill="none"
          strokeWidth={1.25}
          strokeDasharray="3 3"
          className="stroke-copper"
        />
      )}
    </>
  );
}

function RevisionAt({ x, letter, current }: { x: number; letter: string; current: boolean }) {
  return (
    <g transform={`translate(${x} 0)`}>
      <path d="M0 25V70" className="stroke-rule-strong" />
      <path
        d="M0 5.2 11 24.6H-11Z"
        fill="none"
        strokeWidth={1.4}
        strokeLinejoin="round"
        className={current ? 'stroke-ink' : 'stroke-rule-strong'}
      />
      <text
        y={21.6}
        textAnchor="middle"
        style={{ fontSize: 11 }}
        className={current ? 'fill-ink font-bold' : 'fill-ink-soft font-semibold'}
      >
        {letter}
      </text>
    </g>
  );
}

/** A case's time so far: whose turn it was, for how long, what was filed, what is due. */
export function Timeline({ revisions, entries, ...input }: TimelineProps) {
  const [box, width] = useWidth<HTMLDivElement>(1230);
  const drawn = width >= LEAST_WIDTH && input.stretches.length > 0;
  const layout = drawn ? layOutTimeline(input, width) : null;
  return (
    <div ref={box} className="min-w-0">
      {layout ? (
        <>
          <svg width={width} height={98} viewBox={`0 0 ${width} 98`} aria-hidden="true">
            <Weeks layout={layout} width={width} />
            <Stretches layout={layout} />
            {layout.dueX !== null && input.due && (
              <>
                <path d={`M${layout.dueX} 36V78`} strokeWidth={1.5} className="stroke-copper" />
                <text
                  x={layout.dueX - 6}
                  y={44}
                  textAnchor="end"
                  style={{ fontSize: 11.5 }}
                  className="fill-copper font-strong"
                >
                  {input.due.text}
                </text>
              </>
            )}
            {revisions.map(({ letter, at, current }) => (
              <RevisionAt key={letter} x={layout.x(at)} letter={letter} current={current} />
            ))}
          </svg>
          <div className="sr-only">
            <EntryList entries={entries} />
          </div>
        </>
      ) : (
        <EntryList entries={entries} />
      )}
    </div>
  );
}
