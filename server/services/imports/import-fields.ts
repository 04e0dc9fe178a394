import { invalidContent } from '../../errors/problem';
import type { FileFormat } from '../../files/read-filing-file';
import type { CorrectedDialect } from '../../files/sniff-dialect';

/** What an applicant may say of a file, where it was found to be otherwise. */
const CHOICES: Readonly<Record<string, readonly string[]>> = {
  format: ['json', 'csv'],
  delimiter: ['comma', 'semicolon', 'tab'],
  decimal: ['point', 'comma'],
  encoding: ['utf-8', 'windows-1252'],
};

export const IMPORT_FIELDS = Object.keys(CHOICES);

/** Format and dialect as corrected by the form's fields. */
export function correctionsOf(fields: Readonly<Record<string, string>>): {
  format?: FileFormat;
  dialect: CorrectedDialect;
} {
  for (const [name, choices] of Object.entries(CHOICES)) {
    const value = fields[name];
    if (value === undefined || choices.includes(value)) continue;
    const expected = choices.join(' or ');
    throw invalidContent([{ pointer: `/${name}`, value, expected, message: `The ${name} is ${expected}.` }]);
  }
  const { format, ...dialect } = fields;
  return {
    ...(format === undefined ? {} : { format: format as FileFormat }),
    dialect: dialect as CorrectedDialect,
  };
}
