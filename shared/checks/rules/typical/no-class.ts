import { CLASS_REACH } from '../../bands/match-class';
import { percent, withUnit } from '../../words';
import type { LineRule } from '../rule';

/** No voltage class is near enough: typical values are not weighed. */
export const noClass: LineRule = {
  code: 'typical.no-class',
  family: 'typical',
  grades: ['note'],
  parameter: null,
  needs: 'nominal voltage and frequency',
  sentence:
    'A line more than 15 % away from every voltage class of its frequency is weighed against no band.',
  source: 'the matching rule of the bands: nearest class in ln(kV)',
  on: 'line',
  apply: ({ line, match, isOverhead }) => {
    if (match !== null || !isOverhead) return [];
    return [
      {
        grade: 'note',
        where: `${line.pointer}/nominalVoltageKv`,
        message: `No voltage class at ${withUnit(line.frequencyHz, 'Hz')} lies within ${percent(CLASS_REACH)} of ${withUnit(line.nominalVoltageKv, 'kV')}. Typical values are not weighed.`,
      },
    ];
  },
};
