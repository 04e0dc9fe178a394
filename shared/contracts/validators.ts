/** The filing's schemas as functions, the same in browser, server and command line. */
import * as compiled from './filing-validators.generated.js';
import type { Validator } from './filing-validators.generated.js';
import { inOrder } from './faults';
import type { PointerFault } from './faults';
import { plainData } from './plain-data';
import { schemaFaults } from './schema-faults';

/**
 * Runs a compiled validator.
 * @param validate a function made from a schema in the build
 * @param data anything that came from outside as JSON
 * @returns the faults, none when the data hold
 */
export function faultsBy(validate: Validator, data: unknown): PointerFault[] {
  const plain = plainData(data);
  if (!plain.readable) return plain.faults;
  const bySchema = validate(data) ? [] : schemaFaults(validate.errors ?? [], data);
  return inOrder([...plain.faults, ...bySchema]);
}

/** The filing's own schema as Ajv's function. Whole filings are read line by line: see shared/filing/read-filing. */
export const filingValidator: Validator = compiled.filing;

/** Faults of one line by schemas/common/line.schema.json; pointers count from the line. */
export const lineFaults = (data: unknown): PointerFault[] => faultsBy(compiled.commonLine, data);

/** Faults of a line that is still being written: types and unknown keys only. */
export const lineDraftFaults = (data: unknown): PointerFault[] => faultsBy(compiled.commonLineDraft, data);
