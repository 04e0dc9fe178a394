import { createHash } from 'node:crypto';
import { canonicalLineText } from '../../../shared/filing/canonical';
import type { NormalisedLine } from '../../../shared/filing/types';

export function sha256(data: string | Uint8Array): string {
  return createHash('sha256').update(data).digest('hex');
}

/**
 * What a filed line is kept under: its content in SI values, and the digits as written, since the check weighs 0.40
 * more strictly than 0.4.
 */
export function lineHash(line: NormalisedLine): string {
  const { written, assumed } = line.sheet;
  const beside = JSON.stringify([
    Object.entries(written).sort(([a], [b]) => (a < b ? -1 : 1)),
    [...assumed].sort(),
  ]);
  return sha256(`${canonicalLineText(line)}\n${beside}`);
}
