/**
 * Compiles the JSON Schemas into plain validation code, so that the browser needs no `new Function`
 * (its content policy forbids it) and the server runs the very same checks. Skips when nothing changed.
 */
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import { draftSchemas, readSchemas } from './schema-files.mjs';

const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../..');
const FILING_OUT = 'shared/contracts/filing-validators.generated';
const API_OUT = 'shared/contracts/api-validators.generated';

/** Export name of a schema: filing, filingDraft, commonLine, commonLineDraft, requestsSaveDraftLine … */
export function exportName(path) {
  const draft = path.startsWith('draft/');
  const words = path.replace(/^draft\//, '').split(/[^A-Za-z0-9]+/);
  const name = words.map((w, i) => (i === 0 ? w : w.charAt(0).toUpperCase() + w.slice(1))).join('');
  return draft ? `${name}Draft` : name;
}

function stampOf(schemas) {
  const h = createHash('sha256');
  for (const f of ['build-validators.mjs', 'schema-files.mjs'])
    h.update(readFileSync(join(ROOT, 'server/scripts', f)));
  h.update(JSON.parse(readFileSync(join(ROOT, 'node_modules/ajv/package.json'), 'utf8')).version);
  for (const s of schemas) h.update(s.path).update(JSON.stringify(s.schema));
  return h.digest('hex');
}

/** A schema without the words that are for people: they would be carried into the code. */
function bare(node, inMap) {
  if (Array.isArray(node)) return node.map((n) => bare(n, false));
  if (typeof node !== 'object' || node === null) return node;
  const words = inMap ? [] : ['title', 'description', 'default', 'examples'];
  const kept = Object.entries(node).filter(([key]) => !words.includes(key));
  return Object.fromEntries(
    kept.map(([k, v]) => [k, bare(v, !inMap && (k === 'properties' || k === '$defs'))]),
  );
}

/** Ajv's standalone code for all schemas, as one module with a named export for each. */
async function compile(schemas, wanted) {
  const [{ default: Ajv }, { default: addFormats }, { default: standalone }] = await Promise.all([
    import('ajv/dist/2020.js'),
    import('ajv-formats'),
    import('ajv/dist/standalone/index.js'),
  ]);
  const ajv = new Ajv.default({
    allErrors: true,
    strict: true,
    // `then: { required }` names properties that the schema around it defines.
    strictRequired: false,
    allowUnionTypes: true,
    // One function a schema instead of a copy at each reference: a third of the code.
    inlineRefs: false,
    code: { source: true, esm: true },
  });
  addFormats.default(ajv);
  for (const s of schemas) ajv.addSchema(bare(s.schema, false));
  const refs = Object.fromEntries(wanted.map((s) => [exportName(s.path), s.schema.$id]));
  return standalone.default(ajv, refs);
}

/** Bundles what the code requires of Ajv (string length, date formats) into it. */
async function bundle(code, wanted) {
  const { build } = await import('esbuild');
  const names = Object.fromEntries(wanted.map((s) => [s.path, exportName(s.path)]));
  const result = await build({
    stdin: {
      contents: `${code}\nexport const validatorNames = ${JSON.stringify(names)};\n`,
      resolveDir: ROOT,
      loader: 'js',
    },
    bundle: true,
    format: 'esm',
    platform: 'neutral',
    mainFields: ['main'],
    target: 'es2022',
    legalComments: 'none',
    write: false,
    logLevel: 'warning',
  });
  return result.outputFiles[0].text;
}

function declarations(wanted) {
  return [
    "import type { ErrorObject } from 'ajv';",
    'export interface Validator { (data: unknown): boolean; errors?: ErrorObject[] | null }',
    ...wanted.map((s) => `export const ${exportName(s.path)}: Validator;`),
    'export const validatorNames: {',
    ...wanted.map((s) => `  readonly '${s.path}': '${exportName(s.path)}';`),
    '};',
    '',
  ].join('\n');
}

/** Writes by renaming, so that a reader never sees half a file. */
function put(file, text) {
  const fresh = `${file}.${process.pid}`;
  writeFileSync(fresh, text);
  renameSync(fresh, file);
}

/** Writes one module of validators unless it is current; says whether it did. */
async function buildModule(out, schemas, wanted, force) {
  const stamp = `// stamp ${stampOf(schemas)}`;
  const js = join(ROOT, `${out}.js`);
  const dts = join(ROOT, `${out}.d.ts`);
  if (!force && existsSync(js) && existsSync(dts) && readFileSync(js, 'utf8').startsWith(stamp)) return false;
  const code = await bundle(await compile(schemas, wanted), wanted);
  put(dts, declarations(wanted));
  put(js, `${stamp}\n${code}`);
  return true;
}

/**
 * Compiles what is out of date. The filing's validators stand in a module of their own, which the browser and the
 * check command load; those of requests, responses and files are many times larger and the server's alone.
 */
export async function buildValidators({ force = false, only = 'all' } = {}) {
  const own = readSchemas(ROOT);
  const isFiling = (s) => s.path.startsWith('common/') || s.path === 'filing';
  const filing = own.filter(isFiling);
  const drafts = draftSchemas(own);
  const wanted = [...filing, ...drafts].filter((s) => /(^|\/)(filing|line)$/.test(s.path));
  const built = [await buildModule(FILING_OUT, [...filing, ...drafts], wanted, force)];
  const api = own.filter((s) => !isFiling(s));
  if (only === 'all') built.push(await buildModule(API_OUT, [...own, ...drafts], api, force));
  return built.includes(true);
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const t0 = performance.now();
  const built = await buildValidators({ force: process.argv.includes('--force') });
  console.log(
    built ? `validators compiled in ${Math.round(performance.now() - t0)} ms` : 'validators are current',
  );
}
