import { withUnit } from '../../words';
import type { LineRule } from '../rule';

/** The nominal voltage has no class of its own: which band was taken. */
export const betweenClasses: LineRule = {
  code: 'typical.between-classes',
  family: 'typical',
  grades: ['note'],
  parameter: null,
  needs: 'nominal voltage and frequency',
  sentence: 'A line between two voltage classes says which one it was weighed against.',
  source: 'the matching rule of the bands: nearest class in ln(kV)',
  on: 'line',
  apply: ({ line, match, isOverhead }) => {
    if (match === null || match.exact || !isOverhead) return [];
    return [
      {
        grade: 'note',
        where: `${line.pointer}/nominalVoltageKv`,
        message: `${withUnit(line.nominalVoltageKv, 'kV')} has no class of its own. It was weighed against the band of ${withUnit(match.classKv, 'kV')}, the nearest at ${withUnit(line.frequencyHz, 'Hz')}.`,
      },
    ];
  },
};
