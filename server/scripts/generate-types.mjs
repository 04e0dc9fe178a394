/**
 * TypeScript types from the project's JSON Schemas. It knows the part of the language that the schemas use:
 * objects, lists, tuples, enum, const, unions and references. Conditions (if, then, else) narrow nothing in the type.
 */
import { dirname, join } from 'node:path/posix';

const pascal = (text) =>
  text
    .split(/[^A-Za-z0-9]+/)
    .filter(Boolean)
    .map((w) => w.charAt(0).toUpperCase() + w.slice(1))
    .join('');

/** Every schema and `$def` that gets a type of its own: reference → { name, node, path }. */
function collect(schemas) {
  const known = new Map();
  const add = (ref, name, node, path) => {
    const twin = [...known.values()].find(
      (k) => k.name === name && k.path.split('/')[0] === path.split('/')[0],
    );
    if (twin) throw new Error(`two schemas are called ${name}: ${twin.path} and ${path}`);
    known.set(ref, { name, node, path });
  };
  for (const { path, schema } of schemas) {
    // A file that only holds definitions has nothing to be a type of.
    const whole = schema.type ?? schema.enum ?? schema.anyOf ?? schema.oneOf ?? schema.$ref;
    const name = pascal(schema.title ?? path.split('/').at(-1));
    if (whole) add(path, name, schema, path);
    for (const [def, node] of Object.entries(schema.$defs ?? {}))
      add(`${path}#/$defs/${def}`, pascal(node.title ?? def), node, path);
  }
  return known;
}

/** The key in `known` that a `$ref` inside the schema `path` points at. */
function target(ref, path) {
  const [file, fragment] = ref.split('#');
  const whole = file.replace('https://counterpoise.example/schemas/', '/');
  const isDraft = /\/draft\//.test(whole);
  const resolved = isDraft
    ? whole.replace(/^.*\/draft\//, '')
    : whole.startsWith('/')
      ? whole.slice(1)
      : file
        ? join(dirname(path), file)
        : path;
  return { key: resolved.replace('.schema.json', '') + (fragment ? `#${fragment}` : ''), isDraft };
}

const literal = (v) => (typeof v === 'string' ? `'${v.replaceAll("'", "\\'")}'` : JSON.stringify(v));
const union = (types) => [...new Set(types)].join(' | ') || 'never';

/** What one run of the generator knows: the named types, and those that the file being written uses. */
class Writer {
  constructor(known) {
    this.known = known;
    this.used = new Set();
  }

  type(node, path) {
    if (node === true) return 'unknown';
    if (node === false) return 'never';
    if (node.$ref) return this.reference(node.$ref, path);
    if (node.enum) return union(node.enum.map(literal));
    if ('const' in node) return literal(node.const);
    const choice = node.anyOf ?? node.oneOf;
    if (choice) return union(choice.map((n) => this.type(n, path)));
    // A condition on the kind of the value itself (object or list) is a union.
    if (!node.type && node.then && node.else)
      return union([this.type(node.then, path), this.type(node.else, path)]);
    if (Array.isArray(node.type)) return union(node.type.map((t) => this.plain({ ...node, type: t }, path)));
    return this.plain(node, path);
  }

  reference(ref, path) {
    const { key, isDraft } = target(ref, path);
    const found = this.known.get(key);
    if (!found) throw new Error(`schemas/${path}: no schema for ${ref}`);
    this.used.add(found);
    return isDraft ? `DeepPartial<${found.name}>` : found.name;
  }

  plain(node, path) {
    switch (node.type) {
      case 'string':
        return 'string';
      case 'number':
      case 'integer':
        return 'number';
      case 'boolean':
        return 'boolean';
      case 'null':
        return 'null';
      case 'array':
        return this.list(node, path);
      case 'object':
        return this.object(node, path);
      default:
        return 'unknown';
    }
  }

  list(node, path) {
    if (node.prefixItems) return `[${node.prefixItems.map((n) => this.type(n, path)).join(', ')}]`;
    const item = this.type(node.items ?? true, path);
    if (node.minItems === 2 && node.maxItems === 2) return `[${item}, ${item}]`;
    return /[|{ ]/.test(item) ? `(${item})[]` : `${item}[]`;
  }

  object(node, path) {
    const required = new Set(node.required ?? []);
    const fields = Object.entries(node.properties ?? {}).map(([name, child]) => {
      const key = /^[A-Za-z_$][\w$]*$/.test(name) ? name : `'${name}'`;
      return `${this.comment(child)}${key}${required.has(name) ? '' : '?'}: ${this.type(child, path)};`;
    });
    const rest = node.additionalProperties;
    const open = rest === undefined || rest === true;
    if (rest && rest !== true) {
      if (fields.length === 0) return `Record<string, ${this.type(rest, path)}>`;
      fields.push('[key: string]: unknown;');
    } else if (open && fields.length > 0) fields.push('[key: string]: unknown;');
    if (fields.length === 0) return open ? 'Record<string, unknown>' : 'Record<string, never>';
    return `{\n${fields.join('\n')}\n}`;
  }

  comment(node) {
    const text = node.description?.replaceAll('*/', '* /');
    return text ? `/** ${text} */\n` : '';
  }

  declaration({ name, node, path }) {
    const body = this.type(node, path);
    const head = this.comment(node);
    return body.startsWith('{')
      ? `${head}export interface ${name} ${body}`
      : `${head}export type ${name} = ${body};`;
  }
}

const HEAD = 'Made from the schemas by `npm run generate`; do not edit.';
const DEEP_PARTIAL = `/** A thing of which any part may still be missing. */
export type DeepPartial<T> = T extends readonly (infer U)[] ? DeepPartial<U>[] : T extends object ? { [K in keyof T]?: DeepPartial<T[K]> } : T;`;

/** The text of filing.generated.ts (common and filing) and api.generated.ts (requests, responses, files). */
export function typesFrom(schemas) {
  const known = collect(schemas);
  const isFiling = (t) => t.path === 'filing' || t.path.startsWith('common/');
  const all = [...known.values()];
  const writer = new Writer(known);
  const filing = all.filter(isFiling).map((t) => writer.declaration(t));
  const api = new Writer(known);
  const apiTypes = all.filter((t) => !isFiling(t)).map((t) => api.declaration(t));
  const own = new Set(all.filter((t) => !isFiling(t)).map((t) => t.name));
  const borrowed = [...api.used].filter(isFiling).map((t) => t.name);
  const clash = borrowed.find((n) => own.has(n));
  if (clash) throw new Error(`${clash} is the name of a filing type and of an API type`);
  const names = [
    ...new Set([...(apiTypes.join('').includes('DeepPartial<') ? ['DeepPartial'] : []), ...borrowed]),
  ].sort();
  const imports = names.length ? `import type { ${names.join(', ')} } from './filing.generated';\n` : '';
  return {
    'shared/contracts/filing.generated.ts': `/** Types of the filing format. ${HEAD} */\n\n${[DEEP_PARTIAL, ...filing].join('\n\n')}\n`,
    'shared/contracts/api.generated.ts': `/** Types of what the API takes and gives. ${HEAD} */\n${imports}\n${apiTypes.join('\n\n')}\n`,
  };
}
