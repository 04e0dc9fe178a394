import type { Application } from '../../entities/case.entities';
import { CAUTION } from '../../../shared/workflow/caution';

/** The frame of every mail about a case: what happened, where to look, and the caution. */
export function caseMail(
  application: Pick<Application, 'number' | 'title'>,
  publicUrl: URL,
  sentences: readonly string[],
): string {
  const link = new URL(`/applications/${application.number}`, publicUrl).href;
  return [
    `${application.title} (${application.number})`,
    '',
    ...sentences,
    '',
    `Open the application: ${link}`,
    '',
    CAUTION,
    '',
  ].join('\n');
}
