import { scaleLinear } from 'd3-scale';
import { textWidth } from './text-width';

/** The values of one strip, all in the parameter's own unit. */
export interface StripValues {
  /** The outer limits of the class: the ends of the scale. */
  outer: readonly [number, number];
  typical: readonly [number, number];
  declared: number | null;
  recomputed: number | null;
  /** Where the recomputed value may plausibly lie. */
  range?: readonly [number, number] | null;
  /** Declared and recomputed part by more than the tolerance. */
  outOfTolerance: boolean;
}

/** A value's place: within the scale, or pinned to the end beyond which it lies. */
export interface Place {
  x: number;
  pinned: 'low' | 'high' | null;
}

export interface DimensionLayout {
  from: number;
  to: number;
  /** Arrowheads stand inside the two lines and point outwards, or outside and point inwards. */
  arrows: 'inside' | 'outside';
  text: string;
  textX: number;
  anchor: 'start' | 'middle' | 'end';
}

export interface StripLayout {
  start: number;
  end: number;
  band: readonly [number, number];
  ticks: readonly number[];
  declared: Place | null;
  recomputed: Place | null;
  whisker: readonly [number, number] | null;
  dimension: DimensionLayout | null;
}

const MARGIN = 8;
const BAR_HALF = 2;
const LEAST_WHISKER = 5;
const TICK_CLEAR_OF_END = 4;
const LABEL_SIZE = 11;
const ARROW = 6.5;

/** Three significant digits with the sign of multiplication: "× 1.61". */
export function ratioText(ratio: number): string {
  if (ratio >= 1000) return `× ${ratio.toExponential(1).replace('e+', 'e')}`;
  return `× ${ratio.toPrecision(3)}`;
}

function place(value: number | null, x: (v: number) => number, [low, high]: readonly [number, number]) {
  if (value === null || !Number.isFinite(value)) return null;
  if (value < low) return { x: x(low), pinned: 'low' } as const;
  if (value > high) return { x: x(high), pinned: 'high' } as const;
  return { x: x(value), pinned: null };
}

/** Between the two where the words fit; else beside them, on the side with more room. */
function dimensionOf(bar: Place, pointer: Place, text: string, width: number): DimensionLayout | null {
  const rightwards = pointer.x >= bar.x;
  const edge = bar.x + (rightwards ? BAR_HALF : -BAR_HALF);
  const [from, to] = rightwards ? [edge, pointer.x] : [pointer.x, edge];
  const gap = to - from;
  const words = textWidth(text, LABEL_SIZE);
  if (gap >= words + 4) return { from, to, arrows: 'inside', text, textX: (from + to) / 2, anchor: 'middle' };
  const arrows = gap >= 2 * ARROW + 4 ? 'inside' : 'outside';
  const reach = arrows === 'outside' ? ARROW + 6 : 5;
  const roomRight = width - MARGIN / 2 - (to + reach);
  return roomRight >= words
    ? { from, to, arrows, text, textX: to + reach, anchor: 'start' }
    : { from, to, arrows, text, textX: from - reach, anchor: 'end' };
}

/** Where everything on a strip of this width stands. */
export function layOutStrip(values: StripValues, width: number): StripLayout {
  const start = MARGIN;
  const end = width - MARGIN;
  const scale = scaleLinear(values.outer, [start, end]);
  const x = (v: number) => scale(v);
  const clamp = (v: number) => Math.min(Math.max(x(v), start), end);
  const declared = place(values.declared, x, values.outer);
  const recomputed = place(values.recomputed, x, values.outer);
  const range = values.range;
  const whisker = range && recomputed?.pinned === null ? ([clamp(range[0]), clamp(range[1])] as const) : null;
  const ratio = values.declared !== null && values.recomputed ? values.declared / values.recomputed : NaN;
  const shown = values.outOfTolerance && declared && recomputed && Number.isFinite(ratio) && ratio > 0;
  return {
    start,
    end,
    band: [clamp(values.typical[0]), clamp(values.typical[1])],
    ticks: scale
      .ticks(5)
      .map(x)
      .filter((t) => t > start + TICK_CLEAR_OF_END && t < end - TICK_CLEAR_OF_END),
    declared,
    recomputed,
    whisker: whisker && whisker[1] - whisker[0] >= LEAST_WHISKER ? whisker : null,
    dimension: shown ? dimensionOf(recomputed, declared, ratioText(ratio), width) : null,
  };
}
