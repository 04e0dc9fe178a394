import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import { dirname, join, normalize } from 'node:path';
import ts from 'typescript';

/** One source file, parsed, with the project's own files that it imports. */
export interface SourceFile {
  path: string;
  text: string;
  ast: ts.SourceFile;
  imports: { specifier: string; target: string | null; line: number; typeOnly: boolean }[];
}

const ALIASES: Record<string, string> = {
  '#shared/': 'shared/',
  '#server/': 'server/',
  '#schemas/': 'schemas/',
};
const ENDINGS = ['', '.ts', '.tsx', '.mjs', '.d.ts'];

/** Files that git tracks or would track, so that a new file is judged before its first commit. */
export function listFiles(pattern: RegExp): string[] {
  const out = execFileSync('git', ['ls-files', '--cached', '--others', '--exclude-standard'], {
    encoding: 'utf8',
  });
  return [...new Set(out.split('\n'))].filter((f) => pattern.test(f) && existsSync(f)).sort();
}

function resolve(from: string, specifier: string): string | null {
  const alias = Object.keys(ALIASES).find((a) => specifier.startsWith(a));
  if (!alias && !specifier.startsWith('.')) return null;
  const base = alias
    ? (ALIASES[alias] ?? '') + specifier.slice(alias.length)
    : normalize(join(dirname(from), specifier));
  const found = ENDINGS.map((e) => base + e).find((f) => existsSync(f) && /\.[a-z0-9]+$/i.test(f));
  return found ?? base;
}

/** Reads and parses a file once; imports are taken from import, export-from and import() forms. */
export function readSource(path: string): SourceFile {
  const text = readFileSync(path, 'utf8');
  const ast = ts.createSourceFile(path, text, ts.ScriptTarget.ES2023, true);
  const imports: SourceFile['imports'] = [];
  const add = (node: ts.Node, literal: ts.Expression | undefined, typeOnly: boolean) => {
    if (!literal || !ts.isStringLiteral(literal)) return;
    const line = ast.getLineAndCharacterOfPosition(node.getStart(ast)).line + 1;
    imports.push({ specifier: literal.text, target: resolve(path, literal.text), line, typeOnly });
  };
  const visit = (node: ts.Node): void => {
    if (ts.isImportDeclaration(node)) add(node, node.moduleSpecifier, node.importClause?.isTypeOnly ?? false);
    if (ts.isExportDeclaration(node)) add(node, node.moduleSpecifier, node.isTypeOnly);
    if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword)
      add(node, node.arguments[0], false);
    ts.forEachChild(node, visit);
  };
  visit(ast);
  return { path, text, ast, imports };
}

let cached: SourceFile[] | undefined;

/** Every source file of the product itself (tests and generated code left out), parsed once a run. */
export function productFiles(): SourceFile[] {
  cached ??= listFiles(/^(src|server|shared)\/.*\.(ts|tsx|mjs)$/)
    .filter((f) => !f.includes('.generated.') && !f.endsWith('.d.ts'))
    .map(readSource);
  return cached;
}
