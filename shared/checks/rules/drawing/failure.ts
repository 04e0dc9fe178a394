import type { Failure, FailureReason } from '../../../engine/types';
import { pointerToken } from '../../../contracts/faults';
import type { NormalisedLine } from '../../../filing/types';
import { listed } from '../../words';
import type { LineRule } from '../rule';
import { positionWords } from './places';

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
      const { section, position } = failure.where;
      return [
        {
          grade: 'must-answer',
          ...(section === undefined ? {} : { section }),
          ...(position === undefined ? {} : { position }),
          where: placeOf(line, failure.where),
          message: `${asSentence(placed(line, failure))} ${remedy}`,
        },
      ];
    },
  };
}

/** Fields that stand at a position; all others of a wire stand at its conductor. */
const POSITION_FIELDS = new Set([
  'horizontalM',
  'attachmentHeightM',
  'sagM',
  'bundleCount',
  'bundleSpacingM',
]);

/** JSON Pointer of what the engine stumbled over. */
function placeOf(line: NormalisedLine, { section, position, field }: Failure['where']): string {
  const at = section === undefined ? line.pointer : (line.sections[section]?.pointer ?? line.pointer);
  if (section === undefined || position === undefined) return at;
  const wire = `${at}/positions/${position}`;
  if (field === undefined || POSITION_FIELDS.has(field))
    return field === undefined ? wire : `${wire}/${field}`;
  const key = line.sheet.line.sections[section]?.positions?.[position]?.conductor;
  return key === undefined ? wire : `${at}/conductors/${pointerToken(key)}/${field}`;
}

/** The engine's words behind the positions that they are about. */
function placed(line: NormalisedLine, { where, detail }: Failure): string {
  const section = where.section === undefined ? undefined : line.sections[where.section];
  if (section?.kind !== 'overhead' || where.position === undefined) return detail;
  const indices = [where.position, ...(where.other === undefined ? [] : [where.other])].sort((a, b) => a - b);
  const names = [...new Set(indices)].map((index) => positionWords(section, index));
  return `${listed(names)}: ${detail.charAt(0).toLowerCase()}${detail.slice(1)}`;
}

/** Words as a sentence of its own, with true minus signs. */
function asSentence(words: string): string {
  const capital = words.charAt(0).toUpperCase() + words.slice(1);
  const signed = capital.replace(/(^|\s)-(?=\d)/gu, '$1\u2212');
  return signed.endsWith('.') ? signed : `${signed}.`;
}
