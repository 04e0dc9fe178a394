import { scaleLinear } from 'd3-scale';
import { textWidth } from './text-width';

/** Whose turn a stretch of time was. */
export type Turn = 'draft' | 'owner' | 'applicant';

/** A stretch of a case's time; instants as milliseconds. */
export interface Stretch {
  key: string;
  turn: Turn;
  label: string;
  /** "6 of 20": working days used of the window. */
  note?: string;
  from: number;
  to: number;
}

export interface PlacedStretch {
  key: string;
  turn: Turn;
  x: number;
  width: number;
  /** The words that fit over it. */
  label: string;
  note: string;
}

export interface TimelineInput {
  stretches: readonly Stretch[];
  now: number;
  due?: { at: number; text: string } | null;
  /** First days of weeks, with how they are written. */
  weeks: readonly { at: number; text: string }[];
}

export interface TimelineLayout {
  x: (at: number) => number;
  stretches: readonly PlacedStretch[];
  /** What is left of the running window. */
  left: { x: number; width: number } | null;
  dueX: number | null;
  weeks: readonly { x: number; text: string | null }[];
}

const MARGIN = 8;
const GAP = 1.5;
const LABEL_PX = 12.5;
const NOTE_PX = 11.5;
const WEEK_TEXT_ROOM = 52;

function words(label: string, note: string | undefined, room: number): { label: string; note: string } {
  const whole = textWidth(label, LABEL_PX);
  if (note && whole + 6 + textWidth(note, NOTE_PX) <= room) return { label, note };
  return whole <= room ? { label, note: '' } : { label: '', note: '' };
}

/** Labels of weeks thin out until their dates stand clear of each other. */
function placeWeeks(weeks: TimelineInput['weeks'], x: (at: number) => number) {
  let free = -Infinity;
  return weeks.map(({ at, text }) => {
    const here = x(at);
    if (here < free) return { x: here, text: null };
    free = here + WEEK_TEXT_ROOM;
    return { x: here, text };
  });
}

/** Where each stretch, each week and the due day stand on a timeline of this width. */
export function layOutTimeline({ stretches, now, due, weeks }: TimelineInput, width: number): TimelineLayout {
  const start = Math.min(...stretches.map((s) => s.from), now);
  const end = Math.max(...stretches.map((s) => s.to), now, due?.at ?? now);
  const scale = scaleLinear([start, Math.max(end, start + 1)], [MARGIN, width - MARGIN]);
  const x = (at: number) => scale(at);
  const dueX = due ? x(due.at) : null;
  const last = stretches.at(-1);
  const leftFrom = last ? x(last.to) : MARGIN;
  const dueWords = due ? textWidth(due.text, NOTE_PX) + 16 : 0;
  return {
    x,
    stretches: stretches.map((s) => {
      const from = x(s.from);
      const to = x(s.to);
      const room = s === last && dueX !== null ? dueX - from - dueWords : to - from - 10;
      const shown = words(s.label, s.note, room);
      return { key: s.key, turn: s.turn, x: from, width: Math.max(to - from - GAP, 1), ...shown };
    }),
    left: dueX !== null && dueX > leftFrom + 4 ? { x: leftFrom, width: dueX - leftFrom } : null,
    dueX,
    weeks: placeWeeks(weeks, x),
  };
}
