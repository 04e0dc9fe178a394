/** How far a declared value is from the recomputed one, as the product says it. */
import { formatNumber, MINUS, NO_VALUE, THIN_SPACE } from './numbers';

/** Digits that a percentage is worth: whole above ten, one decimal above one, else two. */
function percentDigits(percent: number): string {
  const size = Math.abs(percent);
  return size.toFixed(size >= 9.95 ? 0 : size >= 0.995 ? 1 : 2);
}

/**
 * A share in per cent: `0.0151` → `1.5 %`.
 * @param fraction share, 1 = 100 %
 */
export function formatPercent(fraction: number | null | undefined): string {
  if (fraction === null || fraction === undefined || !Number.isFinite(fraction)) return NO_VALUE;
  const text = percentDigits(fraction * 100);
  const sign = fraction < 0 && Number(text) !== 0 ? MINUS : '';
  return `${sign}${text}${THIN_SPACE}%`;
}

/**
 * A deviation with its sign: `+61 %`, `−3.2 %`.
 * @param deviation declared ÷ recomputed − 1
 */
export function formatDeviation(deviation: number | null | undefined): string {
  const text = formatPercent(deviation);
  const positive = typeof deviation === 'number' && deviation > 0 && /[1-9]/.test(text);
  return positive ? `+${text}` : text;
}

/**
 * A deviation in words: `61 % above`, `3.2 % below`, `equal to`.
 * @param deviation declared ÷ recomputed − 1
 */
export function deviationWords(deviation: number): string {
  const text = formatPercent(Math.abs(deviation));
  if (!/[1-9]/.test(text)) return 'equal to';
  return `${text} ${deviation > 0 ? 'above' : 'below'}`;
}

/**
 * The ratio of two values as a dimension line carries it: `× 1.61`.
 * @param declared declared value
 * @param recomputed recomputed value in the same unit
 */
export function formatRatio(declared: number, recomputed: number): string {
  const ratio = declared / recomputed;
  return Number.isFinite(ratio) ? `×${THIN_SPACE}${formatNumber(ratio, 3)}` : NO_VALUE;
}
