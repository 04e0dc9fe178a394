import { MUTUAL_PARAMETERS } from '../../parameters';
import type { LineParameter, MutualParameter } from '../../parameters';
import { label, quantity } from '../../words';
import type { FindingDraft, PairRule } from '../rule';

const SELF_OF: Readonly<Record<MutualParameter, LineParameter>> = { r0m: 'r0', x0m: 'x0', b0m: 'b0' };

/** A coupling larger than the two circuits it couples allow. */
export const mutualExceedsSelves: PairRule = {
  code: 'physics.mutual-exceeds-selves',
  family: 'physics',
  grades: ['must-answer'],
  parameter: null,
  needs: 'a declared coupling and the zero-sequence self values of both circuits',
  sentence: 'The square of a zero-sequence coupling is at most the product of the two self values.',
  source: 'passivity: the matrices of a pair of circuits are positive definite',
  on: 'pair',
  apply: (context) => {
    if (!context.lineContext.isOverhead) return [];
    return MUTUAL_PARAMETERS.flatMap((parameter): FindingDraft[] => {
      const value = context.mutual.declared[parameter];
      const [one, two] = context.selves.map((self) => self[SELF_OF[parameter]]);
      if (value === undefined || one === undefined || two === undefined || one <= 0 || two <= 0) return [];
      // What rounding of the declared digits explains is no contradiction.
      if (Math.max(0, Math.abs(value.perKm) - value.halfDigitPerKm) ** 2 <= one * two) return [];
      return [
        {
          grade: 'must-answer',
          parameter,
          declared: value.perKm,
          where: value.pointer,
          message: `${label(parameter)} is ${quantity(parameter, value.perKm)}, more than the self values of its two circuits allow (${quantity(parameter, Math.sqrt(one * two))}).`,
        },
      ];
    });
  },
};
