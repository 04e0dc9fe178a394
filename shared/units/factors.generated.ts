/** Factors of the closed list of units, by mathjs. Made by `npm run generate`; do not edit. */
export const FACTORS = {
  /** Into ohm/km. */
  perLengthImpedance: {
    'ohm/km': 1,
    'ohm/mi': 0.621371192237334,
    'ohm/kft': 3.28083989501312,
  },
  /** Into H/km. */
  perLengthInductance: {
    'mH/km': 0.001,
    'mH/mi': 0.000621371192237334,
  },
  /** Into uS/km. */
  perLengthSusceptance: {
    'uS/km': 1,
    'uS/mi': 0.621371192237334,
  },
  /** Into F/km. */
  perLengthCapacitance: {
    'nF/km': 1e-9,
    'nF/mi': 6.21371192237334e-10,
    'uF/km': 0.000001,
  },
  /** Into m. */
  length: {
    km: 1000,
    m: 1,
    cm: 0.01,
    mm: 0.001,
    mi: 1609.344,
    ft: 0.3048,
    in: 0.0254,
  },
  /** Into mm^2. */
  area: {
    mm2: 1,
    kcmil: 0.506707479097498,
  },
} as const;
