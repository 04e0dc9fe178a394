import type { Letter } from '#shared/contracts/api.generated';

/** Kinds of letters as people call them. */
export const KIND_WORDS: Readonly<Record<Letter['kind'], string>> = {
  receipt: 'Receipt',
  return: 'Discrepancy letter',
  decision: 'Decision',
  notice: 'Notice',
};

/** "D-2 and D-3". */
export function discrepancyWords(numbers: readonly number[]): string {
  const names = numbers.map((n) => `D-${n}`);
  return names.length < 2 ? names.join('') : `${names.slice(0, -1).join(', ')} and ${names.at(-1) ?? ''}`;
}

/** The size of a file, as people read it. */
export function sizeWords(bytes: number): string {
  return bytes < 1000 * 1000 ? `${Math.ceil(bytes / 1000)} kB` : `${(bytes / 1e6).toFixed(1)} MB`;
}
