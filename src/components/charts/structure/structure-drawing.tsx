import { useWidth } from '../../../hooks/use-width';
import { BundleLens } from './bundle-lens';
import { describeStructure } from './describe';
import { DimensionLine } from './dimension-line';
import { limitText, METRES, type DrawingUnit, type DrawnPosition } from './drawn-position';
import { PositionMark, SagDrop } from './position-mark';
import { layOutStructure, type StructureLayout } from './structure-layout';
import { usePositionDrag, type Moved } from './use-position-drag';

interface StructureDrawingProps {
  positions: readonly DrawnPosition[];
  unit?: DrawingUnit;
  /** The least height above ground at mid-span; its zone is shaded where it is broken. */
  clearanceM?: number | null;
  /** Conductor of the bundle, for the magnifier. */
  conductorName?: string;
  /** Given, positions can be dragged and nudged; the caller's state is the only one. */
  onMove?: (id: string, to: Moved) => void;
  onPick?: (id: string) => void;
  pickedId?: string | null;
  /** The finest step of a move. */
  stepM?: number;
  /** Greatest height in pixels. */
  tallest?: number;
}

function Ground({ layout }: { layout: StructureLayout }) {
  const { ground, frame } = layout;
  const hatch: string[] = [];
  for (let x = ground[0] + 8; x <= ground[1]; x += 9) hatch.push(`M${x} ${frame.groundY}l-7 8`);
  return (
    <>
      <path d={hatch.join('')} className="stroke-rule-strong" />
      <path d={`M${ground[0]} ${frame.groundY}H${ground[1]}`} strokeWidth={1.5} className="stroke-ink" />
    </>
  );
}

function ClearanceZone({ layout, text }: { layout: StructureLayout; text: string }) {
  if (!layout.zone) return null;
  const [left, right] = layout.ground;
  const { y, height } = layout.zone;
  return (
    <>
      <rect
        x={left}
        y={y}
        width={right - left}
        height={height}
        fillOpacity={0.09}
        className="fill-vermilion"
      />
      <path d={`M${left} ${y}H${right}`} strokeDasharray="5 3" className="stroke-vermilion" />
      <text x={left + 4} y={y - 5} style={{ fontSize: 11.5 }} className="halo fill-vermilion font-semibold">
        {text}
      </text>
    </>
  );
}

/** The structure's cross-section, to scale, from the positions that were entered and nothing else. */
export function StructureDrawing({
  positions,
  unit = METRES,
  clearanceM = null,
  conductorName,
  onMove,
  onPick,
  pickedId,
  stepM = unit.name === 'feet' ? 0.1 * unit.metres : 0.1,
  tallest = 520,
}: StructureDrawingProps) {
  const [box, width] = useWidth<HTMLDivElement>(470);
  const { keptExtent, handlersFor } = usePositionDrag({ stepM, onMove, onPick });
  const layout = layOutStructure(positions, { width, tallest, unit, clearanceM, extent: keptExtent });
  const { frame, marks, discRadius: radius, circuits, extent } = layout;
  const height = layout.height + 18;
  const clearance = clearanceM === null ? '' : `${limitText(clearanceM, unit)}, the least clearance`;
  const description = describeStructure(positions, circuits, unit, clearanceM);
  return (
    <div ref={box} className="min-w-0">
      <svg
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        className="drawing block"
        role={onMove ? 'group' : 'img'}
        aria-label={description}
      >
        <ClearanceZone layout={layout} text={clearance} />
        <Ground layout={layout} />
        <path
          d={`M${frame.centreX} 8V${frame.groundY + 14}`}
          strokeDasharray="14 4 3 4"
          className="stroke-rule-strong"
        />
        {layout.dimensions.map((dimension, i) => (
          <DimensionLine key={i} dimension={dimension} />
        ))}
        {marks.map((mark) => (
          <SagDrop key={mark.position.id} mark={mark} radius={radius} />
        ))}
        {layout.lenses.map((lens) => (
          <BundleLens key={lens.position.id} lens={lens} unit={unit} conductorName={conductorName} />
        ))}
        {marks.map((mark) => (
          <PositionMark
            key={mark.position.id}
            mark={mark}
            radius={radius}
            circuits={circuits}
            unit={unit}
            picked={mark.position.id === pickedId}
            handlers={handlersFor(mark.position, extent, frame.pixelsPerM)}
          />
        ))}
        <text
          x={width}
          y={layout.height + 12}
          textAnchor="end"
          style={{ fontSize: 11 }}
          className="fill-ink-soft"
        >
          {`dimensions in ${unit.name}`}
        </text>
      </svg>
    </div>
  );
}
