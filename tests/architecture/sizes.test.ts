import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import { productFiles, type SourceFile } from './source-files';

const FILE_LIMIT = 350;
const FUNCTION_LIMIT = 80;

/** Waived for now, with the reason. This list can only shrink: a waiver that is no longer needed fails. */
const WAIVED_FILES: Record<string, string> = {};
const WAIVED_FUNCTIONS: Record<string, string> = {};

const lines = (text: string) => text.split('\n').length;
const exempt = (path: string) => /^(server\/database\/(seeds|migrations)|shared\/library)\//.test(path);

interface Sized {
  name: string;
  length: number;
}

function functionsOf(file: SourceFile): Sized[] {
  const found: Sized[] = [];
  const line = (pos: number) => file.ast.getLineAndCharacterOfPosition(pos).line;
  const visit = (node: ts.Node): void => {
    if (ts.isFunctionLike(node) && 'body' in node && node.body) {
      const name =
        node.name?.getText(file.ast) ??
        (ts.isVariableDeclaration(node.parent) ? node.parent.name.getText(file.ast) : 'anonymous');
      found.push({
        name: `${file.path}#${name}`,
        length: line(node.end) - line(node.getStart(file.ast)) + 1,
      });
    }
    ts.forEachChild(node, visit);
  };
  visit(file.ast);
  return found;
}

/** A React component's markup reads at one glance in more lines than logic does; it has the file's limit only. */
const isMarkup = (file: SourceFile) => file.path.endsWith('.tsx');

describe('sizes', () => {
  it(`no file is longer than ${FILE_LIMIT} lines`, () => {
    const long = productFiles()
      .filter((f) => !exempt(f.path) && lines(f.text) > FILE_LIMIT)
      .map((f) => f.path);
    expect(long.filter((p) => !WAIVED_FILES[p])).toEqual([]);
    expect(Object.keys(WAIVED_FILES).filter((p) => !long.includes(p))).toEqual([]);
  });

  it(`no function is longer than ${FUNCTION_LIMIT} lines`, () => {
    const limit = (f: SourceFile) => (isMarkup(f) ? FUNCTION_LIMIT * 2 : FUNCTION_LIMIT);
    const long = productFiles()
      .filter((f) => !exempt(f.path))
      .flatMap((f) =>
        functionsOf(f)
          .filter((s) => s.length > limit(f))
          .map((s) => s.name),
      );
    expect(long.filter((p) => !WAIVED_FUNCTIONS[p])).toEqual([]);
    expect(Object.keys(WAIVED_FUNCTIONS).filter((p) => !long.includes(p))).toEqual([]);
  });
});
