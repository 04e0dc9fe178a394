import { figure, withUnit } from '../../words';
import { conductorRule, dcAtTemperature } from './conductor-rule';
import { conductorWords } from './places';

/** A.c. ÷ d.c. at one temperature that printed data may have: rounding below, magnetised steel above. */
const PLAIN_RATIO = [0.97, 1.6] as const;

/** A.c. resistance below the d.c. resistance at the same temperature, or far above it. */
export const acAgainstDc = conductorRule(
  'ac-against-dc',
  ['must-answer', 'explain'],
  'handbook data with d.c. resistance at 20 °C',
  'A.c. resistance is at least the d.c. resistance at the same temperature, and at most 1.6 times it.',
  'skin effect only adds; one aluminium layer over steel adds up to a fifth at power frequency',
  (used) => {
    const ac = used.conductor.acResistanceOhmPerKm;
    const dc = dcAtTemperature(used);
    if (used.conductor.model !== 'handbook' || ac === undefined || dc === undefined) return null;
    const ratio = ac / dc;
    const words = `The a.c. resistance of ${conductorWords(used)} is ${withUnit(ac, 'Ω/km', 4)}, ${figure(ratio)} of its d.c. resistance at the same temperature (${withUnit(dc, 'Ω/km', 4)})`;
    if (ratio < PLAIN_RATIO[0]) return { grade: 'must-answer', message: `${words}. It cannot be below it.` };
    if (ratio > PLAIN_RATIO[1])
      return { grade: 'explain', message: `${words}. Skin effect does not add as much.` };
    return null;
  },
);
