const NARROW = new Set(".,:;|'’!il\u2009\u202F ");

/**
 * About how wide a short label of figures stands, in pixels: drawings must place labels before the
 * browser has set them. Tabular figures of Public Sans are 0.62 em wide; the estimate errs to the wide side.
 */
export function textWidth(text: string, fontSizePx: number): number {
  let ems = 0;
  for (const sign of text) ems += NARROW.has(sign) ? 0.32 : 0.63;
  return ems * fontSizePx;
}
