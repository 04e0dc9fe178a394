import { quantity } from '#shared/format/numbers';

/** A place where wires hang, as the drawing needs it. Metres; horizontal from the centre line, to the right. */
export interface DrawnPosition {
  id: string;
  kind: 'phase' | 'ground-wire';
  /** The letter in the disc: a, b, c. Of ground wires their number, for their name only. */
  label: string;
  /** Numbered from 1; of ground wires meaningless. */
  circuit: number;
  horizontalM: number;
  attachmentHeightM: number;
  sagM: number;
  bundleCount: number;
  bundleSpacingM: number;
  /** Is itself at fault (below the least clearance is found by the drawing). */
  bad?: boolean;
}

/** What lengths are written in. */
export interface DrawingUnit {
  name: 'metres' | 'feet';
  /** Metres of one unit. */
  metres: number;
  /** The unit of small lengths (bundle spacings) and its metres. */
  small: { symbol: 'mm' | 'in'; metres: number; digits: number };
}

export const METRES: DrawingUnit = {
  name: 'metres',
  metres: 1,
  small: { symbol: 'mm', metres: 0.001, digits: 0 },
};

export const FEET: DrawingUnit = {
  name: 'feet',
  metres: 0.3048,
  small: { symbol: 'in', metres: 0.0254, digits: 1 },
};

const MINUS = '\u2212';

/** A length in the drawing's unit, two digits, with a true minus sign. */
export function lengthText(lengthM: number, unit: DrawingUnit): string {
  const text = (lengthM / unit.metres).toFixed(2);
  return Number(text) < 0 ? text.replace('-', MINUS) : text.replace('-', '');
}

/** A bundle spacing with its unit. */
export function smallLengthText(lengthM: number, { small }: DrawingUnit): string {
  return `${(lengthM / small.metres).toFixed(small.digits)}\u2009${small.symbol}`;
}

/** A limit with its unit, in three significant digits: it was not measured to the centimetre. */
export function limitText(lengthM: number, unit: DrawingUnit): string {
  return quantity(lengthM / unit.metres, unit.name === 'feet' ? 'ft' : 'm');
}

/** Height left at mid-span. */
export function midSpanM(position: DrawnPosition): number {
  return position.attachmentHeightM - position.sagM;
}

/** Positions whose figures are numbers; the others wait until the form is complete. */
export function drawable(positions: readonly DrawnPosition[]): DrawnPosition[] {
  return positions.filter((p) =>
    [p.horizontalM, p.attachmentHeightM, p.sagM].every((value) => Number.isFinite(value)),
  );
}

/** Whether a position leaves less than the least clearance at mid-span. */
export function isTooLow(position: DrawnPosition, clearanceM: number | null): boolean {
  return clearanceM !== null && position.kind === 'phase' && midSpanM(position) < clearanceM;
}
