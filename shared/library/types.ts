/** A conductor library: rows with their sources, some complete enough to be chosen, some not. */

/** Where a conductor's GMR comes from. */
export type GmrSource = 'tabled-xa' | 'tabled-gmr' | 'strand-geometry' | 'strand-factor' | 'representative';

/** Where a conductor's a.c. resistance comes from. */
export type ResistanceSource = 'tabled' | 'computed' | 'representative';

/** One conductor of a library. */
export interface LibraryConductor {
  name: string;
  /** Kind of conductor and the standard that names it. */
  family: string;
  /** Size as the trade says it, such as `795 kcmil`. */
  size?: string;
  diameterMm: number;
  /** Diameter of the steel core; 0 for none. */
  coreDiameterMm?: number;
  dcResistance20OhmPerKm?: number;
  /** 60 Hz resistance at one or several temperatures, the lowest first. */
  acResistances?: { temperatureC: number; ohmPerKm: number }[];
  acResistanceFrom?: ResistanceSource;
  /** Geometric mean radius at 60 Hz. */
  gmrMm?: number;
  gmrFrom?: GmrSource;
  /** 1/K at 20 °C; aluminium's when left out; 0 where the resistance is held at every temperature. */
  temperatureCoefficientPerK?: number;
  /** Rating in A on the catalogue's own assumptions; for people to compare, never for a verdict. */
  ampacityA?: number;
  /** T: read in a published table. C: computed. M: from memory. */
  tag: 'T' | 'C' | 'M' | 'T+C';
  source: string;
}

/** A version of a library. */
export interface ConductorLibrary {
  version: string;
  conductors: readonly LibraryConductor[];
}
