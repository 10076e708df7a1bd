import ts from 'typescript';
import { expect, it } from 'vitest';
import { BLOCK_KINDS } from '#shared/report';
import { parsed, type SourceFile, sourceFiles, visitAll } from './source-files';

/**
 * Nobody outside a block kind's own folder asks which kind a block is. A comparison counts when it
 * reads `kind` of something called a block, or compares with the id of a block kind; "heading"
 * alone is also the name of a drawn element.
 */
const IDS = Object.keys(BLOCK_KINDS).filter((id) => id !== 'heading');
const OWN_FOLDER = /^shared\/report\/blocks\/[^/]+\//;

it('nobody asks which kind a block is', () => {
  const files = sourceFiles('shared', 'server', 'client/src').filter(
    ({ path }) => !OWN_FOLDER.test(path),
  );
  expect(files.flatMap(questionsIn)).toEqual([]);
});

it.each([
  "if (block.kind === 'heading') draw();",
  "const isTable = this.block().kind !== 'x';",
  "switch (hisBlock.kind) { case 'heading': break; }",
  "if (kind === 'effectSentence') draw();",
  "switch (kind) { case 'prose': break; }",
  "['stratifiedTable'].includes(kind);",
])('a question is found: %s', (text) => {
  expect(questionsIn(parsed('server/made-up.ts', text))).toHaveLength(1);
});

it.each([
  "if (element.kind === 'heading') draw();",
  'const kind = blockKindOf(block.kind);',
  'const COMPANIONS = { effectSentence: EffectBalance };',
  "const step = { kind: 'insertBlock', block: { kind: 'prose' } };",
])('something else is let be: %s', (text) => {
  expect(questionsIn(parsed('server/made-up.ts', text))).toEqual([]);
});

function questionsIn(file: SourceFile): readonly string[] {
  if (!file.text.includes('kind')) return [];
  const { path, tree } = file;
  const found: string[] = [];
  visitAll(tree, (node) => {
    if (isQuestion(node)) found.push(`${path}: ${node.getText(tree).split('\n')[0] ?? ''}`);
  });
  return found;
}

function isQuestion(node: ts.Node): boolean {
  if (ts.isBinaryExpression(node)) {
    return (
      isEquality(node) && [node.left, node.right].some((side) => readsKind(side) || isId(side))
    );
  }
  if (ts.isSwitchStatement(node)) {
    const clauses = node.caseBlock.clauses.filter(ts.isCaseClause);
    return readsKind(node.expression) || clauses.some(({ expression }) => isId(expression));
  }
  return ts.isCallExpression(node) && isListOfIds(node.expression);
}

const EQUALITIES = new Set([
  ts.SyntaxKind.EqualsEqualsEqualsToken,
  ts.SyntaxKind.ExclamationEqualsEqualsToken,
  ts.SyntaxKind.EqualsEqualsToken,
  ts.SyntaxKind.ExclamationEqualsToken,
]);

function isEquality({ operatorToken }: ts.BinaryExpression): boolean {
  return EQUALITIES.has(operatorToken.kind);
}

/** `block.kind`, `this.block().kind`, `hisBlock.kind`. */
function readsKind(node: ts.Expression): boolean {
  if (!ts.isPropertyAccessExpression(node) || node.name.text !== 'kind') return false;
  return /block(?:\(\))?$/i.test(node.expression.getText());
}

function isId(node: ts.Expression): boolean {
  return ts.isStringLiteralLike(node) && IDS.includes(node.text);
}

/** `['stratifiedTable'].includes` */
function isListOfIds(node: ts.Expression): boolean {
  if (!ts.isPropertyAccessExpression(node) || node.name.text !== 'includes') return false;
  const list = node.expression;
  return ts.isArrayLiteralExpression(list) && list.elements.some(isId);
}
