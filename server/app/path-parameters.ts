import { notFound } from '../errors/problem';

/** Shapes of the parameters in paths; what does not have its shape names nothing, so it is a 404. */
const UUID = '^[0-9a-fA-F]{8}(-[0-9a-fA-F]{4}){3}-[0-9a-fA-F]{12}$';
const SHAPES: Record<string, string> = {
  applicationId: `^([0-9]{2}-[0-9]{4}|${UUID.slice(1, -1)})$`,
  lineKey: '^L[1-9][0-9]{0,3}$',
  letter: '^[A-Z]{1,3}$',
  number: '^[1-9][0-9]{0,5}$',
  run: '^[1-9][0-9]{0,5}$',
  fingerprint: '^[A-Za-z0-9._:-]{1,200}$',
};

export function parameterPattern(name: string): string {
  return SHAPES[name] ?? UUID;
}

export const parameterNames = (path: string): string[] =>
  [...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1] ?? '');

/** The path in Express's own writing. */
export const expressPath = (path: string): string => path.replace(/\{(\w+)\}/g, ':$1');

export function checkParameters(params: Readonly<Record<string, unknown>>): Record<string, string> {
  const checked: Record<string, string> = {};
  for (const [name, value] of Object.entries(params)) {
    if (typeof value !== 'string' || !new RegExp(parameterPattern(name)).test(value)) throw notFound();
    checked[name] = value;
  }
  return checked;
}
