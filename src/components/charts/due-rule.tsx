import { useWidth } from '../../hooks/use-width';
import { GradeMark } from '../ui/grade-mark';
import type { Grade } from '../ui/grades';
import { layOutRule, type DueItem, type RuleDay, type RuleLayout } from './due-rule-layout';

interface DueRuleProps {
  /** The working days of the rule, from the oldest that still matters. */
  days: readonly RuleDay[];
  /** ISO date of today, and how it is written. */
  today: { date: string; text: string };
  items: readonly DueItem<Grade>[];
  /** What the rule shows, as a sentence. */
  label: string;
}

const BASE = 70;
const HEIGHT = 96;
const LEVEL = 15;

/** What lies before today is hatched. */
function Overdue({ from, to }: { from: number; to: number }) {
  const lines: string[] = [];
  for (let x = from - 36; x < to; x += 9) {
    const [x1, x2] = [Math.max(x, from), Math.min(x + 36, to)];
    lines.push(`M${x1} ${BASE - (x1 - x)}L${x2} ${BASE - (x2 - x)}`);
  }
  return (
    <>
      <path d={lines.join('')} strokeOpacity={0.35} className="stroke-vermilion" />
      <text x={from + 4} y={26}>
        overdue
      </text>
    </>
  );
}

function Today({ x, text, width }: { x: number; text: string; width: number }) {
  const anchor = x < 56 ? 'start' : x > width - 56 ? 'end' : 'middle';
  return (
    <>
      <path d={`M${x} 24V${BASE + 9}`} strokeWidth={1.5} className="stroke-copper" />
      <text x={x} y={16} textAnchor={anchor} className="!fill-copper font-strong">
        {text}
      </text>
    </>
  );
}

function Rule({ layout }: { layout: RuleLayout<Grade> }) {
  return (
    <>
      <path
        d={layout.days.map(({ x, weekStart }) => `M${x} ${BASE}v${weekStart ? 9 : 5}`).join('')}
        className="stroke-rule-strong"
      />
      <path d={`M${layout.start} ${BASE}H${layout.end}`} strokeWidth={1.25} className="stroke-ink" />
      {layout.days
        .filter((day) => day.weekStart)
        .map(({ x, text }) => (
          <text key={text} x={x} y={92} textAnchor="middle">
            {text}
          </text>
        ))}
    </>
  );
}

/** Working days as a rule, with each application's worst grade standing on the day it is due. */
export function DueRule({ days, today, items, label }: DueRuleProps) {
  const [box, width] = useWidth<HTMLDivElement>(700);
  const layout = layOutRule(days, today.date, items, width);
  const { todayX } = layout;
  return (
    <div ref={box} className="min-w-0">
      <svg
        width={width}
        height={HEIGHT}
        viewBox={`0 0 ${width} ${HEIGHT}`}
        role="img"
        aria-label={label}
        className="axis-text"
      >
        {todayX !== null && todayX > layout.start && <Overdue from={layout.start} to={todayX} />}
        <Rule layout={layout} />
        {todayX !== null && <Today x={todayX} text={today.text} width={width} />}
        {layout.standing.map(({ key, x, level, grade }) => (
          <g key={key} transform={`translate(${x - 7} ${BASE - 18 - level * LEVEL})`}>
            <GradeMark grade={grade} />
          </g>
        ))}
        {layout.later > 0 && (
          <text x={layout.end} y={26} textAnchor="end">
            {`${layout.later} later`}
          </text>
        )}
        {layout.more.map(({ x, count }) => (
          <text key={x} x={x} y={BASE - 37} textAnchor="middle" className="font-semibold">
            {`+${count}`}
          </text>
        ))}
      </svg>
    </div>
  );
}
