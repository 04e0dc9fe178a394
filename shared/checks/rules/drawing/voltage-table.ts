/** Plausible heights and spacings of one voltage, m. */
export interface VoltageDimensions {
  /** Least height of a phase over ground. */
  leastHeightM: number;
  /** Phase spacing below which air would not hold. */
  leastSpacingM: number;
  /** Phase spacings that need no explanation. */
  plainSpacingM: readonly [number, number];
  /** Phase spacings that are usual. */
  usualSpacingM: readonly [number, number];
}

type Row = readonly [
  kv: number,
  leastHeightM: number,
  leastSpacingM: number,
  plainLowM: number,
  plainHighM: number,
  usualLowM: number,
  usualHighM: number,
];

/**
 * Heights and spacings by nominal voltage. Least height: NESC rule 232 (from memory), computed at the highest
 * operating voltage. Spacings: margins around NESC rule 235B as published in RUS bulletin 1724E-200; usual
 * spacings from a public engineering note (161 kV between its neighbours). Plausibility only: local code governs.
 */
const ROWS: readonly Row[] = [
  [69, 5.8, 0.9, 1.5, 5, 2.5, 3],
  [115, 6.1, 1.3, 2.3, 7, 3, 3.7],
  [138, 6.3, 1.5, 2.7, 8, 3.5, 4.5],
  [161, 6.4, 1.7, 3.2, 9, 3.9, 5.1],
  [230, 6.8, 2.3, 4.2, 12, 5, 7],
  [345, 7.5, 3.4, 5.8, 15, 7, 9],
  [500, 8.6, 4.5, 7.5, 18, 9, 12],
  [765, 10.1, 6.5, 11, 22, 12, 15],
];

/** The table is stretched by at most this factor beyond its first and last row. */
const REACH = 1.15;

/**
 * Plausible dimensions at a voltage, on straight lines between the rows.
 *
 * @param nominalVoltageKv phase to phase
 * @returns null more than 15 % outside 69 to 765 kV
 */
export function dimensionsAt(nominalVoltageKv: number): VoltageDimensions | null {
  const first = ROWS[0];
  const last = ROWS[ROWS.length - 1];
  if (first === undefined || last === undefined) return null;
  if (nominalVoltageKv < first[0] / REACH || nominalVoltageKv > last[0] * REACH) return null;
  const upper = ROWS.find((row) => row[0] >= nominalVoltageKv) ?? last;
  const lower = [...ROWS].reverse().find((row) => row[0] <= nominalVoltageKv) ?? first;
  const share = upper[0] === lower[0] ? 0 : (nominalVoltageKv - lower[0]) / (upper[0] - lower[0]);
  const at = (column: 1 | 2 | 3 | 4 | 5 | 6): number =>
    lower[column] + share * (upper[column] - lower[column]);
  return {
    leastHeightM: at(1),
    leastSpacingM: at(2),
    plainSpacingM: [at(3), at(4)],
    usualSpacingM: [at(5), at(6)],
  };
}
