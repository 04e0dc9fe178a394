import { figure, quantity } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule } from '../rule';

/** X0 not above X1. */
export const x0BelowX1: CircuitRule = {
  code: 'physics.x0-below-x1',
  family: 'physics',
  grades: ['must-answer'],
  parameter: 'x0',
  needs: 'X1 and X0; a line that is overhead by nine tenths of its length',
  sentence: 'X0 is above X1: the return path lies farther away than the other phases.',
  source: 'some 6 000 random single circuits with up to four ground wires: no exception',
  on: 'circuit',
  apply: (context) => {
    const { x1: one, x0: zero } = context.declared;
    if (!context.lineContext.isOverhead || one === undefined || zero === undefined) return [];
    if (one <= 0 || zero <= 0 || zero > one) return [];
    return [
      {
        grade: 'must-answer',
        parameter: 'x0',
        declared: zero,
        where: pointerOf(context, 'x0'),
        message: `X0 is ${quantity('x0', zero)}, ${figure(zero / one)} times X1. An overhead line has more zero-sequence than positive-sequence reactance.`,
      },
    ];
  },
};
