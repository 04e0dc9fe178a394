import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

type Json = Record<string, unknown>;
const ENDING = '.schema.json';
const BASE = 'https://counterpoise.example/schemas/';

/** `responses/application` → `responses.application`, a name that OpenAPI allows. */
export const componentName = (path: string): string => path.replaceAll('/', '.');

/** A reference of one schema file turned into one within the document. */
function localReference(reference: string, from: string): string {
  const url = new URL(reference, `${BASE}${from}${ENDING}`);
  const path = url.pathname.replace('/schemas/', '').replace(ENDING, '');
  return `#/components/schemas/${componentName(path)}${url.hash.replace(/^#/, '')}`;
}

function translated(node: unknown, from: string): unknown {
  if (Array.isArray(node)) return node.map((item) => translated(item, from));
  if (typeof node !== 'object' || node === null) return node;
  return Object.fromEntries(
    Object.entries(node).map(([key, value]) =>
      key === '$ref' && typeof value === 'string'
        ? [key, localReference(value, from)]
        : [key, translated(value, from)],
    ),
  );
}

/** Every schema of the project, by its path below schemas/, with references that hold within one document. */
export function schemaDocuments(root: string): Map<string, Json> {
  const folder = join(root, 'schemas');
  const documents = new Map<string, Json>();
  for (const name of readdirSync(folder, { recursive: true, encoding: 'utf8' }).sort()) {
    if (!name.endsWith(ENDING)) continue;
    const path = name.slice(0, -ENDING.length).replaceAll('\\', '/');
    const {
      $id: _id,
      $schema: _dialect,
      ...schema
    } = JSON.parse(readFileSync(join(folder, name), 'utf8')) as Json;
    documents.set(path, translated(schema, path) as Json);
  }
  return documents;
}
