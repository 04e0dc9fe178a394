interface ProgressProps {
  /** What is being done, for screen readers. */
  label: string;
  done: number;
  total: number;
  /** Places along the way that need a look, each drawn as a stroke. */
  marks?: readonly number[];
  /** Writes a count. */
  format?: (count: number) => string;
}

const WIDTH = 400;

/** Counted work as a ruled scale that fills; what needs a look stands in it as strokes. */
export function Progress({ label, done, total, marks = [], format = String }: ProgressProps) {
  const x = (count: number) => (total > 0 ? Math.min(count / total, 1) * WIDTH : 0);
  const quarters = [0.25, 0.5, 0.75].map((q) => q * WIDTH);
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={total}
      aria-valuenow={Math.min(done, total)}
      aria-valuetext={`${format(done)} of ${format(total)}`}
    >
      <svg
        viewBox={`-1 0 ${WIDTH + 2} 26`}
        preserveAspectRatio="none"
        className="h-[26px] w-full"
        aria-hidden="true"
      >
        <rect x={0} y={1} width={x(done)} height={16} className="fill-verdigris" />
        <rect
          x={0}
          y={1}
          width={WIDTH}
          height={16}
          fill="none"
          vectorEffect="non-scaling-stroke"
          className="stroke-rule-strong"
        />
        {marks.map((at) => (
          <path
            key={at}
            d={`M${x(at)} 1V17`}
            strokeWidth={2}
            vectorEffect="non-scaling-stroke"
            className="stroke-vermilion"
          />
        ))}
        {quarters.map((at) => (
          <path key={at} d={`M${at} 17v5`} vectorEffect="non-scaling-stroke" className="stroke-rule-strong" />
        ))}
      </svg>
      <div className="flex justify-between text-axis text-ink-soft" aria-hidden="true">
        <span>{format(0)}</span>
        <span>{format(total)}</span>
      </div>
    </div>
  );
}
