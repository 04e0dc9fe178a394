import { LINE_PARAMETERS } from '../../parameters';
import { label, percent } from '../../words';
import { pointerOf } from '../rule';
import type { CircuitRule, FindingDraft } from '../rule';

/** A whole-line value that passes as one form only: which one. */
export const wholeLineForm: CircuitRule = {
  code: 'geometry.whole-line-form',
  family: 'geometry',
  grades: ['note'],
  parameter: null,
  needs: 'a value of the whole line, and positions',
  sentence:
    'A whole-line value that fits only one of equivalent pi and length × per-length value says which.',
  source: 'long-line theory: the two part by about 1 % in X at 200 km',
  on: 'circuit',
  apply: (context) =>
    LINE_PARAMETERS.flatMap((parameter): FindingDraft[] => {
      const weighing = context.weighings[parameter];
      if (weighing === undefined || weighing.form === null || weighing.contradicted) return [];
      const other = Math.abs(weighing.deviation) + weighing.formsPart;
      if (weighing.formsPart <= weighing.tolerance.total || other <= weighing.tolerance.total) return [];
      const words =
        weighing.form === 'equivalent-pi'
          ? 'the equivalent pi of the whole line'
          : 'length × per-length value';
      return [
        {
          grade: 'note',
          parameter,
          declared: weighing.declared.perKm,
          recomputed: weighing.recomputed,
          deviation: weighing.deviation,
          tolerance: weighing.tolerance.total,
          where: pointerOf(context, parameter),
          message: `${label(parameter)} fits as ${words}; the other form lies ${percent(weighing.formsPart)} away.`,
        },
      ];
    }),
};
