/** What a library conductor stands for in a filing: its handbook data at a temperature. */
import type { LibraryConductor } from './types';

/** Aluminium, 1/K at 20 °C. */
const ALUMINIUM_PER_K = 0.00403;

/** Handbook data in the fields of a filing's conductor. */
export interface HandbookData {
  name: string;
  model: 'handbook';
  diameterMm: number;
  coreDiameterMm?: number;
  gmrMm: number;
  acResistanceOhmPerKm: number;
  dcResistance20OhmPerKm?: number;
  temperatureC: number;
  temperatureCoefficientPerK: number;
}

/** What a row lacks of what the handbook model needs; empty when it can be chosen. */
export function handbookLacks(row: LibraryConductor): string[] {
  const lacks: string[] = [];
  if (!row.acResistances?.length) lacks.push('an a.c. resistance');
  if (row.gmrMm === undefined) lacks.push('a GMR');
  return lacks;
}

/** Whether a row can be chosen by name in a filing. */
export function isChoosable(row: LibraryConductor): boolean {
  return handbookLacks(row).length === 0;
}

/** Seven digits: tables hold five, and the rest would be noise of the interpolation. */
const rounded = (ohmPerKm: number) => Number(ohmPerKm.toPrecision(7));

/**
 * A row's a.c. resistance at a temperature: as tabled, linear between two tabled temperatures, and beyond them by the
 * temperature coefficient from the nearest.
 * @param row conductor of the library
 * @param temperatureC conductor temperature in °C
 * @returns Ω/km at 60 Hz, or null when the row has none
 */
export function acResistanceAt(row: LibraryConductor, temperatureC: number): number | null {
  const table = row.acResistances ?? [];
  const exact = table.find((t) => t.temperatureC === temperatureC);
  if (exact) return exact.ohmPerKm;
  const below = table.filter((t) => t.temperatureC < temperatureC).at(-1);
  const above = table.find((t) => t.temperatureC > temperatureC);
  if (below && above) {
    const share = (temperatureC - below.temperatureC) / (above.temperatureC - below.temperatureC);
    return rounded(below.ohmPerKm + share * (above.ohmPerKm - below.ohmPerKm));
  }
  const nearest = below ?? above;
  if (!nearest) return null;
  const perK = row.temperatureCoefficientPerK ?? ALUMINIUM_PER_K;
  const ratio = (1 + perK * (temperatureC - 20)) / (1 + perK * (nearest.temperatureC - 20));
  return rounded(nearest.ohmPerKm * ratio);
}

/**
 * A row's handbook data at a temperature, as they are copied into a filing.
 * @param row conductor of the library
 * @param temperatureC conductor temperature in °C
 * @returns the data, or null when the row lacks what the model needs
 */
export function handbookData(row: LibraryConductor, temperatureC: number): HandbookData | null {
  const acResistanceOhmPerKm = acResistanceAt(row, temperatureC);
  if (acResistanceOhmPerKm === null || row.gmrMm === undefined) return null;
  return {
    name: row.name,
    model: 'handbook',
    diameterMm: row.diameterMm,
    ...(row.coreDiameterMm === undefined ? {} : { coreDiameterMm: row.coreDiameterMm }),
    gmrMm: row.gmrMm,
    acResistanceOhmPerKm,
    ...(row.dcResistance20OhmPerKm === undefined
      ? {}
      : { dcResistance20OhmPerKm: row.dcResistance20OhmPerKm }),
    temperatureC,
    temperatureCoefficientPerK: row.temperatureCoefficientPerK ?? ALUMINIUM_PER_K,
  };
}
