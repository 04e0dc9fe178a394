import { MARK_BOX, MARK_DISCS, MARK_STROKES, MARK_STROKE_WIDTH } from '#shared/format/mark';

const FILLS = { copper: 'fill-copper', verdigris: 'fill-verdigris' } as const;

/** The mark: two unequal conductors in balance on a beam. */
export function Mark() {
  return (
    <svg viewBox={`0 0 ${MARK_BOX.width} ${MARK_BOX.height}`} aria-hidden="true">
      <g fill="none" stroke="currentColor" strokeWidth={MARK_STROKE_WIDTH} strokeLinecap="round">
        {MARK_STROKES.map((d) => (
          <path key={d} d={d} />
        ))}
      </g>
      {MARK_DISCS.map((disc) => (
        <circle key={disc.colour} cx={disc.x} cy={disc.y} r={disc.radius} className={FILLS[disc.colour]} />
      ))}
    </svg>
  );
}

/** Mark and wordmark. */
export function Brand({ large = false }: { large?: boolean }) {
  return (
    <span className={large ? 'brand brand-large' : 'brand'}>
      <Mark />
      <span>counterpoise</span>
    </span>
  );
}
