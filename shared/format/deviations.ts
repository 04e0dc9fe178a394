/** How far a declared value is from the recomputed one, in words; `signedPercent` of numbers.ts gives it as a figure. */
import { figure } from './numbers';

/**
 * A deviation in words: `61 % above`, `3.2 % below`, `equal to`.
 * @param deviation declared ÷ recomputed − 1
 */
export function deviationWords(deviation: number): string {
  const percent = Math.abs(deviation) * 100;
  // Whole above ten, one decimal above one, else two: more digits would claim more than the comparison knows.
  const text = percent.toFixed(percent >= 9.95 ? 0 : percent >= 0.995 ? 1 : 2);
  if (Number(text) === 0) return 'equal to';
  return `${text}\u2009% ${deviation > 0 ? 'above' : 'below'}`;
}

/**
 * The ratio of two values as a dimension line carries it: `× 1.61`.
 * @param declared declared value
 * @param recomputed recomputed value in the same unit
 * @returns nothing when there is no finite ratio
 */
export function ratioText(declared: number, recomputed: number): string {
  const ratio = declared / recomputed;
  return Number.isFinite(ratio) ? `×\u2009${figure(ratio, 3)}` : '';
}

/** A unit of the filing format as people write it: `ohm/km` → `Ω/km`, `uS/km` → `µS/km`. Others stay as they are. */
export function unitForPeople(unit: string): string {
  return unit.replace(/^ohm/, 'Ω').replace(/^u(?=[SF])/, 'µ');
}
