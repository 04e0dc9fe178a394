/**
 * The library that the product begins with: 128 conductors and ground wires, each with its source and tag.
 *
 * Which GMR stands in a row (`gmrFrom` names it):
 * - `tabled-xa`: from the tabled inductive reactance at 1 ft spacing, where the catalogue has one. It is what the
 *   trade works with, and for conductors with one aluminium layer the only fair value, since their steel magnetises
 *   and strand geometry does not apply. One row (Merlin) is left out of this: its printed reactance is a misprint,
 *   24 % off in GMR.
 * - `tabled-gmr`: else a published table of GMRs.
 * - `strand-geometry`: else the aluminium strands' own geometry, which agrees with the three published tables within
 *   0.6 % for every conductor of several layers.
 * - `strand-factor`: all-aluminium conductors, radius × the factor of 19, 37 or 61 equal wires.
 * - `representative`: steel and aluminium-clad ground wires, for small currents. X0 depends on it only a little.
 *
 * Resistances are at 60 Hz and 25, 50 and 75 °C as tabled; for the EN 50182 rows, whose standard gives only d.c.
 * values, they are computed by the tube model at 60 Hz (0.6 % from the tables where both exist). At 50 Hz they are
 * high by less than 1 %.
 */
import data from './conductors.json';
import type { ConductorLibrary, LibraryConductor } from './types';

/** The library that a new installation starts with; its rows seed the database. */
export const STARTING_LIBRARY: ConductorLibrary = {
  version: data.version,
  conductors: data.conductors as readonly LibraryConductor[],
};
