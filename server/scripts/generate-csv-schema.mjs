/** schemas/files/lines-csv.schema.json out of the table of columns, so that the published list is the one that is read. */
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';

const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../..');

/** A TypeScript module without dependencies of its own, loaded in memory. */
async function load(file) {
  const result = await build({
    entryPoints: [join(ROOT, file)],
    bundle: true,
    format: 'esm',
    platform: 'neutral',
    write: false,
    logLevel: 'warning',
  });
  const code = Buffer.from(result.outputFiles[0].text).toString('base64');
  return import(`data:text/javascript;base64,${code}`);
}

const KINDS = {
  text: 'Text.',
  number: 'Number, with the file’s decimal sign.',
  choice: 'One of a list.',
  boolean: 'true or false.',
};

/** The text of schemas/files/lines-csv.schema.json. */
export async function csvSchemaText() {
  const { CSV_COLUMNS, CSV_REQUIRED } = await load('shared/filing/csv-columns.ts');
  const properties = Object.fromEntries(
    CSV_COLUMNS.map((c) => [
      c.name,
      {
        description: `${c.meaning.charAt(0).toUpperCase()}${c.meaning.slice(1)}. ${KINDS[c.kind]}${c.scope === 'line' ? ' On the line’s first row.' : ''}`,
        type: 'string',
        maxLength: 120,
      },
    ]),
  );
  const schema = {
    $schema: 'https://json-schema.org/draft/2020-12/schema',
    $id: 'https://counterpoise.example/schemas/files/lines-csv.schema.json',
    title: 'LinesCsvRow',
    description:
      'One row of the lines’ CSV file, by column. A row is a section; the rows of one name stand together; declared values stand on the first of them. Cells are texts: numbers are read by the rules of the filing format.',
    type: 'object',
    additionalProperties: false,
    required: CSV_REQUIRED,
    properties,
  };
  return JSON.stringify(schema);
}
