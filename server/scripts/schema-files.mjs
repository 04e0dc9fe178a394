/** The schemas of the project: reading them, and deriving the draft variant of the filing's. */
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';

const BASE = 'https://counterpoise.example/schemas/';
const DRAFT_BASE = 'https://counterpoise.example/draft/';

/** Every schema below `root`/schemas as { path: 'common/line', schema }, in the order of their paths. */
export function readSchemas(root) {
  const dir = join(root, 'schemas');
  return readdirSync(dir, { recursive: true, encoding: 'utf8' })
    .filter((f) => f.endsWith('.schema.json'))
    .map((f) => f.replaceAll('\\', '/'))
    .sort()
    .map((f) => {
      const schema = JSON.parse(readFileSync(join(dir, f), 'utf8'));
      if (schema.$id !== BASE + f)
        throw new Error(`schemas/${f}: its $id is ${schema.$id}, wanted ${BASE + f}`);
      return { path: f.replace('.schema.json', ''), schema };
    });
}

/** Words of a schema that say what must be there or in what range: a draft need not keep them yet. */
const COMPLETENESS = new Set([
  ...['required', 'dependentRequired', 'minItems', 'minProperties', 'minLength', 'if', 'then', 'else'],
  ...['minimum', 'maximum', 'exclusiveMinimum', 'exclusiveMaximum', 'uniqueItems', 'format', 'default'],
]);

/** A schema for what is still being written: types, unknown keys and greatest lengths hold, all else may wait. */
function relaxed(node, inMap) {
  if (Array.isArray(node)) return node.map((n) => relaxed(n, false));
  if (typeof node !== 'object' || node === null) return node;
  const out = {};
  for (const [key, value] of Object.entries(node)) {
    // `properties` and `$defs` map names to schemas: their keys are names, whatever they look like.
    if (inMap) out[key] = relaxed(value, false);
    else if (key === 'allOf') continue;
    else if (!COMPLETENESS.has(key)) out[key] = relaxed(value, key === 'properties' || key === '$defs');
  }
  // A cable's values are an object or a list by an if; unconditionally that is a union.
  if (!inMap && node.then && node.else && (node.then.type === 'array' || node.else.$ref))
    out.anyOf = [relaxed(node.then, false), relaxed(node.else, false)];
  return out;
}

/** The draft variants of schemas/common and of the filing, under an $id base of their own. */
export function draftSchemas(schemas) {
  return schemas
    .filter((s) => s.path.startsWith('common/') || s.path === 'filing')
    .map((s) => ({
      path: `draft/${s.path}`,
      schema: { ...relaxed(s.schema, false), $id: s.schema.$id.replace(BASE, DRAFT_BASE) },
    }));
}
