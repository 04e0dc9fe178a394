/** Everything that is made from something else: validators, types, unit factors. `--check` only says what is out of date. */
import { readFileSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { buildValidators } from './build-validators.mjs';
import { csvSchemaText } from './generate-csv-schema.mjs';
import { factorsText } from './generate-factors.mjs';
import { typesFrom } from './generate-types.mjs';
import { readSchemas } from './schema-files.mjs';

const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../..');

const CSV_SCHEMA = 'schemas/files/lines-csv.schema.json';

/** Every committed generated file: path → text as it should be. */
export async function generatedTexts() {
  const prettier = await import('prettier');
  const config = await prettier.resolveConfig(join(ROOT, 'package.json'));
  const csvSchema = await csvSchemaText();
  // The schema made here is one of those that types are made from.
  const others = readSchemas(ROOT).filter((s) => s.path !== 'files/lines-csv');
  const schemas = [...others, { path: 'files/lines-csv', schema: JSON.parse(csvSchema) }];
  const texts = {
    [CSV_SCHEMA]: csvSchema,
    ...typesFrom(schemas),
    'shared/units/factors.generated.ts': await factorsText(),
  };
  const out = {};
  for (const [file, text] of Object.entries(texts)) {
    const parser = file.endsWith('.json') ? 'json' : 'typescript';
    out[file] = await prettier.format(text, { ...config, parser });
  }
  return out;
}

function read(file) {
  try {
    return readFileSync(join(ROOT, file), 'utf8');
  } catch {
    return '';
  }
}

/** Names of the committed generated files that differ from what their sources give. */
export async function drift() {
  return Object.entries(await generatedTexts())
    .filter(([file, text]) => read(file) !== text)
    .map(([file]) => file);
}

async function main() {
  if (process.argv.includes('--check')) {
    const stale = await drift();
    for (const file of stale) console.error(`${file} is out of date: run npm run generate`);
    process.exitCode = stale.length ? 1 : 0;
    return;
  }
  for (const [file, text] of Object.entries(await generatedTexts()))
    if (read(file) !== text) {
      writeFileSync(join(ROOT, file), text);
      console.log(`wrote ${file}`);
    }
  if (await buildValidators()) console.log('compiled the validators');
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) await main();
