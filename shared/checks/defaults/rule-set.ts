import type { Band, RuleSet } from '../rule-set';
import { BAND_ROWS_50_HZ } from './bands-50hz';
import { BAND_ROWS_60_HZ } from './bands-60hz';
import { BAND_SOURCES, OUTER_SOURCE } from './band-row';
import type { BandRow } from './band-row';
import { DEFAULT_TOLERANCES, DEFAULT_TOLERANCES_VERSION, DEFAULT_UNCERTAINTIES } from './tolerances';

/** Version of the default bands; changes whenever one of them does. */
export const DEFAULT_BANDS_VERSION = 'default-1';

/**
 * The default bands: twelve parameters in fourteen voltage classes, eight at 60 Hz and six at 50 Hz. Class 400
 * stands for 380 and 400 kV alike.
 */
export const DEFAULT_BANDS: readonly Band[] = [
  ...BAND_ROWS_60_HZ.map((row) => toBand(row, 60)),
  ...BAND_ROWS_50_HZ.map((row) => toBand(row, 50)),
];

/** The rule set of a grid owner who has changed nothing. */
export const DEFAULT_RULE_SET: RuleSet = {
  bandsVersion: DEFAULT_BANDS_VERSION,
  bands: DEFAULT_BANDS,
  tolerancesVersion: DEFAULT_TOLERANCES_VERSION,
  tolerances: DEFAULT_TOLERANCES,
  uncertainties: DEFAULT_UNCERTAINTIES,
  owner: { baseMva: 100, earthResistivityOhmM: 100 },
};

function toBand(row: BandRow, frequencyHz: number): Band {
  const [classKv, parameter, typicalLow, typicalHigh, outerLow, outerHigh, lowKey, highKey] = row;
  const low = BAND_SOURCES[lowKey];
  const high = BAND_SOURCES[highKey];
  const typicalWords = low === high ? `typical: ${low}` : `typical low: ${low}; typical high: ${high}`;
  return {
    classKv,
    frequencyHz,
    parameter,
    typical: [typicalLow, typicalHigh],
    outer: [outerLow, outerHigh],
    source: `${typicalWords}; outer: ${OUTER_SOURCE}`,
    bounds: { typicalLow: low, typicalHigh: high, outer: OUTER_SOURCE },
  };
}
