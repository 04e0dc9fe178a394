import type { MutualParameter } from '../../parameters';
import { label } from '../../words';
import type { PairRule } from '../rule';
import { contradicted } from './contradicted';

/** A rule that holds one zero-sequence coupling of a pair of circuits against the geometry. */
export function pairGeometryRule(parameter: MutualParameter): PairRule {
  return {
    code: `geometry.${parameter}`,
    family: 'geometry',
    grades: ['must-answer'],
    parameter,
    needs: `${label(parameter)} and the positions of every section`,
    sentence: `${label(parameter)} is within tolerance of what the positions of the two circuits give.`,
    source: 'off-diagonal blocks of the sequence matrices, ground wires eliminated',
    on: 'pair',
    apply: ({ mutual, weighings }) =>
      contradicted(parameter, weighings[parameter], mutual.declared[parameter]?.pointer ?? mutual.pointer),
  };
}
