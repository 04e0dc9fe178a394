import type { PositionForm } from '../model/form-types';

/** The disc that stands for a position in the drawing: “a” or “2a” for a phase, a ring for a ground wire. */
export function PositionMark({ position, circuits }: { position: PositionForm; circuits: 1 | 2 }) {
  return (
    <svg width={18} height={18} viewBox="0 0 18 18" aria-hidden="true" className="flex-none">
      {position.kind === 'phase' ? (
        <>
          <circle cx={9} cy={9} r={8.5} className="fill-ink" />
          <text
            x={9}
            y={circuits === 2 ? 12.5 : 13}
            fontSize={circuits === 2 ? 9.5 : 11}
            fontWeight={700}
            textAnchor="middle"
            className="fill-sheet"
          >
            {circuits === 2 ? `${position.circuit}${position.phase}` : position.phase}
          </text>
        </>
      ) : (
        <circle cx={9} cy={9} r={4.4} fill="none" strokeWidth={1.75} className="stroke-ink" />
      )}
    </svg>
  );
}
