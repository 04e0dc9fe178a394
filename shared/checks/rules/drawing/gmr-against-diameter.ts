import { figure, withUnit } from '../../words';
import { conductorRule } from './conductor-rule';
import { conductorWords } from './places';

/** Largest GMR ÷ radius that data may have: 1 for a thin tube, and a little for rounding. */
const LARGEST_RATIO = 1.005;

/** Smallest GMR ÷ radius of a phase conductor that needs no explanation: one layer over steel reaches 0.3. */
const SMALLEST_RATIO = 0.28;

/** GMR larger than the radius, or far below it. */
export const gmrAgainstDiameter = conductorRule(
  'gmr-against-diameter',
  ['must-answer', 'explain'],
  'GMR and diameter',
  'GMR is at most the radius, and that of a phase conductor not below 0.28 of it.',
  'a thin tube has GMR = radius, a solid wire 0.7788 of it; one aluminium layer over steel comes down to 0.3',
  (used) => {
    const { gmrMm, diameterMm } = used.conductor;
    if (gmrMm === undefined) return null;
    const ratio = gmrMm / (diameterMm / 2);
    const words = `The GMR of ${conductorWords(used)} is ${withUnit(gmrMm, 'mm', 4)}, ${figure(ratio)} of its radius`;
    if (ratio > LARGEST_RATIO) {
      return { grade: 'must-answer', message: `${words}. It is never larger than the radius.` };
    }
    if (used.use === 'phase' && ratio < SMALLEST_RATIO) {
      return { grade: 'explain', message: `${words}. Phase conductors lie between 0.3 and 0.83.` };
    }
    return null;
  },
);
