import { readdirSync, readFileSync } from 'node:fs';
import { join, posix, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import ts from 'typescript';

/** The folder of the project. */
export const ROOT = fileURLToPath(new URL('../..', import.meta.url));

/** A file that ships, by its path from the project's folder, with slashes. */
export interface SourceFile {
  readonly path: string;
  readonly text: string;
  /** Parsed when it is first asked for. */
  readonly tree: ts.SourceFile;
}

/** Something that a file imports. */
export interface Import {
  /** A path without extension ("shared/effects", "server/models/rows"), or "package:zod". */
  readonly target: string;
  /** Whether only types come from there, so that nothing of it is loaded. */
  readonly typeOnly: boolean;
  /** Whether it is loaded later, by a call of `import`. */
  readonly later: boolean;
}

/** The TypeScript files of folders; specs and what only tests use are left out. */
export function sourceFiles(...folders: readonly string[]): readonly SourceFile[] {
  return folders.flatMap((folder) =>
    readdirSync(join(ROOT, folder), { recursive: true, encoding: 'utf8' })
      .map((name) => posix.join(folder, name.split(sep).join('/')))
      .filter((path) => path.endsWith('.ts') && !/\.(spec|d)\.ts$|\/testing\//.test(path))
      .map((path) => parsed(path, readFileSync(join(ROOT, path), 'utf8'))),
  );
}

/** A file with this text. */
export function parsed(path: string, text: string): SourceFile {
  let tree: ts.SourceFile | null = null;
  return {
    path,
    text,
    get tree() {
      tree ??= ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true);
      return tree;
    },
  };
}

/** Everything that a file imports or passes on from elsewhere. */
export function importsOf(file: SourceFile): readonly Import[] {
  const known = KNOWN.get(file) ?? readImports(file);
  KNOWN.set(file, known);
  return known;
}

const KNOWN = new WeakMap<SourceFile, readonly Import[]>();

function readImports({ path, tree }: SourceFile): readonly Import[] {
  const found: Import[] = [];
  visitAll(tree, (node) => {
    const one = importAt(node);
    if (one !== null) found.push({ ...one, target: resolved(one.target, path) });
  });
  return found;
}

/** Visits a node and everything below it. */
export function visitAll(node: ts.Node, look: (node: ts.Node) => void): void {
  look(node);
  ts.forEachChild(node, (child) => {
    visitAll(child, look);
  });
}

function importAt(node: ts.Node): Import | null {
  if (ts.isImportDeclaration(node) && ts.isStringLiteral(node.moduleSpecifier)) {
    const typeOnly = node.importClause !== undefined && onlyTypes(node.importClause);
    return { target: node.moduleSpecifier.text, typeOnly, later: false };
  }
  if (ts.isExportDeclaration(node) && node.moduleSpecifier !== undefined) {
    const target = (node.moduleSpecifier as ts.StringLiteral).text;
    return { target, typeOnly: node.isTypeOnly, later: false };
  }
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
    const target = (node.argument.literal as ts.StringLiteral).text;
    return { target, typeOnly: true, later: false };
  }
  const called = ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword;
  const [argument] = called ? node.arguments : [];
  if (argument === undefined || !ts.isStringLiteral(argument)) return null;
  return { target: argument.text, typeOnly: false, later: true };
}

function onlyTypes({ phaseModifier, name, namedBindings }: ts.ImportClause): boolean {
  if (phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  if (name !== undefined || namedBindings === undefined) return false;
  return (
    ts.isNamedImports(namedBindings) && namedBindings.elements.every((each) => each.isTypeOnly)
  );
}

function resolved(target: string, from: string): string {
  if (target.startsWith('#')) return target.slice(1);
  if (target.startsWith('.')) return posix.join(posix.dirname(from), target);
  return `package:${target}`;
}
