import { useRef, useState, type FocusEvent, type KeyboardEvent, type PointerEvent } from 'react';
import type { DrawnPosition } from './drawn-position';
import type { Extent } from './frame';

export interface Moved {
  horizontalM: number;
  attachmentHeightM: number;
}

export interface DragHandlers {
  onPointerDown: (event: PointerEvent<SVGGElement>) => void;
  onPointerMove: (event: PointerEvent<SVGGElement>) => void;
  onPointerUp: (event: PointerEvent<SVGGElement>) => void;
  onPointerCancel: (event: PointerEvent<SVGGElement>) => void;
  onKeyDown: (event: KeyboardEvent<SVGGElement>) => void;
  onFocus: (event: FocusEvent<SVGGElement>) => void;
}

interface Held {
  id: string;
  pointerX: number;
  pointerY: number;
  start: Moved;
  pixelsPerM: number;
}

const STEPS: Readonly<Record<string, readonly [across: number, up: number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};
const COARSE = 10;

/** To the nearest step, without the dust of binary fractions. */
export function snap(lengthM: number, stepM: number): number {
  return Number((Math.round(lengthM / stepM) * stepM).toFixed(6));
}

/** Where an arrow key moves a position: one step, ten with Shift, never below ground. */
export function nudged(position: Moved, key: string, coarse: boolean, stepM: number): Moved | null {
  const step = STEPS[key];
  if (!step) return null;
  const length = stepM * (coarse ? COARSE : 1);
  return {
    horizontalM: snap(position.horizontalM + step[0] * length, stepM),
    attachmentHeightM: Math.max(stepM, snap(position.attachmentHeightM + step[1] * length, stepM)),
  };
}

interface DragOptions {
  stepM: number;
  onMove: ((id: string, to: Moved) => void) | undefined;
  onPick: ((id: string) => void) | undefined;
}

/** Dragging and nudging of positions. While one is held, the drawing's extent is kept as it was. */
export function usePositionDrag({ stepM, onMove, onPick }: DragOptions) {
  const held = useRef<Held | null>(null);
  const [keptExtent, setKeptExtent] = useState<Extent>();

  const letGo = () => {
    held.current = null;
    setKeptExtent(undefined);
  };

  const drag = (event: PointerEvent<SVGGElement>) => {
    const grip = held.current;
    if (!grip || !onMove) return;
    const across = (event.clientX - grip.pointerX) / grip.pixelsPerM;
    const up = (grip.pointerY - event.clientY) / grip.pixelsPerM;
    onMove(grip.id, {
      horizontalM: snap(grip.start.horizontalM + across, stepM),
      attachmentHeightM: Math.max(stepM, snap(grip.start.attachmentHeightM + up, stepM)),
    });
  };

  const handlersFor = (
    position: DrawnPosition,
    extent: Extent,
    pixelsPerM: number,
  ): DragHandlers | undefined => {
    if (!onMove) return undefined;
    return {
      onPointerDown: (event) => {
        event.currentTarget.setPointerCapture(event.pointerId);
        const { id, horizontalM, attachmentHeightM } = position;
        const start = { horizontalM, attachmentHeightM };
        held.current = { id, pointerX: event.clientX, pointerY: event.clientY, start, pixelsPerM };
        setKeptExtent(extent);
        onPick?.(id);
      },
      onPointerMove: drag,
      onPointerUp: letGo,
      onPointerCancel: letGo,
      onFocus: () => onPick?.(position.id),
      onKeyDown: (event) => {
        const to = nudged(position, event.key, event.shiftKey, stepM);
        if (!to) return;
        event.preventDefault();
        onMove(position.id, to);
      },
    };
  };

  return { keptExtent, handlersFor };
}
