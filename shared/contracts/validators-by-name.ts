/** The schemas of requests, responses and files as functions, by their path below schemas/. For the server and its tests. */
import * as compiled from './api-validators.generated.js';
import type { Validator } from './api-validators.generated.js';
import type { PointerFault } from './faults';
import { faultsBy } from './validators';

/** Path of a schema below schemas/, such as `requests/saveDraftLine`. */
export type SchemaPath = keyof typeof compiled.validatorNames;

/**
 * The compiled validator of a schema.
 * @param path path below schemas/, without `.schema.json`
 * @returns Ajv's function: true or false, with `errors` on itself
 */
export function validatorOf(path: SchemaPath): Validator {
  return compiled[compiled.validatorNames[path]];
}

/**
 * Faults of data by the schema at `path`; none when they hold.
 * @param path path below schemas/, without `.schema.json`
 * @param data anything that came from outside as JSON
 */
export function faultsAgainst(path: SchemaPath, data: unknown): PointerFault[] {
  return faultsBy(validatorOf(path), data);
}
