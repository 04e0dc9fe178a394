import { FACTORS } from '#shared/units/factors.generated';

const TABLES: readonly Readonly<Record<string, number>>[] = [FACTORS.length, FACTORS.perLengthImpedance];

/**
 * A number in another unit of the same kind (lengths; ohms per length). Rounded to 15 digits, so that
 * 30 ft is 9.144 m and not a digit more. Units that do not belong together give NaN, which no caller
 * can mistake for a length.
 */
export function convert(value: number, from: string, to: string): number {
  if (from === to) return value;
  const table = TABLES.find((t) => t[from] !== undefined && t[to] !== undefined);
  const factor = table?.[from];
  const divisor = table?.[to];
  if (factor === undefined || divisor === undefined) return Number.NaN;
  return Number(((value * factor) / divisor).toPrecision(15));
}
