import type { FailureReason } from '../../../engine/types';
import type { LineRule } from '../rule';

/**
 * A rule that passes on why the engine could not compute a line.
 *
 * @param name code without its family
 * @param reasons the engine's reasons that it stands for
 * @param sentence what it holds
 * @param remedy what the applicant does about it
 */
export function failureRule(
  name: string,
  reasons: readonly FailureReason[],
  sentence: string,
  remedy: string,
): LineRule {
  return {
    code: `drawing.${name}`,
    family: 'drawing',
    grades: ['must-answer'],
    parameter: null,
    needs: 'positions',
    sentence,
    source: 'the geometry that the recomputation stands on',
    on: 'line',
    apply: ({ line, recomputation }) => {
      const failure = recomputation.ok ? null : recomputation.failure;
      if (failure === null || !reasons.includes(failure.reason)) return [];
      const { section, position, field } = failure.where;
      const sectionPointer =
        section === undefined ? line.pointer : (line.sections[section]?.pointer ?? line.pointer);
      const positionPart = position === undefined ? '' : `/positions/${position}`;
      const fieldPart = position === undefined || field === undefined ? '' : `/${field}`;
      return [
        {
          grade: 'must-answer',
          ...(section === undefined ? {} : { section }),
          ...(position === undefined ? {} : { position }),
          where: `${sectionPointer}${positionPart}${fieldPart}`,
          message: `${failure.detail} ${remedy}`,
        },
      ];
    },
  };
}
