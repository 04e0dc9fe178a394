import { figure } from '#shared/format/numbers';
import { FACTORS } from '#shared/units/factors.generated';
import type { ConductorForm, Typed } from './form-types';
import { readNumber } from './number-text';

/** Resistivity of hard-drawn aluminium wire at 20 °C, Ω mm²/m (IEC 60889). */
const ALUMINIUM_OHM_MM2_PER_M = 0.028264;

const DIGITS = 4;

/**
 * The d.c. resistance at 20 °C that an area of aluminium has, in Ω/km, for the applicant to take or leave: the lay of
 * the strands, and a core that carries some of the current, are not in it.
 *
 * @returns null while the area is no positive number, or where that value stands in the field already
 */
export function proposedResistance(form: ConductorForm): Typed | null {
  const reading = readNumber(form.aluminiumArea.text);
  const factor = FACTORS.area[form.aluminiumArea.unit as keyof typeof FACTORS.area];
  if (reading.kind !== 'number' || reading.value <= 0) return null;
  const ohmPerKm = (ALUMINIUM_OHM_MM2_PER_M * 1000) / (reading.value * factor);
  const text = figure(ohmPerKm, DIGITS);
  const { dcResistance20OhmPerKm: stands } = form;
  return stands.text === text && stands.unit === 'ohm/km' ? null : { text, unit: 'ohm/km' };
}
