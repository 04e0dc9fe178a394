import { LINE_PARAMETERS } from '../../parameters';
import { label, quantity } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule, FindingDraft } from '../rule';

/** A resistance, reactance or charging of zero or less. */
export const notPositive: CircuitRule = {
  code: 'physics.not-positive',
  family: 'physics',
  grades: ['must-answer'],
  parameter: null,
  needs: 'a declared value; a line that is overhead by nine tenths of its length',
  sentence: 'R, X and B of an overhead line are above zero.',
  source: 'passivity of conductors in air; series compensation is no part of a line’s constants',
  on: 'circuit',
  apply: (context) => {
    if (!context.lineContext.isOverhead) return [];
    return LINE_PARAMETERS.flatMap((parameter): FindingDraft[] => {
      const declared = context.declared[parameter];
      if (declared === undefined || declared > 0) return [];
      return [
        {
          grade: 'must-answer',
          parameter,
          declared,
          where: pointerOf(context, parameter),
          message: `${label(parameter)} is ${quantity(parameter, declared)}. An overhead line has more than zero.`,
        },
      ];
    });
  },
};
