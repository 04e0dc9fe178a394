/** SHA-256 of what a filing says: the canonical JSON of its values in SI. */
import { createHash } from 'node:crypto';
import { canonicalFilingText, canonicalLineText } from '../../shared/filing/canonical';
import type { NormalisedFiling, NormalisedLine } from '../../shared/filing/types';

const sha256 = (text: string) => createHash('sha256').update(text, 'utf8').digest('hex');

/** Content hash of a filing, in hexadecimal. */
export function filingHash(filing: NormalisedFiling): string {
  return sha256(canonicalFilingText(filing));
}

/** Content hash of one line, in hexadecimal. */
export function lineHash(line: NormalisedLine): string {
  return sha256(canonicalLineText(line));
}
