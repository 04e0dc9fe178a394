/** Permeability of vacuum and of air, wires and earth alike, H/m. The value of SI before 2019, which the published tables use. */
export const MU_0 = 4e-7 * Math.PI;

/** Speed of light in vacuum, m/s (exact by definition). */
export const LIGHT_SPEED_M_PER_S = 299_792_458;

/** Permittivity of vacuum and air, F/m: 1/(μ₀c²). */
export const EPSILON_0 = 1 / (MU_0 * LIGHT_SPEED_M_PER_S * LIGHT_SPEED_M_PER_S);

/** Share of the sag that separates the attachment from the average height of a parabolic span: two thirds. */
export const SAG_SHARE = 2 / 3;

/** Temperature at which d.c. resistances are tabled, °C. */
export const RESISTANCE_REFERENCE_C = 20;

/** Temperature coefficient of hard-drawn aluminium at 20 °C, 1/K, taken when none is given. */
export const ALUMINIUM_COEFFICIENT_PER_K = 0.00403;

/** Lowest and highest frequency that the engine answers for, Hz. */
export const FREQUENCY_RANGE_HZ = [0.1, 1e6] as const;

/** Most circuits on one structure. */
export const MAX_CIRCUITS = 4;

/** Most subconductors in one bundle. */
export const MAX_BUNDLE = 8;
