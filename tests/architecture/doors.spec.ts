import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join, posix } from 'node:path';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import { parsed, ROOT, type SourceFile, sourceFiles } from './source-files';

const { imports } = JSON.parse(readFileSync(join(ROOT, 'package.json'), 'utf8')) as {
  readonly imports: Readonly<Record<string, string>>;
};
const DOORS = Object.entries(imports)
  .filter(([name]) => !name.includes('*'))
  .map(([name, file]) => ({ name, path: posix.normalize(file) }));

describe('doors of package.json', () => {
  it('lead to files', () => {
    expect(DOORS.filter(({ path }) => !existsSync(join(ROOT, path)))).toEqual([]);
  });

  it('are there for every folder of shared', () => {
    const folders = new Set(sourceFiles('shared').map(({ path }) => path.split('/')[1] ?? ''));
    const paths = DOORS.map(({ path }) => path);
    expect([...folders].filter((name) => !paths.includes(`shared/${name}/index.ts`))).toEqual([]);
  });

  it('come to no package.json on their way', () => {
    const names = readdirSync(join(ROOT, 'shared'), { recursive: true, encoding: 'utf8' });
    expect(names.filter((name) => name.endsWith('package.json'))).toEqual([]);
  });
});

it('every export has a name of its own: nothing passes on all that another file has', () => {
  const all = sourceFiles('shared', 'server', 'client/src', 'seeds');
  const starred = all.filter(({ text }) => /^\s*export\s+(?:type\s+)?\*/m.test(text));
  expect(all).not.toHaveLength(0);
  expect(starred.map(({ path }) => path)).toEqual([]);
});

describe.each(DOORS)('$name', ({ path }) => {
  it('documents every export', () => {
    const names = exportedNames(fileAt(path));
    expect(names).not.toHaveLength(0);
    expect(names.filter((name) => !isDocumented(path, name))).toEqual([]);
  });
});

describe('documentation', () => {
  it('is looked for where a thing is declared', () => {
    const documented =
      '/** Adds two. */\nexport function add(): void {}\nexport function bare(): void {}';
    const file = parsed('shared/made-up.ts', documented);
    expect(hasComment(declarationsOf(file, 'add'))).toBe(true);
    expect(hasComment(declarationsOf(file, 'bare'))).toBe(false);
  });
});

const files = new Map<string, SourceFile>();

function fileAt(path: string): SourceFile {
  const known = files.get(path);
  if (known !== undefined) return known;
  const file = parsed(path, readFileSync(join(ROOT, path), 'utf8'));
  files.set(path, file);
  return file;
}

function exportedNames({ tree }: SourceFile): readonly string[] {
  return tree.statements.flatMap((statement) =>
    ts.isExportDeclaration(statement) ? namesOf(statement) : declaredNames(statement),
  );
}

function namesOf({ exportClause }: ts.ExportDeclaration): readonly string[] {
  if (exportClause === undefined || !ts.isNamedExports(exportClause)) return [];
  return exportClause.elements.map(({ name }) => name.text);
}

function isDocumented(path: string, name: string): boolean {
  const file = fileAt(path);
  const own = declarationsOf(file, name);
  if (own.length > 0) return hasComment(own);
  const source = passedOnFrom(file, name);
  return source !== null && isDocumented(source.path, source.name);
}

/** Where a file has a name from that it only passes on. */
function passedOnFrom(
  { path, tree }: SourceFile,
  name: string,
): { readonly path: string; readonly name: string } | null {
  for (const statement of tree.statements) {
    if (!ts.isExportDeclaration(statement) || statement.moduleSpecifier === undefined) continue;
    if (!ts.isNamedExports(statement.exportClause!)) continue;
    const found = statement.exportClause.elements.find((each) => each.name.text === name);
    if (found === undefined) continue;
    const target = (statement.moduleSpecifier as ts.StringLiteral).text;
    return { path: fileOf(path, target), name: (found.propertyName ?? found.name).text };
  }
  return null;
}

function fileOf(from: string, target: string): string {
  const door = DOORS.find(({ name }) => name === target);
  if (door !== undefined) return door.path;
  const base = target.startsWith('#') ? target.slice(1) : posix.join(posix.dirname(from), target);
  const asFile = `${base}.ts`;
  return existsSync(join(ROOT, asFile)) ? asFile : `${base}/index.ts`;
}

function declarationsOf({ tree }: SourceFile, name: string): readonly ts.Statement[] {
  return tree.statements.filter((statement) => declaredNames(statement).includes(name));
}

function declaredNames(statement: ts.Statement): readonly string[] {
  if (ts.isVariableStatement(statement)) {
    return statement.declarationList.declarations.map(({ name }) => name.getText());
  }
  const named =
    ts.isFunctionDeclaration(statement) ||
    ts.isClassDeclaration(statement) ||
    ts.isInterfaceDeclaration(statement) ||
    ts.isTypeAliasDeclaration(statement) ||
    ts.isEnumDeclaration(statement);
  return named && statement.name !== undefined ? [statement.name.text] : [];
}

/** A type and a value of one name share their comment; overloads too. */
function hasComment(statements: readonly ts.Statement[]): boolean {
  return statements.some((statement) =>
    ts.getJSDocCommentsAndTags(statement).some((comment) => {
      const text = ts.isJSDoc(comment) ? ts.getTextOfJSDocComment(comment.comment) : undefined;
      return (text ?? '').trim().length > 5;
    }),
  );
}
