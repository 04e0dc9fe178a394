import { figure, THIN_SPACE } from '#shared/format/numbers';

/** A size as people read it: 840 bytes, 12.3 kB, 4.1 MB (of a thousand each). */
export function fileSize(byteLength: number): string {
  if (byteLength < 1000) return `${byteLength}${THIN_SPACE}bytes`;
  const [value, unit] = byteLength < 1e6 ? [byteLength / 1e3, 'kB'] : [byteLength / 1e6, 'MB'];
  return `${figure(value, 3)}${THIN_SPACE}${unit}`;
}
