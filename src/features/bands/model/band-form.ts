import { PARAMETER_WORDS, BAND_PARAMETERS } from '#shared/checks/parameters';
import type { Band } from '#shared/contracts/api.generated';

/** The four limits of a parameter in the order in which they lie on its scale. */
export const LIMITS = ['outerLow', 'typicalLow', 'typicalHigh', 'outerHigh'] as const;
export type Limit = (typeof LIMITS)[number];

export const LIMIT_WORDS: Readonly<Record<Limit, string>> = {
  outerLow: 'outer lower limit',
  typicalLow: 'lower bound',
  typicalHigh: 'upper bound',
  outerHigh: 'outer upper limit',
};

/** What has been typed of a band and not saved yet; what is left out stands as in the draft. */
export type BandEdit = Partial<Record<Limit | 'source', string>>;

export type BandEdits = Readonly<Record<string, BandEdit>>;

/** One name for a band over classes, frequencies and parameters. */
export const bandKey = ({
  classKv,
  frequencyHz,
  parameter,
}: Pick<Band, 'classKv' | 'frequencyHz' | 'parameter'>) => `${classKv}/${frequencyHz}/${parameter}`;

/** Shares of light's speed are shown as per cent. */
export const scaleOf = (parameter: string): number => (parameter === 'waveSpeed' ? 100 : 1);

export function bandWords(parameter: Band['parameter']): { name: string; unit: string } {
  if (parameter === 'waveSpeed') return { name: 'Wave speed', unit: '% of c' };
  const { label, unit } = PARAMETER_WORDS[parameter];
  return { name: parameter === 'surgeImpedanceOhm' ? 'Zc' : label, unit };
}

/** The value of a limit as it stands in a band. */
export function limitOf(band: Pick<Band, 'typical' | 'outer'>, limit: Limit): number {
  switch (limit) {
    case 'outerLow':
      return band.outer[0];
    case 'typicalLow':
      return band.typical[0];
    case 'typicalHigh':
      return band.typical[1];
    default:
      return band.outer[1];
  }
}

/** A limit as its field shows it, without the noise of the scale's factor. */
export function limitText(value: number, parameter: string): string {
  return String(Number((value * scaleOf(parameter)).toPrecision(12)));
}

/** Reads a field; null for what is no number. */
export function readLimit(text: string, parameter: string): number | null {
  const trimmed = text.trim().replace('\u2212', '-');
  if (!/^-?\d+(\.\d+)?$/.test(trimmed)) return null;
  return Number((Number(trimmed) / scaleOf(parameter)).toPrecision(12));
}

export interface ReadBand {
  band: Band;
  /** What is wrong with it, and in which fields; none when it can be saved. */
  fault: { limits: readonly Limit[]; message: string } | null;
}

/** A band of the draft with what has been typed over it. */
export function applyEdit(band: Band, edit: BandEdit | undefined): ReadBand {
  if (!edit) return { band, fault: null };
  const read = LIMITS.map((limit) =>
    edit[limit] === undefined ? limitOf(band, limit) : readLimit(edit[limit], band.parameter),
  );
  const unreadable = LIMITS.filter((_, i) => read[i] === null);
  if (unreadable.length > 0) {
    return { band, fault: { limits: unreadable, message: 'Write a number, such as 0.33.' } };
  }
  const [outerLow = 0, typicalLow = 0, typicalHigh = 0, outerHigh = 0] = read as number[];
  const next: Band = {
    ...band,
    typical: [typicalLow, typicalHigh],
    outer: [outerLow, outerHigh],
    source: edit.source?.trim() || band.source,
  };
  return { band: next, fault: orderFault([outerLow, typicalLow, typicalHigh, outerHigh]) };
}

function orderFault(values: readonly number[]): ReadBand['fault'] {
  const [outerLow = 0, typicalLow = 0, typicalHigh = 0, outerHigh = 0] = values;
  if (typicalLow >= typicalHigh) {
    return {
      limits: ['typicalLow', 'typicalHigh'],
      message: 'The lower bound must lie below the upper one.',
    };
  }
  if (outerLow > typicalLow) {
    return {
      limits: ['outerLow', 'typicalLow'],
      message: 'The outer lower limit must not lie above the lower bound.',
    };
  }
  if (outerHigh < typicalHigh) {
    return {
      limits: ['typicalHigh', 'outerHigh'],
      message: 'The outer upper limit must not lie below the upper bound.',
    };
  }
  return null;
}

/** The bands of one class and frequency, in the order in which parameters are always listed. */
export function bandsOf(bands: readonly Band[], classKv: number, frequencyHz: number): Band[] {
  return bands
    .filter((b) => b.classKv === classKv && b.frequencyHz === frequencyHz)
    .sort((a, b) => BAND_PARAMETERS.indexOf(a.parameter) - BAND_PARAMETERS.indexOf(b.parameter));
}

/** The voltage classes that have bands, with their frequencies, lowest first. */
export function classesOf(bands: readonly Band[]): { classKv: number; frequencyHz: number }[] {
  const seen = new Map(
    bands.map(({ classKv, frequencyHz }) => [`${classKv}/${frequencyHz}`, { classKv, frequencyHz }]),
  );
  return [...seen.values()].sort((a, b) => a.classKv - b.classKv || a.frequencyHz - b.frequencyHz);
}

/** All bands with everything typed; null while something typed cannot be read. */
export function editedBands(bands: readonly Band[], edits: BandEdits): Band[] | null {
  const read = bands.map((band) => applyEdit(band, edits[bandKey(band)]));
  return read.some((r) => r.fault !== null) ? null : read.map((r) => r.band);
}

/** Whether two bands hold the same limits. */
export function sameLimits(a: Pick<Band, 'typical' | 'outer'>, b: Pick<Band, 'typical' | 'outer'>): boolean {
  return LIMITS.every((limit) => limitOf(a, limit) === limitOf(b, limit));
}

/** The bands of a draft whose limits differ from those in force. */
export function changedBands(draft: readonly Band[], inForce: readonly Band[]): Band[] {
  const byKey = new Map(inForce.map((band) => [bandKey(band), band]));
  return draft.filter((band) => {
    const before = byKey.get(bandKey(band));
    return before === undefined || !sameLimits(band, before);
  });
}
