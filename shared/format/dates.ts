/** Days and times as the product shows them: 4 Mar 2027. */
import { formatCount, NO_VALUE } from './numbers';

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;

interface DayParts {
  year: number;
  month: number;
  day: number;
}

/** A calendar day has no zone: it is shown as it stands. */
function partsOfDay(text: string): DayParts | null {
  const m = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text);
  return m ? { year: Number(m[1]), month: Number(m[2]), day: Number(m[3]) } : null;
}

/** Intl's formatters are slow to make and fast to use. */
const formatters = new Map<string, Intl.DateTimeFormat>();

function formatterFor(timeZone: string): Intl.DateTimeFormat {
  const known = formatters.get(timeZone);
  if (known) return known;
  const made = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  });
  formatters.set(timeZone, made);
  return made;
}

function partsOfInstant(instant: Date, timeZone: string): (DayParts & { clock: string }) | null {
  if (Number.isNaN(instant.getTime())) return null;
  const found = new Map(
    formatterFor(timeZone)
      .formatToParts(instant)
      .map((p) => [p.type, p.value]),
  );
  const number = (type: Intl.DateTimeFormatPartTypes) => Number(found.get(type));
  const clock = `${found.get('hour') ?? ''}:${found.get('minute') ?? ''}`;
  return { year: number('year'), month: number('month'), day: number('day'), clock };
}

const words = (p: DayParts) => `${p.day} ${MONTHS[p.month - 1] ?? ''} ${p.year}`;

/**
 * A day: `4 Mar 2027`.
 * @param when a calendar day (`2027-03-04`), or an instant (RFC 3339 text or Date)
 * @param timeZone IANA zone in which an instant's day is meant
 * @returns the day, or a dash for a text that is none
 */
export function formatDate(when: string | Date | null | undefined, timeZone = 'UTC'): string {
  if (when === null || when === undefined) return NO_VALUE;
  const day = typeof when === 'string' ? partsOfDay(when) : null;
  const parts = day ?? partsOfInstant(new Date(when), timeZone);
  return parts ? words(parts) : NO_VALUE;
}

/**
 * An instant with its time: `4 Mar 2027, 14:05`.
 * @param when RFC 3339 text or Date
 * @param timeZone IANA zone
 * @returns day and time, or a dash for a text that is none
 */
export function formatDateTime(when: string | Date | null | undefined, timeZone = 'UTC'): string {
  if (when === null || when === undefined) return NO_VALUE;
  const parts = partsOfInstant(new Date(when), timeZone);
  return parts ? `${words(parts)}, ${parts.clock}` : NO_VALUE;
}

/**
 * What is left of a window, in a sentence: `3 working days left`, `due today`, `2 working days over`.
 * @param left working days left, negative when overdue
 */
export function workingDaysLeft(left: number): string {
  if (left === 0) return 'due today';
  const count = Math.abs(left);
  const days = `${formatCount(count)} working day${count === 1 ? '' : 's'}`;
  return left > 0 ? `${days} left` : `${days} over`;
}

/** The same in a table: `3 left`, `today`, `2 over`. */
export function workingDaysShort(left: number): string {
  if (left === 0) return 'today';
  return left > 0 ? `${formatCount(left)} left` : `${formatCount(-left)} over`;
}
