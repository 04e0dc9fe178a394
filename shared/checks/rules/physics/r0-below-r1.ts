import { quantity } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule } from '../rule';

/** R0 below R1. */
export const r0BelowR1: CircuitRule = {
  code: 'physics.r0-below-r1',
  family: 'physics',
  grades: ['must-answer'],
  parameter: 'r0',
  needs: 'R1 and R0; a line that is overhead by nine tenths of its length',
  sentence: 'R0 is at least R1: the earth and the ground wires only add to it.',
  source: 'some 6 000 random single circuits with up to four ground wires: no exception',
  on: 'circuit',
  apply: (context) => {
    const { r1: one, r0: zero } = context.declared;
    if (!context.lineContext.isOverhead || one === undefined || zero === undefined) return [];
    if (one <= 0 || zero <= 0 || zero >= one) return [];
    return [
      {
        grade: 'must-answer',
        parameter: 'r0',
        declared: zero,
        where: pointerOf(context, 'r0'),
        message: `R0 is ${quantity('r0', zero)}, below R1 (${quantity('r1', one)}). The return path through earth only adds resistance.`,
      },
    ];
  },
};
