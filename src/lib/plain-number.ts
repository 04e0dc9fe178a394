import { fixed, THIN_SPACE } from '#shared/format/numbers';

/**
 * A number that somebody chose (a voltage, a capacity, a length) without zeros that nobody wrote: 480, 49.9,
 * 153.94. Rounded to `places`.
 */
export function plainNumber(value: number, places = 2): string {
  const text = fixed(value, places);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/** The same with its unit. */
export const plainQuantity = (value: number, unit: string, places = 2): string =>
  `${plainNumber(value, places)}${THIN_SPACE}${unit}`;
