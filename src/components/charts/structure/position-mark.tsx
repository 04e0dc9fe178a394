import { classNames } from '../../ui/class-names';
import { describePosition } from './describe';
import type { DrawingUnit } from './drawn-position';
import type { Mark } from './structure-layout';
import type { DragHandlers } from './use-position-drag';

interface PositionMarkProps {
  mark: Mark;
  radius: number;
  circuits: number;
  unit: DrawingUnit;
  picked?: boolean;
  handlers?: DragHandlers;
}

/** The dashed drop to the height that is left at mid-span. */
export function SagDrop({ mark, radius }: { mark: Mark; radius: number }) {
  if (mark.midY === null) return null;
  const phase = mark.position.kind === 'phase';
  const mid = phase ? Math.max(radius - 2.5, 3) : 3.2;
  const clear = mark.midY - mark.y > radius + mid;
  return (
    <>
      {clear && (
        <path
          d={`M${mark.x} ${mark.y + (phase ? radius : 5)}V${mark.midY - mid}`}
          strokeDasharray="3 3"
          className={mark.bad ? 'stroke-vermilion' : 'stroke-ink-soft'}
        />
      )}
      <circle
        cx={mark.x}
        cy={mark.midY}
        r={mid}
        strokeWidth={mark.bad ? 1.75 : 1.25}
        className={classNames('fill-sheet', mark.bad ? 'stroke-vermilion' : 'stroke-ink-soft')}
      />
    </>
  );
}

function Disc({ mark, radius, circuits }: Pick<PositionMarkProps, 'mark' | 'radius' | 'circuits'>) {
  const { position, bad } = mark;
  if (position.kind === 'ground-wire')
    return (
      <circle
        r={5}
        strokeWidth={1.75}
        className={classNames('fill-sheet', bad ? 'stroke-vermilion' : 'stroke-ink')}
      />
    );
  const letter = circuits > 1 ? `${position.circuit}${position.label}` : position.label;
  const fits = radius >= (letter.length > 1 ? 8 : 7);
  return (
    <>
      <circle r={radius} className={bad ? 'fill-vermilion' : 'fill-ink'} />
      <text
        aria-hidden="true"
        x={fits ? 0 : radius + 3}
        y={fits ? 3.8 : 4}
        textAnchor={fits ? 'middle' : 'start'}
        style={{ fontSize: letter.length > 1 && fits ? 9.5 : 11 }}
        className={classNames('font-bold', fits ? 'fill-sheet' : 'halo fill-ink')}
      >
        {letter}
      </text>
    </>
  );
}

/** A disc at its place. With handlers it can be dragged, and moved by the arrow keys once it has the focus. */
export function PositionMark({ mark, radius, circuits, unit, picked, handlers }: PositionMarkProps) {
  const reach = radius + 5;
  const pick = (
    <rect
      x={-reach}
      y={-reach}
      width={2 * reach}
      height={2 * reach}
      fill="none"
      strokeWidth={2}
      className={classNames('pick', picked && 'stroke-copper')}
    />
  );
  const at = `translate(${mark.x} ${mark.y})`;
  if (!handlers)
    return (
      <g transform={at}>
        {picked && pick}
        <Disc mark={mark} radius={radius} circuits={circuits} />
      </g>
    );
  return (
    <g
      transform={at}
      className="drag-handle"
      role="button"
      tabIndex={0}
      aria-label={`${describePosition(mark.position, circuits, unit)}. Move it with the arrow keys.`}
      {...handlers}
    >
      {/* A hand needs more to hold than the disc. */}
      <circle r={Math.max(reach, 16)} fill="transparent" />
      {pick}
      <Disc mark={mark} radius={radius} circuits={circuits} />
    </g>
  );
}
