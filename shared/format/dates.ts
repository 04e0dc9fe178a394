/** Dates as people read them: 4 Mar 2027, and what is left of a window in working days. */

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

interface Parts {
  day: number;
  month: number;
  year: number;
  hour: string;
  minute: string;
}

/** The clock of a place at an instant; of the reader's own place when no zone is named. */
function partsOf(instant: string | Date, timeZone?: string): Parts {
  const read: Record<string, string> = {};
  const formatter = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
  });
  for (const part of formatter.formatToParts(new Date(instant))) read[part.type] = part.value;
  return {
    day: Number(read['day']),
    month: Number(read['month']),
    year: Number(read['year']),
    hour: read['hour'] ?? '',
    minute: read['minute'] ?? '',
  };
}

/**
 * Writes the day of an instant.
 * @param instant RFC 3339 text or a Date
 * @param timeZone IANA zone; the reader's own when absent
 * @returns '4 Mar 2027'
 * @throws RangeError for what is no instant, or an unknown zone
 */
export function formatDate(instant: string | Date, timeZone?: string): string {
  const { day, month, year } = partsOf(instant, timeZone);
  return `${day} ${MONTHS[month - 1] ?? ''} ${year}`;
}

/**
 * Writes the day of an instant without its year, for where the year is plain.
 * @param instant RFC 3339 text or a Date
 * @param timeZone IANA zone; the reader's own when absent
 * @returns '4 Mar'
 * @throws RangeError for what is no instant, or an unknown zone
 */
export function formatDay(instant: string | Date, timeZone?: string): string {
  const { day, month } = partsOf(instant, timeZone);
  return `${day} ${MONTHS[month - 1] ?? ''}`;
}

/**
 * Writes the time of day of an instant.
 * @param instant RFC 3339 text or a Date
 * @param timeZone IANA zone; the reader's own when absent
 * @returns '14:06'
 * @throws RangeError for what is no instant, or an unknown zone
 */
export function formatTime(instant: string | Date, timeZone?: string): string {
  const { hour, minute } = partsOf(instant, timeZone);
  return `${hour}:${minute}`;
}

/**
 * Writes day and time of an instant.
 * @param instant RFC 3339 text or a Date
 * @param timeZone IANA zone; the reader's own when absent
 * @returns '4 Mar 2027, 14:06'
 * @throws RangeError for what is no instant, or an unknown zone
 */
export function formatInstant(instant: string | Date, timeZone?: string): string {
  return `${formatDate(instant, timeZone)}, ${formatTime(instant, timeZone)}`;
}

/**
 * Says what is left of a window.
 * @param left working days left; 0 on the due day, negative when overdue
 * @returns '3 working days left', 'due today', '2 working days over'
 */
export function leftInWords(left: number): string {
  if (left === 0) return 'due today';
  const days = Math.abs(left);
  return `${days} working ${days === 1 ? 'day' : 'days'} ${left < 0 ? 'over' : 'left'}`;
}

/**
 * Says the same in a table's column.
 * @param left working days left; 0 on the due day, negative when overdue
 * @returns '3 left', 'today', '2 over'
 */
export function leftInTable(left: number): string {
  if (left === 0) return 'today';
  return left < 0 ? `${-left} over` : `${left} left`;
}
