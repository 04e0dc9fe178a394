import type { Role } from './api/session';

/** Where an application opens: applicants at their own page, the owner's people at the review sheet. */
export function applicationPath(role: Role, number: string): string {
  return role === 'applicant' ? `/applications/${number}` : `/applications/${number}/review`;
}

/** Where a filed line opens. */
export function linePath(role: Role, number: string, letter: string, lineKey: string): string {
  return role === 'applicant'
    ? `/applications/${number}/revisions/${letter}/lines/${lineKey}`
    : `/applications/${number}/review?revision=${letter}&line=${lineKey}`;
}
