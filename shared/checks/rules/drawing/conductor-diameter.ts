import { withUnit } from '../../words';
import { conductorRule } from './conductor-rule';
import { conductorWords } from './places';

/** Diameters of phase conductors and ground wires that need no explanation, mm. */
const PLAIN_MM = { phase: [5, 60], 'ground-wire': [4, 40] } as const;

/** A conductor too thin or too thick for a transmission line. */
export const conductorDiameter = conductorRule(
  'conductor-diameter',
  ['explain'],
  'diameter',
  'Phase conductors are 5 to 60 mm thick, ground wires 4 to 40 mm.',
  'the published conductor tables run from 5 to 51 mm',
  (used) => {
    const [low, high] = PLAIN_MM[used.use];
    const { diameterMm } = used.conductor;
    if (diameterMm >= low && diameterMm <= high) return null;
    return {
      grade: 'explain',
      message: `The diameter of ${conductorWords(used)} is ${withUnit(diameterMm, 'mm', 4)}. Usual are ${low} to ${withUnit(high, 'mm')}; check that it is not in inches or centimetres.`,
    };
  },
);
