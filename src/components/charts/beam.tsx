import { beamAngle } from './beam-angle';

interface BeamProps {
  /** (declared − recomputed) ÷ recomputed. */
  difference: number;
  /** Relative, as the difference. */
  tolerance: number;
}

/** The balance: a disc for the declared value, a bar for the recomputed, on a beam over its pivot. */
export function Beam({ difference, tolerance }: BeamProps) {
  return (
    <svg width={58} height={34} viewBox="0 0 58 34" aria-hidden="true">
      <path
        d="M23 32.5 29 20.5 35 32.5"
        fill="none"
        strokeWidth={1.5}
        strokeLinejoin="round"
        strokeLinecap="round"
        className="stroke-ink"
      />
      <g
        className="beam-turns"
        style={{
          transform: `rotate(${beamAngle(difference, tolerance)}deg)`,
          transformOrigin: '29px 19.5px',
        }}
      >
        <path d="M5 19.5H53" strokeWidth={1.75} strokeLinecap="round" className="stroke-ink" />
        <circle cx={11} cy={13.6} r={4.8} className="fill-copper" />
        <rect x={45} y={9} width={4.5} height={9.5} className="fill-verdigris" />
      </g>
    </svg>
  );
}
