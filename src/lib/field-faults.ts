import { ApiProblem } from './api/problem';

/** The server's faults of a request's fields, by the member's name: the first one of each. */
export function faultsByField(error: Error | null | undefined): Record<string, string> {
  if (!(error instanceof ApiProblem)) return {};
  const found: Record<string, string> = {};
  for (const { pointer, message } of error.faults) {
    const name = (pointer ?? '').replace(/^\//, '').replaceAll('/', '.');
    if (name !== '') found[name] ??= message;
  }
  return found;
}
