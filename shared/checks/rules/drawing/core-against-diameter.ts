import { withUnit } from '../../words';
import { conductorRule } from './conductor-rule';
import { conductorWords } from './places';

/** A core as thick as the conductor. */
export const coreAgainstDiameter = conductorRule(
  'core-against-diameter',
  ['must-answer'],
  'core diameter',
  'The core is thinner than the conductor.',
  'the current flows around the core',
  (used) => {
    const { coreDiameterMm, diameterMm } = used.conductor;
    if (coreDiameterMm === undefined || coreDiameterMm < diameterMm) return null;
    return {
      grade: 'must-answer',
      message: `The core of ${conductorWords(used)} is ${withUnit(coreDiameterMm, 'mm', 4)} thick, the whole conductor ${withUnit(diameterMm, 'mm', 4)}.`,
    };
  },
);
