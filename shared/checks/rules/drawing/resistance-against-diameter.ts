import { figure, withUnit } from '../../words';
import { conductorRule, dcAtTemperature } from './conductor-rule';
import { conductorWords } from './places';

/** Resistance × gross cross-section of phase conductors that needs no explanation, Ω·mm²/km (= nΩ·m). */
const PLAIN_NANO_OHM_M = [20, 110] as const;

/** A resistance that the cross-section does not allow. */
export const resistanceAgainstDiameter = conductorRule(
  'resistance-against-diameter',
  ['explain'],
  'diameter and a resistance of a phase conductor',
  'Resistance × gross cross-section of a phase conductor lies between 20 and 110 nΩ·m.',
  'copper 17, aluminium 28, alloy 33 nΩ·m, over a fill of 0.6 to 1; every published phase conductor lies between 35 and 60',
  (used) => {
    const resistance = used.conductor.acResistanceOhmPerKm ?? dcAtTemperature(used);
    if (used.use !== 'phase' || resistance === undefined) return null;
    const { diameterMm } = used.conductor;
    const product = (resistance * Math.PI * diameterMm ** 2) / 4;
    if (product >= PLAIN_NANO_OHM_M[0] && product <= PLAIN_NANO_OHM_M[1]) return null;
    return {
      grade: 'explain',
      message: `${withUnit(resistance, 'Ω/km', 4)} over a diameter of ${withUnit(diameterMm, 'mm', 4)} makes ${conductorWords(used)} a metal of ${withUnit(product, 'nΩ·m')}. Aluminium and copper conductors lie between ${figure(PLAIN_NANO_OHM_M[0])} and ${figure(PLAIN_NANO_OHM_M[1])}.`,
    };
  },
);
