import { convert } from './convert';
import type { PositionForm } from './form-types';
import { readNumber } from './number-text';

/** Height above ground at mid-span: in the section's unit as text, and in metres. */
export function midspan(position: PositionForm): { text: string; metres: number } | null {
  const height = readNumber(position.attachmentHeightM.text);
  const sag = readNumber(position.sagM.text);
  if (height.kind !== 'number' || sag.kind === 'fault') return null;
  const left = height.value - (sag.kind === 'number' ? sag.value : 0);
  const metres = convert(left, position.attachmentHeightM.unit, 'm');
  return { text: left.toFixed(2).replace('-', '\u2212'), metres };
}
