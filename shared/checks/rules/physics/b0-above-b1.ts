import { figure, quantity } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule } from '../rule';

/** B0 not below B1. */
export const b0AboveB1: CircuitRule = {
  code: 'physics.b0-above-b1',
  family: 'physics',
  grades: ['must-answer'],
  parameter: 'b0',
  needs: 'B1 and B0; a line that is overhead by nine tenths of its length',
  sentence: 'B0 is below B1: the three phases at one potential shield each other.',
  source: 'some 6 000 random single circuits with up to four ground wires: no exception',
  on: 'circuit',
  apply: (context) => {
    const { b1: one, b0: zero } = context.declared;
    if (!context.lineContext.isOverhead || one === undefined || zero === undefined) return [];
    if (one <= 0 || zero <= 0 || zero < one) return [];
    return [
      {
        grade: 'must-answer',
        parameter: 'b0',
        declared: zero,
        where: pointerOf(context, 'b0'),
        message: `B0 is ${quantity('b0', zero)}, ${figure(zero / one)} times B1. An overhead line has less zero-sequence than positive-sequence charging.`,
      },
    ];
  },
};
