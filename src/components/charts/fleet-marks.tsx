import { useWidth } from '../../hooks/use-width';

interface FleetMarksProps {
  /** Lines that the draft would flag and the bands in force do not. */
  newly: number;
  /** Lines flagged by both. */
  already: number;
  /** All lines of the fleet. */
  total: number;
  label: string;
}

const PITCH = 10.25;
const FIRST = 5.1;

/** One mark for each accepted line: filled diamonds newly flagged, hollow ones flagged already, dots the rest. */
export function FleetMarks({ newly, already, total, label }: FleetMarksProps) {
  const [box, width] = useWidth<HTMLDivElement>(328);
  const perRow = Math.max(1, Math.floor(width / PITCH));
  const place = (i: number) =>
    [FIRST + (i % perRow) * PITCH, FIRST + Math.floor(i / perRow) * PITCH] as const;
  const marks = Array.from({ length: total }, (_, i) => place(i));
  const path = (from: number, to: number, draw: (x: number, y: number) => string) =>
    marks
      .slice(from, to)
      .map(([x, y]) => draw(x, y))
      .join('');
  const diamond = (size: number) => (x: number, y: number) =>
    `M${x} ${y - size}l${size} ${size}-${size} ${size}-${size}-${size}Z`;
  const dot = (x: number, y: number) => `M${x - 1.5} ${y}a1.5 1.5 0 1 0 3 0a1.5 1.5 0 1 0-3 0`;
  const flagged = newly + already;
  const height = Math.ceil(total / perRow) * PITCH + 2;
  return (
    <div ref={box} className="min-w-0">
      <svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} role="img" aria-label={label}>
        <path d={path(0, newly, diamond(4.6))} className="fill-ochre" />
        <path d={path(newly, flagged, diamond(4))} fill="none" strokeWidth={1.5} className="stroke-ochre" />
        <path d={path(flagged, total, dot)} className="fill-rule-strong" />
      </svg>
    </div>
  );
}
