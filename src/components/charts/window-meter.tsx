import { layOutMeter } from './window-meter-layout';

interface WindowMeterProps {
  /** Working days used; more than `total` is overdue. */
  used: number;
  total: number;
  /** 6.5 px a day in every table, so that windows of different length compare; 8 in a title block. */
  perDay?: number;
}

function meterLabel(used: number, total: number): string {
  const over = used - total;
  if (over > 0) return `${total} working days, ${over} over`;
  return `${used} of ${total} working days used`;
}

/** Working days of a window, used and left, as a ruled scale. */
export function WindowMeter({ used, total, perDay = 6.5 }: WindowMeterProps) {
  const layout = layOutMeter(used, total, perDay);
  const { end, over } = layout;
  const notches = layout.notches.map(({ x, tall }) => (tall ? `M${x} 6v7` : `M${x} 9v4`)).join('');
  return (
    <svg
      width={layout.width}
      height={17}
      className="meter shrink-0"
      role="img"
      aria-label={meterLabel(used, total)}
    >
      <path d={`M1 13H${end}`} className="stroke-rule-strong" />
      <path d={notches} className="stroke-rule-strong" />
      <rect
        x={1}
        y={9}
        width={layout.used}
        height={4}
        className={layout.near ? 'fill-copper' : 'fill-ink-soft'}
      />
      {over > 0 && (
        <path d={`M${end} 9h${over - 5}v-2.5l5 4.5-5 4.5v-2.5h${5 - over}Z`} className="fill-vermilion" />
      )}
      <path d={`M1 2.5V15.5M${end} 2.5V15.5`} strokeWidth={1.25} className="stroke-ink" />
    </svg>
  );
}
